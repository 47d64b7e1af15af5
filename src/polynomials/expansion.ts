/**
 * Polynomial arithmetic for readers, with a bound on the work: whatever a text asks to expand ends in a
 * moment, in a polynomial or in a fault at the operator. Work is counted in term operations, weighted by
 * the lengths of the coefficients; clocks are not asked, so that a text reads alike on every machine.
 */
import { absolute, gcd } from "../arithmetic/integers.js";
import { ExponentOverflow, MAX_EXPONENT } from "./exponents.js";
import {
  constant,
  divideByConstant,
  isZero,
  multiply,
  type Polynomial,
  polynomial,
} from "./polynomial.js";
import type { PolynomialRing } from "./polynomial-ring.js";
import { TextFault } from "./text-fault.js";

/** The most digits that a number, a numerator or a denominator may have. */
export const LONGEST_NUMBER = 100_000;

/** The most terms that a product or sum may have. */
const MOST_TERMS = 100_000;

/** Term operations for one text; about a second. */
const MOST_WORK = 2_000_000;

/*
 * Break-even points with one operation on terms, measured: the bits of a sum, the product of the
 * bit lengths in a multiplication, and the product of those in reducing a fraction (Euclid).
 */
const SUM_BITS = 2 ** 8;
const PRODUCT_BITS = 2 ** 21;
const REDUCTION_BITS = 2 ** 14;

const LONGEST_BITS = Math.floor(LONGEST_NUMBER * Math.log2(10));

/** Bounded arithmetic for one text; offsets say where the fault is, if there is one. */
export class Expansion {
  readonly #ring: PolynomialRing;
  #work = 0;

  constructor(ring: PolynomialRing) {
    this.#ring = ring;
  }

  /** f · g. @throws TextFault */
  product(f: Polynomial, g: Polynomial, offset: number): Polynomial {
    this.#charge(f.monomials.length * g.monomials.length, f, g, offset);
    try {
      return this.#checked(multiply(f, g), offset);
    } catch (error) {
      if (!(error instanceof ExponentOverflow)) throw error;
      throw exponentFault(offset);
    }
  }

  /** f / g for a constant g. @throws TextFault */
  quotient(f: Polynomial, g: Polynomial, offset: number): Polynomial {
    if (g.monomials.length > 1 || g.monomials[0]?.some((e) => e > 0)) {
      throw new TextFault(
        offset,
        "division by something that is not a constant",
        "a non-zero number",
      );
    }
    if (isZero(g)) throw new TextFault(offset, "division by zero", "a non-zero number");
    this.#charge(f.monomials.length, f, g, offset);
    return divideByConstant(f, g.numerators[0] as bigint, g.denominator);
  }

  /**
   * baseⁿ, with 0⁰ = 1. Multiplies by the base again and again, which for sparse polynomials costs less
   * than squaring. @throws TextFault
   */
  power(base: Polynomial, exponent: number, offset: number): Polynomial {
    for (const monomial of base.monomials) {
      if (monomial.some((e) => e * exponent > MAX_EXPONENT)) throw exponentFault(offset);
    }
    if (base.monomials.length === 1) return this.#termPower(base, exponent, offset);
    let power = constant(this.#ring, 1n);
    for (let k = 0; k < exponent && !isZero(power); k++) power = this.product(power, base, offset);
    return power;
  }

  /** The sum of a list, over the least common denominator. @throws TextFault */
  sum(parts: readonly Polynomial[], offset: number): Polynomial {
    const [only] = parts;
    if (parts.length === 1 && only !== undefined) return only;
    const common = this.#commonDenominator(parts, offset);
    const terms = parts.flatMap(({ monomials, numerators, denominator }) => {
      const factor = common / denominator;
      return monomials.map((monomial, k) => ({
        monomial,
        numerator: (numerators[k] as bigint) * factor,
      }));
    });
    const length = terms.reduce((most, { numerator }) => Math.max(most, bits(numerator)), 0);
    const perTerm = length / SUM_BITS + (length * bits(common)) / REDUCTION_BITS;
    this.#spend(terms.length * (1 + perTerm), offset);
    return this.#checked(polynomial(this.#ring, terms, common), offset);
  }

  #commonDenominator(parts: readonly Polynomial[], offset: number): bigint {
    let common = 1n;
    for (const { denominator } of parts) {
      if (common % denominator === 0n) continue;
      const length = bits(common) + bits(denominator);
      if (length > LONGEST_BITS) throw lengthFault(offset);
      this.#spend(1 + (bits(common) * bits(denominator)) / REDUCTION_BITS, offset);
      common *= denominator / gcd(common, denominator);
    }
    return common;
  }

  #termPower(base: Polynomial, exponent: number, offset: number): Polynomial {
    const numerator = base.numerators[0] as bigint;
    const once = Math.max(bits(numerator), bits(base.denominator));
    const length = once === 1 ? 1 : once * exponent;
    if (length > LONGEST_BITS) throw lengthFault(offset);
    this.#spend(1 + length / SUM_BITS, offset);
    const n = BigInt(exponent);
    return {
      ring: this.#ring,
      monomials: base.monomials.map((m) => m.map((e) => e * exponent)),
      numerators: [numerator ** n],
      denominator: base.denominator ** n,
    };
  }

  /* Pays for an operation that touches so many terms with the coefficients of f and g. */
  #charge(terms: number, f: Polynomial, g: Polynomial, offset: number): void {
    const [ofF, ofG] = [longest(f), longest(g)];
    const denominators = bits(f.denominator) + bits(g.denominator);
    const perTerm =
      (ofF + ofG) / SUM_BITS +
      (ofF * ofG) / PRODUCT_BITS +
      ((ofF + ofG) * denominators) / REDUCTION_BITS;
    this.#spend(terms * (1 + perTerm), offset);
  }

  #spend(work: number, offset: number): void {
    this.#work += work;
    if (this.#work <= MOST_WORK) return;
    throw new TextFault(
      offset,
      "the expanded polynomial is too large",
      "fewer factors, lower powers or shorter numbers",
    );
  }

  /* A polynomial that may be kept; in particular its text can be read again. */
  #checked(f: Polynomial, offset: number): Polynomial {
    if (isTooLong(f.denominator) || f.numerators.some(isTooLong)) throw lengthFault(offset);
    if (f.monomials.length <= MOST_TERMS) return f;
    throw new TextFault(
      offset,
      "the expanded polynomial is too large",
      `at most ${MOST_TERMS} terms`,
    );
  }
}

function lengthFault(offset: number): TextFault {
  return new TextFault(
    offset,
    "a coefficient becomes too long",
    `at most ${LONGEST_NUMBER} digits`,
  );
}

function exponentFault(offset: number): TextFault {
  return new TextFault(offset, "an exponent becomes too large", `exponents up to ${MAX_EXPONENT}`);
}

/* Has an integer more digits than may be read? Digits are only counted when bits do not decide. */
function isTooLong(n: bigint): boolean {
  const length = bits(n);
  if (length <= LONGEST_BITS) return false;
  return length > LONGEST_BITS + 4 || absolute(n).toString().length > LONGEST_NUMBER;
}

/* The bit length of the longest numerator. */
function longest(f: Polynomial): number {
  return f.numerators.reduce((most, n) => Math.max(most, bits(n)), 0);
}

/* The bit length of an integer, for long ones rounded up to a multiple of four. */
function bits(n: bigint): number {
  if (BigInt.asIntN(53, n) === n) return Math.floor(Math.log2(Math.abs(Number(n)))) + 1;
  return 4 * n.toString(16).length;
}
