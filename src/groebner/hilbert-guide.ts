/**
 * Hilbert-driven runs: the Hilbert function of an ideal is known, from a basis in another order. Before each
 * degree it says how many leading monomials are still missing and in which multidegrees, so that all other
 * pairs of the degree are passed over, and the rest once nothing is missing any more.
 * In the lowest degree where the numerators of two monomial ideals differ, the difference counts the monomials
 * that one has more than the other, since the denominators Π(1−t^deg z) begin with 1.
 * @source Traverso, *Hilbert functions and the Buchberger algorithm*, J. Symb. Comp. 22 (1996).
 */
import {
  degreeOfKey,
  difference,
  gradedNumerator,
  keyOf,
  type PackedGrading,
  packGrading,
  type SparseNumerator,
} from "../hilbert/graded-numerator.js";
import type { Budget } from "../outcomes/budget.js";
import type { Exponents } from "../polynomials/exponents.js";
import type { MonomialIdeal } from "../polynomials/monomial-ideal.js";
import type { Multigrading } from "../polynomials/multigrading.js";

/** What is missing in one degree: a number of leading monomials for each packed multidegree. */
export class Missing {
  readonly #counts: Map<number, number>;
  readonly #grading: PackedGrading;

  constructor(counts: Map<number, number>, grading: PackedGrading) {
    this.#counts = counts;
    this.#grading = grading;
  }

  /** How many are missing in all. */
  get total(): number {
    let total = 0;
    for (const count of this.#counts.values()) total += count;
    return total;
  }

  /** How many are missing in the multidegree of a monomial. */
  at(monomial: Exponents): number {
    return this.#counts.get(keyOf(this.#grading, monomial)) ?? 0;
  }
}

/** The known numerator is computed so many degrees further than asked for. */
const LOOKED_AHEAD = 2;

/** The expectation of one ideal. */
export class HilbertGuide {
  readonly #known: MonomialIdeal;
  readonly #grading: PackedGrading;
  readonly #budget: Budget;
  #target: { readonly upTo: number; readonly numerator: SparseNumerator } | undefined;

  /**
   * @param known the leading monomials of a Gröbner basis of the same ideal in some order
   * @param grading one in which the ideal is homogeneous, beside the total degree
   */
  constructor(known: MonomialIdeal, grading: Multigrading, budget: Budget) {
    this.#known = known;
    this.#grading = packGrading(grading, known.variableCount);
    this.#budget = budget;
  }

  /**
   * What the leading monomials lack in a degree, when they lack nothing in lower ones. Undefined when it cannot be
   * told: the degree is too large to be packed, or there are too many of some already, so that the ideal is
   * another one. @throws LimitReached
   */
  missing(leads: readonly Exponents[], degree: number): Missing | undefined {
    if (degree + LOOKED_AHEAD > this.#grading.largestDegree) return undefined;
    const has = gradedNumerator(leads, this.#grading, degree, this.#budget);
    const lacks = difference(has, this.#numerator(degree));
    for (const [key, count] of lacks) {
      if (count < 0 || degreeOfKey(key) !== degree) return undefined;
    }
    return new Missing(lacks, this.#grading);
  }

  #numerator(degree: number): SparseNumerator {
    if (this.#target === undefined || this.#target.upTo < degree) {
      const upTo = degree + LOOKED_AHEAD;
      const { generators } = this.#known;
      const numerator = gradedNumerator(generators, this.#grading, upTo, this.#budget);
      this.#target = { upTo, numerator };
    }
    const { upTo, numerator } = this.#target;
    if (upTo === degree) return numerator;
    return new Map([...numerator].filter(([key]) => degreeOfKey(key) <= degree));
  }
}
