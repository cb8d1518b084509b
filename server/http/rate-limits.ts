import { type Pool } from 'pg';
import {
  type RateLimiterAbstract,
  RateLimiterMemory,
  RateLimiterPostgres,
  RateLimiterRes,
} from 'rate-limiter-flexible';
import { Problem } from './problem';

export interface Allowance {
  /** Of what is counted; part of the stored key. */
  readonly name: string;
  readonly points: number;
  readonly windowSec: number;
}

/** Counts in PostgreSQL for all processes together; in memory alone while the database is away. */
export function openLimiter(pool: Pool, { name, points, windowSec }: Allowance): RateLimiterAbstract {
  const counted = { keyPrefix: name, points, duration: windowSec };
  return new RateLimiterPostgres({
    ...counted,
    storeClient: pool,
    tableName: 'rate_limits',
    tableCreated: true,
    insuranceLimiter: new RateLimiterMemory(counted),
  });
}

/**
 * Counts one try.
 *
 * @param what as a sentence begins, such as "Signing in was tried"
 * @throws Problem 429 with Retry-After
 */
export async function countTry(limiter: RateLimiterAbstract, key: string, what: string): Promise<void> {
  try {
    await limiter.consume(key);
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    const waitSec = Math.max(1, Math.ceil(refusal.msBeforeNext / 1000));
    const minutes = Math.ceil(waitSec / 60);
    throw new Problem(
      429,
      'too-many-tries',
      'Too many tries',
      `${what} too often. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, then try again. Nothing was changed.`,
      {},
      { 'Retry-After': String(waitSec) },
    );
  }
}
