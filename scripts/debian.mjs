// What must come from Debian. Plain Node, no packages.
import fs from 'node:fs';
import path from 'node:path';

import { run } from './processes.mjs';

export const isRoot = process.getuid() === 0;

/** Folders with a PostgreSQL server's programs, newest first. */
export function postgresVersions() {
  const base = '/usr/lib/postgresql';
  return (fs.existsSync(base) ? fs.readdirSync(base) : [])
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => ({ version, bin: path.join(base, version, 'bin') }))
    .filter(({ bin }) => fs.existsSync(path.join(bin, 'initdb')));
}

const isThere = {
  postgresql: () => postgresVersions().length > 0,
  chromium: () => fs.existsSync('/usr/bin/chromium'),
  'poppler-utils': () => fs.existsSync('/usr/bin/pdftotext'),
};

/** Installs what is missing as root; anyone else is told the command. */
export async function ensure(names, note = () => {}) {
  const missing = names.filter((name) => !isThere[name]());
  if (missing.length === 0) return;
  const command = `apt-get install -y --no-install-recommends ${missing.join(' ')}`;
  if (!isRoot) throw new Error(`Not installed: ${missing.join(', ')}. Run: sudo ${command}`);
  note(`installing ${missing.join(', ')}`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  await run('apt-get', ['update', '-qq'], env);
  await run('apt-get', ['-qq', ...command.split(' ').slice(1)], env);
}
