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

/** Builds the ring, or says where the declaration is wrong. */
export function readRing(
  source: YamlSource,
  variables: ProblemShape["variables"],
): Reading<PolynomialRing> {
  const refuse = (path: KeyPath, message: string, expected: string): Reading<never> => ({
    ok: false,
    fault: source.fault(path, message, expected),
  });
  if (variables === undefined) {
    return refuse([], "the variables are not given", "variables: with names or matrices");
  }
  const { names, matrices, pair, degrees } = variables;
  if ((names === undefined) === (matrices === undefined)) {
    return refuse(["variables"], "names and matrices", "either names or matrices");
  }
  if (pair !== undefined && matrices === undefined) {
    return refuse(["variables", "pair"], "a pair without matrices", "two matrices such as [x, y]");
  }
  const listed = names ?? (matrices ?? []).map((m) => m.name);
  const where = names === undefined ? "matrices" : "names";
  for (const [k, name] of listed.entries()) {
    const path = ["variables", where, k];
    if (!VARIABLE_NAME.test(name)) {
      return refuse(path, `${quote(name)} is no name`, "a letter, then letters, digits or _");
    }
    if (listed.indexOf(name) < k) return refuse(path, `${name} stands twice`, "distinct names");
  }
  const count = names?.length ?? (matrices ?? []).reduce((sum, m) => sum + m.rows * m.columns, 0);
  if (count > MAX_VARIABLES) {
    return refuse(["variables"], `${count} variables`, `at most ${MAX_VARIABLES}`);
  }
  let ring: PolynomialRing;
  try {
    ring =
      names === undefined
        ? ringOfMatrices(
            matrices ?? [],
            pair === undefined ? undefined : { x: pair[0], y: pair[1] },
          )
        : ringOfVariables(names);
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    const path = pair === undefined ? ["variables"] : ["variables", "pair"];
    return refuse(
      path,
      "the variables do not fit together",
      error.message.replace(/^expected /, ""),
    );
  }
  if (degrees === undefined) return read(ring);
  return withDegrees(ring, degrees, refuse);
}

function withDegrees(
  ring: PolynomialRing,
  degrees: Readonly<Record<string, readonly number[]>>,
  refuse: (path: KeyPath, message: string, expected: string) => Reading<never>,
): Reading<PolynomialRing> {
  const path = ["variables", "degrees"];
  const unknown = Object.keys(degrees).find((name) => !ring.variables.includes(name));
  if (unknown !== undefined) {
    return refuse(
      [...path, unknown],
      `unknown variable ${quote(unknown)}`,
      "a variable of the ring",
    );
  }
  const missing = ring.variables.find((name) => degrees[name] === undefined);
  if (missing !== undefined) {
    return refuse(path, `no degree for ${missing}`, "a degree for every variable");
  }
  const lengths = new Set(Object.values(degrees).map((vector) => vector.length));
  if (lengths.size > 1)
    return refuse(path, "degrees of different lengths", "vectors of one length");
  return read({ ...ring, grading: ring.variables.map((name) => degrees[name] ?? []) });
}
