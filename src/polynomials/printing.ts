/** Polynomials and monomials as text: `x11*x22 - 3/2*x12^2*x21`, which reads back to the same value. */
import type { Exponents } from "./exponents.js";
import { sortedTerms } from "./leading-terms.js";
import { coefficient, type Polynomial } from "./polynomial.js";
import type { PolynomialRing } from "./polynomial-ring.js";
import type { TermOrder } from "./term-order.js";

/** A monomial: `x11*x12^2`, and `1` for the empty product. */
export function printMonomial(ring: PolynomialRing, monomial: Exponents): string {
  const factors: string[] = [];
  monomial.forEach((e, v) => {
    if (e > 0) factors.push(e === 1 ? `${ring.variables[v]}` : `${ring.variables[v]}^${e}`);
  });
  return factors.length === 0 ? "1" : factors.join("*");
}

/** A polynomial, largest terms of the order first, or in canonical order when none is given. */
export function printPolynomial(f: Polynomial, order?: TermOrder): string {
  const monomials =
    order === undefined ? f.monomials : sortedTerms(f, order).map((t) => t.monomial);
  if (monomials.length === 0) return "0";
  const place = new Map(f.monomials.map((m, k) => [m, k]));
  let text = "";
  for (const monomial of monomials) {
    const c = coefficient(f, place.get(monomial) as number);
    const size = c.abs();
    const name = printMonomial(f.ring, monomial);
    const factor = size.equals(1)
      ? name
      : name === "1"
        ? size.toFraction()
        : `${size.toFraction()}*${name}`;
    const sign = c.s < 0n ? "-" : "+";
    if (text === "") text = sign === "-" ? `-${factor}` : factor;
    else text += ` ${sign} ${factor}`;
  }
  return text;
}
