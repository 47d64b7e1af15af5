/**
 * Lower-upper varieties: `lower-upper:w` is the component E_w of the scheme of pairs of n×n matrices (X, Y) with
 * XY lower and YX upper triangular on which (XY)_ii = (YX)_w(i)w(i); of codimension n² − n.
 * @source Knutson, *Some schemes related to the commuting variety*, J. Algebraic Geom. 14 (2005).
 */
import { type CornerRanks, cornerSums, essentialBounds } from "../combinatorics/corner-ranks.js";
import {
  type Permutation,
  printPermutation,
  readPermutation,
} from "../combinatorics/permutation.js";
import { read } from "../outcomes/input-fault.js";
import { isZero, type Polynomial, polynomial, type Term } from "../polynomials/polynomial.js";
import {
  type PolynomialRing,
  ringOfMatrices,
  type VariableIndex,
  type VariableMatrix,
} from "../polynomials/polynomial-ring.js";
import type { Family, Ideal } from "./ideal.js";
import { rankMinors } from "./rank-ideal.js";

/** The family of lower-upper varieties. */
export const lowerUpperFamily: Family = {
  name: "lower-upper",
  argument: "a permutation in one-line notation",
  description: "components of the scheme of pairs with XY lower and YX upper triangular",
  example: "lower-upper:132",
  read(argument) {
    const w = readPermutation(argument);
    return w.ok ? read(lowerUpperIdeal(w.value)) : w;
  },
};

/**
 * The ideal that the listed generators of E_w generate. It lies in the ideal of E_w and has its codimension and
 * degree for every w with n ≤ 4; that it is all of it is not assumed anywhere.
 */
export function lowerUpperIdeal(w: Permutation): Ideal {
  const n = w.length;
  const ring = ringOfMatrices(
    [
      { name: "x", rows: n, columns: n },
      { name: "y", rows: n, columns: n },
    ],
    { x: "x", y: "y" },
  );
  const [x, y] = ring.matrices as [VariableMatrix, VariableMatrix];
  return {
    name: `lower-upper:${printPermutation(w)}`,
    ring,
    generatingSets: [
      {
        kind: "listed",
        description: "the equations of the scheme, those of the diagonals, and minors of X and Y",
        polynomials: (budget) => [
          ...triangularEquations(ring, x, y),
          ...diagonalEquations(ring, x, y, w),
          ...rankMinors(ring, x, essentialBounds(northwestRanks(w)), undefined, budget),
          ...rankMinors(ring, transposed(y), essentialBounds(southeastRanks(w)), undefined, budget),
        ],
      },
    ],
    defaultOrder: "dual from nw by rows",
  };
}

/** The entries of XY above the diagonal and of YX below it. */
function triangularEquations(
  ring: PolynomialRing,
  x: VariableMatrix,
  y: VariableMatrix,
): Polynomial[] {
  const equations: Polynomial[] = [];
  for (let i = 0; i < x.rows; i++) {
    for (let j = 0; j < x.rows; j++) {
      if (i < j) equations.push(polynomial(ring, productEntry(ring, x, y, i, j, 1n)));
      if (i > j) equations.push(polynomial(ring, productEntry(ring, y, x, i, j, 1n)));
    }
  }
  return equations;
}

/** (XY)_ii − (YX)_w(i)w(i) for all i but the last: they add up to zero, since the traces agree. */
function diagonalEquations(
  ring: PolynomialRing,
  x: VariableMatrix,
  y: VariableMatrix,
  w: Permutation,
): Polynomial[] {
  return w
    .slice(0, -1)
    .map((value, i) =>
      polynomial(ring, [
        ...productEntry(ring, x, y, i, i, 1n),
        ...productEntry(ring, y, x, value - 1, value - 1, -1n),
      ]),
    )
    .filter((f) => !isZero(f));
}

/** The terms of ± the entry (i, j) of a product of two matrices, from 0. */
function productEntry(
  ring: PolynomialRing,
  left: VariableMatrix,
  right: VariableMatrix,
  i: number,
  j: number,
  sign: bigint,
): Term[] {
  return Array.from({ length: left.columns }, (_, k) => {
    const monomial = new Uint16Array(ring.variables.length);
    monomial[left.cells[i]?.[k] as VariableIndex] = 1;
    monomial[right.cells[k]?.[j] as VariableIndex] = 1;
    return { monomial, numerator: sign };
  });
}

function transposed(matrix: VariableMatrix): VariableMatrix {
  const cells = Array.from({ length: matrix.columns }, (_, j) =>
    matrix.cells.map((row) => row[j] as VariableIndex),
  );
  return { ...matrix, rows: matrix.columns, columns: matrix.rows, cells };
}

/** The ranks of the northwest corners of the matrix of w. */
function northwestRanks(w: Permutation): CornerRanks {
  return cornerSums(w.map((value) => w.map((_, j) => (value === j + 1 ? 1 : 0))));
}

/** The ranks of its southeast corners: those of the matrix turned by 180°, which is that of w₀ww₀. */
function southeastRanks(w: Permutation): CornerRanks {
  const n = w.length;
  const turned = w.map((_, i) => n + 1 - (w[n - 1 - i] as number));
  return { ...northwestRanks(turned as unknown as Permutation), corner: "se" };
}
