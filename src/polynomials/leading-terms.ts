/** Leading terms and leading forms of polynomials in an order. */
import { type Exponents, totalDegree } from "./exponents.js";
import { type Polynomial, polynomial, type Term } from "./polynomial.js";
import { compileComparison, compileDecisiveComparison, type TermOrder } from "./term-order.js";

/** Compares two monomials in an order, total degree first if the order says so. */
export function monomialComparer(order: TermOrder): (a: Exponents, b: Exponents) => number {
  return withDegree(order, compileComparison(order));
}

/** The terms of a polynomial, largest first. */
export function sortedTerms(f: Polynomial, order: TermOrder): Term[] {
  const compare = monomialComparer(order);
  return f.monomials
    .map((monomial, k) => ({ monomial, numerator: f.numerators[k] as bigint }))
    .sort((a, b) => compare(b.monomial, a.monomial));
}

/**
 * The leading form: the terms that are largest by the decisive comparisons; one term for a total order.
 * @param stage how many of the decisive comparisons to use; all by default.
 */
export function leadingForm(f: Polynomial, order: TermOrder, stage = order.decisive): Polynomial {
  const compare = withDegree(order, compileDecisiveComparison({ ...order, decisive: stage }));
  let largest: number[] = [];
  f.monomials.forEach((monomial, k) => {
    const [best] = largest;
    const difference = best === undefined ? 1 : compare(monomial, f.monomials[best] as Exponents);
    if (difference > 0) largest = [k];
    else if (difference === 0) largest.push(k);
  });
  const terms = largest.map((k) => ({
    monomial: f.monomials[k] as Exponents,
    numerator: f.numerators[k] as bigint,
  }));
  return polynomial(f.ring, terms, f.denominator);
}

/** The leading monomial of a non-zero polynomial. @throws RangeError for 0. */
export function leadingMonomialOf(f: Polynomial, order: TermOrder): Exponents {
  const [first] = sortedTerms(f, order);
  if (first === undefined) throw new RangeError("expected a non-zero polynomial, got 0");
  return first.monomial;
}

function withDegree(
  order: TermOrder,
  compareInArena: (exponents: Uint16Array, a: number, b: number) => number,
): (a: Exponents, b: Exponents) => number {
  const arena = new Uint16Array(2 * order.ring.variables.length);
  return (a, b) => {
    if (order.degreeFirst) {
      const byDegree = totalDegree(a) - totalDegree(b);
      if (byDegree !== 0) return byDegree;
    }
    arena.set(a);
    arena.set(b, a.length);
    return compareInArena(arena, 0, a.length);
  };
}
