/**
 * Columns into the term order: weights are packed into 64-bit keys as tightly as their ranges allow and
 * sorted by radix, the last key first. AssemblyScript; the twin is `plain-columns.ts`.
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

/** One stable pass: the permutation at `from` goes to `to`, by the byte of the keys at `shift`. */
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
    const at = histogram + ((<usize>((load<u64>(keys + (k << 3)) >> shift) & 255)) << 2);
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

/**
 * Sorts the columns, largest first. `order` lists the comparisons; `scratch` has room for 16 bytes a
 * column, 24 a comparison, and 1 KiB. Returns the address, within scratch, of the columns in order.
 */
export function sortColumns(order: usize, comparisons: i32, scratch: usize): usize {
  const count = load<i32>(COLUMN_COUNT_AT);
  const bytes = <usize>load<i32>(MONOMIAL_BYTES_AT);
  const exponents = <usize>load<u32>(COLUMN_EXPONENTS_AT);
  const wide = load<i32>(WIDE_AT);
  const keys = scratch;
  let from = keys + ((<usize>count) << 3);
  let to = from + ((<usize>count) << 2);
  const histogram = to + ((<usize>count) << 2);
  const ranges = histogram + 1024;
  // Of each comparison the largest weight, how many bits the range takes, and where it stands.
  let at = order;
  for (let c: usize = 0; c < <usize>comparisons; c++) {
    let least = i64.MAX_VALUE;
    let most = i64.MIN_VALUE;
    for (let k: usize = 0; k < <usize>count; k++) {
      const weight = weightOf(exponents + k * bytes, at, wide);
      if (weight < least) least = weight;
      if (weight > most) most = weight;
    }
    const range = ranges + c * 24;
    store<i64>(range, most);
    store<u64>(range, most <= least ? 0 : 64 - clz<u64>(<u64>(most - least)), 8);
    store<u64>(range, <u64>at, 16);
    at += 8 + ((<usize>load<i32>(at)) << 4);
  }
  for (let k: u32 = 0; k < <u32>count; k++) store<u32>(from + ((<usize>k) << 2), k);
  let end = comparisons;
  while (end > 0) {
    // As many comparisons as fit into one key, from the last one up.
    let bits: u64 = 0;
    let start = end;
    while (start > 0) {
      const more = load<u64>(ranges + (<usize>(start - 1)) * 24, 8);
      if (bits + more > 64) break;
      bits += more;
      start--;
    }
    if (bits > 0) {
      for (let k: usize = 0; k < <usize>count; k++) store<u64>(keys + (k << 3), 0);
      for (let c = <usize>start; c < <usize>end; c++) {
        const range = ranges + c * 24;
        const size = load<u64>(range, 8);
        if (size == 0) continue;
        const most = load<i64>(range);
        const comparison = <usize>load<u64>(range, 16);
        for (let k: usize = 0; k < <usize>count; k++) {
          const weight = weightOf(exponents + k * bytes, comparison, wide);
          const key = load<u64>(keys + (k << 3));
          store<u64>(keys + (k << 3), (key << size) | <u64>(most - weight));
        }
      }
      for (let shift: u64 = 0; shift < bits; shift += 8) {
        radixPass(keys, from, to, count, shift, histogram);
        const other = from;
        from = to;
        to = other;
      }
    }
    end = start;
  }
  return from;
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
