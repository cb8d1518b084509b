import { largestShutterAngleDeg, shutterAngleDeg } from '#shared/capture/shutter';

/** Truth: arithmetic, as MATHS §8 lists it; half a turn at half the interval is how film cameras count. */
it.each([
  ['1/50 s at 24 frames a second', 1 / 50, 1 / 24, 1, 172.8],
  ['the same six times faster', 1 / 50, 1 / 24, 6, 28.8],
  ['1/24 s at 24 frames a second', 1 / 24, 1 / 24, 1, 360],
  ['the same six times faster', 1 / 24, 1 / 24, 6, 60],
  ['20 s every 25 s', 20, 25, 1, 288],
])('is known for %s', (_what, exposure, interval, speed, degrees) => {
  expect(shutterAngleDeg(exposure, interval, speed)).toBeCloseTo(degrees, 10);
});

it('can be no more than the whole interval allows', () => {
  expect(largestShutterAngleDeg(1)).toBe(360);
  expect(largestShutterAngleDeg(6)).toBe(60);
});
