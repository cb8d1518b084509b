import { type Shot } from '#schemas/api/shots';
import { type MoveDocument, type Shot as DocumentShot } from '#schemas/move';
import { checkMove, type Checked } from '#shared/document/validate';

/** @returns what a move document says of a shot */
export function documentShot(shot: Shot): DocumentShot {
  const { title, rate, frames, speed, from, to, start, dropFrame, source, level, seamYaw, loops } = shot;
  const known = { seamYaw, exposure: shot.exposure, interval: shot.interval };
  return {
    ...{ title, rate, frames, speed, from, to, start, dropFrame, source, level, loops },
    ...Object.fromEntries(Object.entries(known).filter(([, value]) => value !== null)),
  };
}

/**
 * Reads a file as a move for a shot: the keys and deliverables are the file's, the shot is this one's.
 *
 * @returns the move on this shot, or the faults: of the file, or of keys that do not fit this shot
 */
export function moveOnShot(text: string, shot: Shot): Checked {
  let value: unknown;
  try {
    value = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    return {
      ok: false,
      faults: [{ pointer: '', detail: `is not JSON: ${error instanceof Error ? error.message : ''}` }],
    };
  }
  const checked = checkMove(value);
  return checked.ok ? checkMove(withShot(checked.document, shot)) : checked;
}

function withShot(document: MoveDocument, shot: Shot): MoveDocument {
  return { ...document, shot: documentShot(shot) };
}
