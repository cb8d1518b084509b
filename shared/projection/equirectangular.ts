import { type Numbers, type Vec3 } from '#shared/conventions';

/**
 * Equirectangular pictures, W × H = 2:1: longitude 0 is the centre column and grows to the right, latitude 0 is the
 * middle row and grows upwards; pixel centres stand at half-integers.
 */

/** @param out receives the unit direction of a longitude and latitude, radians */
export function directionFromLonLat(out: Vec3, lonRad: number, latRad: number): Vec3 {
  const level = Math.cos(latRad);
  out[0] = level * Math.sin(lonRad);
  out[1] = Math.sin(latRad);
  out[2] = -level * Math.cos(lonRad);
  return out;
}

/** @returns longitude of a direction of any length, radians in [−π, π]; 0 at the poles */
export function lonOfDirection(v: Readonly<Vec3>): number {
  return Math.atan2(v[0], -v[2]);
}

/** @returns latitude of a direction of any length, radians in [−π/2, π/2] */
export function latOfDirection(v: Readonly<Vec3>): number {
  return Math.atan2(v[1], Math.hypot(v[0], v[2]));
}

/**
 * @param out receives `[x, y]`, pixels from the picture's left and top edge: x in [0, width], y in [0, height]
 * @param v direction of any length
 * @param width, height of the picture, pixels
 */
export function pixelFromDirection(out: Numbers, v: Readonly<Vec3>, width: number, height: number): Numbers {
  out[0] = (lonOfDirection(v) / (2 * Math.PI) + 0.5) * width;
  out[1] = (0.5 - latOfDirection(v) / Math.PI) * height;
  return out;
}
