/**
 * Where the keys of a saved move fall on a shot: at whole frames, the first on the range's first, the last on its last.
 */

/** @returns frames after the first, of the place `at` in a range that many frames long */
export function framesAfterFirst(at: number, length: number): number {
  return round(at * length);
}

// Looked up once: the search below asks it millions of times.
const { round } = Math;

/** @returns the index of the first key that falls on the frame of the key before; undefined where none does */
export function firstCollision(places: readonly number[], length: number): number | undefined {
  const found = places.findIndex(
    (at, i) => i > 0 && framesAfterFirst(at, length) <= framesAfterFirst(places[i - 1], length),
  );
  return found < 0 ? undefined : found;
}

/** Longest shot, frames (schemas/move.schema.json). */
const MOST_FRAMES = 10_000_000;

/**
 * The shortest range in which no two keys fall on one frame.
 *
 * Not every longer range works too: with rounding, two places that fall apart may come together again a little further
 * on. So lengths are tried one by one, from the least that could do: three neighbouring keys must span more than one
 * frame. At each length the tightest pairs are looked at first, which rules out almost every wrong length at once.
 *
 * @param places rising, 0…1
 * @returns frames from the first to the last; undefined where no shot is long enough
 */
export function shortestRange(places: readonly number[]): number | undefined {
  const gaps = places.slice(1).map((at, i) => at - places[i]);
  const spans = places.slice(2).map((at, i) => at - places[i]);
  const least = Math.max(
    places.length - 1,
    Math.floor(spans.reduce((most, span) => Math.max(most, 1 / span), 0)),
  );
  const tightest = gaps.map((_, i) => i).sort((a, b) => gaps[a] - gaps[b]);
  for (let length = least; length < MOST_FRAMES; length++) {
    const apart = tightest.every(
      i => framesAfterFirst(places[i + 1], length) > framesAfterFirst(places[i], length),
    );
    if (apart) return length;
  }
  return undefined;
}
