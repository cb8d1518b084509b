import fc from 'fast-check';

import { type Key, type Leg } from '#schemas/move';
import { key } from './moves';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

export const anyLeg: fc.Arbitrary<Leg> = fc.record({
  path: fc.constantFrom('arc' as const, 'level' as const),
  ease: fc.oneof(
    { weight: 3, arbitrary: fc.constant('fair' as const) },
    fc.constantFrom('linear' as const, 'hold' as const, 'ease' as const, 'ease-in-out' as const),
    fc.record({ bezier: fc.tuple(number(0, 1), number(-10, 10), number(0, 1), number(-10, 10)) }),
  ),
});

export interface KeyRanges {
  readonly turnDeg: number;
  readonly pitchDeg: number;
  /** Fewest and most frames from key to key. */
  readonly frames: readonly [number, number];
  readonly leg?: fc.Arbitrary<Leg>;
  readonly fovDeg?: readonly [number, number];
  readonly eye?: readonly [number, number];
  readonly rest?: fc.Arbitrary<boolean>;
  /** Fewest keys. */
  readonly least?: number;
}

/** All that the document allows, also where it is wild. */
export const EXTREME: KeyRanges = { turnDeg: 36_000, pitchDeg: 90, frames: [1, 2000], fovDeg: [10, 330] };

/** Rows of keys that a document may have: within its ranges, at rising frames, legs on all but the last. */
export function validKeys(ranges: KeyRanges): fc.Arbitrary<Key[]> {
  const { turnDeg, pitchDeg, frames, leg = anyLeg, fovDeg = [40, 120], eye = [0, 1] } = ranges;
  const drawn = fc.record({
    gap: fc.integer({ min: frames[0], max: frames[1] }),
    yaw: fc.oneof(number(-turnDeg, turnDeg), fc.constantFrom(0, 180, -180)),
    pitch: fc.oneof(number(-pitchDeg, pitchDeg), fc.constantFrom(0, pitchDeg, -pitchDeg)),
    roll: number(-turnDeg, turnDeg),
    fov: number(...fovDeg),
    eye: number(...eye),
    rest: ranges.rest ?? fc.boolean(),
    leg,
  });
  return fc.array(drawn, { minLength: ranges.least ?? 1, maxLength: 7 }).map((all): Key[] => {
    let frame = 0;
    return all.map(({ gap, leg: travel, fov, ...each }, i) => {
      if (i > 0) frame += gap;
      const widest = Math.min(330, (360 * Math.acos(-each.eye)) / Math.PI - 10);
      const placed = key(frame, { ...each, fov: Math.min(fov, widest) });
      return i === all.length - 1 ? placed : { ...placed, leg: travel };
    });
  });
}
