import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { permutation } from "../../src/combinatorics/permutation.js";
import { schubertIdeal } from "../../src/families/schubert.js";
import {
  finestGrading,
  finestGradingLater,
  multidegreeKey,
} from "../../src/polynomials/multigrading.js";
import { randomIdeal } from "../support/arbitraries.js";
import { polynomials, ring } from "../support/reading.js";

describe("the finest grading", () => {
  it("makes every polynomial homogeneous", () => {
    const r = ring("a b c d e");
    fc.assert(
      fc.property(randomIdeal(r, { terms: 4, degree: 3, generators: 3 }), (fs) => {
        const grading = finestGrading(fs);
        for (const f of fs) {
          expect(new Set(f.monomials.map((m) => multidegreeKey(grading, m))).size).toBeLessThan(2);
        }
      }),
    );
  });

  it("has one weight for each variable that occurs, less the independent differences", () => {
    const r = ring("a b c d e");
    const rank = (texts: string[]) => finestGrading(polynomials(r, texts)).weights.length;
    expect(rank(["a*b - c*d"])).toBe(3);
    expect(rank(["a*b - c*d", "a^2*b^2 - c^2*d^2"])).toBe(3);
    expect(rank(["a^2 - b", "b^3 - c"])).toBe(1);
    expect(rank(["a*b"])).toBe(2);
    expect(rank(["a - 1", "b - 2"])).toBe(0);
    expect(finestGrading([]).weights).toEqual([]);
  });

  it("of matrix Schubert ideals contains rows and columns", () => {
    const ideal = schubertIdeal(permutation([2, 1, 5, 4, 3]));
    const grading = finestGradingLater(ideal.generatingSets[0].polynomials());
    // z11 and the 4×4 northwest corner occur; their torus of rows and columns has dimension 4 + 4 − 1,
    // and no larger one makes the minors homogeneous.
    expect(grading().weights.length).toBeGreaterThanOrEqual(7);
    expect(grading()).toBe(grading());
  });

  it("tells monomials of different degrees apart", () => {
    const r = ring("x y z");
    const grading = finestGrading(polynomials(r, ["x*z - y^2"]));
    const key = (m: number[]) => multidegreeKey(grading, Uint16Array.from(m));
    expect(key([1, 0, 1])).toBe(key([0, 2, 0]));
    expect(key([1, 0, 0])).not.toBe(key([0, 1, 0]));
    expect(key([2, 0, 0])).not.toBe(key([1, 1, 0]));
  });
});
