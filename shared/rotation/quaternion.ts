import { type Quat, type Vec3 } from '#shared/conventions';

/**
 * Hamilton product a · b: the rotation that does b first, then a.
 *
 * @param out receives the product; may be `a` or `b`
 */
export function multiply(out: Quat, a: Readonly<Quat>, b: Readonly<Quat>): Quat {
  const ax = a[0];
  const ay = a[1];
  const az = a[2];
  const aw = a[3];
  const bx = b[0];
  const by = b[1];
  const bz = b[2];
  const bw = b[3];
  out[0] = aw * bx + ax * bw + ay * bz - az * by;
  out[1] = aw * by - ax * bz + ay * bw + az * bx;
  out[2] = aw * bz + ax * by - ay * bx + az * bw;
  out[3] = aw * bw - ax * bx - ay * by - az * bz;
  return out;
}

/** The inverse of a unit quaternion. `out` may be `q`. */
export function conjugate(out: Quat, q: Readonly<Quat>): Quat {
  out[0] = -q[0];
  out[1] = -q[1];
  out[2] = -q[2];
  out[3] = q[3];
  return out;
}

/** Scales to unit length; a quaternion of length 0 becomes the identity. `out` may be `q`. */
export function normalise(out: Quat, q: Readonly<Quat>): Quat {
  const length = Math.hypot(q[0], q[1], q[2], q[3]);
  if (length === 0) {
    out[0] = out[1] = out[2] = 0;
    out[3] = 1;
    return out;
  }
  for (let i = 0; i < 4; i++) out[i] = q[i] / length;
  return out;
}

export function dot(a: Readonly<Quat>, b: Readonly<Quat>): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2] + a[3] * b[3];
}

/**
 * Turns a vector by a unit quaternion: q v q*, by v + 2 u × (u × v + w v).
 *
 * @param out receives the turned vector; may be `v`
 */
export function rotate(out: Vec3, q: Readonly<Quat>, v: Readonly<Vec3>): Vec3 {
  const x = q[0];
  const y = q[1];
  const z = q[2];
  const w = q[3];
  const vx = v[0];
  const vy = v[1];
  const vz = v[2];
  const tx = 2 * (y * vz - z * vy);
  const ty = 2 * (z * vx - x * vz);
  const tz = 2 * (x * vy - y * vx);
  out[0] = vx + w * tx + y * tz - z * ty;
  out[1] = vy + w * ty + z * tx - x * tz;
  out[2] = vz + w * tz + x * ty - y * tx;
  return out;
}
