// npm start: everything a fresh machine needs, then server and worker until a signal. --dev: Metro and a watching server.
import path from 'node:path';

import { ensure } from './debian.mjs';
import { install } from './install.mjs';
import * as postgres from './postgres.mjs';
import { keep, root, run, stopAll } from './processes.mjs';
import { choosePort, openState, secret } from './state.mjs';
import { step } from './steps.mjs';

const dev = process.argv.includes('--dev');
const demoPassword = process.env.DEMO_PASSWORD || 'plant-room-demo';
let ending = false;
let usesDatabase = false;

// Before anything is started: a signal during set-up stops what is there by then.
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0));

async function end(code) {
  if (ending) return;
  ending = true;
  await stopAll();
  if (usesDatabase) await postgres.release();
  process.exit(code);
}

/** A part that ends by itself takes the rest with it: it has said why. */
const part = (name, args, env) =>
  keep(args, env, (code) => {
    if (ending) return;
    console.error(`The ${name} ended (${code}), so everything stops.`);
    void end(1);
  });

const script = (file, env) => run(process.execPath, ['--import', 'tsx', file], env);

async function main() {
  await step('Packages', install);
  const ports = await step('PostgreSQL', async (note) => {
    await ensure(['postgresql'], note);
    openState();
    const chosen = await choosePorts();
    usesDatabase = true;
    return { ...chosen, database: await postgres.start() };
  });
  const env = environment(ports);
  await step('Tables', () => script('scripts/migrate.ts', { ...env, OWNER_DATABASE_URL: ports.database.ownerUrl }));
  if (!dev) await step('Web app', async (note) => (await import('./web/build.mjs')).buildWeb(note));
  if (ports.smtp) await step('Mail', () => startMail(ports, env));
  await step('Server and worker', () => startServers(ports, env));
  const people = env.DEMO === 'on' ? await step('Demo', () => loadDemo(env)) : '';
  sayWhere(ports, people.trim().split('\n').filter(Boolean));
}

async function choosePorts() {
  const web = await choosePort('web', { variable: 'PORT', from: 4000 });
  const api = dev ? await choosePort('api') : web;
  const ownMail = !process.env.SMTP_URL && !process.env.SMTP_HOST;
  if (!ownMail) return { web, api };
  return { web, api, smtp: await choosePort('smtp'), inbox: await choosePort('inbox') };
}

function environment({ web, api, smtp, database }) {
  return {
    SESSION_SECRET: secret('session'),
    PUBLIC_URL: `http://localhost:${web}`,
    DEMO: 'on',
    LOG_LEVEL: 'warn',
    ...process.env,
    NODE_ENV: dev ? 'development' : 'production',
    DATABASE_URL: database.url,
    DEMO_PASSWORD: demoPassword,
    PORT: String(api),
    WEB_FOLDER: dev ? '' : path.join(root, 'dist'),
    ...(smtp && { SMTP_URL: `smtp://127.0.0.1:${smtp}` }),
  };
}

const startMail = ({ smtp, inbox }, env) =>
  new Promise((resolve) =>
    part('mail server', ['scripts/mail.mjs', String(smtp), String(inbox)], env).once('message', resolve),
  );

async function startServers({ web, api }, env) {
  const how = [...(dev ? ['--watch', '--watch-preserve-output'] : []), '--import', 'tsx', '--enable-source-maps'];
  part('server', [...how, 'api/server.ts'], env);
  part('worker', [...how, 'api/worker.ts'], env);
  await ready(api);
  if (!dev) return;
  const metro = ['node_modules/expo/bin/cli', 'start', '--web', '--port', String(web)];
  const { CI: _ci, ...local } = env;
  const offline = { BROWSER: 'none', API_PORT: String(api), EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1' };
  part('web app', metro, { ...local, ...offline });
  await ready(web);
}

/** A demo that cannot be loaded is said, and no reason to stop what runs. */
const loadDemo = (env) =>
  script('scripts/seed.ts', env).catch((error) => {
    if (!ending) console.error(`\nThe demo is not complete: ${error.message}`);
    return error.stdout ?? '';
  });

async function ready(port) {
  for (let attempt = 0; attempt < 600 && !ending; attempt += 1) {
    const answer = await fetch(`http://127.0.0.1:${port}/api/ready`).catch(() => undefined);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  if (!ending) throw new Error('The server did not answer within a minute.');
}

function sayWhere({ web, inbox }, people) {
  if (ending) return;
  const lines = [
    ['Thickset', `http://localhost:${web}`],
    ...(inbox ? [['Inbox', `http://localhost:${inbox}  (what is mailed on this machine)`]] : []),
    ...people.map((person, index) => [index === 0 ? 'Sign in as' : '', person]),
    ...(people.length > 0 ? [['Password', `${demoPassword}  (the same for all of them)`]] : []),
    ['Stop', 'Ctrl-C'],
  ];
  console.log(`\n${lines.map(([name, value]) => name.padEnd(20) + value).join('\n')}`);
}

main().catch((error) => {
  if (ending) return;
  console.error(error.message);
  void end(1);
});
