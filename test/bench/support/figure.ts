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
