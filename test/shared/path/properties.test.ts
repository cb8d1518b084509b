import fc from 'fast-check';

import { type Key } from '#schemas/move';
import { compileMove } from '#shared/path/compile';
import { type CompiledMove, POSE_SIZE } from '#shared/path/compiled-move';
import { maxFovRad } from '#shared/projection/field-of-view';
import { angleBetween } from '#shared/rotation/angle-between';
import { conjugate, dot, multiply } from '#shared/rotation/quaternion';
import { rotationVectorFromQuat } from '#shared/rotation/rotation-vector';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { EXTREME, validKeys } from '../../support/valid-keys';

/** What must always hold, by the definition of the paths alone. */
const RAD = Math.PI / 180;

const poseAt = (move: CompiledMove, frame: number) =>
  move.poseAt(new Float64Array(POSE_SIZE), frame) as Float64Array;

const share = fc.double({ min: -0.1, max: 1.1, noNaN: true });

const frameAt = (move: CompiledMove, part: number) =>
  move.firstFrame + part * (move.lastFrame - move.firstFrame);

it('keys are met', () => {
  fc.assert(
    fc.property(validKeys(EXTREME), keys => {
      const move = compileMove({ keys });
      for (const { frame, yaw, pitch, roll, fov, eye } of keys) {
        const pose = poseAt(move, frame);
        const built = quatFromYawPitchRoll(new Float64Array(4), yaw * RAD, pitch * RAD, roll * RAD);
        expect(angleBetween(pose, built)).toBeLessThanOrEqual(1e-9);
        expect(Math.abs(pose[4] - fov * RAD)).toBeLessThanOrEqual(1e-9);
        expect(Math.abs(pose[5] - eye)).toBeLessThanOrEqual(1e-12);
      }
    }),
    { numRuns: 1500 },
  );
});

it('quaternions are unit, lenses within their limits, nothing is NaN, wherever it is asked for', () => {
  fc.assert(
    fc.property(validKeys(EXTREME), fc.array(share, { minLength: 20, maxLength: 20 }), (keys, parts) => {
      const move = compileMove({ keys });
      const angles = new Float64Array(3);
      for (const part of parts) {
        const pose = poseAt(move, frameAt(move, part));
        expect(Math.abs(Math.hypot(pose[0], pose[1], pose[2], pose[3]) - 1)).toBeLessThanOrEqual(1e-12);
        expect(pose[5] >= 0 && pose[5] <= 1).toBe(true);
        expect(pose[4] >= 10 * RAD - 1e-9 && pose[4] <= maxFovRad(pose[5]) + 1e-9).toBe(true);
        move.anglesAt(angles, frameAt(move, part));
        expect(angles.every(Number.isFinite)).toBe(true);
      }
    }),
    { numRuns: 400 },
  );
});

it('a pose is the same whatever was asked for before', () => {
  fc.assert(
    fc.property(validKeys(EXTREME), fc.array(share, { minLength: 2, maxLength: 30 }), (keys, parts) => {
      const used = compileMove({ keys });
      for (const part of parts) {
        const frame = frameAt(used, part);
        expect(poseAt(used, frame)).toEqual(poseAt(compileMove({ keys }), frame));
      }
    }),
    { numRuns: 300 },
  );
});

it('the quaternion’s sign never flips: along a leg it is continuous, at a key it goes on', () => {
  const gentle = validKeys({ turnDeg: 400, pitchDeg: 90, frames: [40, 400] });
  fc.assert(
    fc.property(gentle, share, (keys, part) => {
      const move = compileMove({ keys });
      const frame = frameAt(move, part);
      expect(dot(poseAt(move, frame), poseAt(move, frame + 1e-6))).toBeGreaterThan(-1e-9);
      for (const each of keys.slice(1))
        expect(dot(poseAt(move, each.frame - 1e-9), poseAt(move, each.frame))).toBeGreaterThan(-1e-9);
    }),
    { numRuns: 1500 },
  );
});

describe('fair joints', () => {
  const H = 0.02;

  /** Rate and acceleration of a curve through 0 at its start, from values at ±H, ±2H, ±3H: one-sided, second order. */
  function oneSided(values: readonly Float64Array[], step: number): [Float64Array, Float64Array] {
    const [a, b, c] = values;
    return [
      a.map((_, k) => (18 * a[k] - 9 * b[k] + 2 * c[k]) / (6 * step)),
      a.map((_, k) => (-5 * a[k] + 4 * b[k] - c[k]) / (step * step)),
    ];
  }

  /** The turn from the key's pose in the camera's axes, and what the lens has changed by. */
  function change(move: CompiledMove, at: Float64Array, frame: number): Float64Array {
    const pose = poseAt(move, frame);
    const way = multiply(new Float64Array(4), conjugate(new Float64Array(4), at), pose);
    const sign = way[3] < 0 ? -1 : 1;
    const turn = rotationVectorFromQuat(
      new Float64Array(3),
      Float64Array.from(way, part => sign * part),
    );
    const zoom = (fov: number) => Math.log(Math.tan(fov / 4));
    return Float64Array.of(turn[0], turn[1], turn[2], zoom(pose[4]) - zoom(at[4]), pose[5] - at[5]);
  }

  const isClamped = (move: CompiledMove, frame: number): boolean =>
    [-3, -2, -1, 0, 1, 2, 3].some(i => {
      const [, , , , fov, eye] = poseAt(move, frame + i * H);
      return fov <= 10 * RAD + 1e-6 || fov >= maxFovRad(eye) - 1e-6 || eye <= 1e-9 || eye >= 1 - 1e-9;
    });

  const isInnerJoint = (keys: readonly Key[], i: number): boolean => {
    const [before, here] = [keys[i - 1].leg, keys[i].leg];
    return (
      before?.ease === 'fair' && here?.ease === 'fair' && before.path === here.path && keys[i].rest !== true
    );
  };

  const fair = (path: 'arc' | 'level') =>
    validKeys({
      turnDeg: 170,
      pitchDeg: 85,
      frames: [20, 200],
      fovDeg: [60, 100],
      eye: [0.3, 0.7],
      rest: fc.integer({ min: 0, max: 5 }).map(drawn => drawn === 0),
      least: 3,
      leg: fc.constant({ path, ease: 'fair' as const }),
    });

  it.each(['level', 'arc'] as const)('of %s legs have one rate and one acceleration', path => {
    let joints = 0;
    fc.assert(
      fc.property(fair(path), keys => {
        const move = compileMove({ keys });
        if (move.runs.some(run => run.fellBack)) return;
        keys.slice(1, -1).forEach(({ frame }, inner) => {
          if (!isInnerJoint(keys, inner + 1) || isClamped(move, frame)) return;
          joints++;
          const at = poseAt(move, frame);
          const side = (sign: number) =>
            oneSided(
              [1, 2, 3].map(i => change(move, at, frame + sign * i * H)),
              sign * H,
            );
          const [[rateBefore, bendBefore], [rateAfter, bendAfter]] = [side(-1), side(1)];
          // The joint is as smooth as the run is lively: what a leg turns in its time.
          const lively = Math.max(...rateBefore.map(Math.abs), ...bendBefore.map(Math.abs), 1e-3);
          for (let k = 0; k < 5; k++) {
            expect(Math.abs(rateAfter[k] - rateBefore[k])).toBeLessThan(1e-5 * lively);
            expect(Math.abs(bendAfter[k] - bendBefore[k])).toBeLessThan(2e-2 * lively);
          }
        });
      }),
      { numRuns: 500 },
    );
    expect(joints).toBeGreaterThan(200);
  });
});

it('a mirrored move is the reflection, and the mirror of the mirror is the move', () => {
  const mirrored = (keys: readonly Key[]): Key[] =>
    keys.map(each => ({ ...each, yaw: -each.yaw, roll: -each.roll }));
  fc.assert(
    fc.property(validKeys({ turnDeg: 900, pitchDeg: 90, frames: [5, 300] }), share, (keys, part) => {
      const move = compileMove({ keys });
      const frame = frameAt(move, part);
      const there = poseAt(move, frame);
      const mirror = poseAt(compileMove({ keys: mirrored(keys) }), frame);
      const back = poseAt(compileMove({ keys: mirrored(mirrored(keys)) }), frame);
      // A reflection in the plane through the zenith and straight ahead takes (x, y, z, w) to (x, −y, −z, w).
      expect(angleBetween([mirror[0], -mirror[1], -mirror[2], mirror[3]], there)).toBeLessThan(1e-7);
      expect(angleBetween(back, there)).toBeLessThan(1e-12);
    }),
    { numRuns: 1000 },
  );
});

describe('the yaw column', () => {
  const steps = 4;

  /** Largest step of yaw inside the legs, from quarter frame to quarter frame, degrees; and how near the course comes to a pole. */
  function walked(keys: readonly Key[], from: number): { step: number; poleDeg: number } {
    const move = compileMove({ keys: [...keys] });
    const [before, after] = [new Float64Array(3), new Float64Array(3)];
    const { frame } = keys[from];
    const length = keys[from + 1].frame - frame;
    let step = 0;
    let poleDeg = 90;
    for (let i = 0; i + 1 < length * steps; i++) {
      move.anglesAt(before, frame + i / steps);
      move.anglesAt(after, frame + (i + 1) / steps);
      step = Math.max(step, Math.abs(after[0] - before[0]));
      poleDeg = Math.min(poleDeg, 90 - Math.abs(after[1]), 90 - Math.abs(before[1]));
    }
    return { step, poleDeg };
  }

  // Slow enough that a step at 1° from a pole stays well under half a turn: 400° in 400 frames are 1°/frame at most thrice
  // over in a spline's middle, and yaw runs at most 57 times as fast.
  const slow = { turnDeg: 200, pitchDeg: 80, frames: [400, 800] as const };

  it.each(['level', 'arc'] as const)('is continuous on %s legs', path => {
    let legs = 0;
    fc.assert(
      fc.property(
        validKeys({
          ...slow,
          leg: fc.record({
            path: fc.constant(path),
            ease: fc.constantFrom('fair' as const, 'linear' as const, 'ease' as const),
          }),
        }),
        keys => {
          keys.slice(0, -1).forEach((_, from) => {
            const { step, poleDeg } = walked(keys, from);
            if (path === 'arc' && poleDeg < 1) return;
            legs++;
            expect(step).toBeLessThan(90);
          });
        },
      ),
      { numRuns: 15 },
    );
    expect(legs).toBeGreaterThan(10);
  });
});
