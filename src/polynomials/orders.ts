/**
 * Builders of term orders, each with the phrase that names it. What is given after weights, or as the
 * refinement of a partial order, need not be a term order by itself: `…Piece` builds it unchecked.
 */
import type { PolynomialRing, VariableIndex } from "./polynomial-ring.js";
import {
  looseVariables,
  pathPhrase,
  type ReadingPath,
  readAllLines,
  readLines,
  readVariables,
} from "./reading-path.js";
import {
  type Comparison,
  singleVariableComparison,
  type TermOrder,
  variableBelowOne,
} from "./term-order.js";

export { minorTerms } from "./minor-terms.js";

/** What decides at a cell: `lex`, the larger exponent is the larger monomial; `revlex`, the smaller. */
export type Rule = "lex" | "revlex";

/** One step of an order by weight vectors: one integer weight a variable. */
export type WeightVector = readonly number[];

/** The largest absolute value of a weight, so that weighted degrees stay exact in doubles. */
export const MAX_WEIGHT = 2 ** 24;

/** Some variables in the order in which they are compared, all by one rule. */
export interface CellRule {
  readonly rule: Rule;
  readonly variables: readonly VariableIndex[];
}

/**
 * `RULE from CORNER by LINES`: the first cell of the reading where the exponents differ decides.
 * @param degreeFirst false for `plain RULE from …`.
 * @throws RangeError for a ring without matrices, and for `plain revlex`, which puts variables below 1.
 * @example cornerOrder(ring, "revlex", { corner: "nw", lines: "rows" })
 */
export function cornerOrder(
  ring: PolynomialRing,
  rule: Rule,
  path: ReadingPath,
  degreeFirst = true,
): TermOrder {
  return checked(cornerPiece(ring, rule, path, degreeFirst));
}

/** As `cornerOrder`, unchecked. @throws RangeError for a ring without matrices. */
export function cornerPiece(
  ring: PolynomialRing,
  rule: Rule,
  path: ReadingPath,
  degreeFirst: boolean,
): TermOrder {
  requireMatrices(ring);
  const comparisons = readVariables(ring, path).map((v) => compareBy(rule, v));
  const phrase = `${plainUnless(degreeFirst)}${rule} ${pathPhrase(path)}`;
  return totalOrder(ring, phrase, comparisons, degreeFirst);
}

/**
 * One rule a line of the reading, matrix by matrix: `lex,revlex,lex from nw by rows`. Variables
 * outside matrices go by the last rule.
 * @throws RangeError unless there is one rule for every line of every matrix.
 */
export function lineRulesOrder(
  ring: PolynomialRing,
  rules: readonly Rule[],
  path: ReadingPath,
): TermOrder {
  requireMatrices(ring);
  const lines = readAllLines(ring, path);
  const last = rules.at(-1);
  if (last === undefined || rules.length !== lines.length) {
    throw new RangeError(`expected ${lines.length} rules, got ${rules.length}`);
  }
  const comparisons = [
    ...lines.flatMap((line, k) => line.map((v) => compareBy(rules[k] as Rule, v))),
    ...looseVariables(ring).map((v) => compareBy(last, v)),
  ];
  return totalOrder(ring, `${rules.join(",")} ${pathPhrase(path)}`, comparisons, true);
}

/**
 * A choice for every single variable: `cells lex (z11,z12) revlex (z21,z22)`.
 * @throws RangeError unless every variable of the ring is named just once; without the degree, for
 * any `revlex`.
 */
export function cellRulesOrder(
  ring: PolynomialRing,
  cells: readonly CellRule[],
  degreeFirst = true,
): TermOrder {
  return checked(cellRulesPiece(ring, cells, degreeFirst));
}

/** As `cellRulesOrder`, unchecked. @throws RangeError unless every variable is named just once. */
export function cellRulesPiece(
  ring: PolynomialRing,
  cells: readonly CellRule[],
  degreeFirst: boolean,
): TermOrder {
  const listed = cells.flatMap(({ variables }) => variables);
  const named = new Set<number>(listed);
  const missing = ring.variables.find((_, v) => !named.has(v));
  if (missing !== undefined) throw new RangeError(`expected every variable, ${missing} too`);
  if (listed.length !== ring.variables.length) {
    throw new RangeError("expected every variable of the ring just once");
  }
  const words = cells
    .filter(({ variables }) => variables.length > 0)
    .map(({ rule, variables }) => `${rule} (${variables.map((v) => ring.variables[v]).join(",")})`);
  const comparisons = cells.flatMap(({ rule, variables }) =>
    variables.map((v) => compareBy(rule, v)),
  );
  const phrase = `${plainUnless(degreeFirst)}cells ${words.join(" ")}`;
  return totalOrder(ring, phrase, comparisons, degreeFirst);
}

/** A lex order on the listed variables, the first the largest: `graded lex`, or `plain lex`. */
export function listedLex(ring: PolynomialRing, degreeFirst: boolean): TermOrder {
  const comparisons = ring.variables.map((_, v) => compareBy("lex", v as VariableIndex));
  return totalOrder(ring, degreeFirst ? "graded lex" : "plain lex", comparisons, degreeFirst);
}

/**
 * The partial order `dual from CORNER by LINES` on paired variables: cell by cell of X along the
 * reading, (exponent of y_ji) − (exponent of x_ij) decides, the larger is the larger monomial; each cell
 * is a stage. Refined by `refinement`, by default `lex` along the same path: for the lower-upper variety of 1234
 * the reduced basis then has 82 elements, with `revlex` 266.
 * @throws RangeError for a ring without a pair of matrices.
 */
export function dualOrder(
  ring: PolynomialRing,
  path: ReadingPath,
  refinement?: TermOrder,
): TermOrder {
  if (ring.pair === undefined) throw new RangeError("expected a ring with paired matrices");
  const { x, y } = ring.pair;
  const standard = cornerPiece(ring, "lex", path, true);
  const refined = requireRing(refinement ?? standard, ring);
  const partners = new Map<VariableIndex, VariableIndex>();
  for (const [i, row] of x.cells.entries()) {
    for (const [j, v] of row.entries()) partners.set(v, y.cells[j]?.[i] as VariableIndex);
  }
  const duals = readLines(x, path)
    .flat()
    .map(
      (v): Comparison => ({ variables: [partners.get(v) as VariableIndex, v], weights: [1, -1] }),
    );
  const suffix = refined.phrase === standard.phrase ? "" : ` refined by ${refined.phrase}`;
  return {
    phrase: `dual ${pathPhrase(path)}${suffix}`,
    ring,
    degreeFirst: true,
    comparisons: [...duals, ...refined.comparisons],
    decisive: duals.length,
    stages: duals.map((_, k) => k + 1),
  };
}

/**
 * An order by weight vectors, one stage each, then another order: `total` when that one decides as
 * well (and so partial only if it is), `partial` when it is a mere refinement. The degree is compared
 * before the weights if the other order compares it.
 * @throws RangeError on a vector of another length, weights that are no integers up to 2²⁴, or a
 * variable below 1.
 */
export function weightOrder(
  ring: PolynomialRing,
  vectors: readonly WeightVector[],
  then: TermOrder,
  kind: "total" | "partial",
): TermOrder {
  return checked(weightPiece(ring, vectors, then, kind));
}

/** As `weightOrder`, unchecked. @throws RangeError on vectors that do not fit. */
export function weightPiece(
  ring: PolynomialRing,
  vectors: readonly WeightVector[],
  then: TermOrder,
  kind: "total" | "partial",
): TermOrder {
  if (vectors.length === 0) throw new RangeError("expected at least one weight vector, got none");
  const weighted = vectors.map((vector) => weightComparison(ring, vector));
  requireRing(then, ring);
  const words = vectors.map((vector) => `weights (${vector.join(",")})`).join(" then ");
  const ownStages = weighted.map((_, k) => k + 1);
  const total = kind === "total";
  return {
    phrase: `${words} ${total ? "then" : "refined by"} ${then.phrase}`,
    ring,
    degreeFirst: then.degreeFirst,
    comparisons: [...weighted, ...then.comparisons],
    decisive: weighted.length + (total ? then.decisive : 0),
    stages: total ? [...ownStages, ...then.stages.map((s) => s + weighted.length)] : ownStages,
  };
}

function weightComparison(ring: PolynomialRing, vector: WeightVector): Comparison {
  if (vector.length !== ring.variables.length) {
    throw new RangeError(`expected ${ring.variables.length} weights, got ${vector.length}`);
  }
  const bad = vector.find((w) => !Number.isInteger(w) || Math.abs(w) > MAX_WEIGHT);
  if (bad !== undefined) throw new RangeError(`expected integer weights up to 2^24, got ${bad}`);
  const used = vector.flatMap((w, v) => (w === 0 ? [] : [v as VariableIndex]));
  return { variables: used, weights: used.map((v) => vector[v] as number) };
}

function totalOrder(
  ring: PolynomialRing,
  phrase: string,
  comparisons: readonly Comparison[],
  degreeFirst: boolean,
): TermOrder {
  const decisive = comparisons.length;
  return { phrase, ring, degreeFirst, comparisons, decisive, stages: [decisive] };
}

function compareBy(rule: Rule, v: VariableIndex): Comparison {
  return singleVariableComparison(v, rule === "lex" ? 1 : -1);
}

function plainUnless(degreeFirst: boolean): string {
  return degreeFirst ? "" : "plain ";
}

function checked(order: TermOrder): TermOrder {
  const below = variableBelowOne(order);
  if (below === undefined) return order;
  throw new RangeError(
    `expected a term order, got "${order.phrase}", in which ${order.ring.variables[below]} is below 1`,
  );
}

function requireMatrices(ring: PolynomialRing): void {
  if (ring.matrices.length === 0) {
    throw new RangeError("expected a ring with a matrix of variables, got none");
  }
}

function requireRing(order: TermOrder, ring: PolynomialRing): TermOrder {
  if (order.ring !== ring)
    throw new RangeError(`expected an order on the same ring, got another's`);
  return order;
}
