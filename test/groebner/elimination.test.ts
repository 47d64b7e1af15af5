import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { primeField } from "../../src/arithmetic/prime-field.js";
import { DivisorSearch } from "../../src/groebner/divisor-search.js";
import { exactArithmetic } from "../../src/groebner/exact-elimination.js";
import { modularArithmetic } from "../../src/groebner/modular-elimination.js";
import type { EliminationMode, EliminationTask } from "../../src/groebner/row-arithmetic.js";
import {
  type ExactRow,
  exactRow,
  leadingMonomial,
  type ModularRow,
  modularRow,
  rowPolynomial,
} from "../../src/groebner/rows.js";
import { SymbolicPreprocessing } from "../../src/groebner/symbolic-preprocessing.js";
import { startBudget, type Undecided, unlimited, withinBudget } from "../../src/outcomes/budget.js";
import { MonomialTable } from "../../src/polynomials/monomial-table.js";
import { isZero, type Polynomial, polynomial } from "../../src/polynomials/polynomial.js";
import { randomPolynomial } from "../support/arbitraries.js";
import { monic, normalForm } from "../support/buchberger.js";
import { orderOf, polynomials, ring, termSet } from "../support/reading.js";

const r = ring("x y z");
const order = orderOf(r, "graded lex");

/** All that there is to find in a mode. */
function task(mode: EliminationMode): EliminationTask {
  return { mode, most: Infinity };
}

/** Reduces polynomials by a set, in one matrix over the integers. */
function reduceExactly(
  set: readonly Polynomial[],
  rows: readonly Polynomial[],
  mode: EliminationMode,
): { readonly remainders: Polynomial[]; readonly sources: number[] } {
  const table = new MonomialTable(order);
  const elements: ExactRow[] = [...set, ...rows].map((f) => exactRow(table, f));
  const matrix = matrixOf(table, elements, set.length);
  const left = exactArithmetic().eliminate(matrix, elements, task(mode), unlimited());
  return {
    remainders: left.map(({ row }) => rowPolynomial(r, table, row)),
    sources: left.map(({ source }) => source),
  };
}

function matrixOf(table: MonomialTable, elements: ExactRow[] | ModularRow[], divisors: number) {
  const search = new DivisorSearch(table);
  elements.slice(0, divisors).forEach((row, k) => {
    search.add(k, leadingMonomial(row));
  });
  const rows = elements
    .slice(divisors)
    .map((_, k) => ({ element: divisors + k, multiplier: table.one }));
  return new SymbolicPreprocessing(table).build(
    { rows, pivots: [] },
    elements,
    search,
    unlimited(),
  );
}

const scales = ["1", "3", "9007199254740993", "123456789012345678901234567890"];

describe("exact matrix reduction", () => {
  it.each(scales)("gives the textbook's normal form, coefficients times %s", (scale) => {
    const set = polynomials(r, [`x^2 - ${scale}*y*z + 2*z`, `${scale}*x*y - z^2`, "y^3 - 5*x"]);
    const factor = BigInt(scale);
    fc.assert(
      fc.property(randomPolynomial(r, { terms: 5, degree: 4 }), (f) => {
        if (isZero(f)) return;
        const scaled = polynomial(
          r,
          f.monomials.map((monomial, k) => ({
            monomial,
            numerator:
              k % 2 === 0 ? (f.numerators[k] as bigint) * factor : (f.numerators[k] as bigint),
          })),
        );
        // The leading monomials of this set are pairwise such that normal forms differ by the order of
        // reduction only through its choice of divisor: both take the first that divides.
        const { remainders } = reduceExactly(set, [scaled], "independent");
        const wanted = normalForm(scaled, set, order);
        expect(remainders.map((g) => termSet(monic(g, order)))).toEqual(
          isZero(wanted) ? [] : [termSet(monic(wanted, order))],
        );
      }),
      { numRuns: 60 },
    );
  });

  // Doubles are exact below 2⁵³; the bound is met at once, in the middle of a row, or never.
  it.each([1n, 94906265n, 94906266n, 2n ** 52n, 2n ** 53n - 1n, 2n ** 53n, 2n ** 53n + 1n])(
    "gives the same in doubles and in big integers, coefficients about %i",
    (size) => {
      const near = fc
        .tuple(fc.constantFrom(1n, -1n, size, -size), fc.bigInt(-3n, 3n))
        .map(([a, b]) => a + b);
      const random = fc.array(
        fc.tuple(randomPolynomial(r, { terms: 5, degree: 2 }), fc.array(near, { minLength: 5 })),
        { minLength: 2, maxLength: 5 },
      );
      const mode = fc.constantFrom<EliminationMode>("echelon", "independent", "tails");
      fc.assert(
        fc.property(random, mode, (list, chosen) => {
          const table = new MonomialTable(order);
          const fs = list.map(([f, factors]) =>
            polynomial(
              r,
              f.monomials.map((monomial, k) => ({ monomial, numerator: factors[k] as bigint })),
            ),
          );
          const small = fs.filter((f) => !isZero(f)).map((f) => exactRow(table, f));
          // Without `small` a row is reduced in big integers.
          const large = small.map((row): ExactRow => ({ ...row, small: undefined }));
          const reduce = (elements: ExactRow[]) => {
            const matrix = matrixOf(table, elements, Math.min(2, elements.length));
            return exactArithmetic()
              .eliminate(matrix, elements, task(chosen), unlimited())
              .map(({ row, source }) => [source, [...row.monomials], [...row.coefficients]]);
          };
          expect(reduce(small)).toEqual(reduce(large));
        }),
        { numRuns: 100 },
      );
    },
  );

  it("takes common factors out of long rows of big integers on the way", () => {
    // t0 becomes (b/a)^30·t30: every step multiplies the row, and what is left is one term, a common factor.
    // In "tails" mode t0 stays beside (b/a)^29·t30, and nothing cancels.
    const names = Array.from({ length: 31 }, (_, i) => `t${i}`);
    const many = ring(names.join(" "));
    const table = new MonomialTable(orderOf(many, "graded lex"));
    const [a, b] = [10n ** 20n + 1n, 10n ** 20n + 2n];
    const set = polynomials(
      many,
      names.slice(0, 30).map((name, i) => `${a}*${name} - ${b}*t${i + 1}`),
    );
    const reduce = (text: string, mode: EliminationMode): (readonly bigint[])[] => {
      const elements = [...set, ...polynomials(many, [text])].map((f) => exactRow(table, f));
      const matrix = matrixOf(table, elements, set.length);
      const left = exactArithmetic().eliminate(matrix, elements, task(mode), unlimited());
      return left.map(({ row }) => row.coefficients);
    };
    expect(reduce("t0", "independent")).toEqual([[1n]]);
    expect(reduce("t0 + t1", "tails")).toEqual([[a ** 29n, b ** 29n]]);
  });

  it("can be stopped inside a single greatest common divisor of long integers", () => {
    // Two neighbours in the Fibonacci sequence: the most divisions for their size.
    let [f, g] = [1n, 1n];
    for (let k = 0; k < 5000; k++) [f, g] = [g, f + g];
    const table = new MonomialTable(order);
    const elements = polynomials(r, [`${g}*x + y`, `${f}*x + z`]).map((h) => exactRow(table, h));
    const matrix = matrixOf(table, elements, 1);
    let time = 0;
    const budget = startBudget({ seconds: 0.2, now: () => time++ });
    const outcome = withinBudget(() =>
      exactArithmetic().eliminate(matrix, elements, task("independent"), budget),
    );
    expect(outcome).toMatchObject({ kind: "undecided", limit: "seconds" });
    expect((outcome as Undecided).reason).toMatch(
      /reducing a matrix of 3 columns in big integers$/,
    );
    expect(time).toBeLessThan(250);
  });

  it("in echelon mode gives the reduced echelon form", () => {
    const rows = polynomials(r, ["x + y + z", "x + 2*y - z", "x - y + 5*z", "2*x + 3*y"]);
    const { remainders } = reduceExactly([], rows, "echelon");
    const wanted = polynomials(r, ["x + 3*z", "y - 2*z"]);
    expect(remainders.map(termSet).sort()).toEqual(wanted.map(termSet).sort());
  });

  it("in independent mode rows do not reduce each other, in tails mode leading terms stay", () => {
    const rows = polynomials(r, ["x + y", "x + y + z"]);
    expect(reduceExactly([], rows, "independent").remainders.map(termSet)).toEqual(
      rows.map(termSet),
    );
    const { remainders, sources } = reduceExactly(
      polynomials(r, ["x - z", "y - 3*z"]),
      rows,
      "tails",
    );
    expect(remainders.map(termSet)).toEqual(polynomials(r, ["x + 3*z", "x + 4*z"]).map(termSet));
    expect(sources).toEqual([0, 1]);
  });

  it("names the rows that remainders came from", () => {
    const set = polynomials(r, ["x - z"]);
    const rows = polynomials(r, ["x*y - y*z", "x*y", "x - z"]);
    expect(reduceExactly(set, rows, "independent").sources).toEqual([1]);
  });
});

describe("modular matrix reduction", () => {
  it.each([10007, 32003, 67108859, 2147483647])("is the image of the exact one modulo %i", (p) => {
    const field = primeField(p);
    const set = polynomials(r, ["x^2 - 3*y*z + 2*z", "x*y - z^2", "y^3 - 5*x"]);
    fc.assert(
      fc.property(
        fc.array(randomPolynomial(r, { terms: 4, degree: 3 }), { minLength: 1, maxLength: 4 }),
        (fs) => {
          const rows = fs.filter((f) => !isZero(f));
          const table = new MonomialTable(order);
          const modular = [...set, ...rows].map((f) => modularRow(field, exactRow(table, f)));
          if (modular.includes(undefined)) return;
          const elements = modular.filter((row) => row !== undefined);
          const matrix = matrixOf(table, elements, set.length);
          const left = modularArithmetic(field).eliminate(
            matrix,
            elements,
            task("independent"),
            unlimited(),
          );
          const exact = reduceExactly(set, rows, "independent");
          const wanted = exact.remainders.flatMap((g, k) => {
            const image = modularRow(field, exactRow(table, g));
            return image === undefined ? [] : [{ source: exact.sources[k], image }];
          });
          // A remainder whose leading coefficient p divides has another image; the others must agree. (The
          // primes are larger than any content that these coefficients can have.)
          for (const { source, image } of wanted) {
            const found = left.find((l) => l.source === source);
            if (found === undefined) throw new Error("expected a remainder");
            expect(Array.from(found.row.monomials)).toEqual(Array.from(image.monomials));
            expect(Array.from(found.row.coefficients)).toEqual(Array.from(image.coefficients));
          }
        },
      ),
      { numRuns: 60 },
    );
  });
});
