/**
 * The kernel: the hot loops of matrix reduction over one memory (`layout.ts` says what stands where).
 * It exists twice, compiled to WebAssembly and in plain TypeScript; both do the same to the memory, and
 * the plain one serves where WebAssembly is missing and as the oracle of the other in the tests.
 */

/** Monomials and the columns of a matrix. */
export interface MonomialKernel {
  /** Packs `count` monomials of 16-bit exponents from `source` and hashes them. DONE or EXPONENT_TOO_LARGE. */
  pack(source: number, variables: number, count: number, exponents: number, hashes: number): number;
  /** Empties the matrix; `slots` a power of two. */
  clearColumns(slots: number): void;
  /**
   * Adds the row `multiplier · element`, the multiplier by its number among the monomials. The number of
   * the row, or minus OUT_OF_SPACE or EXPONENT_TOO_LARGE.
   */
  placeRow(element: number, multiplier: number): number;
  /**
   * Goes on with the closure of the matrix: for every column without a pivot that a leading monomial divides,
   * the multiple that reduces it becomes a row. Stops after about `fuel` terms. DONE or why it stopped.
   */
  closeMatrix(fuel: number): number;
  /** The number among the leads of the first that divides the packed monomial with the given mask, or −1. */
  findDivisor(monomial: number, mask: number): number;
}

/** Columns into the term order. */
export interface ColumnKernel {
  /**
   * Sorts the columns, largest monomial first. From `order` to `orderEnd` stands, for each comparison, the count of
   * its terms, then variable and weight of each, 8 bytes all. Returns the address, in scratch, of the columns'
   * old numbers in order; scratch has 24 bytes a column and 1 KiB.
   */
  sortColumns(order: number, orderEnd: number, scratch: number): number;
  /** Renumbers all rows so; rows outside `firstRow ≤ r < endRow` become the pivots of their first columns. */
  renumberColumns(sorted: number, ranks: number, firstRow: number, endRow: number): void;
}

/**
 * Elimination modulo a prime below 2³¹. An accumulator has 8 bytes a column. What its entries look like is the
 * kernel's own affair, but zero bytes are zeros: a cleared accumulator filled by `addRow`, swept and gathered
 * gives a reduced row and is cleared again.
 */
export interface RowKernel {
  /** accumulator[columns[k]] −= multiplier · coefficients[k] modulo the prime, for first ≤ k < length. */
  subtractMultiple(
    accumulator: number,
    columns: number,
    coefficients: number,
    first: number,
    length: number,
    multiplier: number,
    prime: number,
  ): void;
  /** accumulator[columns[k]] += factor · coefficients[k] modulo the prime, for all k. */
  addRow(
    accumulator: number,
    columns: number,
    coefficients: number,
    length: number,
    factor: number,
    prime: number,
  ): void;
  /** Eliminates every entry from column `from` on that has a pivot; how many others are not zero. */
  sweep(accumulator: number, from: number, width: number, prime: number): number;
  /** Writes the swept entries from column `from` on as a monic sparse row and clears them; its length. */
  gather(
    accumulator: number,
    from: number,
    width: number,
    prime: number,
    columns: number,
    coefficients: number,
  ): number;
}

/**
 * Elimination of four rows at once: an accumulator has 32 bytes a column, a lane for each row. Which representatives
 * of a residue it holds is the kernel's own affair, but zero bytes are zeros.
 */
export interface LaneKernel {
  /** Puts a row of residues into one lane of the cleared accumulator. */
  loadLane(
    accumulator: number,
    lane: number,
    columns: number,
    coefficients: number,
    length: number,
  ): void;
  /** In each lane, accumulator[columns[k]] −= multiplier · coefficients[k] modulo the prime, for first ≤ k < length. */
  subtractFromLanes(
    accumulator: number,
    columns: number,
    coefficients: number,
    first: number,
    length: number,
    m0: number,
    m1: number,
    m2: number,
    m3: number,
    prime: number,
  ): void;
  /** Eliminates, in all lanes, every entry from column `from` on that has a pivot. */
  sweepLanes(accumulator: number, from: number, width: number, prime: number): void;
  /** Takes one lane out, from column `from` on, as a sparse row that is not made monic; its length. */
  takeLane(
    accumulator: number,
    lane: number,
    from: number,
    width: number,
    prime: number,
    columns: number,
    coefficients: number,
  ): number;
}

/** All the hot loops, over one memory. */
export interface Kernel extends MonomialKernel, ColumnKernel, RowKernel, LaneKernel {
  readonly kind: "compiled" | "plain";
}
