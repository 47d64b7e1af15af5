/**
 * From residues back to rationals: Chinese remaindering and rational reconstruction.
 * @source von zur Gathen, Gerhard, *Modern Computer Algebra*, sections 5.4 and 5.10.
 */
import bigInt from "big-integer";
import { absolute, gcd, residue } from "./integers.js";

/** A rational number in lowest terms, denominator positive. */
export interface Rational {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

/**
 * The factors with which many residues are joined: with `m` coprime to the prime p,
 * `join(a, b) ≡ a (mod m)` and `≡ b (mod p)`, in 0 ≤ · < m·p.
 */
export function remainderJoiner(m: bigint, p: number): (a: bigint, b: number) => bigint {
  const prime = BigInt(p);
  const inverse = BigInt(
    bigInt(m % prime)
      .modInv(bigInt(p))
      .toString(),
  );
  return (a, b) => a + m * residue((BigInt(b) - a) * inverse, prime);
}

/**
 * The rational n/d with |n| and d at most √(m/2) that is congruent to `value` modulo `m`, if there is
 * one; it is unique then. Cost: one Euclidean algorithm.
 */
export function rationalReconstruction(value: bigint, m: bigint): Rational | undefined {
  return reconstructWithin(integerSquareRoot(m / 2n), value, m);
}

function reconstructWithin(bound: bigint, value: bigint, m: bigint): Rational | undefined {
  let [r0, r1] = [m, residue(value, m)];
  let [t0, t1] = [0n, 1n];
  while (r1 > bound) {
    const q = r0 / r1;
    [r0, r1] = [r1, r0 - q * r1];
    [t0, t1] = [t1, t0 - q * t1];
  }
  if (t1 === 0n || absolute(t1) > bound || gcd(r1, t1) !== 1n) return undefined;
  return t1 < 0n ? { numerator: -r1, denominator: -t1 } : { numerator: r1, denominator: t1 };
}

/**
 * Rational reconstruction of a list, each tried first with the common denominator found so far, which
 * costs one multiplication. Undefined as soon as one value has no reconstruction.
 * Result: numerators over one positive common denominator, without a common factor: it is the least common
 * multiple of denominators in lowest terms.
 */
export function reconstructTogether(
  values: readonly bigint[],
  m: bigint,
): { readonly numerators: readonly bigint[]; readonly denominator: bigint } | undefined {
  const bound = integerSquareRoot(m / 2n);
  let denominator = 1n;
  const found: Rational[] = [];
  for (const value of values) {
    const shifted = residue(value * denominator, m);
    const signed = shifted > m / 2n ? shifted - m : shifted;
    if (absolute(signed) <= bound && denominator <= bound) {
      found.push({ numerator: signed, denominator });
      continue;
    }
    const rational = reconstructWithin(bound, value, m);
    if (rational === undefined) return undefined;
    denominator *= rational.denominator / gcd(rational.denominator, denominator);
    found.push(rational);
  }
  return { numerators: found.map((r) => r.numerator * (denominator / r.denominator)), denominator };
}

/** The largest integer whose square is at most n ≥ 0, by Newton's iteration. */
export function integerSquareRoot(n: bigint): bigint {
  if (n < 2n) return n;
  let x = 1n << (BigInt(n.toString(2).length + 1) / 2n);
  for (;;) {
    const next = (x + n / x) / 2n;
    if (next >= x) return x;
    x = next;
  }
}
