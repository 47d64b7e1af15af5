import { beforeAll, describe, expect, it } from "vitest";
import { primeField } from "../../src/arithmetic/prime-field.js";
import { determinantalIdeal } from "../../src/families/determinantal.js";
import { DivisorSearch } from "../../src/groebner/divisor-search.js";
import { exactArithmetic } from "../../src/groebner/exact-elimination.js";
import { growBasis, reduceBasis } from "../../src/groebner/f4.js";
import { MatrixReduction } from "../../src/groebner/matrix-reduction.js";
import { modularArithmetic } from "../../src/groebner/modular-elimination.js";
import type {
  EliminationMode,
  Remainder,
  RowArithmetic,
} from "../../src/groebner/row-arithmetic.js";
import {
  type ExactRow,
  exactRow,
  leadingMonomial,
  type ModularRow,
  modularRow,
  type Support,
} from "../../src/groebner/rows.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { type MonomialId, MonomialTable } from "../../src/polynomials/monomial-table.js";
import {
  finestGradingLater,
  type Multigrading,
  multidegreeKey,
} from "../../src/polynomials/multigrading.js";
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

describe("a large request", () => {
  // All products of the 3-minors of a 5×5 matrix with one variable: 2,500 rows, 15,000 terms, far more than
  // what is worth splitting. One minor is left out of the reducers, so that something remains.
  const large = determinantalIdeal(5, 5, 2);
  const minors = large.generatingSets[0].polynomials();
  const over = new MonomialTable(orderOf(large.ring, "lex from nw by rows"));
  const grading = finestGradingLater(minors);
  let elements: ExactRow[];
  let divisors: DivisorSearch;

  beforeAll(() => {
    elements = minors.map((f) => exactRow(over, f));
    divisors = new DivisorSearch(over);
    elements.slice(1).forEach((row, k) => {
      divisors.add(k + 1, leadingMonomial(row));
    });
  });

  function multiples() {
    return large.ring.variables.flatMap((_, v) => {
      const exponents = new Uint16Array(large.ring.variables.length);
      exponents[v] = 1;
      const multiplier = over.intern(exponents);
      return elements.map((__, element) => ({ element, multiplier }));
    });
  }

  function reduce(by: () => Multigrading, mode: EliminationMode): Remainder<ExactRow>[] {
    const matrices = new MatrixReduction(over, exactArithmetic(), by, unlimited());
    const left = matrices.reduce({ rows: multiples(), pivots: [] }, elements, divisors, mode);
    return left.sort((a, b) => a.source - b.source);
  }

  it.each(["echelon", "independent"] as const)(
    "is split along the grading, with the same remainders from the same rows: %s",
    (mode) => {
      let asked = 0;
      const counted = (): Multigrading => {
        asked++;
        return grading();
      };
      const split = reduce(counted, mode);
      expect(asked).toBeGreaterThan(2500);
      expect(split.length).toBeGreaterThan(0);
      expect(split).toEqual(reduce(whole, mode));
    },
  );

  it("with pivots that are asked for keeps each beside its rows", () => {
    const rows = multiples();
    // Every row is its own pivot: nothing remains, wherever the split puts it.
    const matrices = new MatrixReduction(over, exactArithmetic(), grading, unlimited());
    const pivots = [...new Map(rows.map((row) => [leadOf(row), row])).values()];
    const left = matrices.reduce({ rows: pivots, pivots }, elements, divisors, "independent");
    expect(pivots.length).toBeGreaterThan(1000);
    expect(left).toEqual([]);
  });

  it("gives remainders of the multidegree of their rows", () => {
    const rows = multiples();
    const keyOf = (id: MonomialId): string => multidegreeKey(grading(), over.exponents(id));
    const left = reduce(grading, "independent");
    for (const { row, source } of left) {
      const { element, multiplier } = rows[source] as (typeof rows)[number];
      const lead = over.product(multiplier, leadingMonomial(elements[element] as ExactRow));
      expect(keyOf(leadingMonomial(row))).toBe(keyOf(lead));
    }
  });

  function leadOf({ element, multiplier }: { element: number; multiplier: MonomialId }): number {
    return over.product(multiplier, leadingMonomial(elements[element] as ExactRow));
  }
});
