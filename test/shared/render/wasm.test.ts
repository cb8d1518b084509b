import { WasmRenderer } from '#shared/render/wasm-renderer';
import { referenceFrame } from '#shared/render/reference';
import { FrameRenderer } from '#shared/render/render-frame';
import { type Picture, type Sampling, type View } from '#shared/render/picture';
import { instantiateRenderer, openRendererModule } from '../../../server/render/renderer-module';
import { difference, panorama, signalToNoiseDb } from '../../support/pictures';
import { renderPoses } from '../../support/render-poses';

type Render = (view: View, sampling: Sampling) => ArrayLike<number>;

function wasmRenderer(source: Picture): Render {
  const opened = openRendererModule('single');
  const renderer = new WasmRenderer(instantiateRenderer(opened), opened.memory);
  renderer.setSource(source);
  return (view, sampling) => renderer.render(view, sampling);
}

function plainRenderer(source: Picture): Render {
  const renderer = new FrameRenderer(source);
  return (view, sampling) =>
    renderer.render(new Uint8ClampedArray(4 * view.width * view.height), view, sampling);
}

const SOURCES = ['courtyard-1024x512.jpg', 'hill-2048x1024.jpg'];

// The bars: the same picture within 3 of 255 and a mean of 0.05; previews 35 dB, exports 44 dB against many samples.
// Truth: the double-precision renderer, itself held against FFmpeg and three.js in reference.test.ts.
describe.each(SOURCES)('framed pictures of %s', name => {
  let source: Picture;
  let ways: (readonly [string, Render])[];

  beforeAll(async () => {
    source = await panorama(name);
    ways = [
      ['WebAssembly', wasmRenderer(source)],
      ['plain TypeScript', plainRenderer(source)],
    ];
  });

  it.each(renderPoses(192, 108))('are the reference, sample for sample: $name', view => {
    const truth = referenceFrame(source, view);
    for (const [way, render] of ways) {
      const { largest, mean } = difference(render(view, 'plain'), truth);
      expect([way, largest <= 3, mean <= 0.05]).toEqual([way, true, true]);
    }
  });

  it.each(renderPoses(240, 136))('are smooth where the view shrinks the source: $name', view => {
    const truth = referenceFrame(source, view, 8);
    for (const [way, render] of ways) {
      expect([way, signalToNoiseDb(render(view, 'preview'), truth) >= 35]).toEqual([way, true]);
      expect([way, signalToNoiseDb(render(view, 'export'), truth) >= 44]).toEqual([way, true]);
    }
  });
});
