import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readTiling } from "../../src/tilings/reading.js";
import { expectHelpful, refused } from "../support/faults.js";
import { mutated, randomText } from "../support/hostile-texts.js";
import { perm, randomPermutation } from "../support/permutations.js";
import { accepted } from "../support/reading.js";
import { tilingsOf } from "../support/tilings.js";

const kinds = fc.constantFrom("ordinary" as const, "bumpless" as const);
const printed = fc
  .tuple(kinds, randomPermutation(1, 5), fc.nat())
  .map(([kind, w, k]) => ({ kind, tilings: tilingsOf(kind, w), k }))
  .map(({ kind, tilings, k }) => ({ kind, rows: tilings[k % tilings.length]?.rows ?? [] }));

describe("reading a tiling", () => {
  it("gives back the tiling whose rows were written", () => {
    fc.assert(
      fc.property(printed, (tiling) => {
        expect(accepted(readTiling(tiling.rows.join("\n"), tiling.kind))).toEqual(tiling);
        const spaced = `${tiling.rows.map((row) => `  ${row} \r`).join("\n")}\n\n`;
        expect(accepted(readTiling(spaced, tiling.kind))).toEqual(tiling);
      }),
    );
  });

  it("points at the tile that cannot stand", () => {
    const fault = refused(readTiling("  r-\n  |.\n", "bumpless"));
    expect(fault).toMatchObject({
      message: "no pipe on the east border",
      expected: "a pipe there",
      place: { line: 2, column: 4 },
      excerpt: "  |.",
    });
    expect(refused(readTiling("", "ordinary")).message).toBe("a row of 0 tiles among 1 rows");
    expect(refused(readTiling("r-\n|r", "ordinary")).message).toContain("no tile of ordinary");
    expect(refused(readTiling("J\n".repeat(101), "ordinary")).message).toBe("a tiling of 101 rows");
  });

  it("gives a tiling that reads back to itself, or a helpful fault, for 20,000 texts", () => {
    const letters = fc.string({ unit: fc.constantFrom(..."+%J.-|r\n "), maxLength: 14 });
    const texts = fc.oneof(
      randomText,
      letters,
      mutated(printed.map(({ rows }) => rows.join("\n"))),
    );
    fc.assert(
      fc.property(texts, kinds, (text, kind) => {
        const reading = readTiling(text, kind);
        if (!reading.ok) return expectHelpful(reading.fault, text);
        expect(accepted(readTiling(reading.value.rows.join("\n"), kind))).toEqual(reading.value);
      }),
      { numRuns: 20_000 },
    );
  });

  it("takes the largest size that permutations have", () => {
    const rows = Array.from({ length: 100 }, (_, i) => `${"%".repeat(99 - i)}J${".".repeat(i)}`);
    expect(accepted(readTiling(rows.join("\n"), "ordinary")).rows).toHaveLength(100);
    expect(perm("1")).toEqual([1]);
  });
});
