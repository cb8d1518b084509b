/**
 * Solves a block-tridiagonal system of 3 × 3 blocks in place, by block elimination without pivoting between blocks:
 * meant for Newton steps, whose caller judges the result by its residual and survives a bad one.
 *
 * @param lower, middle, upper blocks row by row, 9 numbers each (row major); lower[0] and upper[n − 1] are not read;
 *   middle and upper are overwritten
 * @param right 3 numbers a row; becomes the solution. Not finite where a pivot block is singular
 */
export function solveBlockTridiagonal(
  lower: Readonly<Float64Array>,
  middle: Float64Array,
  upper: Float64Array,
  right: Float64Array,
): void {
  const rows = right.length / 3;
  for (let i = 0; i < rows; i++) {
    if (i > 0) eliminate(lower, middle, upper, right, i);
    invert3(middle, 9 * i);
    if (i < rows - 1) multiplyBlock(middle, upper, 9 * i);
    multiplyVector(middle, 9 * i, right, 3 * i);
  }
  for (let i = rows - 2; i >= 0; i--) subtractProduct(right, 3 * i, upper, 9 * i, right, 3 * i + 3);
}

/** Row i minus lower(i) times row i − 1, whose middle block is the identity by now. */
function eliminate(
  lower: Readonly<Float64Array>,
  middle: Float64Array,
  upper: Readonly<Float64Array>,
  right: Float64Array,
  i: number,
): void {
  const at = 9 * i;
  for (let row = 0; row < 3; row++) {
    for (let column = 0; column < 3; column++) {
      let sum = 0;
      for (let k = 0; k < 3; k++) sum += lower[at + 3 * row + k] * upper[at - 9 + 3 * k + column];
      middle[at + 3 * row + column] -= sum;
    }
  }
  subtractProduct(right, 3 * i, lower, at, right, 3 * i - 3);
}

/** out[to…] −= block · vector[from…] */
function subtractProduct(
  out: Float64Array,
  to: number,
  block: Readonly<Float64Array>,
  at: number,
  vector: Readonly<Float64Array>,
  from: number,
): void {
  const x = vector[from];
  const y = vector[from + 1];
  const z = vector[from + 2];
  for (let row = 0; row < 3; row++) {
    out[to + row] -= block[at + 3 * row] * x + block[at + 3 * row + 1] * y + block[at + 3 * row + 2] * z;
  }
}

function multiplyVector(block: Readonly<Float64Array>, at: number, vector: Float64Array, to: number): void {
  const x = vector[to];
  const y = vector[to + 1];
  const z = vector[to + 2];
  for (let row = 0; row < 3; row++) {
    vector[to + row] = block[at + 3 * row] * x + block[at + 3 * row + 1] * y + block[at + 3 * row + 2] * z;
  }
}

/** other[at…] = block[at…] · other[at…] */
function multiplyBlock(block: Readonly<Float64Array>, other: Float64Array, at: number): void {
  for (let column = 0; column < 3; column++) {
    const x = other[at + column];
    const y = other[at + 3 + column];
    const z = other[at + 6 + column];
    for (let row = 0; row < 3; row++) {
      other[at + 3 * row + column] =
        block[at + 3 * row] * x + block[at + 3 * row + 1] * y + block[at + 3 * row + 2] * z;
    }
  }
}

/** Inverts a 3 × 3 block in place by its adjugate. */
function invert3(m: Float64Array, at: number): void {
  const a = m[at];
  const b = m[at + 1];
  const c = m[at + 2];
  const d = m[at + 3];
  const e = m[at + 4];
  const f = m[at + 5];
  const g = m[at + 6];
  const h = m[at + 7];
  const i = m[at + 8];
  const k = 1 / (a * (e * i - f * h) - b * (d * i - f * g) + c * (d * h - e * g));
  m[at] = (e * i - f * h) * k;
  m[at + 1] = (c * h - b * i) * k;
  m[at + 2] = (b * f - c * e) * k;
  m[at + 3] = (f * g - d * i) * k;
  m[at + 4] = (a * i - c * g) * k;
  m[at + 5] = (c * d - a * f) * k;
  m[at + 6] = (d * h - e * g) * k;
  m[at + 7] = (b * g - a * h) * k;
  m[at + 8] = (a * e - b * d) * k;
}
