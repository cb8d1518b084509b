import { type Quat } from '#shared/conventions';

/** A picture of RGBA bytes, sRGB as in its file, rows from the top without gaps. */
export interface Picture {
  readonly width: number;
  readonly height: number;
  readonly rgba: Uint8Array | Uint8ClampedArray;
}

/** Where a framed picture looks, and its sides in pixels. */
export interface View {
  /** Camera to source: level⁻¹ · q where the shot has a level rotation. Unit. */
  readonly orientation: Readonly<Quat>;
  /** Horizontal. */
  readonly fovRad: number;
  /** Eye point, 0…1. */
  readonly eye: number;
  readonly width: number;
  readonly height: number;
}

/**
 * How a framed picture is sampled:
 * - `plain`: one bilinear sample at each pixel's centre, from the source itself;
 * - `preview`: four samples a pixel on a rotated grid where the view shrinks the source, from reduced levels where it
 *   shrinks it much; one where it does not: at least 35 dB against many samples;
 * - `export`: four to sixteen samples a pixel: at least 44 dB.
 *
 * Between pixel centres all blend alike: longitude wraps; beyond the first and the last row's centres, half a source
 * pixel from a pole, that row is repeated (as graphics cards clamp).
 */
export type Sampling = 'plain' | 'preview' | 'export';
