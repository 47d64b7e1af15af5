import { describe, expect, it } from "vitest";
import { printPermutation } from "../../src/combinatorics/permutation.js";
import { followPipes } from "../../src/tilings/pipes.js";
import { ROBBINS_NUMBERS } from "../reference/weigandt/alternating-sign-matrices.js";
import { bumplessOf, everyAlternatingSignMatrix } from "../support/tilings.js";

const ordinary = (text: string) => followPipes({ kind: "ordinary", rows: text.split("/") });
const bumpless = (text: string) => followPipes({ kind: "bumpless", rows: text.split("/") });

describe("following the pipes", () => {
  it("reads 231 and 312 off the ordinary pipe dreams with crosses in column 1 and in row 1", () => {
    expect(printPermutation(ordinary("+%J/+J./J..").permutation)).toBe("231");
    expect(printPermutation(ordinary("++J/%J./J..").permutation)).toBe("312");
    expect(printPermutation(ordinary("%%J/%J./J..").permutation)).toBe("123");
  });

  it("reads 231 and 312 off the bumpless pipe dreams with blanks in column 1 and in row 1", () => {
    expect(printPermutation(bumpless(".r-/.|r/r++").permutation)).toBe("231");
    expect(printPermutation(bumpless("..r/r-+/|r+").permutation)).toBe("312");
    expect(printPermutation(bumpless("r--/|r-/||r").permutation)).toBe("123");
  });

  it("gives the paths of the pipes, by hand for the two pipe dreams of 132 without blanks at (1,1)", () => {
    const { paths, crossings, reduced, permutation } = bumpless("r--/|.r/|r+");
    expect(printPermutation(permutation)).toBe("132");
    expect(paths.map((path) => path.map((c) => `${c.row}${c.column}`).join(" "))).toEqual([
      "31 21 11 12 13",
      "32 33",
      "33 23",
    ]);
    expect(crossings).toEqual([{ row: 3, column: 3, horizontal: 2, vertical: 3 }]);
    expect(reduced).toBe(true);
  });

  it("lists crossings row by row, with the horizontal and the vertical pipe", () => {
    const { crossings, paths } = ordinary("++J/+J./J..");
    expect(crossings).toEqual([
      { row: 1, column: 1, horizontal: 3, vertical: 1 },
      { row: 1, column: 2, horizontal: 3, vertical: 2 },
      { row: 2, column: 1, horizontal: 2, vertical: 1 },
    ]);
    expect(paths[0]).toEqual([
      { row: 1, column: 1 },
      { row: 2, column: 1 },
      { row: 3, column: 1 },
    ]);
  });

  it("goes twice through a bump without a crossing, and notices pipes that cross twice", () => {
    const { permutation, crossings, reduced } = ordinary("%+J/+J./J..");
    expect(printPermutation(permutation)).toBe("123");
    expect(crossings).toHaveLength(2);
    expect(reduced).toBe(false);
  });

  it("finds one bumpless pipe dream in S_4 that is not reduced", () => {
    // 42 alternating sign matrices of size 4 against 41 reduced bumpless pipe dreams (Weigandt, arXiv 2003.07342).
    const diagrams = everyAlternatingSignMatrix(4).map((matrix) => followPipes(bumplessOf(matrix)));
    expect(diagrams).toHaveLength(Number(ROBBINS_NUMBERS[3]));
    // Whose it is, by hand: pipes 1 and 2 cross in row 3 and again in row 2.
    const twice = diagrams.filter(({ reduced }) => !reduced);
    expect(twice.map(({ permutation }) => printPermutation(permutation))).toEqual(["1243"]);
  });

  it("does not follow rows that are no tiling", () => {
    expect(() => ordinary("%J/J+")).toThrow(
      'expected a tiling, got "+" below the antidiagonal at row 2, column 2',
    );
    expect(() => bumpless("r-/|.")).toThrow(RangeError);
  });
});
