import { type MoveDocument } from '#schemas/move';
import { validate } from '#schemas/move-validator';
import { type Fault, shown } from './fault';
import { ruleFaults } from './rules';
import { schemaFaults } from './schema-faults';

export const MOVE_FORMAT = 'fairlead.move';
export const MOVE_VERSION = 1;

/** Most keys of a document (schemas/move.schema.json); what lies beyond is counted, not read. */
const MOST_KEYS = 2000;

export type Checked =
  { readonly ok: true; readonly document: MoveDocument } | { readonly ok: false; readonly faults: Fault[] };

/**
 * Checks whether a value is a move document.
 *
 * @param value anything, such as parsed JSON of unknown origin
 * @returns the document as it is (nothing is filled in or taken out), or all its faults, each with its pointer; never
 *   throws
 */
export function checkMove(value: unknown): Checked {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return refuse({ pointer: '', detail: `must be a move document (an object), is ${shown(value)}` });
  }
  const later = laterVersion(value);
  if (later) return refuse(later);
  const { value: readable, faults: tooMany } = withoutExcessKeys(value);
  const matches = validate(readable);
  const faults = [
    ...tooMany,
    ...(matches ? [] : schemaFaults(readable, validate.errors ?? [])),
    ...ruleFaults(readable),
  ];
  return matches && faults.length === 0
    ? { ok: true, document: readable }
    : { ok: false, faults: inOrder(faults) };
}

function refuse(fault: Fault): Checked {
  return { ok: false, faults: [fault] };
}

/** A later version may mean anything: one clear sentence, not a list of what it has that this one does not know. */
function laterVersion(value: object): Fault | undefined {
  const { format, version }: { format?: unknown; version?: unknown } = value;
  if (format !== MOVE_FORMAT) return undefined;
  if (typeof version !== 'number' || !(version > MOVE_VERSION)) return undefined;
  return {
    pointer: '/version',
    detail: `is ${version}, written by a newer Fairlead; this one reads up to version ${MOVE_VERSION}`,
  };
}

function withoutExcessKeys(value: object): { value: object; faults: Fault[] } {
  const { keys }: { keys?: unknown } = value;
  if (!Array.isArray(keys) || keys.length <= MOST_KEYS) return { value, faults: [] };
  const detail = `must have at most ${MOST_KEYS} entries, has ${keys.length}`;
  return { value: { ...value, keys: keys.slice(0, MOST_KEYS) }, faults: [{ pointer: '/keys', detail }] };
}

/** By pointer, so that a person reads a document's faults from top to bottom; numbers count as numbers. */
function inOrder(faults: readonly Fault[]): Fault[] {
  return [...faults].sort((a, b) => a.pointer.localeCompare(b.pointer, 'en', { numeric: true }));
}
