/**
 * The seam between the reduction strategy and coefficients: the same F4 loop runs over a prime field,
 * where it is fast, and over the integers, where it proves. A coefficient domain says how the rows of a
 * matrix are reduced.
 */
import type { Budget } from "../outcomes/budget.js";
import type { Support } from "./rows.js";
import type { SymbolicMatrix } from "./symbolic-matrix.js";

/** A row that reduction left over, and which of the matrix's rows it came from. */
export interface Remainder<R extends Support> {
  readonly row: R;
  /** Index among the rows that were to be reduced. */
  readonly source: number;
}

/**
 * What becomes of the rows of a matrix.
 * - `echelon`: they are reduced by the pivots and by each other; remainders have distinct leading monomials.
 * - `independent`: each is reduced by the pivots alone.
 * - `tails`: each keeps its leading term, its tail is reduced by the pivots alone.
 */
export type EliminationMode = "echelon" | "independent" | "tails";

/** What is asked of an elimination. */
export interface EliminationTask {
  readonly mode: EliminationMode;
  /** With so many remainders it may stop: the other rows are known to reduce to zero. */
  readonly most: number;
}

/** Matrix reduction over one coefficient domain. */
export interface RowArithmetic<R extends Support> {
  /**
   * Reduces the matrix's rows; the remainders are non-zero, normalised and fully reduced.
   * @param elements the basis elements whose multiples the matrix's rows and pivots are.
   * @throws LimitReached
   */
  eliminate(
    matrix: SymbolicMatrix,
    elements: readonly R[],
    task: EliminationTask,
    budget: Budget,
  ): Remainder<R>[];
}
