import { jsonFault } from './json-position';
import { Problem } from './problem';

/** The largest JSON body: 2,000 keys with all their digits and extensions need less than half of it. */
export const MOST_JSON_BYTES = 2 * 1024 * 1024;

/** @returns the problem with a request's body that Express' own reader found, or undefined for another error */
export function bodyProblem(error: unknown): Problem | undefined {
  if (typeof error !== 'object' || error === null || !('type' in error)) return undefined;
  switch (error.type) {
    case 'entity.too.large':
      return new Problem(
        413,
        'body-too-large',
        'The body is too large',
        `A JSON body may have up to ${MOST_JSON_BYTES / 1024 / 1024} MB. Nothing was stored.`,
      );
    case 'entity.parse.failed':
      return malformed('body' in error && typeof error.body === 'string' ? error.body : '');
    case 'charset.unsupported':
    case 'encoding.unsupported':
      return new Problem(
        415,
        'body-not-json',
        'The body is not readable',
        'Send JSON in UTF-8, plain or gzipped. Nothing was stored.',
      );
    case 'request.aborted':
    case 'request.size.invalid':
      return new Problem(
        400,
        'body-cut-short',
        'The body was cut short',
        'The body ended before its stated length. Nothing was stored; send it again.',
      );
    default:
      return undefined;
  }
}

function malformed(body: string): Problem {
  const fault = jsonFault(body);
  const where = fault
    ? `line ${fault.line}, column ${fault.column} (offset ${fault.offset}): ${fault.found ? `found ${JSON.stringify(fault.found)}` : 'the text ends'}`
    : 'its beginning: it must be an object';
  return new Problem(
    400,
    'malformed-json',
    'The body is not JSON',
    `It stops being JSON at ${where}. Nothing was stored.`,
  );
}

export const wrongContentType = (wanted: string) =>
  new Problem(415, 'wrong-content-type', 'The body has another type', `Send ${wanted}. Nothing was stored.`);
