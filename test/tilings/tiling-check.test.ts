import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { TILES, type TilingKind } from "../../src/tilings/tiling.js";
import { checkTiling } from "../../src/tilings/tiling-check.js";
import {
  bumplessOf,
  everyAlternatingSignMatrix,
  everyOrdinaryFilling,
} from "../support/tilings.js";

describe("checking a tiling", () => {
  it("passes every filling of the staircase with crosses and bumps", () => {
    for (const tiling of everyOrdinaryFilling(4)) expect(checkTiling(tiling)).toBeUndefined();
  });

  it("passes the bumpless pipe dream of every alternating sign matrix", () => {
    for (const matrix of everyAlternatingSignMatrix(4)) {
      expect(checkTiling(bumplessOf(matrix))).toBeUndefined();
    }
  });

  it("passes, of all 2×2 squares of tiles, those by hand", () => {
    const letters = Object.keys(TILES);
    const squares = letters.flatMap((a) =>
      letters.flatMap((b) =>
        letters.flatMap((c) => letters.map((d): string[] => [`${a}${b}`, `${c}${d}`])),
      ),
    );
    expect(squares).toHaveLength(7 ** 4);
    const passing = (kind: TilingKind): string[] =>
      squares
        .filter((rows) => checkTiling({ kind, rows }) === undefined)
        .map((rows) => rows.join("/"));
    expect(passing("ordinary").sort()).toEqual(["%J/J.", "+J/J."]);
    expect(passing("bumpless").sort()).toEqual([".r/r+", "r-/|r"]);
  });

  it("refuses a bumpless pipe dream in which one tile was changed", () => {
    const matrices = fc.constantFrom(...everyAlternatingSignMatrix(4));
    const place = fc.nat({ max: 3 });
    const letter = fc.constantFrom(...".-|+Jr%");
    fc.assert(
      fc.property(matrices, place, place, letter, (matrix, i, j, tile) => {
        const { kind, rows } = bumplessOf(matrix);
        const row = rows[i] ?? "";
        fc.pre(row[j] !== tile);
        const changed = row.slice(0, j) + tile + row.slice(j + 1);
        expect(checkTiling({ kind, rows: rows.with(i, changed) })).toBeDefined();
      }),
      { numRuns: 500 },
    );
  });

  it.each<[TilingKind, string, number, number, string, string]>([
    ["ordinary", "", 1, 1, '""', ""],
    ["ordinary", "%J/J", 2, 2, "a row of 1 tiles among 2 rows", "as many tiles as rows"],
    ["ordinary", "%JJ/J.", 1, 3, "a row of 3 tiles among 2 rows", "as many tiles as rows"],
    ["ordinary", "rJ/J.", 1, 1, '"r" is no tile of ordinary pipe dreams', "one of + % J ."],
    ["bumpless", "r-/%r", 2, 1, '"%" is no tile of bumpless pipe dreams', "one of . - | + J r"],
    ["bumpless", "r-/|\u{1f600}", 2, 2, '"\u{1f600}" is no tile', "one of . - | + J r"],
    ["ordinary", "JJ/J.", 1, 1, '"J" above the antidiagonal', "+ or %"],
    ["ordinary", "%J/+.", 2, 1, '"+" on the antidiagonal', "J"],
    ["ordinary", "%J/JJ", 2, 2, '"J" below the antidiagonal', "."],
    ["bumpless", "|-/|r", 1, 1, "a pipe ends on the north border", "no pipe there"],
    ["bumpless", "--/||", 1, 1, "a pipe ends on the west border", "no pipe there"],
    [
      "bumpless",
      "r./|r",
      1,
      1,
      "breaks off between this tile and the one right in its row",
      "tiles",
    ],
    ["bumpless", "r-/.r", 1, 1, "breaks off between this tile and the one below in its column", ""],
    ["bumpless", "r-/J.", 2, 1, "a pipe ends on the west border", "no pipe there"],
    ["bumpless", "r-/|.", 2, 2, "no pipe on the east border", "a pipe there"],
    ["bumpless", "..", 1, 2, "a row of 2 tiles among 1 rows", "as many tiles as rows"],
    ["bumpless", ".", 1, 1, "no pipe on the east border", "a pipe there"],
    ["bumpless", "-", 1, 1, "a pipe ends on the west border", "no pipe there"],
  ])("refuses the %s rows %j at (%i,%i)", (kind, text, row, column, message, expected) => {
    const rows = text === "" ? [""] : text.split("/");
    const fault = checkTiling({ kind, rows });
    expect(fault).toMatchObject({ row, column });
    expect(fault?.message).toContain(text === "" ? "a row of 0 tiles" : message);
    expect(fault?.expected).toContain(expected);
  });

  it("refuses no rows at all", () => {
    expect(checkTiling({ kind: "bumpless", rows: [] })?.message).toBe("no rows");
  });
});
