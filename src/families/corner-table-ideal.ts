/** The ideal of one generic matrix under a table of corner rank bounds, with its generating sets. */
import { type CornerRanks, essentialBounds } from "../combinatorics/corner-ranks.js";
import { ringOfMatrices, type VariableMatrix } from "../polynomials/polynomial-ring.js";
import type { Ideal } from "./ideal.js";
import { rankMinors } from "./rank-ideal.js";
import { definingSet } from "./schubert.js";

/** The ideal of a table of corner rank bounds on a generic matrix in variables z. */
export function cornerTableIdeal(name: string, table: CornerRanks): Ideal {
  const { rows, columns } = table;
  const ring = ringOfMatrices([{ name: "z", rows, columns }]);
  const matrix = ring.matrices[0] as VariableMatrix;
  const essential = essentialBounds(table);
  return {
    name,
    ring,
    generatingSets: [
      {
        kind: "fulton",
        description: "the minors of the corners whose bounds the others do not imply",
        polynomials: () => rankMinors(ring, matrix, essential),
      },
      definingSet(ring, matrix, table),
    ],
    defaultOrder: "revlex from nw by rows",
  };
}
