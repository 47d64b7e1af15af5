import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { commutingFamily, commutingScheme } from "../../src/families/commuting.js";
import { COMMUTING_DEGREES } from "../reference/knutson/lower-upper-degrees.js";
import { refused } from "../support/faults.js";
import { accepted, polynomials, termSets } from "../support/reading.js";
import { evaluate } from "./determinants.js";
import { codimensionAndDegree, product, square } from "./matrix-points.js";

describe("commuting schemes", () => {
  it("of n = 1 have no equations, of n = 2 the three found by hand", () => {
    expect(commutingScheme(1).generatingSets[0].polynomials()).toEqual([]);
    const two = commutingScheme(2);
    expect(termSets(two.generatingSets[0].polynomials())).toEqual(
      termSets(
        polynomials(two.ring, [
          "x12*y21 - y12*x21",
          "x11*y12 + x12*y22 - y11*x12 - y12*x22",
          "x21*y11 + x22*y21 - y21*x11 - y22*x21",
        ]),
      ),
    );
  });

  it("have codimension n² − n and the degrees of OEIS A029729", () => {
    const found = [1, 2, 3].map((n) => codimensionAndDegree(commutingScheme(n)));
    expect(found).toEqual(COMMUTING_DEGREES.map((degree, k) => [k * (k + 1), degree]));
  });

  it("vanish just at the pairs that commute", () => {
    const { generatingSets } = commutingScheme(3);
    const entries = fc.array(fc.bigInt({ min: -2n, max: 2n }), { minLength: 12, maxLength: 12 });
    fc.assert(
      fc.property(entries, fc.boolean(), (drawn, disturbed) => {
        const x = square(3, (i, j) => drawn[3 * i + j] as bigint);
        const squared = product(x, x);
        const [a = 0n, b = 0n, c = 0n] = drawn.slice(9);
        // A polynomial in X commutes with X; with one more entry it need not.
        const y = square(3, (i, j) => {
          const value = a * (squared[i]?.[j] as bigint) + b * (x[i]?.[j] as bigint);
          return value + (i === j ? c : 0n) + (disturbed && i === 0 && j === 1 ? 1n : 0n);
        });
        const commute = String(product(x, y)) === String(product(y, x));
        if (!disturbed) expect(commute).toBe(true);
        const values = generatingSets[0]
          .polynomials()
          .map((f) => evaluate(f, [...x.flat(), ...y.flat()]));
        expect(values.every((value) => value === 0n)).toBe(commute);
      }),
    );
  });

  it("are read by their size", () => {
    const ideal = accepted(commutingFamily.read("4"));
    expect(ideal.name).toBe("commuting:4");
    expect(ideal.generatingSets[0].polynomials()).toHaveLength(15);
    expect(refused(commutingFamily.read("0")).message).toContain("is no size");
  });
});
