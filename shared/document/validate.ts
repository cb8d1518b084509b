import { type MoveDocument } from '#schemas/move';
import { validate } from '#schemas/move-validator';
import { type CheckedAs, checkDocument, type DocumentKind } from './check-document';
import { moveRuleFaults } from './rules';

/** Version 1 is the first: nothing leads to it yet. */
const MOVE: DocumentKind<MoveDocument> = {
  format: 'fairlead.move',
  noun: 'a move document',
  upgrades: [],
  validate,
  ruleFaults: moveRuleFaults,
};

export type Checked = CheckedAs<MoveDocument>;

/**
 * Checks whether a value is a move document.
 *
 * @returns as `checkDocument` does; never throws
 */
export function checkMove(value: unknown): Checked {
  return checkDocument(value, MOVE);
}
