/**
 * Reducing rows by a basis, a multidegree at a time. Rows of different multidegree share no monomial, so
 * each multidegree is a matrix of its own: small tables of columns, short accumulators, and a peak of
 * memory of one block instead of all.
 */
import type { Budget } from "../outcomes/budget.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";
import { type Multigrading, multidegreeKey } from "../polynomials/multigrading.js";
import type { DivisorSearch } from "./divisor-search.js";
import type { Missing } from "./hilbert-guide.js";
import type { EliminationMode, Remainder, RowArithmetic } from "./row-arithmetic.js";
import type { Support } from "./rows.js";
import {
  type MatrixRequest,
  type Multiple,
  SymbolicPreprocessing,
} from "./symbolic-preprocessing.js";

/** Requests with fewer terms than this in all are not worth the split. */
const TERMS_WORTH_SPLITTING = 2000;

/** Matrix reduction over one table and one coefficient domain. */
export class MatrixReduction<R extends Support> {
  readonly #table: MonomialTable;
  readonly #arithmetic: RowArithmetic<R>;
  readonly #grading: () => Multigrading;
  readonly #budget: Budget;
  readonly #matrices: SymbolicPreprocessing;

  /**
   * @param grading one in which all rows to come are homogeneous, asked for only when it pays; no weights:
   * everything is one block.
   */
  constructor(
    table: MonomialTable,
    arithmetic: RowArithmetic<R>,
    grading: () => Multigrading,
    budget: Budget,
  ) {
    this.#table = table;
    this.#arithmetic = arithmetic;
    this.#grading = grading;
    this.#budget = budget;
    this.#matrices = new SymbolicPreprocessing(table);
  }

  /**
   * Reduces the requested multiples of elements by the elements of `divisors`; `source` of a remainder is
   * its index among the requested rows.
   * @param missing what is still to be found: rows where nothing is missing are passed over. @throws LimitReached
   */
  reduce(
    request: MatrixRequest,
    elements: readonly R[],
    divisors: DivisorSearch,
    mode: EliminationMode,
    missing?: Missing,
  ): Remainder<R>[] {
    const remainders: Remainder<R>[] = [];
    for (const { rows, pivots, sources, most } of this.#blocks(request, elements, missing)) {
      const matrix = this.#matrices.build({ rows, pivots }, elements, divisors, this.#budget);
      const found = this.#arithmetic.eliminate(matrix, elements, { mode, most }, this.#budget);
      for (const { row, source } of found) {
        remainders.push({ row, source: sources[source] as number });
      }
    }
    return remainders;
  }

  #blocks(
    { rows, pivots }: MatrixRequest,
    elements: readonly Support[],
    missing: Missing | undefined,
  ): Iterable<Block> {
    const terms = rows.reduce((sum, row) => sum + termsOf(elements, row), 0);
    if (rows.length < 2 || terms < TERMS_WORTH_SPLITTING || this.#grading().weights.length < 2) {
      return [
        {
          rows: [...rows],
          pivots: [...pivots],
          sources: Array.from(rows.keys()),
          most: missing?.total ?? Infinity,
        },
      ];
    }
    const blocks = new Map<string, Block>();
    const blockOf = ({ element, multiplier }: Multiple): Block => {
      const lead = (elements[element] as Support).monomials[0] as MonomialId;
      const exponents = this.#table.exponents(this.#table.product(multiplier, lead));
      const key = multidegreeKey(this.#grading(), exponents);
      let block = blocks.get(key);
      if (block === undefined) {
        block = { rows: [], pivots: [], sources: [], most: missing?.at(exponents) ?? Infinity };
        blocks.set(key, block);
      }
      return block;
    };
    rows.forEach((row, source) => {
      const block = blockOf(row);
      block.rows.push(row);
      block.sources.push(source);
    });
    for (const pivot of pivots) blockOf(pivot).pivots.push(pivot);
    return [...blocks.values()].filter(({ most }) => most > 0);
  }
}

/** The rows of one multidegree. */
interface Block {
  readonly rows: Multiple[];
  readonly pivots: Multiple[];
  /** For each row its index among the requested ones. */
  readonly sources: number[];
  /** More remainders than this there cannot be. */
  readonly most: number;
}

function termsOf(elements: readonly Support[], { element }: Multiple): number {
  return (elements[element] as Support).monomials.length;
}
