/**
 * Bumpless pipe dreams, from the bottom row up. In row i the pipe w(i) turns right in its column and runs
 * to the border, crossing everything there; left of it other pipes may turn right and turn up again in an
 * empty column. In a reduced one, h may cross v when h < v (not crossed yet) and h leaves below v (they must
 * cross); then a row never leads nowhere. Without reducedness any two pipes may cross anywhere.
 */
import { inverse, type Permutation } from "../combinatorics/permutation.js";
import type { Cut, RowMove, RowTransfer } from "./row-transfer.js";
import type { Tile } from "./tiling.js";

/** May the pipe h, running to the right, cross the pipe v from below? */
type CrossingRule = (h: number, v: number) => boolean;

/** A row that is being filled, from the left to the column where a pipe leaves. */
interface OpenRow extends RowMove {
  readonly cut: Cut;
  /** The column in which the pipe that leaves turns right. */
  readonly exit: number;
  readonly tiles: Tile[];
  readonly next: number[];
  /** The pipe that arrives in each column from the left, 0 where there is none. */
  readonly arriving: number[];
}

/** The rows of the bumpless pipe dreams of w, bottom row first; only the reduced ones, or all. */
export function bumplessTransfer(w: Permutation, which: "reduced" | "all"): RowTransfer {
  const leaves = inverse(w);
  const n = w.length;
  const mustCross: CrossingRule = (h, v) =>
    h < v && (leaves[h - 1] as number) > (leaves[v - 1] as number);
  const mayCross = which === "all" ? () => true : mustCross;
  return {
    size: n,
    start: w.map((_, j) => j + 1),
    moves: (cut, step) => rowsAbove(cut, cut.indexOf(w[n - 1 - step] as number), mayCross),
  };
}

function* rowsAbove(cut: Cut, exit: number, mayCross: CrossingRule): Generator<RowMove, void> {
  const tiles = cut.map((v): Tile => (v === 0 ? "-" : "+"));
  const next = [...cut];
  tiles[exit] = "r";
  next[exit] = 0;
  const row: OpenRow = { cut, exit, tiles, next, arriving: new Array<number>(exit + 1).fill(0) };
  let column: number | undefined = 0;
  while (column !== undefined) {
    fillRightwards(row, column);
    yield row;
    column = sendRightmostOn(row, mayCross);
  }
}

/* Fills the columns from one on: pipes go up, and what arrives turns up in the next empty column. */
function fillRightwards({ cut, exit, tiles, next, arriving }: OpenRow, from: number): void {
  for (let column = from; column < exit; column++) {
    const h = arriving[column] as number;
    const v = cut[column] as number;
    if (v === 0) tiles[column] = h === 0 ? "." : "J";
    else tiles[column] = h === 0 ? "|" : "+";
    next[column] = v === 0 ? h : v;
    arriving[column + 1] = v === 0 ? 0 : h;
  }
}

/*
 * Sends the rightmost pipe that goes up and could turn up later to the right; returns the column after it,
 * from which the row is to be filled.
 */
function sendRightmostOn(row: OpenRow, mayCross: CrossingRule): number | undefined {
  const { tiles, next, arriving } = row;
  for (let column = row.exit - 1; column >= 0; column--) {
    const tile = tiles[column];
    const pipe = next[column] as number;
    if ((tile !== "|" && tile !== "J") || !canTurnUp(pipe, column + 1, row, mayCross)) continue;
    tiles[column] = tile === "|" ? "r" : "-";
    next[column] = 0;
    arriving[column + 1] = pipe;
    return column + 1;
  }
  return undefined;
}

/* Does the pipe h, running right, find an empty column to turn up in before the exit? */
function canTurnUp(
  h: number,
  from: number,
  { cut, exit }: OpenRow,
  mayCross: CrossingRule,
): boolean {
  for (let column = from; column < exit; column++) {
    const v = cut[column] as number;
    if (v === 0) return true;
    if (!mayCross(h, v)) return false;
  }
  return false;
}
