/** Tilings drawn with box characters for a terminal: two characters a cell, one line a row. */
import type { Tile, Tiling } from "./tiling.js";

const SIGNS: Record<Tile, string> = {
  ".": "· ",
  "-": "──",
  "|": "│ ",
  "+": "┼─",
  J: "╯ ",
  r: "╭─",
  "%": "╯╭",
};

/** The lines of one drawing, all of the same width. */
export function drawTiling(tiling: Tiling): string[] {
  return tiling.rows.map((row) => Array.from(row, (t) => SIGNS[t as Tile]).join(""));
}

/** Several drawings side by side, as many as fit into `width` characters, rows of drawings below each other. */
export function drawSideBySide(tilings: readonly Tiling[], width: number): string[] {
  const cellWidth = 2 * (tilings[0]?.rows.length ?? 0) + 3;
  const perRow = Math.max(1, Math.floor(width / cellWidth));
  const lines: string[] = [];
  for (let start = 0; start < tilings.length; start += perRow) {
    const group = tilings.slice(start, start + perRow).map(drawTiling);
    if (start > 0) lines.push("");
    for (let i = 0; i < (group[0]?.length ?? 0); i++) {
      lines.push(
        group
          .map((drawing) => drawing[i])
          .join("   ")
          .trimEnd(),
      );
    }
  }
  return lines;
}
