/**
 * The bumpless pipe dreams of size n, reduced or not, are as many as the alternating sign matrices: the
 * Robbins numbers Π_{k<n} (3k+1)!/(n+k)!.
 * @source Weigandt, *Bumpless pipe dreams and alternating sign matrices*, arXiv 2003.07342; also recomputed
 * by an independent program.
 */
export const ROBBINS_NUMBERS: readonly bigint[] = [1n, 2n, 7n, 42n, 429n, 7436n];
