import fc from "fast-check";
import { beforeAll, describe, expect, it } from "vitest";
import {
  identity,
  inverse,
  type Permutation,
  permutation,
  permutationsOf,
  printPermutation,
} from "../../src/combinatorics/permutation.js";
import { LimitReached, startBudget, unlimited, withinBudget } from "../../src/outcomes/budget.js";
import { bumplessTransfer } from "../../src/tilings/bumpless.js";
import { countTilings, countWithin } from "../../src/tilings/counting.js";
import { ordinaryTransfer } from "../../src/tilings/ordinary.js";
import type { RowTransfer } from "../../src/tilings/row-transfer.js";
import type { TilingKind } from "../../src/tilings/tiling.js";
import { tilingKinds } from "../../src/tilings/tiling-kinds.js";
import { staircasePlanePartitions } from "../reference/fomin-kirillov/plane-partitions.js";
import { LARGER_COUNTS, SMALL_COUNTS } from "../reference/knutson-miller/pipe-dream-counts.js";
import { MAXIMA, SUMS } from "../reference/merzon-smirnov/principal-specializations.js";
import { ROBBINS_NUMBERS } from "../reference/weigandt/alternating-sign-matrices.js";
import { perm, randomPermutation, reducedWords, reversedBehind } from "../support/permutations.js";
import { countOf, tilingsOf } from "../support/tilings.js";

const KINDS: readonly TilingKind[] = ["ordinary", "bumpless"];
const reducedBumpless = (w: Permutation) => bumplessTransfer(w, "reduced");
const byRows = {
  ordinary: (w: Permutation) => countTilings(w, ordinaryTransfer, unlimited()),
  bumpless: (w: Permutation) => countTilings(w, reducedBumpless, unlimited()),
};

describe.each(KINDS)("the numbers of reduced %s pipe dreams", (kind) => {
  it("of S_3 and S_4", () => {
    for (const w of [...permutationsOf(3), ...permutationsOf(4)]) {
      const count = BigInt(SMALL_COUNTS[printPermutation(w)] ?? 1);
      expect(countOf(kind, w)).toBe(count);
      expect(byRows[kind](w)).toBe(count);
    }
  });

  it.each(LARGER_COUNTS)("of %s is %i", (w, count) => {
    expect(countOf(kind, perm(w))).toBe(BigInt(count));
    expect(byRows[kind](perm(w))).toBe(BigInt(count));
    expect(tilingsOf(kind, perm(w))).toHaveLength(count);
  });

  it.each(SUMS.map((sum, k) => [k + 1, sum, MAXIMA[k] as bigint] as const))(
    "of S_%i add up to %i, the largest being %i",
    (n, sum, maximum) => {
      const counts = Array.from(permutationsOf(n), (w) => countOf(kind, w));
      expect(counts.reduce((total, count) => total + count, 0n)).toBe(sum);
      expect(counts.sort((a, b) => Number(b - a))[0]).toBe(maximum);
    },
  );

  it("are those of the lists, with and without closed forms", () => {
    for (const w of [...permutationsOf(5), ...permutationsOf(6)].filter((_, k) => k % 3 === 0)) {
      const listed = BigInt(tilingsOf(kind, w).length);
      expect(countOf(kind, w)).toBe(listed);
      expect(byRows[kind](w)).toBe(listed);
    }
  });

  it("of 1, n, n−1, …, 2 are the Catalan numbers", () => {
    // Woo, *Catalan numbers and Schubert polynomials for w = 1(n+1)…2*, arXiv math/0407160 (from memory).
    const counts = [1, 2, 3, 4, 5, 10].map((k) => byRows[kind](reversedBehind(1, k)));
    expect(counts).toEqual([1n, 2n, 5n, 14n, 42n, 16796n]);
    expect(countOf(kind, reversedBehind(1, 29))).toBe(1002242216651368n);
  });

  it("of 1, …, m, m+k, …, m+1 are those of plane partitions in a staircase", () => {
    for (const [m, k] of [
      [2, 3],
      [3, 3],
      [3, 4],
      [4, 4],
      [2, 6],
    ] as const) {
      expect(byRows[kind](reversedBehind(m, k))).toBe(staircasePlanePartitions(m, k));
      expect(countOf(kind, reversedBehind(m, k))).toBe(staircasePlanePartitions(m, k));
    }
    expect(countOf(kind, reversedBehind(30, 30))).toBe(staircasePlanePartitions(30, 30));
  });

  it("of w and of its inverse are the same", () => {
    fc.assert(
      fc.property(randomPermutation(7, 10), (w) => {
        expect(countOf(kind, w)).toBe(countOf(kind, inverse(w)));
      }),
      { numRuns: 40 },
    );
  });

  it("do not change when w gets a fixed point at the end", () => {
    fc.assert(
      fc.property(randomPermutation(1, 8), (w) => {
        const longer = permutation([...w, w.length + 1]);
        expect(byRows[kind](longer)).toBe(byRows[kind](w));
        expect(countOf(kind, longer)).toBe(countOf(kind, w));
      }),
      { numRuns: 40 },
    );
  });

  it("stop being counted when the budget is spent", () => {
    const w = perm("1,8,4,15,10,2,6,9,13,7,12,11,3,14,5");
    const count = () => tilingKinds[kind].count(w, startBudget({ cancelled: () => true }));
    expect(count).toThrow(LimitReached);
    expect(count).toThrow(/^cancelled, counting tilings, row \d+, \d+ cuts$/);
  });
});

describe("ordinary and bumpless pipe dreams", () => {
  it("of the same w are equally many", () => {
    // Lam, Lee, Shimozono, *Back stable Schubert calculus*, Compositio Math. 157 (2021). The two are counted
    // independently here: from the top and from the bottom, with other cuts and other rules.
    fc.assert(
      fc.property(randomPermutation(7, 11), (w) => {
        expect(byRows.ordinary(w)).toBe(byRows.bumpless(w));
      }),
      { numRuns: 60 },
    );
  });

  it("are still counted when ordinary ones have too many cuts", () => {
    const w = perm("10,4,8,6,18,13,1,9,17,16,15,2,3,14,7,12,5,11");
    expect(countOf("ordinary", w)).toBe(countOf("bumpless", w));
  });

  it("satisfy Macdonald's identity: l! times their number is the sum of a_1⋯a_l over the reduced words", () => {
    // Macdonald, *Notes on Schubert polynomials* (1991), (6.11); also recomputed by an independent program.
    for (const w of permutationsOf(5)) {
      const words = reducedWords(w);
      const sum = words
        .map((word) => word.reduce((product, a) => product * a, 1))
        .reduce((total, product) => total + product, 0);
      const factorial = (words[0] ?? []).reduce((product, _, k) => product * (k + 1), 1);
      expect(countOf("ordinary", w) * BigInt(factorial)).toBe(BigInt(sum));
    }
  });
});

describe("all bumpless pipe dreams", () => {
  let countAll: (w: Permutation) => bigint;
  beforeAll(() => {
    countAll = (w) => tilingKinds.bumpless.all?.count(w, unlimited()) ?? 0n;
  });

  it.each(ROBBINS_NUMBERS.map((count, k) => [k + 1, count] as const))(
    "of S_%i together are the %i alternating sign matrices",
    (n, count) => {
      let total = 0n;
      for (const w of permutationsOf(n)) total += countAll(w);
      expect(total).toBe(count);
    },
  );

  it("are counted as they are listed", () => {
    for (const w of permutationsOf(5)) {
      expect(countAll(w)).toBe(BigInt(tilingsOf("bumpless", w, "all").length));
    }
  });

  it("of the identity of S_n are one when n ≤ 3: every cross would have to be undone", () => {
    for (const n of [1, 2, 3]) expect(countAll(identity(n))).toBe(1n);
  });
});

describe("counting within limits", () => {
  const w = perm("1,7,2,4,8,10,6,9,3,5");

  it("gives up when more cuts would have to be held than are allowed", () => {
    expect(countWithin(2, w, reducedBumpless, unlimited())).toBeUndefined();
    expect(countWithin(100_000, w, reducedBumpless, unlimited())).toBe(59310n);
    const limited = withinBudget(() => countTilings(w, ordinaryTransfer, unlimited(), 10));
    expect(limited).toEqual({
      kind: "undecided",
      limit: "size",
      reason: "counting tilings needs more than 10 numbers at a time",
    });
  });

  it("goes on with the inverse alone when w has too many cuts", () => {
    const oneRow = (cuts: readonly number[]): RowTransfer => ({
      size: 1,
      start: [],
      moves: () => cuts.map((pipe) => ({ tiles: [], next: [pipe] })),
    });
    const inverted = inverse(w).join();
    const transfer = (side: Permutation) =>
      oneRow(side.join() === inverted ? [7, 7, 7] : [7, 8, 9]);
    expect(countWithin(2, w, transfer, unlimited())).toBe(3n);
    expect(countWithin(0, w, transfer, unlimited())).toBeUndefined();
  });
});
