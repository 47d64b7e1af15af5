import { describe, expect, it } from "vitest";
import { primeField } from "../../src/arithmetic/prime-field.js";
import { determinantalIdeal } from "../../src/families/determinantal.js";
import { exactArithmetic } from "../../src/groebner/exact-elimination.js";
import { growBasis, reduceBasis } from "../../src/groebner/f4.js";
import { modularArithmetic } from "../../src/groebner/modular-elimination.js";
import type { RowArithmetic } from "../../src/groebner/row-arithmetic.js";
import {
  type ExactRow,
  exactRow,
  type ModularRow,
  modularRow,
  type Support,
} from "../../src/groebner/rows.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { finestGradingLater, type Multigrading } from "../../src/polynomials/multigrading.js";
import { orderOf } from "../support/reading.js";

const ideal = determinantalIdeal(4, 5, 2);
const generators = ideal.generatingSets[0].polynomials();
const table = new MonomialTable(orderOf(ideal.ring, "revlex from ne by columns"));
const exact = generators.map((f) => exactRow(table, f));
const whole = () => ({ weights: [] });

function basis<R extends Support>(
  inputs: R[],
  arithmetic: RowArithmetic<R>,
  grading: () => Multigrading,
): R[] {
  const input = { table, inputs, arithmetic, grading, budget: unlimited() };
  return reduceBasis(input, growBasis(input).basis);
}

describe("matrices split by multidegree", () => {
  it("give the same basis as whole ones, modulo a prime", () => {
    const field = primeField(32003);
    const inputs = exact
      .map((row) => modularRow(field, row))
      .filter((row): row is ModularRow => row !== undefined);
    const split = basis(inputs, modularArithmetic(field), finestGradingLater(generators));
    expect(split).toEqual(basis(inputs, modularArithmetic(field), whole));
    expect(split).toHaveLength(40);
  });

  it("give the same basis as whole ones, over the integers", () => {
    const split: ExactRow[] = basis(exact, exactArithmetic(), finestGradingLater(generators));
    expect(split).toEqual(basis(exact, exactArithmetic(), whole));
  });
});
