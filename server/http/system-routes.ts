import { type Knex } from 'knex';
import { openApi } from './openapi';
import { type OpenRoute, type Route } from './route';

/** @param routes all others, which the description tells of */
export function systemRoutes(db: Knex, routes: readonly Route[]): OpenRoute[] {
  const health: OpenRoute = {
    kind: 'open',
    method: 'get',
    path: '/health',
    action: 'health.see',
    summary: 'Whether the server and its database answer',
    answer: [200, 'Health'],
    run: async () => {
      await db.raw('select 1');
      return { status: 200, body: { ok: true } };
    },
  };
  const description: OpenRoute = {
    kind: 'open',
    method: 'get',
    path: '/openapi.json',
    action: 'api.see',
    summary: 'This description',
    answer: [200, 'application/json'],
    run: async () => ({ status: 200, body: openApi([health, ...routes, description]) }),
  };
  return [health, description];
}
