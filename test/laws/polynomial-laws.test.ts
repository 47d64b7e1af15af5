/** Polynomials form a commutative ring, and evaluation is a homomorphism to the rationals. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  add,
  constant,
  divideByConstant,
  equal,
  multiply,
  negate,
  type Polynomial,
  polynomial,
  subtract,
  zero,
} from "../../src/polynomials/polynomial.js";
import { randomPolynomial } from "../support/arbitraries.js";
import { randomPoint, randomRational, valueAt } from "../support/rational-points.js";
import { ring } from "../support/reading.js";

describe.each([ring("x"), ring("x y z"), ring("a b c d e f g h")])(
  "polynomials in $variables",
  (r) => {
    const some = randomPolynomial(r, { terms: 5, degree: 3 });
    const one = constant(r, 1n);
    const same = (f: Polynomial, g: Polynomial): void => {
      expect(f).toEqual(g);
      expect(equal(f, g)).toBe(true);
    };

    it("add and multiply commutatively", () => {
      fc.assert(
        fc.property(some, some, (f, g) => {
          same(add(f, g), add(g, f));
          same(multiply(f, g), multiply(g, f));
        }),
      );
    });

    it("add and multiply associatively", () => {
      fc.assert(
        fc.property(some, some, some, (f, g, h) => {
          same(add(add(f, g), h), add(f, add(g, h)));
          same(multiply(multiply(f, g), h), multiply(f, multiply(g, h)));
        }),
      );
    });

    it("distribute", () => {
      fc.assert(
        fc.property(some, some, some, (f, g, h) => {
          same(multiply(f, add(g, h)), add(multiply(f, g), multiply(f, h)));
        }),
      );
    });

    it("have neutral and opposite elements", () => {
      fc.assert(
        fc.property(some, (f) => {
          same(add(f, zero(r)), f);
          same(multiply(f, one), f);
          same(multiply(f, zero(r)), zero(r));
          same(add(f, negate(f)), zero(r));
          same(subtract(f, f), zero(r));
          same(negate(negate(f)), f);
        }),
      );
    });

    it("have no divisors of zero", () => {
      fc.assert(
        fc.property(some, some, (f, g) => {
          fc.pre(f.monomials.length > 0 && g.monomials.length > 0);
          expect(multiply(f, g).monomials.length).toBeGreaterThan(0);
        }),
      );
    });

    it("evaluate as a homomorphism", () => {
      fc.assert(
        fc.property(some, some, randomPoint(r.variables.length), (f, g, point) => {
          const [a, b] = [valueAt(f, point), valueAt(g, point)];
          expect(valueAt(add(f, g), point).equals(a.add(b))).toBe(true);
          expect(valueAt(subtract(f, g), point).equals(a.sub(b))).toBe(true);
          expect(valueAt(multiply(f, g), point).equals(a.mul(b))).toBe(true);
          expect(valueAt(negate(f), point).equals(a.neg())).toBe(true);
        }),
      );
    });

    it("are divided by constants", () => {
      fc.assert(
        fc.property(some, randomRational, (f, c) => {
          fc.pre(!c.equals(0));
          const quotient = divideByConstant(f, c.s * c.n, c.d);
          same(multiply(quotient, constant(r, c)), f);
        }),
      );
    });

    it("do not depend on the order in which terms are given", () => {
      fc.assert(
        fc.property(some, fc.infiniteStream(fc.nat()), (f, keys) => {
          const terms = f.monomials.map((monomial, k) => ({
            monomial,
            numerator: f.numerators[k] as bigint,
            key: keys.next().value as number,
          }));
          same(
            polynomial(
              r,
              terms.sort((a, b) => a.key - b.key),
              f.denominator,
            ),
            f,
          );
        }),
      );
    });
  },
);
