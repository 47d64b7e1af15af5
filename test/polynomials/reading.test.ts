import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { constant, multiply, polynomial, variable } from "../../src/polynomials/polynomial.js";
import { ringOfMatrices, type VariableIndex } from "../../src/polynomials/polynomial-ring.js";
import { readPolynomial } from "../../src/polynomials/reading.js";
import { textWithin } from "../../src/polynomials/text-fault.js";
import { randomExpression } from "../support/expressions.js";
import { expectHelpful, refused } from "../support/faults.js";
import { randomPoint, valueAt } from "../support/rational-points.js";
import { accepted, ring } from "../support/reading.js";

const xyz = (): ReturnType<typeof ring> => ring("x y z");

describe("the polynomial reader", () => {
  it("reads sums of products with fractions and powers", () => {
    const r = ringOfMatrices([{ name: "x", rows: 2, columns: 2 }]);
    expect(accepted(readPolynomial("x11*x22 - 3/2*x12^2*x21", r))).toEqual(
      polynomial(
        r,
        [
          { monomial: Uint16Array.of(1, 0, 0, 1), numerator: 2n },
          { monomial: Uint16Array.of(0, 2, 1, 0), numerator: -3n },
        ],
        2n,
      ),
    );
  });

  it("reads every expression as what it means", () => {
    const r = xyz();
    fc.assert(
      fc.property(randomExpression(r.variables), randomPoint(3), ({ text, value }, point) => {
        const f = accepted(readPolynomial(text, r));
        expect(valueAt(f, point).toFraction()).toBe(value(point).toFraction());
      }),
      { numRuns: 500 },
    );
  });

  it.each([
    ["-x^2", "-(x*x)"],
    ["(-x)^2", "x*x"],
    ["2*-x", "-2*x"],
    ["- -x", "x"],
    ["+-+x", "-x"],
    ["x - -y", "x + y"],
    ["1/2/3*x", "x/6"],
    ["6/2*3", "9"],
    ["1/2^2", "1/4"],
    ["x/(1/2 - 3)", "-2/5*x"],
    ["x^0", "1"],
    ["0^0", "1"],
    ["0^7", "0"],
    ["(x - x)^0", "1"],
    ["(x - y)^3", "x^3 - 3*x^2*y + 3*x*y^2 - y^3"],
    ["(2/3*x*y)^3", "8/27*x^3*y^3"],
    ["(-1)^65535*x", "-x"],
    ["x^00012", "x^12"],
    ["007*x", "7*x"],
    ["\ufeff x\u00a0+\r\n\ty ", "x + y"],
    ["x - x", "0"],
    ["0*x^5 + 3", "3"],
    ["(((x)))", "x"],
  ])("reads %j as %j", (text, same) => {
    const r = xyz();
    expect(accepted(readPolynomial(text, r))).toEqual(accepted(readPolynomial(same, r)));
  });

  it("reads integers of any length up to 100,000 digits", () => {
    const digits = "7".repeat(100_000);
    const f = accepted(readPolynomial(`${digits}*x`, xyz()));
    expect(f.numerators).toEqual([BigInt(digits)]);
    expect(accepted(readPolynomial("2^65535", xyz())).numerators).toEqual([2n ** 65_535n]);
  });

  it("reads exponents up to 65,535, in products too", () => {
    const f = accepted(readPolynomial("x^65535 + x^65000*x^535*y", xyz()));
    expect(f.monomials).toEqual([Uint16Array.of(65_535, 1, 0), Uint16Array.of(65_535, 0, 0)]);
  });

  it("expands powers by the binomial theorem", () => {
    const r = xyz();
    const f = accepted(readPolynomial("(x + y)^40", r));
    let binomial = 1n;
    expect(f.monomials).toHaveLength(41);
    for (const [k, m] of f.monomials.entries()) {
      expect(m).toEqual(Uint16Array.of(40 - k, k, 0));
      expect(f.numerators[k]).toBe(binomial);
      binomial = (binomial * BigInt(40 - k)) / BigInt(k + 1);
    }
  });

  it("adds long sums of like and unlike terms, with unlike denominators", () => {
    const r = xyz();
    const like = accepted(readPolynomial(`x${"+x".repeat(20_000)}`, r));
    expect(like).toEqual(multiply(constant(r, 20_001n), variable(r, 0 as VariableIndex)));
    const terms = Array.from({ length: 5000 }, (_, k) => `${k % 7}/${(k % 6) + 1}*x^${k}`);
    const unlike = accepted(readPolynomial(terms.join(" - "), r));
    expect(unlike.denominator).toBe(60n);
    expect(unlike.monomials).toHaveLength(5000 - Math.ceil(5000 / 7));
    const at = unlike.monomials.findIndex((m) => m[0] === 4999);
    // 4999 = 7·714 + 1 = 6·833 + 1
    expect(unlike.numerators[at]).toBe(-30n);
  });
});

describe("faults of the polynomial reader", () => {
  it.each([
    ["", 1, 1, "there is nothing to read", "a polynomial"],
    [" \n ", 1, 1, "there is nothing to read", "a polynomial"],
    ["x +", 1, 4, "the polynomial ends too early", "a number, a variable or a ("],
    ["x\n+ y\n- ", 3, 3, "the polynomial ends too early", "a number, a variable or a ("],
    ["2x", 1, 2, 'an operator is missing before "x"', "products written with *"],
    ["x y", 1, 3, 'an operator is missing before "y"', "products written with *"],
    ["x 2", 1, 3, 'an operator is missing before "2"', "products written with *"],
    ["2(x + 1)", 1, 2, 'an operator is missing before "("', "products written with *"],
    ["(x y)", 1, 4, 'an operator is missing before "y"', "products written with *"],
    ["(x)(y)", 1, 4, 'an operator is missing before "("', "products written with *"],
    ["x**2", 1, 2, 'unknown operator "**"', "^ for powers"],
    ["x * * y", 1, 5, '"*" cannot stand here', "a number, a variable or a ("],
    ["*x", 1, 1, '"*" cannot stand here', "a number, a variable or a ("],
    ["x^", 1, 3, "an exponent is missing", "a whole number after ^"],
    ["x^y", 1, 3, "an exponent is missing", "a whole number after ^"],
    ["x^(2)", 1, 3, "an exponent is missing", "a whole number after ^"],
    ["x^-1", 1, 3, "an exponent is negative", "a whole number after ^"],
    ["x^2^3", 1, 4, "a power of a power is ambiguous", "parentheses, such as (x^2)^3"],
    ["x^65536", 1, 3, 'the exponent "65536" is too large', "at most 65535"],
    ["(x^300)^300", 1, 8, "an exponent becomes too large", "exponents up to 65535"],
    ["(x^300 + y)^300", 1, 12, "an exponent becomes too large", "exponents up to 65535"],
    ["x^65535 * x", 1, 9, "an exponent becomes too large", "exponents up to 65535"],
    ["1.5*x", 1, 2, "decimals are not exact", "a fraction such as 3/2"],
    ["x + .5", 1, 5, "decimals are not exact", "a fraction such as 3/2"],
    ["2. + x", 1, 2, "decimals are not exact", "a fraction such as 3/2"],
    ["x.y", 1, 2, '"." cannot stand here', "an operator: + - * / ^"],
    ["1/x", 1, 3, "division by something that is not a constant", "a non-zero number"],
    ["1/(x + 1)", 1, 3, "division by something that is not a constant", "a non-zero number"],
    ["x/0", 1, 3, "division by zero", "a non-zero number"],
    ["x/(2 - 2)", 1, 3, "division by zero", "a non-zero number"],
    ["(x + y", 1, 7, "a parenthesis is not closed", "a )"],
    ["x + y)", 1, 6, "a parenthesis is closed that was not opened", "a ( before it"],
    ["()", 1, 2, '")" cannot stand here', "a number, a variable or a ("],
    ["x = y", 1, 3, "an equation is not a polynomial", "the difference of its sides"],
    ["x, y", 1, 2, '"," cannot stand here', "an operator: + - * / ^"],
    ["x − y", 1, 3, '"−" cannot stand here', "- in its place"],
    ["2·x", 1, 2, '"·" cannot stand here', "* in its place"],
    ["x²", 1, 2, '"²" cannot stand here', "^2 in its place"],
    ["[x]", 1, 1, '"[" cannot stand here', "( in its place"],
    ["(x]", 1, 3, '"]" cannot stand here', ") in its place"],
    ["x + \u0007", 1, 5, '"\\u0007" cannot stand here', "a number, a variable or a ("],
    ["x + \u{1d4b3}", 1, 5, '"\u{1d4b3}" cannot stand here', "a number, a variable or a ("],
    ["x + w", 1, 5, 'unknown variable "w"', "one of x, y, z"],
    ["x\n + 3*why", 2, 6, 'unknown variable "why"', "one of x, y, z"],
    ["__proto__", 1, 1, '"_" cannot stand here', "a number, a variable or a ("],
    ["x + Y", 1, 5, 'unknown variable "Y"', "y, perhaps; the variables are x, y, z"],
    ["zz", 1, 1, 'unknown variable "zz"', "z, perhaps; the variables are x, y, z"],
    ["constructor", 1, 1, 'unknown variable "constructor"', "one of x, y, z"],
  ])("in %j: line %i, column %i, %s", (text, line, column, message, expected) => {
    const fault = refused(readPolynomial(text, xyz()));
    expect(fault).toMatchObject({ message, expected, place: { line, column } });
    expectHelpful(fault, text);
  });

  it("suggest the nearest variable, and list a dozen at most", () => {
    const r = ringOfMatrices([{ name: "x", rows: 4, columns: 4 }]);
    const { expected } = refused(readPolynomial("x11 - x45", r));
    expect(expected).toBe(
      "x41, perhaps; the variables are x11, x12, x13, x14, x21, x22, x23, x24, x31, x32, x33, x34, …",
    );
  });

  it("point into the file the polynomial is part of", () => {
    const file = "# note\nideal:\n  - x*y - w3*x\n";
    const text = "x*y - w3*x";
    const source = textWithin(file, file.indexOf(text), "note.yaml");
    expect(refused(readPolynomial(text, xyz(), source))).toEqual({
      code: "input-fault",
      message: 'unknown variable "w3"',
      expected: "one of x, y, z",
      file: "note.yaml",
      place: { line: 3, column: 11 },
      excerpt: "  - x*y - w3*x",
    });
  });

  it("name the file even when the place is in the text alone", () => {
    const fault = refused(readPolynomial("x +", xyz(), { file: "ideal.txt" }));
    expect(fault).toMatchObject({
      file: "ideal.txt",
      place: { line: 1, column: 4 },
      excerpt: "x +",
    });
    expect(refused(readPolynomial("x +", xyz()))).not.toHaveProperty("file");
  });
});
