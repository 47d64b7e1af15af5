/** Reading in tests: the value, or the fault as an error. */
import type { Reading } from "../../src/outcomes/input-fault.js";
import { readOrder } from "../../src/polynomials/order-phrase.js";
import type { Polynomial } from "../../src/polynomials/polynomial.js";
import { type PolynomialRing, ringOfVariables } from "../../src/polynomials/polynomial-ring.js";
import { readPolynomial } from "../../src/polynomials/reading.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";

/** The value that was read; a fault fails the test. */
export function accepted<T>(reading: Reading<T>): T {
  if (!reading.ok) throw new Error(`${reading.fault.message}; expected ${reading.fault.expected}`);
  return reading.value;
}

/** Polynomials of a ring from their texts. */
export function polynomials(ring: PolynomialRing, texts: readonly string[]): Polynomial[] {
  return texts.map((text) => accepted(readPolynomial(text, ring)));
}

/** An order from its phrase. */
export function orderOf(ring: PolynomialRing, phrase: string): TermOrder {
  return accepted(readOrder(phrase, ring));
}

/** The ring in the variables written one after the other: `ring("x y z")`. */
export function ring(names: string): PolynomialRing {
  return ringOfVariables(names.split(" "));
}

/** A polynomial as a text that does not depend on the order of terms. */
export function termSet(f: Polynomial): string {
  return f.monomials
    .map((m, k) => `${m.join(",")}:${f.numerators[k]}/${f.denominator}`)
    .sort()
    .join(" ");
}

/** Polynomials as a set, for comparison. */
export function termSets(fs: readonly Polynomial[]): string[] {
  return fs.map(termSet).sort();
}
