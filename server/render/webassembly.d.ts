/** The part of the WebAssembly JavaScript interface that the renderer uses: Node's types leave it out. */
declare namespace WebAssembly {
  class Module {
    constructor(bytes: Uint8Array);
  }
  class Memory {
    constructor(descriptor: { initial: number; maximum: number; shared?: boolean });
    readonly buffer: ArrayBufferLike;
    grow(pages: number): number;
  }
  class Instance {
    constructor(module: Module, imports: { env: { memory: Memory } });
    readonly exports: Readonly<Record<string, unknown>>;
  }
}
