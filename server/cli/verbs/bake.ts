import { deliverableNamed } from '#shared/document/deliverable-named';
import { framesCsv } from '#shared/export/csv';
import { framesJson } from '#shared/export/frames-json';
import { frameRows } from '#shared/export/frames-table';
import { print } from '../output';
import { readMove } from '../read-document';
import { choice, readWords } from '../usage';

/** `bake FILE [--per source|delivered] [--format csv|json] [--deliverable NAME]`: the frames table. */
export function bake(args: readonly string[]): number {
  const words = readWords(args, ['per', 'format', 'deliverable']);
  const per = choice(words, 'per', ['delivered', 'source']);
  const format = choice(words, 'format', ['csv', 'json']);
  const move = readMove(words.file);
  const deliverable = words.options.get('deliverable');
  deliverableNamed(move, deliverable);
  const rows = frameRows(move, per, deliverable);
  print(format === 'csv' ? framesCsv(rows) : framesJson(rows));
  return 0;
}
