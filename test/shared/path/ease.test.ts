import bezierEasing from 'bezier-easing';
import fc from 'fast-check';

import { type Ease } from '#schemas/move';
import { compileMove } from '#shared/path/compile';
import { joined, key } from '../../support/moves';
import { jsonFixture } from '../../support/fixtures';

/** Progress of an ease, read off a level leg of 100° in 100 frames. */
function progress(ease: Ease): (t: number) => number {
  const move = compileMove({ keys: joined([key(0), key(100, { yaw: 100 })], { path: 'level', ease }) });
  const angles = new Float64Array(3);
  return t => move.anglesAt(angles, 100 * t)[0] / 100;
}

interface ChromiumCurve {
  readonly c: [number, number, number, number];
  readonly v: number[];
}

// Truth: Chromium 156's getComputedTiming().progress, within 2.3e-7 of exact (test/fixtures/README.md).
it.each(
  jsonFixture<{ out: ChromiumCurve[] }>('bezier-chromium.json').out.map(
    ({ c, v }) => [c.join(', '), c, v] as const,
  ),
)('runs as cubic-bezier(%s) does in a browser', (name, bezier, values) => {
  const at = progress({ bezier });
  // Straight up at the middle: every solver's worst case (STACK-REFERENCES).
  const digits = name === '1, 0, 0, 1' ? 4 : 6;
  values.forEach((value, i) => expect(at(i / (values.length - 1))).toBeCloseTo(value, digits));
});

// CSS Easing Functions Level 1, 2.3.1: the keywords are these curves.
it.each([
  ['ease', [0.25, 0.1, 0.25, 1]],
  ['ease-in', [0.42, 0, 1, 1]],
  ['ease-out', [0, 0, 0.58, 1]],
  ['ease-in-out', [0.42, 0, 0.58, 1]],
] as const)('knows the keyword %s', (ease, [x1, y1, x2, y2]) => {
  const at = progress(ease);
  const truth = bezierEasing(x1, y1, x2, y2);
  for (let i = 0; i <= 50; i++) expect(at(i / 50)).toBeCloseTo(truth(i / 50), 12);
});

// CSS Easing Functions Level 1, examples (MATHS §8).
it('gives the published values at the middle', () => {
  expect(progress('ease-in-out')(0.5)).toBeCloseTo(0.5, 12);
  expect(progress('ease')(0.5)).toBeCloseTo(0.8024, 4);
});

it('solves any curve: x(p) = t by its own polynomial', () => {
  const x = fc.double({ min: 0.01, max: 0.99, noNaN: true });
  const y = fc.double({ min: -2, max: 2, noNaN: true });
  fc.assert(
    fc.property(x, y, x, y, fc.double({ min: 0, max: 1, noNaN: true }), (x1, y1, x2, y2, p) => {
      const cubic = (a: number, b: number) => 3 * (1 - p) ** 2 * p * a + 3 * (1 - p) * p ** 2 * b + p ** 3;
      expect(progress({ bezier: [x1, y1, x2, y2] })(cubic(x1, x2))).toBeCloseTo(cubic(y1, y2), 8);
    }),
  );
});

it('holds the first key until the frame of the second', () => {
  const at = progress('hold');
  expect([at(0), at(0.5), at(0.999999), at(1)]).toEqual([0, 0, 0, 1]);
});
