import { type Key, type MoveDocument } from '#schemas/move';
import { type SavedKey, type SavedMove } from '#schemas/saved-move';
import { DEG_PER_RAD, RAD_PER_DEG } from '#shared/conventions';
import { fovFromZoom, zoomFromFov } from '#shared/projection/field-of-view';
import { defined } from './defined';
import { type Fault } from './fault';
import { reversedKeys } from './reversed-legs';
import { forget, remember } from './saved-memory';
import { firstCollision, framesAfterFirst, shortestRange } from './saved-places';
import { type Checked, checkMove } from './validate';

/** How a saved move is put on a shot. */
export interface Application {
  /** Source frames of its first and its last key; a saved move of one key stands at the first. */
  readonly firstFrame: number;
  readonly lastFrame: number;
  /** Where it starts to look. */
  readonly yawDeg: number;
  /** Left for right: yaw, counted from where it starts to look, and roll change sides. */
  readonly mirrored: boolean;
  readonly reversed: boolean;
  /** Factor of yaw, pitch and roll, each counted from the first key; over 0. */
  readonly scale: number;
  /**
   * Whose field of view rules: `own` keeps the saved move's, and its deliverables, which it is meant for; `shot` keeps
   * the deliverables of the move that it is put on and starts at that move's first field of view, zooming as much as
   * the saved move does. The eye point is the saved move's in either case.
   */
  readonly fieldOfView: 'own' | 'shot';
}

/** Applying as it is: it starts where said, and nothing else is changed. */
export const PLAIN = {
  yawDeg: 0,
  mirrored: false,
  reversed: false,
  scale: 1,
  fieldOfView: 'own',
} as const satisfies Omit<Application, 'firstFrame' | 'lastFrame'>;

const LARGEST_SCALE = 100;

/**
 * Puts a saved move on a shot.
 *
 * @param saved as `checkSavedMove` accepts
 * @param onto the move whose shot it is put on
 * @returns a move document, or what keeps it from being one: with the pointer of the saved move's part where it cannot
 *   be applied so, of the document's part where it would be out of range there
 */
export function applySavedMove(saved: SavedMove, onto: MoveDocument, how: Application): Checked {
  const wrong = applicationFaults(saved, how);
  if (wrong.length > 0) return { ok: false, faults: wrong };
  const turned = how.reversed ? reversedKeys(saved.keys) : saved;
  if ('faults' in turned) return { ok: false, faults: turned.faults };
  const { keys } = turned;
  const length = how.lastFrame - how.firstFrame;
  const tooTight = collisionFault(keys, length);
  if (tooTight) return { ok: false, faults: [tooTight] };
  const plain = isPlain(how);
  return checkMove({
    format: 'fairlead.move',
    version: 1,
    title: saved.title,
    ...(saved.notes === undefined ? {} : { notes: saved.notes }),
    shot: onto.shot,
    deliverables: how.fieldOfView === 'own' ? saved.deliverables : onto.deliverables,
    keys: keys.map((key): Key => ({
      frame: how.firstFrame + framesAfterFirst(key.at, length),
      ...placed(key, keys[0], how),
      ...withFov(key, keys[0], how.fieldOfView === 'own' ? undefined : onto.keys[0].fov),
      ...(key.rest === undefined ? {} : { rest: key.rest }),
      ...(key.leg ? { leg: key.leg } : {}),
      ...keyExtensions(key, plain),
    })),
    extensions: remember(saved.extensions, documentMemory(saved, plain)),
  });
}

function isPlain({ mirrored, reversed, scale, fieldOfView }: Application): boolean {
  return !mirrored && !reversed && scale === 1 && fieldOfView === 'own';
}

function applicationFaults(saved: SavedMove, { firstFrame, lastFrame, scale }: Application): Fault[] {
  const wrong = (detail: string): Fault[] => [{ pointer: '', detail }];
  if (!(scale > 0 && scale <= LARGEST_SCALE))
    return wrong(`the scale must be over 0, to ${LARGEST_SCALE}, is ${scale}`);
  if (saved.keys.length > 1 && !(lastFrame > firstFrame))
    return wrong(`the last frame must be after the first (${firstFrame}), is ${lastFrame}`);
  return [];
}

function collisionFault(keys: readonly SavedKey[], length: number): Fault | undefined {
  const places = keys.map(key => key.at);
  const at = firstCollision(places, length);
  if (at === undefined) return undefined;
  const enough = shortestRange(places);
  const remedy =
    enough === undefined
      ? 'no shot is long enough for both'
      : `the smallest range that works is ${enough} frames from first to last`;
  return {
    pointer: `/keys/${at}/at`,
    detail: `would fall on the frame of the key before; ${remedy}, this one is ${length}`,
  };
}

/** Adding 0 turns −0 into 0. */
function placed(key: SavedKey, first: SavedKey, { yawDeg, mirrored, scale }: Application) {
  const side = mirrored ? -1 : 1;
  return {
    yaw: yawDeg + side * scale * (key.yaw - first.yaw) + 0,
    pitch: scale === 1 ? key.pitch : first.pitch + scale * (key.pitch - first.pitch) + 0,
    roll: side * (scale === 1 ? key.roll : first.roll + scale * (key.roll - first.roll)) + 0,
  };
}

/** @param startDeg field of view of the first key; the key's own unless said */
function withFov({ fov, eye }: SavedKey, first: SavedKey, startDeg?: number): { fov: number; eye: number } {
  if (startDeg === undefined) return { fov, eye };
  if (fov === first.fov) return { fov: startDeg, eye };
  const zoomed =
    zoomFromFov(startDeg * RAD_PER_DEG) +
    zoomFromFov(fov * RAD_PER_DEG) -
    zoomFromFov(first.fov * RAD_PER_DEG);
  return { fov: fovFromZoom(zoomed) * DEG_PER_RAD, eye };
}

function keyExtensions(key: SavedKey, plain: boolean): Pick<Key, 'extensions'> {
  const { at, yaw, pitch, roll } = key;
  const extensions = plain ? remember(key.extensions, { at, yaw, pitch, roll }) : forget(key.extensions);
  return extensions ? { extensions } : {};
}

/** Who made it, on which terms and under which words always; what holds of it unchanged only then. */
function documentMemory({ tags, author, licence, usual, turns }: SavedMove, plain: boolean): object {
  return defined(plain ? { tags, author, licence, usual, turns } : { tags, author, licence });
}
