/** Columns into the term order in plain TypeScript: the twin of `assembly/columns.ts`, by comparisons. */
import type { ColumnKernel } from "./kernel.js";
import {
  COLUMN_COUNT_AT,
  COLUMN_EXPONENTS_AT,
  COLUMN_PIVOTS_AT,
  MONOMIAL_BYTES_AT,
  ROW_COUNT_AT,
  ROWS_AT,
  WIDE_AT,
} from "./layout.js";

/** The plain column functions over a memory. */
export function plainColumns(buffer: SharedArrayBuffer | ArrayBuffer): ColumnKernel {
  const words = new Uint32Array(buffer);
  const signed = new Int32Array(buffer);
  const bytes = new Uint8Array(buffer);
  const halves = new Uint16Array(buffer);
  const longs = new BigInt64Array(buffer);
  const field = (at: number): number => words[at >>> 2]!;

  /** The comparisons that stand between two addresses, as numbers. */
  function readOrder(start: number, end: number) {
    const read: { readonly variables: number[]; readonly weights: number[] }[] = [];
    for (let place = start / 8; place < end / 8; ) {
      const terms = Array.from({ length: Number(longs[place]) }, (_, k) => place + 1 + 2 * k);
      read.push({
        variables: terms.map((term) => Number(longs[term])),
        weights: terms.map((term) => Number(longs[term + 1])),
      });
      place += 1 + 2 * terms.length;
    }
    return read;
  }

  return {
    sortColumns(order, orderEnd, scratch) {
      const size = field(MONOMIAL_BYTES_AT);
      const start = field(COLUMN_EXPONENTS_AT);
      const wide = field(WIDE_AT) === 1;
      const exponent = (column: number, v: number): number => {
        const at = start + column * size;
        return wide ? halves[at / 2 + v]! : bytes[at + v]!;
      };
      const tests = readOrder(order, orderEnd);
      const numbers = Uint32Array.from({ length: field(COLUMN_COUNT_AT) }, (_, k) => k);
      numbers.sort((a, b) => {
        for (const { variables, weights } of tests) {
          let difference = 0;
          for (let k = 0; k < variables.length; k++) {
            difference += weights[k]! * (exponent(b, variables[k]!) - exponent(a, variables[k]!));
          }
          if (difference !== 0) return difference;
        }
        return 0;
      });
      words.set(numbers, scratch >>> 2);
      return scratch;
    },

    renumberColumns(sorted, ranks, firstRow, endRow) {
      const count = field(COLUMN_COUNT_AT);
      const rank = ranks >>> 2;
      const pivots = field(COLUMN_PIVOTS_AT) >>> 2;
      for (let k = 0; k < count; k++) {
        words[rank + words[(sorted >>> 2) + k]!] = k;
        signed[pivots + k] = -1;
      }
      const rows = field(ROW_COUNT_AT);
      for (let r = 0; r < rows; r++) {
        const row = (field(ROWS_AT) >>> 2) + 4 * r;
        const columns = words[row + 2]! >>> 2;
        const end = columns + words[row + 1]!;
        for (let k = columns; k < end; k++) words[k] = words[rank + words[k]!]!;
        if (r < firstRow || r >= endRow) signed[pivots + words[columns]!] = r;
      }
    },
  };
}
