import { bytesFromBase64 } from '#shared/render/base64';
import { singleBase64 } from '#shared/render/generated/renderer-wasm';
import { type Picture } from '#shared/render/picture';
import { areRendererExports, MOST_PAGES, WasmRenderer } from '#shared/render/wasm-renderer';
import { type Answer, type Question } from './messages';

const memory = new WebAssembly.Memory({ initial: 1, maximum: MOST_PAGES });
const { exports } = new WebAssembly.Instance(new WebAssembly.Module(bytesFromBase64(singleBase64)), {
  env: { memory },
});
if (!areRendererExports(exports)) throw new TypeError('The embedded renderer is not complete.');
const renderer = new WasmRenderer(exports, memory);

addEventListener('message', ({ data }: MessageEvent<Question>) => {
  const answer = answerTo(data);
  postMessage(answer, { transfer: answer.rgba ? [answer.rgba.buffer] : [] });
});

function answerTo(question: Question): Answer {
  try {
    if (question.kind === 'draw')
      return {
        id: question.id,
        rgba: new Uint8ClampedArray(renderer.render(question.view, question.sampling)),
      };
    renderer.setSource(pixelsOf(question.picture));
    return { id: question.id };
  } catch (error) {
    return { id: question.id, failure: error instanceof Error ? error.message : String(error) };
  }
}

/** @throws Error where the picture is larger than the browser draws */
function pixelsOf(picture: ImageBitmap | ImageData): Picture {
  const { width, height } = picture;
  if (picture instanceof ImageData) return { width, height, rgba: picture.data };
  const context = new OffscreenCanvas(width, height).getContext('2d', { willReadFrequently: true });
  if (!context) throw new Error('The picture is larger than this browser draws.');
  context.drawImage(picture, 0, 0);
  picture.close();
  return { width, height, rgba: context.getImageData(0, 0, width, height).data };
}
