/**
 * A coordinate subspace in one line: for variables that fill a matrix, its rows one after the other with
 * `*` where the variable vanishes; for other rings the vanishing variables themselves.
 */
import type { PolynomialRing, VariableIndex } from "../polynomials/polynomial-ring.js";

/** The subspace where the given variables vanish, as text without line breaks. */
export function subspaceGrid(ring: PolynomialRing, vanishing: readonly VariableIndex[]): string {
  const zero = new Set(vanishing);
  const inMatrices = ring.matrices.reduce((sum, m) => sum + m.rows * m.columns, 0);
  if (inMatrices < ring.variables.length) {
    const names = vanishing.map((v) => ring.variables[v]);
    return names.length === 0 ? "everything" : `${names.join(" = ")} = 0`;
  }
  return ring.matrices
    .map((m) => m.cells.map((row) => row.map((v) => (zero.has(v) ? "*" : "·")).join("")).join(" "))
    .join("   ");
}
