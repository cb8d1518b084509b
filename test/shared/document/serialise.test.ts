import * as fc from 'fast-check';

import { decimalText } from '#shared/document/number-text';
import { serialiseMove } from '#shared/document/serialise';
import { fullMove, quayMove } from '../../support/documents';
import { key, moveWith } from '../../support/moves';

it.each([
  ['the described document', quayMove],
  ['a document of every member', fullMove],
])('%s is read back equal', (_what, document) => {
  expect(JSON.parse(serialiseMove(document()))).toEqual(document());
});

it('members stand in the order of the description, whoever wrote them', () => {
  const { format, version, ...rest } = quayMove();
  const text = serialiseMove({
    ...Object.fromEntries(Object.entries(rest).reverse()),
    ...rest,
    version,
    format,
  });
  expect(Object.keys(JSON.parse(text) as object)).toEqual([
    ...['format', 'version', 'title', 'notes', 'shot', 'deliverables', 'keys'],
  ]);
  expect(serialiseMove(quayMove())).toBe(text);
});

it('a key is one line, so that a comparison of lines shows what changed', () => {
  const lines = serialiseMove(quayMove()).split('\n');
  expect(lines.filter(line => line.includes('"frame": 720'))).toEqual([
    '    { "frame": 720, "yaw": 180, "pitch": -8, "roll": 0, "fov": 100, "eye": 0.2, "leg": { "path": "level", "ease": "fair" } },',
  ]);
});

it('no −0 is written', () => {
  const text = serialiseMove({ ...moveWith([key(0, { yaw: -0 })]), extensions: { a: [-0] } });
  expect(text).not.toMatch(/-0\b(?!\.)/);
});

describe('a number as decimal text', () => {
  // Truth: arithmetic; the format asks for no exponent, no −0.
  it.each([
    [0, 12, '0'],
    [-0, 12, '0'],
    [-1e-13, 12, '0'],
    [1e-7, 12, '0.0000001'],
    [100, 12, '100'],
    [100, 0, '100'],
    [1e20, 12, '100000000000000000000'],
    [-36000.5, 12, '-36000.5'],
    [1 / 3, 9, '0.333333333'],
  ])('%p with %i decimals is %s', (value, digits, text) => {
    expect(decimalText(value, digits)).toBe(text);
  });

  it('is within half of the last digit of the number', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), value => {
        const text = decimalText(value, 9);
        expect(text).toMatch(/^(?!-0$)-?(0|[1-9]\d*)(\.\d*[1-9])?$/);
        expect(Math.abs(Number(text) - value)).toBeLessThanOrEqual(0.5e-9 + 1e-9 * Number.EPSILON);
      }),
    );
  });
});
