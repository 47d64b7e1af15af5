/**
 * Four rows at once: the accumulator has four 64-bit words a column, one for each row, so that a pivot is read
 * once for four rows and the words of a column share a cache line. Words are 0 ≤ a < p² as in `rows.ts`.
 * AssemblyScript; the twin is `plain-four-rows.ts`.
 */
import { COLUMN_PIVOTS_AT, ROWS_AT } from "../layout";

/** Puts a row of residues into one lane of the cleared accumulator. */
export function loadLane(
  accumulator: usize,
  lane: i32,
  columns: usize,
  coefficients: usize,
  length: i32,
): void {
  const start = accumulator + ((<usize>lane) << 3);
  for (let k: usize = 0; k < <usize>length; k++) {
    const at = start + ((<usize>load<u32>(columns + (k << 2))) << 5);
    store<u64>(at, <u64>load<u32>(coefficients + (k << 2)));
  }
}

/** Eliminates, in all lanes, every entry from column `from` on that has a pivot. */
export function sweepLanes(accumulator: usize, from: i32, width: i32, p: u32): void {
  const prime = <u64>p;
  const zero = i64x2.splat(0);
  const pivots = <usize>load<u32>(COLUMN_PIVOTS_AT);
  const table = <usize>load<u32>(ROWS_AT);
  for (let column = from; column < width; column++) {
    const at = accumulator + ((<usize>column) << 5);
    if (!v128.any_true(v128.or(v128.load(at), v128.load(at, 16)))) continue;
    const pivot = load<i32>(pivots + ((<usize>column) << 2));
    if (pivot < 0) continue;
    const m0 = load<u64>(at) % prime;
    const m1 = load<u64>(at, 8) % prime;
    const m2 = load<u64>(at, 16) % prime;
    const m3 = load<u64>(at, 24) % prime;
    v128.store(at, zero);
    v128.store(at, zero, 16);
    if ((m0 | m1 | m2 | m3) == 0) continue;
    const row = table + ((<usize>pivot) << 4);
    subtractFromLanes(
      accumulator,
      <usize>load<u32>(row, 8),
      <usize>load<u32>(row, 12),
      1,
      load<i32>(row, 4),
      <u32>m0,
      <u32>m1,
      <u32>m2,
      <u32>m3,
      p,
    );
  }
}

/** In each lane, accumulator[columns[k]] −= multiplier · coefficients[k] for all k from `first` on. */
export function subtractFromLanes(
  accumulator: usize,
  columns: usize,
  coefficients: usize,
  first: i32,
  length: i32,
  m0: u32,
  m1: u32,
  m2: u32,
  m3: u32,
  p: u32,
): void {
  const square = i64x2.splat(<i64>((<u64>p) * p));
  const zero = i64x2.splat(0);
  let multipliers = i32x4.splat(m0);
  multipliers = i32x4.replace_lane(multipliers, 1, m1);
  multipliers = i32x4.replace_lane(multipliers, 2, m2);
  multipliers = i32x4.replace_lane(multipliers, 3, m3);
  for (let k = <usize>first; k < <usize>length; k++) {
    const target = accumulator + ((<usize>load<u32>(columns + (k << 2))) << 5);
    const factor = v128.load32_splat(coefficients + (k << 2));
    const x = i64x2.sub(v128.load(target), i64x2.extmul_low_i32x4_u(multipliers, factor));
    const y = i64x2.sub(v128.load(target, 16), i64x2.extmul_high_i32x4_u(multipliers, factor));
    v128.store(target, i64x2.add(x, v128.and(i64x2.lt_s(x, zero), square)));
    v128.store(target, i64x2.add(y, v128.and(i64x2.lt_s(y, zero), square)), 16);
  }
}

/** Takes one lane out, from column `from` on, as a sparse row of residues, not made monic; clears it. Its length. */
export function takeLane(
  accumulator: usize,
  lane: i32,
  from: i32,
  width: i32,
  p: u32,
  columns: usize,
  coefficients: usize,
): i32 {
  const prime = <u64>p;
  const start = accumulator + ((<usize>lane) << 3);
  let length: usize = 0;
  for (let column = from; column < width; column++) {
    const at = start + ((<usize>column) << 5);
    const entry = load<u64>(at);
    if (entry == 0) continue;
    store<u64>(at, 0);
    const value = entry >= prime ? entry % prime : entry;
    if (value == 0) continue;
    store<u32>(columns + (length << 2), <u32>column);
    store<u32>(coefficients + (length << 2), <u32>value);
    length++;
  }
  return <i32>length;
}
