import fc from 'fast-check';

import { deliveredFrameCount, deliveredSeconds, sourceFrameOfDelivered } from '#shared/time/delivered-time';

const RATE = { num: 24, den: 1 };

// Arithmetic (MATHS §4).
it('counts delivered frames: 1441 at six times the speed give 241', () => {
  const times = { rate: RATE, speed: 6, from: 0, to: 1440 };
  expect(deliveredFrameCount(times)).toBe(241);
  expect(sourceFrameOfDelivered(times, 240)).toBe(1440);
  expect(deliveredSeconds(times, 1440)).toBe(10);
});

it('does not lose the last frame to the noise of a decimal speed', () => {
  // 0.3 / 0.1 is 2.9999999999999996 in binary.
  expect(deliveredFrameCount({ rate: RATE, speed: 0.1, from: 0, to: 3 })).toBe(31);
});

it('never leaves the delivered range', () => {
  const speed = fc.double({ min: 0.01, max: 10_000, noNaN: true });
  fc.assert(
    fc.property(speed, fc.nat(1000), fc.nat(1000), (times, from, length) => {
      const shot = { rate: RATE, speed: times, from, to: from + length };
      const last = deliveredFrameCount(shot) - 1;
      expect(sourceFrameOfDelivered(shot, last)).toBeLessThanOrEqual(shot.to);
      expect(sourceFrameOfDelivered(shot, last) + times).toBeGreaterThan(shot.to - 1e-6);
    }),
  );
});
