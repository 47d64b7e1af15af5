/**
 * Symbolic preprocessing (Faugère, *A new efficient algorithm for computing Gröbner bases (F4)*, JPAA
 * 139, 1999): given rows to reduce, finds every monomial that their reduction can meet and, for each
 * that a leading monomial divides, the multiple of a basis element that reduces it. The result is a
 * matrix whose columns are monomials, largest first; coefficients are not looked at. The work is the
 * kernel's; here is what it is given. Columns are numbered within their matrix, and only those that a
 * result needs become monomials of the table, which so stays small.
 */
import * as at from "../kernel/layout.js";
import { workspace } from "../kernel/thread-workspace.js";
import { full, type Workspace } from "../kernel/workspace.js";
import type { Budget } from "../outcomes/budget.js";
import { ExponentOverflow } from "../polynomials/exponents.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";
import type { DivisorSearch } from "./divisor-search.js";
import type { Support } from "./rows.js";
import { SymbolicMatrix } from "./symbolic-matrix.js";

/** A monomial multiple of a basis element. */
export interface Multiple {
  readonly element: number;
  readonly multiplier: MonomialId;
}

/** What a matrix is made from. */
export interface MatrixRequest {
  readonly rows: readonly Multiple[];
  /** Multiples that must be the pivots of their leading monomials. */
  readonly pivots: readonly Multiple[];
}

/** Terms placed at a time: some milliseconds, more where memory is touched for the first time. */
const FUEL = 50_000;
/** How much of a budget's patience that takes. */
const WORK_OF_FUEL = 4;

/** Builds matrices over one table, one at a time: a matrix is gone when the next is built. */
export class SymbolicPreprocessing {
  readonly #table: MonomialTable;
  readonly #workspace: Workspace;
  #wide = false;
  /** The elements that the workspace has, by index. */
  #elements: (Support | undefined)[] = [];
  #divisors: { readonly search: DivisorSearch; readonly version: number } | undefined;

  /** For matrices over the monomials of a table. */
  constructor(table: MonomialTable) {
    this.#table = table;
    this.#workspace = workspace();
  }

  /**
   * The matrix in which the requested rows can be fully reduced by the elements of `divisors`.
   * @throws LimitReached
   */
  build(
    request: MatrixRequest,
    elements: readonly Support[],
    divisors: DivisorSearch,
    budget: Budget,
  ): SymbolicMatrix {
    for (;;) {
      const matrix = this.#tryBuild(request, elements, divisors, budget);
      if (matrix !== undefined) return matrix;
      if (this.#wide) throw new ExponentOverflow();
      this.#wide = true;
      this.#divide();
    }
  }

  /** As `build`; undefined when an exponent does not fit. */
  #tryBuild(
    { rows, pivots }: MatrixRequest,
    elements: readonly Support[],
    divisors: DivisorSearch,
    budget: Budget,
  ): SymbolicMatrix | undefined {
    const space = this.#workspace;
    if (!space.isOwnedBy(this)) this.#divide();
    space.clear();
    if (!space.copyMonomials(this.#table)) return undefined;
    this.#bringDivisors(divisors, elements);
    for (const { element } of pivots) this.#bring(element, elements);
    for (const { element } of rows) this.#bring(element, elements);
    for (const pivot of pivots) {
      const row = this.#place(pivot);
      if (row === undefined) return undefined;
      space.makePivot(row);
    }
    for (const row of rows) {
      if (this.#place(row) === undefined) return undefined;
    }
    for (let state = -1; state !== at.DONE; ) {
      budget.spend(() => `preparing a matrix of ${space.columnCount} columns`, WORK_OF_FUEL);
      state = space.kernel.closeMatrix(FUEL);
      if (state === at.EXPONENT_TOO_LARGE) return undefined;
      if (state === at.OUT_OF_SPACE) full("columns or rows");
    }
    const firstRow = pivots.length;
    const numbers = space.arrangeColumns(firstRow, firstRow + rows.length);
    return new SymbolicMatrix(this.#table, space, numbers, { firstRow, rowCount: rows.length });
  }

  #divide(): void {
    this.#workspace.divide(this, this.#table, this.#wide);
    this.#elements = [];
    this.#divisors = undefined;
  }

  #bringDivisors(search: DivisorSearch, elements: readonly Support[]): void {
    const owners = search.elements();
    for (const element of owners) this.#bring(element, elements);
    const known = this.#divisors;
    if (known?.search === search && known.version === search.version) return;
    this.#workspace.setLeads(search.leads(), search.masks(), owners);
    this.#divisors = { search, version: search.version };
  }

  #bring(element: number, elements: readonly Support[]): void {
    const row = elements[element] as Support & { readonly coefficients?: unknown };
    if (this.#elements[element] === row) return;
    const { monomials, coefficients } = row;
    const residues = coefficients instanceof Int32Array ? coefficients : undefined;
    this.#workspace.setElement(element, monomials, residues);
    this.#elements[element] = row;
  }

  /** The number of the row; undefined when an exponent does not fit. */
  #place({ element, multiplier }: Multiple): number | undefined {
    const row = this.#workspace.kernel.placeRow(element, multiplier);
    if (row === -at.EXPONENT_TOO_LARGE) return undefined;
    return row < 0 ? full("columns or rows") : row;
  }
}
