// The types of the routes (made by Expo, offline), then the compiler.
import { spawnSync } from 'node:child_process';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '..');
const env = { ...process.env, CI: '1', EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1' };

function node(...args) {
  const { status } = spawnSync(process.execPath, args, { cwd: root, stdio: 'inherit', env });
  if (status !== 0) process.exit(status ?? 1);
}

node('node_modules/expo/bin/cli', 'customize', 'tsconfig.json');
node('node_modules/typescript/bin/tsc', '--noEmit');
