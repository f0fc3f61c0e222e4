// Children of this process: all end with it. Plain Node, no packages.
import { spawn } from 'node:child_process';
import path from 'node:path';

export const root = path.resolve(import.meta.dirname, '..');
const children = new Set();

/** Starts a program in the checkout's root; it is stopped with this process. */
export function launch(program, args, options) {
  const child = spawn(program, args, { cwd: root, ...options });
  children.add(child);
  for (const event of ['exit', 'error']) child.once(event, () => children.delete(child));
  return child;
}

/** Runs a program to its end without blocking signals; gives its exit code. */
export const code = (program, args, env = process.env) =>
  new Promise((resolve, reject) => {
    launch(program, args, { env, stdio: ['ignore', 'inherit', 'inherit'] })
      .once('error', reject)
      .once('exit', (status) => resolve(status ?? 1));
  });

/** Runs a program quietly and gives what it printed; when it fails, what it printed is the error. */
export const run = (program, args, env = process.env) =>
  new Promise((resolve, reject) => {
    const said = { stdout: '', stderr: '' };
    const child = launch(program, args, { env, stdio: ['ignore', 'pipe', 'pipe'] });
    for (const stream of ['stdout', 'stderr']) child[stream].on('data', (chunk) => (said[stream] += chunk));
    child.once('error', reject);
    child.once('close', (status) => {
      if (status === 0) return resolve(said.stdout);
      const words = (said.stderr.trim() || said.stdout.trim()).slice(-4000);
      const error = new Error(words || `${path.basename(program)} ${args.join(' ')} failed (${status})`);
      reject(Object.assign(error, { stdout: said.stdout }));
    });
  });

/** A program that must live as long as this one; its IPC channel tells it when we are gone, however we went. */
export const keep = (args, env, ended) =>
  launch(process.execPath, args, { env, stdio: ['ignore', 'inherit', 'inherit', 'ipc'] }).once('exit', ended);

/** Asks every child to stop and waits; after ten seconds it insists. */
export async function stopAll() {
  const gone = [...children].map((child) => new Promise((resolve) => child.once('exit', resolve)));
  for (const child of children) child.kill('SIGTERM');
  const late = setTimeout(() => {
    for (const child of children) child.kill('SIGKILL');
  }, 10_000);
  await Promise.all(gone);
  clearTimeout(late);
}
