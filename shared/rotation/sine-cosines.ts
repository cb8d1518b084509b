/** Steps of a turn in the table. */
const STEPS = 256;

/** Up to here steps times the first part of 2π/256, which has 33 bits, are exact: there are under 2²⁰ of them. */
const REDUCED_EXACTLY = 25_000;

/** Added and taken away again, it leaves the nearest whole number. */
const ROUNDING = 6755399441055744;

/** Sine and cosine of each step. */
const table = Float64Array.from({ length: 2 * STEPS }, (_, i) =>
  sineOfStep((i & 1) === 0 ? i >> 1 : (i >> 1) + STEPS / 4),
);

/** From angles of at most an eighth of a turn, whose rounding does not count. */
function sineOfStep(step: number): number {
  if (step >= STEPS) return sineOfStep(step - STEPS);
  if (step > STEPS / 2) return -sineOfStep(step - STEPS / 2);
  if (step > STEPS / 4) return sineOfStep(STEPS / 2 - step);
  return step <= STEPS / 8
    ? Math.sin((step * 2 * Math.PI) / STEPS)
    : Math.cos(((STEPS / 4 - step) * 2 * Math.PI) / STEPS);
}

/**
 * Sines and cosines of a few angles, for what is done for every frame: Math.sin and Math.cos each bring the angle into its
 * quadrant and sum a long series; here both come from the nearest of 256 steps and a short one. Angles go in and out by
 * arrays, as numbers given to a function or returned by it may have to be put on the heap.
 *
 * With the rest r ≤ π/256 the series' own error is under 1e-17.
 *
 * @param out receives sine and cosine of each, within 2e-16 of the truth up to 25,000 rad and as Math has them beyond
 * @param anglesRad any finite numbers
 * @param count how many of them
 */
export function sineCosines(out: Float64Array, anglesRad: Readonly<Float64Array>, count: number): void {
  const sines = table;
  for (let i = 0; i < count; i++) {
    const angle = anglesRad[i];
    // Steps per radian; 2π/256 in two parts, those of fdlibm's e_rem_pio2.c.
    const steps = angle * 40.74366543152521 + ROUNDING - ROUNDING;
    const r = angle - steps * (1.57079632673412561417 / 64) - steps * (6.07710050650619224932e-11 / 64);
    const z = r * r;
    const sine = r - r * z * (1 / 6 - z * (1 / 120));
    const cosineLess1 = z * (z * (1 / 24 - z * (1 / 720)) - 0.5);
    const step = 2 * ((steps | 0) & (STEPS - 1));
    const s = sines[step];
    const c = sines[step + 1];
    out[2 * i] = s + (s * cosineLess1 + c * sine);
    out[2 * i + 1] = c + (c * cosineLess1 - s * sine);
    if (!(angle < REDUCED_EXACTLY && angle > -REDUCED_EXACTLY)) {
      out[2 * i] = Math.sin(angle);
      out[2 * i + 1] = Math.cos(angle);
    }
  }
}
