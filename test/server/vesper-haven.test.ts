import { execFile } from 'node:child_process';
import { promisify } from 'node:util';

import sharp from 'sharp';

import { HARBOUR_OFFICE, BOARDS, LANDMARKS, LIGHTHOUSE, MOON } from '../../seeds/vesper-haven/landmarks';

// The painting is invented; what it is held to are the conventions of equirectangular pictures (MATHS §1): longitude 0 in
// the middle, growing to the right, joined at ±180°, even at the poles, landmarks at the headings that they are said to have.

const WIDTH = 1024;
const HEIGHT = WIDTH / 2;

/** Longest that a painting of this size may take on a busy machine, milliseconds. */
const PATIENCE = 60_000;

async function painted(width: number, variant: string): Promise<Buffer> {
  const args = ['--import', 'tsx', 'test/support/server/paint.ts', String(width), variant];
  const { stdout } = await promisify(execFile)(process.execPath, args, {
    encoding: 'buffer',
    maxBuffer: 1e8,
  });
  return stdout;
}

describe.each(['blue-hour', 'deep-night'] as const)('Vesper Haven, %s', variant => {
  let picture: Buffer;
  let pixels: Buffer;

  beforeAll(async () => {
    picture = await painted(WIDTH, variant);
    pixels = await sharp(picture).raw().toBuffer();
  }, PATIENCE);

  /** Mean tone of a window around a heading, degrees. */
  const tone = (yaw: number, pitch: number, half: number): number => {
    const tones: number[] = [];
    for (
      let y = Math.round((90 - pitch - half) * (WIDTH / 360));
      y <= (90 - pitch + half) * (WIDTH / 360);
      y++
    ) {
      for (
        let x = Math.round((yaw + 180 - half) * (WIDTH / 360));
        x <= (yaw + 180 + half) * (WIDTH / 360);
        x++
      ) {
        tones.push(pixels[3 * (y * WIDTH + (((x % WIDTH) + WIDTH) % WIDTH)) + 1]);
      }
    }
    return tones.reduce((sum, each) => sum + each, 0) / tones.length;
  };

  /** Mean difference between two columns. */
  const step = (left: number, right: number): number => {
    let sum = 0;
    for (let y = 0; y < HEIGHT; y++) {
      for (let k = 0; k < 3; k++)
        sum += Math.abs(pixels[3 * (y * WIDTH + left) + k] - pixels[3 * (y * WIDTH + right) + k]);
    }
    return sum / (3 * HEIGHT);
  };

  it('is twice as wide as high', async () => {
    expect(await sharp(picture).metadata()).toMatchObject({ width: WIDTH, height: HEIGHT, format: 'jpeg' });
  });

  it('joins at ±180° no worse than inside', () => {
    const inside = Array.from({ length: 40 }, (_, i) => step(20 * i + 7, 20 * i + 8));
    expect(step(WIDTH - 1, 0)).toBeLessThanOrEqual(Math.max(...inside));
  });

  it.each([0, HEIGHT - 1])('is even along row %i, a pole', row => {
    const tones = Array.from({ length: WIDTH }, (_, x) => pixels[3 * (row * WIDTH + x) + 2]);
    expect(Math.max(...tones) - Math.min(...tones)).toBeLessThan(40);
  });

  it.each(BOARDS.map(({ name, yawDeg, pitchDeg }) => [name, yawDeg, pitchDeg] as const))(
    'has the lit board %s at its heading',
    (_name, yaw, pitch) => {
      expect(tone(yaw, pitch, 1)).toBeGreaterThan(1.2 * tone(yaw + 6, pitch + 9, 1));
    },
  );

  it.each(
    [MOON, LIGHTHOUSE, HARBOUR_OFFICE].map(({ name, yawDeg, pitchDeg }) => [name, yawDeg, pitchDeg] as const),
  )('has the %s where it says', (_name, yaw, pitch) => {
    expect(tone(yaw, pitch, 0.5)).toBeGreaterThan(1.3 * tone(yaw, pitch + 14, 1));
  });

  it(
    'comes out the same each time',
    async () => {
      expect((await painted(WIDTH, variant)).equals(picture)).toBe(true);
    },
    PATIENCE,
  );
});

it('keeps every landmark on the sphere', () => {
  for (const { yawDeg, pitchDeg } of LANDMARKS) {
    expect(Math.abs(yawDeg)).toBeLessThanOrEqual(180);
    expect(Math.abs(pitchDeg)).toBeLessThan(90);
  }
});
