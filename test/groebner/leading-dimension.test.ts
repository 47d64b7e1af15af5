import { describe, expect, it } from "vitest";
import { primeField } from "../../src/arithmetic/prime-field.js";
import { growBasis, type Trace } from "../../src/groebner/f4.js";
import {
  haveSameFiniteSize,
  isCompleteIntersection,
  type Staircase,
} from "../../src/groebner/leading-dimension.js";
import { modularArithmetic } from "../../src/groebner/modular-elimination.js";
import { proveBasis } from "../../src/groebner/proof.js";
import { rationalBasis } from "../../src/groebner/rational-basis.js";
import { type ExactRow, exactRow, type ModularRow, modularRow } from "../../src/groebner/rows.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { finestGradingLater } from "../../src/polynomials/multigrading.js";
import { add, constant, type Polynomial, variable } from "../../src/polynomials/polynomial.js";
import type { VariableIndex } from "../../src/polynomials/polynomial-ring.js";
import { orderOf, polynomials, ring } from "../support/reading.js";
import { cyclic, katsura } from "../support/systems.js";

const r = ring("x y z");

function staircase(texts: readonly string[]): Staircase {
  const table = new MonomialTable(orderOf(r, "graded revlex"));
  return { table, rows: polynomials(r, texts).map((f) => exactRow(table, f)) };
}

describe("dimensions of staircases", () => {
  it("tell complete intersections by as many generators as the codimension", () => {
    const cases: [string[], number, boolean][] = [
      [["x^2", "y^3", "z"], 3, true],
      [["x^2", "y^3"], 2, true],
      [["x^2", "y^3"], 3, false],
      [["x*y", "x*z"], 2, false],
      [["x*y", "x*z"], 1, true],
      [["1"], 2, true],
      [["x", "y", "z"], 4, false],
      [["1"], 4, false],
    ];
    for (const [texts, count, expected] of cases) {
      expect(isCompleteIntersection(staircase(texts), count, unlimited())).toBe(expected);
    }
  });

  it("compare sizes only when they are finite", () => {
    const same = (a: string[], b: string[]) =>
      haveSameFiniteSize(staircase(a), staircase(b), unlimited());
    expect(same(["x^2", "y^3", "z"], ["x", "y", "z^6"])).toBe(true);
    expect(same(["x^2", "y^3", "z"], ["x", "y", "z^5"])).toBe(false);
    expect(same(["x", "y"], ["x", "y"])).toBe(false);
    expect(same(["1"], ["1"])).toBe(true);
  });
});

/** Proves a candidate for the basis of inhomogeneous generators, membership by the trace of a run modulo a prime. */
function isProved(generators: readonly Polynomial[], candidate: readonly Polynomial[]): boolean {
  const order = orderOf((generators[0] as Polynomial).ring, "graded revlex");
  const table = new MonomialTable(order);
  const inputs = generators.map((f) => exactRow(table, f));
  const basis = candidate.map((f) => exactRow(table, f));
  const grading = finestGradingLater(generators);
  const claim = { table, inputs, basis, grading };
  const trace = traceOf(inputs, table, generators);
  return proveBasis({ ...claim, membership: { kind: "replay", trace } }, unlimited());
}

function traceOf(
  inputs: readonly ExactRow[],
  table: MonomialTable,
  generators: readonly Polynomial[],
): Trace {
  const field = primeField(67_108_859);
  const images = inputs.map((row) => modularRow(field, row) as ModularRow);
  const grading = finestGradingLater(generators);
  const arithmetic = modularArithmetic(field);
  return growBasis({ table, inputs: images, arithmetic, grading, budget: unlimited() }).trace;
}

describe("proofs that a staircase is the whole one", () => {
  const systems = [katsura(3), cyclic(4)];

  it("accept the true basis, of a complete intersection and of another ideal", () => {
    for (const system of systems) {
      const order = orderOf((system[0] as Polynomial).ring, "graded revlex");
      const basis = rationalBasis(system, order, unlimited());
      if (basis.kind === "undecided") throw new Error(basis.reason);
      expect(isProved(system, basis.elements)).toBe(true);
    }
  });

  it("refuse it with one coefficient off, also by a multiple of the prime of the run", () => {
    for (const system of systems) {
      const { ring: own } = system[0] as Polynomial;
      const basis = rationalBasis(system, orderOf(own, "graded revlex"), unlimited());
      if (basis.kind === "undecided") throw new Error(basis.reason);
      basis.elements.forEach((g, k) => {
        for (const change of [constant(own, 67_108_859n), variable(own, 0 as VariableIndex)]) {
          const wrong = add(g, change);
          const candidate = basis.elements.map((f, other) => (other === k ? wrong : f));
          expect(isProved(system, candidate)).toBe(false);
        }
      });
    }
  });
});
