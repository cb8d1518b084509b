/** One measured figure, as a bench prints it. */
export interface Figure {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  /** What the value is held against; null where its limit is absolute. */
  readonly floor: number | null;
  readonly ratio: number | null;
  readonly limit: number;
  readonly holds: boolean;
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
}

/** Prints a figure as one JSON line; one that does not hold makes the bench exit with 1. */
export function printFigure(figure: Omit<Figure, 'holds' | 'ratio'>): void {
  const { name, value, unit, floor, limit } = figure;
  const ratio = floor === null ? null : value / floor;
  const holds = (ratio ?? value) <= limit;
  if (!holds) process.exitCode = 1;
  process.stdout.write(`${JSON.stringify({ name, value, unit, floor, ratio, limit, holds })}\n`);
}

/**
 * Runs several things in turn, round after round, so that what else the machine does falls on all of them.
 *
 * @returns each one's median, milliseconds; the first rounds, in which code is still being compiled, do not count
 */
export function inTurn(rounds: number, things: readonly (() => void)[]): readonly number[] {
  const times = things.map((): number[] => []);
  for (let round = -WARM_UP; round < rounds; round++) {
    things.forEach((thing, i) => {
      const began = performance.now();
      thing();
      if (round >= 0) times[i].push(performance.now() - began);
    });
  }
  return times.map(median);
}

const WARM_UP = 5;
