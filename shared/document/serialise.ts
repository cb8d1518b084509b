import { type MoveDocument } from '#schemas/move';
import { type SavedMove } from '#schemas/saved-move';

/** The members of each part in the order of the format's description: a document reads the same whoever wrote it. */
const ORDER = {
  document: [
    ...['format', 'version', 'title', 'notes', 'author', 'licence', 'tags', 'usual', 'turns'],
    ...['shot', 'deliverables', 'keys', 'extensions'],
  ],
  shot: [
    ...['title', 'rate', 'frames', 'speed', 'from', 'to', 'start', 'dropFrame', 'source', 'level', 'seamYaw'],
    ...['loops', 'exposure', 'interval', 'extensions'],
  ],
  deliverable: ['name', 'width', 'height', 'match', 'extensions'],
  key: ['frame', 'at', 'yaw', 'pitch', 'roll', 'fov', 'eye', 'rest', 'leg', 'extensions'],
} as const satisfies Record<string, readonly string[]>;

/**
 * A move document as text that people read and compare: members in a fixed order, a key on one line.
 *
 * @returns JSON that parses to an equal document; no −0
 */
export function serialiseMove(document: MoveDocument): string {
  return serialised(document, { ...listsOf(document), shot: line(document.shot, ORDER.shot) });
}

/** A saved move as text. @see serialiseMove */
export function serialiseSavedMove(saved: SavedMove): string {
  return serialised(saved, listsOf(saved));
}

/** @param written the members that do not fit on one line, as text */
function serialised(document: object, written: Readonly<Record<string, string>>): string {
  const members = ordered(document, ORDER.document).map(
    ([name, value]) => `  ${quote(name)}: ${written[name] ?? quote(value)}`,
  );
  return `{\n${members.join(',\n')}\n}\n`;
}

function listsOf({ keys, deliverables }: { keys: readonly object[]; deliverables: readonly object[] }) {
  return {
    keys: lines(keys.map(key => line(key, ORDER.key))),
    deliverables: lines(deliverables.map(each => line(each, ORDER.deliverable))),
  };
}

function line(part: object, order: readonly string[]): string {
  return `{ ${ordered(part, order)
    .map(([name, value]) => `${quote(name)}: ${spaced(value)}`)
    .join(', ')} }`;
}

function lines(entries: readonly string[]): string {
  return `[\n${entries.map(entry => `    ${entry}`).join(',\n')}\n  ]`;
}

function ordered(part: object, order: readonly string[]): [string, unknown][] {
  return Object.entries(part)
    .filter(([, value]) => value !== undefined)
    .sort(([a], [b]) => order.indexOf(a) - order.indexOf(b));
}

function quote(value: unknown): string {
  return JSON.stringify(value, (_name, each: unknown) => (Object.is(each, -0) ? 0 : each));
}

/** Small parts with a blank after each comma and colon, as a person would write them. */
function spaced(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(spaced).join(', ')}]`;
  if (typeof value !== 'object' || value === null) return quote(value);
  const members = Object.entries(value).map(([name, each]) => `${quote(name)}: ${spaced(each)}`);
  return members.length === 0 ? '{}' : `{ ${members.join(', ')} }`;
}
