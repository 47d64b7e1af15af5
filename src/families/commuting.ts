/**
 * Commuting schemes: `commuting:n` is the ideal of the pairs of n×n matrices with XY = YX, of codimension n² − n.
 * The lower-upper variety of the identity is a degeneration of the variety of these pairs, so has its degree:
 * 1, 3, 31, 1145, … (OEIS A029729).
 * @source Knutson, *Some schemes related to the commuting variety*, J. Algebraic Geom. 14 (2005).
 */
import type { Budget } from "../outcomes/budget.js";
import { read } from "../outcomes/input-fault.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import { type Family, type Ideal, madeOnce } from "./ideal.js";
import { productEntry, readPairSize, type SquarePair, squarePair } from "./matrix-pair.js";

/** The family of commuting schemes. */
export const commutingFamily: Family = {
  name: "commuting",
  argument: "the size of the matrices",
  description: "pairs of commuting matrices",
  example: "commuting:3",
  read(argument) {
    const n = readPairSize(argument);
    return n.ok ? read(commutingScheme(n.value)) : n;
  },
};

/** The ideal of the pairs of n×n matrices with XY = YX. */
export function commutingScheme(n: number): Ideal {
  const pair = squarePair(n);
  return {
    name: `commuting:${n}`,
    ring: pair.ring,
    generatingSets: [
      {
        kind: "commutator",
        description: "the entries of XY − YX but the last, which the trace implies",
        polynomials: madeOnce((budget) => commutatorEntries(pair, budget)),
      },
    ],
    defaultOrder: "dual from nw by rows",
  };
}

/** The entries of XY − YX, row by row; the last is minus the sum of the others on the diagonal. */
function commutatorEntries(pair: SquarePair, budget: Budget | undefined): Polynomial[] {
  const lines = pair.x.cells.map((_, i) => i);
  const last = lines.length - 1;
  return lines.flatMap((row) =>
    lines
      .filter((column) => row < last || column < last)
      .map((column) =>
        productEntry(pair, { product: "XY", row, column }, { product: "YX", row, column }, budget),
      ),
  );
}
