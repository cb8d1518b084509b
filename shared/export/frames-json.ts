import { type FrameRow } from './frames-table';

/** A frames table as a JSON list of rows, line by line. */
export function* framesJson(rows: Iterable<FrameRow>): Generator<string> {
  let lead = '[\n';
  for (const row of rows) {
    yield lead + JSON.stringify(row, (_name, value: unknown) => (Object.is(value, -0) ? 0 : value));
    lead = ',\n';
  }
  yield '\n]\n';
}
