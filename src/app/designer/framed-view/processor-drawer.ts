import { type View } from '#shared/render/picture';
import { WasmView } from '../wasm-view/wasm-view';
import { type Drawer } from './drawer';

/** Memory for more than this is not to be counted on, pixels. */
const LARGEST_PICTURE = 8192;

/** Draws by WebAssembly in a worker, where there is no graphics card: the same pictures, by the same formulas as exports. */
export class ProcessorDrawer implements Drawer {
  readonly largestPicture = LARGEST_PICTURE;
  readonly #wasm = new WasmView();
  readonly #canvas: HTMLCanvasElement;
  readonly #fail: (reason: Error) => void;

  /** @param fail told where the renderer has ended */
  constructor(canvas: HTMLCanvasElement, fail: (reason: Error) => void) {
    this.#canvas = canvas;
    this.#fail = fail;
  }

  setPlate(picture: ImageBitmap): Promise<void> {
    return this.#wasm.setSource(picture);
  }

  draw(view: View, moving: boolean): void {
    this.#wasm.draw(this.#canvas, view, moving ? 'plain' : 'preview').catch(this.#fail);
  }

  dispose(): void {
    this.#wasm.dispose();
  }
}
