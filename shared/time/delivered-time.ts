import { type FrameRate } from './frame-rate';

/**
 * A shot's two clocks. Keys stand on source frames; the delivered film has the same frame rate, shows the source frames
 * `from`…`to` (both included) and runs `speed` times as fast.
 */
export interface ShotTimes {
  readonly rate: FrameRate;
  readonly speed: number;
  readonly from: number;
  readonly to: number;
}

/** Noise of decimal speeds, in frames, that must not cost the last frame or its timecode. */
const FRAME_SLACK = 1e-9;

/** @returns how many frames the delivered film has, at least 1 */
export function deliveredFrameCount({ speed, from, to }: ShotTimes): number {
  return Math.floor((to - from) / speed + FRAME_SLACK) + 1;
}

/**
 * @returns the source frame that delivered frame `index` (from 0) shows; not whole where the speed is not, but whole
 *   where only the speed's decimals keep it from being so: a hold must be left at its key, not a frame late
 */
export function sourceFrameOfDelivered({ speed, from, to }: ShotTimes, index: number): number {
  const frame = Math.min(from + index * speed, to);
  const whole = Math.round(frame);
  return Math.abs(frame - whole) < FRAME_SLACK ? whole : frame;
}

/** @returns the delivered frame, from 0 and not rounded, that shows a source frame */
export function deliveredOfSourceFrame({ speed, from }: ShotTimes, sourceFrame: number): number {
  return (sourceFrame - from) / speed;
}

/** @returns the first delivered frame, from 0, that shows a delivered source frame or what comes after it; the last at most */
export function firstDeliveredFrameFrom(times: ShotTimes, sourceFrame: number): number {
  const frame = Math.ceil(deliveredOfSourceFrame(times, sourceFrame) - FRAME_SLACK);
  return Math.min(frame, deliveredFrameCount(times) - 1);
}

/** @returns delivered seconds, from the film's start, of a source frame */
export function deliveredSeconds({ rate, speed, from }: ShotTimes, sourceFrame: number): number {
  return ((sourceFrame - from) * rate.den) / (rate.num * speed);
}

/** @returns source frames that pass in a delivered second: the factor from per-frame to per-second rates */
export function sourceFramesPerDeliveredSecond({ rate, speed }: ShotTimes): number {
  return (rate.num * speed) / rate.den;
}

/** @returns the whole source frame whose timecode labels a source frame that may not be whole */
export function labelledFrame(sourceFrame: number): number {
  return Math.floor(sourceFrame + FRAME_SLACK);
}
