/** The ring that a problem file declares: names or matrices, a pair, degrees. */
import { quote, type Reading, read } from "../outcomes/input-fault.js";
import {
  type PolynomialRing,
  ringOfMatrices,
  ringOfVariables,
  VARIABLE_NAME,
} from "../polynomials/polynomial-ring.js";
import { MAX_VARIABLES, type ProblemShape } from "./problem-schema.js";
import type { KeyPath, YamlSource } from "./yaml-source.js";

type Declaration = NonNullable<ProblemShape["variables"]>;
type Refuse = (path: KeyPath, message: string, expected: string) => Reading<never>;

/** Builds the ring, or says where the declaration is wrong. */
export function readRing(
  source: YamlSource,
  variables: ProblemShape["variables"],
): Reading<PolynomialRing> {
  const refuse: Refuse = (path, message, expected) => ({
    ok: false,
    fault: source.fault(path, message, expected),
  });
  if (variables === undefined) {
    return refuse([], "the variables are not given", "variables: with names or matrices");
  }
  const { names, matrices, pair, degrees } = variables;
  if (names !== undefined && matrices !== undefined) {
    return refuse(["variables"], "names and matrices", "either names or matrices");
  }
  if (names === undefined && matrices === undefined) {
    return refuse(["variables"], "neither names nor matrices", "either names or matrices");
  }
  if (pair !== undefined && matrices === undefined) {
    return refuse(["variables", "pair"], "a pair without matrices", "two matrices such as [x, y]");
  }
  const count = names?.length ?? (matrices ?? []).reduce((sum, m) => sum + m.rows * m.columns, 0);
  if (count > MAX_VARIABLES) {
    return refuse(["variables"], `${count} variables`, `at most ${MAX_VARIABLES}`);
  }
  const bad = badName(variables, refuse);
  if (bad !== undefined) return bad;
  const ring = arranged(variables, refuse);
  return !ring.ok || degrees === undefined ? ring : withDegrees(ring.value, degrees, refuse);
}

function badName({ names, matrices }: Declaration, refuse: Refuse): Reading<never> | undefined {
  const where = names === undefined ? "matrices" : "names";
  const listed = names ?? (matrices ?? []).map((m) => m.name);
  const seen = new Set<string>();
  for (const [k, name] of listed.entries()) {
    const path = ["variables", where, k, ...(names === undefined ? ["name"] : [])];
    if (!VARIABLE_NAME.test(name)) {
      return refuse(path, `${quote(name)} is no name`, "a letter, then letters, digits or _");
    }
    if (seen.has(name)) return refuse(path, `${quote(name)} stands twice`, "distinct names");
    seen.add(name);
  }
  return undefined;
}

function arranged({ names, matrices, pair }: Declaration, refuse: Refuse): Reading<PolynomialRing> {
  if (names !== undefined) return read(ringOfVariables(names));
  const pairing = pair === undefined ? undefined : { x: pair[0], y: pair[1] };
  try {
    return read(ringOfMatrices(matrices ?? [], pairing));
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    const path = pair === undefined ? ["variables"] : ["variables", "pair"];
    return refuse(
      path,
      "the variables do not fit together",
      error.message.replace(/^expected /, ""),
    );
  }
}

function withDegrees(
  ring: PolynomialRing,
  degrees: Readonly<Record<string, readonly number[]>>,
  refuse: Refuse,
): Reading<PolynomialRing> {
  const path = ["variables", "degrees"];
  const known = new Set(ring.variables);
  const unknown = Object.keys(degrees).find((name) => !known.has(name));
  if (unknown !== undefined) {
    return refuse(
      [...path, unknown],
      `unknown variable ${quote(unknown)}`,
      "a variable of the ring",
    );
  }
  const missing = ring.variables.find((name) => !Object.hasOwn(degrees, name));
  if (missing !== undefined) {
    return refuse(path, `no degree for ${missing}`, "a degree for every variable");
  }
  const lengths = new Set(Object.values(degrees).map((vector) => vector.length));
  if (lengths.size > 1) {
    return refuse(path, "degrees of different lengths", "vectors of one length");
  }
  return read({ ...ring, grading: ring.variables.map((name) => degrees[name] ?? []) });
}
