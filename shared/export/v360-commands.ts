import { type MoveDocument } from '#schemas/move';
import { DEG_PER_RAD } from '#shared/conventions';
import { shotTimes } from '#shared/document/shot-times';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { halfWidthRatio, matchedFovRad } from '#shared/projection/deliverable-framing';
import { sourceOrientation } from '#shared/render/camera';
import { yawPitchRollFromQuat } from '#shared/rotation/yaw-pitch-roll';
import { deliveredFrameCount, sourceFrameOfDelivered } from '#shared/time/delivered-time';
import { deliverableNamed } from './frames-table';

/** Thrown where FFmpeg's v360 cannot draw a move; the message says what to change. */
export class NotForFfmpeg extends Error {}

/** What v360 is told for one delivered frame, degrees as text. */
export interface V360View {
  readonly yaw: string;
  readonly pitch: string;
  readonly roll: string;
  readonly h_fov: string;
  readonly v_fov: string;
  /** Both at once, corner to corner: one command instead of two. */
  readonly d_fov: string;
}

export interface V360Film {
  /** Sides of the pictures, even as film encoders want them. */
  readonly width: number;
  readonly height: number;
  /** Output projection: `flat` at eye point 0, `sg` at 1. */
  readonly projection: 'flat' | 'sg';
  readonly views: readonly V360View[];
}

/** How far an eye point may be from 0 or 1 and still be it. */
const EYE_SLACK = 1e-9;

/** Widest field of view that v360 draws, degrees. */
const WIDEST_DEG = 359;

/** Decimals of angles: float32, which v360 reads them into, has no more. */
const DECIMALS = 6;

/**
 * The delivered film as v360 sees it. v360's yaw, pitch and roll are ours; a level rotation is folded into them.
 *
 * @throws NotForFfmpeg where an eye point lies between 0 and 1 or a field of view is too wide; UnknownDeliverable
 */
export function v360Film(document: MoveDocument, deliverableName?: string): V360Film {
  const { shot, deliverables } = document;
  const deliverable = deliverableNamed(document, deliverableName);
  const ratio = halfWidthRatio(deliverables[0], deliverable);
  const [width, height] = [even(deliverable.width), even(deliverable.height)];
  const times = shotTimes(shot);
  const move = compileMove(document);
  const [pose, angles] = [new Float64Array(POSE_SIZE), new Float64Array(3)];
  const eye = theEyePoint(document);
  const views = Array.from({ length: deliveredFrameCount(times) }, (_, frame): V360View => {
    move.poseAt(pose, sourceFrameOfDelivered(times, frame));
    const fovRad = matchedFovRad(pose[4], eye, ratio);
    sourceOrientation(pose, shot.level ?? [0, 0, 0, 1], pose);
    yawPitchRollFromQuat(angles, pose, angles[2]);
    const [yaw, pitch, roll] = Array.from(angles, angle => text(angle));
    return { yaw, pitch, roll, ...fieldsOfView(fovRad, eye, width, height, frame) };
  });
  return { width, height, projection: eye === 0 ? 'flat' : 'sg', views };
}

/** The eye point of the whole film, 0 or 1. */
function theEyePoint({ keys }: MoveDocument): 0 | 1 {
  const eye = keys[0].eye < 0.5 ? 0 : 1;
  const others = keys.filter(key => Math.abs(key.eye - eye) > EYE_SLACK);
  if (others.length === 0) return eye;
  const all = keys.filter(key => Math.abs(key.eye) > EYE_SLACK && Math.abs(key.eye - 1) > EYE_SLACK);
  const named = (all.length > 0 ? all : others).map(key => `${key.frame} (${key.eye})`).join(', ');
  throw new NotForFfmpeg(
    `FFmpeg draws eye points 0 and 1 alone, one of them throughout; make all keys 0 or all 1. Keys to change, by frame: ${named}.`,
  );
}

function fieldsOfView(fovRad: number, eye: number, width: number, height: number, frame: number) {
  // tan of half the angle at eye point 0, of a quarter at 1: what grows evenly with the picture's sides.
  const part = eye === 0 ? 2 : 4;
  const tangent = Math.tan(fovRad / part);
  const wide = (sides: number) => part * Math.atan((tangent * sides) / width) * DEG_PER_RAD;
  const down = wide(height);
  if (down > WIDEST_DEG)
    throw new NotForFfmpeg(
      `FFmpeg draws fields of view of at most ${WIDEST_DEG}°; delivered frame ${frame} is ${down.toFixed(1)}° high. Make the keys about it narrower.`,
    );
  return {
    h_fov: (fovRad * DEG_PER_RAD).toFixed(DECIMALS),
    v_fov: down.toFixed(DECIMALS),
    d_fov: wide(Math.hypot(width, height)).toFixed(DECIMALS),
  };
}

/** Wrapped by the arc tangents that it comes from: v360 refuses angles beyond ±180. */
function text(angleRad: number): string {
  const degrees = (angleRad * DEG_PER_RAD).toFixed(DECIMALS);
  return Number(degrees) === 0 ? '0' : degrees;
}

function even(px: number): number {
  return 2 * Math.round(px / 2);
}
