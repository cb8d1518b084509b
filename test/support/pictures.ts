import sharp from 'sharp';

import { type Picture } from '#shared/render/picture';
import { fixture } from './fixtures';

/** @returns a panorama of test/fixtures/panos, decoded */
export async function panorama(name: string): Promise<Picture> {
  const { data, info } = await sharp(fixture(`panos/${name}`))
    .ensureAlpha()
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { width: info.width, height: info.height, rgba: new Uint8Array(data) };
}

/** @returns the largest and the mean difference of red, green and blue, `truth` rounded to bytes */
export function difference(
  picture: ArrayLike<number>,
  truth: ArrayLike<number>,
): { largest: number; mean: number } {
  let largest = 0;
  let sum = 0;
  for (let i = 0; i < truth.length; i++) {
    if (i % 4 === 3) continue;
    const off = Math.abs(picture[i] - Math.round(truth[i]));
    if (!(off <= largest)) largest = off;
    sum += off;
  }
  return { largest, mean: sum / (0.75 * truth.length) };
}

/** @returns peak signal to noise of red, green and blue */
export function signalToNoiseDb(picture: ArrayLike<number>, truth: ArrayLike<number>): number {
  let squares = 0;
  for (let i = 0; i < truth.length; i++) if (i % 4 !== 3) squares += (picture[i] - truth[i]) ** 2;
  return 10 * Math.log10(255 ** 2 / (squares / (0.75 * truth.length)));
}
