import { type MoveDocument } from '#schemas/move';
import { largestShutterAngleDeg, shutterAngleDeg } from '#shared/capture/shutter';
import { DEG_PER_RAD } from '#shared/conventions';
import { type CompleteShotTimes, shotTimes } from '#shared/document/shot-times';
import { type CompiledMove, POSE_SIZE } from '#shared/path/compiled-move';
import { Rates, RATES_SIZE } from '#shared/path/rates';
import { firstDeliveredFrameFrom, sourceFramesPerDeliveredSecond } from '#shared/time/delivered-time';
import { framesPerSecond } from '#shared/time/frame-rate';
import { keyJolts } from './jolts';
import { CROSSING_LIMIT_RATES, SHUTTER_LIMIT_DEG } from './limits';
import { type MeasureName } from './measures';
import { type Worst } from './worst';

/** What a person should know beside the numbers. */
export interface Note {
  readonly kind:
    'cut' | 'fell-back' | 'strobing' | 'impossible-shutter' | 'rate' | 'seam' | 'tripod' | 'loop' | 'outside';
  readonly text: string;
  /** Source frame that it is about. */
  readonly sourceFrame?: number;
  /** Delivered frame, from 0, that shows it. */
  readonly frame?: number;
}

export function notesOf(
  document: MoveDocument,
  move: CompiledMove,
  worst: Readonly<Record<MeasureName, Worst>>,
): Note[] {
  const times = shotTimes(document.shot);
  return [
    ...outsideNotes(document, times),
    ...cutNotes(move, times),
    ...fallbackNotes(move, times),
    ...shutterNotes(document, times),
    ...rateNotes(times, worst.crossingTimeSec),
    ...seenNotes(worst),
    ...loopNotes(document, move, times),
  ];
}

function at(times: CompleteShotTimes, sourceFrame: number): { sourceFrame: number; frame: number } {
  return { sourceFrame, frame: firstDeliveredFrameFrom(times, sourceFrame) };
}

function isDelivered({ from, to }: CompleteShotTimes, sourceFrame: number): boolean {
  return sourceFrame >= from && sourceFrame <= to;
}

function outsideNotes({ keys }: MoveDocument, times: CompleteShotTimes): Note[] {
  const outside = keys.filter(key => !isDelivered(times, key.frame)).length;
  if (outside === 0) return [];
  const text = `${counted(outside, 'key stands', 'keys stand')} outside the delivered frames ${times.from} to ${times.to}; what happens at them is not measured.`;
  return [{ kind: 'outside', text }];
}

function cutNotes(move: CompiledMove, times: CompleteShotTimes): Note[] {
  return keyJolts(move)
    .filter(jolt => jolt.isCut && isDelivered(times, jolt.sourceFrame))
    .map(({ sourceFrame }) => ({
      kind: 'cut',
      text: `The held pose before source frame ${sourceFrame} is left by a cut.`,
      ...at(times, sourceFrame),
    }));
}

function fallbackNotes({ runs, keys }: CompiledMove, times: CompleteShotTimes): Note[] {
  return runs
    .filter(run => run.fellBack)
    .map(run => {
      const [first, last] = [keys[run.firstKey].frame, keys[run.lastKey].frame];
      const text = `The fair arcs from source frame ${first} to ${last} could not be made fair: their rate is continuous, their acceleration is not. Keys further apart in time, or closer in angle, would help.`;
      return {
        kind: 'fell-back',
        text,
        ...(isDelivered(times, first) ? at(times, first) : { sourceFrame: first }),
      };
    });
}

function shutterNotes({ shot }: MoveDocument, { intervalSec, speed }: CompleteShotTimes): Note[] {
  if (shot.exposure === undefined) return [];
  const angle = shutterAngleDeg(shot.exposure, intervalSec, speed);
  const largest = largestShutterAngleDeg(speed);
  if (angle > largest * (1 + 1e-9)) {
    const text = `An exposure of ${shot.exposure} s does not fit an interval of ${intervalSec} s: the shutter angle could be at most ${rounded(largest)}°.`;
    return [{ kind: 'impossible-shutter', text }];
  }
  if (angle >= SHUTTER_LIMIT_DEG) return [];
  const text = `With an effective shutter angle of ${rounded(angle)}° whatever moves will strobe; under ${SHUTTER_LIMIT_DEG}° it is seen (common practice).`;
  return [{ kind: 'strobing', text }];
}

function rateNotes({ rate }: CompleteShotTimes, { limit }: Worst): Note[] {
  const fps = framesPerSecond(rate);
  const { least, most } = CROSSING_LIMIT_RATES;
  if (limit === null || (fps >= least && fps <= most)) return [];
  const text = `The limit of the crossing time is common practice at 24 to 30 frames a second; this film has ${rounded(fps)}.`;
  return [{ kind: 'rate', text }];
}

function seenNotes({ seamInView, tripodInView }: Readonly<Record<MeasureName, Worst>>): Note[] {
  const note = (kind: 'seam' | 'tripod', { value, frame }: Worst, text: string): Note[] =>
    value === null || value === 0 || frame === null
      ? []
      : [{ kind, text: `${text} in ${rounded(100 * value)} % of the frames.`, frame }];
  return [
    ...note('seam', seamInView, 'The seam crosses the middle third of the picture'),
    ...note('tripod', tripodInView, 'The tripod may be seen'),
  ];
}

function loopNotes({ shot }: MoveDocument, move: CompiledMove, times: CompleteShotTimes): Note[] {
  if (shot.loops !== true) return [];
  const rates = new Rates(move);
  const [start, end] = [new Float64Array(RATES_SIZE), new Float64Array(RATES_SIZE)];
  const [first, last] = [new Float64Array(POSE_SIZE), new Float64Array(POSE_SIZE)];
  rates.at(start, times.from);
  rates.at(end, times.to);
  move.poseAt(first, times.from);
  move.poseAt(last, times.to);
  const jump = Math.hypot(start[0] - end[0], start[1] - end[1], start[2] - end[2]);
  const degPerSec = jump * sourceFramesPerDeliveredSecond(times) * DEG_PER_RAD;
  const fovDeg = Math.abs(first[4] - last[4]) * DEG_PER_RAD;
  const text = `From the film's end to its start the angular velocity jumps by ${rounded(degPerSec)} °/s and the field of view by ${rounded(fovDeg)}°.`;
  return [{ kind: 'loop', text }];
}

function counted(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}

function rounded(value: number): string {
  return String(Math.round(value * 100) / 100);
}
