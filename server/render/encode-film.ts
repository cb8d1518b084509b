import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { rename, rm } from 'node:fs/promises';

import { type FrameRate } from '#shared/time/frame-rate';
import { unfinishedName } from './save-picture';

/** Thrown where FFmpeg is not installed. */
export class NoEncoder extends Error {}

/** What a film is made of. */
export interface Film {
  readonly width: number;
  readonly height: number;
  readonly rate: FrameRate;
  readonly frames: number;
  /** Gives a delivered frame's RGBA bytes to `use`, and waits for it. */
  readonly draw: (index: number, use: (rgba: Uint8Array) => Promise<void>) => Promise<void>;
}

/**
 * Encodes a film as H.264 in MP4 through FFmpeg; the file appears whole or not at all.
 *
 * @param signal stops it
 * @param report called after each frame
 * @throws NoEncoder; Error with FFmpeg's last words
 */
export async function encodeFilm(
  file: string,
  film: Film,
  { signal, report }: { signal: AbortSignal; report: (done: number) => void },
): Promise<void> {
  const unfinished = unfinishedName(file);
  try {
    await runEncoder(unfinished, film, signal, report);
    await rename(unfinished, file);
  } catch (error) {
    await rm(unfinished, { force: true });
    throw error;
  }
}

async function runEncoder(
  file: string,
  film: Film,
  signal: AbortSignal,
  report: (done: number) => void,
): Promise<void> {
  const encoder = spawn('ffmpeg', encoderArguments(file, film), { stdio: ['pipe', 'ignore', 'pipe'] });
  let said = '';
  encoder.stderr.on('data', (words: Buffer) => (said = `${said}${words.toString()}`.slice(-2000)));
  const ended = new Promise<void>((resolve, reject) => {
    encoder.once('error', error =>
      reject('code' in error && error.code === 'ENOENT' ? new NoEncoder('FFmpeg is not installed.') : error),
    );
    encoder.once('close', code =>
      code === 0 ? resolve() : reject(new Error(`FFmpeg ended with ${code}: ${said.trim()}`)),
    );
  });
  // The encoder closing its input early shows as its end, with the reason.
  encoder.stdin.on('error', () => undefined);
  const feed = async (): Promise<void> => {
    for (let i = 0; i < film.frames; i++) {
      signal.throwIfAborted();
      await film.draw(i, async rgba => {
        // A copy: the pipe holds on to it while the next picture is drawn.
        if (!encoder.stdin.write(Buffer.from(rgba)))
          await Promise.race([once(encoder.stdin, 'drain'), ended]);
      });
      report(i + 1);
    }
    encoder.stdin.end();
  };
  try {
    await Promise.all([feed(), ended]);
  } catch (error) {
    encoder.kill('SIGKILL');
    await ended.catch(() => undefined);
    throw error;
  }
}

function encoderArguments(file: string, { width, height, rate }: Film): string[] {
  const fps = `${rate.num}/${rate.den}`;
  const input = ['-f', 'rawvideo', '-pix_fmt', 'rgba', '-s', `${width}x${height}`, '-r', fps, '-i', 'pipe:0'];
  const colours = [
    '-colorspace',
    'bt709',
    '-color_primaries',
    'bt709',
    '-color_trc',
    'bt709',
    '-color_range',
    'tv',
  ];
  return [
    ...['-v', 'error', '-nostdin', '-y', ...input],
    ...['-vf', 'scale=out_color_matrix=bt709:out_range=tv,format=yuv420p', ...colours],
    ...['-c:v', 'libx264', '-preset', 'medium', '-crf', '17', '-movflags', '+faststart', '-f', 'mp4', file],
  ];
}
