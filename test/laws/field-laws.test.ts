/**
 * The axioms of a field, run over a table of prime fields: the smallest, a customary one, and those at the
 * edges where the row kernels change their loops (2²⁶) and where residues end (2³¹).
 */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type PrimeField, primeField, type Residue } from "../../src/arithmetic/prime-field.js";

const PRIMES = [2, 3, 5, 7, 101, 32003, 67108859, 67108879, 1073741789, 2147483629, 2147483647];

function residues({ prime }: PrimeField): fc.Arbitrary<Residue> {
  return fc.oneof(
    fc.integer({ min: 0, max: prime - 1 }),
    fc.constantFrom(0, 1, prime - 1, Math.floor(prime / 2), Math.min(65_536, prime - 1)),
  ) as fc.Arbitrary<Residue>;
}

describe.each(PRIMES)("the field of %i elements", (p) => {
  const field = primeField(p);
  const residue = residues(field);

  it("has elements 0 ≤ a < p, closed under every operation", () => {
    fc.assert(
      fc.property(residue, residue, (a, b) => {
        const values = [field.add(a, b), field.subtract(a, b), field.multiply(a, b)];
        if (a !== 0) values.push(field.invert(a));
        for (const c of [...values, field.negate(a), field.zero, field.one]) {
          expect(Number.isInteger(c) && c >= 0 && c < p).toBe(true);
        }
      }),
    );
  });

  it("is a commutative group under addition", () => {
    fc.assert(
      fc.property(residue, residue, residue, (a, b, c) => {
        expect(field.add(a, b)).toBe(field.add(b, a));
        expect(field.add(field.add(a, b), c)).toBe(field.add(a, field.add(b, c)));
        expect(field.add(a, field.zero)).toBe(a);
        expect(field.add(a, field.negate(a))).toBe(field.zero);
        expect(field.subtract(a, b)).toBe(field.add(a, field.negate(b)));
      }),
    );
  });

  it("is a commutative group under multiplication, but for 0", () => {
    fc.assert(
      fc.property(residue, residue, residue, (a, b, c) => {
        expect(field.multiply(a, b)).toBe(field.multiply(b, a));
        expect(field.multiply(field.multiply(a, b), c)).toBe(
          field.multiply(a, field.multiply(b, c)),
        );
        expect(field.multiply(a, field.one)).toBe(a);
        expect(field.multiply(a, field.zero)).toBe(field.zero);
        if (a !== 0) expect(field.multiply(a, field.invert(a))).toBe(field.one);
        if (a !== 0 && b !== 0) expect(field.multiply(a, b)).not.toBe(field.zero);
      }),
    );
  });

  it("is distributive, and the integers map into it", () => {
    const integer = fc.bigInt(-(2n ** 80n), 2n ** 80n);
    fc.assert(
      fc.property(residue, residue, residue, integer, integer, (a, b, c, m, n) => {
        expect(field.multiply(a, field.add(b, c))).toBe(
          field.add(field.multiply(a, b), field.multiply(a, c)),
        );
        const image = (k: bigint): Residue => field.fromInteger(k);
        expect(image(m + n)).toBe(field.add(image(m), image(n)));
        expect(image(m * n)).toBe(field.multiply(image(m), image(n)));
        expect(image(BigInt(p))).toBe(field.zero);
      }),
    );
  });
});
