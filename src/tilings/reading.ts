/** The reader of tilings: rows of tile letters, one a line, as files and JSON have them. */
import { MAX_SIZE } from "../combinatorics/permutation.js";
import type { Reading } from "../outcomes/input-fault.js";
import { readingOf, TextFault } from "../polynomials/text-fault.js";
import type { Tiling, TilingKind } from "./tiling.js";
import { checkTiling } from "./tiling-check.js";

/**
 * Reads a tiling of a kind. Never throws: rows that are no such tiling come back as a fault that points
 * at the first tile that cannot stand. Spaces around rows and empty lines at the end do not matter.
 * @example readTiling("+%J\n+J.\nJ..", "ordinary") // of w = 231
 */
export function readTiling(text: string, kind: TilingKind): Reading<Tiling> {
  return readingOf(text, {}, () => {
    const lines = text.trimEnd().split("\n");
    if (lines.length > MAX_SIZE) {
      throw new TextFault(0, `a tiling of ${lines.length} rows`, `at most ${MAX_SIZE}`);
    }
    const tiling = { kind, rows: lines.map((line) => line.trim()) };
    const fault = checkTiling(tiling);
    if (fault === undefined) return tiling;
    const line = lines[fault.row - 1] as string;
    const before = lines.slice(0, fault.row - 1).reduce((sum, { length }) => sum + length + 1, 0);
    const margin = line.length - line.trimStart().length;
    throw new TextFault(before + margin + fault.column - 1, fault.message, fault.expected);
  });
}
