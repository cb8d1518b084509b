import { type RequestHandler } from 'express';
import { type Pool } from 'pg';
import { notSignedIn } from '../http/problem';
import { countTry, openLimiter } from '../http/rate-limits';

const WINDOW_SEC = 10 * 60;

/** Pictures that one person may send within ten minutes: more than hands can, less than a script may. */
export const USUAL_UPLOADS = 120;

/** Middleware: stops a person's uploads before they are read. */
export function limitUploads(pool: Pool, points: number): RequestHandler {
  const limiter = openLimiter(pool, { name: 'upload', points, windowSec: WINDOW_SEC });
  return async (req, _res, next) => {
    if (!req.user) throw notSignedIn();
    await countTry(limiter, req.user.id, 'Pictures were sent');
    next();
  };
}
