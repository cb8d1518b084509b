import { HttpErrorResponse } from '@angular/common/http';

import { type Problem as ProblemBody } from '#schemas/api/problem';

/** What went wrong, in the words of the server (RFC 9457), or in ours where it could not be reached. */
export class Problem extends Error {
  constructor(
    /** What code switches on, never the wording. */
    readonly type: string,
    readonly title: string,
    readonly status: number,
    readonly detail: string,
    readonly errors: readonly { readonly pointer: string; readonly detail: string }[] = [],
    /** What is stored now, where somebody else was faster (412). */
    readonly current: unknown = undefined,
  ) {
    super(`${title} ${detail}`.trim());
  }
}

/** @returns the problem that an error of HttpClient stands for; any other error is unexpected and says so */
export function problemFrom(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (!(error instanceof HttpErrorResponse)) {
    const detail = error instanceof Error ? error.message : String(error);
    return new Problem('unexpected', 'Something unexpected happened.', 0, detail);
  }
  if (error.status === 0) {
    return new Problem(
      'unreachable',
      'The server cannot be reached.',
      0,
      'Nothing was changed there, and what you have here is kept. Check the connection and try again.',
    );
  }
  const body: unknown = error.error;
  return isProblemBody(body)
    ? new Problem(body.type, body.title, body.status, body.detail ?? '', body.errors ?? [], body.current)
    : new Problem(
        'unexpected',
        `The server answered ${error.status}.`,
        error.status,
        'Nothing was changed. Try again.',
      );
}

function isProblemBody(body: unknown): body is ProblemBody & { readonly current?: unknown } {
  return typeof body === 'object' && body !== null && 'type' in body && 'title' in body && 'status' in body;
}
