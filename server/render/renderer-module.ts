import { bytesFromBase64 } from '#shared/render/base64';
import { sharedBase64, singleBase64 } from '#shared/render/generated/renderer-wasm';
import { areRendererExports, MOST_PAGES, type RendererExports } from '#shared/render/wasm-renderer';

/** The renderer's compiled code, and a memory that fits it. */
export interface RendererModule {
  readonly module: WebAssembly.Module;
  readonly memory: WebAssembly.Memory;
}

/** @param memory `shared` where several threads are to render into one memory */
export function openRendererModule(memory: 'shared' | 'single'): RendererModule {
  const shared = memory === 'shared';
  return {
    module: new WebAssembly.Module(bytesFromBase64(shared ? sharedBase64 : singleBase64)),
    memory: new WebAssembly.Memory({ initial: 1, maximum: MOST_PAGES, shared }),
  };
}

/** @throws TypeError where the module is not the renderer's */
export function instantiateRenderer({ module, memory }: RendererModule): RendererExports {
  const { exports } = new WebAssembly.Instance(module, { env: { memory } });
  if (!areRendererExports(exports)) throw new TypeError('The embedded renderer is not complete.');
  return exports;
}
