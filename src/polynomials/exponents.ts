/**
 * Exponent vectors: a monomial as its exponents, one 16-bit entry a variable.
 * The plain form used at the seams; the engine keeps monomials in a table and names them by ids.
 */
import { LimitReached } from "../outcomes/budget.js";

/** Exponents of a monomial, indexed by variable; never changed once shared. */
export type Exponents = Uint16Array;

/** The largest exponent a monomial may have. */
export const MAX_EXPONENT = 65_535;

/** Thrown when a product or power would need an exponent above 65,535; ends a computation as `undecided`. */
export class ExponentOverflow extends LimitReached {
  constructor() {
    super({
      kind: "undecided",
      limit: "size",
      reason: `an exponent above ${MAX_EXPONENT} is needed`,
    });
    this.name = "ExponentOverflow";
  }
}

/** The product of two monomials. @throws ExponentOverflow if an exponent passes 65,535. */
export function multiplyExponents(a: Exponents, b: Exponents): Exponents {
  const product = new Uint16Array(a.length);
  for (let i = 0; i < a.length; i++) {
    const sum = (a[i] as number) + (b[i] as number);
    if (sum > MAX_EXPONENT) throw new ExponentOverflow();
    product[i] = sum;
  }
  return product;
}

/** Does the monomial `a` divide the monomial `b`? */
export function dividesExponents(a: Exponents, b: Exponents): boolean {
  for (let i = 0; i < a.length; i++) {
    if ((a[i] as number) > (b[i] as number)) return false;
  }
  return true;
}

/** The least common multiple of two monomials. */
export function lcmExponents(a: Exponents, b: Exponents): Exponents {
  const lcm = new Uint16Array(a.length);
  for (let i = 0; i < a.length; i++) lcm[i] = Math.max(a[i] as number, b[i] as number);
  return lcm;
}

/** The total degree of a monomial. */
export function totalDegree(a: Exponents): number {
  let degree = 0;
  for (let i = 0; i < a.length; i++) degree += a[i] as number;
  return degree;
}

/** Are two monomials the same? */
export function equalExponents(a: Exponents, b: Exponents): boolean {
  for (let i = 0; i < a.length; i++) {
    if (a[i] !== b[i]) return false;
  }
  return a.length === b.length;
}

/**
 * The canonical order in which plain data are listed: larger total degree first, then the larger
 * exponent at the first variable that differs. Negative when `a` comes before `b`.
 */
export function compareCanonically(a: Exponents, b: Exponents): number {
  let byDegree = 0;
  let byExponent = 0;
  for (let i = 0; i < a.length; i++) {
    const difference = (b[i] as number) - (a[i] as number);
    byDegree += difference;
    if (byExponent === 0) byExponent = difference;
  }
  return byDegree === 0 ? byExponent : byDegree;
}
