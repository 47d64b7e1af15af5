/**
 * The reduced Gröbner basis modulo one prime: fast, and no proof of anything over the rationals, since the
 * prime may be unlucky.
 */
import { primeField } from "../arithmetic/prime-field.js";
import { type Budget, type Undecided, withinBudget } from "../outcomes/budget.js";
import { MonomialTable } from "../polynomials/monomial-table.js";
import { finestGradingLater } from "../polynomials/multigrading.js";
import { isZero, type Polynomial } from "../polynomials/polynomial.js";
import type { TermOrder } from "../polynomials/term-order.js";
import { type BasisInput, growBasis, reduceBasis } from "./f4.js";
import { modularArithmetic } from "./modular-elimination.js";
import { exactRow, type ModularRow, modularPolynomial, modularRow } from "./rows.js";

/** A reduced Gröbner basis modulo a prime. */
export interface ModularBasis {
  readonly kind: "modular-basis";
  readonly order: TermOrder;
  readonly prime: number;
  /** Monic modulo the prime, coefficients of least absolute value, smallest leading monomial first. */
  readonly elements: readonly Polynomial[];
  readonly evidence: "modular";
}

/**
 * The reduced basis of the ideal that the images of the generators modulo `prime` generate.
 * @returns `Undecided` when the budget is spent or an exponent overflows.
 * @throws RangeError unless `prime` is a prime below 2³¹ that divides no leading coefficient, once the
 * coefficients of each generator are coprime integers.
 */
export function modularBasis(
  generators: readonly Polynomial[],
  order: TermOrder,
  prime: number,
  budget: Budget,
): ModularBasis | Undecided {
  const field = primeField(prime);
  const nonZero = generators.filter((f) => !isZero(f));
  return withinBudget((): ModularBasis => {
    const table = new MonomialTable(order);
    const inputs = nonZero.map((f) => {
      const row = modularRow(field, exactRow(table, f));
      if (row === undefined) {
        throw new RangeError(`expected a prime that divides no leading coefficient, got ${prime}`);
      }
      return row;
    });
    const input: BasisInput<ModularRow> = {
      table,
      inputs,
      arithmetic: modularArithmetic(field),
      grading: finestGradingLater(nonZero),
      budget,
    };
    const rows = reduceBasis(input, growBasis(input).basis);
    const elements = rows.map((row) => modularPolynomial(order.ring, table, field, row));
    return { kind: "modular-basis", order, prime, elements, evidence: "modular" };
  });
}
