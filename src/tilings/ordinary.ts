/**
 * Reduced ordinary pipe dreams, from the top row down. A pipe runs along a row to the left; where it meets
 * the pipe v of a column from above, the two cross or bump. They may cross when v < h (not crossed yet) and
 * h leaves above v (they must cross): then the pipes at the cut are always a permutation below w in weak
 * order, which can be completed, so no row leads nowhere. In row i the pipe w(i) turns left and crosses
 * everything before it; only the columns to its right are free.
 */
import { inverse, type Permutation } from "../combinatorics/permutation.js";
import type { Cut, RowTransfer } from "./row-transfer.js";

/** The rows of the reduced ordinary pipe dreams of w, top row first. */
export function ordinaryTransfer(w: Permutation): RowTransfer {
  const leaves = inverse(w);
  const n = w.length;
  const mayCross = (h: number, v: number): boolean =>
    v < h && (leaves[h - 1] as number) < (leaves[v - 1] as number);
  return {
    size: n,
    start: w.map((_, j) => j + 1),
    *moves(cut, step) {
      const last = cut.length - 1;
      const exit = cut.indexOf(w[step] as number);
      const margin = ".".repeat(step);
      for (const part of freeColumns(cut, exit, last, mayCross)) {
        const tiles = "+".repeat(exit) + (exit === last ? "" : "%") + part.tiles;
        const next =
          exit === last
            ? cut.slice(0, last)
            : [...cut.slice(0, exit), part.arriving, ...part.below];
        yield { tiles: `${tiles}J${margin}`, next };
      }
    },
  };
}

/** The tiles right of the exit column, the pipe that arrives at it, and the pipes below the others. */
interface FreePart {
  readonly tiles: string;
  readonly arriving: number;
  readonly below: Cut;
}

function* freeColumns(
  cut: Cut,
  exit: number,
  last: number,
  mayCross: (h: number, v: number) => boolean,
): Generator<FreePart, void> {
  function* leftOf(
    column: number,
    h: number,
    tiles: string,
    below: Cut,
  ): Generator<FreePart, void> {
    if (column <= exit) {
      yield { tiles, arriving: h, below };
      return;
    }
    const v = cut[column] as number;
    if (mayCross(h, v)) yield* leftOf(column - 1, h, `+${tiles}`, [v, ...below]);
    yield* leftOf(column - 1, v, `%${tiles}`, [h, ...below]);
  }
  yield* leftOf(last - 1, cut[last] as number, "", []);
}
