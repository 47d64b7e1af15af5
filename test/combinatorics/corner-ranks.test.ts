import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type CornerRanks,
  cornerSums,
  essentialBounds,
  type RankBound,
} from "../../src/combinatorics/corner-ranks.js";
import {
  type Permutation,
  permutation,
  permutationsOf,
} from "../../src/combinatorics/permutation.js";
import { essentialSet, rankTable } from "../../src/combinatorics/rank-function.js";

function matrixOf(w: Permutation): number[][] {
  return w.map((value) => w.map((_, j) => (value === j + 1 ? 1 : 0)));
}

/* Whether a bound forces another, from the definition of rank: a line adds at most 1, dropping adds none. */
function forces(known: RankBound, bound: RankBound): boolean {
  const lines = Math.max(0, bound.rows - known.rows) + Math.max(0, bound.columns - known.columns);
  return known.rank + lines <= bound.rank;
}

const isTrivial = (bound: RankBound): boolean => bound.rank >= Math.min(bound.rows, bound.columns);

const randomTable: fc.Arbitrary<CornerRanks> = fc
  .record({
    rows: fc.integer({ min: 1, max: 5 }),
    columns: fc.integer({ min: 1, max: 5 }),
    corner: fc.constantFrom("nw", "ne", "sw", "se"),
  })
  .chain(({ rows, columns, corner }) =>
    fc
      .array(
        fc.record({
          rows: fc.integer({ min: 1, max: rows }),
          columns: fc.integer({ min: 1, max: columns }),
          rank: fc.nat({ max: 4 }),
        }),
        { maxLength: 12 },
      )
      .map((bounds) => ({ rows, columns, corner, bounds })),
  );

describe("corner sums", () => {
  it("of a permutation matrix are its rank function", () => {
    for (const w of permutationsOf(4)) {
      const ranks = rankTable(w);
      const { bounds, ...rest } = cornerSums(matrixOf(w));
      expect(rest).toEqual({ rows: 4, columns: 4, corner: "nw" });
      expect(bounds).toHaveLength(16);
      for (const { rows, columns, rank } of bounds) expect(rank).toBe(ranks[rows]?.[columns]);
    }
  });

  it("of the alternating sign matrix that is no permutation matrix, by hand", () => {
    const { bounds } = cornerSums([
      [0, 1, 0],
      [1, -1, 1],
      [0, 1, 0],
    ]);
    expect(bounds.map(({ rank }) => rank)).toEqual([0, 1, 1, 1, 1, 2, 1, 2, 3]);
  });

  it("of a matrix without rows bound nothing", () => {
    expect(cornerSums([])).toEqual({ rows: 0, columns: 0, corner: "nw", bounds: [] });
  });
});

describe("essential bounds", () => {
  it("of a permutation are those at its essential set", () => {
    for (const w of permutationsOf(5)) {
      const { bounds } = essentialBounds(cornerSums(matrixOf(w)));
      expect(bounds.map(({ rows, columns }) => ({ row: rows, column: columns }))).toEqual(
        essentialSet(w),
      );
    }
  });

  it("of a partial permutation are those of its completion to a permutation", () => {
    // Fulton 1992, section 3; Miller, Sturmfels, *Combinatorial Commutative Algebra*, section 15.1 (from
    // memory): rows without a dot get dots in new columns, then columns without a dot in new rows.
    const partial = fc
      .record({ rows: fc.integer({ min: 1, max: 5 }), columns: fc.integer({ min: 1, max: 5 }) })
      .chain(({ rows, columns }) =>
        fc
          .shuffledSubarray(Array.from({ length: columns }, (_, j) => j + 1))
          .chain((dots) => {
            const used = dots.slice(0, rows);
            const padded = [...used, ...new Array<number>(rows - used.length).fill(0)];
            return fc
              .shuffledSubarray(
                padded.map((_, i) => i),
                { minLength: rows, maxLength: rows },
              )
              .map((order) => order.map((i) => padded[i] as number));
          })
          .map((dots) => ({ dots, columns })),
      );
    fc.assert(
      fc.property(partial, ({ dots, columns }) => {
        let next = columns;
        const filled = dots.map((dot) => (dot === 0 ? ++next : dot));
        const free = Array.from({ length: next }, (_, j) => j + 1).filter(
          (j) => !filled.includes(j),
        );
        const completion = permutation([...filled, ...free]);
        const matrix = dots.map((dot) =>
          Array.from({ length: columns }, (_, j) => (dot === j + 1 ? 1 : 0)),
        );
        const { bounds } = essentialBounds(cornerSums(matrix));
        expect(bounds.map(({ rows, columns: c }) => ({ row: rows, column: c }))).toEqual(
          essentialSet(completion),
        );
      }),
      { numRuns: 400 },
    );
  });

  it("of the alternating sign matrix that is no permutation matrix: the corner cell and nothing else", () => {
    // By hand: z11 = 0, and the 2×2 corner has rank at most 1; the ideal is (z11, z12·z21).
    const { bounds } = essentialBounds(
      cornerSums([
        [0, 1, 0],
        [1, -1, 1],
        [0, 1, 0],
      ]),
    );
    expect(bounds).toEqual([
      { rows: 1, columns: 1, rank: 0 },
      { rows: 2, columns: 2, rank: 1 },
    ]);
  });

  it("are neither trivial nor forced by one another, and force all the rest", () => {
    fc.assert(
      fc.property(randomTable, (table) => {
        const { bounds, ...rest } = essentialBounds(table);
        expect({ ...rest, bounds: table.bounds }).toEqual(table);
        for (const [k, bound] of bounds.entries()) {
          expect(table.bounds).toContain(bound);
          expect(isTrivial(bound)).toBe(false);
          expect(bounds.some((other, l) => l !== k && forces(other, bound))).toBe(false);
        }
        for (const bound of table.bounds) {
          expect(isTrivial(bound) || bounds.some((kept) => forces(kept, bound))).toBe(true);
        }
      }),
      { numRuns: 1000 },
    );
  });

  it("keep the first of bounds that say the same", () => {
    const bound = { rows: 2, columns: 2, rank: 1 };
    const table = { rows: 3, columns: 3, corner: "sw", bounds: [bound, { ...bound }] } as const;
    expect(essentialBounds(table).bounds).toEqual([bound]);
    expect(essentialBounds(table).bounds[0]).toBe(bound);
  });

  it("are not looked for outside of the matrix", () => {
    const outside = (rows: number, columns: number): CornerRanks => ({
      rows: 2,
      columns: 3,
      corner: "nw",
      bounds: [{ rows, columns, rank: 0 }],
    });
    expect(() => essentialBounds(outside(3, 1))).toThrow(
      "expected bounds within 2×3, got one on 3×1",
    );
    expect(() => essentialBounds(outside(2, 4))).toThrow(RangeError);
    expect(essentialBounds(outside(2, 3)).bounds).toHaveLength(1);
    expect(essentialBounds(outside(0, 3)).bounds).toEqual([]);
  });
});
