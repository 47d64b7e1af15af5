/**
 * Monomials in the kernel: packed exponents, products looked up in the columns of a matrix, and the
 * closure of a matrix under reduction. AssemblyScript; the twin is `plain-monomials.ts`.
 */
import {
  COLUMN_CAPACITY_AT,
  COLUMN_COUNT_AT,
  COLUMN_EXPONENTS_AT,
  COLUMN_HASHES_AT,
  COLUMN_MASKS_AT,
  COLUMN_PIVOTS_AT,
  DONE,
  ELEMENTS_AT,
  EXPONENT_TOO_LARGE,
  HASH_WEIGHTS_AT,
  HEAP_AT,
  HEAP_END_AT,
  LEAD_COUNT_AT,
  LEAD_ELEMENTS_AT,
  LEAD_MASKS_AT,
  LEAD_MONOMIALS_AT,
  MONOMIAL_BYTES_AT,
  MONOMIAL_EXPONENTS_AT,
  MONOMIAL_HASHES_AT,
  MULTIPLIER_AT,
  OUT_OF_FUEL,
  OUT_OF_SPACE,
  PROGRESS_AT,
  ROW_CAPACITY_AT,
  ROW_COUNT_AT,
  ROWS_AT,
  SLOT_MASK_AT,
  SLOTS_AT,
  TWO_BIT_MASKS_AT,
  WIDE_AT,
} from "../layout";

/** Packs `count` monomials of 16-bit exponents (`variables` each) from `source`, and hashes them. */
export function pack(
  source: usize,
  variables: i32,
  count: i32,
  exponents: usize,
  hashes: usize,
): i32 {
  const bytes = load<i32>(MONOMIAL_BYTES_AT);
  const wide = load<i32>(WIDE_AT);
  const weights = <usize>load<u32>(HASH_WEIGHTS_AT);
  let from = source;
  let to = exponents;
  for (let m = 0; m < count; m++) {
    memory.fill(to, 0, bytes);
    let hash: u32 = 0;
    for (let v: usize = 0; v < <usize>variables; v++) {
      const e = <u32>load<u16>(from + (v << 1));
      hash += e * load<u32>(weights + (v << 2));
      if (wide) {
        store<u16>(to + (v << 1), <u16>e);
      } else {
        if (e > 255) return EXPONENT_TOO_LARGE;
        store<u8>(to + v, <u8>e);
      }
    }
    store<u32>(hashes + ((<usize>m) << 2), hash);
    from += (<usize>variables) << 1;
    to += bytes;
  }
  return DONE;
}

/** A mask with mask(a) & ~mask(b) = 0 whenever a divides b. */
function supportMask(monomial: usize): u32 {
  const bytes = load<i32>(MONOMIAL_BYTES_AT);
  const wide = load<i32>(WIDE_AT);
  const twoBits = load<i32>(TWO_BIT_MASKS_AT);
  const zero = i32x4.splat(0);
  const one = wide ? i16x8.splat(1) : i8x16.splat(1);
  let mask: u32 = 0;
  let shift: u32 = 0;
  for (let b = 0; b < bytes; b += 16) {
    const chunk = v128.load(monomial + b);
    if (wide) {
      mask |= (<u32>i16x8.bitmask(v128.ne<i16>(chunk, zero))) << shift;
      if (twoBits) mask |= (<u32>i16x8.bitmask(v128.gt<u16>(chunk, one))) << (16 + shift);
      shift = (shift + 8) & 31;
    } else {
      mask |= (<u32>i8x16.bitmask(v128.ne<i8>(chunk, zero))) << shift;
      if (twoBits) mask |= (<u32>i8x16.bitmask(v128.gt<u8>(chunk, one))) << (16 + shift);
      shift = (shift + 16) & 31;
    }
  }
  return mask;
}

/* Hashes of monomials on a line form an arithmetic progression, which linear probing would pile up. */
function spread(hash: u32): u32 {
  const mixed = (hash ^ (hash >> 16)) * 0x7feb352d;
  return mixed ^ (mixed >> 15);
}

/** Empties the matrix; `slots` is a power of two. */
export function clearColumns(slots: i32): void {
  store<i32>(COLUMN_COUNT_AT, 0);
  store<i32>(ROW_COUNT_AT, 0);
  store<i32>(PROGRESS_AT, 0);
  store<i32>(SLOT_MASK_AT, slots - 1);
  memory.fill(<usize>load<u32>(SLOTS_AT), 0, (<usize>slots) << 3);
}

function enlargeSlots(): void {
  const count = load<i32>(COLUMN_COUNT_AT);
  const size = (load<i32>(SLOT_MASK_AT) + 1) << 2;
  const slots = <usize>load<u32>(SLOTS_AT);
  const hashes = <usize>load<u32>(COLUMN_HASHES_AT);
  const limit = <u32>(size - 1);
  memory.fill(slots, 0, (<usize>size) << 3);
  store<i32>(SLOT_MASK_AT, <i32>limit);
  for (let column = 0; column < count; column++) {
    const hash = load<u32>(hashes + ((<usize>column) << 2));
    let slot = spread(hash) & limit;
    while (load<u32>(slots + ((<usize>slot) << 3), 4) != 0) slot = (slot + 1) & limit;
    store<u64>(slots + ((<usize>slot) << 3), (<u64>hash) | ((<u64>(column + 1)) << 32));
  }
}

/** The column of the monomial that stands where the next column would: an old one, or a new one. */
function columnOf(hash: u32, candidate: usize, bytes: usize): i32 {
  const slots = <usize>load<u32>(SLOTS_AT);
  const limit = load<u32>(SLOT_MASK_AT);
  const exponents = <usize>load<u32>(COLUMN_EXPONENTS_AT);
  let slot = spread(hash) & limit;
  while (true) {
    const entry = load<u64>(slots + ((<usize>slot) << 3));
    const next = <u32>(entry >> 32);
    if (next == 0) break;
    if (<u32>entry == hash) {
      const known = exponents + (<usize>(next - 1)) * bytes;
      let difference = v128.xor(v128.load(candidate), v128.load(known));
      for (let b: usize = 16; b < bytes; b += 16) {
        difference = v128.or(
          difference,
          v128.xor(v128.load(candidate + b), v128.load(known + b)),
        );
      }
      if (!v128.any_true(difference)) return <i32>(next - 1);
    }
    slot = (slot + 1) & limit;
  }
  const column = load<i32>(COLUMN_COUNT_AT);
  store<i32>(COLUMN_COUNT_AT, column + 1);
  store<u64>(slots + ((<usize>slot) << 3), (<u64>hash) | ((<u64>(column + 1)) << 32));
  const at = (<usize>column) << 2;
  store<u32>(<usize>load<u32>(COLUMN_HASHES_AT) + at, hash);
  store<u32>(<usize>load<u32>(COLUMN_MASKS_AT) + at, supportMask(candidate));
  store<i32>(<usize>load<u32>(COLUMN_PIVOTS_AT) + at, -1);
  if (((<u32>column + 1) << 1) > limit) enlargeSlots();
  return column;
}

/** Adds the row `multiplier · element`, the multiplier given by its number. Returns as `placeMultiple`. */
export function placeRow(element: i32, multiplier: i32): i32 {
  const bytes = <usize>load<i32>(MONOMIAL_BYTES_AT);
  const exponents = <usize>load<u32>(MONOMIAL_EXPONENTS_AT) + (<usize>multiplier) * bytes;
  memory.copy(MULTIPLIER_AT, exponents, bytes);
  const hashes = <usize>load<u32>(MONOMIAL_HASHES_AT);
  return placeMultiple(element, load<u32>(hashes + ((<usize>multiplier) << 2)));
}

/**
 * Adds the row `multiplier · element` to the matrix; the multiplier stands at MULTIPLIER_AT. Returns
 * minus what went wrong, or the number of the row.
 */
function placeMultiple(element: i32, multiplierHash: u32): i32 {
  const record = <usize>load<u32>(ELEMENTS_AT) + ((<usize>element) << 4);
  const terms = <usize>load<u32>(record);
  const length = load<i32>(record, 4);
  const heap = <usize>load<u32>(HEAP_AT);
  const row = load<i32>(ROW_COUNT_AT);
  if (
    load<i32>(COLUMN_COUNT_AT) + length + 1 > load<i32>(COLUMN_CAPACITY_AT) ||
    row + 1 > load<i32>(ROW_CAPACITY_AT) ||
    <u64>heap + ((<u64>length) << 2) > <u64>load<u32>(HEAP_END_AT)
  ) {
    return -OUT_OF_SPACE;
  }
  const bytes = <usize>load<i32>(MONOMIAL_BYTES_AT);
  const wide = load<i32>(WIDE_AT);
  const monomials = <usize>load<u32>(MONOMIAL_EXPONENTS_AT);
  const hashes = <usize>load<u32>(MONOMIAL_HASHES_AT);
  const exponents = <usize>load<u32>(COLUMN_EXPONENTS_AT);
  let overflow = i32x4.splat(0);
  for (let k: usize = 0; k < <usize>length; k++) {
    const term = <usize>load<u32>(terms + (k << 2));
    const source = monomials + term * bytes;
    const candidate = exponents + (<usize>load<i32>(COLUMN_COUNT_AT)) * bytes;
    for (let b: usize = 0; b < bytes; b += 16) {
      const x = v128.load(source + b);
      const y = v128.load(<usize>MULTIPLIER_AT + b);
      if (wide) {
        const sum = i16x8.add(x, y);
        overflow = v128.or(overflow, v128.xor(sum, i16x8.add_sat_u(x, y)));
        v128.store(candidate + b, sum);
      } else {
        const sum = i8x16.add(x, y);
        overflow = v128.or(overflow, v128.xor(sum, i8x16.add_sat_u(x, y)));
        v128.store(candidate + b, sum);
      }
    }
    const hash = multiplierHash + load<u32>(hashes + (term << 2));
    store<i32>(heap + (k << 2), columnOf(hash, candidate, bytes));
  }
  if (v128.any_true(overflow)) return -EXPONENT_TOO_LARGE;
  const entry = <usize>load<u32>(ROWS_AT) + ((<usize>row) << 4);
  store<i32>(entry, element);
  store<i32>(entry, length, 4);
  store<u32>(entry, <u32>heap, 8);
  store<u32>(entry, load<u32>(record, 8), 12);
  store<u32>(HEAP_AT, <u32>heap + ((<u32>length) << 2));
  store<i32>(ROW_COUNT_AT, row + 1);
  return row;
}

/** The number among the leads of the first that divides the monomial, or −1. */
export function findDivisor(monomial: usize, mask: u32): i32 {
  const count = load<i32>(LEAD_COUNT_AT);
  const masks = <usize>load<u32>(LEAD_MASKS_AT);
  const leads = <usize>load<u32>(LEAD_MONOMIALS_AT);
  const exponents = <usize>load<u32>(MONOMIAL_EXPONENTS_AT);
  const bytes = <usize>load<i32>(MONOMIAL_BYTES_AT);
  const wide = load<i32>(WIDE_AT);
  const outside = i32x4.splat(~mask);
  const zero = i32x4.splat(0);
  for (let k = 0; k < count; k += 4) {
    const four = v128.and(v128.load(masks + ((<usize>k) << 2)), outside);
    let passed = i32x4.bitmask(i32x4.eq(four, zero));
    while (passed != 0) {
      const lead = k + ctz(passed);
      passed &= passed - 1;
      if (lead >= count) return -1;
      const at = exponents + (<usize>load<u32>(leads + ((<usize>lead) << 2))) * bytes;
      let excess = zero;
      for (let b: usize = 0; b < bytes; b += 16) {
        const x = v128.load(at + b);
        const y = v128.load(monomial + b);
        excess = v128.or(excess, wide ? i16x8.sub_sat_u(x, y) : i8x16.sub_sat_u(x, y));
      }
      if (!v128.any_true(excess)) return lead;
    }
  }
  return -1;
}

/**
 * Goes on with the closure of the matrix: for every column that a leading monomial divides, the
 * multiple that reduces it becomes a row. Stops for a while after about `fuel` terms.
 */
export function closeMatrix(fuel: i32): i32 {
  const bytes = <usize>load<i32>(MONOMIAL_BYTES_AT);
  const exponents = <usize>load<u32>(COLUMN_EXPONENTS_AT);
  const monomials = <usize>load<u32>(MONOMIAL_EXPONENTS_AT);
  const hashes = <usize>load<u32>(MONOMIAL_HASHES_AT);
  const leads = <usize>load<u32>(LEAD_MONOMIALS_AT);
  const wide = load<i32>(WIDE_AT);
  let left = fuel;
  for (let column = load<i32>(PROGRESS_AT); column < load<i32>(COLUMN_COUNT_AT); column++) {
    store<i32>(PROGRESS_AT, column);
    if (left <= 0) return OUT_OF_FUEL;
    left--;
    const at = (<usize>column) << 2;
    const pivot = <usize>load<u32>(COLUMN_PIVOTS_AT) + at;
    if (load<i32>(pivot) >= 0) continue;
    const monomial = exponents + (<usize>column) * bytes;
    const lead = findDivisor(monomial, load<u32>(<usize>load<u32>(COLUMN_MASKS_AT) + at));
    if (lead < 0) continue;
    const divisor = <usize>load<u32>(leads + ((<usize>lead) << 2));
    for (let b: usize = 0; b < bytes; b += 16) {
      const x = v128.load(monomial + b);
      const y = v128.load(monomials + divisor * bytes + b);
      v128.store(<usize>MULTIPLIER_AT + b, wide ? i16x8.sub(x, y) : i8x16.sub(x, y));
    }
    const hash =
      load<u32>(<usize>load<u32>(COLUMN_HASHES_AT) + at) - load<u32>(hashes + (divisor << 2));
    const element = load<i32>(<usize>load<u32>(LEAD_ELEMENTS_AT) + ((<usize>lead) << 2));
    const row = placeMultiple(element, hash);
    if (row < 0) return -row;
    store<i32>(pivot, row);
    left -= load<i32>(<usize>load<u32>(ROWS_AT) + ((<usize>row) << 4), 4);
  }
  store<i32>(PROGRESS_AT, load<i32>(COLUMN_COUNT_AT));
  return DONE;
}
