import { json, type Express, type Request, type RequestHandler, type Response } from 'express';
import { type Knex } from 'knex';
import { CrewScope } from '../crews/crew-scope';
import { findRole } from '../crews/crews-db';
import { isUuid } from '../db/uuid-v7';
import { MOST_JSON_BYTES, wrongContentType } from './body-problem';
import { notAllowed, notFound, notSignedIn } from './problem';
import { type Answer, type CrewRoute, pathValue, type Route } from './route';
import { type WriteGuard } from './write-guard';
import { roleMay, WHO_MAY } from './who-may';

const CREW_BASE = '/api/crews/:crewId';

/** @returns the route's whole path, in Express' form */
export function fullPath(route: Route): string {
  return route.kind === 'crew' ? `${CREW_BASE}${route.path}` : `/api${route.path}`;
}

/**
 * Puts routes behind the guards that all of them share: who is signed in, whether the page that asks is ours, whether
 * the crew is theirs, whether their role may. Only then is a body read.
 *
 * @throws Error at start for a route whose action the table of who may what does not know
 */
export function registerRoutes(app: Express, routes: readonly Route[], db: Knex, guard: WriteGuard): void {
  for (const route of routes) {
    if (!Object.hasOwn(WHO_MAY, route.action)) {
      throw new Error(`${route.method} ${fullPath(route)}: nobody said who may do "${route.action}"`);
    }
    if (route.kind === 'crew') registerCrewRoute(app, route, db, guard);
    else {
      app[route.method](
        fullPath(route),
        ...guardsOf(route, guard),
        ...bodyReaders(route),
        carryOut((req, res) => route.run({ req, res })),
      );
    }
  }
}

const readJson = json({ limit: MOST_JSON_BYTES, type: 'application/json' });

const requireJson: RequestHandler = (req, _res, next) => {
  if (!req.is('application/json')) throw wrongContentType('application/json');
  next();
};

function requireSignIn(route: Route): RequestHandler {
  return (req, _res, next) => {
    if (WHO_MAY[route.action] !== 'anybody' && !req.user) throw notSignedIn();
    next();
  };
}

function requireRole(route: CrewRoute, db: Knex, scopes: WeakMap<Request, CrewScope>): RequestHandler {
  return async (req, _res, next) => {
    const ids = Object.entries(req.params).filter(([name]) => name.endsWith('Id'));
    if (!ids.every(([, value]) => typeof value === 'string' && isUuid(value))) throw notFound();
    if (!req.user) throw notSignedIn();
    const crewId = pathValue(req, 'crewId');
    const role = await findRole(db, req.user.id, crewId);
    if (!role) throw notFound('crew');
    if (!roleMay(role, route.action)) throw notAllowed(role);
    scopes.set(req, new CrewScope(db, { userId: req.user.id, userName: req.user.name, crewId, role }));
    next();
  };
}

function carryOut(run: (req: Request, res: Response) => Promise<Answer | undefined>): RequestHandler {
  return async (req, res) => {
    const answer = await run(req, res);
    if (!answer) return;
    res.status(answer.status).set({ 'Cache-Control': 'no-store', ...answer.headers });
    if (answer.body === undefined) res.end();
    else res.json(answer.body);
  };
}

function guardsOf(route: Route, guard: WriteGuard): RequestHandler[] {
  return [requireSignIn(route), ...(route.method === 'get' ? [] : [guard.check])];
}

const bodyReaders = (route: Route): RequestHandler[] =>
  route.body && route.body !== 'upload' ? [requireJson, readJson] : [];

function registerCrewRoute(app: Express, route: CrewRoute, db: Knex, guard: WriteGuard): void {
  const scopes = new WeakMap<Request, CrewScope>();
  app[route.method](
    fullPath(route),
    ...guardsOf(route, guard),
    requireRole(route, db, scopes),
    ...bodyReaders(route),
    ...(route.before ?? []),
    carryOut(async (req, res) => {
      const scope = scopes.get(req);
      if (!scope) throw notSignedIn();
      return route.run({ req, res, scope });
    }),
  );
}
