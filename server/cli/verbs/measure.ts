import { type MeasureColumns, MEASURES, type MeasureName } from '#shared/measure/measures';
import { type Limits, LimitsError, readLimits } from '#shared/measure/limits';
import { measureMove } from '#shared/measure/measure-move';
import { type Note } from '#shared/measure/notes';
import { type Worst } from '#shared/measure/worst';
import { oneLine, print } from '../output';
import { readJson, readMove } from '../read-document';
import { readWords, UsageError } from '../usage';

/** `measure FILE [--limits FILE] [--deliverable NAME]`: the measures as JSON; a summary on standard error. */
export function measure(args: readonly string[]): number {
  const words = readWords(args, ['limits', 'deliverable']);
  const limits = limitsIn(words.options.get('limits'));
  const move = readMove(words.file);
  const measured = measureMove(move, {
    deliverable: words.options.get('deliverable'),
    limits,
  });
  print(jsonOf(measured.worst, measured.perFrame, measured.notes));
  process.stderr.write(summaryOf(measured.worst, measured.notes));
  return 0;
}

function limitsIn(file: string | undefined): Limits | undefined {
  if (file === undefined) return undefined;
  try {
    return readLimits(readJson(file));
  } catch (error) {
    if (error instanceof LimitsError) throw new UsageError(`${file}: ${error.message}`);
    throw error;
  }
}

/** Piece by piece, as the columns of a long film are long. */
function* jsonOf(
  worst: Readonly<Record<MeasureName, Worst>>,
  perFrame: MeasureColumns,
  notes: readonly Note[],
): Generator<string> {
  yield `{\n  "worst": ${JSON.stringify(worst)},\n  "perFrame": {`;
  for (const [i, name] of MEASURES.entries()) {
    const known = Array.from(perFrame[name], value => (Number.isFinite(value) ? value + 0 : null));
    yield `${i === 0 ? '' : ','}\n    ${JSON.stringify(name)}: ${JSON.stringify(known)}`;
  }
  yield `\n  },\n  "notes": ${JSON.stringify(notes)}\n}\n`;
}

function summaryOf(worst: Readonly<Record<MeasureName, Worst>>, notes: readonly Note[]): string {
  const broken = MEASURES.filter(name => worst[name].breaks).map(name => {
    const { value, frame, limit, breakingFrames } = worst[name];
    return `${name}: ${number(value)} at frame ${frame}, limit ${limit} (${breakingFrames} frames)`;
  });
  const lines = [...(broken.length > 0 ? broken : ['No limit is broken.']), ...notes.map(note => note.text)];
  return lines.map(line => `${oneLine(line)}\n`).join('');
}

function number(value: number | null): string {
  return value === null ? 'not known' : String(Number(value.toPrecision(4)));
}
