/** Tilings in tests: slow lists straight from the definitions, and helpers. */
import type { Permutation } from "../../src/combinatorics/permutation.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { followPipes } from "../../src/tilings/pipes.js";
import type { Tiling, TilingKind } from "../../src/tilings/tiling.js";
import { tilingKinds } from "../../src/tilings/tiling-kinds.js";

/** All reduced tilings of w, or all of the kind that there are. */
export function tilingsOf(
  kind: TilingKind,
  w: Permutation,
  which: "reduced" | "all" = "reduced",
): Tiling[] {
  const family = tilingKinds[kind];
  const listing = which === "all" ? family.all : family;
  return [...(listing?.enumerate(w, unlimited()) ?? [])];
}

/** The number of tilings without listing them. */
export function countOf(kind: TilingKind, w: Permutation): bigint {
  return tilingKinds[kind].count(w, unlimited());
}

/** Rows one behind the other, to compare tilings. */
export function writtenTiling({ rows }: Tiling): string {
  return rows.join("/");
}

/** Every filling of the staircase with crosses and bumps: 2^(n(n−1)/2) ordinary pipe dreams. */
export function everyOrdinaryFilling(n: number): Tiling[] {
  const cells = (n * (n - 1)) / 2;
  return Array.from({ length: 2 ** cells }, (_, pattern) => {
    let bit = 0;
    const tileAt = (i: number, j: number): string => {
      if (i + j + 1 >= n) return i + j + 1 === n ? "J" : ".";
      return Math.floor(pattern / 2 ** bit++) % 2 === 1 ? "+" : "%";
    };
    const rows = Array.from({ length: n }, (__, i) =>
      Array.from({ length: n }, (___, j) => tileAt(i, j)).join(""),
    );
    return { kind: "ordinary", rows };
  });
}

/** A square matrix of integers. */
export type SquareMatrix = readonly (readonly number[])[];

/* Partial sums are 0 or 1 and the whole sum is 1. */
function alternates(line: readonly number[]): boolean {
  const sums = line.map((_, k) => line.slice(0, k + 1).reduce((sum, entry) => sum + entry, 0));
  return sums.every((sum) => sum === 0 || sum === 1) && sums.at(-1) === 1;
}

/** All alternating sign matrices: those of all matrices over −1, 0, 1 whose rows and columns alternate. */
export function everyAlternatingSignMatrix(n: number): SquareMatrix[] {
  const lines = Array.from({ length: 3 ** n }, (_, code) =>
    Array.from({ length: n }, (__, j) => (Math.floor(code / 3 ** j) % 3) - 1),
  ).filter(alternates);
  const squares = (rows: number): number[][][] =>
    rows === 0 ? [[]] : squares(rows - 1).flatMap((above) => lines.map((row) => [...above, row]));
  return squares(n).filter((rows) =>
    rows.every((_, j) => alternates(rows.map((row) => row[j] as number))),
  );
}

/**
 * The bumpless pipe dream of an alternating sign matrix: `r` at 1, `J` at −1; at 0 a horizontal pipe where the
 * entries on the left add up to 1, a vertical one where those above do.
 * @source Weigandt, *Bumpless pipe dreams and alternating sign matrices*, arXiv 2003.07342.
 */
export function bumplessOf(matrix: SquareMatrix): Tiling {
  const sum = (entries: readonly number[]): number => entries.reduce((total, e) => total + e, 0);
  const rows = matrix.map((row, i) =>
    row
      .map((entry, j) => {
        if (entry !== 0) return entry === 1 ? "r" : "J";
        const horizontal = sum(row.slice(0, j)) === 1;
        const vertical = sum(matrix.slice(0, i).map((above) => above[j] as number)) === 1;
        if (horizontal) return vertical ? "+" : "-";
        return vertical ? "|" : ".";
      })
      .join(""),
  );
  return { kind: "bumpless", rows };
}

/** The tiling mirrored at the diagonal, which exchanges rows and columns. */
export function transposed({ kind, rows }: Tiling): Tiling {
  const mirrored: Readonly<Record<string, string>> = { "-": "|", "|": "-" };
  return {
    kind,
    rows: rows.map((_, j) =>
      rows
        .map((row) => row[j] ?? "")
        .map((t) => mirrored[t] ?? t)
        .join(""),
    ),
  };
}

/** The sum over tilings of Π (x_i − y_j) over the cells that vanish. */
export function totalWeight(
  tilings: readonly Tiling[],
  x: readonly bigint[],
  y: readonly bigint[],
): bigint {
  return tilings
    .map((tiling) =>
      tilingKinds[tiling.kind]
        .vanishingCells(tiling)
        .map(({ row, column }) => (x[row - 1] as bigint) - (y[column - 1] as bigint))
        .reduce((product, factor) => product * factor, 1n),
    )
    .reduce((sum, weight) => sum + weight, 0n);
}

/** The cells that vanish, as `11 12`. */
export function writtenSubspace(tiling: Tiling): string {
  return tilingKinds[tiling.kind]
    .vanishingCells(tiling)
    .map(({ row, column }) => `${row}${column}`)
    .join(" ");
}

/** Is this a reduced tiling of w? Decided from the tiles alone. */
export function isReducedTilingOf(tiling: Tiling, w: Permutation): boolean {
  const { permutation, reduced } = followPipes(tiling);
  return reduced && permutation.join() === w.join();
}
