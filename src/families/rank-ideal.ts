/**
 * Ideals of rank conditions: the (r+1)-minors of every bounded corner submatrix, from any corner.
 */
import type { CornerRanks, RankBound } from "../combinatorics/corner-ranks.js";
import { type Budget, unlimited } from "../outcomes/budget.js";
import { isZero, type Polynomial } from "../polynomials/polynomial.js";
import type {
  PolynomialRing,
  VariableIndex,
  VariableMatrix,
} from "../polynomials/polynomial-ring.js";
import { minor, sublists } from "./minors.js";

/**
 * The minors that a table of corner rank bounds makes vanish, each once, those that are 0 left out.
 * @param vanishing variables set to 0 in all minors.
 * @throws RangeError when the table does not fit the matrix.
 * @throws LimitReached
 */
export function rankMinors(
  ring: PolynomialRing,
  matrix: VariableMatrix,
  table: CornerRanks,
  vanishing: ReadonlySet<VariableIndex> = new Set(),
  budget: Budget = unlimited(),
): Polynomial[] {
  if (table.rows !== matrix.rows || table.columns !== matrix.columns) {
    throw new RangeError(
      `expected bounds for a ${matrix.rows}×${matrix.columns} matrix, got ${table.rows}×${table.columns}`,
    );
  }
  const seen = new Set<string>();
  const minors: Polynomial[] = [];
  for (const bound of table.bounds) {
    const { rows, columns } = linesOf(table, bound);
    for (const r of sublists(rows, bound.rank + 1)) {
      for (const c of sublists(columns, bound.rank + 1)) {
        const key = `${r}|${c}`;
        if (seen.has(key)) continue;
        seen.add(key);
        const f = minor(ring, matrix, r, c, vanishing, budget);
        if (!isZero(f)) minors.push(f);
      }
    }
  }
  return minors;
}

/** Rows and columns, from 0, of the submatrix that a bound speaks of. */
function linesOf(
  table: CornerRanks,
  bound: RankBound,
): { readonly rows: readonly number[]; readonly columns: readonly number[] } {
  const top = table.corner.startsWith("n") ? 0 : table.rows - bound.rows;
  const left = table.corner.endsWith("w") ? 0 : table.columns - bound.columns;
  return {
    rows: Array.from({ length: bound.rows }, (_, i) => top + i),
    columns: Array.from({ length: bound.columns }, (_, j) => left + j),
  };
}
