import { type Key, type MoveDocument } from '#schemas/move';
import { DEG_PER_RAD } from '#shared/conventions';
import { deliverableNamed } from '#shared/document/deliverable-named';
import { shotTimes } from '#shared/document/shot-times';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { halfWidthRatio, matchedFovRad } from '#shared/projection/deliverable-framing';
import { sourceOrientation } from '#shared/render/camera';
import { yawPitchRollFromQuat } from '#shared/rotation/yaw-pitch-roll';
import { deliveredFrameCount, sourceFrameOfDelivered } from '#shared/time/delivered-time';

/** Thrown where FFmpeg's v360 cannot draw a move; the message says what to change. */
export class NotForFfmpeg extends Error {}

/** Thrown where delivered frames have eye points between 0 and 1, or some 0 and some 1; the message names the keys. */
export class EyePointBetween extends NotForFfmpeg {
  constructor(eye: 0 | 1, keys: readonly Key[]) {
    const named = keys.map(key => `${key.frame} (${key.eye})`).join(', ');
    super(
      `FFmpeg draws eye points 0 and 1 alone, one of them throughout. Keys to make ${eye}, by frame: ${named}.`,
    );
  }
}

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
 * @throws EyePointBetween; NotForFfmpeg where a field of view is too wide; UnknownDeliverable
 */
export function v360Film(document: MoveDocument, deliverableName?: string): V360Film {
  const { shot, deliverables } = document;
  const deliverable = deliverableNamed(document, deliverableName);
  const ratio = halfWidthRatio(deliverables[0], deliverable);
  const [width, height] = [even(deliverable.width), even(deliverable.height)];
  const poses = deliveredPoses(document);
  const eye = theEyePoint(document, poses);
  const angles = new Float64Array(3);
  const views = poses.map((pose, frame): V360View => {
    const fovRad = matchedFovRad(pose[4], eye, ratio);
    sourceOrientation(pose, shot.level ?? [0, 0, 0, 1], pose);
    yawPitchRollFromQuat(angles, pose, angles[2]);
    const [yaw, pitch, roll] = Array.from(angles, angle => text(angle));
    return { yaw, pitch, roll, ...fieldsOfView(fovRad, eye, width, height, frame) };
  });
  return { width, height, projection: eye === 0 ? 'flat' : 'sg', views };
}

function deliveredPoses(document: MoveDocument): Float64Array[] {
  const times = shotTimes(document.shot);
  const move = compileMove(document);
  return Array.from({ length: deliveredFrameCount(times) }, (_, frame) => {
    const pose = new Float64Array(POSE_SIZE);
    move.poseAt(pose, sourceFrameOfDelivered(times, frame));
    return pose;
  });
}

/** The eye point of the whole film. Frames are asked, not keys: a key outside the delivered range may be anything. */
function theEyePoint(document: MoveDocument, poses: readonly Readonly<Float64Array>[]): 0 | 1 {
  const eye = poses[0][5] < 0.5 ? 0 : 1;
  if (poses.every(pose => Math.abs(pose[5] - eye) <= EYE_SLACK)) return eye;
  const reaching = keysOfDelivered(document);
  const target = others(reaching, 1).length < others(reaching, 0).length ? 1 : 0;
  const wrong = others(reaching, target);
  // Fair legs feel keys beyond their own ends.
  throw new EyePointBetween(target, wrong.length > 0 ? wrong : others(document.keys, target));
}

/** The keys whose legs the delivered range touches. */
function keysOfDelivered({ shot, keys }: MoveDocument): Key[] {
  const { from, to } = shotTimes(shot);
  return keys.filter(
    (_, i) => (i === keys.length - 1 || keys[i + 1].frame > from) && (i === 0 || keys[i - 1].frame < to),
  );
}

function others(keys: readonly Key[], eye: number): Key[] {
  return keys.filter(key => Math.abs(key.eye - eye) > EYE_SLACK);
}

function fieldsOfView(fovRad: number, eye: number, width: number, height: number, frame: number) {
  // tan of half the angle at eye point 0, of a quarter at 1: what grows evenly with the picture's sides.
  const part = eye === 0 ? 2 : 4;
  const tangent = Math.tan(fovRad / part);
  const wide = (sides: number) => part * Math.atan((tangent * sides) / width) * DEG_PER_RAD;
  const [across, down] = [wide(width), wide(height)];
  const widest = Math.max(across, down);
  if (widest > WIDEST_DEG)
    throw new NotForFfmpeg(
      `FFmpeg draws fields of view of at most ${WIDEST_DEG}°; delivered frame ${frame} is ${widest.toFixed(1)}° ${widest === down ? 'high' : 'wide'}. Make the keys about it narrower.`,
    );
  return {
    h_fov: across.toFixed(DECIMALS),
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
