/**
 * Elimination modulo a prime p < 2³¹. The accumulator holds 64-bit words 0 ≤ a < p²: a product below p²
 * is subtracted, and p² added back when the result is negative; only pivots' columns are divided by p.
 * AssemblyScript; the twin is `plain-rows.ts`.
 */
import { COLUMN_PIVOTS_AT, ROWS_AT } from "../layout";

/** accumulator[columns[k]] −= multiplier · coefficients[k] for all k from `first` on. */
export function subtractMultiple(
  accumulator: usize,
  columns: usize,
  coefficients: usize,
  first: i32,
  length: i32,
  multiplier: u32,
  prime: u32,
): void {
  subtract(accumulator, columns, coefficients, first, length, multiplier, (<u64>prime) * prime);
}

function subtract(
  accumulator: usize,
  columns: usize,
  coefficients: usize,
  first: i32,
  length: i32,
  multiplier: u64,
  square: u64,
): void {
  let c = columns + ((<usize>first) << 2);
  let f = coefficients + ((<usize>first) << 2);
  const end = columns + ((<usize>length) << 2);
  const unrolled = columns + ((<usize>(first + ((length - first) & ~3))) << 2);
  while (c < unrolled) {
    const a0 = accumulator + ((<usize>load<u32>(c)) << 3);
    const a1 = accumulator + ((<usize>load<u32>(c, 4)) << 3);
    const a2 = accumulator + ((<usize>load<u32>(c, 8)) << 3);
    const a3 = accumulator + ((<usize>load<u32>(c, 12)) << 3);
    const x0 = load<i64>(a0) - <i64>(multiplier * <u64>load<u32>(f));
    const x1 = load<i64>(a1) - <i64>(multiplier * <u64>load<u32>(f, 4));
    const x2 = load<i64>(a2) - <i64>(multiplier * <u64>load<u32>(f, 8));
    const x3 = load<i64>(a3) - <i64>(multiplier * <u64>load<u32>(f, 12));
    store<i64>(a0, x0 + ((x0 >> 63) & <i64>square));
    store<i64>(a1, x1 + ((x1 >> 63) & <i64>square));
    store<i64>(a2, x2 + ((x2 >> 63) & <i64>square));
    store<i64>(a3, x3 + ((x3 >> 63) & <i64>square));
    c += 16;
    f += 16;
  }
  while (c < end) {
    const a = accumulator + ((<usize>load<u32>(c)) << 3);
    const x = load<i64>(a) - <i64>(multiplier * <u64>load<u32>(f));
    store<i64>(a, x + ((x >> 63) & <i64>square));
    c += 4;
    f += 4;
  }
}

/** accumulator[columns[k]] += factor · coefficients[k] for all k. */
export function addRow(
  accumulator: usize,
  columns: usize,
  coefficients: usize,
  length: i32,
  factor: u32,
  prime: u32,
): void {
  const square = (<u64>prime) * prime;
  for (let k: usize = 0; k < <usize>length; k++) {
    const a = accumulator + ((<usize>load<u32>(columns + (k << 2))) << 3);
    const x = load<u64>(a) + <u64>factor * <u64>load<u32>(coefficients + (k << 2));
    store<u64>(a, x >= square ? x - square : x);
  }
}

/**
 * Sweeps the accumulator from column `from` on: each entry with a pivot is eliminated. Afterwards every
 * entry is a residue below p. Returns how many are not zero.
 */
export function sweep(accumulator: usize, from: i32, width: i32, p: u32): i32 {
  const prime = <u64>p;
  const square = prime * prime;
  const pivots = <usize>load<u32>(COLUMN_PIVOTS_AT);
  const table = <usize>load<u32>(ROWS_AT);
  let nonZero = 0;
  for (let column = from; column < width; column++) {
    const at = accumulator + ((<usize>column) << 3);
    const entry = load<u64>(at);
    if (entry == 0) continue;
    const value = entry >= prime ? entry % prime : entry;
    if (value == 0) {
      store<u64>(at, 0);
      continue;
    }
    const pivot = load<i32>(pivots + ((<usize>column) << 2));
    if (pivot < 0) {
      store<u64>(at, value);
      nonZero++;
      continue;
    }
    store<u64>(at, 0);
    const row = table + ((<usize>pivot) << 4);
    const columns = <usize>load<u32>(row, 8);
    const coefficients = <usize>load<u32>(row, 12);
    subtract(accumulator, columns, coefficients, 1, load<i32>(row, 4), value, square);
  }
  return nonZero;
}

/** The inverse of a residue, by the extended algorithm of Euclid. */
function inverse(value: u64, prime: u64): u64 {
  let a = <i64>prime;
  let b = <i64>value;
  let x: i64 = 0;
  let y: i64 = 1;
  while (b != 0) {
    const quotient = a / b;
    const c = a - quotient * b;
    a = b;
    b = c;
    const z = x - quotient * y;
    x = y;
    y = z;
  }
  return <u64>(x < 0 ? x + <i64>prime : x);
}

/**
 * Writes the non-zero residues from column `from` on as a monic sparse row, and clears the accumulator.
 * Returns how many there were.
 */
export function gather(
  accumulator: usize,
  from: i32,
  width: i32,
  p: u32,
  columns: usize,
  coefficients: usize,
): i32 {
  const prime = <u64>p;
  let length: usize = 0;
  let factor: u64 = 1;
  for (let column = from; column < width; column++) {
    const at = accumulator + ((<usize>column) << 3);
    const value = load<u64>(at);
    if (value == 0) continue;
    store<u64>(at, 0);
    if (length == 0) factor = value == 1 ? 1 : inverse(value, prime);
    store<u32>(columns + (length << 2), <u32>column);
    store<u32>(coefficients + (length << 2), <u32>(factor == 1 ? value : (value * factor) % prime));
    length++;
  }
  return <i32>length;
}
