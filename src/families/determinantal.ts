/** Generic determinantal ideals: `determinantal:m,n,r`, the m×n matrices of rank at most r. */
import { faulty, quote, read } from "../outcomes/input-fault.js";
import { ringOfMatrices, type VariableMatrix } from "../polynomials/polynomial-ring.js";
import type { Family, Ideal } from "./ideal.js";
import { rankMinors } from "./rank-ideal.js";

const EXPECTED = "rows, columns and rank with 0 ≤ rank ≤ rows, columns ≤ 100, such as 3,4,1";

/** The family of generic determinantal ideals. */
export const determinantalFamily: Family = {
  name: "determinantal",
  argument: "rows, columns and the largest rank",
  description: "matrices of bounded rank",
  example: "determinantal:3,4,1",
  read(argument) {
    const numbers = /^\s*(\d{1,3})\s*,\s*(\d{1,3})\s*,\s*(\d{1,3})\s*$/.exec(argument);
    const [m = 0, n = 0, r = 0] = numbers?.slice(1).map(Number) ?? [];
    if (numbers === null || m < 1 || n < 1 || m > 100 || n > 100 || r > Math.min(m, n)) {
      return faulty({
        message: `${quote(argument)} is no determinantal ideal`,
        expected: EXPECTED,
      });
    }
    return read(determinantalIdeal(m, n, r));
  },
};

/** The ideal of the (r+1)-minors of a generic m×n matrix. */
export function determinantalIdeal(m: number, n: number, r: number): Ideal {
  const ring = ringOfMatrices([{ name: "z", rows: m, columns: n }]);
  const matrix = ring.matrices[0] as VariableMatrix;
  const bounds = [{ rows: m, columns: n, rank: r }];
  return {
    name: `determinantal:${m},${n},${r}`,
    ring,
    generatingSets: [
      {
        kind: "minors",
        description: "all minors of one more than the rank",
        polynomials: (budget) =>
          rankMinors(
            ring,
            matrix,
            { rows: m, columns: n, corner: "nw", bounds },
            undefined,
            budget,
          ),
      },
    ],
    defaultOrder: "lex from nw by rows",
    defaultBasis: "Sturmfels, *Gröbner bases and Stanley decompositions of determinantal rings*",
  };
}
