import { type Shot } from '#schemas/move';
import { allowsDropFrame } from '#shared/time/frame-rate';
import { frameFromTimecode } from '#shared/time/timecode';
import { type Fault, shown } from './fault';
import { isNumber, isRecord, isWhole, type Unsure } from './unsure';

/** Most frames a second. */
const HIGHEST_RATE = 1000;

/** How far a level rotation may be from unit length. */
const UNIT_TOLERANCE = 1e-6;

/** @returns what is wrong with a shot beyond its schema */
export function shotFaults(shot: Unsure<Shot>): Fault[] {
  const faults: Fault[] = [];
  const wrong = (member: string, detail: string) => faults.push({ pointer: `/shot/${member}`, detail });
  const { frames, from, to, rate, dropFrame, level } = shot;
  if (isWhole(frames)) {
    const last = frames - 1;
    if (isWhole(from) && from > last) wrong('from', `must be inside the shot (0 to ${last}), is ${from}`);
    if (isWhole(to) && to > last) wrong('to', `must be inside the shot (0 to ${last}), is ${to}`);
  }
  if (isWhole(from) && isWhole(to) && from > to) wrong('to', `must not be before "from" (${from}), is ${to}`);
  const known = rateOf(rate);
  if (known && known.num / known.den > HIGHEST_RATE) {
    wrong('rate', `must be at most ${HIGHEST_RATE} frames a second, is ${known.num}/${known.den}`);
  }
  if (known && dropFrame === true && !allowsDropFrame(known)) {
    wrong(
      'dropFrame',
      `is possible at 30000/1001 and 60000/1001 only, the rate is ${known.num}/${known.den}`,
    );
  }
  if (known) faults.push(...startFaults(shot, known));
  if (Array.isArray(level) && level.length === 4 && level.every(isNumber)) {
    const length = Math.hypot(...level);
    if (Math.abs(length - 1) > UNIT_TOLERANCE)
      wrong('level', `must be a unit quaternion, has length ${length}`);
  }
  return faults;
}

function rateOf(rate: unknown): { num: number; den: number } | undefined {
  if (!isRecord(rate)) return undefined;
  const { num, den } = rate;
  return isWhole(num) && isWhole(den) && num >= 1 && den >= 1 ? { num, den } : undefined;
}

/** Anything else the schema has spoken about. */
const TIMECODE_SHAPE = /^\d\d:[0-5]\d:[0-5]\d[:;]\d{2,4}$/;

function startFaults({ start, dropFrame }: Unsure<Shot>, rate: { num: number; den: number }): Fault[] {
  if (typeof start !== 'string' || !TIMECODE_SHAPE.test(start)) return [];
  const drops = dropFrame === true && allowsDropFrame(rate);
  // A start may be written with a colon in drop-frame too: many programs do.
  const text = drops ? start.replace(/:(\d+)$/, ';$1') : start;
  if (frameFromTimecode(text, { rate, dropFrame: drops }) !== undefined) return [];
  const kind = drops ? 'drop-frame' : 'non-drop-frame';
  return [
    {
      pointer: '/shot/start',
      detail: `must be a ${kind} timecode at ${rate.num}/${rate.den}, is ${shown(start)}`,
    },
  ];
}
