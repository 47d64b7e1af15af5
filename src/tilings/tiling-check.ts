/**
 * What makes rows of letters a tiling of a kind, from the definition alone: allowed tiles, pipes that meet
 * across every edge, ends on the two sides where the kind has them and nowhere else. Knows nothing of how
 * tilings are enumerated, so that it checks that instead of repeating it.
 */
import { CONVENTIONS, isTile, type Side, TILES, type Tiling } from "./tiling.js";

/** Where rows of letters stop being a tiling. */
export interface TilingFault {
  /** From 1. */
  readonly row: number;
  readonly column: number;
  readonly message: string;
  readonly expected: string;
}

/** The first fault: of a row as such, then of the shape, then of an edge; undefined for a tiling. */
export function checkTiling(tiling: Tiling): TilingFault | undefined {
  const { rows } = tiling;
  if (rows.length === 0) {
    return { row: 1, column: 1, message: "no rows", expected: "at least one row of tiles" };
  }
  for (const [i, row] of rows.entries()) {
    const fault = rowFault(tiling, row);
    if (fault !== undefined) return { row: i + 1, ...fault };
  }
  return firstFault(tiling, staircaseFault) ?? firstFault(tiling, edgeFault);
}

type CellFault = Pick<TilingFault, "message" | "expected">;

function firstFault(
  tiling: Tiling,
  faultAt: (tiling: Tiling, i: number, j: number) => CellFault | undefined,
): TilingFault | undefined {
  for (let i = 0; i < tiling.rows.length; i++) {
    for (let j = 0; j < tiling.rows.length; j++) {
      const fault = faultAt(tiling, i, j);
      if (fault !== undefined) return { row: i + 1, column: j + 1, ...fault };
    }
  }
  return undefined;
}

function rowFault(
  { kind, rows }: Tiling,
  row: string,
): Pick<TilingFault, "column" | "message" | "expected"> | undefined {
  const n = rows.length;
  const allowed: readonly string[] = CONVENTIONS[kind].tiles;
  const stray = Array.from(row).findIndex((letter) => !allowed.includes(letter));
  if (stray !== -1) {
    const letter = JSON.stringify(Array.from(row)[stray]);
    const message = `${letter} is no tile of ${kind} pipe dreams`;
    return {
      column: Array.from(row).slice(0, stray).join("").length + 1,
      message,
      expected: `one of ${allowed.join(" ")}`,
    };
  }
  if (row.length === n) return undefined;
  const message = `a row of ${row.length} tiles among ${n} rows`;
  return { column: Math.min(row.length, n) + 1, message, expected: "as many tiles as rows" };
}

/* `+` or `%` above the antidiagonal, `J` on it, blank below. */
function staircaseFault({ kind, rows }: Tiling, i: number, j: number): CellFault | undefined {
  if (!CONVENTIONS[kind].staircase) return undefined;
  const below = i + j + 1 - rows.length;
  const expected = below < 0 ? "+%" : below === 0 ? "J" : ".";
  const letter = rows[i]?.[j] ?? "";
  if (expected.includes(letter)) return undefined;
  const where = below < 0 ? "above" : below === 0 ? "on" : "below";
  return {
    message: `"${letter}" ${where} the antidiagonal`,
    expected: Array.from(expected).join(" or "),
  };
}

/* Each inner edge is looked at from the cell above or left of it, each border edge from its only cell. */
function edgeFault(tiling: Tiling, i: number, j: number): CellFault | undefined {
  const { enters, leaves } = CONVENTIONS[tiling.kind];
  const n = tiling.rows.length;
  const here = (side: Side): boolean => hasPipe(tiling, i, j, side);
  const borders: readonly (readonly [boolean, Side])[] = [
    [i === 0, "north"],
    [j === 0, "west"],
    [j === n - 1, "east"],
    [i === n - 1, "south"],
  ];
  for (const [isBorder, side] of borders) {
    if (!isBorder || here(side) === (side === enters || side === leaves)) continue;
    return here(side)
      ? { message: `a pipe ends on the ${side} border`, expected: "no pipe there" }
      : { message: `no pipe on the ${side} border`, expected: "a pipe there" };
  }
  if (j < n - 1 && here("east") !== hasPipe(tiling, i, j + 1, "west")) {
    return broken("row", "right");
  }
  if (i < n - 1 && here("south") !== hasPipe(tiling, i + 1, j, "north")) {
    return broken("column", "below");
  }
  return undefined;
}

function broken(line: string, where: string): CellFault {
  return {
    message: `a pipe breaks off between this tile and the one ${where} in its ${line}`,
    expected: "tiles that both have a pipe at their common edge, or both none",
  };
}

function hasPipe({ rows }: Tiling, i: number, j: number, side: Side): boolean {
  const letter = rows[i]?.[j] ?? "";
  return (
    isTile(letter) && TILES[letter].some((joined) => (joined as readonly Side[]).includes(side))
  );
}
