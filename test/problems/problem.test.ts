import { describe, expect, it } from "vitest";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { generatingSet, type Problem, readProblem } from "../../src/problems/problem.js";

function problemOf(text: string, file?: string): Problem {
  const problem = readProblem(text, file);
  if (!problem.ok) throw new Error(`expected a problem, got ${problem.fault.message}`);
  return problem.value;
}

function printed({ generators }: Problem): string[] {
  return generators.polynomials().map((f) => printPolynomial(f));
}

describe("readProblem", () => {
  it("reads polynomials in listed variables, and orders them by graded revlex by default", () => {
    const problem = problemOf(
      `
title: A curve
note: |
  Two lines
  of words.
variables: {names: [x, y, z]}
ideal:
  polynomials:
    - y - x^2
    - 3/2*(x*z -
      y^2)
    - 0
`,
      "curve.yaml",
    );
    expect(problem.title).toBe("A curve");
    expect(problem.note).toBe("Two lines\nof words.\n");
    expect(problem.ideal.name).toBe("curve.yaml");
    expect(problem.ideal.ring.variables).toEqual(["x", "y", "z"]);
    expect(problem.generators.kind).toBe("given");
    expect(printed(problem)).toHaveLength(3);
    expect(printed(problem)[1]).toBe("3/2*x*z - 3/2*y^2");
    expect(problem.order.phrase).toBe("graded revlex");
    expect(problem.order.degreeFirst).toBe(true);
  });

  it("reads families, with their default order and generators unless others are asked for", () => {
    const plain = problemOf("ideal: {family: 'schubert:2143'}");
    expect(plain.ideal.name).toBe("schubert:2143");
    expect(plain.ideal.permutation).toEqual([2, 1, 4, 3]);
    expect(plain.generators.kind).toBe("fulton");
    expect(plain.order.phrase).toBe("revlex from nw by rows");
    const asked = problemOf(
      "ideal: {family: schubert:2143}\ngenerators: cdg\norder: lex from se by columns",
    );
    expect(asked.generators.kind).toBe("cdg");
    expect(asked.order.phrase).toBe("lex from se by columns");
  });

  it("reads rank bounds at any corner, with a permutation for the tilings", () => {
    const text = (corner: string) => `
variables: {matrices: [{name: z, rows: 3, columns: 3}]}
ideal:
  ranks:
    matrix: z
    corner: ${corner}
    bounds:
      - {rows: 1, columns: 1, rank: 0}
      - {rows: 2, columns: 2, rank: 1}
permutation: 213
`;
    expect(printed(problemOf(text("nw")))).toEqual(["z11", "z11*z22 - z12*z21"]);
    expect(printed(problemOf(text("se")))).toEqual(["z33", "z22*z33 - z23*z32"]);
    expect(printed(problemOf(text("ne")))).toEqual(["z13", "z12*z23 - z13*z22"]);
    expect(printed(problemOf(text("sw")))).toEqual(["z31", "z21*z32 - z22*z31"]);
    expect(problemOf(text("sw")).ideal.permutation).toEqual([2, 1, 3]);
    expect(problemOf(text("sw")).ideal.generatingSets.map((s) => s.kind)).toEqual([
      "fulton",
      "defining",
    ]);
  });

  it("takes as fulton generators those of the bounds that the others do not imply", () => {
    const problem = problemOf(`
variables: {matrices: [{name: z, rows: 2, columns: 2}]}
ideal: {ranks: {matrix: z, corner: nw, bounds: [{rows: 2, columns: 2, rank: 1}, {rows: 1, columns: 2, rank: 0}]}}
`);
    expect(printed(problem)).toEqual(["z11", "z12"]);
    const [, defining] = problem.ideal.generatingSets;
    expect(defining?.polynomials().map((f) => printPolynomial(f))).toEqual([
      "z11*z22 - z12*z21",
      "z11",
      "z12",
    ]);
  });

  it("reads several matrices, a pair and a grading", () => {
    const { ideal, order } = problemOf(`
variables:
  matrices: [{name: x, rows: 1, columns: 2}, {name: y, rows: 2, columns: 1}]
  pair: [x, y]
  degrees: {x11: [1, 0], x12: [1, -1], y11: [0, 1], y21: [0, +2]}
ideal:
  polynomials: [x11*y11 + x12*y21]
order: dual from nw by rows
`);
    expect(ideal.ring.variables).toEqual(["x11", "x12", "y11", "y21"]);
    expect(ideal.ring.pair?.x.name).toBe("x");
    expect(ideal.ring.pair?.y.name).toBe("y");
    expect(ideal.ring.grading).toEqual([
      [1, 0],
      [1, -1],
      [0, 1],
      [0, 2],
    ]);
    expect(order.decisive).toBe(2);
  });

  it("reads orders given by weights, total and partial", () => {
    const order = (text: string) =>
      problemOf(`variables: {names: [x, constructor]}\nideal: {polynomials: []}\norder: ${text}`)
        .order;
    expect(order("{weights: [[1, 2], {constructor: 3}], next: plain lex}").phrase).toBe(
      "weights (1,2) then weights (0,3) then plain lex",
    );
    expect(order("{weights: [{x: 1}], refinement: graded lex}").phrase).toBe(
      "weights (1,0) refined by graded lex",
    );
    expect(order("weights (0,1) then graded revlex").phrase).toBe(
      order("{weights: [[0, 1]], next: graded revlex}").phrase,
    );
    expect(order("plain lex").degreeFirst).toBe(false);
  });

  it("reads scalars as typed: words and numbers of YAML have no meaning of their own", () => {
    const problem = problemOf(
      "title: null\nnote: 1e3\nvariables: {names: [no, yes, null]}\nideal: {polynomials: [no - yes*null]}",
    );
    expect(problem.title).toBe("null");
    expect(problem.note).toBe("1e3");
    expect(problem.ideal.ring.variables).toEqual(["no", "yes", "null"]);
    expect(problem.ideal.name).toBe("null");
  });

  it("reads JSON, byte order marks, carriage returns, and the tags of text, lists and mappings", () => {
    for (const text of [
      '{"ideal": {"family": "schubert:132"}}',
      "\ufeffideal: {family: schubert:132}\n",
      "ideal:\r\n  family: schubert:132\r\n",
      "--- # a comment\n!!map\nideal: !!map {family: !!str schubert:132}\n...\n",
    ]) {
      expect(problemOf(text).ideal.name).toBe("schubert:132");
    }
  });

  it("accepts 128 variables and more, up to 10,000", () => {
    const large = problemOf(
      "variables: {matrices: [{name: z, rows: 100, columns: 100}]}\nideal: {polynomials: [z100_100]}",
    );
    expect(large.ideal.ring.variables).toHaveLength(10_000);
    expect(printed(large)).toEqual(["z100_100"]);
  });

  it("checks the grading only when there is one", () => {
    const polynomials = "ideal: {polynomials: [x^2 + y, 0]}";
    const graded = `variables: {names: [x, y], degrees: {x: [1], y: [2]}}\n${polynomials}`;
    expect(printed(problemOf(graded))).toHaveLength(2);
    expect(printed(problemOf(`variables: {names: [x, y]}\n${polynomials}`))).toHaveLength(2);
  });
});

describe("generatingSet", () => {
  it("is the first one by default, and otherwise the one named", () => {
    const { ideal } = problemOf("ideal: {family: schubert:2143}");
    const kind = (word?: string): string | undefined => {
      const set = generatingSet(ideal, word);
      return set.ok ? set.value.kind : set.fault.expected;
    };
    expect(kind()).toBe("fulton");
    expect(kind("cdg")).toBe("cdg");
    expect(kind("other")).toBe("one of fulton, cdg, defining");
  });
});
