import fc from 'fast-check';
import { jsonFault } from '../../server/http/json-position';

const isJson = (text: string): boolean => {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
};

// Truth: V8's JSON.parse, on texts that are JSON and on the same texts with a sign taken out, put in or changed.
it('agrees with JSON.parse on what is JSON', () => {
  const signs = fc.constantFrom(...'{}[]:,"\\ \n\t\u00005-+.eENntfu'.split(''));
  fc.assert(
    fc.property(fc.json(), fc.nat(), fc.nat(2), signs, (text, where, cut, sign) => {
      const at = where % (text.length + 1);
      const changed = text.slice(0, at) + sign + text.slice(at + cut);
      for (const each of [text, changed])
        expect([each, jsonFault(each) === undefined]).toEqual([each, isJson(each)]);
    }),
    { numRuns: 3000 },
  );
});

it.each([
  ['{"a": NaN}', 1, 7, 'NaN'],
  ['{"a": 1,\n "b": Infinity}', 2, 7, 'Infinity'],
  ['{"a": 1,}', 1, 9, '}'],
  ['{"a" 1}', 1, 6, '1'],
  ['[1 2]', 1, 4, '2'],
  ['{"a": 1} x', 1, 10, 'x'],
  ['{"a": "unended', 1, 7, '"'],
  ['', 1, 1, ''],
  ['{"a": 01}', 1, 8, '1'],
  ['[1}', 1, 3, '}'],
])('of %j stops at line %i, column %i', (text, line, column, found) => {
  expect(isJson(text)).toBe(false);
  expect(jsonFault(text)).toMatchObject({ line, column, found });
});
