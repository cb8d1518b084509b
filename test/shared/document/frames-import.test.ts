import { parse } from 'csv-parse/sync';
import fc from 'fast-check';
import { Euler, MathUtils, Quaternion, Vector3 } from 'three';

import { type Key, type MoveDocument } from '#schemas/move';
import { type FramesImport, keysFromFramesCsv } from '#shared/document/frames-import';
import { framesCsv } from '#shared/export/csv';
import { type FrameRow, frameRows, type Per } from '#shared/export/frames-table';
import { readCsv } from '#shared/export/read-csv';
import { fullMove, quayMove } from '../../support/documents';
import { joined, key, moveWith } from '../../support/moves';

const ARC = { path: 'arc', ease: 'linear' } as const;
const THIN = { thin: true } as const;
const EACH = { thin: false } as const;

const bake = (move: MoveDocument, per: Per = 'source') => [...frameRows(move, per)];
const csvOf = (move: MoveDocument, per: Per = 'source') => [...framesCsv(bake(move, per))].join('');

/** Any move on a shot of so many frames. */
const onto = (frames: number) => {
  const move = moveWith([key(0)]);
  return { ...move, shot: { ...move.shot, frames } };
};

function imported(text: string, move: MoveDocument, options: FramesImport) {
  const result = keysFromFramesCsv(text, move, options);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result;
}

function faultsOf(text: string, move: MoveDocument, options: FramesImport = THIN): string[] {
  const result = keysFromFramesCsv(text, move, options);
  return result.ok ? [] : result.faults.map(each => each.detail);
}

type Pose = Pick<Key, 'frame' | 'yaw' | 'pitch' | 'roll' | 'fov' | 'eye'>;

const tableOf = (poses: readonly Pose[]) =>
  [
    'source_frame,yaw,pitch,roll,fov,eye',
    ...poses.map(({ frame, yaw, pitch, roll, fov, eye }) => [frame, yaw, pitch, roll, fov, eye].join(',')),
  ].join('\n');

/* The truth: linear arc legs as the format describes them, by three.js. */

const UP = new Vector3(0, 1, 0);
const BACK = new Vector3(0, 0, 1);

const orientation = ({ yaw, pitch, roll }: Pick<Pose, 'yaw' | 'pitch' | 'roll'>) => {
  const [x, y, z] = [pitch, -yaw, -roll].map(MathUtils.degToRad);
  return new Quaternion().setFromEuler(new Euler(x, y, z, 'YXZ'));
};

/** Rounded to the nearest, ties towards zero. */
const turnsIn = (degrees: number) => Math.sign(degrees) * Math.ceil(Math.abs(degrees) / 360 - 0.5);

const zeta = (fov: number) => Math.log(Math.tan(MathUtils.degToRad(fov) / 4));

/** Half-chords: three's angleTo is blind to angles under 1e-8. */
function apartDeg(a: Quaternion, b: Quaternion): number {
  const chord = (sign: number) =>
    Math.hypot(a.x - sign * b.x, a.y - sign * b.y, a.z - sign * b.z, a.w - sign * b.w);
  const [near, far] = [chord(1), chord(-1)].sort((x, y) => x - y);
  return MathUtils.radToDeg(4 * Math.atan2(near, far));
}

/** By axis and angle: three's slerp goes straight where the angle is small. */
function turnedTowards(from: Quaternion, to: Quaternion, u: number): Quaternion {
  const way = from.clone().invert().multiply(to);
  const sign = way.w >= -1e-12 ? 1 : -1;
  const axis = new Vector3(way.x, way.y, way.z).multiplyScalar(sign);
  const angle = 2 * Math.atan2(axis.length(), sign * way.w);
  return from.clone().multiply(new Quaternion().setFromAxisAngle(axis.normalize(), u * angle));
}

/** How far a pose is from where a leg is then. */
function offLeg(a: Pose, b: Pose, pose: Pose): { angle: number; fov: number; eye: number } {
  const u = (pose.frame - a.frame) / (b.frame - a.frame);
  const m = turnsIn(b.yaw - a.yaw);
  const n = turnsIn(b.roll - a.roll);
  const end = orientation({ ...b, yaw: b.yaw - 360 * m, roll: b.roll - 360 * n });
  const there = new Quaternion()
    .setFromAxisAngle(UP, -2 * Math.PI * m * u)
    .multiply(turnedTowards(orientation(a), end, u))
    .multiply(new Quaternion().setFromAxisAngle(BACK, -2 * Math.PI * n * u));
  const fov = MathUtils.radToDeg(4 * Math.atan(Math.exp(zeta(a.fov) + u * (zeta(b.fov) - zeta(a.fov)))));
  return {
    angle: apartDeg(there, orientation(pose)),
    fov: Math.abs(fov - pose.fov),
    eye: Math.abs(a.eye + u * (b.eye - a.eye) - pose.eye),
  };
}

const within = (a: Pose, b: Pose, pose: Pose, slack = 0) => {
  const off = offLeg(a, b, pose);
  return off.angle <= 0.05 + slack && off.fov <= 0.05 + slack && off.eye <= 0.0005 + slack;
};

/** Rows that the legs between the keys do not keep to. */
function strays(keys: readonly Pose[], rows: readonly Pose[]): number[] {
  return rows
    .filter(row => {
      const next = keys.findIndex(each => each.frame > row.frame);
      return next < 0
        ? row.frame > keys[keys.length - 1].frame
        : !within(keys[next - 1], keys[next], row, 1e-9);
    })
    .map(row => row.frame);
}

/** The fewest keys, from all pairs of rows; with slack where a row may lie at the tolerance to the last bit. */
function fewest(rows: readonly Pose[], slack: number): number {
  const keys = [1];
  for (let j = 1; j < rows.length; j++) {
    keys[j] = keys[j - 1] + 1;
    for (let i = 0; i < j - 1; i++)
      if (keys[i] + 1 < keys[j] && rows.slice(i + 1, j).every(row => within(rows[i], rows[j], row, slack)))
        keys[j] = keys[i] + 1;
  }
  return keys[rows.length - 1];
}

const poseOf = ({ source_frame, yaw, pitch, roll, fov, eye }: FrameRow): Pose => ({
  frame: source_frame,
  ...{ yaw, pitch, roll, fov, eye },
});

describe('a key a row', () => {
  const keys = joined(
    [
      key(0, { yaw: 10, pitch: -5, fov: 80 }),
      key(60, { yaw: 100, pitch: 20, roll: 3, fov: 100, eye: 0.1 }),
      key(199, { yaw: 350, pitch: -30, roll: -12, fov: 60, eye: 0.4 }),
    ],
    { path: 'arc', ease: 'fair' },
  );
  const move = moveWith(keys, { notes: 'kept', extensions: { other: 1 } });

  // The table has 12 decimals; from degrees to radians and back costs a few more bits.
  it('bakes to the table that it was read from', () => {
    const { document, notes } = imported(csvOf(move), move, EACH);
    const again = bake(document);
    const wrong = bake(move).filter((row, i) =>
      (['yaw', 'pitch', 'roll', 'fov', 'vfov', 'eye', 'qx', 'qy', 'qz', 'qw'] as const).some(
        column => !(Math.abs(row[column] - again[i][column]) < 1e-11),
      ),
    );
    expect(document.keys).toHaveLength(200);
    expect(wrong).toEqual([]);
    expect(notes).toEqual([]);
  });

  it('joins them by linear arcs and keeps the rest of the document', () => {
    const { document } = imported(csvOf(move), move, EACH);
    expect(document).toEqual({ ...move, keys: document.keys });
    expect(document.keys.slice(0, -1).every(each => JSON.stringify(each.leg) === JSON.stringify(ARC))).toBe(
      true,
    );
    expect(document.keys[199]).not.toHaveProperty('leg');
  });

  it('leaves out rows between two source frames, and says how many', () => {
    // Speed 2.5 from 10 to 5390: of 2153 rows every second stands on a whole frame, 10, 15, …, 5390.
    const full = fullMove();
    const { document, notes } = imported(csvOf(full, 'delivered'), full, EACH);
    expect(document.keys.map(each => each.frame)).toEqual(Array.from({ length: 1077 }, (_, i) => 10 + 5 * i));
    expect(notes).toContain('1076 rows stand between two source frames and are left out.');
  });

  it('refuses more rows than a move has keys', () => {
    const still = tableOf(Array.from({ length: 2001 }, (_, frame) => key(frame)));
    expect(faultsOf(still, onto(2001), EACH)).toEqual([
      'the table: must have at most 2000 rows on whole source frames to keep each, has 2001: thin it',
    ]);
  });
});

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

describe('what a key cannot have', () => {
  it('a row that leans over a pole looks the same from the other side', () => {
    const move = moveWith(
      joined(
        [0, 40, 60, 100].map((frame, i) => key(frame, { yaw: 30 + frame, pitch: [40, 89, 89, 40][i] })),
        {
          path: 'level',
          ease: 'fair',
        },
      ),
    );
    const rows = bake(move);
    const over = rows.filter(row => row.pitch > 90).length;
    expect(over).toBeGreaterThan(5);
    const { document, notes } = imported(csvOf(move), move, EACH);
    const wrong = document.keys.filter(
      (got, i) => !(apartDeg(orientation(got), orientation(rows[i])) < 1e-9),
    );
    expect(wrong).toEqual([]);
    expect(notes).toEqual([
      `${over} rows lean over a pole: their keys look from the other side, upside down.`,
    ]);
    const steps = document.keys.slice(1).map((got, i) => Math.abs(got.yaw - document.keys[i].yaw));
    expect(Math.max(...steps)).toBeLessThanOrEqual(180);
  });

  it('a step of whole turns from one source frame to the next is no motion', () => {
    const rows = [0, 10, 380, 390].map((yaw, frame) => key(frame, { yaw }));
    const { document, notes } = imported(tableOf(rows), onto(4), EACH);
    expect(document.keys.map(each => each.yaw)).toEqual([0, 10, 20, 30]);
    expect(notes).toEqual([
      '1 row steps by whole turns of yaw or roll from the source frame before, which are left out.',
    ]);
  });

  it('further apart, it is', () => {
    const rows = [key(0), key(2, { yaw: 370 })];
    expect(imported(tableOf(rows), onto(4), EACH).document.keys[1].yaw).toBe(370);
  });
});

describe('tables of other makes', () => {
  const read = (text: string) => {
    const { document } = imported(text, onto(100), EACH);
    return document.keys.map(({ frame, yaw, pitch, roll, fov, eye }) => [frame, yaw, pitch, roll, fov, eye]);
  };

  it.each([
    [
      'columns in another order, among others',
      'note,fov,roll,pitch,yaw,source_frame,eye,frame\nx,90,3,2,1,7,0.5,0',
    ],
    ['CRLF and a byte order mark', '\uFEFFsource_frame,yaw,pitch,roll,fov,eye\r\n7,1,2,3,90,0.5\r\n'],
    ['blank lines and no line end', '\n\nsource_frame,yaw,pitch,roll,fov,eye\n\n7,1,2,3,90,0.5'],
    [
      'quotes, a comma and a line break in them',
      '"a ""note"", or\ntwo","source_frame",yaw,pitch,roll,fov,eye\n"1,\r\n""2",7,"1",2,"3",90,0.5',
    ],
    ['spaces, capitals, signs and exponents', 'Source_Frame, Yaw ,PITCH,roll,fov,eye\n 7 ,+1,2.,3e0,9E+1,.5'],
    ['frame for want of source_frame', 'frame,yaw,pitch,roll,fov,eye\n7,1,2,3,90,0.5'],
  ])('%s', (_what, text) => {
    expect(read(text)).toEqual([[7, 1, 2, 3, 90, 0.5]]);
  });

  it('take the eye point 0 where they have none', () => {
    expect(read('frame,yaw,pitch,roll,fov\n7,1,2,3,90')).toEqual([[7, 1, 2, 3, 90, 0]]);
  });

  it('give a move of one key from one row, thinned too', () => {
    const text = tableOf([key(5, { yaw: 3 })]);
    for (const options of [THIN, EACH])
      expect(imported(text, onto(10), options).document.keys).toEqual([key(5, { yaw: 3 })]);
  });

  // Truth: csv-parse, told to take either line end and pass over blank lines.
  it('are read as csv-parse reads them', () => {
    const field = fc.oneof(fc.string(), fc.constantFrom('', '"', ',', '\n', '\r\n', 'a"b', 'x,y'));
    const quoted = (text: string) => (/[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);
    const record = fc.array(field, { minLength: 2, maxLength: 4 });
    fc.assert(
      fc.property(fc.array(record), fc.constantFrom('\n', '\r\n'), fc.boolean(), (records, lineEnd, ends) => {
        const text = records.map(each => each.map(quoted).join(',')).join(lineEnd) + (ends ? lineEnd : '');
        const truth = parse(text, {
          bom: true,
          relax_column_count: true,
          record_delimiter: ['\r\n', '\n'],
          skip_empty_lines: true,
        });
        expect([...readCsv(text)].map(each => each.fields)).toEqual(truth);
      }),
    );
  });
});

describe('faults', () => {
  it.each<[string, string, string[]]>([
    ['nothing', '', ['row 1: is missing: a frames table begins with the names of its columns']],
    [
      'blank lines alone',
      '\n\r\n\n',
      ['row 1: is missing: a frames table begins with the names of its columns'],
    ],
    [
      'a header alone',
      'frame,yaw,pitch,roll,fov\n',
      ['the table: has no row below the names of its columns'],
    ],
    [
      'missing columns',
      'yaw,roll\n1,2',
      ['source_frame', 'pitch', 'fov'].map(name => `row 1, column ${name}: is missing`),
    ],
    ['a column twice', 'frame,yaw,yaw,pitch,roll,fov\n0,0,0,0,0,90', ['row 1, column yaw: stands twice']],
    [
      'what is no number',
      'frame,yaw,pitch,roll,fov\n0,NaN,0,0,abc\n\n1,0,,0x10\n2,1e999,--1,1 2,Infinity',
      [
        'row 2, column yaw: must be a number, is "NaN"',
        'row 2, column fov: must be a number, is "abc"',
        'row 4, column pitch: is missing',
        'row 4, column roll: must be a number, is "0x10"',
        'row 4, column fov: is missing',
        'row 5, column yaw: must be a number, is "1e999"',
        'row 5, column pitch: must be a number, is "--1"',
        'row 5, column roll: must be a number, is "1 2"',
        'row 5, column fov: must be a number, is "Infinity"',
      ],
    ],
    [
      'frames that do not rise',
      'frame,yaw,pitch,roll,fov\n3,0,0,0,90\n3,0,0,0,90\n2.5,0,0,0,90\n2.75,0,0,0,90',
      ['row 3, column frame: must be after 3, is 3', 'row 4, column frame: must be after 3, is 2.5'],
    ],
    [
      'quotes that do not close',
      'frame,yaw,pitch,roll,fov\n0,0,0,0,90\n1,"0,0,0,90\n2,0,0,0,90',
      ['row 3: a quoted field does not end'],
    ],
    [
      'something after a quote',
      'frame,yaw,pitch,roll,fov\n0,"0"1,0,0,90\n1,0,0,0,x',
      ['row 2: something follows the quote that ends a field', 'row 3, column fov: must be a number, is "x"'],
    ],
    [
      'no whole frame',
      'frame,yaw,pitch,roll,fov\n0.5,0,0,0,90',
      ['the table: has no row on a whole source frame, where a key could stand'],
    ],
  ])('%s', (_what, text, expected) => {
    expect(faultsOf(text, onto(10), THIN)).toEqual(expected);
    expect(faultsOf(text, onto(10), EACH)).toEqual(expected);
  });

  it.each<[string, Partial<Pose>, string, string]>([
    ['a frame outside the shot', { frame: 10 }, 'source_frame', 'must be inside the shot (0 to 9), is 10'],
    ['a frame before 0', { frame: -1 }, 'source_frame', 'must be'],
    ['a yaw of a thousand turns', { yaw: 360_000 }, 'yaw', 'must be'],
    ['a huge number', { roll: 1e308 }, 'roll', 'must be'],
    ['a pitch of several turns', { pitch: 1000 }, 'pitch', 'must be'],
    // 170° is the limit at eye point 0 (2·acos(0) − 10°).
    [
      'a field of view too wide for its eye point',
      { fov: 171 },
      'fov',
      'must be 10 to 170 at eye point 0, is 171',
    ],
    ['an eye point over 1', { eye: 1.5 }, 'eye', 'must be'],
  ])('%s', (_what, wrong, column, start) => {
    const text = tableOf([{ ...key(3), ...wrong }]);
    for (const options of [THIN, EACH])
      expect(faultsOf(text, onto(10), options)).toEqual([
        expect.stringContaining(`row 2, column ${column}: ${start}`),
      ]);
  });

  it('finds a field of view out of range in any row of a long table', () => {
    const rows = Array.from({ length: 4500 }, (_, frame) => key(frame, { fov: frame === 4321 ? 5 : 90 }));
    expect(faultsOf(tableOf(rows), onto(4500))).toEqual([
      'row 4323, column fov: must be 10 to 170 at eye point 0, is 5',
    ]);
  });

  it('lists a hundred and counts the rest', () => {
    const rows = 'x,0,0,0,90\n'.repeat(150);
    const faults = faultsOf(`frame,yaw,pitch,roll,fov\n${rows}`, onto(10));
    expect(faults).toHaveLength(101);
    expect(faults[100]).toBe('the table: has 50 more');
  });
});

describe('ten megabytes of anything are refused', () => {
  const HEADER = 'frame,yaw,pitch,roll,fov\n';
  const SIZE = 10_000_000;
  it.each<[string, string]>([
    ['one letter', 'x'.repeat(SIZE)],
    ['quotes', '"'.repeat(SIZE + 1)],
    ['commas', ','.repeat(SIZE)],
    ['line ends', '\n'.repeat(SIZE)],
    ['NUL', '\0'.repeat(SIZE)],
    ['commas below a header', HEADER + ','.repeat(SIZE)],
    ['short lines below a header', HEADER + 'x\n'.repeat(SIZE / 2)],
    ['an unclosed quote below a header', `${HEADER}"${'x,\n'.repeat(SIZE / 3)}`],
    ['quoted fields below a header', HEADER + '"a""b",'.repeat(SIZE / 7)],
    ['digits', `${HEADER}${'1'.repeat(SIZE)},0,0,0,90`],
  ])('%s', (_what, text) => {
    for (const options of [THIN, EACH]) {
      const faults = faultsOf(text, onto(10), options);
      expect(faults.length).toBeGreaterThan(0);
      expect(faults.every(each => each.length < 200)).toBe(true);
    }
  });
});

it('any text at all is answered', () => {
  const piece = fc.oneof(
    fc.string(),
    fc.constantFrom('frame,yaw,pitch,roll,fov\n', '0,0,0,0,90\n', '1,0,0,0,90\n', '"', ',', '\n'),
  );
  fc.assert(
    fc.property(fc.array(piece), fc.boolean(), (pieces, thin) => {
      const result = keysFromFramesCsv(pieces.join(''), onto(10), { thin });
      expect(result.ok ? result.document.keys.length : result.faults.length).toBeGreaterThan(0);
    }),
  );
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
