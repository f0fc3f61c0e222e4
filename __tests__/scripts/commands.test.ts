import { execFile, spawn } from 'node:child_process';
import { createHash, randomUUID } from 'node:crypto';
import fs from 'node:fs';
import net from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';

import { ownDatabase } from '../support/own-database';
import { connect } from '@/db/connection';

const root = path.resolve(__dirname, '../..');
const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'thickset-state-'));
// the database's own user must be able to enter it
fs.chmodSync(folder, 0o755);
afterAll(() => fs.rmSync(folder, { recursive: true }));

type Ended = { code: number; stdout: string; stderr: string };
/** Runs a command to its end, whatever that is. */
async function run(args: string[], env: Record<string, string> = {}): Promise<Ended> {
  const all: NodeJS.ProcessEnv = {
    ...process.env,
    NODE_ENV: 'production',
    THICKSET_STATE: folder,
    PORT: '',
    PG_PORT: '',
    ...env,
  };
  const ended = promisify(execFile)(process.execPath, args, { cwd: root, env: all, timeout: 60_000 });
  return ended.then(
    (output) => ({ code: 0, ...output }),
    (error: Ended) => error,
  );
}

const busyPort = () =>
  new Promise<net.Server>((resolve) => {
    const server = net.createServer().listen(0, '127.0.0.1', () => resolve(server));
  });
function portOf(server: net.Server): number {
  const address = server.address();
  return address && typeof address === 'object' ? address.port : 0;
}

describe('npm start', () => {
  it.each([
    [{ PORT: 'eighty' }, 'PORT must be a port, 1 to 65535.'],
    [{ PORT: '70000' }, 'PORT must be a port, 1 to 65535.'],
    [
      { THICKSET_STATE: '/dev/null/state' },
      'The data folder /dev/null/state cannot be used (ENOTDIR): choose another with THICKSET_STATE.',
    ],
  ])('with %j says what is wrong in one sentence, and ends', async (env, sentence) => {
    const { code, stderr } = await run(['scripts/start.mjs'], env);
    expect({ code, stderr }).toEqual({ code: 1, stderr: `${sentence}\n` });
  });

  it.each(['PORT', 'PG_PORT'])(
    'says so when its %s is in use',
    async (variable) => {
      const server = await busyPort();
      const port = portOf(server);
      const { code, stderr } = await run(['scripts/start.mjs'], { [variable]: String(port) });
      server.close();
      const sentence = `Port ${port} is in use: stop what listens there, or choose another with ${variable}.\n`;
      expect({ code, stderr }).toEqual({ code: 1, stderr: sentence });
    },
    60_000,
  );
});

describe('the server', () => {
  it('says in one sentence which configuration it refuses', async () => {
    const environment = {
      SESSION_SECRET: 'sixteen letters!',
      HOST: '0.0.0.0',
      SECURE_COOKIES: 'on',
      PUBLIC_URL: 'https://a.example',
    };
    const refused = await run(['--import', 'tsx', 'api/server.ts'], environment);
    expect(refused.code).toBe(1);
    expect(refused.stderr).toMatch(
      /^SESSION_SECRET must have at least 32 random characters while HOST is 0\.0\.0\.0.*\.\n$/,
    );
  }, 30_000);
});

describe('the server, asked to stop', () => {
  const environment = { SESSION_SECRET: 'sixteen letters!', LOG_LEVEL: 'silent' };

  /** A server on the tests' database, ready to answer. */
  async function serving(port: number) {
    const env: NodeJS.ProcessEnv = { ...process.env, ...environment, NODE_ENV: 'production', PORT: String(port) };
    const child = spawn(process.execPath, ['--import', 'tsx', 'api/server.ts'], {
      cwd: root,
      env,
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    });
    const ended = new Promise<number | null>((resolve) => child.once('exit', resolve));
    const url = `http://127.0.0.1:${port}/api`;
    for (let tries = 0; tries < 300; tries += 1) {
      if ((await fetch(`${url}/ready`).catch(() => undefined))?.ok) break;
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    return { child, ended, url };
  }

  /** Resolves when the try has been counted. */
  async function counted(email: string) {
    const owner = connect(process.env.OWNER_DATABASE_URL ?? '', 1);
    const key = `sign-in ${createHash('sha256').update(email).digest('hex')}`;
    for (let tries = 0; tries < 500 && !(await owner('tries').where({ key }).first()); tries += 1);
    await owner.destroy();
  }

  async function freePort() {
    const server = await busyPort();
    const port = portOf(server);
    await new Promise((resolve) => server.close(resolve));
    return port;
  }

  it('finishes the request that it is working on, then ends by itself', async () => {
    const { child, ended, url } = await serving(await freePort());
    const email = `${randomUUID()}@nowhere.example`;
    const running = fetch(`${url}/session`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'X-Thickset': '1' },
      body: JSON.stringify({ email, password: 'compared with a hash of cost 12' }),
    });
    await counted(email); // and now it compares the password
    child.kill('SIGTERM');
    expect((await running).status).toBe(401);
    expect(await ended).toBe(0);
    await expect(fetch(`${url}/health`)).rejects.toThrow();
  }, 60_000);

  it('or left alone by whoever started it, ends too; and a port in use is one sentence', async () => {
    const port = await freePort();
    const { child, ended } = await serving(port);
    const second = await run(['--import', 'tsx', 'api/server.ts'], { ...environment, PORT: String(port) });
    expect(second.stderr).toBe(`Port ${port} is in use: choose another with PORT.\n`);
    expect(second.code).toBe(1);
    child.disconnect();
    expect(await ended).toBe(0);
  }, 60_000);
});

describe('npm run reset', () => {
  const state = path.join(folder, 'reset');
  const answer = (words: string) =>
    new Promise<string>((resolve) => {
      const child = spawn(process.execPath, ['scripts/reset.mjs'], {
        cwd: root,
        env: { ...process.env, THICKSET_STATE: state },
      });
      let said = '';
      child.stdout.on('data', (chunk) => (said += chunk));
      child.on('close', () => resolve(said));
      child.stdin.end(words);
    });
  beforeEach(() => {
    fs.mkdirSync(path.join(state, 'mail', 'new'), { recursive: true });
    for (const name of ['session.secret', 'web.port', 'somebody-elses.txt'])
      fs.writeFileSync(path.join(state, name), '1');
  });

  it.each(['no\n', '\n', '', 'y\n', 'YES please\n'])('keeps everything at %j', async (words) => {
    expect(await answer(words)).toContain('Nothing was deleted');
    expect(fs.readdirSync(state).sort()).toEqual(['mail', 'session.secret', 'somebody-elses.txt', 'web.port']);
  });

  it('deletes at yes what Thickset put there, and nothing else', async () => {
    expect(await answer('yes\n')).toContain('Deleted');
    expect(fs.readdirSync(state)).toEqual(['somebody-elses.txt']);
  });
});

describe('migrations', () => {
  it('leave a database of a newer Thickset alone, and say what to do', async () => {
    const database = await ownDatabase();
    const owner = connect(database.ownerUrl, 1);
    await owner('knex_migrations').insert({
      name: '20991231000000_of_tomorrow.ts',
      batch: 99,
      migration_time: new Date(),
    });
    await owner.destroy();
    const { code, stderr } = await run(['--import', 'tsx', 'scripts/migrate.ts'], {
      OWNER_DATABASE_URL: database.ownerUrl,
    });
    await database.drop();
    expect({ code, stderr }).toEqual({
      code: 1,
      stderr:
        'This database was migrated by a newer Thickset: update this checkout, or empty the database with npm run reset.\n',
    });
  }, 60_000);

  it('go all the way back and forth again', async () => {
    const database = await ownDatabase();
    const knex = ['--import', 'tsx', 'node_modules/knex/bin/cli.js', '--knexfile', 'knexfile.ts'];
    const env = { OWNER_DATABASE_URL: database.ownerUrl };
    const back = await run([...knex, 'migrate:rollback', '--all'], env);
    expect(back).toMatchObject({ code: 0 });
    const owner = connect(database.ownerUrl, 1);
    const { rows } = await owner.raw(
      "select relname from pg_class where relkind in ('r', 'v') and relnamespace = 'public'::regnamespace order by 1",
    );
    expect(rows.map(({ relname }: { relname: string }) => relname)).toEqual([
      'knex_migrations',
      'knex_migrations_lock',
    ]);
    expect(await run(['--import', 'tsx', 'scripts/migrate.ts'], env)).toMatchObject({ code: 0 });
    await owner.destroy();
    await database.drop();
  }, 60_000);
});
