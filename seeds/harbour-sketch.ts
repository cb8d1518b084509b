import sharp from 'sharp';
import { type Painter } from './demo-plates';
import { type DemoVariant } from './demo-shots';

/**
 * The harbour as a quick sketch: sky, stars, moon, hills, lamps and their reflections. Longitude 0, the tallest lamp, is
 * north, and grows to the right; the picture joins at ±180° and is even at both poles.
 */

type Rgb = readonly [red: number, green: number, blue: number];

interface Light {
  readonly zenith: Rgb;
  readonly horizon: Rgb;
  readonly water: Rgb;
  readonly hills: Rgb;
  readonly stars: number;
}

const LIGHTS: Readonly<Record<DemoVariant, Light>> = {
  'blue-hour': {
    ...{ zenith: [10, 22, 58], horizon: [150, 104, 92], water: [12, 22, 40], hills: [14, 18, 34] },
    stars: 900,
  },
  'deep-night': {
    ...{ zenith: [3, 5, 14], horizon: [30, 34, 54], water: [4, 7, 14], hills: [4, 5, 10] },
    stars: 5000,
  },
};

const WARM: Rgb = [255, 196, 120];
const COLD: Rgb = [150, 205, 255];
const WHITE: Rgb = [255, 246, 226];

/** Heading and height over the horizon, degrees; size of the glow, degrees; colour. */
type Lamp = readonly [yaw: number, pitch: number, size: number, colour: Rgb];

const row = (yaws: readonly number[], colour: Rgb): Lamp[] =>
  yaws.map((yaw, i) => [yaw, 1.2 + (i % 3) * 0.6, 0.5, colour]);

const LAMPS: readonly Lamp[] = [
  [0, 9, 1.4, WHITE],
  ...row([-142, -128, -117, -99, -84, -71, -58, -44, -33, -21], WARM),
  ...row([18, 27, 39, 52, 66, 77, 90], WARM),
  ...row([112, 131, 155, 171], COLD),
];
const MOON: Lamp = [-64, 31, 2.2, WHITE];

/** How far from its middle a glow is drawn, in its own size. */
const GLOW_REACH = 4;

interface Canvas {
  readonly data: Buffer;
  readonly width: number;
  readonly height: number;
}

/** Paints in about a second; done is told by layers. */
export const sketchHarbour: Painter = async ({ width, variant, onProgress }) => {
  const height = width / 2;
  const canvas: Canvas = { data: Buffer.alloc(width * height * 3), width, height };
  const light = LIGHTS[variant];
  paintGround(canvas, light);
  onProgress(0.5);
  paintStars(canvas, light.stars);
  paintHills(canvas, light.hills);
  for (const lamp of LAMPS) {
    paintGlow(canvas, lamp, 1);
    paintGlow(canvas, [lamp[0], -lamp[1], lamp[2], lamp[3]], 3);
  }
  paintGlow(canvas, MOON, 1);
  onProgress(0.75);
  const raw = { width, height, channels: 3 } as const;
  return sharp(canvas.data, { raw }).jpeg({ quality: 90, chromaSubsampling: '4:4:4' }).toBuffer();
};

function paintGround({ data, width, height }: Canvas, { zenith, horizon, water }: Light): void {
  for (let y = 0; y < height; y++) {
    const pitch = 90 - ((y + 0.5) / height) * 180;
    const far = pitch > 0 ? zenith : water;
    const share = pitch > 0 ? 1 - Math.exp(-pitch / 14) : Math.min(1, -pitch / 12);
    const colour = horizon.map((value, c) => value + ((far[c] ?? value) - value) * share);
    data.fill(Buffer.from(colour), y * width * 3, (y + 1) * width * 3);
  }
}

function paintStars(canvas: Canvas, count: number): void {
  const next = randomFrom(20261009);
  for (let i = 0; i < count; i++) {
    // Even over the sky: height by its sine.
    const pitch = (Math.asin(next()) * 180) / Math.PI;
    paintGlow(canvas, [next() * 360 - 180, pitch, 0.03 + 0.05 * next() ** 6, i % 5 ? WHITE : COLD], 1);
  }
}

/** A silhouette of sines of whole numbers of waves a turn, so that it closes. */
function paintHills({ data, width, height }: Canvas, colour: Rgb): void {
  const paint = Buffer.from(colour);
  for (let x = 0; x < width; x++) {
    const yaw = ((x + 0.5) / width) * 2 * Math.PI;
    const topDeg =
      2.2 + 1.3 * Math.sin(3 * yaw + 1) + 0.7 * Math.sin(7 * yaw) + 0.25 * Math.sin(23 * yaw + 2);
    const rows = Math.max(0, Math.round((topDeg / 180) * height));
    for (let y = height / 2 - rows; y < height / 2; y++) paint.copy(data, (y * width + x) * 3);
  }
}

/**
 * Adds a soft round light, widened towards the poles as the projection widens everything.
 *
 * @param stretch how many times higher than wide: reflections are drawn out
 */
function paintGlow({ data, width, height }: Canvas, [yaw, pitch, size, colour]: Lamp, stretch: number): void {
  const sizeY = Math.max((size / 180) * height, 0.6);
  const sizeX = sizeY / Math.max(0.02, Math.cos((pitch / 180) * Math.PI));
  const middleX = ((yaw + 180) / 360) * width;
  const middleY = ((90 - pitch) / 180) * height;
  const reachX = Math.min(width / 2 - 1, sizeX * GLOW_REACH);
  const reachY = sizeY * stretch * GLOW_REACH;
  for (let y = Math.max(0, Math.floor(middleY - reachY)); y < Math.min(height, middleY + reachY); y++) {
    const dy = (y + 0.5 - middleY) / (sizeY * stretch);
    for (let x = Math.floor(middleX - reachX); x < middleX + reachX; x++) {
      const dx = (x + 0.5 - middleX) / sizeX;
      const strength = Math.exp(-2 * Math.sqrt(dx * dx + dy * dy));
      const at = (y * width + ((x + width) % width)) * 3;
      for (let c = 0; c < 3; c++)
        data[at + c] = Math.min(255, (data[at + c] ?? 0) + (colour[c] ?? 0) * strength);
    }
  }
}

/** Numbers in 0…1, the same at every run (a linear congruential generator, Numerical Recipes' constants). */
function randomFrom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}
