/**
 * Whole turns in a difference of yaw or roll: Δ/360 rounded to the nearest, ties towards zero, so that at half a turn
 * the numbers' sign decides which way round.
 *
 * @param differenceDeg degrees, computed from the document's own numbers
 */
export function wholeTurns(differenceDeg: number): number {
  const turns = Math.ceil(Math.abs(differenceDeg) / 360 - 0.5);
  return turns === 0 ? 0 : Math.sign(differenceDeg) * turns;
}
