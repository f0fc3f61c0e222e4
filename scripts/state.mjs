// This checkout's own folder: database, mail, secrets, ports. Plain Node, no packages.
import { spawnSync } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import fs from 'node:fs';
import net from 'node:net';
import path from 'node:path';

import { isRoot } from './debian.mjs';
import { root } from './processes.mjs';

const key = (text) => createHash('sha256').update(text).digest('hex').slice(0, 12);

/** PostgreSQL refuses to run as root, so root runs it as the package's own user, who must be able to enter the folder. */
export function asServer(program, args, options = {}) {
  const command = isRoot ? 'runuser' : program;
  const all = isRoot ? ['-u', 'postgres', '--', 'env', '-C', '/', program, ...args] : args;
  return spawnSync(command, all, { encoding: 'utf8', ...options });
}

let folder;

/** Where the state is: THICKSET_STATE, else .data in the checkout, else below /var/lib when the server cannot enter that. */
export function stateFolder() {
  folder ??= chooseFolder();
  return folder;
}

function chooseFolder() {
  if (process.env.THICKSET_STATE) return path.resolve(process.env.THICKSET_STATE);
  if (!isRoot || asServer('test', ['-x', root]).status === 0) return path.join(root, '.data');
  return path.join('/var/lib', `thickset-${key(root)}`);
}

/** A Unix socket's path may have 107 bytes at most. */
export function socketFolder(cluster) {
  return cluster.length <= 80 ? path.join(cluster, 'run') : path.join('/tmp', `thickset-${key(cluster)}`);
}

/** Makes the folder, or says in one sentence why it cannot be used. */
export function openState() {
  const state = stateFolder();
  try {
    fs.mkdirSync(state, { recursive: true, mode: 0o755 });
    fs.accessSync(state, fs.constants.R_OK | fs.constants.W_OK | fs.constants.X_OK);
  } catch (error) {
    throw new Error(`The data folder ${state} cannot be used (${error.code}): choose another with THICKSET_STATE.`);
  }
  if (isRoot && asServer('test', ['-x', state]).status !== 0) {
    throw new Error(
      `The data folder ${state} cannot be entered by the system user postgres: choose another with THICKSET_STATE.`,
    );
  }
  return state;
}

/** A port given in the environment, which must be free; else the stored one if still free; else a new one, stored. */
export async function choosePort(name, { variable, from = 0 } = {}) {
  const given = variable && process.env[variable];
  if (given) return givenPort(variable, given);
  const file = path.join(stateFolder(), `${name}.port`);
  const stored = fs.existsSync(file) ? Number(fs.readFileSync(file, 'utf8')) : 0;
  if (stored && (await isFree(stored))) return stored;
  const port = await nextFree(from);
  fs.writeFileSync(file, String(port));
  return port;
}

async function givenPort(variable, given) {
  const port = Number(given);
  if (!Number.isInteger(port) || port < 1 || port > 65535) throw new Error(`${variable} must be a port, 1 to 65535.`);
  if (await isFree(port)) return port;
  throw new Error(`Port ${port} is in use: stop what listens there, or choose another with ${variable}.`);
}

async function nextFree(from) {
  if (from === 0) return freePort();
  for (let port = from; port < from + 200; port += 1) if (await isFree(port)) return port;
  throw new Error(`No port from ${from} to ${from + 199} is free.`);
}

const isFree = (port) =>
  listen(port).then(
    () => true,
    () => false,
  );

export const freePort = () => listen(0);

const listen = (wanted) =>
  new Promise((resolve, reject) => {
    const server = net.createServer().once('error', reject);
    server.listen(wanted, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });

/** A secret of this checkout, made once, readable by its owner only. */
export function secret(name) {
  const file = path.join(stateFolder(), `${name}.secret`);
  if (!fs.existsSync(file)) fs.writeFileSync(file, randomBytes(24).toString('hex'), { mode: 0o600 });
  return fs.readFileSync(file, 'utf8');
}

/** One process at a time; a lock whose holder died is taken over. */
export async function alone(work) {
  const lock = path.join(stateFolder(), 'lock');
  while (!take(lock)) {
    const holder = fs.existsSync(lock) ? fs.readFileSync(lock, 'utf8') : '';
    if (holder && !fs.existsSync(`/proc/${holder}`)) fs.rmSync(lock, { force: true });
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  try {
    return await work();
  } finally {
    fs.rmSync(lock, { force: true });
  }
}

function take(lock) {
  try {
    fs.writeFileSync(lock, String(process.pid), { flag: 'wx' });
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  }
}
