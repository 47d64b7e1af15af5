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
/** Without WebAssembly: an array of this size is had nearly everywhere. */
const LARGEST_WITHOUT = 2 ** 30;
const SMALLEST = 2 ** 25;

/** The largest memory that can be had: half after half is tried, with WebAssembly and then without. */
function largestMemory(): KernelMemory {
  const shared = typeof WebAssembly === "undefined" ? undefined : largest(LARGEST, sharedMemory);
  if (shared !== undefined) return { buffer: shared.buffer, shared };
  const buffer = largest(LARGEST_WITHOUT, (bytes) => new ArrayBuffer(bytes));
  if (buffer === undefined) throw new RangeError(`expected ${SMALLEST} bytes of memory, got none`);
  return { buffer, shared: undefined };
}

function sharedMemory(bytes: number): WebAssembly.Memory {
  const pages = bytes / PAGE;
  return new WebAssembly.Memory({ initial: pages, maximum: pages, shared: true });
}

/** What `make` makes of the largest size for which it does not throw; undefined when it always does. */
function largest<T>(size: number, make: (bytes: number) => T): T | undefined {
  for (let bytes = size; bytes >= SMALLEST; bytes /= 2) {
    try {
      return make(bytes);
    } catch {
      // Addresses are limited here; half as many may do.
    }
  }
  return undefined;
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
