import { halfWidthOnPlane, matrixFromQuat } from './camera';
import { type Picture, type View } from './picture';

// Taken once: looking up a global for each of millions of samples costs more than the arithmetic in test runners.
const { atan2, floor, max, min, PI, sqrt } = Math;

/**
 * A framed picture in double precision, as plainly as it can be said: the second opinion for the quick renderers. It
 * shares no arithmetic with them but the camera's matrix.
 *
 * @param across samples across and down each pixel, on an even grid; 1 is `plain` sampling
 * @returns `4 · width · height` values, 0…255, not rounded
 */
export function referenceFrame(source: Picture, view: View, across = 1): Float64Array {
  const out = new Float64Array(4 * view.width * view.height);
  const perPixel = (2 * halfWidthOnPlane(view)) / view.width;
  const share = 1 / (across * across);
  const m = matrixFromQuat(new Float64Array(9), view.orientation);
  const a = 1 + view.eye;
  for (let row = 0; row < view.height * across; row++) {
    const y = (view.height / 2 - (row + 0.5) / across) * perPixel;
    for (let column = 0; column < view.width * across; column++) {
      const x = ((column + 0.5) / across - view.width / 2) * perPixel;
      const squared = x * x + y * y;
      const t = (view.eye * a + sqrt(a * a + squared * (1 - view.eye * view.eye))) / (squared + a * a);
      const z = view.eye - t * a;
      const east = m[0] * t * x + m[1] * t * y + m[2] * z;
      const up = m[3] * t * x + m[4] * t * y + m[5] * z;
      const south = m[6] * t * x + m[7] * t * y + m[8] * z;
      const longitude = atan2(east, -south);
      const latitude = atan2(up, sqrt(east * east + south * south));
      const pixel = floor(row / across) * view.width + floor(column / across);
      addBilinear(
        out,
        4 * pixel,
        source,
        (longitude / (2 * PI) + 0.5) * source.width,
        (0.5 - latitude / PI) * source.height,
        share,
      );
    }
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
  const left = floor(x - 0.5);
  const lower = min(max(y - 0.5, 0), height - 1);
  const top = floor(lower);
  for (let corner = 0; corner < 4; corner++) {
    const right = corner & 1;
    const down = corner >> 1;
    const weight =
      share * (right ? x - 0.5 - left : 1 - (x - 0.5 - left)) * (down ? lower - top : 1 - (lower - top));
    const column = (left + right + width) % width;
    const from = 4 * (min(top + down, height - 1) * width + column);
    for (let channel = 0; channel < 4; channel++) out[place + channel] += weight * rgba[from + channel];
  }
}
