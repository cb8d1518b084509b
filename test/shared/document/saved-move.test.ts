import * as fc from 'fast-check';

import { type MoveDocument } from '#schemas/move';
import { type SavedMove } from '#schemas/saved-move';
import { type Application, applySavedMove, PLAIN } from '#shared/document/apply-saved-move';
import { cutDifference } from '#shared/document/cut-difference';
import { saveMove } from '#shared/document/save-move';
import { checkSavedMove } from '#shared/document/saved-move';
import { firstCollision, shortestRange } from '#shared/document/saved-places';
import { serialiseMove, serialiseSavedMove } from '#shared/document/serialise';
import { checkMove } from '#shared/document/validate';
import { compileMove } from '#shared/path/compile';
import { angleBetween } from '#shared/rotation/angle-between';
import { changed, fullMove, quayMove } from '../../support/documents';
import { joined, key, moveWith } from '../../support/moves';
import { savedMoves, savedWith } from '../../support/saved-moves';

/** Expected values: the format's description of saved moves, and arithmetic. */
const LONG = moveWith([key(0)], {
  shot: { ...quayMove().shot, frames: 10_000_000, from: 0, to: 9_999_999 },
});

function put(saved: SavedMove, how: Partial<Application> = {}, onto: MoveDocument = LONG): MoveDocument {
  const checked = applySavedMove(saved, onto, { ...PLAIN, firstFrame: 0, lastFrame: 1000, ...how });
  if (!checked.ok) throw new Error(JSON.stringify(checked.faults));
  return checked.document;
}

function saved(document: MoveDocument, firstKey = 0, lastKey = document.keys.length - 1): SavedMove {
  const checked = saveMove(document, { firstKey, lastKey });
  if (!checked.ok) throw new Error(JSON.stringify(checked.faults));
  return checked.document;
}

const faultsOf = (how: Partial<Application>, move: SavedMove, onto: MoveDocument = LONG) => {
  const checked = applySavedMove(move, onto, { ...PLAIN, firstFrame: 0, lastFrame: 1000, ...how });
  return checked.ok ? [] : checked.faults;
};

const three = savedWith([
  { at: 0, yaw: 0, pitch: 10, roll: 5, fov: 90, eye: 0, leg: { path: 'level', ease: 'ease-in' } },
  { at: 0.25, yaw: 40, pitch: 20, roll: 0, fov: 60, eye: 0, leg: { path: 'arc', ease: 'ease' } },
  { at: 1, yaw: 100, pitch: -10, roll: -5, fov: 45, eye: 0 },
]);

describe('saving the described move', () => {
  const move = saved(quayMove());

  it('keeps keys by their place, yaw from the first, and the deliverables', () => {
    expect(checkSavedMove(move).ok).toBe(true);
    expect(move.keys.map(({ at, yaw, pitch }) => [at, yaw, pitch])).toEqual([
      [0, 0, 0],
      [0.5, 180, -8],
      [1, 360, 0],
    ]);
    expect(move.deliverables).toEqual(quayMove().deliverables);
  });

  it('says how long it usually is, delivered, and how often it turns', () => {
    expect([move.usual, move.turns]).toEqual([10, 1]); // 1440 / (24 · 6) seconds; 360°
  });
});

describe('applying', () => {
  it('plainly puts keys at rounded frames and starts where said', () => {
    const { keys, title, deliverables } = put(three, { firstFrame: 10, lastFrame: 21, yawDeg: -30 });
    // 0.25 · 11 = 2.75
    expect(keys.map(({ frame, yaw, pitch }) => [frame, yaw, pitch])).toEqual([
      [10, -30, 10],
      [13, 10, 20],
      [21, 70, -10],
    ]);
    expect([title, deliverables]).toEqual([three.title, three.deliverables]);
  });

  it('mirrored changes the sides of yaw and roll', () => {
    const { keys } = put(three, { mirrored: true, yawDeg: 7 });
    expect(keys.map(({ yaw, pitch, roll }) => [yaw, pitch, roll])).toEqual([
      [7, 10, -5],
      [-33, 20, 0],
      [-93, -10, 5],
    ]);
  });

  it('scaled multiplies yaw, pitch and roll, each counted from the first key', () => {
    const { keys } = put(three, { scale: 0.5, yawDeg: 7 });
    expect(keys.map(({ yaw, pitch, roll }) => [yaw, pitch, roll])).toEqual([
      [7, 10, 5],
      [27, 15, 2.5],
      [57, 0, 0],
    ]);
  });

  it('reversed swaps keys and legs and turns the eases about', () => {
    const { keys } = put(three, { reversed: true, yawDeg: 7 });
    expect(keys.map(({ frame, yaw, leg }) => [frame, yaw, leg])).toEqual([
      [0, 7, { path: 'arc', ease: { bezier: [0.75, 0, 0.75, 0.9] } }],
      [750, -53, { path: 'level', ease: 'ease-out' }],
      [1000, -93, undefined],
    ]);
  });

  it('with the shot’s field of view starts at it, keeps its deliverables and zooms as much', () => {
    const onto = { ...quayMove(), keys: [key(0, { fov: 50, eye: 0 })] };
    const move = put(three, { fieldOfView: 'shot' }, { ...onto, shot: LONG.shot });
    expect(move.deliverables).toEqual(quayMove().deliverables);
    const zoom = (fov: number) => Math.log(Math.tan((fov * Math.PI) / 720));
    expect(move.keys[0].fov).toBe(50);
    expect(zoom(move.keys[2].fov) - zoom(50)).toBeCloseTo(zoom(45) - zoom(90), 12);
    expect(move.keys.map(each => each.eye)).toEqual([0, 0, 0]);
  });

  it.each<[string, Partial<Application>, SavedMove, string, string]>([
    ['a scale of nothing', { scale: 0 }, three, '', 'the scale must be over 0'],
    [
      'a range of one frame',
      { firstFrame: 5, lastFrame: 5 },
      three,
      '',
      'the last frame must be after the first (5), is 5',
    ],
    ['a range past the shot', { lastFrame: 10_000_000 }, three, '/keys/2/frame', 'inside the shot'],
    ['a pitch over the pole', { scale: 10 }, three, '/keys/1/pitch', 'at most 90, is 110'],
    ['no number', { yawDeg: NaN }, three, '/keys/0/yaw', 'a number, is NaN'],
    [
      'a hold, reversed',
      { reversed: true },
      changed(three, { '/keys/1/leg/ease': 'hold' }) as SavedMove,
      '/keys/1/leg/ease',
      'a hold has no way back',
    ],
    [
      'a curve too low to be turned',
      { reversed: true },
      changed(three, { '/keys/0/leg/ease': { bezier: [0, -10, 1, 1] } }) as SavedMove,
      '/keys/0/leg/ease/bezier/1',
      '-10 becomes 11',
    ],
  ])('refuses %s with its place', (_what, how, move, pointer, words) => {
    expect(faultsOf(how, move)[0]).toEqual({ pointer, detail: expect.stringContaining(words) });
  });

  it('names the smallest range in which no two keys fall on one frame', () => {
    const at = (places: number[]) =>
      savedWith(
        places.map((place, i) => ({
          ...{ at: place, yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 },
          ...(i < places.length - 1 ? { leg: { path: 'level' as const, ease: 'linear' as const } } : {}),
        })),
      );
    // 0.29 · 2 = 0.58 → 1 and 0.31 · 2 = 0.62 → 1; apart from 5 on: 1.45 → 1, 1.55 → 2.
    const close = at([0, 0.29, 0.31, 1]);
    expect(faultsOf({ lastFrame: 4 }, close)).toEqual([
      { pointer: '/keys/2/at', detail: expect.stringContaining('the smallest range that works is 5 frames') },
    ]);
    expect(faultsOf({ lastFrame: 5 }, close)).toEqual([]);
    const touching = at([0, 0.5, 0.5 + 1e-12, 1]);
    expect(faultsOf({}, touching)[0].detail).toContain('no shot is long enough');
  });
});

describe('the smallest range named', () => {
  const places = fc
    .uniqueArray(fc.integer({ min: 1, max: 9999 }), { minLength: 1, maxLength: 6 })
    .map(inner => [0, ...inner.sort((a, b) => a - b).map(place => place / 10_000), 1]);

  it('works, and none below it does', () => {
    fc.assert(
      fc.property(places, drawn => {
        const length = shortestRange(drawn) ?? NaN;
        expect(firstCollision(drawn, length)).toBeUndefined();
        for (let shorter = 1; shorter < length; shorter++)
          if (firstCollision(drawn, shorter) === undefined) return false;
        return true;
      }),
      { numRuns: 100 },
    );
  });
});

describe('the same saved move comes back exactly', () => {
  it('applied plainly to any frames, from any heading, by way of both documents’ text', () => {
    fc.assert(
      fc.property(
        savedMoves,
        fc.nat(10_000),
        fc.integer({ min: 4000, max: 900_000 }),
        fc.double({ min: -30_000, max: 30_000, noNaN: true }),
        (move, firstFrame, length, yawDeg) => {
          fc.pre(faultsOf({ firstFrame, lastFrame: firstFrame + length }, move).length === 0);
          const text = serialiseMove(put(move, { firstFrame, lastFrame: firstFrame + length, yawDeg }));
          const document = checkMove(JSON.parse(text));
          expect(document.ok).toBe(true);
          if (document.ok)
            expect(serialiseSavedMove(saved(document.document))).toBe(serialiseSavedMove(move));
        },
      ),
      { numRuns: 400 },
    );
  });

  it('for every member of the stored document', () => {
    const move = saved(fullMove());
    // Its yaw counts from −36,000, the least there is.
    expect(saved(put(move, { lastFrame: 300_000, yawDeg: -36_000 }))).toEqual(move);
  });

  it('but for the keys that were changed since', () => {
    const move = savedWith(three.keys.map(each => ({ ...each, at: each.at === 0.25 ? 0.2512 : each.at })));
    const document = put(move, { lastFrame: 100 });
    const moved = changed(document, { '/keys/1/frame': 30 }) as MoveDocument;
    expect(saved(document).keys[1].at).toBe(0.2512);
    expect(saved(moved).keys[1].at).toBe(0.3);
    const turned = changed(document, { '/keys/1/yaw': 41 }) as MoveDocument;
    expect(saved(turned).keys[1]).toMatchObject({ at: 0.25, yaw: 41 });
  });

  it('and nothing of the memory stays in it', () => {
    expect(JSON.stringify(saved(put(three)))).not.toContain('extensions');
  });

  it('mirrored twice or reversed twice, its angles and places are back', () => {
    fc.assert(
      fc.property(
        savedMoves,
        fc.constantFrom<Partial<Application>>({ mirrored: true }, { reversed: true }),
        (move, how) => {
          const far = { ...how, lastFrame: 9_000_000 };
          fc.pre(faultsOf(far, move).length === 0);
          const twice = saved(put(saved(put(move, far)), far));
          twice.keys.forEach((each, i) => {
            const first = move.keys[i];
            expect(each.at).toBeCloseTo(first.at, 6);
            expect(each.yaw).toBeCloseTo(first.yaw, 9);
            expect([each.pitch, each.roll, each.fov]).toEqual([first.pitch, first.roll + 0, first.fov]);
            expect(each.leg?.path).toBe(first.leg?.path);
          });
        },
      ),
      { numRuns: 200 },
    );
  });

  it('author, terms and tags stay with a move however it is applied', () => {
    const terms = { author: 'A. Crew', licence: 'CC-BY-4.0', tags: ['turn'] };
    expect(saved(put({ ...three, ...terms }, { mirrored: true }))).toMatchObject(terms);
  });
});

describe('as poses', () => {
  const [a, b] = [new Float64Array(6), new Float64Array(6)];

  /** Truth: a reflection in the plane through the zenith and straight ahead takes (x, y, z, w) to (x, −y, −z, w). */
  it('a mirrored move is the reflection of the move', () => {
    fc.assert(
      fc.property(savedMoves, fc.double({ min: 0, max: 1, noNaN: true }), (move, share) => {
        fc.pre(faultsOf({ lastFrame: 100_000 }, move).length === 0);
        const frame = share * 100_000;
        compileMove(put(move, { lastFrame: 100_000 })).poseAt(a, frame);
        compileMove(put(move, { lastFrame: 100_000, mirrored: true })).poseAt(b, frame);
        expect(angleBetween([a[0], -a[1], -a[2], a[3]], b.subarray(0, 4))).toBeLessThan(1e-6);
        expect(b[4]).toBeCloseTo(a[4], 9);
      }),
      { numRuns: 200 },
    );
  });

  /** Truth: time runs the other way. (A fair arc's spline has a direction of its own between its keys: not here.) */
  it('a reversed move shows the same poses in the other order', () => {
    fc.assert(
      fc.property(savedMoves, fc.double({ min: 0, max: 1, noNaN: true }), (move, share) => {
        fc.pre(move.keys.every(({ leg }) => leg?.ease !== 'fair' || leg.path === 'level'));
        fc.pre(faultsOf({ lastFrame: 1_000_000 }, move).length === 0);
        const frame = share * 1_000_000;
        const first = { ...move, keys: move.keys.map(each => ({ ...each, pitch: each.pitch * 0.95 })) };
        const yawDeg = move.keys[move.keys.length - 1].yaw;
        const there = put(first, { lastFrame: 1_000_000 });
        const back = put(first, { lastFrame: 1_000_000, reversed: true, yawDeg });
        const turned = {
          ...back,
          keys: back.keys.map((each, i, all) => ({
            ...each,
            frame: 1_000_000 - there.keys[all.length - 1 - i].frame,
          })),
        };
        compileMove(there).poseAt(a, frame);
        compileMove(turned).poseAt(b, 1_000_000 - frame);
        expect(angleBetween(a, b)).toBeLessThan(1e-5);
      }),
      { numRuns: 200 },
    );
  });
});

describe('a part of a move', () => {
  const keys = joined(
    [key(0), key(100, { yaw: 90 }), key(200, { yaw: 90, pitch: 20 }), key(300, { yaw: 200 })],
    { path: 'level', ease: 'fair' },
  );

  it('stands from its first key to its last', () => {
    const part = saved(moveWith(keys), 1, 3);
    expect(part.keys.map(({ at, yaw }) => [at, yaw])).toEqual([
      [0, 0],
      [0.5, 0],
      [1, 110],
    ]);
    expect(part.keys[2].leg).toBeUndefined();
  });

  it('of one key is a still', () => {
    expect(saved(moveWith(keys), 2, 2).keys).toEqual([
      { at: 0, yaw: 0, pitch: 20, roll: 0, fov: 90, eye: 0 },
    ]);
  });

  it('that cuts a fair run says how far it is off, one that does not is not off', () => {
    const cut = cutDifference(moveWith(keys), { firstKey: 0, lastKey: 2 });
    expect(cut.orientationDeg).toBeGreaterThan(0.1);
    expect(cut.frame).toBeGreaterThan(0);
    const eased = joined(keys, { path: 'arc', ease: 'ease' });
    expect(cutDifference(moveWith(eased), { firstKey: 1, lastKey: 3 }).orientationDeg).toBe(0);
    expect(cutDifference(moveWith(keys), { firstKey: 0, lastKey: 3 }).orientationDeg).toBe(0);
  });

  /** Truth: worked by hand: two legs of 100 frames, yaw 0, 90, 90 inside a longer run. */
  it('cut at a rest is not off at all', () => {
    const resting = keys.map((each, i) => (i === 2 ? { ...each, rest: true } : each));
    expect(cutDifference(moveWith(resting), { firstKey: 0, lastKey: 2 }).orientationDeg).toBe(0);
  });
});

describe('a saved move that is none', () => {
  it.each<[string, Record<string, unknown>, string, string]>([
    ['a first key not at 0', { '/keys/0/at': 0.1 }, '/keys/0/at', 'must be 0 at the first key, is 0.1'],
    ['a last key not at 1', { '/keys/2/at': 0.9 }, '/keys/2/at', 'must be 1 at the last key, is 0.9'],
    ['a first yaw', { '/keys/0/yaw': 5 }, '/keys/0/yaw', 'yaw counts from the first key, is 5'],
    ['a frame', { '/keys/1/frame': 5 }, '/keys/1/frame', 'is not a member'],
    ['a shot', { '/shot': {} }, '/shot', 'is not a member'],
    ['no leg', { '/keys/1/leg': undefined }, '/keys/1/leg', 'is missing'],
    ['a place before the one before', { '/keys/1/at': 0 }, '/keys/1/at', 'must be after 0, is 0'],
    ['too wide a view', { '/keys/1/fov': 171 }, '/keys/1/fov', '10 to 170'],
    [
      'a move document',
      { '/format': 'fairlead.move' },
      '/format',
      '"fairlead.saved-move", is "fairlead.move"',
    ],
    ['a licence in prose', { '/licence': 'ask, please!' }, '/licence', 'must look like'],
    ['a tag of no signs', { '/tags': ['', 'a'] }, '/tags/0', 'at least 1 signs'],
    ['NaN', { '/extensions': { a: NaN } }, '/extensions/a', 'JSON can hold'],
  ])('has %s named', (_what, changes, pointer, words) => {
    const checked = checkSavedMove(changed(three, changes));
    expect(checked.ok ? [] : checked.faults).toEqual([{ pointer, detail: expect.stringContaining(words) }]);
  });

  it('2,001 keys are one fault', () => {
    const keys = Array.from({ length: 2001 }, (_, i) => ({
      ...{ at: i / 2000, yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 },
      ...(i < 2000 ? { leg: { path: 'level', ease: 'linear' } } : {}),
    }));
    const checked = checkSavedMove({ ...three, keys });
    expect(checked.ok ? [] : checked.faults.map(fault => fault.pointer)).toEqual(['/keys']);
  });
});
