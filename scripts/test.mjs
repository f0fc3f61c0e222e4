// npm test: every runner, then one line with the sum. Plain Node; arguments name runners: npm test -- unit
import fs from 'node:fs';
import path from 'node:path';

import { ensure } from './debian.mjs';
import { install } from './install.mjs';
import * as postgres from './postgres.mjs';
import { code, launch, root, stopAll } from './processes.mjs';
import { freePort, stateFolder } from './state.mjs';
import { step } from './steps.mjs';

const build = path.join(root, 'build');
const module = (name) => path.join(root, 'node_modules', name);
const run = (args, env = {}) => code(process.execPath, args, { ...process.env, CI: '1', ...env });

const runners = {
  format: {
    needs: [],
    run: () => counted([module('prettier/bin/prettier.cjs'), '--check', '--log-level', 'warn', '.']),
  },
  lint: { needs: [], run: () => counted([module('eslint/bin/eslint.js'), '.', '--max-warnings', '0', ...cached]) },
  types: { needs: [], run: () => counted(['scripts/types.mjs']) },
  unit: { needs: ['postgresql', 'poppler-utils'], run: unit },
  browser: { needs: ['postgresql', 'chromium', 'poppler-utils'], run: browser },
};
const cached = ['--cache', '--cache-location', 'build/eslint'];

/** A runner without tests of its own counts as one. */
async function counted(args) {
  const failed = (await run(args)) !== 0;
  return failed ? [0, 1] : [1, 0];
}

/** A runner that writes what it counted into a file; without the file, or with a bad end, it failed. */
async function reported(args, { file, read, env }) {
  const report = path.join(build, file);
  fs.rmSync(report, { force: true });
  const status = await run(args, env);
  if (!fs.existsSync(report)) return [0, 1];
  const [passed, failed] = read(JSON.parse(fs.readFileSync(report, 'utf8')));
  return [passed, failed || (status === 0 ? 0 : 1)];
}

function unit() {
  const read = (report) => [report.numPassedTests, report.numFailedTests + report.numRuntimeErrorTestSuites];
  const args = [module('jest/bin/jest.js'), '--ci', '--json', `--outputFile=${path.join(build, 'jest.json')}`];
  return reported(args, { file: 'jest.json', read });
}

/** The browser sees the product as a person starts it: npm start, on a free port, with a fresh demo in a state of its own. */
async function browser() {
  const state = path.join(stateFolder(), 'browser');
  const env = { ...process.env, THICKSET_STATE: state };
  for (const name of ['PG_PORT', 'SMTP_URL', 'SMTP_HOST', 'DEMO']) delete env[name];
  await code(process.execPath, ['scripts/postgres.mjs', 'stop'], env);
  fs.rmSync(state, { recursive: true, force: true });
  const app = launch(process.execPath, ['scripts/start.mjs'], {
    env: { ...env, PORT: String(await freePort()) },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const gone = new Promise((resolve) => app.once('exit', resolve));
  try {
    const said = await untilStarted(app);
    const address = (name) => new RegExp(`^${name} +(http://\\S+)`, 'm').exec(said)?.[1];
    const password = /^Password +(\S+)/m.exec(said)?.[1];
    const read = ({ stats }) => [stats.expected + stats.flaky, stats.unexpected];
    const seen = { BASE_URL: address('Thickset'), INBOX_URL: address('Inbox'), DEMO_PASSWORD: password };
    const counts = await reported([module('@playwright/test/cli.js'), 'test'], { file: 'e2e.json', read, env: seen });
    app.kill('SIGTERM');
    await gone;
    const left = await leftRunning([seen.BASE_URL, seen.INBOX_URL], env);
    if (left) console.error(`Still running after npm start was stopped: ${left}`);
    return left ? [counts[0], counts[1] + 1] : [counts[0] + 1, counts[1]];
  } catch (error) {
    console.error(error.message);
    return [0, 1];
  } finally {
    app.kill('SIGTERM');
    await gone;
  }
}

/** Stopping is a test too: what still answers, or the database that still runs. */
async function leftRunning(addresses, env) {
  const answers = (address) =>
    fetch(address).then(
      () => [address],
      () => [],
    );
  const answering = (await Promise.all(addresses.map(answers))).flat();
  const database = (await run(['scripts/postgres.mjs', 'status'], env)) === 0 ? ['PostgreSQL'] : [];
  return [...answering, ...database].join(', ');
}

/** Resolves with what npm start printed when it says how to stop it: its last line. */
const untilStarted = (app) =>
  new Promise((resolve, reject) => {
    let said = '';
    app.stdout.on('data', (chunk) => {
      process.stdout.write(chunk);
      said += chunk;
      if (/^Stop /m.test(said)) resolve(said);
    });
    app.once('exit', (status) => reject(new Error(`npm start ended (${status})`)));
  });

/** What a runner that was cut off left: its children, and the database when nobody else uses it. */
async function cutOff() {
  await stopAll();
  if (postgres.isRunning()) await postgres.release();
  process.exit(1);
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void cutOff());

async function main(chosen) {
  const unknown = chosen.filter((name) => !(name in runners));
  if (unknown.length > 0)
    throw new Error(`No runner ${unknown.join(', ')}: there are ${Object.keys(runners).join(', ')}.`);
  const wanted = Object.entries(runners).filter(([name]) => chosen.length === 0 || chosen.includes(name));
  await step('Debian packages', (note) => ensure([...new Set(wanted.flatMap(([, { needs }]) => needs))], note));
  await step('Packages', install);
  fs.mkdirSync(build, { recursive: true });
  let [passed, failed] = [0, 0];
  for (const [name, runner] of wanted) {
    const began = performance.now();
    const [more, less] = await runner.run();
    console.log(`${name}: ${more} passed, ${less} failed, ${Math.round((performance.now() - began) / 1000)} s\n`);
    [passed, failed] = [passed + more, failed + less];
  }
  console.log(`${passed} passed, ${failed} failed`);
  process.exitCode = failed ? 1 : 0;
}

main(process.argv.slice(2)).catch((error) => {
  console.error(error.message);
  console.log('0 passed, 1 failed');
  process.exitCode = 1;
});
