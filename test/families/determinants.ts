/**
 * Independent determinants for the tests of minors: the value of a polynomial at a point, and integer
 * determinants by fraction-free elimination (Bareiss 1968), which shares nothing with expansion.
 */
import type { Polynomial } from "../../src/polynomials/polynomial.js";

/** The value of a polynomial with integer coefficients at an integer point. */
export function evaluate(f: Polynomial, point: readonly bigint[]): bigint {
  let sum = 0n;
  f.monomials.forEach((monomial, k) => {
    let term = f.numerators[k] as bigint;
    monomial.forEach((e, v) => {
      term *= (point[v] as bigint) ** BigInt(e);
    });
    sum += term;
  });
  return sum / f.denominator;
}

/** The determinant of a square integer matrix. */
export function bareissDeterminant(entries: readonly (readonly bigint[])[]): bigint {
  const a = entries.map((row) => [...row]);
  const get = (i: number, j: number): bigint => a[i]?.[j] as bigint;
  let sign = 1n;
  let previous = 1n;
  for (let k = 0; k + 1 < a.length; k++) {
    const pivot = a.findIndex((_, i) => i >= k && get(i, k) !== 0n);
    if (pivot === -1) return 0n;
    if (pivot !== k) {
      [a[k], a[pivot]] = [a[pivot] as bigint[], a[k] as bigint[]];
      sign = -sign;
    }
    for (let i = k + 1; i < a.length; i++) {
      for (let j = k + 1; j < a.length; j++) {
        const row = a[i] as bigint[];
        row[j] = (get(i, j) * get(k, k) - get(i, k) * get(k, j)) / previous;
      }
    }
    previous = get(k, k);
  }
  return sign * (a.at(-1)?.at(-1) ?? 1n);
}

/** The rank of an integer matrix, by elimination without division. */
export function rankOf(entries: readonly (readonly bigint[])[]): number {
  const rows = entries.map((row) => [...row]);
  let rank = 0;
  for (let column = 0; column < (rows[0]?.length ?? 0); column++) {
    const pivot = rows.findIndex((row, i) => i >= rank && row[column] !== 0n);
    if (pivot === -1) continue;
    const lead = rows[pivot] as bigint[];
    rows[pivot] = rows[rank] as bigint[];
    rows[rank] = lead;
    for (let i = rank + 1; i < rows.length; i++) {
      const row = rows[i] as bigint[];
      const factor = row[column] as bigint;
      rows[i] = row.map((x, j) => x * (lead[column] as bigint) - factor * (lead[j] as bigint));
    }
    rank++;
  }
  return rank;
}

/** The sign of a permutation given by its values, by counting its cycles. */
export function parityOf(values: readonly number[]): 1 | -1 {
  const seen = new Set<number>();
  let even = values.length % 2 === 0;
  for (const start of values) {
    if (seen.has(start)) continue;
    for (let v = start; !seen.has(v); v = values[v - 1] as number) seen.add(v);
    even = !even;
  }
  return even ? 1 : -1;
}
