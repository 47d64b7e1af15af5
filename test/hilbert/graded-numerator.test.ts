import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  degreeOfKey,
  difference,
  gradedNumerator,
  keyOf,
  packGrading,
} from "../../src/hilbert/graded-numerator.js";
import { hilbertNumerator } from "../../src/hilbert/hilbert-numerator.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { type Exponents, totalDegree } from "../../src/polynomials/exponents.js";
import type { MonomialIdeal } from "../../src/polynomials/monomial-ideal.js";
import { idealOf, monomial, randomMonomialIdeal } from "../components/samples.js";

/** The finest grading of all: every variable for itself. */
function fineGrading(count: number) {
  const unit = (v: number) => Int32Array.from({ length: count }, (_, k) => (k === v ? 1 : 0));
  return packGrading({ weights: Array.from({ length: count }, (_, v) => unit(v)) }, count);
}

/** Inclusion and exclusion over all sets of generators, one term a multidegree, up to a degree. */
function byInclusion({ generators, variableCount }: MonomialIdeal, most: number) {
  const grading = fineGrading(variableCount);
  const sum = new Map<number, number>();
  const include = (k: number, lcm: Exponents, sign: number): void => {
    const generator = generators[k];
    if (generator !== undefined) {
      include(k + 1, lcm, sign);
      const larger = lcm.map((e, v) => Math.max(e, generator[v] as number));
      include(k + 1, larger, -sign);
    } else if (totalDegree(lcm) <= most) {
      const key = keyOf(grading, lcm);
      sum.set(key, (sum.get(key) ?? 0) + sign);
    }
  };
  include(0, new Uint16Array(variableCount), 1);
  return new Map([...sum].filter(([, c]) => c !== 0));
}

const ideals = randomMonomialIdeal({ variables: 5, generators: 7, largest: 4 });

describe("graded numerators", () => {
  it("are those of inclusion and exclusion, in every multidegree up to the bound", () => {
    fc.assert(
      fc.property(ideals, fc.integer({ min: 0, max: 20 }), (ideal, most) => {
        const grading = fineGrading(ideal.variableCount);
        const numerator = gradedNumerator(ideal.generators, grading, most, unlimited());
        expect(new Map(numerator)).toEqual(byInclusion(ideal, most));
      }),
      { numRuns: 300 },
    );
  });

  it("add up to the ungraded numerator by total degree", () => {
    fc.assert(
      fc.property(ideals, (ideal) => {
        const grading = fineGrading(ideal.variableCount);
        const byDegree: bigint[] = [];
        for (const [key, c] of gradedNumerator(ideal.generators, grading, 60, unlimited())) {
          const degree = degreeOfKey(key);
          while (byDegree.length <= degree) byDegree.push(0n);
          byDegree[degree] = (byDegree[degree] as bigint) + BigInt(c);
        }
        while (byDegree.at(-1) === 0n) byDegree.pop();
        expect(byDegree).toEqual(hilbertNumerator(ideal, unlimited()));
      }),
      { numRuns: 200 },
    );
  });

  it("differ first where one ideal has more monomials, and count them", () => {
    const grading = fineGrading(3);
    const smaller = idealOf("xyz", "x2 yz3").generators;
    const larger = idealOf("xyz", "x2 xy yz3").generators;
    const numerator = (generators: readonly Exponents[]) =>
      gradedNumerator(generators, grading, 2, unlimited());
    const more = difference(numerator(smaller), numerator(larger));
    expect([...more]).toEqual([[keyOf(grading, monomial("xyz", "xy")), 1]]);
  });

  it("keep weights and degrees of either sign apart in their keys", () => {
    const grading = packGrading({ weights: [Int32Array.from([1, -1, 0])] }, 3);
    expect(degreeOfKey(keyOf(grading, monomial("xyz", "y9")))).toBe(9);
    expect(degreeOfKey(keyOf(grading, monomial("xyz", "x9")))).toBe(9);
    expect(keyOf(grading, monomial("xyz", "xy"))).toBe(keyOf(grading, monomial("xyz", "z2")));
    expect(keyOf(grading, monomial("xyz", "x2"))).not.toBe(keyOf(grading, monomial("xyz", "y2")));
  });

  it("refuse degrees that the packing cannot hold", () => {
    const grading = fineGrading(2);
    expect(() => gradedNumerator([], grading, grading.largestDegree + 1, unlimited())).toThrow(
      "expected a degree of at most 1024, got 1025",
    );
  });
});
