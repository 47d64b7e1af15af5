/**
 * Matrix reduction over a prime field: each row is scattered into a dense accumulator and swept from its
 * first column on, one pivot after the other. Where rows meet many of the pivots, four go at once. All of it
 * happens in the kernel's memory; only what a reduction leaves over comes out.
 */
import type { PrimeField } from "../arithmetic/prime-field.js";
import type { Workspace } from "../kernel/workspace.js";
import type { Remainder, RowArithmetic } from "./row-arithmetic.js";
import type { ModularRow } from "./rows.js";

/** Row arithmetic over a prime field: monic rows. */
export function modularArithmetic(field: PrimeField): RowArithmetic<ModularRow> {
  return {
    eliminate(matrix, _elements, { mode, most }, budget) {
      const { workspace, width, firstRow, rowCount } = matrix;
      const stage = (): string => `reducing a matrix of ${width} columns modulo ${field.prime}`;
      const work = 1 + width / COLUMNS_OF_ONE_SPEND;
      const sweeper = new Sweeper(workspace, width, field.prime, () => budget.spend(stage, work));
      const rows = Array.from({ length: rowCount }, (_, source): ColumnRow => {
        return { ...workspace.placeOfRow(firstRow + source), source };
      });
      let left: ColumnRow[];
      switch (mode) {
        case "tails":
          left = rows.map((row) => sweeper.reduceTail(row));
          break;
        case "independent":
          left = rows.flatMap((row) => sweeper.reduce(row) ?? []);
          break;
        case "echelon":
          left = sweeper.echelon(rows, most);
      }
      return left.map(({ columns, residues, length, source }): Remainder<ModularRow> => {
        const row = {
          monomials: matrix.monomials(workspace.integers(columns, length)),
          coefficients: workspace.integers(residues, length).slice(),
        };
        return { row, source };
      });
    },
  };
}

/** A row in the kernel's memory: addresses of columns and residues. */
interface ColumnRow {
  readonly columns: number;
  readonly residues: number;
  readonly length: number;
  readonly source: number;
}

/** Rows of so many columns more count once more against the budget. */
const COLUMNS_OF_ONE_SPEND = 8192;
const LANES = 4;
/** Fewer rows than this are not worth a look at how dense they are. */
const ROWS_WORTH_LANES = 8;
/** Reduced rows this dense, in parts of the width, are reduced four at a time. */
const DENSITY_WORTH_LANES = 0.02;

/** Reduces rows of one matrix. */
class Sweeper {
  readonly #space: Workspace;
  readonly #width: number;
  readonly #prime: number;
  readonly #spend: () => void;
  readonly #accumulator: number;
  #lanes: number | undefined;

  constructor(space: Workspace, width: number, prime: number, spend: () => void) {
    this.#space = space;
    this.#width = width;
    this.#prime = prime;
    this.#spend = spend;
    this.#accumulator = this.#zeros(8 * width);
  }

  /** Rows with distinct first columns that span the same, fully reduced; stops when there are `most` of them. */
  echelon(rows: readonly ColumnRow[], most: number): ColumnRow[] {
    const left: ColumnRow[] = [];
    let next = 0;
    let dense = false;
    while (next < rows.length && left.length < most) {
      const group = rows.slice(next, next + (dense ? LANES : 1));
      next += group.length;
      const reducible: readonly ColumnRow[] = dense ? this.#reduceTogether(group) : group;
      for (const row of reducible) {
        const reduced = left.length < most ? this.reduce(row) : undefined;
        if (reduced === undefined) continue;
        left.push(reduced);
        this.#makePivot(reduced);
        dense ||= rows.length >= ROWS_WORTH_LANES && this.#isDense(reduced);
      }
    }
    if (left.length < 2) return left;
    // Smallest leading monomial first: every row is then reduced by rows that are final.
    left.sort((a, b) => this.#first(b) - this.#first(a));
    return left.map((row) => {
      const reduced = this.reduceTail(row);
      this.#makePivot(reduced);
      return reduced;
    });
  }

  /** The row reduced by all pivots, monic; undefined if it is zero. */
  reduce(row: ColumnRow): ColumnRow | undefined {
    return this.#reduceFrom(row, this.#first(row), 0);
  }

  /** The row with its first term kept and the others reduced by all pivots. */
  reduceTail(row: ColumnRow): ColumnRow {
    return this.#reduceFrom(row, this.#first(row) + 1, 1) ?? row;
  }

  #reduceFrom(row: ColumnRow, from: number, kept: number): ColumnRow | undefined {
    this.#spend();
    const space = this.#space;
    const { kernel } = space;
    const accumulator = this.#accumulator;
    const prime = this.#prime;
    kernel.addRow(accumulator, row.columns, row.residues, row.length, 1, prime);
    const length = kernel.sweep(accumulator, from, this.#width, prime) + kept;
    if (length === 0) return undefined;
    const columns = space.reserve(4 * length);
    const residues = space.reserve(4 * length);
    kernel.gather(accumulator, from - kept, this.#width, prime, columns, residues);
    return { columns, residues, length, source: row.source };
  }

  /** The rows reduced by the pivots that there are, but neither by each other nor made monic; no zeros. */
  #reduceTogether(rows: readonly ColumnRow[]): ColumnRow[] {
    this.#spend();
    const space = this.#space;
    const { kernel } = space;
    this.#lanes ??= this.#zeros(8 * LANES * this.#width);
    const lanes = this.#lanes;
    rows.forEach(({ columns, residues, length }, lane) => {
      kernel.loadLane(lanes, lane, columns, residues, length);
    });
    const from = rows.reduce((least, row) => Math.min(least, this.#first(row)), this.#width);
    kernel.sweepLanes(lanes, from, this.#width, this.#prime);
    return rows.flatMap(({ source }, lane) => {
      const columns = space.reserve(4 * (this.#width - from));
      const residues = space.reserve(4 * (this.#width - from));
      const length = kernel.takeLane(
        lanes,
        lane,
        from,
        this.#width,
        this.#prime,
        columns,
        residues,
      );
      if (length > 0) return [{ columns, residues, length, source }];
      space.release(columns);
      return [];
    });
  }

  #makePivot({ columns, residues, length }: ColumnRow): void {
    this.#space.makePivot(this.#space.addRow(columns, residues, length));
  }

  #first({ columns }: ColumnRow): number {
    return this.#space.integers(columns, 1)[0] as number;
  }

  #isDense({ length }: ColumnRow): boolean {
    return length > DENSITY_WORTH_LANES * this.#width;
  }

  #zeros(bytes: number): number {
    const start = this.#space.reserve(bytes);
    this.#space.fillWithZeros(start, bytes);
    return start;
  }
}
