/**
 * Effective shutter angle: the share of a delivered frame's time that the picture was exposed for, as the angle that a
 * rotary shutter would be open for. Speeding a shot up leaves pictures out, and with them the time between.
 *
 * @param exposureSec seconds that each source picture was exposed for
 * @param intervalSec real seconds from one source picture to the next
 * @param speed how many times faster the shot is delivered
 * @returns degrees; 172.8 for 1/50 s at 24 frames a second, 28.8 for the same six times faster
 */
export function shutterAngleDeg(exposureSec: number, intervalSec: number, speed: number): number {
  return (360 * exposureSec) / (intervalSec * speed);
}

/** @returns the largest angle that can be: exposed for all of the interval */
export function largestShutterAngleDeg(speed: number): number {
  return 360 / speed;
}
