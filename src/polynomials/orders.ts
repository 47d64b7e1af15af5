/**
 * Builders of term orders. A *reading* lists the cells of the ring's matrices: start at a corner, move
 * away from it along the rows (or columns) one after the other; matrix after matrix, then the variables
 * outside matrices as listed.
 */
import type { Corner } from "./corner.js";
import type { PolynomialRing, VariableIndex, VariableMatrix } from "./polynomial-ring.js";
import { type Comparison, singleVariableComparison, type TermOrder } from "./term-order.js";

/** What decides at a cell: `lex`, the larger exponent is the larger monomial; `revlex`, the smaller. */
export type Rule = "lex" | "revlex";

/** Along what a reading moves first. */
export type Lines = "rows" | "columns";

/** Where a reading starts and along what it moves. */
export interface ReadingPath {
  readonly corner: Corner;
  readonly lines: Lines;
}

/** One step of an order by weight vectors: one integer weight a variable. */
export type WeightVector = readonly number[];

/** The largest absolute value of a weight, so that weighted degrees stay exact in doubles. */
export const MAX_WEIGHT = 2 ** 24;

/** The cells of a matrix in the order of a reading, line by line. */
export function readLines(
  matrix: VariableMatrix,
  path: ReadingPath,
): readonly (readonly VariableIndex[])[] {
  const up = path.corner.startsWith("s");
  const leftwards = path.corner.endsWith("e");
  const turned = <T>(list: readonly T[], back: boolean): T[] =>
    back ? [...list].reverse() : [...list];
  const rows = turned(matrix.cells, up).map((row) => turned(row, leftwards));
  if (path.lines === "rows") return rows;
  return (rows[0] ?? []).map((_, j) => rows.map((row) => row[j] as VariableIndex));
}

/** All variables of a ring in the order of a reading. */
export function readVariables(ring: PolynomialRing, path: ReadingPath): readonly VariableIndex[] {
  const inside = ring.matrices.flatMap((matrix) => readLines(matrix, path).flat());
  const seen = new Set(inside);
  const outside = ring.variables.map((_, v) => v as VariableIndex).filter((v) => !seen.has(v));
  return [...inside, ...outside];
}

/**
 * `RULE from CORNER by LINES`. @param degreeFirst false for `plain RULE from …`.
 * @throws RangeError for a ring without matrices.
 */
export function cornerOrder(
  ring: PolynomialRing,
  rule: Rule,
  path: ReadingPath,
  degreeFirst = true,
): TermOrder {
  const sign = rule === "lex" ? 1 : -1;
  requireMatrices(ring);
  return totalOrder(
    ring,
    `${degreeFirst ? "" : "plain "}${rule} ${pathPhrase(path)}`,
    readVariables(ring, path).map((v) => singleVariableComparison(v, sign)),
    degreeFirst,
  );
}

/**
 * One rule a line of the reading, matrix by matrix: `lex,revlex,lex from nw by rows`. Variables outside
 * matrices are compared by `lex`, last.
 * @throws RangeError unless there is one rule for every line of every matrix.
 */
export function lineRulesOrder(
  ring: PolynomialRing,
  rules: readonly Rule[],
  path: ReadingPath,
): TermOrder {
  requireMatrices(ring);
  const lines = ring.matrices.flatMap((matrix) => readLines(matrix, path));
  if (rules.length !== lines.length) {
    throw new RangeError(`expected ${lines.length} rules, got ${rules.length}`);
  }
  const signs = new Map<VariableIndex, 1 | -1>();
  lines.forEach((line, k) => {
    for (const v of line) signs.set(v, rules[k] === "lex" ? 1 : -1);
  });
  const comparisons = readVariables(ring, path).map((v) =>
    singleVariableComparison(v, signs.get(v) ?? 1),
  );
  return totalOrder(ring, `${rules.join(",")} ${pathPhrase(path)}`, comparisons, true);
}

/** Some variables in the order in which they are compared, all by one rule. */
export interface CellRule {
  readonly rule: Rule;
  readonly variables: readonly VariableIndex[];
}

/**
 * A choice for every single variable: `cells lex (z11,z12) revlex (z21,z22)`.
 * @throws RangeError unless every variable of the ring stands in the list just once.
 */
export function cellRulesOrder(
  ring: PolynomialRing,
  cells: readonly CellRule[],
  degreeFirst = true,
): TermOrder {
  const listed = cells.flatMap(({ variables }) => variables);
  const missing = ring.variables.find((_, v) => !listed.includes(v as VariableIndex));
  if (missing !== undefined) throw new RangeError(`expected every variable, ${missing} too`);
  if (listed.length > ring.variables.length) {
    throw new RangeError("expected every variable just once");
  }
  const words = cells.map(
    ({ rule, variables }) => `${rule} (${variables.map((v) => ring.variables[v]).join(",")})`,
  );
  const comparisons = cells.flatMap(({ rule, variables }) =>
    variables.map((v) => singleVariableComparison(v, rule === "lex" ? 1 : -1)),
  );
  const phrase = `${degreeFirst ? "" : "plain "}cells ${words.join(" ")}`;
  return totalOrder(ring, phrase, comparisons, degreeFirst);
}

/** A lex order on the listed variables, the first the largest: `graded lex`, or `plain lex`. */
export function listedLex(ring: PolynomialRing, degreeFirst: boolean): TermOrder {
  const comparisons = ring.variables.map((_, v) => singleVariableComparison(v as VariableIndex, 1));
  return totalOrder(ring, degreeFirst ? "graded lex" : "plain lex", comparisons, degreeFirst);
}

/**
 * The partial order `dual from CORNER by LINES` on paired variables: cell by cell of X along the
 * reading, (exponent of y_ji) − (exponent of x_ij) decides, the larger is the larger monomial. Refined
 * by `refinement`, by default `revlex` along the same path.
 * @throws RangeError for a ring without a pair of matrices.
 */
export function dualOrder(
  ring: PolynomialRing,
  path: ReadingPath,
  refinement: TermOrder = cornerOrder(ring, "revlex", path),
): TermOrder {
  if (ring.pair === undefined) throw new RangeError("expected a ring with paired matrices");
  const { x, y } = ring.pair;
  const place = new Map<VariableIndex, VariableIndex>();
  x.cells.forEach((row, i) => {
    row.forEach((v, j) => {
      place.set(v, y.cells[j]?.[i] as VariableIndex);
    });
  });
  const duals = readLines(x, path)
    .flat()
    .map((v): Comparison => ({ variables: [place.get(v) as VariableIndex, v], weights: [1, -1] }));
  const phrase = `dual ${pathPhrase(path)}`;
  const standard = cornerOrder(ring, "revlex", path).phrase;
  return {
    phrase: refinement.phrase === standard ? phrase : `${phrase} refined by ${refinement.phrase}`,
    ring,
    degreeFirst: true,
    comparisons: [...duals, ...refinement.comparisons],
    decisive: duals.length,
    stages: duals.map((_, k) => k + 1),
  };
}

/**
 * An order by weight vectors, one stage each, then another order: total, or partial with the other
 * order as mere refinement.
 * @throws RangeError on a vector of another length or weights that are no integers up to 2²⁴.
 */
export function weightOrder(
  ring: PolynomialRing,
  vectors: readonly WeightVector[],
  then: TermOrder,
  kind: "total" | "partial",
): TermOrder {
  const weighted = vectors.map((vector): Comparison => {
    if (vector.length !== ring.variables.length) {
      throw new RangeError(`expected ${ring.variables.length} weights, got ${vector.length}`);
    }
    const bad = vector.find((w) => !Number.isInteger(w) || Math.abs(w) > MAX_WEIGHT);
    if (bad !== undefined) throw new RangeError(`expected integer weights up to 2^24, got ${bad}`);
    const used = vector.flatMap((w, v) => (w === 0 ? [] : [v as VariableIndex]));
    return { variables: used, weights: used.map((v) => vector[v] as number) };
  });
  const words = vectors.map((vector) => `weights (${vector.join(",")})`).join(" then ");
  const ownStages = weighted.map((_, k) => k + 1);
  const comparisons = [...weighted, ...then.comparisons];
  return {
    phrase: `${words} ${kind === "total" ? "then" : "refined by"} ${then.phrase}`,
    ring,
    degreeFirst: then.degreeFirst,
    comparisons,
    decisive: kind === "total" ? weighted.length + then.decisive : weighted.length,
    stages:
      kind === "total" ? [...ownStages, ...then.stages.map((s) => s + weighted.length)] : ownStages,
  };
}

/** Does an order take the diagonal term of every minor of a matrix, the antidiagonal, or neither? */
export type MinorTerms = "diagonal" | "antidiagonal" | "neither";

/**
 * Which terms of minors an order takes. Looking at 2-minors suffices: two terms of a t-minor that
 * differ by exchanging two columns differ by a 2-minor's terms times a monomial, and the (anti)diagonal
 * term is reached from any other by such exchanges, each of which makes it larger.
 */
export function minorTerms(order: TermOrder, matrix: VariableMatrix): MinorTerms {
  const kinds = new Set<boolean>();
  const { cells } = matrix;
  for (let i = 0; i < cells.length; i++) {
    for (let k = i + 1; k < cells.length; k++) {
      for (let j = 0; j < matrix.columns; j++) {
        for (let l = j + 1; l < matrix.columns; l++) {
          const cell = (r: number, c: number): VariableIndex => cells[r]?.[c] as VariableIndex;
          kinds.add(isLarger(order, [cell(i, j), cell(k, l)], [cell(i, l), cell(k, j)]));
        }
      }
    }
  }
  if (kinds.size !== 1) return "neither";
  return kinds.has(true) ? "diagonal" : "antidiagonal";
}

/* Compares two squarefree monomials of the same degree by the comparisons of the order. */
function isLarger(
  order: TermOrder,
  a: readonly VariableIndex[],
  b: readonly VariableIndex[],
): boolean {
  for (const { variables, weights } of order.comparisons) {
    const weight = (monomial: readonly VariableIndex[]): number =>
      monomial.reduce((sum, v) => sum + (weights[variables.indexOf(v)] ?? 0), 0);
    const difference = weight(a) - weight(b);
    if (difference !== 0) return difference > 0;
  }
  return false;
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

function pathPhrase(path: ReadingPath): string {
  return `from ${path.corner} by ${path.lines}`;
}

function requireMatrices(ring: PolynomialRing): void {
  if (ring.matrices.length === 0)
    throw new RangeError("expected a ring with a matrix of variables");
}
