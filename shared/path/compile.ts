import { type Key, type MoveDocument } from '#schemas/move';
import { RAD_PER_DEG } from '#shared/conventions';
import { dot } from '#shared/rotation/quaternion';
import { CompiledMove, type CompiledRun } from './compiled-move';
import { easeTables } from './ease-table';
import * as at from './leg-table';
import { orientationOnLeg } from './orientation';
import { fairRuns } from './runs';
import { writeEased, writeHeld } from './write-eased';
import { writeRun } from './write-fair';

/**
 * Compiles a valid move document into typed arrays, once, so that poses are cheap to ask for.
 *
 * @param document as `checkMove` (document/validate.ts) accepts; its poses depend on its keys alone, not on the shot
 * @returns never throws for a valid document, whatever the keys
 */
export function compileMove(document: Pick<MoveDocument, 'keys'>): CompiledMove {
  const { keys } = document;
  const table = new Float64Array(keys.length * at.ROW);
  const sorts = new Uint8Array(keys.length);
  const flags = new Uint8Array(keys.length);
  keys.forEach((key, leg) => {
    const next = keys[leg + 1];
    table[leg * at.ROW + at.FRAME] = key.frame;
    table[leg * at.ROW + at.PER_FRAME] = next ? 1 / (next.frame - key.frame) : 0;
    table[leg * at.ROW + at.FOV] = key.fov * RAD_PER_DEG;
    table[leg * at.ROW + at.SIGN] = 1;
    if (key.leg?.ease !== 'fair') [sorts[leg], flags[leg]] = writeRow(table, leg, key, next);
  });
  const runs = fairRuns(keys).map((run): CompiledRun => {
    const written = writeRun(table, run, keys);
    sorts.fill(written.sort, run.firstKey, run.lastKey);
    flags.fill(written.flags, run.firstKey, run.lastKey);
    return { ...run, fellBack: written.fellBack };
  });
  carrySigns(table, sorts, flags);
  return new CompiledMove(keys, table, sorts, flags, runs, easeTables(keys, table, flags));
}

/** The last key has no leg: its row holds its pose for what comes after. */
function writeRow(table: Float64Array, leg: number, key: Key, next: Key | undefined): [number, number] {
  const place = { table, row: leg * at.ROW };
  return key.leg && next ? writeEased(place, key.leg, key, next) : writeHeld(place, key);
}

/**
 * As built at the first key; from there each leg takes the sign whose dot product with the end of the leg before is
 * ≥ 0. It so depends on the time alone, not on the sampling.
 */
function carrySigns(table: Float64Array, sorts: Uint8Array, flags: Uint8Array): void {
  const end = new Float64Array(4);
  const start = new Float64Array(4);
  const place = new Float64Array(1);
  for (let leg = 0; leg < sorts.length; leg++) {
    const row = leg * at.ROW;
    place[0] = 0;
    orientationOnLeg(start, table, row, sorts[leg], flags[leg], place);
    if (leg > 0 && dot(end, start) < 0) flip(table, row, sorts[leg]);
    place[0] = 1;
    orientationOnLeg(end, table, row, sorts[leg], flags[leg], place);
  }
}

function flip(table: Float64Array, row: number, sort: number): void {
  if (sort === at.LEVEL) table[row + at.SIGN] = -1;
  const quaternions = sort === at.LEVEL ? 0 : sort === at.ARC ? 8 : 4;
  for (let k = row + at.START; k < row + at.START + quaternions; k++) table[k] = -table[k];
}
