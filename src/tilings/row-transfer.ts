/**
 * Tilings row by row. What later rows need to know of earlier ones is which pipe stands in which column at
 * the cut between them; a kind of tiling says which rows can follow a cut so that the wanted permutation
 * can still be reached. Enumeration walks the cuts depth-first, holds one tiling at a time and meets no
 * dead end: the time between two tilings is at most that of filling all the rows once.
 */
import type { Budget } from "../outcomes/budget.js";
import type { Tile } from "./tiling.js";

/** The pipe that stands in each column at a cut, 0 where there is none. */
export type Cut = readonly number[];

/** One row that can follow a cut, and the cut behind it. Filled anew for the next row that is asked for. */
export interface RowMove {
  readonly tiles: readonly Tile[];
  readonly next: Cut;
}

/** The rows of one kind of tiling of one permutation. */
export interface RowTransfer {
  readonly size: number;
  readonly start: Cut;
  /**
   * The rows that can follow a cut after `step` rows, each once, and none that leads nowhere. One move is
   * valid at a time; the cut that is passed must not change meanwhile.
   */
  moves(cut: Cut, step: number): Iterable<RowMove>;
}

/** All tilings, each as its rows in the order of the transfer, one at a time. @throws LimitReached */
export function* enumerateRows(transfer: RowTransfer, budget: Budget): Generator<string[], void> {
  const rows: string[] = [];
  const open = [transfer.moves(transfer.start, 0)[Symbol.iterator]()];
  for (let moves = open.at(-1); moves !== undefined; moves = open.at(-1)) {
    budget.spend(() => "listing tilings");
    const { done, value: move } = moves.next();
    rows.length = open.length - 1;
    if (done === true) {
      open.pop();
      continue;
    }
    rows.push(move.tiles.join(""));
    if (rows.length === transfer.size) yield [...rows];
    else open.push(transfer.moves(move.next, rows.length)[Symbol.iterator]());
  }
}
