import { type Quat } from '#shared/conventions';
import { dot } from './quaternion';

/**
 * Dot product down to which the end of an arc keeps its sign: at half a turn the numbers' sign decides which way round,
 * and rounding must not.
 */
export const HALF_TURN_SLACK = 1e-12;

/** Sine of half the angle below which slerp and straight interpolation agree to the last bit. */
const SMALL_SINE = 1e-8;

/**
 * Spherical linear interpolation between two orientations at constant rate.
 *
 * Travels to `b` as given where its dot product with `a` is ≥ −1e-12, else to −b: the shorter way, and at half a turn
 * the way that the signs ask for.
 *
 * @param out receives a unit quaternion; may be `a` or `b`
 * @param u share of the way; 0 gives a, 1 gives ±b; outside it goes on round the same circle
 * @see K. Shoemake, "Animating rotation with quaternion curves", SIGGRAPH 1985
 */
export function slerp(out: Quat, a: Readonly<Quat>, b: Readonly<Quat>, u: number): Quat {
  const sign = dot(a, b) >= -HALF_TURN_SLACK ? 1 : -1;
  const halfAngle = halfAngleTo(a, b, sign);
  const sine = Math.sin(halfAngle);
  const ka = sine < SMALL_SINE ? 1 - u : Math.sin((1 - u) * halfAngle) / sine;
  const kb = sign * (sine < SMALL_SINE ? u : Math.sin(u * halfAngle) / sine);
  for (let i = 0; i < 4; i++) out[i] = ka * a[i] + kb * b[i];
  return out;
}

/** Half-chords through atan2: accurate for small angles and near half a turn alike. */
function halfAngleTo(a: Readonly<Quat>, b: Readonly<Quat>, sign: number): number {
  let apart = 0;
  let along = 0;
  for (let i = 0; i < 4; i++) {
    apart += (a[i] - sign * b[i]) ** 2;
    along += (a[i] + sign * b[i]) ** 2;
  }
  return 2 * Math.atan2(Math.sqrt(apart), Math.sqrt(along));
}
