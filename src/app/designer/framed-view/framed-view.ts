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
import { MatDividerModule } from '@angular/material/divider';
import { MatIconModule } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { MatTooltipModule } from '@angular/material/tooltip';

import { matchedFovRad } from '#shared/projection/deliverable-framing';
import { sourceOrientation } from '#shared/render/camera';
import { PlatePictures } from '../plate-pictures';
import { DesignerSession } from '../session/designer-session';
import { changeKey, type Look, setKey } from '../state/commands';
import { Player } from '../transport/player';
import { type Way } from './drawer';
import { DrawingWay } from './drawing-way';
import { FramedDrawing } from './framed-drawing';
import { lookHolding, type PicturePoint, worldDirection, zoomed } from './grab';
import {
  centredBox,
  deliverableBox,
  levelLinePath,
  OVERLAYS,
  SAFE_ACTION,
  SAFE_TITLE,
  seamPath,
  thirdsPath,
} from './overlays';
import { ShownOverlays } from './shown-overlays';

/** What a wheel notch does to the tangent of a quarter of the field of view. */
const ZOOM_PER_PIXEL = 1.0015;

/** How long after the last turn of the wheel a zoom of a key counts as done. */
const WHEEL_ENDS_MS = 250;

/** With its surround the frame is shown this much smaller, and as much more is drawn about it. */
const SURROUND = 1.35;

/** Who draws, as the menu names them. */
const WAYS: readonly { readonly way: Way; readonly label: string }[] = [
  { way: 'graphics', label: 'Drawn by the graphics card' },
  { way: 'processor', label: 'Drawn by the processor' },
];

interface Grip {
  readonly pointer: number;
  readonly world: Float64Array;
}

interface Pinch {
  readonly spread: number;
  readonly tilt: number;
  readonly look: Look;
}

/**
 * The delivered picture, live. Dragging looks around: what was grabbed stays under the pointer. On a key the drag changes
 * that key; anywhere else it makes a pose in hand, which stands on no key until it is set.
 */
@Component({
  selector: 'fl-framed-view',
  imports: [MatButtonModule, MatDividerModule, MatIconModule, MatMenuModule, MatTooltipModule],
  templateUrl: './framed-view.html',
  styleUrl: './framed-view.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [FramedDrawing],
})
export class FramedView {
  protected readonly session = inject(DesignerSession);
  protected readonly pictures = inject(PlatePictures);
  readonly #player = inject(Player);
  readonly #destroy = inject(DestroyRef);
  protected readonly pictureElement = viewChild.required<ElementRef<HTMLElement>>('picture');
  protected readonly frameElement = viewChild.required<ElementRef<HTMLElement>>('frameBox');
  protected readonly graphicsCanvas = viewChild.required<ElementRef<HTMLCanvasElement>>('graphicsCanvas');
  protected readonly processorCanvas = viewChild.required<ElementRef<HTMLCanvasElement>>('processorCanvas');
  protected readonly boxElement = viewChild.required<ElementRef<HTMLElement>>('box');
  protected readonly drawing = inject(DrawingWay);
  readonly #drawn = inject(FramedDrawing);
  readonly #held = signal(false);
  readonly #place = signal({ left: 0, top: 0, width: 0, height: 0 });
  readonly #pointers = new Map<number, PicturePoint>();
  #grip: Grip | undefined;
  #pinch: Pinch | undefined;
  #frameRequest = 0;
  #wheelTimer: ReturnType<typeof setTimeout> | undefined;

  protected readonly failure = this.#drawn.failure;
  protected readonly overlays = inject(ShownOverlays);
  protected readonly overlayChoices = OVERLAYS;
  protected readonly wayChoices = WAYS;
  protected readonly heightPerWidth = computed(() => {
    const [first] = this.session.move().deliverables;
    return first.height / first.width;
  });
  /** How much more than the frame is drawn, each way, of its width and its height. */
  readonly #reach = computed(() => (this.overlays.has('surround') ? SURROUND : 1));
  /** The largest frame of the deliverable's shape that fits with its surround, CSS pixels. */
  protected readonly frame = computed(() => {
    const place = this.#place();
    const width = Math.floor(Math.min(place.width, place.height / this.heightPerWidth()) / this.#reach());
    const height = Math.round(width * this.heightPerWidth());
    // On whole pixels of the screen: half a pixel aside the browser would blur the picture.
    const left = onPixel(place.left + (place.width - width) / 2) - place.left;
    const top = onPixel(place.top + (place.height - height) / 2) - place.top;
    return { width, height, left, top };
  });
  protected readonly viewBox = computed(() => `-1 ${-this.heightPerWidth()} 2 ${2 * this.heightPerWidth()}`);
  protected readonly actionArea = computed(() => centredBox(this.heightPerWidth(), SAFE_ACTION));
  protected readonly titleArea = computed(() => centredBox(this.heightPerWidth(), SAFE_TITLE));
  protected readonly thirds = computed(() => thirdsPath(this.heightPerWidth()));
  protected readonly levelLine = computed(() => levelLinePath(this.session.pose()));
  protected readonly seam = computed(() => {
    const shot = this.session.shot();
    if (shot?.seamYaw == null) return '';
    return seamPath(shot.seamYaw, shot.level ?? [0, 0, 0, 1], this.session.pose());
  });
  protected readonly otherFrames = computed(() => {
    const [first, ...others] = this.session.move().deliverables;
    return others.map(other => ({ name: other.name, box: deliverableBox(first, other) }));
  });
  /** What is drawn, about the frame: the frame itself, or with its surround. */
  protected readonly drawnBox = computed(() => {
    const { width, height } = this.frame();
    const [aside, above] = [width, height].map(side => Math.round((side * (this.#reach() - 1)) / 2));
    return { left: -aside, top: -above, width: width + 2 * aside, height: height + 2 * above };
  });
  readonly #moving = computed(() => this.#held() || this.#player.rate() !== 0);
  /** The widest picture worth loading, pixels; unknown until it is known who draws. */
  readonly widestPicture = this.#drawn.widestPicture;

  constructor() {
    afterNextRender(() => this.#start());
    effect(() => {
      this.session.pose();
      this.session.shot();
      this.frame();
      this.#drawn.turn();
      this.#moving();
      this.#drawSoon();
    });
  }

  protected setKeyHere(): void {
    const hand = this.session.hand();
    if (hand && this.session.run(setKey(Math.round(this.session.playhead()), hand.look)))
      this.session.hand.set(undefined);
  }

  protected letGo(): void {
    this.session.hand.set(undefined);
  }

  protected grab(event: PointerEvent): void {
    this.#player.stop();
    this.pictureElement().nativeElement.setPointerCapture(event.pointerId);
    this.#pointers.set(event.pointerId, this.#point(event));
    this.#held.set(true);
    if (this.#pointers.size === 2) this.#startPinch();
    else this.#grip = { pointer: event.pointerId, world: this.#worldAt(this.#point(event)) };
  }

  protected drag(event: PointerEvent): void {
    if (!this.#pointers.has(event.pointerId)) return;
    this.#pointers.set(event.pointerId, this.#point(event));
    if (this.#pinch && this.#pointers.size === 2) this.#turnTo(this.#pinched(this.#pinch));
    else if (this.#grip?.pointer === event.pointerId) {
      this.#turnTo(lookHolding(this.#grip.world, this.#point(event), this.session.look()));
    }
  }

  protected release(event: PointerEvent): void {
    this.#pointers.delete(event.pointerId);
    this.#pinch = undefined;
    const [rest] = this.#pointers;
    this.#grip = rest ? { pointer: rest[0], world: this.#worldAt(rest[1]) } : undefined;
    this.#held.set(rest !== undefined);
    if (!rest) this.session.commit();
  }

  protected wheel(event: WheelEvent): void {
    event.preventDefault();
    this.#player.stop();
    this.#turnTo(zoomed(this.session.look(), ZOOM_PER_PIXEL ** event.deltaY));
    clearTimeout(this.#wheelTimer);
    this.#wheelTimer = setTimeout(() => this.session.commit(), WHEEL_ENDS_MS);
  }

  /** A key at the playhead is changed, as a preview; where there is none, the pose is in hand. */
  #turnTo(look: Look): void {
    const key = this.session.keyHere();
    if (key && !this.session.hand() && !this.session.readOnly()) {
      this.session.preview(changeKey(key.frame, look, 'Look elsewhere'));
    } else this.session.hand.set({ look });
  }

  #startPinch(): void {
    const [a, b] = [...this.#pointers.values()];
    this.#pinch = { ...between(a, b), look: this.session.look() };
  }

  /** Two fingers zoom and roll: the camera turns against the picture. */
  #pinched({ spread, tilt, look }: Pinch): Look {
    const [a, b] = [...this.#pointers.values()];
    const now = between(a, b);
    const turned = ((now.tilt - tilt) * 180) / Math.PI;
    return { ...zoomed(look, spread / now.spread), roll: look.roll + turned };
  }

  #worldAt(point: PicturePoint): Float64Array {
    return worldDirection(point, this.session.look(), this.session.pose());
  }

  #point(event: PointerEvent): PicturePoint {
    const { left, top, width, height } = this.frameElement().nativeElement.getBoundingClientRect();
    return {
      x: ((event.clientX - left) / width) * 2 - 1,
      y: (1 - ((event.clientY - top) / height) * 2) * (height / width),
    };
  }

  #start(): void {
    this.#drawn.start({
      graphics: this.graphicsCanvas().nativeElement,
      processor: this.processorCanvas().nativeElement,
    });
    const box = this.boxElement().nativeElement;
    const observer = new ResizeObserver(() => this.#place.set(box.getBoundingClientRect()));
    observer.observe(box);
    this.#destroy.onDestroy(() => {
      observer.disconnect();
      cancelAnimationFrame(this.#frameRequest);
      clearTimeout(this.#wheelTimer);
    });
  }

  /** Once a screen frame at most, however often something changes. */
  #drawSoon(): void {
    cancelAnimationFrame(this.#frameRequest);
    this.#frameRequest = requestAnimationFrame(() => this.#draw());
  }

  #draw(): void {
    const { width, height } = this.drawnBox();
    if (width === 0) return;
    const ratio = window.devicePixelRatio;
    const pose = this.session.pose();
    const view = {
      orientation: sourceOrientation(new Float64Array(4), this.session.shot()?.level ?? [0, 0, 0, 1], pose),
      fovRad: matchedFovRad(pose[4], pose[5], width / this.frame().width),
      eye: pose[5],
      width: Math.round(width * ratio),
      height: Math.round(height * ratio),
    };
    this.#drawn.draw(view, this.#moving());
  }
}

function onPixel(position: number): number {
  return Math.round(position * window.devicePixelRatio) / window.devicePixelRatio;
}

function between(a: PicturePoint, b: PicturePoint): { spread: number; tilt: number } {
  return { spread: Math.max(Math.hypot(b.x - a.x, b.y - a.y), 1e-3), tilt: Math.atan2(b.y - a.y, b.x - a.x) };
}
