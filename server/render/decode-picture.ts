import sharp from 'sharp';

import { type Picture } from '#shared/render/picture';

/** Most pixels of a source: 16384 × 8192, as documents allow. */
const MOST_PIXELS = 16_384 * 8_192;

/**
 * @returns a picture file's pixels as sRGB bytes, turned as its orientation tag says
 * @throws Error where it cannot be read or decoded
 */
export async function decodePicture(file: string): Promise<Picture> {
  const { data, info } = await sharp(file, { limitInputPixels: MOST_PIXELS })
    .autoOrient()
    .toColourspace('srgb')
    .ensureAlpha()
    .raw({ depth: 'uchar' })
    .toBuffer({ resolveWithObject: true });
  return { width: info.width, height: info.height, rgba: new Uint8Array(data) };
}
