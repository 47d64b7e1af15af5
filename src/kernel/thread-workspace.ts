/**
 * The workspace of a thread. Computations are synchronous, so one is enough, and who comes next divides it
 * anew: many small ideals touch the same few pages. The memory has as many addresses as can be had, 4 GiB at
 * most; pages that nobody touches cost nothing.
 */
import type { Kernel } from "./kernel.js";
import { compiledKernel, type KernelMemory, plainKernel } from "./make-kernel.js";
import { Workspace } from "./workspace.js";

const PAGE = 65_536;
const LARGEST = 2 ** 32;
const SMALLEST = 2 ** 25;

/** The largest memory that can be had: half after half is tried. */
function largestMemory(): KernelMemory {
  for (let size = LARGEST; ; size /= 2) {
    try {
      if (typeof WebAssembly === "undefined") {
        return { buffer: new ArrayBuffer(Math.min(size, LARGEST / 4)), shared: undefined };
      }
      const pages = size / PAGE;
      const shared = new WebAssembly.Memory({ initial: pages, maximum: pages, shared: true });
      return { buffer: shared.buffer, shared };
    } catch (error) {
      if (size <= SMALLEST) throw error;
    }
  }
}

/** A new workspace; the compiled kernel is taken where it runs, unless another is wished. */
export function createWorkspace(kind?: Kernel["kind"]): Workspace {
  const memory = largestMemory();
  const compiled = kind === "plain" ? undefined : compiledKernel(memory);
  return new Workspace(memory, compiled ?? plainKernel(memory));
}

const ofThisThread: { workspace?: Workspace } = {};

/** The workspace of this thread, made when it is first asked for. */
export function workspace(): Workspace {
  ofThisThread.workspace ??= createWorkspace();
  return ofThisThread.workspace;
}

/** From now on this thread computes with the given kernel. */
export function chooseKernel(kind: Kernel["kind"]): void {
  ofThisThread.workspace = createWorkspace(kind);
}
