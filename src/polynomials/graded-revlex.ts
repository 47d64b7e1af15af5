/**
 * The graded reverse lexicographic order on the listed variables, the first one the largest: the
 * order in which bases tend to be smallest, used by default for inhomogeneous input and inside proofs.
 */
import type { PolynomialRing, VariableIndex } from "./polynomial-ring.js";
import { singleVariableComparison, type TermOrder } from "./term-order.js";

/** `graded revlex`: total degree, then at the last variable that differs the smaller exponent is larger. */
export function gradedRevlex(ring: PolynomialRing): TermOrder {
  const count = ring.variables.length;
  const comparisons = ring.variables.map((_, k) =>
    singleVariableComparison((count - 1 - k) as VariableIndex, -1),
  );
  return {
    phrase: "graded revlex",
    ring,
    degreeFirst: true,
    comparisons,
    decisive: count,
    stages: [count],
  };
}
