/**
 * A compiled move is one row of numbers a leg, all rows in one Float64Array, so that evaluating a pose reads one short
 * stretch of memory and allocates nothing. This file says what stands where.
 *
 * "Cubic" means four coefficients c₀…c₃ of `((c₃s + c₂)s + c₁)s + c₀`, where s is the ease's u on eased legs and the
 * share of the leg's time on fair ones.
 */

/** Numbers a row. */
export const ROW = 42;

/** Source frame at which the leg begins. */
export const FRAME = 0;
/** One over the leg's length in source frames. */
export const PER_FRAME = 1;
/** Nine numbers of a curved ease (`writeEase`, path/ease.ts). */
export const EASE = 2;
/** Cubic of ζ = ln tan(fov/4). */
export const ZOOM = 11;
/** Cubic of the eye point. */
export const EYE = 15;
/** Horizontal field of view at the leg's first key, radians. */
export const FOV = 19;
/** +1 or −1: the sign that keeps the quaternion continuous from the leg before. */
export const SIGN = 20;

/** Level and held legs: cubics in degrees. */
export const YAW = 21;
export const PITCH = 25;
export const ROLL = 29;

/** Arc legs, both sorts: the first key's quaternion, turns taken out. */
export const START = 21;

/** Eased arcs: START · (axis, 0), half the angle, the axis in camera axes, π times the whole turns of yaw and of roll. */
export const ASIDE = 25;
export const HALF_ANGLE = 29;
export const AXIS = 30;
export const YAW_HALF_TURNS = 33;
export const ROLL_HALF_TURNS = 34;

/** Fair arcs: the rotation vector's cubic as c₁, c₂, c₃ of 3 numbers each; cubics of π times the whole turns. */
export const VECTOR = 25;
export const YAW_TURN_CUBIC = 34;
export const ROLL_TURN_CUBIC = 38;

/** Sorts of row. */
export const LEVEL = 0;
export const ARC = 1;
export const FAIR_ARC = 2;

/** Flags of a row: what can be skipped, or cannot. */
export const CURVED_EASE = 1;
export const ZOOMS = 2;
export const TURNS = 4;
export const ROLLS = 8;

/** @returns the value of the cubic at `at` */
export function cubic(table: Readonly<Float64Array>, at: number, s: number): number {
  return ((table[at + 3] * s + table[at + 2]) * s + table[at + 1]) * s + table[at];
}
