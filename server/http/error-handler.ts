import { type ErrorRequestHandler } from 'express';
import { databaseFailure, type DatabaseFailure } from '../db/failures';
import { codeOf } from '../error-parts';
import { bodyProblem } from './body-problem';
import { Problem } from './problem';

const RETRY_AFTER_SEC = '5';

const DATABASE_PROBLEMS: Readonly<Record<DatabaseFailure, () => Problem>> = {
  away: () =>
    new Problem(
      503,
      'database-away',
      'The database is away',
      'The database does not answer just now. What it had acknowledged is kept; try again in a few seconds.',
      {},
      { 'Retry-After': RETRY_AFTER_SEC },
    ),
  full: diskFull,
  'unstorable-text': () =>
    new Problem(
      422,
      'unstorable-text',
      'A text cannot be stored',
      'A text or an identifier holds something that cannot be stored, such as a zero sign or half of a surrogate pair. Nothing was stored; take it out.',
    ),
};

function diskFull(): Problem {
  return new Problem(
    507,
    'disk-full',
    'The disk is full',
    'There is no room to store this. Everything stored before is kept, nothing of this request was. Free some space and try again.',
  );
}

/** Every error leaves here, as a problem. What is not foreseen is logged whole and told plainly. */
export const errorHandler: ErrorRequestHandler = (error: unknown, req, res, _next) => {
  if (res.destroyed && !res.writableFinished) {
    req.log.info({ err: error }, 'The asker went away');
    return;
  }
  const problem = toProblem(error);
  if (problem.status >= 500) req.log.error({ err: error }, problem.title);
  if (res.headersSent) {
    res.destroy();
    return;
  }
  res.removeHeader('ETag');
  res
    .status(problem.status)
    .set({ 'Cache-Control': 'no-store', ...problem.headers })
    .type('application/problem+json')
    .send(
      JSON.stringify({
        type: problem.type,
        title: problem.title,
        status: problem.status,
        detail: problem.detail,
        instance: req.originalUrl.split('?')[0],
        ...problem.extras,
      }),
    );
};

function toProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (codeOf(error) === 'ENOSPC') return diskFull();
  const failure = databaseFailure(error);
  if (failure) return DATABASE_PROBLEMS[failure]();
  return bodyProblem(error) ?? requestProblem(error) ?? unforeseen();
}

/** What Express itself refuses, such as an address whose percent signs mean nothing. */
function requestProblem(error: unknown): Problem | undefined {
  if (typeof error !== 'object' || error === null || !('status' in error)) return undefined;
  const { status } = error;
  if (typeof status !== 'number' || status < 400 || status > 499) return undefined;
  const detail = 'The request itself cannot be read, such as its address. Nothing was changed.';
  return new Problem(status, 'unreadable-request', 'The request is not readable', detail);
}

function unforeseen(): Problem {
  return new Problem(
    500,
    'unforeseen',
    'Something broke on our side',
    'The request was not carried out; nothing is stored half-way. Try again; if it stays, tell whoever runs this server the time.',
  );
}
