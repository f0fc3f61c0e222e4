import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';

import { root, run } from './processes.mjs';

/** npm ci, only when the lockfile (or Node) is not the one of the last installation. Plain Node, no packages. */
export async function install(note = () => {}) {
  const stamp = path.join(root, 'node_modules', '.installed');
  const lockfile = fs.readFileSync(path.join(root, 'package-lock.json'));
  const wanted = createHash('sha256').update(lockfile).update(process.version).digest('hex');
  if (fs.existsSync(stamp) && fs.readFileSync(stamp, 'utf8') === wanted) return;
  note('installing, about two minutes, once');
  const env = { ...process.env, NODE_ENV: 'development', PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: '1' };
  await run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], env);
  fs.writeFileSync(stamp, wanted);
}
