/** Every bench by name; each gives numbers, medians where they are times. A new one is a line here and a file beside. */
const benches: Record<string, () => Promise<Record<string, number>>> = {
  engine: async () => (await import('./bench/engine')).benchEngine(),
  study: async () => (await import('./bench/study')).benchStudy(),
  judging: async () => (await import('./bench/judging')).benchJudging(),
  documents: async () => (await import('./bench/documents')).benchDocuments(),
};

/** `bench -- engine` prints the one bench; without a name all of them, each under its own. */
async function main(name: string | undefined): Promise<void> {
  const bench = name === undefined ? undefined : benches[name];
  if (name !== undefined && !bench) {
    process.stderr.write(`No bench ${name}. Known: ${Object.keys(benches).join(', ')}\n`);
    process.exitCode = 1;
    return;
  }
  const result = bench ? await bench() : await all();
  process.stdout.write(`${JSON.stringify(result, null, 2)}\n`);
}

async function all(): Promise<Record<string, Record<string, number>>> {
  const results: Record<string, Record<string, number>> = {};
  for (const [name, bench] of Object.entries(benches)) results[name] = await bench();
  return results;
}

void main(process.argv[2]);
