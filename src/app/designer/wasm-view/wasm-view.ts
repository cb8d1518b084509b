import { type Sampling, type View } from '#shared/render/picture';
import { type Answer, type Question } from './messages';

type Asked = Question extends infer Q ? (Q extends Question ? Omit<Q, 'id'> : never) : never;

interface Wish {
  readonly canvas: HTMLCanvasElement;
  readonly view: View;
  readonly sampling: Sampling;
  readonly settle: (drawn: boolean) => void;
  readonly fail: (reason: Error) => void;
}

/**
 * Draws framed pictures by WebAssembly in a worker, for browsers without a graphics card or WebGL2.
 *
 * One picture is drawn at a time; of those asked for meanwhile only the last is drawn next, so that a drag never lags
 * behind the pointer.
 */
export class WasmView {
  readonly #worker = new Worker(new URL('./renderer.worker', import.meta.url), { type: 'module' });
  readonly #open = new Map<number, { resolve: (answer: Answer) => void; reject: (reason: Error) => void }>();
  #lastId = 0;
  #drawing = false;
  #next: Wish | undefined;

  constructor() {
    this.#worker.addEventListener('message', ({ data }: MessageEvent<Answer>) => {
      const asked = this.#open.get(data.id);
      this.#open.delete(data.id);
      if (data.failure === undefined) asked?.resolve(data);
      else asked?.reject(new Error(data.failure));
    });
    this.#worker.addEventListener('error', event => {
      this.#giveUp(new Error(event.message || 'The renderer could not be started.'));
    });
  }

  /**
   * @param picture equirectangular; it is copied and stays the caller's
   * @throws Error where it is too large for the browser or for memory
   */
  async setSource(picture: ImageBitmap | ImageData): Promise<void> {
    await this.#ask({ kind: 'source', picture });
  }

  /**
   * @param canvas one with a 2D context or none yet; its size becomes the view's
   * @param sampling `plain` while playing, `preview` where the picture stands
   * @returns whether it was drawn; false where a later wish took its place
   * @throws Error before a source is set, or where the renderer has ended
   */
  draw(canvas: HTMLCanvasElement, view: View, sampling: Sampling = 'preview'): Promise<boolean> {
    return new Promise((settle, fail) => {
      this.#next?.settle(false);
      this.#next = { canvas, view, sampling, settle, fail };
      void this.#drawNext();
    });
  }

  /** Ends the worker; what was asked for is not drawn. */
  dispose(): void {
    this.#giveUp(new Error('The view was closed.'));
    this.#worker.terminate();
  }

  async #drawNext(): Promise<void> {
    const wish = this.#next;
    if (this.#drawing || !wish) return;
    this.#next = undefined;
    this.#drawing = true;
    let answer: Answer;
    try {
      answer = await this.#ask({ kind: 'draw', view: wish.view, sampling: wish.sampling });
    } catch (error) {
      wish.fail(error instanceof Error ? error : new Error(String(error)));
      return;
    } finally {
      this.#drawing = false;
      // The worker draws the next picture while this one is put on the canvas.
      void this.#drawNext();
    }
    wish.settle(answer.rgba !== undefined && put(wish.canvas, new ImageData(answer.rgba, wish.view.width)));
  }

  #ask(question: Asked): Promise<Answer> {
    const id = ++this.#lastId;
    return new Promise((resolve, reject) => {
      this.#open.set(id, { resolve, reject });
      this.#worker.postMessage({ ...question, id });
    });
  }

  #giveUp(reason: Error): void {
    this.#next?.settle(false);
    this.#next = undefined;
    for (const { reject } of this.#open.values()) reject(reason);
    this.#open.clear();
  }
}

function put(canvas: HTMLCanvasElement, picture: ImageData): boolean {
  if (canvas.width !== picture.width) canvas.width = picture.width;
  if (canvas.height !== picture.height) canvas.height = picture.height;
  const context = canvas.getContext('2d');
  context?.putImageData(picture, 0, 0);
  return context !== null;
}
