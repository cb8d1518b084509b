import { type Key } from '#schemas/move';
import { deliverableFaults } from './deliverable-rules';
import { type Fault } from './fault';
import { keyFaults } from './key-rules';
import { shotFaults } from './shot-rules';
import { eachPart, isNumber, isWhole, partOf, partsOf, type Unsure } from './unsure';

/**
 * The rules of a move document that its schema cannot say.
 *
 * @param keyCount how many keys there are; more than the document holds where the rest was not read
 */
export function moveRuleFaults(document: object, keyCount: number | undefined): Fault[] {
  const {
    shot: givenShot,
    deliverables,
    keys,
  }: { shot?: unknown; deliverables?: unknown; keys?: unknown } = document;
  const shot = partOf(givenShot);
  const parts = partsOf(keys);
  return [
    ...shotFaults(shot),
    ...deliverableFaults(deliverables),
    ...frameFaults(parts, isWhole(shot['frames']) ? shot['frames'] : undefined),
    ...eachPart(keys, (key, i) => keyFaults(key, `/keys/${i}`, i + 1 === keyCount)),
  ];
}

/** Frames rise and are inside the shot. */
function frameFaults(keys: readonly Unsure<Key>[], frames: number | undefined): Fault[] {
  const faults: Fault[] = [];
  let before: number | undefined;
  keys.forEach(({ frame }, i) => {
    if (!isNumber(frame)) return;
    const wrong = (detail: string) => faults.push({ pointer: `/keys/${i}/frame`, detail });
    if (before !== undefined && frame <= before) wrong(`must be after frame ${before}, is ${frame}`);
    if (frames !== undefined && frame >= frames)
      wrong(`must be inside the shot (0 to ${frames - 1}), is ${frame}`);
    before = Math.max(frame, before ?? frame);
  });
  return faults;
}
