/**
 * The slow definitions: S-polynomials, normal forms and Buchberger's algorithm straight from the textbook
 * (Cox, Little, O'Shea, *Ideals, Varieties, and Algorithms*, chapter 2, sections 3, 6, 7), over the
 * polynomials of the seams, without criteria, tables or matrices. Independent of `src/groebner`.
 */
import { dividesExponents, type Exponents, lcmExponents } from "../../src/polynomials/exponents.js";
import { leadingMonomialOf } from "../../src/polynomials/leading-terms.js";
import {
  add,
  divideByConstant,
  isZero,
  multiply,
  negate,
  type Polynomial,
  polynomial,
  subtract,
} from "../../src/polynomials/polynomial.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";

/** The leading coefficient as numerator over the polynomial's denominator. */
function leadingNumerator(f: Polynomial, order: TermOrder): bigint {
  const lead = leadingMonomialOf(f, order).join();
  return f.numerators[f.monomials.findIndex((m) => m.join() === lead)] as bigint;
}

/** f divided by its leading coefficient. */
export function monic(f: Polynomial, order: TermOrder): Polynomial {
  return divideByConstant(f, leadingNumerator(f, order), f.denominator);
}

function times(f: Polynomial, monomial: Exponents): Polynomial {
  return multiply(f, polynomial(f.ring, [{ monomial, numerator: 1n }]));
}

function quotient(a: Exponents, b: Exponents): Exponents {
  return a.map((e, v) => e - (b[v] as number));
}

/** The S-polynomial of f and g, both made monic. */
export function sPolynomial(f: Polynomial, g: Polynomial, order: TermOrder): Polynomial {
  const [lf, lg] = [leadingMonomialOf(f, order), leadingMonomialOf(g, order)];
  const lcm = lcmExponents(lf, lg);
  return subtract(
    times(monic(f, order), quotient(lcm, lf)),
    times(monic(g, order), quotient(lcm, lg)),
  );
}

/** The remainder of the division of f by the set: no term of it is divisible by a leading monomial. */
export function normalForm(
  f: Polynomial,
  set: readonly Polynomial[],
  order: TermOrder,
): Polynomial {
  const divisors = set.filter((g) => !isZero(g)).map((g) => monic(g, order));
  const leads = divisors.map((g) => leadingMonomialOf(g, order));
  let rest = f;
  let remainder = subtract(f, f);
  while (!isZero(rest)) {
    const lead = leadingMonomialOf(rest, order);
    const numerator = leadingNumerator(rest, order);
    const term = divideByConstant(
      polynomial(f.ring, [{ monomial: lead, numerator }]),
      rest.denominator,
    );
    const k = leads.findIndex((l) => dividesExponents(l, lead));
    if (k === -1) {
      remainder = add(remainder, term);
      rest = subtract(rest, term);
    } else {
      const factor = divideByConstant(
        polynomial(f.ring, [{ monomial: quotient(lead, leads[k] as Exponents), numerator }]),
        rest.denominator,
      );
      rest = subtract(rest, multiply(divisors[k] as Polynomial, factor));
    }
  }
  return remainder;
}

/** Buchberger's criterion by definition: do all S-polynomials reduce to 0? */
export function isGroebnerBasis(set: readonly Polynomial[], order: TermOrder): boolean {
  const nonZero = set.filter((g) => !isZero(g));
  return nonZero.every((f, i) =>
    nonZero.slice(0, i).every((g) => isZero(normalForm(sPolynomial(f, g, order), nonZero, order))),
  );
}

/** The reduced Gröbner basis by Buchberger's algorithm. */
export function reducedBasis(generators: readonly Polynomial[], order: TermOrder): Polynomial[] {
  const basis = generators.filter((g) => !isZero(g));
  for (let i = 0; i < basis.length; i++) {
    for (let j = 0; j < i; j++) {
      const s = sPolynomial(basis[i] as Polynomial, basis[j] as Polynomial, order);
      const rest = normalForm(s, basis, order);
      if (!isZero(rest)) basis.push(rest);
    }
  }
  const leads = basis.map((g) => leadingMonomialOf(g, order));
  const minimal = basis.filter(
    (_, i) =>
      !leads.some(
        (l, j) =>
          j !== i &&
          dividesExponents(l, leads[i] as Exponents) &&
          (j < i || l.join() !== (leads[i] as Exponents).join()),
      ),
  );
  return minimal.map((g) => {
    const monicOne = monic(g, order);
    const lead = polynomial(g.ring, [{ monomial: leadingMonomialOf(g, order), numerator: 1n }]);
    return add(lead, normalForm(add(monicOne, negate(lead)), minimal, order));
  });
}

/** Is the set a reduced Gröbner basis of the ideal of the generators? Checked from the definitions. */
export function isReducedBasisOf(
  set: readonly Polynomial[],
  generators: readonly Polynomial[],
  order: TermOrder,
): boolean {
  const ideal = reducedBasis(generators, order);
  return (
    isGroebnerBasis(set, order) &&
    generators.every((f) => isZero(normalForm(f, set, order))) &&
    set.every((g) => isZero(normalForm(g, ideal, order))) &&
    set.every((g, k) => {
      const others = set.filter((_, l) => l !== k);
      return (
        monic(g, order).denominator === g.denominator &&
        leadingNumerator(g, order) === g.denominator &&
        g.monomials.every(
          (m) => !others.some((o) => dividesExponents(leadingMonomialOf(o, order), m)),
        )
      );
    })
  );
}
