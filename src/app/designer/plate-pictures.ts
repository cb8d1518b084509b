import { HttpClient } from '@angular/common/http';
import { DestroyRef, inject, Injectable, signal, type WritableSignal } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { type Plate, type PlateVersion } from '#schemas/api/plates';

/** Widest plate that the chart draws: more than a screen shows. */
const CHART_WIDTH = 4096;

/**
 * The pictures of a shot's plate: soon a small one, then the sharpest that the graphics card takes.
 *
 * Bytes are taken as the file has them: no colour conversion, so that what is shown is what was shot.
 */
@Injectable()
export class PlatePictures {
  readonly #http = inject(HttpClient);
  /** By address: going back along a shot needs no second download. */
  readonly #loaded = new Map<string, Promise<ImageBitmap>>();
  #plate = '';
  /** For the framed view. */
  readonly sharpest = signal<ImageBitmap | undefined>(undefined);
  /** For the chart. */
  readonly flat = signal<ImageBitmap | undefined>(undefined);
  /** Says why the framed view is not as sharp as the plate; empty while it is. */
  readonly note = signal('');

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      for (const bitmap of this.#loaded.values()) void bitmap.then(each => each.close());
    });
  }

  /**
   * @param widest the widest picture that the graphics card takes, pixels
   * @throws Problem where a picture cannot be fetched
   */
  async show(plate: Plate, widest: number): Promise<void> {
    if (plate.id === this.#plate) return;
    this.#plate = plate.id;
    const versions = plate.versions
      .filter(version => version.name !== 'thumb')
      .sort((a, b) => a.width - b.width);
    const small = versions[0];
    const flat = versions.filter(version => version.width <= CHART_WIDTH).at(-1) ?? small;
    const sharp = versions.filter(version => version.width <= widest).at(-1) ?? small;
    await this.#put(plate, small, [this.sharpest, this.flat]);
    await this.#put(plate, flat, [this.flat]);
    await this.#put(plate, sharp, [this.sharpest]);
    const cut = sharp.width < versions[versions.length - 1].width;
    const note = `Shown at ${sharp.width} of ${plate.width} pixels: this graphics card takes no more.`;
    if (this.#plate === plate.id) this.note.set(cut ? note : '');
  }

  /** Shows a version where it belongs, unless another plate has come into force meanwhile. */
  async #put(
    plate: Plate,
    version: PlateVersion,
    places: WritableSignal<ImageBitmap | undefined>[],
  ): Promise<void> {
    const bitmap = await this.#load(version.url);
    if (this.#plate === plate.id) places.forEach(place => place.set(bitmap));
  }

  #load(url: string): Promise<ImageBitmap> {
    const known = this.#loaded.get(url);
    if (known) return known;
    const loading = this.#fetch(url);
    this.#loaded.set(url, loading);
    // What failed may be tried again.
    loading.catch(() => this.#loaded.delete(url));
    return loading;
  }

  async #fetch(url: string): Promise<ImageBitmap> {
    const blob = await firstValueFrom(this.#http.get(url, { responseType: 'blob' }));
    return createImageBitmap(blob, { colorSpaceConversion: 'none', premultiplyAlpha: 'none' });
  }
}
