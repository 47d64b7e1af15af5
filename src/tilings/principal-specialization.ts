/**
 * The value S_w(1,…,1) of the Schubert polynomial, which is the number of reduced ordinary and of reduced
 * bumpless pipe dreams of w. What has a closed form is taken out first: S_{u×v} = S_u · S_{1_m×v} for
 * u ∈ S_m, and vexillary permutations have flagged Schur polynomials, determinants of binomial
 * coefficients at 1. The factors that are left are counted as tilings.
 * @source Macdonald, *Notes on Schubert polynomials* (1991), for the product (from memory); Wachs, *Flagged
 * Schur functions, Schubert polynomials, and symmetrizing operators*, J. Combin. Theory Ser. A 40 (1985).
 */
import { containsPattern } from "../combinatorics/pattern-containment.js";
import { identity, type Permutation, permutation } from "../combinatorics/permutation.js";

const PATTERN_2143 = permutation([2, 1, 4, 3]);

/**
 * S_w(1,…,1).
 * @param count the number of tilings of a factor; called for those without a closed form.
 */
export function principalSpecialization(
  w: Permutation,
  count: (factor: Permutation) => bigint,
): bigint {
  return schubertFactors(w).reduce(
    (product, factor) => product * (vexillaryValue(factor) ?? count(factor)),
    1n,
  );
}

/**
 * For w = u_1 × u_2 × … with indecomposable u_k of sizes n_k > 1 (after and between them any number of fixed
 * points): the permutations 1_m × u_k, m being where u_k begins. The product of their Schubert
 * polynomials at 1 is that of w; for the identity it is empty.
 */
export function schubertFactors(w: Permutation): readonly Permutation[] {
  const factors: Permutation[] = [];
  let begin = 0;
  let largest = 0;
  for (const [i, value] of w.entries()) {
    largest = Math.max(largest, value);
    if (largest !== i + 1) continue;
    if (i > begin) {
      const fixed = begin === 0 ? [] : identity(begin);
      factors.push(permutation([...fixed, ...w.slice(begin, i + 1)]));
    }
    begin = i + 1;
  }
  return factors;
}

/**
 * S_w(1,…,1) of a vexillary permutation (one that avoids 2143) as det C(f_i + λ_i − i + j − 1, λ_i − i + j):
 * λ is the sorted code of w, and f the sorted list of the last places to which the code stays at least
 * c_i, over the i with c_i > 0. @returns undefined when w is not vexillary.
 */
export function vexillaryValue(w: Permutation): bigint | undefined {
  if (containsPattern(w, PATTERN_2143)) return undefined;
  const code = w.map((value, i) => w.slice(i + 1).filter((later) => later < value).length);
  const shape = code.filter((c) => c > 0).sort((a, b) => b - a);
  const flags = code
    .flatMap((c, i) => {
      const stop = code.findIndex((later, j) => j > i && later < c);
      return c === 0 ? [] : [stop === -1 ? w.length : stop];
    })
    .sort((a, b) => a - b);
  return determinant(
    shape.map((part, i) =>
      shape.map((_, j) => completeHomogeneousAtOne(part - i + j, flags[i] as number)),
    ),
  );
}

/* The number of monomials of a degree in so many variables. */
function completeHomogeneousAtOne(degree: number, variables: number): bigint {
  if (degree < 0) return 0n;
  let value = 1n;
  for (let k = 1; k <= degree; k++) value = (value * BigInt(variables + k - 1)) / BigInt(k);
  return value;
}

/* Fraction-free elimination (Bareiss); every division is exact. The empty determinant is 1. */
function determinant(matrix: readonly (readonly bigint[])[]): bigint {
  let rows = matrix.map((row) => [...row]);
  let divisor = 1n;
  let sign = 1n;
  while (rows.length > 0) {
    const k = rows.findIndex((row) => row[0] !== 0n);
    const top = rows[k];
    if (top === undefined) return 0n;
    if (k % 2 === 1) sign = -sign;
    rows.splice(k, 1);
    const pivot = top[0] as bigint;
    const last = divisor;
    rows = rows.map((row) =>
      row
        .slice(1)
        .map((entry, j) => (entry * pivot - (row[0] as bigint) * (top[j + 1] as bigint)) / last),
    );
    divisor = pivot;
  }
  return sign * divisor;
}
