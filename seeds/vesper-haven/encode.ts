import sharp from 'sharp';

import { type Painting } from './painting';

const QUALITY = 91;

/** Brightest light that is told apart from white. */
const BRIGHTEST = 4;

/**
 * Bits of a 32-bit float that the tone table leaves out: what is kept are the exponent and ten bits of the fraction, a
 * thousandth of any light, far finer than a tone of 8 bits.
 */
const DROPPED_BITS = 13;

/** Light to sRGB as film does it, softly into white; then a grain of half a step, so that no sky shows bands. */
export async function encode({ data, width, height }: Painting, exposure: number): Promise<Buffer> {
  const tones = toneTable(exposure);
  const lights = new Uint32Array(data.buffer, data.byteOffset, data.length);
  const bytes = Buffer.alloc(data.length);
  let grain = 0x9e3779b9;
  for (let i = 0; i < bytes.length; i++) {
    grain = (Math.imul(grain, 1664525) + 1013904223) >>> 0;
    const tone = tones[Math.min(lights[i] >>> DROPPED_BITS, tones.length - 1)];
    bytes[i] = Math.min(255, Math.max(0, tone + (grain / 4294967296 - 0.5) * 1.3 + 0.5));
  }
  return sharp(bytes, { raw: { width, height, channels: 3 } })
    .jpeg({ quality: QUALITY, chromaSubsampling: '4:4:4' })
    .toBuffer();
}

/** Tones, 0…255, by the leading bits of a light that is 0 or more: no root and no logarithm a pixel. */
function toneTable(exposure: number): Float32Array {
  const bits = new Uint32Array(1);
  const light = new Float32Array(bits.buffer);
  light[0] = BRIGHTEST;
  return Float32Array.from({ length: bits[0] >>> DROPPED_BITS }, (_, i) => {
    bits[0] = (i << DROPPED_BITS) | (1 << (DROPPED_BITS - 1));
    return 255 * srgb(1 - Math.exp(-exposure * light[0]));
  });
}

/** @see IEC 61966-2-1 */
function srgb(linear: number): number {
  return linear <= 0.0031308 ? 12.92 * linear : 1.055 * linear ** (1 / 2.4) - 0.055;
}
