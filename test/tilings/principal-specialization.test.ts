import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { containsPattern } from "../../src/combinatorics/pattern-containment.js";
import {
  identity,
  permutation,
  permutationsOf,
  printPermutation,
} from "../../src/combinatorics/permutation.js";
import {
  principalSpecialization,
  schubertFactors,
  vexillaryValue,
} from "../../src/tilings/principal-specialization.js";
import { perm, randomPermutation } from "../support/permutations.js";
import { tilingsOf } from "../support/tilings.js";

describe("the factors of a permutation", () => {
  it("are its indecomposable parts, each behind as many fixed points as come before it", () => {
    const factors = (w: string): string[] => schubertFactors(perm(w)).map(printPermutation);
    expect(factors("214365")).toEqual(["21", "1243", "123465"]);
    expect(factors("1432765")).toEqual(["1432", "1234765"]);
    expect(factors("31524")).toEqual(["31524"]);
    expect(factors("132456")).toEqual(["132"]);
    expect(schubertFactors(identity(6))).toEqual([]);
  });

  it("multiply to the number of pipe dreams", () => {
    fc.assert(
      fc.property(randomPermutation(1, 4), randomPermutation(1, 4), (u, v) => {
        const w = permutation([...u, ...v.map((value) => value + u.length)]);
        const product = schubertFactors(w)
          .map((factor) => tilingsOf("ordinary", factor).length)
          .reduce((total, count) => total * count, 1);
        expect(product).toBe(tilingsOf("ordinary", w).length);
      }),
      { numRuns: 60 },
    );
  });
});

describe("the value of a vexillary permutation", () => {
  it("is the number of its pipe dreams, listed", () => {
    for (const w of [1, 2, 3, 4, 5, 6].flatMap((n) => [...permutationsOf(n)])) {
      if (containsPattern(w, perm("2143"))) expect(vexillaryValue(w)).toBeUndefined();
      else expect(vexillaryValue(w)).toBe(BigInt(tilingsOf("bumpless", w).length));
    }
  });

  it("is 1 for the identity and for dominant permutations, also large ones", () => {
    const longest = permutation(Array.from({ length: 60 }, (_, i) => 60 - i));
    expect(vexillaryValue(identity(100))).toBe(1n);
    expect(vexillaryValue(longest)).toBe(1n);
  });
});

describe("the principal specialization", () => {
  it("counts only what has no closed form", () => {
    const counted: string[] = [];
    const w = perm("3,1,5,2,4,6,7,9,8,10");
    const value = principalSpecialization(w, (factor) => {
      counted.push(printPermutation(factor));
      return BigInt(tilingsOf("ordinary", factor).length);
    });
    expect(counted).toEqual(["31524"]);
    expect(value).toBe(5n * 8n);
  });

  it("of many descents next to each other multiplies: 2143… of size 100", () => {
    // S_{s_k} = x_1 + … + x_k, and the s_1, s_3, … commute: 1·3·5·…·99.
    const w = permutation(Array.from({ length: 100 }, (_, i) => (i % 2 === 0 ? i + 2 : i)));
    const odd = Array.from({ length: 50 }, (_, k) => BigInt(2 * k + 1));
    const never = () => {
      throw new Error("expected a closed form");
    };
    expect(principalSpecialization(w, never)).toBe(odd.reduce((product, k) => product * k, 1n));
  });
});
