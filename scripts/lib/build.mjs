import { existsSync } from 'node:fs';
import path from 'node:path';

import { inProject } from './project.mjs';
import { mustRun } from './run.mjs';
import { step } from './say.mjs';
import { whenStale } from './stamps.mjs';

const LOCK = 'package-lock.json';

/** Programs that run by plain Node: bundled, so that a start does not compile TypeScript. */
const SERVER_ENTRIES = [
  'server/main.ts',
  'server/prepare.ts',
  { in: 'server/plates/picture-worker.ts', out: 'plates/picture-worker' },
];

/** Builds the browser's half into `dist/client`. */
export async function buildClient() {
  const inputs = [
    'src',
    'shared',
    'schemas/generated',
    'public',
    'angular.json',
    'tsconfig.json',
    'tsconfig.app.json',
    LOCK,
  ];
  await whenStale({ name: 'client', inputs, outputs: ['dist/client/index.html'] }, () =>
    step('Building the client (up to a minute after a change)', () =>
      mustRun('Building the client', process.execPath, [
        'node_modules/@angular/cli/bin/ng.js',
        'build',
        '--progress=false',
      ]),
    ),
  );
}

/** Bundles the server's programs into `dist/server`. */
export async function buildServer() {
  const inputs = ['server', 'shared', 'schemas', 'migrations', 'seeds', LOCK];
  await whenStale(
    {
      name: 'server',
      inputs,
      outputs: ['dist/server/main.mjs', 'dist/server/prepare.mjs', 'dist/server/plates/picture-worker.mjs'],
    },
    () => step('Building the server', () => bundle(SERVER_ENTRIES, 'dist/server')),
  );
}

/**
 * Bundles TypeScript entry files for Node, packages left outside.
 *
 * @param entries paths below the project, each becoming `<outdir>/<name>.mjs`, or `{ in, out }` with a name of its own
 */
export async function bundle(entries, outdir, options = {}) {
  const { build } = await import('esbuild');
  await build({
    entryPoints: entries
      .map(entry => (typeof entry === 'string' ? { in: entry, out: path.basename(entry, '.ts') } : entry))
      .map(entry => ({ ...entry, in: inProject(entry.in) }))
      .filter(entry => existsSync(entry.in)),
    outdir: inProject(outdir),
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    minifySyntax: true,
    packages: 'external',
    sourcemap: true,
    outExtension: { '.js': '.mjs' },
    logLevel: 'warning',
    ...options,
  });
}
