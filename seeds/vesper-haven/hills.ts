import { noise2 } from './noise';
import { type Light, mix, type Painting } from './painting';
import { type Palette } from './palette';
import { type SkyTable } from './sky';

interface Range {
  /** How much of the air's light lies before it: 0 near, 1 lost in haze. */
  readonly haze: number;
  /** Degrees. */
  readonly height: number;
  readonly base: number;
  /** Features around the whole circle. */
  readonly detail: number;
  readonly seed: number;
}

/** Far to near. Behind the town they are highest, towards the harbour's mouth they leave the sea open. */
const RANGES: readonly Range[] = [
  { haze: 0.62, height: 4.6, base: 1.6, detail: 16, seed: 11 },
  { haze: 0.36, height: 4.2, base: 0.8, detail: 24, seed: 23 },
  { haze: 0.12, height: 3.4, base: 0.1, detail: 38, seed: 37 },
];

/** Headings between which the harbour opens to the sea: no near hills there. */
const MOUTH = { yaw: 2, width: 26 };

/** Height of a range at a heading, degrees; the same at −180 and 180. */
function crest({ height, base, detail, seed }: Range, yaw: number): number {
  const turn = ((yaw + 180) / 360) * detail;
  // Noise that closes round the circle: one lattice of whole features, and finer ones on it.
  const ring = (t: number, cells: number, s: number) => noise2(((t % cells) + cells) % cells, 0.5, s);
  const wave =
    closed(turn, detail, seed, ring) * 0.62 +
    closed(turn * 3, detail * 3, seed + 1, ring) * 0.26 +
    closed(turn * 11, detail * 11, seed + 2, ring) * 0.12;
  const town = Math.exp(-((apart(yaw, 178) / 66) ** 2));
  const open = Math.exp(-((apart(yaw, MOUTH.yaw) / MOUTH.width) ** 2));
  return (base + height * wave * (0.55 + 0.85 * town)) * (1 - open) - 0.5 * open;
}

/** Value noise on a circle: the last cell blends back into the first. */
function closed(
  t: number,
  cells: number,
  seed: number,
  ring: (t: number, cells: number, seed: number) => number,
): number {
  const place = ((t % cells) + cells) % cells;
  const share = Math.max(0, place - (cells - 1));
  const here = ring(Math.min(place, cells - 1.0001), cells, seed);
  return share === 0
    ? here
    : here * (1 - share * share * (3 - 2 * share)) + ring(0, cells, seed) * share * share * (3 - 2 * share);
}

function apart(a: number, b: number): number {
  const d = a - b;
  return d - 360 * Math.round(d / 360);
}

/** @returns the height of the land at a heading, degrees; under 0 where the sea is open */
export function skyline(yaw: number): number {
  return Math.max(...RANGES.map(range => crest(range, yaw)));
}

/** @returns the height of the nearest range: where houses may stand */
export function nearCrest(yaw: number): number {
  return crest(RANGES[2], yaw);
}

export function paintHills(painting: Painting, palette: Palette, sky: SkyTable): void {
  const behind = new Float32Array(3);
  for (const range of RANGES) {
    for (let x = 0; x < painting.width; x++) {
      const yaw = (x + 0.5) / painting.scale - 180;
      const top = crest(range, yaw);
      if (top <= 0) continue;
      sky.read(behind, yaw, top + 1.5);
      const air: Light = [behind[0], behind[1], behind[2]];
      paintColumn(painting, x, top, (pitch: number) => {
        const mist = Math.exp(-pitch / 1.1) * 0.22 * (1 - range.haze);
        return mix(palette.hill, air, Math.min(range.haze * 0.8 + mist, 0.9));
      });
    }
  }
}

function paintColumn(painting: Painting, x: number, top: number, light: (pitch: number) => Light): void {
  const first = painting.y(top);
  const horizon = Math.floor(painting.height / 2);
  for (let y = Math.floor(first); y < horizon; y++) {
    const covered = Math.min(1, y + 1 - first);
    painting.cover(x, y, light(90 - (y + 0.5) / painting.scale), covered);
  }
}
