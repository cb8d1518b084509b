import { type Deliverable } from '#schemas/move';
import { type Quat, RAD_PER_DEG, type Vec3 } from '#shared/conventions';
import { halfWidthRatio } from '#shared/projection/deliverable-framing';
import { pictureOfDirection, radiusAtAngle } from '#shared/projection/general-perspective';
import { conjugate, rotate } from '#shared/rotation/quaternion';

/**
 * Lines over the framed picture. Places are in its own unit: −1…1 from the left to the right edge, y downwards in the same
 * unit, so that an SVG of `viewBox="-1 -h 2 2h"` (h the frame's height divided by its width) takes them as they are.
 */

/** Overlays that can be switched, in the order of their menu. */
export const OVERLAYS = [
  { name: 'thirds', label: 'Thirds' },
  { name: 'centre', label: 'Centre' },
  { name: 'action-area', label: 'Safe action area' },
  { name: 'title-area', label: 'Safe title area' },
  { name: 'level-line', label: 'Level line' },
  { name: 'seam', label: 'Seam' },
  { name: 'other-frames', label: 'Other deliverables' },
  { name: 'surround', label: 'Surround, masked' },
] as const;

export type OverlayName = (typeof OVERLAYS)[number]['name'];

/** Shares of width and height inside which action, and titles, are safe. @see SMPTE ST 2046-1:2009 */
export const SAFE_ACTION = 0.93;
export const SAFE_TITLE = 0.9;

/** Degrees from point to point of a circle: its chords are then 1/3300 of its radius off. */
const STEP_DEG = 2;

/** How far outside the frame a line is still followed, in half widths. */
const REACH = 4;

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** A share of the frame about its centre. */
export function centredBox(heightPerWidth: number, acrossShare: number, downShare = acrossShare): Box {
  return {
    x: -acrossShare,
    y: -downShare * heightPerWidth,
    width: 2 * acrossShare,
    height: 2 * downShare * heightPerWidth,
  };
}

/** Two lines across and two down, a third of the frame apart. */
export function thirdsPath(heightPerWidth: number): string {
  const h = heightPerWidth;
  return `M${-1 / 3} ${-h}V${h}M${1 / 3} ${-h}V${h}M-1 ${-h / 3}H1M-1 ${h / 3}H1`;
}

/** Another deliverable's frame, where it lies in the first's: it may reach beyond it. */
export function deliverableBox(first: Deliverable, other: Deliverable): Box {
  const across = halfWidthRatio(first, other);
  const aspect = other.height / other.width;
  return { x: -across, y: -across * aspect, width: 2 * across, height: 2 * across * aspect };
}

/**
 * A great circle as it falls in the frame.
 *
 * @param normal unit world direction square to the circle's plane
 * @param pose qx, qy, qz, qw, field of view in radians, eye point
 * @returns an SVG path; empty where nothing of it comes near the frame
 */
export function greatCirclePath(normal: Readonly<Vec3>, pose: Readonly<Float64Array>): string {
  const [a, b] = axesAcross(normal);
  const inverse = conjugate(new Float64Array(4), pose.subarray(0, 4));
  const half = radiusAtAngle(pose[4] / 2, pose[5]);
  const point = new Float64Array(3);
  const place = new Float64Array(2);
  const parts: string[] = [];
  let drawing = false;
  for (let angle = 0; angle <= 360; angle += STEP_DEG) {
    const [c, s] = [Math.cos(angle * RAD_PER_DEG), Math.sin(angle * RAD_PER_DEG)];
    for (let k = 0; k < 3; k++) point[k] = c * a[k] + s * b[k];
    rotate(point, inverse, point);
    const drawn = pictureOfDirection(place, point, pose[5]);
    const [x, y] = [place[0] / half, -place[1] / half];
    if (drawn && Math.abs(x) < REACH && Math.abs(y) < REACH) {
      parts.push(`${drawing ? 'L' : 'M'}${x.toFixed(4)} ${y.toFixed(4)}`);
      drawing = true;
    } else drawing = false;
  }
  return parts.length > 1 ? parts.join('') : '';
}

/** The level line: directions at height 0 of the levelled world. */
export function levelLinePath(pose: Readonly<Float64Array>): string {
  return greatCirclePath([0, 1, 0], pose);
}

/**
 * The source's seam: through its poles, at `seamYaw` and half a turn on.
 *
 * @param level source direction → levelled world
 */
export function seamPath(seamYawDeg: number, level: Readonly<Quat>, pose: Readonly<Float64Array>): string {
  const yaw = seamYawDeg * RAD_PER_DEG;
  return greatCirclePath(rotate([0, 0, 0], level, [Math.cos(yaw), 0, Math.sin(yaw)]), pose);
}

/** Two unit directions that span the plane square to a third. */
function axesAcross([x, y, z]: Readonly<Vec3>): [Vec3, Vec3] {
  const aside = Math.abs(y) < 0.9 ? [0, 1, 0] : [1, 0, 0];
  const a = unit([y * aside[2] - z * aside[1], z * aside[0] - x * aside[2], x * aside[1] - y * aside[0]]);
  return [a, [y * a[2] - z * a[1], z * a[0] - x * a[2], x * a[1] - y * a[0]]];
}

function unit(v: Vec3): Vec3 {
  const length = Math.hypot(v[0], v[1], v[2]);
  return [v[0] / length, v[1] / length, v[2] / length];
}
