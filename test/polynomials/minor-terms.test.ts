/** Which terms of minors the orders take, and that the 2-minors decide. */
import { describe, expect, it } from "vitest";
import { leadingForm } from "../../src/polynomials/leading-terms.js";
import { minorTerms } from "../../src/polynomials/orders.js";
import { type Polynomial, polynomial } from "../../src/polynomials/polynomial.js";
import {
  type PolynomialRing,
  ringOfMatrices,
  type VariableMatrix,
} from "../../src/polynomials/polynomial-ring.js";
import { pairedRing } from "../support/order-table.js";
import { orderOf } from "../support/reading.js";

const CORNERS = ["nw", "ne", "sw", "se"];
const LINES = ["rows", "columns"];

function matrixOf(r: PolynomialRing): VariableMatrix {
  return r.matrices[0] ?? expect.fail();
}

function permutations(n: number): number[][] {
  if (n === 0) return [[]];
  return permutations(n - 1).flatMap((p) =>
    Array.from({ length: n }, (_, k) => [...p.slice(0, k), n - 1, ...p.slice(k)]),
  );
}

function subsets(n: number, size: number): number[][] {
  return Array.from({ length: 2 ** n }, (_, bits) =>
    Array.from({ length: n }, (_, k) => k).filter((k) => (bits >> k) & 1),
  ).filter((list) => list.length === size);
}

/* The minor by the Leibniz formula. */
function minor(r: PolynomialRing, rows: number[], columns: number[]): Polynomial {
  const { cells } = matrixOf(r);
  const terms = permutations(rows.length).map((p) => {
    const monomial = new Uint16Array(r.variables.length);
    for (const [k, i] of rows.entries()) {
      monomial[cells[i]?.[columns[p[k] as number] as number] as number] = 1;
    }
    const inversions = p.flatMap((a, k) => p.slice(k).filter((b) => b < a)).length;
    return { monomial, numerator: inversions % 2 === 0 ? 1n : -1n };
  });
  return polynomial(r, terms);
}

/* The answer by looking at all minors of all sizes from 2 on. */
function byAllMinors(r: PolynomialRing, phrase: string): string {
  const matrix = matrixOf(r);
  const order = orderOf(r, phrase);
  const kinds = new Set<string>();
  for (let t = 2; t <= Math.min(matrix.rows, matrix.columns); t++) {
    for (const rows of subsets(matrix.rows, t)) {
      for (const columns of subsets(matrix.columns, t)) {
        const form = leadingForm(minor(r, rows, columns), order);
        const isTerm = (back: boolean): boolean =>
          form.monomials.length === 1 &&
          rows.every((i, k) => {
            const j = columns[back ? t - 1 - k : k] as number;
            return form.monomials[0]?.[matrix.cells[i]?.[j] as number] === 1;
          });
        kinds.add(isTerm(false) ? "diagonal" : isTerm(true) ? "antidiagonal" : "neither");
      }
    }
  }
  return kinds.size === 1 ? ([...kinds][0] as string) : "neither";
}

describe("leading terms of minors", () => {
  // Knutson, Miller, *Gröbner geometry of Schubert polynomials*, Ann. of Math. 161 (2005), and Knutson,
  // Miller, Yong, J. reine angew. Math. 630 (2009), call orders antidiagonal and diagonal by this.
  it.each([
    ["revlex from nw", "antidiagonal"],
    ["lex from ne", "antidiagonal"],
    ["lex from sw", "antidiagonal"],
    ["revlex from se", "antidiagonal"],
    ["lex from nw", "diagonal"],
    ["lex from se", "diagonal"],
    ["revlex from ne", "diagonal"],
    ["revlex from sw", "diagonal"],
  ])("in %s are %s, by rows and by columns", (start, expected) => {
    const r = ringOfMatrices([{ name: "z", rows: 4, columns: 3 }]);
    for (const lines of LINES) {
      expect(minorTerms(orderOf(r, `${start} by ${lines}`), matrixOf(r))).toBe(expected);
      expect(byAllMinors(r, `${start} by ${lines}`)).toBe(expected);
    }
  });

  it("in graded lex are diagonal, in graded revlex antidiagonal", () => {
    // Graded reverse lex on the variables row by row is the usual example of an antidiagonal order.
    const r = ringOfMatrices([{ name: "z", rows: 3, columns: 3 }]);
    expect(minorTerms(orderOf(r, "graded lex"), matrixOf(r))).toBe("diagonal");
    expect(minorTerms(orderOf(r, "plain lex"), matrixOf(r))).toBe("diagonal");
    expect(minorTerms(orderOf(r, "graded revlex"), matrixOf(r))).toBe("antidiagonal");
  });

  it.each([
    "weights (1,2,4,2,4,8,4,8,16) refined by graded revlex",
    "weights (1,2,4,2,4,8,4,8,16) then lex from ne by rows",
    "weights (4,2,1,3,3,3,1,2,4) then graded lex",
    "weights (0,0,0,0,0,0,0,0,0) refined by lex from nw by rows",
    "weights (0,0,0,0,0,0,0,0,1) then lex from ne by rows",
    "lex,revlex,lex from nw by rows",
    "cells lex (z22,z11,z33) revlex (z31,z13,z12,z21,z23,z32)",
    "cells revlex (z22,z11,z33) lex (z31,z13,z12,z21,z23,z32)",
    "cells lex (z11,z21,z22,z33,z12,z13,z23,z31,z32)",
  ])("are told by the 2-minors in %s", (phrase) => {
    const r = ringOfMatrices([{ name: "z", rows: 3, columns: 3 }]);
    expect(minorTerms(orderOf(r, phrase), matrixOf(r))).toBe(byAllMinors(r, phrase));
  });

  it("in dual orders go as revlex does in X and as lex does in the transpose, Y", () => {
    const r = pairedRing(2);
    const [x, y] = r.matrices as [VariableMatrix, VariableMatrix];
    for (const corner of CORNERS) {
      for (const lines of LINES) {
        const path = `from ${corner} by ${lines}`;
        const order = orderOf(r, `dual ${path}`);
        expect(minorTerms(order, x)).toBe(minorTerms(orderOf(r, `revlex ${path}`), x));
        expect(minorTerms(order, y)).toBe(minorTerms(orderOf(r, `lex ${path}`), y));
      }
    }
  });

  it("are neither when there are no minors, or both terms stay", () => {
    const row = ringOfMatrices([{ name: "z", rows: 1, columns: 4 }]);
    expect(minorTerms(orderOf(row, "lex from nw by rows"), matrixOf(row))).toBe("neither");
    const square = ringOfMatrices([{ name: "z", rows: 2, columns: 2 }]);
    const tied = orderOf(square, "weights (1,0,1,0) refined by lex from nw by rows");
    expect(minorTerms(tied, matrixOf(square))).toBe("neither");
  });
});
