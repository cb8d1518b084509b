import { encode } from './encode';
import { paintHarbour, paintQuayLamps } from './harbour';
import { paintHills } from './hills';
import { paintLamp, paintLampReflection } from './lamps';
import { Painting } from './painting';
import { type Palette, PALETTES, type Variant } from './palette';
import { paintQuay } from './quay';
import { paintMoon, paintSky, paintStars, SkyTable } from './sky';
import { paintTown } from './town';
import { paintMoonRoad, paintWater } from './water';

/**
 * Paints Vesper Haven by night: the invented harbour town, seen all round from the end of its quay. North is the middle
 * column (landmarks.ts); the picture joins at ±180° and is true at zenith and nadir.
 *
 * Far things first, near things over them, lamps last, as their light lies over everything.
 *
 * @param wanted.width pixels, even; the height is half of it
 * @param wanted.onProgress is told the share that is done, 0…1
 * @returns a JPEG, the same bytes for the same width and variant
 */
export async function paintVesperHaven(wanted: {
  readonly width: number;
  readonly variant: Variant;
  readonly onProgress?: (done: number) => void;
}): Promise<Buffer> {
  const palette = PALETTES[wanted.variant];
  const painting = new Painting(wanted.width);
  const sky = new SkyTable(palette);
  const layers = [
    () => paintSky(painting, sky),
    () => paintStars(painting, palette),
    () => paintMoon(painting, palette),
    () => paintHills(painting, palette, sky),
    () => paintWater(painting, palette, sky),
    () => paintMoonRoad(painting, palette),
    () => paintThings(painting, palette),
  ];
  for (const [i, layer] of layers.entries()) {
    layer();
    wanted.onProgress?.((i + 1) / (layers.length + 1));
    // Between layers a killed or cancelled start is noticed.
    await new Promise(resolve => setImmediate(resolve));
  }
  const picture = await encode(painting, palette.exposure);
  wanted.onProgress?.(1);
  return picture;
}

/** Reflections lie on the water but under boats, boards and the quay; lamps shine over all. */
function paintThings(painting: Painting, palette: Palette): void {
  // The lamps are known once their things are painted; so town and harbour are painted again over the reflections.
  const lamps = [
    ...paintTown(painting, palette),
    ...paintHarbour(painting, palette),
    ...paintQuayLamps(painting, palette),
  ];
  lamps.forEach((lamp, i) => paintLampReflection(painting, lamp, i + 1));
  paintHarbour(painting, palette);
  paintQuay(painting, palette);
  paintQuayLamps(painting, palette);
  lamps.forEach(lamp => paintLamp(painting, lamp));
}
