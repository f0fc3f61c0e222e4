// The web app in dist/: fonts, export, compressed copies. Only when a hash of its sources changed.
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import zlib from 'node:zlib';

import { root, run } from '../processes.mjs';

const dist = path.join(root, 'dist');
const build = path.join(root, 'build');
const sources = [
  'app',
  'components',
  'hooks',
  'api/contracts',
  'api/engine',
  'api/geometry',
  'assets',
  'public',
  'scripts/web',
  'app.json',
  'babel.config.js',
  'metro.config.js',
  'package-lock.json',
  'tsconfig.json',
];

function filesOf(name) {
  const full = path.join(root, name);
  if (!fs.existsSync(full)) return [];
  if (!fs.statSync(full).isDirectory()) return [name];
  return fs
    .readdirSync(full)
    .sort()
    .flatMap((child) => filesOf(path.join(name, child)));
}

function hashOfSources() {
  const hash = createHash('sha256');
  const files = sources.flatMap(filesOf).filter((name) => !name.endsWith('.woff2'));
  for (const file of files) hash.update(`${file}\0`).update(fs.readFileSync(path.join(root, file)));
  return hash.digest('hex');
}

/** The server sends these to whoever takes them, so that it never compresses while someone waits. */
function compress(folder) {
  for (const file of fs.readdirSync(folder, { recursive: true, encoding: 'utf8' })) {
    if (!/\.(js|css|html|json|svg|ttf|map|webmanifest)$/.test(file)) continue;
    const bytes = fs.readFileSync(path.join(folder, file));
    const quality = { params: { [zlib.constants.BROTLI_PARAM_QUALITY]: 9 } };
    fs.writeFileSync(path.join(folder, `${file}.gz`), zlib.gzipSync(bytes, { level: 9 }));
    fs.writeFileSync(path.join(folder, `${file}.br`), zlib.brotliCompressSync(bytes, quality));
  }
}

/** What an export that was cut off, or this process before, left behind. */
function clearUnfinished() {
  for (const name of fs.existsSync(build) ? fs.readdirSync(build) : []) {
    const pid = /^web-(\d+)$/.exec(name)?.[1];
    const isWorking = pid !== String(process.pid) && fs.existsSync(`/proc/${pid}`);
    if (pid && !isWorking) fs.rmSync(path.join(build, name), { recursive: true, force: true });
  }
}

/** Exports beside the last build and takes its place when all is there: a running server keeps a whole app. */
export async function buildWeb(note = () => {}) {
  const stamp = path.join(dist, '.hash');
  const wanted = hashOfSources();
  if (fs.existsSync(stamp) && fs.readFileSync(stamp, 'utf8') === wanted) return;
  note('exporting, about a minute, at each change');
  const { makeFonts } = await import('./fonts.mjs'); // a package, there only after the installation
  await makeFonts();
  clearUnfinished();
  const fresh = path.join(build, `web-${process.pid}`);
  const env = { ...process.env, NODE_ENV: 'production', CI: '1', EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1' };
  const exported = ['export', '--platform', 'web', '--output-dir', path.relative(root, fresh)];
  await run(process.execPath, ['node_modules/expo/bin/cli', ...exported], env);
  compress(fresh);
  fs.writeFileSync(path.join(fresh, '.hash'), wanted);
  fs.rmSync(dist, { recursive: true, force: true });
  fs.renameSync(fresh, dist);
}
