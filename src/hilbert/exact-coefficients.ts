/**
 * Integer coefficients that are doubles as long as those are exact and bigints from then on: in a deep
 * recursion only the few sums near the root pay for long integers.
 */

/** Coefficients of a polynomial in t, constant term first; the zero polynomial is empty. */
export type Coefficients = readonly bigint[];

/** Coefficients on the way: all doubles of at most 2⁵¹, or all bigints. */
export type PartialCoefficients = readonly number[] | readonly bigint[];

/* Sums of three such numbers are exact. */
const EXACT_LIMIT = 2 ** 51;

/** beside·(1−t^w) + t^w·below. */
export function combine(
  beside: PartialCoefficients,
  below: PartialCoefficients,
  weight: number,
): PartialCoefficients {
  if (areDoubles(beside) && areDoubles(below)) {
    const sum = combineDoubles(beside, below, weight);
    if (sum !== undefined) return sum;
  }
  return combineBigints(asBigints(beside), asBigints(below), weight);
}

/** The same coefficients as bigints. */
export function asBigints(coefficients: PartialCoefficients): Coefficients {
  return areDoubles(coefficients) ? coefficients.map(BigInt) : coefficients;
}

/** Leaves zeros at the end out, in place. */
export function trim<T extends number | bigint>(coefficients: T[]): T[] {
  while (coefficients.length > 0 && !coefficients.at(-1)) coefficients.pop();
  return coefficients;
}

function areDoubles(coefficients: PartialCoefficients): coefficients is readonly number[] {
  return typeof coefficients[0] !== "bigint";
}

/** Undefined when a coefficient passes the limit. */
function combineDoubles(
  beside: readonly number[],
  below: readonly number[],
  weight: number,
): number[] | undefined {
  const sum = new Array<number>(Math.max(beside.length, below.length) + weight).fill(0);
  for (let d = 0; d < beside.length; d++) {
    const c = beside[d] as number;
    sum[d] = (sum[d] as number) + c;
    sum[d + weight] = (sum[d + weight] as number) - c;
  }
  for (let d = 0; d < below.length; d++) {
    sum[d + weight] = (sum[d + weight] as number) + (below[d] as number);
  }
  return sum.every((c) => Math.abs(c) <= EXACT_LIMIT) ? trim(sum) : undefined;
}

function combineBigints(beside: Coefficients, below: Coefficients, weight: number): bigint[] {
  const sum = new Array<bigint>(Math.max(beside.length, below.length) + weight).fill(0n);
  for (let d = 0; d < beside.length; d++) {
    const c = beside[d] as bigint;
    sum[d] = (sum[d] as bigint) + c;
    sum[d + weight] = (sum[d + weight] as bigint) - c;
  }
  for (let d = 0; d < below.length; d++) {
    sum[d + weight] = (sum[d + weight] as bigint) + (below[d] as bigint);
  }
  return trim(sum);
}
