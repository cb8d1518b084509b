import { parse } from 'csv-parse/sync';
import fc from 'fast-check';

import { keysFromFramesCsv } from '#shared/document/frames-import';
import { readCsv } from '#shared/export/read-csv';
import { fullMove } from '../../support/documents';
import { orientation, apartDeg, type Pose } from '../../support/even-arcs';
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
