/**
 * Numbers of reduced pipe dreams, S_w(1,…,1).
 * @source Knutson, Miller, *Gröbner geometry of Schubert polynomials*, Ann. of Math. 161 (2005), for the
 * statement; the numbers also recomputed by an independent program.
 */

/** Every w of S_3 and S_4 with more than one reduced pipe dream. */
export const SMALL_COUNTS: Readonly<Record<string, number>> = {
  "132": 2,
  "1432": 5,
  "1243": 3,
  "1342": 3,
  "1423": 3,
  "2143": 3,
  "1324": 2,
  "2413": 2,
  "2431": 2,
  "3142": 2,
  "4132": 2,
};

/** Some of S_5 and S_6. */
export const LARGER_COUNTS: readonly (readonly [w: string, count: number])[] = [
  ["13254", 8],
  ["21543", 14],
  ["31524", 5],
  ["14523", 6],
  ["214365", 15],
];

/** Components of the antidiagonal limit by hand: w, and the cells of the variables that vanish. */
export const SUBSPACES: readonly (readonly [w: string, cells: readonly string[]])[] = [
  ["231", ["11 21"]],
  ["312", ["11 12"]],
  ["321", ["11 12 21"]],
  ["132", ["12", "21"]],
];
