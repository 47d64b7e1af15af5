import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { permutationsOf } from "../../src/combinatorics/permutation.js";
import { schubertIdeal } from "../../src/families/schubert.js";
import { guidedBasis, type KnownBasis } from "../../src/groebner/guided-basis.js";
import { rationalBasis } from "../../src/groebner/rational-basis.js";
import { monicPolynomial } from "../../src/groebner/rows.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { isHomogeneous, type Polynomial } from "../../src/polynomials/polynomial.js";
import { randomIdeal } from "../support/arbitraries.js";
import { orderOf, polynomials, ring, termSets } from "../support/reading.js";

/** The known basis of an ideal in an order, and what it is. */
function known(generators: readonly Polynomial[], phrase: string): KnownBasis {
  const [first] = generators;
  const order = orderOf((first as Polynomial).ring, phrase);
  const basis = rationalBasis(generators, order, unlimited());
  if (basis.kind === "undecided") throw new Error(basis.reason);
  return basis;
}

/** The guided basis as a set of polynomials. */
function guided(generators: readonly Polynomial[], phrase: string, basis: KnownBasis) {
  const { ring: r } = generators[0] as Polynomial;
  const table = new MonomialTable(orderOf(r, phrase));
  const rows = guidedBasis(generators, table, basis, unlimited());
  return rows && termSets(rows.map((row) => monicPolynomial(r, table, row)));
}

function unguided(generators: readonly Polynomial[], phrase: string): string[] {
  const { ring: r } = generators[0] as Polynomial;
  const { table, rows } = known(generators, phrase);
  return termSets(rows.map((row) => monicPolynomial(r, table, row)));
}

describe("bases guided by a known one", () => {
  it("are the reduced bases, for random homogeneous ideals and any two orders", () => {
    const r = ring("x y z t");
    const phrases = ["graded revlex", "graded lex", "weights (1,3,2,0) then graded revlex"];
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 4, degree: 3, generators: 3 }),
        fc.constantFrom(...phrases),
        fc.constantFrom(...phrases),
        (ideal, from, to) => {
          const homogeneous = ideal
            .map((f) => homogenised(f))
            .filter((f) => f.monomials.length > 0);
          fc.pre(homogeneous.length > 0 && homogeneous.every(isHomogeneous));
          expect(guided(homogeneous, to, known(homogeneous, from))).toEqual(
            unguided(homogeneous, to),
          );
        },
      ),
      { numRuns: 60 },
    );
  });

  it("are the reduced bases of all Schubert ideals of S_4, from one corner to the other", () => {
    for (const w of permutationsOf(4)) {
      for (const { polynomials: generators } of schubertIdeal(w).generatingSets) {
        const given = generators();
        if (given.length === 0) continue;
        const basis = known(given, "revlex from nw by rows");
        for (const phrase of ["lex from nw by rows", "revlex from sw by columns"]) {
          expect(guided(given, phrase, basis)).toEqual(unguided(given, phrase));
        }
      }
    }
  });

  it("do not trust a basis of another ideal, larger, smaller or of the same Hilbert function", () => {
    const r = ring("x y z");
    const given = polynomials(r, ["x^2 - y*z", "x*y - z^2"]);
    const others = [
      ["x^2 - y*z"],
      ["x^2 - y*z", "x*y - z^2", "z^5"],
      ["x^2 - y*z", "x*y + z^2"],
      ["x", "y", "z"],
    ];
    for (const texts of others) {
      const other = known(polynomials(r, texts), "graded revlex");
      expect(guided(given, "graded lex", other)).toBeUndefined();
      const order = orderOf(r, "graded lex");
      const basis = rationalBasis(given, order, unlimited(), { known: other });
      expect(basis.kind === "basis" && termSets(basis.elements)).toEqual(
        unguided(given, "graded lex"),
      );
    }
  });

  it("pass over inhomogeneous ideals", () => {
    const r = ring("x y");
    const given = polynomials(r, ["x^2 - y", "y^2 - 1"]);
    expect(guided(given, "graded lex", known(given, "graded revlex"))).toBeUndefined();
  });
});

/** The terms of largest degree: a homogeneous polynomial of as many terms as may be. */
function homogenised(f: Polynomial): Polynomial {
  const degree = (m: Uint16Array): number => m.reduce((sum, e) => sum + e, 0);
  const largest = Math.max(0, ...f.monomials.map(degree));
  const kept = f.monomials.flatMap((m, k) => (degree(m) === largest ? [k] : []));
  return {
    ...f,
    monomials: kept.map((k) => f.monomials[k] as Uint16Array),
    numerators: kept.map((k) => f.numerators[k] as bigint),
  };
}
