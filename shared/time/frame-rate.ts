/** Frames per second as a ratio of whole numbers: 30000/1001 is exact, 29.97 is not. */
export interface FrameRate {
  readonly num: number;
  readonly den: number;
}

export function framesPerSecond(rate: FrameRate): number {
  return rate.num / rate.den;
}

/** The timecode's count of frames in a second: 30 at 29.97, 1 at rates under one. @see SMPTE ST 12-1 */
export function timecodeBase(rate: FrameRate): number {
  return Math.max(1, Math.round(rate.num / rate.den));
}

/** Whether drop-frame counting is defined for a rate: 30000/1001 and 60000/1001 alone. @see SMPTE ST 12-1 */
export function allowsDropFrame(rate: FrameRate): boolean {
  return rate.den === 1001 && (rate.num === 30000 || rate.num === 60000);
}
