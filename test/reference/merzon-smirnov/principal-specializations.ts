/**
 * Sums and maxima of S_w(1,…,1) over S_n.
 * @source Merzon, Smirnov, *Determinantal identities for flagged Schur and Schubert polynomials*, arXiv
 * 1410.6857; Stanley, *Some Schubert shenanigans*, arXiv 1704.00851 (from memory); to n = 6 also recomputed
 * by an independent program. The maximum for n = 7 is from memory.
 */

/** Σ over S_n, n = 1, 2, … */
export const SUMS: readonly bigint[] = [1n, 2n, 7n, 41n, 393n, 6080n];

/** The maximum over S_n, n = 1, 2, … */
export const MAXIMA: readonly bigint[] = [1n, 1n, 2n, 5n, 14n, 84n, 660n];
