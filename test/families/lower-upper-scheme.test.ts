import { describe, expect, it } from "vitest";
import { lowerUpperScheme, lowerUpperSchemeFamily } from "../../src/families/lower-upper-scheme.js";
import { LimitReached, startBudget } from "../../src/outcomes/budget.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { refused } from "../support/faults.js";
import { accepted, polynomials, termSets } from "../support/reading.js";
import { codimensionAndDegree } from "./matrix-points.js";

describe("the lower-upper scheme", () => {
  it("of n = 1 has no equations, of n = 2 the two found by hand", () => {
    expect(lowerUpperScheme(1).generatingSets[0].polynomials()).toEqual([]);
    const two = lowerUpperScheme(2);
    expect(termSets(two.generatingSets[0].polynomials())).toEqual(
      termSets(polynomials(two.ring, ["x11*y12 + x12*y22", "y21*x11 + y22*x21"])),
    );
  });

  it("has entries of XY above the diagonal, and of YX below it", () => {
    const texts = lowerUpperScheme(3)
      .generatingSets[0].polynomials()
      .map((f) => printPolynomial(f));
    expect(texts.slice(1, 4)).toEqual([
      "x11*y13 + x12*y23 + x13*y33",
      "x11*y21 + x21*y22 + x31*y23",
      "x21*y13 + x22*y23 + x23*y33",
    ]);
  });

  // Knutson, *Some schemes related to the commuting variety*, J. Algebraic Geom. 14 (2005) [from memory].
  it.each([1, 2, 3])("of n = %i is a complete intersection of n² − n quadrics", (n) => {
    const ideal = lowerUpperScheme(n);
    const quadrics = n * n - n;
    expect(ideal.generatingSets[0].polynomials()).toHaveLength(quadrics);
    expect(codimensionAndDegree(ideal)).toEqual([quadrics, 2n ** BigInt(quadrics)]);
  });

  it("pairs x_ij with y_ji", () => {
    const { pair, variables } = lowerUpperScheme(3).ring;
    expect([pair?.x.name, pair?.y.name]).toEqual(["x", "y"]);
    expect(variables).toHaveLength(18);
  });

  it("is read by its size, which is bounded", () => {
    expect(accepted(lowerUpperSchemeFamily.read(" 4 ")).name).toBe("lower-upper-scheme:4");
    expect(accepted(lowerUpperSchemeFamily.read("30")).ring.variables).toHaveLength(1800);
    for (const text of ["0", "31", "-1", "2,1", "1.5", "x", "1000"]) {
      expect(refused(lowerUpperSchemeFamily.read(text)).expected).toBe("a number from 1 to 30");
    }
  });

  it("is written out within the budget", () => {
    const budget = startBudget({ seconds: 0, now: () => performance.now() + 1 });
    expect(() => lowerUpperScheme(20).generatingSets[0].polynomials(budget)).toThrow(LimitReached);
  });
});
