/**
 * Buchberger's criterion, exactly: a set is a Gröbner basis of what it generates when the S-polynomials
 * of its critical pairs reduce to zero. Superfluous pairs are dropped by the criteria of Gebauer and
 * Möller; the rest are reduced over the integers, one matrix a degree, up to the first failure.
 */
import type { Budget } from "../outcomes/budget.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";
import type { Multigrading } from "../polynomials/multigrading.js";
import { CriticalPairs } from "./critical-pairs.js";
import { DivisorSearch } from "./divisor-search.js";
import { exactArithmetic } from "./exact-elimination.js";
import { matrixOfPairs } from "./f4.js";
import { MatrixReduction } from "./matrix-reduction.js";
import { type ExactRow, leadingMonomial } from "./rows.js";
import type { Multiple } from "./symbolic-preprocessing.js";

/** A pair whose S-polynomial does not reduce to zero. */
export interface FailingPair {
  /** Indices into the rows given. */
  readonly first: number;
  readonly second: number;
  /** The full normal form of the S-polynomial: no leading monomial of the set divides a term of it. */
  readonly remainder: ExactRow;
}

/** The outcome of the check; `pairs` counts the S-polynomials that were reduced. */
export interface PairCheck {
  readonly failing: FailingPair | undefined;
  readonly pairs: number;
}

/**
 * Checks every critical pair of the rows; in case of failure the first failing pair by degree, then by
 * lcm. @throws LimitReached
 */
export function checkPairs(
  table: MonomialTable,
  rows: readonly ExactRow[],
  grading: () => Multigrading,
  budget: Budget,
): PairCheck {
  const { pairs, divisors } = pairsOf(table, rows, budget);
  const matrices = new MatrixReduction(table, exactArithmetic(), grading, budget);
  const total = pairs.size;
  let reduced = 0;
  while (pairs.size > 0) {
    budget.spend(() => `reducing S-pair ${reduced + 1} of ${total}`);
    const request = matrixOfPairs(table, pairs.take(pairs.nextSugar), rows);
    const remainders = matrices.reduce(request, rows, divisors, "independent");
    reduced += request.rows.length;
    const failures = remainders.map(({ row, source }) => {
      const { element, lead } = located(table, rows, request.rows[source] as Multiple);
      return { row, element, lead };
    });
    const [failure] = failures.sort((a, b) => table.compare(a.lead, b.lead));
    if (failure !== undefined) {
      const { row, element, lead } = failure;
      const partner = request.pivots
        .map((pivot) => located(table, rows, pivot))
        .find((pivot) => pivot.lead === lead) as Located;
      return {
        failing: { first: partner.element, second: element, remainder: row },
        pairs: reduced,
      };
    }
  }
  return { failing: undefined, pairs: reduced };
}

interface Located {
  readonly element: number;
  readonly lead: MonomialId;
}

function located(
  table: MonomialTable,
  rows: readonly ExactRow[],
  { element, multiplier }: Multiple,
): Located {
  const lead = leadingMonomial(rows[element] as ExactRow);
  return { element, lead: table.product(multiplier, lead) };
}

/** Does every one of the polynomials reduce to zero by the basis, exactly? @throws LimitReached */
export function reduceToZero(
  table: MonomialTable,
  polynomials: readonly ExactRow[],
  basis: readonly ExactRow[],
  grading: () => Multigrading,
  budget: Budget,
): boolean {
  const elements = [...basis, ...polynomials];
  const divisors = new DivisorSearch(table);
  basis.forEach((row, k) => {
    divisors.add(k, leadingMonomial(row));
  });
  const rows = polynomials.map((_, k) => ({ element: basis.length + k, multiplier: table.one }));
  const matrices = new MatrixReduction(table, exactArithmetic(), grading, budget);
  return matrices.reduce({ rows, pivots: [] }, elements, divisors, "independent").length === 0;
}

/* Smallest leading monomials first, so that redundant elements drop out of later pairs at once. */
function pairsOf(
  table: MonomialTable,
  rows: readonly ExactRow[],
  budget: Budget,
): { readonly pairs: CriticalPairs; readonly divisors: DivisorSearch } {
  const pairs = new CriticalPairs(table);
  const divisors = new DivisorSearch(table);
  const ascending = rows
    .map((row, index) => ({ index, lead: leadingMonomial(row), row }))
    .sort((a, b) => table.compare(a.lead, b.lead) || a.index - b.index);
  for (const { index, lead, row } of ascending) {
    budget.spend(() => `making the pairs of ${rows.length} elements`);
    const degree = row.monomials.reduce((d, id) => Math.max(d, table.degree(id as MonomialId)), 0);
    pairs.add(index, lead, degree);
    divisors.add(index, lead);
  }
  return { pairs, divisors };
}
