/** The ideal of one generic matrix under a table of corner rank bounds, with its generating sets. */
import { type CornerRanks, essentialBounds } from "../combinatorics/corner-ranks.js";
import {
  type PolynomialRing,
  ringOfMatrices,
  type VariableMatrix,
} from "../polynomials/polynomial-ring.js";
import { type Ideal, madeOnce } from "./ideal.js";
import { rankMinors } from "./rank-ideal.js";

/** The ideal of a table of corner rank bounds on a generic matrix in variables z. */
export function cornerTableIdeal(name: string, table: CornerRanks): Ideal {
  const ring = ringOfMatrices([{ name: "z", rows: table.rows, columns: table.columns }]);
  return cornerBoundsIdeal(name, ring, ring.matrices[0] as VariableMatrix, table);
}

/** The ideal of a table of corner rank bounds on one matrix of a ring. */
export function cornerBoundsIdeal(
  name: string,
  ring: PolynomialRing,
  matrix: VariableMatrix,
  table: CornerRanks,
): Ideal {
  return {
    name,
    ring,
    generatingSets: [
      {
        kind: "fulton",
        description: "the minors of the corners whose bounds the others do not imply",
        polynomials: madeOnce((budget) =>
          rankMinors(ring, matrix, essentialBounds(table), undefined, budget),
        ),
      },
      {
        kind: "defining",
        description: "the minors of all corners",
        polynomials: madeOnce((budget) => rankMinors(ring, matrix, table, undefined, budget)),
      },
    ],
    defaultOrder: "revlex from nw by rows",
  };
}
