import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { determinantalIdeal } from "../../src/families/determinantal.js";
import { hilbertNumerator } from "../../src/hilbert/hilbert-numerator.js";
import { type FlatLimit, flatLimit } from "../../src/limits/flat-limit.js";
import { startBudget, unlimited } from "../../src/outcomes/budget.js";
import { leadingForm } from "../../src/polynomials/leading-terms.js";
import type { Polynomial } from "../../src/polynomials/polynomial.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";
import { randomIdeal } from "../support/arbitraries.js";
import { normalForm, reducedBasis } from "../support/buchberger.js";
import { orderOf, polynomials, ring } from "../support/reading.js";

function limitOf(generators: readonly Polynomial[], order: TermOrder): FlatLimit {
  const limit = flatLimit(generators, order, unlimited());
  if (limit.kind === "undecided") throw new Error(limit.reason);
  return limit;
}

describe("flat limits", () => {
  const r = ring("a b c d");

  it("under total orders are the leading monomials, and keep the Hilbert function", () => {
    const orders = [
      "graded revlex",
      "graded lex",
      "plain lex",
      "weights (1,3,0,2) then graded lex",
    ];
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 3, homogeneous: true }),
        (generators) => {
          const series = orders.map((phrase) => {
            const limit = limitOf(generators, orderOf(r, phrase));
            expect(limit.monomial).toBe(true);
            return hilbertNumerator(limit.leadingIdeal, unlimited()).map(String);
          });
          for (const other of series) expect(other).toEqual(series[0]);
        },
      ),
      { numRuns: 40 },
    );
  });

  it("under partial orders hold the leading form of every element of the ideal", () => {
    const order = orderOf(r, "weights (2,1,1,0) refined by graded revlex");
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 2, homogeneous: true }),
        randomIdeal(r, { terms: 2, degree: 1, generators: 2, homogeneous: true }),
        (generators, factors) => {
          const limit = limitOf(generators, order);
          const total = orderOf(r, "graded revlex");
          const basis = reducedBasis(limit.generators, total);
          for (const form of generators.map((f) => leadingForm(f, order))) {
            expect(normalForm(form, basis, total).monomials).toEqual([]);
          }
          expect(factors.length).toBeGreaterThan(0);
          // The limit has the Hilbert function of its own leading ideal in the refinement.
          const again = limitOf(limit.generators, total);
          const numerator = (l: FlatLimit) =>
            hilbertNumerator(l.leadingIdeal, unlimited()).map(String);
          expect(numerator(again)).toEqual(numerator(limit));
        },
      ),
      { numRuns: 40 },
    );
  });

  // By hand: x12·y22, x21·y22 and the difference of the two remaining products.
  it("of the 2×2 lower-upper identity component under the dual order is the known one", () => {
    const ideal = polynomials(ring("x y"), ["x*y"]);
    expect(limitOf(ideal, orderOf(ring("x y"), "graded lex")).monomial).toBe(true);
    const four = ring("p q s t");
    const pair = polynomials(four, ["p*q - s*t", "p^2 - s*t"]);
    const limit = limitOf(pair, orderOf(four, "weights (0,0,1,1) refined by graded revlex"));
    expect(limit.monomial).toBe(false);
    expect(limit.generators.map((f) => printPolynomial(f))).toContain("s*t");
  });

  // Conca, Herzog, Proc. AMS 122 (1994) [from memory]: h-polynomials of determinantal rings.
  it.each([
    [3, 3, 1, [1, 4, 1]],
    [3, 4, 1, [1, 6, 3]],
    [3, 4, 2, [1, 2, 3]],
    [4, 4, 2, [1, 4, 10, 4, 1]],
  ])("of %i×%i matrices of rank at most %i have the known h-polynomial", (m, n, k, h) => {
    const ideal = determinantalIdeal(m, n, k);
    const codimension = (m - k) * (n - k);
    for (const phrase of ["lex from nw by rows", "revlex from nw by columns"]) {
      const limit = limitOf(ideal.generatingSets[0].polynomials(), orderOf(ideal.ring, phrase));
      // h(t)·(1−t)^codimension, multiplied out.
      let product = h.map(BigInt);
      for (let d = 0; d < codimension; d++) {
        product = [...product, 0n].map((c, i) => c - (product[i - 1] ?? 0n));
      }
      expect(hilbertNumerator(limit.leadingIdeal, unlimited()).map(BigInt)).toEqual(product);
    }
  });

  it("of the unit ideal are the unit ideal, of the zero ideal zero", () => {
    const order = orderOf(r, "graded revlex");
    expect(limitOf(polynomials(r, ["a", "a - 1"]), order).leadingIdeal.generators).toHaveLength(1);
    expect(limitOf([], order).generators).toEqual([]);
  });

  it("are undecided when the time is up", () => {
    const ideal = determinantalIdeal(5, 6, 2);
    const order = orderOf(ideal.ring, "lex from nw by rows");
    const outcome = flatLimit(
      ideal.generatingSets[0].polynomials(),
      order,
      startBudget({ seconds: 1e-4 }),
    );
    expect(outcome.kind).toBe("undecided");
  });
});
