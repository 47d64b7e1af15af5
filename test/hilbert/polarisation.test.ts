import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { polarise } from "../../src/hilbert/polarisation.js";
import { dividesExponents, type Exponents, totalDegree } from "../../src/polynomials/exponents.js";
import { idealOf, randomMonomialIdeal } from "../components/samples.js";

const ideals = randomMonomialIdeal({ variables: 12, generators: 9, largest: 6 });

describe("polarisation", () => {
  it("keeps the degrees of all least common multiples, so that the Taylor resolutions agree", () => {
    fc.assert(
      fc.property(ideals, fc.infiniteStream(fc.boolean()), (ideal, chosen) => {
        const { weights, generators } = polarise(ideal);
        const lcm = new Uint16Array(ideal.variableCount);
        const union = new Set<number>();
        ideal.generators.forEach((g, k) => {
          if (!chosen.next().value) return;
          for (const [v, e] of g.entries()) lcm[v] = Math.max(e, lcm[v] as number);
          for (const bit of bitsOf(generators[k] as Int32Array)) union.add(bit);
        });
        const degree = [...union].reduce((sum, bit) => sum + (weights[bit] as number), 0);
        expect(degree).toBe(totalDegree(lcm));
      }),
      { numRuns: 300 },
    );
  });

  it("turns division into inclusion", () => {
    fc.assert(
      fc.property(ideals, ideals, ({ generators: one }, { generators: two }) => {
        // Not minimal, on purpose: polarisation does not ask.
        const monomials: Exponents[] = [...one, ...two];
        const { generators } = polarise({ variableCount: 12, generators: monomials });
        const sets = generators.map(bitsOf);
        for (const [i, a] of monomials.entries()) {
          for (const [j, b] of monomials.entries()) {
            const included = sets[i]?.every((bit) => sets[j]?.includes(bit));
            expect(included).toBe(dividesExponents(a, b));
          }
        }
      }),
    );
  });

  it("gives every exponent that occurs one bit, weighted by the step from the one below", () => {
    const { weights, generators } = polarise(idealOf("xy", "x5y x2y3 y4"));
    expect(weights).toEqual([2, 3, 1, 2, 1]);
    expect(generators.map(bitsOf)).toEqual([
      [0, 1, 2],
      [0, 2, 3],
      [2, 3, 4],
    ]);
  });

  it("has no bits without generators, and none for 1", () => {
    expect(polarise(idealOf("xy", ""))).toEqual({ weights: [], generators: [] });
    expect(polarise(idealOf("xy", "1"))).toEqual({ weights: [], generators: [new Int32Array(0)] });
  });
});

function bitsOf(words: Int32Array): number[] {
  return Array.from({ length: 32 * words.length }, (_, bit) => bit).filter(
    (bit) => ((words[bit >> 5] as number) & (1 << (bit & 31))) !== 0,
  );
}
