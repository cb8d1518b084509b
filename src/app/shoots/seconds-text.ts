/** Longest time that a document takes, seconds. */
const LONGEST = 86_400;

/**
 * Reads seconds as photographers write them: `1/50`, `20`, `0.5`, with or without `s`.
 *
 * @returns seconds; null for empty text; undefined for anything else
 */
export function secondsFromText(text: string): number | null | undefined {
  const trimmed = text.trim().replace(/\s*s$/, '').replace(',', '.');
  if (trimmed === '') return null;
  const match = /^(\d+(?:\.\d+)?)(?:\s*\/\s*(\d+(?:\.\d+)?))?$/.exec(trimmed);
  if (!match) return undefined;
  const seconds = Number(match[1]) / Number(match[2] ?? 1);
  return seconds > 0 && seconds <= LONGEST ? seconds : undefined;
}

/** @returns `1/50` where that is what the seconds are, else a decimal; empty for null */
export function textFromSeconds(seconds: number | null): string {
  if (seconds === null) return '';
  const divisor = 1 / seconds;
  const whole = Math.round(divisor);
  return seconds < 0.4 && Math.abs(divisor - whole) < 1e-6 * divisor ? `1/${whole}` : String(seconds);
}
