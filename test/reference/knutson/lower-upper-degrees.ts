/**
 * Degrees of lower-upper varieties and of commuting varieties.
 * @source Knutson, *Some schemes related to the commuting variety*, J. Algebraic Geom. 14 (2005), from memory; *Generic
 * pipe dreams, lower-upper varieties, and Schwartz–MacPherson classes*, arXiv 2411.11208; the commuting ones OEIS
 * A029729. All recomputed by an independent program.
 */

/** The degree of E_w for all w with n = 2 and 3. */
export const LOWER_UPPER_DEGREES: readonly (readonly [w: string, degree: bigint])[] = [
  ["12", 3n],
  ["21", 1n],
  ["123", 31n],
  ["132", 13n],
  ["213", 13n],
  ["231", 3n],
  ["312", 3n],
  ["321", 1n],
];

/** The degree of the variety of commuting n×n matrices, n = 1, 2, 3. */
export const COMMUTING_DEGREES: readonly bigint[] = [1n, 3n, 31n];
