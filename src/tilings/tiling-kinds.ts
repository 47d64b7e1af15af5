/** The kinds of tilings by name: how each is enumerated, counted, and which variables vanish on it. */
import type { Cell } from "../combinatorics/cell.js";
import type { Permutation } from "../combinatorics/permutation.js";
import type { Budget } from "../outcomes/budget.js";
import { bumplessTransfer } from "./bumpless.js";
import { ordinaryTransfer } from "./ordinary.js";
import { countRows, enumerateRows } from "./row-transfer.js";
import { cellsWith, type Tiling, type TilingKind } from "./tiling.js";

/** One kind of tiling. */
export interface TilingFamily {
  readonly kind: TilingKind;
  readonly description: string;
  /** The reduced tilings of w, one at a time. @throws LimitReached */
  enumerate(w: Permutation, budget: Budget): Iterable<Tiling>;
  /** Their number, without listing them. @throws LimitReached */
  count(w: Permutation, budget: Budget): bigint;
  /** All tilings of w, reduced or not, where the kind has others. */
  readonly all?: {
    enumerate(w: Permutation, budget: Budget): Iterable<Tiling>;
    count(w: Permutation, budget: Budget): bigint;
  };
  /** The cells whose variables vanish on the subspace of a tiling. */
  vanishingCells(tiling: Tiling): readonly Cell[];
}

/** Reduced ordinary pipe dreams: the variables at the crosses vanish. */
const ordinary: TilingFamily = {
  kind: "ordinary",
  description: "reduced ordinary pipe dreams",
  *enumerate(w, budget) {
    for (const rows of enumerateRows(ordinaryTransfer(w), budget)) yield { kind: "ordinary", rows };
  },
  count: (w, budget) => countRows(ordinaryTransfer(w), budget),
  vanishingCells: (tiling) => cellsWith(tiling, "+"),
};

/** Bumpless pipe dreams: the variables at the blanks vanish. */
const bumpless: TilingFamily = {
  kind: "bumpless",
  description: "reduced bumpless pipe dreams",
  enumerate: (w, budget) => bumplessTilings(w, "reduced", budget),
  count: (w, budget) => countRows(bumplessTransfer(w, "reduced"), budget),
  all: {
    enumerate: (w, budget) => bumplessTilings(w, "all", budget),
    count: (w, budget) => countRows(bumplessTransfer(w, "all"), budget),
  },
  vanishingCells: (tiling) => cellsWith(tiling, "."),
};

function* bumplessTilings(
  w: Permutation,
  which: "reduced" | "all",
  budget: Budget,
): Generator<Tiling, void> {
  for (const rows of enumerateRows(bumplessTransfer(w, which), budget)) {
    yield { kind: "bumpless", rows: rows.reverse() };
  }
}

/** All kinds, by name. */
export const tilingKinds: Readonly<Record<TilingKind, TilingFamily>> = { ordinary, bumpless };

/** Is this the name of a kind of tiling? */
export function isTilingKind(name: string): name is TilingKind {
  return Object.hasOwn(tilingKinds, name);
}
