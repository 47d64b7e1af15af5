/**
 * Results as plain objects for `--json`: the keys that the commands promise, big integers as strings,
 * polynomials as text that reads back, and the problem itself, so that every output can be run again.
 */

import type { GroebnerClaim } from "../claims/groebner-claim.js";
import type { LimitDescription } from "../claims/limit-description.js";
import type { Question } from "../claims/question.js";
import type { TilingsClaim } from "../claims/tilings-claim.js";
import type { PrimaryComponent } from "../components/primary-components.js";
import { largestDegree } from "../groebner/rational-basis.js";
import { isList } from "../outcomes/budget.js";
import { printMonomial, printPolynomial } from "../polynomials/printing.js";
import { type ProblemDocument, problemDocument } from "../problems/problem-document.js";

/** A JSON object. */
export type Json = Readonly<Record<string, unknown>>;

/** The result of `verify`. */
export function groebnerJson(claim: GroebnerClaim, seconds: number): Json {
  const { ideal, generators, order, witness } = claim;
  return {
    ...head(claim),
    generators: { kind: generators.kind, count: claim.polynomials.length },
    verdict: claim.verdict,
    evidence: claim.evidence,
    ...(witness === undefined
      ? {}
      : {
          witness: {
            pair: witness.pair.map((k) => k + 1),
            pairGenerators: witness.pair.map((k) => {
              const f = claim.polynomials[k];
              return f === undefined ? "" : printPolynomial(f, order);
            }),
            remainder: printPolynomial(witness.remainder, order),
            leadingMonomial: printMonomial(ideal.ring, witness.leadingMonomial),
          },
        }),
    basis: claim.basis ?? null,
    pairsReduced: claim.pairsReduced,
    ...tail(claim, seconds),
  };
}

/** The result of `limit`. */
export function limitJson(description: LimitDescription, seconds: number): Json {
  return { ...limitBody(description), ...tail(description, seconds) };
}

/** The result of `match`. */
export function tilingsClaimJson(claim: TilingsClaim, seconds: number): Json {
  const { description, matching, tilings } = claim;
  const decided = "verdict" in matching ? matching : undefined;
  return {
    ...limitBody(description),
    tilings: {
      kind: claim.tilingKind,
      count: tilings.length,
      weightedCount: String(tilings.length),
    },
    pairs: (decided?.pairs ?? []).map(
      ({ component, tilings: members, multiplicity, expected }) => ({
        component,
        tilings: members.map((k) => tilings[k]?.rows),
        multiplicity: String(multiplicity),
        expected: String(expected),
      }),
    ),
    unmatchedComponents: decided?.unmatchedComponents ?? [],
    unmatchedTilings: (decided?.unmatchedTilings ?? []).map((k) => tilings[k]?.rows),
    verdict: decided?.verdict ?? "undecided",
    ...("reason" in matching ? { reason: matching.reason } : {}),
    ...tail(description, seconds),
  };
}

function limitBody(description: LimitDescription): Json {
  const { limit, ideal, order, components } = description;
  return {
    ...head(description),
    evidence: description.evidence,
    basis: { size: limit.basis.rows.length, maxDegree: largestDegree(limit.basis) },
    limit: {
      generators: limit.generators.map((f) => printPolynomial(f, order)),
      monomial: limit.monomial,
      squarefree: description.squarefree,
      codimension: finite(description.codimension),
      degree: String(description.degree),
    },
    components: isList(components)
      ? components.map((c) => componentJson(c, ideal.ring.variables))
      : [],
    ...(isList(components) ? {} : { undecided: components.reason }),
    unmixed: description.unmixed,
  };
}

function componentJson(component: PrimaryComponent, names: readonly string[]): Json {
  return {
    variables: component.prime.map((v) => names[v]),
    equations: [],
    codimension: component.codimension,
    degree: String(component.degree),
    multiplicity: component.multiplicity === null ? null : String(component.multiplicity),
    embedded: component.embedded,
  };
}

function head({ ideal, order }: Question): Json {
  return { ideal: ideal.name, order: order.phrase };
}

function tail(question: Question, seconds: number): { problem: ProblemDocument; seconds: number } {
  return { problem: problemDocument(question), seconds: Math.round(seconds * 1000) / 1000 };
}

/** The unit ideal has no codimension: null. */
function finite(codimension: number): number | null {
  return Number.isFinite(codimension) ? codimension : null;
}
