import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  effect,
  type ElementRef,
  inject,
  signal,
  viewChild,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatIconModule } from '@angular/material/icon';
import { MatTooltipModule } from '@angular/material/tooltip';

import { DEG_PER_RAD } from '#shared/conventions';
import { CROSSING_LIMIT_SEC } from '#shared/measure/limits';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { directionFromLonLat, lonOfDirection } from '#shared/projection/equirectangular';
import { type Frame } from '#shared/projection/footprint';
import { rotate } from '#shared/rotation/quaternion';
import { nearest } from '../framed-view/grab';
import { coursePoints } from '../pace';
import { paceColour, PACE_STEPS } from '../pace-ramp';
import { PlatePictures } from '../plate-pictures';
import { DesignerSession } from '../session/designer-session';
import { changeKey } from '../state/commands';
import { drawOverlay } from './draw-overlay';
import { drawPlate } from './draw-plate';
import {
  type ChartSize,
  type ChartView,
  degreesAt,
  screenX,
  screenY,
  settled,
  WHOLE,
  zoomedAt,
} from './viewport';

/** Points of the course: finer than a screen shows, at any zoom that shows all of it. */
const COURSE_POINTS = 900;

/** Key outlines drawn at most; beyond it the chart would be all lines. */
const MOST_OUTLINES = 60;

const ZOOM_PER_PIXEL = 1.0018;

/** A key's handle on the chart. */
interface Handle {
  readonly frame: number;
  readonly number: number;
  readonly x: number;
  readonly y: number;
  readonly selected: boolean;
  readonly name: string;
}

/** The whole panorama laid flat, with the course drawn over it. Keys are dragged right here. */
@Component({
  selector: 'fl-chart',
  imports: [MatButtonModule, MatIconModule, MatTooltipModule],
  templateUrl: './chart.html',
  styleUrl: './chart.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Chart {
  readonly #session = inject(DesignerSession);
  readonly #pictures = inject(PlatePictures);
  readonly #destroy = inject(DestroyRef);
  protected readonly plateCanvas = viewChild.required<ElementRef<HTMLCanvasElement>>('plate');
  protected readonly overlayCanvas = viewChild.required<ElementRef<HTMLCanvasElement>>('overlay');
  readonly #size = signal<ChartSize>({ width: 0, height: 0 });
  readonly #view = signal<ChartView>(WHOLE);
  #pan: { readonly pointer: number; readonly lon: number; readonly lat: number } | undefined;
  #plateRequest = 0;
  #overlayRequest = 0;

  protected readonly crossingLimit = CROSSING_LIMIT_SEC;
  protected readonly ramp = Array.from({ length: PACE_STEPS }, (_, step) => paceColour(step));
  protected readonly zoom = computed(() => this.#view().zoom);
  readonly #course = computed(() =>
    coursePoints(this.#session.compiled(), this.#session.times(), COURSE_POINTS),
  );
  readonly #heightPerWidth = computed(() => {
    const [first] = this.#session.move().deliverables;
    return first.height / first.width;
  });
  readonly #keyFrames = computed(() => {
    const { keys } = this.#session.move();
    const compiled = this.#session.compiled();
    const every = Math.ceil(keys.length / MOST_OUTLINES);
    return keys
      .filter((_, i) => i % every === 0)
      .map(key => frameOf(compiled.poseAt(new Float64Array(POSE_SIZE), key.frame), this.#heightPerWidth()));
  });
  readonly #seamYaw = computed(() => {
    const shot = this.#session.shot();
    if (shot?.seamYaw == null) return undefined;
    const seam = directionFromLonLat(new Float64Array(3), (shot.seamYaw * Math.PI) / 180, 0);
    return lonOfDirection(rotate(seam, shot.level, seam)) * DEG_PER_RAD;
  });
  protected readonly handles = computed((): Handle[] => {
    const size = this.#size();
    const view = this.#view();
    const { keys } = this.#session.selection();
    return this.#session.move().keys.map(({ frame, yaw, pitch }, i) => ({
      frame,
      number: i + 1,
      x: screenX(yaw, view, size),
      y: screenY(pitch, view, size),
      selected: keys.includes(frame),
      name: `Key ${i + 1} at frame ${frame}: yaw ${round(yaw)}, pitch ${round(pitch)}`,
    }));
  });

  constructor() {
    afterNextRender(() => this.#watchSize());
    effect(() => {
      this.#pictures.flat();
      this.#view();
      this.#size();
      cancelAnimationFrame(this.#plateRequest);
      this.#plateRequest = requestAnimationFrame(() => this.#drawPlate());
    });
    effect(() => {
      this.#course();
      this.#keyFrames();
      this.#session.pose();
      this.#view();
      this.#size();
      cancelAnimationFrame(this.#overlayRequest);
      this.#overlayRequest = requestAnimationFrame(() => this.#drawOverlay());
    });
  }

  protected grabPaper(event: PointerEvent): void {
    this.overlayCanvas().nativeElement.setPointerCapture(event.pointerId);
    this.#pan = { pointer: event.pointerId, ...this.#degrees(event) };
  }

  protected dragPaper(event: PointerEvent): void {
    if (this.#pan?.pointer !== event.pointerId) return;
    const here = this.#degrees(event);
    const { lon, lat } = this.#pan;
    this.#view.update(view =>
      settled({ ...view, lon: view.lon + lon - here.lon, lat: view.lat + lat - here.lat }, this.#size()),
    );
    this.#pan = { pointer: event.pointerId, ...this.#degrees(event) };
  }

  protected letGoPaper(): void {
    this.#pan = undefined;
  }

  protected wheel(event: WheelEvent): void {
    event.preventDefault();
    const { left, top } = this.overlayCanvas().nativeElement.getBoundingClientRect();
    const factor = ZOOM_PER_PIXEL ** -event.deltaY;
    this.#view.update(view =>
      zoomedAt(view, this.#size(), event.clientX - left, event.clientY - top, factor),
    );
  }

  protected zoomBy(factor: number): void {
    const { width, height } = this.#size();
    this.#view.update(view => zoomedAt(view, this.#size(), width / 2, height / 2, factor));
  }

  protected showAll(): void {
    this.#view.set(WHOLE);
  }

  protected takeKey(event: PointerEvent, handle: Handle): void {
    event.stopPropagation();
    const button = event.currentTarget;
    if (!(button instanceof HTMLElement)) return;
    button.setPointerCapture(event.pointerId);
    this.#session.goToKey(handle.frame);
  }

  protected dragKey(event: PointerEvent, handle: Handle): void {
    const button = event.currentTarget;
    if (!(button instanceof HTMLElement) || !button.hasPointerCapture(event.pointerId)) return;
    const { lon, lat } = this.#degrees(event);
    const before = this.#session.saved().keys.find(key => key.frame === handle.frame);
    if (!before) return;
    const pitch = Math.min(Math.max(lat, -90), 90);
    // Angles as fine as a pointer is, and no finer: a hundredth of a degree.
    const aim = { yaw: fine(nearest(lon, before.yaw)), pitch: fine(pitch) };
    this.#session.preview(changeKey(handle.frame, aim, 'Drag key on the chart'));
  }

  protected dropKey(): void {
    this.#session.commit();
  }

  protected nudgeKey(event: KeyboardEvent, handle: Handle): void {
    const steps: Readonly<Record<string, readonly [number, number]>> = {
      ArrowLeft: [-1, 0],
      ArrowRight: [1, 0],
      ArrowUp: [0, 1],
      ArrowDown: [0, -1],
    };
    const step = steps[event.key];
    const key = this.#session.move().keys.find(each => each.frame === handle.frame);
    if (!step || !key) return;
    event.preventDefault();
    event.stopPropagation();
    const size = event.shiftKey ? 10 : 1;
    const pitch = Math.min(Math.max(key.pitch + step[1] * size, -90), 90);
    this.#session.run(
      changeKey(handle.frame, { yaw: key.yaw + step[0] * size, pitch }, 'Nudge key', `aim ${handle.frame}`),
    );
  }

  protected goTo(handle: Handle): void {
    this.#session.goToKey(handle.frame);
  }

  #degrees(event: PointerEvent): { lon: number; lat: number } {
    const { left, top } = this.overlayCanvas().nativeElement.getBoundingClientRect();
    return degreesAt(event.clientX - left, event.clientY - top, this.#view(), this.#size());
  }

  #watchSize(): void {
    const canvas = this.overlayCanvas().nativeElement;
    const observer = new ResizeObserver(([entry]) => {
      const { width, height } = entry.contentRect;
      this.#size.set({ width, height });
      this.#view.update(view => settled(view, { width, height }));
    });
    observer.observe(canvas);
    this.#destroy.onDestroy(() => {
      observer.disconnect();
      cancelAnimationFrame(this.#plateRequest);
      cancelAnimationFrame(this.#overlayRequest);
    });
  }

  #drawPlate(): void {
    const context = prepared(this.plateCanvas().nativeElement, this.#size());
    if (context) drawPlate(context, this.#pictures.flat(), this.#view(), this.#size());
  }

  #drawOverlay(): void {
    const context = prepared(this.overlayCanvas().nativeElement, this.#size());
    if (!context) return;
    const overlay = {
      course: this.#course(),
      keyFrames: this.#keyFrames(),
      hereFrame: frameOf(this.#session.pose(), this.#heightPerWidth()),
      seamYawDeg: this.#seamYaw(),
    };
    drawOverlay(context, overlay, this.#view(), this.#size());
  }
}

/** @returns a context that draws in CSS pixels, sharp on dense screens; none while the chart has no size */
function prepared(canvas: HTMLCanvasElement, { width, height }: ChartSize): CanvasRenderingContext2D | null {
  if (width === 0 || height === 0) return null;
  const ratio = window.devicePixelRatio;
  const [w, h] = [Math.round(width * ratio), Math.round(height * ratio)];
  if (canvas.width !== w || canvas.height !== h) {
    canvas.width = w;
    canvas.height = h;
  }
  const context = canvas.getContext('2d');
  context?.setTransform(ratio, 0, 0, ratio, 0, 0);
  return context;
}

function frameOf(pose: ArrayLike<number>, heightPerWidth: number): Frame {
  return {
    orientation: Float64Array.from({ length: 4 }, (_, i) => pose[i]),
    fovRad: pose[4],
    eye: pose[5],
    heightPerWidth,
  };
}

function round(degrees: number): string {
  return degrees.toFixed(1);
}

function fine(degrees: number): number {
  return Math.round(degrees * 100) / 100;
}
