/**
 * Rings and orders over which laws are run, each order with its definition written once more and
 * naively: exponents are looked up by the names of variables, nothing of the library is used.
 */
import {
  type PolynomialRing,
  ringOfMatrices,
  ringOfVariables,
  type VariableIndex,
} from "../../src/polynomials/polynomial-ring.js";

/** The exponent of a named variable in a monomial. */
export type ExponentOf = (name: string) => number;

/** Positive when the first monomial is larger. */
export type NaiveComparison = (a: ExponentOf, b: ExponentOf) => number;

/** One order on one ring; `decisive` compares what a leading form compares. */
export interface OrderCase {
  readonly ringName: string;
  readonly ring: PolynomialRing;
  readonly phrase: string;
  readonly compare: NaiveComparison;
  readonly decisive: NaiveComparison;
}

const CORNERS = ["nw", "ne", "sw", "se"] as const;
const LINES = ["rows", "columns"] as const;

interface Shape {
  readonly name: string;
  readonly rows: number;
  readonly columns: number;
}

/* The names of the cells of a matrix as a reading visits them, by plain loops. */
function cellsFrom(shape: Shape, corner: string, lines: string): string[] {
  const rows: number[] = [];
  const columns: number[] = [];
  for (let i = 1; i <= shape.rows; i++) corner[0] === "n" ? rows.push(i) : rows.unshift(i);
  for (let j = 1; j <= shape.columns; j++) corner[1] === "w" ? columns.push(j) : columns.unshift(j);
  const names: string[] = [];
  if (lines === "rows") {
    for (const i of rows) for (const j of columns) names.push(`${shape.name}${i}${j}`);
  } else {
    for (const j of columns) for (const i of rows) names.push(`${shape.name}${i}${j}`);
  }
  return names;
}

function firstDifference(...comparisons: NaiveComparison[]): NaiveComparison {
  return (a, b) => {
    for (const compare of comparisons) {
      const difference = compare(a, b);
      if (difference !== 0) return difference;
    }
    return 0;
  };
}

function largerFirst(names: readonly string[]): NaiveComparison {
  return firstDifference(
    ...names.map(
      (v): NaiveComparison =>
        (a, b) =>
          a(v) - b(v),
    ),
  );
}

function smallerFirst(names: readonly string[]): NaiveComparison {
  return firstDifference(
    ...names.map(
      (v): NaiveComparison =>
        (a, b) =>
          b(v) - a(v),
    ),
  );
}

function weighted(names: readonly string[], weights: readonly number[]): NaiveComparison {
  const weight = (m: ExponentOf): number =>
    names.reduce((sum, v, k) => sum + (weights[k] ?? Number.NaN) * m(v), 0);
  return (a, b) => weight(a) - weight(b);
}

function degree(names: readonly string[]): NaiveComparison {
  return weighted(
    names,
    names.map(() => 1),
  );
}

function total(
  ringName: string,
  ring: PolynomialRing,
  phrase: string,
  compare: NaiveComparison,
): OrderCase {
  return { ringName, ring, phrase, compare, decisive: compare };
}

function listedOrders(ringName: string, ring: PolynomialRing): OrderCase[] {
  const names = ring.variables;
  const reversed = [...names].reverse();
  const weights = names.map((_, k) => (k * 5) % 4);
  const shown = weights.join(",");
  const revlex = smallerFirst(reversed);
  return [
    total(ringName, ring, "graded lex", firstDifference(degree(names), largerFirst(names))),
    total(ringName, ring, "graded revlex", firstDifference(degree(names), revlex)),
    total(ringName, ring, "plain lex", largerFirst(names)),
    total(
      ringName,
      ring,
      `weights (${shown}) then plain lex`,
      firstDifference(weighted(names, weights), largerFirst(names)),
    ),
    {
      ...total(
        ringName,
        ring,
        `weights (${shown}) refined by graded revlex`,
        firstDifference(degree(names), weighted(names, weights), revlex),
      ),
      decisive: firstDifference(degree(names), weighted(names, weights)),
    },
  ];
}

function cornerOrders(
  ringName: string,
  ring: PolynomialRing,
  shapes: readonly Shape[],
  loose: readonly string[] = [],
): OrderCase[] {
  const everyPath = CORNERS.flatMap((corner) => LINES.map((lines) => ({ corner, lines })));
  return everyPath.flatMap(({ corner, lines }) => {
    const names = [...shapes.flatMap((shape) => cellsFrom(shape, corner, lines)), ...loose];
    const path = `from ${corner} by ${lines}`;
    const byDegree = degree(ring.variables);
    return [
      total(ringName, ring, `lex ${path}`, firstDifference(byDegree, largerFirst(names))),
      total(ringName, ring, `revlex ${path}`, firstDifference(byDegree, smallerFirst(names))),
      total(ringName, ring, `plain lex ${path}`, largerFirst(names)),
    ];
  });
}

function dualOrders(ringName: string, ring: PolynomialRing, size: number): OrderCase[] {
  return CORNERS.flatMap((corner) =>
    LINES.map((lines): OrderCase => {
      const shape = { rows: size, columns: size };
      const x = cellsFrom({ name: "x", ...shape }, corner, lines);
      const y = cellsFrom({ name: "y", ...shape }, corner, lines);
      const weights = x.map((cell): NaiveComparison => {
        const partner = `y${cell[2]}${cell[1]}`;
        const weight = (m: ExponentOf): number => m(partner) - m(cell);
        return (a, b) => weight(a) - weight(b);
      });
      const decisive = firstDifference(degree(ring.variables), ...weights);
      return {
        ringName,
        ring,
        phrase: `dual from ${corner} by ${lines}`,
        decisive,
        compare: firstDifference(decisive, smallerFirst([...x, ...y])),
      };
    }),
  );
}

/** A ring of two matrix cells and two variables outside the matrix. */
export function ringWithLooseVariables(): PolynomialRing {
  const cells = [[1 as VariableIndex, 2 as VariableIndex]];
  return {
    variables: ["s", "z11", "z12", "t"],
    matrices: [{ name: "z", rows: 1, columns: 2, cells }],
  };
}

/** The ring of the cells of two n×n matrices x and y, paired. */
export function pairedRing(n: number): PolynomialRing {
  const shape = { rows: n, columns: n };
  return ringOfMatrices(
    [
      { name: "x", ...shape },
      { name: "y", ...shape },
    ],
    { x: "x", y: "y" },
  );
}

/** Every order on every ring of the table. */
export function orderTable(): OrderCase[] {
  const listed = ringOfVariables(["x", "y", "z"]);
  const z23 = { name: "z", rows: 2, columns: 3 };
  const wide = ringOfMatrices([z23]);
  const a = { name: "a", rows: 2, columns: 1 };
  const b = { name: "b", rows: 2, columns: 2 };
  const two = ringOfMatrices([a, b]);
  const loose = ringWithLooseVariables();
  const pair = pairedRing(2);
  const degreeOfWide = degree(wide.variables);
  return [
    ...listedOrders("x, y, z", listed),
    ...listedOrders("2×3", wide),
    ...cornerOrders("2×3", wide, [z23]),
    ...cornerOrders("2×1 and 2×2", two, [a, b]),
    ...cornerOrders("1×2 and loose", loose, [{ name: "z", rows: 1, columns: 2 }], ["s", "t"]),
    ...cornerOrders("paired 2×2", pair, [
      { name: "x", rows: 2, columns: 2 },
      { name: "y", rows: 2, columns: 2 },
    ]),
    ...dualOrders("paired 2×2", pair, 2),
    total(
      "2×3",
      wide,
      "lex,revlex from ne by rows",
      firstDifference(
        degreeOfWide,
        largerFirst(["z13", "z12", "z11"]),
        smallerFirst(["z23", "z22", "z21"]),
      ),
    ),
    total(
      "2×3",
      wide,
      "cells revlex (z22,z11) lex (z13,z12,z21,z23)",
      firstDifference(
        degreeOfWide,
        smallerFirst(["z22", "z11"]),
        largerFirst(["z13", "z12", "z21", "z23"]),
      ),
    ),
    total(
      "2×3",
      wide,
      "weights (3,1,4,1,5,9) then weights (-2,6,0,0,0,1) then revlex from sw by columns",
      firstDifference(
        degreeOfWide,
        weighted(wide.variables, [3, 1, 4, 1, 5, 9]),
        weighted(wide.variables, [-2, 6, 0, 0, 0, 1]),
        smallerFirst(["z21", "z11", "z22", "z12", "z23", "z13"]),
      ),
    ),
  ];
}
