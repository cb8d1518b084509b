import { type Numbers, type Vec3 } from '#shared/conventions';

/**
 * General perspective: the eye stands the eye point d (0…1) behind the sphere's centre. A ray at angle c from the axis
 * falls at r(c) = (1 + d) sin c / (d + cos c) on the tangent plane; d = 0 is rectilinear (gnomonic), d = 1
 * stereographic, and near the axis r ≈ c for every d. Valid while cos c > −d.
 *
 * @see J. P. Snyder, "Map Projections: A Working Manual", USGS 1395 (1987), pp. 169–181, with the eye inside (P = −d)
 */

/** @returns the radius on the tangent plane of a ray `angleRad` off the axis; grows without bound at cos c = −d */
export function radiusAtAngle(angleRad: number, eye: number): number {
  return ((1 + eye) * Math.sin(angleRad)) / (eye + Math.cos(angleRad));
}

/** @returns the angle off the axis, radians, of a radius on the tangent plane: the inverse of {@link radiusAtAngle} */
export function angleAtRadius(radius: number, eye: number): number {
  const k = radius / (1 + eye);
  return Math.atan(k) + Math.asin((eye * k) / Math.sqrt(1 + k * k));
}

/**
 * The camera direction that falls on a point of the tangent plane, by one square root and no trigonometry.
 *
 * @param out receives a unit direction in camera axes (looking along −Z)
 * @param x, y on the tangent plane, right and up; the frame's half width is r(fov/2)
 */
export function directionAtPicture(out: Vec3, x: number, y: number, eye: number): Vec3 {
  const a = 1 + eye;
  const squared = x * x + y * y;
  const t = (eye * a + Math.sqrt(a * a + squared * (1 - eye * eye))) / (squared + a * a);
  out[0] = t * x;
  out[1] = t * y;
  out[2] = eye - t * a;
  return out;
}

/**
 * Where a camera direction falls on the tangent plane.
 *
 * @param out receives `[x, y]`, right and up; meaningless when false is returned
 * @param v unit direction in camera axes
 * @returns whether the direction can be drawn at all (cos c > −d)
 */
export function pictureOfDirection(out: Numbers, v: Readonly<Vec3>, eye: number): boolean {
  const depth = eye - v[2];
  const scale = (1 + eye) / depth;
  out[0] = scale * v[0];
  out[1] = scale * v[1];
  return depth > 0;
}
