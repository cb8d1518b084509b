import { type Request } from 'express';
import { Problem, revisionMissing } from './problem';

/**
 * The revision that the client changed, from If-Match.
 *
 * @throws Problem 428 without it, 400 where it is no revision of ours
 */
export function revisionOf(req: Request): number {
  const header = req.get('if-match');
  if (header === undefined) throw revisionMissing();
  const match = /^(?:W\/)?"([1-9]\d{0,8})"$/.exec(header.trim());
  if (!match) {
    throw new Problem(
      400,
      'revision-unreadable',
      'If-Match is not a revision',
      'If-Match must be the ETag of what you changed, such as "3" with its quotes. Nothing was stored.',
    );
  }
  return Number(match[1]);
}
