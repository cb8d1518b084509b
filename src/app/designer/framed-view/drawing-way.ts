import { computed, Injectable, signal } from '@angular/core';

import { type Graphics, graphicsOf, type Way } from './drawer';

/** Where a browser remembers who shall draw. */
const STORED = 'fairlead.drawn-by';

/** What is said where the processor draws, and why. */
const WHY: Readonly<Record<Graphics, string>> = {
  card: 'Drawn by the processor.',
  software: 'Drawn by the processor: this browser has no graphics card to draw with.',
  none: 'Drawn by the processor: this browser gives no WebGL2.',
};

/** Who draws the framed view: chosen by what the browser has, or by hand; that choice is remembered. */
@Injectable({ providedIn: 'root' })
export class DrawingWay {
  readonly #graphics = graphicsOf();
  readonly #chosen = signal(remembered());

  readonly way = computed((): Way => {
    if (this.#graphics === 'none') return 'processor';
    return this.#chosen() ?? (this.#graphics === 'card' ? 'graphics' : 'processor');
  });
  /** Whether there is a choice at all. */
  readonly hasChoice = this.#graphics !== 'none';
  /** Says that, and why, the processor draws; empty where the graphics card does. */
  readonly note = computed(() => (this.way() === 'processor' ? WHY[this.#graphics] : ''));

  choose(way: Way): void {
    this.#chosen.set(way);
    try {
      localStorage.setItem(STORED, way);
    } catch {
      // A browser that keeps nothing: the choice holds for this page.
    }
  }
}

function remembered(): Way | undefined {
  try {
    const stored = localStorage.getItem(STORED);
    return stored === 'graphics' || stored === 'processor' ? stored : undefined;
  } catch {
    return undefined;
  }
}
