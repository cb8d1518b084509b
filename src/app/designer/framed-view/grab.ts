import { DEG_PER_RAD, RAD_PER_DEG, type Vec3 } from '#shared/conventions';
import { clampFovRad } from '#shared/projection/field-of-view';
import { directionAtPicture, radiusAtAngle } from '#shared/projection/general-perspective';
import { rotate } from '#shared/rotation/quaternion';
import { type Look } from '../state/commands';

/** A point of the framed picture: −1…1 from its left to its right edge, y in the same unit, up. */
export interface PicturePoint {
  readonly x: number;
  readonly y: number;
}

function cameraDirection(point: PicturePoint, { fov, eye }: Look): Float64Array {
  const half = radiusAtAngle((fov * RAD_PER_DEG) / 2, eye);
  const direction = new Float64Array(3);
  directionAtPicture(direction, point.x * half, point.y * half, eye);
  return direction;
}

/** @returns the world direction at a point of the picture, to be held under the pointer */
export function worldDirection(point: PicturePoint, look: Look, pose: Readonly<Float64Array>): Float64Array {
  const direction = cameraDirection(point, look);
  rotate(direction, pose, direction);
  return direction;
}

/**
 * The look that puts a world direction under a point of the picture, keeping roll, field of view and eye point: what was
 * grabbed stays under the pointer.
 *
 * With roll undone, the camera direction v must satisfy Ry(−ψ) Rx(θ) v = w: the height w_y fixes the pitch (of two, the
 * one nearer to the present), the heading then the yaw. Out of reach, the nearest pitch within ±90° is taken.
 */
export function lookHolding(world: Readonly<Vec3>, point: PicturePoint, look: Look): Look {
  const v = cameraDirection(point, look);
  const roll = look.roll * RAD_PER_DEG;
  const x = v[0] * Math.cos(roll) + v[1] * Math.sin(roll);
  const y = v[1] * Math.cos(roll) - v[0] * Math.sin(roll);
  const z = v[2];
  const reach = Math.hypot(y, z);
  const swing = Math.acos(Math.min(Math.max(world[1] / reach, -1), 1));
  const offset = Math.atan2(z, y);
  const now = look.pitch * RAD_PER_DEG;
  const pitch = [swing - offset, -swing - offset]
    .map(angle => angle - 2 * Math.PI * Math.round((angle - now) / (2 * Math.PI)))
    .map(angle => Math.min(Math.max(angle, -Math.PI / 2), Math.PI / 2))
    .reduce((best, angle) => (Math.abs(angle - now) < Math.abs(best - now) ? angle : best));
  const ahead = y * Math.sin(pitch) + z * Math.cos(pitch);
  const yaw = (Math.atan2(world[0], -world[2]) - Math.atan2(x, -ahead)) * DEG_PER_RAD;
  return { ...look, yaw: nearest(yaw, look.yaw), pitch: pitch * DEG_PER_RAD };
}

/** The angle modulo 360 that is nearest to `before`: a drag never adds a turn by a jump. */
export function nearest(angleDeg: number, before: number): number {
  return angleDeg + 360 * Math.round((before - angleDeg) / 360);
}

/** @param factor over 1 widens @returns the look zoomed about the frame's centre, within the limits of its eye point */
export function zoomed(look: Look, factor: number): Look {
  const half = Math.tan((look.fov * RAD_PER_DEG) / 4) * factor;
  const fov = clampFovRad(4 * Math.atan(half), look.eye) * DEG_PER_RAD;
  return { ...look, fov };
}
