import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { permutationsOf } from "../../src/combinatorics/permutation.js";
import { minor, sublists } from "../../src/families/minors.js";
import {
  add,
  equal,
  isZero,
  multiply,
  negate,
  type Polynomial,
  setToZero,
  variable,
  zero,
} from "../../src/polynomials/polynomial.js";
import {
  type PolynomialRing,
  ringOfMatrices,
  type VariableIndex,
  type VariableMatrix,
} from "../../src/polynomials/polynomial-ring.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { bareissDeterminant, evaluate, parityOf } from "./determinants.js";

interface Setting {
  readonly ring: PolynomialRing;
  readonly matrix: VariableMatrix;
}

function generic(rows: number, columns: number): Setting {
  const ring = ringOfMatrices([{ name: "z", rows, columns }]);
  return { ring, matrix: ring.matrices[0] as VariableMatrix };
}

function at({ matrix }: Setting, row: number, column: number): VariableIndex {
  return matrix.cells[row]?.[column] as VariableIndex;
}

/* The definition, Σ sign(π) Π z_{r_k, c_π(k)}, by polynomial arithmetic. */
function leibniz(
  setting: Setting,
  rows: readonly number[],
  columns: readonly number[],
): Polynomial {
  let sum = zero(setting.ring);
  for (const w of permutationsOf(rows.length)) {
    const product = rows
      .map((r, k) =>
        variable(setting.ring, at(setting, r, columns[(w[k] as number) - 1] as number)),
      )
      .reduce(multiply);
    sum = add(sum, parityOf(w) === 1 ? product : negate(product));
  }
  return sum;
}

const chosenLines = fc.integer({ min: 1, max: 4 }).chain((t) =>
  fc.record({
    rows: fc.shuffledSubarray([0, 1, 2, 3, 4], { minLength: t, maxLength: t }),
    columns: fc.shuffledSubarray([0, 1, 2, 3], { minLength: t, maxLength: t }),
  }),
);

describe("minor", () => {
  it("is the usual formula for two and three rows", () => {
    const { ring, matrix } = generic(3, 3);
    expect(printPolynomial(minor(ring, matrix, [0, 1], [0, 1]))).toBe("z11*z22 - z12*z21");
    // The rule of Sarrus.
    expect(printPolynomial(minor(ring, matrix, [0, 1, 2], [0, 1, 2]))).toBe(
      "z11*z22*z33 - z11*z23*z32 - z12*z21*z33 + z12*z23*z31 + z13*z21*z32 - z13*z22*z31",
    );
  });

  it("is one variable for one row, and 1 for none", () => {
    const { ring, matrix } = generic(2, 3);
    expect(printPolynomial(minor(ring, matrix, [1], [2]))).toBe("z23");
    expect(printPolynomial(minor(ring, matrix, [], []))).toBe("1");
  });

  it("agrees with the Leibniz formula for every choice and order of rows and columns", () => {
    const setting = generic(5, 4);
    fc.assert(
      fc.property(chosenLines, ({ rows, columns }) => {
        const f = minor(setting.ring, setting.matrix, rows, columns);
        expect(equal(f, leibniz(setting, rows, columns))).toBe(true);
      }),
    );
  });

  it("takes the values of numeric determinants at random integers", () => {
    const setting = generic(5, 4);
    const values = fc.array(fc.bigInt({ min: -99n, max: 99n }), { minLength: 20, maxLength: 20 });
    fc.assert(
      fc.property(chosenLines, values, ({ rows, columns }, point) => {
        const f = minor(setting.ring, setting.matrix, rows, columns);
        const entries = rows.map((r) => columns.map((c) => point[at(setting, r, c)] as bigint));
        expect(evaluate(f, point)).toBe(bareissDeterminant(entries));
      }),
    );
  });

  it("has t! terms, with coefficients 1 and -1 equally often", () => {
    const { ring, matrix } = generic(6, 6);
    for (const [t, terms] of [
      [2, 2],
      [3, 6],
      [4, 24],
      [5, 120],
      [6, 720],
    ] as const) {
      const lines = Array.from({ length: t }, (_, k) => k);
      const { numerators } = minor(ring, matrix, lines, lines);
      expect(numerators).toHaveLength(terms);
      expect(numerators.filter((n) => n === 1n)).toHaveLength(terms / 2);
      expect(numerators.filter((n) => n === -1n)).toHaveLength(terms / 2);
    }
  });

  it("changes its sign when two rows are exchanged, and vanishes when a row stands twice", () => {
    const { ring, matrix } = generic(3, 3);
    const f = minor(ring, matrix, [0, 1, 2], [0, 1, 2]);
    expect(equal(minor(ring, matrix, [1, 0, 2], [0, 1, 2]), negate(f))).toBe(true);
    expect(isZero(minor(ring, matrix, [0, 0], [1, 2]))).toBe(true);
  });

  it("with vanishing entries is the minor with these variables set to 0", () => {
    const setting = generic(5, 4);
    const vanishing = fc.uniqueArray(fc.integer({ min: 0, max: 19 }), { maxLength: 14 });
    fc.assert(
      fc.property(chosenLines, vanishing, ({ rows, columns }, gone) => {
        const cells = new Set(gone as VariableIndex[]);
        const f = minor(setting.ring, setting.matrix, rows, columns, cells);
        const whole = minor(setting.ring, setting.matrix, rows, columns);
        expect(equal(f, setToZero(whole, cells))).toBe(true);
      }),
    );
  });

  it("refuses rows and columns of different number", () => {
    const { ring, matrix } = generic(3, 3);
    expect(() => minor(ring, matrix, [0, 1], [0])).toThrow(
      new RangeError("expected as many rows as columns, got 2 and 1"),
    );
  });
});

describe("sublists", () => {
  it("lists all choices of t elements in lexicographic order", () => {
    expect([...sublists(["a", "b", "c", "d"], 2)].map((s) => s.join(""))).toEqual([
      "ab",
      "ac",
      "ad",
      "bc",
      "bd",
      "cd",
    ]);
    expect([...sublists([1, 2], 0)]).toEqual([[]]);
    expect([...sublists([1, 2], 3)]).toEqual([]);
  });

  it("are as many as the binomial coefficient, and distinct", () => {
    const binomials = [1, 7, 21, 35, 35, 21, 7, 1];
    binomials.forEach((count, t) => {
      const all = [...sublists([0, 1, 2, 3, 4, 5, 6], t)];
      expect(all).toHaveLength(count);
      expect(new Set(all.map(String)).size).toBe(count);
    });
  });
});
