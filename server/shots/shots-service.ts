import { type Shot, type ShotChanges, type ShotDraft } from '#schemas/api/shots';
import { type CrewScope } from '../crews/crew-scope';
import { uuidV7 } from '../db/uuid-v7';
import { type Page } from '../http/paging';
import { invalid, notFound, revisionConflict } from '../http/problem';
import { lastPlateFrame } from '../plates/plates-db';
import { findShoot, holdShoot } from '../shoots/shoots-db';
import { changedFacts, factsOf, type ShotFacts, shotFaults } from './shot-facts';
import { findShot, insertShot, listShots, updateShot } from './shots-db';

/** @throws Problem 404 */
export async function seeShot(scope: CrewScope, id: string): Promise<Shot> {
  const shot = await findShot(scope, id);
  if (!shot) throw notFound('shot');
  return shot;
}

/** @throws Problem 404 for the shoot */
export async function seeShots(scope: CrewScope, shootId: string, page: Page) {
  if (!(await findShoot(scope, shootId))) throw notFound('shoot');
  return listShots(scope, shootId, page);
}

/** @throws Problem 404 for the shoot; 422 with every fault */
export async function createShot(scope: CrewScope, shootId: string, draft: ShotDraft): Promise<Shot> {
  const facts = sound(factsOf(draft));
  return scope.transaction(async trx => {
    if (!(await holdShoot(trx, shootId))) throw notFound('shoot');
    const id = uuidV7();
    await insertShot(trx, id, shootId, facts);
    await trx.record('shot.created', id, { title: facts.title });
    return seeShot(trx, id);
  });
}

/**
 * Moves keep the facts that they were saved with; plates must stay inside the shot.
 *
 * @throws Problem 404, 422; 412 with the shot as it is
 */
export async function editShot(
  scope: CrewScope,
  id: string,
  revision: number,
  changes: ShotChanges,
): Promise<Shot> {
  return scope.transaction(async trx => {
    const facts = changedFacts(await seeShot(trx, id), changes);
    if (!(await updateShot(trx, { id, revision }, sound(facts))))
      throw revisionConflict(await seeShot(trx, id));
    await requirePlatesInside(trx, id, facts.frames);
    await trx.record('shot.edited', id, { revision: revision + 1 });
    return seeShot(trx, id);
  });
}

/** Marks the shot, its plates and its moves as deleted. @throws Problem 404 */
export async function deleteShot(scope: CrewScope, id: string): Promise<void> {
  await scope.transaction(async trx => {
    const gone = await trx.softDelete('shots', 'id', [id]);
    if (gone.length === 0) throw notFound('shot');
    await deleteChildren(trx, gone);
    await trx.record('shot.deleted', id);
  });
}

/** Within a transaction that deletes their shoot. */
export async function deleteShotsOf(trx: CrewScope, shootId: string): Promise<void> {
  await deleteChildren(trx, await trx.softDelete('shots', 'shoot_id', [shootId]));
}

async function deleteChildren(trx: CrewScope, shotIds: readonly string[]): Promise<void> {
  await trx.softDelete('plates', 'shot_id', shotIds);
  await trx.softDelete('moves', 'shot_id', shotIds);
}

async function requirePlatesInside(trx: CrewScope, shotId: string, frames: number): Promise<void> {
  const last = await lastPlateFrame(trx, shotId);
  if (last === undefined || last < frames) return;
  const detail = `must be over ${last}, where a plate stands, is ${frames}; delete that plate first`;
  throw invalid([{ pointer: '/frames', detail }], 'A plate would stand outside the shot');
}

function sound(facts: ShotFacts): ShotFacts {
  const faults = shotFaults(facts);
  if (faults.length > 0) throw invalid(faults, 'The shot does not hold together');
  return facts;
}
