import { RAD_PER_DEG } from '#shared/conventions';
import {
  FOV_ALWAYS_DRAWN_RAD,
  FOV_MIN_RAD,
  fovFromZoom,
  maxFovRad,
  zoomFromFov,
} from '#shared/projection/field-of-view';
import { bodyRates } from '#shared/rotation/rotation-vector';
import { type CompiledMove } from './compiled-move';
import { bezierParameter, bezierHeight, bezierSlopes } from './ease';
import * as at from './leg-table';
import { orientationOnLeg } from './orientation';

/**
 * Numbers in a row of rates: angular velocity x, y, z (radians a source frame) and acceleration x, y, z (radians a source
 * frame squared), both in the camera's own axes, so that z is the viewing axis; then ζ′ (a source frame).
 */
export const RATES_SIZE = 7;

/** A number along the leg: its value, and its first and second derivative by source frames. */
type Channel = Float64Array;

/**
 * Rates of a compiled move, from the path's own derivatives, never from differences of poses.
 *
 * Level and arc legs alike are `Ry(−w) · s · Rz(−v)`: for level legs s = Rx(pitch), w the yaw and v the roll; for arcs s is
 * the rotation between the keys and w, v the whole turns. With s's own rate and acceleration in the body,
 *
 *     ω₁ = ω_s − ẇ y,  α₁ = α_s − ẅ y + ẇ ω_s × y,  y = sᵀ ŷ,
 *     ω = Rz(v) ω₁ − v̇ ẑ,  α = Rz(v) α₁ + v̇ ẑ × (Rz(v) ω₁) − v̈ ẑ.
 *
 * One of them serves one thread; it allocates when made and never again: numbers go from step to step in arrays.
 */
export class Rates {
  readonly #move: CompiledMove;
  readonly #progress: Channel = new Float64Array(3);
  readonly #yaw: Channel = new Float64Array(3);
  readonly #pitch: Channel = new Float64Array(3);
  readonly #roll: Channel = new Float64Array(3);
  readonly #zoom: Channel = new Float64Array(3);
  /** Rate and acceleration of s in the body, and y = sᵀ ŷ. */
  readonly #rate = new Float64Array(3);
  readonly #acceleration = new Float64Array(3);
  readonly #up = new Float64Array(3);
  /** Scratch: an ease's slopes, a quaternion, a rotation vector and its derivatives. */
  readonly #slopes = new Float64Array(2);
  readonly #quat = new Float64Array(4);
  readonly #vector = new Float64Array(3);
  readonly #vector1 = new Float64Array(3);
  readonly #vector2 = new Float64Array(3);

  constructor(move: CompiledMove) {
    this.#move = move;
  }

  /**
   * Rates at a source frame: at a key those of the leg that begins there, at the last key of the one that ends there;
   * outside the keys all are 0.
   *
   * @param out receives RATES_SIZE numbers; not finite where an ease is vertical
   */
  at(out: Float64Array, frame: number): Float64Array {
    const move = this.#move;
    if (!(frame >= move.firstFrame && frame <= move.lastFrame) || move.lastKey === 0) return out.fill(0);
    const leg = move.legAt(frame);
    return this.onLeg(out, leg === move.lastKey ? leg - 1 : leg, frame);
  }

  /** Rates at a frame of a leg, its ends included: the side of a key that the leg is on. */
  onLeg(out: Float64Array, leg: number, frame: number): Float64Array {
    const { table, flags, sorts } = this.#move;
    const row = leg * at.ROW;
    this.#readProgress(flags[leg], row, frame);
    if (sorts[leg] === at.LEVEL) this.#level(out, table, row);
    else this.#arc(out, table, row, sorts[leg], flags[leg]);
    out[6] = 0;
    if ((flags[leg] & at.ZOOMS) !== 0) this.#zoomRate(out, table, row);
    return out;
  }

  #readProgress(flags: number, row: number, frame: number): void {
    const { table } = this.#move;
    const progress = this.#progress;
    const perFrame = table[row + at.PER_FRAME];
    const way = (frame - table[row + at.FRAME]) * perFrame;
    const t = way > 0 ? (way < 1 ? way : 1) : 0;
    progress[0] = t;
    progress[1] = perFrame;
    progress[2] = 0;
    if ((flags & at.CURVED_EASE) === 0) return;
    const isEnd = t === 0 || t === 1;
    const p = isEnd ? t : bezierParameter(table, row + at.EASE, t);
    bezierSlopes(this.#slopes, table, row + at.EASE, p);
    progress[0] = isEnd ? t : bezierHeight(table, row + at.EASE, p);
    progress[1] = this.#slopes[0] * perFrame;
    progress[2] = this.#slopes[1] * perFrame * perFrame;
  }

  /** A cubic of the progress as a channel. */
  #channel(out: Channel, table: Readonly<Float64Array>, cubic: number): void {
    const s = this.#progress[0];
    const s1 = this.#progress[1];
    const c1 = table[cubic + 1];
    const c2 = table[cubic + 2];
    const c3 = table[cubic + 3];
    const slope = (3 * c3 * s + 2 * c2) * s + c1;
    out[0] = ((c3 * s + c2) * s + c1) * s + table[cubic];
    out[1] = slope * s1;
    out[2] = (6 * c3 * s + 2 * c2) * s1 * s1 + slope * this.#progress[2];
  }

  #level(out: Float64Array, table: Readonly<Float64Array>, row: number): void {
    const pitch = this.#pitch;
    this.#channel(this.#yaw, table, row + at.YAW);
    this.#channel(pitch, table, row + at.PITCH);
    this.#channel(this.#roll, table, row + at.ROLL);
    this.#rate[0] = pitch[1] * RAD_PER_DEG;
    this.#acceleration[0] = pitch[2] * RAD_PER_DEG;
    this.#rate[1] = this.#rate[2] = this.#acceleration[1] = this.#acceleration[2] = 0;
    this.#up[0] = 0;
    this.#up[1] = Math.cos(pitch[0] * RAD_PER_DEG);
    this.#up[2] = -Math.sin(pitch[0] * RAD_PER_DEG);
    this.#compose(out, RAD_PER_DEG);
  }

  #arc(out: Float64Array, table: Readonly<Float64Array>, row: number, sort: number, flags: number): void {
    if (sort === at.ARC) this.#slerpRates(table, row);
    else this.#splineRates(table, row);
    if ((flags & at.TURNS) === 0) {
      for (let k = 0; k < 3; k++) {
        out[k] = this.#rate[k];
        out[3 + k] = this.#acceleration[k];
      }
      return;
    }
    if (sort === at.ARC) this.#evenTurns(table, row);
    else {
      this.#channel(this.#yaw, table, row + at.YAW_TURN_CUBIC);
      this.#channel(this.#roll, table, row + at.ROLL_TURN_CUBIC);
    }
    orientationOnLeg(this.#quat, table, row, sort, flags & ~at.TURNS, this.#progress);
    const q = this.#quat;
    const x = q[0];
    const y = q[1];
    const z = q[2];
    const w = q[3];
    this.#up[0] = 2 * (x * y + w * z);
    this.#up[1] = 1 - 2 * (x * x + z * z);
    this.#up[2] = 2 * (y * z - w * x);
    // The table holds half the turns' angles.
    this.#compose(out, 2);
  }

  /** Whole turns of an eased arc run with the ease. */
  #evenTurns(table: Readonly<Float64Array>, row: number): void {
    for (let k = 0; k < 3; k++) {
      this.#yaw[k] = table[row + at.YAW_HALF_TURNS] * this.#progress[k];
      this.#roll[k] = table[row + at.ROLL_HALF_TURNS] * this.#progress[k];
    }
  }

  /** Along a slerp the axis stands and the angle runs with the ease. */
  #slerpRates(table: Readonly<Float64Array>, row: number): void {
    const angle = 2 * table[row + at.HALF_ANGLE];
    for (let k = 0; k < 3; k++) {
      this.#rate[k] = table[row + at.AXIS + k] * angle * this.#progress[1];
      this.#acceleration[k] = table[row + at.AXIS + k] * angle * this.#progress[2];
    }
  }

  #splineRates(table: Readonly<Float64Array>, row: number): void {
    const t = this.#progress[0];
    const perFrame = this.#progress[1];
    const r = this.#vector;
    const r1 = this.#vector1;
    const r2 = this.#vector2;
    for (let k = 0; k < 3; k++) {
      const c1 = table[row + at.VECTOR + k];
      const c2 = table[row + at.VECTOR + 3 + k];
      const c3 = table[row + at.VECTOR + 6 + k];
      r[k] = ((c3 * t + c2) * t + c1) * t;
      r1[k] = ((3 * c3 * t + 2 * c2) * t + c1) * perFrame;
      r2[k] = (6 * c3 * t + 2 * c2) * perFrame * perFrame;
    }
    bodyRates(this.#rate, this.#acceleration, r, r1, r2);
  }

  /** See the class: from s's rates and y, and from the channels of yaw and roll about it, which are in `unit`s of a radian. */
  #compose(out: Float64Array, unit: number): void {
    const w = this.#rate;
    const a = this.#acceleration;
    const u = this.#up;
    const yaw1 = this.#yaw[1] * unit;
    const yaw2 = this.#yaw[2] * unit;
    const roll = this.#roll[0] * unit;
    const roll1 = this.#roll[1] * unit;
    const px = w[0] - yaw1 * u[0];
    const py = w[1] - yaw1 * u[1];
    const bx = a[0] - yaw2 * u[0] + yaw1 * (w[1] * u[2] - w[2] * u[1]);
    const by = a[1] - yaw2 * u[1] + yaw1 * (w[2] * u[0] - w[0] * u[2]);
    const bz = a[2] - yaw2 * u[2] + yaw1 * (w[0] * u[1] - w[1] * u[0]);
    const c = Math.cos(roll);
    const s = Math.sin(roll);
    const x = c * px - s * py;
    const y = s * px + c * py;
    out[0] = x;
    out[1] = y;
    out[2] = w[2] - yaw1 * u[2] - roll1;
    out[3] = c * bx - s * by - roll1 * y;
    out[4] = s * bx + c * by + roll1 * x;
    out[5] = bz - this.#roll[2] * unit;
  }

  /** ζ′ into its place; 0 where the field of view is held at a limit. */
  #zoomRate(out: Float64Array, table: Readonly<Float64Array>, row: number): void {
    const zoom = this.#zoom;
    this.#channel(zoom, table, row + at.ZOOM);
    out[6] = zoom[1];
    if (zoom[0] > ZOOM_MIN && zoom[0] < ZOOM_ALWAYS_DRAWN) return;
    const fov = fovFromZoom(zoom[0]);
    const eye = Math.min(Math.max(at.cubic(table, row + at.EYE, this.#progress[0]), 0), 1);
    if (fov < FOV_MIN_RAD - LIMIT_SLACK || fov > maxFovRad(eye) + LIMIT_SLACK) out[6] = 0;
  }
}

/** Between these no eye point's limits hold a zoom. */
const ZOOM_MIN = zoomFromFov(FOV_MIN_RAD);
const ZOOM_ALWAYS_DRAWN = zoomFromFov(FOV_ALWAYS_DRAWN_RAD);

/** A key may stand at its limit itself: rounding must not count as beyond it. */
const LIMIT_SLACK = 1e-9;
