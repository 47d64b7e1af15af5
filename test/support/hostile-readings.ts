/** The properties of the readers under hostile texts, for the fast and the slow tests. */
import fc from "fast-check";
import { expect } from "vitest";
import { readOrder } from "../../src/polynomials/order-phrase.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { readPolynomial } from "../../src/polynomials/reading.js";
import { randomPolynomial } from "./arbitraries.js";
import { randomExpression } from "./expressions.js";
import { expectHelpful } from "./faults.js";
import { mutated, randomText } from "./hostile-texts.js";
import { orderTable, pairedRing } from "./order-table.js";
import { accepted, ring } from "./reading.js";

/** `readPolynomial` gives a polynomial that prints back to itself, or a helpful fault. */
export function hostilePolynomial(): fc.IPropertyWithHooks<[string]> {
  const r = ring("x y z x11");
  const printed = randomPolynomial(r, { terms: 5, degree: 4, coefficient: 99 }).map((f) =>
    printPolynomial(f),
  );
  const written = randomExpression(r.variables).map(({ text }) => text);
  const texts = fc.oneof(randomText, mutated(printed), mutated(written), mutated(randomText));
  return fc.property(texts, (text) => {
    const reading = readPolynomial(text, r);
    if (!reading.ok) return expectHelpful(reading.fault, text);
    expect(accepted(readPolynomial(printPolynomial(reading.value), r))).toEqual(reading.value);
  });
}

/** `readOrder` gives an order whose phrase reads back to it, or a helpful fault. */
export function hostileOrder(): fc.IPropertyWithHooks<[string]> {
  const r = pairedRing(2);
  const words = fc
    .array(
      fc.constantFrom(
        ..."lex revlex dual graded plain weights cells from by nw ne sw se rows columns".split(" "),
        ..."then refined , ( ) (1,1,1,1,1,1,1,1) (0,-1,0,0,0,0,0,0) x11 y22".split(" "),
      ),
      { maxLength: 12 },
    )
    .map((list) => list.join(" "));
  const phrases = fc.constantFrom(...orderTable().map(({ phrase }) => phrase));
  const vector = fc.array(fc.integer({ min: -3, max: 3 }), { minLength: 8, maxLength: 8 });
  const weighted = fc
    .tuple(vector, fc.constantFrom("then", "refined by"), phrases)
    .map(([weights, word, phrase]) => `weights (${weights.join(",")}) ${word} ${phrase}`);
  const texts = fc.oneof(words, phrases, weighted, mutated(phrases), mutated(weighted), randomText);
  return fc.property(texts, (text) => {
    const reading = readOrder(text, r);
    if (!reading.ok) return expectHelpful(reading.fault, text);
    expect(accepted(readOrder(reading.value.phrase, r))).toEqual(reading.value);
  });
}
