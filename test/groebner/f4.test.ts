import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { primeField } from "../../src/arithmetic/prime-field.js";
import { exactArithmetic } from "../../src/groebner/exact-elimination.js";
import { growBasis, reduceBasis, replayTrace } from "../../src/groebner/f4.js";
import { modularArithmetic } from "../../src/groebner/modular-elimination.js";
import {
  exactRow,
  leadingMonomial,
  type ModularRow,
  modularPolynomial,
  modularRow,
  monicPolynomial,
  rowPolynomial,
} from "../../src/groebner/rows.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { type MonomialId, MonomialTable } from "../../src/polynomials/monomial-table.js";
import { isZero, type Polynomial } from "../../src/polynomials/polynomial.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";
import { randomIdeal } from "../support/arbitraries.js";
import { reducedBasis } from "../support/buchberger.js";
import { textbookModulo } from "../support/modular-buchberger.js";
import { orderOf, polynomials, ring, termSets } from "../support/reading.js";
import { cyclic } from "../support/systems.js";

interface Run {
  readonly table: MonomialTable;
  readonly inputs: ModularRow[];
  readonly leads: number[];
  readonly texts: string[];
}

/** One block, no limits. */
const whole = { grading: () => ({ weights: [] }), budget: unlimited() };

function images(table: MonomialTable, generators: readonly Polynomial[], p: number): ModularRow[] {
  const field = primeField(p);
  return generators
    .filter((f) => !isZero(f))
    .flatMap((f) => modularRow(field, exactRow(table, f)) ?? []);
}

function fullRun(
  generators: readonly Polynomial[],
  order: TermOrder,
  p: number,
): Run & { trace: object } {
  const table = new MonomialTable(order);
  const inputs = images(table, generators, p);
  const arithmetic = modularArithmetic(primeField(p));
  const { basis, trace } = growBasis({ table, inputs, arithmetic, ...whole });
  const rows = reduceBasis({ table, inputs, arithmetic, ...whole }, basis);
  return {
    table,
    inputs,
    trace,
    leads: rows.map(leadingMonomial),
    texts: modularTexts(table, order, p, rows),
  };
}

function modularTexts(
  table: MonomialTable,
  order: TermOrder,
  p: number,
  rows: ModularRow[],
): string[] {
  return termSets(rows.map((row) => modularPolynomial(order.ring, table, primeField(p), row)));
}

/** Rows as the textbook computation prints its own. */
function residueSets(table: MonomialTable, rows: readonly ModularRow[]): string[] {
  const printed = rows.map((row) =>
    Array.from(row.coefficients, (c, k) => {
      const exponents = table.exponents(row.monomials[k] as MonomialId);
      return `${exponents.join()}:${c}`;
    })
      .sort()
      .join(" "),
  );
  return printed.sort();
}

describe("the F4 loop", () => {
  const r = ring("x y z");
  const order = orderOf(r, "graded revlex");

  it("over the integers gives the reduced basis of the textbook", () => {
    fc.assert(
      fc.property(randomIdeal(r, { terms: 3, degree: 2, generators: 3 }), (generators) => {
        const table = new MonomialTable(order);
        const inputs = generators.filter((f) => !isZero(f)).map((f) => exactRow(table, f));
        const arithmetic = exactArithmetic();
        const { basis } = growBasis({ table, inputs, arithmetic, ...whole });
        const rows = reduceBasis({ table, inputs, arithmetic, ...whole }, basis);
        const found = rows.map((row) => monicPolynomial(r, table, row));
        expect(termSets(found)).toEqual(termSets(reducedBasis(generators, order)));
      }),
      { numRuns: 80 },
    );
  });

  it.each([101, 32003, 67108859, 2147483647])(
    "modulo %i gives the image of the rational basis when the prime is lucky",
    (p) => {
      // Bases with small coefficients: none of these primes divides anything that matters.
      const generators = polynomials(r, ["x^2 - 3*y*z", "x*y - 2*z^2", "y^3 - x*z^2"]);
      const exact = reducedBasis(generators, order);
      const table = new MonomialTable(order);
      const wanted = images(table, exact, p);
      expect(fullRun(generators, order, p).texts).toEqual(modularTexts(table, order, p, wanted));
    },
  );

  it.each([2, 3, 5, 7, 101, 32003])(
    "modulo %i gives the reduced basis of the textbook modulo that prime, lucky or not",
    (p) => {
      const field = primeField(p);
      const phrases = [
        "graded revlex",
        "graded lex",
        "plain lex",
        "weights (3,1,2) then graded lex",
      ];
      let compared = 0;
      fc.assert(
        fc.property(
          randomIdeal(r, { terms: 3, degree: 2, generators: 3 }),
          fc.constantFrom(...phrases),
          (generators, phrase) => {
            const wanted = orderOf(r, phrase);
            const table = new MonomialTable(wanted);
            const rows = generators.filter((f) => !isZero(f)).map((f) => exactRow(table, f));
            const modular = rows.map((row) => modularRow(field, row));
            if (modular.includes(undefined)) return;
            compared++;
            const inputs = modular.filter((row) => row !== undefined);
            const input = { table, inputs, arithmetic: modularArithmetic(field), ...whole };
            const { basis, trace } = growBasis(input);
            const found = reduceBasis(input, basis);
            const textbook = textbookModulo(BigInt(p), wanted);
            const images = rows.map((row) => textbook.image(rowPolynomial(r, table, row)));
            expect(residueSets(table, found)).toEqual(textbook.reducedBasis(images));
            // The run can be repeated from its trace.
            const replayed = replayTrace(input, trace);
            if (replayed === undefined) throw new Error("expected the replay to succeed");
            expect(reduceBasis(input, replayed)).toEqual(found);
          },
        ),
        { numRuns: 60 },
      );
      expect(compared).toBeGreaterThan(15);
    },
  );

  it("replayed over the integers gives elements that generate the same ideal", () => {
    fc.assert(
      fc.property(randomIdeal(r, { terms: 3, degree: 2, generators: 3 }), (generators) => {
        const table = new MonomialTable(order);
        const inputs = generators.filter((f) => !isZero(f)).map((f) => exactRow(table, f));
        const p = 67108859;
        const { trace } = growBasis({
          table,
          inputs: images(table, generators, p),
          arithmetic: modularArithmetic(primeField(p)),
          ...whole,
        });
        const exact = { table, inputs, arithmetic: exactArithmetic(), ...whole };
        const replayed = replayTrace(exact, trace);
        if (replayed === undefined) throw new Error("expected the replay to succeed");
        const found = reduceBasis(exact, replayed).map((row) => monicPolynomial(r, table, row));
        expect(termSets(found)).toEqual(termSets(reducedBasis(generators, order)));
      }),
      { numRuns: 60 },
    );
  });

  it("replayed over another prime gives the same basis as a full run there", () => {
    const generators = cyclic(5);
    const graded = orderOf((generators[0] as Polynomial).ring, "graded revlex");
    const table = new MonomialTable(graded);
    const first = modularArithmetic(primeField(67108859));
    const { trace } = growBasis({
      table,
      inputs: images(table, generators, 67108859),
      arithmetic: first,
      ...whole,
    });
    const second = modularArithmetic(primeField(32003));
    const inputs = images(table, generators, 32003);
    const replayed = replayTrace({ table, inputs, arithmetic: second, ...whole }, trace);
    if (replayed === undefined) throw new Error("expected the replay to succeed");
    const rows = reduceBasis({ table, inputs, arithmetic: second, ...whole }, replayed);
    expect(rows).toHaveLength(20);
    expect(modularTexts(table, graded, 32003, rows)).toEqual(
      fullRun(generators, graded, 32003).texts,
    );
  });

  it("replayed where leading monomials differ gives nothing", () => {
    // Modulo 7 the first polynomial is y: another leading monomial.
    const generators = polynomials(r, ["7*x + y", "x*z + y^2"]);
    const table = new MonomialTable(order);
    const lucky = modularArithmetic(primeField(101));
    const { trace } = growBasis({
      table,
      inputs: images(table, generators, 101),
      arithmetic: lucky,
      ...whole,
    });
    const unlucky = polynomials(r, ["y", "x*z + y^2"]);
    const replayed = replayTrace(
      {
        table,
        inputs: images(table, unlucky, 7),
        arithmetic: modularArithmetic(primeField(7)),
        ...whole,
      },
      trace,
    );
    expect(replayed).toBeUndefined();
  });

  it("stops at a constant: the unit ideal has the basis 1", () => {
    const run = fullRun(polynomials(r, ["x*y - 1", "x", "y^2 + z"]), order, 101);
    expect(run.leads).toEqual([run.table.one]);
    expect(run.texts).toEqual(["0,0,0:1/1"]);
  });
});
