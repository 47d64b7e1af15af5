/**
 * Following the pipes of a tiling: which permutation it is of, where pipes cross. Works from the tiles
 * alone, so that it checks enumerations instead of repeating them.
 */
import { type Permutation, permutation } from "../combinatorics/permutation.js";
import { isTile, type Side, TILES, type Tiling } from "./tiling.js";

/** A crossing of two pipes, by their numbers. */
export interface Crossing {
  readonly row: number;
  readonly column: number;
  readonly pipes: readonly [horizontal: number, vertical: number];
}

/** What following the pipes finds. */
export interface PipeDiagram {
  /** The pipe leaving row i, for i = 1, …, n. */
  readonly permutation: Permutation;
  readonly crossings: readonly Crossing[];
  /** Does no pair of pipes cross twice? */
  readonly reduced: boolean;
}

const OPPOSITE: Record<Side, Side> = { north: "south", south: "north", east: "west", west: "east" };
const STEP: Record<Side, readonly [number, number]> = {
  north: [-1, 0],
  south: [1, 0],
  east: [0, 1],
  west: [0, -1],
};

/**
 * Follows every pipe from where it enters (at the top of column j for ordinary pipe dreams, at the bottom
 * for bumpless ones) to the row where it leaves (on the left, on the right).
 * @returns undefined when the rows are no tiling of that kind: a letter that is no tile or not allowed, a pipe
 * that ends, leaves elsewhere or joins nothing, edges on the border where there must be none.
 */
export function followPipes(tiling: Tiling): PipeDiagram | undefined {
  const n = tiling.rows.length;
  const ordinary = tiling.kind === "ordinary";
  const forbidden = ordinary ? /[^.J%+]/ : /[^.|+Jr-]/;
  if (tiling.rows.some((row) => row.length !== n || forbidden.test(row))) return undefined;
  const through = new Map<string, { readonly pipe: number; readonly horizontal: boolean }[]>();
  const leaving = new Array<number>(n).fill(0);
  let edges = 0;
  for (let pipe = 1; pipe <= n; pipe++) {
    let [row, column] = [ordinary ? 0 : n - 1, pipe - 1];
    let entered: Side = ordinary ? "north" : "south";
    while (row >= 0 && row < n && column >= 0 && column < n) {
      const exit = exitOf(tiling, row, column, entered);
      if (exit === undefined) return undefined;
      edges++;
      const key = `${row + 1},${column + 1}`;
      through.set(key, [
        ...(through.get(key) ?? []),
        { pipe, horizontal: exit === "east" || exit === "west" },
      ]);
      const [down, right] = STEP[exit];
      [row, column, entered] = [row + down, column + right, OPPOSITE[exit]];
    }
    if (column !== (ordinary ? -1 : n) || leaving[row] !== 0) return undefined;
    leaving[row] = pipe;
  }
  const joined = tiling.rows.join("").split("");
  if (edges !== joined.reduce((sum, t) => sum + (isTile(t) ? TILES[t].length : 0), 0))
    return undefined;
  if (ordinary && !isStaircase(tiling.rows)) return undefined;
  const crossings: Crossing[] = [];
  for (const [key, pipes] of through) {
    const [row = 0, column = 0] = key.split(",").map(Number);
    if (tiling.rows[row - 1]?.[column - 1] !== "+") continue;
    const horizontal = pipes.find((p) => p.horizontal)?.pipe ?? 0;
    const vertical = pipes.find((p) => !p.horizontal)?.pipe ?? 0;
    crossings.push({ row, column, pipes: [horizontal, vertical] });
  }
  const pairs = crossings.map(({ pipes: [a, b] }) => `${Math.min(a, b)} ${Math.max(a, b)}`);
  return {
    permutation: permutation(leaving),
    crossings,
    reduced: new Set(pairs).size === pairs.length,
  };
}

function exitOf(tiling: Tiling, row: number, column: number, entered: Side): Side | undefined {
  const letter = tiling.rows[row]?.[column] ?? "";
  if (!isTile(letter)) return undefined;
  for (const [a, b] of TILES[letter]) {
    if (a === entered) return b;
    if (b === entered) return a;
  }
  return undefined;
}

/* `+` or `%` above the antidiagonal, `J` on it, `.` below. */
function isStaircase(rows: readonly string[]): boolean {
  const n = rows.length;
  return rows.every((row, i) =>
    Array.from(row).every((letter, j) => {
      const level = i + j + 2 - (n + 1);
      if (level < 0) return letter === "+" || letter === "%";
      return letter === (level === 0 ? "J" : ".");
    }),
  );
}
