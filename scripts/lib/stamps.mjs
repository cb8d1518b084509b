import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { inProject } from './project.mjs';

/**
 * Does a piece of work only when what it is made from has changed.
 *
 * @param name of the stamp, kept in `dist/.stamps`; written only after the work has succeeded
 * @param inputs files and folders below the project whose contents decide
 * @param outputs files that must exist for the work to count as done
 * @param work async function
 */
export async function whenStale({ name, inputs, outputs }, work) {
  const stamp = inProject('dist/.stamps', name);
  const wanted = contentHash(inputs);
  const fresh =
    existsSync(stamp) &&
    readFileSync(stamp, 'utf8') === wanted &&
    outputs.every(file => existsSync(inProject(file)));
  if (fresh) return;
  await work();
  mkdirSync(path.dirname(stamp), { recursive: true });
  writeFileSync(stamp, wanted);
}

function contentHash(inputs) {
  const hash = createHash('sha256').update(process.version);
  for (const file of inputs.flatMap(input => filesBelow(inProject(input))).sort()) {
    hash.update(file).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

function filesBelow(place) {
  if (!existsSync(place)) return [];
  if (statSync(place).isFile()) return [place];
  return readdirSync(place, { withFileTypes: true, recursive: true })
    .filter(entry => entry.isFile())
    .map(entry => path.join(entry.parentPath, entry.name));
}
