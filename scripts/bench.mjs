// `npm run -s bench -- NAME`: runs test/bench/NAME.ts; without a name, lists the benches.
import { existsSync, readdirSync } from 'node:fs';
import { pathToFileURL } from 'node:url';

import { bundle } from './lib/build.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { Explained, inProject } from './lib/project.mjs';
import { fail } from './lib/say.mjs';

try {
  await ensurePackages();
  const [name] = process.argv.slice(2);
  const benches = readdirSync(inProject('test/bench'))
    .filter(file => file.endsWith('.ts'))
    .map(file => file.slice(0, -'.ts'.length));
  if (!name || !existsSync(inProject('test/bench', `${name}.ts`))) {
    throw new Explained(
      `Name a bench: npm run -s bench -- NAME, where NAME is one of ${benches.join(', ')}.`,
    );
  }
  await bundle([`test/bench/${name}.ts`], 'dist/bench');
  await import(pathToFileURL(inProject('dist/bench', `${name}.mjs`)).href);
} catch (error) {
  fail(error);
}
