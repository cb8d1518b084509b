import { badnessAllowed, breaksLimit, isWorseBelow } from './limits';
import { type MeasureName } from './measures';

/** The worst of a measure over the delivered film. */
export interface Worst {
  /** Null where nothing is known. Of what is seen or not, the share of frames in which it is seen. */
  readonly value: number | null;
  /** Delivered frame, from 0, of the worst value; the first of several, and the first in which a thing is seen. */
  readonly frame: number | null;
  readonly limit: number | null;
  readonly breaks: boolean;
  /** In how many delivered frames the limit is broken. */
  readonly breakingFrames: number;
  /** Why something is not known, in all frames or in some. */
  readonly why?: string;
}

/** Why a measure has no number in a frame. */
const WHY: Readonly<Partial<Record<MeasureName, string>>> = {
  crossingTimeSec: 'nothing crosses the frame while it stands',
  shutterAngleDeg: 'the shot does not say its exposure',
  horizonLeanDeg: 'looking straight up or down, the horizon has no direction',
  seamInView: 'the shot does not say where the seam is',
  loopGapDeg: 'the shot does not loop',
};
const NO_SLOPE = 'an ease is vertical there, so its speed has no end';

/** Measures of one value for the whole film. */
const OF_THE_WHOLE: ReadonlySet<MeasureName> = new Set(['loopGapDeg']);
const SEEN_OR_NOT: ReadonlySet<MeasureName> = new Set(['seamInView', 'tripodInView']);

/** How near to the worst a value counts as just as bad, so that noise does not choose the frame. */
const TIE_SLACK = 1e-9;

/**
 * @param column one number a delivered frame; those that are not finite are not known
 * @param limit undefined for none
 */
export function worstOf(measure: MeasureName, column: Float64Array, limit: number | undefined): Worst {
  if (SEEN_OR_NOT.has(measure)) return shareOf(measure, column, limit);
  const isBelow = isWorseBelow(measure);
  const threshold = badnessAllowed(measure, limit);
  let worst = NaN;
  let most = -Infinity;
  let known = 0;
  let breakingFrames = 0;
  for (let i = 0; i < column.length; i++) {
    const value = column[i];
    // Neither NaN nor infinite.
    if (value - value !== 0) continue;
    known++;
    const badness = isBelow ? -value : Math.abs(value);
    if (badness > threshold) breakingFrames++;
    if (badness <= most) continue;
    most = badness;
    worst = value;
  }
  const least = most - TIE_SLACK * Math.max(1, Math.abs(most));
  const frame = known > 0 ? firstAsBad(column, isBelow, least) : -1;
  const allKnown = known === column.length || (known > 0 && OF_THE_WHOLE.has(measure));
  return {
    value: known > 0 ? worst : null,
    frame: known > 0 ? frame : null,
    limit: limit ?? null,
    breaks: breakingFrames > 0,
    breakingFrames,
    ...(allKnown ? {} : { why: WHY[measure] ?? NO_SLOPE }),
  };
}

/** @returns the first frame whose badness is at least `least` */
function firstAsBad(column: Float64Array, isBelow: boolean, least: number): number {
  let frame = 0;
  while (!((isBelow ? -column[frame] : Math.abs(column[frame])) >= least)) frame++;
  return frame;
}

function shareOf(measure: MeasureName, column: Float64Array, limit: number | undefined): Worst {
  let seen = 0;
  for (let i = 0; i < column.length; i++) if (column[i] === 1) seen++;
  const first = column.indexOf(1);
  const isKnown = column.length > 0 && !Number.isNaN(column[0]);
  const share = seen / column.length;
  const breaks = isKnown && breaksLimit(measure, share, limit);
  return {
    value: isKnown ? share : null,
    frame: first < 0 ? null : first,
    limit: limit ?? null,
    breaks,
    breakingFrames: breaks ? seen : 0,
    ...(isKnown ? {} : { why: WHY[measure] ?? NO_SLOPE }),
  };
}
