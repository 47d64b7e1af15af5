/**
 * The CDG generators are a diagonal Gröbner basis exactly when w avoids these patterns; in S_5 exactly 13254
 * and 21543 contain one.
 * @source Klein, *Diagonal degenerations of matrix Schubert varieties*, Algebraic Combinatorics 6 (2023).
 */
export const CDG_PATTERNS: readonly string[] = [
  "13254",
  "21543",
  "214635",
  "215364",
  "215634",
  "241635",
  "315264",
  "4261735",
];
