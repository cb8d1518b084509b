import { Injectable, signal } from '@angular/core';

import { type OverlayName, OVERLAYS } from './overlays';

/** Where a browser remembers whether an overlay is shown. */
const STORED = 'fairlead.show.';

/** Which overlays the framed view shows: a choice of this browser, remembered. */
@Injectable({ providedIn: 'root' })
export class ShownOverlays {
  readonly #shown = signal<ReadonlySet<OverlayName>>(
    new Set(OVERLAYS.map(({ name }) => name).filter(name => remembered(name))),
  );
  readonly shown = this.#shown.asReadonly();

  has(name: OverlayName): boolean {
    return this.#shown().has(name);
  }

  toggle(name: OverlayName): void {
    const on = !this.has(name);
    this.#shown.update(shown => new Set([...shown].filter(each => each !== name).concat(on ? [name] : [])));
    remember(name, on);
  }
}

function remembered(name: OverlayName): boolean {
  try {
    return localStorage.getItem(STORED + name) === 'yes';
  } catch {
    return false;
  }
}

function remember(name: OverlayName, on: boolean): void {
  try {
    localStorage.setItem(STORED + name, on ? 'yes' : 'no');
  } catch {
    // A browser that keeps nothing: the choice holds for this page.
  }
}
