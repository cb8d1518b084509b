import { POLE_SINE, type Quat, type Vec3 } from '#shared/conventions';

/**
 * Orientation of yaw, pitch and roll, "as built": Ry(−yaw) · Rx(pitch) · Rz(−roll) of the half angles, so that a whole
 * turn more gives the other sign.
 *
 * @param out receives a unit quaternion
 * @param yawRad, pitchRad, rollRad any finite numbers, not wrapped
 */
export function quatFromYawPitchRoll(out: Quat, yawRad: number, pitchRad: number, rollRad: number): Quat {
  const sy = -Math.sin(yawRad / 2);
  const cy = Math.cos(yawRad / 2);
  const sx = Math.sin(pitchRad / 2);
  const cx = Math.cos(pitchRad / 2);
  const sz = -Math.sin(rollRad / 2);
  const cz = Math.cos(rollRad / 2);
  out[0] = cy * sx * cz + sy * cx * sz;
  out[1] = sy * cx * cz - cy * sx * sz;
  out[2] = cy * cx * sz - sy * sx * cz;
  out[3] = cy * cx * cz + sy * sx * sz;
  return out;
}

/**
 * Yaw, pitch and roll of an orientation.
 *
 * @param out receives `[yaw, pitch, roll]` in radians; yaw and roll in [−π, π], pitch in [−π/2, π/2]
 * @param q unit quaternion
 * @param poleRollRad the roll to report while looking at a pole, where only yaw and roll together are known; yaw takes
 *   the rest
 */
export function yawPitchRollFromQuat(out: Vec3, q: Readonly<Quat>, poleRollRad = 0): Vec3 {
  const x = q[0];
  const y = q[1];
  const z = q[2];
  const w = q[3];
  // Columns of the rotation matrix: forward is the camera's −Z, right its +X, up its +Y.
  const forwardX = -2 * (x * z + w * y);
  const forwardY = -2 * (y * z - w * x);
  const forwardZ = 2 * (x * x + y * y) - 1;
  const level = Math.hypot(forwardX, forwardZ);
  out[1] = Math.atan2(forwardY, level);
  if (level < POLE_SINE) {
    const rightX = 1 - 2 * (y * y + z * z);
    const rightZ = 2 * (x * z - w * y);
    const turn = Math.atan2(rightZ, rightX);
    out[0] = forwardY > 0 ? turn + poleRollRad : turn - poleRollRad;
    out[2] = poleRollRad;
    return out;
  }
  const rightY = 2 * (x * y + w * z);
  const upY = 1 - 2 * (x * x + z * z);
  out[0] = Math.atan2(forwardX, -forwardZ);
  out[2] = Math.atan2(-rightY, upY);
  return out;
}
