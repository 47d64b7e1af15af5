/**
 * Worked examples of monomial orders from Cox, Little, O'Shea, *Ideals, Varieties, and Algorithms*,
 * chapter 2, section 2, with x > y > z (from memory). Their lex, grlex and grevlex are `plain lex`,
 * `graded lex` and `graded revlex`.
 */
import { describe, expect, it } from "vitest";
import { monomialComparer } from "../../src/polynomials/leading-terms.js";
import type { Polynomial } from "../../src/polynomials/polynomial.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { orderOf, polynomials, ring } from "../support/reading.js";

describe("the textbook's monomial orders", () => {
  it.each([
    ["plain lex", [1, 2, 0], [0, 3, 4]],
    ["plain lex", [3, 2, 4], [3, 2, 1]],
    ["plain lex", [1, 0, 0], [0, 5, 9]],
    ["graded lex", [1, 2, 3], [3, 2, 0]],
    ["graded lex", [1, 2, 4], [1, 1, 5]],
    ["graded lex", [5, 1, 1], [4, 1, 2]],
    ["graded revlex", [4, 7, 1], [4, 2, 3]],
    ["graded revlex", [1, 5, 2], [4, 1, 3]],
    ["graded revlex", [5, 1, 1], [4, 1, 2]],
  ])("put, in %s, %j above %j", (phrase, larger, smaller) => {
    const compare = monomialComparer(orderOf(ring("x y z"), phrase));
    expect(compare(Uint16Array.from(larger), Uint16Array.from(smaller))).toBeGreaterThan(0);
    expect(compare(Uint16Array.from(smaller), Uint16Array.from(larger))).toBeLessThan(0);
  });

  it.each([
    ["plain lex", "-5*x^3 + 7*x^2*z^2 + 4*x*y^2*z + 4*z^2"],
    ["graded lex", "7*x^2*z^2 + 4*x*y^2*z - 5*x^3 + 4*z^2"],
    ["graded revlex", "4*x*y^2*z + 7*x^2*z^2 - 5*x^3 + 4*z^2"],
  ])("sort the section's polynomial in %s", (phrase, sorted) => {
    const r = ring("x y z");
    const [f] = polynomials(r, ["4*x*y^2*z + 4*z^2 - 5*x^3 + 7*x^2*z^2"]) as [Polynomial];
    expect(printPolynomial(f, orderOf(r, phrase))).toBe(sorted);
  });

  // Exercise 1; the sorted forms follow from the definitions.
  it.each([
    ["plain lex", "x^3 + x^2 + 2*x + 3*y - z^2 + z"],
    ["graded lex", "x^3 + x^2 - z^2 + 2*x + 3*y + z"],
    ["graded revlex", "x^3 + x^2 - z^2 + 2*x + 3*y + z"],
  ])("sort the first exercise's polynomial in %s", (phrase, sorted) => {
    const r = ring("x y z");
    const [f] = polynomials(r, ["2*x + 3*y + z + x^2 - z^2 + x^3"]) as [Polynomial];
    expect(printPolynomial(f, orderOf(r, phrase))).toBe(sorted);
  });

  it.each([
    ["plain lex", "-3*x^5*y*z^4 + 2*x^2*y^8 - x*y^4 + x*y*z^3"],
    ["graded lex", "-3*x^5*y*z^4 + 2*x^2*y^8 - x*y^4 + x*y*z^3"],
    ["graded revlex", "2*x^2*y^8 - 3*x^5*y*z^4 - x*y^4 + x*y*z^3"],
  ])("sort its second polynomial in %s", (phrase, sorted) => {
    const r = ring("x y z");
    const [f] = polynomials(r, ["2*x^2*y^8 - 3*x^5*y*z^4 + x*y*z^3 - x*y^4"]) as [Polynomial];
    expect(printPolynomial(f, orderOf(r, phrase))).toBe(sorted);
  });
});
