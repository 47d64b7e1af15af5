import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Polynomial } from "../../src/polynomials/polynomial.js";
import { ringOfMatrices } from "../../src/polynomials/polynomial-ring.js";
import { printMonomial, printPolynomial } from "../../src/polynomials/printing.js";
import { readPolynomial } from "../../src/polynomials/reading.js";
import { randomPolynomial } from "../support/arbitraries.js";
import { orderTable } from "../support/order-table.js";
import { accepted, orderOf, polynomials, ring } from "../support/reading.js";

describe("the polynomial printer", () => {
  it.each([
    "0",
    "1",
    "-1",
    "2/3",
    "-2/3",
    "x",
    "-x",
    "x - 1",
    "-x^2*y + 3/2*x*z - z - 7/5",
    "x*y*z + x + y + z",
    "123456789012345678901234567890*x",
  ])("writes %s so", (text) => {
    const r = ring("x y z");
    expect(printPolynomial(accepted(readPolynomial(text, r)))).toBe(text);
  });

  it("writes each coefficient in lowest terms of its own", () => {
    const r = ring("x y z");
    const f = accepted(readPolynomial("x/2 + y/3 + 3*z", r));
    expect(printPolynomial(f)).toBe("1/2*x + 1/3*y + 3*z");
  });

  it("writes the largest term of an order first", () => {
    const r = ringOfMatrices([{ name: "x", rows: 2, columns: 2 }]);
    const [f] = polynomials(r, ["x11*x22 - 3/2*x12*x21 + x11"]) as [Polynomial];
    const shown = (phrase: string): string => printPolynomial(f, orderOf(r, phrase));
    expect(shown("lex from nw by rows")).toBe("x11*x22 - 3/2*x12*x21 + x11");
    expect(shown("revlex from nw by rows")).toBe("-3/2*x12*x21 + x11*x22 + x11");
    expect(shown("plain lex")).toBe("x11*x22 + x11 - 3/2*x12*x21");
  });

  it("is undone by the reader, in canonical order and in every other", () => {
    const cases = orderTable();
    const any = fc.constantFrom(...cases).chain(({ ring: r, phrase }) =>
      fc.record({
        order: fc.constantFrom(undefined, orderOf(r, phrase)),
        f: randomPolynomial(r, { terms: 6, degree: 4, coefficient: 1000 }),
      }),
    );
    fc.assert(
      fc.property(any, ({ f, order }) => {
        expect(accepted(readPolynomial(printPolynomial(f, order), f.ring))).toEqual(f);
      }),
      { numRuns: 500 },
    );
  });

  it("writes monomials as products of powers, and 1", () => {
    const r = ringOfMatrices([{ name: "z", rows: 1, columns: 12 }]);
    const monomial = new Uint16Array(12);
    expect(printMonomial(r, monomial)).toBe("1");
    monomial[0] = 1;
    monomial[11] = 65_535;
    expect(printMonomial(r, monomial)).toBe("z1_1*z1_12^65535");
  });
});
