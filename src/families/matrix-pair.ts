/**
 * Pairs (X, Y) of generic n×n matrices: their ring, x_ij paired with y_ji, the entries of XY and YX, and the
 * reader of n for families that depend on nothing else.
 */
import { type Budget, unlimited } from "../outcomes/budget.js";
import { faulty, quote, type Reading, read } from "../outcomes/input-fault.js";
import { type Polynomial, polynomial, type Term } from "../polynomials/polynomial.js";
import {
  type PolynomialRing,
  ringOfMatrices,
  type VariableIndex,
  type VariableMatrix,
} from "../polynomials/polynomial-ring.js";

/** The largest n that is read: the n² − n quadrics of n terms in 2n² variables then take 100 MB. */
export const MAX_PAIR_SIZE = 30;

/** Two square matrices of variables and their ring. */
export interface SquarePair {
  readonly ring: PolynomialRing;
  readonly x: VariableMatrix;
  readonly y: VariableMatrix;
}

/** The entry (row, column), from 0, of XY or of YX. */
export interface ProductEntry {
  readonly product: "XY" | "YX";
  readonly row: number;
  readonly column: number;
}

/** The pair of generic n×n matrices. */
export function squarePair(n: number): SquarePair {
  const square = { rows: n, columns: n };
  const ring = ringOfMatrices(
    [
      { name: "x", ...square },
      { name: "y", ...square },
    ],
    { x: "x", y: "y" },
  );
  const [x, y] = ring.matrices as [VariableMatrix, VariableMatrix];
  return { ring, x, y };
}

/**
 * An entry of a product: `Σ_k x_ik·y_kj`, or `Σ_k y_ik·x_kj`; minus another entry, if one is given.
 * @throws LimitReached
 */
export function productEntry(
  pair: SquarePair,
  entry: ProductEntry,
  minus?: ProductEntry,
  budget: Budget = unlimited(),
): Polynomial {
  budget.spend(() => `writing out the products of matrices of size ${pair.x.rows}`);
  const subtracted = minus === undefined ? [] : entryTerms(pair, minus, -1n);
  return polynomial(pair.ring, [...entryTerms(pair, entry, 1n), ...subtracted]);
}

function entryTerms({ ring, x, y }: SquarePair, entry: ProductEntry, numerator: bigint): Term[] {
  const [left, right] = entry.product === "XY" ? [x, y] : [y, x];
  return Array.from({ length: left.columns }, (_, k) => {
    const monomial = new Uint16Array(ring.variables.length);
    monomial[left.cells[entry.row]?.[k] as VariableIndex] = 1;
    monomial[right.cells[k]?.[entry.column] as VariableIndex] = 1;
    return { monomial, numerator };
  });
}

/** Reads the size n of a pair, from 1 to `MAX_PAIR_SIZE`. */
export function readPairSize(argument: string): Reading<number> {
  const n = /^\s*\d{1,3}\s*$/.test(argument) ? Number(argument) : 0;
  if (n >= 1 && n <= MAX_PAIR_SIZE) return read(n);
  return faulty({
    message: `${quote(argument)} is no size of two square matrices`,
    expected: `a number from 1 to ${MAX_PAIR_SIZE}`,
  });
}
