import { revisionOf } from '../http/if-match';
import { pageOf } from '../http/paging';
import { crewRoute, crewRouteWithBody, type CrewRoute, pathValue, revised } from '../http/route';
import { createShot, deleteShot, editShot, seeShot, seeShots } from './shots-service';

const OF_SHOOT = '/shoots/:shootId/shots';
const ONE = '/shots/:shotId';

export function shotRoutes(): CrewRoute[] {
  return [
    crewRoute(
      {
        method: 'get',
        path: OF_SHOOT,
        action: 'shots.see',
        summary: 'A shoot’s shots, newest first',
        answer: [200, 'ShotPage'],
      },
      async ({ scope, req }) => ({
        status: 200,
        body: await seeShots(scope, pathValue(req, 'shootId'), pageOf(req)),
      }),
    ),
    crewRouteWithBody(
      {
        method: 'post',
        path: OF_SHOOT,
        action: 'shots.create',
        summary: 'Make a shot',
        body: 'ShotDraft',
        answer: [201, 'Shot'],
      },
      async ({ scope, req }, draft) =>
        revised(201, await createShot(scope, pathValue(req, 'shootId'), draft)),
    ),
    crewRoute(
      { method: 'get', path: ONE, action: 'shots.see', summary: 'A shot', answer: [200, 'Shot'] },
      async ({ scope, req }) => revised(200, await seeShot(scope, pathValue(req, 'shotId'))),
    ),
    crewRouteWithBody(
      {
        method: 'patch',
        path: ONE,
        action: 'shots.edit',
        summary: 'Change a shot; needs If-Match',
        body: 'ShotChanges',
        answer: [200, 'Shot'],
      },
      async ({ scope, req }, changes) =>
        revised(200, await editShot(scope, pathValue(req, 'shotId'), revisionOf(req), changes)),
    ),
    crewRoute(
      {
        method: 'delete',
        path: ONE,
        action: 'shots.delete',
        summary: 'Delete a shot; it is kept for 30 days',
        answer: [204],
      },
      async ({ scope, req }) => {
        await deleteShot(scope, pathValue(req, 'shotId'));
        return { status: 204 };
      },
    ),
  ];
}
