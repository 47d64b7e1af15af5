/**
 * Matrix reduction over a prime field: each row is scattered into a dense accumulator and swept from its
 * first column on, one pivot after the other. All of it happens in the kernel's memory; only what a
 * reduction leaves over comes out.
 */
import type { PrimeField } from "../arithmetic/prime-field.js";
import type { Workspace } from "../kernel/workspace.js";
import type { Remainder, RowArithmetic } from "./row-arithmetic.js";
import type { ModularRow } from "./rows.js";

/** A reduced row in the kernel's memory. */
interface Left {
  readonly first: number;
  readonly length: number;
  readonly columns: number;
  readonly residues: number;
  readonly source: number;
}

/** Row arithmetic over a prime field: monic rows. */
export function modularArithmetic(field: PrimeField): RowArithmetic<ModularRow> {
  return {
    eliminate(matrix, _elements, { mode, most }, budget) {
      const { workspace, width, firstRow, rowCount } = matrix;
      const sweeper = new Sweeper(workspace, width, field.prime);
      const stage = (): string => `reducing a matrix of ${width} columns modulo ${field.prime}`;
      let left: Left[] = [];
      for (let source = 0; source < rowCount && left.length < most; source++) {
        budget.spend(stage);
        const reduced = sweeper.reduceRow(firstRow + source, source, mode === "tails");
        if (reduced === undefined) continue;
        left.push(reduced);
        if (mode === "echelon") sweeper.makePivot(reduced);
      }
      if (mode === "echelon" && left.length > 1) {
        // Smallest leading monomial first: every row is then reduced by rows that are final.
        left.sort((a, b) => b.first - a.first);
        left = left.map((row) => {
          budget.spend(stage);
          return sweeper.reduceTail(row);
        });
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

/** Reduces rows of one matrix. */
class Sweeper {
  readonly #space: Workspace;
  readonly #width: number;
  readonly #prime: number;
  readonly #accumulator: number;

  constructor(space: Workspace, width: number, prime: number) {
    this.#space = space;
    this.#width = width;
    this.#prime = prime;
    this.#accumulator = space.reserve(8 * width);
    space.fillWithZeros(this.#accumulator, 8 * width);
  }

  reduceRow(row: number, source: number, keepLead: boolean): Left | undefined {
    const { columns, residues, length } = this.#space.placeOfRow(row);
    return this.#reduce({ columns, residues, length, source }, keepLead);
  }

  /** Reduces all but the first term once more, by the pivots that have come. */
  reduceTail(row: Left): Left {
    const reduced = this.#reduce(row, true) ?? row;
    this.makePivot(reduced);
    return reduced;
  }

  makePivot({ columns, residues, length }: Left): void {
    this.#space.makePivot(this.#space.addRow(columns, residues, length));
  }

  #reduce(row: Omit<Left, "first">, keepLead: boolean): Left | undefined {
    const space = this.#space;
    const { kernel } = space;
    const accumulator = this.#accumulator;
    const start = space.integers(row.columns, 1)[0] as number;
    kernel.addRow(accumulator, row.columns, row.residues, row.length, 1, this.#prime);
    const from = keepLead ? start + 1 : start;
    const count = kernel.sweep(accumulator, from, this.#width, this.#prime) + (keepLead ? 1 : 0);
    if (count === 0) return undefined;
    const columns = space.reserve(4 * count);
    const residues = space.reserve(4 * count);
    kernel.gather(accumulator, start, this.#width, this.#prime, columns, residues);
    const first = space.integers(columns, 1)[0] as number;
    return { first, length: count, columns, residues, source: row.source };
  }
}
