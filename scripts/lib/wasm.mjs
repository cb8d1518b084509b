import { ROOT } from './project.mjs';

/** Where the built renderer stands, committed like the other generated modules. */
export const RENDERER_MODULE = 'shared/render/generated/renderer-wasm.ts';

/** Built from the same source: `shared` for threads over one memory, `single` for hosts without shared memory. */
const VARIANTS = {
  shared: ['--enable', 'simd,bulk-memory,threads', '--sharedMemory'],
  single: ['--enable', 'simd,bulk-memory'],
};

/** 64 KiB pages: 2 GiB, the most that any size of source asks for. */
const MOST_PAGES = 32768;

/**
 * The WebAssembly renderer as a module that every tool can import: no plugin, no fetch.
 *
 * @returns its text; the same for the same source and compiler
 */
export async function rendererModule() {
  const lines = ['// Made by `npm run generate` from wasm/renderer.ts. Not to be edited.'];
  for (const [name, options] of Object.entries(VARIANTS)) {
    const binary = await compile(options);
    lines.push(`/** ${binary.length} bytes. */`);
    lines.push(`export const ${name}Base64 =\n  '${Buffer.from(binary).toString('base64')}';`);
  }
  return `${lines.join('\n')}\n`;
}

async function compile(options) {
  const { default: asc } = await import('assemblyscript/asc');
  let binary;
  const { error, stderr } = await asc.main(
    [
      'wasm/renderer.ts',
      '-O3',
      '--noAssert',
      ...['--runtime', 'stub'],
      '--importMemory',
      ...['--maximumMemory', String(MOST_PAGES)],
      ...['--baseDir', ROOT, '--outFile', 'renderer.wasm'],
      ...options,
    ],
    {
      writeFile: (_name, contents) => {
        binary = contents;
      },
    },
  );
  if (error || !binary) throw new Error(`wasm/renderer.ts does not compile:\n${stderr.toString()}`);
  return binary;
}
