import { createHash } from 'node:crypto';
import { type Pool } from 'pg';
import { type RateLimiterAbstract } from 'rate-limiter-flexible';
import { countTry, openLimiter } from '../http/rate-limits';

const WINDOW_SEC = 15 * 60;
const WHAT = 'Signing in was tried';

/** Wrong passwords within the window: a forgetful person's few, and those of a whole office behind one address. */
export interface SignInAllowance {
  readonly ofAccountAndAddress: number;
  readonly ofAddress: number;
}
export const USUAL_SIGN_INS: SignInAllowance = { ofAccountAndAddress: 10, ofAddress: 100 };

/** Counts tries at signing in. */
export class SignInLimits {
  readonly #pair: RateLimiterAbstract;
  readonly #address: RateLimiterAbstract;

  constructor(pool: Pool, { ofAccountAndAddress, ofAddress }: SignInAllowance) {
    this.#pair = openLimiter(pool, {
      name: 'sign-in-pair',
      points: ofAccountAndAddress,
      windowSec: WINDOW_SEC,
    });
    this.#address = openLimiter(pool, { name: 'sign-in-address', points: ofAddress, windowSec: WINDOW_SEC });
  }

  /**
   * Counts a try, before the password is looked at: many at once cannot slip through.
   *
   * @throws Problem 429 with Retry-After
   */
  async begin(email: string, address: string): Promise<void> {
    await countTry(this.#address, address, WHAT);
    await countTry(this.#pair, pairKey(email, address), WHAT);
  }

  /** The password was right: this try and the wrong ones before it no longer count. */
  async succeed(email: string, address: string): Promise<void> {
    await this.#pair.delete(pairKey(email, address));
    await this.#address.reward(address, 1);
  }
}

/** Hashed: the table shall not become a list of who tried to sign in. */
function pairKey(email: string, address: string): string {
  return createHash('sha256').update(`${email.toLowerCase()}\n${address}`).digest('base64url');
}
