import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  codimensionOf,
  degreeOf,
  hilbertNumerator,
  reducedNumerator,
} from "../../src/hilbert/hilbert-numerator.js";
import { startBudget, unlimited } from "../../src/outcomes/budget.js";
import type { MonomialIdeal } from "../../src/polynomials/monomial-ideal.js";
import {
  minimalTransversals,
  numeratorByCounting,
  numeratorByInclusion,
} from "../components/by-definition.js";
import {
  complementsOfCyclicFacets,
  diagonalIdeal,
  idealOf,
  idealOfSupports,
  randomMonomialIdeal,
  randomRenaming,
  renamedIdeal,
} from "../components/samples.js";

const numeratorOf = (ideal: MonomialIdeal) => hilbertNumerator(ideal, unlimited());
const hOf = (ideal: MonomialIdeal) => reducedNumerator(numeratorOf(ideal));
const bigints = (coefficients: readonly number[]) => coefficients.map(BigInt);

describe("the Hilbert numerator", () => {
  it("counts the standard monomials of every degree", () => {
    fc.assert(
      fc.property(randomMonomialIdeal({ variables: 3, generators: 7, largest: 4 }), (ideal) => {
        expect(numeratorOf(ideal)).toEqual(bigints(numeratorByCounting(ideal)));
      }),
    );
  });

  it("is the alternating sum over all sets of generators", () => {
    const squarefree = randomMonomialIdeal({ variables: 9, generators: 9, largest: 1 });
    const any = randomMonomialIdeal({ variables: 7, generators: 9, largest: 5 });
    fc.assert(
      fc.property(fc.oneof(squarefree, any), (ideal) => {
        expect(numeratorOf(ideal)).toEqual(bigints(numeratorByInclusion(ideal)));
      }),
    );
  });

  it("does not depend on the names of the variables", () => {
    const ideals = randomMonomialIdeal({ variables: 6, generators: 12, largest: 3 });
    fc.assert(
      fc.property(ideals, randomRenaming(6), (ideal, renaming) => {
        expect(numeratorOf(renamedIdeal(ideal, renaming))).toEqual(numeratorOf(ideal));
      }),
    );
  });

  it("ends in a non-zero coefficient when those at the end cancel", () => {
    // Standard monomials by degree: 1, 3, 3, 3, 3, …; times (1−t)³ by hand.
    expect(numeratorOf(idealOf("xyz", "x2 xy xz yz2"))).toEqual(bigints([1, 0, -3, 2]));
  });

  it("is a product for generators without common variables", () => {
    // (1−t²)(1−t³)(1−t): a complete intersection, by its Koszul complex.
    expect(numeratorOf(idealOf("uvwxyz", "uv w3 z"))).toEqual(bigints([1, -1, -1, 0, 1, 1, -1]));
  });

  it("sees more variables than fit in a machine word", () => {
    const edges = Array.from({ length: 35 }, (_, k) => [2 * k, 2 * k + 1]);
    const { codimension, h } = hOf(idealOfSupports(70, edges));
    expect(codimension).toBe(35);
    // (1+z)^35 by the Koszul complex.
    expect(h).toHaveLength(36);
    expect(h[17]).toBe(4_537_567_650n);
    expect(degreeOf(numeratorOf(idealOfSupports(70, edges)))).toBe(2n ** 35n);
  });
});

describe("the unit ideal and the zero ideal", () => {
  it("have the numerators 0 and 1", () => {
    expect(numeratorOf(idealOf("xy", "1"))).toEqual([]);
    expect(numeratorOf(idealOf("xy", ""))).toEqual([1n]);
    expect(numeratorOf({ variableCount: 0, generators: [] })).toEqual([1n]);
    expect(numeratorOf({ variableCount: 0, generators: [new Uint16Array(0)] })).toEqual([]);
  });

  it("have codimension infinity and degree 0, and codimension 0 and degree 1", () => {
    expect(codimensionOf([])).toBe(Infinity);
    expect(degreeOf([])).toBe(0n);
    expect(reducedNumerator([])).toEqual({ codimension: Infinity, h: [] });
    expect(codimensionOf([1n])).toBe(0);
    expect(degreeOf([1n])).toBe(1n);
  });
});

describe("codimension and degree", () => {
  it("are the least size of a transversal and, for squarefree ideals, the number of those", () => {
    const squarefree = randomMonomialIdeal({ variables: 8, generators: 10, largest: 1 });
    fc.assert(
      fc.property(squarefree, (ideal) => {
        const sizes = minimalTransversals(ideal).map((t) => t.length);
        const least = Math.min(...sizes);
        const numerator = numeratorOf(ideal);
        expect(codimensionOf(numerator)).toBe(least);
        expect(degreeOf(numerator)).toBe(BigInt(sizes.filter((s) => s === least).length));
      }),
    );
  });

  it("reduce the numerator so that multiplying by powers of 1−t gives it back", () => {
    const ideals = randomMonomialIdeal({ variables: 5, generators: 8, largest: 3 });
    fc.assert(
      fc.property(ideals, (ideal) => {
        const numerator = numeratorOf(ideal);
        fc.pre(numerator.length > 0);
        const { codimension, h } = reducedNumerator(numerator);
        let product = [...h];
        for (let k = 0; k < codimension; k++) {
          product = [...product, 0n].map((c, d) => c - (product[d - 1] ?? 0n));
        }
        expect(product).toEqual(numerator);
        expect(h.reduce((sum, c) => sum + c, 0n)).toBeGreaterThan(0n);
      }),
    );
  });
});

describe("h-vectors of Stanley–Reisner rings", () => {
  // Bruns, Herzog, *Cohen–Macaulay Rings*, section 5.1 and 5.2; Miller, Sturmfels, *Combinatorial
  // Commutative Algebra*, chapter 1 (from memory).
  it("are 1, …, 1 for the boundary of a simplex", () => {
    expect(hOf(idealOf("abcd", "abcd"))).toEqual({ codimension: 1, h: bigints([1, 1, 1, 1]) });
  });

  it("are 1, n−2, 1 for an n-gon", () => {
    for (const n of [4, 5, 6, 7, 12]) {
      const diagonals: number[][] = [];
      for (let i = 0; i < n; i++) {
        for (let j = i + 2; j < n; j++) if (j - i !== n - 1) diagonals.push([i, j]);
      }
      expect(hOf(idealOfSupports(n, diagonals))).toEqual({
        codimension: n - 2,
        h: bigints([1, n - 2, 1]),
      });
    }
  });

  it("are the binomial coefficients for a cross-polytope", () => {
    expect(hOf(idealOf("abcdef", "ad be cf"))).toEqual({
      codimension: 3,
      h: bigints([1, 3, 3, 1]),
    });
  });

  it("are those of the projective plane on six vertices: 1, 3, 6", () => {
    // Reisner's example: ten triangles, any two vertices joined, so f = (1, 6, 15, 10) (from memory).
    const minimalNonfaces = "abc abe acf ade adf bcd bdf bef cde cef";
    const { codimension, h } = hOf(idealOf("abcdef", minimalNonfaces));
    expect(codimension).toBe(3);
    expect(h).toEqual(bigints([1, 3, 6]));
  });

  it("are as large as the upper bound theorem allows for cyclic polytopes", () => {
    // Stanley 1975; McMullen 1970: h_i = C(n−d−1+i, i) for i ≤ d/2, and h_i = h_{d−i} (from memory).
    for (const [n, d] of [
      [6, 3],
      [7, 4],
      [8, 4],
      [8, 5],
      [9, 6],
    ] as const) {
      const h = Array.from({ length: d + 1 }, (_, i) => {
        const k = Math.min(i, d - i);
        return binomial(n - d - 1 + k, k);
      });
      // The Stanley–Reisner ideal: its generators are the minimal non-faces.
      const nonfaces = minimalTransversals(idealOfSupports(n, complementsOfCyclicFacets(n, d)));
      expect(hOf(idealOfSupports(n, nonfaces))).toEqual({ codimension: n - d, h: bigints(h) });
    }
  });
});

describe("generic determinantal ideals, by the diagonals of their minors", () => {
  // The diagonals generate an initial ideal: Sturmfels, *Gröbner bases and Stanley decompositions of
  // determinantal rings*, Math. Z. 205 (1990) (from memory).
  it("have the h-polynomials of Conca and Herzog", () => {
    // Conca, Herzog, *On the Hilbert function of determinantal rings and their canonical module*,
    // Proc. AMS 122 (1994) (from memory).
    for (const [m, n, rank, codimension, h] of [
      [3, 3, 1, 4, [1, 4, 1]],
      [3, 4, 1, 6, [1, 6, 3]],
      [3, 4, 2, 2, [1, 2, 3]],
      [4, 4, 2, 4, [1, 4, 10, 4, 1]],
      [4, 5, 2, 6, [1, 6, 21, 16, 6]],
    ] as const) {
      expect(hOf(diagonalIdeal(m, n, rank + 1))).toEqual({ codimension, h: bigints(h) });
    }
  });

  it("have the degrees of Giambelli", () => {
    // Harris, Tu, *On symmetric and skew-symmetric determinantal varieties*, Topology 23 (1984) (from
    // memory): Π C(m+i, r)/C(r+i, r) over 0 ≤ i < n−r; the codimension is (m−r)(n−r).
    for (const [m, n, r] of [
      [2, 6, 1],
      [4, 4, 1],
      [4, 4, 3],
      [5, 5, 2],
      [5, 5, 3],
      [5, 6, 4],
    ] as const) {
      const numerator = numeratorOf(diagonalIdeal(m, n, r + 1));
      let [above, below] = [1, 1];
      for (let i = 0; i < n - r; i++) {
        above *= binomial(m + i, r);
        below *= binomial(r + i, r);
      }
      expect(codimensionOf(numerator)).toBe((m - r) * (n - r));
      expect(degreeOf(numerator)).toBe(BigInt(above / below));
    }
  });
});

describe("large coefficients", () => {
  it("are exact: (1−t)^n has binomial coefficients", () => {
    for (const n of [54, 55, 60, 66, 128]) {
      const maximal = idealOfSupports(
        n,
        Array.from({ length: n }, (_, v) => [v]),
      );
      const numerator = numeratorOf(maximal);
      let binomialCoefficient = 1n;
      for (let k = 0; k <= n; k++) {
        expect(numerator[k]).toBe(k % 2 === 0 ? binomialCoefficient : -binomialCoefficient);
        binomialCoefficient = (binomialCoefficient * BigInt(n - k)) / BigInt(k + 1);
      }
      expect(reducedNumerator(numerator)).toEqual({ codimension: n, h: [1n] });
    }
  });

  it("stay exact when a later sum makes them small again", () => {
    // Linear forms times a triangle of pairs (h = 1 + 2z) and times a pentagon (h = 1 + 3z + z²).
    const linear = Array.from({ length: 70 }, (_, v) => [v]);
    const triangle = [
      [70, 71],
      [70, 72],
      [71, 72],
    ];
    const pentagon = [
      [73, 75],
      [74, 76],
      [75, 77],
      [76, 73],
      [77, 74],
    ];
    const ideal = idealOfSupports(78, [...linear, ...triangle, ...pentagon]);
    expect(hOf(ideal)).toEqual({ codimension: 75, h: bigints([1, 5, 7, 2]) });
  });

  it("are exact above shared variables", () => {
    // The variable 0 times each of the others: K = (1−t) + t·(1−t)^n − … = 1 − t + t·(1−t)^n.
    const n = 70;
    const star = idealOfSupports(
      n + 1,
      Array.from({ length: n }, (_, v) => [0, v + 1]),
    );
    const numerator = numeratorOf(star);
    const power = numeratorOf(
      idealOfSupports(
        n,
        Array.from({ length: n }, (_, v) => [v]),
      ),
    );
    const expected = [0n, ...power].map((c, d) => c + (d === 0 ? 1n : 0n) - (d === 1 ? 1n : 0n));
    expect(numerator).toEqual(expected);
    expect([codimensionOf(numerator), degreeOf(numerator)]).toEqual([1, 1n]);
  });
});

describe("the budget of the numerator", () => {
  it("end the work when it is cancelled", () => {
    const budget = startBudget({ cancelled: () => true });
    expect(() => hilbertNumerator(diagonalIdeal(5, 5, 3), budget)).toThrow(
      /^cancelled, Hilbert numerator of \d+ monomials$/,
    );
  });

  it("is asked for every generator, so that long lists cannot outrun it", () => {
    const star = idealOfSupports(
      120,
      Array.from({ length: 119 }, (_, v) => [0, v + 1]),
    );
    let calls = 0;
    const spend = (): void => {
      calls++;
    };
    hilbertNumerator(star, { spend, elapsed: () => 0 });
    expect(calls).toBeGreaterThan(star.generators.length);
  });
});

function binomial(n: number, k: number): number {
  return k === 0 ? 1 : (binomial(n - 1, k - 1) * n) / k;
}
