import { type Deliverable, type MoveDocument } from '#schemas/move';
import { DEG_PER_RAD, POLE_SINE, RAD_PER_DEG } from '#shared/conventions';
import { shutterAngleDeg } from '#shared/capture/shutter';
import { type CompleteShotTimes, shotTimes } from '#shared/document/shot-times';
import { type CompiledMove, POSE_SIZE } from '#shared/path/compiled-move';
import { Rates, RATES_SIZE } from '#shared/path/rates';
import { halfWidthRatio } from '#shared/projection/deliverable-framing';
import { angleBetween } from '#shared/rotation/angle-between';
import { framesPerSecond } from '#shared/time/frame-rate';
import {
  deliveredFrameCount,
  firstDeliveredFrameFrom,
  sourceFrameOfDelivered,
  sourceFramesPerDeliveredSecond,
} from '#shared/time/delivered-time';
import { keyJolts } from './jolts';
import { HALF_WIDTH, Lens } from './lens';
import { eachMeasure, type MeasureColumns } from './measures';
import { SeamView, TripodView } from './views';

/**
 * Takes the measures of a compiled move for one deliverable, frame by frame, from the path's own derivatives. Allocates
 * its columns once; any stretch of frames can be taken again without the others.
 */
export class MeasureTaker {
  readonly columns: MeasureColumns;
  readonly times: CompleteShotTimes;
  readonly frameCount: number;
  readonly #document: MoveDocument;
  readonly #move: CompiledMove;
  readonly #rates: Rates;
  readonly #lens: Lens;
  readonly #seam: SeamView | undefined;
  readonly #tripod: TripodView;
  /** Degrees a delivered second, per radian a source frame; and the same of accelerations. */
  readonly #rateFactor: number;
  readonly #accelerationFactor: number;
  /** Picture pixels a frame, per degree a second and by the frame's width on the tangent plane. */
  readonly #stepFactor: number;
  /** Source pixels per picture pixel, per width on the tangent plane. */
  readonly #sharpnessFactor: number;
  readonly #pose = new Float64Array(POSE_SIZE);
  readonly #forward = new Float64Array(3);
  readonly #rate = new Float64Array(RATES_SIZE);

  /** @param deliverable one of the document's */
  constructor(document: MoveDocument, move: CompiledMove, deliverable: Deliverable) {
    const { shot, deliverables } = document;
    const times = shotTimes(shot);
    const level = shot.level ?? [0, 0, 0, 1];
    const perSecond = sourceFramesPerDeliveredSecond(times);
    this.times = times;
    this.frameCount = deliveredFrameCount(times);
    this.columns = eachMeasure(() => new Float64Array(this.frameCount));
    for (const name of MAYBE_UNKNOWN) this.columns[name].fill(NaN);
    this.#document = document;
    this.#move = move;
    this.#rates = new Rates(move);
    this.#lens = new Lens(
      halfWidthRatio(deliverables[0], deliverable),
      deliverable.height / deliverable.width,
    );
    this.#seam =
      shot.seamYaw === undefined ? undefined : new SeamView(shot.seamYaw * RAD_PER_DEG, level, this.#lens);
    this.#tripod = new TripodView(level, this.#lens);
    this.#rateFactor = perSecond * DEG_PER_RAD;
    this.#accelerationFactor = perSecond * perSecond * DEG_PER_RAD;
    this.#stepFactor = (RAD_PER_DEG * deliverable.width) / framesPerSecond(times.rate);
    this.#sharpnessFactor = shot.source.width / (2 * Math.PI * deliverable.width);
  }

  /** All frames, and what is measured at keys and of the whole. */
  takeAll(): MeasureColumns {
    this.take(0, this.frameCount - 1);
    this.#takeJolts();
    this.#takeWhole();
    return this.columns;
  }

  /** Delivered frames `first`…`last`, both included: all that is measured frame by frame. */
  take(first: number, last: number): void {
    for (let frame = first; frame <= last; frame++) this.#takeFrame(frame);
  }

  #takeFrame(frame: number): void {
    const pose = this.#pose;
    const rate = this.#rate;
    const lens = this.#lens;
    const columns = this.columns;
    const sourceFrame = sourceFrameOfDelivered(this.times, frame);
    this.#move.poseAt(pose, sourceFrame);
    this.#rates.at(rate, sourceFrame);
    lens.set(pose);
    const across = Math.sqrt(rate[0] * rate[0] + rate[1] * rate[1]) * this.#rateFactor;
    const width = 2 * lens.numbers[HALF_WIDTH];
    columns.panRateDegPerSec[frame] = across;
    columns.crossingTimeSec[frame] = across > 0 ? (width * DEG_PER_RAD) / across : NaN;
    columns.stepPx[frame] = (across * this.#stepFactor) / width;
    columns.rollRateDegPerSec[frame] = Math.abs(rate[2]) * this.#rateFactor;
    columns.zoomRatePerSec[frame] = Math.abs(rate[6]) * this.#rateFactor * DOUBLINGS;
    columns.accelerationDegPerSec2[frame] =
      Math.sqrt(rate[3] * rate[3] + rate[4] * rate[4] + rate[5] * rate[5]) * this.#accelerationFactor;
    columns.sharpness[frame] = width * this.#sharpnessFactor;
    columns.horizonLeanDeg[frame] = leanDeg(pose);
    const forward = this.#forward;
    forward[0] = -2 * (pose[0] * pose[2] + pose[3] * pose[1]);
    forward[1] = -2 * (pose[1] * pose[2] - pose[3] * pose[0]);
    forward[2] = 2 * (pose[0] * pose[0] + pose[1] * pose[1]) - 1;
    if (this.#seam) columns.seamInView[frame] = this.#seam.isSeen(pose, forward) ? 1 : 0;
    columns.tripodInView[frame] = this.#tripod.isSeen(pose, forward) ? 1 : 0;
  }

  /** A key's jolt stands at the first delivered frame that shows the key, or what comes after it. */
  #takeJolts(): void {
    const column = this.columns.joltDegPerSec.fill(0);
    const { from, to } = this.times;
    for (const { sourceFrame, jump } of keyJolts(this.#move)) {
      if (sourceFrame < from || sourceFrame > to) continue;
      const frame = firstDeliveredFrameFrom(this.times, sourceFrame);
      column[frame] = Math.max(column[frame], jump * this.#rateFactor);
    }
  }

  #takeWhole(): void {
    const { exposure, loops } = this.#document.shot;
    const { intervalSec, speed } = this.times;
    if (exposure !== undefined)
      this.columns.shutterAngleDeg.fill(shutterAngleDeg(exposure, intervalSec, speed));
    if (loops !== true) return;
    const last = this.frameCount - 1;
    const [start, end] = [new Float64Array(POSE_SIZE), new Float64Array(POSE_SIZE)];
    this.#move.poseAt(start, sourceFrameOfDelivered(this.times, 0));
    this.#move.poseAt(end, sourceFrameOfDelivered(this.times, last));
    this.columns.loopGapDeg[last] = angleBetween(start, end) * DEG_PER_RAD;
  }
}

/** Measures that a shot may not say enough for. */
const MAYBE_UNKNOWN = ['shutterAngleDeg', 'seamInView', 'loopGapDeg'] as const;

/** From a rate of ζ in degrees a second to doublings a second. */
const DOUBLINGS = RAD_PER_DEG / Math.LN2;

/**
 * How the horizon leans in the picture: minus the roll, which stands in the heights of the camera's right and up.
 *
 * @returns degrees in −180…180; NaN where the camera looks at a pole and no horizon has a direction
 */
function leanDeg(q: Readonly<Float64Array>): number {
  const rightY = 2 * (q[0] * q[1] + q[2] * q[3]);
  const upY = 1 - 2 * (q[0] * q[0] + q[2] * q[2]);
  if (rightY * rightY + upY * upY < POLE_SINE * POLE_SINE) return NaN;
  // Upright, as nearly all frames are, the plain arc tangent is the same and sooner done.
  return (upY > 0 ? Math.atan(rightY / upY) : Math.atan2(rightY, upY)) * DEG_PER_RAD;
}
