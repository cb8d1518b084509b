// `npm run -s move -- VERB FILE [options]`: the command line, bundled when its sources have changed.
import { pathToFileURL } from 'node:url';

import { bundle } from './lib/build.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { inProject } from './lib/project.mjs';
import { fail } from './lib/say.mjs';
import { whenStale } from './lib/stamps.mjs';

try {
  await ensurePackages();
  const inputs = ['server/cli', 'server/render', 'shared', 'schemas/generated', 'package-lock.json'];
  await whenStale({ name: 'move', inputs, outputs: ['dist/move/move.mjs'] }, () =>
    bundle([{ in: 'server/cli/main.ts', out: 'move' }], 'dist/move', {
      splitting: true,
      chunkNames: '[name]-[hash]',
    }),
  );
  await import(pathToFileURL(inProject('dist/move/move.mjs')).href);
} catch (error) {
  fail(error);
}
