/**
 * Fields of view of even zooms, `4 atan(e^ζ)`, from a table of short polynomials: half the time of an exponential and an
 * arc tangent, for what is done for every frame.
 *
 * With G = 4 atan(e^ζ), G′ = 2 sech ζ; with S = sech and T = tanh, S′ = −S T and T′ = S², which gives all coefficients of
 * G about any ζ. Its poles lie π/2 away, so over a 1/64 to either side eight coefficients leave less than 1e-16.
 */

/** Numbers a step: coefficients of powers of the way from its middle, in ζ. */
export const COEFFICIENTS = 8;
export const STEPS_PER_UNIT = 32;

/** The table goes from −REACH to REACH: ζ of 0.3° and of 359.7°, beyond all fields of view that there are. */
export const REACH = 6;

/** @returns the table, one row of coefficients a step */
export function zoomTable(): Float64Array {
  // One more, as the last ζ below REACH may be rounded up to it.
  const steps = 2 * REACH * STEPS_PER_UNIT + 1;
  const all = new Float64Array(steps * COEFFICIENTS);
  for (let step = 0; step < steps; step++)
    all.set(coefficientsAbout((step + 0.5) / STEPS_PER_UNIT - REACH), step * COEFFICIENTS);
  return all;
}

/** Taylor's coefficients of G about ζ. */
function coefficientsAbout(zoom: number): number[] {
  const sech = [1 / Math.cosh(zoom)];
  const tanh = [Math.tanh(zoom)];
  for (let n = 0; n < COEFFICIENTS - 2; n++) {
    sech.push(-convolved(sech, tanh, n) / (n + 1));
    tanh.push(convolved(sech, sech, n) / (n + 1));
  }
  return [4 * Math.atan(Math.exp(zoom)), ...sech.map((value, n) => (2 * value) / (n + 1))];
}

/** Coefficient n of the product of two series. */
function convolved(a: readonly number[], b: readonly number[], n: number): number {
  let sum = 0;
  for (let k = 0; k <= n; k++) sum += a[k] * b[n - k];
  return sum;
}
