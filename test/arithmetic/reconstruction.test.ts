import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { absolute, gcd, residue } from "../../src/arithmetic/integers.js";
import {
  integerSquareRoot,
  manyRemaindersJoiner,
  rationalReconstruction,
  reconstructTogether,
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
        const join = manyRemaindersJoiner(1n, PRIMES);
        const residues = PRIMES.map((p) => Number(n % BigInt(p)));
        expect(join(0n, residues)).toBe(n);
      }),
    );
  });

  it("are joined in batches, to what is known already, for small, middling and large primes in any order", () => {
    const primes = [2, 2147483647, 67108859, 3, 67108837, 2147483629, 2147483587, 5, 67108819, 7];
    const modulus = primes.reduce((m, p) => m * BigInt(p), 1n);
    fc.assert(
      fc.property(
        fc.bigInt(0n, modulus - 1n),
        fc.shuffledSubarray(primes, { minLength: primes.length }),
        fc.array(fc.nat(3), { minLength: 1, maxLength: 4 }),
        (n, shuffled, batches) => {
          let [value, m, from] = [0n, 1n, 0];
          for (const size of [...batches, primes.length]) {
            const batch = shuffled.slice(from, from + size);
            const residues = Int32Array.from(batch, (p) => Number(n % BigInt(p)));
            value = manyRemaindersJoiner(m, batch)(value, residues);
            m = batch.reduce((product, p) => product * BigInt(p), m);
            from += batch.length;
            expect(value).toBe(n % m);
          }
          expect(value).toBe(n);
        },
      ),
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

  /** The definition: the extended Euclidean algorithm, one division after the other. */
  function plain(value: bigint, m: bigint): { numerator: bigint; denominator: bigint } | undefined {
    const most = integerSquareRoot(m / 2n);
    let [r0, r1, t0, t1] = [m, residue(value, m), 0n, 1n];
    while (r1 > most) {
      const q = r0 / r1;
      [r0, r1, t0, t1] = [r1, r0 - q * r1, t1, t0 - q * t1];
    }
    if (t1 === 0n || absolute(t1) > most || gcd(r1, t1) !== 1n) return undefined;
    return t1 < 0n ? { numerator: -r1, denominator: -t1 } : { numerator: r1, denominator: t1 };
  }

  it("is that of the plain Euclidean algorithm, for moduli of all sizes", () => {
    const size = fc.integer({ min: 1, max: 1500 });
    const modulus = size.chain((bits) => fc.bigInt(2n ** BigInt(bits), 2n ** BigInt(bits + 1)));
    fc.assert(
      fc.property(modulus, fc.bigInt(0n, 2n ** 1501n), (m, value) => {
        expect(rationalReconstruction(value, m)).toEqual(plain(value, m));
      }),
      { numRuns: 500 },
    );
  });

  it("is that of the plain algorithm where quotients are large, all ones, or digits agree for long", () => {
    const fibonacci = [1n, 1n];
    while (fibonacci.length < 900)
      fibonacci.push((fibonacci.at(-1) ?? 0n) + (fibonacci.at(-2) ?? 0n));
    for (let k = 2; k < 900; k++) {
      const [value, m] = [fibonacci[k - 1] as bigint, fibonacci[k] as bigint];
      expect(rationalReconstruction(value, m)).toEqual(plain(value, m));
      const power = 2n ** BigInt(k);
      for (const near of [1n, 2n, 3n, power - 1n, power + 1n, power << 5n]) {
        const large = power << 300n;
        expect(rationalReconstruction(near, large + 1n)).toEqual(plain(near, large + 1n));
        expect(rationalReconstruction(large - near, large)).toEqual(plain(large - near, large));
      }
    }
  });

  it("of a list is that of its members, whatever the order", () => {
    const part = fc.record({
      n: fc.bigInt(-(2n ** 40n), 2n ** 40n),
      d: fc.bigInt(1n, 2n ** 40n),
    });
    fc.assert(
      fc.property(fc.array(part, { minLength: 1, maxLength: 8 }), (list) => {
        const values = list
          .filter(({ d }) => gcd(d, MODULUS) === 1n)
          .map(({ n, d }) => residue(n * inverse(d, MODULUS), MODULUS));
        const single = values.map((value) => plain(value, MODULUS));
        const together = reconstructTogether(values, MODULUS);
        if (together === undefined) throw new Error("expected a reconstruction");
        single.forEach((rational, k) => {
          if (rational === undefined) throw new Error("expected a reconstruction");
          const numerator = together.numerators[k] as bigint;
          expect(numerator * rational.denominator).toBe(rational.numerator * together.denominator);
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
