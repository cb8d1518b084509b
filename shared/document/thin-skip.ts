import { wholeTurns } from '#shared/path/whole-turns';
import { type ThinLeg } from './thin-leg';
import { type ThinTable } from './thin-table';

/** Kept off what a refusal allows to be skipped, radians and degrees: rounding. */
const ROUNDING = 1e-9;

/**
 * The next row to which a leg from the same row may fit, after one did not.
 *
 * As the leg's end goes on along the rows, the leg at the row that was missed moves by no more than the end does, and by
 * what its share of the leg loses. As long as that is less than it was off, and neither whole turns nor the way round
 * change, no leg fits.
 *
 * @param leg as the refusal has left it
 * @returns a row after `to`; the table's count where there is none
 */
export function rowAfterMiss(leg: ThinLeg, from: number, to: number, table: ThinTable): number {
  if (leg.missedByRad === 0) return to + 1;
  const { keys, frames, gone } = table;
  const arc = leg.arcRad;
  const passed = (frames[leg.missedRow] - frames[from]) * (arc + leg.wholeTurnsRad);
  const perTime = 1 / (frames[to] - frames[from]);
  const yawLeft = turnLeft(keys[to].yaw - keys[from].yaw);
  const rollLeft = turnLeft(keys[to].roll - keys[from].roll);
  return lastWhere(to, table.count, row => {
    const moved = gone[row] - gone[to];
    const lost = passed * (perTime - 1 / (frames[row] - frames[from]));
    return (
      moved + lost < leg.missedByRad - ROUNDING &&
      moved < Math.PI - arc - ROUNDING &&
      table.yawGone[row] - table.yawGone[to] < yawLeft &&
      table.rollGone[row] - table.rollGone[to] < rollLeft
    );
  });
}

/** @returns whether the leg between two rows has no whole turns */
export function isPlain({ keys }: ThinTable, from: number, to: number): boolean {
  return wholeTurns(keys[to].yaw - keys[from].yaw) === 0 && wholeTurns(keys[to].roll - keys[from].roll) === 0;
}

/** @returns the next row after `to` to which a leg may have whole turns; `to` is one to which it has none */
export function rowAfterPlain(from: number, to: number, table: ThinTable): number {
  const { keys, yawGone, rollGone } = table;
  const yawLeft = turnLeft(keys[to].yaw - keys[from].yaw);
  const rollLeft = turnLeft(keys[to].roll - keys[from].roll);
  return lastWhere(
    to,
    table.count,
    row => yawGone[row] - yawGone[to] < yawLeft && rollGone[row] - rollGone[to] < rollLeft,
  );
}

/** @returns degrees that a difference can change by before its whole turns do */
function turnLeft(differenceDeg: number): number {
  return 180 - Math.abs(differenceDeg - 360 * wholeTurns(differenceDeg)) - ROUNDING;
}

/**
 * @param holds true up to some row, then false
 * @returns the row after the last one beyond `from` for which it holds; at least the next one
 */
function lastWhere(from: number, count: number, holds: (row: number) => boolean): number {
  let low = from;
  let step = 1;
  while (low + step < count && holds(low + step)) {
    low += step;
    step *= 2;
  }
  let high = Math.min(low + step, count);
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (holds(middle)) low = middle;
    else high = middle;
  }
  return low + 1;
}
