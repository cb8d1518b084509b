import { type Ease, type Leg } from '#schemas/move';
import { type SavedKey } from '#schemas/saved-move';
import { bezierHandles } from '#shared/path/ease';
import { type Fault } from './fault';

/** y of a bezier handle, either way (schemas/move.schema.json). */
const HANDLE_LIMIT = 10;

/** What can be travelled the other way: fair and linear as they are, a curve turned about its middle. */
const TURNED: Readonly<Record<string, Ease>> = {
  fair: 'fair',
  linear: 'linear',
  'ease-in': 'ease-out',
  'ease-out': 'ease-in',
  'ease-in-out': 'ease-in-out',
};

/**
 * Keys in the other order: what was at the end of the move is at its beginning, and each leg is travelled backwards.
 *
 * @returns the keys, or a fault at each leg that has no way back: a hold shows its first key all along, and turned it
 *   would have to show its second
 */
export function reversedKeys(
  keys: readonly SavedKey[],
): { readonly keys: SavedKey[] } | { readonly faults: Fault[] } {
  const faults = keys.flatMap((key, i) => (key.leg ? turnFaults(key.leg, `/keys/${i}/leg/ease`) : []));
  if (faults.length > 0) return { faults };
  if (keys.length === 1) return { keys: [...keys] };
  const turned = keys.map((_, i) => {
    const from = keys.length - 1 - i;
    const { leg: _left, ...key } = keys[from];
    const travelled = keys[from - 1]?.leg;
    const at = 1 - key.at;
    return travelled
      ? { ...key, at, leg: { ...travelled, ease: turnedEase(travelled.ease) } }
      : { ...key, at };
  });
  return { keys: turned };
}

function turnFaults({ ease }: Leg, pointer: string): Fault[] {
  if (ease === 'hold') return [{ pointer, detail: 'cannot be reversed: a hold has no way back' }];
  const handles = typeof ease === 'object' ? ease.bezier : [];
  return [1, 3]
    .filter(i => Math.abs(1 - (handles[i] ?? 0)) > HANDLE_LIMIT)
    .map(i => ({
      pointer: `${pointer}/bezier/${i}`,
      detail: `cannot be reversed: turned about, ${handles[i]} becomes ${1 - handles[i]}, over ${HANDLE_LIMIT}`,
    }));
}

function turnedEase(ease: Ease): Ease {
  const known = typeof ease === 'string' ? TURNED[ease] : undefined;
  if (known !== undefined) return known;
  const [x1, y1, x2, y2] = bezierHandles(ease) ?? [0, 0, 1, 1];
  return { bezier: [1 - x2, 1 - y2, 1 - x1, 1 - y1] };
}
