/**
 * Which terms of the minors of a generic matrix an order takes: the question that decides between
 * tilings with pipes bending one way and the other.
 */
import type { VariableIndex, VariableMatrix } from "./polynomial-ring.js";
import { compileDecisiveComparison, type TermOrder } from "./term-order.js";

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
  const compare = productComparer(order);
  const { cells } = matrix;
  const cell = (i: number, j: number): VariableIndex => cells[i]?.[j] as VariableIndex;
  let common: number | undefined;
  for (let i = 0; i < matrix.rows; i++) {
    for (let k = i + 1; k < matrix.rows; k++) {
      for (let j = 0; j < matrix.columns; j++) {
        for (let l = j + 1; l < matrix.columns; l++) {
          const sign = compare([cell(i, j), cell(k, l)], [cell(i, l), cell(k, j)]);
          common ??= sign;
          if (sign === 0 || sign !== common) return "neither";
        }
      }
    }
  }
  if (common === undefined) return "neither";
  return common === 1 ? "diagonal" : "antidiagonal";
}

type Product = readonly [VariableIndex, VariableIndex];

/* The sign with which two products of two variables differ in the decisive comparisons. */
function productComparer(order: TermOrder): (a: Product, b: Product) => number {
  const count = order.ring.variables.length;
  const compare = compileDecisiveComparison(order);
  const arena = new Uint16Array(2 * count);
  const mark = (start: number, product: Product, by: number): void => {
    for (const v of product) arena[start + v] = (arena[start + v] as number) + by;
  };
  return (a, b) => {
    mark(0, a, 1);
    mark(count, b, 1);
    const sign = Math.sign(compare(arena, 0, count));
    mark(0, a, -1);
    mark(count, b, -1);
    return sign;
  };
}
