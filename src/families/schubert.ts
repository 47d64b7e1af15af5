/**
 * Matrix Schubert varieties: `schubert:w` is the ideal of the matrices whose northwest i×j corners have
 * rank at most r_w(i,j); prime of codimension ℓ(w).
 * @source Fulton, *Flags, Schubert polynomials, degeneracy loci, and determinantal formulas*, Duke Math.
 * J. 65 (1992); the CDG generators are those of Hamaker, Pechenik, Weigandt, *Gröbner geometry of Schubert
 * polynomials through ice*, Adv. Math. 398 (2022), named there after Conca, De Negri and Gorla.
 */
import { type CornerRanks, cornerSums, essentialBounds } from "../combinatorics/corner-ranks.js";
import {
  type Permutation,
  printPermutation,
  readPermutation,
} from "../combinatorics/permutation.js";
import { dominantPart } from "../combinatorics/rank-function.js";
import type { Budget } from "../outcomes/budget.js";
import { read } from "../outcomes/input-fault.js";
import { type Polynomial, variable } from "../polynomials/polynomial.js";
import type {
  PolynomialRing,
  VariableIndex,
  VariableMatrix,
} from "../polynomials/polynomial-ring.js";
import { cornerTableIdeal } from "./corner-table-ideal.js";
import { type Family, type GeneratingSet, type Ideal, madeOnce } from "./ideal.js";
import { rankMinors } from "./rank-ideal.js";

/** The family of matrix Schubert varieties. */
export const schubertFamily: Family = {
  name: "schubert",
  argument: "a permutation in one-line notation",
  description: "matrix Schubert varieties: rank conditions on northwest corners",
  example: "schubert:2143",
  read(argument) {
    const w = readPermutation(argument);
    return w.ok ? read(schubertIdeal(w.value)) : w;
  },
};

/** The ideal of the matrix Schubert variety of w. */
export function schubertIdeal(w: Permutation): Ideal {
  const corners = cornerSums(w.map((value) => w.map((_, j) => (value === j + 1 ? 1 : 0))));
  const byCorners = cornerTableIdeal(`schubert:${printPermutation(w)}`, corners);
  const [fulton, ...others] = byCorners.generatingSets;
  const matrix = byCorners.ring.matrices[0] as VariableMatrix;
  const cdg: GeneratingSet = {
    kind: "cdg",
    description: "the variables of the dominant part, and the Fulton minors without them",
    polynomials: madeOnce((budget) =>
      cdgGenerators(byCorners.ring, matrix, corners, dominantVariables(w, matrix), budget),
    ),
  };
  return {
    ...byCorners,
    generatingSets: [fulton, cdg, ...others],
    defaultBasis: "Knutson, Miller, *Gröbner geometry of Schubert polynomials*, theorem B",
    permutation: w,
  };
}

function dominantVariables(w: Permutation, matrix: VariableMatrix): VariableIndex[] {
  return dominantPart(w).map(
    ({ row, column }) => matrix.cells[row - 1]?.[column - 1] as VariableIndex,
  );
}

function cdgGenerators(
  ring: PolynomialRing,
  matrix: VariableMatrix,
  corners: CornerRanks,
  dominant: readonly VariableIndex[],
  budget: Budget | undefined,
): Polynomial[] {
  const minors = rankMinors(ring, matrix, essentialBounds(corners), new Set(dominant), budget);
  return [...dominant.map((v) => variable(ring, v)), ...minors];
}
