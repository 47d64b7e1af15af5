/**
 * The numerator K(t) of the Hilbert series K(t)/(1−t)^n of R/J for a monomial ideal J, by splitting at a
 * variable: K(J) = (1−t)·K(J without the generators at x) + t·K(J : x). Generators that share no variable
 * with any other are split off as factors. Any J is polarised first, with one weighted bit for each exponent
 * that occurs, so that all work is on bitsets.
 * @source Bigatti, Caboara, Robbiano, *On the computation of Hilbert–Poincaré series*, AAECC 2 (1991).
 */
import type { Budget } from "../outcomes/budget.js";
import type { MonomialIdeal } from "../polynomials/monomial-ideal.js";
import {
  asBigints,
  type Coefficients,
  combine,
  type PartialCoefficients,
  trim,
} from "./exact-coefficients.js";
import { type BitIdeal, polarise } from "./polarisation.js";

/**
 * The numerator K(t) over (1−t)^n, n the number of variables; 0 for the unit ideal, 1 for the zero ideal.
 * @throws LimitReached when the budget is spent.
 */
export function hilbertNumerator(ideal: MonomialIdeal, budget: Budget): Coefficients {
  return asBigints(numerator(polarise(ideal), budget));
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
  while (valueAtOne(h) === 0n) {
    // Division by 1−t: the partial sums of the coefficients.
    let sum = 0n;
    h = h.map((c) => {
      sum += c;
      return sum;
    });
    trim(h);
    codimension++;
  }
  return { codimension, h };
}

/** The degree h(1) of R/J, read off the numerator; 0 for the unit ideal. */
export function degreeOf(numeratorOfSeries: Coefficients): bigint {
  return valueAtOne(reducedNumerator(numeratorOfSeries).h);
}

/** The codimension of J, read off the numerator; infinity for the unit ideal. */
export function codimensionOf(numeratorOfSeries: Coefficients): number {
  return reducedNumerator(numeratorOfSeries).codimension;
}

function valueAtOne(coefficients: Coefficients): bigint {
  return coefficients.reduce((sum, c) => sum + c, 0n);
}

function numerator(ideal: BitIdeal, budget: Budget): PartialCoefficients {
  const { generators, weights } = ideal;
  budget.spend(() => `Hilbert numerator of ${generators.length} monomials`);
  if (generators.some(isOne)) return [];
  const counts = bitCounts(ideal);
  const linked: Int32Array[] = [];
  const factors: Int32Array[] = [];
  for (const g of generators) (hasRepeatedBit(g, counts) ? linked : factors).push(g);
  let product: PartialCoefficients =
    linked.length === 0 ? [1] : split({ weights, generators: linked }, counts, budget);
  for (const g of factors) product = combine(product, [], degreeOfBits(g, weights));
  return product;
}

/** The numerator by the two halves of the splitting at the most frequent bit. */
function split(ideal: BitIdeal, counts: Int32Array, budget: Budget): PartialCoefficients {
  const { generators, weights } = ideal;
  const stage = (): string => `Hilbert numerator of ${generators.length} monomials`;
  const bit = mostFrequent(counts);
  const word = bit >> 5;
  const flag = 1 << (bit & 31);
  const without: Int32Array[] = [];
  const divided: Int32Array[] = [];
  for (const g of generators) {
    // Long lists take long: once a generator keeps the budget's looks at the clock close together.
    budget.spend(stage);
    if (((g[word] as number) & flag) === 0) {
      without.push(g);
      continue;
    }
    const quotient = g.slice();
    quotient[word] = (g[word] as number) & ~flag;
    divided.push(quotient);
  }
  const kept = without.filter((g) => {
    budget.spend(stage);
    return !divided.some((d) => isSubset(d, g));
  });
  const beside = numerator({ weights, generators: without }, budget);
  const below = numerator({ weights, generators: [...divided, ...kept] }, budget);
  return combine(beside, below, weights[bit] as number);
}

function mostFrequent(counts: Int32Array): number {
  let best = 0;
  for (let bit = 1; bit < counts.length; bit++) {
    if ((counts[bit] as number) > (counts[best] as number)) best = bit;
  }
  return best;
}

/** How many generators have each bit. */
function bitCounts({ weights, generators }: BitIdeal): Int32Array {
  const counts = new Int32Array(weights.length);
  for (const g of generators) {
    for (let k = 0; k < g.length; k++) {
      for (let rest = g[k] as number; rest !== 0; rest &= rest - 1) {
        const bit = lowestBit(k, rest);
        counts[bit] = (counts[bit] as number) + 1;
      }
    }
  }
  return counts;
}

function hasRepeatedBit(g: Int32Array, counts: Int32Array): boolean {
  for (let k = 0; k < g.length; k++) {
    for (let rest = g[k] as number; rest !== 0; rest &= rest - 1) {
      if ((counts[lowestBit(k, rest)] as number) > 1) return true;
    }
  }
  return false;
}

function degreeOfBits(g: Int32Array, weights: readonly number[]): number {
  let degree = 0;
  for (let k = 0; k < g.length; k++) {
    for (let rest = g[k] as number; rest !== 0; rest &= rest - 1) {
      degree += weights[lowestBit(k, rest)] as number;
    }
  }
  return degree;
}

/** The index of the lowest bit set in the rest of word k. */
function lowestBit(k: number, rest: number): number {
  return 32 * k + 31 - Math.clz32(rest & -rest);
}

function isOne(g: Int32Array): boolean {
  for (let k = 0; k < g.length; k++) if (g[k] !== 0) return false;
  return true;
}

function isSubset(a: Int32Array, b: Int32Array): boolean {
  for (let k = 0; k < a.length; k++) {
    if (((a[k] as number) & ~(b[k] as number)) !== 0) return false;
  }
  return true;
}
