import { type MoveDocument } from '#schemas/move';
import { type Shot, type ShotChanges, type ShotDraft } from '#schemas/api/shots';
import { checkMove } from '#shared/document/validate';
import { type Fault } from '#shared/document/fault';

/** What a person says of a shot. */
export type ShotFacts = Required<ShotDraft>;

/** The facts of a draft, with what is left out: the whole shot, at its own speed, levelled. */
export function factsOf(draft: ShotDraft): ShotFacts {
  return {
    title: draft.title,
    rate: draft.rate,
    frames: draft.frames,
    speed: draft.speed ?? 1,
    from: draft.from ?? 0,
    to: draft.to ?? draft.frames - 1,
    start: draft.start ?? (draft.dropFrame ? '00:00:00;00' : '00:00:00:00'),
    dropFrame: draft.dropFrame ?? false,
    source: draft.source,
    level: draft.level ?? [0, 0, 0, 1],
    seamYaw: draft.seamYaw ?? null,
    loops: draft.loops ?? false,
    exposure: draft.exposure ?? null,
    interval: draft.interval ?? null,
    notes: draft.notes ?? '',
  };
}

/**
 * A shot's facts after a change. A shot that was delivered whole stays so when its length changes.
 *
 * @param shot as stored
 */
export function changedFacts(shot: Shot, changes: ShotChanges): ShotFacts {
  const to = shot.to === shot.frames - 1 && changes.frames !== undefined ? changes.frames - 1 : shot.to;
  return factsOf({ ...shot, to, ...changes });
}

/** The shot as a move document tells it; what is not known is left out. */
export function documentShot(facts: ShotFacts): MoveDocument['shot'] {
  const { title, rate, frames, speed, from, to, start, dropFrame, source, level, loops } = facts;
  return {
    ...{ title, rate, frames, speed, from, to, start, dropFrame, source, level, loops },
    ...(facts.seamYaw === null ? {} : { seamYaw: facts.seamYaw }),
    ...(facts.exposure === null ? {} : { exposure: facts.exposure }),
    ...(facts.interval === null ? {} : { interval: facts.interval }),
  };
}

/**
 * Faults of a shot's facts, by the rules of the move document: a shot that no move could be made on is refused here.
 *
 * @returns faults with pointers into the shot
 */
export function shotFaults(facts: ShotFacts): Fault[] {
  const checked = checkMove({
    format: 'fairlead.move',
    version: 1,
    title: facts.title,
    shot: documentShot(facts),
    deliverables: [{ name: 'Wide', width: 1920, height: 1080 }],
    keys: [{ frame: 0, yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 }],
  });
  if (checked.ok) return [];
  const ofShot = checked.faults.filter(fault => fault.pointer.startsWith('/shot/'));
  return ofShot.map(({ pointer, detail }) => ({ pointer: pointer.slice('/shot'.length), detail }));
}
