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
import { nearestName } from "../polynomials/nearest-name.js";
import { readOrder } from "../polynomials/order-phrase.js";
import { isZero, type Polynomial } from "../polynomials/polynomial.js";
import type { PolynomialRing } from "../polynomials/polynomial-ring.js";
import { readPolynomial } from "../polynomials/reading.js";
import type { TermOrder } from "../polynomials/term-order.js";
import { homogeneityFault } from "./grading.js";
import { KNOWN_KEYS, type ProblemShape, problemSchema } from "./problem-schema.js";
import { readRing } from "./ring-reading.js";
import { type KeyPath, YamlSource } from "./yaml-source.js";

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
    return read(problemOf(source.value, shapeOf(source.value)));
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

function shapeOf(source: YamlSource): ProblemShape {
  const parsed = problemSchema.safeParse(source.content());
  if (parsed.success) return parsed.data;
  const [issue] = parsed.error.issues;
  const path: KeyPath = issue?.path ?? [];
  if (issue?.code === "unrecognized_keys") {
    const [key = ""] = issue.keys;
    const near = nearestName(key, KNOWN_KEYS);
    const expected =
      near === undefined ? `one of ${KNOWN_KEYS.slice(0, 7).join(", ")}` : `${near}, perhaps`;
    throw new Refusal(source.fault(path, `unknown key ${quote(key)}`, expected, key));
  }
  const where = path.length === 0 ? "the problem" : path.map(String).join(".");
  const message = issue?.message ?? "expected another shape";
  throw new Refusal(
    message.startsWith("expected ")
      ? source.fault(path, `${where} is not right`, message.slice("expected ".length))
      : source.fault(path, `${where}: ${message}`),
  );
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
  const permutation = accept(source, ["permutation"], readPermutation(shape.permutation));
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
  return accept(source, ["ideal", "family"], readFamilyIdeal(family));
}

function declaredIdeal(source: YamlSource, shape: ProblemShape): Ideal {
  const ring = accept(source, [], readRing(source, shape.variables));
  const name = source.file ?? shape.title ?? "the problem";
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
        polynomials: () => polynomials.filter((f) => !isZero(f)),
      },
    ],
    defaultOrder: "graded revlex",
  };
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
  if (typeof order === "string") return accept(source, ["order"], readOrder(order, ideal.ring));
  const { weights, next, refinement } = order;
  const last = next ?? refinement;
  if (last === undefined || (next !== undefined && refinement !== undefined)) {
    throw new Refusal(
      source.fault(
        ["order"],
        "weights alone do not order all monomials",
        "either next or refinement",
      ),
    );
  }
  const vectors = weights.map((vector, k) => {
    if (Array.isArray(vector)) return vector;
    const unknown = Object.keys(vector).find((name) => !ideal.ring.variables.includes(name));
    if (unknown !== undefined) {
      const path = ["order", "weights", k];
      throw new Refusal(
        source.fault(path, `unknown variable ${quote(unknown)}`, "a variable of the ring", unknown),
      );
    }
    return ideal.ring.variables.map((name) => vector[name] ?? 0);
  });
  const words = vectors.map((vector) => `weights (${vector.join(",")})`).join(" then ");
  const phrase = `${words} ${next === undefined ? "refined by" : "then"} ${last}`;
  const read = readOrder(phrase, ideal.ring);
  if (!read.ok) throw new Refusal(source.fault(["order"], read.fault.message, read.fault.expected));
  return read.value;
}

/* A fault inside a value is moved to where the value stands in the file. */
function accept<T>(source: YamlSource, path: KeyPath, reading: Reading<T>): T {
  if (reading.ok) return reading.value;
  const { fault } = reading;
  if (path.length === 0) throw new Refusal(fault);
  const offset = (fault.place?.line ?? 1) === 1 ? (fault.place?.column ?? 1) - 1 : 0;
  const located = source.fault(path, fault.message, fault.expected);
  throw new Refusal({ ...located, ...source.locatorOf(path)(offset) });
}
