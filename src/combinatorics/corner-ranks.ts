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
 * Of bounds that say the same the first stays. For permutations these are the bounds at the essential
 * set. Linear in the size of the matrix and the number of bounds.
 * @throws RangeError when a bound is on more lines than the matrix has.
 */
export function essentialBounds(table: CornerRanks): CornerRanks {
  const forced = forcedRanks(table);
  const at = (rows: number, columns: number): number => forced[rows]?.[columns] ?? Infinity;
  const said = new Set<string>();
  const bounds = table.bounds.filter(({ rows, columns, rank }) => {
    if (rank >= Math.min(rows, columns)) return false;
    const fromOthers = Math.min(
      at(rows - 1, columns) + 1,
      at(rows, columns - 1) + 1,
      at(rows + 1, columns),
      at(rows, columns + 1),
    );
    if (rank > at(rows, columns) || rank >= fromOthers) return false;
    const place = `${rows} ${columns}`;
    if (said.has(place)) return false;
    said.add(place);
    return true;
  });
  return { ...table, bounds };
}

/**
 * The largest rank that the bounds together leave to every corner submatrix, with 0 … m rows and 0 … n
 * columns. A submatrix of rank ≤ r gains at most one rank a line, and loses none by dropping lines; so
 * each bound spreads along the columns and then along the rows, down at one a line and back at no cost.
 */
function forcedRanks(table: CornerRanks): number[][] {
  const forced = Array.from({ length: table.rows + 1 }, (_, i) =>
    Array.from({ length: table.columns + 1 }, (_, j) => (i === 0 || j === 0 ? 0 : Infinity)),
  );
  for (const { rows, columns, rank } of table.bounds) {
    const row = forced[rows];
    const known = row?.[columns];
    if (row === undefined || known === undefined) {
      throw new RangeError(
        `expected bounds within ${table.rows}×${table.columns}, got one on ${rows}×${columns}`,
      );
    }
    row[columns] = Math.min(known, rank);
  }
  for (const row of forced) spread(row);
  for (let j = 0; j <= table.columns; j++) {
    const column = forced.map((row) => row[j] as number);
    spread(column);
    for (const [i, row] of forced.entries()) row[j] = column[i] as number;
  }
  return forced;
}

function spread(ranks: number[]): void {
  for (let k = 1; k < ranks.length; k++) {
    ranks[k] = Math.min(ranks[k] as number, (ranks[k - 1] as number) + 1);
  }
  for (let k = ranks.length - 1; k > 0; k--) {
    ranks[k - 1] = Math.min(ranks[k - 1] as number, ranks[k] as number);
  }
}
