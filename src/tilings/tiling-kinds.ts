/** The kinds of tilings by name: how each is enumerated, counted, and which variables vanish on it. */
import type { Cell } from "../combinatorics/cell.js";
import type { Permutation } from "../combinatorics/permutation.js";
import type { Budget } from "../outcomes/budget.js";
import { bumplessTransfer } from "./bumpless.js";
import { countTilings, countWithin } from "./counting.js";
import { ordinaryTransfer } from "./ordinary.js";
import { principalSpecialization } from "./principal-specialization.js";
import { enumerateRows } from "./row-transfer.js";
import { cellsWith, type Tiling, type TilingKind } from "./tiling.js";

/** Tilings of permutations, listed and counted. */
export interface TilingListing {
  /** The tilings of w, one at a time, in constant memory. @throws LimitReached */
  enumerate(w: Permutation, budget: Budget): Iterable<Tiling>;
  /** Their number, without listing them. @throws LimitReached */
  count(w: Permutation, budget: Budget): bigint;
}

/** One kind of tiling; listed and counted are the reduced ones. */
export interface TilingFamily extends TilingListing {
  readonly kind: TilingKind;
  readonly description: string;
  /** All tilings of w, reduced or not, where the kind has others. */
  readonly all?: TilingListing;
  /**
   * The cells whose variables vanish on the subspace of a tiling. The weight of the tiling is the product
   * of x_i − y_j over these cells (i,j).
   */
  vanishingCells(tiling: Tiling): readonly Cell[];
}

/* Ordinary pipe dreams have many more cuts: past about a second's worth, bumpless ones are counted. */
const MOST_ORDINARY_CUTS = 20_000;

/**
 * Reduced ordinary pipe dreams: the variables at the crosses vanish.
 * @source Knutson, Miller, *Gröbner geometry of Schubert polynomials*, Ann. of Math. 161 (2005).
 */
const ordinary: TilingFamily = {
  kind: "ordinary",
  description: "reduced ordinary pipe dreams",
  *enumerate(w, budget) {
    for (const rows of enumerateRows(ordinaryTransfer(w), budget)) yield { kind: "ordinary", rows };
  },
  count: (w, budget) =>
    principalSpecialization(
      w,
      (factor) =>
        countWithin(MOST_ORDINARY_CUTS, factor, ordinaryTransfer, budget) ??
        countBumpless(factor, "reduced", budget),
    ),
  vanishingCells: (tiling) => cellsWith(tiling, "+"),
};

/**
 * Bumpless pipe dreams: the variables at the blanks vanish. The reduced ones are as many as the reduced
 * ordinary ones; all of size n together are the alternating sign matrices.
 * @source Lam, Lee, Shimozono, *Back stable Schubert calculus*, Compositio Math. 157 (2021); Weigandt,
 * *Bumpless pipe dreams and alternating sign matrices*, arXiv 2003.07342.
 */
const bumpless: TilingFamily = {
  kind: "bumpless",
  description: "reduced bumpless pipe dreams",
  enumerate: (w, budget) => bumplessTilings(w, "reduced", budget),
  count: (w, budget) =>
    principalSpecialization(w, (factor) => countBumpless(factor, "reduced", budget)),
  all: {
    enumerate: (w, budget) => bumplessTilings(w, "all", budget),
    count: (w, budget) => countBumpless(w, "all", budget),
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

function countBumpless(w: Permutation, which: "reduced" | "all", budget: Budget): bigint {
  return countTilings(w, (side) => bumplessTransfer(side, which), budget);
}

/** All kinds, by name. */
export const tilingKinds: Readonly<Record<TilingKind, TilingFamily>> = { ordinary, bumpless };

/** Is this the name of a kind of tiling? */
export function isTilingKind(name: string): name is TilingKind {
  return Object.hasOwn(tilingKinds, name);
}
