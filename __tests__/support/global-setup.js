const { execFileSync } = require('node:child_process');
const { createHash } = require('node:crypto');
const fs = require('node:fs');
const path = require('node:path');
const { Client } = require('pg');

const root = path.resolve(__dirname, '../..');
const at = (base, name) => Object.assign(new URL(base), { pathname: `/${name}` }).href;

/** Starts PostgreSQL, migrates a template once for each state of the schema, clones it for this run. */
module.exports = async function globalSetup() {
  const postgres = await import('../../scripts/postgres.mjs');
  const { url, ownerUrl } = await postgres.start();
  const database = `test_${process.pid}`;
  globalThis.testDatabase = { ownerUrl, database, release: postgres.release };
  try {
    process.env.TEMPLATE_DATABASE = await clone(ownerUrl, database);
  } catch (error) {
    await postgres.release();
    throw error;
  }
  Object.assign(process.env, { DATABASE_URL: at(url, database), OWNER_DATABASE_URL: at(ownerUrl, database) });
};

async function clone(ownerUrl, database) {
  const template = `template_${hashOfSchema()}`;
  const owner = new Client({ connectionString: ownerUrl });
  await owner.connect();
  await owner.query('select pg_advisory_lock(7)'); // two runs in one checkout
  await dropLeftovers(owner);
  const { rowCount } = await owner.query('select 1 from pg_database where datname = $1', [template]);
  if (rowCount === 0) await makeTemplate(owner, template, ownerUrl);
  await owner.query(`create database ${database} template ${template}`);
  await owner.end();
  return template;
}

/** Databases of runs that were killed. */
async function dropLeftovers(owner) {
  const { rows } = await owner.query("select datname from pg_database where datname ~ '^test_[0-9]+(_[0-9a-f]+)?$'");
  for (const { datname } of rows) {
    if (!fs.existsSync(`/proc/${datname.split('_')[1]}`))
      await owner.query(`drop database if exists ${datname} with (force)`);
  }
}

async function makeTemplate(owner, template, ownerUrl) {
  const old = await owner.query("select datname from pg_database where datname ~ '^template_[0-9a-f]{12}'");
  for (const { datname } of old.rows) await owner.query(`drop database ${datname} with (force)`);
  await owner.query(`create database ${template}_half`);
  const env = { ...process.env, OWNER_DATABASE_URL: at(ownerUrl, `${template}_half`) };
  execFileSync(process.execPath, ['--import', 'tsx', 'scripts/migrate.ts'], { cwd: root, stdio: 'inherit', env });
  await owner.query(`alter database ${template}_half rename to ${template}`);
}

function hashOfSchema() {
  const hash = createHash('sha256');
  const files = ['migrations', '.'].flatMap((folder) => {
    const names = fs.readdirSync(path.join(root, 'db', folder)).sort();
    return names.filter((name) => name.endsWith('.ts')).map((name) => path.join(root, 'db', folder, name));
  });
  for (const file of files) hash.update(path.basename(file)).update(fs.readFileSync(file));
  return hash.digest('hex').slice(0, 12);
}
