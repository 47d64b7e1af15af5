/**
 * Matrix reduction over a prime field: each row is scattered into a dense accumulator and swept from
 * its first column on, one pivot after the other.
 */
import type { PrimeField, Residue } from "../arithmetic/prime-field.js";
import { plainRowKernel, type RowKernel } from "../kernel/row-kernel.js";
import { type ColumnRow, monomialsOf, type RowArithmetic, reduceMatrix } from "./row-arithmetic.js";
import type { ModularRow } from "./rows.js";

interface PivotRow extends ColumnRow {
  readonly coefficients: Int32Array;
}

/** Row arithmetic over a prime field: monic rows. */
export function modularArithmetic(
  field: PrimeField,
  kernel: RowKernel = plainRowKernel(field.prime),
): RowArithmetic<ModularRow> {
  return {
    eliminate(matrix, elements, mode, budget) {
      const width = matrix.monomials.length;
      const accumulator = new Float64Array(width);
      return reduceMatrix<PivotRow, ModularRow>(matrix, mode, {
        load: ({ columns, element }) => ({
          columns,
          coefficients: (elements[element] as ModularRow).coefficients,
        }),
        reduce(row, pivots, from) {
          budget.spend(() => `reducing a matrix of ${width} columns modulo ${field.prime}`);
          const start = row.columns[0] as number;
          accumulator.fill(0, start);
          for (let k = 0; k < row.columns.length; k++) {
            accumulator[row.columns[k] as number] = row.coefficients[k] as number;
          }
          sweep(accumulator, pivots, kernel, from);
          return gather(accumulator, field, start);
        },
        store: (row) => ({ monomials: monomialsOf(matrix, row), coefficients: row.coefficients }),
      });
    },
  };
}

function sweep(
  accumulator: Float64Array,
  pivots: readonly (PivotRow | undefined)[],
  kernel: RowKernel,
  from: number,
): void {
  const p = kernel.prime;
  for (let column = from; column < accumulator.length; column++) {
    const value = accumulator[column] as number;
    if (value === 0) continue;
    const pivot = pivots[column];
    if (pivot !== undefined) {
      kernel.addMultiple(accumulator, pivot.columns, pivot.coefficients, p - value);
    }
  }
}

/** The monic sparse row in the accumulator, or undefined if it is zero. */
function gather(accumulator: Float64Array, field: PrimeField, start: number): PivotRow | undefined {
  let length = 0;
  let first = -1;
  for (let column = start; column < accumulator.length; column++) {
    if (accumulator[column] === 0) continue;
    if (first === -1) first = column;
    length++;
  }
  if (first === -1) return undefined;
  const columns = new Int32Array(length);
  const coefficients = new Int32Array(length);
  const inverse = field.invert(accumulator[first] as Residue);
  for (let column = first, k = 0; k < length; column++) {
    const value = accumulator[column] as Residue;
    if (value === 0) continue;
    columns[k] = column;
    coefficients[k] = inverse === 1 ? value : field.multiply(value, inverse);
    k++;
  }
  return { columns, coefficients };
}
