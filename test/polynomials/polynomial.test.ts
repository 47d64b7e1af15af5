import fc from "fast-check";
import Fraction from "fraction.js";
import { describe, expect, it } from "vitest";
import { gcd } from "../../src/arithmetic/integers.js";
import { compareCanonically, ExponentOverflow } from "../../src/polynomials/exponents.js";
import {
  add,
  coefficient,
  constant,
  divideByConstant,
  equal,
  isHomogeneous,
  isZero,
  multiply,
  negate,
  type Polynomial,
  polynomial,
  setToZero,
  variable,
  zero,
} from "../../src/polynomials/polynomial.js";
import { type PolynomialRing, variableNamed } from "../../src/polynomials/polynomial-ring.js";
import { randomPolynomial } from "../support/arbitraries.js";
import { polynomials, ring } from "../support/reading.js";

const of = (...exponents: number[]): Uint16Array => Uint16Array.from(exponents);

function texts(r: PolynomialRing, ...list: string[]): Polynomial[] {
  return polynomials(r, list);
}

/* The normal form that the type promises. */
function expectNormal(f: Polynomial): void {
  expect(f.denominator > 0n).toBe(true);
  expect(f.numerators.every((n) => n !== 0n)).toBe(true);
  expect(f.numerators).toHaveLength(f.monomials.length);
  expect(f.numerators.reduce(gcd, f.denominator)).toBe(1n);
  f.monomials.slice(1).forEach((m, k) => {
    expect(compareCanonically(f.monomials[k] as Uint16Array, m)).toBeLessThan(0);
  });
}

describe("polynomials", () => {
  it("are in normal form, whatever is done to them", () => {
    const r = ring("x y");
    const some = randomPolynomial(r, { terms: 4, degree: 2 });
    fc.assert(
      fc.property(some, some, fc.integer({ min: 1, max: 9 }), (f, g, c) => {
        for (const h of [f, add(f, g), multiply(f, g), negate(f)]) expectNormal(h);
        expectNormal(divideByConstant(f, BigInt(-c), 6n));
        expectNormal(setToZero(f, new Set([1])));
      }),
    );
  });

  it("collect like terms, drop zero terms and cancel the common factor", () => {
    const r = ring("x y");
    const terms = [
      { monomial: of(0, 1), numerator: 4n },
      { monomial: of(2, 0), numerator: 3n },
      { monomial: of(0, 1), numerator: 2n },
      { monomial: of(1, 1), numerator: 5n },
      { monomial: of(1, 1), numerator: -5n },
      { monomial: of(2, 0), numerator: 0n },
    ];
    expect(polynomial(r, terms, -9n)).toEqual({
      ring: r,
      monomials: [of(2, 0), of(0, 1)],
      numerators: [-1n, -2n],
      denominator: 3n,
    });
    expect(polynomial(r, [], 7n)).toEqual(zero(r));
    expect(polynomial(r, terms.slice(3, 5), 7n)).toEqual(zero(r));
  });

  it("refuse a denominator 0", () => {
    const r = ring("x");
    expect(() => polynomial(r, [], 0n)).toThrow("expected a non-zero denominator, got 0");
    expect(() => divideByConstant(constant(r, 1n), 0n)).toThrow(RangeError);
  });

  it("hand out exact coefficients", () => {
    const r = ring("x y");
    const [f] = texts(r, "2/3*x - y/2 + 5") as [Polynomial];
    expect(f.denominator).toBe(6n);
    const coefficients = f.monomials.map((_, k) => coefficient(f, k).toFraction());
    expect(coefficients).toEqual(["2/3", "-1/2", "5"]);
    expect(() => coefficient(f, 3)).toThrow("expected a term index, got 3");
    expect(() => coefficient(f, -1)).toThrow(RangeError);
  });

  it("may be constants and variables", () => {
    const r = ring("x y");
    const [half, y, nothing] = texts(r, "-1/2", "y", "0") as [Polynomial, Polynomial, Polynomial];
    expect(constant(r, new Fraction(-2, 4))).toEqual(half);
    expect(variable(r, variableNamed(r, "y") ?? expect.fail())).toEqual(y);
    expect(constant(r, 0n)).toEqual(nothing);
    expect(isZero(nothing) && !isZero(half)).toBe(true);
  });

  it("are equal only with the same terms, coefficients and denominators", () => {
    const r = ring("x y");
    const list = texts(r, "x + y", "x - y", "x + y + 1", "x/2 + y/2", "x + x*y", "0");
    for (const [i, f] of list.entries()) {
      for (const [j, g] of list.entries()) expect(equal(f, g)).toBe(i === j);
    }
  });

  it("are homogeneous when all terms have the same degree; 0 is", () => {
    const r = ring("x y");
    const answers = texts(r, "x^2 + x*y", "x^2 + y", "7", "x + 1", "0").map(isHomogeneous);
    expect(answers).toEqual([true, false, true, false, true]);
  });

  it("lose every term with a variable that is set to 0", () => {
    const r = ring("x y z");
    const [f, left] = texts(r, "x*y + 2/3*z^2 + 2*y + 4/3", "2/3*z^2 + 4/3") as [
      Polynomial,
      Polynomial,
    ];
    expect(setToZero(f, new Set([1]))).toEqual(left);
    expect(setToZero(f, new Set())).toEqual(f);
  });

  it("overflow in products rather than wrap around", () => {
    const r = ring("x");
    const [f, g] = texts(r, "x^65535 + 1", "x^65534 + 1") as [Polynomial, Polynomial];
    expect(() => multiply(f, f)).toThrow(ExponentOverflow);
    expect(multiply(g, variable(r, 0 as never)).monomials[0]).toEqual(of(65_535));
  });
});
