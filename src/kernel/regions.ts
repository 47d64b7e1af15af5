/**
 * How the kernel's memory is divided for monomials of one size: every region gets its share of the
 * addresses, nothing ever moves, and pages that nobody touches cost nothing.
 */
import * as at from "./layout.js";

/** Shares of the memory in parts of 1000; the heap of rows gets what is left. */
const SHARES = { leads: 6, elements: 10, monomials: 120, terms: 200, rows: 50, columns: 260 };

/** Where the regions begin and how much they hold; what the kernel reads is in the header besides. */
export interface Regions {
  /** The comparisons of the order. */
  readonly order: number;
  readonly leadCapacity: number;
  readonly elementCapacity: number;
  readonly monomialCapacity: number;
  /** Monomials and residues of elements. */
  readonly terms: number;
  readonly termsEnd: number;
  readonly heap: number;
}

/** What a division depends on. */
export interface RegionSizes {
  readonly monomialBytes: number;
  readonly variables: number;
  readonly orderBytes: number;
}

/** Divides a memory and writes the header. */
export function divideMemory(words: Uint32Array, sizes: RegionSizes): Regions {
  const { monomialBytes, variables, orderBytes } = sizes;
  const end = words.length * 4;
  let next = at.HEADER_BYTES;
  const region = (bytes: number): number => {
    const start = next;
    next = roundUp(next + bytes, 64);
    return start;
  };
  const set = (field: number, value: number): void => {
    words[field >>> 2] = value;
  };
  set(at.HASH_WEIGHTS_AT, region(4 * variables));
  const order = region(orderBytes);
  const rest = end - next - 65_536;
  const share = (part: number, bytesEach: number): number =>
    Math.floor((rest * part) / 1000 / bytesEach);

  const leadCapacity = share(SHARES.leads, 12) & ~3;
  set(at.LEAD_MONOMIALS_AT, region(4 * leadCapacity));
  set(at.LEAD_MASKS_AT, region(4 * leadCapacity));
  set(at.LEAD_ELEMENTS_AT, region(4 * leadCapacity));
  const elementCapacity = share(SHARES.elements, 16);
  set(at.ELEMENTS_AT, region(16 * elementCapacity));
  const monomialCapacity = share(SHARES.monomials, monomialBytes + 4);
  set(at.MONOMIAL_EXPONENTS_AT, region(monomialBytes * monomialCapacity));
  set(at.MONOMIAL_HASHES_AT, region(4 * monomialCapacity));
  const terms = region(share(SHARES.terms, 1));
  const termsEnd = next;
  const rowCapacity = share(SHARES.rows, 16);
  set(at.ROW_CAPACITY_AT, rowCapacity);
  set(at.ROWS_AT, region(16 * rowCapacity));
  // A column has exponents, mask, hash, pivot, and up to eight slots, since slots quadruple.
  const columnCapacity = share(SHARES.columns, monomialBytes + 12 + 64);
  set(at.COLUMN_CAPACITY_AT, columnCapacity);
  set(at.COLUMN_EXPONENTS_AT, region(monomialBytes * columnCapacity));
  set(at.COLUMN_MASKS_AT, region(4 * columnCapacity));
  set(at.COLUMN_HASHES_AT, region(4 * columnCapacity));
  set(at.COLUMN_PIVOTS_AT, region(4 * columnCapacity));
  set(at.SLOTS_AT, region(64 * columnCapacity + 2048));
  set(at.HEAP_AT, next);
  set(at.HEAP_END_AT, end - 64);
  return {
    order,
    leadCapacity,
    elementCapacity,
    monomialCapacity,
    terms,
    termsEnd,
    heap: next,
  };
}

/** The smallest multiple of `to` that is not below `value`. */
export function roundUp(value: number, to: number): number {
  return Math.ceil(value / to) * to;
}
