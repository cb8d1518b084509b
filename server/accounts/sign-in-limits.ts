import { createHash } from 'node:crypto';
import { type Pool } from 'pg';
import {
  type RateLimiterAbstract,
  RateLimiterMemory,
  RateLimiterPostgres,
  RateLimiterRes,
} from 'rate-limiter-flexible';
import { Problem } from '../http/problem';

const WINDOW_SEC = 15 * 60;

/** Wrong passwords within the window: a forgetful person's few, and those of a whole office behind one address. */
export interface SignInAllowance {
  readonly ofAccountAndAddress: number;
  readonly ofAddress: number;
}
export const USUAL_ALLOWANCE: SignInAllowance = { ofAccountAndAddress: 10, ofAddress: 100 };

/** Counts tries at signing in, in PostgreSQL for all processes together; by memory alone while the database is away. */
export class SignInLimits {
  readonly #pair: RateLimiterAbstract;
  readonly #address: RateLimiterAbstract;

  constructor(pool: Pool, allowance: SignInAllowance) {
    this.#pair = limiter(pool, 'sign-in-pair', allowance.ofAccountAndAddress);
    this.#address = limiter(pool, 'sign-in-address', allowance.ofAddress);
  }

  /**
   * Counts a try, before the password is looked at: many at once cannot slip through.
   *
   * @throws Problem 429 with Retry-After
   */
  async begin(email: string, address: string): Promise<void> {
    await consume(this.#address, address);
    await consume(this.#pair, pairKey(email, address));
  }

  /** The password was right: this try and the wrong ones before it no longer count. */
  async succeed(email: string, address: string): Promise<void> {
    await this.#pair.delete(pairKey(email, address));
    await this.#address.reward(address, 1);
  }
}

function limiter(pool: Pool, keyPrefix: string, points: number): RateLimiterAbstract {
  const insuranceLimiter = new RateLimiterMemory({ keyPrefix, points, duration: WINDOW_SEC });
  return new RateLimiterPostgres({
    storeClient: pool,
    tableName: 'rate_limits',
    tableCreated: true,
    keyPrefix,
    points,
    duration: WINDOW_SEC,
    insuranceLimiter,
  });
}

/** Hashed: the table shall not become a list of who tried to sign in. */
function pairKey(email: string, address: string): string {
  return createHash('sha256').update(`${email.toLowerCase()}\n${address}`).digest('base64url');
}

async function consume(limits: RateLimiterAbstract, key: string): Promise<void> {
  try {
    await limits.consume(key);
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    const waitSec = Math.max(1, Math.ceil(refusal.msBeforeNext / 1000));
    throw new Problem(
      429,
      'too-many-tries',
      'Too many tries',
      `Signing in was tried too often. Wait ${Math.ceil(waitSec / 60)} minutes, then try again.`,
      {},
      { 'Retry-After': String(waitSec) },
    );
  }
}
