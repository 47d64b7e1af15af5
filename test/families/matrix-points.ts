/** Points of varieties of pairs of matrices for the tests: integer matrices, and what limits say of dimension. */
import type { Ideal } from "../../src/families/ideal.js";
import { codimensionOf, degreeOf, hilbertNumerator } from "../../src/hilbert/hilbert-numerator.js";
import { type FlatLimit, flatLimit } from "../../src/limits/flat-limit.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { orderOf } from "../support/reading.js";

export type Matrix = bigint[][];

/** The n×n matrix with the given entries, rows and columns from 0. */
export function square(n: number, entry: (i: number, j: number) => bigint): Matrix {
  const lines = Array.from({ length: n }, (_, i) => i);
  return lines.map((i) => lines.map((j) => entry(i, j)));
}

export function product(a: Matrix, b: Matrix): Matrix {
  return a.map((row) =>
    (b[0] as bigint[]).map((_, j) =>
      row.reduce((sum, x, k) => sum + x * ((b[k] as bigint[])[j] as bigint), 0n),
    ),
  );
}

/** The inverse of a unipotent triangular matrix U = 1 + N: the sum of (−N)^k. */
export function unipotentInverse(u: Matrix): Matrix {
  const minusN = u.map((row, i) => row.map((x, j) => (i === j ? 0n : -x)));
  let power = square(u.length, (i, j) => (i === j ? 1n : 0n));
  let sum = power;
  for (let k = 1; k < u.length; k++) {
    power = product(power, minusN);
    sum = sum.map((row, i) => row.map((x, j) => x + (power[i]?.[j] as bigint)));
  }
  return sum;
}

/** The limit of an ideal in its own order. */
export function limitOf(ideal: Ideal): FlatLimit {
  const order = orderOf(ideal.ring, ideal.defaultOrder);
  const limit = flatLimit(ideal.generatingSets[0].polynomials(), order, unlimited());
  if (limit.kind === "undecided") throw new Error(limit.reason);
  return limit;
}

/** Codimension and degree, read off the limit. */
export function codimensionAndDegree(ideal: Ideal): [number, bigint] {
  const numerator = hilbertNumerator(limitOf(ideal).leadingIdeal, unlimited());
  return [codimensionOf(numerator), degreeOf(numerator)];
}
