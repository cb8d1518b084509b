import { DEG_PER_RAD } from '#shared/conventions';
import { latOfDirection, lonOfDirection } from '#shared/projection/equirectangular';
import { type Frame, frameOutline } from '#shared/projection/footprint';
import { type CoursePoint } from '../pace';
import { paceColour, PACE_STEPS, paceStep } from '../pace-ramp';
import { type ChartSize, type ChartView, pixelsPerDegree, screenX, screenY } from './viewport';

const OUTLINE_POINTS_PER_SIDE = 24;

/** What the chart shows over the plate. */
export interface Overlay {
  readonly course: readonly CoursePoint[];
  readonly keyFrames: readonly Frame[];
  readonly hereFrame: Frame;
  /** Heading of the stitch seam in the levelled world, or undefined. */
  readonly seamYawDeg: number | undefined;
}

/** Draws everything that stands over the plate. One path a sort of line: few strokes, quick even without a graphics card. */
export function drawOverlay(
  context: CanvasRenderingContext2D,
  overlay: Overlay,
  view: ChartView,
  size: ChartSize,
): void {
  context.clearRect(0, 0, size.width, size.height);
  drawGraticule(context, view, size);
  drawSeam(context, overlay.seamYawDeg, view, size);
  context.beginPath();
  for (const frame of overlay.keyFrames) traceOutline(context, frame, view, size);
  strokeTwice(context, 'rgb(255 255 255 / 0.75)', 1.25);
  drawCourse(context, overlay.course, view, size);
  context.beginPath();
  traceOutline(context, overlay.hereFrame, view, size);
  strokeTwice(context, '#ffffff', 2.25);
}

/** A dark casing first: light lines stay readable over bright pictures. */
function strokeTwice(context: CanvasRenderingContext2D, colour: string, width: number): void {
  context.lineJoin = 'round';
  context.strokeStyle = 'rgb(0 0 0 / 0.6)';
  context.lineWidth = width + 2;
  context.stroke();
  context.strokeStyle = colour;
  context.lineWidth = width;
  context.stroke();
}

/** Headings' spacing, degrees, that keeps their labels apart. */
function spacing(scale: number): number {
  return [5, 10, 15, 30, 45].find(degrees => degrees * scale >= 56) ?? 90;
}

const COMPASS: Readonly<Record<number, string>> = { 0: 'N', 90: 'E', 180: 'S', 270: 'W' };

function drawGraticule(context: CanvasRenderingContext2D, view: ChartView, size: ChartSize): void {
  const scale = pixelsPerDegree(view, size);
  const every = spacing(scale);
  const top = Math.max(0, screenY(90, view, size));
  const bottom = Math.min(size.height, screenY(-90, view, size));
  context.font = "11px 'Hanken Grotesk Variable', sans-serif";
  context.textAlign = 'center';
  context.textBaseline = 'top';
  context.beginPath();
  const first = Math.ceil((view.lon - size.width / 2 / scale) / every) * every;
  for (let lon = first; lon <= view.lon + size.width / 2 / scale; lon += every) {
    const x = size.width / 2 + (lon - view.lon) * scale;
    context.moveTo(x, top);
    context.lineTo(x, bottom);
    label(context, headingLabel(lon), x, top + 4);
  }
  context.textAlign = 'left';
  context.textBaseline = 'middle';
  for (let lat = -90 + every; lat < 90; lat += every) {
    const y = screenY(lat, view, size);
    if (y < top || y > bottom) continue;
    context.moveTo(0, y);
    context.lineTo(size.width, y);
    if (y > top + 22) label(context, `${lat}°`, 5, y - 7);
  }
  context.strokeStyle = 'rgb(255 255 255 / 0.16)';
  context.lineWidth = 1;
  context.stroke();
  const horizon = screenY(0, view, size);
  context.beginPath();
  context.moveTo(0, horizon);
  context.lineTo(size.width, horizon);
  context.strokeStyle = 'rgb(255 255 255 / 0.45)';
  context.stroke();
}

function headingLabel(lonDeg: number): string {
  const heading = ((Math.round(lonDeg) % 360) + 360) % 360;
  return COMPASS[heading] ?? `${heading}°`;
}

function label(context: CanvasRenderingContext2D, text: string, x: number, y: number): void {
  context.strokeStyle = 'rgb(0 0 0 / 0.7)';
  context.lineWidth = 3;
  context.strokeText(text, x, y);
  context.fillStyle = 'rgb(255 255 255 / 0.85)';
  context.fillText(text, x, y);
}

function drawSeam(
  context: CanvasRenderingContext2D,
  yaw: number | undefined,
  view: ChartView,
  size: ChartSize,
): void {
  if (yaw === undefined) return;
  context.save();
  context.setLineDash([6, 5]);
  context.beginPath();
  for (const each of [yaw, yaw + 180]) {
    const x = screenX(each, view, size);
    context.moveTo(x, Math.max(0, screenY(90, view, size)));
    context.lineTo(x, Math.min(size.height, screenY(-90, view, size)));
    label(context, 'seam', x + 4, screenY(0, view, size) + 14);
  }
  context.strokeStyle = 'rgb(255 255 255 / 0.6)';
  context.lineWidth = 1;
  context.stroke();
  context.restore();
}

/** Lines of one pace are stroked together; a pace beyond the limit is also drawn thicker, not by colour alone. */
function drawCourse(
  context: CanvasRenderingContext2D,
  course: readonly CoursePoint[],
  view: ChartView,
  size: ChartSize,
): void {
  context.lineCap = 'round';
  context.beginPath();
  course.forEach((point, i) => traceSegment(context, course[i - 1], point, view, size));
  context.strokeStyle = 'rgb(0 0 0 / 0.65)';
  context.lineWidth = 6;
  context.stroke();
  for (let step = 0; step < PACE_STEPS; step++)
    strokeWhere(
      context,
      course,
      view,
      size,
      paceColour(step),
      3,
      p => p.pace <= 1 && paceStep(p.pace) === step,
    );
  strokeWhere(context, course, view, size, paceColour(PACE_STEPS - 1), 5, p => p.pace > 1);
}

function strokeWhere(
  context: CanvasRenderingContext2D,
  course: readonly CoursePoint[],
  view: ChartView,
  size: ChartSize,
  colour: string,
  width: number,
  which: (point: CoursePoint) => boolean,
): void {
  context.beginPath();
  course.forEach((point, i) => {
    if (which(point)) traceSegment(context, course[i - 1], point, view, size);
  });
  context.strokeStyle = colour;
  context.lineWidth = width;
  context.stroke();
}

function traceSegment(
  context: CanvasRenderingContext2D,
  from: CoursePoint | undefined,
  to: CoursePoint,
  view: ChartView,
  size: ChartSize,
): void {
  if (!from || to.cut) return;
  traceLine(context, from.lonDeg, from.latDeg, to.lonDeg, to.latDeg, view, size);
}

/** A short line on the chart; where it leaves by one edge it enters by the other, so it is drawn on both. */
function traceLine(
  context: CanvasRenderingContext2D,
  lon0: number,
  lat0: number,
  lon1: number,
  lat1: number,
  view: ChartView,
  size: ChartSize,
): void {
  const scale = pixelsPerDegree(view, size);
  const x0 = screenX(lon0, view, size);
  const x1 = x0 + (lon1 - lon0 - 360 * Math.round((lon1 - lon0) / 360)) * scale;
  const y0 = screenY(lat0, view, size);
  const y1 = screenY(lat1, view, size);
  context.moveTo(x0, y0);
  context.lineTo(x1, y1);
  const edge = size.width / 2 + 180 * scale;
  const shift = x1 > edge ? -360 * scale : x1 < size.width / 2 - 180 * scale ? 360 * scale : 0;
  if (shift === 0) return;
  context.moveTo(x0 + shift, y0);
  context.lineTo(x1 + shift, y1);
}

/** A frame's outline as it really falls on the panorama; round a pole it runs along the chart's edge by itself. */
function traceOutline(
  context: CanvasRenderingContext2D,
  frame: Frame,
  view: ChartView,
  size: ChartSize,
): void {
  const outline = frameOutline(frame, OUTLINE_POINTS_PER_SIDE);
  let lon0 = NaN;
  let lat0 = NaN;
  for (let i = 0; i < outline.length; i += 3) {
    const direction = outline.subarray(i, i + 3);
    const lon = lonOfDirection(direction) * DEG_PER_RAD;
    const lat = latOfDirection(direction) * DEG_PER_RAD;
    if (i > 0) traceLine(context, lon0, lat0, lon, lat, view, size);
    lon0 = lon;
    lat0 = lat;
  }
}
