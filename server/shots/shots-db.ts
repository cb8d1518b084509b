import { type Shot } from '#schemas/api/shots';
import { type CrewScope } from '../crews/crew-scope';
import { cutPage, type Page } from '../http/paging';
import { coversOfShots } from '../plates/covers-db';
import { type ShotFacts } from './shot-facts';

interface ShotRow {
  id: string;
  shoot_id: string;
  title: string;
  rate_num: number;
  rate_den: number;
  frames: number;
  speed: number;
  from_frame: number;
  to_frame: number;
  start_timecode: string;
  drop_frame: boolean;
  source_width: number;
  source_height: number;
  level: [number, number, number, number];
  seam_yaw: number | null;
  loops: boolean;
  exposure_sec: number | null;
  interval_sec: number | null;
  notes: string;
  revision: number;
  created_at: Date;
  updated_at: Date;
  plate_count: string;
  move_count: string;
}

/** A shoot's shots, newest first. */
export async function listShots(
  scope: CrewScope,
  shootId: string,
  page: Page,
): Promise<{ items: Shot[]; next: string | null }> {
  const query = selectShots(scope)
    .where({ shoot_id: shootId })
    .orderBy('shots.id', 'desc')
    .limit(page.limit + 1);
  if (page.after !== undefined) void query.where('shots.id', '<', page.after);
  const { items, next } = cutPage(await query, page);
  return { items: await withCovers(scope, items), next };
}

export async function findShot(scope: CrewScope, id: string): Promise<Shot | undefined> {
  return (await withCovers(scope, await selectShots(scope).where('shots.id', id)))[0];
}

/** Keeps a shot from being deleted until the transaction ends. @returns its shoot and length, if it is there */
export async function holdShot(
  scope: CrewScope,
  id: string,
): Promise<{ shootId: string; frames: number } | undefined> {
  const row = await scope.rows<ShotRow>('shots').where({ id }).forShare().first('shoot_id', 'frames');
  return row && { shootId: row.shoot_id, frames: row.frames };
}

export async function insertShot(
  scope: CrewScope,
  id: string,
  shootId: string,
  facts: ShotFacts,
): Promise<void> {
  await scope.insert('shots', { id, shoot_id: shootId, ...columnsOf(facts) });
}

/** @returns false where it is at another revision */
export async function updateShot(
  scope: CrewScope,
  at: { readonly id: string; readonly revision: number },
  facts: ShotFacts,
): Promise<boolean> {
  return scope.change('shots', at, columnsOf(facts));
}

function columnsOf(facts: ShotFacts): Record<string, unknown> {
  return {
    title: facts.title,
    rate_num: facts.rate.num,
    rate_den: facts.rate.den,
    frames: facts.frames,
    speed: facts.speed,
    from_frame: facts.from,
    to_frame: facts.to,
    start_timecode: facts.start,
    drop_frame: facts.dropFrame,
    source_width: facts.source.width,
    source_height: facts.source.height,
    level: facts.level,
    seam_yaw: facts.seamYaw,
    loops: facts.loops,
    exposure_sec: facts.exposure,
    interval_sec: facts.interval,
    notes: facts.notes,
  };
}

function selectShots(scope: CrewScope) {
  const childrenIn = (table: 'plates' | 'moves') =>
    scope.rows(table).whereRaw('??.shot_id = shots.id', [table]).count();
  return scope
    .rows<ShotRow>('shots')
    .select('shots.*', childrenIn('plates').as('plate_count'), childrenIn('moves').as('move_count'));
}

async function withCovers(scope: CrewScope, rows: readonly ShotRow[]): Promise<Shot[]> {
  const covers = await coversOfShots(
    scope,
    rows.map(row => row.id),
  );
  return rows.map(row => ({
    id: row.id,
    shootId: row.shoot_id,
    title: row.title,
    rate: { num: row.rate_num, den: row.rate_den },
    frames: row.frames,
    speed: row.speed,
    from: row.from_frame,
    to: row.to_frame,
    start: row.start_timecode,
    dropFrame: row.drop_frame,
    source: { width: row.source_width, height: row.source_height },
    level: row.level,
    seamYaw: row.seam_yaw,
    loops: row.loops,
    exposure: row.exposure_sec,
    interval: row.interval_sec,
    notes: row.notes,
    plateCount: Number(row.plate_count),
    moveCount: Number(row.move_count),
    cover: covers.get(row.id) ?? null,
    revision: row.revision,
    createdAt: row.created_at.toISOString(),
    updatedAt: row.updated_at.toISOString(),
  }));
}
