import { readFileSync } from 'node:fs';

import { type MoveDocument } from '#schemas/move';
import { checkMove } from '#shared/document/validate';
import { UsageError } from './usage';

/**
 * @param file a path, or `-` for standard input
 * @returns the parsed JSON
 * @throws UsageError where it cannot be read or is not JSON
 */
export function readJson(file: string): unknown {
  const name = nameOf(file);
  let text: string;
  try {
    text = readFileSync(file === '-' ? 0 : file, 'utf8');
  } catch (error) {
    throw new UsageError(`${name} cannot be read: ${error instanceof Error ? error.message : String(error)}`);
  }
  try {
    return JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    throw new UsageError(`${name} is not JSON: ${error instanceof Error ? error.message : String(error)}`);
  }
}

function nameOf(file: string): string {
  return file === '-' ? 'standard input' : file;
}

/** @throws UsageError where the file is no valid move document: its first fault, and how many there are */
export function readMove(file: string): MoveDocument {
  const checked = checkMove(readJson(file));
  if (checked.ok) return checked.document;
  const [first] = checked.faults;
  const more =
    checked.faults.length > 1 ? ` (and ${checked.faults.length - 1} more; see: check ${file})` : '';
  throw new UsageError(
    `${nameOf(file)} is not a valid move document: ${first.pointer}: ${first.detail}${more}`,
  );
}
