/**
 * Permutations in one-line notation, `w = w(1)w(2)…w(n)`: written `214365` for n ≤ 9 and `2,1,4,3`
 * always. The permutation matrix has its dots at (i, w(i)).
 */
import { faulty, quote, type Reading, read } from "../outcomes/input-fault.js";

declare const permutationBrand: unique symbol;
/** The values w(1), …, w(n) of a permutation; n ≥ 1. */
export type Permutation = readonly number[] & { readonly [permutationBrand]: true };

/** The largest n of a permutation that is read from text. */
export const MAX_SIZE = 100;

const NOTATION = "a permutation such as 2143, or 2,1,4,3 (needed from n = 10 on)";

/** Reads a permutation in either notation. */
export function readPermutation(text: string): Reading<Permutation> {
  const refuse = (message: string, expected = NOTATION, offset = 0): Reading<never> =>
    faulty({
      message,
      expected,
      place: { line: 1, column: offset + 1 },
      excerpt: text.slice(0, 400),
    });
  const trimmed = text.trim();
  if (trimmed === "") return refuse("the permutation is empty");
  const bad = /[^\d,\s]/u.exec(trimmed);
  if (bad !== null) {
    const offset = text.indexOf(trimmed) + bad.index;
    return refuse(`${quote(bad[0])} in the permutation ${quote(trimmed)}`, NOTATION, offset);
  }
  if (!trimmed.includes(",") && /\s/.test(trimmed)) {
    return refuse(`the values of ${quote(trimmed)} are not separated by commas`);
  }
  if (!trimmed.includes(",") && trimmed.length > 9) {
    return refuse(
      `${quote(trimmed)} has ${trimmed.length} digits`,
      `at most 9 without commas; ${NOTATION}`,
    );
  }
  const pieces = trimmed.includes(",") ? trimmed.split(",") : [...trimmed];
  if (pieces.length > MAX_SIZE) {
    return refuse(`a permutation of ${pieces.length} values`, `at most ${MAX_SIZE}`);
  }
  const values: number[] = [];
  for (const piece of pieces) {
    if (!/^\s*\d+\s*$/.test(piece)) {
      return refuse(`a value is missing or broken in ${quote(trimmed)}`);
    }
    values.push(Number(piece));
  }
  const fault = permutationFault(values);
  return fault === undefined
    ? read(values as unknown as Permutation)
    : refuse(`${quote(trimmed)} is no permutation: ${fault}`);
}

/** The permutation with the given values. @throws RangeError if they are not 1, …, n in some order. */
export function permutation(values: readonly number[]): Permutation {
  const fault = values.length === 0 ? "it is empty" : permutationFault(values);
  if (fault !== undefined)
    throw new RangeError(`expected a permutation, got [${values}]: ${fault}`);
  return [...values] as unknown as Permutation;
}

/** The permutation as text, without commas for n ≤ 9; reads back to the same. */
export function printPermutation(w: Permutation): string {
  return w.join(w.length <= 9 ? "" : ",");
}

/** The identity of S_n. */
export function identity(n: number): Permutation {
  return permutation(Array.from({ length: n }, (_, i) => i + 1));
}

/** The inverse. */
export function inverse(w: Permutation): Permutation {
  const values = new Array<number>(w.length);
  w.forEach((value, i) => {
    values[value - 1] = i + 1;
  });
  return values as unknown as Permutation;
}

/** The length ℓ(w): the number of inversions. */
export function length(w: Permutation): number {
  let inversions = 0;
  for (let i = 0; i < w.length; i++) {
    for (let j = i + 1; j < w.length; j++) {
      if ((w[i] as number) > (w[j] as number)) inversions++;
    }
  }
  return inversions;
}

/** The descents: the i with w(i) > w(i+1), from 1. */
export function descents(w: Permutation): readonly number[] {
  return w.flatMap((value, i) => (value > (w[i + 1] ?? Infinity) ? [i + 1] : []));
}

/** All permutations of S_n in lexicographic order, one at a time. */
export function* permutationsOf(n: number): Generator<Permutation, void> {
  const values = Array.from({ length: n }, (_, i) => i + 1);
  for (;;) {
    yield [...values] as unknown as Permutation;
    let i = n - 2;
    while (i >= 0 && (values[i] as number) > (values[i + 1] as number)) i--;
    if (i < 0) return;
    let j = n - 1;
    while ((values[j] as number) < (values[i] as number)) j--;
    [values[i], values[j]] = [values[j] as number, values[i] as number];
    values.splice(i + 1, n, ...values.slice(i + 1).reverse());
  }
}

/** Why values are no permutation, or undefined. */
function permutationFault(values: readonly number[]): string | undefined {
  const n = values.length;
  const seen = new Set<number>();
  for (const value of values) {
    if (!Number.isInteger(value) || value < 1 || value > n) {
      return `the value ${value} is not one of 1, …, ${n}`;
    }
    if (seen.has(value)) return `the value ${value} stands twice`;
    seen.add(value);
  }
  return undefined;
}
