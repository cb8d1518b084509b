import { type Key, type MoveDocument } from '#schemas/move';
import { DEG_PER_RAD, RAD_PER_DEG } from '#shared/conventions';
import { deliverableNamed } from '#shared/document/deliverable-named';
import { decimalText } from '#shared/document/number-text';
import { shotTimes } from '#shared/document/shot-times';
import { halfWidthRatio, matchedFovRad } from '#shared/projection/deliverable-framing';
import { deliveredFrameCount, deliveredOfSourceFrame, deliveredSeconds } from '#shared/time/delivered-time';
import { framesPerSecond } from '#shared/time/frame-rate';
import { framesPerDay, timecodeFromFrame } from '#shared/time/timecode';
import * as otio from './otio-objects';

/** A key as the timeline tells it: where it stands in source and film, and its numbers for the deliverable. */
interface ToldKey {
  /** From 1. */
  readonly key: number;
  readonly frame: number;
  readonly timecode: string;
  readonly seconds: number;
  readonly yaw: number;
  readonly pitch: number;
  readonly roll: number;
  readonly fov: number;
  readonly eye: number;
  readonly rest: boolean;
  readonly leg?: Pick<NonNullable<Key['leg']>, 'path' | 'ease'>;
}

/**
 * The delivered film as an OpenTimelineIO timeline of one clip: JSON text.
 *
 * OTIO's effects leave ranges alone: a clip stands on its track for its own `source_range`, and the media that it takes
 * is that duration times the warp's scalar. So the range begins at the timecode of `from`, is as long as the delivered
 * film, and a key's marker, which shares the clip's frames, stands as many of them after the range's start as the film
 * needs to get there (not always a whole number). Which source frame that is, is in the marker's metadata.
 *
 * Keys outside the delivered range have no marker: the clip does not show them, and readers drop such markers or put
 * them on another frame. They are in the clip's metadata instead, as "keysOutside".
 *
 * The document knows no file, so the media are a missing reference with the shot's title and frames, to be linked. The
 * timeline starts at the timecode of its first frame. What other programs keep under `extensions` stays out: an
 * "OTIO_SCHEMA" in there would be read as OTIO's.
 *
 * @param document a valid one
 * @param deliverableName the first deliverable unless said
 * @throws UnknownDeliverable
 * @see OpenTimelineIO, "Serialized Data Documentation"
 */
export function timelineOtio(document: MoveDocument, deliverableName?: string): string {
  const { name } = deliverableNamed(document, deliverableName);
  const { from, startFrame, count } = shotTimes(document.shot);
  const start = otio.rationalTime((startFrame + from) % framesPerDay(count), framesPerSecond(count.rate));
  const track = otio.videoTrack(name, [clipOf(document, deliverableName)]);
  const notes = { fairlead: { notes: document.notes ?? '' } };
  return `${JSON.stringify(otio.timeline(document.title, start, track, notes), null, 2)}\n`;
}

function clipOf(document: MoveDocument, deliverableName?: string): object {
  const { shot } = document;
  const times = shotTimes(shot);
  const fps = framesPerSecond(shot.rate);
  const first = times.startFrame + times.from;
  const keys = toldKeys(document, deliverableName);
  const isInside = ({ frame }: ToldKey) => frame >= times.from && frame <= times.to;
  const keysOutside = keys.filter(key => !isInside(key));
  return otio.clip(shot.title, otio.timeRange(first, deliveredFrameCount(times), fps), {
    media: mediaOf(document),
    effects: [otio.linearTimeWarp(shot.speed)],
    markers: keys.filter(isInside).map(told => {
      // Without the noise of decimal speeds, which could cost a frame where it is rounded down.
      const after = Number(deliveredOfSourceFrame(times, told.frame).toFixed(9));
      return otio.marker(`Key ${told.key}`, spoken(told), otio.timeRange(first + after, 0, fps), {
        fairlead: told,
      });
    }),
    metadata: { fairlead: { ...deliveryOf(document, deliverableName), keysOutside } },
  });
}

function mediaOf({ shot }: MoveDocument): object {
  const { startFrame } = shotTimes(shot);
  const range = otio.timeRange(startFrame, shot.frames, framesPerSecond(shot.rate));
  const { width, height } = shot.source;
  return otio.missingReference(shot.title, range, {
    fairlead: { projection: 'equirectangular', width, height },
  });
}

/** What the clip's range and warp round or leave out. */
function deliveryOf(document: MoveDocument, deliverableName?: string): object {
  const { rate, speed, level = [0, 0, 0, 1] } = document.shot;
  const { from, to } = shotTimes(document.shot);
  const { name, width, height } = deliverableNamed(document, deliverableName);
  return {
    rate: { num: rate.num, den: rate.den },
    speed,
    from,
    to,
    level,
    deliverable: { name, width, height },
  };
}

function toldKeys(document: MoveDocument, deliverableName?: string): ToldKey[] {
  const times = shotTimes(document.shot);
  const deliverable = deliverableNamed(document, deliverableName);
  const ratio = halfWidthRatio(document.deliverables[0], deliverable);
  return document.keys.map(({ frame, yaw, pitch, roll, fov, eye, rest = false, leg }, i) => ({
    key: i + 1,
    frame,
    timecode: timecodeFromFrame(times.startFrame + frame, times.count),
    seconds: deliveredSeconds(times, frame),
    yaw,
    pitch,
    roll,
    fov: ratio === 1 ? fov : matchedFovRad(fov * RAD_PER_DEG, eye, ratio) * DEG_PER_RAD,
    eye,
    rest,
    leg: leg && { path: leg.path, ease: leg.ease },
  }));
}

/** For readers that show a marker's comment, not its metadata. */
function spoken({ yaw, pitch, roll, fov, eye }: ToldKey): string {
  const [ya, pi, ro, fo] = [yaw, pitch, roll, fov].map(angle => `${decimalText(angle, 3)}°`);
  return `yaw ${ya}, pitch ${pi}, roll ${ro}, field of view ${fo}, eye point ${decimalText(eye, 3)}`;
}
