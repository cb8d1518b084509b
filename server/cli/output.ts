import { writeSync } from 'node:fs';

/** Characters gathered before they are written: few system calls for long tables. */
const CHUNK = 1 << 16;

/** Thrown when the reader of standard output has gone (`move bake … | head`): not a fault. */
export class ReaderGone extends Error {}

/**
 * Writes pieces of text to standard output and waits for it, so that nothing is lost at exit.
 *
 * @throws ReaderGone
 */
export function print(pieces: Iterable<string>): void {
  let waiting = '';
  for (const piece of pieces) {
    waiting += piece;
    if (waiting.length >= CHUNK) {
      writeAll(waiting);
      waiting = '';
    }
  }
  writeAll(waiting);
}

/**
 * Text as one line for people and scripts: what a document says may hold line ends and control signs, which would break
 * a list of lines or steer a terminal.
 */
export function oneLine(text: string): string {
  return text.replace(/[\p{Cc}\u2028\u2029]/gu, sign =>
    sign === '\n' ? '\\n' : `\\u${sign.charCodeAt(0).toString(16).padStart(4, '0')}`,
  );
}

function writeAll(text: string): void {
  const bytes = Buffer.from(text, 'utf8');
  let done = 0;
  while (done < bytes.length) {
    try {
      done += writeSync(1, bytes, done);
    } catch (error) {
      const code = error instanceof Error && 'code' in error ? error.code : undefined;
      if (code === 'EPIPE') throw new ReaderGone();
      // A pipe that is full for the moment: try again.
      if (code !== 'EAGAIN') throw error;
    }
  }
}
