import { shotTimes } from '#shared/document/shot-times';
import { deliveredFrameCount, sourceFrameOfDelivered } from '#shared/time/delivered-time';
import { encodeFilm } from '../../render/encode-film';
import { FramePool } from '../../render/frame-pool';
import { framedViews } from '../../render/framed-views';
import { openSource, widthOption } from '../picture-options';
import { readMove } from '../read-document';
import { readWords, UsageError, wanted } from '../usage';

/** `render FILE --source PANO.jpg --out FILM.mp4 [--width N] [--deliverable NAME]`: the film, by FFmpeg's encoder. */
export async function render(args: readonly string[]): Promise<number> {
  const words = readWords(args, ['source', 'out', 'width', 'deliverable']);
  const out = wanted(words, 'out');
  if (!out.toLowerCase().endsWith('.mp4')) throw new UsageError(`--out is an .mp4 file, not ${out}.`);
  const sourceFile = wanted(words, 'source');
  const widthPx = widthOption(words);
  const move = readMove(words.file);
  const times = shotTimes(move.shot);
  const frames = deliveredFrameCount(times);
  const viewAt = framedViews(move, words.options.get('deliverable'), { widthPx, even: true });
  const source = await openSource(sourceFile);
  const stop = new AbortController();
  const interrupted = () => stop.abort(new Error('it was stopped'));
  process.once('SIGINT', interrupted).once('SIGTERM', interrupted);
  const pool = new FramePool(2);
  try {
    await pool.setSource(source);
    const { width, height } = viewAt(times.from);
    await encodeFilm(
      out,
      {
        ...{ width, height, rate: times.rate, frames },
        draw: (i, use) => pool.render(viewAt(sourceFrameOfDelivered(times, i)), 'export', use),
      },
      { signal: stop.signal, report: done => showProgress(done, frames) },
    );
  } catch (error) {
    throw new UsageError(`${out} was not written: ${error instanceof Error ? error.message : String(error)}`);
  } finally {
    process.off('SIGINT', interrupted).off('SIGTERM', interrupted);
    await pool.close();
  }
  return 0;
}

/** One line that is written over where a person watches; every tenth of the film where a file does. */
function showProgress(done: number, frames: number): void {
  const tenth = Math.ceil(frames / 10);
  if (process.stderr.isTTY)
    process.stderr.write(`\rframe ${done} of ${frames}${done === frames ? '\n' : ''}`);
  else if (done % tenth === 0 || done === frames) process.stderr.write(`frame ${done} of ${frames}\n`);
}
