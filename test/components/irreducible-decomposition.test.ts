import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type IrreducibleIdeal,
  irreducibleDecomposition,
} from "../../src/components/irreducible-decomposition.js";
import { startBudget, unlimited } from "../../src/outcomes/budget.js";
import { totalDegree } from "../../src/polynomials/exponents.js";
import { type MonomialIdeal, monomialIdeal } from "../../src/polynomials/monomial-ideal.js";
import { irreduciblesBySplitting } from "./by-definition.js";
import {
  boxBelow,
  contains,
  idealOf,
  lcmOfGenerators,
  monomial,
  randomMonomialIdeal,
  randomRenaming,
  renamed,
  renamedIdeal,
  treeIdeal,
} from "./samples.js";

const irreduciblesOf = (ideal: MonomialIdeal) => irreducibleDecomposition(ideal, unlimited());
const sorted = (list: readonly IrreducibleIdeal[]) => list.map((b) => b.join(" ")).sort();
const small = randomMonomialIdeal({ variables: 4, generators: 7, largest: 3 });

describe("the irreducible decomposition", () => {
  it("is the one found by splitting generators into coprime factors", () => {
    const flat = randomMonomialIdeal({ variables: 6, generators: 6, largest: 2 });
    fc.assert(
      fc.property(fc.oneof(small, flat), (ideal) => {
        expect(sorted(irreduciblesOf(ideal))).toEqual(sorted(irreduciblesBySplitting(ideal)));
      }),
      { numRuns: 300 },
    );
  });

  it("intersects in the ideal, and every component is needed", () => {
    fc.assert(
      fc.property(small, (ideal) => {
        const components = irreduciblesOf(ideal);
        const needed = new Set<number>();
        for (const m of boxBelow(lcmOfGenerators(ideal))) {
          const lacking = [...components.keys()].filter(
            (k) => !components[k]?.some((b, v) => b > 0 && (m[v] as number) >= b),
          );
          expect(lacking.length === 0).toBe(contains(ideal, m));
          if (lacking.length === 1) needed.add(lacking[0] as number);
        }
        expect(needed.size).toBe(components.length);
      }),
    );
  });

  it("does not depend on the names of the variables", () => {
    fc.assert(
      fc.property(small, randomRenaming(4), (ideal, renaming) => {
        const moved = irreduciblesOf(ideal).map((b) => renamed(b, renaming));
        expect(sorted(irreduciblesOf(renamedIdeal(ideal, renaming)))).toEqual(sorted(moved));
      }),
    );
  });

  it("is the zero ideal for the zero ideal and empty for the unit ideal", () => {
    expect(irreduciblesOf(idealOf("xy", ""))).toEqual([monomial("xy", "1")]);
    expect(irreduciblesOf(idealOf("xy", "1"))).toEqual([]);
  });

  it("keeps exponents as large as an exponent may be", () => {
    const components = irreduciblesOf(idealOf("xy", "x65535 x65534y y65535"));
    expect(sorted(components)).toEqual(["65534 65535", "65535 1"]);
  });

  it("stops when the budget is spent", () => {
    const budget = startBudget({ cancelled: () => true });
    expect(() => irreducibleDecomposition(treeIdeal(5), budget)).toThrow(
      /^cancelled, irreducible components, \d+ at generator \d+$/,
    );
  });
});

describe("known irreducible decompositions", () => {
  it("of (x², xy) is (x) ∩ (x², y)", () => {
    // Cox, Little, O'Shea, *Ideals, Varieties, and Algorithms*, section 4.8 (from memory).
    expect(sorted(irreduciblesOf(idealOf("xy", "x2 xy")))).toEqual(["1 0", "2 1"]);
  });

  it("of an ideal in two variables goes down the staircase", () => {
    // Miller, Sturmfels, *Combinatorial Commutative Algebra*, section 3.1 (from memory).
    const components = irreduciblesOf(idealOf("xy", "x5 x4y x2y2 y4"));
    expect(sorted(components)).toEqual(["2 4", "4 2", "5 1"]);
  });

  it("of a power of the maximal ideal counts compositions", () => {
    // (x_1, …, x_n)^d has the socle in degree d−1, so C(n+d−2, n−1) components (from memory).
    const generators = [...boxBelow([4, 4, 4])].filter((m) => totalDegree(m) === 4);
    const components = irreduciblesOf(monomialIdeal(3, generators));
    expect(components).toHaveLength(10);
    expect(new Set(components.map(totalDegree))).toEqual(new Set([4 + 3 - 1]));
  });

  it("of the permutohedron ideal has a component for every set of variables", () => {
    // Miller, Sturmfels, *Combinatorial Commutative Algebra*, chapters 4 and 5 (from memory): 2^n − 1 of them.
    // On a set S the values of a permutation have a maximum of at least |S|, and it can be |S|.
    for (const n of [3, 4, 5]) {
      const components = irreduciblesOf(monomialIdeal(n, permutationsAsExponents(n)));
      expect(components).toHaveLength(2 ** n - 1);
      for (const b of components) {
        const support = [...b].filter((e) => e > 0);
        expect(new Set(support)).toEqual(new Set([support.length]));
      }
    }
  });

  it("of the tree ideal has n! components, the permutations", () => {
    // Postnikov, Shapiro, *Trees, parking functions, syzygies, and deformations of monomial ideals*, Trans.
    // AMS 356 (2004); Miller, Sturmfels, chapter 4 (from memory).
    for (const n of [3, 4, 5]) {
      expect(sorted(irreduciblesOf(treeIdeal(n)))).toEqual(sorted(permutationsAsExponents(n)));
    }
  });
});

/* The vectors with the entries 1 … n in all orders. */
function permutationsAsExponents(n: number): Uint16Array[] {
  return [...boxBelow(new Array<number>(n).fill(n))].filter(
    (b) => new Set(b).size === n && !b.includes(0),
  );
}
