import connectPgSimple from 'connect-pg-simple';
import { type RequestHandler } from 'express';
import session from 'express-session';
import { type Pool } from 'pg';

const SESSION_DAYS = 14;
const PRUNE_EVERY_SEC = 15 * 60;

export interface Sessions {
  readonly middleware: RequestHandler;
  readonly cookieName: string;
  /** Stops the store's timers. */
  close(): void;
}

/** Sessions in PostgreSQL, so that any process serves any person. */
export function openSessions(pool: Pool, secret: string, publicOrigin: string): Sessions {
  const secure = publicOrigin.startsWith('https:');
  const Store = connectPgSimple(session);
  const store = new Store({
    pool,
    tableName: 'sessions',
    pruneSessionInterval: PRUNE_EVERY_SEC,
    // Pruning fails while the database is away; it comes round again.
    errorLog: () => undefined,
  });
  // The __Host- prefix binds the cookie to this very host, but asks for TLS.
  const cookieName = secure ? '__Host-sid' : 'sid';
  const middleware = session({
    name: cookieName,
    secret,
    store,
    resave: false,
    saveUninitialized: false,
    cookie: { httpOnly: true, sameSite: 'lax', secure, path: '/', maxAge: SESSION_DAYS * 24 * 3600 * 1000 },
  });
  return { middleware, cookieName, close: () => store.close() };
}
