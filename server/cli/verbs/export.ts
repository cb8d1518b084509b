import { mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { type MoveDocument } from '#schemas/move';
import { deliverableNamed } from '#shared/document/deliverable-named';
import { framesCsv } from '#shared/export/csv';
import { ffmpegScript } from '#shared/export/ffmpeg-script';
import { frameRows } from '#shared/export/frames-table';
import { cameraGltf } from '#shared/export/gltf';
import { FilmTooLong } from '#shared/export/gltf-film';
import { timelineOtio } from '#shared/export/otio';
import { NotForFfmpeg } from '#shared/export/v360-commands';
import { print } from '../output';
import { readMove } from '../read-document';
import { readWords, UsageError, wanted } from '../usage';

/** Names and texts of files. */
type Files = Readonly<Record<string, string>>;

const EXPORTS: Readonly<Record<string, (move: MoveDocument, deliverable?: string) => Files>> = {
  gltf: (move, deliverable) => ({ 'camera.gltf': cameraGltf(move, deliverable) }),
  otio: (move, deliverable) => ({ 'timeline.otio': timelineOtio(move, deliverable) }),
  ffmpeg: (move, deliverable) => ffmpegScript(move, deliverable),
  csv: (move, deliverable) => ({
    'frames.csv': [...framesCsv(frameRows(move, 'delivered', deliverable))].join(''),
    'frames-source.csv': [...framesCsv(frameRows(move, 'source', deliverable))].join(''),
  }),
};

/** `export FILE --to gltf|otio|ffmpeg|csv [--out DIR] [--deliverable NAME]`: writes the files and prints their names. */
export function exportMove(args: readonly string[]): number {
  const words = readWords(args, ['to', 'out', 'deliverable']);
  const to = wanted(words, 'to');
  const write = Object.hasOwn(EXPORTS, to) ? EXPORTS[to] : undefined;
  if (!write)
    throw new UsageError(`--to is one of ${Object.keys(EXPORTS).join(', ')}, not ${JSON.stringify(to)}.`);
  const move = readMove(words.file);
  const deliverable = words.options.get('deliverable');
  deliverableNamed(move, deliverable);
  const places = writeAll(
    words.options.get('out') ?? '.',
    texts(() => write(move, deliverable)),
  );
  print(places.map(place => `${place}\n`));
  return 0;
}

function texts(write: () => Files): Files {
  try {
    return write();
  } catch (error) {
    if (error instanceof NotForFfmpeg || error instanceof FilmTooLong) throw new UsageError(error.message);
    throw error;
  }
}

/** Each file stands whole or not at all: it is written beside its place and then put there. */
function writeAll(folder: string, files: Files): string[] {
  try {
    mkdirSync(folder, { recursive: true });
    return Object.entries(files).map(([name, text]) => {
      const place = path.join(folder, name);
      const beside = `${place}.${process.pid}.part`;
      try {
        writeFileSync(beside, text);
        renameSync(beside, place);
      } finally {
        rmSync(beside, { force: true });
      }
      return place;
    });
  } catch (error) {
    throw new UsageError(
      `${folder} cannot be written to: ${error instanceof Error ? error.message : String(error)}`,
    );
  }
}
