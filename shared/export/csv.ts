import { decimalText } from '#shared/document/number-text';
import { FRAME_COLUMNS, type FrameRow } from './frames-table';

const LINE_END = '\r\n';
const SOURCE_FRAME_DIGITS = 9;
const QUATERNION_DIGITS = 15;
const NUMBER_DIGITS = 12;

/** @returns decimals of a column */
function digitsOf(column: (typeof FRAME_COLUMNS)[number]): number {
  if (column === 'source_frame') return SOURCE_FRAME_DIGITS;
  return /^q[xyzw]$/.test(column) ? QUATERNION_DIGITS : NUMBER_DIGITS;
}

/**
 * A frames table as RFC 4180 text, line by line: CRLF, a header, no field that needs quotes.
 *
 * @param rows as `frameRows` gives them
 */
export function* framesCsv(rows: Iterable<FrameRow>): Generator<string> {
  yield FRAME_COLUMNS.join(',') + LINE_END;
  for (const row of rows) {
    const fields = FRAME_COLUMNS.map(column => {
      const value = row[column];
      return typeof value === 'string' ? value : decimalText(value, digitsOf(column));
    });
    yield fields.join(',') + LINE_END;
  }
}
