import { halfWidthOnPlane, matrixFromQuat } from './camera';
import { endOfLevels, fillLevels, layOutLevels, type Level } from './levels';
import { type Picture, type Sampling, type View } from './picture';
import { samplePlan } from './sampling';

/** What wasm/renderer.ts exports. */
export interface RendererExports {
  /** Bytes of scratch that a thread needs for pictures of a width. */
  scratchSize(width: number): number;
  /** Renders rows `from`…`to` (excluded) as the parameters at an address say. */
  renderRows(parametersAt: number, scratchAt: number, from: number, to: number): void;
}

/** Whether an instance's exports are the renderer's. */
export function areRendererExports(exports: object): exports is RendererExports {
  return ['scratchSize', 'renderRows'].every(name => typeof Reflect.get(exports, name) === 'function');
}

/** A WebAssembly.Memory. */
export interface RendererMemory {
  readonly buffer: ArrayBufferLike;
  grow(pages: number): number;
}

/** Everything that a thread needs to take part in a picture; addresses in the memory. */
export interface FrameJob {
  readonly parametersAt: number;
  readonly scratchAt: readonly number[];
  readonly outAt: number;
  readonly outBytes: number;
  readonly height: number;
}

/** 2 GiB: what a renderer's memory may grow to. The module is built with it. */
export const MOST_PAGES = 32_768;

/** A number that threads count rows with. */
export const COUNTER_AT = 64;
const PARAMETERS_AT = 1024;
const LEVELS_AT = 4096;
const PAGE = 65_536;

// Places of the parameters, in doubles: as in wasm/renderer.ts.
const OUT = 2;
const MATRIX = 3;
const EYE = 12;
const HALF_WIDTH = 13;
const LEVEL_COUNT = 14;
const REDUCE_AT = 15;
const SAMPLE_COUNT = 16;
const SAMPLES = 17;
const LEVELS = 49;
const LEVEL_SIZE = 4;

/**
 * Speaks with the WebAssembly renderer: lays out its memory, writes a view's parameters. The host instantiates the
 * module (shared/render/generated/) with the memory and lends both.
 */
export class WasmRenderer {
  #levels: readonly Level[] = [];
  readonly #exports: RendererExports;
  readonly #memory: RendererMemory;

  constructor(exports: RendererExports, memory: RendererMemory) {
    this.#exports = exports;
    this.#memory = memory;
  }

  /** Copies the source in and reduces it; the picture is not needed afterwards. */
  setSource(source: Picture): void {
    const levels = layOutLevels(source.width, source.height, LEVELS_AT);
    this.#reach(endOfLevels(levels));
    fillLevels(new Uint8Array(this.#memory.buffer), levels, source);
    this.#levels = levels;
  }

  /**
   * Writes the parameters of a picture; the job's rows can then be rendered, by several threads at once.
   *
   * @param threads how many scratch areas to set aside
   * @throws RangeError where no source was set, or memory does not suffice
   */
  prepare(view: View, sampling: Sampling, threads = 1): FrameJob {
    const levels = this.#levels;
    if (levels.length === 0) throw new RangeError('The renderer has no source picture yet.');
    const scratch = Math.ceil(this.#exports.scratchSize(view.width) / 64) * 64;
    const scratchAt = Array.from({ length: threads }, (_, i) => endOfLevels(levels) + i * scratch);
    const outAt = endOfLevels(levels) + threads * scratch;
    const outBytes = 4 * view.width * view.height;
    this.#reach(outAt + outBytes + 64);
    this.#writeParameters(view, sampling, outAt);
    new Int32Array(this.#memory.buffer, COUNTER_AT, 1)[0] = 0;
    return { parametersAt: PARAMETERS_AT, scratchAt, outAt, outBytes, height: view.height };
  }

  /** @returns RGBA bytes, a window on the memory that holds until the next call */
  render(view: View, sampling: Sampling): Uint8Array {
    const job = this.prepare(view, sampling);
    this.#exports.renderRows(job.parametersAt, job.scratchAt[0], 0, job.height);
    return this.picture(job);
  }

  /** @returns RGBA bytes of a finished job, a window on the memory */
  picture({ outAt, outBytes }: FrameJob): Uint8Array {
    return new Uint8Array(this.#memory.buffer, outAt, outBytes);
  }

  #writeParameters(view: View, sampling: Sampling, outAt: number): void {
    const to = new Float64Array(
      this.#memory.buffer,
      PARAMETERS_AT,
      LEVELS + LEVEL_SIZE * this.#levels.length,
    );
    const plan = samplePlan(sampling, view, this.#levels[0].width);
    to[0] = view.width;
    to[1] = view.height;
    to[OUT] = outAt;
    matrixFromQuat(to.subarray(MATRIX), view.orientation);
    to[EYE] = view.eye;
    to[HALF_WIDTH] = halfWidthOnPlane(view);
    to[LEVEL_COUNT] = this.#levels.length;
    to[REDUCE_AT] = plan.reduceAt;
    to[SAMPLE_COUNT] = plan.places.length / 2;
    to.set(plan.places, SAMPLES);
    this.#levels.forEach(({ offset, stride, width, height }, i) => {
      to.set([offset, stride, width, height], LEVELS + LEVEL_SIZE * i);
    });
  }

  #reach(bytes: number): void {
    const missing = Math.ceil((bytes - this.#memory.buffer.byteLength) / PAGE);
    if (missing > 0) this.#memory.grow(missing);
  }
}
