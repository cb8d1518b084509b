import { rename, rm } from 'node:fs/promises';
import path from 'node:path';

import sharp from 'sharp';

import { type Picture } from '#shared/render/picture';

/** @returns a name beside a file for what is not finished yet; it keeps the extension, which says the format */
export function unfinishedName(file: string): string {
  const { dir, name, ext } = path.parse(file);
  return path.join(dir, `.${name}.${process.pid}.unfinished${ext}`);
}

/**
 * Writes a picture in the format that the file's extension names; it appears whole or not at all.
 *
 * @throws Error where it cannot be written
 */
export async function savePicture(file: string, { width, height, rgba }: Picture): Promise<void> {
  const unfinished = unfinishedName(file);
  try {
    // A copy: the pixels may stand in memory that threads share, which the encoder does not take.
    await sharp(Buffer.from(rgba), { raw: { width, height, channels: 4 } })
      .removeAlpha()
      .toFile(unfinished);
    await rename(unfinished, file);
  } catch (error) {
    await rm(unfinished, { force: true });
    throw error;
  }
}
