/** Random monomials. */
import fc from "fast-check";
import type { Exponents } from "../../src/polynomials/exponents.js";
import type { PolynomialRing } from "../../src/polynomials/polynomial-ring.js";

/** A random monomial of the ring; small exponents, so that comparisons come to every step. */
export function randomMonomial(ring: PolynomialRing, largest = 2): fc.Arbitrary<Exponents> {
  const count = ring.variables.length;
  return fc
    .array(fc.nat({ max: largest }), { minLength: count, maxLength: count })
    .map((exponents) => Uint16Array.from(exponents));
}

/** Two random monomials that often have the same degree: the second permutes the first. */
export function randomPair(ring: PolynomialRing): fc.Arbitrary<[Exponents, Exponents]> {
  return fc.oneof(
    fc.tuple(randomMonomial(ring), randomMonomial(ring)),
    randomMonomial(ring).chain((a) =>
      fc
        .shuffledSubarray([...a.keys()], { minLength: a.length, maxLength: a.length })
        .map((from): [Exponents, Exponents] => [a, Uint16Array.from(from, (k) => a[k] as number)]),
    ),
  );
}
