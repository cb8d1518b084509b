import { execFileSync, spawnSync } from 'node:child_process';
import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { type Deliverable, type Key, type Leg, type MoveDocument, type Shot } from '#schemas/move';
import { ffmpegScript } from '#shared/export/ffmpeg-script';
import { fraction } from '#shared/export/fraction';
import { EyePointBetween } from '#shared/export/v360-commands';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { halfWidthRatio } from '#shared/projection/deliverable-framing';
import { directionAtPicture, radiusAtAngle } from '#shared/projection/general-perspective';
import { conjugate, rotate } from '#shared/rotation/quaternion';
import { joined, key, moveWith } from '../../support/moves';

/**
 * Truth: FFmpeg itself. Its v360 renders footage whose colours are directions, by the exported script; what each pixel
 * then shows is compared with our own formula. Each footage frame is turned on from the one before, so that a wrong frame
 * shows as a wrong direction.
 */
const SOURCE = { width: 512, height: 256 };
const FOOTAGE_FRAMES = 61;
const TURN_A_FRAME_RAD = (3 * Math.PI) / 180;
const MOST_MEAN_ERROR_DEG = 0.05;

let folder: string;
let footage: string;

/** −1…1 as 16 bits, away from both ends: v360's weights overflow there. */
const CODE_SPAN = 0.45 * 65_535;
const encoded = (part: number) => Math.round(0.5 * 65_535 + part * CODE_SPAN);

/** The direction that a footage frame's colours say at a source direction. */
function turnedOn([x, y, z]: readonly number[], frame: number): [number, number, number] {
  const [c, s] = [Math.cos(frame * TURN_A_FRAME_RAD), Math.sin(frame * TURN_A_FRAME_RAD)];
  return [c * x + s * z, y, c * z - s * x];
}

function footageFrame(frame: number): Buffer {
  const { width, height } = SOURCE;
  const bytes = Buffer.alloc(width * height * 6);
  for (let row = 0; row < height; row++) {
    const latitude = (0.5 - (row + 0.5) / height) * Math.PI;
    for (let column = 0; column < width; column++) {
      const longitude = ((column + 0.5) / width - 0.5) * 2 * Math.PI;
      const level = Math.cos(latitude);
      const direction = [level * Math.sin(longitude), Math.sin(latitude), -level * Math.cos(longitude)];
      turnedOn(direction, frame).forEach((part, i) =>
        bytes.writeUInt16LE(encoded(part), 6 * (row * width + column) + 2 * i),
      );
    }
  }
  return bytes;
}

beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'it\'s a "folder": '));
  footage = path.join(folder, 'foot age.mkv');
  const raw = Buffer.concat(Array.from({ length: FOOTAGE_FRAMES }, (_, frame) => footageFrame(frame)));
  const size = `${SOURCE.width}x${SOURCE.height}`;
  execFileSync(
    'ffmpeg',
    [
      ...['-v', 'error', '-f', 'rawvideo', '-pix_fmt', 'rgb48le', '-s', size, '-r', '24', '-i', '-'],
      ...['-c:v', 'ffv1', '-pix_fmt', 'gbrp16le', `file:${footage}`],
    ],
    { input: raw },
  );
}, 60_000);

afterAll(() => rmSync(folder, { recursive: true, force: true }));

const RAW = { ENCODER: '-c:v rawvideo -pix_fmt rgb48le -f rawvideo' };

/** Runs a script that has been written beside its commands, from another folder. */
function run(
  files: Readonly<Record<string, string>>,
  name: string,
  args: readonly string[],
  env: object = RAW,
) {
  const place = path.join(folder, name);
  mkdirSync(place, { recursive: true });
  for (const [file, text] of Object.entries(files)) writeFileSync(path.join(place, file), text);
  return spawnSync('bash', [path.join(place, 'render.sh'), ...args], {
    cwd: folder,
    env: { ...process.env, ...env },
    encoding: 'utf8',
  });
}

function rendered(move: MoveDocument, name: string, deliverable?: string, framesAFile?: number): Buffer {
  const files = ffmpegScript(move, deliverable, framesAFile);
  const out = path.join(folder, `${name}.raw`);
  const { status, stderr } = run(files, name, ['foot age.mkv', out]);
  expect([status, /error|invalid|not found/i.exec(stderr)?.[0]]).toEqual([0, undefined]);
  return readFileSync(out);
}

interface Expected {
  readonly frames: number;
  readonly footageFrame: (frame: number) => number;
  readonly sourceFrame: (frame: number) => number;
}

/** Mean angle between what FFmpeg shows and what we say, over all pixels of all frames, degrees. */
function meanErrorDeg(film: Buffer, move: MoveDocument, expected: Expected, name?: string): number {
  const { deliverables, shot } = move;
  const { width, height, ...shape } = deliverables.find(each => each.name === name) ?? deliverables[0];
  const ratio = halfWidthRatio(deliverables[0], { width, height, ...shape });
  expect(film).toHaveLength(expected.frames * width * height * 6);
  const compiled = compileMove(move);
  const pose = new Float64Array(POSE_SIZE);
  const v = new Float64Array(3);
  const unlevel = conjugate(new Float64Array(4), shot.level ?? [0, 0, 0, 1]);
  let sum = 0;
  for (let frame = 0; frame < expected.frames; frame++) {
    compiled.poseAt(pose, expected.sourceFrame(frame));
    const half = ratio * radiusAtAngle(pose[4] / 2, pose[5]);
    for (let row = 0; row < height; row++) {
      for (let column = 0; column < width; column++) {
        const x = half * ((2 * column + 1) / width - 1);
        const y = (half * (height - 2 * row - 1)) / width;
        directionAtPicture(v, x, y, pose[5]);
        rotate(v, pose, v);
        rotate(v, unlevel, v);
        const truth = turnedOn([v[0], v[1], v[2]], expected.footageFrame(frame));
        sum += angleTo(truth, film, 6 * ((frame * height + row) * width + column));
      }
    }
  }
  return (sum / (expected.frames * width * height)) * (180 / Math.PI);
}

function angleTo(truth: readonly number[], film: Buffer, at: number): number {
  const seen = [0, 1, 2].map(i => (film.readUInt16LE(at + 2 * i) - 0.5 * 65_535) / CODE_SPAN);
  const length = Math.hypot(...seen);
  const apart = Math.hypot(...seen.map((part, i) => part / length - truth[i]));
  return 2 * Math.asin(Math.min(1, apart / 2));
}

function shotted(
  keys: Key[],
  over: Partial<Shot>,
  deliverables: Deliverable[] = [{ name: 'W', width: 96, height: 54 }],
): MoveDocument {
  const move = moveWith(keys, { deliverables });
  return { ...move, shot: { ...move.shot, frames: FOOTAGE_FRAMES, source: SOURCE, ...over } };
}

const FAIR: Leg = { path: 'level', ease: 'fair' };

describe('the film that FFmpeg renders by the script shows what we say', () => {
  it('turning several times, rolling, looking up and down and zooming, at eye point 0', () => {
    const keys = joined(
      [
        key(0, { fov: 60 }),
        key(25, { yaw: 500, pitch: 40, roll: -30, fov: 100 }),
        key(60, { yaw: -400, roll: 400 }),
      ],
      FAIR,
    );
    const move = shotted(keys, { to: 40 });
    const expected = { frames: 41, footageFrame: (j: number) => j, sourceFrame: (j: number) => j };
    expect(meanErrorDeg(rendered(move, 'turns'), move, expected)).toBeLessThan(MOST_MEAN_ERROR_DEG);
  }, 60_000);

  it('six times faster, over a part of the shot, at eye point 1', () => {
    const keys = joined([key(3, { eye: 1, fov: 200 }), key(60, { eye: 1, fov: 120, yaw: 300, pitch: -80 })], {
      path: 'arc',
      ease: 'ease-in-out',
    });
    const move = shotted(keys, { from: 5, to: 59, speed: 6 });
    const source = (j: number) => 5 + 6 * j;
    const expected = { frames: 10, footageFrame: source, sourceFrame: source };
    expect(meanErrorDeg(rendered(move, 'fast'), move, expected)).toBeLessThan(MOST_MEAN_ERROR_DEG);
  }, 60_000);

  it('two and a half times faster, at 23.976 a second, levelled, in the tall deliverable', () => {
    const keys = joined([key(0, { fov: 90 }), key(60, { yaw: 120, pitch: 30, fov: 90 })], FAIR);
    const tall = { name: 'T', width: 54, height: 96, match: 'height' as const };
    const move = shotted(
      keys,
      {
        speed: 2.5,
        rate: { num: 24_000, den: 1001 },
        level: [0.1, 0.2, -0.3, Math.sqrt(1 - 0.14)],
      },
      [{ name: 'W', width: 96, height: 54 }, tall],
    );
    const source = (j: number) => 2.5 * j;
    const expected = { frames: 25, footageFrame: (j: number) => Math.floor(source(j)), sourceFrame: source };
    expect(meanErrorDeg(rendered(move, 'tall', 'T'), move, expected, 'T')).toBeLessThan(MOST_MEAN_ERROR_DEG);
  }, 60_000);

  it('slower than life', () => {
    const move = shotted(joined([key(0), key(60, { yaw: 90 })], FAIR), { to: 10, speed: 0.4 });
    const source = (j: number) => Math.min(0.4 * j, 10);
    const expected = {
      frames: 26,
      footageFrame: (j: number) => Math.floor(source(j) + 1e-9),
      sourceFrame: source,
    };
    expect(meanErrorDeg(rendered(move, 'slow'), move, expected)).toBeLessThan(MOST_MEAN_ERROR_DEG);
  }, 60_000);

  it('at two thirds of the speed, to the last frame of the footage, past a yaw of 180', () => {
    const keys = joined([key(0, { yaw: 150 }), key(30, { yaw: 180 }), key(60, { yaw: 210 })], {
      path: 'arc',
      ease: 'linear',
    });
    const move = shotted(keys, { from: 20, speed: 2 / 3 });
    const source = (j: number) => 20 + (2 * j) / 3;
    const expected = {
      frames: 61,
      footageFrame: (j: number) => 20 + Math.floor((2 * j) / 3),
      sourceFrame: source,
    };
    expect(meanErrorDeg(rendered(move, 'end'), move, expected)).toBeLessThan(MOST_MEAN_ERROR_DEG);
  }, 60_000);

  it('with its commands in several files', () => {
    const move = shotted(joined([key(0), key(60, { yaw: 700, fov: 50 })], FAIR), { to: 30 });
    expect(Object.keys(ffmpegScript(move, undefined, 7))).toEqual([
      'render.sh',
      ...[1, 2, 3, 4, 5].map(part => `move-${part}.cmd`),
    ]);
    const expected = { frames: 31, footageFrame: (j: number) => j, sourceFrame: (j: number) => j };
    expect(meanErrorDeg(rendered(move, 'parts', undefined, 7), move, expected)).toBeLessThan(
      MOST_MEAN_ERROR_DEG,
    );
  }, 60_000);
});

describe('the script', () => {
  const move = shotted(joined([key(0), key(60, { yaw: 90 })], FAIR), {});

  it('is Bash, without faults of syntax', () => {
    const { status, stderr } = spawnSync('bash', ['-n'], {
      input: ffmpegScript(move)['render.sh'],
      encoding: 'utf8',
    });
    expect([status, stderr]).toEqual([0, '']);
  });

  it('finds its commands wherever a shell would rather go', () => {
    mkdirSync(path.join(folder, 'elsewhere', 'near'), { recursive: true });
    const place = path.join(folder, 'near');
    mkdirSync(place);
    for (const [file, text] of Object.entries(ffmpegScript(move)))
      writeFileSync(path.join(place, file), text);
    const { status } = spawnSync('bash', ['near/render.sh', 'foot age.mkv', 'near.raw'], {
      cwd: folder,
      env: { ...process.env, ...RAW, CDPATH: path.join(folder, 'elsewhere') },
    });
    expect(status).toBe(0);
  }, 60_000);

  it('gives a file of commands to each 5,000 frames', () => {
    const long = shotted(joined([key(0), key(10_000, { yaw: 90 })], FAIR), { frames: 10_001 });
    const files = ffmpegScript(long);
    expect(Object.keys(files)).toEqual(['render.sh', 'move-1.cmd', 'move-2.cmd', 'move-3.cmd']);
    expect(files['render.sh']).toContain(
      'sendcmd=f=move-1.cmd,sendcmd=f=move-2.cmd,sendcmd=f=move-3.cmd,v360=',
    );
    // Frame 5,000 at 24 a second, from half a frame early to half a frame late.
    expect(files['move-2.cmd']).toMatch(/^#.*\n208\.312500-208\.354167 v360 yaw /);
  });

  it('makes a film that players know, unless it is told otherwise', () => {
    const out = path.join(folder, 'film.mp4');
    expect(run(ffmpegScript(move), 'mp4', [footage, out], {}).status).toBe(0);
    const told = execFileSync(
      'ffprobe',
      [
        '-v',
        'error',
        '-count_frames',
        '-show_entries',
        'stream=codec_name,width,height,r_frame_rate,nb_read_frames',
        '-of',
        'csv=p=0',
        out,
      ],
      { encoding: 'utf8' },
    );
    expect(told.trim()).toBe('h264,96,54,24/1,61');
  }, 60_000);

  it('says what is missing and changes nothing', () => {
    const files = ffmpegScript(move);
    const there = path.join(folder, 'there.mp4');
    writeFileSync(there, 'kept');
    for (const [args, words] of [
      [[], 'name the footage and the film'],
      [['nothing.mkv', 'out.mp4'], 'there is no footage nothing.mkv'],
      [[footage, there], 'is there already'],
    ] as const) {
      const { status, stderr } = run(files, 'bad', args);
      expect(status).toBe(2);
      expect(stderr).toContain(words);
    }
    expect(readFileSync(there, 'utf8')).toBe('kept');
  });

  it('leaves nothing half-made behind', () => {
    const broken = path.join(folder, 'broken.mkv');
    writeFileSync(broken, 'no film');
    expect(run(ffmpegScript(move), 'half', [broken, 'half.mp4']).status).not.toBe(0);
    expect(readdirSync(folder).filter(name => name.includes('half.mp4'))).toEqual([]);
  });

  it('makes no film of footage that ends too soon', () => {
    const longer = shotted(joined([key(0), key(80, { yaw: 90 })], FAIR), { frames: 81 });
    const { status, stderr } = run(ffmpegScript(longer), 'short', [footage, 'short.raw']);
    expect(status).toBe(2);
    expect(stderr).toContain(`it gives ${FOOTAGE_FRAMES} of 81 frames`);
    expect(readdirSync(folder).filter(name => name.includes('short.raw'))).toEqual([]);
  }, 60_000);

  it('holds whatever a title may say as a comment', () => {
    const hostile = { ...move, title: 'A\'\n"`touch owned`$(touch owned)\r\n; touch owned\u2028touch owned' };
    const files = ffmpegScript(hostile);
    run(files, 'hostile', []);
    expect(existsSync(path.join(folder, 'owned'))).toBe(false);
    expect(existsSync(path.join(folder, 'hostile', 'owned'))).toBe(false);
    expect(files['render.sh'].split('\n')[1]).toMatch(/^# A' /);
  });

  it('tells v360 only what changes', () => {
    const cmd = ffmpegScript(move)['move.cmd'];
    expect(cmd).toContain('v360 yaw');
    expect(cmd).not.toMatch(/pitch|roll|fov/);
    expect(ffmpegScript(shotted([key(0)], {}))['move.cmd']).not.toContain('v360 ');
  });
});

describe('what v360 cannot draw is refused', () => {
  const refused = (keys: Key[], over: Partial<Shot> = {}) => {
    const move = shotted(joined(keys, { path: 'level', ease: 'linear' }), over);
    return () => ffmpegScript(move);
  };

  it('eye points between 0 and 1, with the keys to change', () => {
    const between = refused([key(0), key(20, { eye: 0.2 }), key(60)]);
    expect(between).toThrow(EyePointBetween);
    expect(between).toThrow('Keys to make 0, by frame: 20 (0.2).');
    expect(refused([key(0), key(60, { eye: 1 })])).toThrow('Keys to make 0, by frame: 60 (1).');
  });

  it('with the fewest keys to change', () => {
    const keys = [key(0, { eye: 0.9 }), key(20, { eye: 1 }), key(60, { eye: 1 })];
    expect(refused(keys)).toThrow('Keys to make 1, by frame: 0 (0.9).');
  });

  it('in delivered frames alone', () => {
    const keys = [key(0), key(20), key(40, { eye: 0.5 }), key(60, { eye: 0.7 })];
    expect(refused(keys, { to: 20 })).not.toThrow();
    expect(refused(keys, { to: 21 })).toThrow('Keys to make 0, by frame: 40 (0.5).');
  });

  // Truth: tan of a quarter of the angle grows with the side, and tan(359°/4) is 30.17 times tan(330°/4).
  it('fields of view beyond 359°', () => {
    const keys = [key(0, { eye: 1, fov: 330 })];
    const square = { name: 'Square', width: 10, height: 10 };
    const strip = (width: number, height: number, match: 'width' | 'height') => () =>
      ffmpegScript(shotted(keys, {}, [square, { name: 'Strip', width, height, match }]), 'Strip');
    expect(strip(10, 310, 'width')).toThrow(/delivered frame 0 is 359\.\d° high/);
    expect(strip(310, 10, 'height')).toThrow(/delivered frame 0 is 359\.\d° wide/);
    expect(strip(10, 300, 'width')).not.toThrow();
    expect(strip(300, 10, 'height')).not.toThrow();
  });
});

// Truth: arithmetic.
it.each([
  [6, 6, 1],
  [2.5, 5, 2],
  [0.04, 1, 25],
  [1 / 3, 1, 3],
  [10_000, 10_000, 1],
])('the speed %d is the fraction %d/%d', (value, num, den) => {
  expect(fraction(value, 71_000)).toEqual({ num, den });
});
