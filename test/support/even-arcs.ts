import { Euler, MathUtils, Quaternion, Vector3 } from 'three';

import { type Key } from '#schemas/move';
import { type FrameRow } from '#shared/export/frames-table';

export type Pose = Pick<Key, 'frame' | 'yaw' | 'pitch' | 'roll' | 'fov' | 'eye'>;

/* The truth: linear arc legs as the format describes them, by three.js. */

export const UP = new Vector3(0, 1, 0);
export const BACK = new Vector3(0, 0, 1);

export const orientation = ({ yaw, pitch, roll }: Pick<Pose, 'yaw' | 'pitch' | 'roll'>) => {
  const [x, y, z] = [pitch, -yaw, -roll].map(MathUtils.degToRad);
  return new Quaternion().setFromEuler(new Euler(x, y, z, 'YXZ'));
};

/** Rounded to the nearest, ties towards zero. */
export const turnsIn = (degrees: number) => Math.sign(degrees) * Math.ceil(Math.abs(degrees) / 360 - 0.5);

export const zeta = (fov: number) => Math.log(Math.tan(MathUtils.degToRad(fov) / 4));

/** Half-chords: three's angleTo is blind to angles under 1e-8. */
export function apartDeg(a: Quaternion, b: Quaternion): number {
  const chord = (sign: number) =>
    Math.hypot(a.x - sign * b.x, a.y - sign * b.y, a.z - sign * b.z, a.w - sign * b.w);
  const [near, far] = [chord(1), chord(-1)].sort((x, y) => x - y);
  return MathUtils.radToDeg(4 * Math.atan2(near, far));
}

/** By axis and angle: three's slerp goes straight where the angle is small. */
export function turnedTowards(from: Quaternion, to: Quaternion, u: number): Quaternion {
  const way = from.clone().invert().multiply(to);
  const sign = way.w >= -1e-12 ? 1 : -1;
  const axis = new Vector3(way.x, way.y, way.z).multiplyScalar(sign);
  const angle = 2 * Math.atan2(axis.length(), sign * way.w);
  return from.clone().multiply(new Quaternion().setFromAxisAngle(axis.normalize(), u * angle));
}

/** How far a pose is from where a leg is then. */
export function offLeg(a: Pose, b: Pose, pose: Pose): { angle: number; fov: number; eye: number } {
  const u = (pose.frame - a.frame) / (b.frame - a.frame);
  const m = turnsIn(b.yaw - a.yaw);
  const n = turnsIn(b.roll - a.roll);
  const end = orientation({ ...b, yaw: b.yaw - 360 * m, roll: b.roll - 360 * n });
  const there = new Quaternion()
    .setFromAxisAngle(UP, -2 * Math.PI * m * u)
    .multiply(turnedTowards(orientation(a), end, u))
    .multiply(new Quaternion().setFromAxisAngle(BACK, -2 * Math.PI * n * u));
  const fov = MathUtils.radToDeg(4 * Math.atan(Math.exp(zeta(a.fov) + u * (zeta(b.fov) - zeta(a.fov)))));
  return {
    angle: apartDeg(there, orientation(pose)),
    fov: Math.abs(fov - pose.fov),
    eye: Math.abs(a.eye + u * (b.eye - a.eye) - pose.eye),
  };
}

export const within = (a: Pose, b: Pose, pose: Pose, slack = 0) => {
  const off = offLeg(a, b, pose);
  return off.angle <= 0.05 + slack && off.fov <= 0.05 + slack && off.eye <= 0.0005 + slack;
};

/** Rows that the legs between the keys do not keep to. */
export function strays(keys: readonly Pose[], rows: readonly Pose[]): number[] {
  return rows
    .filter(row => {
      const next = keys.findIndex(each => each.frame > row.frame);
      return next < 0
        ? row.frame > keys[keys.length - 1].frame
        : !within(keys[next - 1], keys[next], row, 1e-9);
    })
    .map(row => row.frame);
}

/** The fewest keys, from all pairs of rows; with slack where a row may lie at the tolerance to the last bit. */
export function fewest(rows: readonly Pose[], slack: number): number {
  const keys = [1];
  for (let j = 1; j < rows.length; j++) {
    keys[j] = keys[j - 1] + 1;
    for (let i = 0; i < j - 1; i++)
      if (keys[i] + 1 < keys[j] && rows.slice(i + 1, j).every(row => within(rows[i], rows[j], row, slack)))
        keys[j] = keys[i] + 1;
  }
  return keys[rows.length - 1];
}

export const poseOf = ({ source_frame, yaw, pitch, roll, fov, eye }: FrameRow): Pose => ({
  frame: source_frame,
  ...{ yaw, pitch, roll, fov, eye },
});
