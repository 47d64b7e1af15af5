import { describe, expect, it } from "vitest";
import { nearestName } from "../../src/polynomials/nearest-name.js";

describe("the nearest name", () => {
  const names = ["revlex", "lex", "dual", "graded"];

  it.each([
    ["lexx", "lex"],
    ["lx", "lex"],
    ["REVLEX", "revlex"],
    ["rvelex", "revlex"],
    ["duel", "dual"],
    ["gradd", "graded"],
    ["x", undefined],
    ["D", undefined],
    ["polynomial", undefined],
    ["", undefined],
  ])("for %j is %j", (word, expected) => {
    expect(nearestName(word, names)).toBe(expected);
  });

  it("is the first of several that are equally near", () => {
    expect(nearestName("x33", ["x31", "x32", "x13"])).toBe("x31");
  });

  it("is within one change for short words, a third of the length for longer ones", () => {
    expect(nearestName("x33", ["x12"])).toBeUndefined();
    expect(nearestName("abcdef", ["abcdxy"])).toBe("abcdxy");
    expect(nearestName("abcde", ["abcxy"])).toBeUndefined();
  });

  it("is not looked for when the word is very long", () => {
    const word = "a".repeat(41);
    expect(nearestName(word, [word])).toBeUndefined();
    expect(nearestName(word.slice(1), [word])).toBe(word);
  });
});
