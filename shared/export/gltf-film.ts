import { type MoveDocument } from '#schemas/move';
import { RAD_PER_DEG } from '#shared/conventions';
import { deliverableNamed } from '#shared/document/deliverable-named';
import { shotTimes } from '#shared/document/shot-times';
import { radiusAtAngle } from '#shared/projection/general-perspective';
import { deliveredFrameCount } from '#shared/time/delivered-time';
import { frameRows } from './frames-table';

/**
 * Most delivered frames that a glTF camera is written for: two days at 24 a second.
 *
 * Times are 32-bit floats, of 24 bits. Up to 2²² frames each is within a quarter of a frame of its right place,
 * whatever the rate, so that they rise; beyond 2²³ neighbours begin to fall on one another. The text of so many also
 * stays below what JavaScript engines can hold in one string (2²⁹ signs).
 */
export const MOST_GLTF_FRAMES = 2 ** 22;

/** Thrown where the delivered film has more frames than a glTF camera can tell apart in time. */
export class FilmTooLong extends Error {
  constructor(frames: number) {
    super(`The film has ${frames} frames; a glTF camera can have at most ${MOST_GLTF_FRAMES}.`);
  }
}

/** Where a camera turns to, and when. */
export interface Turning {
  /** Delivered seconds, rising. */
  readonly seconds: Float64Array;
  /** Unit quaternions, four numbers a time. */
  readonly orientations: Float64Array;
}

/** What a glTF camera needs of a delivered film, a value (or four) a frame. */
export interface Film extends Turning {
  /** Vertical field of view of the rectilinear camera with the film's scale at the centre, radians. */
  readonly yfovsRad: Float64Array;
  /** The film's own horizontal field of view, degrees, and eye point. */
  readonly fovsDeg: Float64Array;
  readonly eyes: Float64Array;
}

/**
 * @param document a valid one
 * @throws FilmTooLong, UnknownDeliverable
 */
export function filmOf(document: MoveDocument, deliverableName?: string): Film {
  const count = deliveredFrameCount(shotTimes(document.shot));
  if (count > MOST_GLTF_FRAMES) throw new FilmTooLong(count);
  const { width, height } = deliverableNamed(document, deliverableName);
  const row = () => new Float64Array(count);
  const orientations = new Float64Array(4 * count);
  const film = { seconds: row(), orientations, yfovsRad: row(), fovsDeg: row(), eyes: row() };
  for (const { frame, seconds, fov, eye, qx, qy, qz, qw } of frameRows(
    document,
    'delivered',
    deliverableName,
  )) {
    film.seconds[frame] = seconds;
    film.orientations.set([qx, qy, qz, qw], 4 * frame);
    film.yfovsRad[frame] = rectilinearYfovRad(fov * RAD_PER_DEG, eye, height / width);
    film.fovsDeg[frame] = fov;
    film.eyes[frame] = eye;
  }
  return film;
}

/** At eye point 0 the frame's own; elsewhere what leaves the scale at the centre as it is: near the axis r ≈ c. */
function rectilinearYfovRad(fovRad: number, eye: number, heightPerWidth: number): number {
  return 2 * Math.atan(radiusAtAngle(fovRad / 2, eye) * heightPerWidth);
}
