import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

import { inProject } from '../project.mjs';
import { standaloneValidator } from './validators.mjs';

const BANNER = '// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.\n';

/** @returns paths below schemas/ of all schemas, such as `api/shot.schema.json` */
export function schemaFiles() {
  return readdirSync(inProject('schemas'), { recursive: true })
    .filter(file => file.endsWith('.schema.json'))
    .sort();
}

export function readSchema(file, reviver) {
  return JSON.parse(readFileSync(inProject('schemas', file), 'utf8'), reviver);
}

/**
 * Types and validators of every schema: `schemas/generated/<name>.ts` holds the types,
 * `schemas/generated/<name>-validator.ts` a validator without `eval`, for server, browser and command line alike.
 *
 * @returns a Map of path below schemas/generated to text
 */
export async function generated() {
  const files = new Map();
  const schemas = new Map(schemaFiles().map(file => [file, readSchema(file)]));
  for (const file of schemas.keys()) {
    const name = file.replace(/\.schema\.json$/, '');
    files.set(`${name}.ts`, BANNER + (await typesOf(file)));
    files.set(`${name}-validator.ts`, BANNER + (await standaloneValidator(file, schemas)));
  }
  return files;
}

/** json-schema-to-typescript 16 reads draft 2020-12 but for `prefixItems`, which our schemas do without. */
async function typesOf(file) {
  const { compile } = await import('json-schema-to-typescript');
  const schema = readSchema(file, (_name, value) => (isOpenList(value) ? withoutBounds(value) : value));
  return compile(schema, schema.title, {
    cwd: path.dirname(inProject('schemas', file)),
    additionalProperties: false,
    bannerComment: '',
    format: true,
    style: { singleQuote: true, printWidth: 110 },
  });
}

/** A list whose length may vary: its bounds would become a union of tuples, which no code could build. */
function isOpenList(value) {
  return value?.type === 'array' && value.minItems !== value.maxItems;
}

function withoutBounds({ minItems: _min, maxItems: _max, ...schema }) {
  return schema;
}
