import { checkMove } from '#shared/document/validate';
import { changed, fullMove, quayMove } from '../../support/documents';
import { fixture } from '../../support/fixtures';
import { joined, key, moveWith } from '../../support/moves';

/** Expected pointers and words: the ranges and rules of the format's description; the wording is ours. */
const faultsOf = (value: unknown) => {
  const checked = checkMove(value);
  return checked.ok ? [] : checked.faults;
};
const pointersOf = (value: unknown) => faultsOf(value).map(fault => fault.pointer);
const quayWith = (changes: Record<string, unknown>) => changed(quayMove(), changes);

it('a stored file of version 1 is read, every member kept', () => {
  const stored: unknown = JSON.parse(fixture('documents/move-version-1.json').toString('utf8'));
  expect(checkMove(stored)).toEqual({ ok: true, document: stored });
  expect(Object.keys(fullMove().extensions ?? {})).toEqual(['origin', '__proto__']);
});

it('a document is handed back as it is, nothing filled in', () => {
  const document = moveWith([key(0)]);
  const checked = checkMove(document);
  expect(checked).toEqual({ ok: true, document });
  expect(checked.ok && checked.document).toBe(document);
});

describe('a single thing wrong is one fault', () => {
  it.each<[what: string, changes: Record<string, unknown>, pointer: string, words: string]>([
    ['a frame that does not rise', { '/keys/2/frame': 720 }, '/keys/2/frame', 'after frame 720, is 720'],
    [
      'a frame behind its end',
      { '/keys/2/frame': 1441 },
      '/keys/2/frame',
      'inside the shot (0 to 1440), is 1441',
    ],
    ['a frame that is not whole', { '/keys/1/frame': 720.5 }, '/keys/1/frame', 'a whole number, is 720.5'],
    ['a negative frame', { '/keys/0/frame': -1 }, '/keys/0/frame', 'at least 0, is -1'],
    ['a frame as text', { '/keys/1/frame': '720' }, '/keys/1/frame', 'a whole number, is "720"'],
    ['too far a turn', { '/keys/1/yaw': 36001 }, '/keys/1/yaw', 'at most 36000, is 36001'],
    ['too far a roll', { '/keys/1/roll': -36001 }, '/keys/1/roll', 'at least -36000, is -36001'],
    ['a pitch over the pole', { '/keys/1/pitch': 90.001 }, '/keys/1/pitch', 'at most 90, is 90.001'],
    ['an eye point beyond the sphere', { '/keys/1/eye': 1.01 }, '/keys/1/eye', 'at most 1, is 1.01'],
    // 2·acos(−0.2) − 10 = 193.07390…
    [
      'too wide a view',
      { '/keys/1/fov': 193.08 },
      '/keys/1/fov',
      '10 to 193.0739 at eye point 0.2, is 193.08',
    ],
    ['too narrow a view', { '/keys/1/fov': 9.99 }, '/keys/1/fov', '10 to 193.0739 at eye point 0.2, is 9.99'],
    [
      'rectilinear past 170°',
      { '/keys/1/fov': 170.01, '/keys/1/eye': 0 },
      '/keys/1/fov',
      '10 to 170 at eye point 0',
    ],
    ['stereographic past 330°', { '/keys/1/fov': 330.01, '/keys/1/eye': 1 }, '/keys/1/fov', '10 to 330'],
    ['a view of no width', { '/keys/1/fov': 0 }, '/keys/1/fov', 'over 0, is 0'],
    ['a key without yaw', { '/keys/1/yaw': undefined }, '/keys/1/yaw', 'is missing'],
    ['NaN', { '/keys/1/yaw': NaN }, '/keys/1/yaw', 'a number, is NaN'],
    ['Infinity', { '/shot/speed': Infinity }, '/shot/speed', 'a number, is Infinity'],
    ['a leg left out', { '/keys/1/leg': undefined }, '/keys/1/leg', 'is missing: every key but the last'],
    [
      'a leg after the last key',
      { '/keys/2/leg': { path: 'arc', ease: 'fair' } },
      '/keys/2/leg',
      'must be left out',
    ],
    [
      'an unknown path',
      { '/keys/0/leg/path': 'bee-line' },
      '/keys/0/leg/path',
      'one of "arc", "level", is "bee-line"',
    ],
    ['an unknown ease', { '/keys/0/leg/ease': 'gentle' }, '/keys/0/leg/ease', '"fair", "linear", "hold"'],
    [
      'a curve of three numbers',
      { '/keys/0/leg/ease': { bezier: [0, 0, 1] } },
      '/keys/0/leg/ease/bezier',
      'at least 4 entries, has 3',
    ],
    [
      'a curve back in time',
      { '/keys/0/leg/ease': { bezier: [0, 0, 1.1, 0] } },
      '/keys/0/leg/ease/bezier/2',
      'within 0 to 1',
    ],
    [
      'a curve too high',
      { '/keys/0/leg/ease': { bezier: [0, 11, 1, 0] } },
      '/keys/0/leg/ease/bezier/1',
      'at most 10, is 11',
    ],
    [
      'a curve far back in time',
      { '/keys/0/leg/ease': { bezier: [-11, 0, 1, 0] } },
      '/keys/0/leg/ease/bezier/0',
      'at least -10',
    ],
    ['a member too many', { '/keys/1/zoom': 2 }, '/keys/1/zoom', 'belong under "extensions"'],
    ['a rest that is a number', { '/keys/1/rest': 1 }, '/keys/1/rest', 'true or false, is 1'],
    ['no keys', { '/keys': [] }, '/keys', 'at least 1 entries, has 0'],
    ['a match on the first', { '/deliverables/0/match': 'width' }, '/deliverables/0/match', 'left out'],
    [
      'no match on the second',
      { '/deliverables/1/match': undefined },
      '/deliverables/1/match',
      '"width", "height" or "diagonal"',
    ],
    [
      'an unknown match',
      { '/deliverables/1/match': 'area' },
      '/deliverables/1/match',
      'one of "width", "height", "diagonal"',
    ],
    [
      'a name twice',
      { '/deliverables/1/name': 'Wide' },
      '/deliverables/1/name',
      'unique, is "Wide" as /deliverables/0',
    ],
    ['a name of no signs', { '/deliverables/1/name': '' }, '/deliverables/1/name', 'at least 1 signs'],
    ['a side too small', { '/deliverables/1/width': 15 }, '/deliverables/1/width', 'at least 16, is 15'],
    ['a source too large', { '/shot/source/width': 16385 }, '/shot/source/width', 'at most 16384'],
    ['no deliverable', { '/deliverables': [] }, '/deliverables', 'at least 1 entries'],
    ['a range past the end', { '/shot/to': 1441 }, '/shot/to', 'inside the shot (0 to 1440), is 1441'],
    ['a range that runs back', { '/shot/from': 1440, '/shot/to': 1439 }, '/shot/to', 'before "from" (1440)'],
    ['a range from past the end', { '/shot/from': 1441, '/shot/to': undefined }, '/shot/from', '0 to 1440'],
    [
      'too high a rate',
      { '/shot/rate': { num: 1001, den: 1 } },
      '/shot/rate',
      'at most 1000 frames a second',
    ],
    ['a rate over nothing', { '/shot/rate/den': 0 }, '/shot/rate/den', 'at least 1, is 0'],
    [
      'dropped frames at 24',
      { '/shot/dropFrame': true },
      '/shot/dropFrame',
      '30000/1001 and 60000/1001 only, the rate is 24/1',
    ],
    [
      'a label past the second',
      { '/shot/start': '01:00:00:24' },
      '/shot/start',
      'timecode at 24/1, is "01:00:00:24"',
    ],
    ['a start in words', { '/shot/start': 'noon' }, '/shot/start', 'is "noon"'],
    ['a speed of nothing', { '/shot/speed': 0 }, '/shot/speed', 'at least 0.01, is 0'],
    ['an exposure of nothing', { '/shot/exposure': 0 }, '/shot/exposure', 'over 0, is 0'],
    ['an interval of two days', { '/shot/interval': 172800 }, '/shot/interval', 'at most 86400'],
    ['a level that is no rotation', { '/shot/level': [0, 0, 0, 0.5] }, '/shot/level', 'unit quaternion'],
    ['a level of three', { '/shot/level': [0, 0, 1] }, '/shot/level', 'at least 4 entries, has 3'],
    ['too long a title', { '/title': 'a'.repeat(201) }, '/title', 'at most 200 signs, has 201'],
    ['too long notes', { '/notes': 'a'.repeat(20001) }, '/notes', 'at most 20000 signs, has 20001'],
    ['another format', { '/format': 'other.move' }, '/format', '"fairlead.move", is "other.move"'],
    ['a format as a number', { '/format': 3 }, '/format', 'must be "fairlead.move", is 3'],
    ['a later version', { '/version': 2 }, '/version', 'newer Fairlead; this one reads up to version 1'],
    ['a version before the first', { '/version': 0 }, '/version', 'must be 1, is 0'],
    ['a key that is a list', { '/keys/1': [] }, '/keys/1', 'an object, is a list of 0'],
  ])('%s', (_what, changes, pointer, words) => {
    expect(faultsOf(quayWith(changes))).toEqual([{ pointer, detail: expect.stringContaining(words) }]);
  });
});

it('a label that drop-frame skips is refused, whichever sign stands before the frames', () => {
  const at2997 = { '/shot/rate': { num: 30000, den: 1001 }, '/shot/dropFrame': true };
  // SMPTE ST 12-1: 00:01:00;00 does not exist, 00:10:00;00 does.
  expect(pointersOf(quayWith({ ...at2997, '/shot/start': '00:01:00:00' }))).toEqual(['/shot/start']);
  expect(pointersOf(quayWith({ ...at2997, '/shot/start': '00:01:00;00' }))).toEqual(['/shot/start']);
  expect(pointersOf(quayWith({ ...at2997, '/shot/start': '00:10:00:00' }))).toEqual([]);
});

it('a rate under one frame a second has timecodes too', () => {
  const slow = { '/shot/rate': { num: 1, den: 10 }, '/shot/start': '00:00:05:00' };
  expect(pointersOf(quayWith(slow))).toEqual([]);
});

it('all faults of a document are found in one pass, in its order', () => {
  const many = quayWith({
    '/deliverables/1/match': undefined,
    '/keys/0/leg/ease': 'gentle',
    '/keys/1/fov': 300,
    '/keys/1/frame': 0,
    '/keys/2/extra': 1,
    '/keys/2/yaw': NaN,
    '/shot/from': 2000,
    '/shot/rate/num': 0,
    '/shot/extensions': { gain: Infinity },
    '/title': undefined,
  });
  expect(pointersOf(many)).toEqual([
    '/deliverables/1/match',
    '/keys/0/leg/ease',
    '/keys/1/fov',
    '/keys/1/frame',
    '/keys/2/extra',
    '/keys/2/yaw',
    '/shot/extensions/gain',
    '/shot/from',
    '/shot/rate/num',
    '/shot/to',
    '/title',
  ]);
});

it('wrong eases at many keys are one fault each', () => {
  const keys = joined(
    Array.from({ length: 30 }, (_, i) => key(i)),
    { path: 'arc', ease: 'linear' },
  );
  const wrong = keys.map((each, i) => (i < 29 ? { ...each, leg: { path: 'arc', ease: 'gentle' } } : each));
  expect(pointersOf({ ...moveWith(keys), keys: wrong })).toEqual(
    Array.from({ length: 29 }, (_, i) => `/keys/${i}/leg/ease`),
  );
});

describe('too many keys', () => {
  const manyKeys = (count: number) =>
    moveWith(
      joined(
        Array.from({ length: count }, (_, i) => key(i)),
        { path: 'level', ease: 'linear' },
      ),
    );

  it('2,000 are taken', () => {
    expect(pointersOf(manyKeys(2000))).toEqual([]);
  });

  it('2,001 are one fault, and what is wrong in the first 2,000 is still found', () => {
    expect(faultsOf(manyKeys(2001))).toEqual([
      { pointer: '/keys', detail: expect.stringContaining('at most 2000 entries, has 2001') },
    ]);
    expect(pointersOf(changed(manyKeys(2001), { '/keys/1999/leg': undefined, '/keys/7/yaw': 'x' }))).toEqual([
      '/keys',
      '/keys/7/yaw',
      '/keys/1999/leg',
    ]);
  });
});
