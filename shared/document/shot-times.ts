import { type Shot } from '#schemas/move';
import { type ShotTimes } from '#shared/time/delivered-time';
import { frameFromTimecode, type TimecodeCount } from '#shared/time/timecode';

/** A shot's clocks with what its document left out filled in. */
export interface CompleteShotTimes extends ShotTimes {
  /** Real seconds from one source frame to the next. */
  readonly intervalSec: number;
  readonly count: TimecodeCount;
  /** The timecode's frame number of source frame 0. */
  readonly startFrame: number;
}

/** @returns the times of a valid document's shot: whole shot, start 0, one over the rate unless it says otherwise */
export function shotTimes(shot: Shot): CompleteShotTimes {
  const {
    rate,
    speed,
    frames,
    from = 0,
    to = frames - 1,
    dropFrame = false,
    interval = rate.den / rate.num,
  } = shot;
  const count = { rate, dropFrame };
  const start = shot.start?.replace(/:(\d+)$/, dropFrame ? ';$1' : ':$1');
  const startFrame = (start === undefined ? undefined : frameFromTimecode(start, count)) ?? 0;
  return { rate, speed, from, to, intervalSec: interval, count, startFrame };
}
