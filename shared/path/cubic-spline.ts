/**
 * Slopes at the knots of the cubic spline through given points with given slopes at its ends ("clamped"): twice
 * continuously differentiable.
 *
 * @param times rising, n ≥ 2
 * @param values n of them
 * @param firstSlope, lastSlope dv/dt at the ends
 * @returns n slopes
 * @see C. de Boor, "A Practical Guide to Splines", 1978, chapter IV: the tridiagonal system for slopes, solved without
 *   pivoting since it is diagonally dominant
 */
export function clampedSplineSlopes(
  times: readonly number[],
  values: readonly number[],
  firstSlope: number,
  lastSlope: number,
): Float64Array {
  const n = times.length;
  const slopes = new Float64Array(n);
  slopes[0] = firstSlope;
  slopes[n - 1] = lastSlope;
  const upper = new Float64Array(n);
  for (let i = 1; i < n - 1; i++) {
    const before = 1 / (times[i] - times[i - 1]);
    const after = 1 / (times[i + 1] - times[i]);
    const right =
      3 * ((values[i] - values[i - 1]) * before * before + (values[i + 1] - values[i]) * after * after);
    const pivot = 2 * (before + after) - before * upper[i - 1];
    upper[i] = after / pivot;
    slopes[i] = (right - before * slopes[i - 1]) / pivot;
  }
  for (let i = n - 2; i > 0; i--) slopes[i] -= upper[i] * slopes[i + 1];
  return slopes;
}

/**
 * Writes the cubic that goes from v0 to v1 with the given slopes as coefficients of τ = 0…1: `((c₃τ + c₂)τ + c₁)τ + c₀`.
 *
 * @param out receives c₀…c₃ from `at` on
 * @param duration of the leg, in the unit of time of the slopes
 */
export function writeCubic(
  out: Float64Array,
  at: number,
  v0: number,
  v1: number,
  slope0: number,
  slope1: number,
  duration: number,
): void {
  const d0 = slope0 * duration;
  const d1 = slope1 * duration;
  const step = v1 - v0;
  out[at] = v0;
  out[at + 1] = d0;
  out[at + 2] = 3 * step - 2 * d0 - d1;
  out[at + 3] = d0 + d1 - 2 * step;
}
