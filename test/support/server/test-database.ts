import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { connect } from '../../../server/db/connect';
import { migrate } from '../../../server/db/migrations';

/** Two Jest workers make the template once between them. */
const TEMPLATE_LOCK = 4_180_311;

/** A database of a test file's own, cloned from a migrated template. */
export interface TestDatabase {
  readonly url: string;
  drop(): Promise<void>;
}

/** Address of the throw-away cluster's administration database. */
function adminUrl(): string {
  const url = process.env['TEST_DATABASE_URL'];
  if (!url) throw new Error('Set TEST_DATABASE_URL: node scripts/database.mjs test prints it');
  return url;
}

const urlOf = (name: string) => adminUrl().replace(/\/[^/]*$/, `/${name}`);

/** One template for each Jest run: Jest's workers are children of one process. */
const TEMPLATE = `fairlead_template_${process.ppid}`;

async function withAdmin<T>(work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: adminUrl() });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

export async function makeDatabase(): Promise<TestDatabase> {
  const name = `fairlead_${process.pid}_${randomBytes(4).toString('hex')}`;
  await withAdmin(async admin => {
    await admin.query('select pg_advisory_lock($1)', [TEMPLATE_LOCK]);
    await makeTemplate(admin);
    await admin.query(`create database ${name} template ${TEMPLATE}`);
  });
  return { url: urlOf(name), drop: () => dropDatabase(name) };
}

async function makeTemplate(admin: pg.Client): Promise<void> {
  const { rowCount } = await admin.query('select 1 from pg_database where datname = $1', [TEMPLATE]);
  if (rowCount) return;
  // Earlier runs' templates: nobody else can be cloning them while this lock is held.
  const old = await admin.query<{ datname: string }>(
    "select datname from pg_database where datname like 'fairlead_template_%'",
  );
  for (const { datname } of old.rows) await admin.query(`drop database if exists ${datname} with (force)`);
  await admin.query(`create database ${TEMPLATE}_new`);
  const db = connect(urlOf(`${TEMPLATE}_new`), 1);
  await migrate(db);
  await db.destroy();
  await admin.query(`alter database ${TEMPLATE}_new rename to ${TEMPLATE}`);
}

async function dropDatabase(name: string): Promise<void> {
  await withAdmin(admin => admin.query(`drop database if exists ${name} with (force)`));
}
