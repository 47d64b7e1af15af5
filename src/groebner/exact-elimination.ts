/**
 * Matrix reduction over the integers, without fractions: a row is scaled where a pivot's leading
 * coefficient does not divide. A row is first tried in doubles, with a running bound that guarantees
 * every entry below 2⁵³; when the bound gives out it starts again in big integers. The families here
 * have coefficients ±1, so nearly all their rows stay in doubles.
 */
import { interruptibleGcd } from "../arithmetic/integers.js";
import type { Budget } from "../outcomes/budget.js";
import type { EliminationTask, RowArithmetic } from "./row-arithmetic.js";
import { coprimeRow, type ExactRow, primitiveRow, smallRow } from "./rows.js";
import type { SymbolicMatrix } from "./symbolic-matrix.js";

interface PivotRow {
  /** Ascending. */
  readonly columns: Int32Array;
  readonly row: Pick<ExactRow, "coefficients" | "small">;
  /** The largest absolute value among small coefficients. */
  readonly height: number;
}

const EXACT_LIMIT = Number.MAX_SAFE_INTEGER;
/** Rows of so many columns more count once more against the budget. */
const COLUMNS_OF_ONE_SPEND = 4096;
/** After this many scalings by big integers the content of the row is divided out. */
const SCALINGS_BETWEEN_CONTENTS = 8;

/** Row arithmetic over the integers: primitive rows, exact results. */
export function exactArithmetic(): RowArithmetic<ExactRow> {
  return {
    eliminate(matrix, elements, task, budget) {
      return reduceMatrix(matrix, elements, task, budget).map(
        ({ row: { columns, row }, source }) => {
          const monomials = matrix.monomials(columns);
          const exact =
            row.small === undefined
              ? coprimeRow(monomials, row.coefficients)
              : smallRow(monomials, row.small);
          return { row: exact, source };
        },
      );
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
  { mode, most }: EliminationTask,
  budget: Budget,
): { readonly row: PivotRow; readonly source: number }[] {
  const { width } = matrix;
  const pivots = new Pivots(matrix, elements);
  const accumulator = new Float64Array(width);
  const reduce = (row: PivotRow, from: number): PivotRow | undefined => {
    budget.spend(
      () => `reducing a matrix of ${width} columns exactly`,
      1 + width / COLUMNS_OF_ONE_SPEND,
    );
    const quick = reduceInDoubles(row, pivots, accumulator, from);
    return (quick ?? reduceInBigIntegers(row, pivots, width, from, budget)).reduced;
  };
  const left: { row: PivotRow; readonly source: number }[] = [];
  for (let source = 0; source < matrix.rowCount && left.length < most; source++) {
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

function pivotRow(columns: Int32Array, row: Pick<ExactRow, "coefficients" | "small">): PivotRow {
  const { small } = row;
  return { columns, row, height: small === undefined ? Infinity : heightOf(small) };
}

function heightOf(values: Float64Array): number {
  let height = 0;
  for (let k = 0; k < values.length; k++) height = Math.max(height, Math.abs(values[k] as number));
  return height;
}

/** The reduced row (undefined: it is zero); undefined altogether when doubles do not suffice. */
function reduceInDoubles(
  row: PivotRow,
  pivots: Pivots,
  accumulator: Float64Array,
  from: number,
): { readonly reduced: PivotRow | undefined } | undefined {
  const { columns, height } = row;
  const { small } = row.row;
  if (small === undefined) return undefined;
  const start = columns[0] as number;
  accumulator.fill(0, start);
  for (let k = 0; k < columns.length; k++) {
    accumulator[columns[k] as number] = small[k] as number;
  }
  let bound = height;
  for (let column = from; column < accumulator.length; column++) {
    const value = accumulator[column] as number;
    const pivot = value === 0 ? undefined : pivots.at(column);
    if (pivot === undefined) continue;
    const reducing = pivot.row.small;
    if (reducing === undefined) return undefined;
    const lead = reducing[0] as number;
    const common = gcdOfDoubles(value, lead);
    const scale = lead / common;
    const multiplier = value / common;
    const growth = Math.abs(multiplier) * pivot.height;
    if (bound * scale + growth > EXACT_LIMIT) bound = largestFrom(accumulator, start);
    bound = bound * scale + growth;
    if (bound > EXACT_LIMIT) return undefined;
    if (scale !== 1) multiplyFrom(accumulator, start, scale);
    subtractMultiple(accumulator, pivot.columns, reducing, multiplier);
  }
  return { reduced: gatherDoubles(accumulator, start) };
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
    entries[row.columns[k] as number] = row.row.coefficients[k] as bigint;
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
    const lead = pivot.row.coefficients[0] as bigint;
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
    const { columns } = pivot;
    const { coefficients } = pivot.row;
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
  return { reduced: gatherBigIntegers(entries, start, spend) };
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

/** The primitive row in the accumulator; undefined if it is zero. */
function gatherDoubles(accumulator: Float64Array, start: number): PivotRow | undefined {
  let length = 0;
  let content = 0;
  for (let column = start; column < accumulator.length; column++) {
    const value = accumulator[column] as number;
    if (value === 0) continue;
    length++;
    if (content !== 1) content = content === 0 ? Math.abs(value) : gcdOfDoubles(value, content);
  }
  if (length === 0) return undefined;
  const columns = new Int32Array(length);
  const values = new Float64Array(length);
  for (let column = start, k = 0; k < length; column++) {
    const value = accumulator[column] as number;
    if (value === 0) continue;
    columns[k] = column;
    values[k++] = value;
  }
  const unit = (values[0] as number) < 0 ? -content : content;
  if (unit !== 1) {
    for (let k = 0; k < length; k++) values[k] = (values[k] as number) / unit;
  }
  return pivotRow(columns, smallRow(columns, values));
}

function gatherBigIntegers(
  entries: readonly bigint[],
  start: number,
  spend: () => void,
): PivotRow | undefined {
  const columns: number[] = [];
  const coefficients: bigint[] = [];
  for (let column = start; column < entries.length; column++) {
    const value = entries[column] as bigint;
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
