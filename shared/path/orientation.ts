import { type Numbers, RAD_PER_DEG } from '#shared/conventions';
import * as at from './leg-table';

const HALF_RAD_PER_DEG = RAD_PER_DEG / 2;

/**
 * Orientation along one row of a leg table.
 *
 * @param out receives a unit quaternion in its first four places
 * @param row where the leg's row begins in `table`
 * @param sort, flags of the row (leg-table.ts)
 * @param s the ease's u, or the share of time on fair legs; 0…1
 */
export function orientationOnLeg(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  sort: number,
  flags: number,
  s: number,
): void {
  if (sort === at.LEVEL) levelOrientation(out, table, row, flags, s);
  else if (sort === at.ARC) arcOrientation(out, table, row, flags, s);
  else fairArcOrientation(out, table, row, flags, s);
}

/** As built from the three channels; written out, with the roll left out where the leg has none. */
function levelOrientation(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  flags: number,
  s: number,
): void {
  const yaw = at.cubic(table, row + at.YAW, s) * HALF_RAD_PER_DEG;
  const pitch = at.cubic(table, row + at.PITCH, s) * HALF_RAD_PER_DEG;
  const sign = table[row + at.SIGN];
  const sy = -sign * Math.sin(yaw);
  const cy = sign * Math.cos(yaw);
  const sx = Math.sin(pitch);
  const cx = Math.cos(pitch);
  out[0] = cy * sx;
  out[1] = sy * cx;
  out[2] = -sy * sx;
  out[3] = cy * cx;
  if ((flags & at.ROLLS) !== 0) rollBy(out, at.cubic(table, row + at.ROLL, s) * HALF_RAD_PER_DEG);
}

/** slerp as q_a cos(u h) + (q_a · axis) sin(u h): one sine and one cosine. */
function arcOrientation(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  flags: number,
  u: number,
): void {
  const half = u * table[row + at.HALF_ANGLE];
  const c = Math.cos(half);
  const s = Math.sin(half);
  for (let k = 0; k < 4; k++) out[k] = c * table[row + at.START + k] + s * table[row + at.ASIDE + k];
  if ((flags & at.TURNS) === 0) return;
  yawBy(out, u * table[row + at.YAW_HALF_TURNS]);
  rollBy(out, u * table[row + at.ROLL_HALF_TURNS]);
}

/** START · exp(r(τ)), with the whole turns around it. */
function fairArcOrientation(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  flags: number,
  t: number,
): void {
  const v = row + at.VECTOR;
  const x = ((table[v + 6] * t + table[v + 3]) * t + table[v]) * t;
  const y = ((table[v + 7] * t + table[v + 4]) * t + table[v + 1]) * t;
  const z = ((table[v + 8] * t + table[v + 5]) * t + table[v + 2]) * t;
  const squared = x * x + y * y + z * z;
  const half = 0.5 * Math.sqrt(squared);
  // sin(θ/2)/θ; below 1e-4 two terms of the series are exact to 1e-18.
  const k = half < 1e-4 ? 0.5 - squared / 48 : (0.5 * Math.sin(half)) / half;
  multiplyStart(out, table, row + at.START, k * x, k * y, k * z, Math.cos(half));
  if ((flags & at.TURNS) === 0) return;
  yawBy(out, at.cubic(table, row + at.YAW_TURN_CUBIC, t));
  rollBy(out, at.cubic(table, row + at.ROLL_TURN_CUBIC, t));
}

/** out = (the quaternion at `start`) · (x, y, z, w) */
function multiplyStart(
  out: Numbers,
  table: Readonly<Float64Array>,
  start: number,
  x: number,
  y: number,
  z: number,
  w: number,
): void {
  const ax = table[start];
  const ay = table[start + 1];
  const az = table[start + 2];
  const aw = table[start + 3];
  out[0] = aw * x + ax * w + ay * z - az * y;
  out[1] = aw * y - ax * z + ay * w + az * x;
  out[2] = aw * z + ax * y - ay * x + az * w;
  out[3] = aw * w - ax * x - ay * y - az * z;
}

/** out = Ry(−2 · half) · out: half is half the yaw, radians. */
function yawBy(out: Numbers, half: number): void {
  const s = -Math.sin(half);
  const c = Math.cos(half);
  const x = out[0];
  const y = out[1];
  const z = out[2];
  const w = out[3];
  out[0] = c * x + s * z;
  out[1] = c * y + s * w;
  out[2] = c * z - s * x;
  out[3] = c * w - s * y;
}

/** out = out · Rz(−2 · half): half is half the roll, radians. */
function rollBy(out: Numbers, half: number): void {
  const s = -Math.sin(half);
  const c = Math.cos(half);
  const x = out[0];
  const y = out[1];
  const z = out[2];
  const w = out[3];
  out[0] = c * x + s * y;
  out[1] = c * y - s * x;
  out[2] = c * z + s * w;
  out[3] = c * w - s * z;
}
