/** A ratio of whole numbers. */
export interface Fraction {
  readonly num: number;
  readonly den: number;
}

/**
 * The simplest fraction that is a number, or the nearest one found by its continued fraction.
 *
 * @param value over 0
 * @param most largest numerator and denominator
 * @returns in lowest terms; 5/2 for 2.5, 1001/30000 for 0.03336666666666667
 * @see Hardy and Wright, "An Introduction to the Theory of Numbers", chapter X
 */
export function fraction(value: number, most: number): Fraction {
  let [before, here]: [Fraction, Fraction] = [
    { num: 0, den: 1 },
    { num: 1, den: 0 },
  ];
  let rest = value;
  for (;;) {
    const whole = Math.floor(rest);
    const next = { num: whole * here.num + before.num, den: whole * here.den + before.den };
    if (next.num > most || next.den > most) return here;
    [before, here] = [here, next];
    if (here.num / here.den === value || rest === whole) return here;
    rest = 1 / (rest - whole);
  }
}
