import { type MoveDocument } from '#schemas/move';
import { deliverableNamed } from '#shared/document/deliverable-named';
import { halfWidthRatio, matchedFovRad } from '#shared/projection/deliverable-framing';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { sourceOrientation } from '#shared/render/camera';
import { type View } from '#shared/render/picture';

/**
 * A move's views for pictures of one deliverable.
 *
 * @param deliverable its name; the first unless said
 * @param widthPx the pictures' width, the deliverable's own unless said; the height follows its aspect
 * @param even whether both sides are made even, as film encoders want them
 * @returns the view at a source frame
 */
export function framedViews(
  move: MoveDocument,
  deliverable: string | undefined,
  { widthPx, even = false }: { widthPx?: number; even?: boolean },
): (frame: number) => View {
  const compiled = compileMove(move);
  const shape = deliverableNamed(move, deliverable);
  const ratio = halfWidthRatio(move.deliverables[0], shape);
  const side = (px: number): number => Math.max(2, even ? 2 * Math.round(px / 2) : Math.round(px));
  const width = side(widthPx ?? shape.width);
  const height = side((width * shape.height) / shape.width);
  const level = move.shot.level ?? [0, 0, 0, 1];
  return frame => {
    const pose = compiled.poseAt(new Float64Array(POSE_SIZE), frame);
    return {
      orientation: sourceOrientation(new Float64Array(4), level, pose),
      fovRad: matchedFovRad(pose[4], pose[5], ratio),
      eye: pose[5],
      width,
      height,
    };
  };
}
