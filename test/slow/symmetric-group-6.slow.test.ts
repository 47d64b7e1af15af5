import { describe, expect, it } from "vitest";
import { containsPattern } from "../../src/combinatorics/pattern-containment.js";
import {
  permutation,
  permutationsOf,
  printPermutation,
} from "../../src/combinatorics/permutation.js";
import { groebner, match, schubertQuestion } from "../support/questions.js";

const pattern = (text: string) => permutation(Array.from(text, Number));

describe("all of S_6", () => {
  // Knutson, Miller 2005; Klein, Weigandt, arXiv 2108.08370 [from memory].
  it.each(["revlex from nw by rows", "lex from nw by rows", "lex from se by columns"])(
    "matches its pipe dreams in %s",
    (phrase) => {
      let degrees = 0n;
      for (const w of permutationsOf(6)) {
        const { matching, description } = match(schubertQuestion(w, phrase));
        expect(matching.verdict, printPermutation(w)).toBe("holds");
        degrees += description.degree;
      }
      // Merzon, Smirnov, arXiv 1410.6857; Stanley, arXiv 1704.00851 [from memory]: the sum over S_6.
      expect(degrees).toBe(6080n);
    },
    600_000,
  );

  // Knutson, Miller 2005; Knutson, Miller, Yong 2009: 513 vexillary permutations.
  it("has Fulton bases for all in the antidiagonal order, for the 513 vexillary ones in the diagonal order", () => {
    const holds = (phrase: string) =>
      [...permutationsOf(6)].filter(
        (w) => groebner(schubertQuestion(w, phrase)).verdict === "holds",
      );
    expect(holds("revlex from nw by rows")).toHaveLength(720);
    const diagonal = holds("lex from nw by rows");
    expect(diagonal).toHaveLength(513);
    expect(diagonal.every((w) => !containsPattern(w, pattern("2143")))).toBe(true);
  }, 600_000);

  // Klein, Algebraic Combinatorics 6 (2023): the patterns of size at most 6.
  it("has diagonal CDG bases exactly for the permutations that avoid Klein's patterns", () => {
    const patterns = ["13254", "21543", "214635", "215364", "215634", "241635", "315264"].map(
      pattern,
    );
    for (const w of permutationsOf(6)) {
      const { verdict } = groebner(schubertQuestion(w, "lex from nw by rows", "cdg"));
      expect(verdict === "fails", printPermutation(w)).toBe(
        patterns.some((p) => containsPattern(w, p)),
      );
    }
  }, 600_000);
});
