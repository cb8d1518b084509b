import { types } from 'node:util';

/**
 * Reads an error without asking what made it: Node's own errors are not `instanceof Error` everywhere (a test runner has
 * globals of its own).
 */

/** @returns the code of a system or database error, such as `ENOSPC` or `23505`; empty where it has none */
export function codeOf(error: unknown): string {
  return typeof error === 'object' && error !== null && 'code' in error && typeof error.code === 'string'
    ? error.code
    : '';
}

/** @returns the message; empty where it has none */
export function messageOf(error: unknown): string {
  return typeof error === 'object' &&
    error !== null &&
    'message' in error &&
    typeof error.message === 'string'
    ? error.message
    : '';
}

/** @returns what a callback gave as its error, as an Error */
export function asError(error: unknown): Error {
  return types.isNativeError(error) ? error : new Error(String(error));
}
