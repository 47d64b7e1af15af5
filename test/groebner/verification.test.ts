import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { determinantalIdeal } from "../../src/families/determinantal.js";
import { type Verification, verifyGenerators } from "../../src/groebner/verification.js";
import { startBudget, unlimited } from "../../src/outcomes/budget.js";
import {
  dividesExponents,
  type Exponents,
  lcmExponents,
  totalDegree,
} from "../../src/polynomials/exponents.js";
import { leadingMonomialOf, monomialComparer } from "../../src/polynomials/leading-terms.js";
import {
  constant,
  divideByConstant,
  isZero,
  multiply,
  type Polynomial,
  variable,
} from "../../src/polynomials/polynomial.js";
import type { VariableIndex } from "../../src/polynomials/polynomial-ring.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";
import { randomIdeal } from "../support/arbitraries.js";
import {
  isGroebnerBasis,
  monic,
  normalForm,
  reducedBasis,
  sPolynomial,
} from "../support/buchberger.js";
import { LinearSpan } from "../support/linear-span.js";
import { orderOf, polynomials, ring, termSet } from "../support/reading.js";

function verify(generators: readonly Polynomial[], order: TermOrder): Verification {
  const verification = verifyGenerators(generators, order, unlimited());
  if (verification.kind === "undecided") throw new Error(verification.reason);
  return verification;
}

/** A witness is right when it follows from the definitions. */
function checkWitness(generators: readonly Polynomial[], order: TermOrder, v: Verification): void {
  if (v.verdict !== "fails") throw new Error("expected a failure");
  const { pair, remainder, leadingMonomial } = v.witness;
  const [f, g] = pair.map((k) => generators[k] as Polynomial);
  expect(pair[0]).toBeLessThan(pair[1]);
  expect(isZero(remainder)).toBe(false);
  expect(leadingMonomialOf(remainder, order)).toEqual(leadingMonomial);
  const leads = generators.filter((h) => !isZero(h)).map((h) => leadingMonomialOf(h, order));
  for (const m of remainder.monomials) {
    expect(leads.some((l) => dividesExponents(l, m))).toBe(false);
  }
  // It is a normal form of the pair's S-polynomial S: a combination of S and of products m·g below the lcm of
  // the pair. Such products alone do not give S, so the pair really fails Buchberger's criterion.
  const s = sPolynomial(f as Polynomial, g as Polynomial, order);
  const lcm = lcmExponents(
    leadingMonomialOf(f as Polynomial, order),
    leadingMonomialOf(g as Polynomial, order),
  );
  if (!order.degreeFirst) {
    // Infinitely many products lie below the lcm: only that both lie in the ideal is checked.
    const basis = reducedBasis(generators, order);
    expect(isZero(normalForm(remainder, basis, order))).toBe(true);
    expect(isZero(s)).toBe(false);
    return;
  }
  const below = new LinearSpan(order, productsBelow(lcm, generators, order));
  expect(below.contains(s)).toBe(false);
  below.add(s);
  expect(below.contains(remainder)).toBe(true);
}

/** All products of a monomial with a generator whose leading monomial is below the bound, in a graded order. */
function productsBelow(
  bound: Exponents,
  generators: readonly Polynomial[],
  order: TermOrder,
): Polynomial[] {
  const compare = monomialComparer(order);
  const variables = order.ring.variables.map((_, v) => variable(order.ring, v as VariableIndex));
  const degree = totalDegree(bound);
  let layer = generators.filter((h) => !isZero(h));
  const products: Polynomial[] = [];
  const seen = new Set<string>();
  while (layer.length > 0) {
    const fits = layer.filter((h) => totalDegree(leadingMonomialOf(h, order)) <= degree);
    const fresh = fits.filter((h) => !seen.has(termSet(h)));
    for (const h of fresh) seen.add(termSet(h));
    products.push(...fresh);
    layer = fresh.flatMap((h) => variables.map((x) => multiply(h, x)));
  }
  return products.filter((h) => compare(leadingMonomialOf(h, order), bound) < 0);
}

describe("verification of a given set", () => {
  it("agrees with Buchberger's criterion, and every witness is right", () => {
    const r = ring("x y z");
    let failures = 0;
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 4 }),
        fc.constantFrom(
          "graded revlex",
          "graded lex",
          "plain lex",
          "weights (1,2,3) then graded lex",
        ),
        (generators, phrase) => {
          const order = orderOf(r, phrase);
          const v = verify(generators, order);
          expect(v.verdict === "holds").toBe(isGroebnerBasis(generators, order));
          if (v.verdict === "fails") {
            failures++;
            checkWitness(generators, order, v);
          }
        },
      ),
      { numRuns: 150 },
    );
    expect(failures).toBeGreaterThan(10);
  });

  it("holds for reduced bases, scaled, permuted, doubled, and with elements of the ideal added", () => {
    const r = ring("x y z");
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 3 }),
        fc.integer({ min: 2, max: 9 }),
        (generators, factor) => {
          const order = orderOf(r, "graded revlex");
          const basis = reducedBasis(generators, order);
          const scaled = basis.map((f) => multiply(f, constant(r, BigInt(-factor)))).reverse();
          const more = [constant(r, 0n), ...generators, ...scaled, ...basis];
          expect(verify(more, order).verdict).toBe("holds");
        },
      ),
      { numRuns: 60 },
    );
  });

  it("gives the same verdict however the generators are listed and scaled", () => {
    const r = ring("x y z");
    const verdicts = new Set<string>();
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 4 }),
        fc.constantFrom("graded revlex", "graded lex", "plain lex"),
        fc.infiniteStream(fc.integer({ min: 1, max: 9 })),
        (generators, phrase, factors) => {
          const order = orderOf(r, phrase);
          const { verdict, leadingIdeal } = verify(generators, order);
          verdicts.add(verdict);
          const scaled = generators.map((f) => {
            const factor = BigInt(factors.next().value ?? 1);
            return divideByConstant(multiply(f, constant(r, -factor)), factor + 1n, 1n);
          });
          const listed = [...scaled.reverse(), constant(r, 0n), ...generators];
          const again = verify(listed, order);
          expect(again.verdict).toBe(verdict);
          expect(again.leadingIdeal).toEqual(leadingIdeal);
          if (again.verdict === "fails") checkWitness(listed, order, again);
        },
      ),
      { numRuns: 100 },
    );
    expect([...verdicts].sort()).toEqual(["fails", "holds"]);
  });

  it("fails when an element that is needed is dropped", () => {
    const r = ring("x y z");
    const order = orderOf(r, "graded revlex");
    const generators = polynomials(r, ["y - x^2", "z - x^3"]);
    const basis = reducedBasis(generators, order);
    expect(basis).toHaveLength(3);
    const dropped = polynomials(r, ["x^2 - y", "x*y - z"]);
    const v = verify(dropped, order);
    checkWitness(dropped, order, v);
    if (v.verdict === "fails") {
      expect(termSet(v.witness.remainder)).toBe(
        termSet(monic(polynomials(r, ["y^2 - x*z"])[0] as Polynomial, order)),
      );
    }
  });

  it("passes over zero polynomials: the witness still counts them", () => {
    const r = ring("x y z");
    const v = verify(polynomials(r, ["0", "x^2 - y", "0", "x*y - z"]), orderOf(r, "graded revlex"));
    expect(v).toMatchObject({ verdict: "fails", witness: { pair: [1, 3] } });
  });

  it("holds for the empty set and for a constant", () => {
    const r = ring("x y");
    const order = orderOf(r, "graded revlex");
    expect(verify([], order)).toMatchObject({ verdict: "holds", pairsReduced: 0 });
    expect(verify(polynomials(r, ["3", "x*y - 1", "x"]), order).verdict).toBe("holds");
  });

  // Cox, Little, O'Shea, ch. 2 §6 (from memory): {y − x², z − x³} is a lex basis for y > z > x only.
  it("depends on the order, as in the textbook's example", () => {
    const curve = ["y - x^2", "z - x^3"];
    const yzx = ring("y z x");
    const xyz = ring("x y z");
    expect(verify(polynomials(yzx, curve), orderOf(yzx, "plain lex")).verdict).toBe("holds");
    expect(verify(polynomials(xyz, curve), orderOf(xyz, "plain lex")).verdict).toBe("fails");
  });

  // Sturmfels, Gröbner bases and Stanley decompositions of determinantal rings, Math. Z. 205 (1990) [from memory].
  it.each([
    [3, 3, 1],
    [3, 4, 1],
    [4, 4, 2],
    [4, 5, 2],
    [4, 5, 3],
  ])(
    "holds for the minors of a generic %i×%i matrix of rank at most %i in diagonal orders",
    (m, n, k) => {
      const ideal = determinantalIdeal(m, n, k);
      const minors = ideal.generatingSets[0].polynomials();
      for (const phrase of [
        "lex from nw by rows",
        "lex from se by columns",
        "revlex from ne by rows",
      ]) {
        expect(verify(minors, orderOf(ideal.ring, phrase)).verdict).toBe("holds");
      }
    },
  );

  // Bernstein, Zelevinsky 1993; Sturmfels, Zelevinsky 1993 [from memory]: every order.
  it("holds for maximal minors in random weight orders", () => {
    const ideal = determinantalIdeal(3, 5, 2);
    const minors = ideal.generatingSets[0].polynomials();
    fc.assert(
      fc.property(
        fc.array(fc.nat({ max: 1000 }), { minLength: 15, maxLength: 15 }),
        fc.constantFrom("graded lex", "graded revlex"),
        (weights, phrase) => {
          const order = orderOf(ideal.ring, `weights (${weights.join(",")}) then ${phrase}`);
          expect(verify(minors, order).verdict).toBe("holds");
        },
      ),
      { numRuns: 40 },
    );
  });

  it("is undecided when the time is up", () => {
    const ideal = determinantalIdeal(6, 6, 2);
    const minors = ideal.generatingSets[0].polynomials();
    const order = orderOf(ideal.ring, "lex from nw by rows");
    expect(verifyGenerators(minors, order, startBudget({ seconds: 0.0001 }))).toMatchObject({
      kind: "undecided",
      limit: "seconds",
    });
  });

  it("reports the leading ideal of the generators", () => {
    const r = ring("x y z");
    const v = verify(
      polynomials(r, ["x^2 - y", "x*y - z", "x^2*y - z"]),
      orderOf(r, "graded revlex"),
    );
    expect(v.leadingIdeal.generators.map((m) => m.join())).toEqual(["2,0,0", "1,1,0"]);
  });
});
