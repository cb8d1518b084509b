import { Worker } from 'node:worker_threads';

import { type Picture, type Sampling, type View } from '#shared/render/picture';
import { COUNTER_AT, WasmRenderer } from '#shared/render/wasm-renderer';
import { instantiateRenderer, openRendererModule } from './renderer-module';

/** Rows that a thread takes at a time: small enough that both end together, large enough that counting costs nothing. */
const BAND = 16;

/**
 * A thread's program, as text: so it runs from any bundle without a file of its own. A message is a job's numbers; an
 * answer says that no rows are left.
 */
const THREAD = `
const { parentPort, workerData: { module, memory, counterAt, band } } = require('node:worker_threads');
const { renderRows } = new WebAssembly.Instance(module, { env: { memory } }).exports;
const counter = new Int32Array(memory.buffer, counterAt, 1);
parentPort.on('message', ({ parametersAt, scratchAt, height }) => {
  for (let row = Atomics.add(counter, 0, band); row < height; row = Atomics.add(counter, 0, band)) {
    renderRows(parametersAt, scratchAt, row, Math.min(row + band, height));
  }
  parentPort.postMessage(null);
});
`;

/** Renders framed pictures on several threads that share one memory. */
export class FramePool {
  readonly #renderer: WasmRenderer;
  readonly #threads: readonly Worker[];
  #busy: Promise<unknown> = Promise.resolve();

  /** @param threads at least 1 */
  constructor(threads: number) {
    const opened = openRendererModule('shared');
    this.#renderer = new WasmRenderer(instantiateRenderer(opened), opened.memory);
    const workerData = { ...opened, counterAt: COUNTER_AT, band: BAND };
    this.#threads = Array.from({ length: threads }, () => new Worker(THREAD, { eval: true, workerData }));
  }

  /** Copies the source in, after the pictures asked for before. */
  setSource(source: Picture): Promise<void> {
    return this.#inTurn(() => Promise.resolve(this.#renderer.setSource(source)));
  }

  /**
   * @param use gets the picture's RGBA bytes, a window on memory that holds until what it returns has settled
   * @returns what `use` returns
   * @throws Error where a thread ended; RangeError without a source
   */
  render<T>(view: View, sampling: Sampling, use: (rgba: Uint8Array) => T | Promise<T>): Promise<T> {
    return this.#inTurn(async () => {
      const job = this.#renderer.prepare(view, sampling, this.#threads.length);
      await Promise.all(
        this.#threads.map((thread, i) =>
          askThread(thread, {
            parametersAt: job.parametersAt,
            scratchAt: job.scratchAt[i],
            height: job.height,
          }),
        ),
      );
      return use(this.#renderer.picture(job));
    });
  }

  /** Ends the threads; pictures under way are given up. */
  async close(): Promise<void> {
    await Promise.all(this.#threads.map(thread => thread.terminate()));
  }

  /** One thing at a time: the memory holds one picture. */
  #inTurn<T>(work: () => Promise<T>): Promise<T> {
    const done = this.#busy.then(work, work);
    this.#busy = done.catch(() => undefined);
    return done;
  }
}

interface ThreadJob {
  readonly parametersAt: number;
  readonly scratchAt: number;
  readonly height: number;
}

function askThread(thread: Worker, job: ThreadJob): Promise<void> {
  return new Promise((resolve, reject) => {
    const settle = (act: () => void) => () => {
      thread.off('message', answered).off('error', failed).off('exit', ended);
      act();
    };
    const answered = settle(resolve);
    const failed = (error: Error) => settle(() => reject(error))();
    const ended = settle(() =>
      reject(new Error('A rendering thread was ended before its picture was done.')),
    );
    thread.on('message', answered).on('error', failed).on('exit', ended);
    thread.postMessage(job);
  });
}
