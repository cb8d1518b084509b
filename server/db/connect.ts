import knex, { type Knex } from 'knex';
import pg from 'pg';

/** A request that waits longer than this for a connection is told to come back. */
const ACQUIRE_TIMEOUT_MS = 5000;
const STATEMENT_TIMEOUT_MS = 20_000;

/** A calendar day stays the text it is; the driver would make it midnight in the server's own time zone. */
pg.types.setTypeParser(pg.types.builtins.DATE, day => day);

/**
 * Opens a pool; nothing is connected until the first query, so a database that is away does not stop a start.
 *
 * @param note takes what Knex would print; a failed query is told by its own error
 */
export function connect(
  databaseUrl: string,
  mostConnections: number,
  note: (words: string) => void = () => undefined,
): Knex {
  return knex({
    client: 'pg',
    connection: {
      connectionString: databaseUrl,
      connectionTimeoutMillis: ACQUIRE_TIMEOUT_MS,
      statement_timeout: STATEMENT_TIMEOUT_MS,
      application_name: 'fairlead',
    },
    pool: { min: 0, max: mostConnections },
    acquireConnectionTimeout: ACQUIRE_TIMEOUT_MS,
    log: { warn: note, error: note, deprecate: note, debug: note },
  });
}
