/**
 * Tiles, kinds and tilings: square arrays of tile letters, row 1 on top. A further kind is a row of
 * `CONVENTIONS`, a transfer of its own and a row of the table in `tiling-kinds.ts`.
 */
import type { Cell } from "../combinatorics/cell.js";

/** The sides of a tile. */
export type Side = "north" | "east" | "south" | "west";

/** For each tile letter the pairs of sides that its pipes join. */
export const TILES = {
  ".": [],
  "-": [["west", "east"]],
  "|": [["north", "south"]],
  "+": [
    ["west", "east"],
    ["north", "south"],
  ],
  J: [["north", "west"]],
  r: [["south", "east"]],
  "%": [
    ["north", "west"],
    ["south", "east"],
  ],
} as const satisfies Record<string, readonly (readonly [Side, Side])[]>;

/** A tile letter: `.` blank, `-`, `|`, `+` cross, `J` and `r` elbows, `%` bump. */
export type Tile = keyof typeof TILES;

/** Is a letter a tile? */
export function isTile(letter: string): letter is Tile {
  return Object.hasOwn(TILES, letter);
}

/** The kinds of tilings. */
export type TilingKind = "ordinary" | "bumpless";

/** Where the pipes of a kind come from and go to: pipe j enters in column j; none touches the other sides. */
export interface Conventions {
  readonly enters: "north" | "south";
  readonly leaves: "west" | "east";
  readonly tiles: readonly Tile[];
  /** Is everything below the antidiagonal blank, with a `J` in each of its cells and pipes above it? */
  readonly staircase: boolean;
}

/**
 * The conventions of each kind; in all of them the pipe that leaves row i is number w(i).
 * @source Knutson, Miller, *Gröbner geometry of Schubert polynomials*, Ann. of Math. 161 (2005); Lam, Lee,
 * Shimozono, *Back stable Schubert calculus*, Compositio Math. 157 (2021).
 */
export const CONVENTIONS: Readonly<Record<TilingKind, Conventions>> = {
  ordinary: { enters: "north", leaves: "west", tiles: ["+", "%", "J", "."], staircase: true },
  bumpless: {
    enters: "south",
    leaves: "east",
    tiles: [".", "-", "|", "+", "J", "r"],
    staircase: false,
  },
};

/** A tiling of the n×n square: n rows of n tile letters. */
export interface Tiling {
  readonly kind: TilingKind;
  readonly rows: readonly string[];
}

/** The cells that carry a given tile, row by row. */
export function cellsWith(tiling: Tiling, tile: Tile): readonly Cell[] {
  return tiling.rows.flatMap((row, i) =>
    Array.from(row).flatMap((letter, j) =>
      letter === tile ? [{ row: i + 1, column: j + 1 }] : [],
    ),
  );
}
