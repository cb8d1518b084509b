import compression from 'compression';
import express, { type Express } from 'express';
import { type Knex } from 'knex';
import pg from 'pg';
import { type Logger } from 'pino';
import { Authentication } from './accounts/authentication';
import { sessionRoutes } from './accounts/session-routes';
import { openSessions } from './accounts/sessions';
import { type SignInAllowance, SignInLimits, USUAL_SIGN_INS } from './accounts/sign-in-limits';
import { type Config } from './config';
import { connect } from './db/connect';
import { dataOnly, securityHeaders, serveClient } from './http/client-pages';
import { errorHandler } from './http/error-handler';
import { notFound } from './http/problem';
import { registerRoutes } from './http/register';
import { requestLog } from './http/request-log';
import { type Route } from './http/route';
import { systemRoutes } from './http/system-routes';
import { WriteGuard } from './http/write-guard';
import { moveRoutes } from './moves/move-routes';
import { PictureReader } from './plates/picture-reader';
import { plateRoutes } from './plates/plate-routes';
import { PictureReceiver } from './plates/receive-picture';
import { limitUploads, USUAL_UPLOADS } from './plates/upload-limit';
import { shootRoutes } from './shoots/shoot-routes';
import { shotRoutes } from './shots/shot-routes';
import { LocalStorage, objectsFolder } from './storage/local-storage';
import { type ObjectStorage } from './storage/object-storage';

/** What a test may bring instead of the usual. */
export interface Parts {
  readonly storage?: ObjectStorage;
  readonly signIns?: SignInAllowance;
  /** Of one person within ten minutes. */
  readonly uploads?: number;
}

/** A running application: everything that was opened, and how to close it. */
export interface App {
  readonly express: Express;
  readonly routes: readonly Route[];
  readonly db: Knex;
  close(): Promise<void>;
}

const QUERY_CONNECTIONS = 10;
/** Connections for sessions and rate limits, beside Knex' own pool. */
const SESSION_CONNECTIONS = 5;
const CONNECT_TIMEOUT_MS = 5000;

/** Puts the application together. Nothing is connected yet; the first requests do that. */
export function createApp(config: Config, log: Logger, parts: Parts = {}): App {
  const db = connect(config.databaseUrl, QUERY_CONNECTIONS, words =>
    log.debug({ words: String(words) }, 'Knex'),
  );
  const pool = new pg.Pool({
    connectionString: config.databaseUrl,
    max: SESSION_CONNECTIONS,
    connectionTimeoutMillis: CONNECT_TIMEOUT_MS,
  });
  // An idle connection that the database closes is opened anew when it is next needed.
  pool.on('error', error => log.warn({ err: error }, 'A database connection was lost'));

  const sessions = openSessions(pool, config.sessionSecret, config.publicOrigin);
  const authentication = new Authentication(db);
  const guard = new WriteGuard(config.sessionSecret, config.publicOrigin);
  const limits = new SignInLimits(pool, parts.signIns ?? USUAL_SIGN_INS);
  const receiver = new PictureReceiver(config.storageDir);
  const tools = {
    reader: new PictureReader(config.pictureWorker),
    storage: parts.storage ?? new LocalStorage(objectsFolder(config.storageDir)),
  };
  const featureRoutes: Route[] = [
    ...sessionRoutes({ db, authentication, limits, guard, sessionCookie: sessions.cookieName }),
    ...shootRoutes(),
    ...shotRoutes(),
    ...plateRoutes(tools, receiver, limitUploads(pool, parts.uploads ?? USUAL_UPLOADS)),
    ...moveRoutes(),
  ];
  const routes = [...systemRoutes(db, featureRoutes), ...featureRoutes];

  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  if (config.publicOrigin.startsWith('https:')) app.set('trust proxy', 1);
  app.use(requestLog(log), securityHeaders(config.publicOrigin), compression());
  app.use('/api', dataOnly, sessions.middleware, authentication.session());
  registerRoutes(app, routes, db, guard);
  app.use('/api', () => {
    throw notFound('route');
  });
  serveClient(app, config.clientDir);
  app.use(errorHandler);
  receiver
    .sweep(Date.now())
    .catch((error: unknown) => log.warn({ err: error }, 'Old uploads were not swept'));

  const close = async () => {
    sessions.close();
    await db.destroy();
    await pool.end();
  };
  return { express: app, routes, db, close };
}
