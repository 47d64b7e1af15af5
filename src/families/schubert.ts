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
import { read } from "../outcomes/input-fault.js";
import { type Polynomial, variable } from "../polynomials/polynomial.js";
import {
  type PolynomialRing,
  ringOfMatrices,
  type VariableIndex,
  type VariableMatrix,
} from "../polynomials/polynomial-ring.js";
import type { Family, GeneratingSet, Ideal } from "./ideal.js";
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
  const n = w.length;
  const ring = ringOfMatrices([{ name: "z", rows: n, columns: n }]);
  const matrix = ring.matrices[0] as VariableMatrix;
  const corners = cornerSums(w.map((value) => w.map((_, j) => (value === j + 1 ? 1 : 0))));
  const essential = essentialBounds(corners);
  return {
    name: `schubert:${printPermutation(w)}`,
    ring,
    generatingSets: [
      {
        kind: "fulton",
        description: "the minors of the essential corners",
        polynomials: () => rankMinors(ring, matrix, essential),
      },
      {
        kind: "cdg",
        description: "the variables of the dominant part, and the Fulton minors without them",
        polynomials: () => cdgGenerators(ring, matrix, essential, dominantVariables(w, matrix)),
      },
      definingSet(ring, matrix, corners),
    ],
    defaultOrder: "revlex from nw by rows",
    permutation: w,
  };
}

/** The minors of all corner submatrices of a table. */
export function definingSet(
  ring: PolynomialRing,
  matrix: VariableMatrix,
  corners: CornerRanks,
): GeneratingSet {
  return {
    kind: "defining",
    description: "the minors of all corners",
    polynomials: () => rankMinors(ring, matrix, corners),
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
  essential: CornerRanks,
  dominant: readonly VariableIndex[],
): Polynomial[] {
  const minors = rankMinors(ring, matrix, essential, new Set(dominant));
  return [...dominant.map((v) => variable(ring, v)), ...minors];
}
