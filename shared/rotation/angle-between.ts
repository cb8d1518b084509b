import { type Quat } from '#shared/conventions';

/**
 * Angle of the shortest turn between two camera orientations.
 *
 * Half-chords through atan2, not acos(a·b): cosine is flat near 0, so the dot product has already lost a pan of
 * 1e-8 rad per frame.
 *
 * @param a, b unit quaternions [x, y, z, w]; q and −q are one orientation
 * @returns radians in [0, π]; NaN if an input holds NaN
 * @see W. Kahan, "How Futile are Mindless Assessments of Roundoff", 2006, "Mangled Angles"
 */
export function angleBetween(a: Readonly<Quat>, b: Readonly<Quat>): number {
  let apart = 0;
  let along = 0;
  for (let i = 0; i < 4; i++) {
    apart += (a[i] - b[i]) ** 2;
    along += (a[i] + b[i]) ** 2;
  }
  return 4 * Math.atan2(Math.sqrt(Math.min(apart, along)), Math.sqrt(Math.max(apart, along)));
}
