/**
 * Reduced ordinary pipe dreams, from the top row down. A pipe runs along a row to the left; where it meets
 * the pipe v of a column from above, the two cross or bump. They may cross when v < h (not crossed yet) and
 * h leaves above v (they must cross): then the pipes at the cut are always a permutation below w in weak
 * order, which can be completed, so no row leads nowhere. In row i the pipe w(i) turns left and crosses
 * everything before it; only the columns to its right are free.
 */
import { inverse, type Permutation } from "../combinatorics/permutation.js";
import type { Cut, RowMove, RowTransfer } from "./row-transfer.js";
import type { Tile } from "./tiling.js";

/** May the pipe h, running to the left, cross the pipe v from above? */
type CrossingRule = (h: number, v: number) => boolean;

/** A row that is being filled, from the right to the column where a pipe leaves. */
interface OpenRow extends RowMove {
  readonly cut: Cut;
  /** The column in which the pipe that leaves turns left. */
  readonly exit: number;
  readonly tiles: Tile[];
  readonly next: number[];
  /** The pipe that arrives in each column from the right. */
  readonly arriving: number[];
}

/** The rows of the reduced ordinary pipe dreams of w, top row first. */
export function ordinaryTransfer(w: Permutation): RowTransfer {
  const leaves = inverse(w);
  const mayCross: CrossingRule = (h, v) =>
    v < h && (leaves[h - 1] as number) < (leaves[v - 1] as number);
  return {
    size: w.length,
    start: w.map((_, j) => j + 1),
    moves: (cut, step) => rowsBelow(cut, cut.indexOf(w[step] as number), w.length, mayCross),
  };
}

function* rowsBelow(
  cut: Cut,
  exit: number,
  size: number,
  mayCross: CrossingRule,
): Generator<RowMove, void> {
  const last = cut.length - 1;
  const tiles = Array.from({ length: size }, (_, j): Tile => (j < exit ? "+" : "."));
  tiles[exit] = "%";
  tiles[last] = "J";
  const row: OpenRow = { cut, exit, tiles, next: cut.slice(0, last), arriving: cut.slice(1) };
  let column: number | undefined = last - 1;
  while (column !== undefined) {
    fillLeftwards(row, column, mayCross);
    yield row;
    column = bumpLeftmostCross(row);
  }
}

/* Fills the free columns from one on: crosses wherever they are allowed. */
function fillLeftwards(row: OpenRow, from: number, mayCross: CrossingRule): void {
  const { cut, exit, tiles, next, arriving } = row;
  for (let column = from; column > exit; column--) {
    const h = arriving[column] as number;
    const v = cut[column] as number;
    const crosses = mayCross(h, v);
    tiles[column] = crosses ? "+" : "%";
    next[column] = crosses ? v : h;
    arriving[column - 1] = crosses ? h : v;
  }
  if (exit < next.length) next[exit] = arriving[exit] as number;
}

/* Makes the leftmost free cross a bump; returns the column after it, from which the row is to be filled. */
function bumpLeftmostCross({ cut, exit, tiles, next, arriving }: OpenRow): number | undefined {
  const column = tiles.indexOf("+", exit + 1);
  if (column === -1) return undefined;
  tiles[column] = "%";
  next[column] = arriving[column] as number;
  arriving[column - 1] = cut[column] as number;
  return column - 1;
}
