import { type Key, type Leg } from '#schemas/move';
import { DEG_PER_RAD } from '#shared/conventions';
import { compileMove } from '#shared/path/compile';
import { clampedSplineSlopes, writeCubic } from '#shared/path/cubic-spline';
import { cubic } from '#shared/path/leg-table';
import { angleBetween } from '#shared/rotation/angle-between';
import { joined, key } from '../../support/moves';
import { type ScipyCase, scipyCases } from '../../support/fixtures';

// Truth: SciPy 1.10.1, values in test/fixtures/scipy-reference.json, made by test/fixtures/scipy-reference.py.

const arc: Leg = { path: 'arc', ease: 'linear' };
const fairArc: Leg = { path: 'arc', ease: 'fair' };

/** Keys of a case; its times are seconds and need not be whole, which a compiled path does not mind. */
function keysOf(test: ScipyCase, leg: Leg): Key[] {
  return joined(
    test.keysYawPitchRollDeg.map(([yaw, pitch, roll], i) => key(test.times[i], { yaw, pitch, roll })),
    leg,
  );
}

/** Our arcs count whole turns and SciPy's do not: compare where no step of yaw or roll is more than half a turn. */
function turnsNowhere(test: ScipyCase): boolean {
  return test.keysYawPitchRollDeg.every((angles, i) => {
    const before = test.keysYawPitchRollDeg[i - 1] ?? angles;
    return Math.abs(angles[0] - before[0]) < 180 && Math.abs(angles[2] - before[2]) < 180;
  });
}

/** Our keys' pitch stays within ±90; two of SciPy's cases spell a pole by pitch beyond it. */
const cases = scipyCases.filter(turnsNowhere);

/** Largest angle between our poses and SciPy's orientations, degrees. */
function worstAngleDeg(test: ScipyCase, leg: Leg, truth: number[][]): number {
  const move = compileMove({ keys: keysOf(test, leg) });
  const pose = new Float64Array(6);
  return Math.max(
    ...test.sampleTimes.map((time, i) => angleBetween(move.poseAt(pose, time), truth[i]) * DEG_PER_RAD),
  );
}

describe('arc legs', () => {
  it.each(cases.map(test => [test.name, test] as const))('follow SciPy Slerp: %s', (_name, test) => {
    // Both sides are doubles; SciPy's numbers are printed to 13 digits.
    expect(worstAngleDeg(test, arc, test.slerp.q)).toBeLessThan(2e-10);
  });
});

describe('fair arc legs', () => {
  it.each(cases.map(test => [test.name, test] as const))('follow SciPy RotationSpline: %s', (name, test) => {
    // SciPy stops after ten rounds; on wild keys its own residual leaves about 1e-4 degrees (test/fixtures/README.md).
    const tolerance = /^random-(0[1-6])|near-pole|nonuniform|pole|pitched|360|middle/.test(name)
      ? 2e-5
      : 2e-4;
    expect(worstAngleDeg(test, fairArc, test.rotationSpline.q)).toBeLessThan(tolerance);
  });
});

describe('clamped cubic spline', () => {
  it.each(scipyCases.map(test => [test.name, test] as const))(
    'is SciPy CubicSpline with bc_type clamped: %s',
    (_name, test) => {
      const { times, fovKeys, sampleTimes } = test;
      const truth = test.fovCubicSpline['clamped'];
      const slopes = clampedSplineSlopes(times, fovKeys, 0, 0);
      const table = new Float64Array(4);
      sampleTimes.forEach((time, i) => {
        const leg = Math.max(
          times.findLastIndex(start => start <= time && start < times[times.length - 1]),
          0,
        );
        const duration = times[leg + 1] - times[leg];
        writeCubic(table, 0, fovKeys[leg], fovKeys[leg + 1], slopes[leg], slopes[leg + 1], duration);
        const s = (time - times[leg]) / duration;
        expect(cubic(table, 0, s)).toBeCloseTo(truth?.v[i] ?? NaN, 9);
        const slope = (3 * table[3] * s + 2 * table[2]) * s + table[1];
        expect(slope / duration).toBeCloseTo(truth?.d1[i] ?? NaN, 8);
      });
    },
  );
});
