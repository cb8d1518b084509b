import { type Key, type Leg, type MoveDocument } from '#schemas/move';

/** A key looking ahead, with what a test cares about put over it. */
export function key(frame: number, over: Partial<Key> = {}): Key {
  return { frame, yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0, ...over };
}

/** Keys joined by the same leg; the last has none. */
export function joined(keys: readonly Key[], leg: Leg): Key[] {
  return keys.map((each, i) => (i === keys.length - 1 ? each : { ...each, leg }));
}

/** A whole valid document around keys, on a 24 fps shot as long as they need. */
export function moveWith(keys: Key[], over: Partial<MoveDocument> = {}): MoveDocument {
  return {
    format: 'fairlead.move',
    version: 1,
    title: 'Test',
    shot: {
      title: 'Shot',
      rate: { num: 24, den: 1 },
      frames: keys[keys.length - 1].frame + 1,
      speed: 1,
      source: { width: 6144, height: 3072 },
    },
    deliverables: [{ name: 'Wide', width: 1920, height: 1080 }],
    keys,
    ...over,
  };
}
