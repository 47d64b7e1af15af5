import { describe, expect, it } from "vitest";
import {
  cellName,
  ringOfMatrices,
  ringOfVariables,
  variableNamed,
} from "../../src/polynomials/polynomial-ring.js";

describe("rings of listed variables", () => {
  it("keep the variables in the order given, in no arrangement", () => {
    const ring = ringOfVariables(["x", "y_1", "Z9"]);
    expect(ring).toEqual({ variables: ["x", "y_1", "Z9"], matrices: [] });
    expect(variableNamed(ring, "y_1")).toBe(1);
    expect(variableNamed(ring, "y")).toBeUndefined();
  });

  it("keep a grading when there is one", () => {
    const grading = [
      [1, 0],
      [1, 1],
    ];
    expect(ringOfVariables(["x", "y"], grading).grading).toEqual(grading);
  });

  it("do not follow later changes of the list they were made from", () => {
    const names = ["x", "y"];
    const ring = ringOfVariables(names);
    names.push("z");
    expect(ring.variables).toEqual(["x", "y"]);
  });

  it.each(["", "1x", "x y", "_x", "x-y", "ä", "x\n"])("refuse %j as a name", (name) => {
    expect(() => ringOfVariables(["a", name])).toThrow(RangeError);
  });

  it("refuse a name that comes twice", () => {
    expect(() => ringOfVariables(["x", "y", "x"])).toThrow(
      "expected distinct variables, got x twice",
    );
  });
});

describe("rings of matrices", () => {
  it("number the cells matrix after matrix, row after row", () => {
    const ring = ringOfMatrices([
      { name: "x", rows: 2, columns: 3 },
      { name: "y", rows: 1, columns: 2 },
    ]);
    const names = ["x11", "x12", "x13", "x21", "x22", "x23", "y11", "y12"];
    expect(ring.variables).toEqual(names);
    expect(ring.matrices.map((m) => m.cells)).toEqual([
      [
        [0, 1, 2],
        [3, 4, 5],
      ],
      [[6, 7]],
    ]);
    expect(ring.pair).toBeUndefined();
  });

  it("write indices without a separator as long as all of them are at most 9", () => {
    expect(cellName({ name: "z", rows: 9, columns: 9 }, 1, 2)).toBe("z12");
    expect(cellName({ name: "z", rows: 9, columns: 10 }, 1, 2)).toBe("z1_2");
    expect(cellName({ name: "z", rows: 12, columns: 3 }, 12, 2)).toBe("z12_2");
  });

  it("pair two matrices of transposed shapes", () => {
    const x = { name: "x", rows: 2, columns: 3 };
    const y = { name: "y", rows: 3, columns: 2 };
    const { pair, matrices } = ringOfMatrices([x, y], { x: "y", y: "x" });
    expect(pair?.x).toBe(matrices[1]);
    expect(pair?.y).toBe(matrices[0]);
  });

  it("refuse pairs that are not of transposed shapes, or one matrix with itself, or unknown ones", () => {
    const x = { name: "x", rows: 2, columns: 3 };
    const y = { name: "y", rows: 2, columns: 3 };
    const square = { name: "s", rows: 2, columns: 2 };
    const tall = { name: "t", rows: 3, columns: 3 };
    expect(() => ringOfMatrices([x, y], { x: "x", y: "y" })).toThrow("of transposed shapes");
    expect(() => ringOfMatrices([x, tall], { x: "x", y: "t" })).toThrow("of transposed shapes");
    expect(() => ringOfMatrices([square], { x: "s", y: "s" })).toThrow("of transposed shapes");
    expect(() => ringOfMatrices([x], { x: "x", y: "w" })).toThrow("expected a matrix named w");
  });

  it("refuse empty matrices and clashing names", () => {
    expect(() => ringOfMatrices([{ name: "x", rows: 0, columns: 2 }])).toThrow(RangeError);
    expect(() => ringOfMatrices([{ name: "x", rows: 2, columns: 0 }])).toThrow(RangeError);
    const one = { name: "x", rows: 1, columns: 1 };
    expect(() => ringOfMatrices([one, one])).toThrow("got x11 twice");
    expect(() => ringOfMatrices([{ ...one, name: "1" }])).toThrow("expected a variable name");
  });
});
