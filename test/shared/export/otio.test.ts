import Timecode from 'smpte-timecode';
import { MathUtils } from 'three';

import { type MoveDocument } from '#schemas/move';
import { UnknownDeliverable } from '#shared/document/deliverable-named';
import { timelineOtio } from '#shared/export/otio';
import { changed, fullMove, quayMove } from '../../support/documents';
import { joined, key, moveWith } from '../../support/moves';

interface Time {
  readonly value: number;
  readonly rate: number;
}

interface Range {
  readonly start_time: Time;
  readonly duration: Time;
}

interface Told {
  readonly key: number;
  readonly frame: number;
  readonly timecode: string;
  readonly seconds: number;
  readonly fov: number;
  readonly leg?: unknown;
}

interface Marker {
  readonly name: string;
  readonly comment: string;
  readonly marked_range: Range;
  readonly metadata: { readonly fairlead: Told };
}

interface Clip {
  readonly name: string;
  readonly source_range: Range;
  readonly effects: { readonly OTIO_SCHEMA: string; readonly time_scalar: number }[];
  readonly markers: Marker[];
  readonly metadata: { readonly fairlead: { readonly keysOutside: Told[] } };
  readonly media_references: Record<string, { readonly name: string; readonly available_range: Range }>;
  readonly active_media_reference_key: string;
}

interface Timeline {
  readonly name: string;
  readonly global_start_time: Time;
  readonly tracks: { readonly children: { readonly kind: string; readonly children: Clip[] }[] };
}

const read = (move: MoveDocument, deliverable?: string) =>
  JSON.parse(timelineOtio(move, deliverable)) as Timeline;
const clipOf = (move: MoveDocument, deliverable?: string) =>
  read(move, deliverable).tracks.children[0].children[0];
const withShot = (move: MoveDocument, shot: Partial<MoveDocument['shot']>): MoveDocument => ({
  ...move,
  shot: { ...move.shot, ...shot },
});

/**
 * Members of OTIO's own objects, from its "Serialized Data Documentation" (0.17), and what may stand at each: another
 * object, a list of them, nothing, or a plain type.
 */
const ITEM = {
  metadata: ['dictionary'],
  name: ['string'],
  source_range: ['TimeRange.1', 'null'],
  effects: ['LinearTimeWarp.1[]'],
  markers: ['Marker.2[]'],
  enabled: ['boolean'],
};
const MEMBERS: Readonly<Record<string, Readonly<Record<string, readonly string[]>>>> = {
  'Timeline.1': {
    metadata: ['dictionary'],
    name: ['string'],
    global_start_time: ['RationalTime.1', 'null'],
    tracks: ['Stack.1'],
  },
  'Stack.1': { ...ITEM, children: ['Track.1[]'] },
  'Track.1': { ...ITEM, children: ['Clip.2[]'], kind: ['string'] },
  'Clip.2': { ...ITEM, media_references: ['dictionary'], active_media_reference_key: ['string'] },
  'MissingReference.1': {
    metadata: ['dictionary'],
    name: ['string'],
    available_range: ['TimeRange.1', 'null'],
    available_image_bounds: ['null'],
  },
  'LinearTimeWarp.1': {
    metadata: ['dictionary'],
    name: ['string'],
    effect_name: ['string'],
    time_scalar: ['number'],
  },
  'Marker.2': {
    metadata: ['dictionary'],
    name: ['string'],
    color: ['string'],
    comment: ['string'],
    marked_range: ['TimeRange.1'],
  },
  'TimeRange.1': { start_time: ['RationalTime.1'], duration: ['RationalTime.1'] },
  'RationalTime.1': { value: ['number'], rate: ['number'] },
};

function schemaOf(value: object): string | undefined {
  const schema: unknown = Reflect.get(value, 'OTIO_SCHEMA');
  return schema === undefined ? undefined : JSON.stringify(schema).replaceAll('"', '');
}

function isOfType(value: unknown, type: string): boolean {
  if (type.endsWith('[]'))
    return Array.isArray(value) && value.every(each => isOfType(each, type.slice(0, -2)));
  if (value === null || typeof value !== 'object') return (value === null ? 'null' : typeof value) === type;
  return !Array.isArray(value) && type === (schemaOf(value) ?? 'dictionary');
}

/** @returns what breaks the table above, in all objects of a timeline */
function structureFaults(value: unknown, pointer = ''): string[] {
  if (typeof value !== 'object' || value === null) return [];
  const inner = Object.entries(value).flatMap(([name, part]) => structureFaults(part, `${pointer}/${name}`));
  const schema = schemaOf(value);
  if (schema === undefined) return inner;
  const members = MEMBERS[schema] ?? {};
  const names = Object.keys(value).filter(name => name !== 'OTIO_SCHEMA');
  if (names.sort().join() !== Object.keys(members).sort().join())
    inner.push(`${pointer}: members of ${schema}`);
  for (const [name, types] of Object.entries(members)) {
    const part: unknown = Reflect.get(value, name);
    if (!types.some(type => isOfType(part, type))) inner.push(`${pointer}/${name}: ${types.join()}`);
  }
  return inner;
}

describe('the structure', () => {
  it.each([
    ['one turn with a dip', quayMove()],
    ['every member of a document', fullMove()],
    ['a still', moveWith([key(0)])],
  ])('is OTIO’s, with all members of each object and no others: %s', (_what, move) => {
    for (const { name } of move.deliverables) {
      const timeline: unknown = JSON.parse(timelineOtio(move, name));
      expect(structureFaults(timeline)).toEqual([]);
      expect(isOfType(timeline, 'Timeline.1')).toBe(true);
    }
  });

  it('is one clip of missing media, to be linked, on one video track', () => {
    const { tracks, name } = read(quayMove());
    expect(name).toBe('Quay, one turn with a dip');
    expect(tracks.children.map(track => [track.kind, track.children.length])).toEqual([['Video', 1]]);
    const clip = clipOf(quayMove());
    expect(clip.name).toBe('Quay at blue hour');
    const media = clip.media_references[clip.active_media_reference_key];
    expect(media).toMatchObject({ OTIO_SCHEMA: 'MissingReference.1', name: 'Quay at blue hour' });
  });

  it('has no deliverable of a name that the move does not name', () => {
    expect(() => timelineOtio(quayMove(), 'Square')).toThrow(UnknownDeliverable);
    expect(read(quayMove(), 'Tall').tracks.children[0]).toMatchObject({ name: 'Tall' });
  });

  // A reader takes any object with this member for one of OTIO's.
  it('keeps what other programs store in the document out', () => {
    const extensions = { OTIO_SCHEMA: 5 };
    const move = changed(fullMove(), {
      '/extensions': extensions,
      '/shot/extensions': extensions,
      '/deliverables/0/extensions': extensions,
      '/keys/0/extensions': extensions,
      '/keys/0/leg/extensions': extensions,
    }) as MoveDocument;
    expect(timelineOtio(move)).toBe(timelineOtio(fullMove()));
  });
});

describe('ranges and speed', () => {
  // OTIO's effects leave ranges alone: media used = duration · scalar. 240 steps of 6 frames, and the last: 241.
  it('stand on the track for the delivered film, and take the source from its first frame on', () => {
    const { source_range, effects } = clipOf(quayMove());
    const hour = 24 * 3600;
    expect(source_range.start_time).toMatchObject({ value: hour, rate: 24 });
    expect(source_range.duration).toMatchObject({ value: 241, rate: 24 });
    expect(effects).toMatchObject([{ OTIO_SCHEMA: 'LinearTimeWarp.1', time_scalar: 6 }]);
    expect(clipOf(quayMove()).media_references['DEFAULT_MEDIA'].available_range).toMatchObject({
      start_time: { value: hour, rate: 24 },
      duration: { value: 1441, rate: 24 },
    });
  });

  // 00:59:00;02 at 29.97 drop-frame is the frame that smpte-timecode gives this label.
  it('count the frames of drop-frame timecode at a rate that is a ratio', () => {
    const start = 106_094; // 59 · 1800 + 2 labels, less 2 in each of the 54 minutes that drop
    expect(new Timecode(start, 29.97, true).toString()).toBe('00:59:00;02');
    const { source_range, effects, media_references } = clipOf(fullMove());
    expect(media_references['DEFAULT_MEDIA'].available_range.start_time).toMatchObject({
      value: start,
      rate: 30000 / 1001,
    });
    expect(source_range.start_time.value).toBe(start + 10);
    expect(source_range.duration.value).toBe(2153); // floor(5380 / 2.5) + 1
    expect(effects[0].time_scalar).toBe(2.5);
  });

  it('begin the timeline at the timecode of its first frame, within the day', () => {
    expect(read(quayMove()).global_start_time).toMatchObject({ value: 24 * 3600, rate: 24 });
    const late = withShot(quayMove(), { start: '23:59:59:00', from: 100 });
    expect(read(late).global_start_time.value).toBe(100 - 24);
    // The media do not begin anew at midnight: their range holds the clip's.
    expect(clipOf(late).source_range.start_time.value).toBe(24 * 86_400 - 24 + 100);
  });
});

describe('markers', () => {
  it('stand at each key, as points, in the clip’s frames: delivered ones after its start', () => {
    const { markers, metadata } = clipOf(quayMove());
    const hour = 24 * 3600;
    expect(markers.map(({ name }) => name)).toEqual(['Key 1', 'Key 2', 'Key 3']);
    expect(markers.map(({ marked_range }) => marked_range.start_time.value)).toEqual([
      hour,
      hour + 120,
      hour + 240,
    ]);
    for (const { marked_range } of markers)
      expect(marked_range.duration).toMatchObject({ value: 0, rate: 24 });
    expect(metadata.fairlead.keysOutside).toEqual([]);
  });

  it('tell the key’s numbers and where it stands in source and film', () => {
    expect(clipOf(quayMove()).markers[1].metadata.fairlead).toEqual({
      key: 2,
      frame: 720,
      timecode: '01:00:30:00', // 720 / 24 s
      seconds: 5, // 30 / 6
      yaw: 180,
      pitch: -8,
      roll: 0,
      fov: 100,
      eye: 0.2,
      rest: false,
      leg: { path: 'level', ease: 'fair' },
    });
    expect(clipOf(quayMove()).markers[2].metadata.fairlead.leg).toBeUndefined();
    expect(clipOf(quayMove()).markers[1].comment).toBe(
      'yaw 180°, pitch -8°, roll 0°, field of view 100°, eye point 0.2',
    );
  });

  // At eye point 0, matched by height: tan(fov/2) shrinks by the aspects' ratio, (9/16)².
  it('tell the field of view of the deliverable that is asked for', () => {
    const move = { ...quayMove(), keys: [key(0, { fov: 100 })] };
    const half = Math.atan(Math.tan(MathUtils.degToRad(50)) * (9 / 16) ** 2);
    const { fov } = clipOf(move, 'Tall').markers[0].metadata.fairlead;
    expect(fov).toBeCloseTo(MathUtils.radToDeg(2 * half), 10);
  });

  // Source frames 10 to 40 at 2.5 times the speed: frame 23 is (23 − 10) / 2.5 = 5.2 delivered frames on.
  it('leave keys outside the delivered range to the clip’s metadata, and stand between frames', () => {
    const keys = [0, 9, 10, 23, 40, 41].map(frame => key(frame, { yaw: frame }));
    const move = moveWith(joined(keys, { path: 'arc', ease: 'linear' }));
    const { markers, metadata, source_range } = clipOf(withShot(move, { from: 10, to: 40, speed: 2.5 }));
    expect(markers.map(each => [each.name, each.marked_range.start_time.value])).toEqual([
      ['Key 3', 10],
      ['Key 4', 15.2],
      ['Key 5', 22],
    ]);
    expect([source_range.start_time.value, source_range.duration.value]).toEqual([10, 13]);
    const outside = metadata.fairlead.keysOutside.map(told => [told.key, told.frame, told.seconds]);
    expect(outside).toEqual([
      [1, 0, -10 / 60],
      [2, 9, -1 / 60],
      [6, 41, 31 / 60],
    ]);
  });

  // 21 / 0.7 is 30, but 30.000000000000004 in doubles.
  it('stand on whole frames where only the speed’s decimals keep them off', () => {
    const keys = Array.from({ length: 50 }, (_, i) => key(i, { yaw: i }));
    const move = moveWith(joined(keys, { path: 'level', ease: 'linear' }));
    const values = clipOf(withShot(move, { speed: 0.7 })).markers.map(
      each => each.marked_range.start_time.value,
    );
    expect(values.filter((_, i) => i % 7 === 0)).toEqual([0, 10, 20, 30, 40, 50, 60, 70]);
  });
});
