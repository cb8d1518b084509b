import { MOON } from './landmarks';
import { cloud3, noise3, randomFrom } from './noise';
import { dimmed, type Light, mix, type Painting } from './painting';
import { type Palette } from './palette';

const RAD = Math.PI / 180;

/** Headings of the sun's last light and of the town. */
const WEST = -78;
const TOWN = 172;

/** Where the band of the Milky Way stands: the direction square to it. */
const BAND_POLE = direction(64, 34);
const BAND_WIDTH = 0.24;

/** The moon is painted somewhat larger than it is, as the eye remembers it. */
const MOON_RADIUS = 0.95;

export function direction(yaw: number, pitch: number): readonly [number, number, number] {
  const level = Math.cos(pitch * RAD);
  return [level * Math.sin(yaw * RAD), Math.sin(pitch * RAD), -level * Math.cos(yaw * RAD)];
}

function apart(a: number, b: number): number {
  const d = a - b;
  return d - 360 * Math.round(d / 360);
}

/** The sky's light without stars and moon, also below the horizon: the water asks for it mirrored. */
export function skyLight(palette: Palette, yaw: number, pitch: number): Light {
  const up = Math.max(pitch, 0);
  const rise = 1 - Math.exp(-up / 13);
  let light = mix(palette.horizon, palette.middle, rise);
  light = mix(light, palette.zenith, 1 - Math.exp(-((up / 46) ** 1.5)));
  const west = Math.exp(-((apart(yaw, WEST) / 62) ** 2)) * Math.exp(-up / 8.5);
  const town = Math.exp(-((apart(yaw, TOWN) / 58) ** 2)) * Math.exp(-up / 11);
  light = sum(light, dimmed(palette.afterglow, west), dimmed(palette.townGlow, town));
  const [x, y, z] = direction(yaw, pitch);
  const streak = Math.max(0, cloud3(x * 5, y * 26, z * 5, 4) - 0.5) * Math.exp(-(((up - 9) / 9) ** 2)) * 2.2;
  light = mix(
    light,
    sum(dimmed(light, 0.55), dimmed(palette.afterglow, 0.18 * west)),
    Math.min(streak, 0.75),
  );
  const moonApart = Math.acos(Math.min(1, dotMoon(x, y, z))) / RAD;
  const halo = 0.11 * palette.moon * (Math.exp(-moonApart / 3.2) + 0.22 * Math.exp(-moonApart / 13));
  return sum(light, [halo * 0.86, halo * 0.93, halo], milkyWay(palette, x, y, z));
}

const MOON_AT = direction(MOON.yawDeg, MOON.pitchDeg);

function dotMoon(x: number, y: number, z: number): number {
  return x * MOON_AT[0] + y * MOON_AT[1] + z * MOON_AT[2];
}

function milkyWay(palette: Palette, x: number, y: number, z: number): Light {
  const across = x * BAND_POLE[0] + y * BAND_POLE[1] + z * BAND_POLE[2];
  const band = Math.exp(-((across / BAND_WIDTH) ** 2));
  if (band < 0.02 || y < 0.02) return [0, 0, 0];
  const dust = cloud3(x * 4.5, y * 4.5, z * 4.5, 5);
  const lane = 1 - 0.85 * Math.exp(-((across / 0.05) ** 2)) * Math.max(0, Math.min(1, (dust - 0.38) * 5));
  const light = 0.021 * palette.milkyWay * band * lane * (0.35 + 1.3 * dust) * Math.min(1, y * 3);
  return [light * 0.94, light * 0.92, light];
}

function sum(...lights: readonly Light[]): Light {
  let [r, g, b] = [0, 0, 0];
  for (const light of lights) {
    r += light[0];
    g += light[1];
    b += light[2];
  }
  return [r, g, b];
}

/** Samples a degree of the table that the sky is painted from; finer things are painted over it. */
const TABLE_PER_DEGREE = 5;

/** The sky's light as a table over the upper half, read with smooth steps between: the sky itself is smooth. */
export class SkyTable {
  readonly #columns = 360 * TABLE_PER_DEGREE;
  readonly #rows = 90 * TABLE_PER_DEGREE + 1;
  readonly #table: Float32Array;

  constructor(palette: Palette) {
    this.#table = new Float32Array(this.#columns * this.#rows * 3);
    for (let row = 0, i = 0; row < this.#rows; row++) {
      for (let column = 0; column < this.#columns; column++, i += 3) {
        this.#table.set(skyLight(palette, column / TABLE_PER_DEGREE - 180, row / TABLE_PER_DEGREE), i);
      }
    }
  }

  /** @param out receives the light; pitch 0…90 */
  read(out: Float32Array, yaw: number, pitch: number): void {
    const x = (yaw + 540) * TABLE_PER_DEGREE;
    const y = Math.min(Math.max(pitch, 0), 89.99) * TABLE_PER_DEGREE;
    const [x0, y0] = [Math.floor(x), Math.floor(y)];
    const [u, v] = [x - x0, y - y0];
    const left = x0 % this.#columns;
    const right = (x0 + 1) % this.#columns;
    const table = this.#table;
    const a = 3 * (y0 * this.#columns + left);
    const b = 3 * (y0 * this.#columns + right);
    const c = a + 3 * this.#columns;
    const d = b + 3 * this.#columns;
    for (let k = 0; k < 3; k++) {
      out[k] =
        (table[a + k] * (1 - u) + table[b + k] * u) * (1 - v) +
        (table[c + k] * (1 - u) + table[d + k] * u) * v;
    }
  }
}

/** Paints the upper half. */
export function paintSky(painting: Painting, table: SkyTable): void {
  const light = new Float32Array(3);
  for (let y = 0, i = 0; y < painting.height / 2; y++) {
    const pitch = 90 - (y + 0.5) / painting.scale;
    for (let x = 0; x < painting.width; x++, i += 3) {
      table.read(light, (x + 0.5) / painting.scale - 180, pitch);
      painting.set(i, light[0], light[1], light[2]);
    }
  }
}

/** Stars of the whole upper half: many faint, few bright, evenly over the sphere, thicker in the Milky Way. */
export function paintStars(painting: Painting, palette: Palette): void {
  const random = randomFrom(20261009);
  for (let i = 0; i < 9000 * palette.stars; i++) {
    const [yaw, pitch] = [random() * 360 - 180, Math.asin(random()) / RAD];
    const size = (1 - random()) ** -0.42 - 0.9;
    const tint = random();
    const [x, y, z] = direction(yaw, pitch);
    const across = x * BAND_POLE[0] + y * BAND_POLE[1] + z * BAND_POLE[2];
    if (random() > 0.45 + 0.55 * Math.exp(-((across / BAND_WIDTH) ** 2))) continue;
    const haze = Math.min(1, Math.max(0, (pitch - 4) / 26)) ** 1.2;
    const light = Math.min(size, 7) * 0.2 * haze * palette.stars;
    const colour: Light = tint < 0.2 ? [1, 0.82, 0.66] : tint < 0.55 ? [1, 0.97, 0.92] : [0.78, 0.88, 1];
    // Towards the zenith the flat picture stretches sideways: a round star must be painted as wide.
    const wide = 1 / Math.max(Math.cos(pitch * RAD), 0.02);
    const spread = 0.032 + 0.006 * Math.min(size, 5);
    painting.glow([yaw, pitch], Math.min(spread * wide, 4), dimmed(colour, light), spread);
    if (size > 3) painting.glow([yaw, pitch], Math.min(0.16 * wide, 6), dimmed(colour, light * 0.06), 0.16);
  }
}

export function paintMoon(painting: Painting, palette: Palette): void {
  const reach = MOON_RADIUS * 1.15;
  const wide = 1 / Math.cos(MOON.pitchDeg * RAD);
  const [cx, cy] = [painting.x(MOON.yawDeg), painting.y(MOON.pitchDeg)];
  for (let y = Math.floor(cy - reach * painting.scale); y <= cy + reach * painting.scale; y++) {
    for (
      let x = Math.floor(cx - reach * wide * painting.scale);
      x <= cx + reach * wide * painting.scale;
      x++
    ) {
      const u = (x + 0.5 - cx) / (MOON_RADIUS * wide * painting.scale);
      const v = (y + 0.5 - cy) / (MOON_RADIUS * painting.scale);
      const r = Math.hypot(u, v);
      const edge = Math.min(1, Math.max(0, ((1 - r) * MOON_RADIUS * painting.scale) / 1.2 + 0.5));
      if (edge === 0) continue;
      // Waxing: the lit side towards the west, where the sun went.
      const lit = Math.min(1, Math.max(0.012, (0.62 - u - 0.28 * v * v) * 2.6));
      const seas = 0.72 + 0.5 * noise3(u * 2.6 + 5, v * 2.6, 3) - 0.2 * noise3(u * 7, v * 7, 9);
      const light = 1.75 * palette.moon * seas * lit * (1 - 0.25 * r ** 4);
      painting.cover(x, y, [light, light * 0.95, light * 0.85], edge);
    }
  }
}
