import { type Shoot, type ShootChanges, type ShootDraft } from '#schemas/api/shoots';
import { type CrewScope } from '../crews/crew-scope';
import { uuidV7 } from '../db/uuid-v7';
import { invalid, notFound, revisionConflict } from '../http/problem';
import { deleteShotsOf } from '../shots/shots-service';
import { findShoot, insertShoot, updateShoot } from './shoots-db';

/** @throws Problem 404 */
export async function seeShoot(scope: CrewScope, id: string): Promise<Shoot> {
  const shoot = await findShoot(scope, id);
  if (!shoot) throw notFound('shoot');
  return shoot;
}

export async function createShoot(scope: CrewScope, draft: ShootDraft): Promise<Shoot> {
  requireRealDay(draft.startsOn);
  return scope.transaction(async trx => {
    const id = uuidV7();
    await insertShoot(trx, id, draft);
    await trx.record('shoot.created', id, { title: draft.title });
    return seeShoot(trx, id);
  });
}

/** @throws Problem 404; 412 with the shoot as it is where somebody was first */
export async function editShoot(
  scope: CrewScope,
  id: string,
  revision: number,
  changes: ShootChanges,
): Promise<Shoot> {
  requireRealDay(changes.startsOn);
  return scope.transaction(async trx => {
    const changed = await updateShoot(trx, { id, revision }, changes);
    const shoot = await seeShoot(trx, id);
    if (!changed) throw revisionConflict(shoot);
    await trx.record('shoot.edited', id, { revision: shoot.revision });
    return shoot;
  });
}

/** Marks the shoot and all that belongs to it as deleted. @throws Problem 404 */
export async function deleteShoot(scope: CrewScope, id: string): Promise<void> {
  await scope.transaction(async trx => {
    if ((await trx.softDelete('shoots', 'id', [id])).length === 0) throw notFound('shoot');
    await deleteShotsOf(trx, id);
    await trx.record('shoot.deleted', id);
  });
}

/** A day that the calendar has; the schema has checked the shape. */
function requireRealDay(day: string | null | undefined): void {
  if (day == null) return;
  const instant = new Date(`${day}T00:00:00Z`);
  if (Number.isNaN(instant.getTime()) || instant.toISOString().slice(0, 10) !== day || day < '0001') {
    throw invalid([
      { pointer: '/startsOn', detail: `must be a day of the calendar, is ${JSON.stringify(day)}` },
    ]);
  }
}
