import { type CompiledMove } from '#shared/path/compiled-move';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { Rates, RATES_SIZE } from '#shared/path/rates';
import { angleBetween } from '#shared/rotation/angle-between';

/** What happens to the angular velocity at a key. */
export interface KeyJolt {
  /** Index of the key. */
  readonly key: number;
  readonly sourceFrame: number;
  /** Length of the jump of the angular velocity, radians a source frame; 0 at a cut; NaN where an ease has no slope. */
  readonly jump: number;
  /** Whether a held pose is left here for another: a cut, which is no jolt. */
  readonly isCut: boolean;
}

/** How far two poses may be apart and still be no cut, radians. */
const SAME_POSE_RAD = 1e-9;

/** Jolts at every key, in order: before the first and after the last the camera stands. */
export function keyJolts(move: CompiledMove): KeyJolt[] {
  const rates = new Rates(move);
  const before = new Float64Array(RATES_SIZE);
  const after = new Float64Array(RATES_SIZE);
  return move.keys.map((key, i): KeyJolt => {
    before.fill(0);
    after.fill(0);
    if (i > 0) rates.onLeg(before, i - 1, key.frame);
    if (i < move.lastKey) rates.onLeg(after, i, key.frame);
    const isCut = i > 0 && move.keys[i - 1].leg?.ease === 'hold' && posesDiffer(move, i);
    const jump = isCut ? 0 : Math.hypot(after[0] - before[0], after[1] - before[1], after[2] - before[2]);
    return { key: i, sourceFrame: key.frame, jump: Number.isFinite(jump) ? jump : NaN, isCut };
  });
}

/** Whether the pose held by the key before differs from this key's. */
function posesDiffer(move: CompiledMove, key: number): boolean {
  const held = move.poseAt(new Float64Array(POSE_SIZE), move.keys[key - 1].frame);
  const shown = move.poseAt(new Float64Array(POSE_SIZE), move.keys[key].frame);
  return (
    angleBetween(held, shown) > SAME_POSE_RAD ||
    Math.abs(held[4] - shown[4]) > SAME_POSE_RAD ||
    Math.abs(held[5] - shown[5]) > SAME_POSE_RAD
  );
}
