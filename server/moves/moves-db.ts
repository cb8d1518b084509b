import { type Move, type MoveSummary } from '#schemas/api/moves';
import { type MoveDocument } from '#schemas/move';
import { type CrewScope } from '../crews/crew-scope';

interface MoveRow {
  id: string;
  shot_id: string;
  shoot_id: string;
  title: string;
  key_count: number;
  document: MoveDocument;
  revision: number;
  updated_at: Date;
  updated_by: string;
  updated_by_name: string;
}

/** A stored move, its document known to be one. */
export type StoredMove = Omit<Move, 'document'> & { readonly document: MoveDocument };

/** A shot's moves, last saved first. */
export async function listMoves(scope: CrewScope, shotId: string): Promise<MoveSummary[]> {
  const rows = await scope
    .rows<MoveRow>('moves')
    .join('users', 'users.id', 'moves.updated_by')
    .where({ shot_id: shotId })
    .orderBy([
      { column: 'moves.updated_at', order: 'desc' },
      { column: 'moves.id', order: 'desc' },
    ])
    .select<MoveRow[]>(
      ...[
        'moves.id',
        'moves.shot_id',
        'moves.title',
        'moves.key_count',
        'moves.revision',
        'moves.updated_at',
      ],
      ...['moves.updated_by', 'users.name as updated_by_name'],
    );
  return rows.map(row => ({
    id: row.id,
    shotId: row.shot_id,
    title: row.title,
    revision: row.revision,
    keyCount: row.key_count,
    updatedAt: row.updated_at.toISOString(),
    updatedBy: { id: row.updated_by, name: row.updated_by_name },
  }));
}

export async function findMove(scope: CrewScope, id: string): Promise<StoredMove | undefined> {
  const row = await scope
    .rows<MoveRow>('moves')
    .join('users', 'users.id', 'moves.updated_by')
    .join('shots', 'shots.id', 'moves.shot_id')
    .where({ 'moves.id': id })
    .first<MoveRow | undefined>('moves.*', 'shots.shoot_id', 'users.name as updated_by_name');
  return (
    row && {
      id: row.id,
      shotId: row.shot_id,
      shootId: row.shoot_id,
      crewId: scope.member.crewId,
      title: row.title,
      revision: row.revision,
      document: row.document,
      updatedAt: row.updated_at.toISOString(),
      updatedBy: { id: row.updated_by, name: row.updated_by_name },
    }
  );
}

export async function insertMove(
  scope: CrewScope,
  id: string,
  shotId: string,
  document: MoveDocument,
): Promise<void> {
  await scope.insert('moves', { id, shot_id: shotId, ...columnsOf(scope, document) });
}

/** @returns false where it is not there or at another revision */
export async function updateMove(
  scope: CrewScope,
  at: { readonly id: string; readonly revision: number },
  document: MoveDocument,
): Promise<boolean> {
  return scope.change('moves', at, columnsOf(scope, document));
}

function columnsOf(scope: CrewScope, document: MoveDocument): Record<string, unknown> {
  return {
    title: document.title,
    key_count: document.keys.length,
    document: JSON.stringify(document),
    updated_by: scope.member.userId,
  };
}
