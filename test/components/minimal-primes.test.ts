import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { minimalPrimes } from "../../src/components/minimal-primes.js";
import { LimitReached, startBudget, unlimited } from "../../src/outcomes/budget.js";
import type { MonomialIdeal } from "../../src/polynomials/monomial-ideal.js";
import { minimalTransversals } from "./by-definition.js";
import {
  complementsOfCyclicFacets,
  diagonalIdeal,
  idealOf,
  idealOfSupports,
  randomMonomialIdeal,
} from "./samples.js";

const primesOf = (ideal: MonomialIdeal) => minimalPrimes(ideal, unlimited());
const sorted = (sets: readonly (readonly number[])[]) => sets.map((set) => set.join(" ")).sort();

describe("minimal primes", () => {
  it("are the minimal transversals of the supports, each once and ascending", () => {
    const squarefree = randomMonomialIdeal({ variables: 9, generators: 12, largest: 1 });
    const any = randomMonomialIdeal({ variables: 6, generators: 9, largest: 3 });
    fc.assert(
      fc.property(fc.oneof(squarefree, any), (ideal) => {
        expect(sorted(primesOf(ideal))).toEqual(sorted(minimalTransversals(ideal)));
      }),
      { numRuns: 300 },
    );
  });

  it("of the minimal primes give the minimal generators back", () => {
    // Alexander duality: transversals of transversals are the edges (Berge, *Hypergraphs*, 1989, chapter 2;
    // from memory).
    const squarefree = randomMonomialIdeal({ variables: 12, generators: 14, largest: 1 });
    fc.assert(
      fc.property(squarefree, (ideal) => {
        const dual = idealOfSupports(12, primesOf(ideal));
        expect(idealOfSupports(12, primesOf(dual))).toEqual(ideal);
      }),
    );
  });

  it("are the empty prime for the zero ideal and none for the unit ideal", () => {
    expect(primesOf(idealOf("xy", ""))).toEqual([[]]);
    expect(primesOf(idealOf("xy", "1"))).toEqual([]);
  });

  it("do not see exponents", () => {
    // Cox, Little, O'Shea, *Ideals, Varieties, and Algorithms*, section 9.1 on monomial ideals (from
    // memory): V(x²y, x³) is the hyperplane x = 0.
    expect(primesOf(idealOf("xy", "x2y x3"))).toEqual([[0]]);
  });

  it("stop when the budget is spent", () => {
    const budget = startBudget({ cancelled: () => true });
    expect(() => minimalPrimes(diagonalIdeal(5, 5, 3), budget)).toThrow(LimitReached);
    expect(() => minimalPrimes(diagonalIdeal(5, 5, 3), budget)).toThrow(
      /^cancelled, minimal primes, \d+ so far$/,
    );
  });
});

describe("known numbers of minimal transversals", () => {
  it("are products for disjoint edges", () => {
    const triangles = Array.from({ length: 7 }, (_, k) => [3 * k, 3 * k + 1, 3 * k + 2]);
    expect(primesOf(idealOfSupports(21, triangles))).toHaveLength(3 ** 7);
  });

  it("are 3^(n/3) for the pairs in disjoint triangles, the most a graph can have", () => {
    // Moon, Moser, *On cliques in graphs*, Israel J. Math. 3 (1965) (from memory).
    const pairs = [0, 3, 6, 9, 12].flatMap((k) => [
      [k, k + 1],
      [k, k + 2],
      [k + 1, k + 2],
    ]);
    expect(primesOf(idealOfSupports(15, pairs))).toHaveLength(3 ** 5);
  });

  it("are n for the complete graph", () => {
    const pairs = Array.from({ length: 8 }, (_, b) => Array.from({ length: b }, (_, a) => [a, b]));
    expect(primesOf(idealOfSupports(8, pairs.flat()))).toHaveLength(8);
  });

  it("are the Perrin numbers for cycles", () => {
    // Füredi, *The number of maximal independent sets in connected graphs*, J. Graph Theory 11 (1987); OEIS
    // A001608 (from memory): P(n) = P(n−2) + P(n−3).
    const perrin = [3, 2, 5, 5, 7, 10, 12, 17, 22, 29, 39, 51, 68, 90];
    const counts = perrin.map((_, k) => {
      const n = k + 3;
      const edges = Array.from({ length: n }, (_, v) => [v, (v + 1) % n]);
      return primesOf(idealOfSupports(n, edges)).length;
    });
    expect(counts).toEqual(perrin);
  });

  it("are the lines again for the Fano plane", () => {
    // Berge, *Hypergraphs*, 1989 (from memory): the Fano plane is its own transversal hypergraph.
    const lines = Array.from({ length: 7 }, (_, k) => [k, (k + 1) % 7, (k + 3) % 7]);
    const plane = idealOfSupports(7, lines);
    expect(idealOfSupports(7, primesOf(plane))).toEqual(plane);
    expect(primesOf(plane)).toHaveLength(7);
  });

  it("are the complements of the facets for the non-faces of a cyclic polytope", () => {
    // Gale 1963: the facets of C(n, d); there are 14 for C(7, 4) and 20 for C(8, 4) (from memory).
    for (const [n, d, facets] of [
      [7, 4, 14],
      [8, 4, 20],
    ] as const) {
      const complements = complementsOfCyclicFacets(n, d);
      const nonfaces = primesOf(idealOfSupports(n, complements));
      expect(complements).toHaveLength(facets);
      expect(sorted(primesOf(idealOfSupports(n, nonfaces)))).toEqual(sorted(complements));
    }
  });

  it("are the degrees of Giambelli for the diagonals of minors, all of one codimension", () => {
    // Sturmfels 1990: a shellable complex; degrees 175 and 1764 by the formula of Giambelli (Harris, Tu,
    // Topology 23 (1984); from memory).
    for (const [n, degree] of [
      [5, 175],
      [6, 1764],
    ] as const) {
      const primes = primesOf(diagonalIdeal(n, n, 3));
      expect(primes).toHaveLength(degree);
      expect(new Set(primes.map((prime) => prime.length))).toEqual(new Set([(n - 2) ** 2]));
    }
  });
});
