import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DivisorSearch } from "../../src/groebner/divisor-search.js";
import { dividesExponents, type Exponents } from "../../src/polynomials/exponents.js";
import { gradedRevlex } from "../../src/polynomials/graded-revlex.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { ringOfVariables } from "../../src/polynomials/polynomial-ring.js";
import { randomMonomial } from "../support/monomials.js";

/** The elements that take part, by the definition: one after the other, none dividing another. */
function naive(leads: readonly Exponents[]): number[] {
  let kept: number[] = [];
  for (const [k, lead] of leads.entries()) {
    if (kept.some((j) => dividesExponents(leads[j] as Exponents, lead))) continue;
    kept = [...kept.filter((j) => !dividesExponents(lead, leads[j] as Exponents)), k];
  }
  return kept;
}

describe.each([2, 5, 20, 40])("the search for divisors in %i variables", (count) => {
  const ring = ringOfVariables(Array.from({ length: count }, (_, i) => `t${i}`));

  it("keeps minimal leading monomials and finds the oldest divisor", () => {
    fc.assert(
      fc.property(
        fc.array(randomMonomial(ring), { maxLength: 12 }),
        fc.array(randomMonomial(ring, 4), { minLength: 1, maxLength: 6 }),
        (leads, monomials) => {
          const table = new MonomialTable(gradedRevlex(ring));
          const search = new DivisorSearch(table);
          leads.forEach((lead, k) => {
            search.add(k, table.intern(lead));
          });
          const kept = naive(leads);
          expect([...search.elements()]).toEqual(kept);
          expect(search.size).toBe(kept.length);
          for (const m of [...monomials, ...leads]) {
            const wanted = kept.find((k) => dividesExponents(leads[k] as Exponents, m));
            expect(search.find(table.intern(m))).toBe(wanted ?? -1);
          }
        },
      ),
    );
  });
});

describe("the search for divisors", () => {
  it("holds any number of leading monomials", () => {
    const ring = ringOfVariables(["x", "y"]);
    const table = new MonomialTable(gradedRevlex(ring));
    const search = new DivisorSearch(table);
    for (let k = 0; k <= 500; k++) search.add(k, table.intern(Uint16Array.of(k, 500 - k)));
    expect(search.size).toBe(501);
    for (let k = 0; k <= 500; k++) {
      expect(search.find(table.intern(Uint16Array.of(k, 500 - k)))).toBe(k);
    }
    expect(search.find(table.intern(Uint16Array.of(250, 249)))).toBe(-1);
    search.add(501, table.one);
    expect([...search.elements()]).toEqual([501]);
  });
});
