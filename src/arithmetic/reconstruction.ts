/**
 * From residues back to rationals: Chinese remaindering, many primes at a time, and rational
 * reconstruction by a Euclidean algorithm whose quotients are found from leading digits (Lehmer,
 * *Euclid's algorithm for large numbers*, Amer. Math. Monthly 45, 1938), some twenty of them for the price
 * of a few products of long integers.
 * @source von zur Gathen, Gerhard, *Modern Computer Algebra*, sections 5.4 and 5.10.
 */
import { absolute, gcd, residue } from "./integers.js";

/** A rational number in lowest terms, denominator positive. */
export interface Rational {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

/**
 * Joins residues modulo several primes with what is known modulo m: the result is ≡ `known` (mod m) and
 * ≡ `residues[k]` (mod primes[k]), in 0 ≤ · < m·Π primes. All must be coprime. Cost a value: a product of
 * a long and a short integer for every two primes below 2²⁶, and one division.
 */
export function manyRemaindersJoiner(
  m: bigint,
  primes: readonly number[],
): (known: bigint, residues: ArrayLike<number>) => bigint {
  const parts = pairsOfPrimes(primes);
  const modulus = parts.reduce((product, part) => product * BigInt(part.modulus), m);
  /** ≡ 1 modulo the part, ≡ 0 modulo all others. */
  const idempotent = (part: bigint): bigint => {
    const others = modulus / part;
    return others * inverseModulo(residue(others, part), part);
  };
  const ofKnown = m === 1n ? 0n : idempotent(m);
  const ofParts = parts.map((part) => idempotent(BigInt(part.modulus)));
  return (known, residues) => {
    let sum = known * ofKnown;
    for (let k = 0; k < parts.length; k++) {
      const value = (parts[k] as PrimePair).join(residues);
      if (value !== 0) sum += BigInt(value) * (ofParts[k] as bigint);
    }
    return sum % modulus;
  };
}

/** One prime, or two below 2²⁶, so that residues are joined in doubles. */
interface PrimePair {
  readonly modulus: number;
  readonly join: (residues: ArrayLike<number>) => number;
}

const PAIRED_PRIME_LIMIT = 2 ** 26;

function pairsOfPrimes(primes: readonly number[]): PrimePair[] {
  const parts: PrimePair[] = [];
  for (let k = 0; k < primes.length; k++) {
    const first = k;
    const p = primes[k] as number;
    const q = primes[k + 1];
    if (q === undefined || p >= PAIRED_PRIME_LIMIT || q >= PAIRED_PRIME_LIMIT) {
      parts.push({ modulus: p, join: (residues) => residues[first] as number });
      continue;
    }
    const inverse = Number(inverseModulo(BigInt(p % q), BigInt(q)));
    const join = (residues: ArrayLike<number>): number => {
      const a = residues[first] as number;
      const difference = ((residues[first + 1] as number) - a) % q;
      return a + p * (((difference < 0 ? difference + q : difference) * inverse) % q);
    };
    parts.push({ modulus: p * q, join });
    k++;
  }
  return parts;
}

/** The inverse of a modulo m, for coprime 0 ≤ a < m. */
function inverseModulo(a: bigint, m: bigint): bigint {
  let [r0, r1, t0, t1] = [m, a, 0n, 1n];
  while (r1 !== 0n) {
    const q = r0 / r1;
    [r0, r1, t0, t1] = [r1, r0 - q * r1, t1, t0 - q * t1];
  }
  return residue(t0, m);
}

/**
 * The rational n/d with |n| and d at most √(m/2) that is congruent to `value` modulo `m`, if there is
 * one; it is unique then. Cost: one Euclidean algorithm.
 */
export function rationalReconstruction(value: bigint, m: bigint): Rational | undefined {
  return reconstructWithin(integerSquareRoot(m / 2n), value, m);
}

function reconstructWithin(bound: bigint, value: bigint, m: bigint): Rational | undefined {
  const { r1, t1 } = firstRemainderWithin(bound, residue(value, m), m);
  if (t1 === 0n || absolute(t1) > bound || gcd(r1, t1) !== 1n) return undefined;
  return t1 < 0n ? { numerator: -r1, denominator: -t1 } : { numerator: r1, denominator: t1 };
}

/** Leading digits of this many bits are looked at, */
const DIGIT_BITS = 52;
/** and as many quotients taken as keep cofactors below this. */
const LARGEST_COFACTOR = 2 ** 25;
/** A round of quotients shortens remainders by fewer bits than this. */
const BITS_OF_ROUND = 28;

/**
 * The Euclidean algorithm on m and `value` up to the first remainder r1 ≤ bound, with t1·value ≡ r1 (mod m).
 * Rounds by leading digits while they cannot pass the end, single divisions then.
 */
function firstRemainderWithin(
  bound: bigint,
  value: bigint,
  m: bigint,
): { readonly r1: bigint; readonly t1: bigint } {
  let [r0, r1] = [m, value];
  let [t0, t1] = [0n, 1n];
  let bits = bitLength(m);
  const lastRound = Math.max(bitLength(bound) + BITS_OF_ROUND, DIGIT_BITS + 1);
  while (r1 > bound) {
    const round = bits > lastRound ? quotientsFromDigits(r0, r1, bits - DIGIT_BITS) : undefined;
    if (round === undefined) {
      const q = r0 / r1;
      [r0, r1] = [r1, r0 - q * r1];
      [t0, t1] = [t1, t0 - q * t1];
    } else {
      const [a, b, c, d] = round.map(BigInt) as [bigint, bigint, bigint, bigint];
      [r0, r1] = [a * r0 + b * r1, c * r0 + d * r1];
      [t0, t1] = [a * t0 + b * t1, c * t0 + d * t1];
    }
    while (bits > DIGIT_BITS && r0 >> BigInt(bits - 1) === 0n) bits = shortened(r0, bits);
  }
  return { r1, t1 };
}

/** The bit length of r, known to be less than `bits`; too large still when it is less by more than a digit. */
function shortened(r: bigint, bits: number): number {
  const shift = Math.max(0, bits - DIGIT_BITS);
  const top = Number(r >> BigInt(shift));
  const high = Math.floor(top / 2 ** 32);
  return shift + (high === 0 ? 32 - Math.clz32(top) : 64 - Math.clz32(high));
}

/**
 * The matrix (a b; c d) of the quotients of (r0, r1) that their leading digits determine, by Collins's
 * condition; undefined when they do not determine even the first one.
 */
function quotientsFromDigits(
  r0: bigint,
  r1: bigint,
  shift: number,
): [number, number, number, number] | undefined {
  let x = Number(r0 >> BigInt(shift));
  let y = Number(r1 >> BigInt(shift));
  let [a, b, c, d] = [1, 0, 0, 1];
  for (;;) {
    // The true quotient is between those of (x + b)/(y + d) and (x + a)/(y + c), in one order or the other.
    if (y + c <= 0 || y + d <= 0) break;
    const q = Math.floor((x + a) / (y + c));
    if (q !== Math.floor((x + b) / (y + d))) break;
    const [nextC, nextD] = [a - q * c, b - q * d];
    if (Math.abs(nextC) > LARGEST_COFACTOR || Math.abs(nextD) > LARGEST_COFACTOR) break;
    [a, b, c, d] = [c, d, nextC, nextD];
    [x, y] = [y, x - q * y];
  }
  return b === 0 ? undefined : [a, b, c, d];
}

function bitLength(n: bigint): number {
  const digits = n.toString(16);
  return 4 * digits.length - Math.clz32(Number.parseInt(digits[0] as string, 16)) + 28;
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
  const half = m / 2n;
  const bound = integerSquareRoot(half);
  let denominator = 1n;
  const found: Rational[] = [];
  for (const value of values) {
    const shifted = residue(denominator === 1n ? value : value * denominator, m);
    const signed = shifted > half ? shifted - m : shifted;
    if (signed <= bound && -signed <= bound && denominator <= bound) {
      found.push({ numerator: signed, denominator });
      continue;
    }
    const rational = reconstructWithin(bound, value, m);
    if (rational === undefined) return undefined;
    denominator *= rational.denominator / gcd(rational.denominator, denominator);
    found.push(rational);
  }
  const numerators = found.map((r) =>
    r.denominator === denominator ? r.numerator : r.numerator * (denominator / r.denominator),
  );
  return { numerators, denominator };
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
