/** Questions about matrix Schubert ideals, for tests of claims. */
import { decideGroebner, type GroebnerClaim } from "../../src/claims/groebner-claim.js";
import { describeLimit, type LimitDescription } from "../../src/claims/limit-description.js";
import type { Question } from "../../src/claims/question.js";
import type { SubspaceMatching } from "../../src/claims/subspace-matching.js";
import {
  matchTilings,
  suggestedTilings,
  type TilingsClaim,
} from "../../src/claims/tilings-claim.js";
import { type Permutation, readPermutation } from "../../src/combinatorics/permutation.js";
import type { PrimaryComponent } from "../../src/components/primary-components.js";
import { schubertIdeal } from "../../src/families/schubert.js";
import { type Undecided, unlimited } from "../../src/outcomes/budget.js";
import { generatingSet } from "../../src/problems/problem.js";
import type { TilingKind } from "../../src/tilings/tiling.js";
import { accepted, orderOf } from "./reading.js";

/** A question about the ideal of a matrix Schubert variety. */
export function schubertQuestion(
  w: string | Permutation,
  phrase: string,
  generators = "fulton",
): Question & { readonly permutation: Permutation } {
  const permutation = typeof w === "string" ? accepted(readPermutation(w)) : w;
  const ideal = schubertIdeal(permutation);
  return {
    ideal,
    generators: accepted(generatingSet(ideal, generators)),
    order: orderOf(ideal.ring, phrase),
    permutation,
  };
}

/** A result that was decided; a limit fails the test. */
function decided<T extends { readonly kind: string }>(outcome: T | Undecided): T {
  if (outcome.kind === "undecided") throw new Error((outcome as Undecided).reason);
  return outcome as T;
}

/** Is the generating set a Gröbner basis? */
export function groebner(question: Question, basisSeconds = 0): GroebnerClaim {
  return decided(decideGroebner(question, unlimited(), basisSeconds));
}

/** The limit, described. */
export function limit(question: Question): LimitDescription {
  return decided(describeLimit(question, unlimited()));
}

/** The components of a limit that was decomposed. */
export function componentsOf(description: LimitDescription): readonly PrimaryComponent[] {
  const { components } = description;
  if ("reason" in components) throw new Error(components.reason);
  return components;
}

/** The limit matched with tilings, of the kind that the order suggests or of another. */
export function match(
  question: Question & { readonly permutation: Permutation },
  kind?: TilingKind,
): TilingsClaim & { readonly matching: SubspaceMatching } {
  const tilingKind = kind ?? suggestedTilings(question.order);
  if (tilingKind === undefined) throw new Error("expected an order that suggests tilings");
  const claim = decided(matchTilings({ ...question, tilingKind }, unlimited()));
  const { matching } = claim;
  if ("reason" in matching) throw new Error(matching.reason);
  return { ...claim, matching };
}
