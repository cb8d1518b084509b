import { halfWidthOnPlane, matrixFromQuat, sourcePixelsPerPixel } from './camera';
import { endOfLevels, fillLevels, layOutLevels, type Level } from './levels';
import { type Picture, type Sampling, type View } from './picture';
import { samplePlan } from './sampling';

/**
 * Framed pictures in plain TypeScript, where WebAssembly cannot be had: the same samples from the same levels as
 * wasm/renderer.ts takes, in doubles.
 */
export class FrameRenderer {
  readonly #levels: readonly Level[];
  readonly #bytes: Uint8Array;
  readonly #matrix = new Float64Array(9);
  /** Place of a sample in the source's level 0, pixels, and the projection's scale t there. */
  readonly #place = new Float64Array(3);

  constructor(source: Picture) {
    this.#levels = layOutLevels(source.width, source.height, 0);
    this.#bytes = new Uint8Array(endOfLevels(this.#levels));
    fillLevels(this.#bytes, this.#levels, source);
  }

  /** @param out receives RGBA bytes, `4 · width · height` of them, values rounded to the nearest */
  render(out: Uint8ClampedArray, view: View, sampling: Sampling): Uint8ClampedArray {
    matrixFromQuat(this.#matrix, view.orientation);
    const { places, reduceAt } = samplePlan(sampling, view, this.#levels[0].width);
    const perPixel = (2 * halfWidthOnPlane(view)) / view.width;
    const spanned = sourcePixelsPerPixel(view, this.#levels[0].width);
    const share = 2 / places.length;
    const sum = new Float64Array(4);
    for (let pixel = 0; pixel < view.width * view.height; pixel++) {
      const column = pixel % view.width;
      const row = Math.floor(pixel / view.width);
      sum.fill(0);
      for (let s = 0; s < places.length; s += 2) {
        const x = (column + places[s] - view.width / 2) * perPixel;
        const y = (view.height / 2 - row - places[s + 1]) * perPixel;
        this.#placeAt(x, y, view.eye);
        this.#add(sum, this.#levelFor(this.#place[2] * spanned, reduceAt), share);
      }
      out.set(sum, 4 * pixel);
    }
    return out;
  }

  #placeAt(x: number, y: number, eye: number): void {
    const m = this.#matrix;
    const a = 1 + eye;
    const squared = x * x + y * y;
    const t = (eye * a + Math.sqrt(a * a + squared * (1 - eye * eye))) / (squared + a * a);
    const vx = t * x;
    const vy = t * y;
    const vz = eye - t * a;
    const nx = m[0] * vx + m[1] * vy + m[2] * vz;
    const ny = m[3] * vx + m[4] * vy + m[5] * vz;
    const nz = m[6] * vx + m[7] * vy + m[8] * vz;
    const [{ width, height }] = this.#levels;
    this.#place[0] = (Math.atan2(nx, -nz) / (2 * Math.PI) + 0.5) * width;
    this.#place[1] = (0.5 - Math.atan2(ny, Math.sqrt(nx * nx + nz * nz)) / Math.PI) * height;
    this.#place[2] = t;
  }

  #levelFor(spanned: number, reduceAt: number): Level {
    let index = 0;
    for (let limit = reduceAt; index + 1 < this.#levels.length && spanned >= limit; limit *= 2) index++;
    return this.#levels[index];
  }

  #add(sum: Float64Array, { width, height, offset, stride }: Level, share: number): void {
    const [first] = this.#levels;
    let x = (this.#place[0] * width) / first.width - 0.5;
    if (x < 0) x += width;
    const y = Math.min(Math.max((this.#place[1] * height) / first.height - 0.5, 0), height - 1);
    const left = Math.min(Math.floor(x), width - 1);
    const top = Math.floor(y);
    const right = x - left;
    const below = y - top;
    const bytes = this.#bytes;
    const upper = offset + top * stride + 4 * left;
    const lower = upper + stride;
    for (let c = 0; c < 4; c++) {
      const high = bytes[upper + c] + right * (bytes[upper + 4 + c] - bytes[upper + c]);
      const low = bytes[lower + c] + right * (bytes[lower + 4 + c] - bytes[lower + c]);
      sum[c] += share * (high + below * (low - high));
    }
  }
}
