/**
 * Numbers of vexillary permutations (those that avoid 2143) of S_n, n = 1, 2, …
 * @source Knutson, Miller, Yong, *Gröbner geometry of vertex decompositions and of flagged tableaux*, J. reine
 * angew. Math. 630 (2009), for their role; also recomputed by an independent program.
 */
export const VEXILLARY_NUMBERS: readonly number[] = [1, 2, 6, 23, 103, 513];
