import fc from 'fast-check';

import { type Key, type Leg } from '#schemas/move';
import { compileMove } from '#shared/path/compile';
import { Rates, RATES_SIZE } from '#shared/path/rates';
import { conjugate, multiply } from '#shared/rotation/quaternion';
import { rotationVectorFromQuat } from '#shared/rotation/rotation-vector';
import { joined, key } from '../../support/moves';
import { type ScipyCase, scipyCases } from '../../support/fixtures';

// Truth: SciPy 1.10.1, angular rate and acceleration of RotationSpline in the body's axes (test/fixtures/README.md). Its
// solver stops after ten rounds, so wild cases are left to the differences below.
const settled = scipyCases.filter(test =>
  /^random-0[1-6]|360-[45]|pitched|middle|near-pole|nonuniform/.test(test.name),
);

function keysOf(test: ScipyCase, leg: Leg): Key[] {
  return joined(
    test.keysYawPitchRollDeg.map(([yaw, pitch, roll], i) => key(test.times[i], { yaw, pitch, roll })),
    leg,
  );
}

it.each(settled.map(test => [test.name, test] as const))(
  'are those of SciPy RotationSpline: %s',
  (_name, test) => {
    const rates = new Rates(compileMove({ keys: keysOf(test, { path: 'arc', ease: 'fair' }) }));
    const out = new Float64Array(RATES_SIZE);
    const scale = Math.max(1, ...test.rotationSpline.alpha.flat().map(Math.abs));
    test.sampleTimes.forEach((time, i) => {
      rates.at(out, time);
      for (let k = 0; k < 3; k++) {
        expect(Math.abs(out[k] - test.rotationSpline.omega[i][k])).toBeLessThan(2e-6 * scale);
        expect(Math.abs(out[3 + k] - test.rotationSpline.alpha[i][k])).toBeLessThan(2e-4 * scale);
      }
    });
  },
);

const number = (least: number, most: number) => fc.double({ min: least, max: most, noNaN: true });

const anyLeg: fc.Arbitrary<Leg> = fc.record({
  path: fc.constantFrom('level' as const, 'arc' as const),
  ease: fc.oneof(
    fc.constantFrom('fair' as const, 'linear' as const, 'ease-in-out' as const),
    fc.record({ bezier: fc.tuple(number(0.1, 0.9), number(-1, 2), number(0.1, 0.9), number(-1, 2)) }),
  ),
});

const anyKeys = fc
  .array(
    fc.record({
      yaw: number(-800, 800),
      pitch: number(-80, 80),
      roll: number(-400, 400),
      fov: number(30, 120),
      rest: fc.boolean(),
    }),
    {
      minLength: 2,
      maxLength: 5,
    },
  )
  .chain(looks =>
    fc.tuple(fc.constant(looks), fc.array(anyLeg, { minLength: looks.length, maxLength: looks.length })),
  )
  .map(([looks, legs]) =>
    looks.map((look, i): Key => ({
      ...key(40 * i, look),
      ...(i < looks.length - 1 ? { leg: legs[i] } : {}),
    })),
  );

// The definition: the body's rate is the rotation vector of q(t − h)* q(t + h) over 2h, its acceleration the difference of
// rates; central differences with an error of h² and rounding over h.
it('agree with differences of poses and of themselves on every sort of leg', () => {
  const h = 1e-3;
  fc.assert(
    fc.property(anyKeys, number(0.02, 0.98), (keys, share) => {
      const move = compileMove({ keys });
      const rates = new Rates(move);
      const frame = share * move.lastFrame;
      fc.pre(Math.abs(frame - 40 * Math.round(frame / 40)) > 2 * h);
      const pose = (f: number) => move.poseAt(new Float64Array(6), f) as Float64Array;
      const at = (f: number) => rates.at(new Float64Array(RATES_SIZE), f);
      const way = multiply(
        new Float64Array(4),
        conjugate(new Float64Array(4), pose(frame - h)),
        pose(frame + h),
      );
      const turned = rotationVectorFromQuat(new Float64Array(3), way);
      const here = at(frame);
      const [before, after] = [at(frame - h), at(frame + h)];
      const size = Math.hypot(here[0], here[1], here[2]);
      const bend = Math.hypot(here[3], here[4], here[5]);
      for (let k = 0; k < 3; k++) {
        expect(Math.abs(turned[k] / (2 * h) - here[k])).toBeLessThan(1e-7 + 1e-5 * (size + bend));
        expect(Math.abs((after[k] - before[k]) / (2 * h) - here[3 + k])).toBeLessThan(
          1e-7 + 1e-4 * (size + bend),
        );
      }
    }),
    { numRuns: 300 },
  );
});

it('are zero outside the keys, and those of the leg that ends at the last key', () => {
  const rates = new Rates(
    compileMove({ keys: joined([key(10), key(20, { yaw: 90 })], { path: 'level', ease: 'linear' }) }),
  );
  const speed = (frame: number) => rates.at(new Float64Array(RATES_SIZE), frame)[1];
  // 90° in 10 frames to the right is a turn about the camera's −Y.
  expect(speed(20)).toBeCloseTo(-Math.PI / 20, 12);
  expect(speed(9.9)).toBe(0);
  expect(speed(20.1)).toBe(0);
});

it('are not finite where an ease is vertical', () => {
  const rates = new Rates(
    compileMove({
      keys: joined([key(0), key(20, { yaw: 90 })], { path: 'level', ease: { bezier: [0, 1, 0.5, 1] } }),
    }),
  );
  expect(Number.isFinite(rates.at(new Float64Array(RATES_SIZE), 0)[1])).toBe(false);
});
