import { type Shoot, type ShootChanges, type ShootDraft } from '#schemas/api/shoots';
import { type CrewScope } from '../crews/crew-scope';
import { cutPage, type Page } from '../http/paging';
import { coversOfShoots } from '../plates/covers-db';

interface ShootRow {
  id: string;
  title: string;
  place: string;
  notes: string;
  starts_on: string | null;
  revision: number;
  created_at: Date;
  updated_at: Date;
  shot_count: string;
  move_count: string;
}

/** The crew's shoots, newest first. */
export async function listShoots(
  scope: CrewScope,
  page: Page,
): Promise<{ items: Shoot[]; next: string | null }> {
  const query = selectShoots(scope)
    .orderBy('shoots.id', 'desc')
    .limit(page.limit + 1);
  if (page.after !== undefined) void query.where('shoots.id', '<', page.after);
  const { items, next } = cutPage(await query, page);
  return { items: await withCovers(scope, items), next };
}

export async function findShoot(scope: CrewScope, id: string): Promise<Shoot | undefined> {
  const rows = await selectShoots(scope).where('shoots.id', id);
  return (await withCovers(scope, rows))[0];
}

/** Keeps a shoot from being deleted until the transaction ends. @returns whether it is there */
export async function holdShoot(scope: CrewScope, id: string): Promise<boolean> {
  const held = await scope.rows<ShootRow>('shoots').where({ id }).forShare().first('id');
  return held !== undefined;
}

export async function insertShoot(scope: CrewScope, id: string, draft: ShootDraft): Promise<void> {
  await scope.insert('shoots', { id, ...columnsOf(draft) });
}

/** @returns false where it is at another revision */
export async function updateShoot(
  scope: CrewScope,
  at: { readonly id: string; readonly revision: number },
  changes: ShootChanges,
): Promise<boolean> {
  return scope.change('shoots', at, columnsOf(changes));
}

function columnsOf({ title, place, notes, startsOn }: ShootChanges): Record<string, unknown> {
  const columns = { title, place, notes, starts_on: startsOn };
  return Object.fromEntries(Object.entries(columns).filter(([, value]) => value !== undefined));
}

function selectShoots(scope: CrewScope) {
  const shots = scope.rows('shots').whereRaw('shots.shoot_id = shoots.id');
  return scope
    .rows<ShootRow>('shoots')
    .select('shoots.*', shots.clone().count().as('shot_count'))
    .select(
      scope.rows('moves').whereIn('moves.shot_id', shots.clone().select('shots.id')).count().as('move_count'),
    );
}

async function withCovers(scope: CrewScope, rows: readonly ShootRow[]): Promise<Shoot[]> {
  const covers = await coversOfShoots(
    scope,
    rows.map(row => row.id),
  );
  return rows.map(row => ({
    id: row.id,
    title: row.title,
    place: row.place,
    notes: row.notes,
    startsOn: row.starts_on,
    shotCount: Number(row.shot_count),
    moveCount: Number(row.move_count),
    cover: covers.get(row.id) ?? null,
    revision: row.revision,
    createdAt: row.created_at.toISOString(),
    updatedAt: row.updated_at.toISOString(),
  }));
}
