/**
 * Lower-upper varieties: `lower-upper:w` is the component E_w of the scheme of pairs of n×n matrices (X, Y) with
 * XY lower and YX upper triangular on which (XY)_ii = (YX)_w(i)w(i); of codimension n² − n.
 * @source Knutson, *Some schemes related to the commuting variety*, J. Algebraic Geom. 14 (2005).
 */
import { type CornerRanks, cornerSums, essentialBounds } from "../combinatorics/corner-ranks.js";
import {
  type Permutation,
  permutation,
  printPermutation,
  readPermutation,
} from "../combinatorics/permutation.js";
import type { Budget } from "../outcomes/budget.js";
import { faulty, read } from "../outcomes/input-fault.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import type { VariableIndex, VariableMatrix } from "../polynomials/polynomial-ring.js";
import { type Family, type Ideal, madeOnce } from "./ideal.js";
import { triangularEquations } from "./lower-upper-scheme.js";
import { MAX_PAIR_SIZE, productEntry, type SquarePair, squarePair } from "./matrix-pair.js";
import { rankMinors } from "./rank-ideal.js";

/** The family of lower-upper varieties. */
export const lowerUpperFamily: Family = {
  name: "lower-upper",
  argument: "a permutation in one-line notation",
  description: "components of the scheme of pairs with XY lower and YX upper triangular",
  example: "lower-upper:132",
  read(argument) {
    const w = readPermutation(argument);
    if (!w.ok) return w;
    if (w.value.length <= MAX_PAIR_SIZE) return read(lowerUpperIdeal(w.value));
    return faulty({
      message: `a lower-upper variety of a permutation of ${w.value.length} values`,
      expected: `at most ${MAX_PAIR_SIZE}`,
    });
  },
};

/**
 * The ideal that these generate, all sums over k = 1 … n:
 * - `Σ x_ik·y_kj` for i < j and `Σ y_ik·x_kj` for i > j, the n² − n equations of the scheme;
 * - `Σ x_ik·y_ki − Σ y_jk·x_kj`, j = w(i), for i = 1 … n−1; that for i = n is minus their sum, as XY and YX have
 *   the same trace;
 * - the (r+1)-minors of the northwest i×j corner of X, r = #{a ≤ i : w(a) ≤ j}, for (i,j) in the essential set;
 * - the (r+1)-minors of the southeast corner of Yᵗ with rows i … n and columns j … n, that is of Y with rows
 *   j … n and columns i … n, r = #{a ≥ i : w(a) ≥ j}, for the bounds that the others do not imply.
 *
 * The minors of all other corners are in the ideal of these (Fulton, Duke Math. J. 65 (1992), lemma 3.10).
 *
 * It lies in the prime ideal of E_w, and has its codimension and degree for n ≤ 4. For n ≤ 3, and for n = 4 unless
 * w = 1324, it is that ideal: some initial ideal is unmixed, hence so is the ideal, and the degrees add up to
 * 2^(n² − n), those of the varieties. For 1324 it is smaller, and vanishes at more points: on E_1324 also
 * `((XY)_22 − (XY)_11)·x_2j + (XY)_21·x_1j = 0`, j = 1, 2, and
 * `((YX)_33 − (YX)_44)·y_3j + (YX)_34·y_4j = 0`, j = 3, 4; with these it is prime.
 */
export function lowerUpperIdeal(w: Permutation): Ideal {
  const pair = squarePair(w.length);
  return {
    name: `lower-upper:${printPermutation(w)}`,
    ring: pair.ring,
    generatingSets: [
      {
        kind: "listed",
        description: "the equations of the scheme, those of the diagonals, and minors of X and Y",
        polynomials: madeOnce((budget) => listedGenerators(pair, w, budget)),
      },
    ],
    defaultOrder: "dual from nw by rows",
  };
}

function listedGenerators(pair: SquarePair, w: Permutation, budget?: Budget): Polynomial[] {
  const { ring, x, y } = pair;
  const northwest = essentialBounds(northwestRanks(w));
  const southeast = essentialBounds(southeastRanks(w));
  return [
    ...triangularEquations(pair, budget),
    ...diagonalEquations(pair, w, budget),
    ...rankMinors(ring, x, northwest, undefined, budget),
    ...rankMinors(ring, transposed(y), southeast, undefined, budget),
  ];
}

/** (XY)_ii − (YX)_w(i)w(i) for all i but the last. */
function diagonalEquations(pair: SquarePair, w: Permutation, budget?: Budget): Polynomial[] {
  return w
    .slice(0, -1)
    .map((value, i) =>
      productEntry(
        pair,
        { product: "XY", row: i, column: i },
        { product: "YX", row: value - 1, column: value - 1 },
        budget,
      ),
    );
}

function transposed(matrix: VariableMatrix): VariableMatrix {
  const cells = Array.from({ length: matrix.columns }, (_, j) =>
    matrix.cells.map((row) => row[j] as VariableIndex),
  );
  return { ...matrix, rows: matrix.columns, columns: matrix.rows, cells };
}

/** The ranks of the northwest corners of the matrix of w. */
function northwestRanks(w: Permutation): CornerRanks {
  return cornerSums(w.map((value) => w.map((_, j) => (value === j + 1 ? 1 : 0))));
}

/** The ranks of its southeast corners: those of the matrix turned by 180°, which is that of w₀ww₀. */
function southeastRanks(w: Permutation): CornerRanks {
  const turned = w.map((value) => w.length + 1 - value).reverse();
  return { ...northwestRanks(permutation(turned)), corner: "se" };
}
