import { describe, expect, it } from "vitest";
import type { Cell } from "../../src/combinatorics/cell.js";
import { containsPattern } from "../../src/combinatorics/pattern-containment.js";
import { identity, length, permutationsOf } from "../../src/combinatorics/permutation.js";
import {
  diagram,
  dominantPart,
  essentialSet,
  rankTable,
} from "../../src/combinatorics/rank-function.js";
import { cornerRank, isInDiagram, perm } from "../support/permutations.js";

const written = (cells: readonly Cell[]): string =>
  cells.map(({ row, column }) => `${row}${column}`).join(" ");

describe("the rank function", () => {
  it("counts the dots of the northwest corners", () => {
    for (const w of permutationsOf(5)) {
      const ranks = rankTable(w);
      expect(ranks).toHaveLength(6);
      for (const [i, row] of ranks.entries()) {
        expect(row).toEqual(Array.from({ length: 6 }, (_, j) => cornerRank(w, i, j)));
      }
    }
  });
});

describe("the diagram", () => {
  it("holds the cells left of the dot of their row and above the dot of their column", () => {
    for (const w of permutationsOf(5)) {
      const places = w.flatMap((_, i) => w.map((__, j) => ({ row: i + 1, column: j + 1 })));
      expect(diagram(w)).toEqual(places.filter(({ row, column }) => isInDiagram(w, row, column)));
    }
  });

  it("has as many cells as w has inversions", () => {
    for (const w of permutationsOf(6)) expect(diagram(w)).toHaveLength(length(w));
    expect(diagram(identity(4))).toEqual([]);
  });

  it("of 31524 by hand", () => {
    expect(written(diagram(perm("31524")))).toBe("11 12 32 34");
  });
});

describe("the essential set", () => {
  it("by hand: the corners that the ideals of small cases need", () => {
    expect(written(essentialSet(perm("2143")))).toBe("11 33");
    expect(written(essentialSet(perm("231")))).toBe("21");
    expect(written(essentialSet(perm("312")))).toBe("12");
    expect(written(essentialSet(perm("1432")))).toBe("23 32");
    expect(written(essentialSet(perm("31524")))).toBe("12 32 34");
    expect(essentialSet(identity(5))).toEqual([]);
  });

  it("of w has no cell strictly southeast of another exactly when w is vexillary", () => {
    // Fulton, *Flags, Schubert polynomials, degeneracy loci, and determinantal formulas*, Duke Math. J. 65
    // (1992), remark 9.17 (from memory).
    for (const w of permutationsOf(6)) {
      const cells = essentialSet(w);
      const nested = cells.some((a) => cells.some((b) => a.row < b.row && a.column < b.column));
      expect(nested).toBe(containsPattern(w, perm("2143")));
    }
  });

  it("has one cell exactly for the w with the rank condition of one corner", () => {
    // Bigrassmannian permutations, C(n+1, 3) of them: Lascoux, Schützenberger, *Treillis et bases des groupes
    // de Coxeter*, Electron. J. Combin. 3 (1996) (from memory).
    for (const [n, count] of [
      [3, 4],
      [4, 10],
      [5, 20],
    ] as const) {
      const one = Array.from(permutationsOf(n)).filter((w) => essentialSet(w).length === 1);
      expect(one).toHaveLength(count);
    }
  });
});

describe("the dominant part", () => {
  it("is the part of the diagram in corners without dots", () => {
    for (const w of permutationsOf(5)) {
      const cells = diagram(w).filter(({ row, column }) => cornerRank(w, row, column) === 0);
      expect(dominantPart(w)).toEqual(cells);
    }
  });

  it("is the whole diagram exactly for the Catalan many w that avoid 132", () => {
    // Macdonald, *Notes on Schubert polynomials* (1991), on dominant permutations (from memory).
    const dominant = Array.from(permutationsOf(5)).filter(
      (w) => dominantPart(w).length === length(w),
    );
    expect(dominant).toHaveLength(42);
    expect(dominant.some((w) => containsPattern(w, perm("132")))).toBe(false);
  });
});
