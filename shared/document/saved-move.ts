import { type SavedMove } from '#schemas/saved-move';
import { validate } from '#schemas/saved-move-validator';
import { type CheckedAs, checkDocument, type DocumentKind } from './check-document';
import { deliverableFaults } from './deliverable-rules';
import { type Fault } from './fault';
import { keyFaults } from './key-rules';
import { eachPart, isNumber } from './unsure';

/** Version 1 is the first: nothing leads to it yet. */
const SAVED_MOVE: DocumentKind<SavedMove> = {
  format: 'fairlead.saved-move',
  noun: 'a saved move',
  upgrades: [],
  validate,
  ruleFaults,
};

export type CheckedSavedMove = CheckedAs<SavedMove>;

/**
 * Checks whether a value is a saved move.
 *
 * @returns as `checkDocument` does; never throws
 */
export function checkSavedMove(value: unknown): CheckedSavedMove {
  return checkDocument(value, SAVED_MOVE);
}

function ruleFaults(document: object, keyCount: number | undefined): Fault[] {
  const { deliverables, keys }: { deliverables?: unknown; keys?: unknown } = document;
  return [
    ...deliverableFaults(deliverables),
    ...placeFaults(keys, keyCount),
    ...eachPart(keys, (key, i) => keyFaults(key, `/keys/${i}`, i + 1 === keyCount)),
  ];
}

/** Places rise from 0 to 1; yaw counts from the first key. */
function placeFaults(keys: unknown, keyCount: number | undefined): Fault[] {
  let before: number | undefined;
  return eachPart(keys, ({ at, yaw }, i) => {
    const faults: Fault[] = [];
    const wrong = (member: string, detail: string) =>
      faults.push({ pointer: `/keys/${i}/${member}`, detail });
    if (i === 0 && isNumber(yaw) && yaw !== 0)
      wrong('yaw', `must be 0, as yaw counts from the first key, is ${yaw}`);
    if (!isNumber(at) || at < 0 || at > 1) return faults;
    if (i === 0 && at !== 0) wrong('at', `must be 0 at the first key, is ${at}`);
    else if (i > 0 && i + 1 === keyCount && at !== 1) wrong('at', `must be 1 at the last key, is ${at}`);
    else if (before !== undefined && at <= before) wrong('at', `must be after ${before}, is ${at}`);
    before = Math.max(at, before ?? at);
    return faults;
  });
}
