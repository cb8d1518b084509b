import fc from 'fast-check';
import { PerspectiveCamera, Quaternion, Vector3 } from 'three';

import { RAD_PER_DEG } from '#shared/conventions';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { lookHolding, nearest, worldDirection, zoomed } from '../../../src/app/designer/framed-view/grab';
import { type Look } from '../../../src/app/designer/state/commands';

const AHEAD: Look = { yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 };

function poseOf({ yaw, pitch, roll }: Look): Float64Array {
  const pose = new Float64Array(6);
  quatFromYawPitchRoll(pose, yaw * RAD_PER_DEG, pitch * RAD_PER_DEG, roll * RAD_PER_DEG);
  return pose;
}

// Truth: a three.js PerspectiveCamera turned by the same quaternion, its own projection matrix.
it('finds the direction under a point as three.js unprojects it', () => {
  const look: Look = { yaw: 30, pitch: -10, roll: 5, fov: 70, eye: 0 };
  const [width, height] = [16, 9];
  const verticalDeg = (2 * Math.atan(Math.tan((35 * Math.PI) / 180) * (height / width)) * 180) / Math.PI;
  const camera = new PerspectiveCamera(verticalDeg, width / height);
  camera.quaternion.copy(new Quaternion(...poseOf(look).subarray(0, 4)));
  camera.updateMatrixWorld();
  const truth = new Vector3(0.4, -0.6, 0.5).unproject(camera).normalize();
  const direction = worldDirection({ x: 0.4, y: (-0.6 * height) / width }, look, poseOf(look));
  expect([...direction]).toEqual([truth.x, truth.y, truth.z].map(part => expect.closeTo(part, 12)));
});

it('keeps what was grabbed under the pointer', () => {
  const share = fc.double({ min: -0.5, max: 0.5, noNaN: true });
  const point = fc.record({ x: share, y: share });
  const look = fc.record({
    yaw: fc.double({ min: -400, max: 400, noNaN: true }),
    pitch: fc.double({ min: -20, max: 20, noNaN: true }),
    roll: fc.double({ min: -40, max: 40, noNaN: true }),
    fov: fc.double({ min: 20, max: 60, noNaN: true }),
    eye: fc.double({ min: 0, max: 1, noNaN: true }),
  });
  fc.assert(
    fc.property(look, point, point, (from, grabbed, to) => {
      const world = worldDirection(grabbed, from, poseOf(from));
      const after = lookHolding(world, to, from);
      const held = worldDirection(to, after, poseOf(after));
      expect(Math.hypot(...held.map((part, i) => part - world[i]))).toBeLessThan(1e-9);
      expect(after.roll).toBe(from.roll);
      expect(Math.abs(after.yaw - from.yaw)).toBeLessThanOrEqual(180);
    }),
  );
});

it('never looks beyond a pole, and gives numbers where the grabbed point is out of reach', () => {
  const world = new Float64Array([0, 1, 0]);
  const look = lookHolding(world, { x: 0.9, y: -0.5 }, { ...AHEAD, pitch: 80 });
  expect(Math.abs(look.pitch)).toBeLessThanOrEqual(90);
  expect(Number.isFinite(look.yaw)).toBe(true);
});

it('zooms within the limits of the eye point', () => {
  // MATHS §2: 10° to 170° at eye point 0, to 330° at 1.
  expect(zoomed(AHEAD, 1e9).fov).toBeCloseTo(170, 9);
  expect(zoomed({ ...AHEAD, eye: 1 }, 1e9).fov).toBeCloseTo(330, 9);
  expect(zoomed(AHEAD, 1e-9).fov).toBeCloseTo(10, 9);
});

it('takes the nearest spelling of an angle', () => {
  expect(nearest(-170, 540)).toBe(550);
  expect(nearest(10, 0)).toBe(10);
});
