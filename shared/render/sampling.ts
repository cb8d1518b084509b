import { sourcePixelsPerPixel } from './camera';
import { type Sampling, type View } from './picture';

/** How each pixel is sampled. */
export interface SamplePlan {
  /** Places inside the pixel, x and y in turn, from its left and top edge, 0…1. */
  readonly places: readonly number[];
  /** Source pixels between samples from which on a level's half is used; infinite where only the source itself is. */
  readonly reduceAt: number;
}

/**
 * Source pixels a picture pixel at the frame's centre from which on previews take four samples a pixel. One sample from
 * reduced levels was measured instead: 24…31 dB at the widest views, too soft or too rough by turns.
 */
const FOUR_SAMPLES_FROM = 1;

/** Source pixels a picture pixel at the frame's centre from which on exports take eight samples a pixel. */
const EIGHT_SAMPLES_FROM = 2;

/** Beyond this, sixteen. */
const SIXTEEN_SAMPLES_FROM = 4;

/** Steps that visit every row and every column of an n × n grid once, far from one another: a rotated grid. */
const GRID_STEPS = new Map([
  [4, [1, 3, 0, 2]],
  [8, [3, 6, 1, 4, 7, 2, 5, 0]],
  [16, [5, 10, 15, 3, 8, 13, 1, 6, 11, 0, 14, 4, 9, 2, 12, 7]],
]);

/** @returns a rotated grid of 1, 4, 8 or 16 places */
export function rotatedGrid(count: number): number[] {
  const steps = GRID_STEPS.get(count) ?? [0];
  return steps.flatMap((step, i) => [(i + 0.5) / steps.length, (step + 0.5) / steps.length]);
}

const previewCount = (perPixel: number): number => (perPixel > FOUR_SAMPLES_FROM ? 4 : 1);

function exportCount(perPixel: number): number {
  if (perPixel > SIXTEEN_SAMPLES_FROM) return 16;
  return perPixel > EIGHT_SAMPLES_FROM ? 8 : 4;
}

export function samplePlan(sampling: Sampling, view: View, sourceWidth: number): SamplePlan {
  if (sampling === 'plain') return { places: rotatedGrid(1), reduceAt: Infinity };
  const perPixel = sourcePixelsPerPixel(view, sourceWidth);
  const count = sampling === 'preview' ? previewCount(perPixel) : exportCount(perPixel);
  // Samples of a level may be two of its pixels apart: closer together they only blur.
  return { places: rotatedGrid(count), reduceAt: 2 * Math.sqrt(count) };
}
