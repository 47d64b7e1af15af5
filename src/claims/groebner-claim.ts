/** The claim that a generating set is a Gröbner basis of its ideal in an order. */
import { largestDegree, rationalBasis } from "../groebner/rational-basis.js";
import { type VerificationWitness, verifyGenerators } from "../groebner/verification.js";
import {
  type Budget,
  isList,
  startBudget,
  type Undecided,
  withinBudget,
} from "../outcomes/budget.js";
import { totalDegree } from "../polynomials/exponents.js";
import { isHomogeneous, type Polynomial } from "../polynomials/polynomial.js";
import { rememberBasis, rememberedBasis } from "./known-basis.js";
import type { Question } from "./question.js";

/** Size and largest degree of the reduced Gröbner basis of the ideal. */
export interface BasisSize {
  readonly size: number;
  readonly maxDegree: number;
}

/** The claim with its verdict, evidence and witness. */
export interface GroebnerClaim extends Question {
  readonly kind: "groebner-claim";
  /** The generators themselves; witnesses point into this list. */
  readonly polynomials: readonly Polynomial[];
  readonly evidence: "proved";
  readonly pairsReduced: number;
  readonly verdict: "holds" | "fails";
  readonly witness: VerificationWitness | undefined;
  /** Of the ideal's reduced basis; undefined when that was not reached. */
  readonly basis: BasisSize | undefined;
}

/**
 * Decides the claim. When it holds, the size of the reduced basis is read off the generators' leading
 * monomials; otherwise the reduced basis is computed for `basisSeconds` at most (0: not at all).
 * @returns `Undecided` when the budget is spent before the verdict.
 */
export function decideGroebner(
  question: Question,
  budget: Budget,
  basisSeconds = 0,
): GroebnerClaim | Undecided {
  const polynomials = withinBudget(() => question.generators.polynomials(budget));
  if (!isList(polynomials)) return polynomials;
  const verification = verifyGenerators(polynomials, question.order, budget);
  if (verification.kind === "undecided") return verification;
  const { verdict, pairsReduced } = verification;
  if (verdict === "holds") rememberBasis(question.ideal, verification.generators);
  const claim = {
    ...question,
    kind: "groebner-claim",
    polynomials,
    evidence: "proved",
    pairsReduced,
    verdict,
  } as const;
  // For graded orders and homogeneous ideals an element's degree is that of its leading monomial.
  const graded = question.order.degreeFirst || polynomials.every(isHomogeneous);
  if (verdict === "holds" && graded) {
    const leads = verification.leadingIdeal.generators;
    const maxDegree = leads.reduce((most, m) => Math.max(most, totalDegree(m)), 0);
    return { ...claim, witness: undefined, basis: { size: leads.length, maxDegree } };
  }
  const known = rememberedBasis(question.ideal);
  const basis =
    basisSeconds > 0
      ? rationalBasis(polynomials, question.order, startBudget({ seconds: basisSeconds }), {
          known,
        })
      : undefined;
  return {
    ...claim,
    witness: verdict === "fails" ? verification.witness : undefined,
    basis:
      basis?.kind === "basis"
        ? { size: basis.rows.length, maxDegree: largestDegree(basis) }
        : undefined,
  };
}
