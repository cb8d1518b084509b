import { inverseRateCoefficient, rateCoefficients } from '#shared/rotation/rotation-vector';
import { solveBlockTridiagonal } from './block-tridiagonal';

/**
 * A rotation spline with continuous angular rate and acceleration.
 *
 * Along leg i the orientation is `qᵢ · exp(r(t))`, r a cubic in time from 0 to the leg's rotation vector rvᵢ, fixed by
 * the angular rates ωᵢ and ωᵢ₊₁ (in the camera's own axes) at its ends: ṙ = ωᵢ at the start, where J = I, and
 * ṙ = J(rvᵢ)⁻¹ ωᵢ₊₁ at the end. The rates at the inner keys are the unknowns; asking that the acceleration at the end
 * of a leg,
 *
 *     J(rv) r̈(dt) + N(rv, ṙ(dt)),   r̈(dt) = −6 rv/dt² + 2 ω/dt + 4 ṙ(dt)/dt,
 *
 * equals that at the start of the next, r̈(0) = 6 rv/dt² − 4 ω/dt − 2 ṙ(dt)/dt, gives three equations a key, which
 * couple neighbours only. Newton's method with the exact derivative solves them, each step halved until the mismatch
 * shrinks; time is counted in mean legs.
 *
 * @see the construction is that of SciPy's `RotationSpline` (scipy.spatial.transform, after V. Kravets), which stops
 *   after ten rounds of a simpler iteration; this goes on until it has settled
 */
export interface RotationSpline {
  /** ω at each key, radians per unit of the given durations, 3 numbers each, in the camera's own axes. */
  readonly rates: Float64Array;
  /** True where Newton did not settle: the rate is continuous, the acceleration is not. */
  readonly fellBack: boolean;
}

/** The largest mismatch of acceleration that counts as none, as a share of the largest leg's angle / dt². */
const SETTLED = 1e-10;
const MOST_ROUNDS = 60;
const MOST_HALVINGS = 24;

/**
 * @param durations of the legs, n of them, over 0
 * @param rotationVectors of the legs, 3 numbers each, of angle ≤ π
 * @param restAtStart, restAtEnd whether the end rate is zero; else it is the end leg's average
 */
export function solveRotationSpline(
  durations: readonly number[],
  rotationVectors: Readonly<Float64Array>,
  restAtStart: boolean,
  restAtEnd: boolean,
): RotationSpline {
  const legs = durations.length;
  const unit = durations.reduce((sum, duration) => sum + duration, 0) / legs;
  const system = new SplineSystem(
    Float64Array.from(durations, duration => duration / unit),
    rotationVectors,
  );
  const rates = system.averageRates();
  if (restAtStart) rates.fill(0, 0, 3);
  if (restAtEnd) rates.fill(0, 3 * legs);
  const settled = legs === 1 || newton(system, rates);
  if (!settled) system.fallBack(rates);
  return { rates: rates.map(rate => rate / unit), fellBack: !settled };
}

/** Improves the inner rates until the mismatch has settled; leaves them anyhow when it does not. */
function newton(system: SplineSystem, rates: Float64Array): boolean {
  const enough = SETTLED * system.largestAcceleration();
  let mismatch = system.mismatch(rates);
  const trial = new Float64Array(rates.length);
  for (let round = 0; round < MOST_ROUNDS; round++) {
    if (mismatch <= enough) return true;
    const step = system.newtonStep(rates);
    const before = mismatch;
    for (let halving = 0, share = 1; halving < MOST_HALVINGS; halving++, share /= 2) {
      trial.set(rates);
      for (let k = 0; k < step.length; k++) trial[k + 3] -= share * step[k];
      mismatch = system.mismatch(trial);
      if (mismatch < before) break;
    }
    // NaN compares false, so a singular step ends here too.
    if (!(mismatch < before)) return before <= enough;
    rates.set(trial);
  }
  return mismatch <= enough;
}

/** The equations of one spline: mismatch of acceleration at the inner keys, and its derivative. */
class SplineSystem {
  readonly #durations: Float64Array;
  readonly #rv: Readonly<Float64Array>;
  /** Per leg: a, b, a′/θ, b′/θ and c of shared/rotation/rotation-vector.ts. */
  readonly #coefficients: Float64Array;
  readonly #residual: Float64Array;
  readonly #lower: Float64Array;
  readonly #middle: Float64Array;
  readonly #upper: Float64Array;
  readonly #dot = new Float64Array(3);
  readonly #cross = new Float64Array(3);

  constructor(durations: Float64Array, rotationVectors: Readonly<Float64Array>) {
    this.#durations = durations;
    this.#rv = rotationVectors;
    const legs = durations.length;
    this.#coefficients = new Float64Array(5 * legs);
    for (let leg = 0; leg < legs; leg++) {
      const squared = this.#squaredAngle(leg);
      rateCoefficients(this.#coefficients.subarray(5 * leg, 5 * leg + 4), squared);
      this.#coefficients[5 * leg + 4] = inverseRateCoefficient(squared);
    }
    const inner = legs - 1;
    this.#residual = new Float64Array(3 * inner);
    this.#lower = new Float64Array(9 * inner);
    this.#middle = new Float64Array(9 * inner);
    this.#upper = new Float64Array(9 * inner);
  }

  /** Each leg's average rate, at the key that ends it; the first key takes the first leg's. */
  averageRates(): Float64Array {
    const rates = new Float64Array(this.#rv.length + 3);
    this.#durations.forEach((duration, leg) => {
      for (let k = 0; k < 3; k++) rates[3 * leg + 3 + k] = this.#rv[3 * leg + k] / duration;
    });
    rates.copyWithin(0, 3, 6);
    return rates;
  }

  /** Rates that are continuous and always exist: at an inner key the average over both its legs. */
  fallBack(rates: Float64Array): void {
    for (let key = 1; key < this.#durations.length; key++) {
      const time = this.#durations[key - 1] + this.#durations[key];
      for (let k = 0; k < 3; k++) {
        rates[3 * key + k] = (this.#rv[3 * key - 3 + k] + this.#rv[3 * key + k]) / time;
      }
    }
  }

  largestAcceleration(): number {
    return this.#durations.reduce(
      (most, duration, leg) => Math.max(most, Math.sqrt(this.#squaredAngle(leg)) / duration ** 2),
      0,
    );
  }

  /** @returns the largest component of the mismatch; NaN where any is not a number */
  mismatch(rates: Readonly<Float64Array>): number {
    const inner = this.#durations.length - 1;
    this.#residual.fill(0);
    for (let leg = 0; leg <= inner; leg++) {
      if (leg > 0) this.#subtractStart(rates, leg);
      if (leg < inner) this.#addEnd(rates, leg);
    }
    let most = 0;
    for (const part of this.#residual) {
      if (Number.isNaN(part)) return NaN;
      most = Math.max(most, Math.abs(part));
    }
    return most;
  }

  /** @returns the step to subtract from the inner rates, 3 numbers each; the residual must be that of `rates` */
  newtonStep(rates: Readonly<Float64Array>): Float64Array {
    this.mismatch(rates);
    const inner = this.#durations.length - 1;
    this.#middle.fill(0);
    for (let leg = 0; leg <= inner; leg++) this.#writeDerivative(rates, leg, inner);
    const step = Float64Array.from(this.#residual);
    solveBlockTridiagonal(this.#lower, this.#middle, this.#upper, step);
    return step;
  }

  #squaredAngle(leg: number): number {
    const rv = this.#rv;
    return rv[3 * leg] ** 2 + rv[3 * leg + 1] ** 2 + rv[3 * leg + 2] ** 2;
  }

  /** ṙ at a leg's end, J(rv)⁻¹ ω, into #dot. */
  #endDot(rates: Readonly<Float64Array>, leg: number): void {
    const at = 3 * leg;
    const c = this.#coefficients[5 * leg + 4];
    const x = this.#rv[at];
    const y = this.#rv[at + 1];
    const z = this.#rv[at + 2];
    const wx = rates[at + 3];
    const wy = rates[at + 4];
    const wz = rates[at + 5];
    const px = y * wz - z * wy;
    const py = z * wx - x * wz;
    const pz = x * wy - y * wx;
    this.#dot[0] = wx + 0.5 * px + c * (y * pz - z * py);
    this.#dot[1] = wy + 0.5 * py + c * (z * px - x * pz);
    this.#dot[2] = wz + 0.5 * pz + c * (x * py - y * px);
  }

  /** residual(key leg) −= r̈(0) */
  #subtractStart(rates: Readonly<Float64Array>, leg: number): void {
    this.#endDot(rates, leg);
    const dt = this.#durations[leg];
    for (let k = 0; k < 3; k++) {
      this.#residual[3 * leg - 3 + k] -=
        (6 * this.#rv[3 * leg + k]) / (dt * dt) - (4 * rates[3 * leg + k] + 2 * this.#dot[k]) / dt;
    }
  }

  /** residual(key leg + 1) += J(rv) r̈(dt) + N(rv, ṙ(dt)) */
  #addEnd(rates: Readonly<Float64Array>, leg: number): void {
    this.#endDot(rates, leg);
    const at = 3 * leg;
    const dt = this.#durations[leg];
    const a = this.#coefficients[5 * leg];
    const b = this.#coefficients[5 * leg + 1];
    const a1 = this.#coefficients[5 * leg + 2];
    const b1 = this.#coefficients[5 * leg + 3];
    const x = this.#rv[at];
    const y = this.#rv[at + 1];
    const z = this.#rv[at + 2];
    const ux = this.#dot[0];
    const uy = this.#dot[1];
    const uz = this.#dot[2];
    const sx = (2 * rates[at] + 4 * ux) / dt - (6 * x) / (dt * dt);
    const sy = (2 * rates[at + 1] + 4 * uy) / dt - (6 * y) / (dt * dt);
    const sz = (2 * rates[at + 2] + 4 * uz) / dt - (6 * z) / (dt * dt);
    const along = x * ux + y * uy + z * uz;
    const px = y * uz - z * uy;
    const py = z * ux - x * uz;
    const pz = x * uy - y * ux;
    const qx = y * sz - z * sy;
    const qy = z * sx - x * sz;
    const qz = x * sy - y * sx;
    const turn = -a1 * along;
    const twist = b1 * along;
    const out = this.#residual;
    out[at] +=
      sx - a * qx + b * (y * qz - z * qy) + turn * px + twist * (y * pz - z * py) + b * (uy * pz - uz * py);
    out[at + 1] +=
      sy - a * qy + b * (z * qx - x * qz) + turn * py + twist * (z * px - x * pz) + b * (uz * px - ux * pz);
    out[at + 2] +=
      sz - a * qz + b * (x * qy - y * qx) + turn * pz + twist * (x * py - y * px) + b * (ux * py - uy * px);
  }

  /** A leg's share of the blocks: of the key at its start (row leg − 1) and of the key at its end (row leg). */
  #writeDerivative(rates: Readonly<Float64Array>, leg: number, inner: number): void {
    const dt = this.#durations[leg];
    this.#endDot(rates, leg);
    for (let column = 0; column < 3; column++) {
      if (leg > 0) this.#middle[9 * (leg - 1) + 4 * column] += 4 / dt;
      if (leg < inner) this.#middle[9 * leg + 4 * column] += 4 / dt;
      this.#inverseColumn(leg, column);
      for (let row = 0; row < 3; row++) {
        if (leg > 0) this.#upper[9 * (leg - 1) + 3 * row + column] = (2 / dt) * this.#cross[row];
      }
      if (leg < inner) {
        this.#addNonlinearColumn(leg, column);
        this.#writeRateColumn(leg, column, 2 / dt);
      }
    }
  }

  /** A column of J(rv)⁻¹ into #cross. */
  #inverseColumn(leg: number, column: number): void {
    this.#matrixColumn(leg, column, 0.5, this.#coefficients[5 * leg + 4]);
  }

  /** lower(row leg), column = factor · J(rv) column. */
  #writeRateColumn(leg: number, column: number, factor: number): void {
    this.#matrixColumn(leg, column, -this.#coefficients[5 * leg], this.#coefficients[5 * leg + 1]);
    for (let row = 0; row < 3; row++) this.#lower[9 * leg + 3 * row + column] = factor * this.#cross[row];
  }

  /** A column of I + s [rv]× + t [rv]×² into #cross. */
  #matrixColumn(leg: number, column: number, s: number, t: number): void {
    const x = this.#rv[3 * leg];
    const y = this.#rv[3 * leg + 1];
    const z = this.#rv[3 * leg + 2];
    const ex = column === 0 ? 1 : 0;
    const ey = column === 1 ? 1 : 0;
    const ez = column === 2 ? 1 : 0;
    const px = y * ez - z * ey;
    const py = z * ex - x * ez;
    const pz = x * ey - y * ex;
    this.#cross[0] = ex + s * px + t * (y * pz - z * py);
    this.#cross[1] = ey + s * py + t * (z * px - x * pz);
    this.#cross[2] = ez + s * pz + t * (x * py - y * px);
  }

  /**
   * Adds the derivative of N(rv, ṙ(dt)) by one component of ω to the middle block: with δ the matching column of J⁻¹
   * (in #cross), δN = −a′(δg p + g δp) + b′(δg t + g δt) + b(δ × p + ṙ × δp), g = rv·ṙ, p = rv × ṙ, t = rv × p.
   */
  #addNonlinearColumn(leg: number, column: number): void {
    const b = this.#coefficients[5 * leg + 1];
    const a1 = this.#coefficients[5 * leg + 2];
    const b1 = this.#coefficients[5 * leg + 3];
    const x = this.#rv[3 * leg];
    const y = this.#rv[3 * leg + 1];
    const z = this.#rv[3 * leg + 2];
    const [ux, uy, uz] = [this.#dot[0], this.#dot[1], this.#dot[2]];
    const [dx, dy, dz] = [this.#cross[0], this.#cross[1], this.#cross[2]];
    const g = x * ux + y * uy + z * uz;
    const px = y * uz - z * uy;
    const py = z * ux - x * uz;
    const pz = x * uy - y * ux;
    const dg = x * dx + y * dy + z * dz;
    const ex = y * dz - z * dy;
    const ey = z * dx - x * dz;
    const ez = x * dy - y * dx;
    const m = this.#middle;
    const at = 9 * leg + column;
    m[at] +=
      b1 * (dg * (y * pz - z * py) + g * (y * ez - z * ey)) -
      a1 * (dg * px + g * ex) +
      b * (dy * pz - dz * py + uy * ez - uz * ey);
    m[at + 3] +=
      b1 * (dg * (z * px - x * pz) + g * (z * ex - x * ez)) -
      a1 * (dg * py + g * ey) +
      b * (dz * px - dx * pz + uz * ex - ux * ez);
    m[at + 6] +=
      b1 * (dg * (x * py - y * px) + g * (x * ey - y * ex)) -
      a1 * (dg * pz + g * ez) +
      b * (dx * py - dy * px + ux * ey - uy * ex);
  }
}
