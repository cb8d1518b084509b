import { type View } from '#shared/render/picture';

/** Draws framed pictures of one plate onto a canvas of its own. */
export interface Drawer {
  /** The widest plate that it takes, pixels. */
  readonly largestPicture: number;
  /**
   * @param picture equirectangular; it stays the caller's to close
   * @throws Error where it does not fit
   */
  setPlate(picture: ImageBitmap): Promise<void>;
  /** @param moving whether the next picture follows at once: soon is then worth more than fine */
  draw(view: View, moving: boolean): void;
  dispose(): void;
}

/** Who draws: the graphics card, or the processor alone. */
export type Way = 'graphics' | 'processor';

/** What a browser has to draw with: a graphics card, one that is but played by the processor, or no WebGL2 at all. */
export type Graphics = 'card' | 'software' | 'none';

/** Names that graphics drivers without a card go by. */
const SOFTWARE = /swiftshader|llvmpipe|softpipe|software|basic render/i;

/** Asks the browser, on a canvas of its own that is let go at once. */
export function graphicsOf(): Graphics {
  const context = document.createElement('canvas').getContext('webgl2');
  if (!context) return 'none';
  const named = context.getExtension('WEBGL_debug_renderer_info');
  const renderer: unknown = context.getParameter(named ? named.UNMASKED_RENDERER_WEBGL : context.RENDERER);
  context.getExtension('WEBGL_lose_context')?.loseContext();
  return SOFTWARE.test(String(renderer)) ? 'software' : 'card';
}
