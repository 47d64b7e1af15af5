/**
 * Monomials, products and the closure of a matrix in plain TypeScript: the twin of
 * `assembly/monomials.ts`, function by function.
 */
import type { MonomialKernel } from "./kernel.js";
import * as at from "./layout.js";

/** The plain monomial functions over a memory. */
export function plainMonomials(buffer: SharedArrayBuffer | ArrayBuffer): MonomialKernel {
  const words = new Uint32Array(buffer);
  const signed = new Int32Array(buffer);
  const bytes = new Uint8Array(buffer);
  const halves = new Uint16Array(buffer);
  const field = (address: number): number => words[address >>> 2]!;
  const setField = (address: number, value: number): void => {
    words[address >>> 2] = value;
  };
  const isWide = (): boolean => field(at.WIDE_AT) === 1;
  /** Entries a packed monomial has: exponents and padding. */
  const lanes = (): number => field(at.MONOMIAL_BYTES_AT) / (isWide() ? 2 : 1);
  const exponentsOf = (): Uint8Array | Uint16Array => (isWide() ? halves : bytes);
  /** The address of a packed monomial as an index into `exponentsOf()`. */
  const place = (address: number): number => (isWide() ? address / 2 : address);

  function supportMask(monomial: number): number {
    const exponents = exponentsOf();
    const start = place(monomial);
    const count = lanes();
    const twoBits = field(at.TWO_BIT_MASKS_AT) === 1;
    let mask = 0;
    for (let v = 0; v < count; v++) {
      const e = exponents[start + v]!;
      if (e >= 1) mask |= 1 << (v & 31);
      if (twoBits && e >= 2) mask |= 65_536 << v;
    }
    return mask >>> 0;
  }

  function insert(column: number, hash: number): void {
    const slots = field(at.SLOTS_AT) >>> 2;
    const limit = field(at.SLOT_MASK_AT);
    let slot = spread(hash) & limit;
    while (words[slots + 2 * slot + 1] !== 0) slot = (slot + 1) & limit;
    words[slots + 2 * slot] = hash;
    words[slots + 2 * slot + 1] = column + 1;
  }

  function enlargeSlots(): void {
    const count = field(at.COLUMN_COUNT_AT);
    const size = (field(at.SLOT_MASK_AT) + 1) * 4;
    const slots = field(at.SLOTS_AT) >>> 2;
    words.fill(0, slots, slots + 2 * size);
    setField(at.SLOT_MASK_AT, size - 1);
    const hashes = field(at.COLUMN_HASHES_AT) >>> 2;
    for (let column = 0; column < count; column++) insert(column, words[hashes + column]!);
  }

  /** The column of the monomial that stands where the next column would: an old one, or a new one. */
  function columnOf(hash: number, candidate: number): number {
    const slots = field(at.SLOTS_AT) >>> 2;
    const limit = field(at.SLOT_MASK_AT);
    const exponents = exponentsOf();
    const count = lanes();
    const first = place(field(at.COLUMN_EXPONENTS_AT));
    const next = place(candidate);
    for (let slot = spread(hash) & limit; ; slot = (slot + 1) & limit) {
      const known = words[slots + 2 * slot + 1]!;
      if (known === 0) break;
      if (words[slots + 2 * slot] !== hash) continue;
      const start = first + (known - 1) * count;
      let v = 0;
      while (v < count && exponents[start + v] === exponents[next + v]) v++;
      if (v === count) return known - 1;
    }
    const column = field(at.COLUMN_COUNT_AT);
    setField(at.COLUMN_COUNT_AT, column + 1);
    insert(column, hash);
    words[(field(at.COLUMN_HASHES_AT) >>> 2) + column] = hash;
    words[(field(at.COLUMN_MASKS_AT) >>> 2) + column] = supportMask(candidate);
    signed[(field(at.COLUMN_PIVOTS_AT) >>> 2) + column] = -1;
    if (2 * (column + 1) > limit) enlargeSlots();
    return column;
  }

  /** Adds the row `multiplier · element`; the multiplier stands at MULTIPLIER_AT. */
  function placeMultiple(element: number, multiplierHash: number): number {
    const record = (field(at.ELEMENTS_AT) >>> 2) + 4 * element;
    const terms = words[record]! >>> 2;
    const length = words[record + 1]!;
    const heap = field(at.HEAP_AT);
    const row = field(at.ROW_COUNT_AT);
    if (
      field(at.COLUMN_COUNT_AT) + length + 1 > field(at.COLUMN_CAPACITY_AT) ||
      row + 1 > field(at.ROW_CAPACITY_AT) ||
      heap + 4 * length > field(at.HEAP_END_AT)
    ) {
      return -at.OUT_OF_SPACE;
    }
    const size = field(at.MONOMIAL_BYTES_AT);
    const exponents = exponentsOf();
    const count = lanes();
    const largest = isWide() ? 65_535 : 255;
    const multiplier = place(at.MULTIPLIER_AT);
    const hashes = field(at.MONOMIAL_HASHES_AT) >>> 2;
    let overflow = false;
    for (let k = 0; k < length; k++) {
      const term = words[terms + k]!;
      const source = place(field(at.MONOMIAL_EXPONENTS_AT) + term * size);
      const candidate = field(at.COLUMN_EXPONENTS_AT) + field(at.COLUMN_COUNT_AT) * size;
      const target = place(candidate);
      for (let v = 0; v < count; v++) {
        const sum = exponents[source + v]! + exponents[multiplier + v]!;
        if (sum > largest) overflow = true;
        exponents[target + v] = sum;
      }
      const hash = (multiplierHash + words[hashes + term]!) >>> 0;
      words[(heap >>> 2) + k] = columnOf(hash, candidate);
    }
    if (overflow) return -at.EXPONENT_TOO_LARGE;
    const entry = (field(at.ROWS_AT) >>> 2) + 4 * row;
    words[entry] = element;
    words[entry + 1] = length;
    words[entry + 2] = heap;
    words[entry + 3] = words[record + 2]!;
    setField(at.HEAP_AT, heap + 4 * length);
    setField(at.ROW_COUNT_AT, row + 1);
    return row;
  }

  function findDivisor(monomial: number, mask: number): number {
    const leadCount = field(at.LEAD_COUNT_AT);
    const masks = field(at.LEAD_MASKS_AT) >>> 2;
    const leads = field(at.LEAD_MONOMIALS_AT) >>> 2;
    const size = field(at.MONOMIAL_BYTES_AT);
    const exponents = exponentsOf();
    const count = lanes();
    const start = place(monomial);
    for (let lead = 0; lead < leadCount; lead++) {
      if ((words[masks + lead]! & ~mask) !== 0) continue;
      const divisor = place(field(at.MONOMIAL_EXPONENTS_AT) + words[leads + lead]! * size);
      let v = 0;
      while (v < count && exponents[divisor + v]! <= exponents[start + v]!) v++;
      if (v === count) return lead;
    }
    return -1;
  }

  /** The row for the lead that divides a column: multiplier, hash, placing. */
  function placeReducer(column: number, lead: number): number {
    const size = field(at.MONOMIAL_BYTES_AT);
    const exponents = exponentsOf();
    const count = lanes();
    const divisor = words[(field(at.LEAD_MONOMIALS_AT) >>> 2) + lead]!;
    const from = place(field(at.COLUMN_EXPONENTS_AT) + column * size);
    const by = place(field(at.MONOMIAL_EXPONENTS_AT) + divisor * size);
    const multiplier = place(at.MULTIPLIER_AT);
    for (let v = 0; v < count; v++) {
      exponents[multiplier + v] = exponents[from + v]! - exponents[by + v]!;
    }
    const hash =
      words[(field(at.COLUMN_HASHES_AT) >>> 2) + column]! -
      words[(field(at.MONOMIAL_HASHES_AT) >>> 2) + divisor]!;
    return placeMultiple(words[(field(at.LEAD_ELEMENTS_AT) >>> 2) + lead]!, hash >>> 0);
  }

  return {
    findDivisor,
    pack(source, variables, count, exponents, hashes) {
      const weights = field(at.HASH_WEIGHTS_AT) >>> 2;
      const packed = exponentsOf();
      const wide = isWide();
      const length = lanes();
      for (let m = 0; m < count; m++) {
        const from = source / 2 + m * variables;
        const to = place(exponents) + m * length;
        let hash = 0;
        packed.fill(0, to, to + length);
        for (let v = 0; v < variables; v++) {
          const e = halves[from + v]!;
          if (!wide && e > 255) return at.EXPONENT_TOO_LARGE;
          packed[to + v] = e;
          hash = (hash + Math.imul(e, words[weights + v]!)) >>> 0;
        }
        words[(hashes >>> 2) + m] = hash;
      }
      return at.DONE;
    },
    clearColumns(slots) {
      setField(at.COLUMN_COUNT_AT, 0);
      setField(at.ROW_COUNT_AT, 0);
      setField(at.PROGRESS_AT, 0);
      setField(at.SLOT_MASK_AT, slots - 1);
      const start = field(at.SLOTS_AT) >>> 2;
      words.fill(0, start, start + 2 * slots);
    },
    placeRow(element, multiplier) {
      const size = field(at.MONOMIAL_BYTES_AT);
      const source = field(at.MONOMIAL_EXPONENTS_AT) + multiplier * size;
      bytes.copyWithin(at.MULTIPLIER_AT, source, source + size);
      return placeMultiple(element, words[(field(at.MONOMIAL_HASHES_AT) >>> 2) + multiplier]!);
    },
    closeMatrix(fuel) {
      const size = field(at.MONOMIAL_BYTES_AT);
      let left = fuel;
      for (let column = field(at.PROGRESS_AT); column < field(at.COLUMN_COUNT_AT); column++) {
        setField(at.PROGRESS_AT, column);
        if (left <= 0) return at.OUT_OF_FUEL;
        left--;
        const pivot = (field(at.COLUMN_PIVOTS_AT) >>> 2) + column;
        if (signed[pivot]! >= 0) continue;
        const monomial = field(at.COLUMN_EXPONENTS_AT) + column * size;
        const lead = findDivisor(monomial, words[(field(at.COLUMN_MASKS_AT) >>> 2) + column]!);
        if (lead < 0) continue;
        const row = placeReducer(column, lead);
        if (row < 0) return -row;
        signed[pivot] = row;
        left -= words[(field(at.ROWS_AT) >>> 2) + 4 * row + 1]!;
      }
      setField(at.PROGRESS_AT, field(at.COLUMN_COUNT_AT));
      return at.DONE;
    },
  };
}

/* Hashes of monomials on a line form an arithmetic progression, which linear probing would pile up. */
function spread(hash: number): number {
  const mixed = Math.imul(hash ^ (hash >>> 16), 0x7feb352d);
  return mixed ^ (mixed >>> 15);
}
