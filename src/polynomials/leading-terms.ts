/**
 * Leading terms and leading forms of polynomials in an order, for the plain form of polynomials; the
 * engine keeps its rows sorted and does not need them.
 */
import { type Exponents, totalDegree } from "./exponents.js";
import { type Polynomial, polynomial, type Term } from "./polynomial.js";
import {
  type CompareInArena,
  compileComparison,
  compileDecisiveComparison,
  type TermOrder,
} from "./term-order.js";

/** Compares two monomials in an order: positive when the first is larger, total degree first if the order says so. */
export function monomialComparer(order: TermOrder): (a: Exponents, b: Exponents) => number {
  return withDegree(order, compileComparison(order));
}

/** The terms of a polynomial, largest first; coefficients over the polynomial's denominator. */
export function sortedTerms(f: Polynomial, order: TermOrder): Term[] {
  const compare = monomialComparer(order);
  return f.monomials
    .map((monomial, k) => ({ monomial, numerator: f.numerators[k] as bigint }))
    .sort((a, b) => compare(b.monomial, a.monomial));
}

/**
 * The leading form: the terms that are largest by the degree (if the order compares it) and the decisive
 * comparisons; one term for a total order, and 0 for 0.
 * @param stage how many of the decisive comparisons to use, all by default: `order.stages[k]` gives the
 * initial form after stage k+1, and 0 the part of the largest degree.
 * @throws RangeError unless 0 ≤ stage ≤ `order.decisive`.
 */
export function leadingForm(f: Polynomial, order: TermOrder, stage = order.decisive): Polynomial {
  if (!Number.isInteger(stage) || stage < 0 || stage > order.decisive) {
    throw new RangeError(`expected a stage from 0 to ${order.decisive}, got ${stage}`);
  }
  const compare = withDegree(order, compileDecisiveComparison({ ...order, decisive: stage }));
  let largest: Term[] = [];
  for (const [k, monomial] of f.monomials.entries()) {
    const [best] = largest;
    const difference = best === undefined ? 1 : compare(monomial, best.monomial);
    if (difference > 0) largest = [];
    if (difference >= 0) largest.push({ monomial, numerator: f.numerators[k] as bigint });
  }
  return polynomial(f.ring, largest, f.denominator);
}

/**
 * The leading term of a non-zero polynomial, its coefficient over the polynomial's denominator.
 * @throws RangeError for 0.
 */
export function leadingTermOf(f: Polynomial, order: TermOrder): Term {
  const compare = monomialComparer(order);
  let leading: Term | undefined;
  for (const [k, monomial] of f.monomials.entries()) {
    if (leading === undefined || compare(monomial, leading.monomial) > 0) {
      leading = { monomial, numerator: f.numerators[k] as bigint };
    }
  }
  if (leading === undefined) throw new RangeError("expected a non-zero polynomial, got 0");
  return leading;
}

/** The leading monomial of a non-zero polynomial. @throws RangeError for 0. */
export function leadingMonomialOf(f: Polynomial, order: TermOrder): Exponents {
  return leadingTermOf(f, order).monomial;
}

function withDegree(
  order: TermOrder,
  compareInArena: CompareInArena,
): (a: Exponents, b: Exponents) => number {
  const count = order.ring.variables.length;
  const arena = new Uint16Array(2 * count);
  return (a, b) => {
    if (order.degreeFirst) {
      const byDegree = totalDegree(a) - totalDegree(b);
      if (byDegree !== 0) return byDegree;
    }
    arena.set(a);
    arena.set(b, count);
    return compareInArena(arena, 0, count);
  };
}
