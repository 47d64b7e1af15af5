import { describe, expect, it } from "vitest";
import { drawSideBySide, drawTiling } from "../../src/tilings/drawing.js";
import { perm } from "../support/permutations.js";
import { tilingsOf } from "../support/tilings.js";

describe("drawing a tiling", () => {
  it("uses two box characters a cell", () => {
    expect(drawTiling({ kind: "ordinary", rows: ["+%J", "+J.", "J.."] })).toEqual([
      "┼─╯╭╯ ",
      "┼─╯ · ",
      "╯ · · ",
    ]);
    expect(drawTiling({ kind: "bumpless", rows: [".r-", "rJr", "|r+"] })).toEqual([
      "· ╭───",
      "╭─╯ ╭─",
      "│ ╭─┼─",
    ]);
  });

  it("gives lines of one width, so that drawings line up", () => {
    for (const kind of ["ordinary", "bumpless"] as const) {
      for (const tiling of tilingsOf(kind, perm("21543"))) {
        expect(drawTiling(tiling).map((line) => line.length)).toEqual([10, 10, 10, 10, 10]);
      }
    }
  });
});

describe("drawing tilings side by side", () => {
  it("puts as many in a line as fit, and leaves an empty line between lines of drawings", () => {
    const tilings = tilingsOf("bumpless", perm("132"));
    expect(tilings).toHaveLength(2);
    expect(drawSideBySide(tilings, 80)).toEqual([
      "╭─────   · ╭───",
      "│ · ╭─   ╭─╯ ╭─",
      "│ ╭─┼─   │ ╭─┼─",
    ]);
    expect(drawSideBySide(tilings, 10)).toEqual([
      "╭─────",
      "│ · ╭─",
      "│ ╭─┼─",
      "",
      "· ╭───",
      "╭─╯ ╭─",
      "│ ╭─┼─",
    ]);
  });

  it("draws one in a line when not even one fits, and nothing of nothing", () => {
    expect(drawSideBySide(tilingsOf("ordinary", perm("132")), 1)).toHaveLength(7);
    expect(drawSideBySide([], 80)).toEqual([]);
  });
});
