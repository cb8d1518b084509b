import { type MoveDocument } from '#schemas/move';
import { deliverableNamed } from '#shared/document/deliverable-named';
import { compileMove } from '#shared/path/compile';
import { DEFAULT_LIMITS, type Limits } from './limits';
import { eachMeasure, type MeasureColumns, type MeasureName } from './measures';
import { type Note, notesOf } from './notes';
import { MeasureTaker } from './take-measures';
import { type Worst, worstOf } from './worst';

export interface MeasureOptions {
  /** Name of the deliverable that is measured; the first unless said. */
  readonly deliverable?: string;
  /** The default limits unless said. */
  readonly limits?: Limits;
}

export interface Measured {
  readonly worst: Readonly<Record<MeasureName, Worst>>;
  readonly perFrame: MeasureColumns;
  readonly notes: readonly Note[];
}

/**
 * Measures the delivered film of a move.
 *
 * @param document as `checkMove` (document/validate.ts) accepts
 * @returns each measure for every delivered frame, its worst against its limit, and what else should be known
 * @throws UnknownDeliverable
 */
export function measureMove(document: MoveDocument, options: MeasureOptions = {}): Measured {
  const deliverable = deliverableNamed(document, options.deliverable);
  const limits = options.limits ?? DEFAULT_LIMITS;
  const move = compileMove(document);
  const perFrame = new MeasureTaker(document, move, deliverable).takeAll();
  const worst = eachMeasure(measure => worstOf(measure, perFrame[measure], limits[measure]));
  return { worst, perFrame, notes: notesOf(document, move, worst) };
}
