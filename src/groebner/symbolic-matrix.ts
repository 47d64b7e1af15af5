/**
 * A matrix ready for reduction, in the kernel's memory. It lasts until the next one is built there; so do
 * the arrays of columns that it hands out.
 */
import type { Workspace, WorkspaceRow } from "../kernel/workspace.js";
import type { MonomialTable } from "../polynomials/monomial-table.js";

/** The rows to reduce, the pivots that reduce them, and what the columns stand for. */
export class SymbolicMatrix {
  readonly workspace: Workspace;
  /** The number of the first row to reduce among all rows of the workspace. */
  readonly firstRow: number;
  /** How many rows are to be reduced. */
  readonly rowCount: number;
  readonly #table: MonomialTable;
  /** For each column its number in the order in which columns were met. */
  readonly #numbers: Uint32Array;

  /** The matrix that stands in the workspace; `numbers` are the columns' old numbers. */
  constructor(
    table: MonomialTable,
    space: Workspace,
    numbers: Uint32Array,
    { firstRow, rowCount }: { readonly firstRow: number; readonly rowCount: number },
  ) {
    this.workspace = space;
    this.firstRow = firstRow;
    this.rowCount = rowCount;
    this.#table = table;
    this.#numbers = numbers;
  }

  /** How many columns there are. */
  get width(): number {
    return this.#numbers.length;
  }

  /** The monomials of columns, brought into the table. */
  monomials(columns: Int32Array): Int32Array {
    const table = this.#table;
    const exponents = new Uint16Array(table.variableCount);
    const monomials = new Int32Array(columns.length);
    for (let k = 0; k < columns.length; k++) {
      this.workspace.readExponents(this.#numbers[columns[k] as number] as number, exponents);
      monomials[k] = table.intern(exponents);
    }
    return monomials;
  }

  /** A row to reduce; columns ascending. */
  row(k: number): WorkspaceRow {
    return this.workspace.row(this.firstRow + k);
  }

  /** The row that reduces a column, if there is one; its first column is this one. */
  pivot(column: number): WorkspaceRow | undefined {
    const row = this.workspace.pivotOf(column);
    return row < 0 ? undefined : this.workspace.row(row);
  }
}
