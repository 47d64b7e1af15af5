/**
 * Tilings row by row. What later rows need to know of earlier ones is which pipe stands in which column at
 * the cut between them; a kind of tiling says which rows can follow a cut so that the wanted permutation
 * can still be reached. Enumeration walks the cuts depth-first and holds one tiling at a time; counting
 * adds up numbers of tilings a cut and lists none.
 */
import type { Budget } from "../outcomes/budget.js";

/** The pipe that stands in each column at a cut, 0 where there is none. */
export type Cut = readonly number[];

/** One row that can follow a cut, and the cut behind it. */
export interface RowMove {
  readonly tiles: string;
  readonly next: Cut;
}

/** The rows of one kind of tiling of one permutation. */
export interface RowTransfer {
  readonly size: number;
  readonly start: Cut;
  /**
   * The rows that can follow a cut after `step` rows, each once, and none that leads nowhere.
   */
  moves(cut: Cut, step: number): Iterable<RowMove>;
}

/** All tilings, each as its rows in the order of the transfer, one at a time. @throws LimitReached */
export function* enumerateRows(transfer: RowTransfer, budget: Budget): Generator<string[], void> {
  const rows: string[] = [];
  function* from(cut: Cut, step: number): Generator<string[], void> {
    if (step === transfer.size) {
      yield [...rows];
      return;
    }
    for (const { tiles, next } of transfer.moves(cut, step)) {
      budget.spend(() => "listing tilings");
      rows.push(tiles);
      yield* from(next, step + 1);
      rows.pop();
    }
  }
  yield* from(transfer.start, 0);
}

/** The number of tilings. Memory: the cuts at one height. @throws LimitReached */
export function countRows(transfer: RowTransfer, budget: Budget): bigint {
  let counts = new Map<string, { readonly cut: Cut; count: bigint }>([
    ["", { cut: transfer.start, count: 1n }],
  ]);
  for (let step = 0; step < transfer.size; step++) {
    const next: typeof counts = new Map();
    for (const { cut, count } of counts.values()) {
      for (const move of transfer.moves(cut, step)) {
        budget.spend(() => `counting tilings, row ${step + 1}, ${next.size} cuts`);
        const key = String.fromCharCode(...move.next);
        const known = next.get(key);
        if (known === undefined) next.set(key, { cut: move.next, count });
        else known.count += count;
      }
    }
    counts = next;
  }
  let total = 0n;
  for (const { count } of counts.values()) total += count;
  return total;
}
