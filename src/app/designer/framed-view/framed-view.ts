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

import { PlatePictures } from '../plate-pictures';
import { DesignerSession } from '../session/designer-session';
import { changeKey, type Look, setKey } from '../state/commands';
import { Player } from '../transport/player';
import { lookHolding, type PicturePoint, worldDirection, zoomed } from './grab';
import { type FramedRenderer } from './renderer';

/** What a wheel notch does to the tangent of a quarter of the field of view. */
const ZOOM_PER_PIXEL = 1.0015;

/** How long after the last turn of the wheel a zoom of a key counts as done. */
const WHEEL_ENDS_MS = 250;

/** Without a framed view the chart alone needs a picture. */
const CHART_ONLY = 4096;

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
  imports: [MatButtonModule, MatIconModule, MatTooltipModule],
  templateUrl: './framed-view.html',
  styleUrl: './framed-view.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FramedView {
  protected readonly session = inject(DesignerSession);
  protected readonly pictures = inject(PlatePictures);
  readonly #player = inject(Player);
  readonly #destroy = inject(DestroyRef);
  protected readonly canvasElement = viewChild.required<ElementRef<HTMLCanvasElement>>('canvas');
  protected readonly boxElement = viewChild.required<ElementRef<HTMLElement>>('box');
  readonly #renderer = signal<FramedRenderer | undefined>(undefined);
  readonly #place = signal({ left: 0, top: 0, width: 0, height: 0 });
  readonly #pointers = new Map<number, PicturePoint>();
  #grip: Grip | undefined;
  #pinch: Pinch | undefined;
  #frameRequest = 0;
  #wheelTimer: ReturnType<typeof setTimeout> | undefined;

  protected readonly failure = signal('');
  protected readonly thirds = signal(readFlag('thirds'));
  protected readonly levelLine = signal(readFlag('level-line'));
  protected readonly heightPerWidth = computed(() => {
    const [first] = this.session.move().deliverables;
    return first.height / first.width;
  });
  /** The largest frame of the deliverable's shape that fits, CSS pixels. */
  protected readonly frame = computed(() => {
    const place = this.#place();
    const width = Math.floor(Math.min(place.width, place.height / this.heightPerWidth()));
    const height = Math.round(width * this.heightPerWidth());
    // On whole pixels of the screen: half a pixel aside the browser would blur the picture.
    const left = onPixel(place.left + (place.width - width) / 2) - place.left;
    const top = onPixel(place.top + (place.height - height) / 2) - place.top;
    return { width, height, left, top };
  });
  /** The widest picture worth loading, pixels; unknown until the graphics card has been asked. */
  readonly widestPicture = computed(
    () => this.#renderer()?.largestTexture ?? (this.failure() ? CHART_ONLY : undefined),
  );

  constructor() {
    afterNextRender(() => void this.#start());
    effect(() => {
      const picture = this.pictures.sharpest();
      const renderer = this.#renderer();
      if (picture && renderer) renderer.setPlate(picture);
      this.#drawSoon();
    });
    effect(() => {
      this.session.pose();
      this.session.shot();
      this.frame();
      this.#drawSoon();
    });
  }

  protected toggleThirds(): void {
    this.thirds.update(on => writeFlag('thirds', !on));
  }

  protected toggleLevelLine(): void {
    this.levelLine.update(on => writeFlag('level-line', !on));
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
    this.canvasElement().nativeElement.setPointerCapture(event.pointerId);
    this.#pointers.set(event.pointerId, this.#point(event));
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
    const { left, top, width, height } = this.canvasElement().nativeElement.getBoundingClientRect();
    return {
      x: ((event.clientX - left) / width) * 2 - 1,
      y: (1 - ((event.clientY - top) / height) * 2) * (height / width),
    };
  }

  async #start(): Promise<void> {
    const box = this.boxElement().nativeElement;
    const observer = new ResizeObserver(() => this.#place.set(box.getBoundingClientRect()));
    observer.observe(box);
    const canvas = this.canvasElement().nativeElement;
    // three.js restores its own state; what we must do is draw again.
    canvas.addEventListener('webglcontextrestored', () => this.#drawSoon());
    try {
      const { FramedRenderer } = await import('./renderer');
      const renderer = new FramedRenderer(canvas);
      this.#renderer.set(renderer);
      this.#destroy.onDestroy(() => renderer.dispose());
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error);
      this.failure.set(
        `The framed view cannot be drawn: this browser gives no WebGL2 (${reason}). Keys and numbers work as ever.`,
      );
    }
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
    const renderer = this.#renderer();
    const { width, height } = this.frame();
    if (!renderer || !this.pictures.sharpest() || width === 0) return;
    const ratio = window.devicePixelRatio;
    renderer.setSize(Math.round(width * ratio), Math.round(height * ratio));
    const level = this.session.shot()?.level ?? [0, 0, 0, 1];
    renderer.draw(this.session.pose(), level, this.heightPerWidth());
  }
}

function onPixel(position: number): number {
  return Math.round(position * window.devicePixelRatio) / window.devicePixelRatio;
}

function between(a: PicturePoint, b: PicturePoint): { spread: number; tilt: number } {
  return { spread: Math.max(Math.hypot(b.x - a.x, b.y - a.y), 1e-3), tilt: Math.atan2(b.y - a.y, b.x - a.x) };
}

function readFlag(name: string): boolean {
  try {
    return localStorage.getItem(`fairlead.show.${name}`) === 'yes';
  } catch {
    return false;
  }
}

function writeFlag(name: string, on: boolean): boolean {
  try {
    localStorage.setItem(`fairlead.show.${name}`, on ? 'yes' : 'no');
  } catch {
    // A browser that keeps nothing: the choice holds for this page.
  }
  return on;
}
