import { type Sampling, type View } from '#shared/render/picture';

/** What the worker is asked; answered in turn, by `id`. */
export type Question =
  | { readonly id: number; readonly kind: 'source'; readonly picture: ImageBitmap | ImageData }
  | { readonly id: number; readonly kind: 'draw'; readonly view: View; readonly sampling: Sampling };

/** What it answers: a drawn picture's RGBA bytes, nothing for a source, or what went wrong. */
export interface Answer {
  readonly id: number;
  readonly rgba?: Uint8ClampedArray<ArrayBuffer>;
  readonly failure?: string;
}
