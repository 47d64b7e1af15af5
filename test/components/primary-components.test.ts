import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  multiplicityAt,
  type PrimaryComponent,
  primaryComponents,
  primaryIdeal,
} from "../../src/components/primary-components.js";
import { codimensionOf, degreeOf, hilbertNumerator } from "../../src/hilbert/hilbert-numerator.js";
import { isList, startBudget, unlimited } from "../../src/outcomes/budget.js";
import { type MonomialIdeal, monomialIdeal } from "../../src/polynomials/monomial-ideal.js";
import {
  associatedPrimesByColons,
  irreduciblesBySplitting,
  lengthByListing,
  minimalTransversals,
} from "./by-definition.js";
import {
  boxBelow,
  contains,
  diagonalIdeal,
  idealOf,
  lcmOfGenerators,
  randomMonomialIdeal,
  randomRenaming,
  renamedIdeal,
  treeIdeal,
  variables,
} from "./samples.js";

const squarefree = randomMonomialIdeal({ variables: 7, generators: 8, largest: 1 });
const small = randomMonomialIdeal({ variables: 4, generators: 6, largest: 3 });
const ideals = fc.oneof(small, squarefree);

describe("primary components", () => {
  it("have the associated primes, found as colon ideals, each once", () => {
    fc.assert(
      fc.property(ideals, (ideal) => {
        const primes = componentsOf(ideal).map(({ prime }) => prime.join(" "));
        const expected = associatedPrimesByColons(ideal).map((prime) => prime.join(" "));
        expect([...primes].sort()).toEqual(expected.sort());
      }),
      { numRuns: 200 },
    );
  });

  it("are embedded where the prime is not a minimal one", () => {
    fc.assert(
      fc.property(ideals, (ideal) => {
        const minimal = new Set(minimalTransversals(ideal).map((prime) => prime.join(" ")));
        for (const { prime, embedded, codimension, degree } of componentsOf(ideal)) {
          expect(embedded).toBe(!minimal.has(prime.join(" ")));
          expect(codimension).toBe(prime.length);
          expect(degree).toBe(1);
        }
      }),
    );
  });

  it("are primary ideals whose intersection is the ideal, and none can be left out", () => {
    fc.assert(
      fc.property(ideals, (ideal) => {
        const components = componentsOf(ideal);
        const primaries = components.map((c) => primaryIdeal(ideal.variableCount, c));
        primaries.forEach((primary, k) => {
          expect(isPrimaryTo(primary, components[k]?.prime ?? [])).toBe(true);
        });
        const needed = new Set<number>();
        for (const m of boxBelow(lcmOfGenerators(ideal))) {
          const lacking = [...primaries.keys()].filter(
            (k) => !contains(primaries[k] as MonomialIdeal, m),
          );
          expect(lacking.length === 0).toBe(contains(ideal, m));
          if (lacking.length === 1) needed.add(lacking[0] as number);
        }
        expect(needed.size).toBe(components.length);
      }),
    );
  });

  it("collect the irreducible components by their radical", () => {
    fc.assert(
      fc.property(ideals, (ideal) => {
        const collected = componentsOf(ideal).flatMap(({ prime, irreducibles }) =>
          irreducibles.map((b) => {
            expect([...b.keys()].filter((v) => (b[v] as number) > 0)).toEqual([...prime]);
            return b.join(" ");
          }),
        );
        const expected = irreduciblesBySplitting(ideal).map((b) => b.join(" "));
        expect(collected.sort()).toEqual(expected.sort());
      }),
    );
  });

  it("are listed by codimension, then by prime", () => {
    fc.assert(
      fc.property(ideals, (ideal) => {
        const keys = componentsOf(ideal).map(({ prime }) =>
          String.fromCharCode(prime.length, ...prime),
        );
        expect(keys).toEqual([...keys].sort());
      }),
    );
  });

  it("do not depend on the names of the variables", () => {
    const describeAll = (ideal: MonomialIdeal, rename: (v: number) => number): string[] =>
      componentsOf(ideal)
        .map(({ prime, multiplicity, embedded }) => {
          const moved = prime.map(rename).sort((a, b) => a - b);
          return `${moved.join(" ")}: ${multiplicity} ${embedded}`;
        })
        .sort();
    fc.assert(
      fc.property(small, randomRenaming(4), (ideal, renaming) => {
        expect(describeAll(renamedIdeal(ideal, renaming), (v) => v)).toEqual(
          describeAll(ideal, (v) => renaming[v] as number),
        );
      }),
    );
  });

  it("of the zero ideal are the zero ideal, of the unit ideal none", () => {
    const [zero, ...others] = componentsOf(idealOf("xy", ""));
    expect(others).toEqual([]);
    expect(zero).toMatchObject({ prime: [], codimension: 0, multiplicity: 1n, embedded: false });
    expect(primaryIdeal(2, zero as PrimaryComponent)).toEqual(idealOf("xy", ""));
    expect(componentsOf(idealOf("xy", "1"))).toEqual([]);
  });

  it("are undecided when the budget is spent", () => {
    const cancelled = () => startBudget({ cancelled: () => true });
    const square = (ideal: MonomialIdeal) =>
      monomialIdeal(
        ideal.variableCount,
        ideal.generators.map((g) => g.map((e) => 2 * e)),
      );
    expect(primaryComponents(diagonalIdeal(5, 5, 3), cancelled())).toMatchObject({
      kind: "undecided",
      limit: "cancelled",
    });
    expect(primaryComponents(square(diagonalIdeal(5, 5, 3)), cancelled())).toMatchObject({
      kind: "undecided",
      limit: "cancelled",
    });
  });
});

describe("multiplicities", () => {
  it("are the lengths of the localisations, null at embedded primes", () => {
    fc.assert(
      fc.property(ideals, (ideal) => {
        for (const { prime, multiplicity, embedded } of componentsOf(ideal)) {
          expect(multiplicity).toBe(embedded ? null : lengthByListing(ideal, prime));
        }
      }),
    );
  });

  it("in the top dimension add up to the degree", () => {
    const larger = randomMonomialIdeal({ variables: 7, generators: 12, largest: 4 });
    fc.assert(
      fc.property(fc.oneof(larger, ideals), (ideal) => {
        const numerator = hilbertNumerator(ideal, unlimited());
        const codimension = codimensionOf(numerator);
        const top = componentsOf(ideal).filter((c) => c.codimension === codimension);
        const sum = top.reduce((total, c) => total + (c.multiplicity ?? 0n), 0n);
        expect(sum).toBe(degreeOf(numerator));
        expect(top.every((c) => !c.embedded)).toBe(true);
      }),
    );
  });

  it("are exact beyond what could be listed", () => {
    // A complete intersection: the lengths are the products of the exponents (Bézout), with w999 or with x.
    const ideal = idealOf("uvwxyz", "u999 v999 w999x y998 z");
    expect(componentsOf(ideal).map((c) => c.multiplicity)).toEqual([
      999n * 999n * 999n * 998n,
      999n * 999n * 998n,
    ]);
  });

  it("of the tree ideal count the trees on labelled vertices", () => {
    // Postnikov, Shapiro, *Trees, parking functions, syzygies, and deformations of monomial ideals*, Trans.
    // AMS 356 (2004) (from memory): (n+1)^(n−1) standard monomials, the parking functions.
    for (const n of [2, 3, 4, 5, 6]) {
      const [component, ...others] = componentsOf(treeIdeal(n));
      expect(others).toEqual([]);
      expect(component?.multiplicity).toBe(BigInt((n + 1) ** (n - 1)));
    }
  });

  it("are 0 at a prime that does not contain the ideal, and 1 at the zero ideal", () => {
    expect(multiplicityAt(idealOf("xyz", "xy z2"), variables([0, 1]), unlimited())).toBe(0n);
    expect(multiplicityAt(idealOf("xyz", ""), [], unlimited())).toBe(1n);
  });
});

describe("known primary decompositions", () => {
  it("of (x², xy): the line x = 0 and an embedded point", () => {
    // Atiyah, Macdonald, *Introduction to Commutative Algebra*, chapter 4 (from memory).
    const [line, point, ...others] = componentsOf(idealOf("xy", "x2 xy"));
    expect(others).toEqual([]);
    expect(line).toMatchObject({ prime: [0], multiplicity: 1n, embedded: false });
    expect(point).toMatchObject({ prime: [0, 1], multiplicity: null, embedded: true });
    expect(primaryIdeal(2, line as PrimaryComponent)).toEqual(idealOf("xy", "x"));
    expect(primaryIdeal(2, point as PrimaryComponent)).toEqual(idealOf("xy", "x2 y"));
  });

  it("of (x)(x, y)(x, y, z): a chain of three primes, two of them embedded", () => {
    // Products of monomial primes: Conca, Herzog, *Castelnuovo–Mumford regularity of products of ideals*,
    // Collect. Math. 54 (2003) (from memory).
    const ideal = idealOf("xyz", "x3 x2y x2z x2y xy2 xyz");
    const components = componentsOf(ideal);
    expect(components.map((c) => c.prime)).toEqual([[0], [0, 1], [0, 1, 2]]);
    expect(components.map((c) => c.embedded)).toEqual([false, true, true]);
  });

  it("of the square of the edge ideal of a triangle: an embedded point", () => {
    // Simis, Vasconcelos, Villarreal, *On the ideal theory of graphs*, J. Algebra 167 (1994) (from memory):
    // powers of an edge ideal have no embedded primes exactly for bipartite graphs.
    const triangle = idealOf("xyz", "x2y2 x2z2 y2z2 x2yz xy2z xyz2");
    expect(componentsOf(triangle).map((c) => [c.prime, c.multiplicity])).toEqual([
      [[0, 1], 3n],
      [[0, 2], 3n],
      [[1, 2], 3n],
      [[0, 1, 2], null],
    ]);
    const square = idealOf("abcd", "a2b2 b2c2 c2d2 a2d2 ab2c abcd a2bd bc2d acd2");
    expect(componentsOf(square).some((c) => c.embedded)).toBe(false);
  });

  it("of the diagonals of minors: only minimal primes, of multiplicity 1", () => {
    // Sturmfels, Math. Z. 205 (1990) (from memory): the initial ideal is squarefree and Cohen–Macaulay.
    const components = componentsOf(diagonalIdeal(4, 5, 3));
    expect(components).toHaveLength(50);
    for (const { codimension, multiplicity, embedded } of components) {
      expect([codimension, multiplicity, embedded]).toEqual([6, 1n, false]);
    }
  });
});

function componentsOf(ideal: MonomialIdeal): readonly PrimaryComponent[] {
  const components = primaryComponents(ideal);
  if (!isList(components)) throw new Error(components.reason);
  return components;
}

/* Generated in the variables of the prime alone, with a power of each: then the radical is the prime. */
function isPrimaryTo({ generators }: MonomialIdeal, prime: readonly number[]): boolean {
  const supports = generators.map((g) => [...g.keys()].filter((v) => (g[v] as number) > 0));
  const inside = supports.every((support) => support.every((v) => prime.includes(v)));
  const powers = supports.filter((support) => support.length === 1).map(([v]) => v);
  return inside && prime.every((v) => powers.includes(v));
}
