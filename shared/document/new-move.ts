import { type MoveDocument, type Shot } from '#schemas/move';

/** A move of one still key at the delivered range's first frame, level and looking ahead. */
export function newMove(shot: Shot, title: string): MoveDocument {
  return {
    format: 'fairlead.move',
    version: 1,
    title,
    shot,
    deliverables: [{ name: 'Wide', width: 1920, height: 1080 }],
    keys: [{ frame: shot.from ?? 0, yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 }],
  };
}
