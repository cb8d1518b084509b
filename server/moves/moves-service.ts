import { type MoveDraft, type MoveSummary } from '#schemas/api/moves';
import { type MoveDocument } from '#schemas/move';
import { newMove } from '#shared/document/new-move';
import { checkMove } from '#shared/document/validate';
import { type CrewScope } from '../crews/crew-scope';
import { uuidV7 } from '../db/uuid-v7';
import { invalid, notFound, revisionConflict } from '../http/problem';
import { documentShot } from '../shots/shot-facts';
import { holdShot } from '../shots/shots-db';
import { seeShot } from '../shots/shots-service';
import { findMove, insertMove, listMoves, type StoredMove, updateMove } from './moves-db';

/** @throws Problem 404 for the shot */
export async function seeMoves(scope: CrewScope, shotId: string): Promise<MoveSummary[]> {
  await seeShot(scope, shotId);
  return listMoves(scope, shotId);
}

/** @throws Problem 404 */
export async function seeMove(scope: CrewScope, id: string): Promise<StoredMove> {
  const move = await findMove(scope, id);
  if (!move) throw notFound('move');
  return move;
}

/**
 * Stores a document as a new move, or makes a fresh one of one key from the shot.
 *
 * @throws Problem 404 for the shot; 422 with every fault of the document
 */
export async function createMove(scope: CrewScope, shotId: string, draft: MoveDraft): Promise<StoredMove> {
  const given = 'document' in draft ? sound(draft.document) : undefined;
  return scope.transaction(async trx => {
    if (!(await holdShot(trx, shotId))) throw notFound('shot');
    const document = given ?? (await freshDocument(trx, shotId, draft));
    const id = uuidV7();
    await insertMove(trx, id, shotId, document);
    await trx.record('move.created', id, { title: document.title });
    return seeMove(trx, id);
  });
}

async function freshDocument(trx: CrewScope, shotId: string, draft: MoveDraft): Promise<MoveDocument> {
  const title = 'title' in draft ? draft.title : '';
  return newMove(documentShot(await seeShot(trx, shotId)), title);
}

/** @throws Problem 404; 422 with every fault; 412 with the move as it is where somebody was first */
export async function saveMove(
  scope: CrewScope,
  id: string,
  revision: number,
  value: object,
): Promise<StoredMove> {
  const document = sound(value);
  return scope.transaction(async trx => {
    if (!(await updateMove(trx, { id, revision }, document))) throw revisionConflict(await seeMove(trx, id));
    await trx.record('move.saved', id, { revision: revision + 1 });
    return seeMove(trx, id);
  });
}

/** @throws Problem 404 */
export async function deleteMove(scope: CrewScope, id: string): Promise<void> {
  await scope.transaction(async trx => {
    if ((await trx.softDelete('moves', 'id', [id])).length === 0) throw notFound('move');
    await trx.record('move.deleted', id);
  });
}

/** Pointers are into the body, where the document stands. */
function sound(value: object): MoveDocument {
  const checked = checkMove(value);
  if (checked.ok) return checked.document;
  throw invalid(
    checked.faults.map(({ pointer, detail }) => ({ pointer: `/document${pointer}`, detail })),
    'The document is not a move that Fairlead can keep',
  );
}
