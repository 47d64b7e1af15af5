/**
 * The workspace: the memory that matrices are made in, with its kernel. Who computes divides it into regions
 * for its own monomials; a region that is full is a limit reached.
 */
import { LimitReached } from "../outcomes/budget.js";
import type { MonomialTable } from "../polynomials/monomial-table.js";
import type { Kernel } from "./kernel.js";
import * as at from "./layout.js";
import type { KernelMemory } from "./make-kernel.js";
import { divideMemory, type Regions, roundUp } from "./regions.js";

/** A row of a matrix: a multiple of an element, with the columns of its terms. */
export interface WorkspaceRow {
  readonly element: number;
  /** Not a copy: gone when the next matrix is built. */
  readonly columns: Int32Array;
}

/** A memory with its kernel, divided for one computation at a time. */
export class Workspace {
  readonly kernel: Kernel;
  readonly #words: Uint32Array;
  readonly #signed: Int32Array;
  readonly #halves: Uint16Array;
  readonly #bytes: Uint8Array;
  readonly #longs: BigInt64Array;
  /** Who divided the memory last. */
  #owner: object | undefined;
  #regions: Regions;
  #monomialCount = 0;
  #termsUsed = 0;
  #orderEnd = 0;

  /** A workspace in the given memory, all zero, with the given kernel. */
  constructor({ buffer }: KernelMemory, kernel: Kernel) {
    this.kernel = kernel;
    this.#words = new Uint32Array(buffer);
    this.#signed = new Int32Array(buffer);
    this.#halves = new Uint16Array(buffer);
    this.#bytes = new Uint8Array(buffer);
    this.#longs = new BigInt64Array(buffer);
    this.#regions = divideMemory(this.#words, { monomialBytes: 16, variables: 1, orderBytes: 0 });
  }

  /** Was `owner` the last to divide this memory? */
  isOwnedBy(owner: object): boolean {
    return this.#owner === owner;
  }

  /**
   * Divides the memory for monomials of a table and forgets what was in it.
   * @param wide exponents of 16 bits, not 8. @throws LimitReached when there are too many variables
   */
  divide(owner: object, table: MonomialTable, wide: boolean): void {
    const { variableCount, order } = table;
    const monomialBytes = Math.max(16, roundUp(wide ? 2 * variableCount : variableCount, 16));
    if (at.MULTIPLIER_AT + monomialBytes > at.HEADER_BYTES) full("variables");
    const terms = order.comparisons.reduce((sum, c) => sum + c.weights.length, variableCount);
    const orderBytes = 16 * terms + 8 * (order.comparisons.length + 1);
    this.#owner = owner;
    this.#setField(at.MONOMIAL_BYTES_AT, monomialBytes);
    this.#setField(at.WIDE_AT, wide ? 1 : 0);
    this.#setField(at.TWO_BIT_MASKS_AT, variableCount <= 16 ? 1 : 0);
    this.#setField(at.LEAD_COUNT_AT, 0);
    this.#regions = divideMemory(this.#words, {
      monomialBytes,
      variables: variableCount,
      orderBytes,
    });
    this.#monomialCount = 0;
    this.#termsUsed = this.#regions.terms;
    this.#signed.set(table.hashWeights, this.#field(at.HASH_WEIGHTS_AT) >>> 2);
    this.#orderEnd = this.#writeOrder(table);
    this.clear();
  }

  /** Empties the matrix; elements, leads and monomials stay. */
  clear(): void {
    this.release(this.#regions.heap);
    this.kernel.clearColumns(256);
  }

  /** Brings in the monomials that the table has gained. False when one does not fit into 8 bits. */
  copyMonomials(table: MonomialTable): boolean {
    const { variableCount, size } = table;
    if (size > this.#regions.monomialCapacity) full("monomials");
    const bytes = this.#field(at.MONOMIAL_BYTES_AT);
    const atOnce = Math.floor(2 ** 20 / bytes);
    while (this.#monomialCount < size) {
      const first = this.#monomialCount;
      const count = Math.min(atOnce, size - first);
      const staging = this.#field(at.HEAP_AT);
      this.#halves.set(table.exponentsBetween(first, first + count), staging / 2);
      const exponents = this.addressOfMonomial(first);
      const hashes = this.#field(at.MONOMIAL_HASHES_AT) + 4 * first;
      const done = this.kernel.pack(staging, variableCount, count, exponents, hashes);
      if (done !== at.DONE) return false;
      this.#monomialCount = first + count;
    }
    return true;
  }

  /** Where the packed monomial with an id stands, once it was brought in. */
  addressOfMonomial(id: number): number {
    return this.#field(at.MONOMIAL_EXPONENTS_AT) + id * this.#field(at.MONOMIAL_BYTES_AT);
  }

  /** Sets the leading monomials that reduce, their support masks, and the elements they belong to. */
  setLeads(monomials: Int32Array, masks: Int32Array, elements: Int32Array): void {
    const count = monomials.length;
    if (count + 4 > this.#regions.leadCapacity) full("leading monomials");
    this.#setField(at.LEAD_COUNT_AT, count);
    this.#signed.set(monomials, this.#field(at.LEAD_MONOMIALS_AT) >>> 2);
    this.#signed.set(elements, this.#field(at.LEAD_ELEMENTS_AT) >>> 2);
    const start = this.#field(at.LEAD_MASKS_AT) >>> 2;
    this.#signed.set(masks, start);
    this.#signed.fill(-1, start + count, start + roundUp(count, 4));
  }

  /** Brings in an element: its monomials, and its residues if it has them. */
  setElement(element: number, monomials: Int32Array, residues: Int32Array | undefined): void {
    if (element >= this.#regions.elementCapacity) full("elements");
    const record = (this.#field(at.ELEMENTS_AT) >>> 2) + 4 * element;
    this.#words[record] = this.#keep(monomials);
    this.#words[record + 1] = monomials.length;
    this.#words[record + 2] = residues === undefined ? 0 : this.#keep(residues);
  }

  /**
   * Sorts the columns into the table's order and renumbers the rows; all rows but those from `firstRow` up to
   * (without) `endRow` become pivots. Returns the old numbers of the columns in order.
   */
  arrangeColumns(firstRow: number, endRow: number): Uint32Array {
    const count = this.columnCount;
    const sortBytes = 24 * count + 1024;
    const scratch = this.reserve(sortBytes + 4 * count);
    const sorted = this.kernel.sortColumns(this.#regions.order, this.#orderEnd, scratch) >>> 0;
    const numbers = this.#words.slice(sorted >>> 2, (sorted >>> 2) + count);
    this.kernel.renumberColumns(sorted, scratch + sortBytes, firstRow, endRow);
    this.release(scratch);
    return numbers;
  }

  /** Takes bytes from the heap. @throws LimitReached */
  reserve(bytes: number): number {
    const start = roundUp(this.#field(at.HEAP_AT), 16);
    const end = start + roundUp(bytes, 16) + 16;
    if (end > this.#field(at.HEAP_END_AT)) full("rows");
    this.#setField(at.HEAP_AT, end);
    return start;
  }

  /** Gives back everything that was taken from the heap from this address on. */
  release(address: number): void {
    this.#setField(at.HEAP_AT, address);
  }

  /** Sets bytes of the heap to zero. */
  fillWithZeros(address: number, bytes: number): void {
    this.#words.fill(0, address >>> 2, (address + bytes) >>> 2);
  }

  /** How many columns the matrix has. */
  get columnCount(): number {
    return this.#field(at.COLUMN_COUNT_AT);
  }

  /** A row: its element and its columns. */
  row(row: number): WorkspaceRow {
    const entry = this.#entry(row);
    return {
      element: this.#signed[entry] as number,
      columns: this.integers(this.#words[entry + 2] as number, this.#words[entry + 1] as number),
    };
  }

  /** Where a row's columns and residues stand, and how many there are. */
  placeOfRow(row: number): { readonly columns: number; readonly residues: number; length: number } {
    const entry = this.#entry(row);
    return {
      columns: this.#words[entry + 2] as number,
      residues: this.#words[entry + 3] as number,
      length: this.#words[entry + 1] as number,
    };
  }

  /** Adds a row that is no multiple of an element; its number. */
  addRow(columns: number, residues: number, length: number): number {
    const row = this.#field(at.ROW_COUNT_AT);
    if (row >= this.#field(at.ROW_CAPACITY_AT)) full("rows");
    this.#setField(at.ROW_COUNT_AT, row + 1);
    this.#words.set([-1, length, columns, residues], this.#entry(row));
    return row;
  }

  /** Leaves the first columns without pivots. */
  forgetPivots(width: number): void {
    this.integers(this.#field(at.COLUMN_PIVOTS_AT), width).fill(-1);
  }

  /** Makes a row the pivot of its first column. */
  makePivot(row: number): void {
    const columns = this.#words[this.#entry(row) + 2] as number;
    const column = this.#words[columns >>> 2] as number;
    this.#words[(this.#field(at.COLUMN_PIVOTS_AT) >>> 2) + column] = row;
  }

  /** The row that reduces a column, or −1. */
  pivotOf(column: number): number {
    return this.#signed[(this.#field(at.COLUMN_PIVOTS_AT) >>> 2) + column] as number;
  }

  /** Integers of the memory, not a copy. */
  integers(address: number, length: number): Int32Array {
    return this.#signed.subarray(address >>> 2, (address >>> 2) + length);
  }

  /** Writes the exponents of a column, by its number before sorting. */
  readExponents(column: number, exponents: Uint16Array): void {
    const start = this.#field(at.COLUMN_EXPONENTS_AT) + column * this.#field(at.MONOMIAL_BYTES_AT);
    const wide = this.#field(at.WIDE_AT) === 1;
    const source = wide ? this.#halves : this.#bytes;
    const from = wide ? start / 2 : start;
    for (let v = 0; v < exponents.length; v++) exponents[v] = source[from + v] as number;
  }

  #entry(row: number): number {
    return (this.#field(at.ROWS_AT) >>> 2) + 4 * row;
  }

  #keep(values: Int32Array): number {
    const start = this.#termsUsed;
    const end = start + 4 * values.length;
    if (end > this.#regions.termsEnd) full("terms");
    this.#signed.set(values, start >>> 2);
    this.#termsUsed = end;
    return start;
  }

  /** Writes the comparisons for `sortColumns`; where they end. */
  #writeOrder({ order, variableCount }: MonomialTable): number {
    let place = this.#regions.order / 8;
    const write = (variables: readonly number[], weights: readonly number[]): void => {
      this.#longs[place++] = BigInt(variables.length);
      variables.forEach((v, k) => {
        this.#longs[place++] = BigInt(v);
        this.#longs[place++] = BigInt(weights[k] as number);
      });
    };
    const all = Array.from({ length: variableCount }, (_, v) => v);
    if (order.degreeFirst) write(all, new Array<number>(variableCount).fill(1));
    for (const { variables, weights } of order.comparisons) write(variables, weights);
    return 8 * place;
  }

  #field(address: number): number {
    return this.#words[address >>> 2] as number;
  }

  #setField(address: number, value: number): void {
    this.#words[address >>> 2] = value;
  }
}

/** Ends the computation: a region is full. @throws LimitReached */
export function full(what: string): never {
  const reason = `the matrices outgrow the memory that can be addressed: too many ${what}`;
  throw new LimitReached({ kind: "undecided", limit: "bytes", reason });
}
