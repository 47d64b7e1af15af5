import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { absolute, gcd, residue } from "../../src/arithmetic/integers.js";
import {
  integerSquareRoot,
  rationalReconstruction,
  reconstructTogether,
  remainderJoiner,
} from "../../src/arithmetic/reconstruction.js";

const PRIMES = [67108859, 67108837, 67108819, 67108777, 67108763, 67108747];
const MODULUS = PRIMES.reduce((m, p) => m * BigInt(p), 1n);

function inverse(a: bigint, m: bigint): bigint {
  let [r0, r1, t0, t1] = [m, residue(a, m), 0n, 1n];
  while (r1 !== 0n) {
    const q = r0 / r1;
    [r0, r1, t0, t1] = [r1, r0 - q * r1, t1, t0 - q * t1];
  }
  return residue(t0, m);
}

describe("integers", () => {
  it("have a greatest common divisor that divides both and is divided by every common divisor", () => {
    fc.assert(
      fc.property(
        fc.bigInt(-1000n, 1000n),
        fc.bigInt(-1000n, 1000n),
        fc.bigInt(1n, 50n),
        (a, b, c) => {
          const g = gcd(a * c, b * c);
          expect(g >= 0n).toBe(true);
          expect(g).toBe(gcd(b * c, a * c));
          expect(g).toBe(gcd(a, b) * c);
          if (g > 0n) expect([(a * c) % g, (b * c) % g]).toEqual([0n, 0n]);
        },
      ),
    );
    expect(gcd(0n, 0n)).toBe(0n);
    expect(gcd(0n, -6n)).toBe(6n);
    expect(absolute(-5n)).toBe(5n);
    expect(absolute(5n)).toBe(5n);
    expect(residue(-7n, 5n)).toBe(3n);
  });

  it("have integer square roots", () => {
    fc.assert(
      fc.property(fc.bigInt(0n, 2n ** 300n), (n) => {
        const root = integerSquareRoot(n);
        expect(root * root <= n).toBe(true);
        expect((root + 1n) * (root + 1n) > n).toBe(true);
      }),
    );
    expect([0n, 1n, 2n, 3n, 4n, 15n, 16n].map(integerSquareRoot)).toEqual([
      0n,
      1n,
      1n,
      1n,
      2n,
      3n,
      4n,
    ]);
  });
});

describe("Chinese remainders", () => {
  it("are joined to the one class that has them all", () => {
    fc.assert(
      fc.property(fc.bigInt(0n, MODULUS - 1n), (n) => {
        let [value, modulus] = [0n, 1n];
        for (const p of PRIMES) {
          value = remainderJoiner(modulus, p)(value, Number(n % BigInt(p)));
          modulus *= BigInt(p);
        }
        expect(value).toBe(n);
      }),
    );
  });
});

describe("rational reconstruction", () => {
  const bound = integerSquareRoot(MODULUS / 2n);

  it("finds every fraction within the bound", () => {
    fc.assert(
      fc.property(fc.bigInt(-bound, bound), fc.bigInt(1n, bound), (n, d) => {
        if (gcd(d, MODULUS) !== 1n) return;
        const g = gcd(n, d);
        expect(rationalReconstruction(residue(n * inverse(d, MODULUS), MODULUS), MODULUS)).toEqual({
          numerator: n / g,
          denominator: d / g,
        });
      }),
    );
  });

  it("finds nothing where there is nothing: the number of classes with a fraction modulo a small m", () => {
    // By brute force: all fractions with |n|, d ≤ √(m/2), listed and compared class by class.
    const m = 101n;
    const small = integerSquareRoot(m / 2n);
    const classes = new Map<bigint, string>();
    for (let d = 1n; d <= small; d++) {
      for (let n = -small; n <= small; n++) {
        if (gcd(n, d) === 1n) classes.set(residue(n * inverse(d, m), m), `${n}/${d}`);
      }
    }
    for (let value = 0n; value < m; value++) {
      const found = rationalReconstruction(value, m);
      expect(found && `${found.numerator}/${found.denominator}`).toBe(classes.get(value));
    }
  });

  it("of a list puts everything over one denominator in lowest terms", () => {
    const fraction = fc.record({ n: fc.bigInt(-(10n ** 9n), 10n ** 9n), d: fc.bigInt(1n, 1000n) });
    fc.assert(
      fc.property(fc.array(fraction, { minLength: 1, maxLength: 6 }), (list) => {
        const values = list.map(({ n, d }) => residue(n * inverse(d, MODULUS), MODULUS));
        const found = reconstructTogether(values, MODULUS);
        if (found === undefined) throw new Error("expected a reconstruction");
        list.forEach(({ n, d }, k) => {
          expect((found.numerators[k] as bigint) * d).toBe(n * found.denominator);
        });
        const common = found.numerators.reduce(gcd, found.denominator);
        expect(common).toBe(1n);
        expect(found.denominator > 0n).toBe(true);
      }),
    );
  });

  it("of a list fails as soon as one value has no fraction", () => {
    expect(reconstructTogether([1n, 38n], 101n)).toBeUndefined();
    expect(rationalReconstruction(38n, 101n)).toBeUndefined();
    expect(reconstructTogether([1n, 100n], 101n)).toEqual({
      numerators: [1n, -1n],
      denominator: 1n,
    });
  });
});
