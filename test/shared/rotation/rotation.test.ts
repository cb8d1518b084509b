import fc from 'fast-check';
import { quat as glQuat } from 'gl-matrix';
import { Euler, Quaternion, Vector3 } from 'three';

import { RAD_PER_DEG } from '#shared/conventions';
import { angleBetween } from '#shared/rotation/angle-between';
import { multiply, rotate } from '#shared/rotation/quaternion';
import { quatFromRotationVector, rotationVectorFromQuat } from '#shared/rotation/rotation-vector';
import { slerp } from '#shared/rotation/slerp';
import { quatFromYawPitchRoll, yawPitchRollFromQuat } from '#shared/rotation/yaw-pitch-roll';

const angle = fc.double({ min: -Math.PI, max: Math.PI, noNaN: true });
const pitch = fc.double({ min: -1.57, max: 1.57, noNaN: true });
const orientation = fc.tuple(angle, pitch, angle).map(([y, p, r]) => {
  const q = new Float64Array(4);
  quatFromYawPitchRoll(q, y, p, r);
  return q;
});

// Truth: three.js, Euler order YXZ, which is Ry · Rx · Rz; our yaw and roll turn the other way (MATHS §1).
it('builds orientations as three.js does with Euler angles in order YXZ', () => {
  fc.assert(
    fc.property(angle, pitch, angle, (yaw, tilt, roll) => {
      const truth = new Quaternion().setFromEuler(new Euler(tilt, -yaw, -roll, 'YXZ'));
      const q = new Float64Array(4);
      quatFromYawPitchRoll(q, yaw, tilt, roll);
      expect(angleBetween(q, truth.toArray())).toBeLessThan(1e-12);
    }),
  );
});

// The words of MATHS §1: yaw looks right (+X), pitch looks up, roll leans the up vector right.
it('looks right with yaw, up with pitch, and leans right with roll', () => {
  const q = new Float64Array(4);
  const seen = (yaw: number, tilt: number, roll: number, v: number[]) => {
    quatFromYawPitchRoll(q, yaw * RAD_PER_DEG, tilt * RAD_PER_DEG, roll * RAD_PER_DEG);
    return [...rotate(new Float64Array(3), q, v)].map(part => Math.round(part * 1e12) / 1e12 + 0);
  };
  expect(seen(90, 0, 0, [0, 0, -1])).toEqual([1, 0, 0]);
  expect(seen(0, 90, 0, [0, 0, -1])).toEqual([0, 1, 0]);
  expect(seen(0, 0, 90, [0, 1, 0])).toEqual([1, 0, 0]);
});

it('reads its own angles back', () => {
  fc.assert(
    fc.property(angle, pitch, angle, (yaw, tilt, roll) => {
      const q = new Float64Array(4);
      quatFromYawPitchRoll(q, yaw, tilt, roll);
      const back = new Float64Array(3);
      yawPitchRollFromQuat(back, q);
      const again = new Float64Array(4);
      quatFromYawPitchRoll(again, back[0], back[1], back[2]);
      expect(angleBetween(q, again)).toBeLessThan(1e-9);
      expect(back[1]).toBeCloseTo(tilt, 9);
    }),
  );
});

it('keeps the roll that it is told while looking at a pole', () => {
  const q = new Float64Array(4);
  quatFromYawPitchRoll(q, 0.4, Math.PI / 2, 0.9);
  const back = new Float64Array(3);
  yawPitchRollFromQuat(back, q, 0.25);
  expect(back[2]).toBe(0.25);
  expect(back[0] - back[2]).toBeCloseTo(0.4 - 0.9, 9);
});

// Truth: gl-matrix 3.4.4 and three.js 0.187; both take the short way.
it('slerps as gl-matrix and three.js do', () => {
  fc.assert(
    fc.property(orientation, orientation, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, u) => {
      const out = new Float64Array(4);
      slerp(out, a, b, u);
      const gl = glQuat.slerp([0, 0, 0, 1], [a[0], a[1], a[2], a[3]], [b[0], b[1], b[2], b[3]], u);
      const three = new Quaternion(...a).slerp(new Quaternion(...b), u).normalize();
      fc.pre(angleBetween(a, b) < 3.1);
      expect(angleBetween(out, [...gl])).toBeLessThan(2e-6);
      expect(angleBetween(out, three.toArray())).toBeLessThan(2e-6);
      expect(Math.hypot(...out)).toBeCloseTo(1, 12);
    }),
  );
});

it('turns vectors as three.js does', () => {
  fc.assert(
    fc.property(orientation, q => {
      const truth = new Vector3(0.3, -0.5, 0.8).applyQuaternion(new Quaternion(...q));
      const out = rotate(new Float64Array(3), q, [0.3, -0.5, 0.8]);
      expect([...out]).toEqual(truth.toArray().map(part => expect.closeTo(part, 12)));
    }),
  );
});

it('measures angles that a dot product has lost', () => {
  const a = new Float64Array(4);
  const b = new Float64Array(4);
  quatFromYawPitchRoll(a, 0.3, 0.1, 0);
  quatFromYawPitchRoll(b, 0.3, 0.1 + 1e-9, 0);
  expect(angleBetween(a, b)).toBeCloseTo(1e-9, 15);
});

it('goes to a rotation vector and back', () => {
  fc.assert(
    fc.property(orientation, orientation, (a, b) => {
      const q = multiply(new Float64Array(4), a, b);
      const vector = rotationVectorFromQuat(new Float64Array(3), q);
      const back = quatFromRotationVector(new Float64Array(4), vector[0], vector[1], vector[2]);
      expect(angleBetween(back, q)).toBeLessThan(1e-9);
    }),
  );
});

it('multiplies into either of its operands', () => {
  const a = [0.1, 0.2, 0.3, 0.9];
  const b = [-0.4, 0.1, 0.2, 0.8];
  const apart = multiply([0, 0, 0, 0], a, b);
  const [into, other] = [[...a], [...b]];
  expect(multiply(into, into, b)).toEqual(apart);
  expect(multiply(other, a, other)).toEqual(apart);
});
