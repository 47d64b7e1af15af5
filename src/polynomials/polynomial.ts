/**
 * Sparse polynomials with rational coefficients: the exact form at the seams between reading,
 * families, engine and printing. A polynomial is stored as integer numerators over one positive
 * denominator, in lowest terms, so that clearing denominators costs nothing; `fraction.js` values
 * appear only where single coefficients are handed out. The engine has its own rows.
 */
import Fraction from "fraction.js";
import { gcd } from "../arithmetic/integers.js";
import {
  compareCanonically,
  type Exponents,
  equalExponents,
  multiplyExponents,
  totalDegree,
} from "./exponents.js";
import type { PolynomialRing, VariableIndex } from "./polynomial-ring.js";

/**
 * A polynomial: `Σ numerators[k] / denominator · monomials[k]`. Normal form: monomials distinct and
 * in canonical order, numerators non-zero, denominator positive, no common factor of them all.
 */
export interface Polynomial {
  readonly ring: PolynomialRing;
  readonly monomials: readonly Exponents[];
  readonly numerators: readonly bigint[];
  readonly denominator: bigint;
}

/** One term, its coefficient as numerator over the polynomial's denominator. */
export interface Term {
  readonly monomial: Exponents;
  readonly numerator: bigint;
}

/** The polynomial that is the sum of the given terms over a common denominator. @throws RangeError if it is 0. */
export function polynomial(
  ring: PolynomialRing,
  terms: Iterable<Term>,
  denominator = 1n,
): Polynomial {
  if (denominator === 0n) throw new RangeError("expected a non-zero denominator, got 0");
  const sorted = [...terms].sort((a, b) => compareCanonically(a.monomial, b.monomial));
  const monomials: Exponents[] = [];
  const numerators: bigint[] = [];
  for (const { monomial, numerator } of sorted) {
    const last = monomials.length - 1;
    if (last >= 0 && equalExponents(monomials[last] as Exponents, monomial)) {
      numerators[last] = (numerators[last] as bigint) + numerator;
    } else {
      monomials.push(monomial);
      numerators.push(numerator);
    }
  }
  return normalised(ring, monomials, numerators, denominator);
}

/** The zero polynomial. */
export function zero(ring: PolynomialRing): Polynomial {
  return { ring, monomials: [], numerators: [], denominator: 1n };
}

/** A constant. */
export function constant(ring: PolynomialRing, value: bigint | Fraction): Polynomial {
  const [n, d] = typeof value === "bigint" ? [value, 1n] : [value.s * value.n, value.d];
  return polynomial(ring, [{ monomial: one(ring), numerator: n }], d);
}

/** A variable as a polynomial. */
export function variable(ring: PolynomialRing, index: VariableIndex): Polynomial {
  const monomial = one(ring);
  monomial[index] = 1;
  return { ring, monomials: [monomial], numerators: [1n], denominator: 1n };
}

/** Is this the zero polynomial? */
export function isZero(f: Polynomial): boolean {
  return f.monomials.length === 0;
}

/** The coefficient of the k-th term. @throws RangeError outside the terms. */
export function coefficient(f: Polynomial, k: number): Fraction {
  const numerator = f.numerators[k];
  if (numerator === undefined) throw new RangeError(`expected a term index, got ${k}`);
  return new Fraction(numerator, f.denominator);
}

/** f + g. */
export function add(f: Polynomial, g: Polynomial): Polynomial {
  const common = f.denominator * g.denominator;
  return polynomial(
    f.ring,
    [...scaledTerms(f, g.denominator), ...scaledTerms(g, f.denominator)],
    common,
  );
}

/** −f. */
export function negate(f: Polynomial): Polynomial {
  return { ...f, numerators: f.numerators.map((n) => -n) };
}

/** f − g. */
export function subtract(f: Polynomial, g: Polynomial): Polynomial {
  return add(f, negate(g));
}

/**
 * f · g. @throws ExponentOverflow when an exponent passes 65,535.
 * Cost: the products of terms are laid out as one sorted run for each term of the shorter factor, and
 * the sort merges runs: N·log(runs) for N pairs of terms.
 */
export function multiply(f: Polynomial, g: Polynomial): Polynomial {
  const [short, long] = f.monomials.length < g.monomials.length ? [f, g] : [g, f];
  const terms: Term[] = [];
  for (let i = 0; i < short.monomials.length; i++) {
    const monomial = short.monomials[i] as Exponents;
    const numerator = short.numerators[i] as bigint;
    for (let j = 0; j < long.monomials.length; j++) {
      terms.push({
        monomial: multiplyExponents(monomial, long.monomials[j] as Exponents),
        numerator: numerator * (long.numerators[j] as bigint),
      });
    }
  }
  return polynomial(f.ring, terms, f.denominator * g.denominator);
}

/** f divided by a non-zero constant. @throws RangeError when the divisor is 0. */
export function divideByConstant(f: Polynomial, numerator: bigint, denominator = 1n): Polynomial {
  return polynomial(f.ring, scaledTerms(f, denominator), f.denominator * numerator);
}

/** Are two polynomials of one ring equal? */
export function equal(f: Polynomial, g: Polynomial): boolean {
  return (
    f.denominator === g.denominator &&
    f.monomials.length === g.monomials.length &&
    f.numerators.every((n, k) => n === g.numerators[k]) &&
    f.monomials.every((m, k) => equalExponents(m, g.monomials[k] as Exponents))
  );
}

/** Have all terms the same total degree? True for 0. */
export function isHomogeneous(f: Polynomial): boolean {
  const [first, ...others] = f.monomials;
  return first === undefined || others.every((m) => totalDegree(m) === totalDegree(first));
}

/** f with the given variables set to 0. */
export function setToZero(f: Polynomial, variables: ReadonlySet<number>): Polynomial {
  const kept = [...scaledTerms(f, 1n)].filter((t) =>
    t.monomial.every((e, v) => e === 0 || !variables.has(v)),
  );
  return polynomial(f.ring, kept, f.denominator);
}

function one(ring: PolynomialRing): Exponents {
  return new Uint16Array(ring.variables.length);
}

function scaledTerms(f: Polynomial, factor: bigint): Term[] {
  return f.monomials.map((monomial, k) => ({
    monomial,
    numerator: (f.numerators[k] as bigint) * factor,
  }));
}

function normalised(
  ring: PolynomialRing,
  monomials: readonly Exponents[],
  numerators: readonly bigint[],
  denominator: bigint,
): Polynomial {
  let common = denominator;
  for (const n of numerators) {
    if (common === 1n || common === -1n) break;
    common = gcd(common, n);
  }
  const divisor = (denominator < 0n ? -1n : 1n) * (common < 0n ? -common : common);
  const kept = numerators.flatMap((n, k) => (n === 0n ? [] : [k]));
  if (kept.length === 0) return zero(ring);
  return {
    ring,
    monomials: kept.map((k) => monomials[k] as Exponents),
    numerators: kept.map((k) => (numerators[k] as bigint) / divisor),
    denominator: denominator / divisor,
  };
}
