import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type CriticalPair, CriticalPairs } from "../../src/groebner/critical-pairs.js";
import { dividesExponents, type Exponents, lcmExponents } from "../../src/polynomials/exponents.js";
import { gradedRevlex } from "../../src/polynomials/graded-revlex.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { randomMonomial } from "../support/monomials.js";
import { ring } from "../support/reading.js";

const r = ring("x y z");

/** All pairs of elements with the given leading monomials, sugar = degree, in the order they are taken. */
function pairsOf(leads: readonly Exponents[]): { pairs: CriticalPair[]; table: MonomialTable } {
  const table = new MonomialTable(gradedRevlex(r));
  const waiting = new CriticalPairs(table);
  leads.forEach((lead, k) => {
    waiting.add(k, table.intern(lead), table.degree(table.intern(lead)));
  });
  const pairs: CriticalPair[] = [];
  while (waiting.size > 0) pairs.push(...waiting.take(waiting.nextSugar));
  expect(waiting.nextSugar).toBe(Infinity);
  return { pairs, table };
}

function monomials(...texts: string[]): Exponents[] {
  return texts.map((text) => Uint16Array.from(text, Number));
}

function named(pairs: readonly CriticalPair[]): string[] {
  return pairs.map(({ first, second }) => `${first}${second}`);
}

describe("critical pairs", () => {
  it("of coprime leading monomials are not needed (Buchberger's first criterion)", () => {
    expect(pairsOf(monomials("200", "020", "003")).pairs).toEqual([]);
  });

  it("of three monomials with one lcm are two (Buchberger's second criterion)", () => {
    expect(pairsOf(monomials("110", "101", "011")).pairs).toHaveLength(2);
  });

  it("are dropped when a later leading monomial divides their lcm properly", () => {
    // lcm(x²y², y²z²) = x²y²z²; the later xyz divides it, and its lcms with both are smaller: xy²z² < x²y²z.
    const { pairs } = pairsOf(monomials("220", "022", "111"));
    expect(named(pairs)).toEqual(["12", "02"]);
  });

  it("come with their lcm and sugar, smallest sugar first", () => {
    const table = new MonomialTable(gradedRevlex(r));
    const waiting = new CriticalPairs(table);
    const [a, b, c] = monomials("210", "120", "012").map((m) => table.intern(m));
    // The second element has sugar 5 for a leading monomial of degree 3: an excess of 2.
    waiting.add(0, a as typeof table.one, 3);
    waiting.add(1, b as typeof table.one, 5);
    waiting.add(2, c as typeof table.one, 3);
    expect(waiting.size).toBe(3);
    expect(waiting.nextSugar).toBe(5);
    expect(waiting.take(5)).toMatchObject([{ first: 0, second: 2, sugar: 5 }]);
    const [next] = waiting.take(waiting.nextSugar);
    expect(next).toMatchObject({ first: 0, second: 1, sugar: 6 });
    expect(table.exponents((next as CriticalPair).lcm)).toEqual(Uint16Array.of(2, 2, 0));
    expect(waiting.take(6)).toEqual([]);
    expect(waiting.take(7)).toMatchObject([{ first: 1, second: 2, sugar: 7 }]);
    expect(waiting.size).toBe(0);
  });

  it("that are kept connect all others: every lcm class is joined through divisors of the lcm", () => {
    // Buchberger's second criterion in its general form: for any two elements, a chain of kept or coprime pairs
    // leads from one to the other through elements that divide their lcm, with lcms that divide it.
    fc.assert(
      fc.property(fc.array(randomMonomial(r, 3), { minLength: 2, maxLength: 8 }), (leads) => {
        const { pairs } = pairsOf(leads);
        const kept = new Set(named(pairs));
        const at = (k: number): Exponents => leads[k] as Exponents;
        const coprime = (i: number, j: number): boolean =>
          at(i).every((e, v) => e === 0 || at(j)[v] === 0);
        const joined = (i: number, j: number): boolean =>
          kept.has(i < j ? `${i}${j}` : `${j}${i}`) || coprime(i, j);
        for (let j = 1; j < leads.length; j++) {
          for (let i = 0; i < j; i++) {
            const lcm = lcmExponents(at(i), at(j));
            const inside = [...leads.keys()].filter((k) => dividesExponents(at(k), lcm));
            const reached = new Set([i]);
            for (const k of reached) {
              for (const l of inside) if (joined(k, l)) reached.add(l);
            }
            expect(reached.has(j)).toBe(true);
          }
        }
      }),
      { numRuns: 300 },
    );
  });

  it("have first < second and the lcm of the two leading monomials", () => {
    fc.assert(
      fc.property(fc.array(randomMonomial(r, 3), { minLength: 2, maxLength: 8 }), (leads) => {
        const { pairs, table } = pairsOf(leads);
        for (const { first, second, lcm, sugar } of pairs) {
          expect(first).toBeLessThan(second);
          const wanted = lcmExponents(leads[first] as Exponents, leads[second] as Exponents);
          expect(table.exponents(lcm)).toEqual(wanted);
          expect(sugar).toBe(table.degree(lcm));
        }
        const sugars = pairs.map((pair) => pair.sugar);
        expect(sugars).toEqual([...sugars].sort((a, b) => a - b));
      }),
    );
  });
});
