/** Where a text stops being JSON. Line and column count from 1, in UTF-16 units. */
export interface JsonFault {
  readonly offset: number;
  readonly line: number;
  readonly column: number;
  /** What stands there, cut short; empty at the end of the text. */
  readonly found: string;
}

type Expected = 'value' | 'valueOrEnd' | 'name' | 'nameOrEnd' | 'colon' | 'commaOrEnd' | 'end';

const SPACE = /[ \t\n\r]*/y;
const STRING = /"(?:[^"\\\p{Cc}]|[\u007f-\u009f]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"/uy;
const SCALAR = /true|false|null|-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
const SHOWN_SIGNS = 20;

/**
 * The first place at which a text is not JSON (RFC 8259). V8's own message names no position where it stops at an
 * unexpected word, such as NaN.
 *
 * @returns undefined where the whole text is JSON
 */
export function jsonFault(text: string): JsonFault | undefined {
  const open: ('{' | '[')[] = [];
  let expected: Expected = 'value';
  let at = 0;

  const take = (pattern: RegExp): boolean => {
    pattern.lastIndex = at;
    const match = pattern.exec(text);
    if (!match) return false;
    at += match[0].length;
    return true;
  };
  const afterValue = (): Expected => (open.length > 0 ? 'commaOrEnd' : 'end');

  for (;;) {
    take(SPACE);
    const sign = text[at];
    if (sign === undefined) return expected === 'end' ? undefined : describe(text, at);
    const before = at;
    if ((sign === '}' || sign === ']') && mayClose(expected, open.at(-1), sign)) {
      at++;
      open.pop();
      expected = afterValue();
    } else if (expected === 'value' || expected === 'valueOrEnd') {
      if (sign === '{' || sign === '[') {
        at++;
        open.push(sign);
        expected = sign === '{' ? 'nameOrEnd' : 'valueOrEnd';
      } else if (take(STRING) || take(SCALAR)) expected = afterValue();
    } else if (expected === 'name' || expected === 'nameOrEnd') {
      if (take(STRING)) expected = 'colon';
    } else if (expected === 'colon' && sign === ':') {
      at++;
      expected = 'value';
    } else if (expected === 'commaOrEnd' && sign === ',') {
      at++;
      expected = open.at(-1) === '{' ? 'name' : 'value';
    }
    if (at === before) return describe(text, at);
  }
}

function mayClose(expected: Expected, opened: string | undefined, sign: string): boolean {
  if (sign === '}') return opened === '{' && (expected === 'nameOrEnd' || expected === 'commaOrEnd');
  return opened === '[' && (expected === 'valueOrEnd' || expected === 'commaOrEnd');
}

function describe(text: string, offset: number): JsonFault {
  const before = text.slice(0, offset);
  const line = before.split('\n').length;
  const column = offset - before.lastIndexOf('\n');
  const word = /^[\w.+-]+/.exec(text.slice(offset, offset + SHOWN_SIGNS));
  return { offset, line, column, found: word ? word[0] : text.slice(offset, offset + 1) };
}
