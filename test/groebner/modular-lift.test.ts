import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { primeField } from "../../src/arithmetic/prime-field.js";
import { areImages, JoinedBases } from "../../src/groebner/modular-lift.js";
import { type ExactRow, exactRow, type ModularRow, modularRow } from "../../src/groebner/rows.js";
import { startBudget, unlimited, withinBudget } from "../../src/outcomes/budget.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { type Polynomial, polynomial } from "../../src/polynomials/polynomial.js";
import { orderOf, polynomials, ring } from "../support/reading.js";

const r = ring("x y z");
const order = orderOf(r, "graded lex");
const PRIMES = [67108859, 67108837, 67108819, 67108777, 67108763, 67108747];

/** The images of exact rows modulo a prime that divides no leading coefficient. */
function imagesOf(rows: readonly ExactRow[], p: number): ModularRow[] {
  return rows.map((row) => {
    const image = modularRow(primeField(p), row);
    if (image === undefined) throw new Error(`expected ${p} to divide no leading coefficient`);
    return image;
  });
}

/** Joins images prime by prime and lifts after each; the last lift. Early ones may be smaller rationals. */
function lastLift(table: MonomialTable, rows: readonly ExactRow[], primes: readonly number[]) {
  const joined = new JoinedBases();
  let lifted: ExactRow[] | undefined;
  for (const p of primes) {
    joined.add(p, imagesOf(rows, p));
    lifted = joined.reconstruct(table, unlimited());
    for (const q of lifted === undefined ? [] : joined.primes) {
      expect(areImages(primeField(q), lifted as ExactRow[], imagesOf(rows, q))).toBe(true);
    }
  }
  expect(joined.primes).toEqual(primes);
  return lifted;
}

describe("bases joined from their images", () => {
  const coefficient = fc.bigInt(-(10n ** 12n), 10n ** 12n);
  const element = fc
    .array(coefficient, { minLength: 3, maxLength: 3 })
    .chain((tail) => fc.bigInt(1n, 10n ** 12n).map((lead) => ({ lead, tail })));

  it("are lifted to the rows they are the images of; what is lifted before has the same images", () => {
    fc.assert(
      fc.property(fc.array(element, { minLength: 1, maxLength: 3 }), (elements) => {
        const table = new MonomialTable(order);
        const rows = elements.map(({ lead, tail }) => exactRow(table, linear([lead, ...tail])));
        expect(lastLift(table, rows, PRIMES)).toEqual(rows);
      }),
    );
  });

  function linear([lead, ...tail]: readonly bigint[]): Polynomial {
    const names = ["x^2", "x", "y", "z"];
    const [first, ...others] = polynomials(r, names).map((f) => f.monomials[0] as Uint16Array);
    return polynomial(r, [
      { monomial: first as Uint16Array, numerator: lead as bigint },
      ...others.map((monomial, k) => ({ monomial, numerator: tail[k] as bigint })),
    ]);
  }

  it("keep terms that vanish modulo some of the primes", () => {
    const table = new MonomialTable(order);
    const [p, q] = PRIMES;
    const rows = polynomials(r, [`x^2 + ${p}*x + ${q}*y + z`, `x*y - ${p}/${q}*z`]).map((f) =>
      exactRow(table, f),
    );
    // The second prime divides the second leading coefficient: it must not be used.
    const others = PRIMES.filter((prime) => prime !== q);
    expect(lastLift(table, rows, others)).toEqual(rows);
    expect(modularRow(primeField(q as number), rows[1] as ExactRow)).toBeUndefined();
  });

  it("lift when the element that needs most primes is not the first, and after failures", () => {
    const table = new MonomialTable(order);
    const large = 10n ** 30n + 57n;
    const rows = polynomials(r, ["x^2 - y", `x*y - ${large}*z`, "y^2 - 1/7*z"]).map((f) =>
      exactRow(table, f),
    );
    expect(lastLift(table, rows, PRIMES.slice(0, 4))).not.toEqual(rows);
    const more = [...PRIMES, 67108729, 67108721, 67108709];
    expect(lastLift(table, rows, more)).toEqual(rows);
  });

  it("of nothing are nothing", () => {
    const joined = new JoinedBases();
    joined.add(101, []);
    expect(joined.reconstruct(new MonomialTable(order), unlimited())).toEqual([]);
    expect(joined.primes).toEqual([101]);
  });

  it("stop lifting when the time is up", () => {
    const table = new MonomialTable(order);
    const texts = Array.from({ length: 20 }, (_, k) => `x^${k + 1} + y`);
    const rows = polynomials(r, texts).map((f) => exactRow(table, f));
    const joined = new JoinedBases();
    joined.add(101, imagesOf(rows, 101));
    let time = 0;
    const budget = startBudget({ seconds: 0.0005, now: () => time++ });
    expect(withinBudget(() => joined.reconstruct(table, budget))).toMatchObject({
      kind: "undecided",
      limit: "seconds",
      reason: "after 0.0 s, lifting 20 elements from 1 primes",
    });
  });
});

describe("areImages", () => {
  const table = new MonomialTable(order);
  const rows = polynomials(r, ["7*x^2 - y", "x*y - z"]).map((f) => exactRow(table, f));
  const field = primeField(101);
  const images = imagesOf(rows, 101);

  it("accepts the images", () => {
    expect(areImages(field, rows, images)).toBe(true);
  });

  it.each([
    ["fewer elements", ["7*x^2 - y"]],
    ["another coefficient", ["7*x^2 - 2*y", "x*y - z"]],
    ["another monomial", ["7*x^2 - z", "x*y - z"]],
    ["one more term", ["7*x^2 - y + z", "x*y - z"]],
  ])("refuses %s", (_, texts) => {
    const others = polynomials(r, texts).map((f) => exactRow(table, f));
    expect(areImages(field, rows, imagesOf(others, 101))).toBe(false);
  });

  it("refuses everything modulo a prime that divides a leading coefficient", () => {
    const same = polynomials(r, ["y", "x*y - z"]).map((f) => exactRow(table, f));
    expect(areImages(primeField(7), rows, imagesOf(same, 7))).toBe(false);
  });
});
