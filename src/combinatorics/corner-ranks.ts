/**
 * Tables of corner rank bounds: for some corner submatrices of a matrix, the largest rank allowed. From
 * permutations, partial permutation matrices and alternating sign matrices they are corner sums.
 */
import type { Corner } from "../polynomials/corner.js";

/** The submatrix of `rows` × `columns` cells at the table's corner has at most this rank. */
export interface RankBound {
  readonly rows: number;
  readonly columns: number;
  readonly rank: number;
}

/** Rank bounds at one corner of an m×n matrix. */
export interface CornerRanks {
  readonly rows: number;
  readonly columns: number;
  readonly corner: Corner;
  readonly bounds: readonly RankBound[];
}

/** The northwest corner sums of a matrix, as rank bounds on every corner submatrix. */
export function cornerSums(matrix: readonly (readonly number[])[]): CornerRanks {
  const columns = matrix[0]?.length ?? 0;
  let above = new Array<number>(columns).fill(0);
  const bounds = matrix.flatMap((row, i) => {
    let along = 0;
    above = above.map((sum, j) => {
      along += row[j] as number;
      return sum + along;
    });
    return above.map((rank, j) => ({ rows: i + 1, columns: j + 1, rank }));
  });
  return { rows: matrix.length, columns, corner: "nw", bounds };
}

/**
 * The bounds that the others do not imply: a bound is implied when it is not below the size of its
 * submatrix, or when a submatrix with one line less or more (or any other bounded submatrix) forces it.
 * For permutations these are the bounds at the essential set.
 */
export function essentialBounds(table: CornerRanks): CornerRanks {
  const kept: RankBound[] = [];
  const proper = table.bounds.filter((b) => b.rank < Math.min(b.rows, b.columns));
  proper.forEach((bound, k) => {
    const implied = proper.some(
      (other, l) => l !== k && implies(other, bound) && (!implies(bound, other) || l < k),
    );
    if (!implied) kept.push(bound);
  });
  return { ...table, bounds: kept };
}

/* A submatrix of rank ≤ r gains at most one rank a line, and loses none by dropping lines. */
function implies(known: RankBound, bound: RankBound): boolean {
  const more = Math.max(0, bound.rows - known.rows) + Math.max(0, bound.columns - known.columns);
  return known.rank + more <= bound.rank;
}
