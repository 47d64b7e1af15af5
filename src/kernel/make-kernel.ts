/** The two kernels over a memory: compiled where the machine allows it, plain everywhere. */
import { COMPILED_KERNEL } from "./compiled.js";
import type { Kernel } from "./kernel.js";
import { plainColumns } from "./plain-columns.js";
import { plainFourRows } from "./plain-four-rows.js";
import { plainMonomials } from "./plain-monomials.js";
import { plainRows } from "./plain-rows.js";

/** A memory that both kernels can work in; all its bytes are zero at first. */
export interface KernelMemory {
  readonly buffer: SharedArrayBuffer | ArrayBuffer;
  /** The same memory for WebAssembly, where there is WebAssembly. */
  readonly shared: WebAssembly.Memory | undefined;
}

/** The kernel in plain TypeScript. */
export function plainKernel({ buffer }: KernelMemory): Kernel {
  return {
    kind: "plain",
    ...plainMonomials(buffer),
    ...plainColumns(buffer),
    ...plainRows(buffer),
    ...plainFourRows(buffer),
  };
}

/** The compiled kernel; undefined where WebAssembly, shared memory or vector instructions are missing. */
export function compiledKernel({ shared }: KernelMemory): Kernel | undefined {
  if (shared === undefined) return undefined;
  try {
    const bytes = Uint8Array.from(atob(COMPILED_KERNEL), (c) => c.charCodeAt(0));
    const module = new WebAssembly.Module(bytes);
    const { exports } = new WebAssembly.Instance(module, { env: { memory: shared } });
    const functions = exports as unknown as Omit<Kernel, "kind">;
    return { kind: "compiled", ...functions };
  } catch {
    return undefined;
  }
}
