import { DEG_PER_RAD, type Numbers, RAD_PER_DEG } from '#shared/conventions';
import { yawPitchRollFromQuat } from '#shared/rotation/yaw-pitch-roll';
import { type CompiledMove } from './compiled-move';
import * as at from './leg-table';

/** Every so many source frames of an arc leg its columns are kept, so that a jump need not count from the leg's start. */
const KEPT_EVERY = 64;

/** Columns at a whole source frame of an arc leg. */
interface Place {
  readonly yawDeg: number;
  readonly rollDeg: number;
}

/**
 * Yaw, pitch and roll as tables show them.
 *
 * A quaternion does not say how often it has turned. On an arc leg the first key's numbers start the count, and each
 * later whole source frame takes yaw and roll modulo 360 nearest to the source frame before; so the count is walked
 * frame by frame, and what was walked is kept in steps. Level legs have the numbers themselves.
 */
export class AngleColumns {
  readonly #move: CompiledMove;
  /** Per arc leg: places at its frames 0, 64, 128, … as far as walked. */
  readonly #kept = new Map<number, Place[]>();
  readonly #pose = new Float64Array(6);
  readonly #angles = new Float64Array(3);

  constructor(move: CompiledMove) {
    this.#move = move;
  }

  /** @see CompiledMove.anglesAt */
  at(out: Numbers, frame: number): Numbers {
    const move = this.#move;
    const leg = move.legAt(frame);
    const key = move.keys[leg];
    if (leg === move.lastKey || !(frame > key.frame)) {
      out[0] = key.yaw;
      out[1] = key.pitch;
      out[2] = key.roll;
      return out;
    }
    if (move.sorts[leg] === at.LEVEL) return this.#level(out, leg, frame);
    const whole = Math.floor(frame);
    const place = this.#walk(leg, whole);
    const here = whole === frame ? place : this.#next(frame, place);
    out[0] = here.yawDeg;
    out[1] = this.#angles[1] * DEG_PER_RAD;
    out[2] = here.rollDeg;
    return out;
  }

  #level(out: Numbers, leg: number, frame: number): Numbers {
    const { table } = this.#move;
    const s = this.#move.progress(leg, frame);
    const row = leg * at.ROW;
    out[0] = at.cubic(table, row + at.YAW, s);
    out[1] = at.cubic(table, row + at.PITCH, s);
    out[2] = at.cubic(table, row + at.ROLL, s);
    return out;
  }

  /** @returns the columns at a whole frame of a leg; leaves that frame's angles in #angles */
  #walk(leg: number, frame: number): Place {
    const key = this.#move.keys[leg];
    const kept = this.#kept.get(leg) ?? [{ yawDeg: key.yaw, rollDeg: key.roll }];
    this.#kept.set(leg, kept);
    const from = Math.min(Math.floor((frame - key.frame) / KEPT_EVERY), kept.length - 1);
    let place = kept[from];
    // The last kept place itself may be the one asked for: step onto it from itself, which changes nothing.
    for (let step = from * KEPT_EVERY; step <= frame - key.frame; step++) {
      place = step === 0 ? place : this.#next(key.frame + step, place);
      if (step % KEPT_EVERY === 0 && step / KEPT_EVERY === kept.length) kept.push(place);
    }
    if (frame === key.frame) this.#next(frame, place);
    return place;
  }

  /** @returns the columns at a frame, nearest to those before; leaves its angles in #angles */
  #next(frame: number, before: Place): Place {
    this.#move.poseAt(this.#pose, frame);
    yawPitchRollFromQuat(this.#angles, this.#pose, before.rollDeg * RAD_PER_DEG);
    return {
      yawDeg: nearest(this.#angles[0] * DEG_PER_RAD, before.yawDeg),
      rollDeg: nearest(this.#angles[2] * DEG_PER_RAD, before.rollDeg),
    };
  }
}

/** The angle modulo 360 that is nearest to `before`, degrees. */
function nearest(angleDeg: number, before: number): number {
  return angleDeg + 360 * Math.round((before - angleDeg) / 360);
}
