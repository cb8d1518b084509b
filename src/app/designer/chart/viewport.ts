/** Widest zoom-in: screen pixels per degree. */
const CLOSEST = 60;

/** What part of the panorama the chart shows. Immutable. */
export interface ChartView {
  /** Heading and height at the chart's middle, degrees. */
  readonly lon: number;
  readonly lat: number;
  /** Times the whole panorama fits into the chart. */
  readonly zoom: number;
}

export interface ChartSize {
  readonly width: number;
  readonly height: number;
}

export const WHOLE: ChartView = { lon: 0, lat: 0, zoom: 1 };

/** @returns CSS pixels per degree */
export function pixelsPerDegree({ zoom }: ChartView, { width, height }: ChartSize): number {
  return Math.min(width / 360, height / 180) * zoom;
}

/** Puts the view back where it shows something: zoom within limits, the panorama's edges not past the chart's middle. */
export function settled(view: ChartView, size: ChartSize): ChartView {
  const base = pixelsPerDegree(WHOLE, size);
  const zoom = Math.min(Math.max(view.zoom, 1), Math.max(CLOSEST / base, 1));
  const visibleLat = size.height / (base * zoom);
  const slack = Math.max(0, 90 - visibleLat / 2);
  return {
    zoom,
    lon: view.lon - 360 * Math.round(view.lon / 360),
    lat: Math.min(Math.max(view.lat, -slack), slack),
  };
}

/** @returns screen x of a heading; headings are put into the turn nearest to the chart's middle */
export function screenX(lonDeg: number, view: ChartView, size: ChartSize): number {
  const apart = lonDeg - view.lon;
  return size.width / 2 + (apart - 360 * Math.round(apart / 360)) * pixelsPerDegree(view, size);
}

export function screenY(latDeg: number, view: ChartView, size: ChartSize): number {
  return size.height / 2 - (latDeg - view.lat) * pixelsPerDegree(view, size);
}

/** @returns the heading and height under a screen point, degrees */
export function degreesAt(
  x: number,
  y: number,
  view: ChartView,
  size: ChartSize,
): { lon: number; lat: number } {
  const scale = pixelsPerDegree(view, size);
  return { lon: view.lon + (x - size.width / 2) / scale, lat: view.lat - (y - size.height / 2) / scale };
}

/** Zooms about a screen point, which stays where it is. */
export function zoomedAt(view: ChartView, size: ChartSize, x: number, y: number, factor: number): ChartView {
  const point = degreesAt(x, y, view, size);
  const { zoom } = settled({ ...view, zoom: view.zoom * factor }, size);
  const scale = pixelsPerDegree({ ...view, zoom }, size);
  return settled(
    { zoom, lon: point.lon - (x - size.width / 2) / scale, lat: point.lat + (y - size.height / 2) / scale },
    size,
  );
}
