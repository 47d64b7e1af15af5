/** The claim that a generating set is a Gröbner basis of its ideal in an order. */
import { rationalBasis } from "../groebner/rational-basis.js";
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
    const leads = verification.leadingIdeal.generators.map((m) => [m]);
    return { ...claim, witness: undefined, basis: basisSize(leads) };
  }
  const basis =
    basisSeconds > 0
      ? rationalBasis(polynomials, question.order, startBudget({ seconds: basisSeconds }))
      : undefined;
  return {
    ...claim,
    witness: verdict === "fails" ? verification.witness : undefined,
    basis: basis?.kind === "basis" ? basisSize(basis.elements.map((g) => g.monomials)) : undefined,
  };
}

/** Size and largest degree of a reduced basis, from the monomials of its elements. */
function basisSize(elements: readonly (readonly Uint16Array[])[]): BasisSize {
  const degrees = elements.flatMap((monomials) => monomials.map(totalDegree));
  return { size: elements.length, maxDegree: degrees.reduce((a, b) => Math.max(a, b), 0) };
}
