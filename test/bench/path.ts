import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { quat } from 'gl-matrix';
import { NumberKeyframeTrack, QuaternionKeyframeTrack } from 'three';

import { type Key, type Leg, type MoveDocument } from '#schemas/move';
import { measureMove } from '#shared/measure/measure-move';
import { compileMove } from '#shared/path/compile';
import { type CompiledMove, POSE_SIZE } from '#shared/path/compiled-move';
import { joined, key, moveWith } from '../support/moves';
import { inTurn, printFigure } from './support/figure';

/**
 * The path library against the work that nobody can skip: a pose in playback against one bare slerp of gl-matrix and
 * against three.js' tracks, measures against sampling, the command line against an empty Node.
 */
const ROUNDS = 21;
const POSES = 20_000;
const FRAMES_PER_KEY = 48;

const LEGS = {
  arc: { path: 'arc', ease: 'ease-in-out' },
  levelfair: { path: 'level', ease: 'fair' },
  arcfair: { path: 'arc', ease: 'fair' },
} as const satisfies Record<string, Leg>;

/** Keys of a lively move: every number changes at every key. */
function keysOf(count: number, leg: Leg, framesPerKey = FRAMES_PER_KEY): Key[] {
  const keys = Array.from({ length: count }, (_, i) =>
    key(i * framesPerKey, {
      yaw: 40 * i + 15 * Math.sin(i),
      pitch: 25 * Math.sin(1.7 * i),
      roll: 6 * Math.sin(2.3 * i),
      fov: 85 + 20 * Math.sin(1.1 * i),
      eye: 0.3 + 0.2 * Math.cos(i),
    }),
  );
  return joined(keys, leg);
}

let sink = 0;

function playback(move: CompiledMove): () => void {
  const pose = new Float64Array(POSE_SIZE);
  const step = move.lastFrame / POSES;
  return () => {
    let sum = 0;
    for (let i = 0; i < POSES; i++) {
      move.poseAt(pose, i * step);
      sum += pose[0] + pose[4];
    }
    sink += sum;
  };
}

function bareSlerp(): () => void {
  const [a, b] = [quat.fromEuler(quat.create(), 10, 20, 30), quat.fromEuler(quat.create(), 40, -60, 20)];
  const out = quat.create();
  return () => {
    let sum = 0;
    for (let i = 0; i < POSES; i++) {
      quat.slerp(out, a, b, i / POSES);
      sum += out[0];
    }
    sink += sum;
  };
}

/** The same poses as three.js would play them: a quaternion track, and number tracks for field of view and eye point. */
function threeTracks(move: CompiledMove): () => void {
  const pose = new Float64Array(POSE_SIZE);
  const poses = move.keys.map(each => [...move.poseAt(pose, each.frame)]);
  const times = move.keys.map(each => each.frame);
  const numbers = (at: number) =>
    new NumberKeyframeTrack(
      'camera.number',
      times,
      poses.map(each => each[at]),
    ).InterpolantFactoryMethodLinear();
  const turns = poses.flatMap(each => each.slice(0, 4));
  const turn = new QuaternionKeyframeTrack(
    'camera.quaternion',
    times,
    turns,
  ).InterpolantFactoryMethodLinear();
  const [fov, eye] = [numbers(4), numbers(5)];
  const step = move.lastFrame / POSES;
  return () => {
    let sum = 0;
    for (let i = 0; i < POSES; i++) {
      const q: ArrayLike<number> = turn.evaluate(i * step);
      const f: ArrayLike<number> = fov.evaluate(i * step);
      const e: ArrayLike<number> = eye.evaluate(i * step);
      sum += q[0] + f[0] + e[0];
    }
    sink += sum;
  };
}

function poseFigures(): void {
  const slerp = bareSlerp();
  for (const [name, leg] of Object.entries(LEGS)) {
    const [few, many] = [10, 1000].map(count => compileMove({ keys: keysOf(count, leg) }));
    const medians = inTurn(ROUNDS, [slerp, playback(few), playback(many), threeTracks(few)]);
    const [bare, ten, thousand, tracks] = medians.map(ms => (ms * 1e6) / POSES);
    const figure = (suffix: string, value: number, floor: number, limit: number): void =>
      printFigure({ name: `pose-${name}-${suffix}`, value, unit: 'ns', floor, limit });
    figure('10', ten, bare, 2.5);
    figure('1000', thousand, bare, 2.5);
    figure('1000-per-10', thousand, ten, 1.2);
    figure('10-per-three', ten, tracks, 1);
  }
}

/** Ten minutes at 60 frames a second with a bit of everything. */
function tenMinutes(): MoveDocument {
  const legs = [LEGS.arc, LEGS.levelfair, LEGS.levelfair, LEGS.arcfair, LEGS.arcfair, LEGS.arcfair];
  const keys = keysOf(41, LEGS.arc, 36_000 / 40).map((each, i) => ({
    ...each,
    ...(each.leg ? { leg: legs[i % legs.length] } : {}),
  }));
  const { shot } = moveWith(keys);
  const rate = { num: 60, den: 1 };
  return moveWith(keys, { shot: { ...shot, rate, to: 35_999, seamYaw: 90, exposure: 1 / 120 } });
}

function measureFigure(): void {
  const document = tenMinutes();
  const move = compileMove(document);
  const poses = new Float64Array(36_000 * POSE_SIZE);
  const sample = () => void move.sampleInto(poses, 0, 1);
  const measure = () => void (sink += measureMove(document).worst.stepPx.value ?? 0);
  const medians = inTurn(ROUNDS, [sample, measure]);
  printFigure({ name: 'measures-36000', value: medians[1], unit: 'ms', floor: medians[0], limit: 6 });
}

function compileFigures(): void {
  const many = { keys: keysOf(2000, LEGS.arcfair) };
  const compile = () => void (sink += compileMove(many).lastFrame);
  const run = keysOf(200, LEGS.arcfair);
  let turn = 0;
  const drag = () => {
    turn += 0.37;
    const keys = run.map((each, i) => (i === 100 ? { ...each, yaw: each.yaw + turn } : each));
    sink += compileMove({ keys }).lastFrame;
  };
  const medians = inTurn(ROUNDS, [compile, drag]);
  printFigure({ name: 'compile-2000', value: medians[0], unit: 'ms', floor: null, limit: 40 });
  printFigure({ name: 'recompile-200', value: medians[1], unit: 'ms', floor: null, limit: 2 });
}

function commandLineFigure(): void {
  const folder = mkdtempSync(path.join(tmpdir(), 'path-bench-'));
  try {
    const file = path.join(folder, 'move.json');
    writeFileSync(file, JSON.stringify(moveWith(keysOf(10, LEGS.arcfair))));
    execFileSync(process.execPath, ['scripts/move.mjs', 'check', file]);
    const node = (...args: string[]) => void execFileSync(process.execPath, args);
    const medians = inTurn(ROUNDS, [() => node('-e', '0'), () => node('dist/move/move.mjs', 'check', file)]);
    printFigure({ name: 'cli-check', value: medians[1], unit: 'ms', floor: medians[0], limit: 2.5 });
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

poseFigures();
measureFigure();
compileFigures();
commandLineFigure();
if (!Number.isFinite(sink)) throw new Error('A pose was no number.');
