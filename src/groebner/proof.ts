/**
 * The proof that a lifted basis G is a Gröbner basis of the ideal I of the inputs. In all cases the
 * S-pairs of G reduce to 0 exactly, so G is a Gröbner basis of (G), and the inputs reduce to 0 by G
 * exactly, so I ⊆ (G). What is left is (G) ⊆ I, in one of three ways:
 * - homogeneous I: the leading monomials of G are those of a basis of I modulo a prime p, so
 *   dim (G)_d = dim (I mod p)_d ≤ dim I_d in every degree d (Arnold, *Modular algorithms for computing
 *   Gröbner bases*, J. Symb. Comp. 35, 2003). A replayed trace proves nothing modulo its own prime, but
 *   it reproduces the leading monomials of the run that left it, which was complete;
 * - a basis of I in another order is known: G reduces to 0 by it exactly;
 * - else the traced run is replayed over the integers, which gives elements of I, and G reduces to 0 by
 *   them exactly. Only for graded orders: in others the replayed coefficients explode.
 */
import type { Budget } from "../outcomes/budget.js";
import type { MonomialTable } from "../polynomials/monomial-table.js";
import type { Multigrading } from "../polynomials/multigrading.js";
import { exactArithmetic } from "./exact-elimination.js";
import { replayTrace, type Trace } from "./f4.js";
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
  return (
    reduceToZero(table, inputs, basis, grading, budget) &&
    checkPairs(table, basis, grading, budget).failing === undefined &&
    liesInIdeal(claim, budget)
  );
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
