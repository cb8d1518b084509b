import { type Request, type Response } from 'express';
import { type Knex } from 'knex';
import { type Session } from '#schemas/api/session';
import { listMemberships } from '../crews/crews-db';
import { recordAudit } from '../db/audit';
import { checkBody } from '../http/bodies';
import { Problem } from '../http/problem';
import { type OpenRoute } from '../http/route';
import { type WriteGuard } from '../http/write-guard';
import { type Account } from './accounts-db';
import { type Authentication } from './authentication';
import { type SignInLimits } from './sign-in-limits';

interface Accounts {
  readonly db: Knex;
  readonly authentication: Authentication;
  readonly limits: SignInLimits;
  readonly guard: WriteGuard;
  readonly sessionCookie: string;
}

export function sessionRoutes({ db, authentication, limits, guard, sessionCookie }: Accounts): OpenRoute[] {
  return [
    {
      kind: 'open',
      method: 'get',
      path: '/session',
      action: 'session.see',
      summary: 'Who is signed in; sets the cookie XSRF-TOKEN',
      answer: [200, 'Session'],
      run: async ({ req, res }) => {
        guard.issue(req, res);
        return { status: 200, body: await sessionBody(db, req.user) };
      },
    },
    {
      kind: 'open',
      method: 'post',
      path: '/session',
      action: 'session.begin',
      summary: 'Sign in',
      body: 'SignIn',
      answer: [200, 'Session'],
      run: async ({ req, res }) => {
        const account = await signIn(req, res);
        return { status: 200, body: await sessionBody(db, account) };
      },
    },
    {
      kind: 'open',
      method: 'delete',
      path: '/session',
      action: 'session.end',
      summary: 'Sign out',
      answer: [204],
      run: async ({ req, res }) => {
        if (req.user) await recordAudit(db, accountEvent(req.user, 'session.ended'));
        await authentication.signOut(req);
        res.clearCookie(sessionCookie, { path: '/' });
        return { status: 204 };
      },
    },
  ];

  async function signIn(req: Request, res: Response): Promise<Account> {
    const { email } = checkBody('SignIn', req.body);
    const address = req.ip ?? 'unknown';
    await limits.begin(email, address);
    const account = await authentication.checkPassword(req, res);
    if (!account) {
      throw new Problem(
        401,
        'wrong-sign-in',
        'Not signed in',
        'No account has this e-mail address with this password.',
      );
    }
    await limits.succeed(email, address);
    await authentication.signIn(req, account);
    await recordAudit(db, accountEvent(account, 'session.begun'));
    return account;
  }
}

async function sessionBody(db: Knex, user: Account | undefined): Promise<Session> {
  if (!user) return { user: null, memberships: [] };
  const { id, name, email } = user;
  return { user: { id, name, email }, memberships: await listMemberships(db, id) };
}

const accountEvent = (account: Account, action: string) => ({
  crewId: null,
  userId: account.id,
  action,
  subjectId: account.id,
  detail: {},
});
