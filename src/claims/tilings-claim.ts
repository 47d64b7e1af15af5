/** The claim that the components of a limit are the tilings of a permutation, with multiplicities. */
import type { Permutation } from "../combinatorics/permutation.js";
import { type Budget, isList, type Undecided, withinBudget } from "../outcomes/budget.js";
import { minorTerms } from "../polynomials/orders.js";
import type { PolynomialRing, VariableIndex } from "../polynomials/polynomial-ring.js";
import type { TermOrder } from "../polynomials/term-order.js";
import type { Tiling, TilingKind } from "../tilings/tiling.js";
import { tilingKinds } from "../tilings/tiling-kinds.js";
import { describeLimit, type LimitDescription } from "./limit-description.js";
import type { Question } from "./question.js";
import { matchSubspaces, type SubspaceMatching } from "./subspace-matching.js";

/** A limit matched with tilings; the matching is `Undecided` when components or tilings were not reached. */
export interface TilingsClaim {
  readonly kind: "tilings-claim";
  readonly description: LimitDescription;
  readonly tilingKind: TilingKind;
  readonly tilings: readonly Tiling[];
  readonly matching: SubspaceMatching | Undecided;
}

/** A question about an ideal with a permutation, whose tilings fill its first matrix of variables. */
export interface TilingsQuestion extends Question {
  readonly permutation: Permutation;
  readonly tilingKind: TilingKind;
}

/**
 * The kind of tilings that an order suggests: ordinary when it takes the antidiagonal terms of all minors,
 * bumpless when it takes the diagonal ones; undefined otherwise.
 */
export function suggestedTilings(order: TermOrder): TilingKind | undefined {
  const [matrix] = order.ring.matrices;
  if (matrix === undefined || matrix.rows < 2 || matrix.columns < 2) return "ordinary";
  const terms = minorTerms(order, matrix);
  if (terms === "neither") return undefined;
  return terms === "antidiagonal" ? "ordinary" : "bumpless";
}

/**
 * Decides whether the minimal components of the limit are the subspaces of the tilings, each with as many
 * tilings as its multiplicity, in both directions. @returns `Undecided` when the limit was not reached.
 */
export function matchTilings(question: TilingsQuestion, budget: Budget): TilingsClaim | Undecided {
  const description = describeLimit(question, budget);
  if (description.kind === "undecided") return description;
  const family = tilingKinds[question.tilingKind];
  const listed = withinBudget(() => [...family.enumerate(question.permutation, budget)]);
  const claim = {
    kind: "tilings-claim",
    description,
    tilingKind: question.tilingKind,
    tilings: isList(listed) ? listed : [],
  } as const;
  if (!isList(listed)) return { ...claim, matching: listed };
  if (!isList(description.components)) return { ...claim, matching: description.components };
  const subspaces = listed.map((tiling) => ({
    vanishing: vanishingVariables(question.ideal.ring, question.tilingKind, tiling),
  }));
  return { ...claim, matching: matchSubspaces(description.components, subspaces) };
}

/** The variables of the ring's first matrix that vanish on the subspace of a tiling. */
function vanishingVariables(
  ring: PolynomialRing,
  kind: TilingKind,
  tiling: Tiling,
): VariableIndex[] {
  const cells = ring.matrices[0]?.cells ?? [];
  return tilingKinds[kind]
    .vanishingCells(tiling)
    .map(({ row, column }) => cells[row - 1]?.[column - 1] as VariableIndex);
}
