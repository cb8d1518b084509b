import { type ThinLeg } from './thin-leg';
import { type ThinTable } from './thin-table';

const MOST_PASSES = 10;

/** Poses that it may compare: under a second. */
const MOST_COMPARED = 4_000_000;

/**
 * Moves each kept row to one near it from which the legs follow the table better, by the sum of squares, as long as that
 * helps. Of all rows that would do, the search takes those that it meets first, often at the tolerance's very edge; a
 * table that was made of even arcs should give the rows that it was made of.
 *
 * @param kept rows whose legs fit, the first and the last staying
 * @returns as many rows, whose legs fit too
 */
export function settled(kept: readonly number[], { keys }: ThinTable, leg: ThinLeg): number[] {
  const rows = [...kept];
  const most = leg.compared + MOST_COMPARED;
  const offAt = (i: number, row: number) => leg.squares(rows[i - 1], row) + leg.squares(row, rows[i + 1]);
  let moved = rows.length > 2;
  for (let pass = 0; moved && pass < MOST_PASSES; pass++) {
    moved = false;
    for (let i = 1; i < rows.length - 1 && leg.compared < most; i++) {
      const open = (row: number) =>
        row > rows[i - 1] && row < rows[i + 1] && Number.isInteger(keys[row].frame);
      const row = lowest(rows[i], (rows[i + 1] - rows[i - 1]) >> 2, open, at => offAt(i, at));
      moved ||= row !== rows[i];
      rows[i] = row;
    }
  }
  return rows;
}

/** Goes downhill from `start`, by ever smaller steps. */
function lowest(
  start: number,
  firstStep: number,
  open: (row: number) => boolean,
  heightAt: (row: number) => number,
): number {
  let row = start;
  let height = heightAt(row);
  for (let step = Math.max(firstStep, 1); step >= 1; step = step >> 1) {
    for (const next of [row - step, row + step]) {
      const there = open(next) ? heightAt(next) : Infinity;
      if (!(there < height)) continue;
      height = there;
      row = next;
      break;
    }
  }
  return row;
}
