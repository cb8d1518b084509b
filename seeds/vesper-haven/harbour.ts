import { type Lamp } from './lamps';
import { BOARDS, BRIDGE, CRANE, LIGHTHOUSE } from './landmarks';
import { write } from './lettering';
import { randomFrom } from './noise';
import { dimmed, type Light, mix, type Painting, type Spot } from './painting';
import { LAMP_COLD, LAMP_GREEN, LAMP_RED, LAMP_WARM, LAMP_WHITE, type Palette } from './palette';
import { QUAY_LAMPS } from './quay';

const DEG = 180 / Math.PI;

/** Paints what stands in and around the harbour; returns its lamps. */
export function paintHarbour(painting: Painting, palette: Palette): Lamp[] {
  const dark = dimmed(palette.hill, 0.75);
  return [
    ...paintMole(painting, palette, dark),
    ...paintCrane(painting, dark),
    ...paintBridge(painting, palette, dark),
    ...paintBoats(painting, palette),
    ...paintBoards(painting),
  ];
}

/** The breakwater with the lighthouse, its beams sweeping over the sea. */
function paintMole(painting: Painting, palette: Palette, dark: Light): Lamp[] {
  const { yawDeg: yaw, pitchDeg: pitch } = LIGHTHOUSE;
  painting.fill(
    [
      [8, -0.15],
      [8.6, 0.35],
      [20, 0.55],
      [30, 0.7],
      [47, 0.5],
      [48, -0.15],
    ],
    dark,
  );
  const wall = mix(palette.hill, [0.5, 0.48, 0.46], 0.16);
  const band = mix(palette.hill, [0.42, 0.05, 0.03], 0.24);
  const half = (p: number) => 0.62 - 0.05 * p;
  for (let i = 0; i < 5; i++) {
    const [low, high] = [0.4 + i * 1.06, 0.4 + (i + 1) * 1.06];
    painting.fill(
      [
        [yaw - half(low), low],
        [yaw + half(low), low],
        [yaw + half(high), high],
        [yaw - half(high), high],
      ],
      i % 2 === 0 ? wall : band,
    );
  }
  painting.rectangle(yaw - 0.52, 5.7, 1.04, 0.16, dark);
  painting.rectangle(yaw - 0.27, 5.86, 0.54, 0.95, [0.9, 0.78, 0.5]);
  painting.fill(
    [
      [yaw - 0.38, 6.8],
      [yaw, 7.35],
      [yaw + 0.38, 6.8],
    ],
    dark,
  );
  for (const [aim, length] of [
    [11, 78],
    [191, 64],
  ] as const)
    paintBeam(painting, [yaw, pitch], aim, length);
  painting.glow([yaw, pitch], 3.4, [0.2, 0.17, 0.11]);
  return [
    { at: [yaw, pitch], colour: LAMP_WHITE, strength: 2.3, mirrored: true },
    { at: [8.4, 1.1], colour: LAMP_GREEN, strength: 0.75, mirrored: true },
    { at: [-7.5, 1.1], colour: LAMP_RED, strength: 0.75, mirrored: true },
  ];
}

/** A beam in the haze: bright at the lamp, wider and fainter outwards; aim in degrees from "right" towards "up". */
function paintBeam(painting: Painting, [yaw, pitch]: Spot, aim: number, length: number): void {
  const [dx, dy] = [Math.cos(aim / DEG), Math.sin(aim / DEG) * 0.5];
  const steps = Math.round(length * 7);
  for (let i = 1; i < steps; i++) {
    const t = i / steps;
    const along = t * length;
    const light = (0.026 * (1 - t) ** 1.7) / (1 + along * 0.05);
    painting.glow(
      [yaw + dx * along, pitch + dy * along],
      0.16,
      dimmed([1, 0.93, 0.74], light),
      0.14 + 0.028 * along,
    );
  }
}

/** The cargo quay with its portal crane, lattice against the sky. */
function paintCrane(painting: Painting, dark: Light): Lamp[] {
  const yaw = CRANE.yawDeg;
  painting.fill(
    [
      [58, -0.2],
      [58, 0.75],
      [107, 0.75],
      [107, -0.2],
    ],
    dark,
  );
  const random = randomFrom(99);
  const paint: readonly Light[] = [
    [0.03, 0.012, 0.008],
    [0.008, 0.016, 0.024],
    [0.02, 0.02, 0.016],
  ];
  for (let i = 0; i < 26; i++) {
    const [left, level] = [84 + (i % 13) * 1.65, Math.floor(i / 13)];
    if (random() < 0.82)
      painting.rectangle(left, 0.75 + level * 0.62, 1.55, 0.58, dimmed(paint[i % 3], 0.7 + 0.5 * random()));
  }
  painting.rectangle(60, 0.75, 11, 2.1, dimmed(dark, 1.25));
  for (let i = 0; i < 6; i++)
    painting.rectangle(60.7 + i * 1.75, 1.9, 0.8, 0.4, i === 3 ? [0.9, 0.66, 0.34] : [0.16, 0.12, 0.08]);
  const line = (a: Spot, b: Spot, w = 0.16) => painting.stroke(a, b, w, dark);
  for (const leg of [-1.7, 1.7]) line([yaw + leg, 0.7], [yaw + leg * 0.62, 5.2], 0.26);
  line([yaw - 1.4, 3.1], [yaw + 1.4, 3.1], 0.2);
  painting.rectangle(yaw - 1.15, 5.2, 2.3, 1.15, dark);
  painting.rectangle(yaw - 0.9, 5.5, 0.5, 0.5, [0.85, 0.62, 0.3]);
  lattice(painting, [yaw + 0.5, 6.3], [yaw - 9.5, 13.6], 0.62, dark);
  line([yaw + 0.6, 6.3], [yaw + 0.9, 9.4], 0.2);
  line([yaw + 0.9, 9.4], [yaw - 9.2, 13.5], 0.06);
  line([yaw + 0.9, 9.4], [yaw + 2.4, 6], 0.1);
  line([yaw - 9.4, 13.5], [yaw - 9.4, 4.4], 0.045);
  painting.rectangle(yaw - 9.65, 3.9, 0.5, 0.5, dark);
  return [
    { at: [yaw - 9.5, 13.8], colour: LAMP_RED, strength: 0.6, mirrored: false },
    { at: [yaw + 0.9, 9.6], colour: LAMP_RED, strength: 0.5, mirrored: false },
    { at: [yaw + 1.2, 5.1], colour: LAMP_COLD, strength: 0.9, mirrored: true },
    ...[61, 66, 71.5, 84, 92, 99, 105].map((at): Lamp => ({
      at: [at, 2.6],
      colour: LAMP_COLD,
      strength: 0.7,
      mirrored: true,
    })),
  ];
}

function lattice(painting: Painting, from: Spot, to: Spot, depth: number, light: Light): void {
  const bays = 15;
  const along = (t: number, lift: number): Spot => [
    from[0] + t * (to[0] - from[0]),
    from[1] + t * (to[1] - from[1]) + lift * (1 - 0.6 * t),
  ];
  painting.stroke(along(0, 0), along(1, 0), 0.12, light);
  painting.stroke(along(0, depth), along(1, depth), 0.12, light);
  for (let i = 0; i < bays; i++)
    painting.stroke(
      along(i / bays, i % 2 === 0 ? 0 : depth),
      along((i + 1) / bays, i % 2 === 0 ? depth : 0),
      0.07,
      light,
    );
}

/** A bridge on two towers, its cables hung with lamps, over the western arm of the harbour. */
function paintBridge(painting: Painting, palette: Palette, dark: Light): Lamp[] {
  const { yawDeg: middle } = BRIDGE;
  const [left, right] = [middle - 33, middle + 33];
  const towers = [middle - 14, middle + 14];
  const deck = (yaw: number) => 1.75 + 0.75 * Math.cos(((yaw - middle) / 33) * 1.35);
  const steel = mix(dark, palette.horizon, 0.1);
  for (let yaw = left; yaw < right; yaw += 0.5)
    painting.stroke([yaw, deck(yaw)], [yaw + 0.52, deck(yaw + 0.52)], 0.3, steel);
  for (let yaw = left + 2; yaw < right; yaw += 6.5)
    painting.rectangle(yaw - 0.15, -0.2, 0.3, deck(yaw), steel);
  const cable = (yaw: number): number => {
    const tower = towers[yaw < middle ? 0 : 1];
    if (yaw < towers[0] || yaw > towers[1])
      return deck(yaw) + 6.6 * Math.max(0, 1 - Math.abs(yaw - tower) / 19) ** 1.5;
    return deck(yaw) + 0.7 + 5.9 * ((yaw - middle) / 14) ** 2;
  };
  for (const tower of towers) {
    for (const side of [-0.42, 0.42])
      painting.rectangle(tower + side - 0.13, -0.2, 0.26, deck(tower) + 6.9, steel);
    for (const up of [2.4, 4.6, 6.5]) painting.rectangle(tower - 0.42, deck(tower) + up, 0.84, 0.2, steel);
  }
  const lamps: Lamp[] = towers.map((tower): Lamp => ({
    at: [tower, deck(tower) + 7.2],
    colour: LAMP_RED,
    strength: 0.55,
    mirrored: false,
  }));
  for (let yaw = left + 14; yaw < right - 13.9; yaw += 0.5) {
    painting.stroke([yaw, cable(yaw)], [yaw + 0.5, cable(yaw + 0.5)], 0.1, steel);
    painting.stroke([yaw, cable(yaw)], [yaw, deck(yaw)], 0.035, steel, 0.7);
    painting.glow([yaw, cable(yaw)], 0.05, [0.9, 0.72, 0.46]);
  }
  for (let yaw = left + 1.5; yaw < right; yaw += 3.3)
    lamps.push({ at: [yaw, deck(yaw) + 0.62], colour: LAMP_WARM, strength: 0.55, mirrored: true });
  return lamps;
}

/** Boats at moorings: dark hulls, a wheelhouse, masts and stays; a light here and there. */
function paintBoats(painting: Painting, palette: Palette): Lamp[] {
  const random = randomFrom(505);
  const lamps: Lamp[] = [];
  const boats: readonly Spot[] = [
    [-56, -1.6],
    [-47, -2.6],
    [-29, -1.9],
    [-20, -3.4],
    [44, -2.2],
    [53, -3.6],
    [112, -2.2],
    [121, -4.2],
    [131, -2.8],
    [-136, -2.6],
    [-146, -4.6],
    [-158, -3],
  ];
  for (const [yaw, water] of boats) {
    const size = 0.75 - water * 0.4;
    const hull = dimmed(mix(palette.hill, [0.06, 0.055, 0.05], 0.25 + 0.4 * random()), 0.8);
    painting.fill(
      [
        [yaw - 1.6 * size, water + 0.62 * size],
        [yaw - 1.25 * size, water],
        [yaw + 1.1 * size, water],
        [yaw + 1.75 * size, water + 0.75 * size],
      ],
      hull,
    );
    painting.fill(
      [
        [yaw - 1.25 * size, water],
        [yaw + 1.1 * size, water],
        [yaw + 0.8 * size, water - 0.34 * size],
        [yaw - 1 * size, water - 0.34 * size],
      ],
      dimmed(palette.deepWater, 0.6),
      0.7,
    );
    painting.rectangle(yaw - 0.75 * size, water + 0.6 * size, 0.95 * size, 0.5 * size, dimmed(hull, 1.3));
    const home = random() < 0.45;
    painting.rectangle(
      yaw - 0.6 * size,
      water + 0.74 * size,
      0.26 * size,
      0.2 * size,
      home ? [0.95, 0.66, 0.3] : [0.004, 0.006, 0.01],
    );
    painting.rectangle(
      yaw - 0.2 * size,
      water + 0.74 * size,
      0.26 * size,
      0.2 * size,
      home ? [0.95, 0.66, 0.3] : [0.004, 0.006, 0.01],
    );
    const top = water + (3.3 + random()) * size;
    painting.stroke(
      [yaw + 0.3 * size, water + 0.6 * size],
      [yaw + 0.3 * size, top],
      0.055 * size,
      dimmed(palette.hill, 0.6),
    );
    painting.stroke(
      [yaw + 0.3 * size, top],
      [yaw + 1.7 * size, water + 0.75 * size],
      0.022 * size,
      dimmed(palette.hill, 0.6),
    );
    painting.stroke(
      [yaw + 0.3 * size, top],
      [yaw - 1.5 * size, water + 0.62 * size],
      0.022 * size,
      dimmed(palette.hill, 0.6),
    );
    if (random() < 0.6)
      lamps.push({ at: [yaw + 0.3 * size, top], colour: LAMP_WHITE, strength: 0.3, mirrored: false });
  }
  return lamps;
}

/** Day-boards lit from above, one in each quarter of the compass. */
function paintBoards(painting: Painting): Lamp[] {
  return BOARDS.map(({ name, yawDeg: yaw, pitchDeg: pitch }): Lamp => {
    const size = name === 'S' ? 1.5 : 1.9;
    for (const side of [-0.55, 0.55])
      painting.rectangle(yaw + side * size - 0.06, -2.2, 0.12, pitch + 2.2, [0.012, 0.012, 0.012]);
    painting.rectangle(yaw - size, pitch - size * 0.85, 2 * size, size * 1.7, [0.03, 0.03, 0.028]);
    painting.rectangle(yaw - size * 0.94, pitch - size * 0.79, 1.88 * size, size * 1.58, [0.62, 0.58, 0.46]);
    write(painting, name, [yaw, pitch], size * 1.05, [0.01, 0.02, 0.045], 1.15);
    return { at: [yaw, pitch + size * 1.05], colour: LAMP_WHITE, strength: 0.75, mirrored: name !== 'S' };
  });
}

/** The lamp posts of the quay that we stand on, going away to the south. */
export function paintQuayLamps(painting: Painting, palette: Palette): Lamp[] {
  const { side, height, south } = QUAY_LAMPS;
  return [...south].reverse().map((metres): Lamp => {
    const yaw = Math.atan2(side, -metres) * DEG;
    const distance = Math.hypot(side, metres);
    const foot = -Math.atan2(1.7, distance) * DEG;
    const top = Math.atan2(height - 1.7, distance) * DEG;
    const width = Math.max((0.11 / distance) * DEG, 0.05);
    painting.stroke([yaw, foot], [yaw, top], width, dimmed(palette.hill, 0.9));
    painting.stroke(
      [yaw, top],
      [yaw - (0.5 / distance) * DEG, top + width],
      width,
      dimmed(palette.hill, 0.9),
    );
    return {
      at: [yaw - (0.5 / distance) * DEG, top],
      colour: LAMP_WARM,
      strength: Math.min(2.1, 0.55 + 9 / distance),
      mirrored: false,
    };
  });
}
