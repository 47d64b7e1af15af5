/** The flat limit of an ideal with everything that is read off it: components, multiplicities, degree. */

import { type PrimaryComponent, primaryComponents } from "../components/primary-components.js";
import type { KnownBasis } from "../groebner/guided-basis.js";
import { verifyGenerators } from "../groebner/verification.js";
import { codimensionOf, degreeOf, hilbertNumerator } from "../hilbert/hilbert-numerator.js";
import { type FlatLimit, flatLimit } from "../limits/flat-limit.js";
import {
  type Budget,
  isList,
  LimitReached,
  type Undecided,
  withinBudget,
} from "../outcomes/budget.js";
import { isSquarefree } from "../polynomials/monomial-ideal.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import { promisedBasis, rememberBasis, rememberedBasis } from "./known-basis.js";
import type { Question } from "./question.js";

/** A flat limit, described. */
export interface LimitDescription extends Question {
  readonly kind: "limit-description";
  readonly evidence: "proved";
  readonly limit: FlatLimit;
  readonly squarefree: boolean;
  readonly codimension: number;
  readonly degree: bigint;
  /** All primary components, embedded ones too; or why the decomposition was not reached. */
  readonly components: readonly PrimaryComponent[] | Undecided;
  /** No embedded component; null when undecided. */
  readonly unmixed: boolean | null;
}

/** Computes and describes the limit. @returns `Undecided` when even the limit was not reached. */
export function describeLimit(question: Question, budget: Budget): LimitDescription | Undecided {
  const polynomials = withinBudget(() => question.generators.polynomials(budget));
  if (!isList(polynomials)) return polynomials;
  const limit = withinBudget(() => {
    const known = helpfulBasis(question, polynomials, budget);
    return flatLimit(polynomials, question.order, budget, { known });
  });
  if (limit.kind === "undecided") return limit;
  const { leadingIdeal, monomial, basis } = limit;
  rememberBasis(question.ideal, basis);
  return withinBudget((): LimitDescription => {
    const numerator = hilbertNumerator(leadingIdeal, budget);
    const components = monomial ? primaryComponents(leadingIdeal, budget) : notMonomial();
    return {
      ...question,
      kind: "limit-description",
      evidence: "proved",
      limit,
      squarefree: monomial && isSquarefree(leadingIdeal),
      codimension: codimensionOf(numerator),
      degree: degreeOf(numerator),
      components,
      unmixed: isList(components) ? components.every((c) => !c.embedded) : null,
    };
  });
}

/**
 * A basis that makes the limit cheap: one that is known already, the generators themselves when they are one, or
 * the one that a theorem promises. Only for the families that have such a theorem: there the checks are short.
 */
function helpfulBasis(
  { ideal, order }: Question,
  polynomials: readonly Polynomial[],
  budget: Budget,
): KnownBasis | undefined {
  const remembered = rememberedBasis(ideal);
  if (remembered !== undefined || ideal.defaultBasis === undefined) return remembered;
  const verification = verifyGenerators(polynomials, order, budget);
  if (verification.kind === "undecided") throw new LimitReached(verification);
  return verification.verdict === "holds" ? verification.generators : promisedBasis(ideal, budget);
}

function notMonomial(): Undecided {
  return {
    kind: "undecided",
    limit: "method",
    reason: "the limit is not a monomial ideal, and only monomial limits are decomposed so far",
  };
}
