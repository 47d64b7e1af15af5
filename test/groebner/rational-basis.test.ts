import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type RationalBasis, rationalBasis } from "../../src/groebner/rational-basis.js";
import { monicPolynomial } from "../../src/groebner/rows.js";
import { startBudget, type Undecided, unlimited } from "../../src/outcomes/budget.js";
import { gradedRevlex } from "../../src/polynomials/graded-revlex.js";
import { leadingMonomialOf, monomialComparer } from "../../src/polynomials/leading-terms.js";
import { constant, multiply, type Polynomial } from "../../src/polynomials/polynomial.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";
import { randomIdeal } from "../support/arbitraries.js";
import { isReducedBasisOf } from "../support/buchberger.js";
import { orderOf, polynomials, ring, termSet, termSets } from "../support/reading.js";
import { cyclic, eco, katsura, noon } from "../support/systems.js";

/** Enough for small examples after any number of small primes. */
const largePrimes = [
  67108859, 67108837, 67108819, 67108777, 67108763, 67108747, 67108729, 67108721,
];

function basisOf(
  generators: readonly Polynomial[],
  order: TermOrder,
  primes?: number[],
): RationalBasis {
  const basis = rationalBasis(generators, order, unlimited(), { primes });
  if (basis.kind === "undecided") throw new Error(basis.reason);
  return basis;
}

function sizeOf(generators: readonly Polynomial[]): number {
  const [first] = generators;
  if (first === undefined) throw new Error("expected generators");
  return basisOf(generators, gradedRevlex(first.ring)).elements.length;
}

describe("reduced bases over the rationals", () => {
  // Sizes: computed with a general-purpose library (cyclic, katsura, noon, eco: shared check values).
  it.each([
    ["cyclic-4", cyclic(4), 7],
    ["cyclic-5", cyclic(5), 20],
    ["katsura-3", katsura(3), 7],
    ["katsura-4", katsura(4), 13],
    ["katsura-5", katsura(5), 22],
    ["katsura-6", katsura(6), 41],
    ["noon-3", noon(3), 11],
    ["noon-4", noon(4), 28],
    ["eco-4", eco(4), 7],
    ["eco-5", eco(5), 11],
    ["eco-6", eco(6), 18],
  ])("have the known size for %s", (_, generators, size) => {
    expect(sizeOf(generators)).toBe(size);
  });

  // Cox, Little, O'Shea, Ideals, Varieties, and Algorithms, ch. 2 §7 (from memory).
  it("are those of the textbook's worked examples", () => {
    const r = ring("x y");
    const basis = basisOf(
      polynomials(r, ["x^3 - 2*x*y", "x^2*y - 2*y^2 + x"]),
      orderOf(r, "graded lex"),
    );
    expect(termSets(basis.elements)).toEqual(
      termSets(polynomials(r, ["x^2", "x*y", "y^2 - 1/2*x"])),
    );
  });

  // Cox, Little, O'Shea, ch. 2 §8, the system solved by elimination (from memory).
  it("solve the textbook's first system: sphere, paraboloid and plane", () => {
    const r = ring("x y z");
    const system = polynomials(r, ["x^2 + y^2 + z^2 - 1", "x^2 + z^2 - y", "x - z"]);
    expect(termSets(basisOf(system, orderOf(r, "plain lex")).elements)).toEqual(
      termSets(polynomials(r, ["x - z", "y - 2*z^2", "z^4 + 1/2*z^2 - 1/4"])),
    );
  });

  // Cox, Little, O'Shea, ch. 2 §7, exercise 2 (from memory), by hand: y(x²y − 1) − x(xy² − x) = x² − y.
  it("are those of the textbook's exercises, the same in lex and in graded lex", () => {
    const r = ring("x y");
    for (const phrase of ["plain lex", "graded lex"]) {
      const basis = basisOf(polynomials(r, ["x^2*y - 1", "x*y^2 - x"]), orderOf(r, phrase));
      expect(termSets(basis.elements)).toEqual(termSets(polynomials(r, ["x^2 - y", "y^2 - 1"])));
    }
  });

  // Cox, Little, O'Shea, ch. 2 §8 (from memory): the twisted cubic by elimination.
  it("eliminate: the twisted cubic in plain lex", () => {
    const r = ring("x y z");
    const basis = basisOf(polynomials(r, ["y - x^2", "z - x^3"]), orderOf(r, "plain lex"));
    expect(termSets(basis.elements)).toEqual(
      termSets(polynomials(r, ["y^3 - z^2", "x^2 - y", "x*y - z", "x*z - y^2"])),
    );
  });

  it("agree with Buchberger's algorithm from the textbook, in many orders", () => {
    const r = ring("x y z");
    const phrases = [
      "graded revlex",
      "graded lex",
      "plain lex",
      "weights (3,1,2) then graded lex",
      "cells lex (y) revlex (x,z)",
    ];
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 3 }),
        fc.constantFrom(...phrases),
        (generators, phrase) => {
          const order = orderOf(r, phrase);
          const { elements } = basisOf(generators, order);
          expect(isReducedBasisOf(elements, generators, order)).toBe(true);
        },
      ),
      { numRuns: 150 },
    );
  });

  it("agree with the textbook for homogeneous ideals, and do not depend on how generators are given", () => {
    const r = ring("a b c d");
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 3, homogeneous: true }),
        fc.constantFrom("graded revlex", "graded lex", "plain lex"),
        fc.integer({ min: 2, max: 9 }),
        (generators, phrase, factor) => {
          const order = orderOf(r, phrase);
          const { elements } = basisOf(generators, order);
          expect(isReducedBasisOf(elements, generators, order)).toBe(true);
          const scaled = generators.map((f) => multiply(f, constant(r, BigInt(factor))));
          const again = [...scaled.reverse(), ...scaled, constant(r, 0n)];
          expect(termSets(basisOf(again, order).elements)).toEqual(termSets(elements));
        },
      ),
      { numRuns: 80 },
    );
  });

  it("of inhomogeneous ideals do not depend on how generators are given, nor on the primes", () => {
    const r = ring("x y z");
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 3 }),
        fc.constantFrom("graded revlex", "graded lex", "plain lex"),
        fc.integer({ min: 2, max: 9 }),
        (generators, phrase, factor) => {
          const order = orderOf(r, phrase);
          const wanted = termSets(basisOf(generators, order).elements);
          const scaled = generators.map((f) => multiply(f, constant(r, BigInt(-factor))));
          const again = [constant(r, 0n), ...scaled.reverse(), ...scaled];
          const primes = [2, 3, 5, 7, ...largePrimes];
          expect(termSets(basisOf(again, order, primes).elements)).toEqual(wanted);
        },
      ),
      { numRuns: 80 },
    );
  });

  it("are smallest leading monomial first, over the table, and name their primes", () => {
    const r = ring("x y z");
    const order = orderOf(r, "graded lex");
    const { elements, rows, table, primes } = basisOf(
      polynomials(r, ["x*y - 3*z^2", "x^2 - 5*y*z", "y^3 - z^3"]),
      order,
    );
    expect(primes.length).toBeGreaterThanOrEqual(2);
    expect(rows.map((row) => termSet(monicPolynomial(r, table, row)))).toEqual(
      elements.map(termSet),
    );
    const compare = monomialComparer(order);
    const leads = elements.map((f) => leadingMonomialOf(f, order));
    expect(leads).toEqual([...leads].sort(compare));
  });

  it("of the zero ideal and of the unit ideal are empty and 1", () => {
    const r = ring("x y");
    const order = orderOf(r, "graded revlex");
    expect(basisOf([], order).elements).toEqual([]);
    expect(basisOf(polynomials(r, ["0"]), order).elements).toEqual([]);
    expect(basisOf(polynomials(r, ["x", "x + 3"]), order).elements.map(termSet)).toEqual([
      "0,0:1/1",
    ]);
  });
});

describe("bad primes", () => {
  const r = ring("x y z");
  const order = orderOf(r, "graded lex");

  it.each([
    ["a prime that changes the leading monomial", ["7*x + y"], [7, 11, 13, 101, 103, 107, 109]],
    [
      "a prime that divides a leading coefficient inside",
      ["x^2 - y*z", "x*y - 7*z^2"],
      [7, 11, 13, 10007, 10009, 10037, 10039],
    ],
    [
      "primes that divide a denominator of the result",
      ["5*x*y - 3*z^2", "2*x^2 - y*z"],
      [2, 3, 5, 10007, 10009, 10037, 10039],
    ],
    [
      "only small primes at first",
      ["x^2 + 6*y^2", "x*y + 10*z^2 + 15*y*z"],
      [2, 3, 5, 7, 11, 13, 10007, 10009, 10037, 10039, 10061],
    ],
  ])("do not mislead: %s", (_, texts, primes) => {
    const generators = polynomials(r, texts);
    const found = rationalBasis(generators, order, unlimited(), { primes });
    const truth = basisOf(generators, order);
    expect(found.kind).toBe("basis");
    expect(termSets((found as RationalBasis).elements)).toEqual(termSets(truth.elements));
    expect(isReducedBasisOf(truth.elements, generators, order)).toBe(true);
  });

  // Modulo 7 the only S-polynomial, 7·y³, vanishes: what a run modulo 7 does works modulo every prime, but is not
  // enough. Homogeneous, graded revlex (membership by replay) and another order (by the graded basis).
  it.each([
    [["x*y", "x*z + 7*y^2"], "graded lex"],
    [["x*y", "x*z + 7*y^2 + 7*y"], "graded revlex"],
    [["x*y", "x*z + 7*y^2 + 7*y"], "graded lex"],
  ])("do not mislead when an S-polynomial vanishes modulo the first: %j, %s", (texts, phrase) => {
    const generators = polynomials(r, texts);
    const wanted = orderOf(r, phrase);
    const primes = [7, 10007, 10009, 10037, 10039, 10061];
    const { elements, primes: used } = basisOf(generators, wanted, primes);
    expect(isReducedBasisOf(elements, generators, wanted)).toBe(true);
    expect(elements.length).toBeGreaterThan(2);
    expect(used).not.toContain(7);
  });

  it("given twice count once", () => {
    const generators = polynomials(r, ["x*y - z^2", "x^2 - 3*y*z"]);
    const { elements, primes } = basisOf(generators, order, [101, 101, 103, 101, 107, 109]);
    expect(isReducedBasisOf(elements, generators, order)).toBe(true);
    expect(new Set(primes).size).toBe(primes.length);
  });

  it("are never trusted: a list of bad primes alone leaves the question undecided", () => {
    const outcome = rationalBasis(polynomials(r, ["7*x + y"]), order, unlimited(), { primes: [7] });
    expect(outcome).toMatchObject({ kind: "undecided", limit: "size" });
  });

  it("never give another basis than the true one, whatever the primes", () => {
    const small = [2, 3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37, 41, 43, 47];
    fc.assert(
      fc.property(
        randomIdeal(r, { terms: 3, degree: 2, generators: 3, homogeneous: true, coefficient: 30 }),
        fc.shuffledSubarray(small, { minLength: 4 }),
        (generators, primes) => {
          const found = rationalBasis(generators, order, unlimited(), { primes });
          if (found.kind === "undecided") return;
          expect(termSets(found.elements)).toEqual(termSets(basisOf(generators, order).elements));
        },
      ),
      { numRuns: 200 },
    );
  });
});

describe("limits of a computation", () => {
  it("end as undecided at once without any time, and say in which stage", () => {
    const generators = katsura(6);
    const order = gradedRevlex((generators[0] as Polynomial).ring);
    let time = 0;
    const now = (): number => time++;
    const outcome = rationalBasis(generators, order, startBudget({ seconds: 0, now }));
    expect(outcome).toMatchObject({ kind: "undecided", limit: "seconds" });
    expect((outcome as Undecided).reason).toMatch(
      /^after 0\.0 s, .*degree \d+|^after 0\.0 s, \w+ing /,
    );
  });

  it("end as undecided when the user cancels in the middle, in every stage of a long computation", () => {
    const generators = katsura(5);
    const order = orderOf((generators[0] as Polynomial).ring, "graded lex");
    const stages = new Set<string>();
    for (let stopAt = 1; ; stopAt = Math.ceil(stopAt * 1.3)) {
      let looks = 0;
      const cancelled = (): boolean => ++looks >= stopAt;
      const outcome = rationalBasis(generators, order, startBudget({ cancelled }));
      if (outcome.kind === "basis") break;
      expect(outcome.limit).toBe("cancelled");
      stages.add(outcome.reason.replace(/\d+/g, "#"));
    }
    expect([...stages].some((s) => s.includes("modulo"))).toBe(true);
    expect([...stages].some((s) => s.includes("in big integers"))).toBe(true);
    expect(stages.size).toBeGreaterThan(4);
  });

  it("end as undecided when the time is up", () => {
    const generators = katsura(7);
    const order = gradedRevlex((generators[0] as Polynomial).ring);
    const outcome = rationalBasis(generators, order, startBudget({ seconds: 0.001 }));
    expect(outcome).toMatchObject({ kind: "undecided", limit: "seconds" });
    expect((outcome as Undecided).reason).toMatch(/^after \d/);
  });

  it("end as undecided when an exponent overflows", () => {
    const r = ring("x y");
    const large = polynomials(r, ["x^65535 - y", "x*y - 1"]);
    expect(rationalBasis(large, orderOf(r, "plain lex"), unlimited())).toMatchObject({
      kind: "undecided",
      limit: "size",
    });
  });
});
