import { type Numbers, RAD_PER_DEG } from '#shared/conventions';
import { sineCosines } from '#shared/rotation/sine-cosines';
import * as at from './leg-table';

const HALF_RAD_PER_DEG = RAD_PER_DEG / 2;

// What follows is done for every frame. Cubics are written out, since a number that is given to a function or returned by
// it may have to be put on the heap where the compiler does not fold the function in.

/** Scratch for up to three angles, their sines and their cosines: it holds nothing between calls. */
const scratchAngles = new Float64Array(3);
const scratchTurn = new Float64Array(6);

/**
 * Orientation along one row of a leg table.
 *
 * @param out receives a unit quaternion in its first four places
 * @param row where the leg's row begins in `table`
 * @param sort, flags of the row (leg-table.ts)
 * @param place holds the ease's u, or the share of time on fair legs, 0…1: in an array, as a number that is given to a
 *   function may have to be put on the heap
 */
export function orientationOnLeg(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  sort: number,
  flags: number,
  place: Readonly<Float64Array>,
): void {
  if (sort === at.LEVEL) levelOrientation(out, table, row, flags, place);
  else if (sort === at.ARC) arcOrientation(out, table, row, flags, place);
  else fairArcOrientation(out, table, row, flags, place);
}

/** As built from the three channels; written out, with the roll left out where the leg has none. */
function levelOrientation(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  flags: number,
  place: Readonly<Float64Array>,
): void {
  const angles = scratchAngles;
  const turn = scratchTurn;
  const s = place[0];
  const rolls = (flags & at.ROLLS) !== 0;
  const yaw =
    ((table[row + at.YAW + 3] * s + table[row + at.YAW + 2]) * s + table[row + at.YAW + 1]) * s +
    table[row + at.YAW];
  const pitch =
    ((table[row + at.PITCH + 3] * s + table[row + at.PITCH + 2]) * s + table[row + at.PITCH + 1]) * s +
    table[row + at.PITCH];
  angles[0] = yaw * HALF_RAD_PER_DEG;
  angles[1] = pitch * HALF_RAD_PER_DEG;
  if (rolls) {
    const roll =
      ((table[row + at.ROLL + 3] * s + table[row + at.ROLL + 2]) * s + table[row + at.ROLL + 1]) * s +
      table[row + at.ROLL];
    angles[2] = roll * HALF_RAD_PER_DEG;
  }
  sineCosines(turn, angles, rolls ? 3 : 2);
  const sign = table[row + at.SIGN];
  const sy = -sign * turn[0];
  const cy = sign * turn[1];
  const sx = turn[2];
  const cx = turn[3];
  const sz = rolls ? -turn[4] : 0;
  const cz = rolls ? turn[5] : 1;
  out[0] = cy * sx * cz + sy * cx * sz;
  out[1] = sy * cx * cz - cy * sx * sz;
  out[2] = cy * cx * sz - sy * sx * cz;
  out[3] = cy * cx * cz + sy * sx * sz;
}

/** slerp as q_a cos(u h) + (q_a · axis) sin(u h): one sine and one cosine. */
function arcOrientation(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  flags: number,
  place: Readonly<Float64Array>,
): void {
  const angles = scratchAngles;
  const turn = scratchTurn;
  const u = place[0];
  angles[0] = u * table[row + at.HALF_ANGLE];
  sineCosines(turn, angles, 1);
  const s = turn[0];
  const c = turn[1];
  out[0] = c * table[row + at.START] + s * table[row + at.ASIDE];
  out[1] = c * table[row + at.START + 1] + s * table[row + at.ASIDE + 1];
  out[2] = c * table[row + at.START + 2] + s * table[row + at.ASIDE + 2];
  out[3] = c * table[row + at.START + 3] + s * table[row + at.ASIDE + 3];
  if ((flags & at.TURNS) === 0) return;
  angles[0] = u * table[row + at.YAW_HALF_TURNS];
  angles[1] = u * table[row + at.ROLL_HALF_TURNS];
  turnAround(out);
}

/** START · exp(r(τ)), with the whole turns around it. */
function fairArcOrientation(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  flags: number,
  place: Readonly<Float64Array>,
): void {
  const angles = scratchAngles;
  const turn = scratchTurn;
  const t = place[0];
  const v = row + at.VECTOR;
  const x = ((table[v + 6] * t + table[v + 3]) * t + table[v]) * t;
  const y = ((table[v + 7] * t + table[v + 4]) * t + table[v + 1]) * t;
  const z = ((table[v + 8] * t + table[v + 5]) * t + table[v + 2]) * t;
  const squared = x * x + y * y + z * z;
  const half = 0.5 * Math.sqrt(squared);
  // sin(θ/2)/θ; below 1e-4 two terms of the series are exact to 1e-18.
  angles[0] = half;
  sineCosines(turn, angles, 1);
  const k = half < 1e-4 ? 0.5 - squared / 48 : (0.5 * turn[0]) / half;
  const rx = k * x;
  const ry = k * y;
  const rz = k * z;
  const rw = turn[1];
  const ax = table[row + at.START];
  const ay = table[row + at.START + 1];
  const az = table[row + at.START + 2];
  const aw = table[row + at.START + 3];
  out[0] = aw * rx + ax * rw + ay * rz - az * ry;
  out[1] = aw * ry - ax * rz + ay * rw + az * rx;
  out[2] = aw * rz + ax * ry - ay * rx + az * rw;
  out[3] = aw * rw - ax * rx - ay * ry - az * rz;
  if ((flags & at.TURNS) === 0) return;
  angles[0] = at.cubic(table, row + at.YAW_TURN_CUBIC, t);
  angles[1] = at.cubic(table, row + at.ROLL_TURN_CUBIC, t);
  turnAround(out);
}

/** out = Ry(−2a) · out · Rz(−2b), a and b in `scratchAngles`: half the turns of yaw and of roll, radians. */
function turnAround(out: Numbers): void {
  const angles = scratchAngles;
  const turn = scratchTurn;
  sineCosines(turn, angles, 2);
  const sy = -turn[0];
  const cy = turn[1];
  const sz = -turn[2];
  const cz = turn[3];
  const x = cy * out[0] + sy * out[2];
  const y = cy * out[1] + sy * out[3];
  const z = cy * out[2] - sy * out[0];
  const w = cy * out[3] - sy * out[1];
  out[0] = cz * x + sz * y;
  out[1] = cz * y - sz * x;
  out[2] = cz * z + sz * w;
  out[3] = cz * w - sz * z;
}
