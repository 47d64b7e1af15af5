/**
 * All primary components of a monomial ideal, embedded ones too. A squarefree ideal is the intersection
 * of its minimal primes; any other is decomposed into irreducible ideals, and those with one radical are
 * put together. The multiplicity of a minimal prime P is the length of the localisation: with the
 * variables outside P set to 1, the colength of what is left.
 * @source Miller, Sturmfels, *Combinatorial Commutative Algebra*, chapters 1 and 5.
 */

import { degreeOf, hilbertNumerator } from "../hilbert/hilbert-numerator.js";
import { type Budget, type Undecided, unlimited, withinBudget } from "../outcomes/budget.js";
import { type Exponents, lcmExponents } from "../polynomials/exponents.js";
import { isSquarefree, type MonomialIdeal, monomialIdeal } from "../polynomials/monomial-ideal.js";
import type { VariableIndex } from "../polynomials/polynomial-ring.js";
import { type IrreducibleIdeal, irreducibleDecomposition } from "./irreducible-decomposition.js";
import { type MonomialPrime, minimalPrimes } from "./minimal-primes.js";

/** One primary component of a monomial ideal. */
export interface PrimaryComponent {
  /** The variables that generate the associated prime, ascending. */
  readonly prime: MonomialPrime;
  readonly codimension: number;
  /** Of the prime: a coordinate subspace. */
  readonly degree: 1;
  /** Length of the localisation at a minimal prime; null for an embedded one. */
  readonly multiplicity: bigint | null;
  readonly embedded: boolean;
  /** The irreducible ideals whose intersection the component is. */
  readonly irreducibles: readonly IrreducibleIdeal[];
}

/**
 * The primary components, by codimension, then by prime; one for each associated prime. For an embedded
 * prime the component is not unique; this one is the intersection of the irreducible components with that
 * radical. The unit ideal has none.
 */
export function primaryComponents(
  ideal: MonomialIdeal,
  budget: Budget = unlimited(),
): readonly PrimaryComponent[] | Undecided {
  return withinBudget(() => {
    const components = isSquarefree(ideal)
      ? minimalPrimes(ideal, budget).map((prime) => primeComponent(ideal.variableCount, prime))
      : byRadical(ideal, irreducibleDecomposition(ideal, budget), budget);
    return components.sort(inOrder);
  });
}

/** The generators of a primary component. Cost: a product of sizes, for many irreducible ideals large. */
export function primaryIdeal(variableCount: number, component: PrimaryComponent): MonomialIdeal {
  let generators: readonly Exponents[] | undefined;
  for (const irreducible of component.irreducibles) {
    const powers = purePowers(irreducible);
    generators =
      generators === undefined
        ? powers
        : monomialIdeal(
            variableCount,
            generators.flatMap((g) => powers.map((p) => lcmExponents(g, p))),
          ).generators;
  }
  return monomialIdeal(variableCount, generators ?? []);
}

/** The length of (R/J)_P for a minimal prime P of J. @throws LimitReached */
export function multiplicityAt(ideal: MonomialIdeal, prime: MonomialPrime, budget: Budget): bigint {
  const localised = ideal.generators.map((g) => Uint16Array.from(prime, (v) => g[v] as number));
  return degreeOf(hilbertNumerator(monomialIdeal(prime.length, localised), budget));
}

function primeComponent(variableCount: number, prime: MonomialPrime): PrimaryComponent {
  const irreducible = new Uint16Array(variableCount);
  for (const v of prime) irreducible[v] = 1;
  return {
    prime,
    codimension: prime.length,
    degree: 1,
    multiplicity: 1n,
    embedded: false,
    irreducibles: [irreducible],
  };
}

function byRadical(
  ideal: MonomialIdeal,
  irreducibles: readonly IrreducibleIdeal[],
  budget: Budget,
): PrimaryComponent[] {
  const groups = new Map<string, { prime: MonomialPrime; members: IrreducibleIdeal[] }>();
  for (const irreducible of irreducibles) {
    const prime = supportOf(irreducible);
    const key = prime.join(" ");
    const group = groups.get(key) ?? { prime, members: [] };
    group.members.push(irreducible);
    groups.set(key, group);
  }
  // By size, a prime that contains another associated one contains a minimal one seen before.
  const minimal: MonomialPrime[] = [];
  const bySize = [...groups.values()].sort((a, b) => a.prime.length - b.prime.length);
  return bySize.map(({ prime, members }): PrimaryComponent => {
    budget.spend(() => `multiplicities of ${bySize.length} components`);
    const own = new Set(prime);
    const embedded = minimal.some((other) => other.every((v) => own.has(v)));
    if (!embedded) minimal.push(prime);
    return {
      prime,
      codimension: prime.length,
      degree: 1,
      multiplicity: embedded ? null : multiplicityAt(ideal, prime, budget),
      embedded,
      irreducibles: members,
    };
  });
}

function supportOf(irreducible: IrreducibleIdeal): MonomialPrime {
  return Array.from(irreducible.keys()).filter(
    (v) => (irreducible[v] as number) > 0,
  ) as VariableIndex[];
}

function purePowers(irreducible: IrreducibleIdeal): Exponents[] {
  return supportOf(irreducible).map((v) => {
    const power = new Uint16Array(irreducible.length);
    power[v] = irreducible[v] as number;
    return power;
  });
}

function inOrder(a: PrimaryComponent, b: PrimaryComponent): number {
  const byCodimension = a.codimension - b.codimension;
  if (byCodimension !== 0) return byCodimension;
  const k = a.prime.findIndex((v, i) => v !== b.prime[i]);
  return k === -1 ? 0 : (a.prime[k] as number) - (b.prime[k] as number);
}
