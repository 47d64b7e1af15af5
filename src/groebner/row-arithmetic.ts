/**
 * The seam between the reduction strategy and coefficients: the same F4 loop runs over a prime field,
 * where it is fast, and over the integers, where it proves. A coefficient domain says how one row is
 * reduced; which rows reduce which is the same for all and stands here.
 */
import type { Budget } from "../outcomes/budget.js";
import type { Support } from "./rows.js";
import type { MatrixRow, SymbolicMatrix } from "./symbolic-preprocessing.js";

/** A row that reduction left over, and which of the matrix's rows it came from. */
export interface Remainder<R extends Support> {
  readonly row: R;
  /** Index into the matrix's `rows`. */
  readonly source: number;
}

/**
 * What becomes of the rows of a matrix.
 * - `echelon`: they are reduced by the pivots and by each other; remainders have distinct leading monomials.
 * - `independent`: each is reduced by the pivots alone.
 * - `tails`: each keeps its leading term, its tail is reduced by the pivots alone.
 */
export type EliminationMode = "echelon" | "independent" | "tails";

/** Matrix reduction over one coefficient domain. */
export interface RowArithmetic<R extends Support> {
  /**
   * Reduces the matrix's rows; the remainders are non-zero, normalised and fully reduced.
   * @param elements the basis elements whose multiples the matrix's rows and pivots are.
   */
  eliminate(
    matrix: SymbolicMatrix,
    elements: readonly R[],
    mode: EliminationMode,
    budget: Budget,
  ): Remainder<R>[];
}

/** A row inside a matrix: ascending columns. */
export interface ColumnRow {
  readonly columns: Int32Array;
}

/** How one coefficient domain reduces one row of a matrix. */
export interface RowReducer<P extends ColumnRow, R extends Support> {
  /** The matrix row with its coefficients. */
  load(row: MatrixRow): P;
  /** The row reduced by the pivots from column `from` on, normalised; undefined if it is zero. */
  reduce(row: P, pivots: readonly (P | undefined)[], from: number): P | undefined;
  /** The row with monomials for columns. */
  store(row: P): R;
}

/** Runs the rows of a matrix through a reducer in the given mode. */
export function reduceMatrix<P extends ColumnRow, R extends Support>(
  matrix: SymbolicMatrix,
  mode: EliminationMode,
  reducer: RowReducer<P, R>,
): Remainder<R>[] {
  const pivots = matrix.pivots.map((row) => (row === undefined ? undefined : reducer.load(row)));
  const left: { row: P; readonly source: number }[] = [];
  matrix.rows.forEach((matrixRow, source) => {
    const row = reducer.load(matrixRow);
    const reduced = reducer.reduce(row, pivots, firstColumn(row) + (mode === "tails" ? 1 : 0));
    if (reduced === undefined) return;
    left.push({ row: reduced, source });
    if (mode === "echelon") pivots[firstColumn(reduced)] = reduced;
  });
  if (mode === "echelon" && left.length > 1) {
    // Smallest leading monomial first: every row is then reduced by rows that are final.
    left.sort((a, b) => firstColumn(b.row) - firstColumn(a.row));
    for (const item of left) {
      item.row = reducer.reduce(item.row, pivots, firstColumn(item.row) + 1) ?? item.row;
      pivots[firstColumn(item.row)] = item.row;
    }
  }
  return left.map(({ row, source }) => ({ row: reducer.store(row), source }));
}

/** The columns of a row as the monomials they stand for. */
export function monomialsOf(matrix: SymbolicMatrix, row: ColumnRow): Int32Array {
  return row.columns.map((column) => matrix.monomials[column] as number);
}

function firstColumn(row: ColumnRow): number {
  return row.columns[0] as number;
}
