import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { containsPattern } from "../../src/combinatorics/pattern-containment.js";
import {
  identity,
  inverse,
  type Permutation,
  permutation,
  permutationsOf,
  printPermutation,
} from "../../src/combinatorics/permutation.js";
import { CDG_PATTERNS } from "../reference/klein/cdg-patterns.js";
import { VEXILLARY_NUMBERS } from "../reference/knutson-miller-yong/vexillary-numbers.js";
import { perm, randomPermutation } from "../support/permutations.js";

/* By definition: some subsequence, flattened, is the pattern. */
function containsByDefinition(w: Permutation, pattern: Permutation): boolean {
  const flattened = (values: readonly number[]): string =>
    values.map((v) => values.filter((other) => other <= v).length).join();
  const subsequences = (from: number, size: number): number[][] =>
    size === 0
      ? [[]]
      : w
          .slice(from)
          .flatMap((v, i) => subsequences(from + i + 1, size - 1).map((rest) => [v, ...rest]));
  return subsequences(0, pattern.length).some((values) => flattened(values) === pattern.join());
}

describe("pattern containment", () => {
  it("finds 2143 in 214365 and in itself, not in 1432", () => {
    expect(containsPattern(perm("214365"), perm("2143"))).toBe(true);
    expect(containsPattern(perm("2143"), perm("2143"))).toBe(true);
    expect(containsPattern(perm("1432"), perm("2143"))).toBe(false);
    expect(containsPattern(perm("21"), perm("2143"))).toBe(false);
    expect(containsPattern(perm("1"), perm("1"))).toBe(true);
  });

  it("agrees with the definition", () => {
    fc.assert(
      fc.property(randomPermutation(1, 8), randomPermutation(1, 5), (w, pattern) => {
        expect(containsPattern(w, pattern)).toBe(containsByDefinition(w, pattern));
      }),
      { numRuns: 300 },
    );
  });

  it("does not change when both are inverted", () => {
    fc.assert(
      fc.property(randomPermutation(1, 12), randomPermutation(1, 5), (w, pattern) => {
        expect(containsPattern(inverse(w), inverse(pattern))).toBe(containsPattern(w, pattern));
      }),
    );
  });

  it("counts the vexillary permutations", () => {
    const counts = VEXILLARY_NUMBERS.map(
      (_, k) =>
        Array.from(permutationsOf(k + 1)).filter((w) => !containsPattern(w, perm("2143"))).length,
    );
    expect(counts).toEqual(VEXILLARY_NUMBERS);
  });

  it("counts the permutations without a pattern of S_3 by the Catalan numbers", () => {
    // Knuth, *The Art of Computer Programming* 1, section 2.2.1; Simion, Schmidt 1985 (from memory).
    for (const pattern of permutationsOf(3)) {
      const avoiding = Array.from(permutationsOf(6)).filter((w) => !containsPattern(w, pattern));
      expect(avoiding).toHaveLength(132);
    }
  });

  it("leaves out exactly 13254 and 21543 in S_5 of Klein's list", () => {
    const failing = Array.from(permutationsOf(5)).filter((w) =>
      CDG_PATTERNS.some((pattern) => containsPattern(w, perm(pattern))),
    );
    expect(failing.map(printPermutation)).toEqual(["13254", "21543"]);
  });

  it("ends soon for patterns that are nearly everywhere", () => {
    const layers = permutation(Array.from({ length: 60 }, (_, i) => (i % 2 === 0 ? i + 2 : i)));
    expect(containsPattern(layers, perm("321"))).toBe(false);
    expect(containsPattern(layers, identity(30))).toBe(true);
    expect(containsPattern(identity(100), perm("21"))).toBe(false);
  });
});
