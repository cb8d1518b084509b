import { type Numbers, type Quat } from '#shared/conventions';
import { radiusAtAngle } from '#shared/projection/general-perspective';
import { conjugate, multiply } from '#shared/rotation/quaternion';
import { type View } from './picture';

/**
 * The orientation that a renderer samples the source at: level⁻¹ · q.
 *
 * @param out may be `orientation`
 * @param level source direction → levelled world
 * @param orientation camera → levelled world
 */
export function sourceOrientation(out: Numbers, level: Readonly<Quat>, orientation: Readonly<Quat>): Numbers {
  const unlevel = conjugate([0, 0, 0, 1], level);
  return multiply(out, unlevel, orientation);
}

/** @param out receives the rotation matrix of a unit quaternion, nine numbers, row by row */
export function matrixFromQuat(out: Numbers, [x, y, z, w]: Readonly<Quat>): Numbers {
  out[0] = 1 - 2 * (y * y + z * z);
  out[1] = 2 * (x * y - w * z);
  out[2] = 2 * (x * z + w * y);
  out[3] = 2 * (x * y + w * z);
  out[4] = 1 - 2 * (x * x + z * z);
  out[5] = 2 * (y * z - w * x);
  out[6] = 2 * (x * z - w * y);
  out[7] = 2 * (y * z + w * x);
  out[8] = 1 - 2 * (x * x + y * y);
  return out;
}

/** Half the frame's width on the tangent plane. */
export function halfWidthOnPlane(view: View): number {
  return radiusAtAngle(view.fovRad / 2, view.eye);
}

/**
 * Source pixels that a picture pixel spans at the frame's centre, by the width. Elsewhere it is this times the
 * projection's scale t, which is 1 at the centre and nowhere larger.
 */
export function sourcePixelsPerPixel(view: View, sourceWidth: number): number {
  return ((2 * halfWidthOnPlane(view)) / view.width) * (sourceWidth / (2 * Math.PI));
}
