/**
 * Rows: polynomials as the engine keeps them, monomial ids (largest first) beside coefficients, over
 * one monomial table. Modular rows are monic with residues; exact rows are primitive integer vectors
 * with a positive leading coefficient, since a Gröbner basis does not see constant factors.
 */
import { absolute, interruptibleGcd } from "../arithmetic/integers.js";
import type { PrimeField, Residue } from "../arithmetic/prime-field.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";
import { type Polynomial, polynomial } from "../polynomials/polynomial.js";
import type { PolynomialRing } from "../polynomials/polynomial-ring.js";

/** The monomials of a row, largest first; never empty. */
export interface Support {
  readonly monomials: Int32Array;
}

/** A monic polynomial over a prime field. */
export interface ModularRow extends Support {
  readonly coefficients: Int32Array;
}

/** A primitive integer polynomial, leading coefficient positive. */
export interface ExactRow extends Support {
  readonly coefficients: readonly bigint[];
  /** The same coefficients as doubles, when all of them are below 2⁵³. */
  readonly small: Float64Array | undefined;
}

/** The leading monomial of a row. */
export function leadingMonomial(row: Support): MonomialId {
  return row.monomials[0] as MonomialId;
}

/** The exact row of a non-zero polynomial. */
export function exactRow(table: MonomialTable, f: Polynomial): ExactRow {
  return sortedRow(
    table,
    f.monomials.map((m, k) => ({ id: table.intern(m), coefficient: f.numerators[k] as bigint })),
  );
}

/** An exact row over one table as a row over another table of the same ring. */
export function rowOver(to: MonomialTable, from: MonomialTable, row: ExactRow): ExactRow {
  return sortedRow(
    to,
    row.coefficients.map((coefficient, k) => ({
      id: to.intern(from.exponents(row.monomials[k] as MonomialId)),
      coefficient,
    })),
  );
}

function sortedRow(
  table: MonomialTable,
  terms: readonly { readonly id: MonomialId; readonly coefficient: bigint }[],
): ExactRow {
  const sorted = [...terms].sort((a, b) => table.compare(b.id, a.id));
  return primitiveRow(
    Int32Array.from(sorted, (t) => t.id),
    sorted.map((t) => t.coefficient),
  );
}

/**
 * The exact row with the given monomials and coefficients, common factors and sign taken out.
 * @param spend called again and again while common factors are sought.
 */
export function primitiveRow(
  monomials: Int32Array,
  coefficients: readonly bigint[],
  spend?: () => void,
): ExactRow {
  let common = 0n;
  for (const c of coefficients) {
    common = interruptibleGcd(common, c, spend);
    if (common === 1n) break;
  }
  if ((coefficients[0] as bigint) < 0n) common = -common;
  return coprimeRow(monomials, common === 1n ? coefficients : coefficients.map((c) => c / common));
}

/** The exact row with coefficients that are known to have no common factor, the leading one positive. */
export function coprimeRow(monomials: Int32Array, coefficients: readonly bigint[]): ExactRow {
  return { monomials, coefficients, small: asSmall(coefficients) };
}

/** As `coprimeRow`, from doubles below 2⁵³; most rows are never asked for their coefficients as big integers. */
export function smallRow(monomials: Int32Array, small: Float64Array): ExactRow {
  let coefficients: readonly bigint[] | undefined;
  return {
    monomials,
    small,
    get coefficients() {
      coefficients ??= Array.from(small, BigInt);
      return coefficients;
    },
  };
}

/**
 * The image of an exact row modulo the field's prime, made monic; `undefined` when the prime divides
 * the leading coefficient, so that the image has another leading monomial.
 */
export function modularRow(field: PrimeField, row: ExactRow): ModularRow | undefined {
  const lead = field.fromInteger(row.coefficients[0] as bigint);
  if (lead === 0) return undefined;
  const inverse = field.invert(lead);
  const monomials: number[] = [];
  const coefficients: number[] = [];
  for (let k = 0; k < row.monomials.length; k++) {
    const c = field.multiply(field.fromInteger(row.coefficients[k] as bigint), inverse);
    if (c !== 0) {
      monomials.push(row.monomials[k] as number);
      coefficients.push(c);
    }
  }
  return { monomials: Int32Array.from(monomials), coefficients: Int32Array.from(coefficients) };
}

/** The monic polynomial of an exact row. */
export function monicPolynomial(
  ring: PolynomialRing,
  table: MonomialTable,
  row: ExactRow,
): Polynomial {
  return rowPolynomial(ring, table, row, row.coefficients[0] as bigint);
}

/** The polynomial of an exact row, divided by a constant. */
export function rowPolynomial(
  ring: PolynomialRing,
  table: MonomialTable,
  row: ExactRow,
  denominator = 1n,
): Polynomial {
  const terms = row.coefficients.map((numerator, k) => ({
    monomial: table.exponents(row.monomials[k] as MonomialId),
    numerator,
  }));
  return polynomial(ring, terms, denominator);
}

/** The polynomial of a modular row, coefficients of least absolute value. */
export function modularPolynomial(
  ring: PolynomialRing,
  table: MonomialTable,
  field: PrimeField,
  row: ModularRow,
): Polynomial {
  const terms = Array.from(row.coefficients, (c, k) => ({
    monomial: table.exponents(row.monomials[k] as MonomialId),
    numerator: BigInt(field.toSigned(c as Residue)),
  }));
  return polynomial(ring, terms);
}

function asSmall(coefficients: readonly bigint[]): Float64Array | undefined {
  const limit = BigInt(Number.MAX_SAFE_INTEGER);
  if (coefficients.some((c) => absolute(c) > limit)) return undefined;
  return Float64Array.from(coefficients, Number);
}
