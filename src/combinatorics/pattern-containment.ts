/** Classical pattern containment of permutations. */
import type { Permutation } from "./permutation.js";

/**
 * Does w contain the pattern: are there positions i_1 < … < i_k at which w has the same relative order
 * as the pattern? Depth-first over positions; exponential in the pattern's size only.
 */
export function containsPattern(w: Permutation, pattern: Permutation): boolean {
  const chosen: number[] = [];
  const fits = (value: number): boolean =>
    chosen.every(
      (c, k) => c < value === (pattern[k] as number) < (pattern[chosen.length] as number),
    );
  const extend = (from: number): boolean => {
    if (chosen.length === pattern.length) return true;
    for (let i = from; i <= w.length - (pattern.length - chosen.length); i++) {
      const value = w[i] as number;
      if (!fits(value)) continue;
      chosen.push(value);
      if (extend(i + 1)) return true;
      chosen.pop();
    }
    return false;
  };
  return extend(0);
}
