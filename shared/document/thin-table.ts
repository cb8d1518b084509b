import { type Key } from '#schemas/move';
import { type Numbers, RAD_PER_DEG } from '#shared/conventions';
import { keyOrientation } from '#shared/path/write-eased';
import { zoomFromFov } from '#shared/projection/field-of-view';
import { angleBetween } from '#shared/rotation/angle-between';

/** How far a thinned move may stray from the rows that it was made of. */
export interface Tolerance {
  /** Of orientation, over 0. */
  readonly angleRad: number;
  readonly fovRad: number;
  readonly eye: number;
}

/** Rows of a frames table as columns of numbers, a number a row; orientations four. */
export interface ThinTable {
  readonly keys: readonly Key[];
  readonly count: number;
  readonly frames: Float64Array;
  readonly quats: Float64Array;
  readonly fovsRad: Float64Array;
  /** ζ = ln tan(fov/4). */
  readonly zooms: Float64Array;
  readonly eyes: Float64Array;
  /** Radians that the orientation has gone up to each row, turn by turn; degrees that yaw and roll have. */
  readonly gone: Float64Array;
  readonly yawGone: Float64Array;
  readonly rollGone: Float64Array;
}

/** @param keys at rising frames, whole or not */
export function thinTable(keys: readonly Key[]): ThinTable {
  const count = keys.length;
  const quats = new Float64Array(4 * count);
  keys.forEach((key, i) => quats.set(keyOrientation(key), 4 * i));
  const fovsRad = Float64Array.from(keys, key => key.fov * RAD_PER_DEG);
  return {
    keys,
    count,
    frames: Float64Array.from(keys, key => key.frame),
    quats,
    fovsRad,
    zooms: fovsRad.map(zoomFromFov),
    eyes: Float64Array.from(keys, key => key.eye),
    gone: summed(count, i =>
      angleBetween(quats.subarray(4 * i - 4, 4 * i), quats.subarray(4 * i, 4 * i + 4)),
    ),
    yawGone: summed(count, i => Math.abs(keys[i].yaw - keys[i - 1].yaw)),
    rollGone: summed(count, i => Math.abs(keys[i].roll - keys[i - 1].roll)),
  };
}

/** Running sums of the steps from row to row. */
function summed(count: number, step: (i: number) => number): Float64Array {
  const sums = new Float64Array(count);
  for (let i = 1; i < count; i++) sums[i] = sums[i - 1] + step(i);
  return sums;
}

/** @param out receives the orientation of a row */
export function rowOrientation(out: Numbers, { quats }: ThinTable, row: number): Numbers {
  for (let k = 0; k < 4; k++) out[k] = quats[4 * row + k];
  return out;
}
