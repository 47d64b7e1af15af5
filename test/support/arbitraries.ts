/** Random small polynomials and ideals for property tests. */
import fc from "fast-check";
import { type Polynomial, polynomial } from "../../src/polynomials/polynomial.js";
import type { PolynomialRing } from "../../src/polynomials/polynomial-ring.js";

/** A random polynomial with few terms and small coefficients; homogeneous of a degree if one is given. */
export function randomPolynomial(
  ring: PolynomialRing,
  options: { terms: number; degree: number; homogeneous?: boolean; coefficient?: number },
): fc.Arbitrary<Polynomial> {
  const count = ring.variables.length;
  const { terms, degree, homogeneous = false, coefficient = 5 } = options;
  const monomial = fc
    .array(fc.nat({ max: count - (homogeneous ? 1 : 0) }), { minLength: degree, maxLength: degree })
    .map((picked) => {
      const exponents = new Uint16Array(count);
      // The index behind the last variable stands for "none": degrees up to the bound.
      for (const v of picked) if (v < count) exponents[v] = (exponents[v] as number) + 1;
      return exponents;
    });
  const term = fc.record({
    monomial,
    numerator: fc.integer({ min: -coefficient, max: coefficient }).map(BigInt),
  });
  return fc
    .array(term, { minLength: 1, maxLength: terms })
    .chain((list) =>
      fc
        .integer({ min: 1, max: 3 })
        .map((d) => polynomial(ring, list, homogeneous ? 1n : BigInt(d))),
    );
}

/** A few random polynomials. */
export function randomIdeal(
  ring: PolynomialRing,
  options: Parameters<typeof randomPolynomial>[1] & { generators: number },
): fc.Arbitrary<Polynomial[]> {
  return fc.array(randomPolynomial(ring, options), { minLength: 1, maxLength: options.generators });
}
