/** Monomial ideals for the tests of components: written as text, random, and from tables of the trade. */
import fc from "fast-check";
import { dividesExponents, type Exponents, totalDegree } from "../../src/polynomials/exponents.js";
import { type MonomialIdeal, monomialIdeal } from "../../src/polynomials/monomial-ideal.js";
import type { VariableIndex } from "../../src/polynomials/polynomial-ring.js";

/** A monomial in one-letter variables: `monomial("xyz", "x2y")`; `1` is the empty product. */
export function monomial(variables: string, text: string): Exponents {
  const exponents = new Uint16Array(variables.length);
  for (const [, letter = "", power = ""] of text.matchAll(/([a-z])(\d*)/g)) {
    const v = variables.indexOf(letter);
    exponents[v] = (exponents[v] as number) + (power === "" ? 1 : Number(power));
  }
  return exponents;
}

/** An ideal in one-letter variables: `idealOf("xy", "x2 xy")`. */
export function idealOf(variables: string, text: string): MonomialIdeal {
  const monomials = text.split(" ").filter((word) => word !== "");
  return monomialIdeal(
    variables.length,
    monomials.map((word) => monomial(variables, word)),
  );
}

/** The squarefree ideal with the given supports. */
export function idealOfSupports(
  variableCount: number,
  supports: readonly (readonly number[])[],
): MonomialIdeal {
  const monomials = supports.map((support) => {
    const exponents = new Uint16Array(variableCount);
    for (const v of support) exponents[v] = 1;
    return exponents;
  });
  return monomialIdeal(variableCount, monomials);
}

/** A random monomial ideal; the unit ideal and the zero ideal come up too. */
export function randomMonomialIdeal(options: {
  variables: number;
  generators: number;
  largest: number;
}): fc.Arbitrary<MonomialIdeal> {
  const { variables, generators, largest } = options;
  const exponent = fc.oneof(fc.constant(0), fc.nat({ max: largest }));
  const randomMonomial = fc
    .array(exponent, { minLength: variables, maxLength: variables })
    .map((exponents) => Uint16Array.from(exponents));
  return fc
    .array(randomMonomial, { maxLength: generators })
    .map((monomials) => monomialIdeal(variables, monomials));
}

/** A permutation of so many variables: variable v becomes number `permutation[v]`. */
export function randomRenaming(variables: number): fc.Arbitrary<number[]> {
  const all = Array.from({ length: variables }, (_, v) => v);
  return fc.shuffledSubarray(all, { minLength: variables, maxLength: variables });
}

/** The vector with its entries moved. */
export function renamed(exponents: Exponents, renaming: readonly number[]): Exponents {
  const moved = new Uint16Array(exponents.length);
  renaming.forEach((to, from) => {
    moved[to] = exponents[from] as number;
  });
  return moved;
}

/** The ideal with its variables renamed. */
export function renamedIdeal(ideal: MonomialIdeal, renaming: readonly number[]): MonomialIdeal {
  return monomialIdeal(
    ideal.variableCount,
    ideal.generators.map((g) => renamed(g, renaming)),
  );
}

/** Does the ideal contain the monomial? */
export function contains(ideal: MonomialIdeal, m: Exponents): boolean {
  return ideal.generators.some((g) => dividesExponents(g, m));
}

/** All subsets of 0 … n−1 with so many members, each ascending. */
function subsetsOfSize(n: number, size: number): number[][] {
  if (size === 0) return [[]];
  return subsetsOfSize(n, size - 1).flatMap((subset) => {
    const start = (subset.at(-1) ?? -1) + 1;
    return Array.from({ length: n - start }, (_, k) => [...subset, start + k]);
  });
}

/** The products of the main diagonals of all t-minors of an m×n matrix, variables row by row. */
export function diagonalIdeal(m: number, n: number, t: number): MonomialIdeal {
  const supports = subsetsOfSize(m, t).flatMap((rows) =>
    subsetsOfSize(n, t).map((columns) => rows.map((r, k) => r * n + (columns[k] as number))),
  );
  return idealOfSupports(m * n, supports);
}

/** Every exponent vector that is nowhere above a bound. */
export function* boxBelow(bound: readonly number[]): Generator<Exponents> {
  const exponents = new Uint16Array(bound.length);
  for (;;) {
    yield exponents.slice();
    let v = 0;
    while (v < bound.length && exponents[v] === bound[v]) exponents[v++] = 0;
    if (v === bound.length) return;
    exponents[v] = (exponents[v] as number) + 1;
  }
}

/** The largest exponent of each variable in the generators. */
export function lcmOfGenerators(ideal: MonomialIdeal): number[] {
  return Array.from({ length: ideal.variableCount }, (_, v) =>
    Math.max(0, ...ideal.generators.map((g) => g[v] as number)),
  );
}

/** Plain numbers as variables. */
export function variables(numbers: readonly number[]): VariableIndex[] {
  return numbers.map((v) => v as VariableIndex);
}

/** The complements of the facets that Gale's evenness condition gives: the cyclic polytope C(n, d). */
export function complementsOfCyclicFacets(n: number, d: number): number[][] {
  const all = Array.from({ length: n }, (_, v) => v);
  return subsetsOfSize(n, d)
    .filter((facet) => {
      const outside = all.filter((v) => !facet.includes(v));
      return outside.every((a, k) =>
        outside.slice(k + 1).every((b) => facet.filter((v) => a < v && v < b).length % 2 === 0),
      );
    })
    .map((facet) => all.filter((v) => !facet.includes(v)));
}

/** The tree ideal: (Π_{s ∈ S} x_s)^(n−|S|+1) over the non-empty sets S of n variables. */
export function treeIdeal(n: number): MonomialIdeal {
  const sets = [...boxBelow(new Array<number>(n).fill(1))].slice(1);
  return monomialIdeal(
    n,
    sets.map((set) => set.map((e) => e * (n - totalDegree(set) + 1))),
  );
}
