/**
 * OpenTimelineIO's objects as JSON, each with the members that its own writer gives it.
 *
 * @see OpenTimelineIO, "Serialized Data Documentation"
 */

/** A count of frames at a rate; whole or not. */
interface RationalTime {
  readonly OTIO_SCHEMA: 'RationalTime.1';
  readonly rate: number;
  readonly value: number;
}

/** What an object carries for one program, under that program's name. */
export type Metadata = Readonly<Record<string, object>>;

export function rationalTime(value: number, rate: number): RationalTime {
  return { OTIO_SCHEMA: 'RationalTime.1', rate, value };
}

/** @param duration frames; 0 marks a point */
export function timeRange(start: number, duration: number, rate: number) {
  return {
    OTIO_SCHEMA: 'TimeRange.1',
    duration: rationalTime(duration, rate),
    start_time: rationalTime(start, rate),
  } as const;
}

type TimeRange = ReturnType<typeof timeRange>;

/** What items, on tracks and tracks themselves, have in common. */
function item(schema: string, name: string, sourceRange: TimeRange | null) {
  return {
    OTIO_SCHEMA: schema,
    metadata: {},
    name,
    source_range: sourceRange,
    effects: [],
    markers: [],
    enabled: true,
  };
}

export function timeline(name: string, globalStart: RationalTime, track: object, metadata: Metadata) {
  const tracks = { ...item('Stack.1', 'tracks', null), children: [track] };
  return { OTIO_SCHEMA: 'Timeline.1', metadata, name, global_start_time: globalStart, tracks };
}

export function videoTrack(name: string, clips: readonly object[]) {
  return { ...item('Track.1', name, null), children: clips, kind: 'Video' };
}

/** What a clip has beside its name and its range. */
export interface ClipParts {
  readonly media: object;
  readonly effects: readonly object[];
  readonly markers: readonly object[];
  readonly metadata: Metadata;
}

export function clip(name: string, sourceRange: TimeRange, { media, ...parts }: ClipParts) {
  const references = { media_references: { DEFAULT_MEDIA: media } };
  const active = { active_media_reference_key: 'DEFAULT_MEDIA' };
  return { ...item('Clip.2', name, sourceRange), ...parts, ...references, ...active };
}

/** Media of which no file is known, but the frames that it has. */
export function missingReference(name: string, availableRange: TimeRange, metadata: Metadata) {
  return {
    OTIO_SCHEMA: 'MissingReference.1',
    metadata,
    name,
    available_range: availableRange,
    available_image_bounds: null,
  };
}

/** @param timeScalar 2 plays twice as fast */
export function linearTimeWarp(timeScalar: number) {
  return {
    OTIO_SCHEMA: 'LinearTimeWarp.1',
    metadata: {},
    name: 'Speed',
    effect_name: 'LinearTimeWarp',
    time_scalar: timeScalar,
  };
}

export function marker(name: string, comment: string, markedRange: TimeRange, metadata: Metadata) {
  return { OTIO_SCHEMA: 'Marker.2', metadata, name, color: 'CYAN', comment, marked_range: markedRange };
}
