import { existsSync, readFileSync } from 'node:fs';

import { inProject } from './project.mjs';
import { mustRun } from './run.mjs';
import { step } from './say.mjs';

/**
 * Installs the locked packages when they are missing or stale.
 *
 * npm writes `node_modules/.package-lock.json` as its last act, so a half-done install has none, and comparing it
 * with the committed lock tells whether what is installed is what is wanted. No stamp of our own can go wrong.
 */
export async function ensurePackages() {
  if (installedAsLocked()) return;
  await step('Installing packages (a minute or two the first time)', () =>
    mustRun('Installing packages', 'npm', [
      'ci',
      '--ignore-scripts',
      '--no-audit',
      '--no-fund',
      '--no-progress',
    ]),
  );
}

function installedAsLocked() {
  const installed = packagesOf('node_modules/.package-lock.json');
  const locked = packagesOf('package-lock.json');
  if (!installed || !locked) return false;
  return Object.entries(locked).every(([folder, wanted]) => {
    if (folder === '') return true;
    const found = installed[folder];
    return found ? found.version === wanted.version : Boolean(wanted.optional || wanted.peer);
  });
}

function packagesOf(file) {
  const path = inProject(file);
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')).packages : undefined;
}
