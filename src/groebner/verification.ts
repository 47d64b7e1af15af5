/**
 * Is a given set a Gröbner basis of the ideal it generates? Decided over the rationals by exact
 * reduction of S-pairs; a failure comes with its witness.
 */

import { type Budget, type Undecided, withinBudget } from "../outcomes/budget.js";
import type { Exponents } from "../polynomials/exponents.js";
import { type MonomialIdeal, monomialIdeal } from "../polynomials/monomial-ideal.js";
import { MonomialTable } from "../polynomials/monomial-table.js";
import { finestGradingLater } from "../polynomials/multigrading.js";
import { isZero, type Polynomial } from "../polynomials/polynomial.js";
import type { TermOrder } from "../polynomials/term-order.js";
import type { KnownBasis } from "./guided-basis.js";
import { exactRow, leadingMonomial, monicPolynomial } from "./rows.js";
import { checkPairs } from "./s-pair-check.js";

/** Why a set is not a Gröbner basis. */
export interface VerificationWitness {
  /** Indices into the generators given, from 0. */
  readonly pair: readonly [number, number];
  /** The monic normal form of their S-polynomial: an element of the ideal, not 0. */
  readonly remainder: Polynomial;
  /** Its leading monomial, which no leading monomial of a generator divides. */
  readonly leadingMonomial: Exponents;
}

interface VerificationFacts {
  readonly kind: "verification";
  readonly evidence: "proved";
  /** How many S-polynomials were reduced; the criteria made the others superfluous. */
  readonly pairsReduced: number;
  /** The ideal of the generators' leading monomials. */
  readonly leadingIdeal: MonomialIdeal;
  /** The non-zero generators as rows: a known basis when they are one. */
  readonly generators: KnownBasis;
}

/** The decision, exact over the rationals. */
export type Verification =
  | (VerificationFacts & { readonly verdict: "holds" })
  | (VerificationFacts & { readonly verdict: "fails"; readonly witness: VerificationWitness });

/**
 * Decides whether the generators are a Gröbner basis of the ideal they generate, in the order.
 * Zero polynomials are passed over. @returns `Undecided` when the budget is spent.
 */
export function verifyGenerators(
  generators: readonly Polynomial[],
  order: TermOrder,
  budget: Budget,
): Verification | Undecided {
  return withinBudget((): Verification => {
    const table = new MonomialTable(order);
    const indices = generators.flatMap((f, k) => (isZero(f) ? [] : [k]));
    const rows = indices.map((k) => exactRow(table, generators[k] as Polynomial));
    const { failing, pairs } = checkPairs(
      table,
      rows,
      finestGradingLater(indices.map((k) => generators[k] as Polynomial)),
      budget,
    );
    const leads = rows.map((row) => table.exponents(leadingMonomial(row)));
    const facts: VerificationFacts = {
      kind: "verification",
      evidence: "proved",
      pairsReduced: pairs,
      leadingIdeal: monomialIdeal(table.variableCount, leads),
      generators: { table, rows },
    };
    if (failing === undefined) return { ...facts, verdict: "holds" };
    const { first, second, remainder } = failing;
    const pair = [indices[first], indices[second]].sort((a, b) => (a as number) - (b as number));
    return {
      ...facts,
      verdict: "fails",
      witness: {
        pair: pair as [number, number],
        remainder: monicPolynomial(order.ring, table, remainder),
        leadingMonomial: table.exponents(leadingMonomial(remainder)),
      },
    };
  });
}
