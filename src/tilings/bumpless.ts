/**
 * Bumpless pipe dreams, from the bottom row up. In row i the pipe w(i) turns right in its column and runs
 * to the border, crossing everything there; left of it other pipes may turn right and turn up again in an
 * empty column. In a reduced one, h may cross v when h < v (not crossed yet) and h leaves below v (they must
 * cross); then a row never leads nowhere. Without reducedness any two pipes may cross anywhere.
 */
import { inverse, type Permutation } from "../combinatorics/permutation.js";
import type { Cut, RowMove, RowTransfer } from "./row-transfer.js";

/** The rows of the bumpless pipe dreams of w, bottom row first; only the reduced ones, or all. */
export function bumplessTransfer(w: Permutation, which: "reduced" | "all"): RowTransfer {
  const leaves = inverse(w);
  const n = w.length;
  const mayCross =
    which === "all"
      ? () => true
      : (h: number, v: number): boolean =>
          h < v && (leaves[h - 1] as number) > (leaves[v - 1] as number);
  return {
    size: n,
    start: w.map((_, j) => j + 1),
    moves: (cut, step) => rowsAbove(cut, w[n - 1 - step] as number, mayCross),
  };
}

function* rowsAbove(
  cut: Cut,
  leaving: number,
  mayCross: (h: number, v: number) => boolean,
): Generator<RowMove, void> {
  const exit = cut.indexOf(leaving);
  const right = cut.slice(exit + 1);
  const tail = `r${right.map((v) => (v === 0 ? "-" : "+")).join("")}`;
  /* Can the pipe h running right still turn up in an empty column from here on, left of the exit? */
  const canTurnUp = (h: number, from: number): boolean => {
    for (let column = from; column < exit; column++) {
      const v = cut[column] as number;
      if (v === 0) return true;
      if (!mayCross(h, v)) return false;
    }
    return false;
  };
  function* rightFrom(
    column: number,
    h: number,
    tiles: string,
    above: Cut,
  ): Generator<RowMove, void> {
    if (column === exit) {
      yield { tiles: tiles + tail, next: [...above, 0, ...right] };
      return;
    }
    const v = cut[column] as number;
    if (h === 0) {
      yield* rightFrom(column + 1, 0, tiles + (v === 0 ? "." : "|"), [...above, v]);
      if (v !== 0 && canTurnUp(v, column + 1))
        yield* rightFrom(column + 1, v, `${tiles}r`, [...above, 0]);
      return;
    }
    if (v !== 0) {
      yield* rightFrom(column + 1, h, `${tiles}+`, [...above, v]);
      return;
    }
    yield* rightFrom(column + 1, 0, `${tiles}J`, [...above, h]);
    if (canTurnUp(h, column + 1)) yield* rightFrom(column + 1, h, `${tiles}-`, [...above, 0]);
  }
  yield* rightFrom(0, 0, "", []);
}
