/** Four rows at once in plain TypeScript: the twin of `assembly/four-rows.ts`; lanes hold residues as doubles. */
import type { LaneKernel } from "./kernel.js";
import { COLUMN_PIVOTS_AT, ROWS_AT } from "./layout.js";
import { residueProduct } from "./residue-product.js";

/** The plain lane functions over a memory. */
export function plainFourRows(buffer: SharedArrayBuffer | ArrayBuffer): LaneKernel {
  const words = new Uint32Array(buffer);
  const signed = new Int32Array(buffer);
  const entries = new Float64Array(buffer);

  const subtractFromLanes: LaneKernel["subtractFromLanes"] = (
    accumulator,
    columns,
    coefficients,
    first,
    length,
    m0,
    m1,
    m2,
    m3,
    p,
  ) => {
    [m0, m1, m2, m3].forEach((m, lane) => {
      if (m === 0) return;
      const start = accumulator / 8 + lane;
      for (let k = first; k < length; k++) {
        const at = start + 4 * words[(columns >>> 2) + k]!;
        const x = entries[at]! - residueProduct(words[(coefficients >>> 2) + k]!, m, p);
        entries[at] = x < 0 ? x + p : x;
      }
    });
  };

  return {
    subtractFromLanes,
    loadLane(accumulator, lane, columns, coefficients, length) {
      const start = accumulator / 8 + lane;
      for (let k = 0; k < length; k++) {
        const column = words[(columns >>> 2) + k]!;
        entries[start + 4 * column] = words[(coefficients >>> 2) + k]!;
      }
    },
    sweepLanes(accumulator, from, width, prime) {
      const start = accumulator / 8;
      const pivots = words[COLUMN_PIVOTS_AT >>> 2]! >>> 2;
      for (let column = from; column < width; column++) {
        const pivot = signed[pivots + column]!;
        if (pivot < 0) continue;
        const at = start + 4 * column;
        const [m0, m1, m2, m3] = [0, 1, 2, 3].map((lane) => entries[at + lane]!);
        entries.fill(0, at, at + 4);
        const row = (words[ROWS_AT >>> 2]! >>> 2) + 4 * pivot;
        subtractFromLanes(
          accumulator,
          words[row + 2]!,
          words[row + 3]!,
          1,
          words[row + 1]!,
          m0!,
          m1!,
          m2!,
          m3!,
          prime,
        );
      }
    },
    takeLane(accumulator, lane, from, width, _prime, columns, coefficients) {
      const start = accumulator / 8 + lane;
      let length = 0;
      for (let column = from; column < width; column++) {
        const value = entries[start + 4 * column]!;
        if (value === 0) continue;
        entries[start + 4 * column] = 0;
        words[(columns >>> 2) + length] = column;
        words[(coefficients >>> 2) + length] = value;
        length++;
      }
      return length;
    },
  };
}
