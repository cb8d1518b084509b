import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import { type Request, type RequestHandler, type Response } from 'express';
import { Problem } from './problem';

const COOKIE = 'XSRF-TOKEN';
const HEADER = 'x-xsrf-token';

/**
 * Lets only our own page change things. First layer: the browser's word for where a request comes from
 * (Sec-Fetch-Site, else Origin). Second: a signed token in a readable cookie that the page repeats in a header, under
 * the names that Angular's HttpClient uses; another site can neither read nor forge it. It is not bound to the session,
 * so that it stays good across signing in and out.
 */
export class WriteGuard {
  constructor(
    private readonly secret: string,
    private readonly publicOrigin: string,
  ) {}

  /** Gives the page its token, unless it has a good one. */
  issue(req: Request, res: Response): void {
    if (this.isOurs(cookieOf(req))) return;
    const nonce = randomBytes(18).toString('base64url');
    res.cookie(COOKIE, `${nonce}.${this.sign(nonce)}`, {
      path: '/',
      sameSite: 'lax',
      secure: this.publicOrigin.startsWith('https:'),
    });
  }

  /** @throws Problem 403 for a request that another site made, or that carries no token of ours */
  readonly check: RequestHandler = (req, _res, next) => {
    if (!this.comesFromOurPage(req)) {
      throw new Problem(
        403,
        'other-site',
        'Asked from another site',
        `Only pages of ${this.publicOrigin} may change things here. Nothing was changed.`,
      );
    }
    const token = req.get(HEADER);
    if (token === undefined || token !== cookieOf(req) || !this.isOurs(token)) {
      throw new Problem(
        403,
        'xsrf',
        'The page’s token is missing',
        'Send the cookie XSRF-TOKEN back in the header X-XSRF-TOKEN; GET /api/session gives one. Nothing was changed.',
      );
    }
    next();
  };

  private comesFromOurPage(req: Request): boolean {
    const site = req.get('sec-fetch-site');
    return site === undefined ? req.get('origin') === this.publicOrigin : site === 'same-origin';
  }

  private isOurs(token: string | undefined): boolean {
    const [nonce, signature] = token?.split('.') ?? [];
    if (!nonce || !signature) return false;
    const right = Buffer.from(this.sign(nonce));
    const given = Buffer.from(signature);
    return right.length === given.length && timingSafeEqual(right, given);
  }

  private sign(nonce: string): string {
    return createHmac('sha256', this.secret).update(`xsrf:${nonce}`).digest('base64url');
  }
}

function cookieOf(req: Request): string | undefined {
  const pairs = req.headers.cookie?.split(/; */) ?? [];
  return pairs.find(pair => pair.startsWith(`${COOKIE}=`))?.slice(COOKIE.length + 1);
}
