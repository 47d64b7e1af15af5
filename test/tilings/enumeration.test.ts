import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { inverse, permutationsOf, printPermutation } from "../../src/combinatorics/permutation.js";
import { LimitReached, startBudget, unlimited } from "../../src/outcomes/budget.js";
import { followPipes } from "../../src/tilings/pipes.js";
import type { TilingKind } from "../../src/tilings/tiling.js";
import { checkTiling } from "../../src/tilings/tiling-check.js";
import { isTilingKind, tilingKinds } from "../../src/tilings/tiling-kinds.js";
import { SUBSPACES } from "../reference/knutson-miller/pipe-dream-counts.js";
import {
  doubleSchubert,
  perm,
  randomPermutation,
  reversedBehind,
} from "../support/permutations.js";
import {
  bumplessOf,
  everyAlternatingSignMatrix,
  everyOrdinaryFilling,
  isReducedTilingOf,
  tilingsOf,
  totalWeight,
  transposed,
  writtenSubspace,
  writtenTiling,
} from "../support/tilings.js";

const KINDS: readonly TilingKind[] = ["ordinary", "bumpless"];

describe.each(KINDS)("the reduced %s pipe dreams", (kind) => {
  it("are tilings of w, reduced, and each listed once", () => {
    for (const w of permutationsOf(5)) {
      const listed = tilingsOf(kind, w);
      expect(new Set(listed.map(writtenTiling)).size).toBe(listed.length);
      for (const tiling of listed) {
        expect(checkTiling(tiling)).toBeUndefined();
        expect(isReducedTilingOf(tiling, w)).toBe(true);
      }
    }
  });

  it("have the double Schubert polynomial as their total weight", () => {
    // Knutson, Miller 2005 and Fomin, Kirillov 1996 for ordinary ones, Lam, Lee, Shimozono 2021 for bumpless
    // ones; here against divided differences, at random integers.
    const integers = fc.uniqueArray(fc.integer({ min: -40, max: 40 }), {
      minLength: 5,
      maxLength: 5,
    });
    fc.assert(
      fc.property(randomPermutation(1, 5), integers, integers, (w, xs, ys) => {
        const [x, y] = [xs.map(BigInt), ys.map(BigInt)];
        expect(totalWeight(tilingsOf(kind, w), x, y)).toBe(doubleSchubert(w, x, y));
      }),
      { numRuns: 200 },
    );
  });

  it("of w⁻¹ are those of w mirrored at the diagonal", () => {
    for (const w of permutationsOf(5)) {
      const mirrored = tilingsOf(kind, w).map((tiling) => writtenTiling(transposed(tiling)));
      expect(mirrored.sort()).toEqual(tilingsOf(kind, inverse(w)).map(writtenTiling).sort());
    }
  });

  it("have as many vanishing cells as w has inversions", () => {
    for (const [w, subspaces] of SUBSPACES) {
      expect(tilingsOf(kind, perm(w)).map(writtenSubspace).sort()).toEqual(
        kind === "bumpless" && w === "132" ? ["11", "22"] : subspaces,
      );
    }
  });

  it("come one at a time: a few hundred of very many, at n = 12 and n = 40", () => {
    for (const w of [reversedBehind(1, 11), reversedBehind(20, 20)]) {
      let listed = 0;
      for (const tiling of tilingKinds[kind].enumerate(w, unlimited())) {
        expect(isReducedTilingOf(tiling, w)).toBe(true);
        if (++listed === 200) break;
      }
      expect(listed).toBe(200);
    }
  });

  it("stop being listed when the budget is spent", () => {
    const listing = (): unknown => {
      const budget = startBudget({ cancelled: () => true });
      return [...tilingKinds[kind].enumerate(reversedBehind(1, 11), budget)];
    };
    expect(listing).toThrow(LimitReached);
    expect(listing).toThrow("cancelled, listing tilings");
  });
});

describe("ordinary pipe dreams", () => {
  it("are, to n = 5, those of all fillings of the staircase that are reduced and of w", () => {
    for (let n = 1; n <= 5; n++) {
      const reduced = everyOrdinaryFilling(n).flatMap((tiling) => {
        const diagram = followPipes(tiling);
        return diagram.reduced ? [`${diagram.permutation} ${writtenTiling(tiling)}`] : [];
      });
      const listed = [...permutationsOf(n)].flatMap((w) =>
        tilingsOf("ordinary", w).map((tiling) => `${w} ${writtenTiling(tiling)}`),
      );
      expect(listed.sort()).toEqual(reduced.sort());
    }
  });

  it("have the antidiagonal limit of the ideal as the ideal of their subspaces for 1432, by hand", () => {
    // The minors of the corners (2,3) and (3,2) have antidiagonal terms 12·21, 13·21, 13·22, 12·31, 22·31; their
    // minimal primes are the five pipe dreams (Knutson, Miller 2005, theorem B).
    expect(tilingsOf("ordinary", perm("1432")).map(writtenSubspace).sort()).toEqual([
      "12 13 22",
      "12 13 31",
      "12 21 22",
      "13 21 31",
      "21 22 31",
    ]);
  });
});

describe("bumpless pipe dreams", () => {
  it("are, to n = 4, the alternating sign matrices, reduced or not", () => {
    for (let n = 1; n <= 4; n++) {
      const diagrams = everyAlternatingSignMatrix(n).map((matrix) => {
        const tiling = bumplessOf(matrix);
        return { ...followPipes(tiling), text: writtenTiling(tiling) };
      });
      for (const w of permutationsOf(n)) {
        const ofW = diagrams.filter(({ permutation }) => permutation.join() === w.join());
        const texts = ofW.map(({ text }) => text).sort();
        const reduced = ofW.filter((diagram) => diagram.reduced).map(({ text }) => text);
        expect(tilingsOf("bumpless", w, "all").map(writtenTiling).sort()).toEqual(texts);
        expect(tilingsOf("bumpless", w).map(writtenTiling).sort()).toEqual(reduced.sort());
      }
    }
  });

  it("that are not reduced are tilings of w all the same", () => {
    for (const w of permutationsOf(5)) {
      const all = tilingsOf("bumpless", w, "all");
      for (const tiling of all) {
        expect(printPermutation(followPipes(tiling).permutation)).toBe(printPermutation(w));
      }
      const reduced = all.filter((tiling) => followPipes(tiling).reduced);
      expect(reduced.map(writtenTiling).sort()).toEqual(
        tilingsOf("bumpless", w).map(writtenTiling).sort(),
      );
    }
  });

  it("of 214365 are 15 on 14 sets of blanks, one of them taken twice", () => {
    // Klein, Weigandt, *Bumpless pipe dreams encode Gröbner geometry of Schubert polynomials*, arXiv 2108.08370
    // (from memory); also recomputed by an independent program.
    const subspaces = tilingsOf("bumpless", perm("214365")).map(writtenSubspace);
    expect(subspaces).toHaveLength(15);
    expect(new Set(subspaces).size).toBe(14);
  });

  it("share no set of blanks in S_5", () => {
    // The same source: 214365 is among the smallest with a multiplicity above 1.
    for (const w of permutationsOf(5)) {
      const subspaces = tilingsOf("bumpless", w).map(writtenSubspace);
      expect(new Set(subspaces).size).toBe(subspaces.length);
    }
  });
});

describe("the table of kinds", () => {
  it("knows its kinds by name and no other", () => {
    expect(Object.keys(tilingKinds)).toEqual(["ordinary", "bumpless"]);
    for (const kind of KINDS) {
      expect(isTilingKind(kind)).toBe(true);
      expect(tilingKinds[kind].kind).toBe(kind);
      expect(tilingKinds[kind].description).toContain(kind);
    }
    for (const name of ["", "Ordinary", "toString", "__proto__", "generic"]) {
      expect(isTilingKind(name)).toBe(false);
    }
  });

  it("has others than reduced ones for bumpless pipe dreams only", () => {
    expect(tilingKinds.ordinary.all).toBeUndefined();
    expect(tilingKinds.bumpless.all).toBeDefined();
  });
});
