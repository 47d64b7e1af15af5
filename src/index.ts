/**
 * Flatlimit as a library: state an ideal, decide whether generators are a Gröbner basis, compute the flat
 * limit and its components, enumerate tilings, match both.
 *
 * ```ts
 * const ideal = readFamilyIdeal("schubert:2143");
 * if (ideal.ok) {
 *   const order = readOrder("lex from nw by rows", ideal.value.ring);
 *   if (order.ok) {
 *     const question = { ideal: ideal.value, generators: ideal.value.generatingSets[0], order: order.value };
 *     console.log(decideGroebner(question, startBudget({ seconds: 60 })));
 *   }
 * }
 * ```
 */
export { type BasisSize, decideGroebner, type GroebnerClaim } from "./claims/groebner-claim.js";
export { describeLimit, type LimitDescription } from "./claims/limit-description.js";
export type { Question } from "./claims/question.js";
export type { MatchedPair, SubspaceMatching } from "./claims/subspace-matching.js";
export {
  matchTilings,
  suggestedTilings,
  type TilingsClaim,
  type TilingsQuestion,
} from "./claims/tilings-claim.js";
export type { Cell } from "./combinatorics/cell.js";
export type { CornerRanks, RankBound } from "./combinatorics/corner-ranks.js";
export { containsPattern } from "./combinatorics/pattern-containment.js";
export {
  type Permutation,
  permutation,
  permutationsOf,
  printPermutation,
  readPermutation,
} from "./combinatorics/permutation.js";
export { type PrimaryComponent, primaryComponents } from "./components/primary-components.js";
export type { GeneratingSet, Ideal } from "./families/ideal.js";
export { readFamilyIdeal } from "./families/registry.js";
export { schubertIdeal } from "./families/schubert.js";
export { type ModularBasis, modularBasis } from "./groebner/modular-basis.js";
export { type RationalBasis, rationalBasis } from "./groebner/rational-basis.js";
export {
  type Verification,
  type VerificationWitness,
  verifyGenerators,
} from "./groebner/verification.js";
export { type FlatLimit, flatLimit } from "./limits/flat-limit.js";
export {
  type Budget,
  type BudgetOptions,
  startBudget,
  type Undecided,
  unlimited,
} from "./outcomes/budget.js";
export type { InputFault, Place, Reading } from "./outcomes/input-fault.js";
export { type MonomialIdeal, monomialIdeal } from "./polynomials/monomial-ideal.js";
export { readOrder } from "./polynomials/order-phrase.js";
export type { Polynomial } from "./polynomials/polynomial.js";
export {
  type PolynomialRing,
  ringOfMatrices,
  ringOfVariables,
  type VariableIndex,
} from "./polynomials/polynomial-ring.js";
export { printMonomial, printPolynomial } from "./polynomials/printing.js";
export { type PolynomialSource, readPolynomial } from "./polynomials/reading.js";
export type { TermOrder } from "./polynomials/term-order.js";
export { type Problem, readProblem } from "./problems/problem.js";
export { type ProblemDocument, problemDocument } from "./problems/problem-document.js";
export { printFault } from "./report/fault-text.js";
export { drawTiling } from "./tilings/drawing.js";
export type { Tiling, TilingKind } from "./tilings/tiling.js";
export { type TilingFamily, tilingKinds } from "./tilings/tiling-kinds.js";
