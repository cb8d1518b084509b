/**
 * The measures of a delivered move, in the order that they are listed in. `measure-move.ts` takes them.
 *
 * - `panRateDegPerSec`: how fast the viewing axis turns.
 * - `crossingTimeSec`: how long a still thing at that rate takes across the frame's width.
 * - `stepPx`: how far a thing at the frame's centre moves from frame to frame, picture pixels.
 * - `rollRateDegPerSec`: how fast the frame turns about its viewing axis.
 * - `zoomRatePerSec`: doublings of the picture's scale a second.
 * - `accelerationDegPerSec2`: change of the whole angular velocity.
 * - `joltDegPerSec`: jump of the angular velocity at a key, at the first delivered frame that shows it; 0 elsewhere.
 * - `shutterAngleDeg`: effective shutter angle (shared/capture/shutter.ts).
 * - `sharpness`: source pixels per picture pixel at the frame's centre.
 * - `horizonLeanDeg`: how far the horizon leans in the picture, −roll, within ±180.
 * - `seamInView`: 1 where the source's seam crosses the middle third of the frame's width, else 0.
 * - `tripodInView`: 1 where any of the cone of 20° about the source's nadir shows, else 0.
 * - `loopGapDeg`: turn from the film's last pose to its first, at the last frame.
 *
 * "A second" is a second of the delivered film.
 */
export const MEASURES = [
  'panRateDegPerSec',
  'crossingTimeSec',
  'stepPx',
  'rollRateDegPerSec',
  'zoomRatePerSec',
  'accelerationDegPerSec2',
  'joltDegPerSec',
  'shutterAngleDeg',
  'sharpness',
  'horizonLeanDeg',
  'seamInView',
  'tripodInView',
  'loopGapDeg',
] as const;

export type MeasureName = (typeof MEASURES)[number];

/** One number a delivered frame for each measure; NaN where it is not known, or none. */
export type MeasureColumns = Readonly<Record<MeasureName, Float64Array>>;

/** @returns a record of what is said of each measure, in their order */
export function eachMeasure<T>(say: (measure: MeasureName) => T): Record<MeasureName, T> {
  return {
    panRateDegPerSec: say('panRateDegPerSec'),
    crossingTimeSec: say('crossingTimeSec'),
    stepPx: say('stepPx'),
    rollRateDegPerSec: say('rollRateDegPerSec'),
    zoomRatePerSec: say('zoomRatePerSec'),
    accelerationDegPerSec2: say('accelerationDegPerSec2'),
    joltDegPerSec: say('joltDegPerSec'),
    shutterAngleDeg: say('shutterAngleDeg'),
    sharpness: say('sharpness'),
    horizonLeanDeg: say('horizonLeanDeg'),
    seamInView: say('seamInView'),
    tripodInView: say('tripodInView'),
    loopGapDeg: say('loopGapDeg'),
  };
}
