import { MEASURES, type MeasureName } from './measures';

/** What a crew allows; a measure without a limit is shown and never breaks. */
export type Limits = Readonly<Partial<Record<MeasureName, number>>>;

/**
 * Shortest time that a still thing may need to cross the frame's width at 24 to 30 frames a second and a 180° shutter,
 * seconds; faster pans strobe. Common practice, no source.
 */
export const CROSSING_LIMIT_SEC = 7;

/** Frame rates that {@link CROSSING_LIMIT_SEC} is said of, frames a second; 24000/1001 counts as 24. */
export const CROSSING_LIMIT_RATES = { least: 23.9, most: 30 } as const;

/** Largest jump of the angular velocity at a key that is not felt, degrees a second. Common practice, no source. */
const JOLT_LIMIT_DEG_PER_SEC = 2;

/** At least a source pixel for every picture pixel at the centre: arithmetic. */
const SHARPNESS_LIMIT = 1;

/** Effective shutter angle under which movement strobes, degrees. Common practice, no source. */
export const SHUTTER_LIMIT_DEG = 90;

export const DEFAULT_LIMITS: Limits = {
  crossingTimeSec: CROSSING_LIMIT_SEC,
  joltDegPerSec: JOLT_LIMIT_DEG_PER_SEC,
  shutterAngleDeg: SHUTTER_LIMIT_DEG,
  sharpness: SHARPNESS_LIMIT,
};

/** Measures whose limit is the least allowed; of all others it is the most. */
const LIMITED_BELOW: ReadonlySet<MeasureName> = new Set(['crossingTimeSec', 'shutterAngleDeg', 'sharpness']);

/** The share by which rounding may put a value over its limit. */
const LIMIT_SLACK = 1e-9;

/** Whether the smaller of two values of a measure is the worse one. */
export function isWorseBelow(measure: MeasureName): boolean {
  return LIMITED_BELOW.has(measure);
}

/**
 * How bad a value may be: badness is the value's size, and its negative where the smaller value is the worse.
 *
 * @returns the largest badness that keeps the limit; infinite where there is none
 */
export function badnessAllowed(measure: MeasureName, limit: number | undefined): number {
  if (limit === undefined) return Infinity;
  const slack = LIMIT_SLACK * Math.abs(limit);
  return isWorseBelow(measure) ? slack - limit : limit + slack;
}

/** @returns whether a value breaks a limit; never where either is not known. A lean counts to either side */
export function breaksLimit(measure: MeasureName, value: number, limit: number | undefined): boolean {
  return (isWorseBelow(measure) ? -value : Math.abs(value)) > badnessAllowed(measure, limit);
}

/** Reading limits failed; the message says which and why. */
export class LimitsError extends Error {}

/**
 * @param value parsed JSON of unknown origin: an object of measures and numbers; null takes a default limit away
 * @returns the default limits with those put over them
 * @throws LimitsError
 */
export function readLimits(value: unknown): Limits {
  if (typeof value !== 'object' || value === null || Array.isArray(value))
    throw new LimitsError('The limits must be an object: { "<measure>": number, … }.');
  const limits: Partial<Record<MeasureName, number>> = { ...DEFAULT_LIMITS };
  for (const [name, limit] of Object.entries<unknown>({ ...value })) {
    const measure = MEASURES.find(each => each === name);
    if (!measure)
      throw new LimitsError(`${JSON.stringify(name)} is no measure; they are ${MEASURES.join(', ')}.`);
    if (limit === null) delete limits[measure];
    else if (typeof limit === 'number' && Number.isFinite(limit) && limit >= 0) limits[measure] = limit;
    else throw new LimitsError(`The limit of ${measure} must be a number from 0 on, or null for none.`);
  }
  return limits;
}
