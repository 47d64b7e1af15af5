/** The laws of term orders, and every order against its definition written out naively. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Exponents, multiplyExponents } from "../../src/polynomials/exponents.js";
import { leadingForm, monomialComparer } from "../../src/polynomials/leading-terms.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { polynomial } from "../../src/polynomials/polynomial.js";
import { isPartial } from "../../src/polynomials/term-order.js";
import { randomMonomial, randomPair } from "../support/monomials.js";
import { type ExponentOf, orderTable } from "../support/order-table.js";
import { orderOf } from "../support/reading.js";

describe.each(orderTable())("$phrase on $ringName", ({ ring, phrase, compare, decisive }) => {
  const comparer = (): ReturnType<typeof monomialComparer> =>
    monomialComparer(orderOf(ring, phrase));
  const named =
    (m: Exponents): ExponentOf =>
    (name) =>
      m[ring.variables.indexOf(name)] ?? Number.NaN;

  it("compares as its definition says", () => {
    const larger = comparer();
    const table = new MonomialTable(orderOf(ring, phrase));
    fc.assert(
      fc.property(randomPair(ring), ([a, b]) => {
        const expected = Math.sign(compare(named(a), named(b)));
        expect(Math.sign(larger(a, b))).toBe(expected);
        expect(Math.sign(table.compare(table.intern(a), table.intern(b)))).toBe(expected);
      }),
    );
  });

  it("is antisymmetric, and only equal monomials tie", () => {
    const larger = comparer();
    fc.assert(
      fc.property(randomPair(ring), ([a, b]) => {
        expect(Math.sign(larger(a, b))).toBe(0 - Math.sign(larger(b, a)));
        expect(larger(a, b) === 0).toBe(a.join() === b.join());
      }),
    );
  });

  it("is transitive", () => {
    const larger = comparer();
    fc.assert(
      fc.property(randomPair(ring), randomMonomial(ring), ([a, b], c) => {
        const [low, middle, high] = [a, b, c].sort(larger) as [Exponents, Exponents, Exponents];
        expect(larger(low, middle)).toBeLessThanOrEqual(0);
        expect(larger(middle, high)).toBeLessThanOrEqual(0);
        expect(larger(low, high)).toBeLessThanOrEqual(0);
      }),
    );
  });

  it("is kept by multiplication", () => {
    const larger = comparer();
    fc.assert(
      fc.property(randomPair(ring), randomMonomial(ring), ([a, b], c) => {
        const after = larger(multiplyExponents(a, c), multiplyExponents(b, c));
        expect(Math.sign(after)).toBe(Math.sign(larger(a, b)));
      }),
    );
  });

  it("has 1 as its smallest monomial", () => {
    const larger = comparer();
    const one = new Uint16Array(ring.variables.length);
    fc.assert(
      fc.property(randomMonomial(ring), (a) => {
        fc.pre(a.some((e) => e > 0));
        expect(larger(a, one)).toBeGreaterThan(0);
      }),
    );
  });

  it("keeps in leading forms what its decisive comparisons leave tied", () => {
    const order = orderOf(ring, phrase);
    fc.assert(
      fc.property(randomPair(ring), ([a, b]) => {
        fc.pre(a.join() !== b.join());
        const terms = [a, b].map((monomial) => ({ monomial, numerator: 1n }));
        const kept = leadingForm(polynomial(ring, terms), order).monomials;
        const sign = Math.sign(decisive(named(a), named(b)));
        const expected = sign === 0 ? [a, b] : [sign > 0 ? a : b];
        expect(kept.map(String).sort()).toEqual(expected.map(String).sort());
      }),
    );
  });

  it("is partial just when its decisive comparisons are fewer, and its stages end with them", () => {
    const order = orderOf(ring, phrase);
    expect(isPartial(order)).toBe(compare !== decisive);
    expect(order.stages.at(-1)).toBe(order.decisive);
    expect([...order.stages].sort((a, b) => a - b)).toEqual(order.stages);
  });

  it("is named by a phrase that reads back to it", () => {
    const order = orderOf(ring, phrase);
    expect(order.phrase).toBe(phrase);
    expect(orderOf(ring, order.phrase)).toEqual(order);
  });
});
