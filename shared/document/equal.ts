import { type MoveDocument, type Shot } from '#schemas/move';
import { isRecord } from './unsure';

/**
 * Whether two move documents say the same: what is left out counts as its default, the order of members does not count,
 * nor does the sign of a zero; members of other programs count as they are.
 */
export function equalMoves(a: MoveDocument, b: MoveDocument): boolean {
  return equalJson(completed(a), completed(b));
}

function completed({ notes = '', extensions = {}, ...document }: MoveDocument): object {
  return {
    ...document,
    notes,
    extensions,
    shot: completedShot(document.shot),
    deliverables: document.deliverables.map(each => ({ ...each, extensions: each.extensions ?? {} })),
    keys: document.keys.map(({ rest = false, leg, ...key }) => ({
      ...{ ...key, rest, extensions: key.extensions ?? {} },
      leg: leg && { ...leg, extensions: leg.extensions ?? {} },
    })),
  };
}

function completedShot(shot: Shot): object {
  return {
    ...shot,
    from: shot.from ?? 0,
    to: shot.to ?? shot.frames - 1,
    start: (shot.start ?? '00:00:00:00').replace(';', ':'),
    dropFrame: shot.dropFrame ?? false,
    level: shot.level ?? [0, 0, 0, 1],
    loops: shot.loops ?? false,
    interval: shot.interval ?? shot.rate.den / shot.rate.num,
    extensions: shot.extensions ?? {},
  };
}

/** Whether two JSON values are equal; members that are undefined count as left out. */
export function equalJson(a: unknown, b: unknown): boolean {
  if (Array.isArray(a) && Array.isArray(b))
    return a.length === b.length && a.every((entry, i) => equalJson(entry, b[i]));
  if (!isRecord(a) || !isRecord(b)) return a === b;
  const names = (part: object) =>
    Object.entries(part)
      .filter(([, value]) => value !== undefined)
      .map(([name]) => name);
  const own = names(a);
  return (
    own.length === names(b).length && own.every(name => Object.hasOwn(b, name) && equalJson(a[name], b[name]))
  );
}
