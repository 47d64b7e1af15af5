import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type Permutation,
  permutationsOf,
  readPermutation,
} from "../../src/combinatorics/permutation.js";
import { primaryComponents } from "../../src/components/primary-components.js";
import { lowerUpperFamily, lowerUpperIdeal } from "../../src/families/lower-upper.js";
import { lowerUpperScheme } from "../../src/families/lower-upper-scheme.js";
import type { Polynomial } from "../../src/polynomials/polynomial.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { LOWER_UPPER_DEGREES } from "../reference/knutson/lower-upper-degrees.js";
import { refused } from "../support/faults.js";
import { accepted, polynomials, termSets } from "../support/reading.js";
import { evaluate, rankOf } from "./determinants.js";
import {
  codimensionAndDegree,
  limitOf,
  type Matrix,
  product,
  square,
  unipotentInverse,
} from "./matrix-points.js";

const idealOf = (w: string) => lowerUpperIdeal(accepted(readPermutation(w)));
const listed = (w: Permutation) => lowerUpperIdeal(w).generatingSets[0].polynomials();
const small = fc.bigInt({ min: -9n, max: 9n });
const upTo = (n: number): Permutation[] =>
  Array.from({ length: n }, (_, k) => [...permutationsOf(k + 1)]).flat();

/** The matrices D·w and w⁻¹·D′ of the drawn entries, moved by a lower and an upper unipotent matrix. */
function orbitPoint(w: Permutation, draw: () => bigint): { x: Matrix; y: Matrix } {
  const n = w.length;
  const lower = square(n, (i, j) => (i === j ? 1n : i > j ? draw() : 0n));
  const upper = square(n, (i, j) => (i === j ? 1n : i < j ? draw() : 0n));
  const a = square(n, (i, j) => (w[i] === j + 1 ? draw() : 0n));
  const b = square(n, (i, j) => (w[j] === i + 1 ? draw() : 0n));
  const x = product(product(lower, a), upper);
  const y = product(product(unipotentInverse(upper), b), unipotentInverse(lower));
  return { x, y };
}

/** The partial derivative of a squarefree polynomial at a point. */
function derivativeAt(f: Polynomial, v: number, point: readonly bigint[]): bigint {
  return f.monomials.reduce((sum, m, k) => {
    if (m[v] === 0) return sum;
    const others = point.filter((_, u) => u !== v && m[u] === 1);
    return sum + others.reduce((value, x) => value * x, f.numerators[k] as bigint);
  }, 0n);
}

/** Polynomials with coefficients ±1 as functions on points over the field of two elements, bit v for variable v. */
function modTwo(fs: readonly Polynomial[]): (point: number) => boolean {
  const masks = fs.map((f) => f.monomials.map((m) => m.reduce((mask, e, v) => mask | (e << v), 0)));
  return (point) => masks.every((terms) => terms.filter((m) => (m & point) === m).length % 2 === 0);
}

describe("the listed generators", () => {
  it("of n = 1 are none: E_1 is the plane", () => {
    expect(idealOf("1").generatingSets[0].polynomials()).toEqual([]);
    expect(codimensionAndDegree(idealOf("1"))).toEqual([0, 1n]);
  });

  it.each([
    ["12", ["x11*y12 + x12*y22", "y21*x11 + y22*x21", "x12*y21 - y12*x21"]],
    [
      "21",
      [
        "x11*y12 + x12*y22",
        "y21*x11 + y22*x21",
        "x11*y11 + x12*y21 - y21*x12 - y22*x22",
        "x11",
        "y22",
      ],
    ],
  ])("of %s are those found by hand", (w, texts) => {
    const { ring, generatingSets } = idealOf(w);
    expect(termSets(generatingSets[0].polynomials())).toEqual(termSets(polynomials(ring, texts)));
  });

  // By hand: the essential corners of w, and for Y of w turned by 180°, transposed.
  it.each([
    ["123", []],
    ["132", ["x11*x22 - x12*x21", "y33"]],
    ["213", ["x11", "y22*y33 - y23*y32"]],
    ["231", ["x11", "x21", "y23", "y33"]],
    ["312", ["x11", "x12", "y32", "y33"]],
    ["321", ["x11", "x12", "x21", "y23", "y32", "y33"]],
    ["1324", ["x11*x22 - x12*x21", "y33*y44 - y34*y43"]],
  ])("of %s end with the minors found by hand", (w, minors) => {
    const n = w.length;
    const found = idealOf(w).generatingSets[0].polynomials();
    const quadrics = n * n - n + n - 1;
    expect(termSets(found.slice(quadrics))).toEqual(termSets(polynomials(idealOf(w).ring, minors)));
  });

  it("vanish at the orbits of (D·w, w⁻¹·D′) under lower and upper unipotent matrices", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...upTo(4)),
        fc.array(small, { minLength: 40, maxLength: 40 }),
        (w, numbers) => {
          const left = [...numbers];
          const { x, y } = orbitPoint(w, () => left.pop() as bigint);
          const point = [...x.flat(), ...y.flat()];
          for (const f of listed(w)) expect(evaluate(f, point)).toBe(0n);
        },
      ),
      { numRuns: 100 },
    );
  });

  it("vanish at (D·w, w⁻¹·D′) for one w only, and there the scheme is smooth of codimension n² − n", () => {
    // So every E_w is a component, and the scheme is reduced along it.
    const sets = new Map(upTo(4).map((w) => [w, listed(w)]));
    for (const w of sets.keys()) {
      const n = w.length;
      const x = square(n, (i, j) => (w[i] === j + 1 ? 1n : 0n));
      const y = square(n, (i, j) => (w[j] === i + 1 ? BigInt(j + 1) : 0n));
      const point = [...x.flat(), ...y.flat()];
      const there = [...sets.keys()].filter(
        (v) => v.length === n && sets.get(v)?.every((f) => evaluate(f, point) === 0n),
      );
      expect(there).toEqual([w]);
      const jacobian = lowerUpperScheme(n)
        .generatingSets[0].polynomials()
        .map((f) => point.map((_, v) => derivativeAt(f, v, point)));
      expect(rankOf(jacobian)).toBe(n * n - n);
    }
  });

  it("vanish, one w or another, at all points of the scheme over two elements, n ≤ 3", () => {
    for (const n of [1, 2, 3]) {
      const scheme = modTwo(lowerUpperScheme(n).generatingSets[0].polynomials());
      const components = [...permutationsOf(n)].map((w) => modTwo(listed(w)));
      let missed = 0;
      for (let point = 0; point < 2 ** (2 * n * n); point++) {
        if (scheme(point) !== components.some((c) => c(point))) missed++;
      }
      expect(missed).toBe(0);
    }
  });

  it("are the definition: ranks of all corners and equal diagonals, at points of small orbits", () => {
    const sets = new Map([...permutationsOf(3)].map((w) => [w, listed(w)]));
    fc.assert(
      fc.property(
        fc.constantFrom(...sets.keys()),
        fc.array(fc.bigInt({ min: 0n, max: 1n }), { minLength: 24, maxLength: 24 }),
        (v, bits) => {
          const left = [...bits];
          const { x, y } = orbitPoint(v, () => left.pop() as bigint);
          const point = [...x.flat(), ...y.flat()];
          for (const [w, generators] of sets) {
            const vanish = generators.every((f) => evaluate(f, point) === 0n);
            expect(vanish).toBe(satisfies(w, x, y));
          }
        },
      ),
      { numRuns: 200 },
    );
  });
});

/** The conditions of E_w on a point of the scheme, from the definition, for every corner. */
function satisfies(w: Permutation, x: Matrix, y: Matrix): boolean {
  const xy = product(x, y);
  const yx = product(y, x);
  return w.every((value, i) => {
    if (xy[i]?.[i] !== yx[value - 1]?.[value - 1]) return false;
    return w.every((_, j) => {
      const northwest = w.filter((c, a) => a <= i && c <= j + 1).length;
      const southeast = w.filter((c, a) => a >= i && c >= j + 1).length;
      return (
        rankOf(x.slice(0, i + 1).map((row) => row.slice(0, j + 1))) <= northwest &&
        rankOf(y.slice(j).map((row) => row.slice(i))) <= southeast
      );
    });
  });
}

describe("lower-upper varieties", () => {
  it.each(LOWER_UPPER_DEGREES)("of %s have codimension n² − n and degree %i", (w, degree) => {
    const n = w.length;
    expect(codimensionAndDegree(idealOf(w))).toEqual([n * n - n, degree]);
  });

  // The scheme of all pairs is a complete intersection of n² − n quadrics: Knutson 2005 [from memory].
  it.each([1, 2, 3])("have degrees that add up to 2^(n² − n), n = %i", (n) => {
    const degrees = [...permutationsOf(n)].map((w) => codimensionAndDegree(lowerUpperIdeal(w))[1]);
    expect(degrees.reduce((a, b) => a + b, 0n)).toBe(2n ** BigInt(n * n - n));
  });

  it("have for n ≤ 3 the listed generators: an initial ideal is unmixed, so these leave no room", () => {
    for (const w of upTo(3)) {
      const found = primaryComponents(limitOf(lowerUpperIdeal(w)).leadingIdeal);
      if ("kind" in found) throw new Error(found.reason);
      expect(found.some((c) => c.embedded)).toBe(false);
      expect(found.every((c) => c.codimension === w.length ** 2 - w.length)).toBe(true);
    }
  });

  it("of 1324 is smaller than the listed generators say", () => {
    // On E_1324 the northwest 2×2 corner of X has rank 1, and XY acts on its image by the entry 11; by hand.
    const ideal = idealOf("1324");
    const entry = (i: number, j: number) =>
      `(${[1, 2, 3, 4].map((k) => `x${i}${k}*y${k}${j}`).join(" + ")})`;
    const [cubic] = polynomials(ideal.ring, [
      `(${entry(2, 2)} - ${entry(1, 1)})*x22 + ${entry(2, 1)}*x12`,
    ]);
    const w = accepted(readPermutation("1324"));
    fc.assert(
      fc.property(fc.array(small, { minLength: 40, maxLength: 40 }), (numbers) => {
        const left = [...numbers];
        const { x, y } = orbitPoint(w, () => left.pop() as bigint);
        expect(cubic && evaluate(cubic, [...x.flat(), ...y.flat()])).toBe(0n);
      }),
    );
    // A point of E_4231 with the diagonal entries 1, 2, 2, 1 of both products.
    const x = square(4, (i, j) => ([4, 2, 3, 1][i] === j + 1 ? 1n : 0n));
    const y = x.map((row, i) => row.map((e) => (i === 1 || i === 2 ? 2n * e : e)));
    const point = [...x.flat(), ...y.flat()];
    expect(listed(w).every((f) => evaluate(f, point) === 0n)).toBe(true);
    expect(cubic && evaluate(cubic, point)).toBe(1n);
  });

  // By hand, and recomputed by an independent program: components (x12, x21) of degree 1 and (y22, x21·y12 − x12·y21) of degree 2.
  it("of 12 degenerates to x12·y22, x21·y22 and x21·y12 − x12·y21", () => {
    const { generators } = limitOf(idealOf("12"));
    expect(generators.map((f) => printPolynomial(f)).sort()).toEqual(
      ["x12*y22", "x21*y22", "x12*y21 - x21*y12"].sort(),
    );
  });

  it("are read by name, in the dual order, and refused for what is no permutation or too large", () => {
    const ideal = accepted(lowerUpperFamily.read("2413"));
    expect(ideal.name).toBe("lower-upper:2413");
    expect(ideal.defaultOrder).toBe("dual from nw by rows");
    expect(ideal.generatingSets.map((s) => s.kind)).toEqual(["listed"]);
    expect(lowerUpperFamily.read("122").ok).toBe(false);
    const large = Array.from({ length: 31 }, (_, i) => i + 1).join(",");
    expect(refused(lowerUpperFamily.read(large)).expected).toBe("at most 30");
  });

  it("have non-zero, distinct generators, for all of S_5", () => {
    for (const w of permutationsOf(5)) {
      const texts = listed(w).map((f) => printPolynomial(f));
      expect(texts).not.toContain("0");
      expect(new Set(texts).size).toBe(texts.length);
    }
  });
});
