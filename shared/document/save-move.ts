import { type Key, type MoveDocument } from '#schemas/move';
import { type SavedKey } from '#schemas/saved-move';
import { deliveredSeconds } from '#shared/time/delivered-time';
import { defined } from './defined';
import { forget, keyMemory, moveMemory } from './saved-memory';
import { checkSavedMove, type CheckedSavedMove } from './saved-move';
import { shotTimes } from './shot-times';
import { framesAfterFirst } from './saved-places';

/** A stretch of a move, from one of its keys to another. */
export interface Part {
  /** Indices of the first and the last key, both included. */
  readonly firstKey: number;
  readonly lastKey: number;
}

/**
 * A saved move of a move document, or of a part of it.
 *
 * Keys that stand as a saved move once put them say exactly what it said, so that applying plainly and saving again
 * gives the same saved move.
 *
 * @param part the whole move unless said; a fair run that it cuts gets average rates at its new ends (`cutDifference`)
 * @returns the saved move; faults only where somebody else has written in what the document remembers
 */
export function saveMove(document: MoveDocument, part: Part = wholeOf(document)): CheckedSavedMove {
  const keys = document.keys.slice(part.firstKey, part.lastKey + 1);
  const memory = moveMemory(document.extensions);
  const { tags, author, licence, usual, turns } = memory;
  const asPut = keys.length === document.keys.length && endsStandAsPut(keys);
  const lengths = asPut ? { usual, turns } : lengthsOf(document, keys);
  const { title, notes, deliverables } = document;
  return checkSavedMove({
    ...{ format: 'fairlead.saved-move', version: 1 },
    ...defined({ title, notes, deliverables }),
    keys: savedKeys(keys),
    ...defined({ tags, author, licence, ...lengths, extensions: forget(document.extensions) }),
  });
}

function wholeOf({ keys }: MoveDocument): Part {
  return { firstKey: 0, lastKey: keys.length - 1 };
}

function savedKeys(keys: readonly Key[]): SavedKey[] {
  const remembered = keys.map((key, i) => savedKey(key, i, keys, memoryThatHolds(key, keys)));
  const rises = remembered.every((key, i) => i === 0 || key.at > remembered[i - 1].at);
  // Keys of two saved moves in one document may remember places that cross.
  return rises ? remembered : keys.map((key, i) => savedKey(key, i, keys));
}

function savedKey(
  key: Key,
  index: number,
  keys: readonly Key[],
  memory?: { at: number; yaw: number },
): SavedKey {
  const { frame, leg, extensions, ...kept } = key;
  const first = keys[0];
  const isLast = index === keys.length - 1;
  const length = keys[keys.length - 1].frame - first.frame;
  const between = memory?.at ?? (frame - first.frame) / length;
  const others = forget(extensions);
  return {
    at: index === 0 ? 0 : isLast ? 1 : between,
    ...kept,
    yaw: index === 0 ? 0 : (memory?.yaw ?? key.yaw - first.yaw),
    ...(leg && !isLast ? { leg } : {}),
    ...(others ? { extensions: others } : {}),
  };
}

/** A key's memory, where putting it on the shot again would give the key as it is. */
function memoryThatHolds(key: Key, keys: readonly Key[]): ReturnType<typeof keyMemory> {
  const memory = keyMemory(key);
  const first = keys[0];
  const length = keys[keys.length - 1].frame - first.frame;
  const holds =
    memory &&
    first.frame + framesAfterFirst(memory.at, length) === key.frame &&
    first.yaw + memory.yaw === key.yaw &&
    memory.pitch === key.pitch &&
    memory.roll === key.roll;
  return holds ? memory : undefined;
}

function endsStandAsPut(keys: readonly Key[]): boolean {
  const placeOf = (key: Key) => memoryThatHolds(key, keys)?.at;
  return placeOf(keys[0]) === 0 && (keys.length === 1 || placeOf(keys[keys.length - 1]) === 1);
}

/** Its usual length and its turns, as this document has them; neither of a single key. */
function lengthsOf(document: MoveDocument, keys: readonly Key[]): { usual?: number; turns?: number } {
  const first = keys[0];
  const last = keys[keys.length - 1];
  if (first === last) return {};
  const times = shotTimes(document.shot);
  return {
    usual: deliveredSeconds(times, last.frame) - deliveredSeconds(times, first.frame),
    turns: (last.yaw - first.yaw) / 360,
  };
}
