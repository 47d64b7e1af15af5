/** The part of the WebAssembly JavaScript interface (W3C) that the kernel uses; the core has no DOM types. */
// biome-ignore lint/style/noNamespace: the interface itself is a namespace.
declare namespace WebAssembly {
  class Module {
    constructor(bytes: Uint8Array);
  }
  class Instance {
    constructor(module: Module, imports: Record<string, Record<string, unknown>>);
    readonly exports: Record<string, unknown>;
  }
  class Memory {
    constructor(descriptor: { initial: number; maximum: number; shared: boolean });
    readonly buffer: SharedArrayBuffer;
  }
}
