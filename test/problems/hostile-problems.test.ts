import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readProblem } from "../../src/problems/problem.js";
import { hostileTexts } from "./problem-texts.js";

/** The reading of a text in words; a fault must point into the text. */
function outcome(text: string): string {
  const problem = readProblem(text);
  if (problem.ok) return "a problem";
  const { place, excerpt, message } = problem.fault;
  const lines = text.split("\n");
  expect(place?.line).toBeGreaterThanOrEqual(1);
  expect(place?.line).toBeLessThanOrEqual(lines.length);
  expect(place?.column).toBeGreaterThanOrEqual(1);
  expect(place?.column).toBeLessThanOrEqual((excerpt?.length ?? 0) + 2);
  return message;
}

describe("readProblem", () => {
  it("answers any text with a problem or a fault that has a place in it", () => {
    fc.assert(
      fc.property(hostileTexts, (text) => {
        expect(outcome(text)).toMatch(/\S/);
      }),
      { numRuns: 2000 },
    );
  });

  it.each([
    ["ten megabytes of garbage", "x y: [".repeat(1_700_000), "the file is too large"],
    ["one endless word", "x".repeat(3_999_999), "the problem is not right"],
    ["closing brackets only", "}".repeat(3_999_999), '"}" cannot stand here'],
    ["opening brackets only", "[".repeat(3_999_999), "nested too deeply"],
    ["dashes only", "- ".repeat(1_999_999), "nested too deeply"],
    ["ever deeper lists", ladder(2000), "nested too deeply"],
    ["a list of a million words", "- x\n".repeat(999_999), "the file has too many parts"],
    ["a million anchors", "&a ".repeat(999_999), "the file has too many parts"],
    ["a million documents", "---\n".repeat(999_999), "a second document"],
    ["a million directives", "%a\n".repeat(999_999), "a directive"],
    ["many distinct keys", keys(40_000), "unknown key"],
    ["white space only", " \n".repeat(1_999_999), "the file is empty"],
  ])("ends at once for %s", (_, text, message) => {
    expect(outcome(text)).toContain(message);
  });

  it("does not unfold aliases that would grow to billions", () => {
    const levels = Array.from({ length: 12 }, (_, k) => {
      const items =
        k === 0
          ? "lol"
          : Array<string>(9)
              .fill(`*a${k - 1}`)
              .join(", ");
      return `a${k}: &a${k} [${items}]\n`;
    });
    expect(outcome(levels.join(""))).toContain("an anchor");
    expect(outcome("ideal: *missing\n")).toMatch(/alias/i);
  });

  it("bounds names, matrices, bounds and weights by number", () => {
    const names = Array.from({ length: 10_001 }, (_, i) => `x${i}`).join(", ");
    expect(outcome(`variables: {names: [${names}]}\nideal: {polynomials: []}`)).toBe(
      "10001 variables",
    );
    const matrices = Array.from({ length: 101 }, (_, i) => `{name: m${i}, rows: 100, columns: 1}`);
    expect(
      outcome(`variables: {matrices: [${matrices.join(",")}]}\nideal: {polynomials: []}`),
    ).toBe("10100 variables");
    const bounds = "{rows: 1, columns: 1, rank: 0}, ".repeat(10_001);
    expect(
      outcome(
        `variables: {matrices: [{name: z, rows: 1, columns: 1}]}\nideal: {ranks: {matrix: z, corner: nw, bounds: [${bounds}]}}`,
      ),
    ).toBe("ideal.ranks.bounds is not right");
    const weights = "{x: 1}, ".repeat(20_001);
    expect(
      outcome(
        `variables: {names: [x, y]}\nideal: {polynomials: []}\norder: {weights: [${weights}], next: graded lex}`,
      ),
    ).toBe("20001 weight vectors of 2 weights");
  });
});

function ladder(depth: number): string {
  return Array.from({ length: depth }, (_, k) => `${" ".repeat(k)}-\n`).join("");
}

function keys(count: number): string {
  return Array.from({ length: count }, (_, k) => `k${k}: v\n`).join("");
}
