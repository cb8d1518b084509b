import { type Fault } from '#shared/document/fault';

/** Lists and objects within one another. A document of ours has 6; extensions may go further, but not without end. */
const MOST_LEVELS = 100;

/**
 * Finds values nested so deeply that neither JSON's writer nor the database could take them. Never recurses itself.
 *
 * @param value parsed JSON
 * @returns one fault naming the top member that goes too deep, or undefined
 */
export function nestingFault(value: object): Fault | undefined {
  for (const [name, member] of Object.entries(value)) {
    let level: unknown[] = [member];
    for (let depth = 1; level.length > 0; depth++) {
      if (depth > MOST_LEVELS) {
        return { pointer: `/${name}`, detail: `must be at most ${MOST_LEVELS} levels deep, goes deeper` };
      }
      level = level.flatMap(membersOf);
    }
  }
  return undefined;
}

function membersOf(value: unknown): unknown[] {
  return typeof value === 'object' && value !== null ? Object.values(value) : [];
}
