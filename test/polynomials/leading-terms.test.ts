import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  leadingForm,
  leadingMonomialOf,
  leadingTermOf,
  sortedTerms,
} from "../../src/polynomials/leading-terms.js";
import { multiply, type Polynomial, zero } from "../../src/polynomials/polynomial.js";
import type { PolynomialRing } from "../../src/polynomials/polynomial-ring.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { randomPolynomial } from "../support/arbitraries.js";
import { orderTable, pairedRing } from "../support/order-table.js";
import { orderOf, polynomials, ring } from "../support/reading.js";

function read(r: PolynomialRing, text: string): Polynomial {
  return polynomials(r, [text])[0] ?? expect.fail();
}

describe("leading terms", () => {
  it("are the first of the sorted terms, and multiply, in every order", () => {
    const cases = fc.constantFrom(...orderTable()).chain((c) => {
      const some = randomPolynomial(c.ring, { terms: 5, degree: 3 });
      return fc.tuple(fc.constant(c), some, some);
    });
    fc.assert(
      fc.property(cases, ([{ ring: r, phrase }, f, g]) => {
        fc.pre(f.monomials.length > 0 && g.monomials.length > 0);
        const order = orderOf(r, phrase);
        expect(leadingTermOf(f, order)).toEqual(sortedTerms(f, order)[0]);
        expect(leadingMonomialOf(f, order)).toEqual(leadingTermOf(f, order).monomial);
        const [a, b] = [leadingForm(f, order), leadingForm(g, order)];
        expect(leadingForm(multiply(f, g), order)).toEqual(multiply(a, b));
      }),
      { numRuns: 500 },
    );
  });

  it("keep their coefficients over the denominator of the polynomial", () => {
    const r = ring("x y");
    const f = read(r, "2/3*x - 5*y^2 + 1/2");
    const order = orderOf(r, "plain lex");
    expect(leadingTermOf(f, order)).toEqual({ monomial: Uint16Array.of(1, 0), numerator: 4n });
    expect(printPolynomial(leadingForm(f, order))).toBe("2/3*x");
    expect(printPolynomial(leadingForm(f, orderOf(r, "graded lex")))).toBe("-5*y^2");
  });

  it("do not exist for 0, whose leading form is 0", () => {
    const r = ring("x y");
    const order = orderOf(r, "graded lex");
    expect(() => leadingMonomialOf(zero(r), order)).toThrow(
      "expected a non-zero polynomial, got 0",
    );
    expect(() => leadingTermOf(zero(r), order)).toThrow(RangeError);
    expect(leadingForm(zero(r), order)).toEqual(zero(r));
  });
});

describe("leading forms", () => {
  it("of a partial order keep all terms that agree in the weights", () => {
    const r = ring("x y z");
    const order = orderOf(r, "weights (1,1,0) refined by graded revlex");
    expect(printPolynomial(leadingForm(read(r, "x*z + 2*y*z + z^2 - 7"), order))).toBe(
      "x*z + 2*y*z",
    );
    expect(printPolynomial(leadingForm(read(r, "x*y - z^3"), order))).toBe("-z^3");
  });

  it("of a dual order keep what agrees in all the differences of exponents", () => {
    // The flux terms z_ij = x_ij·y_ji have weight 0 everywhere: none is above another.
    const r = pairedRing(2);
    const order = orderOf(r, "dual from nw by rows");
    const form = (text: string): string => printPolynomial(leadingForm(read(r, text), order));
    expect(form("x11*y11 + x12*y21 - x21*y12")).toBe("x11*y11 + x12*y21 - x21*y12");
    expect(form("x11*y12 + x12*y22")).toBe("x12*y22");
    expect(form("y11*x12 - x11*y21")).toBe("x12*y11");
  });

  it("may be taken stage by stage, each the leading form of the one before", () => {
    const r = ring("x y z");
    const order = orderOf(r, "weights (1,1,0) then weights (0,1,0) then plain lex");
    const f = read(r, "x^2 + x*y + y^2*z + y^2 + z");
    const stages = order.stages.map((k) => printPolynomial(leadingForm(f, order, k)));
    expect(order.stages).toEqual([1, 2, 5]);
    expect(stages).toEqual(["y^2*z + x^2 + x*y + y^2", "y^2*z + y^2", "y^2*z"]);
    expect(leadingForm(f, order, 0)).toEqual(f);
    expect(printPolynomial(leadingForm(f, orderOf(r, "graded lex"), 0))).toBe("y^2*z");
  });

  it("refuse stages that the order does not have", () => {
    const r = ring("x y");
    const order = orderOf(r, "graded lex");
    const f = read(r, "x + y");
    for (const stage of [-1, 3, 0.5]) {
      expect(() => leadingForm(f, order, stage)).toThrow(`from 0 to 2, got ${stage}`);
    }
  });
});
