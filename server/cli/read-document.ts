import { readFileSync } from 'node:fs';

import { type MoveDocument } from '#schemas/move';
import { type SavedMove } from '#schemas/saved-move';
import { type CheckedAs } from '#shared/document/check-document';
import { type Fault } from '#shared/document/fault';
import { checkSavedMove } from '#shared/document/saved-move';
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
  return documentIn(file, checkMove(readJson(file)), 'a valid move document', `; see: check ${file}`);
}

/** @throws UsageError where the file is no valid saved move: its first fault, and how many there are */
export function readSavedMove(file: string): SavedMove {
  return documentIn(file, checkSavedMove(readJson(file)), 'a valid saved move');
}

function documentIn<T>(file: string, checked: CheckedAs<T>, wantedKind: string, advice = ''): T {
  if (checked.ok) return checked.document;
  throw new UsageError(`${nameOf(file)} is not ${wantedKind}: ${faultsInOneLine(checked.faults, advice)}`);
}

/** The first of a document's faults, and how many more there are. */
export function faultsInOneLine([first, ...others]: readonly Fault[], advice = ''): string {
  const more = others.length > 0 ? ` (and ${others.length} more${advice})` : '';
  return `${first.pointer === '' ? '' : `${first.pointer}: `}${first.detail}${more}`;
}
