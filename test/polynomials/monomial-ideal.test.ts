import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { dividesExponents } from "../../src/polynomials/exponents.js";
import { isSquarefree, monomialIdeal } from "../../src/polynomials/monomial-ideal.js";

const of = (...exponents: number[]): Uint16Array => Uint16Array.from(exponents);
const monomials = fc.array(
  fc.array(fc.nat({ max: 3 }), { minLength: 3, maxLength: 3 }).map((e) => Uint16Array.from(e)),
  { maxLength: 8 },
);

describe("monomial ideals", () => {
  it("contain the monomials given and nothing that none of them divides", () => {
    fc.assert(
      fc.property(monomials, monomials, (given, probes) => {
        const { generators } = monomialIdeal(3, given);
        for (const m of [...given, ...probes]) {
          const inside = given.some((g) => dividesExponents(g, m));
          expect(generators.some((g) => dividesExponents(g, m))).toBe(inside);
        }
      }),
    );
  });

  it("have minimal generators that do not depend on the order of the list", () => {
    fc.assert(
      fc.property(monomials, (given) => {
        const { generators } = monomialIdeal(3, given);
        expect(monomialIdeal(3, [...given].reverse()).generators).toEqual(generators);
        for (const [i, g] of generators.entries()) {
          for (const [j, h] of generators.entries()) {
            expect(dividesExponents(g, h)).toBe(i === j);
          }
        }
      }),
    );
  });

  it("list the generators canonically", () => {
    const given = [of(0, 0, 2), of(1, 1, 0), of(3, 0, 0), of(1, 1, 0), of(3, 1, 0)];
    const generators = [of(3, 0, 0), of(1, 1, 0), of(0, 0, 2)];
    expect(monomialIdeal(3, given)).toEqual({ variableCount: 3, generators });
    expect(monomialIdeal(3, [])).toEqual({ variableCount: 3, generators: [] });
    expect(monomialIdeal(3, [...given, of(0, 0, 0)]).generators).toEqual([of(0, 0, 0)]);
  });

  it("are squarefree when no minimal generator has a square", () => {
    expect(isSquarefree(monomialIdeal(2, [of(1, 0), of(2, 1)]))).toBe(true);
    expect(isSquarefree(monomialIdeal(2, [of(1, 1), of(2, 0)]))).toBe(false);
    expect(isSquarefree(monomialIdeal(2, []))).toBe(true);
  });

  it("refuse monomials of another ring", () => {
    expect(() => monomialIdeal(3, [of(1, 0, 0), of(1, 0)])).toThrow("expected 3 exponents, got 2");
  });
});
