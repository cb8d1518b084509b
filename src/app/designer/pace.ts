import { DEG_PER_RAD } from '#shared/conventions';
import { type CompleteShotTimes } from '#shared/document/shot-times';
import { CROSSING_LIMIT_SEC } from '#shared/measure/limits';
import { type CompiledMove, POSE_SIZE } from '#shared/path/compiled-move';
import { latOfDirection, lonOfDirection } from '#shared/projection/equirectangular';
import { radiusAtAngle } from '#shared/projection/general-perspective';
import { rotate } from '#shared/rotation/quaternion';
import { sourceFramesPerDeliveredSecond } from '#shared/time/delivered-time';

/** A point of the course: where the frame's centre is, and how fast it passes. */
export interface CoursePoint {
  readonly frame: number;
  readonly lonDeg: number;
  readonly latDeg: number;
  /** Whether the course jumps here from the point before: a cut after a held key. */
  readonly cut: boolean;
  /** Pan rate as a share of the fastest that keeps the crossing time: 0 stands, 1 is at the limit. */
  readonly pace: number;
}

/** Half a step to either side of a point that its rate is taken over, as a share of the step between points. */
const SIDE = 0.5;

/**
 * The course and its pace at even steps.
 *
 * @param points at least 2
 * @returns points from the first key to the last; one point where there is but one key
 */
export function coursePoints(move: CompiledMove, times: CompleteShotTimes, points: number): CoursePoint[] {
  const { firstFrame, lastFrame } = move;
  const step = (lastFrame - firstFrame) / (points - 1);
  if (step === 0) return [pointAt(move, firstFrame, 0, 1)];
  const perSecond = sourceFramesPerDeliveredSecond(times);
  const course = Array.from({ length: points }, (_, i) =>
    pointAt(move, firstFrame + i * step, step * SIDE, perSecond),
  );
  return course.map((point, i) => ({
    ...point,
    cut: i > 0 && hasCut(move, course[i - 1].frame, point.frame),
  }));
}

/** Whether a held key is left between two frames. */
function hasCut(move: CompiledMove, before: number, after: number): boolean {
  return move.keys.slice(move.legAt(before), move.legAt(after)).some(key => key.leg?.ease === 'hold');
}

/** The stretch around a frame that lies on one leg: a held key is left by a cut, which is no travel. */
function withinLeg(move: CompiledMove, frame: number, side: number): { from: number; to: number } {
  // The last key's row is no leg; the one that ends there counts.
  const leg = Math.min(move.legAt(frame), Math.max(move.lastKey - 1, 0));
  const start = move.keys[leg].frame;
  const end = move.keys[leg + 1]?.frame ?? start;
  // Just before the next key: at it the next leg begins.
  const inside = end - (end - start) * 1e-9;
  return { from: Math.max(frame - side, start), to: Math.min(frame + side, inside) };
}

function pointAt(move: CompiledMove, frame: number, side: number, framesPerSecond: number): CoursePoint {
  const pose = new Float64Array(POSE_SIZE);
  const forward = forwardAt(move, pose, frame);
  const [fov, eye] = [pose[4], pose[5]];
  const { from, to } = withinLeg(move, frame, side);
  const turned = to > from ? angle(forwardAt(move, pose, from), forwardAt(move, pose, to)) : 0;
  const panRate = to > from ? (turned / (to - from)) * framesPerSecond : 0;
  const crossing = (2 * radiusAtAngle(fov / 2, eye)) / panRate;
  return {
    frame,
    lonDeg: lonOfDirection(forward) * DEG_PER_RAD,
    latDeg: latOfDirection(forward) * DEG_PER_RAD,
    cut: false,
    pace: CROSSING_LIMIT_SEC / crossing,
  };
}

function forwardAt(move: CompiledMove, pose: Float64Array, frame: number): Float64Array {
  const forward = new Float64Array([0, 0, -1]);
  rotate(forward, move.poseAt(pose, frame), forward);
  return forward;
}

function angle(a: Float64Array, b: Float64Array): number {
  const cross = Math.hypot(a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]);
  return Math.atan2(cross, a[0] * b[0] + a[1] * b[1] + a[2] * b[2]);
}
