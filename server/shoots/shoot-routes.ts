import { crewRoute, crewRouteWithBody, type CrewRoute, pathValue, revised } from '../http/route';
import { revisionOf } from '../http/if-match';
import { pageOf } from '../http/paging';
import { listShoots } from './shoots-db';
import { createShoot, deleteShoot, editShoot, seeShoot } from './shoots-service';

const ONE = '/shoots/:shootId';

export function shootRoutes(): CrewRoute[] {
  return [
    crewRoute(
      {
        method: 'get',
        path: '/shoots',
        action: 'shoots.see',
        summary: 'The crew’s shoots, newest first',
        answer: [200, 'ShootPage'],
      },
      async ({ scope, req }) => ({ status: 200, body: await listShoots(scope, pageOf(req)) }),
    ),
    crewRouteWithBody(
      {
        method: 'post',
        path: '/shoots',
        action: 'shoots.create',
        summary: 'Make a shoot',
        body: 'ShootDraft',
        answer: [201, 'Shoot'],
      },
      async ({ scope }, draft) => revised(201, await createShoot(scope, draft)),
    ),
    crewRoute(
      { method: 'get', path: ONE, action: 'shoots.see', summary: 'A shoot', answer: [200, 'Shoot'] },
      async ({ scope, req }) => revised(200, await seeShoot(scope, pathValue(req, 'shootId'))),
    ),
    crewRouteWithBody(
      {
        method: 'patch',
        path: ONE,
        action: 'shoots.edit',
        summary: 'Change a shoot; needs If-Match',
        body: 'ShootChanges',
        answer: [200, 'Shoot'],
      },
      async ({ scope, req }, changes) =>
        revised(200, await editShoot(scope, pathValue(req, 'shootId'), revisionOf(req), changes)),
    ),
    crewRoute(
      {
        method: 'delete',
        path: ONE,
        action: 'shoots.delete',
        summary: 'Delete a shoot; it is kept for 30 days',
        answer: [204],
      },
      async ({ scope, req }) => {
        await deleteShoot(scope, pathValue(req, 'shootId'));
        return { status: 204 };
      },
    ),
  ];
}
