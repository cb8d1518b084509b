import { type Key, type MoveDocument } from '#schemas/move';
import { RAD_PER_DEG } from '#shared/conventions';
import { shotTimes } from '#shared/document/shot-times';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE, type CompiledMove } from '#shared/path/compiled-move';
import { wholeTurns } from '#shared/path/whole-turns';
import { angleBetween } from '#shared/rotation/angle-between';
import {
  deliveredFrameCount,
  deliveredSeconds,
  type ShotTimes,
  sourceFrameOfDelivered,
} from '#shared/time/delivered-time';
import { type Turning } from './gltf-film';

/**
 * Legs that turn further also give their middle. glTF goes the shorter way between two 32-bit quaternions, and near
 * half a turn their rounding could decide which way that is.
 */
const WIDE_LEG_RAD = 170 * RAD_PER_DEG;

/**
 * The move by its keys alone, where glTF's LINEAR says the same: between two rotations it is the slerp along the
 * shortest path, as an arc leg with linear ease and without whole turns is.
 *
 * The film's first and last frame have poses of their own, keys outside its range have none: so it stands before the
 * first key and after the last, and a leg that the range cuts turns at its right rate.
 *
 * @param document a valid one, of a film of at least two frames
 * @returns undefined where another leg, a field of view or an eye point that changes, or keys so close in so long a
 *   film that their times are one in 32 bits, ask for a pose at each frame
 * @see glTF 2.0 §3.11 and appendix C
 */
export function exactTurning(document: MoveDocument): Turning | undefined {
  if (!isSlerpOnly(document.keys)) return undefined;
  const times = shotTimes(document.shot);
  const move = compileMove(document);
  const frames = Float64Array.from(turningFrames(move, times));
  const seconds = frames.map(frame => deliveredSeconds(times, frame));
  if (!risesAsFloats(seconds)) return undefined;
  const orientations = new Float64Array(4 * frames.length);
  frames.forEach((frame, i) => orientations.set(orientationAt(move, frame), 4 * i));
  return { seconds, orientations };
}

function isSlerpOnly(keys: readonly Key[]): boolean {
  return keys.every((key, i) => {
    const next = keys[i + 1] ?? key;
    const turns = wholeTurns(next.yaw - key.yaw) !== 0 || wholeTurns(next.roll - key.roll) !== 0;
    const straight = !key.leg || (key.leg.path === 'arc' && key.leg.ease === 'linear');
    return straight && !turns && key.fov === next.fov && key.eye === next.eye;
  });
}

/** @returns source frames, rising: the delivered ends, between them the keys and the middles of wide legs */
function turningFrames(move: CompiledMove, times: ShotTimes): number[] {
  const first = times.from;
  const last = sourceFrameOfDelivered(times, deliveredFrameCount(times) - 1);
  const turns = move.keys.flatMap(({ frame }, i) => {
    const next = move.keys[i + 1]?.frame ?? frame;
    const angle = angleBetween(orientationAt(move, frame), orientationAt(move, next));
    return angle > WIDE_LEG_RAD ? [frame, (frame + next) / 2] : [frame];
  });
  return [first, ...turns.filter(frame => frame > first && frame < last), last];
}

function orientationAt(move: CompiledMove, frame: number): Float64Array {
  const pose = new Float64Array(POSE_SIZE);
  move.poseAt(pose, frame);
  return pose.subarray(0, 4);
}

function risesAsFloats(values: Float64Array): boolean {
  return values.every((value, i) => i === 0 || Math.fround(value) > Math.fround(values[i - 1]));
}
