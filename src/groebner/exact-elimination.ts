/**
 * Matrix reduction over the integers, without fractions: a row is scaled where a pivot's leading
 * coefficient does not divide. A row is first tried in doubles, with a running bound that guarantees
 * every entry below 2⁵³; when the bound gives out it starts again in big integers. The families here
 * have coefficients ±1, so nearly all their rows stay in doubles.
 */
import { interruptibleGcd } from "../arithmetic/integers.js";
import type { Budget } from "../outcomes/budget.js";
import type { EliminationMode, RowArithmetic } from "./row-arithmetic.js";
import { type ExactRow, primitiveRow } from "./rows.js";
import type { SymbolicMatrix } from "./symbolic-matrix.js";

interface PivotRow {
  /** Ascending. */
  readonly columns: Int32Array;
  readonly coefficients: readonly bigint[];
  readonly small: Float64Array | undefined;
  /** The largest absolute value in `small`. */
  readonly height: number;
}

const EXACT_LIMIT = Number.MAX_SAFE_INTEGER;
/** After this many scalings by big integers the content of the row is divided out. */
const SCALINGS_BETWEEN_CONTENTS = 8;

/** Row arithmetic over the integers: primitive rows, exact results. */
export function exactArithmetic(): RowArithmetic<ExactRow> {
  return {
    eliminate(matrix, elements, mode, budget) {
      return reduceMatrix(matrix, elements, mode, budget).map(({ row, source }) => {
        const { columns, coefficients, small } = row;
        return { row: { monomials: matrix.monomials(columns), coefficients, small }, source };
      });
    },
  };
}

/** The pivots of a matrix, each read when it is first needed; later rows may join them. */
class Pivots {
  readonly #matrix: SymbolicMatrix;
  readonly #elements: readonly ExactRow[];
  readonly #known: (PivotRow | undefined)[] = [];

  constructor(matrix: SymbolicMatrix, elements: readonly ExactRow[]) {
    this.#matrix = matrix;
    this.#elements = elements;
  }

  at(column: number): PivotRow | undefined {
    const known = this.#known[column];
    if (known !== undefined) return known;
    const row = this.#matrix.pivot(column);
    if (row === undefined) return undefined;
    const pivot = pivotRow(row.columns, this.#elements[row.element] as ExactRow);
    this.#known[column] = pivot;
    return pivot;
  }

  set(row: PivotRow): void {
    this.#known[row.columns[0] as number] = row;
  }
}

function reduceMatrix(
  matrix: SymbolicMatrix,
  elements: readonly ExactRow[],
  mode: EliminationMode,
  budget: Budget,
): { readonly row: PivotRow; readonly source: number }[] {
  const { width } = matrix;
  const pivots = new Pivots(matrix, elements);
  const accumulator = new Float64Array(width);
  const reduce = (row: PivotRow, from: number): PivotRow | undefined => {
    budget.spend(() => `reducing a matrix of ${width} columns exactly`);
    const quick = reduceInDoubles(row, pivots, accumulator, from);
    return (quick ?? reduceInBigIntegers(row, pivots, width, from, budget)).reduced;
  };
  const left: { row: PivotRow; readonly source: number }[] = [];
  for (let source = 0; source < matrix.rowCount; source++) {
    const { columns, element } = matrix.row(source);
    const row = pivotRow(columns, elements[element] as ExactRow);
    const first = columns[0] as number;
    const reduced = reduce(row, mode === "tails" ? first + 1 : first);
    if (reduced === undefined) continue;
    left.push({ row: reduced, source });
    if (mode === "echelon") pivots.set(reduced);
  }
  if (mode === "echelon" && left.length > 1) {
    // Smallest leading monomial first: every row is then reduced by rows that are final.
    left.sort((a, b) => (b.row.columns[0] as number) - (a.row.columns[0] as number));
    for (const item of left) {
      item.row = reduce(item.row, (item.row.columns[0] as number) + 1) ?? item.row;
      pivots.set(item.row);
    }
  }
  return left;
}

function pivotRow(columns: Int32Array, row: ExactRow): PivotRow {
  let height = 0;
  for (const c of row.small ?? []) height = Math.max(height, Math.abs(c));
  return { columns, coefficients: row.coefficients, small: row.small, height };
}

/** The reduced row (undefined: it is zero); undefined altogether when doubles do not suffice. */
function reduceInDoubles(
  row: PivotRow,
  pivots: Pivots,
  accumulator: Float64Array,
  from: number,
): { readonly reduced: PivotRow | undefined } | undefined {
  if (row.small === undefined) return undefined;
  const start = row.columns[0] as number;
  accumulator.fill(0, start);
  for (let k = 0; k < row.columns.length; k++) {
    accumulator[row.columns[k] as number] = row.small[k] as number;
  }
  let bound = row.height;
  for (let column = from; column < accumulator.length; column++) {
    const value = accumulator[column] as number;
    const pivot = value === 0 ? undefined : pivots.at(column);
    if (pivot === undefined) continue;
    if (pivot.small === undefined) return undefined;
    const lead = pivot.small[0] as number;
    const common = gcdOfDoubles(value, lead);
    const scale = lead / common;
    const multiplier = value / common;
    const growth = Math.abs(multiplier) * pivot.height;
    if (bound * scale + growth > EXACT_LIMIT) bound = largestFrom(accumulator, start);
    bound = bound * scale + growth;
    if (bound > EXACT_LIMIT) return undefined;
    if (scale !== 1) multiplyFrom(accumulator, start, scale);
    subtractMultiple(accumulator, pivot.columns, pivot.small, multiplier);
  }
  return { reduced: gather(start, accumulator.length, (c) => BigInt(accumulator[c] as number)) };
}

function multiplyFrom(accumulator: Float64Array, start: number, factor: number): void {
  for (let c = start; c < accumulator.length; c++) {
    accumulator[c] = (accumulator[c] as number) * factor;
  }
}

function subtractMultiple(
  accumulator: Float64Array,
  columns: Int32Array,
  coefficients: Float64Array,
  multiplier: number,
): void {
  for (let k = 0; k < columns.length; k++) {
    const c = columns[k] as number;
    accumulator[c] = (accumulator[c] as number) - multiplier * (coefficients[k] as number);
  }
}

function reduceInBigIntegers(
  row: PivotRow,
  pivots: Pivots,
  width: number,
  from: number,
  budget: Budget,
): { readonly reduced: PivotRow | undefined } {
  const start = row.columns[0] as number;
  const entries = new Array<bigint>(width).fill(0n);
  for (let k = 0; k < row.columns.length; k++) {
    entries[row.columns[k] as number] = row.coefficients[k] as bigint;
  }
  // Integers may grow to millions of bits, so that single operations take long: every one is accounted for.
  const stage = (): string => `reducing a matrix of ${width} columns in big integers`;
  const spend = (): void => budget.spend(stage);
  let scalings = 0;
  for (let column = from; column < width; column++) {
    const value = entries[column] as bigint;
    if (value === 0n) continue;
    const pivot = pivots.at(column);
    if (pivot === undefined) continue;
    const lead = pivot.coefficients[0] as bigint;
    const common = interruptibleGcd(value, lead, spend);
    const scale = lead / common;
    const multiplier = value / common;
    if (scale !== 1n) {
      for (let c = start; c < width; c++) {
        if (entries[c] === 0n) continue;
        spend();
        entries[c] = (entries[c] as bigint) * scale;
      }
      scalings++;
    }
    const { columns, coefficients } = pivot;
    for (let k = 0; k < columns.length; k++) {
      const c = columns[k] as number;
      spend();
      entries[c] = (entries[c] as bigint) - multiplier * (coefficients[k] as bigint);
    }
    if (scalings >= SCALINGS_BETWEEN_CONTENTS) {
      divideByContent(entries, start, spend);
      scalings = 0;
    }
  }
  return { reduced: gather(start, width, (c) => entries[c] as bigint, spend) };
}

function divideByContent(entries: bigint[], start: number, spend: () => void): void {
  let content = 0n;
  for (let c = start; c < entries.length; c++) {
    if (entries[c] !== 0n) content = interruptibleGcd(content, entries[c] as bigint, spend);
    if (content === 1n) return;
  }
  if (content === 0n) return;
  for (let c = start; c < entries.length; c++) {
    if (entries[c] !== 0n) entries[c] = (entries[c] as bigint) / content;
  }
}

function gather(
  start: number,
  width: number,
  entry: (column: number) => bigint,
  spend?: () => void,
): PivotRow | undefined {
  const columns: number[] = [];
  const coefficients: bigint[] = [];
  for (let column = start; column < width; column++) {
    const value = entry(column);
    if (value === 0n) continue;
    columns.push(column);
    coefficients.push(value);
  }
  if (columns.length === 0) return undefined;
  const primitive = primitiveRow(Int32Array.from(columns), coefficients, spend);
  return pivotRow(primitive.monomials, primitive);
}

function largestFrom(accumulator: Float64Array, start: number): number {
  let largest = 0;
  for (let c = start; c < accumulator.length; c++) {
    largest = Math.max(largest, Math.abs(accumulator[c] as number));
  }
  return largest;
}

/** The positive greatest common divisor of two non-zero integers below 2⁵³. */
function gcdOfDoubles(a: number, b: number): number {
  let x = Math.abs(a);
  let y = Math.abs(b);
  while (y !== 0) [x, y] = [y, x % y];
  return x;
}
