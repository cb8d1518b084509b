import { type Request, type RequestHandler, type Response } from 'express';
import { type Knex } from 'knex';
import passport from 'passport';
import { Strategy } from 'passport-local';
import { asError } from '../error-parts';
import { type Account, findAccount, findAccountByEmail } from './accounts-db';
import type {} from './express-user';
import { passwordMatches } from './passwords';

/** What a session remembers of its person. */
interface SessionUser {
  readonly id: string;
  readonly epoch: number;
}

/** Who is signed in: by password once, then by the session. */
export class Authentication {
  readonly #passport = new passport.Passport();

  constructor(private readonly db: Knex) {
    this.#passport.use(
      new Strategy({ usernameField: 'email' }, (email, password, done) => {
        this.#accountOf(email, password).then(account => done(null, account ?? false), done);
      }),
    );
    this.#passport.serializeUser((user, done) => {
      done(null, { id: user.id, epoch: user.sessionEpoch } satisfies SessionUser);
    });
    this.#passport.deserializeUser((remembered: SessionUser, done) => {
      this.#accountIn(remembered).then(account => done(null, account ?? false), done);
    });
  }

  /** Middleware: sets req.user where the session has one. */
  session(): RequestHandler {
    const restore: unknown = this.#passport.session();
    if (!isMiddleware(restore)) throw new TypeError('Passport gave no middleware');
    return restore;
  }

  /** @returns the account, or undefined for a wrong password or a name that nobody has: both take the same time */
  checkPassword(req: Request, res: Response): Promise<Account | undefined> {
    return new Promise((resolve, reject) => {
      const check: unknown = this.#passport.authenticate('local', (error: unknown, user: Account | false) => {
        if (error) reject(asError(error));
        else resolve(user || undefined);
      });
      if (isMiddleware(check)) void check(req, res, reject);
      else reject(new TypeError('Passport gave no middleware'));
    });
  }

  /** Begins a session under a new id; what the old one held is dropped. */
  signIn(req: Request, account: Account): Promise<void> {
    return new Promise((resolve, reject) => {
      req.logIn(account, (error: unknown) => {
        if (error) reject(asError(error));
        else resolve();
      });
    });
  }

  /** Ends the session: its row is gone, so its cookie is worth nothing. */
  signOut(req: Request): Promise<void> {
    return new Promise((resolve, reject) => {
      req.session.destroy((error: unknown) => {
        if (error) reject(asError(error));
        else resolve();
      });
    });
  }

  async #accountOf(email: string, password: string): Promise<Account | undefined> {
    const found = await findAccountByEmail(this.db, email);
    return (await passwordMatches(found?.passwordHash, password)) ? found?.account : undefined;
  }

  async #accountIn({ id, epoch }: SessionUser): Promise<Account | undefined> {
    const account = await findAccount(this.db, id);
    return account?.sessionEpoch === epoch ? account : undefined;
  }
}

/** Passport's types call its middleware `any`. */
function isMiddleware(value: unknown): value is RequestHandler {
  return typeof value === 'function';
}
