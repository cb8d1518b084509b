import { type Fault, pointerTo } from './fault';
import { isRecord, partsOf } from './unsure';

/** Most keys of a document (schemas/move.schema.json, schemas/saved-move.schema.json). */
export const MOST_KEYS = 2000;

/** No other list of ours has as many entries, and no part as many members. */
const MONSTROUS = 100;

/** Where members of other programs stand: never read by the schema's validator, so of any size. */
const FOREIGN = 'extensions';

/**
 * What of a document is worth reading. A validator that reports every fault would report millions of a monstrous
 * document; nobody could read them.
 */
export interface Readable {
  /** The document, keys beyond the most cut off. */
  readonly value: object;
  /** Its keys before the cut; undefined where it has no list of them. */
  readonly keyCount: number | undefined;
  readonly faults: readonly Fault[];
  /** Whether the faults are all there is to say. */
  readonly monstrous: boolean;
}

/** @returns the readable part of a document and what is said of the rest */
export function readablePart(value: object): Readable {
  const { keys }: { keys?: unknown } = value;
  const keyCount = Array.isArray(keys) ? keys.length : undefined;
  const cut = Array.isArray(keys) && keys.length > MOST_KEYS;
  const readable = cut ? { ...value, keys: keys.slice(0, MOST_KEYS) } : value;
  const tooMany = {
    pointer: '/keys',
    detail: `must have at most ${MOST_KEYS} entries, has ${keyCount ?? 0}`,
  };
  const monsters = monstrousParts(readable);
  const faults = [...(cut ? [tooMany] : []), ...monsters];
  return { value: readable, keyCount, faults, monstrous: monsters.length > 0 };
}

function monstrousParts(document: object): Fault[] {
  const { keys, shot, deliverables }: { keys?: unknown; shot?: unknown; deliverables?: unknown } = document;
  return [
    ...monsters(document, ''),
    ...monsters(shot, '/shot'),
    ...(Array.isArray(deliverables) && deliverables.length <= MONSTROUS
      ? deliverables.flatMap((each, i) => monsters(each, `/deliverables/${i}`))
      : []),
    ...partsOf(keys).flatMap((key, i) => keyMonsters(key, `/keys/${i}`)),
  ];
}

function keyMonsters(key: Record<string, unknown>, pointer: string): Fault[] {
  const leg = key['leg'];
  const ease = isRecord(leg) ? leg['ease'] : undefined;
  return [
    ...monsters(key, pointer),
    ...monsters(leg, `${pointer}/leg`),
    ...monsters(ease, `${pointer}/leg/ease`),
  ];
}

/** A part itself, and the lists and parts directly in it that nobody looks into further. */
function monsters(part: unknown, pointer: string): Fault[] {
  if (!isRecord(part)) return [];
  const names = Object.keys(part);
  if (names.length > MONSTROUS)
    return [{ pointer, detail: `must not have more than ${MONSTROUS} members, has ${names.length}` }];
  return names.flatMap(name => {
    const size = name === FOREIGN || (pointer === '' && name === 'keys') ? 0 : sizeOf(part[name]);
    return size > MONSTROUS
      ? [
          {
            pointer: pointerTo(pointer, name),
            detail: `must not have more than ${MONSTROUS} entries, has ${size}`,
          },
        ]
      : [];
  });
}

function sizeOf(value: unknown): number {
  return Array.isArray(value) ? value.length : 0;
}
