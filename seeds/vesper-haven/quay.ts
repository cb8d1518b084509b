import { noise2, noise3 } from './noise';
import { type Light, mix, type Painting } from './painting';
import { LAMP_WARM, type Palette } from './palette';

const RAD = Math.PI / 180;

/** Metres. The quay is 5.4 m wide, ends 2.4 m before the camera and runs south to the shore. */
const CAMERA_OVER_QUAY = 1.7;
const HALF_WIDTH = 2.7;
const FRONT = -2.4;
const BACK = 150;
const COPING = 0.42;
const SLAB = { long: 1.35, wide: 0.9 };
const JOINT = 0.025;

/** Lamp posts along the quay's western edge, metres south of the camera; the pools of light under them. */
export const QUAY_LAMPS = { side: -2.35, height: 4.6, south: [7, 22, 38, 55, 74, 95, 118] } as const;

/** Paints the stone underfoot by direction, so that its edges and joints run straight and meet where they must. */
export function paintQuay(painting: Painting, palette: Palette): void {
  const yaws = Float64Array.from(
    { length: painting.width },
    (_, x) => ((x + 0.5) / painting.scale - 180) * RAD,
  );
  const [sines, cosines] = [yaws.map(Math.sin), yaws.map(Math.cos)];
  for (let y = painting.height / 2, i = 3 * y * painting.width; y < painting.height; y++) {
    const down = ((y + 0.5) / painting.scale - 90) * RAD;
    const distance = CAMERA_OVER_QUAY / Math.tan(Math.max(down, 1e-4));
    // A pixel's size on the stone, metres: edges are softened over it.
    const blur = Math.max((CAMERA_OVER_QUAY / Math.sin(down) ** 2) * (RAD / painting.scale), 0.002);
    for (let x = 0; x < painting.width; x++, i += 3) {
      const east = distance * sines[x];
      const south = -distance * cosines[x];
      const side = Math.min(HALF_WIDTH - Math.abs(east), south - FRONT, BACK - south);
      const wide = Math.min(blur, Math.max(side, 0) + 0.4);
      if (side < -0.3) continue;
      const covered = Math.min(1, Math.max(0, side / Math.min(wide, 0.5) + 0.5));
      if (covered === 0) continue;
      const light = stone(palette, east, south, side, blur);
      for (let k = 0; k < 3; k++) painting.data[i + k] += covered * (light[k] - painting.data[i + k]);
    }
  }
}

function stone(palette: Palette, east: number, south: number, side: number, blur: number): Light {
  const coping = side < COPING;
  const row = Math.floor(south / SLAB.long);
  const shift = (row & 1) * (SLAB.wide / 2);
  const column = Math.floor((east + shift) / SLAB.wide);
  const jointAcross = Math.min(mod(south, SLAB.long), SLAB.long - mod(south, SLAB.long));
  const jointAlong = Math.min(mod(east + shift, SLAB.wide), SLAB.wide - mod(east + shift, SLAB.wide));
  const joint = coping
    ? Math.min(mod(south, 1.8), Math.abs(side - COPING) + 0.005)
    : Math.min(jointAcross, jointAlong);
  const fade = 1 / (1 + (blur / 0.12) ** 2);
  const gap = Math.max(0, 1 - joint / Math.max(JOINT, blur)) * 0.72 * fade;
  const slab = 0.82 + 0.36 * noise2(row * 3.7, column * 5.3, coping ? 8 : 7) * fade;
  const grain =
    1 +
    (noise3(east * 9, south * 9, 4) - 0.5) * 0.38 * fade +
    (noise2(east * 1.3, south * 1.3, 31) - 0.5) * 0.3;
  const wet = Math.max(0, noise2(east * 0.5 + 3, south * 0.42, 12) - 0.56) * 2;
  const shade = (coping ? 1.35 : 1) * slab * grain * (1 - gap) * tripodShade(east, south);
  const lamp = lampPools(east, south) * shade;
  const cool = mix(
    palette.stone,
    [palette.stone[0] * 0.4, palette.stone[1] * 0.45, palette.stone[2] * 0.62],
    Math.min(wet, 0.8),
  );
  return [
    cool[0] * shade + LAMP_WARM[0] * lamp,
    cool[1] * shade + LAMP_WARM[1] * lamp,
    cool[2] * shade + LAMP_WARM[2] * lamp,
  ];
}

function mod(value: number, by: number): number {
  return value - by * Math.floor(value / by);
}

function lampPools(east: number, south: number): number {
  let light = 0;
  for (const lamp of QUAY_LAMPS.south) {
    const squared = (east - QUAY_LAMPS.side) ** 2 + (south - lamp) ** 2 + QUAY_LAMPS.height ** 2;
    // The lamp's light falls with the square of its distance, and slants on the stone.
    light += QUAY_LAMPS.height / (squared * Math.sqrt(squared));
  }
  return light * 1.85;
}

/** Headings of the tripod's legs, radians. */
const LEGS = [0.3, 0.3 + (2 * Math.PI) / 3, 0.3 - (2 * Math.PI) / 3];

/** The tripod: three legs from under the camera, and the dark where they meet. */
function tripodShade(east: number, south: number): number {
  const r = Math.hypot(east, south);
  if (r > 0.75) return 1;
  const angle = Math.atan2(east, -south);
  let nearest = Infinity;
  for (const leg of LEGS) {
    if (Math.cos(angle - leg) > 0) nearest = Math.min(nearest, Math.abs(Math.sin(angle - leg)) * r);
  }
  const legs = r < 0.56 ? 1 - 0.93 * Math.exp(-((nearest / 0.016) ** 2)) : 1;
  const hub = 1 - 0.95 * Math.exp(-((r / 0.085) ** 4));
  return legs * hub * (1 - 0.4 * Math.exp(-((r / 0.3) ** 2)));
}
