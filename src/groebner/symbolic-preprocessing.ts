/**
 * Symbolic preprocessing (Faugère, *A new efficient algorithm for computing Gröbner bases (F4)*, JPAA
 * 139, 1999): given rows to reduce, finds every monomial that their reduction can meet and, for each
 * that a leading monomial divides, the multiple of a basis element that reduces it. The result is a
 * matrix whose columns are monomials, largest first; coefficients are not looked at.
 */
import type { Budget } from "../outcomes/budget.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";
import type { DivisorSearch } from "./divisor-search.js";
import type { Support } from "./rows.js";

/** A monomial multiple of a basis element. */
export interface Multiple {
  readonly element: number;
  readonly multiplier: MonomialId;
}

/** A multiple with the columns of its terms, in ascending order. */
export interface MatrixRow extends Multiple {
  readonly columns: Int32Array;
}

/** A matrix ready for reduction. */
export interface SymbolicMatrix {
  /** The monomial of each column, largest first. */
  readonly monomials: Int32Array;
  /** For each column the row that reduces it, if there is one; its first column is this one. */
  readonly pivots: readonly (MatrixRow | undefined)[];
  readonly rows: readonly MatrixRow[];
}

/** What a matrix is made from. */
export interface MatrixRequest {
  readonly rows: readonly Multiple[];
  /** Multiples that must be the pivots of their leading monomials. */
  readonly pivots: readonly Multiple[];
}

/** Builds matrices over one table; the scratch space is reused from one to the next. */
export class SymbolicPreprocessing {
  readonly #table: MonomialTable;
  /** For each monomial: 1 + its place in `#met`, later 1 + its column; 0 outside the matrix. */
  #mark = new Int32Array(1024);
  #met: number[] = [];

  /** For matrices over the monomials of a table. */
  constructor(table: MonomialTable) {
    this.#table = table;
  }

  /** The matrix in which the requested rows can be fully reduced by the elements of `divisors`. */
  build(
    request: MatrixRequest,
    elements: readonly Support[],
    divisors: DivisorSearch,
    budget: Budget,
  ): SymbolicMatrix {
    this.#met = [];
    const reducers = new Map<number, MatrixRow>();
    for (const pivot of request.pivots) {
      const row = this.#place(pivot, elements);
      reducers.set(row.columns[0] as number, row);
    }
    const rows = request.rows.map((multiple) => this.#place(multiple, elements));
    for (let k = 0; k < this.#met.length; k++) {
      budget.spend(() => `preparing a matrix of ${this.#met.length} columns`);
      const monomial = this.#met[k] as MonomialId;
      if (reducers.has(monomial)) continue;
      const element = divisors.find(monomial);
      if (element === -1) continue;
      const lead = (elements[element] as Support).monomials[0] as MonomialId;
      const multiplier = this.#table.quotient(monomial, lead);
      reducers.set(monomial, this.#place({ element, multiplier }, elements));
    }
    return this.#arrange(rows, reducers);
  }

  /** The monomials of a multiple, marked as met; `columns` holds ids until `#arrange`. */
  #place({ element, multiplier }: Multiple, elements: readonly Support[]): MatrixRow {
    const { monomials } = elements[element] as Support;
    const table = this.#table;
    const columns = new Int32Array(monomials.length);
    for (let k = 0; k < monomials.length; k++) {
      const id = table.product(multiplier, monomials[k] as MonomialId);
      columns[k] = id;
      if (id >= this.#mark.length) this.#growMarks();
      if (this.#mark[id] === 0) {
        this.#met.push(id);
        this.#mark[id] = this.#met.length;
      }
    }
    return { element, multiplier, columns };
  }

  #arrange(rows: readonly MatrixRow[], reducers: ReadonlyMap<number, MatrixRow>): SymbolicMatrix {
    const table = this.#table;
    const monomials = Int32Array.from(this.#met).sort((a, b) =>
      table.compare(b as MonomialId, a as MonomialId),
    );
    const mark = this.#mark;
    for (let column = 0; column < monomials.length; column++) {
      mark[monomials[column] as number] = column;
    }
    const pivots = Array.from(monomials, (id) => reducers.get(id));
    const renumber = (row: MatrixRow): void => {
      const { columns } = row;
      for (let k = 0; k < columns.length; k++) columns[k] = mark[columns[k] as number] as number;
    };
    rows.forEach(renumber);
    for (const row of reducers.values()) renumber(row);
    for (const id of monomials) mark[id] = 0;
    return { monomials, pivots, rows };
  }

  #growMarks(): void {
    const larger = new Int32Array(2 * Math.max(this.#mark.length, this.#table.size));
    larger.set(this.#mark);
    this.#mark = larger;
  }
}
