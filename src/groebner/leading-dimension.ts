/**
 * When the size of a staircase proves that it is the whole one, so that no S-pair need be reduced. Let G be
 * elements of the ideal I over the rationals, with leading monomials that generate L ⊆ in(I).
 *
 * 1. Another Gröbner basis of I is known, and L leaves as many monomials standing as it does, finitely many:
 *    dim R/in(I) = dim R/I = dim R/L, so in(I) = L.
 *
 * 2. I has s generators f with integer coefficients in n variables, and modulo one prime p their ideal I_p has
 *    leading ideal L of codimension s, or L = (1). Then in(I) = L.
 *    Let A = Z_(p)[x]/(f). At a maximal ideal m that contains p and (f), Z_(p)[x]_m is regular of dimension
 *    n+1, and modulo the s+1 elements f, p it has dimension at most dim F_p[x]/I_p = n−s: so they are part of a
 *    system of parameters, hence a regular sequence in any order, and p is no zero divisor in A_m. At all
 *    other m it is a unit. So A has no p-torsion: if p^k·h is in the ideal of f over Z_(p), so is h.
 *    Now suppose that in(I) is larger than L. Then some h ≠ 0 in I has no monomial in L, since G reduces it,
 *    and it can be scaled to have coefficients in Z_(p), not all in (p). Some multiple p^k·h is in the ideal
 *    of f over Z_(p), so h is, and its image modulo p is an element of I_p, not 0, without a monomial in
 *    L = in(I_p): a contradiction. (No assumption on solutions at infinity: there p may be as bad as it likes.)
 * @source Matsumura, *Commutative Ring Theory*, sections 16 and 17, for regular sequences.
 */
import { codimensionOf, hilbertNumerator, reducedNumerator } from "../hilbert/hilbert-numerator.js";
import type { Budget } from "../outcomes/budget.js";
import { monomialIdeal } from "../polynomials/monomial-ideal.js";
import type { MonomialTable } from "../polynomials/monomial-table.js";
import { leadingMonomial, type Support } from "./rows.js";

/** The rows whose leading monomials generate a monomial ideal. */
export interface Staircase {
  readonly table: MonomialTable;
  readonly rows: readonly Support[];
}

/**
 * Has the ideal of the leading monomials codimension `count`, or is it the unit ideal? If they are those of an
 * ideal with `count` generators modulo a prime, the generators are a complete intersection there.
 * @throws LimitReached
 */
export function isCompleteIntersection(
  staircase: Staircase,
  count: number,
  budget: Budget,
): boolean {
  if (count > staircase.table.variableCount) return false;
  const codimension = codimensionOf(numerator(staircase, budget));
  return codimension === count || codimension === Infinity;
}

/** Do both leave the same number of monomials standing, finitely many? @throws LimitReached */
export function haveSameFiniteSize(a: Staircase, b: Staircase, budget: Budget): boolean {
  const size = finiteSize(a, budget);
  return size !== undefined && size === finiteSize(b, budget);
}

function finiteSize(staircase: Staircase, budget: Budget): bigint | undefined {
  const { codimension, h } = reducedNumerator(numerator(staircase, budget));
  if (codimension < staircase.table.variableCount) return undefined;
  return h.reduce((sum, c) => sum + c, 0n);
}

function numerator(
  { table, rows }: Staircase,
  budget: Budget,
): ReturnType<typeof hilbertNumerator> {
  const leads = rows.map((row) => table.exponents(leadingMonomial(row)));
  return hilbertNumerator(monomialIdeal(table.variableCount, leads), budget);
}
