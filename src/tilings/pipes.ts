/**
 * Following the pipes of a tiling: their paths, the permutation it is of, where pipes cross. Works from the
 * tiles and the conventions of the kind alone.
 */
import type { Cell } from "../combinatorics/cell.js";
import { type Permutation, permutation } from "../combinatorics/permutation.js";
import { CONVENTIONS, isTile, type Side, TILES, type Tiling } from "./tiling.js";
import { checkTiling } from "./tiling-check.js";

/** A crossing of two pipes, by their numbers. */
export interface Crossing extends Cell {
  readonly horizontal: number;
  readonly vertical: number;
}

/** What following the pipes finds. */
export interface PipeDiagram {
  /** The pipe leaving row i, for i = 1, …, n. */
  readonly permutation: Permutation;
  /** The cells of pipe j, for j = 1, …, n, from where it enters to where it leaves. */
  readonly paths: readonly (readonly Cell[])[];
  /** Row by row. */
  readonly crossings: readonly Crossing[];
  /** Does no pair of pipes cross twice? */
  readonly reduced: boolean;
}

const OPPOSITE: Readonly<Record<Side, Side>> = {
  north: "south",
  south: "north",
  east: "west",
  west: "east",
};
const STEP: Readonly<Record<Side, readonly [down: number, right: number]>> = {
  north: [-1, 0],
  south: [1, 0],
  east: [0, 1],
  west: [0, -1],
};

/**
 * Follows every pipe from where it enters (at the top of column j for ordinary pipe dreams, at the bottom
 * for bumpless ones) to the row where it leaves (on the left, on the right). Pipes run straight through
 * crosses, however often they have met before.
 * @throws RangeError when the rows are no tiling of that kind.
 */
export function followPipes(tiling: Tiling): PipeDiagram {
  const fault = checkTiling(tiling);
  if (fault !== undefined) {
    const { row, column, message } = fault;
    throw new RangeError(`expected a tiling, got ${message} at row ${row}, column ${column}`);
  }
  const n = tiling.rows.length;
  const leaving = new Array<number>(n).fill(0);
  const horizontal = new Map<number, number>();
  const vertical = new Map<number, number>();
  const paths: Cell[][] = [];
  for (let pipe = 1; pipe <= n; pipe++) {
    const path: Cell[] = [];
    let entered: Side = CONVENTIONS[tiling.kind].enters;
    let [row, column] = [entered === "north" ? 1 : n, pipe];
    while (row >= 1 && row <= n && column >= 1 && column <= n) {
      path.push({ row, column });
      const exit: Side = otherEnd(tiling, row, column, entered);
      if (exit === OPPOSITE[entered]) {
        const through = exit === "east" || exit === "west" ? horizontal : vertical;
        through.set(row * (n + 1) + column, pipe);
      }
      const [down, right]: readonly [number, number] = STEP[exit];
      [row, column, entered] = [row + down, column + right, OPPOSITE[exit]];
    }
    leaving[row - 1] = pipe;
    paths.push(path);
  }
  const crossings = [...horizontal]
    .flatMap(([cell, pipe]) => {
      const other = vertical.get(cell);
      const place = { row: Math.floor(cell / (n + 1)), column: cell % (n + 1) };
      return other === undefined ? [] : [{ ...place, horizontal: pipe, vertical: other }];
    })
    .sort((a, b) => a.row - b.row || a.column - b.column);
  const pairs = crossings.map((c) => [c.horizontal, c.vertical].sort((a, b) => a - b).join(" "));
  return {
    permutation: permutation(leaving),
    paths,
    crossings,
    reduced: new Set(pairs).size === pairs.length,
  };
}

function otherEnd({ rows }: Tiling, row: number, column: number, entered: Side): Side {
  const letter = rows[row - 1]?.[column - 1] ?? "";
  const joined = isTile(letter) ? TILES[letter] : [];
  const through = joined.find(([a, b]) => a === entered || b === entered);
  if (through === undefined) throw new RangeError(`expected a pipe from ${entered} in "${letter}"`);
  return through[0] === entered ? through[1] : through[0];
}
