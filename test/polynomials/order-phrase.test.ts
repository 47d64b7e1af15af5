import { describe, expect, it } from "vitest";
import { readOrder } from "../../src/polynomials/order-phrase.js";
import { type PolynomialRing, ringOfMatrices } from "../../src/polynomials/polynomial-ring.js";
import { expectHelpful, refused } from "../support/faults.js";
import { orderTable, pairedRing, ringWithLooseVariables } from "../support/order-table.js";
import { orderOf, ring } from "../support/reading.js";

const RINGS: Record<string, () => PolynomialRing> = {
  listed: () => ring("x y z"),
  matrix: () => ringOfMatrices([{ name: "z", rows: 2, columns: 2 }]),
  paired: () => pairedRing(1),
};

const ringNamed = (name: string): PolynomialRing => RINGS[name]?.() ?? expect.fail();
const EXAMPLES =
  '"lex from nw by rows", "revlex from se by columns", "graded revlex" or "plain lex"';
const LISTED = '"graded revlex", "graded lex" or "plain lex"';

describe("phrases of orders", () => {
  it("read back to the order they name, whatever spaces they have", () => {
    for (const { ring: r, phrase } of orderTable()) {
      const order = orderOf(r, phrase);
      expect(order.phrase).toBe(phrase);
      expect(
        orderOf(r, `\n${phrase.replaceAll(" ", " \t ").replaceAll(/([(),])/g, " $1 ")} `),
      ).toEqual(order);
    }
  });

  it("may give the refinement of a dual order, after either word", () => {
    const r = pairedRing(2);
    const order = orderOf(r, "dual from nw by rows refined by lex from se by columns");
    expect(orderOf(r, "dual from nw by rows then lex from se by columns")).toEqual(order);
    expect(order.phrase).toBe("dual from nw by rows refined by lex from se by columns");
    expect(order.decisive).toBe(4);
    expect(orderOf(r, "dual from nw by rows then lex from nw by rows")).toEqual(
      orderOf(r, "dual from nw by rows"),
    );
  });

  it("may switch the degree off below positive weights, whatever comes next", () => {
    const r = ringOfMatrices([{ name: "z", rows: 1, columns: 2 }]);
    for (const end of ["plain revlex from ne by rows", "plain cells revlex (z12) lex (z11)"]) {
      const phrase = `weights (2,1) then ${end}`;
      expect(orderOf(r, phrase)).toMatchObject({ phrase, degreeFirst: false });
      expect(readOrder(end, r).ok).toBe(false);
      expect(readOrder(`weights (2,0) then ${end}`, r).ok).toBe(false);
    }
  });

  it("give variables outside matrices the last rule", () => {
    const r = ringWithLooseVariables();
    expect(orderOf(r, "lex,revlex from nw by columns").comparisons).toEqual([
      { variables: [1], weights: [1] },
      { variables: [2], weights: [-1] },
      { variables: [0], weights: [-1] },
      { variables: [3], weights: [-1] },
    ]);
  });
});

describe("faults of order phrases", () => {
  it.each([
    ["matrix", "", 1, "the order is empty", EXAMPLES],
    ["matrix", " \n", 1, "the order is empty", EXAMPLES],
    [
      "matrix",
      "lexx from nw by rows",
      1,
      'unknown rule "lexx"',
      `lex, perhaps; an order such as ${EXAMPLES}`,
    ],
    ["matrix", "degree", 1, 'unknown rule "degree"', `an order such as ${EXAMPLES}`],
    [
      "matrix",
      "graduated lex",
      1,
      'unknown rule "graduated"',
      `graded, perhaps; an order such as ${EXAMPLES}`,
    ],
    ["matrix", "from nw by rows", 1, 'unknown rule "from"', `an order such as ${EXAMPLES}`],
    ["matrix", "lex", 4, "the order ends too early", '"from" and a corner: nw, ne, sw or se'],
    [
      "matrix",
      "lex nw by rows",
      5,
      '"nw" cannot stand here',
      '"from" and a corner: nw, ne, sw or se',
    ],
    ["matrix", "lex from", 9, "the order ends too early", "a corner: nw, ne, sw or se"],
    ["matrix", "lex from north by rows", 10, 'unknown corner "north"', "one of nw, ne, sw, se"],
    ["matrix", "lex from NW by rows", 10, 'unknown corner "NW"', "one of nw, ne, sw, se"],
    ["matrix", "lex from nw", 12, "the order ends too early", '"by rows" or "by columns"'],
    ["matrix", "lex from nw rows", 13, '"rows" cannot stand here', '"by rows" or "by columns"'],
    ["matrix", "lex from nw by", 15, "the order ends too early", "rows or columns"],
    ["matrix", "lex from nw by lines", 16, 'unknown lines "lines"', "rows or columns"],
    [
      "matrix",
      "lex from nw by rows rows",
      21,
      '"rows" cannot follow "lex from nw by rows"',
      "nothing more",
    ],
    [
      "matrix",
      "graded lex from nw by rows",
      12,
      '"from" cannot follow "graded lex"',
      "nothing more",
    ],
    ["matrix", "graded", 7, "the order ends too early", '"graded lex" or "graded revlex"'],
    ["matrix", "graded dual", 8, '"dual" cannot stand here', '"graded lex" or "graded revlex"'],
    ["matrix", "plain", 6, "the order ends too early", `an order such as ${EXAMPLES}`],
    ["matrix", "plain graded lex", 7, '"graded" cannot stand here', `an order such as ${EXAMPLES}`],
    [
      "matrix",
      "plain dual from nw by rows",
      7,
      '"dual" cannot stand here',
      `an order such as ${EXAMPLES}`,
    ],
    [
      "matrix",
      "lex,revlex,lex from nw by rows",
      1,
      "there are 3 rules for 2 rows",
      "one rule for each, or one for all",
    ],
    [
      "matrix",
      "lex,revlex,lex from nw by columns",
      1,
      "there are 3 rules for 2 columns",
      "one rule for each, or one for all",
    ],
    ["matrix", "lex, from nw by rows", 6, 'unknown rule "from"', `an order such as ${EXAMPLES}`],
    [
      "matrix",
      "plain revlex from nw by rows",
      1,
      '"plain revlex from nw by rows" is not a term order: z11 is below 1',
      'positive weights first, or the degree first (without "plain")',
    ],
    [
      "matrix",
      "plain cells lex (z11,z12,z21) revlex (z22)",
      1,
      '"plain cells lex (z11,z12,z21) revlex (z22)" is not a term order: z22 is below 1',
      'positive weights first, or the degree first (without "plain")',
    ],
    ["matrix", "dual from nw by rows", 1, "there are no paired matrices to compare", EXAMPLES],
    ["listed", "dual from nw by rows", 1, "there are no paired matrices to compare", EXAMPLES],
    ["listed", "lex from nw by rows", 1, "there is no matrix to read from a corner", LISTED],
    ["listed", "revlex", 1, "there is no matrix to read from a corner", LISTED],
    ["listed", "plain revlex", 1, "there is no matrix to read from a corner", LISTED],
    ["paired", "dual", 5, "the order ends too early", '"from" and a corner: nw, ne, sw or se'],
    [
      "paired",
      "dual from nw by rows refined",
      29,
      "the order ends too early",
      '"refined by" and an order',
    ],
    [
      "paired",
      "dual from nw by rows refined by",
      32,
      "the order ends too early",
      `an order such as ${EXAMPLES}`,
    ],
    [
      "paired",
      "dual from nw by rows lex",
      22,
      '"lex" cannot follow "dual from nw by rows"',
      "nothing more",
    ],
    ["listed", "weights", 8, "the order ends too early", "weights in parentheses, such as (1,0,2)"],
    [
      "listed",
      "weights 1,2,3",
      9,
      '"1" cannot stand here',
      "weights in parentheses, such as (1,0,2)",
    ],
    ["listed", "weights (1,0", 13, "the order ends too early", "a , or a )"],
    ["listed", "weights (1,0,", 14, "the order ends too early", "a weight"],
    [
      "listed",
      "weights (1,0) then graded lex",
      13,
      "there are fewer weights than variables",
      "3 weights, one for each variable",
    ],
    [
      "listed",
      "weights (1,0,2,3) then graded lex",
      16,
      "there are more weights than variables",
      "3 weights, one for each variable",
    ],
    ["listed", "weights (1,x,2) then graded lex", 12, '"x" is not a weight', "a whole number"],
    ["listed", "weights (1,1.5,2) then graded lex", 12, '"1.5" is not a weight', "a whole number"],
    ["listed", "weights (1,,2) then graded lex", 12, '"," is not a weight', "a whole number"],
    [
      "listed",
      "weights (1,16777217,2) then graded lex",
      12,
      'the weight "16777217" is too large',
      "a whole number up to 16777216",
    ],
    [
      "listed",
      "weights (1,0,2)",
      16,
      "the order ends too early",
      '"then" or "refined by" and another order',
    ],
    [
      "listed",
      "weights (1,0,2) graded lex",
      17,
      '"graded" cannot stand here',
      '"then" or "refined by" and another order',
    ],
    [
      "listed",
      "weights (1,0,2) refined graded lex",
      25,
      '"graded" cannot stand here',
      '"refined by" and another order',
    ],
    [
      "listed",
      "weights (1,0,2) then",
      21,
      "the order ends too early",
      `an order such as ${EXAMPLES}`,
    ],
    [
      "listed",
      "weights (1,0,2) refined by weights (1,0,2) then plain lex",
      28,
      '"weights" cannot stand here',
      `an order such as ${EXAMPLES}`,
    ],
    [
      "listed",
      "weights (1,-1,2) then plain lex",
      1,
      '"weights (1,-1,2) then plain lex" is not a term order: y is below 1',
      'positive weights first, or the degree first (without "plain")',
    ],
    ["matrix", "cells", 6, "the order ends too early", `an order such as ${EXAMPLES}`],
    [
      "matrix",
      "cells lex z11",
      11,
      '"z11" cannot stand here',
      "variables in parentheses, such as (z11,z12)",
    ],
    ["matrix", "cells lex (z11,w)", 16, 'unknown variable "w"', "a variable of the ring"],
    ["matrix", "cells lex (z11,z31)", 16, 'unknown variable "z31"', "z11, perhaps"],
    ["matrix", "cells lex (z11) revlex (z11)", 25, "a second rule for z11", "every variable once"],
    [
      "matrix",
      "cells lex (z11,z12) revlex (z21)",
      33,
      "there is no rule for z22",
      "every variable once",
    ],
    ["matrix", "cells lex (z11 z12)", 16, '"z12" cannot stand here', "a , or a )"],
  ])("on a %s ring, in %j: column %i, %s", (ringName, phrase, column, message, expected) => {
    const fault = refused(readOrder(phrase, ringNamed(ringName)));
    expect(fault).toMatchObject({ message, expected, place: { line: 1, column } });
    expectHelpful(fault, phrase);
  });

  it("refuse several rules without the degree", () => {
    const fault = refused(readOrder("plain lex,lex from nw by rows", ringNamed("matrix")));
    expect(fault).toMatchObject({
      message: '"plain" goes with one rule only',
      expected: '"plain lex from nw by rows"',
      place: { line: 1, column: 1 },
    });
  });

  it("count lines", () => {
    const text = "lex\n  from\n  nv by rows";
    expect(refused(readOrder(text, ringNamed("matrix")))).toMatchObject({
      place: { line: 3, column: 3 },
      excerpt: "  nv by rows",
    });
  });

  it("refuse phrases of more than 100,000 characters", () => {
    const fault = refused(readOrder(`lex${" ".repeat(100_000)}`, ringNamed("matrix")));
    expect(fault.message).toBe("the order is too long");
  });
});
