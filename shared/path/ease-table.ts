import { type Key } from '#schemas/move';
import { bezierHeight, bezierParameter } from './ease';
import * as at from './leg-table';
import { POINTS, TERMS, writeSeries } from './series';

/**
 * A curved ease as short polynomials, so that playing it solves no equation: u(t) over 1/32 of the way at a time, as
 * series (path/series.ts). Where u has no such polynomial (beside a vertical or a standing end), the table
 * has none either and the equation is solved.
 */

const STRETCHES = 32;

/** Numbers that a table takes. */
const TABLE_SIZE = STRETCHES * TERMS;

/** How large the last term of a stretch may be: the terms left out are 1e-12 and less. */
const LAST_TERM = 1e-10;

/** The tables of a move's eases. */
export interface EaseTables {
  readonly tables: Float64Array;
  /** For each leg, where its ease's table begins; −1 where it has none. */
  readonly starts: Int32Array;
}

/** Eases that differ, up to which they get tables: a move of many hand-made curves must still be compiled in no time. */
const MOST_TABLES = 32;

/** @param table, flags of a compiled move (leg-table.ts) */
export function easeTables(
  keys: readonly Key[],
  table: Readonly<Float64Array>,
  flags: Readonly<Uint8Array>,
): EaseTables {
  const numbers = new Map<string, number>();
  const tables: Float64Array[] = [];
  const starts = new Int32Array(keys.length).fill(-1);
  keys.forEach((key, leg) => {
    if ((flags[leg] & at.CURVED_EASE) === 0) return;
    const name = JSON.stringify(key.leg?.ease);
    if (!numbers.has(name) && tables.length < MOST_TABLES) {
      numbers.set(name, tables.length);
      tables.push(easeTable(table, leg * at.ROW + at.EASE));
    }
    starts[leg] = (numbers.get(name) ?? -1) * TABLE_SIZE;
  });
  return { tables: concatenated(tables), starts };
}

function concatenated(parts: readonly Float64Array[]): Float64Array {
  const all = new Float64Array(parts.length * TABLE_SIZE);
  parts.forEach((part, i) => all.set(part, i * TABLE_SIZE));
  return all;
}

/**
 * @param ease, place what `writeEase` (path/ease.ts) has written
 */
function easeTable(ease: Readonly<Float64Array>, place: number): Float64Array {
  const table = new Float64Array(TABLE_SIZE);
  const values = new Float64Array(TERMS);
  for (let stretch = 0; stretch < STRETCHES; stretch++) {
    for (let i = 0; i < TERMS; i++) {
      const t = (stretch + 0.5 + POINTS[i] / 2) / STRETCHES;
      values[i] = bezierHeight(ease, place, bezierParameter(ease, place, t));
    }
    const last = writeSeries(table, stretch * TERMS, values);
    if (!(last < LAST_TERM)) table[stretch * TERMS] = NaN;
  }
  return table;
}

/**
 * @param out holds t in its first place, in 0…1 and not 1, and receives u there, within 1e-12; NaN where the table has
 *   none
 * @param start where the table begins
 */
export function easeFromTable(out: Float64Array, table: Readonly<Float64Array>, start: number): void {
  const along = out[0] * STRETCHES;
  const stretch = along | 0;
  const x = 2 * (along - stretch) - 1;
  const x2 = x * x;
  const c = start + stretch * TERMS;
  const low = table[c] + x * table[c + 1] + x2 * (table[c + 2] + x * table[c + 3]);
  const high = table[c + 4] + x * table[c + 5] + x2 * (table[c + 6] + x * table[c + 7]);
  out[0] = low + x2 * x2 * high;
}
