import { type Picture } from '#shared/render/picture';
import { decodePicture } from '../render/decode-picture';
import { UsageError, wanted, type Words } from './usage';

/** Sides that a document's deliverables may have, pixels. */
const SMALLEST_PX = 16;
const LARGEST_PX = 16_384;

/** @throws UsageError where `--width` is no whole number of pixels that a deliverable may have */
export function widthOption(words: Words): number | undefined {
  const given = words.options.get('width');
  if (given === undefined) return undefined;
  const width = Number(given);
  if (!Number.isInteger(width) || width < SMALLEST_PX || width > LARGEST_PX)
    throw new UsageError(
      `--width is a whole number of pixels, ${SMALLEST_PX} to ${LARGEST_PX}, not ${given}.`,
    );
  return width;
}

/** @throws UsageError where `--at` is missing or no source frame of the shot */
export function atOption(words: Words, frames: number): number {
  const given = wanted(words, 'at');
  const at = given.trim() === '' ? NaN : Number(given);
  if (!(at >= 0 && at <= frames - 1))
    throw new UsageError(`--at is a source frame of the shot, 0 to ${frames - 1}, not ${given}.`);
  return at;
}

/** @throws UsageError where the panorama cannot be read */
export async function openSource(file: string): Promise<Picture> {
  try {
    return await decodePicture(file);
  } catch (error) {
    throw new UsageError(
      `The source ${file} cannot be read: ${error instanceof Error ? error.message : String(error)}`,
    );
  }
}
