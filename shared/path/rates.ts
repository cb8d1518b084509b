import { RAD_PER_DEG } from '#shared/conventions';
import { FOV_MIN_RAD, fovFromZoom, maxFovRad } from '#shared/projection/field-of-view';
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

/**
 * Rates of a compiled move, from the path's own derivatives, never from differences of poses.
 *
 * Level and arc legs alike are `Ry(−w) · s · Rz(−v)`: for level legs s = Rx(pitch), w the yaw and v the roll; for arcs s is
 * the rotation between the keys and w, v the whole turns. With s's own rate and acceleration in the body,
 *
 *     ω₁ = ω_s − ẇ y,  α₁ = α_s − ẅ y + ẇ ω_s × y,  y = sᵀ ŷ,
 *     ω = Rz(v) ω₁ − v̇ ẑ,  α = Rz(v) α₁ + v̇ ẑ × (Rz(v) ω₁) − v̈ ẑ.
 *
 * One of them serves one thread; it allocates when made and never again.
 */
export class Rates {
  readonly #move: CompiledMove;
  readonly #slopes = new Float64Array(2);
  readonly #quat = new Float64Array(4);
  readonly #r = new Float64Array(3);
  readonly #r1 = new Float64Array(3);
  readonly #r2 = new Float64Array(3);
  readonly #rate = new Float64Array(3);
  readonly #acceleration = new Float64Array(3);
  /** Progress s along the leg and its first and second derivative a source frame. */
  #s = 0;
  #s1 = 0;
  #s2 = 0;

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
    return this.onLeg(out, Math.min(move.legAt(frame), move.lastKey - 1), frame);
  }

  /** Rates at a frame of a leg, its ends included: the side of a key that the leg is on. */
  onLeg(out: Float64Array, leg: number, frame: number): Float64Array {
    const { table, flags, sorts } = this.#move;
    const row = leg * at.ROW;
    this.#readProgress(leg, row, frame);
    const sort = sorts[leg];
    if (sort === at.LEVEL) this.#level(out, table, row);
    else this.#arc(out, table, row, sort, flags[leg]);
    out[6] = this.#zoomRate(table, row, flags[leg]);
    return out;
  }

  #readProgress(leg: number, row: number, frame: number): void {
    const { table, flags } = this.#move;
    const perFrame = table[row + at.PER_FRAME];
    const t = Math.min(Math.max((frame - table[row + at.FRAME]) * perFrame, 0), 1);
    if ((flags[leg] & at.CURVED_EASE) === 0) {
      this.#s = t;
      this.#s1 = perFrame;
      this.#s2 = 0;
      return;
    }
    const p = t === 0 || t === 1 ? t : bezierParameter(table, row + at.EASE, t);
    bezierSlopes(this.#slopes, table, row + at.EASE, p);
    this.#s = t === 0 || t === 1 ? t : bezierHeight(table, row + at.EASE, p);
    this.#s1 = this.#slopes[0] * perFrame;
    this.#s2 = this.#slopes[1] * perFrame * perFrame;
  }

  #level(out: Float64Array, table: Readonly<Float64Array>, row: number): void {
    const pitch = at.cubic(table, row + at.PITCH, this.#s) * RAD_PER_DEG;
    this.#compose(
      out,
      this.#first(table, row + at.PITCH) * RAD_PER_DEG,
      0,
      0,
      this.#second(table, row + at.PITCH) * RAD_PER_DEG,
      0,
      0,
      0,
      Math.cos(pitch),
      -Math.sin(pitch),
      this.#first(table, row + at.YAW) * RAD_PER_DEG,
      this.#second(table, row + at.YAW) * RAD_PER_DEG,
      at.cubic(table, row + at.ROLL, this.#s) * RAD_PER_DEG,
      this.#first(table, row + at.ROLL) * RAD_PER_DEG,
      this.#second(table, row + at.ROLL) * RAD_PER_DEG,
    );
  }

  #arc(out: Float64Array, table: Readonly<Float64Array>, row: number, sort: number, flags: number): void {
    if (sort === at.ARC) this.#slerpRates(table, row);
    else this.#splineRates(table, row);
    const w = this.#rate;
    const a = this.#acceleration;
    if ((flags & at.TURNS) === 0) {
      for (let k = 0; k < 3; k++) {
        out[k] = w[k];
        out[3 + k] = a[k];
      }
      return;
    }
    orientationOnLeg(this.#quat, table, row, sort, flags & ~at.TURNS, this.#s);
    const x = this.#quat[0];
    const y = this.#quat[1];
    const z = this.#quat[2];
    const q = this.#quat[3];
    const eased = sort === at.ARC;
    // The table holds half the turns' angles; eased arcs hold the whole leg's turns, fair ones a cubic.
    const yaw1 =
      2 * (eased ? table[row + at.YAW_HALF_TURNS] * this.#s1 : this.#first(table, row + at.YAW_TURN_CUBIC));
    const yaw2 =
      2 * (eased ? table[row + at.YAW_HALF_TURNS] * this.#s2 : this.#second(table, row + at.YAW_TURN_CUBIC));
    const roll =
      2 *
      (eased
        ? table[row + at.ROLL_HALF_TURNS] * this.#s
        : at.cubic(table, row + at.ROLL_TURN_CUBIC, this.#s));
    const roll1 =
      2 * (eased ? table[row + at.ROLL_HALF_TURNS] * this.#s1 : this.#first(table, row + at.ROLL_TURN_CUBIC));
    const roll2 =
      2 *
      (eased ? table[row + at.ROLL_HALF_TURNS] * this.#s2 : this.#second(table, row + at.ROLL_TURN_CUBIC));
    const [wx, wy, wz] = [w[0], w[1], w[2]];
    const [ax, ay, az] = [a[0], a[1], a[2]];
    const [ux, uy, uz] = [2 * (x * y + q * z), 1 - 2 * (x * x + z * z), 2 * (y * z - q * x)];
    this.#compose(out, wx, wy, wz, ax, ay, az, ux, uy, uz, yaw1, yaw2, roll, roll1, roll2);
  }

  /** Along a slerp the axis stands and the angle runs with the ease. */
  #slerpRates(table: Readonly<Float64Array>, row: number): void {
    const angle = 2 * table[row + at.HALF_ANGLE];
    for (let k = 0; k < 3; k++) {
      this.#rate[k] = table[row + at.AXIS + k] * angle * this.#s1;
      this.#acceleration[k] = table[row + at.AXIS + k] * angle * this.#s2;
    }
  }

  #splineRates(table: Readonly<Float64Array>, row: number): void {
    const t = this.#s;
    const perFrame = this.#s1;
    for (let k = 0; k < 3; k++) {
      const c1 = table[row + at.VECTOR + k];
      const c2 = table[row + at.VECTOR + 3 + k];
      const c3 = table[row + at.VECTOR + 6 + k];
      this.#r[k] = ((c3 * t + c2) * t + c1) * t;
      this.#r1[k] = ((3 * c3 * t + 2 * c2) * t + c1) * perFrame;
      this.#r2[k] = (6 * c3 * t + 2 * c2) * perFrame * perFrame;
    }
    bodyRates(this.#rate, this.#acceleration, this.#r, this.#r1, this.#r2);
  }

  /** See the class: w…, a… of s; u… = sᵀ ŷ; derivatives of yaw and roll about it. */
  #compose(
    out: Float64Array,
    wx: number,
    wy: number,
    wz: number,
    ax: number,
    ay: number,
    az: number,
    ux: number,
    uy: number,
    uz: number,
    yaw1: number,
    yaw2: number,
    roll: number,
    roll1: number,
    roll2: number,
  ): void {
    const px = wx - yaw1 * ux;
    const py = wy - yaw1 * uy;
    const pz = wz - yaw1 * uz;
    const bx = ax - yaw2 * ux + yaw1 * (wy * uz - wz * uy);
    const by = ay - yaw2 * uy + yaw1 * (wz * ux - wx * uz);
    const bz = az - yaw2 * uz + yaw1 * (wx * uy - wy * ux);
    const c = Math.cos(roll);
    const s = Math.sin(roll);
    const x = c * px - s * py;
    const y = s * px + c * py;
    out[0] = x;
    out[1] = y;
    out[2] = pz - roll1;
    out[3] = c * bx - s * by - roll1 * y;
    out[4] = s * bx + c * by + roll1 * x;
    out[5] = bz - roll2;
  }

  /** ζ′; 0 where the field of view is held at a limit. */
  #zoomRate(table: Readonly<Float64Array>, row: number, flags: number): number {
    if ((flags & at.ZOOMS) === 0) return 0;
    const fov = fovFromZoom(at.cubic(table, row + at.ZOOM, this.#s));
    const eye = Math.min(Math.max(at.cubic(table, row + at.EYE, this.#s), 0), 1);
    const held = fov < FOV_MIN_RAD - LIMIT_SLACK || fov > maxFovRad(eye) + LIMIT_SLACK;
    return held ? 0 : this.#first(table, row + at.ZOOM);
  }

  /** First derivative of a cubic, a source frame. */
  #first(table: Readonly<Float64Array>, place: number): number {
    return at.cubicSlope(table, place, this.#s) * this.#s1;
  }

  #second(table: Readonly<Float64Array>, place: number): number {
    const bend = at.cubicBend(table, place, this.#s);
    const slope = at.cubicSlope(table, place, this.#s);
    return bend * this.#s1 * this.#s1 + slope * this.#s2;
  }
}

/** A key may stand at its limit itself: rounding must not count as beyond it. */
const LIMIT_SLACK = 1e-9;
