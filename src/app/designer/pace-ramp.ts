/**
 * Colours of pace, slow to fast: one ramp whose lightness rises evenly while the hue goes from blue to yellow, so that it
 * reads without colour vision and on print (CIELAB lightness 45, 58, 71, 84, 95).
 */
const RAMP: readonly (readonly [number, number, number])[] = [
  [72, 106, 176],
  [112, 140, 172],
  [155, 173, 158],
  [207, 207, 128],
  [253, 240, 130],
];

/** Steps of a ramp: lines of one colour are drawn together. */
export const PACE_STEPS = 12;

/** @param pace 0 stands, 1 at the limit, beyond it stays at the ramp's end @returns a step, 0 to PACE_STEPS − 1 */
export function paceStep(pace: number): number {
  return Math.min(Math.floor(Math.min(pace, 1) * PACE_STEPS), PACE_STEPS - 1);
}

/** @returns the CSS colour of a step */
export function paceColour(step: number): string {
  const place = (step / (PACE_STEPS - 1)) * (RAMP.length - 1);
  const from = RAMP[Math.min(Math.floor(place), RAMP.length - 2)];
  const to = RAMP[RAMP.indexOf(from) + 1];
  const share = place - RAMP.indexOf(from);
  const mixed = from.map((part, i) => Math.round(part + share * (to[i] - part)));
  return `rgb(${mixed.join(' ')})`;
}
