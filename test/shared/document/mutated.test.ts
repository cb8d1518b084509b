import * as fc from 'fast-check';

import { type Fault, valueAt } from '#shared/document/fault';
import { serialiseMove } from '#shared/document/serialise';
import { checkMove } from '#shared/document/validate';
import { compileMove } from '#shared/path/compile';
import { fixture } from '../../support/fixtures';

const TEXTS = ['quay-one-turn.move.json', 'documents/move-version-1.json'].map(name =>
  fixture(name).toString('utf8'),
);

/** What takes the place of a member: near misses, other types, what JSON cannot hold, and names that bite. */
const strange = fc.oneof(
  fc.double(),
  fc.integer(),
  fc.constantFrom(NaN, Infinity, -Infinity, -0, 1e308, 5e-324, null, true, '', '__proto__', '01:00:00:00'),
  fc.string({ maxLength: 8 }),
  fc.constantFrom<unknown>([], {}, [0, 0, 0, 1], { bezier: [0, 0, 1, 1] }, 'hold', 'fair', {
    num: 24,
    den: 1,
  }),
  fc.dictionary(fc.string({ maxLength: 4 }), fc.jsonValue({ maxDepth: 1 }), { maxKeys: 2 }),
);

interface Mutation {
  readonly where: number;
  readonly how: 'replace' | 'remove' | 'add' | 'double' | 'swap';
  readonly name: string;
  readonly value: unknown;
}

const mutation: fc.Arbitrary<Mutation> = fc.record({
  where: fc.nat(),
  how: fc.constantFrom('replace', 'remove', 'add', 'double', 'swap'),
  name: fc.constantFrom('extensions', 'leg', 'match', 'fov', '__proto__', 'constructor', 'a/b~c', ''),
  value: strange,
});

/** Every object and list of a value, the whole first. */
function parts(value: unknown): object[] {
  return typeof value === 'object' && value !== null ? [value, ...Object.values(value).flatMap(parts)] : [];
}

function mutate(document: unknown, { where, how, name, value }: Mutation): void {
  const all = parts(document);
  const part = all[where % all.length];
  const names = Object.keys(part);
  const member = names[(where >> 4) % Math.max(names.length, 1)] ?? name;
  const copy: unknown = structuredClone(value);
  if (how === 'replace') Reflect.set(part, member, copy);
  else if (how === 'remove') Reflect.deleteProperty(part, member);
  else if (how === 'add' && !Array.isArray(part))
    Reflect.defineProperty(part, name, { value: copy, enumerable: true, writable: true });
  else if (Array.isArray(part)) {
    if (how === 'double') part.push(structuredClone(part[0]));
    else part.reverse();
  }
}

function isTelling({ pointer, detail }: Fault): boolean {
  return (pointer === '' || pointer.startsWith('/')) && detail.trim().length > 3;
}

/** Truth: the promise of the format: a document is taken whole, or every fault names its place; nothing else happens. */
it('10,000 mutated documents are taken whole or refused with telling faults; nothing throws', () => {
  let taken = 0;
  fc.assert(
    fc.property(fc.boolean(), fc.array(mutation, { minLength: 1, maxLength: 4 }), (full, mutations) => {
      const document: unknown = JSON.parse(TEXTS[full ? 1 : 0]);
      for (const each of mutations) mutate(document, each);
      const checked = checkMove(document);
      if (!checked.ok) {
        return checked.faults.length > 0 && checked.faults.every(isTelling);
      }
      taken++;
      const again: unknown = JSON.parse(serialiseMove(checked.document));
      const { keys } = checked.document;
      const pose = compileMove(checked.document).poseAt(new Float64Array(6), keys[0].frame + 0.5);
      return (
        checked.document === document &&
        JSON.stringify(again).length === JSON.stringify(document).length &&
        checkMove(again).ok &&
        pose.every(Number.isFinite)
      );
    }),
    { numRuns: 10_000 },
  );
  // A test of refusals alone, or of none, would show little.
  expect(taken).toBeGreaterThan(500);
  expect(taken).toBeLessThan(9500);
});

it('the pointer of a fault about a value finds that value', () => {
  fc.assert(
    fc.property(fc.array(mutation, { minLength: 1, maxLength: 2 }), mutations => {
      const document: unknown = JSON.parse(TEXTS[0]);
      for (const each of mutations) mutate(document, each);
      const checked = checkMove(document);
      for (const { pointer, detail } of checked.ok ? [] : checked.faults) {
        const found = valueAt(document, pointer);
        expect(found === undefined).toBe(/^is missing/.test(detail) || detail.endsWith('is undefined'));
      }
    }),
    { numRuns: 1000 },
  );
});
