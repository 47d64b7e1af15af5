import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { equal } from "../../src/polynomials/polynomial.js";
import { type Problem, readProblem } from "../../src/problems/problem.js";
import { problemDocument } from "../../src/problems/problem-document.js";
import { problemContents, toYaml } from "./problem-texts.js";

function problemOf(text: string, file?: string): Problem {
  const problem = readProblem(text, file);
  if (!problem.ok) throw new Error(`expected a problem, got ${problem.fault.message}`);
  return problem.value;
}

function again(problem: Problem): Problem {
  return problemOf(JSON.stringify(problemDocument(problem)));
}

/* Same ring, same generators one by one, same order, same words. */
function expectSame(problem: Problem, other: Problem): void {
  expect(other.title).toBe(problem.title);
  expect(other.note).toBe(problem.note);
  expect(other.ideal.ring).toEqual(problem.ideal.ring);
  expect(other.ideal.permutation).toEqual(problem.ideal.permutation);
  expect(other.order.phrase).toBe(problem.order.phrase);
  expect(other.order.comparisons).toEqual(problem.order.comparisons);
  expect(other.order.decisive).toBe(problem.order.decisive);
  const before = problem.generators.polynomials();
  const after = other.generators.polynomials();
  expect(after).toHaveLength(before.length);
  expect(before.every((f, k) => equal(f, after[k] ?? f) && after[k] !== undefined)).toBe(true);
}

describe("problemDocument", () => {
  it("as JSON reads back to the same problem, for problems of every kind", () => {
    fc.assert(
      fc.property(problemContents, (content) => {
        const problem = problemOf(JSON.stringify(content));
        expectSame(problem, again(problem));
        expect(problemDocument(again(problem))).toEqual(problemDocument(problem));
      }),
      { numRuns: 300 },
    );
  });

  it("does not depend on whether the problem was written as YAML or JSON", () => {
    fc.assert(
      fc.property(problemContents, (content) => {
        expectSame(problemOf(JSON.stringify(content)), problemOf(toYaml(content, 0)));
      }),
    );
  });

  it("names members of families and their generating set", () => {
    const problem = problemOf("ideal: {family: 'schubert:2,1,4,3'}\ngenerators: cdg\n");
    expect(problemDocument(problem)).toEqual({
      ideal: { family: "schubert:2143" },
      generators: "cdg",
      order: "revlex from nw by rows",
    });
    expect(again(problem).generators.kind).toBe("cdg");
  });

  it("keeps a permutation that was put beside a family", () => {
    const problem = problemOf("ideal: {family: 'determinantal:3,3,1'}\npermutation: 132\n");
    expect(problemDocument(problem)).toMatchObject({ permutation: "132" });
    expectSame(problem, again(problem));
    const other = problemOf("ideal: {family: 'schubert:132'}\npermutation: 213\n");
    expect(problemDocument(other)).toMatchObject({ permutation: "213" });
    expectSame(other, again(other));
  });

  it("does not take a problem for a family because its title or path reads like one", () => {
    const body = "variables: {names: [x]}\nideal: {polynomials: [x^2]}\n";
    for (const problem of [
      problemOf(`title: schubert:21\n${body}`),
      problemOf(body, "schubert:21"),
    ]) {
      expect(problemDocument(problem)).toMatchObject({ ideal: { polynomials: ["x^2"] } });
      expectSame(problem, again(problem));
    }
  });

  it("writes rank conditions out as polynomials", () => {
    const problem = problemOf(
      "variables: {matrices: [{name: z, rows: 2, columns: 2}]}\nideal: {ranks: {matrix: z, corner: se, bounds: [{rows: 2, columns: 2, rank: 1}]}}\n",
    );
    expect(problemDocument(problem)).toEqual({
      variables: { matrices: [{ name: "z", rows: 2, columns: 2 }] },
      ideal: { polynomials: ["z11*z22 - z12*z21"] },
      order: "revlex from nw by rows",
    });
  });
});
