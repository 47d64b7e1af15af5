/** Tiles and tilings: square arrays of tile letters, row 1 on top. */
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
