/**
 * A problem as a plain document: what `--json` output contains, so that it can be run again. It reads back
 * (`readProblem` of its JSON text) to the same ideal, generators and order.
 */

import { printPermutation } from "../combinatorics/permutation.js";
import type { Ideal } from "../families/ideal.js";
import { readFamilyIdeal } from "../families/registry.js";
import type { PolynomialRing } from "../polynomials/polynomial-ring.js";
import { printPolynomial } from "../polynomials/printing.js";
import type { Problem } from "./problem.js";

/** The JSON form of a problem file. */
export type ProblemDocument = Readonly<Record<string, unknown>>;

/** The document of a problem: families by name, all else by polynomials written out. */
export function problemDocument(problem: Problem): ProblemDocument {
  const { ideal, generators, order, title, note } = problem;
  const family = familyMember(ideal);
  const { permutation } = ideal;
  return {
    ...(title === undefined ? {} : { title }),
    ...(note === undefined ? {} : { note }),
    ...(family === undefined
      ? {
          variables: variablesDocument(ideal.ring),
          ideal: { polynomials: generators.polynomials().map((f) => printPolynomial(f)) },
        }
      : { ideal: { family: ideal.name }, generators: generators.kind }),
    order: order.phrase,
    ...(permutation === undefined || String(permutation) === String(family?.permutation)
      ? {}
      : { permutation: printPermutation(permutation) }),
  };
}

function familyMember({ name }: Ideal): Ideal | undefined {
  const member = readFamilyIdeal(name);
  return member.ok && member.value.name === name ? member.value : undefined;
}

function variablesDocument(ring: PolynomialRing): ProblemDocument {
  const degrees =
    ring.grading === undefined
      ? {}
      : { degrees: Object.fromEntries(ring.variables.map((name, v) => [name, ring.grading?.[v]])) };
  if (ring.matrices.length === 0) return { names: ring.variables, ...degrees };
  return {
    matrices: ring.matrices.map(({ name, rows, columns }) => ({ name, rows, columns })),
    ...(ring.pair === undefined ? {} : { pair: [ring.pair.x.name, ring.pair.y.name] }),
    ...degrees,
  };
}
