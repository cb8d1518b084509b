import * as fc from 'fast-check';

import { type Ease } from '#schemas/move';
import { type SavedKey, type SavedMove } from '#schemas/saved-move';

/** A saved move around keys, made for one wide deliverable. */
export function savedWith(keys: SavedKey[], over: Partial<SavedMove> = {}): SavedMove {
  return {
    format: 'fairlead.saved-move',
    version: 1,
    title: 'Saved',
    deliverables: [{ name: 'Wide', width: 1920, height: 1080 }],
    keys,
    ...over,
  };
}

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const curve: fc.Arbitrary<Ease> = fc
  .tuple(number(0, 1), number(-9, 10), number(0, 1), number(-9, 10))
  .map(bezier => ({ bezier }));

/** Eases that have a way back. */
const ease: fc.Arbitrary<Ease> = fc.oneof(
  fc.constantFrom<Ease>('fair', 'linear', 'ease', 'ease-in', 'ease-out', 'ease-in-out'),
  curve,
);

const savedKey: fc.Arbitrary<SavedKey> = fc.record(
  {
    at: number(0.001, 0.999),
    yaw: number(-1000, 1000),
    pitch: number(-90, 90),
    roll: number(-500, 500),
    fov: number(10, 170),
    eye: number(0, 1),
    rest: fc.boolean(),
    leg: fc.record({ path: fc.constantFrom('arc', 'level'), ease }),
    extensions: fc.dictionary(fc.string({ maxLength: 3 }), fc.jsonValue({ maxDepth: 1 }), { maxKeys: 2 }),
  },
  { requiredKeys: ['at', 'yaw', 'pitch', 'roll', 'fov', 'eye', 'leg'] },
);

/** Makes drawn keys a valid row of keys: places from 0 to 1, yaw from 0, no leg at the last. */
function asRow(drawn: readonly SavedKey[]): SavedKey[] {
  const keys = [...drawn].sort((a, b) => a.at - b.at);
  return keys.map(({ leg, ...key }, i) => {
    const last = i === keys.length - 1;
    const placed = { ...key, at: i === 0 ? 0 : last ? 1 : key.at, yaw: i === 0 ? 0 : key.yaw };
    return last || !leg ? placed : { ...placed, leg };
  });
}

/** Valid saved moves with a way back, of any sort. */
export const savedMoves: fc.Arbitrary<SavedMove> = fc
  .tuple(
    fc.uniqueArray(savedKey, { minLength: 1, maxLength: 7, selector: key => key.at }),
    fc.record(
      {
        notes: fc.string(),
        tags: fc.array(fc.string({ minLength: 1 }), { maxLength: 3 }),
        author: fc.string(),
        licence: fc.constantFrom('CC-BY-4.0', 'CC0-1.0 OR MIT'),
        usual: number(0.1, 600),
        turns: number(-3, 3),
        extensions: fc.dictionary(fc.string({ maxLength: 3 }), fc.jsonValue({ maxDepth: 1 }), { maxKeys: 2 }),
      },
      { requiredKeys: [] },
    ),
  )
  .map(([keys, over]) => savedWith(asRow(keys), over));
