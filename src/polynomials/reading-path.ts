/**
 * Readings: the cells of the ring's matrices in the order in which an order looks at them. A reading
 * starts at a corner and moves away from it along the rows (or columns), one after the other; matrix
 * after matrix, then the variables outside matrices as listed.
 */
import type { Corner } from "./corner.js";
import type { PolynomialRing, VariableIndex, VariableMatrix } from "./polynomial-ring.js";

/** Along what a reading moves first. */
export type Lines = "rows" | "columns";

/** Where a reading starts and along what it moves. */
export interface ReadingPath {
  readonly corner: Corner;
  readonly lines: Lines;
}

/** The words for a path in the phrase of an order: `from nw by rows`. */
export function pathPhrase(path: ReadingPath): string {
  return `from ${path.corner} by ${path.lines}`;
}

/** The cells of a matrix in the order of a reading, line by line. */
export function readLines(
  matrix: VariableMatrix,
  path: ReadingPath,
): readonly (readonly VariableIndex[])[] {
  const up = path.corner.startsWith("s");
  const leftwards = path.corner.endsWith("e");
  const turned = <T>(list: readonly T[], back: boolean): T[] =>
    back ? [...list].reverse() : [...list];
  const rows = turned(matrix.cells, up).map((row) => turned(row, leftwards));
  if (path.lines === "rows") return rows;
  return (rows[0] ?? []).map((_, j) => rows.map((row) => row[j] as VariableIndex));
}

/** The lines of all matrices of a ring, matrix after matrix. */
export function readAllLines(
  ring: PolynomialRing,
  path: ReadingPath,
): readonly (readonly VariableIndex[])[] {
  return ring.matrices.flatMap((matrix) => readLines(matrix, path));
}

/** The variables outside matrices, as listed. */
export function looseVariables(ring: PolynomialRing): readonly VariableIndex[] {
  const inside = new Set(ring.matrices.flatMap((matrix) => matrix.cells.flat()));
  return ring.variables.map((_, v) => v as VariableIndex).filter((v) => !inside.has(v));
}

/** All variables of a ring in the order of a reading. */
export function readVariables(ring: PolynomialRing, path: ReadingPath): readonly VariableIndex[] {
  return [...readAllLines(ring, path).flat(), ...looseVariables(ring)];
}
