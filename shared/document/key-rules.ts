import { type Key } from '#schemas/move';
import { DEG_PER_RAD, FOV_MIN_DEG, FOV_TOLERANCE_DEG } from '#shared/conventions';
import { maxFovRad } from '#shared/projection/field-of-view';
import { type Fault, shown } from './fault';
import { isNumber, isRecord, type Unsure } from './unsure';

/** y of a bezier handle, either way (schemas/move.schema.json). */
const HANDLE_LIMIT = 10;

/**
 * What must hold of a key wherever it stands, in a move or in a saved move: its leg is there unless it is the last, its
 * field of view can be drawn, its ease is a function of time.
 *
 * @param pointer where the key stands
 */
export function keyFaults(key: Unsure<Omit<Key, 'frame'>>, pointer: string, isLast: boolean): Fault[] {
  const faults: Fault[] = [];
  const wrong = (member: string, detail: string) => faults.push({ pointer: `${pointer}/${member}`, detail });
  if (isLast && key.leg !== undefined) wrong('leg', 'must be left out: no leg runs from the last key');
  if (!isLast && key.leg === undefined)
    wrong('leg', 'is missing: every key but the last says how the camera travels on');
  const fovFault = fieldOfViewFault(key);
  if (fovFault) wrong('fov', fovFault);
  return [...faults, ...bezierFaults(key.leg, pointer)];
}

/** Out of 0…360 the schema has spoken already. */
function fieldOfViewFault({ fov, eye }: Unsure<Pick<Key, 'fov' | 'eye'>>): string | undefined {
  if (!isNumber(fov) || !isNumber(eye) || fov <= 0 || fov >= 360 || eye < 0 || eye > 1) return undefined;
  const most = maxFovRad(eye) * DEG_PER_RAD;
  if (fov >= FOV_MIN_DEG - FOV_TOLERANCE_DEG && fov <= most + FOV_TOLERANCE_DEG) return undefined;
  return `must be ${FOV_MIN_DEG} to ${Number(most.toFixed(4))} at eye point ${eye}, is ${fov}`;
}

/** Beyond ±10 the schema has spoken already. */
function bezierFaults(leg: unknown, pointer: string): Fault[] {
  if (!isRecord(leg) || !isRecord(leg['ease']) || !Array.isArray(leg['ease']['bezier'])) return [];
  const handles: unknown[] = leg['ease']['bezier'];
  return [0, 2]
    .filter(i => {
      const x = handles[i];
      return isNumber(x) && Math.abs(x) <= HANDLE_LIMIT && (x < 0 || x > 1);
    })
    .map(i => ({
      pointer: `${pointer}/leg/ease/bezier/${i}`,
      detail: `must be within 0 to 1, as x of a CSS easing curve, is ${shown(handles[i])}`,
    }));
}
