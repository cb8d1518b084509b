import { type MoveDocument } from '#schemas/move';
import { DEG_PER_RAD } from '#shared/conventions';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { angleBetween } from '#shared/rotation/angle-between';
import { type Part } from './save-move';

/** How far a part of a move, standing alone, is from the move that it was cut from. */
export interface CutDifference {
  /** Largest angle between the two orientations, degrees, and the source frame where. */
  readonly orientationDeg: number;
  readonly frame: number;
  /** Largest difference of the field of view, degrees. */
  readonly fovDeg: number;
}

/** Frames looked at in a leg: differences are smooth, so between them little is missed. */
const LOOKS_PER_LEG = 32;

/**
 * A fair run that is cut gets average rates at its new ends, so the part's poses are not quite the move's.
 *
 * @returns 0 throughout where no fair run is cut
 */
export function cutDifference(document: MoveDocument, { firstKey, lastKey }: Part): CutDifference {
  const keys = document.keys.slice(firstKey, lastKey + 1).map((key, i, all) => {
    const { leg: _left, ...last } = key;
    return i === all.length - 1 ? last : key;
  });
  const [whole, part] = [compileMove(document), compileMove({ keys })];
  const [a, b] = [new Float64Array(POSE_SIZE), new Float64Array(POSE_SIZE)];
  let worst: CutDifference = { orientationDeg: 0, frame: keys[0].frame, fovDeg: 0 };
  for (let leg = 0; leg + 1 < keys.length; leg++) {
    const from = keys[leg].frame;
    const length = keys[leg + 1].frame - from;
    const looks = Math.min(length, LOOKS_PER_LEG);
    for (let i = 0; i < looks; i++) {
      const frame = from + Math.round((i * length) / looks);
      whole.poseAt(a, frame);
      part.poseAt(b, frame);
      const fovDeg = Math.max(worst.fovDeg, Math.abs(a[4] - b[4]) * DEG_PER_RAD);
      const orientationDeg = angleBetween(a, b) * DEG_PER_RAD;
      worst =
        orientationDeg > worst.orientationDeg ? { orientationDeg, frame, fovDeg } : { ...worst, fovDeg };
    }
  }
  return worst;
}
