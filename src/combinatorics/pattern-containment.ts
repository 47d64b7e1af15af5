/**
 * Classical pattern containment of permutations. Depth-first over positions; the values that may stand at
 * the next position of the pattern are an interval between two values chosen before, so each step is one
 * comparison. Exponential in the pattern's size only.
 */
import type { Permutation } from "./permutation.js";

/**
 * Does w contain the pattern: are there positions i_1 < … < i_k at which w has the same relative order
 * as the pattern?
 * @example containsPattern(w, permutation([2, 1, 4, 3])) // is w not vexillary?
 */
export function containsPattern(w: Permutation, pattern: Permutation): boolean {
  const size = pattern.length;
  const neighbours = pattern.map((_, k) => nearestBefore(pattern, k));
  const chosen = new Array<number>(size).fill(0);
  const extend = (k: number, from: number): boolean => {
    const between = neighbours[k];
    if (between === undefined) return true;
    const low = chosen[between.below] ?? 0;
    const high = chosen[between.above] ?? Infinity;
    for (let i = from; i <= w.length - (size - k); i++) {
      const value = w[i] as number;
      if (value <= low || value >= high) continue;
      chosen[k] = value;
      if (extend(k + 1, i + 1)) return true;
    }
    return false;
  };
  return extend(0, 0);
}

/* The earlier positions of the pattern with the nearest values below and above position k; −1: none. */
function nearestBefore(
  pattern: Permutation,
  k: number,
): { readonly below: number; readonly above: number } {
  const value = pattern[k] as number;
  const earlier = pattern.slice(0, k);
  const below = Math.max(0, ...earlier.filter((other) => other < value));
  const above = Math.min(Infinity, ...earlier.filter((other) => other > value));
  return { below: earlier.indexOf(below), above: earlier.indexOf(above) };
}
