/**
 * The numerator K(t) of the Hilbert series K(t)/(1−t)^n of R/J for a monomial ideal J, by splitting at a
 * variable: K(J) = (1−t)·K(J without the generators at x) + t·K(J : x). Any J is polarised first, with one
 * weighted bit for each exponent that occurs, so that all work is on bitsets. Coefficients are doubles;
 * one beyond 2⁵² ends the computation as undecided.
 * @source Bigatti, Caboara, Robbiano, *On the computation of Hilbert–Poincaré series*, AAECC 2 (1991).
 */
import { type Budget, LimitReached } from "../outcomes/budget.js";
import type { MonomialIdeal } from "../polynomials/monomial-ideal.js";
import { type BitIdeal, polarise } from "./polarisation.js";

/** Coefficients of a polynomial in t, constant term first; the zero polynomial is empty. */
export type Coefficients = readonly number[];

const EXACT_LIMIT = 2 ** 52;

/**
 * The numerator K(t) over (1−t)^n, n the number of variables; 0 for the unit ideal, 1 for the zero ideal.
 * @throws LimitReached when the budget is spent or a coefficient grows too large.
 */
export function hilbertNumerator(ideal: MonomialIdeal, budget: Budget): Coefficients {
  return numerator(polarise(ideal), budget);
}

/**
 * The codimension of J and the reduced numerator h(t), K(t) = h(t)·(1−t)^codimension, h(1) ≠ 0. The unit
 * ideal has codimension infinity and h = 0.
 */
export function reducedNumerator(numeratorOfSeries: Coefficients): {
  readonly codimension: number;
  readonly h: Coefficients;
} {
  let h = [...numeratorOfSeries];
  if (h.length === 0) return { codimension: Infinity, h };
  let codimension = 0;
  while (valueAtOne(h) === 0) {
    // Division by 1−t: the partial sums of the coefficients.
    let sum = 0;
    h = h.map((c) => {
      sum = exact(sum + c);
      return sum;
    });
    trim(h);
    codimension++;
  }
  return { codimension, h };
}

/** The degree h(1) of R/J, read off the numerator; 0 for the unit ideal. */
export function degreeOf(numeratorOfSeries: Coefficients): bigint {
  return reducedNumerator(numeratorOfSeries).h.reduce((sum, c) => sum + BigInt(c), 0n);
}

/** The codimension of J, read off the numerator; infinity for the unit ideal. */
export function codimensionOf(numeratorOfSeries: Coefficients): number {
  return reducedNumerator(numeratorOfSeries).codimension;
}

function numerator(ideal: BitIdeal, budget: Budget): number[] {
  budget.spend(() => `Hilbert numerator of ${ideal.generators.length} monomials`);
  if (ideal.generators.length === 0) return [1];
  if (ideal.generators.some((g) => g.every((word) => word === 0))) return [];
  const pivot = mostFrequentBit(ideal);
  if (pivot.count === 1) return coprimeNumerator(ideal);
  const weight = ideal.weights[pivot.bit] as number;
  const word = pivot.bit >> 5;
  const flag = 1 << (pivot.bit & 31);
  const without: Int32Array[] = [];
  const divided: Int32Array[] = [];
  for (const g of ideal.generators) {
    if (((g[word] as number) & flag) === 0) {
      without.push(g);
      continue;
    }
    const quotient = g.slice();
    quotient[word] = (g[word] as number) & ~flag;
    divided.push(quotient);
  }
  const kept = without.filter((g) => !divided.some((d) => isSubset(d, g)));
  const beside = numerator({ ...ideal, generators: without }, budget);
  const below = numerator({ ...ideal, generators: [...divided, ...kept] }, budget);
  return combine(beside, below, weight);
}

/** beside·(1−t^w) + t^w·below. */
function combine(beside: readonly number[], below: readonly number[], weight: number): number[] {
  const sum = new Array<number>(Math.max(beside.length, below.length) + weight).fill(0);
  beside.forEach((c, d) => {
    sum[d] = exact((sum[d] as number) + c);
    sum[d + weight] = exact((sum[d + weight] as number) - c);
  });
  below.forEach((c, d) => {
    sum[d + weight] = exact((sum[d + weight] as number) + c);
  });
  return trim(sum);
}

function coprimeNumerator(ideal: BitIdeal): number[] {
  let product = [1];
  for (const g of ideal.generators) {
    let degree = 0;
    ideal.weights.forEach((weight, bit) => {
      if (((g[bit >> 5] as number) & (1 << (bit & 31))) !== 0) degree += weight;
    });
    product = combine(product, [], degree);
  }
  return product;
}

function mostFrequentBit(ideal: BitIdeal): { readonly bit: number; readonly count: number } {
  const counts = new Int32Array(ideal.weights.length);
  for (const g of ideal.generators) {
    g.forEach((word, k) => {
      for (let rest = word; rest !== 0; rest &= rest - 1) {
        const bit = 32 * k + 31 - Math.clz32(rest & -rest);
        counts[bit] = (counts[bit] as number) + 1;
      }
    });
  }
  let best = 0;
  counts.forEach((count, bit) => {
    if (count > (counts[best] as number)) best = bit;
  });
  return { bit: best, count: counts[best] as number };
}

function isSubset(a: Int32Array, b: Int32Array): boolean {
  for (let k = 0; k < a.length; k++) {
    if (((a[k] as number) & ~(b[k] as number)) !== 0) return false;
  }
  return true;
}

function valueAtOne(coefficients: Coefficients): number {
  return coefficients.reduce((sum, c) => exact(sum + c), 0);
}

function trim(coefficients: number[]): number[] {
  while (coefficients.at(-1) === 0) coefficients.pop();
  return coefficients;
}

function exact(value: number): number {
  if (Math.abs(value) > EXACT_LIMIT) {
    const reason = "a coefficient of the Hilbert numerator is beyond 2^52";
    throw new LimitReached({ kind: "undecided", limit: "size", reason });
  }
  return value;
}
