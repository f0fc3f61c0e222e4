// npm run reset: asks, then deletes what this checkout keeps. Plain Node, no packages.
import fs from 'node:fs';
import path from 'node:path';
import readline from 'node:readline';

import { isRunning, otherUsers, stop } from './postgres.mjs';
import { stateFolder } from './state.mjs';

/** Only what Thickset itself put there: the folder may be anyone's. */
const own = /^(postgres|mail|users|lock|browser|[a-z]+\.port|[a-z]+\.secret)$/;

const ask = (question) =>
  new Promise((resolve) => {
    const terminal = readline.createInterface({ input: process.stdin, output: process.stdout });
    terminal.once('close', () => resolve(''));
    terminal.question(question, (answer) => {
      resolve(answer);
      terminal.close();
    });
  });

async function reset() {
  const folder = stateFolder();
  const names = fs.existsSync(folder) ? fs.readdirSync(folder).filter((name) => own.test(name)) : [];
  if (names.length === 0) return console.log(`There is nothing in ${folder}.`);
  const users = otherUsers().filter((user) => user !== 'by-hand');
  if (isRunning() && users.length > 0) {
    throw new Error(`Thickset is running from this checkout (process ${users.join(', ')}): stop it first.`);
  }
  console.log(`This deletes every firm, job and mail of this checkout, in ${folder}.`);
  if ((await ask('Type "yes" to delete: ')).trim() !== 'yes') return console.log('\nNothing was deleted.');
  stop();
  for (const name of names) fs.rmSync(path.join(folder, name), { recursive: true, force: true });
  console.log('Deleted. npm start begins anew.');
}

reset().catch((error) => {
  console.error(error.message);
  process.exitCode = 1;
});
