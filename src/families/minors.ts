/**
 * Minors of matrices of variables, built term by term in normal form: depth-first over the rows, one
 * permutation a term, entries that vanish skipped. Cost: the number of terms times their degree.
 */
import { type Budget, unlimited } from "../outcomes/budget.js";
import { type Polynomial, polynomial, type Term } from "../polynomials/polynomial.js";
import type {
  PolynomialRing,
  VariableIndex,
  VariableMatrix,
} from "../polynomials/polynomial-ring.js";

/**
 * The minor with the given rows and columns (from 0, as many of each), its entries in `vanishing` set
 * to 0.
 * @throws RangeError when rows and columns differ in number.
 * @throws LimitReached
 */
export function minor(
  ring: PolynomialRing,
  matrix: VariableMatrix,
  rows: readonly number[],
  columns: readonly number[],
  vanishing: ReadonlySet<VariableIndex> = new Set(),
  budget: Budget = unlimited(),
): Polynomial {
  if (rows.length !== columns.length) {
    throw new RangeError(
      `expected as many rows as columns, got ${rows.length} and ${columns.length}`,
    );
  }
  const terms: Term[] = [];
  const chosen = new Uint16Array(ring.variables.length);
  const expand = (k: number, free: readonly number[], sign: bigint): void => {
    budget.spend(() => `writing out a minor of size ${rows.length}, ${terms.length} terms so far`);
    if (k === rows.length) {
      terms.push({ monomial: chosen.slice(), numerator: sign });
      return;
    }
    free.forEach((column, place) => {
      const entry = matrix.cells[rows[k] as number]?.[column] as VariableIndex;
      if (vanishing.has(entry)) return;
      chosen[entry] = 1;
      expand(
        k + 1,
        free.filter((c) => c !== column),
        place % 2 === 0 ? sign : -sign,
      );
      chosen[entry] = 0;
    });
  };
  expand(0, columns, 1n);
  return polynomial(ring, terms);
}

/** All t-element sublists of a list, in lexicographic order. */
export function* sublists<T>(list: readonly T[], t: number): Generator<readonly T[], void> {
  if (t === 0) {
    yield [];
    return;
  }
  for (let i = 0; i + t <= list.length; i++) {
    for (const rest of sublists(list.slice(i + 1), t - 1)) yield [list[i] as T, ...rest];
  }
}
