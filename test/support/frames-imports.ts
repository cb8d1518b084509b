import { type MoveDocument } from '#schemas/move';
import { type FramesImport, keysFromFramesCsv } from '#shared/document/frames-import';
import { framesCsv } from '#shared/export/csv';
import { frameRows, type Per } from '#shared/export/frames-table';
import { type Pose } from './even-arcs';
import { key, moveWith } from './moves';

export const ARC = { path: 'arc', ease: 'linear' } as const;
export const THIN = { thin: true } as const;
export const EACH = { thin: false } as const;

export const bake = (move: MoveDocument, per: Per = 'source') => [...frameRows(move, per)];
export const csvOf = (move: MoveDocument, per: Per = 'source') => [...framesCsv(bake(move, per))].join('');

/** Any move on a shot of so many frames. */
export const onto = (frames: number) => {
  const move = moveWith([key(0)]);
  return { ...move, shot: { ...move.shot, frames } };
};

export function imported(text: string, move: MoveDocument, options: FramesImport) {
  const result = keysFromFramesCsv(text, move, options);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result;
}

export function faultsOf(text: string, move: MoveDocument, options: FramesImport = THIN): string[] {
  const result = keysFromFramesCsv(text, move, options);
  return result.ok ? [] : result.faults.map(each => each.detail);
}

export const tableOf = (poses: readonly Pose[]) =>
  [
    'source_frame,yaw,pitch,roll,fov,eye',
    ...poses.map(({ frame, yaw, pitch, roll, fov, eye }) => [frame, yaw, pitch, roll, fov, eye].join(',')),
  ].join('\n');
