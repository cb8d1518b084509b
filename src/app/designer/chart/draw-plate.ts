import { type ChartSize, type ChartView, pixelsPerDegree, screenY } from './viewport';

/** Draws the plate flat, as often as it repeats across the chart; without a plate, a plain sphere of sky and ground. */
export function drawPlate(
  context: CanvasRenderingContext2D,
  picture: ImageBitmap | undefined,
  view: ChartView,
  size: ChartSize,
): void {
  const scale = pixelsPerDegree(view, size);
  const width = 360 * scale;
  const top = screenY(90, view, size);
  context.fillStyle = '#161616';
  context.fillRect(0, 0, size.width, size.height);
  context.imageSmoothingQuality = 'high';
  // Half the sphere to the left of heading 0, and back until the chart's left edge is covered.
  let left = size.width / 2 - (view.lon + 180) * scale;
  left -= Math.ceil(left / width) * width;
  for (let x = left; x < size.width; x += width) {
    if (picture) context.drawImage(picture, x, top, width, width / 2);
    else drawBare(context, x, top, width);
  }
}

function drawBare(context: CanvasRenderingContext2D, x: number, top: number, width: number): void {
  const height = width / 2;
  const shade = context.createLinearGradient(0, top, 0, top + height);
  shade.addColorStop(0, '#3a3a3a');
  shade.addColorStop(0.495, '#5a5a5a');
  shade.addColorStop(0.505, '#333333');
  shade.addColorStop(1, '#262626');
  context.fillStyle = shade;
  context.fillRect(x, top, width + 1, height);
}
