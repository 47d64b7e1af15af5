/**
 * Polynomial rings over the rationals: named variables, and how they are arranged. Variables may
 * fill matrices (the cells that corner orders read) and two matrices may be paired, x_ij with y_ji.
 */

declare const variableIndexBrand: unique symbol;
/** The position of a variable in its ring, from 0. */
export type VariableIndex = number & { readonly [variableIndexBrand]: true };

/** A matrix of variables; `cells[i][j]` is the variable in row i+1, column j+1. */
export interface VariableMatrix {
  readonly name: string;
  readonly rows: number;
  readonly columns: number;
  readonly cells: readonly (readonly VariableIndex[])[];
}

/** Two matrices of transposed shapes, whose variables x_ij and y_ji belong together. */
export interface MatrixPair {
  readonly x: VariableMatrix;
  readonly y: VariableMatrix;
}

/** A polynomial ring over the rationals. */
export interface PolynomialRing {
  /** Names, distinct, in the order in which variables are listed. */
  readonly variables: readonly string[];
  readonly matrices: readonly VariableMatrix[];
  readonly pair?: MatrixPair;
  /** A grading: for each variable its degree vector, all of one length; absent: the standard one. */
  readonly grading?: readonly (readonly number[])[];
}

/** The shape of a matrix of variables still to be named. */
export interface MatrixShape {
  readonly name: string;
  readonly rows: number;
  readonly columns: number;
}

/** What a variable may be called. */
export const VARIABLE_NAME = /^[A-Za-z][A-Za-z0-9_]*$/;

/**
 * The name of the variable in row i, column j: `z12` when every index of the matrix is at most 9,
 * `z1_12` otherwise.
 */
export function cellName(shape: MatrixShape, row: number, column: number): string {
  const separator = shape.rows <= 9 && shape.columns <= 9 ? "" : "_";
  return `${shape.name}${row}${separator}${column}`;
}

/** The ring in the listed variables, in no arrangement. @throws RangeError on a bad or repeated name. */
export function ringOfVariables(
  variables: readonly string[],
  grading?: readonly (readonly number[])[],
): PolynomialRing {
  checkNames(variables);
  return { variables: [...variables], matrices: [], ...(grading ? { grading } : {}) };
}

/**
 * The ring whose variables fill the given matrices, matrix after matrix, row after row.
 * @param pairing names of the matrices X and Y to pair, x_ij with y_ji.
 * @throws RangeError on a bad name, an empty shape, or a pairing of shapes that are not transposed.
 */
export function ringOfMatrices(
  shapes: readonly MatrixShape[],
  pairing?: { readonly x: string; readonly y: string },
): PolynomialRing {
  const variables: string[] = [];
  const matrices = shapes.map((shape): VariableMatrix => {
    if (shape.rows < 1 || shape.columns < 1) {
      throw new RangeError(`expected a matrix with rows and columns, got ${shape.name}`);
    }
    const cells = Array.from({ length: shape.rows }, (_, i) =>
      Array.from({ length: shape.columns }, (_, j) => {
        variables.push(cellName(shape, i + 1, j + 1));
        return (variables.length - 1) as VariableIndex;
      }),
    );
    return { ...shape, cells };
  });
  checkNames(variables);
  if (pairing === undefined) return { variables, matrices };
  const named = (name: string): VariableMatrix => {
    const found = matrices.find((m) => m.name === name);
    if (found === undefined) throw new RangeError(`expected a matrix named ${name}`);
    return found;
  };
  const x = named(pairing.x);
  const y = named(pairing.y);
  if (x === y || x.rows !== y.columns || x.columns !== y.rows) {
    throw new RangeError(`expected ${x.name} and ${y.name} of transposed shapes`);
  }
  return { variables, matrices, pair: { x, y } };
}

/** The variable of a name, or undefined. */
export function variableNamed(ring: PolynomialRing, name: string): VariableIndex | undefined {
  const index = ring.variables.indexOf(name);
  return index === -1 ? undefined : (index as VariableIndex);
}

function checkNames(variables: readonly string[]): void {
  const seen = new Set<string>();
  for (const name of variables) {
    if (!VARIABLE_NAME.test(name)) throw new RangeError(`expected a variable name, got ${name}`);
    if (seen.has(name)) throw new RangeError(`expected distinct variables, got ${name} twice`);
    seen.add(name);
  }
}
