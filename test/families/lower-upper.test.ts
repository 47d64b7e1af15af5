import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type Permutation,
  permutationsOf,
  readPermutation,
} from "../../src/combinatorics/permutation.js";
import { lowerUpperFamily, lowerUpperIdeal } from "../../src/families/lower-upper.js";
import { codimensionOf, degreeOf, hilbertNumerator } from "../../src/hilbert/hilbert-numerator.js";
import { flatLimit } from "../../src/limits/flat-limit.js";
import { unlimited } from "../../src/outcomes/budget.js";
import type { Polynomial } from "../../src/polynomials/polynomial.js";
import { accepted, orderOf, polynomials, termSets } from "../support/reading.js";

type Matrix = bigint[][];

/** The limit's codimension and degree under the family's own order. */
function codimensionAndDegree(w: Permutation): [number, bigint] {
  const ideal = lowerUpperIdeal(w);
  const order = orderOf(ideal.ring, ideal.defaultOrder);
  const limit = flatLimit(ideal.generatingSets[0].polynomials(), order, unlimited());
  if (limit.kind === "undecided") throw new Error(limit.reason);
  const numerator = hilbertNumerator(limit.leadingIdeal, unlimited());
  return [codimensionOf(numerator), degreeOf(numerator)];
}

function product(a: Matrix, b: Matrix): Matrix {
  return a.map((row) =>
    (b[0] as bigint[]).map((_, j) =>
      row.reduce((sum, x, k) => sum + x * ((b[k] as bigint[])[j] as bigint), 0n),
    ),
  );
}

/** The inverse of a unipotent triangular matrix U = 1 + N: the sum of (−N)^k. */
function unipotentInverse(u: Matrix): Matrix {
  const minusN = u.map((row, i) => row.map((x, j) => (i === j ? 0n : -x)));
  let power: Matrix = u.map((_, i) => u.map((__, j) => (i === j ? 1n : 0n)));
  let sum = power;
  for (let k = 1; k < u.length; k++) {
    power = product(power, minusN);
    sum = sum.map((row, i) => row.map((x, j) => x + ((power[i] as bigint[])[j] as bigint)));
  }
  return sum;
}

function valueAt(f: Polynomial, point: readonly bigint[]): bigint {
  return f.monomials.reduce((sum, m, k) => {
    let term = f.numerators[k] as bigint;
    for (let v = 0; v < m.length; v++) term *= (point[v] as bigint) ** BigInt(m[v] as number);
    return sum + term;
  }, 0n);
}

describe("lower-upper varieties", () => {
  it("of n = 2 are those found by hand", () => {
    const identity = lowerUpperIdeal(accepted(readPermutation("12")));
    expect(termSets(identity.generatingSets[0].polynomials())).toEqual(
      termSets(
        polynomials(identity.ring, ["x11*y12 + x12*y22", "y21*x11 + y22*x21", "x12*y21 - y12*x21"]),
      ),
    );
    const swap = lowerUpperIdeal(accepted(readPermutation("21")));
    expect(termSets(swap.generatingSets[0].polynomials())).toEqual(
      termSets(
        polynomials(swap.ring, [
          "x11*y12 + x12*y22",
          "y21*x11 + y22*x21",
          "x11*y11 + x12*y21 - y21*x12 - y22*x22",
          "x11",
          "y22",
        ]),
      ),
    );
  });

  // Knutson, *Some schemes related to the commuting variety*, J. Algebraic Geom. 14 (2005): degrees for n = 2, 3.
  it("have codimension n² − n and the degrees of the literature for n = 2 and 3", () => {
    const table: Record<string, bigint> = {
      12: 3n,
      21: 1n,
      123: 31n,
      132: 13n,
      213: 13n,
      231: 3n,
      312: 3n,
      321: 1n,
    };
    for (const [name, degree] of Object.entries(table)) {
      const n = name.length;
      const found = codimensionAndDegree(accepted(readPermutation(name)));
      expect([name, ...found]).toEqual([name, n * n - n, degree]);
    }
  });

  // The scheme of all pairs is a complete intersection of n² − n quadrics, the same source; E_w its components.
  it("have degrees that add up to 2^(n² − n)", () => {
    for (const n of [1, 2, 3]) {
      const degrees = [...permutationsOf(n)].map((w) => codimensionAndDegree(w)[1]);
      expect(degrees.reduce((a, b) => a + b, 0n)).toBe(2n ** BigInt(n * n - n));
    }
  });

  it("contain the orbits of (D·w, w⁻¹·D′) under lower and upper unipotent matrices", () => {
    const small = fc.bigInt({ min: -9n, max: 9n });
    const permutations = [1, 2, 3, 4].flatMap((n) => [...permutationsOf(n)]);
    fc.assert(
      fc.property(
        fc.constantFrom(...permutations),
        fc.array(small, { minLength: 40, maxLength: 40 }),
        (w, numbers) => {
          const n = w.length;
          let next = 0;
          const draw = (): bigint => numbers[next++] as bigint;
          const matrix = (entry: (i: number, j: number) => bigint): Matrix =>
            w.map((_, i) => w.map((__, j) => entry(i, j)));
          const lower = matrix((i, j) => (i === j ? 1n : i > j ? draw() : 0n));
          const upper = matrix((i, j) => (i === j ? 1n : i < j ? draw() : 0n));
          const a = matrix((i, j) => (w[i] === j + 1 ? draw() : 0n));
          const b = matrix((i, j) => (w[j] === i + 1 ? draw() : 0n));
          const x = product(product(lower, a), upper);
          const y = product(product(unipotentInverse(upper), b), unipotentInverse(lower));
          const point = [...x.flat(), ...y.flat()];
          expect(point).toHaveLength(2 * n * n);
          for (const f of lowerUpperIdeal(w).generatingSets[0].polynomials()) {
            expect(valueAt(f, point)).toBe(0n);
          }
        },
      ),
      { numRuns: 200 },
    );
  });

  it("are read by name and refuse what is no permutation", () => {
    const ideal = accepted(lowerUpperFamily.read("2413"));
    expect(ideal.name).toBe("lower-upper:2413");
    expect(lowerUpperFamily.read("122").ok).toBe(false);
  });
});
