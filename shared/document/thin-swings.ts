import { RAD_PER_DEG } from '#shared/conventions';
import { type ThinTable } from './thin-table';

/** Rounding, radians. */
const SLACK = 1e-9;

/**
 * For each row, the last row that a leg from it may reach without its pitch swinging too often.
 *
 * Whole turns of yaw and roll leave the pitch as it is, and the arc itself turns by at most half a turn at an even rate:
 * the sine of the pitch follows at most half a wave of a sine, and so turns back once at most. Rows that swing up, down and
 * up again, each time by more than twice the tolerance, are beyond any leg.
 *
 * @param angleRad the tolerance
 */
export function reachOfSwings(table: ThinTable, angleRad: number): Int32Array {
  const ends = swingEnds(
    Float64Array.from(table.keys, key => key.pitch * RAD_PER_DEG),
    2 * angleRad + SLACK,
  );
  let passed = 0;
  return Int32Array.from({ length: table.count }, (_, row) => {
    while (passed < ends.length && ends[passed] < row) passed++;
    return passed + 3 < ends.length ? ends[passed + 3] - 1 : table.count - 1;
  });
}

/** @returns where the swings that are larger than `least` begin and end, rows in order */
function swingEnds(values: Float64Array, least: number): number[] {
  const ends: number[] = [];
  let low = 0;
  let high = 0;
  let way = 0;
  values.forEach((value, row) => {
    if (value < values[low]) low = row;
    if (value > values[high]) high = row;
    if (way <= 0 && value - values[low] > least) {
      ends.push(low);
      way = 1;
      high = row;
    } else if (way >= 0 && values[high] - value > least) {
      ends.push(high);
      way = -1;
      low = row;
    }
  });
  if (way !== 0) ends.push(way > 0 ? high : low);
  return ends;
}
