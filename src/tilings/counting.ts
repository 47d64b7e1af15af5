/**
 * Counting tilings without listing them: numbers of partial tilings, added up cut by cut. Transposing the
 * square turns tilings of w into tilings of w⁻¹, and one of the two can have a hundred times fewer cuts;
 * which cannot be told beforehand, so that both counts run in turns until the first is done.
 */
import { inverse, type Permutation } from "../combinatorics/permutation.js";
import { type Budget, LimitReached } from "../outcomes/budget.js";
import type { RowTransfer } from "./row-transfer.js";

/** Rows tried before the other count has its turn. */
const MOVES_IN_A_TURN = 256;

/** The most cuts at one height that are held in memory; about 150 bytes each. */
const MOST_CUTS = 1_000_000;

/** The numbers of partial tilings by the cut behind them; a cut is written as a string of pipes. */
type CountedCuts = ReadonlyMap<string, { count: bigint }>;

/**
 * The number of tilings that a kind has for w.
 * @param transfer the rows of the kind; w and w⁻¹ must have equally many tilings.
 * @throws LimitReached also when more than `mostCuts` cuts would have to be held at one height.
 */
export function countTilings(
  w: Permutation,
  transfer: (w: Permutation) => RowTransfer,
  budget: Budget,
  mostCuts: number = MOST_CUTS,
): bigint {
  const count = countWithin(mostCuts, w, transfer, budget);
  if (count !== undefined) return count;
  const reason = `counting tilings needs more than ${mostCuts} numbers at a time`;
  throw new LimitReached({ kind: "undecided", limit: "size", reason });
}

/**
 * The number of tilings that a kind has for w, as `countTilings`.
 * @returns undefined when more than `mostCuts` cuts would have to be held at one height.
 * @throws LimitReached
 */
export function countWithin(
  mostCuts: number,
  w: Permutation,
  transfer: (w: Permutation) => RowTransfer,
  budget: Budget,
): bigint | undefined {
  const inverted = inverse(w);
  const isInvolution = inverted.every((value, i) => value === w[i]);
  const sides = isInvolution ? [w] : [w, inverted];
  const running = new Set(sides.map((side) => countingRows(transfer(side), mostCuts)));
  while (running.size > 0) {
    for (const count of running) {
      const { done, value } = count.next();
      if (done === true && value !== undefined) return value;
      if (done === true) running.delete(count);
      else budget.spend(() => `counting tilings, ${value}`);
    }
  }
  return undefined;
}

function* countingRows(
  transfer: RowTransfer,
  mostCuts: number,
): Generator<string, bigint | undefined> {
  let counts: CountedCuts = new Map([[writtenCut(transfer.start), { count: 1n }]]);
  let moves = 0;
  for (let step = 0; step < transfer.size; step++) {
    const next = new Map<string, { count: bigint }>();
    for (const [cut, { count }] of counts) {
      for (const move of transfer.moves(pipesOf(cut), step)) {
        const key = writtenCut(move.next);
        const known = next.get(key);
        if (known === undefined) next.set(key, { count });
        else known.count += count;
        if (++moves % MOVES_IN_A_TURN === 0) yield `row ${step + 1}, ${next.size} cuts`;
      }
      if (next.size > mostCuts) return undefined;
    }
    counts = next;
  }
  let total = 0n;
  for (const { count } of counts.values()) total += count;
  return total;
}

function writtenCut(pipes: readonly number[]): string {
  return String.fromCharCode(...pipes);
}

function pipesOf(cut: string): number[] {
  return Array.from({ length: cut.length }, (_, j) => cut.charCodeAt(j));
}
