import fc from 'fast-check';

import { sineCosines } from '#shared/rotation/sine-cosines';

const angles = fc.oneof(
  fc.double({ min: -10, max: 10, noNaN: true }),
  fc.double({ min: -1e5, max: 1e5, noNaN: true }),
  fc.integer({ min: -2000, max: 2000 }).map(steps => (steps * Math.PI) / 256),
);

/** Truth: Math.sin and Math.cos, which are within a unit of the last place, 1.1e-16. */
it('gives sines and cosines to the last digits, several at once', () => {
  const out = new Float64Array(6);
  fc.assert(
    fc.property(fc.tuple(angles, angles, angles), three => {
      sineCosines(out, Float64Array.from(three), 3);
      three.forEach((angle, i) => {
        expect(Math.abs(out[2 * i] - Math.sin(angle))).toBeLessThan(3.4e-16);
        expect(Math.abs(out[2 * i + 1] - Math.cos(angle))).toBeLessThan(3.4e-16);
      });
    }),
    { numRuns: 4000 },
  );
});

it('takes angles beyond its table’s reach, and none that is no number', () => {
  const out = new Float64Array(6);
  sineCosines(out, Float64Array.of(1e9, -123_456_789.5, NaN), 3);
  expect([...out]).toEqual([
    Math.sin(1e9),
    Math.cos(1e9),
    Math.sin(-123_456_789.5),
    Math.cos(-123_456_789.5),
    NaN,
    NaN,
  ]);
});
