/**
 * Smooth functions as short polynomials of x in −1…1, through their values at eight Chebyshev points: what costs an
 * exponential or an equation to compute is then a few multiplications.
 */

/** Numbers that a polynomial takes. */
export const TERMS = 8;

/** Where the function's values are wanted, x in −1…1. */
export const POINTS = Array.from({ length: TERMS }, (_, i) =>
  Math.cos((Math.PI * (2 * i + 1)) / (2 * TERMS)),
);

/** The matrix from values at POINTS to coefficients of powers of x, row by row. */
const FIT = inverseVandermonde(POINTS);

/**
 * @param out receives TERMS coefficients from `place` on
 * @param values at POINTS
 * @returns the last coefficient's size. Where it is small, what is left out is smaller still, by about as much as it is
 *   smaller than those before it
 */
export function writeSeries(out: Float64Array, place: number, values: Readonly<Float64Array>): number {
  for (let power = 0; power < TERMS; power++) {
    let sum = 0;
    for (let i = 0; i < TERMS; i++) sum += FIT[power * TERMS + i] * values[i];
    out[place + power] = sum;
  }
  return Math.abs(out[place + TERMS - 1]);
}

/** Coefficients of Lagrange's polynomials, which are 1 at one point and 0 at the others. */
function inverseVandermonde(points: readonly number[]): Float64Array {
  const inverse = new Float64Array(points.length * points.length);
  points.forEach((point, i) => {
    let polynomial = [1];
    for (const other of points.filter(each => each !== point)) {
      const scale = 1 / (point - other);
      const shifted = [0, ...polynomial];
      polynomial = shifted.map((coefficient, k) => scale * (coefficient - other * (polynomial[k] ?? 0)));
    }
    polynomial.forEach((coefficient, power) => (inverse[power * points.length + i] = coefficient));
  });
  return inverse;
}
