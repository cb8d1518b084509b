import { type FrameRate, timecodeBase } from './frame-rate';

/**
 * Timecode as SMPTE ST 12-1: hours, minutes, seconds and frames of a count that wraps at 24 hours.
 *
 * Drop-frame skips labels, never pictures: at 29.97 the labels ;00 and ;01 (at 59.94 also ;02 and ;03) of each minute
 * but every tenth do not exist, so that the labels keep step with the clock.
 */
export interface TimecodeCount {
  readonly rate: FrameRate;
  readonly dropFrame: boolean;
}

const MINUTES_PER_DAY = 24 * 60;
const TIMECODE = /^(\d\d):([0-5]\d):([0-5]\d)([:;])(\d{2,4})$/;

/** Labels dropped at the top of a dropping minute. */
function droppedLabels({ rate, dropFrame }: TimecodeCount): number {
  return dropFrame ? timecodeBase(rate) / 15 : 0;
}

/** @returns how many frames the count holds before it wraps: 2,589,408 at 29.97 drop-frame */
export function framesPerDay(count: TimecodeCount): number {
  const minutes = MINUTES_PER_DAY - MINUTES_PER_DAY / 10;
  return timecodeBase(count.rate) * 60 * MINUTES_PER_DAY - droppedLabels(count) * minutes;
}

/**
 * @param frame whole frames since 00:00:00:00; any whole number, wraps at 24 hours
 * @returns `hh:mm:ss:ff`, with `;` before the frames in drop-frame
 */
export function timecodeFromFrame(frame: number, count: TimecodeCount): string {
  const day = framesPerDay(count);
  const base = timecodeBase(count.rate);
  const label = labelNumber(((frame % day) + day) % day, count);
  const parts = [label / (3600 * base), (label / (60 * base)) % 60, (label / base) % 60].map(part =>
    two(part),
  );
  return `${parts.join(':')}${count.dropFrame ? ';' : ':'}${two(label % base)}`;
}

/** Puts the dropped labels back in: the number that a label would have if none were missing. */
function labelNumber(frame: number, count: TimecodeCount): number {
  const dropped = droppedLabels(count);
  if (dropped === 0) return frame;
  const base = timecodeBase(count.rate);
  const perTenMinutes = base * 600 - dropped * 9;
  const perMinute = base * 60 - dropped;
  const tens = Math.floor(frame / perTenMinutes);
  const rest = frame % perTenMinutes;
  // The first minute of ten drops nothing, so it is longer by the dropped labels.
  const minutes = rest < base * 60 ? 0 : 1 + Math.floor((rest - base * 60) / perMinute);
  return frame + dropped * (9 * tens + minutes);
}

/**
 * @param text `hh:mm:ss:ff`, or `hh:mm:ss;ff` when the count drops frames
 * @returns the frame's number, or undefined where the text is no timecode of this count: a wrong form, a label out of
 *   range or one that drop-frame skips
 */
export function frameFromTimecode(text: string, count: TimecodeCount): number | undefined {
  const match = TIMECODE.exec(text);
  if (!match) return undefined;
  const base = timecodeBase(count.rate);
  const [hours, minutes, seconds, frames] = [match[1], match[2], match[3], match[5]].map(Number);
  const separator = count.dropFrame ? ';' : ':';
  if (hours > 23 || frames >= base || match[4] !== separator || match[5] !== two(frames)) return undefined;
  const dropped = droppedLabels(count);
  const wholeMinutes = hours * 60 + minutes;
  if (dropped > 0 && seconds === 0 && frames < dropped && minutes % 10 !== 0) return undefined;
  const label = (wholeMinutes * 60 + seconds) * base + frames;
  return label - dropped * (wholeMinutes - Math.floor(wholeMinutes / 10));
}

function two(value: number): string {
  return String(Math.floor(value)).padStart(2, '0');
}
