import { type Ease } from '#schemas/move';

/**
 * A cubic Bézier ease from (0, 0) to (1, 1) as coefficients of its two polynomials,
 * `x(p) = ((ax p + bx) p + cx) p` and likewise y: [ax, bx, cx, ay, by, cy].
 *
 * @see CSS Easing Functions Level 1, 2.3
 */
export type BezierCoefficients = readonly [number, number, number, number, number, number];

type Handles = readonly [number, number, number, number];

/** @see CSS Easing Functions Level 1, 2.3.1: the keywords' handles */
const KEYWORDS: Readonly<Record<string, Handles>> = {
  ease: [0.25, 0.1, 0.25, 1],
  'ease-in': [0.42, 0, 1, 1],
  'ease-out': [0, 0, 0.58, 1],
  'ease-in-out': [0.42, 0, 0.58, 1],
};

/** @returns the handles of a curved ease; undefined for fair, linear and hold */
export function bezierHandles(ease: Ease): Handles | undefined {
  return typeof ease === 'object' ? ease.bezier : KEYWORDS[ease];
}

export function bezierCoefficients([x1, y1, x2, y2]: Handles): BezierCoefficients {
  return [1 + 3 * (x1 - x2), 3 * (x2 - 2 * x1), 3 * x1, 1 + 3 * (y1 - y2), 3 * (y2 - 2 * y1), 3 * y1];
}

/**
 * Numbers that {@link writeEase} writes: the six coefficients, and three of a parabola h with
 * `p(t) ≈ t + t (1 − t) h(t)`, which is where the search for p begins.
 */
export const EASE_SIZE = 9;

const GUESS = 6;

/** Writes what {@link bezierParameter} and the others read, from `at` on. */
export function writeEase(table: Float64Array, at: number, handles: Handles): void {
  table.set(bezierCoefficients(handles), at);
  const bow = (t: number) => (bracketed(table, at, t) - t) / (t * (1 - t));
  const [early, middle, late] = [bow(0.25), bow(0.5), bow(0.75)];
  table[at + GUESS] = middle;
  table[at + GUESS + 1] = (late - early) / 2;
  table[at + GUESS + 2] = (early + late) / 2 - middle;
}

/** Halley's steps converge cubically: after one as small as this, nothing is left at slopes above STEEP_ENOUGH. */
const SETTLED = 1e-5;
const STEEP_ENOUGH = 0.05;

/**
 * The parameter p at which x(p) = t: two of Halley's steps from the guess, which settle all but the flattest stretches of
 * the steepest curves.
 *
 * @param table, at as written by {@link writeEase}
 * @param t in 0…1
 */
export function bezierParameter(table: Readonly<Float64Array>, at: number, t: number): number {
  const ax = table[at];
  const bx = table[at + 1];
  const cx = table[at + 2];
  const u = 4 * t - 2;
  let p = t + t * (1 - t) * (table[at + GUESS] + u * (table[at + GUESS + 1] + u * table[at + GUESS + 2]));
  let step = 0;
  let slope = 0;
  for (let round = 0; round < 2; round++) {
    const miss = ((ax * p + bx) * p + cx) * p - t;
    slope = (3 * ax * p + 2 * bx) * p + cx;
    step = (miss * slope) / (slope * slope - miss * (3 * ax * p + bx));
    p -= step;
  }
  const settled = step < SETTLED && step > -SETTLED && slope > STEEP_ENOUGH && p >= 0 && p <= 1;
  return settled ? p : bracketed(table, at, t);
}

/** Where Newton's step is small enough: what is left after it is far smaller, as it converges quadratically. */
const SMALL = 1e-12;

/** Slope of x below which Newton's step is not trusted and the interval is halved instead. */
const FLAT = 1e-7;

/** The same by Newton within a shrinking bracket, so that it always ends. */
function bracketed(table: Readonly<Float64Array>, at: number, t: number): number {
  const ax = table[at];
  const bx = table[at + 1];
  const cx = table[at + 2];
  let low = 0;
  let high = 1;
  let p = t;
  for (let round = 0; round < 64; round++) {
    const miss = ((ax * p + bx) * p + cx) * p - t;
    if (miss > 0) high = p;
    else low = p;
    const slope = (3 * ax * p + 2 * bx) * p + cx;
    const next = p - miss / slope;
    const inside = slope > FLAT && next >= low && next <= high;
    const stepped = inside ? next : (low + high) / 2;
    const move = Math.abs(stepped - p);
    p = stepped;
    if (inside ? move < SMALL : high - low < 1e-16) break;
  }
  return p;
}

/** @returns u = y(p) */
export function bezierHeight(table: Readonly<Float64Array>, at: number, p: number): number {
  return ((table[at + 3] * p + table[at + 4]) * p + table[at + 5]) * p;
}

/** How far from a vertical or standing end the slope is read instead, in p: its limit, where there is one. */
const BESIDE_END = 1e-6;

/**
 * Slope and curvature of an ease, du/dt and d²u/dt².
 *
 * @param out receives both; not finite where the curve is vertical
 */
export function bezierSlopes(out: Float64Array, table: Readonly<Float64Array>, at: number, p: number): void {
  const flat = slopeOf(table, at, p) < FLAT;
  const vertical = flat && Math.abs(slopeOf(table, at + 3, p)) > FLAT;
  const read = flat && !vertical ? Math.min(Math.max(p, BESIDE_END), 1 - BESIDE_END) : p;
  const x1 = slopeOf(table, at, read);
  const y1 = slopeOf(table, at + 3, read);
  const x2 = 6 * table[at] * read + 2 * table[at + 1];
  const y2 = 6 * table[at + 3] * read + 2 * table[at + 4];
  out[0] = vertical ? Math.sign(y1) * Infinity : y1 / x1;
  out[1] = vertical ? NaN : (y2 * x1 - y1 * x2) / (x1 * x1 * x1);
}

function slopeOf(table: Readonly<Float64Array>, at: number, p: number): number {
  return (3 * table[at] * p + 2 * table[at + 1]) * p + table[at + 2];
}
