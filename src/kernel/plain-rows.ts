/**
 * Elimination modulo a prime in plain TypeScript: the twin of `assembly/rows.ts`. The accumulator holds
 * residues as doubles. For primes below 2²⁶ product plus entry stay under 2⁵², where the rounded quotient
 * x/p never reaches the next integer: its rounding error is at most (x/p)·2⁻⁵³ < 1/(2p), and the distance
 * from x/p up to an integer is 0 or at least 1/p. Above, the multiplier is split at 16 bits.
 */
import type { RowKernel } from "./kernel.js";
import { COLUMN_PIVOTS_AT, ROWS_AT } from "./layout.js";
import { residueProduct } from "./residue-product.js";

const SMALL_PRIME_LIMIT = 2 ** 26;

/** The plain row functions over a memory. */
export function plainRows(buffer: SharedArrayBuffer | ArrayBuffer): RowKernel {
  const words = new Uint32Array(buffer);
  const signed = new Int32Array(buffer);
  const entries = new Float64Array(buffer);

  const addRow: RowKernel["addRow"] = (accumulator, columns, coefficients, length, m, p) => {
    const add = p < SMALL_PRIME_LIMIT ? addSmall : addLarge;
    add(entries, signed, accumulator >>> 3, columns >>> 2, coefficients >>> 2, length, m, p);
  };
  return {
    addRow,
    subtractMultiple(accumulator, columns, coefficients, first, length, multiplier, prime) {
      const skip = 4 * first;
      const minus = multiplier === 0 ? 0 : prime - multiplier;
      addRow(accumulator, columns + skip, coefficients + skip, length - first, minus, prime);
    },
    sweep(accumulator, from, width, prime) {
      const start = accumulator >>> 3;
      const pivots = words[COLUMN_PIVOTS_AT >>> 2]! >>> 2;
      const rows = words[ROWS_AT >>> 2]! >>> 2;
      let nonZero = 0;
      for (let column = from; column < width; column++) {
        const value = entries[start + column]!;
        if (value === 0) continue;
        const pivot = signed[pivots + column]!;
        if (pivot < 0) {
          nonZero++;
          continue;
        }
        entries[start + column] = 0;
        const row = rows + 4 * pivot;
        const columns = words[row + 2]! + 4;
        const coefficients = words[row + 3]! + 4;
        addRow(accumulator, columns, coefficients, words[row + 1]! - 1, prime - value, prime);
      }
      return nonZero;
    },
    gather(accumulator, from, width, prime, columns, coefficients) {
      const start = accumulator >>> 3;
      let length = 0;
      let factor = 1;
      for (let column = from; column < width; column++) {
        const value = entries[start + column]!;
        if (value === 0) continue;
        entries[start + column] = 0;
        if (length === 0) factor = inverse(value, prime);
        words[(columns >>> 2) + length] = column;
        words[(coefficients >>> 2) + length] = residueProduct(value, factor, prime);
        length++;
      }
      return length;
    },
  };
}

function addSmall(
  entries: Float64Array,
  words: Int32Array,
  accumulator: number,
  columns: number,
  coefficients: number,
  length: number,
  multiplier: number,
  p: number,
): void {
  const unrolled = length & ~3;
  let k = 0;
  for (; k < unrolled; k += 4) {
    const c0 = accumulator + words[columns + k]!;
    const c1 = accumulator + words[columns + k + 1]!;
    const c2 = accumulator + words[columns + k + 2]!;
    const c3 = accumulator + words[columns + k + 3]!;
    const x0 = entries[c0]! + multiplier * words[coefficients + k]!;
    const x1 = entries[c1]! + multiplier * words[coefficients + k + 1]!;
    const x2 = entries[c2]! + multiplier * words[coefficients + k + 2]!;
    const x3 = entries[c3]! + multiplier * words[coefficients + k + 3]!;
    entries[c0] = x0 - Math.floor(x0 / p) * p;
    entries[c1] = x1 - Math.floor(x1 / p) * p;
    entries[c2] = x2 - Math.floor(x2 / p) * p;
    entries[c3] = x3 - Math.floor(x3 / p) * p;
  }
  for (; k < length; k++) {
    const c = accumulator + words[columns + k]!;
    const x = entries[c]! + multiplier * words[coefficients + k]!;
    entries[c] = x - Math.floor(x / p) * p;
  }
}

function addLarge(
  entries: Float64Array,
  words: Int32Array,
  accumulator: number,
  columns: number,
  coefficients: number,
  length: number,
  multiplier: number,
  p: number,
): void {
  for (let k = 0; k < length; k++) {
    const c = accumulator + words[columns + k]!;
    const x = entries[c]! + residueProduct(words[coefficients + k]!, multiplier, p);
    entries[c] = x >= p ? x - p : x;
  }
}

/** The inverse of a residue, by the extended algorithm of Euclid. */
function inverse(value: number, p: number): number {
  let [a, b, x, y] = [p, value, 0, 1];
  while (b !== 0) {
    const quotient = Math.floor(a / b);
    [a, b, x, y] = [b, a - quotient * b, y, x - quotient * y];
  }
  return x < 0 ? x + p : x;
}
