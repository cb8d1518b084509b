import { type Numbers, type Quat, type Vec3 } from '#shared/conventions';
import { conjugate, rotate } from '#shared/rotation/quaternion';
import { directionAtPicture, pictureOfDirection, radiusAtAngle } from './general-perspective';

/** A framed picture: where it looks and what shape it has. */
export interface Frame {
  /** Camera to world. */
  readonly orientation: Readonly<Quat>;
  /** Horizontal field of view. */
  readonly fovRad: number;
  /** Eye point, 0…1. */
  readonly eye: number;
  /** The frame's height divided by its width. */
  readonly heightPerWidth: number;
}

/**
 * The frame's outline as it falls on the sphere, clockwise from the top left corner and closed.
 *
 * @param pointsPerSide at least 1; more make the curves smoother
 * @returns world directions, three numbers each, `4 · pointsPerSide + 1` of them, the last equal to the first
 */
export function frameOutline(frame: Frame, pointsPerSide: number): Float64Array {
  const halfWidth = radiusAtAngle(frame.fovRad / 2, frame.eye);
  const halfHeight = halfWidth * frame.heightPerWidth;
  const corners = [
    [-halfWidth, halfHeight],
    [halfWidth, halfHeight],
    [halfWidth, -halfHeight],
    [-halfWidth, -halfHeight],
  ];
  const out = new Float64Array(3 * (4 * pointsPerSide + 1));
  const direction = new Float64Array(3);
  for (let i = 0; i <= 4 * pointsPerSide; i++) {
    const side = Math.floor(i / pointsPerSide) % 4;
    const share = (i % pointsPerSide) / pointsPerSide;
    const from = corners[side];
    const to = corners[(side + 1) % 4];
    directionAtPicture(
      direction,
      from[0] + share * (to[0] - from[0]),
      from[1] + share * (to[1] - from[1]),
      frame.eye,
    );
    out.set(rotate(direction, frame.orientation, direction), 3 * i);
  }
  return out;
}

const scratchQuat = new Float64Array(4);
const scratchDirection = new Float64Array(3);

/**
 * Where a world direction falls in a frame.
 *
 * @param out receives `[x, y]`: −1…1 from the left to the right edge and from the bottom to the top edge inside the
 *   frame, beyond that outside
 * @returns whether the direction is inside the frame
 */
export function placeInFrame(out: Numbers, frame: Frame, world: Readonly<Vec3>): boolean {
  rotate(scratchDirection, conjugate(scratchQuat, frame.orientation), world);
  const drawn = pictureOfDirection(out, scratchDirection, frame.eye);
  const halfWidth = radiusAtAngle(frame.fovRad / 2, frame.eye);
  out[0] /= halfWidth;
  out[1] /= halfWidth * frame.heightPerWidth;
  return drawn && Math.abs(out[0]) <= 1 && Math.abs(out[1]) <= 1;
}
