import { HttpClient } from '@angular/common/http';
import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { type Plate } from '#schemas/api/plates';

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
  readonly #open = new Set<ImageBitmap>();
  #plate = '';
  /** For the framed view. */
  readonly sharpest = signal<ImageBitmap | undefined>(undefined);
  /** For the chart. */
  readonly flat = signal<ImageBitmap | undefined>(undefined);
  /** Says why the framed view is not as sharp as the plate; empty while it is. */
  readonly note = signal('');

  constructor() {
    inject(DestroyRef).onDestroy(() => this.#open.forEach(bitmap => bitmap.close()));
  }

  /**
   * @param largestTexture the widest picture that the graphics card takes, pixels
   * @throws Problem where a picture cannot be fetched
   */
  async show(plate: Plate, largestTexture: number): Promise<void> {
    if (plate.id === this.#plate) return;
    this.#plate = plate.id;
    const byWidth = [...plate.versions]
      .filter(version => version.name !== 'thumb')
      .sort((a, b) => a.width - b.width);
    const small = byWidth[0];
    const sharp = byWidth.filter(version => version.width <= largestTexture).at(-1) ?? small;
    const first = await this.#load(small.url);
    if (this.#plate !== plate.id) return;
    this.sharpest.set(first);
    this.flat.set(first);
    this.note.set(
      sharp.width < plate.width && sharp.width < (byWidth.at(-1)?.width ?? 0)
        ? `Shown at ${sharp.width} of ${plate.width} pixels: this graphics card takes no more.`
        : '',
    );
    const chartVersion = byWidth.filter(version => version.width <= CHART_WIDTH).at(-1) ?? small;
    if (chartVersion !== small) this.flat.set(await this.#load(chartVersion.url));
    if (sharp !== small) {
      const bitmap = sharp === chartVersion ? this.flat() : await this.#load(sharp.url);
      if (this.#plate === plate.id) this.sharpest.set(bitmap);
    }
  }

  async #load(url: string): Promise<ImageBitmap> {
    const blob = await firstValueFrom(this.#http.get(url, { responseType: 'blob' }));
    const bitmap = await createImageBitmap(blob, { colorSpaceConversion: 'none', premultiplyAlpha: 'none' });
    this.#open.add(bitmap);
    return bitmap;
  }
}
