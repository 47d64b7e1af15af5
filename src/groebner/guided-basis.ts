/**
 * From one order to another: the reduced basis of an ideal I of which a Gröbner basis in some other order is
 * known. The run is exact and Hilbert-driven, and needs no proof afterwards: everything it makes lies in
 * the ideal of the generators, which lies in I when the known basis reduces them to zero; and when the
 * leading monomials found have the Hilbert function of I, they are all of them:
 *   dim (found)_d ≤ dim (generators)_d ≤ dim I_d, with equality throughout, in every degree d.
 */
import { hilbertNumerator } from "../hilbert/hilbert-numerator.js";
import type { Budget } from "../outcomes/budget.js";
import { type MonomialIdeal, monomialIdeal } from "../polynomials/monomial-ideal.js";
import type { MonomialTable } from "../polynomials/monomial-table.js";
import { finestGradingLater, type Multigrading } from "../polynomials/multigrading.js";
import { isHomogeneous, isZero, type Polynomial } from "../polynomials/polynomial.js";
import { exactArithmetic } from "./exact-elimination.js";
import { growBasis, reduceBasis, withoutGrowth } from "./f4.js";
import { HilbertGuide } from "./hilbert-guide.js";
import { type ExactRow, exactRow, leadingMonomial } from "./rows.js";
import { reduceToZero } from "./s-pair-check.js";

/** A Gröbner basis that has been proved to be one. */
export interface KnownBasis {
  readonly table: MonomialTable;
  readonly rows: readonly ExactRow[];
}

/**
 * The reduced basis of the ideal of `generators` in the order of `table`; undefined when the known basis
 * does not help: it is another ideal's, or not homogeneous. @throws LimitReached
 */
export function guidedBasis(
  generators: readonly Polynomial[],
  table: MonomialTable,
  known: KnownBasis,
  budget: Budget,
): ExactRow[] | undefined {
  const nonZero = generators.filter((f) => !isZero(f));
  if (!nonZero.every(isHomogeneous)) return undefined;
  const grading = finestGradingLater(nonZero);
  if (!contains(known, nonZero, grading, budget)) return undefined;
  const inputs = nonZero.map((f) => exactRow(table, f));
  const target = leadingIdeal(known);
  const input = { table, inputs, arithmetic: exactArithmetic(), grading, budget };
  if (haveSameHilbertFunction(leadingIdeal({ table, rows: inputs }), target, budget)) {
    return reduceBasis(input, withoutGrowth(input));
  }
  const guide = new HilbertGuide(target, grading(), budget);
  const { basis } = growBasis({ ...input, guide });
  const found = Array.from(basis.minimal, (k) => basis.elements[k] as ExactRow);
  return haveSameHilbertFunction(leadingIdeal({ table, rows: found }), target, budget)
    ? reduceBasis(input, basis)
    : undefined;
}

function leadingIdeal({ table, rows }: KnownBasis): MonomialIdeal {
  const leads = rows.map((row) => table.exponents(leadingMonomial(row)));
  return monomialIdeal(table.variableCount, leads);
}

/** Does the known basis reduce the polynomials to zero? */
function contains(
  { table, rows }: KnownBasis,
  polynomials: readonly Polynomial[],
  grading: () => Multigrading,
  budget: Budget,
): boolean {
  const unknown = polynomials.map((f) => exactRow(table, f)).filter((f) => !isAmong(rows, f));
  return unknown.length === 0 || reduceToZero(table, unknown, rows, grading, budget);
}

function isAmong(rows: readonly ExactRow[], f: ExactRow): boolean {
  return rows.some(
    (row) =>
      row.monomials.length === f.monomials.length &&
      row.monomials.every((id, k) => id === f.monomials[k]) &&
      row.coefficients.every((c, k) => c === f.coefficients[k]),
  );
}

function haveSameHilbertFunction(a: MonomialIdeal, b: MonomialIdeal, budget: Budget): boolean {
  const ofA = hilbertNumerator(a, budget);
  const ofB = hilbertNumerator(b, budget);
  return ofA.length === ofB.length && ofA.every((c, k) => c === ofB[k]);
}
