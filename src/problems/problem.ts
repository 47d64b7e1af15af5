/**
 * Problem files: any ideal, generating set and order from a YAML (or JSON) text of our own format.
 *
 * ```yaml
 * title: A hook in a 3×3 matrix
 * variables:
 *   matrices: [{name: z, rows: 3, columns: 3}]     # or names: [x, y, z]
 * ideal:
 *   ranks:                                         # or polynomials: [...], or family: schubert:2143
 *     matrix: z
 *     corner: nw
 *     bounds: [{rows: 2, columns: 2, rank: 1}]
 * generators: fulton
 * order: lex from nw by rows
 * permutation: 132                                 # whose tilings `match` compares with
 * ```
 */
import { readPermutation } from "../combinatorics/permutation.js";
import { cornerBoundsIdeal } from "../families/corner-table-ideal.js";
import type { GeneratingSet, Ideal } from "../families/ideal.js";
import { readFamilyIdeal } from "../families/registry.js";
import { type InputFault, quote, type Reading, read } from "../outcomes/input-fault.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import type { PolynomialRing } from "../polynomials/polynomial-ring.js";
import { readPolynomial } from "../polynomials/reading.js";
import type { TermOrder } from "../polynomials/term-order.js";
import { homogeneityFault } from "./grading.js";
import { readOrderShape } from "./order-reading.js";
import type { ProblemShape } from "./problem-schema.js";
import { readRing } from "./ring-reading.js";
import { readShape } from "./shape-reading.js";
import { YamlSource } from "./yaml-source.js";

/** A problem: an ideal, one of its generating sets, an order. */
export interface Problem {
  readonly title?: string;
  readonly note?: string;
  readonly ideal: Ideal;
  readonly generators: GeneratingSet;
  readonly order: TermOrder;
}

/** A fault on its way out of this file's functions. */
class Refusal extends Error {
  readonly fault: InputFault;
  constructor(fault: InputFault) {
    super(fault.message);
    this.fault = fault;
  }
}

/** Reads a problem. @param file the path, for messages and as the ideal's name. */
export function readProblem(text: string, file?: string): Reading<Problem> {
  const source = YamlSource.read(text, file);
  if (!source.ok) return source;
  try {
    return read(problemOf(source.value, accept(readShape(source.value))));
  } catch (error) {
    if (error instanceof Refusal) return { ok: false, fault: error.fault };
    throw error;
  }
}

/** The generating set of a kind, or a message that lists what there is. */
export function generatingSet(ideal: Ideal, kind: string | undefined): Reading<GeneratingSet> {
  const sets = ideal.generatingSets;
  const found = kind === undefined ? sets[0] : sets.find((set) => set.kind === kind);
  if (found !== undefined) return read(found);
  const message = `${ideal.name} has no generating set ${quote(kind ?? "")}`;
  const expected = `one of ${sets.map((set) => set.kind).join(", ")}`;
  return { ok: false, fault: { code: "input-fault", message, expected } };
}

function problemOf(source: YamlSource, shape: ProblemShape): Problem {
  const ideal = idealOf(source, shape);
  const set = generatingSet(ideal, shape.generators);
  if (!set.ok) {
    throw new Refusal(source.fault(["generators"], set.fault.message, set.fault.expected));
  }
  return {
    ...(shape.title === undefined ? {} : { title: shape.title }),
    ...(shape.note === undefined ? {} : { note: shape.note }),
    ideal,
    generators: set.value,
    order: orderOf(source, shape, ideal),
  };
}

function idealOf(source: YamlSource, shape: ProblemShape): Ideal {
  const { polynomials, family, ranks } = shape.ideal;
  const given = [polynomials, family, ranks].filter((part) => part !== undefined);
  if (given.length !== 1) {
    const message = given.length === 0 ? "the ideal is not given" : "the ideal is given twice";
    throw new Refusal(source.fault(["ideal"], message, "just one of polynomials, family, ranks"));
  }
  const ideal =
    family === undefined ? declaredIdeal(source, shape) : familyIdeal(source, shape, family);
  if (shape.permutation === undefined) return ideal;
  const permutation = accept(source.moved(["permutation"], readPermutation(shape.permutation)));
  const [matrix] = ideal.ring.matrices;
  if (matrix?.rows !== permutation.length || matrix.columns !== permutation.length) {
    const expected = "a permutation of the size of the first matrix";
    throw new Refusal(
      source.fault(["permutation"], "the permutation does not fit the variables", expected),
    );
  }
  return { ...ideal, permutation };
}

function familyIdeal(source: YamlSource, shape: ProblemShape, family: string): Ideal {
  if (shape.variables !== undefined) {
    throw new Refusal(
      source.fault(
        ["variables"],
        "a family brings its own variables",
        "no variables beside a family",
        "variables",
      ),
    );
  }
  return accept(source.moved(["ideal", "family"], readFamilyIdeal(family)));
}

function declaredIdeal(source: YamlSource, shape: ProblemShape): Ideal {
  const ring = accept(readRing(source, shape.variables));
  const name = ownName(source.file ?? shape.title);
  if (shape.ideal.ranks !== undefined) return ranksIdeal(source, ring, name, shape.ideal.ranks);
  const polynomials = (shape.ideal.polynomials ?? []).map((text, k) =>
    generator(source, ring, text, k),
  );
  return {
    name,
    ring,
    generatingSets: [
      {
        kind: "given",
        description: "the polynomials of the problem",
        polynomials: () => polynomials,
      },
    ],
    defaultOrder: "graded revlex",
  };
}

/* A file or title that reads like a member of a family must not pass for it. */
function ownName(name = "the problem"): string {
  return readFamilyIdeal(name).ok ? `problem ${name}` : name;
}

function generator(source: YamlSource, ring: PolynomialRing, text: string, k: number): Polynomial {
  const path = ["ideal", "polynomials", k];
  const { file } = source;
  const locate = source.locatorOf(path);
  const f = readPolynomial(text, ring, { locate, ...(file === undefined ? {} : { file }) });
  if (!f.ok) throw new Refusal(f.fault);
  const fault = homogeneityFault(f.value);
  if (fault !== undefined) {
    throw new Refusal(
      source.fault(path, fault, "a generator that is homogeneous in the degrees given"),
    );
  }
  return f.value;
}

function ranksIdeal(
  source: YamlSource,
  ring: PolynomialRing,
  name: string,
  ranks: NonNullable<ProblemShape["ideal"]["ranks"]>,
): Ideal {
  const matrix = ring.matrices.find((m) => m.name === ranks.matrix);
  if (matrix === undefined) {
    const names = ring.matrices.map((m) => m.name).join(", ");
    const expected = names === "" ? "matrices among the variables" : `one of ${names}`;
    throw new Refusal(
      source.fault(["ideal", "ranks", "matrix"], `unknown matrix ${quote(ranks.matrix)}`, expected),
    );
  }
  ranks.bounds.forEach((bound, k) => {
    if (bound.rows > matrix.rows || bound.columns > matrix.columns) {
      const message = `a corner of ${bound.rows}×${bound.columns} in a ${matrix.rows}×${matrix.columns} matrix`;
      throw new Refusal(
        source.fault(["ideal", "ranks", "bounds", k], message, "a corner inside the matrix"),
      );
    }
  });
  const { rows, columns } = matrix;
  const table = { rows, columns, corner: ranks.corner, bounds: ranks.bounds };
  return cornerBoundsIdeal(name, ring, matrix, table);
}

function orderOf(source: YamlSource, shape: ProblemShape, ideal: Ideal): TermOrder {
  const { order = ideal.defaultOrder } = shape;
  return accept(readOrderShape(source, order, ideal.ring));
}

/* The value, or on with the fault. */
function accept<T>(reading: Reading<T>): T {
  if (reading.ok) return reading.value;
  throw new Refusal(reading.fault);
}
