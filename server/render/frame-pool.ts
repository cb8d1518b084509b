import { Worker } from 'node:worker_threads';

import { type Picture, type Sampling, type View } from '#shared/render/picture';
import { COUNTER_AT, WasmRenderer } from '#shared/render/wasm-renderer';
import { instantiateRenderer, openRendererModule } from './renderer-module';

/** Rows that a thread takes at a time: small enough that both end together, large enough that counting costs nothing. */
const BAND = 8;

/** Words of shared memory, from COUNTER_AT on: rows handed out, jobs begun, the job's numbers, scratch of each thread. */
const WORDS = { row: 0, job: 1, parametersAt: 2, height: 3, scratchAt: 4 };

/**
 * A thread's program, as text: so it runs from any bundle without a file of its own. It sleeps on the count of jobs
 * and answers each when no rows are left.
 */
const THREAD = `
const { parentPort, workerData: { module, memory, counterAt, band, at, index } } = require('node:worker_threads');
const { renderRows } = new WebAssembly.Instance(module, { env: { memory } }).exports;
const words = new Int32Array(memory.buffer, counterAt, at.scratchAt + index + 1);
for (let job = 0; ; ) {
  Atomics.wait(words, at.job, job);
  job = Atomics.load(words, at.job);
  const parametersAt = words[at.parametersAt], height = words[at.height], scratch = words[at.scratchAt + index];
  for (let row = Atomics.add(words, at.row, band); row < height; row = Atomics.add(words, at.row, band)) {
    renderRows(parametersAt, scratch, row, Math.min(row + band, height));
  }
  parentPort.postMessage(null);
}
`;

/** Renders framed pictures on several threads that share one memory. */
export class FramePool {
  readonly #renderer: WasmRenderer;
  readonly #threads: readonly Worker[];
  readonly #words: Int32Array;
  #busy: Promise<unknown> = Promise.resolve();

  /** @param threads 1 to 64 */
  constructor(threads: number) {
    const opened = openRendererModule('shared');
    this.#renderer = new WasmRenderer(instantiateRenderer(opened), opened.memory);
    const shared = { ...opened, counterAt: COUNTER_AT, band: BAND, at: WORDS };
    this.#words = new Int32Array(opened.memory.buffer, COUNTER_AT, WORDS.scratchAt + threads);
    this.#threads = Array.from(
      { length: threads },
      (_, index) => new Worker(THREAD, { eval: true, workerData: { ...shared, index } }),
    );
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
      const answers = Promise.all(this.#threads.map(answerOf));
      this.#words.set([job.parametersAt, job.height, ...job.scratchAt], WORDS.parametersAt);
      Atomics.add(this.#words, WORDS.job, 1);
      Atomics.notify(this.#words, WORDS.job);
      await answers;
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

function answerOf(thread: Worker): Promise<void> {
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
  });
}
