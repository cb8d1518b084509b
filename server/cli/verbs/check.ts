import { checkMove } from '#shared/document/validate';
import { oneLine, print } from '../output';
import { readJson } from '../read-document';
import { readWords } from '../usage';

/** `check FILE`: each fault as `pointer: what is wrong`, exit code 1; else `ok`. */
export function check(args: readonly string[]): number {
  const { file } = readWords(args, []);
  const checked = checkMove(readJson(file));
  if (checked.ok) {
    print(['ok\n']);
    return 0;
  }
  print(checked.faults.map(fault => `${oneLine(`${fault.pointer}: ${fault.detail}`)}\n`));
  return 1;
}
