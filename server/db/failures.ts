import { codeOf, messageOf } from '../error-parts';

/** What a failed query says about the database itself, not about the query. */
export type DatabaseFailure = 'away' | 'full' | 'unstorable-text';

/** @see https://www.postgresql.org/docs/current/errcodes-appendix.html and Node's system errors */
const AWAY = /^(08|57P0[1-3]|53300|ECONNREFUSED|ECONNRESET|ETIMEDOUT|EPIPE|ENOTFOUND|EHOSTUNREACH|EAI_AGAIN)/;

/** Errors of pg and of Knex' pool that carry no code. */
const AWAY_WORDS =
  /Connection terminated|timeout exceeded when trying to connect|Timeout acquiring a connection|Client has encountered a connection error/;

/** @returns what is wrong with the database, or undefined where the error is not about it */
export function databaseFailure(error: unknown): DatabaseFailure | undefined {
  const code = codeOf(error);
  if (code === '53100') return 'full';
  if (code === '22P05' || code === '22021' || code === '22P02') return 'unstorable-text';
  if (AWAY.test(code)) return 'away';
  return code === '' && AWAY_WORDS.test(messageOf(error)) ? 'away' : undefined;
}
