import { fork } from 'node:child_process';
import { type WorkerProgram } from '../config';
import { type PictureReport, type PictureTask } from './picture-report';

/** Decoding the largest picture takes 3 s of processor time; a machine may be very busy. */
const MOST_SEC = 120;

/** Pictures decoded at once: each may need 600 MB. */
const AT_ONCE = 2;

/** Reads pictures in processes of their own, two at a time; the others wait in line. */
export class PictureReader {
  #running = 0;
  readonly #waiting: (() => void)[] = [];

  constructor(private readonly program: WorkerProgram) {}

  /**
   * @param signal ends the work where nobody wants it any more
   * @throws Error where the worker was ended before it answered
   */
  async read(task: PictureTask, signal: AbortSignal): Promise<PictureReport> {
    await this.#turn();
    try {
      signal.throwIfAborted();
      return await this.#run(task, signal);
    } finally {
      this.#running--;
      this.#waiting.shift()?.();
    }
  }

  async #turn(): Promise<void> {
    while (this.#running >= AT_ONCE) await new Promise<void>(resolve => this.#waiting.push(resolve));
    this.#running++;
  }

  #run(task: PictureTask, signal: AbortSignal): Promise<PictureReport> {
    return new Promise((resolve, reject) => {
      const worker = fork(this.program.file, {
        execArgv: [...this.program.execArgv],
        // It needs no secret of ours, so it gets none.
        env: {},
        stdio: ['ignore', 'ignore', 'pipe', 'ipc'],
        timeout: MOST_SEC * 1000,
        killSignal: 'SIGKILL',
        signal,
      });
      let said = '';
      worker.stderr?.on('data', (words: Buffer) => {
        said = `${said}${words.toString()}`.slice(-2000);
      });
      worker.once('message', (report: PictureReport) => resolve(report));
      worker.once('error', reject);
      worker.once('close', (code, ended) => {
        if (ended === 'SIGKILL' || ended === 'SIGSEGV' || ended === 'SIGABRT' || ended === 'SIGBUS') {
          resolve({
            refused: {
              kind: 'broken-picture',
              detail: 'The decoder gave up on it: it is damaged, or too costly to decode',
            },
          });
        } else reject(new Error(`The picture worker ended with ${code ?? ended} and no answer. ${said}`));
      });
      worker.send(task);
    });
  }
}
