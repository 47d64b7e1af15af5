import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { LimitReached, withinBudget } from "../../src/outcomes/budget.js";
import {
  compareCanonically,
  dividesExponents,
  ExponentOverflow,
  equalExponents,
  lcmExponents,
  MAX_EXPONENT,
  multiplyExponents,
  totalDegree,
} from "../../src/polynomials/exponents.js";

const of = (...exponents: number[]): Uint16Array => Uint16Array.from(exponents);
const monomial = fc
  .array(fc.nat({ max: 3 }), { minLength: 3, maxLength: 3 })
  .map((exponents) => Uint16Array.from(exponents));

describe("exponents", () => {
  it("add up in products, up to the largest exponent", () => {
    expect(multiplyExponents(of(1, 0, 2), of(0, 5, 3))).toEqual(of(1, 5, 5));
    expect(multiplyExponents(of(MAX_EXPONENT - 1), of(1))).toEqual(of(MAX_EXPONENT));
  });

  it("overflow as a limit that is reached, not as a wrong product", () => {
    expect(() => multiplyExponents(of(0, MAX_EXPONENT), of(0, 1))).toThrow(ExponentOverflow);
    expect(() => multiplyExponents(of(40_000), of(40_000))).toThrow(LimitReached);
    const outcome = withinBudget(() => multiplyExponents(of(MAX_EXPONENT), of(1)));
    expect(outcome).toEqual({
      kind: "undecided",
      limit: "size",
      reason: "an exponent above 65535 is needed",
    });
  });

  it("divide just when there is a cofactor", () => {
    fc.assert(
      fc.property(monomial, monomial, (a, b) => {
        const cofactor = Array.from(b, (e, v) => e - (a[v] as number));
        expect(dividesExponents(a, b)).toBe(cofactor.every((e) => e >= 0));
        expect(dividesExponents(a, multiplyExponents(a, b))).toBe(true);
      }),
    );
  });

  it("have a least common multiple that both divide, and that divides every common multiple", () => {
    fc.assert(
      fc.property(monomial, monomial, monomial, (a, b, c) => {
        const lcm = lcmExponents(a, b);
        expect(dividesExponents(a, lcm) && dividesExponents(b, lcm)).toBe(true);
        const common = dividesExponents(a, c) && dividesExponents(b, c);
        expect(dividesExponents(lcm, c)).toBe(common);
      }),
    );
  });

  it("have the sum of the exponents as total degree, beyond 16 bits too", () => {
    expect(totalDegree(of())).toBe(0);
    expect(totalDegree(of(MAX_EXPONENT, MAX_EXPONENT, 2))).toBe(131_072);
  });

  it("are equal when all exponents are and there are as many", () => {
    expect(equalExponents(of(1, 2), of(1, 2))).toBe(true);
    expect(equalExponents(of(1, 2), of(1, 3))).toBe(false);
    expect(equalExponents(of(1, 2), of(1, 2, 0))).toBe(false);
    expect(equalExponents(of(1, 2, 0), of(1, 2))).toBe(false);
  });

  it("are listed by degree, then by the first larger exponent", () => {
    const listed = [of(3, 0, 0), of(0, 0, 3), of(1, 1, 0), of(1, 0, 1), of(0, 2, 0), of(0, 0, 0)];
    const shuffled = [listed[4], listed[1], listed[5], listed[3], listed[0], listed[2]];
    expect((shuffled as Uint16Array[]).sort(compareCanonically)).toEqual(listed);
    expect(compareCanonically(of(1, 2, 3), of(1, 2, 3))).toBe(0);
    expect(compareCanonically(of(0, 9, 0), of(9, 0, 1))).toBeGreaterThan(0);
  });
});
