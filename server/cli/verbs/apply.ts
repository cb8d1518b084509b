import { applySavedMove } from '#shared/document/apply-saved-move';
import { serialiseMove } from '#shared/document/serialise';
import { print } from '../output';
import { faultsInOneLine, readMove, readSavedMove } from '../read-document';
import { choice, numberOption, readWords, UsageError, wanted } from '../usage';

const OPTIONS = ['shot', 'from', 'to', 'yaw', 'scale', 'fov'];
const FLAGS = ['mirror', 'reverse'];

/**
 * `apply SAVED --shot FILE --from N --to N [--yaw D] [--mirror] [--reverse] [--scale S] [--fov own|shot]`: a move document
 * on standard output.
 */
export function apply(args: readonly string[]): number {
  const words = readWords(args, OPTIONS, FLAGS);
  const fieldOfView = choice(words, 'fov', ['own', 'shot']);
  const how = {
    firstFrame: numberOption(words, 'from'),
    lastFrame: numberOption(words, 'to'),
    yawDeg: numberOption(words, 'yaw', 0),
    scale: numberOption(words, 'scale', 1),
    mirrored: words.flags.has('mirror'),
    reversed: words.flags.has('reverse'),
    fieldOfView,
  };
  const saved = readSavedMove(words.file);
  const onto = readMove(wanted(words, 'shot'));
  const applied = applySavedMove(saved, onto, how);
  if (!applied.ok)
    throw new UsageError(`The saved move cannot be applied so: ${faultsInOneLine(applied.faults)}`);
  print([serialiseMove(applied.document)]);
  return 0;
}
