import { type Key } from '#schemas/move';

/** A maximal stretch of neighbouring fair legs of one path without a rest inside: it makes one spline. */
export interface Run {
  /** Indices of its first and last key. */
  readonly firstKey: number;
  readonly lastKey: number;
  readonly path: 'level' | 'arc';
}

/** @returns the runs of a move, in order */
export function fairRuns(keys: readonly Key[]): Run[] {
  const runs: Run[] = [];
  let open: Run | undefined;
  keys.slice(0, -1).forEach((key, leg) => {
    const { leg: travel } = key;
    const path = travel?.ease === 'fair' ? travel.path : undefined;
    const goesOn = open !== undefined && open.path === path && key.rest !== true;
    if (open && goesOn) {
      open = { ...open, lastKey: leg + 1 };
      runs[runs.length - 1] = open;
    } else {
      open = path && { firstKey: leg, lastKey: leg + 1, path };
      if (open) runs.push(open);
    }
  });
  return runs;
}
