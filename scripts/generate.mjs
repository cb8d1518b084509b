// `npm run generate`: types and validators from schemas/, the WebAssembly renderer from wasm/. With --check: exit 1 when
// the committed ones are stale.
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { ensurePackages } from './lib/packages.mjs';
import { Explained, inProject } from './lib/project.mjs';
import { fail } from './lib/say.mjs';
import { generated } from './lib/schemas/generate.mjs';
import { RENDERER_MODULE, rendererModule } from './lib/wasm.mjs';

/** Written by hand, beside the generated files that refer to it. */
const BY_HAND = 'schema-validator.ts';

function present() {
  const folder = inProject('schemas/generated');
  if (!existsSync(folder)) return [];
  return readdirSync(folder, { recursive: true }).filter(file => file.endsWith('.ts') && file !== BY_HAND);
}

function write(files) {
  for (const file of present()) if (!files.has(file)) rmSync(inProject('schemas/generated', file));
  for (const [file, text] of files) {
    const target = inProject('schemas/generated', file);
    mkdirSync(path.dirname(target), { recursive: true });
    writeFileSync(target, text);
  }
}

function check(files, renderer) {
  const read = file => (existsSync(file) ? readFileSync(file, 'utf8') : undefined);
  const stale = [...files]
    .filter(([file, text]) => read(inProject('schemas/generated', file)) !== text)
    .map(([file]) => file);
  stale.push(...present().filter(file => !files.has(file)));
  if (read(inProject(RENDERER_MODULE)) !== renderer) stale.push(RENDERER_MODULE);
  if (stale.length > 0) throw new Explained(`Stale: ${stale.join(', ')}. Run npm run generate and commit.`);
}

try {
  await ensurePackages();
  const files = await generated();
  const renderer = await rendererModule();
  if (process.argv.includes('--check')) check(files, renderer);
  else {
    write(files);
    writeFileSync(inProject(RENDERER_MODULE), renderer);
  }
} catch (error) {
  fail(error);
}
