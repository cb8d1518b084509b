import { type MoveDocument } from '#schemas/move';
import { DEG_PER_RAD } from '#shared/conventions';
import { deliverableNamed } from '#shared/document/deliverable-named';
import { shotTimes } from '#shared/document/shot-times';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { halfWidthRatio, matchedFovRad } from '#shared/projection/deliverable-framing';
import { verticalFovRad } from '#shared/projection/field-of-view';
import {
  deliveredFrameCount,
  deliveredSeconds,
  labelledFrame,
  sourceFrameOfDelivered,
} from '#shared/time/delivered-time';
import { timecodeFromFrame } from '#shared/time/timecode';

/** Rows per delivered frame, or per source frame of the delivered range. */
export type Per = 'delivered' | 'source';

/** One row of the frames table; angles in degrees, `seconds` delivered, `timecode` of the source. */
export interface FrameRow {
  readonly frame: number;
  readonly source_frame: number;
  readonly timecode: string;
  readonly seconds: number;
  readonly yaw: number;
  readonly pitch: number;
  readonly roll: number;
  readonly fov: number;
  readonly vfov: number;
  readonly eye: number;
  readonly qx: number;
  readonly qy: number;
  readonly qz: number;
  readonly qw: number;
}

/** The table's columns, in order. */
export const FRAME_COLUMNS = [
  'frame',
  'source_frame',
  'timecode',
  'seconds',
  'yaw',
  'pitch',
  'roll',
  'fov',
  'vfov',
  'eye',
  'qx',
  'qy',
  'qz',
  'qw',
] as const satisfies readonly (keyof FrameRow)[];

/**
 * The frames table of a valid document, row by row, so that a long one need not stand in memory.
 *
 * @throws UnknownDeliverable
 */
export function* frameRows(document: MoveDocument, per: Per, deliverableName?: string): Generator<FrameRow> {
  const times = shotTimes(document.shot);
  const deliverable = deliverableNamed(document, deliverableName);
  const ratio = halfWidthRatio(document.deliverables[0], deliverable);
  const heightPerWidth = deliverable.height / deliverable.width;
  const move = compileMove(document);
  const pose = new Float64Array(POSE_SIZE);
  const angles = new Float64Array(3);
  const count = per === 'delivered' ? deliveredFrameCount(times) : times.to - times.from + 1;
  for (let frame = 0; frame < count; frame++) {
    const sourceFrame = per === 'delivered' ? sourceFrameOfDelivered(times, frame) : times.from + frame;
    move.poseAt(pose, sourceFrame);
    move.anglesAt(angles, sourceFrame);
    const eye = pose[5];
    const fovRad = matchedFovRad(pose[4], eye, ratio);
    yield {
      frame,
      source_frame: sourceFrame,
      timecode: timecodeFromFrame(times.startFrame + labelledFrame(sourceFrame), times.count),
      seconds: deliveredSeconds(times, sourceFrame),
      yaw: angles[0],
      pitch: angles[1],
      roll: angles[2],
      fov: fovRad * DEG_PER_RAD,
      vfov: verticalFovRad(fovRad, eye, heightPerWidth) * DEG_PER_RAD,
      eye,
      qx: pose[0],
      qy: pose[1],
      qz: pose[2],
      qw: pose[3],
    };
  }
}
