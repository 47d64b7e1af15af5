/**
 * The numerator of the Hilbert series of a monomial ideal in a fine grading, up to a given degree: a sparse
 * polynomial, one term a multidegree. Multidegrees are packed into one number, the total degree first, by
 * a generic weight; two may fall together, which makes the grading coarser and nothing else.
 * The splitting is that of `hilbert-numerator.ts`, with generators of too large a degree left out.
 */
import type { Budget } from "../outcomes/budget.js";
import { type Exponents, totalDegree } from "../polynomials/exponents.js";
import type { Multigrading } from "../polynomials/multigrading.js";

/** The distance between total degrees in a key. */
const DEGREE_STEP = 2 ** 36;
/** Up to this total degree keys are exact for weights up to 2²⁴. */
const LARGEST_DEGREE = 2 ** 10;
const LARGEST_WEIGHT = 2 ** 24;

/** A grading packed into one number a monomial: total degree times 2³⁶ plus a weight. */
export interface PackedGrading {
  /** The key of each variable; keys of monomials add up. */
  readonly variableKeys: Float64Array;
  /** The largest total degree for which keys are exact. */
  readonly largestDegree: number;
}

/** Packs a grading: a combination of its weights with fixed pseudo-random coefficients. */
export function packGrading(grading: Multigrading, variableCount: number): PackedGrading {
  const weights = new Float64Array(variableCount);
  let state = 0x2545f491;
  for (const weight of grading.weights) {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    const factor = 1 + (state & 0xffff);
    for (let v = 0; v < variableCount; v++) {
      weights[v] = (weights[v] as number) + factor * (weight[v] as number);
    }
  }
  const exact = weights.every((w) => Math.abs(w) <= LARGEST_WEIGHT);
  return {
    variableKeys: weights.map((w) => DEGREE_STEP + (exact ? w : 0)),
    largestDegree: LARGEST_DEGREE,
  };
}

/** The key of a monomial. */
export function keyOf({ variableKeys }: PackedGrading, monomial: Exponents): number {
  let key = 0;
  for (let v = 0; v < monomial.length; v++) {
    key += (monomial[v] as number) * (variableKeys[v] as number);
  }
  return key;
}

/** The total degree in a key. */
export function degreeOfKey(key: number): number {
  return Math.round(key / DEGREE_STEP);
}

/** Coefficients by key; no zeros. */
export type SparseNumerator = ReadonlyMap<number, number>;

/**
 * The terms of total degree at most `most` of the numerator over Π(1−t^deg z_v).
 * @param generators of the monomial ideal, minimal
 * @throws LimitReached when the budget is spent, RangeError when `most` is too large for the packing
 */
export function gradedNumerator(
  generators: readonly Exponents[],
  grading: PackedGrading,
  most: number,
  budget: Budget,
): SparseNumerator {
  if (most > grading.largestDegree) {
    throw new RangeError(`expected a degree of at most ${grading.largestDegree}, got ${most}`);
  }
  const relevant = generators.filter((g) => totalDegree(g) <= most);
  return new Splitting(grading, budget).numerator(relevant, most);
}

/** What `a` has more than `b`, by key. */
export function difference(a: SparseNumerator, b: SparseNumerator): Map<number, number> {
  const result = new Map(a);
  for (const [key, c] of b) add(result, key, -c);
  return result;
}

class Splitting {
  readonly #grading: PackedGrading;
  readonly #budget: Budget;

  constructor(grading: PackedGrading, budget: Budget) {
    this.#grading = grading;
    this.#budget = budget;
  }

  numerator(generators: readonly Exponents[], most: number): Map<number, number> {
    this.#budget.spend(() => `graded Hilbert numerator of ${generators.length} monomials`);
    const counts = occurrences(generators);
    const linked = generators.filter((g) => g.some((e, v) => e > 0 && (counts[v] as number) > 1));
    const product = linked.length === 0 ? new Map([[0, 1]]) : this.#split(linked, counts, most);
    if (linked.length < generators.length) {
      for (const g of generators) {
        if (!linked.includes(g)) multiplyByFactor(product, keyOf(this.#grading, g), most);
      }
    }
    return product;
  }

  /** By a power of the most frequent variable x: K(J) = K(J + x^e) + t^e·K(J : x^e), e the least exponent. */
  #split(generators: readonly Exponents[], counts: Int32Array, most: number): Map<number, number> {
    let variable = 0;
    for (let v = 1; v < counts.length; v++) {
      if ((counts[v] as number) > (counts[variable] as number)) variable = v;
    }
    const e = leastExponent(generators, variable);
    const key = e * (this.#grading.variableKeys[variable] as number);
    const without = generators.filter((g) => g[variable] === 0);
    const divided: Exponents[] = [];
    for (const g of generators) {
      if (g[variable] === 0) continue;
      const quotient = g.slice();
      quotient[variable] = (g[variable] as number) - e;
      divided.push(quotient);
    }
    const result = this.numerator(without, most);
    multiplyByFactor(result, key, most);
    if (e > most) return result;
    const kept = without.filter((g) => !divided.some((d) => divides(d, g)));
    const below = [...divided, ...kept].filter((g) => totalDegree(g) <= most - e);
    if (below.some((g) => totalDegree(g) === 0)) return result;
    for (const [k, c] of this.numerator(below, most - e)) add(result, k + key, c);
    return result;
  }
}

/** In how many generators each variable occurs. */
function occurrences(generators: readonly Exponents[]): Int32Array {
  const counts = new Int32Array(generators[0]?.length ?? 0);
  for (const g of generators) {
    for (let v = 0; v < g.length; v++) {
      if (g[v] !== 0) counts[v] = (counts[v] as number) + 1;
    }
  }
  return counts;
}

function leastExponent(generators: readonly Exponents[], variable: number): number {
  let least = Infinity;
  for (const g of generators) {
    const e = g[variable] as number;
    if (e > 0 && e < least) least = e;
  }
  return least;
}

/** Multiplies by 1 − t^key, up to the degree. */
function multiplyByFactor(polynomial: Map<number, number>, key: number, most: number): void {
  for (const [k, c] of [...polynomial]) {
    if (degreeOfKey(k + key) <= most) add(polynomial, k + key, -c);
  }
}

function add(polynomial: Map<number, number>, key: number, c: number): void {
  const sum = (polynomial.get(key) ?? 0) + c;
  if (sum === 0) polynomial.delete(key);
  else polynomial.set(key, sum);
}

function divides(a: Exponents, b: Exponents): boolean {
  for (let v = 0; v < a.length; v++) if ((a[v] as number) > (b[v] as number)) return false;
  return true;
}
