import fc from 'fast-check';

import { type Key, type MoveDocument } from '#schemas/move';
import { type Per } from '#shared/export/frames-table';
import { fullMove, quayMove } from '../../support/documents';
import { strays, fewest, poseOf, type Pose } from '../../support/even-arcs';
import {
  ARC,
  THIN,
  EACH,
  bake,
  csvOf,
  onto,
  imported,
  faultsOf,
  tableOf,
} from '../../support/frames-imports';
import { joined, key, moveWith } from '../../support/moves';

describe('thinned', () => {
  it.each<[string, Key[]]>([
    [
      'in all directions',
      [
        key(0, { yaw: 5, fov: 100 }),
        key(300, { yaw: 100, pitch: 30, fov: 60 }),
        key(500, { yaw: 60, pitch: -20, roll: 15, fov: 90, eye: 0.5 }),
        key(900, { yaw: -60, pitch: 10, fov: 90, eye: 0.2 }),
        key(1200, { yaw: 0, pitch: 60, roll: -30, fov: 45 }),
      ],
    ],
    [
      'with whole turns, tilting meanwhile',
      [
        key(0),
        key(400, { yaw: 500, pitch: 25 }),
        key(700, { yaw: 200, pitch: -25 }),
        key(1000, { yaw: 260, roll: 720 }),
        key(1300, { yaw: -700, pitch: 40, roll: 700 }),
      ],
    ],
  ])('a move of linear arcs %s comes back', (_what, keys) => {
    const move = moveWith(joined(keys, ARC));
    const { document, notes } = imported(csvOf(move), move, {
      ...THIN,
      angleDeg: 1e-5,
      fovDeg: 1e-5,
      eye: 1e-7,
    });
    expect(document.keys.map(each => each.frame)).toEqual(keys.map(each => each.frame));
    const names = ['yaw', 'pitch', 'roll', 'fov', 'eye'] as const;
    const wrong = document.keys.flatMap((got, i) =>
      names.filter(name => {
        const off = got[name] - keys[i][name];
        // Columns are counted on from frame to frame, so past a key they may be whole turns away; see below.
        return !(
          Math.abs(name === 'yaw' || name === 'roll' ? off - 360 * Math.round(off / 360) : off) < 1e-9
        );
      }),
    );
    expect(wrong).toEqual([]);
    expect(notes.filter(each => each.includes('Fewer'))).toEqual([]);
  });

  it('comes back from a wide tolerance too, as of equally few the closest rows are taken', () => {
    const frames = [0, 3000, 5000, 9000, 12000];
    const keys = frames.map((frame, i) =>
      key(frame, { yaw: [0, 100, 150, 20, 0][i], pitch: [0, 20, -20, 0, 30][i] }),
    );
    const move = moveWith(joined(keys, ARC));
    expect(imported(csvOf(move), move, THIN).document.keys.map(each => each.frame)).toEqual(frames);
  });

  it.each<[string, MoveDocument, Per]>([
    ['the quay', quayMove(), 'source'],
    ['the quay as delivered', quayMove(), 'delivered'],
    ['every member', fullMove(), 'source'],
  ])('%s is nowhere further off than the tolerance', (_what, move, per) => {
    const { document } = imported(csvOf(move, per), move, THIN);
    expect(strays(document.keys, bake(move, per).map(poseOf))).toEqual([]);
    expect(document.keys.length).toBeLessThan(bake(move, per).length / 5);
  });

  it('needs two keys for a level turn, however often it goes round', () => {
    const move = moveWith(
      joined([key(0, { pitch: -8 }), key(500, { yaw: 1080, pitch: -8 })], { path: 'level', ease: 'linear' }),
    );
    expect(imported(csvOf(move), move, THIN).document.keys).toMatchObject([{ yaw: 0 }, { yaw: 1080 }]);
  });

  it('keeps to rows between two source frames, though they cannot be keys', () => {
    const keys = joined([key(0), key(100, { yaw: 40, pitch: 30 }), key(201, { yaw: 90 })], {
      path: 'arc',
      ease: 'fair',
    });
    const move = moveWith(keys);
    const fast = { ...move, shot: { ...move.shot, speed: 1.5 } };
    const { document, notes } = imported(csvOf(fast, 'delivered'), fast, THIN);
    expect(document.keys.every(each => Number.isInteger(each.frame))).toBe(true);
    expect(strays(document.keys, bake(fast, 'delivered').map(poseOf))).toEqual([]);
    // Of 0, 1.5, 3, …, 201 every second is between two frames: 67 of 135.
    expect(notes).toEqual(['67 rows stand between two source frames and cannot be keys.']);
  });

  it('names the tolerances that would do where 2000 keys are not enough', () => {
    // 1° up and down from row to row: only legs of one row keep to it, and half of that width keeps to all.
    const zigzag = Array.from({ length: 2400 }, (_, frame) => key(frame, { pitch: frame % 2 }));
    const [fault] = faultsOf(tableOf(zigzag), onto(2400));
    expect(fault).toMatch(
      /^the table: cannot be thinned to 2000 keys within these tolerances; it can with \d+ times as much: /,
    );
    const factor = Number(/with (\d+) times/.exec(fault)?.[1]);
    const wider = { ...THIN, angleDeg: 0.05 * factor, fovDeg: 0.05 * factor, eye: 0.0005 * factor };
    expect(imported(tableOf(zigzag), onto(2400), wider).document.keys.length).toBeLessThanOrEqual(2000);
  });

  it('takes no tolerance of 0 or less', () => {
    expect(faultsOf(tableOf([key(0), key(1)]), onto(2), { ...THIN, eye: 0 })).toEqual([
      'the tolerances must be over 0',
    ]);
    expect(faultsOf(tableOf([key(0), key(1)]), onto(2), { ...THIN, angleDeg: NaN })).toHaveLength(1);
  });
});

describe('no smaller set of rows does', () => {
  const channel = (size: number) =>
    fc.array(fc.double({ min: -size, max: size, noNaN: true }), { minLength: 40, maxLength: 40 });
  const summed = (steps: readonly number[], start: number) => {
    let sum = start;
    return steps.map(step => (sum += step));
  };

  /** Straight stretches with knees, and a little noise of about the tolerance. */
  const walks = fc
    .record({
      length: fc.integer({ min: 1, max: 40 }),
      gaps: fc.array(fc.integer({ min: 1, max: 3 }), { minLength: 40, maxLength: 40 }),
      rates: fc.array(
        fc.tuple(...[30, 10, 20, 1, 0.01].map(size => fc.double({ min: -size, max: size, noNaN: true }))),
        {
          minLength: 5,
          maxLength: 5,
        },
      ),
      scale: fc.constantFrom(0.01, 0.1, 1),
      noise: channel(1),
      amount: fc.constantFrom(0, 0.01, 0.07),
    })
    .map(({ length, gaps, rates, scale, noise, amount }) => {
      const of = (which: number) => gaps.map((gap, i) => gap * scale * rates[Math.floor(i / 8)][which]);
      const [yaw, pitch, roll, zoom, eye] = [0, 1, 2, 3, 4].map(which => summed(of(which), 0));
      const frames = summed(gaps, 0);
      return Array.from({ length }, (_, i): Pose => ({
        frame: frames[i],
        yaw: yaw[i] + amount * noise[i],
        pitch: 85 * Math.sin(pitch[i] / 60) + amount * noise[39 - i],
        roll: roll[i],
        fov: 90 + 40 * Math.sin(zoom[i] / 20),
        eye: 0.5 + 0.4 * Math.sin(eye[i]),
      }));
    });

  /** Truth: all pairs of rows, by three.js (`fewest`). */
  it('of random rows, by all pairs', () => {
    fc.assert(
      fc.property(walks, rows => {
        const { document } = imported(tableOf(rows), onto(200), THIN);
        expect(strays(document.keys, rows)).toEqual([]);
        expect(document.keys.length).toBeGreaterThanOrEqual(fewest(rows, 1e-9));
        expect(document.keys.length).toBeLessThanOrEqual(fewest(rows, -1e-9));
      }),
      { numRuns: 300 },
    );
  });

  const number = (size: number) => fc.integer({ min: -size, max: size });
  const moves = fc
    .record({
      poses: fc.array(fc.tuple(number(900), number(85), number(400), fc.integer({ min: 30, max: 150 })), {
        minLength: 4,
        maxLength: 4,
      }),
      calm: fc.constantFrom(1, 0.2, 0.03),
      leg: fc.constantFrom(
        ARC,
        { path: 'arc', ease: 'fair' } as const,
        { path: 'level', ease: 'ease' } as const,
      ),
      second: fc.integer({ min: 20, max: 80 }),
    })
    .map(({ poses, calm, leg, second }) => {
      const frames = [0, second, 90, 140];
      const keys = poses.map(([yaw, pitch, roll, fov], i) =>
        key(frames[i], {
          yaw: calm * yaw,
          pitch: calm * pitch,
          roll: calm * roll,
          fov: 90 + calm * (fov - 90),
        }),
      );
      return moveWith(joined(keys, leg));
    });

  it('of baked moves, by all pairs', () => {
    fc.assert(
      fc.property(moves, move => {
        const each = imported(csvOf(move), move, EACH).document.keys;
        const { document } = imported(csvOf(move), move, THIN);
        expect(strays(document.keys, each)).toEqual([]);
        expect(document.keys.length).toBeGreaterThanOrEqual(fewest(each, 1e-9));
        expect(document.keys.length).toBeLessThanOrEqual(fewest(each, -1e-9));
      }),
      { numRuns: 25 },
    );
  }, 60_000);
});

/** Noise of just about the tolerance over a long table is what the search cannot finish: it says so and gives a good answer. */
it('says where it did not try every choice, and keeps within the tolerance', () => {
  let state = 1;
  const noise = () => (state = (state * 16807) % 2147483647) / 2147483647 - 0.5;
  const rows = Array.from({ length: 20_000 }, (_, frame) =>
    key(frame, { yaw: frame / 100, pitch: 0.094 * noise() }),
  );
  const { document, notes } = imported(tableOf(rows), onto(20_000), THIN);
  expect(notes).toEqual(['Fewer keys may do: the table is too long and too uneven to try every choice.']);
  expect(strays(document.keys, rows)).toEqual([]);
}, 60_000);
