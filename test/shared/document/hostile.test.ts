import { serialiseMove } from '#shared/document/serialise';
import { checkMove } from '#shared/document/validate';
import { changed, quayMove } from '../../support/documents';

/** Values that nobody writes by hand; the rules are the format's: JSON holds the whole document, or it is refused. */
const pointersOf = (value: unknown) => {
  const checked = checkMove(value);
  return checked.ok ? [] : checked.faults.map(fault => fault.pointer);
};
const quayWith = (changes: Record<string, unknown>) => changed(quayMove(), changes);

/** Lists within lists. */
function nested(levels: number): unknown {
  let value: unknown = 'core';
  for (let i = 0; i < levels; i++) value = [value];
  return value;
}

it.each([
  ['nothing', undefined],
  ['null', null],
  ['a number', 3],
  ['text', 'fairlead.move'],
  ['a list', []],
  ['a function', () => 1],
])('%s is no document', (_what, value) => {
  expect(pointersOf(value)).toEqual(['']);
});

describe('in extensions', () => {
  it.each([
    ['NaN', NaN],
    ['Infinity', Infinity],
    ['a big integer', 10n],
    ['a function', () => 1],
    ['undefined', undefined],
    ['a date', new Date(0)],
    ['a map', new Map()],
  ])('%s is refused with its place, as JSON would lose it', (_what, value) => {
    const other = { 'a/b': [0, { gain: value }] };
    const pointer = '/other/a~1b/1/gain';
    const extensions = { other };
    expect(pointersOf({ ...quayMove(), extensions })).toEqual([`/extensions${pointer}`]);
    const [first, ...rest] = quayMove().keys;
    const leg = { path: 'arc', ease: 'fair', extensions };
    expect(pointersOf({ ...quayMove(), keys: [{ ...first, leg }, ...rest] })).toEqual([
      `/keys/0/leg/extensions${pointer}`,
    ]);
  });

  it.each(['/extensions', '/shot/extensions', '/deliverables/1/extensions', '/keys/2/extensions'])(
    'everything JSON can hold is kept at %s',
    place => {
      const extensions = JSON.parse(
        '{"__proto__":{"a":1},"constructor":null,"deep":[[[{}]]],"-":-0.5}',
      ) as unknown;
      const document = quayWith({ [place]: extensions });
      const checked = checkMove(document);
      expect(checked).toEqual({ ok: true, document });
      const text = checked.ok ? serialiseMove(checked.document) : '';
      expect(JSON.stringify(JSON.parse(text))).toContain('"__proto__":{"a":1},"constructor":null');
    },
  );

  it('100 levels are kept, more are refused', () => {
    expect(pointersOf(quayWith({ '/extensions': { deep: nested(99) } }))).toEqual([]);
    expect(pointersOf(quayWith({ '/extensions': { deep: nested(100) } }))).toEqual(['/extensions']);
  });

  it('a value that holds itself is refused', () => {
    const ring: unknown[] = [];
    ring.push({ ring }, { ring });
    expect(pointersOf({ ...quayMove(), extensions: { ring } })).toEqual(['/extensions']);
  });

  it('a value that stands in very many places is read once', () => {
    let shared: unknown = { end: true };
    for (let i = 0; i < 90; i++) shared = [shared, shared];
    expect(pointersOf({ ...quayMove(), extensions: { shared } })).toEqual([]);
  });
});

describe('without throwing or hanging, however much there is', () => {
  it.each<[what: string, document: () => unknown, pointers: string[]]>([
    ['nesting of 100,000', () => ({ ...quayMove(), extensions: { deep: nested(100_000) } }), ['/extensions']],
    ['keys nested 100,000 deep', () => quayWith({ '/keys/1': nested(100_000) }), ['/keys/1']],
    [
      'a million entries of a level',
      () => quayWith({ '/shot/level': new Array(1e6).fill(0) }),
      ['/shot/level'],
    ],
    ['an endless empty list', () => quayWith({ '/shot/level': new Array(4e9) }), ['/shot/level']],
    [
      'a million handles',
      () => quayWith({ '/keys/0/leg/ease': { bezier: new Array(1e6).fill(0) } }),
      ['/keys/0/leg/ease/bezier'],
    ],
    [
      'a million deliverables',
      () => quayWith({ '/deliverables': new Array(1e6).fill({}) }),
      ['/deliverables'],
    ],
    ['a title of ten million signs', () => quayWith({ '/title': '𝄞'.repeat(1e7) }), ['/title']],
    [
      'a million unknown members',
      () => ({ ...quayMove(), ...Object.fromEntries(Array.from({ length: 1e6 }, (_, i) => [`m${i}`, i])) }),
      [''],
    ],
  ])('%s', (_what, document, pointers) => {
    expect(pointersOf(document())).toEqual(pointers);
  });

  it('a million keys', () => {
    const pointers = pointersOf(quayWith({ '/keys': new Array(1e6).fill(3) }));
    expect(pointers).toHaveLength(2001);
    expect(pointers.slice(0, 3)).toEqual(['/keys', '/keys/0', '/keys/1']);
  });
});

it.each(['__proto__', 'constructor', 'toString', 'hasOwnProperty'])(
  'a member called %s is refused like any other unknown one, and nothing is polluted',
  name => {
    const parse = (text: string): unknown => JSON.parse(text);
    const top = parse(
      JSON.stringify(quayMove()).replace('"notes":""', `${JSON.stringify(name)}:{"polluted":1}`),
    );
    expect(pointersOf(top)).toEqual([`/${name}`]);
    const inKey = parse(
      JSON.stringify(quayMove()).replace('"frame":720', `"frame":720,${JSON.stringify(name)}:1`),
    );
    expect(pointersOf(inKey)).toEqual([`/keys/1/${name}`]);
    expect({}).not.toHaveProperty('polluted');
  },
);
