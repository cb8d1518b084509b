import { type Fault } from '#schemas/api/problem';

/** What may stand in a problem beside the standard members. */
interface ProblemExtras {
  readonly errors?: readonly Fault[];
  /** With 412: what is stored now. */
  readonly current?: unknown;
}

/** An error that a client is told of, as RFC 9457 problem details. Clients switch on `type`, never on wording. */
export class Problem extends Error {
  readonly type: string;

  /**
   * @param kind last part of the type, such as `not-found`
   * @param detail what happened, what was kept, what to do
   */
  constructor(
    readonly status: number,
    kind: string,
    readonly title: string,
    readonly detail: string,
    readonly extras: ProblemExtras = {},
    readonly headers: Readonly<Record<string, string>> = {},
  ) {
    super(`${title}: ${detail}`);
    this.type = `/problems/${kind}`;
  }
}

export const notFound = (what = 'page') =>
  new Problem(
    404,
    'not-found',
    'Not found',
    `There is no such ${what}, or it is not yours to see. It may have been deleted.`,
  );

export const notSignedIn = () =>
  new Problem(
    401,
    'not-signed-in',
    'Not signed in',
    'Nobody is signed in, or the sign-in has ended. Sign in again; nothing was changed.',
  );

export const notAllowed = (role: string) =>
  new Problem(
    403,
    'not-allowed',
    'Not allowed',
    `As the crew’s ${role} you may not do this. Nothing was changed; a lead can change roles.`,
  );

export const invalid = (errors: readonly Fault[], title = 'The body does not match its schema') =>
  new Problem(
    422,
    'invalid-body',
    title,
    `Nothing was stored. ${errors.length === 1 ? 'There is one fault' : `There are ${errors.length} faults`}; each is named with its place.`,
    { errors },
  );

export const revisionMissing = () =>
  new Problem(
    428,
    'revision-missing',
    'Which revision?',
    'Send If-Match with the revision that you changed, such as "3". Nothing was stored.',
  );

export const revisionConflict = (current: unknown) =>
  new Problem(
    412,
    'revision-conflict',
    'Somebody saved before you',
    'What is stored is newer than what you changed. It was kept and comes along as current; nothing of yours was stored.',
    { current },
  );
