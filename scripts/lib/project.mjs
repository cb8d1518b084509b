import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder that holds package.json. */
export const ROOT = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** What a running copy keeps: database, pictures, secrets. Ignored by git; delete it to begin anew. */
export const DATA = path.join(ROOT, '.data');

export const inProject = (...parts) => path.join(ROOT, ...parts);

/** @returns a folder below `.data`, made when missing */
export function dataFolder(...parts) {
  const folder = path.join(DATA, ...parts);
  mkdirSync(folder, { recursive: true });
  return folder;
}

/** A failure whose message is all that a person needs: printed without a stack. */
export class Explained extends Error {}
