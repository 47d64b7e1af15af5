/** Gradings declared in problem files: is a polynomial homogeneous in them? */
import type { Exponents } from "../polynomials/exponents.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import { printMonomial } from "../polynomials/printing.js";

/** Why a polynomial is not homogeneous in its ring's grading, or undefined when it is or there is none. */
export function homogeneityFault(f: Polynomial): string | undefined {
  const { grading } = f.ring;
  if (grading === undefined) return undefined;
  const degree = (monomial: Exponents): string =>
    (grading[0] ?? [])
      .map((_, k) => monomial.reduce((sum, e, v) => sum + e * (grading[v]?.[k] ?? 0), 0))
      .join(", ");
  const [first, ...others] = f.monomials;
  if (first === undefined) return undefined;
  const other = others.find((m) => degree(m) !== degree(first));
  if (other === undefined) return undefined;
  const print = (m: Exponents): string => `${printMonomial(f.ring, m)} has degree (${degree(m)})`;
  return `not homogeneous: ${print(first)}, ${print(other)}`;
}
