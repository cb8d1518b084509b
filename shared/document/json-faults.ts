import { type Fault, pointerTo, shown } from './fault';

/** Lists and objects within one another. Members of other programs may go deep, but not without end: JSON's writer and databases recurse. */
const MOST_LEVELS = 100;

/**
 * Finds what JSON text could not hold, and would lose without a word: numbers that are not finite, values that are not
 * JSON's, and nesting without end.
 *
 * @param pointer where the value stands
 * @returns one fault a place; for nesting one at `pointer`, and then no others
 */
export function jsonFaults(value: unknown, pointer: string): Fault[] {
  const faults: Fault[] = [];
  const heights = new Map<object, number>();
  if (heightOf(value, MOST_LEVELS, heights) > MOST_LEVELS)
    return [{ pointer, detail: `must be at most ${MOST_LEVELS} levels deep, goes deeper` }];
  collect(value, pointer, faults, new Set());
  return faults;
}

/**
 * @param most levels that may follow; a value that goes deeper, or holds itself, counts as deeper than that
 * @param heights of objects seen before, so that one that stands in many places is measured once
 */
function heightOf(value: unknown, most: number, heights: Map<object, number>): number {
  if (typeof value !== 'object' || value === null) return 0;
  const known = heights.get(value);
  if (known !== undefined) return known;
  if (most === 0) return Infinity;
  // While it is being measured it counts as endless: if it is met inside itself, it is.
  heights.set(value, Infinity);
  let height = 0;
  for (const member of Object.values(value)) height = Math.max(height, heightOf(member, most - 1, heights));
  heights.set(value, height + 1);
  return height + 1;
}

function collect(value: unknown, pointer: string, faults: Fault[], seen: Set<object>): void {
  if (typeof value !== 'object' || value === null) {
    if (!isJsonScalar(value))
      faults.push({ pointer, detail: `must be a value that JSON can hold, is ${shown(value)}` });
    return;
  }
  if (seen.has(value)) return;
  seen.add(value);
  if (!isPlain(value)) {
    faults.push({
      pointer,
      detail: `must be a value that JSON can hold, is a list with gaps or an object of its own kind`,
    });
    return;
  }
  for (const [name, member] of Object.entries(value)) collect(member, pointerTo(pointer, name), faults, seen);
}

function isJsonScalar(value: unknown): boolean {
  return (
    value === null ||
    typeof value === 'string' ||
    typeof value === 'boolean' ||
    (typeof value === 'number' && Number.isFinite(value))
  );
}

/** A list without gaps or members of its own; an object plain whichever window or context made it: its prototype is the end of the line, or is missing. */
function isPlain(value: object): boolean {
  if (Array.isArray(value)) return Object.keys(value).length === value.length;
  const prototype: unknown = Object.getPrototypeOf(value);
  return prototype === null || Object.getPrototypeOf(prototype) === null;
}
