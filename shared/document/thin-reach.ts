import { FOV_ALWAYS_DRAWN_RAD, maxFovRad, zoomFromFov } from '#shared/projection/field-of-view';
import { conjugate, multiply } from '#shared/rotation/quaternion';
import { rotationVectorFromQuat } from '#shared/rotation/rotation-vector';
import { rowOrientation, type ThinTable, type Tolerance } from './thin-table';

/** How far legs from a row can get: the last rows that are not ruled out. */
export interface Reach {
  /** By any leg: the lens alone. */
  readonly any: number;
  /** By a leg without whole turns. */
  readonly plain: number;
}

/** From one row that is looked at to the next, the way from the leg's start grows by this factor. */
const GROWTH = 1.125;

/** Rounding, in the numbers of each channel, that must not rule a row out. */
const SLACK = 1e-11;

/** Bounds of a rate, per source frame; empty where the lower is above the upper. */
interface Bounds {
  low: number;
  high: number;
}

/**
 * How far even legs from one row can get, judged by a few of the rows on the way.
 *
 * Each channel of such a leg has one rate, and each row that it passes bounds that rate: field of view (as ζ), eye point
 * and, without whole turns, the rotation vector from the leg's start. Once no rate is left, no longer leg can do.
 */
export function reachFrom(from: number, table: ThinTable, tolerance: Tolerance): Reach {
  const { count, frames } = table;
  const rates = Array.from({ length: 5 }, (): Bounds => ({ low: -Infinity, high: Infinity }));
  const [zoom, eye, ...turn] = rates;
  let plain = count - 1;
  for (let step = 1; from + step < count - 1; step = Math.max(step + 1, Math.floor(step * GROWTH))) {
    const row = from + step;
    const time = frames[row] - frames[from];
    boundZoom(zoom, from, row, table, tolerance);
    bound(eye, table.eyes[row] - table.eyes[from], tolerance.eye, time);
    if (isEmpty(zoom) || isEmpty(eye)) return { any: row, plain: Math.min(plain, row) };
    if (plain <= row) continue;
    boundTurn(turn, from, row, table, tolerance);
    if (turn.some(isEmpty)) plain = row;
  }
  return { any: count - 1, plain };
}

function bound(bounds: Bounds, change: number, slack: number, time: number): void {
  bounds.low = Math.max(bounds.low, (change - slack - SLACK) / time);
  bounds.high = Math.min(bounds.high, (change + slack + SLACK) / time);
}

function isEmpty({ low, high }: Bounds): boolean {
  return low > high;
}

/** Where the field of view may be cut down to its limit, ζ itself may be beyond. */
function boundZoom(bounds: Bounds, from: number, row: number, table: ThinTable, tolerance: Tolerance): void {
  const { frames, zooms, fovsRad, eyes } = table;
  const time = frames[row] - frames[from];
  const narrow = fovsRad[row] - tolerance.fovRad;
  const wide = fovsRad[row] + tolerance.fovRad;
  if (narrow > 0) bounds.low = Math.max(bounds.low, (zoomFromFov(narrow) - zooms[from] - SLACK) / time);
  if (wide < FOV_ALWAYS_DRAWN_RAD || wide < maxFovRad(Math.max(0, eyes[row] - tolerance.eye)))
    bounds.high = Math.min(bounds.high, (zoomFromFov(wide) - zooms[from] + SLACK) / time);
}

const start = new Float64Array(4);
const way = new Float64Array(4);
const vector = new Float64Array(3);

/**
 * A rotation within ε of the row's, x its largest angle, lies within ε·(x/2)/sin(x/2) of it as a rotation vector: that is
 * the most by which taking vectors of rotations up to x apart stretches. Near half a turn nothing is said.
 */
function boundTurn(
  bounds: readonly Bounds[],
  from: number,
  row: number,
  table: ThinTable,
  tolerance: Tolerance,
): void {
  const { angleRad } = tolerance;
  multiply(way, conjugate(start, rowOrientation(start, table, from)), rowOrientation(way, table, row));
  if (way[3] < 0) for (let k = 0; k < 4; k++) way[k] = -way[k];
  rotationVectorFromQuat(vector, way);
  const largest = Math.hypot(vector[0], vector[1], vector[2]) + angleRad;
  if (largest >= Math.PI) return;
  const slack = (angleRad * largest) / 2 / Math.sin(largest / 2);
  const time = table.frames[row] - table.frames[from];
  bounds.forEach((each, axis) => bound(each, vector[axis], slack, time));
}
