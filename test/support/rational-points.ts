/** Values of polynomials at rational points, with `fraction.js`. */
import fc from "fast-check";
import Fraction from "fraction.js";
import type { Polynomial } from "../../src/polynomials/polynomial.js";

/** A random small rational number. */
export const randomRational: fc.Arbitrary<Fraction> = fc
  .tuple(fc.integer({ min: -9, max: 9 }), fc.integer({ min: 1, max: 7 }))
  .map(([n, d]) => new Fraction(n, d));

/** A random point with rational coordinates. */
export function randomPoint(dimension: number): fc.Arbitrary<Fraction[]> {
  return fc.array(randomRational, { minLength: dimension, maxLength: dimension });
}

/** The value of a polynomial at a point, term by term. */
export function valueAt(f: Polynomial, point: readonly Fraction[]): Fraction {
  return f.monomials.reduce((sum, monomial, k) => {
    const numerator = new Fraction(f.numerators[k] as bigint, f.denominator);
    const product = monomial.reduce(
      (value, e, v) => value.mul((point[v] as Fraction).pow(e) ?? Number.NaN),
      numerator,
    );
    return sum.add(product);
  }, new Fraction(0));
}
