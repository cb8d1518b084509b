/** Linear light, red green blue; 1 is paper white before the exposure. */
export type Light = readonly [red: number, green: number, blue: number];

/** A point of the sphere: yaw and pitch in degrees. */
export type Spot = readonly [yaw: number, pitch: number];

/** Parts that a row of pixels is cut into for smooth edges. */
const SUB_ROWS = 4;

export function mix(a: Light, b: Light, share: number): Light {
  return [a[0] + share * (b[0] - a[0]), a[1] + share * (b[1] - a[1]), a[2] + share * (b[2] - a[2])];
}

export function dimmed(light: Light, factor: number): Light {
  return [light[0] * factor, light[1] * factor, light[2] * factor];
}

/**
 * An equirectangular picture in linear light. Shapes are given by yaw and pitch and meant for the neighbourhood of the
 * horizon, where the flat picture does not stretch them; whatever is large or near a pole is painted by direction instead.
 */
export class Painting {
  readonly data: Float32Array;
  readonly height: number;
  /** Pixels per degree. */
  readonly scale: number;

  constructor(readonly width: number) {
    this.height = width / 2;
    this.scale = width / 360;
    this.data = new Float32Array(width * this.height * 3);
  }

  /** @returns x in pixels; not wrapped */
  x(yaw: number): number {
    return (yaw + 180) * this.scale;
  }

  y(pitch: number): number {
    return (90 - pitch) * this.scale;
  }

  set(index: number, red: number, green: number, blue: number): void {
    this.data[index] = red;
    this.data[index + 1] = green;
    this.data[index + 2] = blue;
  }

  /** Covers a pixel; x wraps round the sphere. */
  cover(x: number, y: number, light: Light, share: number): void {
    if (y < 0 || y >= this.height) return;
    const i = 3 * (y * this.width + wrapped(x, this.width));
    for (let k = 0; k < 3; k++) this.data[i + k] += share * (light[k] - this.data[i + k]);
  }

  /** Adds light to a pixel; x wraps round the sphere. */
  shine(x: number, y: number, light: Light, share: number): void {
    if (y < 0 || y >= this.height) return;
    const i = 3 * (y * this.width + wrapped(x, this.width));
    for (let k = 0; k < 3; k++) this.data[i + k] += share * light[k];
  }

  /** Fills a polygon, even-odd, with smooth edges. */
  fill(spots: readonly Spot[], light: Light, share = 1): void {
    const xs = spots.map(([yaw]) => this.x(yaw));
    const ys = spots.map(([, pitch]) => this.y(pitch));
    const last = Math.ceil(Math.max(...ys));
    const left = Math.floor(Math.min(...xs));
    const cover = new Float32Array(Math.ceil(Math.max(...xs)) - left + 2);
    for (let y = Math.floor(Math.min(...ys)); y < last; y++) {
      cover.fill(0);
      for (let part = 0; part < SUB_ROWS; part++) addSpans(cover, left, xs, ys, y + (part + 0.5) / SUB_ROWS);
      cover.forEach((covered, i) => {
        if (covered > 0) this.cover(left + i, y, light, Math.min(covered / SUB_ROWS, 1) * share);
      });
    }
  }

  rectangle(yaw: number, pitch: number, width: number, height: number, light: Light, share = 1): void {
    const [l, r, b, t] = [yaw, yaw + width, pitch, pitch + height];
    this.fill(
      [
        [l, b],
        [r, b],
        [r, t],
        [l, t],
      ],
      light,
      share,
    );
  }

  /** A straight stroke of a width in degrees. */
  stroke(from: Spot, to: Spot, width: number, light: Light, share = 1): void {
    const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
    const length = Math.hypot(dx, dy) || 1;
    const [nx, ny] = [(-dy / length) * (width / 2), (dx / length) * (width / 2)];
    this.fill(
      [
        [from[0] + nx, from[1] + ny],
        [to[0] + nx, to[1] + ny],
        [to[0] - nx, to[1] - ny],
        [from[0] - nx, from[1] - ny],
      ],
      light,
      share,
    );
  }

  strokes(spots: readonly Spot[], width: number, light: Light, share = 1): void {
    spots.slice(1).forEach((spot, i) => this.stroke(spots[i], spot, width, light, share));
  }

  /** A round glow that fades as a bell curve; sizes in degrees, the height may differ. */
  glow([yaw, pitch]: Spot, size: number, light: Light, tall = size): void {
    // A glow smaller than a pixel keeps its light: it is spread over the pixel.
    const least = 0.55 / this.scale;
    const [sx, sy] = [Math.max(size, least) * this.scale, Math.max(tall, least) * this.scale];
    const kept = Math.min(1, (size * tall * this.scale * this.scale) / (sx * sy));
    const [cx, cy] = [this.x(yaw) - 0.5, this.y(pitch) - 0.5];
    const left = Math.floor(cx - 3 * sx);
    const across = bell(left, Math.floor(cx + 3 * sx), cx, sx);
    for (let y = Math.floor(cy - 3 * sy); y <= cy + 3 * sy; y++) {
      const share = kept * Math.exp(-0.5 * ((y - cy) / sy) ** 2);
      across.forEach((part, i) => this.shine(left + i, y, light, share * part));
    }
  }
}

/** A bell curve at whole pixels: a glow is one curve across times one down. */
function bell(from: number, to: number, middle: number, size: number): Float32Array {
  return Float32Array.from({ length: to - from + 1 }, (_, i) =>
    Math.exp(-0.5 * ((from + i - middle) / size) ** 2),
  );
}

function wrapped(x: number, width: number): number {
  return ((x % width) + width) % width;
}

/** Adds what one thin row of a polygon covers of each pixel. */
function addSpans(
  cover: Float32Array,
  left: number,
  xs: readonly number[],
  ys: readonly number[],
  y: number,
): void {
  const crossings: number[] = [];
  xs.forEach((x, i) => {
    const j = (i + 1) % xs.length;
    if (ys[i] <= y !== ys[j] <= y) crossings.push(x + ((y - ys[i]) / (ys[j] - ys[i])) * (xs[j] - x) - left);
  });
  crossings.sort((a, b) => a - b);
  for (let k = 0; k + 1 < crossings.length; k += 2) addSpan(cover, crossings[k], crossings[k + 1]);
}

function addSpan(cover: Float32Array, from: number, to: number): void {
  for (let i = Math.floor(from); i < to; i++) cover[i] += Math.min(to, i + 1) - Math.max(from, i);
}
