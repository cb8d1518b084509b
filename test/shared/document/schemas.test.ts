import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

import Ajv2020 from 'ajv/dist/2020';

const FOLDER = path.resolve('schemas');
const files = readdirSync(FOLDER, { recursive: true, encoding: 'utf8' }).filter(file =>
  file.endsWith('.schema.json'),
);
const read = (file: string): Record<string, unknown> =>
  JSON.parse(readFileSync(path.join(FOLDER, file), 'utf8')) as Record<string, unknown>;

/** Every schema within a schema, with its place. */
function schemasIn(value: unknown, place: string): [string, Record<string, unknown>][] {
  if (typeof value !== 'object' || value === null) return [];
  const inside = Object.entries(value).flatMap(([name, member]) => schemasIn(member, `${place}/${name}`));
  return 'type' in value && typeof value.type === 'string' ? [[place, { ...value }], ...inside] : inside;
}

describe.each(files)('%s', file => {
  it('is a valid schema of draft 2020-12, by its meta-schema as ajv carries it', () => {
    const ajv = new Ajv2020();
    expect(ajv.validateSchema(read(file))).toBe(true);
    expect(read(file)).toMatchObject({ $schema: 'https://json-schema.org/draft/2020-12/schema' });
  });

  it('is found by its file name', () => {
    expect(read(file)['$id']).toBe(path.basename(file));
  });
});

/** STYLE of our own: every number's description gives its unit; a number without words has been forgotten. */
it.each(files.filter(file => !file.startsWith('api')))('%s describes every number', file => {
  const numbers = schemasIn(read(file), '').filter(
    ([place, { type }]) => (type === 'number' || type === 'integer') && !place.endsWith('/items'),
  );
  expect(numbers.length).toBeGreaterThan(5);
  expect(numbers.filter(([, schema]) => typeof schema['description'] !== 'string')).toEqual([]);
});
