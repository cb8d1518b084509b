import { computed, DestroyRef, effect, inject, Injectable, signal, untracked } from '@angular/core';

import { type View } from '#shared/render/picture';
import { PlatePictures } from '../plate-pictures';
import { type Drawer, type Way } from './drawer';
import { DrawingWay } from './drawing-way';

/** Without a framed view the chart alone needs a picture, pixels wide. */
const CHART_ONLY = 4096;

/** The canvases, one for each way to draw: a canvas keeps the sort of context that it was first asked for. */
export type Canvases = Readonly<Record<Way, HTMLCanvasElement>>;

/** Who draws the framed view at the moment: opened when chosen, given the plate, closed when another is. */
@Injectable()
export class FramedDrawing {
  readonly #pictures = inject(PlatePictures);
  readonly #way = inject(DrawingWay).way;
  readonly #canvases = signal<Canvases | undefined>(undefined);
  readonly #drawer = signal<Drawer | undefined>(undefined);
  readonly #ready = signal<Drawer | undefined>(undefined);
  /** How often the canvas has become out of date. */
  readonly #renewed = signal(0);

  /** Why nothing is drawn; empty while all is well. */
  readonly failure = signal('');
  /** Changes whenever what stands on the canvas is out of date by the drawer's doing: a new one, a new plate. */
  readonly turn = computed(() => [this.#ready(), this.#renewed()] as const);
  /** The widest picture worth loading, pixels; unknown until a drawer has been opened. */
  readonly widestPicture = computed(
    () => this.#drawer()?.largestPicture ?? (this.failure() ? CHART_ONLY : undefined),
  );

  constructor() {
    effect(() => {
      const canvases = this.#canvases();
      if (canvases) void this.#open(this.#way(), canvases);
    });
    effect(() => {
      const picture = this.#pictures.sharpest();
      const drawer = this.#drawer();
      if (picture && drawer) void this.#give(drawer, picture);
    });
    inject(DestroyRef).onDestroy(() => this.#drawer()?.dispose());
  }

  /** To be called once, when the canvases stand. */
  start(canvases: Canvases): void {
    this.#canvases.set(canvases);
  }

  /** Draws, if there is a drawer that has a plate. */
  draw(view: View, moving: boolean): void {
    this.#ready()?.draw(view, moving);
  }

  async #open(way: Way, canvases: Canvases): Promise<void> {
    untracked(this.#drawer)?.dispose();
    this.#drawer.set(undefined);
    this.#ready.set(undefined);
    this.failure.set('');
    try {
      const drawer = await this.#opened(way, canvases[way]);
      // Another way may have been chosen meanwhile.
      if (way === untracked(this.#way)) this.#drawer.set(drawer);
      else drawer.dispose();
    } catch (error) {
      this.#fail(error);
    }
  }

  async #opened(way: Way, canvas: HTMLCanvasElement): Promise<Drawer> {
    if (way === 'processor') {
      const { ProcessorDrawer } = await import('./processor-drawer');
      return new ProcessorDrawer(canvas, reason => this.#fail(reason));
    }
    const { FramedRenderer } = await import('./renderer');
    // three.js restores its own state; what we must do is draw again.
    canvas.addEventListener('webglcontextrestored', () => this.#renewed.update(times => times + 1));
    return new FramedRenderer(canvas);
  }

  async #give(drawer: Drawer, picture: ImageBitmap): Promise<void> {
    try {
      await drawer.setPlate(picture);
      if (drawer !== this.#drawer()) return;
      this.#ready.set(drawer);
      this.#renewed.update(times => times + 1);
    } catch (error) {
      // A drawer that was closed meanwhile has nothing to say.
      if (drawer === this.#drawer()) this.#fail(error);
    }
  }

  #fail(error: unknown): void {
    const reason = error instanceof Error ? error.message : String(error);
    this.failure.set(`The framed view cannot be drawn (${reason}). Keys and numbers work as ever.`);
  }
}
