/**
 * Prime fields with primes below 2³¹, as a record of functions over residues 0 ≤ a < p. Residues are
 * plain doubles: a product of two 31-bit numbers is split at 16 bits so that every intermediate
 * value stays below 2⁵³. The row kernels have faster loops of their own.
 */
import bigInt from "big-integer";
import { residue } from "./integers.js";

declare const residueBrand: unique symbol;
/** An element of a prime field, an integer 0 ≤ a < p. */
export type Residue = number & { readonly [residueBrand]: true };

/** The field with p elements. */
export interface PrimeField {
  readonly prime: number;
  readonly zero: Residue;
  readonly one: Residue;
  add(a: Residue, b: Residue): Residue;
  subtract(a: Residue, b: Residue): Residue;
  negate(a: Residue): Residue;
  multiply(a: Residue, b: Residue): Residue;
  /** @throws RangeError for 0. */
  invert(a: Residue): Residue;
  /** The residue of any integer. */
  fromInteger(a: number | bigint): Residue;
  /** The representative of least absolute value. */
  toSigned(a: Residue): number;
}

/** One more than the largest prime of a field. */
export const PRIME_LIMIT = 2 ** 31;

/**
 * The field with p elements.
 * @throws RangeError unless p is a prime below 2³¹.
 */
export function primeField(p: number): PrimeField {
  if (!Number.isInteger(p) || p < 2 || p >= PRIME_LIMIT || !bigInt(p).isPrime()) {
    throw new RangeError(`expected a prime below 2^31, got ${p}`);
  }
  const multiply = (a: Residue, b: Residue): Residue => multiplyModulo(a, b, p) as Residue;
  return {
    prime: p,
    zero: 0 as Residue,
    one: 1 as Residue,
    add: (a, b) => (a + b >= p ? a + b - p : a + b) as Residue,
    subtract: (a, b) => (a >= b ? a - b : a - b + p) as Residue,
    negate: (a) => (a === 0 ? 0 : p - a) as Residue,
    multiply,
    invert(a) {
      if (a === 0) throw new RangeError("expected a non-zero residue, got 0");
      return invertModulo(a, p) as Residue;
    },
    fromInteger(a) {
      if (typeof a === "bigint") return Number(residue(a, BigInt(p))) as Residue;
      const r = a % p;
      return (r < 0 ? r + p : r) as Residue;
    },
    toSigned: (a) => (a > p / 2 ? a - p : a),
  };
}

/** a·b modulo p, for 0 ≤ a, b < p < 2³¹. */
function multiplyModulo(a: number, b: number, p: number): number {
  const high = ((a >>> 16) * b) % p;
  return (high * 65_536 + (a & 0xffff) * b) % p;
}

/** The inverse of a modulo p by the extended Euclidean algorithm. */
function invertModulo(a: number, p: number): number {
  let [r0, r1] = [p, a];
  let [t0, t1] = [0, 1];
  while (r1 !== 0) {
    const q = Math.floor(r0 / r1);
    [r0, r1] = [r1, r0 - q * r1];
    [t0, t1] = [t1, t0 - q * t1];
  }
  return t0 < 0 ? t0 + p : t0;
}
