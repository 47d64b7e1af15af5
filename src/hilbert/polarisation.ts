/**
 * Polarisation with weights: a monomial ideal as a squarefree one on bits. A variable whose exponents in
 * the generators are e_1 < … < e_k becomes k bits of weights e_1, e_2−e_1, …; x^e_j is the product of the
 * first j. Hilbert numerators agree (Miller, Sturmfels, *Combinatorial Commutative Algebra*, exercise 3.15:
 * polarisation divides out a regular sequence).
 */
import type { MonomialIdeal } from "../polynomials/monomial-ideal.js";

/** A squarefree monomial ideal: minimal generators as bitsets, and the degree of each bit. */
export interface BitIdeal {
  readonly weights: readonly number[];
  readonly generators: readonly Int32Array[];
}

/** The polarisation of a monomial ideal. */
export function polarise(ideal: MonomialIdeal): BitIdeal {
  const steps: { readonly variable: number; readonly exponent: number }[] = [];
  const weights: number[] = [];
  for (let v = 0; v < ideal.variableCount; v++) {
    const exponents = [...new Set(ideal.generators.map((g) => g[v] as number))]
      .filter((e) => e > 0)
      .sort((a, b) => a - b);
    exponents.forEach((exponent, k) => {
      steps.push({ variable: v, exponent });
      weights.push(exponent - (exponents[k - 1] ?? 0));
    });
  }
  const words = Math.ceil(steps.length / 32);
  const generators = ideal.generators.map((g) => {
    const bits = new Int32Array(words);
    steps.forEach(({ variable, exponent }, bit) => {
      if ((g[variable] as number) >= exponent) {
        bits[bit >> 5] = (bits[bit >> 5] as number) | (1 << (bit & 31));
      }
    });
    return bits;
  });
  return { weights, generators };
}
