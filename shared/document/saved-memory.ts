import { type Key } from '#schemas/move';
import { type SavedKey } from '#schemas/saved-move';
import { isNumber, partOf } from './unsure';

/**
 * What a move remembers of the saved move that was put on its shot.
 *
 * A key's frame is rounded, so its place along the saved move could not be found again from it. Each key therefore
 * carries the saved key's numbers among its extensions, and the document carries what a move has no members for. A key
 * uses them again only where they still lead to the numbers that it has now.
 */
const MEMORY = 'fairlead.saved-move';

type Extensions = Readonly<Record<string, unknown>>;

/** @returns the extensions with a memory among them */
export function remember(extensions: Extensions | undefined, memory: object): Record<string, unknown> {
  const others = forget(extensions) ?? {};
  // An empty list of extensions is not the same as none; it comes back as it was.
  const kept = extensions && Object.keys(extensions).length === 0 ? { ...memory, empty: true } : memory;
  return { ...others, [MEMORY]: kept };
}

/** @returns the extensions without a memory; undefined where there is nothing else */
export function forget(extensions: Extensions | undefined): Record<string, unknown> | undefined {
  if (!extensions) return undefined;
  const { [MEMORY]: memory, ...others } = extensions;
  const wereNone = memory !== undefined && partOf(memory)['empty'] !== true;
  return wereNone && Object.keys(others).length === 0 ? undefined : others;
}

/** @returns what a document remembers, as it stands there: not checked */
export function moveMemory(extensions: Extensions | undefined): Record<string, unknown> {
  return partOf(extensions?.[MEMORY]);
}

/** @returns the saved key's numbers that a key remembers; undefined where it has none */
export function keyMemory(key: Key): Pick<SavedKey, 'at' | 'yaw' | 'pitch' | 'roll'> | undefined {
  const { at, yaw, pitch, roll } = partOf(key.extensions?.[MEMORY]);
  return isNumber(at) && isNumber(yaw) && isNumber(pitch) && isNumber(roll)
    ? { at, yaw, pitch, roll }
    : undefined;
}
