import { skyline } from './hills';
import { MOON } from './landmarks';
import { noise2 } from './noise';
import { type Light, type Painting, type Spot } from './painting';
import { randomFrom } from './noise';
import { type Palette } from './palette';
import { type SkyTable } from './sky';

const RAD = Math.PI / 180;

/** Metres from the water to the camera. */
export const EYE_OVER_WATER = 6;

/**
 * Ripples at a point of the water, metres: two swells and a chop, fading where they are finer than the picture shows.
 *
 * @returns tilt of the surface towards the camera and across it, about −1…1
 */
function ripples(x: number, z: number, distance: number): [along: number, across: number] {
  const chop = 1 / (1 + (distance / 34) ** 2);
  const swell = 1 / (1 + (distance / 170) ** 2);
  const along =
    (noise2(x * 0.16, z * 0.5, 1) - 0.5) * 0.9 * swell +
    (noise2(x * 0.7 + 9, z * 2.1, 2) - 0.5) * 1.1 * chop +
    (noise2(x * 2.6, z * 6.5, 3) - 0.5) * 0.7 * chop * chop;
  const across = (noise2(x * 0.5 + 40, z * 0.4, 4) - 0.5) * (0.5 * swell + 0.8 * chop);
  return [along, across];
}

/** Paints the lower half: the mirrored sky and land, broken by ripples, over deep water. */
export function paintWater(painting: Painting, palette: Palette, sky: SkyTable): void {
  const mirrored = new Float32Array(3);
  const crests = Float32Array.from({ length: painting.width }, (_, x) =>
    skyline((x + 0.5) / painting.scale - 180),
  );
  for (let y = painting.height / 2, i = 3 * y * painting.width; y < painting.height; y++) {
    const down = (y + 0.5) / painting.scale - 90;
    const distance = EYE_OVER_WATER / Math.tan(Math.max(down, 0.02) * RAD);
    // What a flat mirror gives at this slant (Schlick's approximation for water, 0.02 straight down).
    const mirror = 0.02 + 0.98 * (1 - Math.sin(down * RAD)) ** 5;
    for (let x = 0; x < painting.width; x++, i += 3) {
      const yaw = (x + 0.5) / painting.scale - 180;
      const [along, across] = ripples(
        distance * Math.sin(yaw * RAD),
        -distance * Math.cos(yaw * RAD),
        distance,
      );
      const up = Math.abs(down + along * (3.5 + 0.3 * down));
      sky.read(mirrored, yaw + across * 4, up);
      const crest = crests[x] + 0.35;
      const land = up < crest ? 0.75 * Math.min(1, (crest - up) * 1.6) : 0;
      const share = mirror * (1 - land) * (0.85 + 0.3 * along);
      painting.set(
        i,
        palette.deepWater[0] + mirrored[0] * share + palette.hill[0] * mirror * land,
        palette.deepWater[1] + mirrored[1] * share + palette.hill[1] * mirror * land,
        palette.deepWater[2] + mirrored[2] * share + palette.hill[2] * mirror * land,
      );
    }
  }
}

/** The moon's road: glints that lie closer together below the moon and spread towards the camera. */
export function paintMoonRoad(painting: Painting, palette: Palette): void {
  const random = randomFrom(77);
  for (let i = 0; i < 5200; i++) {
    const down = 0.15 + 62 * random() ** 2.1;
    const spread = 0.9 + down * 0.16;
    const side = (random() + random() + random() - 1.5) * spread * 1.25;
    const near = Math.exp(-(((down - MOON.pitchDeg) / 24) ** 2));
    const light =
      (0.1 + 0.55 * near) * palette.moon * (0.25 + random()) * (0.35 + 0.65 * Math.exp(-down / 30));
    glint(painting, [MOON.yawDeg + side, -down], [0.95, 0.97, 1], light, random());
  }
}

/** A lamp's reflection: a broken column of glints below it, longest for the strong ones. */
export function paintReflection(
  painting: Painting,
  [yaw, pitch]: Spot,
  colour: Light,
  strength: number,
  seed: number,
): void {
  const random = randomFrom(seed * 7919 + 13);
  const reach = 5 + 15 * Math.min(strength, 1.4);
  const glints = Math.round(46 + 120 * strength);
  const shore = 0.5;
  for (let i = 0; i < glints; i++) {
    const t = random() ** 1.55;
    const down = shore + t * (reach + Math.max(pitch, 0));
    const spread = 0.07 + 0.035 * down;
    const side = (random() + random() - 1) * spread * 1.6;
    glint(
      painting,
      [yaw + side, -down],
      colour,
      0.62 * strength * (1 - t) ** 1.35 * (0.3 + random()),
      random(),
    );
  }
}

/** A short bright dash on a wavelet; nearer ones are larger. */
function glint(painting: Painting, [yaw, pitch]: Spot, colour: Light, light: number, chance: number): void {
  const near = Math.min(-pitch, 60);
  const wide = ((0.05 + 0.014 * near) * (0.5 + chance)) / Math.max(Math.cos(pitch * RAD), 0.3);
  painting.glow(
    [yaw, pitch],
    wide,
    [colour[0] * light, colour[1] * light, colour[2] * light],
    0.018 + 0.0042 * near,
  );
}
