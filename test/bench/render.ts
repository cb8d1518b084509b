import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import sharp from 'sharp';

import { type Picture, type View } from '#shared/render/picture';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { FramePool } from '../../server/render/frame-pool';
import { median, printFigure } from './support/figure';

/**
 * Wall time a frame, the camera turning every frame, against FFmpeg's v360 with yaw, pitch and roll sent each frame: same
 * source (a JPEG, which FFmpeg keeps in 4:2:0), same size, two threads each.
 */
const RAD = Math.PI / 180;
const ROUNDS = 5;
const FRAMES = 60;
/** v360's start-up is taken out by two lengths. */
const V360_FRAMES = [2, 8] as const;
const SIZES = [
  ['render-1080', 1920, 1080],
  ['render-540', 960, 540],
] as const;

const anglesAt = (frame: number): [number, number, number] => [
  ((frame * 7.3 + 180) % 360) - 180,
  18 * Math.sin(frame / 9),
  6 * Math.sin(frame / 5),
];

/** Smooth shapes with detail on them, 6144 × 3072. */
function paint(): Picture {
  const [width, height] = [6144, 3072];
  const rgba = new Uint8Array(4 * width * height);
  for (let row = 0; row < height; row++) {
    for (let column = 0; column < width; column++) {
      const detail = ((column * 73_856_093) ^ (row * 19_349_663)) & 31;
      const at = 4 * (row * width + column);
      rgba[at] = 90 + 60 * Math.sin((column * 2 * Math.PI) / 768) + detail;
      rgba[at + 1] = 90 + 60 * Math.cos(row / 97) + detail;
      rgba[at + 2] = 120 + detail;
      rgba[at + 3] = 255;
    }
  }
  return { width, height, rgba };
}

function viewAt(frame: number, width: number, height: number): View {
  const [yaw, pitch, roll] = anglesAt(frame);
  const orientation = quatFromYawPitchRoll(new Float64Array(4), yaw * RAD, pitch * RAD, roll * RAD);
  return { orientation, fovRad: 90 * RAD, eye: 0, width, height };
}

async function ourFrameMs(pool: FramePool, width: number, height: number): Promise<number> {
  const began = performance.now();
  for (let i = 0; i < FRAMES; i++) await pool.render(viewAt(i, width, height), 'plain', () => undefined);
  return (performance.now() - began) / FRAMES;
}

function v360Ms(folder: string, frames: number, width: number, height: number): number {
  const commands = Array.from({ length: frames }, (_, i) => {
    const [yaw, pitch, roll] = anglesAt(i).map(angle => angle.toFixed(6));
    const from = Math.max(0, (i - 0.5) / 24).toFixed(6);
    return `${from}-${((i + 0.5) / 24).toFixed(6)} v360 yaw ${yaw}, v360 pitch ${pitch}, v360 roll ${roll};`;
  });
  const script = path.join(folder, 'turn.cmd');
  writeFileSync(script, commands.join('\n'));
  const fovDown = (2 * Math.atan(height / width)) / RAD;
  const v360 = `v360=e:flat:w=${width}:h=${height}:h_fov=90:v_fov=${fovDown}:reset_rot=1`;
  const graph = `loop=-1:1,setpts=N/24/TB,sendcmd=f=${script},${v360}`;
  const source = path.join(folder, 'source.jpg');
  const began = performance.now();
  execFileSync('ffmpeg', [
    ...['-v', 'error', '-nostdin', '-filter_threads', '2', '-r', '24', '-i', source],
    ...['-vf', graph, '-frames:v', String(frames), '-f', 'null', '-'],
  ]);
  return performance.now() - began;
}

const folder = mkdtempSync(path.join(tmpdir(), 'render-bench-'));
const pool = new FramePool(2);
try {
  const source = paint();
  const { width, height, rgba } = source;
  await sharp(rgba, { raw: { width, height, channels: 4 } })
    .removeAlpha()
    .jpeg({ quality: 90 })
    .toFile(path.join(folder, 'source.jpg'));
  await pool.setSource(source);
  for (const [name, across, down] of SIZES) {
    await ourFrameMs(pool, across, down);
    const ours: number[] = [];
    const theirs: number[] = [];
    for (let round = 0; round < ROUNDS; round++) {
      const [few, many] = V360_FRAMES.map(frames => v360Ms(folder, frames, across, down));
      theirs.push((many - few) / (V360_FRAMES[1] - V360_FRAMES[0]));
      ours.push(await ourFrameMs(pool, across, down));
    }
    printFigure({ name, value: median(ours), unit: 'ms/frame', floor: median(theirs), limit: 0.033 });
  }
} finally {
  await pool.close();
  rmSync(folder, { recursive: true, force: true });
}
