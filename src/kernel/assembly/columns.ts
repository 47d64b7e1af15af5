/**
 * Columns into the term order: the first comparisons are packed into 64-bit keys as tightly as their ranges allow
 * and sorted by radix; what is equal then is sorted by the others. AssemblyScript; the twin is `plain-columns.ts`.
 */
import {
  COLUMN_COUNT_AT,
  COLUMN_EXPONENTS_AT,
  COLUMN_PIVOTS_AT,
  MONOMIAL_BYTES_AT,
  ROW_COUNT_AT,
  ROWS_AT,
  WIDE_AT,
} from "../layout";

/** The weight of a monomial under a comparison: its terms' count, then variable and weight of each. */
function weightOf(monomial: usize, comparison: usize, wide: i32): i64 {
  const count = load<i32>(comparison);
  let weight: i64 = 0;
  for (let k: usize = 0; k < <usize>count; k++) {
    const term = comparison + 8 + (k << 4);
    const v = <usize>load<i32>(term);
    const e = wide ? <i64>load<u16>(monomial + (v << 1)) : <i64>load<u8>(monomial + v);
    weight += e * load<i64>(term, 8);
  }
  return weight;
}

/** One stable pass over part of a permutation, `from` to `to`, by the byte of the keys at `shift`. */
function radixPass(
  keys: usize,
  from: usize,
  to: usize,
  count: i32,
  shift: u64,
  histogram: usize,
): void {
  memory.fill(histogram, 0, 1024);
  for (let k: usize = 0; k < <usize>count; k++) {
    const key = load<u64>(keys + ((<usize>load<u32>(from + (k << 2))) << 3));
    const at = histogram + ((<usize>((key >> shift) & 255)) << 2);
    store<u32>(at, load<u32>(at) + 1);
  }
  let sum: u32 = 0;
  for (let digit: usize = 0; digit < 256; digit++) {
    const at = histogram + (digit << 2);
    const size = load<u32>(at);
    store<u32>(at, sum);
    sum += size;
  }
  for (let k: usize = 0; k < <usize>count; k++) {
    const column = load<u32>(from + (k << 2));
    const key = load<u64>(keys + ((<usize>column) << 3));
    const at = histogram + ((<usize>((key >> shift) & 255)) << 2);
    const place = <usize>load<u32>(at);
    store<u32>(at, <u32>place + 1);
    store<u32>(to + (place << 2), column);
  }
}

/** Part of a permutation up to this long is sorted by insertion. */
const SHORT: i32 = 12;

/** Sorts part of a permutation by insertion: largest keys last, then by the comparisons from `order` on. */
function insertionSort(columns: usize, count: i32, order: usize, orderEnd: usize): void {
  const bytes = <usize>load<i32>(MONOMIAL_BYTES_AT);
  const exponents = <usize>load<u32>(COLUMN_EXPONENTS_AT);
  const wide = load<i32>(WIDE_AT);
  for (let k = 1; k < count; k++) {
    const column = load<u32>(columns + ((<usize>k) << 2));
    const monomial = exponents + (<usize>column) * bytes;
    let place = k;
    while (place > 0) {
      const before = load<u32>(columns + ((<usize>(place - 1)) << 2));
      const other = exponents + (<usize>before) * bytes;
      let larger = false;
      for (let at = order; at < orderEnd; at += 8 + ((<usize>load<i32>(at)) << 4)) {
        const difference = weightOf(monomial, at, wide) - weightOf(other, at, wide);
        if (difference != 0) {
          larger = difference > 0;
          break;
        }
      }
      if (!larger) break;
      store<u32>(columns + ((<usize>place) << 2), before);
      place--;
    }
    store<u32>(columns + ((<usize>place) << 2), column);
  }
}

/**
 * Sorts part of a permutation, largest first, by the comparisons from `order` on. As many comparisons as fit
 * make one 64-bit key; runs of equal keys are sorted by the comparisons that are left.
 */
function sortPart(
  columns: usize,
  count: i32,
  order: usize,
  orderEnd: usize,
  keys: usize,
  spare: usize,
  weights: usize,
  histogram: usize,
): void {
  if (count <= SHORT) {
    insertionSort(columns, count, order, orderEnd);
    return;
  }
  const bytes = <usize>load<i32>(MONOMIAL_BYTES_AT);
  const exponents = <usize>load<u32>(COLUMN_EXPONENTS_AT);
  const wide = load<i32>(WIDE_AT);
  for (let k: usize = 0; k < <usize>count; k++) {
    store<u64>(keys + ((<usize>load<u32>(columns + (k << 2))) << 3), 0);
  }
  let bits: u64 = 0;
  let at = order;
  while (at < orderEnd) {
    let least = i64.MAX_VALUE;
    let most = i64.MIN_VALUE;
    for (let k: usize = 0; k < <usize>count; k++) {
      const column = <usize>load<u32>(columns + (k << 2));
      const weight = weightOf(exponents + column * bytes, at, wide);
      store<i64>(weights + (k << 3), weight);
      if (weight < least) least = weight;
      if (weight > most) most = weight;
    }
    const size: u64 = most == least ? 0 : 64 - clz<u64>(<u64>(most - least));
    if (bits + size > 64) break;
    at += 8 + ((<usize>load<i32>(at)) << 4);
    if (size == 0) continue;
    bits += size;
    for (let k: usize = 0; k < <usize>count; k++) {
      const key = keys + ((<usize>load<u32>(columns + (k << 2))) << 3);
      const digit = <u64>(most - load<i64>(weights + (k << 3)));
      store<u64>(key, size == 64 ? digit : (load<u64>(key) << size) | digit);
    }
  }
  let from = columns;
  let to = spare;
  for (let shift: u64 = 0; shift < bits; shift += 8) {
    radixPass(keys, from, to, count, shift, histogram);
    const other = from;
    from = to;
    to = other;
  }
  if (from != columns) memory.copy(columns, from, (<usize>count) << 2);
  if (at >= orderEnd) return;
  // What is equal so far is told apart by the rest; the keys of a run are not needed any more.
  let start = 0;
  while (start < count) {
    const key = load<u64>(keys + ((<usize>load<u32>(columns + ((<usize>start) << 2))) << 3));
    let end = start + 1;
    while (
      end < count &&
      load<u64>(keys + ((<usize>load<u32>(columns + ((<usize>end) << 2))) << 3)) == key
    ) {
      end++;
    }
    if (end - start > 1) {
      const part = columns + ((<usize>start) << 2);
      sortPart(part, end - start, at, orderEnd, keys, spare, weights, histogram);
    }
    start = end;
  }
}

/**
 * Sorts the columns, largest first. `order` to `orderEnd` lists the comparisons; `scratch` has room for 24 bytes a
 * column and 1 KiB. Returns the address, within scratch, of the columns in order.
 */
export function sortColumns(order: usize, orderEnd: usize, scratch: usize): usize {
  const count = load<i32>(COLUMN_COUNT_AT);
  const keys = scratch;
  const weights = keys + ((<usize>count) << 3);
  const columns = weights + ((<usize>count) << 3);
  const spare = columns + ((<usize>count) << 2);
  const histogram = spare + ((<usize>count) << 2);
  for (let k: u32 = 0; k < <u32>count; k++) store<u32>(columns + ((<usize>k) << 2), k);
  sortPart(columns, count, order, orderEnd, keys, spare, weights, histogram);
  return columns;
}

/**
 * Renumbers columns so that `sorted` becomes 0, 1, 2, …, in all rows, and marks the pivots: all rows but
 * those from `firstRow` up to (without) `endRow` reduce the column that they begin with. `ranks` has
 * room for 4 bytes a column.
 */
export function renumberColumns(sorted: usize, ranks: usize, firstRow: i32, endRow: i32): void {
  const count = load<i32>(COLUMN_COUNT_AT);
  const pivots = <usize>load<u32>(COLUMN_PIVOTS_AT);
  for (let k: u32 = 0; k < <u32>count; k++) {
    store<u32>(ranks + ((<usize>load<u32>(sorted + ((<usize>k) << 2))) << 2), k);
    store<i32>(pivots + ((<usize>k) << 2), -1);
  }
  const rows = load<i32>(ROW_COUNT_AT);
  const table = <usize>load<u32>(ROWS_AT);
  for (let r = 0; r < rows; r++) {
    const row = table + ((<usize>r) << 4);
    const length = load<i32>(row, 4);
    const columns = <usize>load<u32>(row, 8);
    for (let k: usize = 0; k < <usize>length; k++) {
      const place = columns + (k << 2);
      store<u32>(place, load<u32>(ranks + ((<usize>load<u32>(place)) << 2)));
    }
    if (r < firstRow || r >= endRow) store<i32>(pivots + ((<usize>load<u32>(columns)) << 2), r);
  }
}
