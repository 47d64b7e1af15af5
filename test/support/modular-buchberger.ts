/**
 * Buchberger's algorithm modulo a prime by the definitions (Cox, Little, O'Shea, *Ideals, Varieties, and
 * Algorithms*, chapter 2, sections 3, 6, 7): polynomials are maps from printed exponents to bigint
 * residues; no criteria, no tables, nothing of the library but the comparison of monomials.
 */
import type { Exponents } from "../../src/polynomials/exponents.js";
import { monomialComparer } from "../../src/polynomials/leading-terms.js";
import type { Polynomial } from "../../src/polynomials/polynomial.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";

type Residues = ReadonlyMap<string, bigint>;

/** Textbook computations modulo one prime in one order. */
export function textbookModulo(p: bigint, order: TermOrder) {
  const compare = monomialComparer(order);
  const exponents = (key: string): Exponents => Uint16Array.from(key.split(","), Number);

  function inverse(a: bigint): bigint {
    let [power, result, rest] = [a, 1n, p - 2n];
    for (; rest > 0n; rest >>= 1n, power = (power * power) % p) {
      if (rest & 1n) result = (result * power) % p;
    }
    return result;
  }

  function lead(f: Residues): string {
    return [...f.keys()].reduce((a, b) => (compare(exponents(a), exponents(b)) >= 0 ? a : b));
  }

  /** f − c·m·g, the monomial m by its exponents. */
  function minus(f: Residues, c: bigint, m: readonly number[], g: Residues): Residues {
    const result = new Map(f);
    for (const [key, value] of g) {
      const moved = Array.from(exponents(key), (e, v) => e + (m[v] as number)).join();
      const sum = ((((result.get(moved) ?? 0n) - c * value) % p) + p) % p;
      if (sum === 0n) result.delete(moved);
      else result.set(moved, sum);
    }
    return result;
  }

  function monic(f: Residues): Residues {
    const factor = inverse(f.get(lead(f)) as bigint);
    return new Map(Array.from(f, ([key, value]) => [key, (value * factor) % p]));
  }

  function quotient(a: string, b: string): number[] | undefined {
    const other = exponents(b);
    const difference = Array.from(exponents(a), (e, v) => e - (other[v] as number));
    return difference.some((e) => e < 0) ? undefined : difference;
  }

  /** The remainder of f by monic divisors. */
  function normalForm(f: Residues, divisors: readonly Residues[]): Residues {
    const remainder = new Map<string, bigint>();
    let rest = f;
    while (rest.size > 0) {
      const key = lead(rest);
      const value = rest.get(key) as bigint;
      const divisor = divisors.find((g) => quotient(key, lead(g)) !== undefined);
      if (divisor !== undefined) {
        rest = minus(rest, value, quotient(key, lead(divisor)) as number[], divisor);
      } else {
        remainder.set(key, value);
        rest = new Map([...rest].filter(([other]) => other !== key));
      }
    }
    return remainder;
  }

  function sPolynomial(f: Residues, g: Residues): Residues {
    const [a, b] = [lead(f), lead(g)].map(exponents) as [Exponents, Exponents];
    const lcm = a.map((e, v) => Math.max(e, b[v] as number)).join();
    const moved = minus(new Map(), -1n, quotient(lcm, lead(f)) as number[], f);
    return minus(moved, 1n, quotient(lcm, lead(g)) as number[], g);
  }

  return {
    /** The image of an integer polynomial; empty when it vanishes. */
    image(f: Polynomial): Residues {
      const terms = f.monomials.map((m, k): [string, bigint] => [
        m.join(),
        (((f.numerators[k] as bigint) % p) + p) % p,
      ]);
      return new Map(terms.filter(([, value]) => value !== 0n));
    },

    /** The reduced basis, each element a sorted list of `exponents:residue`, the list sorted. */
    reducedBasis(generators: readonly Residues[]): string[] {
      const basis = generators.filter((f) => f.size > 0).map(monic);
      for (let i = 0; i < basis.length; i++) {
        for (let j = 0; j < i; j++) {
          const pair = sPolynomial(basis[i] as Residues, basis[j] as Residues);
          const rest = normalForm(pair, basis);
          if (rest.size > 0) basis.push(monic(rest));
        }
      }
      const minimal = basis.filter((f, i) =>
        basis.every((g, j) => {
          if (i === j || quotient(lead(f), lead(g)) === undefined) return true;
          return lead(f) === lead(g) && i < j;
        }),
      );
      const reduced = minimal.map((f) =>
        normalForm(
          f,
          minimal.filter((g) => g !== f),
        ),
      );
      return reduced
        .map((f) =>
          Array.from(f, ([key, c]) => `${key}:${c}`)
            .sort()
            .join(" "),
        )
        .sort();
    },
  };
}
