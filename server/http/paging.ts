import { type Request } from 'express';
import { isUuid } from '../db/uuid-v7';
import { Problem } from './problem';

const USUAL_PAGE = 50;
const LARGEST_PAGE = 200;

export interface Page {
  readonly limit: number;
  /** The last id of the page before. */
  readonly after: string | undefined;
}

/**
 * `?limit=&after=` of a list.
 *
 * @throws Problem 400 naming the parameter at fault
 */
export function pageOf(req: Request): Page {
  const { limit = String(USUAL_PAGE), after } = req.query;
  const count = typeof limit === 'string' && /^\d{1,4}$/.test(limit) ? Number(limit) : 0;
  if (count < 1 || count > LARGEST_PAGE)
    throw unreadable('limit', `a whole number from 1 to ${LARGEST_PAGE}`);
  if (after !== undefined && !(typeof after === 'string' && isUuid(after))) {
    throw unreadable('after', 'the `next` of the page before');
  }
  return { limit: count, after };
}

function unreadable(parameter: string, wanted: string): Problem {
  return new Problem(400, 'invalid-query', 'The query is not readable', `${parameter} must be ${wanted}.`);
}

/**
 * Cuts one page from rows of which one more than its limit was asked for.
 *
 * @param rows at most limit + 1, in order
 */
export function cutPage<T extends { readonly id: string }>(
  rows: readonly T[],
  { limit }: Page,
): { items: T[]; next: string | null } {
  const items = rows.slice(0, limit);
  return { items, next: rows.length > limit ? (items.at(-1)?.id ?? null) : null };
}
