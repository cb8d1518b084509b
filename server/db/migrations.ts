import { type Knex } from 'knex';
import * as accounts from '../../migrations/20261201000001_accounts';
import * as shootsAndMoves from '../../migrations/20261201000002_shoots_and_moves';

interface Migration {
  readonly name: string;
  readonly up: (knex: Knex) => Promise<void>;
  readonly down: (knex: Knex) => Promise<void>;
}

/** Every migration, oldest first. A static list: the same under tsx, Jest and in the bundle. */
const MIGRATIONS: readonly Migration[] = [
  { name: '20261201000001_accounts', ...accounts },
  { name: '20261201000002_shoots_and_moves', ...shootsAndMoves },
];

const migrationSource: Knex.MigrationSource<Migration> = {
  getMigrations: () => Promise.resolve([...MIGRATIONS]),
  getMigrationName: migration => migration.name,
  getMigration: migration => Promise.resolve(migration),
};

/** @returns the names of the migrations that were run now */
export async function migrate(db: Knex): Promise<string[]> {
  const done: unknown = await db.migrate.latest({ migrationSource });
  const names: unknown = Array.isArray(done) ? done[1] : undefined;
  return Array.isArray(names) ? names.map(String) : [];
}
