import path from 'node:path';

/**
 * Ajv's standalone code for one schema, bundled so that it imports nothing: it runs under a policy that forbids `eval`.
 *
 * @param file path below schemas/
 * @param schemas Map of all schemas by path, for references between them
 * @returns TypeScript text that exports `validate`
 */
export async function standaloneValidator(file, schemas) {
  const { Ajv2020 } = await import('ajv/dist/2020.js');
  const { default: standalone } = await import('ajv/dist/standalone/index.js');
  // A CommonJS package: depending on the loader its default stands one level deeper.
  const standaloneCode = standalone.default ?? standalone;
  const ajv = new Ajv2020({
    allErrors: true,
    verbose: false,
    strictRequired: false,
    code: { source: true, esm: true, lines: false },
    schemas: [...schemas.values()],
  });
  const { $id, title } = schemas.get(file);
  const code = await selfContained(standaloneCode(ajv, { machineMade: $id }));
  return `// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from '${'../'.repeat(file.split('/').length - 1) || './'}schema-validator';
import { type ${title} } from './${path.basename(file, '.schema.json')}';

${code.replace(/export\s*\{[^}]*\};?\s*$/, '')}
export const validate: SchemaValidator<${title}> = ${exportedName(code)} as SchemaValidator<${title}>;
`;
}

/** esbuild ends its output with `export { name as machineMade };` */
function exportedName(code) {
  const [, name] = /export\s*\{\s*(?:([\w$]+) as )?machineMade\s*\}/.exec(code) ?? [];
  return name ?? 'machineMade';
}

/** Ajv emits `require` for its helpers (`minLength` counts code points): esbuild folds them in. */
async function selfContained(contents) {
  const { build } = await import('esbuild');
  const result = await build({
    stdin: { contents, resolveDir: path.resolve('.'), loader: 'js' },
    bundle: true,
    format: 'esm',
    target: 'es2022',
    write: false,
    minifySyntax: true,
    legalComments: 'none',
  });
  return result.outputFiles[0].text;
}
