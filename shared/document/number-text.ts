/**
 * Decimal text of a number: at most `digits` decimals, no exponent, no trailing zeros, no −0.
 *
 * @param value finite, below 1e21
 */
export function decimalText(value: number, digits: number): string {
  const text = value.toFixed(digits);
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return short === '-0' ? '0' : short;
}
