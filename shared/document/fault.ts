/** One thing wrong with a document: where, and what was wanted and given. */
export interface Fault {
  /** JSON Pointer (RFC 6901) of the member that is at fault. */
  readonly pointer: string;
  /** A sentence that goes on from the pointer: "must be after frame 720, is 700". */
  readonly detail: string;
}

/** Longest rendering of a wrong value in a sentence. */
const SHOWN = 60;

/** @returns a value as a person would write it, short */
export function shown(value: unknown): string {
  if (typeof value === 'number' || typeof value === 'boolean' || value == null) return String(value);
  if (typeof value === 'string')
    return JSON.stringify(value.length > SHOWN ? `${value.slice(0, SHOWN)}…` : value);
  if (Array.isArray(value)) return `a list of ${value.length}`;
  return typeof value === 'object' ? 'an object' : typeof value;
}

/** @returns a pointer to a member: `~` and `/` escaped as RFC 6901 asks */
export function pointerTo(parent: string, member: string | number): string {
  return `${parent}/${String(member).replaceAll('~', '~0').replaceAll('/', '~1')}`;
}

/** @returns the value that a pointer names, undefined where there is none; own members only */
export function valueAt(root: unknown, pointer: string): unknown {
  let value = root;
  for (const part of pointer.split('/').slice(1)) {
    const member = part.replaceAll('~1', '/').replaceAll('~0', '~');
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, member)) return undefined;
    value = Reflect.get(value, member);
  }
  return value;
}
