import bigInt from "big-integer";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { PRIME_LIMIT, primeField, type Residue } from "../../src/arithmetic/prime-field.js";

const PRIMES = [2, 3, 5, 32003, 67108859, 1073741789, 2147483629, 2147483647];

describe.each(PRIMES)("the field of %i elements", (p) => {
  const field = primeField(p);
  const residue = fc.oneof(
    fc.integer({ min: 0, max: p - 1 }),
    fc.constantFrom(0, 1, p - 1, Math.floor(p / 2)),
  ) as fc.Arbitrary<Residue>;

  it("agrees with big integers", () => {
    fc.assert(
      fc.property(residue, residue, fc.bigInt(-(2n ** 200n), 2n ** 200n), (a, b, n) => {
        const m = BigInt(p);
        expect(BigInt(field.multiply(a, b))).toBe((BigInt(a) * BigInt(b)) % m);
        expect(BigInt(field.add(a, b))).toBe((BigInt(a) + BigInt(b)) % m);
        expect(BigInt(field.fromInteger(n))).toBe(((n % m) + m) % m);
        if (a !== 0) expect(field.invert(a)).toBe(bigInt(a).modInv(p).toJSNumber());
      }),
    );
  });

  it("takes representatives of least absolute value", () => {
    fc.assert(
      fc.property(residue, (a) => {
        const signed = field.toSigned(a);
        expect(Math.abs(signed) * 2).toBeLessThanOrEqual(p);
        expect(field.fromInteger(signed)).toBe(a);
      }),
    );
  });

  it("does not invert 0", () => {
    expect(() => field.invert(field.zero)).toThrow(
      new RangeError("expected a non-zero residue, got 0"),
    );
  });
});

describe("primeField", () => {
  it.each([0, 1, 4, -3, 2.5, 67108863, PRIME_LIMIT, 2147483659, Number.NaN])(
    "refuses %d, which is no prime below 2^31",
    (p) => {
      expect(() => primeField(p)).toThrow(RangeError);
      expect(() => primeField(p)).toThrow(`expected a prime below 2^31, got ${p}`);
    },
  );
});
