import { type Key } from '#schemas/move';
import { type Numbers } from '#shared/conventions';
import { AngleColumns } from './angle-columns';
import { bezierHeight, bezierParameter } from './ease';
import { easeFromTable, type EaseTables } from './ease-table';
import * as at from './leg-table';
import { lensOnLeg } from './lens-on-leg';
import { orientationOnLeg } from './orientation';
import { type Run } from './runs';

/** Numbers in a pose: qx, qy, qz, qw, horizontal field of view (radians), eye point. */
export const POSE_SIZE = 6;

/** A fair run and whether its rotation spline fell back to a continuous rate without continuous acceleration. */
export interface CompiledRun extends Run {
  readonly fellBack: boolean;
}

/**
 * A move ready to be asked for poses.
 *
 * Every quaternion that leaves it is unit to 1e-12. Asking is total (frames outside the keys give the end poses) and
 * allocates nothing. It remembers the leg asked for last, so playback finds the next one at once and a jump takes
 * O(log n); what it answers depends on the frame alone.
 */
export class CompiledMove {
  /** Source frames of the first and the last key. */
  readonly firstFrame: number;
  readonly lastFrame: number;
  /** Index of the last key: the number of legs. */
  readonly lastKey: number;
  readonly #frames: Float64Array;
  readonly #columns: AngleColumns;
  readonly #eases: Readonly<Float64Array>;
  readonly #easeStarts: Readonly<Int32Array>;
  readonly #place = new Float64Array(1);
  #leg = 0;

  /** Made by `compileMove`; rows, sorts and flags as leg-table.ts says, one a key, the last key's holding its pose. */
  constructor(
    readonly keys: readonly Key[],
    readonly table: Readonly<Float64Array>,
    readonly sorts: Readonly<Uint8Array>,
    readonly flags: Readonly<Uint8Array>,
    readonly runs: readonly CompiledRun[],
    eases: EaseTables,
  ) {
    this.#frames = Float64Array.from(keys, key => key.frame);
    this.#eases = eases.tables;
    this.#easeStarts = eases.starts;
    this.lastKey = keys.length - 1;
    this.firstFrame = this.#frames[0];
    this.lastFrame = this.#frames[this.lastKey];
    this.#columns = new AngleColumns(this);
  }

  /**
   * The pose at a source frame.
   *
   * @param out receives qx, qy, qz, qw, field of view in radians, eye point
   * @param frame source frame, whole or not; before the first and after the last key the pose stands
   */
  poseAt(out: Numbers, frame: number): Numbers {
    const leg = this.legAt(frame);
    const row = leg * at.ROW;
    this.#findProgress(leg, frame);
    orientationOnLeg(out, this.table, row, this.sorts[leg], this.flags[leg], this.#place);
    lensOnLeg(out, this.table, row, this.flags[leg], this.#place);
    return out;
  }

  /**
   * The columns yaw, pitch, roll at a source frame, as tables show them: at a key the key's own numbers, on level legs
   * the channels, on arc legs counted on from the leg's first key without a jump.
   *
   * @param out receives yaw, pitch and roll in degrees
   */
  anglesAt(out: Numbers, frame: number): Numbers {
    return this.#columns.at(out, frame);
  }

  /**
   * Samples poses at even steps.
   *
   * @param out receives POSE_SIZE numbers a pose, as many poses as fit
   * @param from source frame of the first
   * @param step source frames from one to the next
   * @param until frames beyond it are taken as it
   */
  sampleInto(out: Float64Array, from: number, step: number, until = Infinity): Float64Array {
    const poses = Math.floor(out.length / POSE_SIZE);
    const pose = new Float64Array(POSE_SIZE);
    for (let i = 0; i < poses; i++)
      out.set(this.poseAt(pose, Math.min(from + i * step, until)), i * POSE_SIZE);
    return out;
  }

  /** @returns the index of the leg that holds at a frame: at a key the leg that begins there; the last key's row after it */
  legAt(frame: number): number {
    const frames = this.#frames;
    let leg = this.#leg;
    if (frame >= frames[leg]) {
      if (leg === this.lastKey || frame < frames[leg + 1]) return leg;
      leg++;
      if (leg === this.lastKey || frame < frames[leg + 1]) return (this.#leg = leg);
    }
    return (this.#leg = this.#search(frame));
  }

  /** @returns how far along a leg a frame is: the ease's u on eased legs, the share of time on fair ones; 0…1 */
  progress(leg: number, frame: number): number {
    this.#findProgress(leg, frame);
    return this.#place[0];
  }

  /** Leaves the progress in #place: a number returned may have to be put on the heap. */
  #findProgress(leg: number, frame: number): void {
    const row = leg * at.ROW;
    const place = this.#place;
    const t = (frame - this.table[row + at.FRAME]) * this.table[row + at.PER_FRAME];
    // Not "t < 0": a frame that is no number stands at the leg's start too.
    place[0] = t > 0 ? (t < 1 ? t : 1) : 0;
    if ((this.flags[leg] & at.CURVED_EASE) === 0 || !(t > 0) || t >= 1) return;
    const table = this.#easeStarts[leg];
    if (table >= 0) easeFromTable(place, this.#eases, table);
    if (table >= 0 && !Number.isNaN(place[0])) return;
    place[0] = bezierHeight(this.table, row + at.EASE, bezierParameter(this.table, row + at.EASE, t));
  }

  /** The last leg that begins at or before a frame; 0 where none does. */
  #search(frame: number): number {
    let low = 0;
    let high = this.lastKey;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (frame >= this.#frames[middle]) low = middle;
      else high = middle - 1;
    }
    return low;
  }
}
