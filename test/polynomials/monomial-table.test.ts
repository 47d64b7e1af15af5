import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ExponentOverflow, MAX_EXPONENT } from "../../src/polynomials/exponents.js";
import { gradedRevlex } from "../../src/polynomials/graded-revlex.js";
import { monomialComparer } from "../../src/polynomials/leading-terms.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { ringOfVariables } from "../../src/polynomials/polynomial-ring.js";
import { orderOf } from "../support/reading.js";

function tableOf(count: number): MonomialTable {
  const names = Array.from({ length: count }, (_, i) => `t${i}`);
  return new MonomialTable(gradedRevlex(ringOfVariables(names)));
}

function exponents(count: number, max: number): fc.Arbitrary<Uint16Array> {
  return fc.uint16Array({ minLength: count, maxLength: count, max });
}

describe.each([1, 3, 16, 17, 40, 130])("a monomial table in %i variables", (count) => {
  it("names every monomial once and gives its exponents and degree back", () => {
    fc.assert(
      fc.property(fc.array(exponents(count, 3), { maxLength: 20 }), (list) => {
        const table = tableOf(count);
        const ids = list.map((e) => table.intern(e));
        list.forEach((e, k) => {
          const id = ids[k] as (typeof ids)[number];
          expect(table.intern(e)).toBe(id);
          expect(table.exponents(id)).toEqual(e);
          expect(table.degree(id)).toBe(e.reduce((a, b) => a + b, 0));
        });
        expect(new Set(ids).size).toBe(new Set(list.map(String)).size);
      }),
    );
  });

  it("multiplies, divides and tests divisibility as exponents do", () => {
    const table = tableOf(count);
    fc.assert(
      fc.property(exponents(count, 3), exponents(count, 3), (a, b) => {
        const [ia, ib] = [table.intern(a), table.intern(b)];
        const product = table.product(ia, ib);
        expect(table.exponents(product)).toEqual(a.map((e, v) => e + (b[v] as number)));
        expect(product).toBe(table.intern(table.exponents(product)));
        expect(table.quotient(product, ib)).toBe(ia);
        expect(table.divides(ia, product)).toBe(true);
        expect(table.mask(ia) & ~table.mask(product)).toBe(0);
        expect(table.divides(ia, ib)).toBe(a.every((e, v) => e <= (b[v] as number)));
      }),
    );
  });
});

describe("a monomial table", () => {
  it("keeps names while it grows, and holds many monomials", () => {
    const table = tableOf(3);
    const first = table.intern(Uint16Array.of(1, 2, 3));
    const bytes = table.bytes;
    for (let i = 0; i < 40; i++) {
      for (let j = 0; j < 40; j++) {
        for (let k = 0; k < 40; k++) table.intern(Uint16Array.of(i, j, k));
      }
    }
    expect(table.size).toBe(64_000);
    expect(table.bytes).toBeGreaterThan(bytes);
    expect(table.intern(Uint16Array.of(1, 2, 3))).toBe(first);
    expect(table.exponents(table.one)).toEqual(Uint16Array.of(0, 0, 0));
  });

  it("detects overflow of any exponent and takes everything up to 65,535", () => {
    const table = tableOf(2);
    const large = table.intern(Uint16Array.of(MAX_EXPONENT - 1, 1));
    const x = table.intern(Uint16Array.of(1, 0));
    const y = table.intern(Uint16Array.of(0, 65_534));
    const most = table.product(table.product(large, x), y);
    expect(table.exponents(most)).toEqual(Uint16Array.of(MAX_EXPONENT, MAX_EXPONENT));
    expect(table.degree(most)).toBe(2 * MAX_EXPONENT);
    expect(() => table.product(most, x)).toThrow(ExponentOverflow);
    expect(() => table.product(large, large)).toThrow(ExponentOverflow);
  });

  it.each(["graded revlex", "plain lex", "weights (1,0,2) then graded lex"])(
    "compares by its order: %s",
    (phrase) => {
      const ring = ringOfVariables(["x", "y", "z"]);
      const order = orderOf(ring, phrase);
      const compare = monomialComparer(order);
      const table = new MonomialTable(order);
      fc.assert(
        fc.property(exponents(3, 4), exponents(3, 4), (a, b) => {
          const found = table.compare(table.intern(a), table.intern(b));
          expect(Math.sign(found)).toBe(Math.sign(compare(a, b)));
        }),
      );
    },
  );
});
