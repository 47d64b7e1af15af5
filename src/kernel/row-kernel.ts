/**
 * The inner loop of matrix reduction modulo a prime: a multiple of a sparse row is added to a dense
 * accumulator. This is the plain TypeScript form, the fallback and the oracle of any faster one: the
 * engine only sees `RowKernel`, so another implementation is another factory.
 */

/** The loops of one prime. Accumulators hold residues as doubles. */
export interface RowKernel {
  readonly prime: number;
  /**
   * accumulator[columns[k]] += multiplier · coefficients[k] modulo p, for all k.
   * All residues in 0 ≤ · < p; columns distinct.
   */
  addMultiple(
    accumulator: Float64Array,
    columns: Int32Array,
    coefficients: Int32Array,
    multiplier: number,
  ): void;
}

/** Below this, product plus accumulator stay under 2⁵² and one division by p is exact enough. */
const SMALL_PRIME_LIMIT = 2 ** 26;

/** The plain kernel for a prime below 2³¹. */
export function plainRowKernel(p: number): RowKernel {
  return p < SMALL_PRIME_LIMIT ? smallPrimeKernel(p) : largePrimeKernel(p);
}

/*
 * For x < 2⁵² the rounded quotient x/p never reaches the next integer: its rounding error is at most
 * (x/p)·2⁻⁵³ < 1/(2p), and the distance from x/p up to an integer is 0 or at least 1/p.
 */
function smallPrimeKernel(p: number): RowKernel {
  return {
    prime: p,
    addMultiple(accumulator, columns, coefficients, multiplier) {
      const length = columns.length;
      const unrolled = length & ~3;
      let k = 0;
      for (; k < unrolled; k += 4) {
        const c0 = columns[k]!;
        const c1 = columns[k + 1]!;
        const c2 = columns[k + 2]!;
        const c3 = columns[k + 3]!;
        const x0 = accumulator[c0]! + multiplier * coefficients[k]!;
        const x1 = accumulator[c1]! + multiplier * coefficients[k + 1]!;
        const x2 = accumulator[c2]! + multiplier * coefficients[k + 2]!;
        const x3 = accumulator[c3]! + multiplier * coefficients[k + 3]!;
        accumulator[c0] = x0 - Math.floor(x0 / p) * p;
        accumulator[c1] = x1 - Math.floor(x1 / p) * p;
        accumulator[c2] = x2 - Math.floor(x2 / p) * p;
        accumulator[c3] = x3 - Math.floor(x3 / p) * p;
      }
      for (; k < length; k++) {
        const c = columns[k]!;
        const x = accumulator[c]! + multiplier * coefficients[k]!;
        accumulator[c] = x - Math.floor(x / p) * p;
      }
    },
  };
}

/* The multiplier is split at 16 bits, so that both products stay below 2⁴⁸. */
function largePrimeKernel(p: number): RowKernel {
  return {
    prime: p,
    addMultiple(accumulator, columns, coefficients, multiplier) {
      const high = Math.floor(multiplier / 65_536);
      const low = multiplier - high * 65_536;
      for (let k = 0; k < columns.length; k++) {
        const c = columns[k]!;
        const a = coefficients[k]!;
        const x = high * a;
        const y = (x - Math.floor(x / p) * p) * 65_536 + low * a + accumulator[c]!;
        accumulator[c] = y - Math.floor(y / p) * p;
      }
    },
  };
}
