import fc from "fast-check";
import { beforeAll, describe, expect, it } from "vitest";
import { cornerSums, essentialBounds } from "../../src/combinatorics/corner-ranks.js";
import {
  length,
  type Permutation,
  permutation,
  permutationsOf,
  readPermutation,
} from "../../src/combinatorics/permutation.js";
import {
  diagram,
  dominantPart,
  essentialSet,
  rankTable,
} from "../../src/combinatorics/rank-function.js";
import type { Ideal } from "../../src/families/ideal.js";
import { schubertFamily, schubertIdeal } from "../../src/families/schubert.js";
import { equal, isZero, type Polynomial, setToZero } from "../../src/polynomials/polynomial.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { evaluate } from "./determinants.js";

function wOf(text: string): Permutation {
  const w = readPermutation(text);
  if (!w.ok) throw new Error(`expected a permutation, got ${text}`);
  return w.value;
}

function generators(ideal: Ideal, kind: string): readonly Polynomial[] {
  const set = ideal.generatingSets.find((s) => s.kind === kind);
  if (set === undefined) throw new Error(`expected a generating set, got ${kind}`);
  return set.polynomials();
}

function printed(text: string, kind: string): string[] {
  return generators(schubertIdeal(wOf(text)), kind).map((f) => printPolynomial(f));
}

const cells = (list: readonly { readonly row: number; readonly column: number }[]): string =>
  list.map(({ row, column }) => `${row},${column}`).join(" ");

describe("the Fulton generators", () => {
  it.each([
    // Counted by hand from the essential set: C(i,r+1)·C(j,r+1) minors for the box (i,j) of rank r.
    ["1", 0],
    ["12345", 0],
    ["132", 1],
    ["213", 1],
    ["231", 2],
    ["312", 2],
    ["321", 3],
    ["1243", 1],
    ["1324", 1],
    ["1342", 3],
    ["1423", 3],
    ["1432", 3 + 3 - 1],
    ["2143", 2],
    ["2413", 2 + 3],
    ["3412", 4],
    ["4321", 6],
    ["13254", 1 + 1],
    ["14523", 9],
    ["21543", 1 + 4 + 4 - 1],
    ["31524", 2 + 3 + 4],
    ["214365", 3],
  ])("of %s are %i", (w, count) => {
    expect(printed(w, "fulton")).toHaveLength(count);
  });

  it("of 2143 are z11 and the 3-minor, as in Knutson, Miller, Yong 2009", () => {
    expect(printed("2143", "fulton")).toEqual([
      "z11",
      "z11*z22*z33 - z11*z23*z32 - z12*z21*z33 + z12*z23*z31 + z13*z21*z32 - z13*z22*z31",
    ]);
  });

  it("of the longest permutation are the variables above the antidiagonal", () => {
    const w = permutation([5, 4, 3, 2, 1]);
    const expected = diagram(w).map(({ row, column }) => `z${row}${column}`);
    expect(printed("54321", "fulton").sort()).toEqual(expected.sort());
    expect(expected).toHaveLength(10);
  });

  it("are the first and default set, and among the defining minors", () => {
    for (const w of permutationsOf(4)) {
      const ideal = schubertIdeal(w);
      expect(ideal.generatingSets.map((s) => s.kind)).toEqual(["fulton", "cdg", "defining"]);
      const defining = generators(ideal, "defining");
      for (const f of generators(ideal, "fulton")) {
        expect(defining.some((g) => equal(f, g))).toBe(true);
      }
    }
  });
});

describe("the CDG generators", () => {
  it("of 2143 are z11 and the 3-minor with z11 = 0, as in Hamaker, Pechenik, Weigandt 2022", () => {
    expect(printed("2143", "cdg")).toEqual([
      "z11",
      "-z12*z21*z33 + z12*z23*z31 + z13*z21*z32 - z13*z22*z31",
    ]);
  });

  it("of a dominant permutation are the variables of the diagram", () => {
    const w = wOf("4231");
    expect(dominantPart(wOf("43125"))).toHaveLength(length(wOf("43125")));
    expect(printed("43125", "cdg").sort()).toEqual(
      diagram(wOf("43125"))
        .map(({ row, column }) => `z${row}${column}`)
        .sort(),
    );
    expect(cells(dominantPart(w))).toBe("1,1 1,2 1,3 2,1 3,1");
  });

  it("are the Fulton generators when no rank is 0", () => {
    expect(printed("13254", "cdg")).toEqual(printed("13254", "fulton"));
    expect(printed("1432", "cdg")).toEqual(printed("1432", "fulton"));
  });

  it("are for all of S_5 the variables of rank 0 and the Fulton minors with these set to 0", () => {
    for (const w of permutationsOf(5)) {
      const ideal = schubertIdeal(w);
      const cell = ideal.ring.matrices[0]?.cells ?? [];
      // The definition once more, from the rank function alone, not from the diagram.
      const ranks = rankTable(w);
      const zeroes = new Set<number>();
      cell.forEach((row, i) => {
        row.forEach((v, j) => {
          if (ranks[i + 1]?.[j + 1] === 0) zeroes.add(v);
        });
      });
      const expected = generators(ideal, "fulton")
        .map((f) => setToZero(f, zeroes))
        .filter((f) => !isZero(f))
        .map((f) => printPolynomial(f));
      const names = [...zeroes].map((v) => ideal.ring.variables[v]);
      expect(generators(ideal, "cdg").map((f) => printPolynomial(f))).toEqual([
        ...names,
        ...expected,
      ]);
    }
  });
});

describe("the defining minors", () => {
  it("are those of all corners, each once, without vacuous corners", () => {
    expect(printed("132", "defining")).toEqual(["z11*z22 - z12*z21"]);
    expect(printed("321", "defining").sort()).toEqual(
      ["z11", "z12", "z21", "z11*z22 - z12*z21"].sort(),
    );
    expect(printed("123", "defining")).toEqual([]);
  });

  it("vanish with the Fulton and the CDG generators at B·v·B for exactly the v above w", () => {
    // Fulton 1992, §3 (from memory): the variety of w is the union of the lower·v·upper with r_v <= r_w.
    const entry = fc.bigInt({ min: -3n, max: 3n });
    const triangle = fc.array(entry, { minLength: 16, maxLength: 16 });
    const permutationOf4 = fc.shuffledSubarray([1, 2, 3, 4], { minLength: 4 });
    const unit = (values: readonly bigint[], lower: boolean): bigint[][] =>
      [0, 1, 2, 3].map((i) =>
        [0, 1, 2, 3].map((j) => {
          if (i === j) return 1n;
          return i > j === lower ? (values[4 * i + j] as bigint) : 0n;
        }),
      );
    const product = (a: readonly bigint[][], b: readonly bigint[][]): bigint[][] =>
      a.map((row) =>
        [0, 1, 2, 3].map((j) => row.reduce((s, x, k) => s + x * (b[k]?.[j] as bigint), 0n)),
      );
    const sets = new Map(
      [...permutationsOf(4)].map((w) => {
        const ideal = schubertIdeal(w);
        return [w, ideal.generatingSets.map((s) => s.polynomials())] as const;
      }),
    );
    fc.assert(
      fc.property(permutationOf4, triangle, triangle, (values, l, u) => {
        const v = permutation(values);
        const dots = v.map((value) => [0, 1, 2, 3].map((j) => (value === j + 1 ? 1n : 0n)));
        const point = product(product(unit(l, true), dots), unit(u, false)).flat();
        const ranks = rankTable(v).flat();
        for (const [w, kinds] of sets) {
          const allowed = rankTable(w).flat();
          const above = ranks.every((rank, k) => rank <= (allowed[k] as number));
          for (const minors of kinds) {
            expect(minors.every((f) => evaluate(f, point) === 0n)).toBe(above);
          }
        }
      }),
      { numRuns: 60 },
    );
  });
});

describe("the essential set", () => {
  it("of 48627315 is that of the running example of Fulton 1992", () => {
    // The permutation is Fulton's (from memory); the cells were found by hand from its diagram.
    const w = permutation([4, 8, 6, 2, 7, 3, 1, 5]);
    const ranks = rankTable(w);
    expect(length(w)).toBe(18);
    expect(essentialSet(w).map((c) => [c.row, c.column, ranks[c.row]?.[c.column]])).toEqual([
      [2, 7, 1],
      [3, 3, 0],
      [3, 5, 1],
      [5, 3, 1],
      [5, 5, 2],
      [6, 1, 0],
    ]);
  });

  it("gives exactly the bounds that the others do not imply, for all of S_6", () => {
    // Fulton 1992, Lemma 3.10 (from memory).
    for (const w of permutationsOf(6)) {
      const sums = cornerSums(w.map((value) => w.map((_, j) => (value === j + 1 ? 1 : 0))));
      const bounds = essentialBounds(sums).bounds.map((b) => ({ row: b.rows, column: b.columns }));
      expect(cells(bounds)).toBe(cells(essentialSet(w)));
    }
  });

  it("has no cell strictly southeast of another exactly for vexillary w", () => {
    // Fulton 1992, Remark 9.17 (from memory); the numbers of vexillary permutations from
    // Knutson, Miller, Yong 2009 for n = 1…6.
    const counts = [1, 2, 3, 4, 5, 6].map(
      (n) =>
        [...permutationsOf(n)].filter((w) => {
          const set = essentialSet(w);
          return !set.some((a) => set.some((b) => a.row < b.row && a.column < b.column));
        }).length,
    );
    expect(counts).toEqual([1, 2, 6, 23, 103, 513]);
  });
});

describe("schubertIdeal", () => {
  let ideal: Ideal;
  beforeAll(() => {
    ideal = schubertIdeal(wOf("2143"));
  });

  it("carries its name, its permutation and its default order", () => {
    expect(ideal.name).toBe("schubert:2143");
    expect(ideal.permutation).toEqual([2, 1, 4, 3]);
    expect(ideal.defaultOrder).toBe("revlex from nw by rows");
    expect(ideal.ring.variables).toHaveLength(16);
  });

  it("is read from both notations, which name the same ideal", () => {
    const commas = schubertFamily.read("2,1,4,3");
    const digits = schubertFamily.read("2143");
    expect(commas.ok && commas.value.name).toBe("schubert:2143");
    expect(digits.ok && digits.value.name).toBe("schubert:2143");
    const ten = schubertFamily.read("2,1,3,4,5,6,7,8,9,10");
    expect(ten.ok && ten.value.name).toBe("schubert:2,1,3,4,5,6,7,8,9,10");
    expect(ten.ok && generators(ten.value, "fulton").map((f) => printPolynomial(f))).toEqual([
      "z1_1",
    ]);
  });

  it("has non-zero, distinct generators of every kind, for all of S_4", () => {
    for (const w of permutationsOf(4)) {
      for (const set of schubertIdeal(w).generatingSets) {
        const texts = set.polynomials().map((f) => printPolynomial(f));
        expect(texts).not.toContain("0");
        expect(new Set(texts).size).toBe(texts.length);
      }
    }
  });
});
