/** Every text ends in a moment: nesting, numbers, expansion and the text itself are bounded. */
import { describe, expect, it } from "vitest";
import { readPolynomial } from "../../src/polynomials/reading.js";
import { expectHelpful, refused } from "../support/faults.js";
import { accepted, ring } from "../support/reading.js";

const xyz = (): ReturnType<typeof ring> => ring("x y z");

describe("bounds of the polynomial reader", () => {
  it.each([
    ["(x+y+z)^1000", "the expanded polynomial is too large"],
    ["(x+1)^65535", "the expanded polynomial is too large"],
    ["(x+y)^400*(x+z)^400", "the expanded polynomial is too large"],
    ["(1/3*x+1/7*y+z/11)^1000", "the expanded polynomial is too large"],
    ["3^65535*3^65535*3^65535*3^65535", "a coefficient becomes too long"],
    ["(3*x)^65535*(3*x)^65535", "an exponent becomes too large"],
    ["1000000^65535", "a coefficient becomes too long"],
    ["(x + 2^60000)^600", "a coefficient becomes too long"],
  ])("end %j in a fault", (text, message) => {
    const fault = refused(readPolynomial(text, xyz()));
    expect(fault.message).toBe(message);
    expectHelpful(fault, text);
  });

  it("allow 200 levels of parentheses", () => {
    const nested = (levels: number): string => `${"(".repeat(levels)}x${")".repeat(levels)}`;
    expect(readPolynomial(nested(200), xyz()).ok).toBe(true);
    const fault = refused(readPolynomial(nested(201), xyz()));
    expect(fault).toMatchObject({ message: "nested too deeply", place: { line: 1, column: 202 } });
  });

  it("allow any number of signs and of parentheses one after the other", () => {
    expect(accepted(readPolynomial(`${"-".repeat(99_999)}x`, xyz())).numerators).toEqual([-1n]);
    expect(accepted(readPolynomial(`0${"+(x)".repeat(999)}`, xyz())).numerators).toEqual([999n]);
  });

  it("refuse numbers of more than 100,000 digits", () => {
    const fault = refused(readPolynomial(`x + ${"9".repeat(100_001)}`, xyz()));
    expect(fault).toMatchObject({
      message: "the number is too long",
      expected: "at most 100000 digits",
      place: { line: 1, column: 5 },
    });
  });

  it("keep coefficients of 100,000 digits, which print and read back, and no longer ones", () => {
    const nines = "9".repeat(100_000);
    expect(accepted(readPolynomial(`${nines}*x + 1`, xyz())).monomials).toHaveLength(2);
    expect(refused(readPolynomial(`${nines} + 1`, xyz())).message).toBe(
      "a coefficient becomes too long",
    );
  });

  it("refuse more than 100,000 terms", () => {
    const r = ring("x y");
    const text = Array.from({ length: 100_001 }, (_, k) => `x^${k >> 8}*y^${k & 255}`).join("+");
    expect(text.length).toBeGreaterThan(1_000_000);
    expect(refused(readPolynomial(text, r)).message).toBe("the text is too long");
    const short = Array.from({ length: 100_001 }, (_, k) =>
      k < 65_536 ? `x^${k}` : `y^${k - 65_535}`,
    );
    const fault = refused(readPolynomial(short.join("+"), r));
    expect(fault).toMatchObject({ expected: "at most 100000 terms" });
    expect(accepted(readPolynomial(short.slice(1).join("+"), r)).monomials).toHaveLength(100_000);
  });

  it.each([
    ["x", 10_000_000],
    ["(", 10_000_000],
    ["x+", 5_000_000],
    ["9", 10_000_000],
    ["\n", 10_000_000],
    ["\u0000\u{1f600}", 3_000_000],
  ])("refuse %j repeated to ten million characters", (piece, count) => {
    const fault = refused(readPolynomial(piece.repeat(count), xyz()));
    expect(fault).toMatchObject({
      message: "the text is too long",
      expected: "at most 1000000 characters",
      place: { line: 1, column: 1 },
    });
  });

  it.each([
    ["(x+1)*", "the expanded polynomial is too large"],
    ["2^30000+", "the expanded polynomial is too large"],
    ["1/7919/", "the expanded polynomial is too large"],
    ["x*", "an exponent becomes too large"],
    ["(", "nested too deeply"],
    ["x(", 'an operator is missing before "("'],
    ["-", "the polynomial ends too early"],
    ["a", `unknown variable ${JSON.stringify(`${"a".repeat(60)}…`)}`],
    ["\n", "there is nothing to read"],
    ["*", '"*" cannot stand here'],
    ["\u0000", '"\\u0000" cannot stand here'],
  ])("end a million characters of %j in a fault", (piece, message) => {
    const text = piece.repeat(Math.floor(1_000_000 / piece.length));
    const fault = refused(readPolynomial(text, xyz()));
    expect(fault.message).toBe(message);
  });

  it("bound sums of fractions with unlike denominators", () => {
    const terms = Array.from({ length: 60_000 }, (_, k) => `1/${1_000_003 + 7919 * k}`);
    expect(refused(readPolynomial(terms.join("+"), xyz())).message).toBe(
      "the expanded polynomial is too large",
    );
    const long = (digit: string): string => `1/${digit.repeat(60_000)}`;
    expect(refused(readPolynomial(`${long("7")}+${long("3")}1`, xyz())).message).toBe(
      "a coefficient becomes too long",
    );
  });

  it("bound long divisions of many terms", () => {
    const text = `(x + y + z + 1)^30${"/1".repeat(100_000)}`;
    expect(refused(readPolynomial(text, xyz())).message).toBe(
      "the expanded polynomial is too large",
    );
  });
});
