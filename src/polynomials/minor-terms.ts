/**
 * Which terms of the minors of a generic matrix an order takes: the question that decides between
 * tilings with pipes bending one way and the other.
 */
import type { VariableIndex, VariableMatrix } from "./polynomial-ring.js";
import type { TermOrder } from "./term-order.js";

/** Does an order take the diagonal term of every minor of a matrix, the antidiagonal, or neither? */
export type MinorTerms = "diagonal" | "antidiagonal" | "neither";

/**
 * Is the leading form of every minor of the matrix its diagonal term, or always its antidiagonal one?
 *
 * The 2-minors decide. If all of them lead with the diagonal, take a term of a t-minor, which is a
 * permutation of the columns, and two rows whose columns are inverted: exchanging those two columns
 * multiplies a common factor with the other term of a 2-minor and so makes the term larger. Every term
 * but the diagonal one has an inversion, and exchanges end; so the diagonal is the largest. Likewise
 * for antidiagonals. Matrices with one row or column have no such minors: `neither`.
 * Cost: quadratic in the number of cells.
 */
export function minorTerms(order: TermOrder, matrix: VariableMatrix): MinorTerms {
  const signs = new Set<number>();
  const { cells } = matrix;
  const cell = (i: number, j: number): VariableIndex => cells[i]?.[j] as VariableIndex;
  for (let i = 0; i < matrix.rows; i++) {
    for (let k = i + 1; k < matrix.rows; k++) {
      for (let j = 0; j < matrix.columns; j++) {
        for (let l = j + 1; l < matrix.columns; l++) {
          signs.add(compareProducts(order, [cell(i, j), cell(k, l)], [cell(i, l), cell(k, j)]));
        }
      }
    }
  }
  if (signs.size !== 1 || signs.has(0)) return "neither";
  return signs.has(1) ? "diagonal" : "antidiagonal";
}

type Product = readonly [VariableIndex, VariableIndex];

/* The sign with which two products of two variables differ in the decisive comparisons. */
function compareProducts(order: TermOrder, a: Product, b: Product): number {
  for (const { variables, weights } of order.comparisons.slice(0, order.decisive)) {
    const weight = (product: Product): number =>
      product.reduce((sum, v) => sum + (weights[variables.indexOf(v)] ?? 0), 0);
    const sign = Math.sign(weight(a) - weight(b));
    if (sign !== 0) return sign;
  }
  return 0;
}
