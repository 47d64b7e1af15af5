/**
 * The lower-upper scheme: `lower-upper-scheme:n` is the ideal of the pairs of n×n matrices (X, Y) with XY lower
 * and YX upper triangular. Its n² − n quadrics are a complete intersection, of degree 2^(n² − n); its components
 * are the lower-upper varieties of the permutations of 1, …, n.
 * @source Knutson, *Some schemes related to the commuting variety*, J. Algebraic Geom. 14 (2005).
 */
import type { Budget } from "../outcomes/budget.js";
import { read } from "../outcomes/input-fault.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import { type Family, type Ideal, madeOnce } from "./ideal.js";
import { productEntry, readPairSize, type SquarePair, squarePair } from "./matrix-pair.js";

/** The family of lower-upper schemes. */
export const lowerUpperSchemeFamily: Family = {
  name: "lower-upper-scheme",
  argument: "the size of the matrices",
  description: "pairs of matrices with XY lower and YX upper triangular",
  example: "lower-upper-scheme:3",
  read(argument) {
    const n = readPairSize(argument);
    return n.ok ? read(lowerUpperScheme(n.value)) : n;
  },
};

/** The ideal of the pairs of n×n matrices with XY lower and YX upper triangular. */
export function lowerUpperScheme(n: number): Ideal {
  const pair = squarePair(n);
  return {
    name: `lower-upper-scheme:${n}`,
    ring: pair.ring,
    generatingSets: [
      {
        kind: "equations",
        description: "the entries of XY above and of YX below the diagonal",
        polynomials: madeOnce((budget) => triangularEquations(pair, budget)),
      },
    ],
    defaultOrder: "dual from nw by rows",
  };
}

/** The entries of XY above the diagonal and of YX below it, row by row. @throws LimitReached */
export function triangularEquations(pair: SquarePair, budget?: Budget): Polynomial[] {
  const lines = pair.x.cells.map((_, i) => i);
  return lines.flatMap((row) =>
    lines
      .filter((column) => column !== row)
      .map((column) => {
        const product = row < column ? "XY" : "YX";
        return productEntry(pair, { product, row, column }, undefined, budget);
      }),
  );
}
