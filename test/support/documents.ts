import { type MoveDocument } from '#schemas/move';
import { checkMove } from '#shared/document/validate';
import { fixture } from './fixtures';

/** A fresh copy of a stored move document, as it stands in its file. */
export function storedMove(name: string): MoveDocument {
  const checked = checkMove(JSON.parse(fixture(name).toString('utf8')));
  if (!checked.ok) throw new Error(`${name}: ${JSON.stringify(checked.faults)}`);
  return checked.document;
}

/** The document of the format's description: one turn with a dip. */
export const quayMove = (): MoveDocument => storedMove('quay-one-turn.move.json');

/** Every member that version 1 knows, in values at the ends of their ranges. */
export const fullMove = (): MoveDocument => storedMove('documents/move-version-1.json');

/**
 * A copy of a document with some of its values exchanged.
 *
 * @param changes pointers and values; undefined takes the member out
 */
export function changed(document: unknown, changes: Readonly<Record<string, unknown>>): unknown {
  const copy: unknown = structuredClone(document);
  for (const [pointer, value] of Object.entries(changes)) {
    const names = pointer.split('/').slice(1);
    const last = names.pop() ?? '';
    const parent = names.reduce<unknown>((part, name) => Reflect.get(Object(part), name), copy);
    if (value === undefined) Reflect.deleteProperty(Object(parent), last);
    else Reflect.set(Object(parent), last, value);
  }
  return copy;
}
