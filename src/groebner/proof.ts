/**
 * The proof that a lifted basis G is the reduced Gröbner basis of the ideal I of the inputs, of which it
 * is known that modulo some prime p its leading monomials are those of G.
 *
 * For homogeneous I: the S-pairs of G reduce to 0, so G is a Gröbner basis of (G); the inputs reduce to 0
 * by G, so I ⊆ (G); and dim (G)_d = dim (I mod p)_d ≤ dim I_d in every degree d (Arnold, *Modular
 * algorithms for computing Gröbner bases*, J. Symb. Comp. 35, 2003). A replayed trace proves nothing modulo its
 * own prime, but it reproduces the leading monomials of the run that left it, which was complete.
 *
 * For other I, that G lies in I is proved in one of two ways:
 * - a basis of I in another order is known: G reduces to 0 by it;
 * - else the traced run is replayed over the integers, which gives elements of I, and G reduces to 0 by
 *   them. Only for graded orders: in others the replayed coefficients explode.
 * Then the dimension of the staircase may be enough (`leading-dimension.ts`): when the known basis leaves as
 * many monomials standing, or when the inputs are a complete intersection modulo p. Else S-pairs and inputs
 * are reduced to 0 as above: I ⊆ (G) ⊆ I.
 *
 * All reductions to 0 are exact.
 */
import type { Budget } from "../outcomes/budget.js";
import type { MonomialTable } from "../polynomials/monomial-table.js";
import type { Multigrading } from "../polynomials/multigrading.js";
import { exactArithmetic } from "./exact-elimination.js";
import { replayTrace, type Trace } from "./f4.js";
import { haveSameFiniteSize, isCompleteIntersection } from "./leading-dimension.js";
import { type ExactRow, rowOver } from "./rows.js";
import { checkPairs, reduceToZero } from "./s-pair-check.js";

/** How (G) ⊆ I is proved; see the head of the file. */
export type Membership =
  | { readonly kind: "homogeneous" }
  | { readonly kind: "replay"; readonly trace: Trace }
  | { readonly kind: "known"; readonly table: MonomialTable; readonly rows: readonly ExactRow[] };

/** A basis that is claimed to be a Gröbner basis of the ideal of the inputs. */
export interface BasisClaim {
  readonly table: MonomialTable;
  readonly inputs: readonly ExactRow[];
  /** Its leading monomials must be those of the reduced basis of the inputs modulo a prime. */
  readonly basis: readonly ExactRow[];
  readonly membership: Membership;
  /** A grading in which the inputs are homogeneous. */
  readonly grading: () => Multigrading;
}

/** Is the claim proved? False means that this proof failed, not that the claim is false. */
export function proveBasis(claim: BasisClaim, budget: Budget): boolean {
  const { table, inputs, basis, grading } = claim;
  if (hasAllLeadingMonomials(claim, budget)) return liesInIdeal(claim, budget);
  return (
    reduceToZero(table, inputs, basis, grading, budget) &&
    checkPairs(table, basis, grading, budget).failing === undefined &&
    liesInIdeal(claim, budget)
  );
}

/** If G lies in I, do its leading monomials generate in(I) for reasons of dimension? */
function hasAllLeadingMonomials(claim: BasisClaim, budget: Budget): boolean {
  const { table, inputs, basis, membership } = claim;
  switch (membership.kind) {
    case "homogeneous":
      return false;
    case "known":
      return haveSameFiniteSize({ table, rows: basis }, membership, budget);
    case "replay":
      return isCompleteIntersection({ table, rows: basis }, inputs.length, budget);
  }
}

function liesInIdeal(claim: BasisClaim, budget: Budget): boolean {
  const { table, inputs, basis, membership, grading } = claim;
  switch (membership.kind) {
    case "homogeneous":
      return true;
    case "known": {
      const moved = basis.map((row) => rowOver(membership.table, table, row));
      return reduceToZero(membership.table, moved, membership.rows, grading, budget);
    }
    case "replay": {
      const members = replayTrace(
        { table, inputs, arithmetic: exactArithmetic(), grading, budget },
        membership.trace,
      );
      if (members === undefined) return false;
      const minimal = Array.from(members.minimal, (k) => members.elements[k] as ExactRow);
      return reduceToZero(table, basis, minimal, grading, budget);
    }
  }
}
