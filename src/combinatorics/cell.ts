/** Cells of a matrix: row and column from 1, row 1 on top. */

/** A cell. */
export interface Cell {
  readonly row: number;
  readonly column: number;
}
