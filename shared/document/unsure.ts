/**
 * Reading values that nobody has checked yet. Rules look at each part on its own and ask for the right types first, so
 * that they find what is wrong beside parts that the schema has already refused.
 */

/** What a part is before it is known to be one: every member may be missing or of another type. */
export type Unsure<T> = { readonly [K in keyof T]?: unknown };

export function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** @returns the value, or an empty part where it is none */
export function partOf(value: unknown): Record<string, unknown> {
  return isRecord(value) ? value : {};
}

/** @returns the parts of a list; an empty one for each entry that is none, so that indices stay */
export function partsOf(value: unknown): Record<string, unknown>[] {
  return Array.isArray(value) ? Array.from(value, partOf) : [];
}

export function isNumber(value: unknown): value is number {
  return typeof value === 'number' && Number.isFinite(value);
}

export function isWhole(value: unknown): value is number {
  return Number.isInteger(value);
}

/** @returns what is said of each entry of a list that is a part at all */
export function eachPart<T>(
  list: unknown,
  say: (part: Record<string, unknown>, index: number) => readonly T[],
): T[] {
  if (!Array.isArray(list)) return [];
  return list.flatMap((entry: unknown, i) => (isRecord(entry) ? say(entry, i) : []));
}
