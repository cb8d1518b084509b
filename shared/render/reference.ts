import { directionAtPicture } from '#shared/projection/general-perspective';
import { pixelFromDirection } from '#shared/projection/equirectangular';
import { rotate } from '#shared/rotation/quaternion';
import { halfWidthOnPlane } from './camera';
import { type Picture, type View } from './picture';

/**
 * A framed picture in double precision, as plainly as it can be said: the second opinion for the quick renderers.
 *
 * @param across samples across and down each pixel, on an even grid; 1 is `plain` sampling
 * @returns `4 · width · height` values, 0…255, not rounded
 */
export function referenceFrame(source: Picture, view: View, across = 1): Float64Array {
  const out = new Float64Array(4 * view.width * view.height);
  const half = halfWidthOnPlane(view);
  const perPixel = (2 * half) / view.width;
  const direction = new Float64Array(3);
  const at = new Float64Array(2);
  const share = 1 / (across * across);
  for (let i = 0; i < view.width * view.height * across * across; i++) {
    const sample = i % (across * across);
    const pixel = (i - sample) / (across * across);
    const column = (pixel % view.width) + ((sample % across) + 0.5) / across;
    const row = Math.floor(pixel / view.width) + (Math.floor(sample / across) + 0.5) / across;
    directionAtPicture(
      direction,
      (column - view.width / 2) * perPixel,
      (view.height / 2 - row) * perPixel,
      view.eye,
    );
    pixelFromDirection(at, rotate(direction, view.orientation, direction), source.width, source.height);
    addBilinear(out, 4 * pixel, source, at[0], at[1], share);
  }
  return out;
}

/** Adds `share` of the source's colour at (x, y), pixels from its left and top edge, blended between pixel centres. */
function addBilinear(
  out: Float64Array,
  place: number,
  { width, height, rgba }: Picture,
  x: number,
  y: number,
  share: number,
): void {
  const left = Math.floor(x - 0.5);
  const lower = Math.min(Math.max(y - 0.5, 0), height - 1);
  const top = Math.floor(lower);
  for (let corner = 0; corner < 4; corner++) {
    const right = corner & 1;
    const down = corner >> 1;
    const weight =
      share * (right ? x - 0.5 - left : 1 - (x - 0.5 - left)) * (down ? lower - top : 1 - (lower - top));
    const column = (left + right + width) % width;
    const from = 4 * (Math.min(top + down, height - 1) * width + column);
    for (let channel = 0; channel < 4; channel++) out[place + channel] += weight * rgba[from + channel];
  }
}
