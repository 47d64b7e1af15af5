import { describe, expect, it } from "vitest";
import { gradedRevlex } from "../../src/polynomials/graded-revlex.js";
import {
  cellRulesOrder,
  cornerOrder,
  dualOrder,
  lineRulesOrder,
  listedLex,
  MAX_WEIGHT,
  type Rule,
  weightOrder,
} from "../../src/polynomials/orders.js";
import { ringOfMatrices, type VariableIndex } from "../../src/polynomials/polynomial-ring.js";
import {
  type ReadingPath,
  readAllLines,
  readLines,
  readVariables,
} from "../../src/polynomials/reading-path.js";
import { variableBelowOne } from "../../src/polynomials/term-order.js";
import { pairedRing, ringWithLooseVariables } from "../support/order-table.js";
import { orderOf, ring } from "../support/reading.js";

const NW: ReadingPath = { corner: "nw", lines: "rows" };
const matrix = (rows: number, columns: number): ReturnType<typeof ringOfMatrices> =>
  ringOfMatrices([{ name: "z", rows, columns }]);
const v = (...indices: number[]): VariableIndex[] => indices as VariableIndex[];

describe("readings of cells", () => {
  it("move away from the corner along the rows, as the phrase says", () => {
    const r = matrix(3, 3);
    const names = (path: ReadingPath): string[] =>
      readVariables(r, path).map((k) => r.variables[k] as string);
    expect(names(NW)).toEqual("z11 z12 z13 z21 z22 z23 z31 z32 z33".split(" "));
    expect(names({ corner: "se", lines: "rows" })).toEqual(
      "z33 z32 z31 z23 z22 z21 z13 z12 z11".split(" "),
    );
    expect(names({ corner: "ne", lines: "columns" })).toEqual(
      "z13 z23 z33 z12 z22 z32 z11 z21 z31".split(" "),
    );
    expect(names({ corner: "sw", lines: "rows" })).toEqual(
      "z31 z32 z33 z21 z22 z23 z11 z12 z13".split(" "),
    );
  });

  it("go line by line, matrix after matrix, and then to the other variables", () => {
    const two = ringOfMatrices([
      { name: "a", rows: 1, columns: 2 },
      { name: "b", rows: 2, columns: 1 },
    ]);
    expect(readAllLines(two, { corner: "se", lines: "rows" })).toEqual([[1, 0], [3], [2]]);
    const loose = ringWithLooseVariables();
    expect(readVariables(loose, { corner: "ne", lines: "rows" })).toEqual([2, 1, 0, 3]);
    const empty = { name: "e", rows: 0, columns: 0, cells: [] };
    expect(readLines(empty, { corner: "nw", lines: "columns" })).toEqual([]);
  });
});

describe("builders of orders", () => {
  it("build what the phrase that names the order reads as", () => {
    const r = pairedRing(2);
    const weights = [0, 1, -2, 3, 0, 0, 0, 5];
    const built = [
      cornerOrder(r, "revlex", { corner: "se", lines: "columns" }),
      cornerOrder(r, "lex", NW, false),
      lineRulesOrder(r, ["lex", "revlex", "revlex", "lex"], NW),
      cellRulesOrder(r, [
        { rule: "lex", variables: v(3, 1) },
        { rule: "revlex", variables: v(0, 2, 4, 5, 6, 7) },
      ]),
      cellRulesOrder(r, [{ rule: "lex", variables: v(3, 1, 0, 2, 4, 5, 6, 7) }], false),
      listedLex(r, true),
      listedLex(r, false),
      gradedRevlex(r),
      dualOrder(r, NW),
      dualOrder(r, NW, gradedRevlex(r)),
      weightOrder(r, [weights], gradedRevlex(r), "partial"),
      weightOrder(r, [weights, weights], dualOrder(r, NW), "total"),
    ];
    for (const order of built) expect(orderOf(r, order.phrase)).toEqual(order);
    expect(new Set(built.map(({ phrase }) => phrase)).size).toBe(built.length);
  });

  it("stage weight vectors one by one, and dual orders cell by cell", () => {
    const r = pairedRing(2);
    const weights = r.variables.map((_, k) => k);
    const twice = [weights, weights];
    expect(weightOrder(r, twice, gradedRevlex(r), "partial").stages).toEqual([1, 2]);
    expect(weightOrder(r, twice, gradedRevlex(r), "total").stages).toEqual([1, 2, 10]);
    expect(dualOrder(r, NW).stages).toEqual([1, 2, 3, 4]);
    const both = weightOrder(r, twice, dualOrder(r, NW), "total");
    expect(both).toMatchObject({ stages: [1, 2, 3, 4, 5, 6], decisive: 6 });
    expect(weightOrder(r, twice, dualOrder(r, NW), "partial")).toMatchObject({ decisive: 2 });
  });

  it("say when a refinement is the default one", () => {
    const r = pairedRing(2);
    const same = dualOrder(r, NW, cornerOrder(r, "lex", NW));
    expect(same).toEqual(dualOrder(r, NW));
    expect(same.phrase).toBe("dual from nw by rows");
  });

  it("apply one rule to all lines as they apply it to the ring", () => {
    const loose = ringWithLooseVariables();
    for (const rule of ["lex", "revlex"] satisfies Rule[]) {
      expect(lineRulesOrder(loose, [rule], NW)).toEqual(cornerOrder(loose, rule, NW));
    }
  });

  it("drop empty groups of cells from the phrase", () => {
    const r = ring("x y");
    const groups = [
      { rule: "revlex", variables: [] },
      { rule: "lex", variables: v(1, 0) },
    ] as const;
    expect(cellRulesOrder(r, groups).phrase).toBe("cells lex (y,x)");
  });

  it("refuse rings that the order does not fit", () => {
    const listed = ring("x y");
    const z = matrix(2, 2);
    expect(() => cornerOrder(listed, "lex", NW)).toThrow(
      "expected a ring with a matrix of variables, got none",
    );
    expect(() => lineRulesOrder(listed, ["lex"], NW)).toThrow("a ring with a matrix");
    expect(() => dualOrder(listed, NW)).toThrow("expected a ring with paired matrices");
    expect(() => dualOrder(z, NW)).toThrow("expected a ring with paired matrices");
    expect(() => weightOrder(z, [[1, 0, 0, 0]], gradedRevlex(listed), "total")).toThrow(
      "expected an order on the same ring",
    );
    expect(() => dualOrder(pairedRing(1), NW, gradedRevlex(z))).toThrow("on the same ring");
  });

  it("refuse a wrong number of rules, and cells that are missing or come twice", () => {
    const z = matrix(3, 2);
    expect(() => lineRulesOrder(z, ["lex", "lex"], NW)).toThrow("expected 3 rules, got 2");
    expect(() => lineRulesOrder(z, [], NW)).toThrow("expected 3 rules, got 0");
    const cells = [{ rule: "lex", variables: v(0, 1, 2, 3, 5) }] as const;
    expect(() => cellRulesOrder(z, cells)).toThrow("expected every variable, z31 too");
    const twice = [...cells, { rule: "revlex", variables: v(4, 0) }] as const;
    expect(() => cellRulesOrder(z, twice)).toThrow("expected every variable of the ring just once");
    const foreign = [...cells, { rule: "revlex", variables: v(4, 9) }] as const;
    expect(() => cellRulesOrder(z, foreign)).toThrow("just once");
  });

  it("refuse weights that are no integers, too large, or too many or few", () => {
    const r = ring("x y");
    const build =
      (...vectors: number[][]): (() => unknown) =>
      () =>
        weightOrder(r, vectors, gradedRevlex(r), "total");
    expect(build([1])).toThrow("expected 2 weights, got 1");
    expect(build([1, 2], [1, 2, 3])).toThrow("expected 2 weights, got 3");
    expect(build([1, 0.5])).toThrow("expected integer weights up to 2^24, got 0.5");
    expect(build([1, Number.NaN])).toThrow("got NaN");
    expect(build([0, MAX_WEIGHT + 1])).toThrow(RangeError);
    expect(build([-MAX_WEIGHT - 1, 0])).toThrow(RangeError);
    expect(build([MAX_WEIGHT, -MAX_WEIGHT])).not.toThrow();
    expect(build()).toThrow("expected at least one weight vector, got none");
  });

  it("refuse what puts a variable below 1, naming it", () => {
    const z = matrix(1, 2);
    expect(() => cornerOrder(z, "revlex", NW, false)).toThrow(
      'expected a term order, got "plain revlex from nw by rows", in which z11 is below 1',
    );
    const mixed = [
      { rule: "lex", variables: v(0) },
      { rule: "revlex", variables: v(1) },
    ] as const;
    expect(() => cellRulesOrder(z, mixed, false)).toThrow("in which z12 is below 1");
    expect(() => weightOrder(z, [[0, -1]], listedLex(z, false), "total")).toThrow("z12 is below 1");
    expect(weightOrder(z, [[0, -1]], listedLex(z, true), "total").degreeFirst).toBe(true);
  });
});

describe("a variable below 1", () => {
  it("is one whose first weight that is not 0 is negative, or that is never looked at", () => {
    const r = ring("x y z");
    const order = {
      ...listedLex(r, false),
      comparisons: [
        { variables: v(0, 1), weights: [1, 0] },
        { variables: v(1), weights: [-1] },
        { variables: v(1), weights: [1] },
      ],
    };
    expect(variableBelowOne(order)).toBe(1);
    const [first, , third] = order.comparisons;
    const unseen = { ...order, comparisons: [first, third].flatMap((c) => c ?? []) };
    expect(variableBelowOne(unseen)).toBe(2);
    expect(variableBelowOne({ ...order, degreeFirst: true })).toBeUndefined();
    expect(variableBelowOne(listedLex(r, false))).toBeUndefined();
  });
});
