import { angleAtRadius, radiusAtAngle } from './general-perspective';

/** A frame's sides in pixels, and which of them keeps the first deliverable's coverage. */
export interface FrameShape {
  readonly width: number;
  readonly height: number;
  readonly match?: 'width' | 'height' | 'diagonal';
}

/**
 * How much larger the half width of a deliverable's frame is, on the tangent plane, than the first deliverable's.
 * It depends on the shapes alone, so a move needs it once.
 */
export function halfWidthRatio(first: FrameShape, deliverable: FrameShape): number {
  const firstAspect = first.height / first.width;
  const aspect = deliverable.height / deliverable.width;
  switch (deliverable.match ?? 'width') {
    case 'width':
      return 1;
    case 'height':
      return firstAspect / aspect;
    case 'diagonal':
      return Math.hypot(1, firstAspect) / Math.hypot(1, aspect);
  }
}

/**
 * @param fovRad the first deliverable's horizontal field of view
 * @param ratio from {@link halfWidthRatio}
 * @returns the deliverable's own horizontal field of view, radians; not clamped
 */
export function matchedFovRad(fovRad: number, eye: number, ratio: number): number {
  return ratio === 1 ? fovRad : 2 * angleAtRadius(radiusAtAngle(fovRad / 2, eye) * ratio, eye);
}
