import { type Deliverable, type Key, type MoveDocument, type Shot } from '#schemas/move';
import { DEG_PER_RAD, FOV_MIN_DEG, FOV_TOLERANCE_DEG } from '#shared/conventions';
import { maxFovRad } from '#shared/projection/field-of-view';
import { allowsDropFrame } from '#shared/time/frame-rate';
import { frameFromTimecode } from '#shared/time/timecode';
import { type Fault, shown } from './fault';

/**
 * The rules of a move document that a schema cannot say. They look at each part on its own and ask for the right types
 * first, so that they find what is wrong beside parts that the schema has already refused.
 */

/** What a document is before it is known to be one: every member may be missing or of another type. */
type Unsure<T> = { readonly [K in keyof T]?: unknown };

/** @returns the faults of all rules, in the document's order */
export function ruleFaults(document: Unsure<MoveDocument>): Fault[] {
  const shot = isRecord(document.shot) ? document.shot : {};
  return [
    ...shotFaults(shot),
    ...deliverableFaults(listOf(document.deliverables)),
    ...keyFaults(listOf(document.keys), isWhole(shot.frames) ? shot.frames : undefined),
  ];
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function listOf(value: unknown): Record<string, unknown>[] {
  return Array.isArray(value) ? value.map((entry: unknown) => (isRecord(entry) ? entry : {})) : [];
}

function isNumber(value: unknown): value is number {
  return typeof value === 'number' && Number.isFinite(value);
}

function isWhole(value: unknown): value is number {
  return Number.isInteger(value);
}

/** Most frames a second. */
const HIGHEST_RATE = 1000;

/** How far a level rotation may be from unit length. */
const UNIT_TOLERANCE = 1e-6;

function shotFaults(shot: Unsure<Shot>): Fault[] {
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

function startFaults({ start, dropFrame }: Unsure<Shot>, rate: { num: number; den: number }): Fault[] {
  if (typeof start !== 'string') return [];
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

function deliverableFaults(deliverables: readonly Unsure<Deliverable>[]): Fault[] {
  const faults: Fault[] = [];
  const names = new Map<unknown, number>();
  deliverables.forEach(({ name, match }, i) => {
    const wrong = (member: string, detail: string) =>
      faults.push({ pointer: `/deliverables/${i}/${member}`, detail });
    if (i === 0 && match !== undefined)
      wrong('match', 'must be left out: the first deliverable is the one that the keys were made for');
    if (i > 0 && match === undefined) wrong('match', 'is missing: "width", "height" or "diagonal"');
    const first = names.get(name);
    if (typeof name === 'string' && first !== undefined) {
      wrong('name', `must be unique, is ${shown(name)} as /deliverables/${first} is`);
    } else names.set(name, i);
  });
  return faults;
}

function keyFaults(keys: readonly Unsure<Key>[], frames: number | undefined): Fault[] {
  const faults: Fault[] = [];
  let before: number | undefined;
  keys.forEach((key, i) => {
    const wrong = (member: string, detail: string) =>
      faults.push({ pointer: `/keys/${i}/${member}`, detail });
    const { frame, leg } = key;
    if (isNumber(frame)) {
      if (before !== undefined && frame <= before)
        wrong('frame', `must be after frame ${before}, is ${frame}`);
      if (frames !== undefined && frame >= frames) {
        wrong('frame', `must be inside the shot (0 to ${frames - 1}), is ${frame}`);
      }
      before = Math.max(frame, before ?? frame);
    }
    const last = i === keys.length - 1;
    if (last && leg !== undefined) wrong('leg', 'must be left out: no leg runs from the last key');
    if (!last && leg === undefined)
      wrong('leg', 'is missing: every key but the last says how the camera travels on');
    const fovFault = fieldOfViewFault(key);
    if (fovFault) wrong('fov', fovFault);
    faults.push(...bezierFaults(leg, i));
  });
  return faults;
}

/** Out of 0…360 the schema has spoken already. */
function fieldOfViewFault({ fov, eye }: Unsure<Key>): string | undefined {
  if (!isNumber(fov) || !isNumber(eye) || fov <= 0 || fov >= 360 || eye < 0 || eye > 1) return undefined;
  const most = maxFovRad(eye) * DEG_PER_RAD;
  if (fov >= FOV_MIN_DEG - FOV_TOLERANCE_DEG && fov <= most + FOV_TOLERANCE_DEG) return undefined;
  return `must be ${FOV_MIN_DEG} to ${Number(most.toFixed(4))} at eye point ${eye}, is ${fov}`;
}

function bezierFaults(leg: unknown, key: number): Fault[] {
  if (!isRecord(leg) || !isRecord(leg['ease']) || !Array.isArray(leg['ease']['bezier'])) return [];
  const handles: unknown[] = leg['ease']['bezier'];
  return [0, 2]
    .filter(i => {
      const x = handles[i];
      return isNumber(x) && (x < 0 || x > 1);
    })
    .map(i => ({
      pointer: `/keys/${key}/leg/ease/bezier/${i}`,
      detail: `must be within 0 to 1, as x of a CSS easing curve, is ${shown(handles[i])}`,
    }));
}
