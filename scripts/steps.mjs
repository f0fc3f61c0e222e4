// What a person reads while a command works: each step's name and its time. Plain Node, no packages.

/** Does one step and says its name, notes on the way, and how long it took. */
export async function step(name, work) {
  const began = performance.now();
  process.stdout.write(`${name.padEnd(20)}`);
  const note = (words) => process.stdout.write(`${words}  `);
  try {
    const result = await work(note);
    process.stdout.write(`${seconds(began)}\n`);
    return result;
  } catch (error) {
    process.stdout.write(`stopped after ${seconds(began)}\n`);
    throw error;
  }
}

const seconds = (began) => `${((performance.now() - began) / 1000).toFixed(1)} s`;
