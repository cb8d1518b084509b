import { nearCrest } from './hills';
import { type Lamp } from './lamps';
import { HARBOUR_OFFICE } from './landmarks';
import { textWidth, write } from './lettering';
import { randomFrom } from './noise';
import { dimmed, type Light, mix, type Painting, type Spot } from './painting';
import { LAMP_WARM, LAMP_WHITE, type Palette } from './palette';

/** The town lies round the south of the harbour, from the bridge's foot to the cargo quay. */
const TOWN = { from: 108, to: 288 };

/** Rows of houses, far and high to near and low: pitch of their feet, degrees, and how large they are. */
const ROWS = [
  { foot: 4.3, size: 0.62, count: 120 },
  { foot: 3.2, size: 0.78, count: 130 },
  { foot: 2.1, size: 0.98, count: 120 },
  { foot: 1.05, size: 1.22, count: 105 },
  { foot: 0.02, size: 1.5, count: 84 },
];

const WINDOW_LIGHTS: readonly Light[] = [
  [1, 0.62, 0.26],
  [1, 0.74, 0.42],
  [1, 0.52, 0.18],
  [0.86, 0.9, 1],
];

/** Paints the houses with their lit windows; returns the street lamps, to be lit over them. */
export function paintTown(painting: Painting, palette: Palette): Lamp[] {
  const random = randomFrom(4711);
  const lamps: Lamp[] = [];
  paintTownHill(painting, palette);
  for (const [depth, row] of ROWS.entries()) {
    for (let i = 0; i < row.count; i++) {
      const yaw = TOWN.from + ((i + random() * 0.9) / row.count) * (TOWN.to - TOWN.from);
      const edge = Math.min(yaw - TOWN.from, TOWN.to - yaw) / 26;
      // The town thins out towards its ends and climbs no higher than its hill.
      if (random() > Math.min(1, edge + 0.25) || row.foot > Math.min(nearCrest(yaw) + 2.4, 0.4 + edge * 5))
        continue;
      const foot = row.foot * (0.86 + 0.2 * random());
      paintHouse(
        painting,
        palette,
        [yaw, foot],
        row.size * (0.8 + 0.5 * random()),
        depth / (ROWS.length - 1),
        random,
      );
      if (random() < 0.34) {
        const strength = (0.16 + 0.34 * random()) * (0.4 + (0.8 * depth) / ROWS.length);
        lamps.push({
          at: [yaw + 0.4, foot + 0.45 * row.size],
          colour: random() < 0.75 ? LAMP_WARM : LAMP_WHITE,
          strength,
          mirrored: depth >= 3,
        });
      }
    }
  }
  paintChurch(painting, palette, [206, 3.4]);
  paintHarbourOffice(painting, palette);
  return [...lamps, ...waterfrontLamps(random)];
}

/** The slope that the houses stand on, darker than the hills behind it. */
function paintTownHill(painting: Painting, palette: Palette): void {
  const crest: Spot[] = [];
  for (let yaw = TOWN.from - 4; yaw <= TOWN.to + 4; yaw += 0.5) {
    const edge = Math.min(yaw - TOWN.from + 4, TOWN.to + 4 - yaw) / 30;
    crest.push([
      yaw,
      Math.min(4.6, 0.2 + edge * 4.4) + 0.35 * Math.sin(yaw / 3.1) + 0.2 * Math.sin(yaw / 1.3),
    ]);
  }
  const ground = mix(palette.hill, palette.townGlow, 0.1);
  painting.fill([[TOWN.from - 4, -0.1], ...crest, [TOWN.to + 4, -0.1]], ground);
}

function paintHouse(
  painting: Painting,
  palette: Palette,
  [yaw, foot]: Spot,
  size: number,
  near: number,
  random: () => number,
): void {
  const width = size * (0.7 + 0.6 * random());
  const height = size * (0.55 + 0.6 * random());
  const lit = 0.5 + random();
  const wall = mix(dimmed(palette.hill, 1.5), [0.05 * lit, 0.036 * lit, 0.024 * lit], 0.28 + 0.4 * near);
  painting.rectangle(yaw - width / 2, foot - 0.4, width, height + 0.4, wall);
  const ridge = foot + height + width * (0.24 + 0.14 * random());
  const roof = dimmed(wall, 0.5);
  if (random() < 0.55)
    painting.fill(
      [
        [yaw - width / 2 - 0.04, foot + height],
        [yaw, ridge],
        [yaw + width / 2 + 0.04, foot + height],
      ],
      roof,
    );
  else
    painting.fill(
      [
        [yaw - width / 2 - 0.04, foot + height],
        [yaw - width * 0.36, ridge],
        [yaw + width * 0.36, ridge],
        [yaw + width / 2 + 0.04, foot + height],
      ],
      roof,
    );
  if (random() < 0.4) painting.rectangle(yaw + width * 0.18, foot + height, width * 0.1, width * 0.36, roof);
  paintWindows(painting, yaw - width / 2, foot, width, height, random);
}

function paintWindows(
  painting: Painting,
  left: number,
  foot: number,
  width: number,
  height: number,
  random: () => number,
): void {
  const across = Math.max(1, Math.round(width / 0.3));
  const floors = Math.max(1, Math.round(height / 0.36));
  const home = random() < 0.8 ? 0.42 : 0.06;
  for (let floor = 0; floor < floors; floor++) {
    for (let i = 0; i < across; i++) {
      const chance = random();
      const [cw, ch] = [width / across, height / floors];
      const at: Spot = [left + (i + 0.5) * cw, foot + (floor + 0.52) * ch];
      if (chance > home) {
        painting.rectangle(
          at[0] - cw * 0.18,
          at[1] - ch * 0.24,
          cw * 0.36,
          ch * 0.46,
          [0.002, 0.003, 0.006],
          0.7,
        );
        continue;
      }
      const light = dimmed(
        WINDOW_LIGHTS[Math.floor(random() ** 1.6 * WINDOW_LIGHTS.length)],
        0.3 + 0.75 * random(),
      );
      painting.rectangle(at[0] - cw * 0.2, at[1] - ch * 0.27, cw * 0.4, ch * 0.52, light);
      painting.glow(at, cw * 0.5, dimmed(light, 0.1));
    }
  }
}

function paintChurch(painting: Painting, palette: Palette, [yaw, foot]: Spot): void {
  const wall = mix(palette.hill, [0.2, 0.13, 0.07], 0.42);
  painting.rectangle(yaw - 1.3, foot, 2.1, 1.05, wall);
  painting.fill(
    [
      [yaw - 1.38, foot + 1.05],
      [yaw - 0.9, foot + 1.75],
      [yaw + 0.5, foot + 1.75],
      [yaw + 0.85, foot + 1.05],
    ],
    dimmed(wall, 0.45),
  );
  painting.rectangle(yaw + 0.55, foot, 0.62, 2.35, wall);
  painting.fill(
    [
      [yaw + 0.5, foot + 2.35],
      [yaw + 0.86, foot + 4.5],
      [yaw + 1.22, foot + 2.35],
    ],
    dimmed(wall, 0.4),
  );
  painting.rectangle(yaw + 0.76, foot + 1.55, 0.2, 0.42, [1, 0.7, 0.3]);
  painting.glow([yaw + 0.86, foot + 1.2], 0.8, [0.11, 0.065, 0.03]);
  for (let i = 0; i < 4; i++)
    painting.rectangle(yaw - 1.05 + i * 0.38, foot + 0.3, 0.13, 0.46, [0.85, 0.5, 0.18]);
}

function paintHarbourOffice(painting: Painting, palette: Palette): void {
  const { yawDeg: yaw, pitchDeg: pitch } = HARBOUR_OFFICE;
  const text = 'HARBOUR OFFICE';
  const width = textWidth(text, 0.62) + 1.1;
  const wall = mix(palette.hill, [0.11, 0.08, 0.055], 0.62);
  painting.rectangle(yaw - width / 2, -0.2, width, 2.75, wall);
  painting.rectangle(yaw - width / 2 - 0.15, 2.5, width + 0.3, 0.2, dimmed(wall, 0.6));
  for (let i = 0; i < 9; i++)
    painting.rectangle(
      yaw - width / 2 + 0.45 + (i * (width - 0.9)) / 9,
      0.3,
      (width - 0.9) / 12,
      0.78,
      i === 2 || i === 6 ? [0.3, 0.24, 0.16] : [1, 0.76, 0.42],
    );
  painting.rectangle(yaw - width / 2 + 0.25, pitch - 0.5, width - 0.5, 1, [0.012, 0.03, 0.06]);
  write(painting, text, [yaw, pitch], 0.62, [1.15, 1.05, 0.85], 0.85);
  painting.glow([yaw, pitch], 2.6, [0.04, 0.032, 0.02], 0.9);
}

/** A chain of lamps along the water, close enough to each other to make a street. */
function waterfrontLamps(random: () => number): Lamp[] {
  const lamps: Lamp[] = [];
  for (let yaw = TOWN.from + 2; yaw < TOWN.to - 4; yaw += 3.1 + 1.6 * random()) {
    lamps.push({
      at: [yaw, 0.95 + 0.25 * random()],
      colour: random() < 0.72 ? LAMP_WARM : LAMP_WHITE,
      strength: 0.42 + 0.42 * random(),
      mirrored: true,
    });
  }
  return lamps;
}
