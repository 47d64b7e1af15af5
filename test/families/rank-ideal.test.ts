import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type CornerRanks, cornerSums } from "../../src/combinatorics/corner-ranks.js";
import { permutationsOf } from "../../src/combinatorics/permutation.js";
import { rankMinors } from "../../src/families/rank-ideal.js";
import { CORNERS, type Corner } from "../../src/polynomials/corner.js";
import { negate, type Polynomial } from "../../src/polynomials/polynomial.js";
import {
  ringOfMatrices,
  type VariableIndex,
  type VariableMatrix,
} from "../../src/polynomials/polynomial-ring.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { evaluate, rankOf } from "./determinants.js";

function minorsOf(table: CornerRanks, vanishing?: ReadonlySet<VariableIndex>): Polynomial[] {
  const ring = ringOfMatrices([{ name: "z", rows: table.rows, columns: table.columns }]);
  return rankMinors(ring, ring.matrices[0] as VariableMatrix, table, vanishing);
}

function printed(minors: readonly Polynomial[]): string[] {
  return minors.map((f) => printPolynomial(f));
}

/* Minors up to sign, as a set. */
function upToSign(minors: readonly Polynomial[]): string[] {
  return minors.map((f) => [f, negate(f)].map((g) => printPolynomial(g)).sort()[0] ?? "").sort();
}

/* Row i of a matrix becomes row m+1−i, column j becomes column n+1−j, in the printed names. */
function flipped(minors: readonly string[], table: CornerRanks, to: Corner): string[] {
  return minors.map((text) =>
    text.replace(/z(\d)(\d)/g, (_, i: string, j: string) => {
      const row = to.startsWith("s") ? table.rows + 1 - Number(i) : Number(i);
      const column = to.endsWith("e") ? table.columns + 1 - Number(j) : Number(j);
      return `z${row}${column}`;
    }),
  );
}

/* A polynomial's text with factors and terms sorted and the sign taken out. */
function canonical(text: string): string {
  const terms = text
    .replaceAll(" - ", " + -")
    .split(" + ")
    .map((term) => {
      const sign = term.startsWith("-") ? "-" : "+";
      return { sign, name: term.replace("-", "").split("*").sort().join("*") };
    })
    .sort((a, b) => (a.name < b.name ? -1 : 1));
  const flip = terms[0]?.sign === "-";
  return terms.map((t) => `${(t.sign === "-") === flip ? "+" : "-"}${t.name}`).join(" ");
}

const tables = fc
  .record({ rows: fc.integer({ min: 1, max: 4 }), columns: fc.integer({ min: 1, max: 4 }) })
  .chain(({ rows, columns }) =>
    fc.record({
      rows: fc.constant(rows),
      columns: fc.constant(columns),
      corner: fc.constantFrom(...CORNERS),
      bounds: fc.array(
        fc.record({
          rows: fc.integer({ min: 1, max: rows }),
          columns: fc.integer({ min: 1, max: columns }),
          rank: fc.integer({ min: 0, max: 3 }),
        }),
        { minLength: 1, maxLength: 3 },
      ),
    }),
  );

describe("rankMinors", () => {
  it("are the entries of a corner of rank 0", () => {
    const bounds = [{ rows: 2, columns: 2, rank: 0 }];
    const at = (corner: Corner) => printed(minorsOf({ rows: 3, columns: 4, corner, bounds }));
    expect(at("nw")).toEqual(["z11", "z12", "z21", "z22"]);
    expect(at("ne")).toEqual(["z13", "z14", "z23", "z24"]);
    expect(at("sw")).toEqual(["z21", "z22", "z31", "z32"]);
    expect(at("se")).toEqual(["z23", "z24", "z33", "z34"]);
  });

  it("are as many as the choices of r+1 rows and columns", () => {
    const count = (rows: number, columns: number, rank: number): number =>
      minorsOf({ rows: 5, columns: 5, corner: "nw", bounds: [{ rows, columns, rank }] }).length;
    expect(count(4, 5, 1)).toBe(6 * 10);
    expect(count(3, 5, 2)).toBe(10);
    expect(count(5, 5, 4)).toBe(1);
    expect(count(3, 3, 3)).toBe(0);
  });

  it("counts a minor that several bounds ask for once", () => {
    const bounds = [
      { rows: 2, columns: 3, rank: 1 },
      { rows: 3, columns: 2, rank: 1 },
      { rows: 2, columns: 3, rank: 1 },
    ];
    const minors = printed(minorsOf({ rows: 3, columns: 3, corner: "nw", bounds }));
    expect(minors).toHaveLength(3 + 3 - 1);
    expect(new Set(minors).size).toBe(5);
  });

  it("from every corner are the flipped images of those from the northwest", () => {
    fc.assert(
      fc.property(tables, (table) => {
        const northwest = printed(minorsOf({ ...table, corner: "nw" }));
        const expected = flipped(northwest, table, table.corner).map(canonical).sort();
        expect(printed(minorsOf(table)).map(canonical).sort()).toEqual(expected);
      }),
    );
  });

  it("vanish at an integer matrix exactly when its corners have these ranks", () => {
    const entries = fc.array(fc.bigInt({ min: -1n, max: 1n }), { minLength: 16, maxLength: 16 });
    fc.assert(
      fc.property(tables, entries, (table, values) => {
        const { rows, columns, corner, bounds } = table;
        const rowsOfCorner = (k: number) =>
          Array.from({ length: k }, (_, i) => (corner.startsWith("s") ? rows - 1 - i : i));
        const columnsOfCorner = (k: number) =>
          Array.from({ length: k }, (_, j) => (corner.endsWith("e") ? columns - 1 - j : j));
        const satisfied = bounds.every((bound) => {
          const part = rowsOfCorner(bound.rows).map((i) =>
            columnsOfCorner(bound.columns).map((j) => values[i * columns + j] as bigint),
          );
          return rankOf(part) <= bound.rank;
        });
        const vanish = minorsOf(table).every((f) => evaluate(f, values) === 0n);
        expect(vanish).toBe(satisfied);
      }),
      { numRuns: 500 },
    );
  });

  it("of the corner sums of w vanish at the matrix of w and not at a matrix above w", () => {
    // Fulton 1992, Lemma 3.1 (from memory): v is in the matrix Schubert variety of w exactly when r_v <= r_w.
    const all = [...permutationsOf(4)];
    const tableOf = (w: readonly number[]) =>
      cornerSums(w.map((value) => w.map((_, j) => (value === j + 1 ? 1 : 0))));
    for (const w of all) {
      const ranks = tableOf(w);
      const minors = minorsOf(ranks);
      for (const v of all) {
        const point = v.flatMap((value) => v.map((_, j) => (value === j + 1 ? 1n : 0n)));
        const below = tableOf(v).bounds.every((b, k) => b.rank <= (ranks.bounds[k]?.rank ?? -1));
        expect(minors.every((f) => evaluate(f, point) === 0n)).toBe(below);
      }
    }
  });

  it("leave out minors that vanish with the variables set to 0", () => {
    const bounds = [{ rows: 2, columns: 3, rank: 1 }];
    const table: CornerRanks = { rows: 2, columns: 3, corner: "nw", bounds };
    const firstColumn = new Set([0, 3] as VariableIndex[]);
    expect(printed(minorsOf(table, firstColumn))).toEqual(["z12*z23 - z13*z22"]);
  });

  it("do not depend on the order of the bounds", () => {
    fc.assert(
      fc.property(tables, (table) => {
        const reversed = { ...table, bounds: table.bounds.toReversed() };
        expect(upToSign(minorsOf(reversed))).toEqual(upToSign(minorsOf(table)));
      }),
    );
  });

  it("refuse a table of another shape than the matrix", () => {
    const ring = ringOfMatrices([{ name: "z", rows: 2, columns: 2 }]);
    const matrix = ring.matrices[0] as VariableMatrix;
    const table: CornerRanks = { rows: 2, columns: 3, corner: "nw", bounds: [] };
    expect(() => rankMinors(ring, matrix, table)).toThrow(
      new RangeError("expected bounds for a 2×2 matrix, got 2×3"),
    );
  });
});
