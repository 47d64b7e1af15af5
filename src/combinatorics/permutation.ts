/**
 * Permutations in one-line notation, `w = w(1)w(2)…w(n)`: written `214365` for n ≤ 9 and `2,1,4,3`
 * always. The permutation matrix has its dots at (i, w(i)).
 */
import { quote, type Reading } from "../outcomes/input-fault.js";
import { readingOf, TextFault } from "../polynomials/text-fault.js";

declare const permutationBrand: unique symbol;
/** The values w(1), …, w(n) of a permutation; n ≥ 1. */
export type Permutation = readonly number[] & { readonly [permutationBrand]: true };

/** The largest n of a permutation that is read from text. */
export const MAX_SIZE = 100;

const NOTATION = "a permutation such as 2143, or 2,1,4,3 (needed from n = 10 on)";
/** How many missing values a message lists. */
const LISTED = 8;

/**
 * Reads a permutation in either notation. Never throws: a text that is none comes back as a fault that
 * points at the first value that cannot stand.
 * @example readPermutation("2,1,4,3")
 */
export function readPermutation(text: string): Reading<Permutation> {
  return readingOf(text, {}, () => {
    const values = valuesIn(text);
    const fault = permutationFault(values.map(({ value }) => value));
    if (fault === undefined) return values.map(({ value }) => value) as unknown as Permutation;
    throw new TextFault(
      values[fault.index]?.offset ?? 0,
      `${quote(text.trim())} is no permutation: ${fault.message}`,
      fault.expected,
    );
  });
}

/** The permutation with the given values. @throws RangeError if they are not 1, …, n in some order. */
export function permutation(values: readonly number[]): Permutation {
  const fault = values.length === 0 ? { message: "it is empty" } : permutationFault(values);
  if (fault !== undefined) {
    throw new RangeError(`expected a permutation, got [${values}]: ${fault.message}`);
  }
  return [...values] as unknown as Permutation;
}

/** The permutation as text, without commas for n ≤ 9; reads back to the same. */
export function printPermutation(w: Permutation): string {
  return w.join(w.length <= 9 ? "" : ",");
}

/** The identity of S_n. @throws RangeError when n is not a positive integer. */
export function identity(n: number): Permutation {
  if (!Number.isInteger(n) || n < 1) throw new RangeError(`expected a size n ≥ 1, got ${n}`);
  return permutation(Array.from({ length: n }, (_, i) => i + 1));
}

/** The inverse. */
export function inverse(w: Permutation): Permutation {
  const values = new Array<number>(w.length);
  for (const [i, value] of w.entries()) values[value - 1] = i + 1;
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

/**
 * All permutations of S_n in lexicographic order, one at a time.
 * @throws RangeError when n is not a positive integer.
 */
export function* permutationsOf(n: number): Generator<Permutation, void> {
  const values: number[] = [...identity(n)];
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

/** A value in a text, and where it stands. */
interface PlacedValue {
  readonly value: number;
  readonly offset: number;
}

/** The values of either notation; whether they are a permutation is not looked at. @throws TextFault */
function valuesIn(text: string): PlacedValue[] {
  const start = text.search(/\S/);
  if (start === -1) throw new TextFault(0, "the permutation is empty", NOTATION);
  const stray = /[^\d,\s]/u.exec(text);
  if (stray !== null) {
    const [sign] = stray;
    throw new TextFault(stray.index, `${quote(sign)} in a permutation`, NOTATION);
  }
  if (!text.includes(",")) return digitsIn(text, start);
  const pieces = text.split(",");
  if (pieces.length > MAX_SIZE) {
    throw new TextFault(start, `a permutation of ${pieces.length} values`, `at most ${MAX_SIZE}`);
  }
  let end = -1;
  return pieces.map((piece) => {
    const before = end + 1;
    end = before + piece.length;
    const offset = before + Math.max(0, piece.search(/\d/));
    const digits = piece.trim();
    if (digits === "") throw new TextFault(before, "a value is missing", NOTATION);
    if (!/^\d+$/.test(digits)) {
      throw new TextFault(offset, `no comma between the values of ${quote(digits)}`, NOTATION);
    }
    return { value: Number(digits), offset };
  });
}

function digitsIn(text: string, start: number): PlacedValue[] {
  const digits = text.trim();
  if (/\s/.test(digits)) {
    const message = `the values of ${quote(digits)} are not separated by commas`;
    throw new TextFault(start, message, NOTATION);
  }
  if (digits.length > 9) {
    const message = `${quote(digits)} has ${digits.length} digits`;
    throw new TextFault(start, message, `at most 9 without commas; ${NOTATION}`);
  }
  return Array.from(digits, (digit, k) => ({ value: Number(digit), offset: start + k }));
}

/** The first value that keeps others from being a permutation; undefined if they are one. */
interface PermutationFault {
  readonly index: number;
  readonly message: string;
  readonly expected: string;
}

function permutationFault(values: readonly number[]): PermutationFault | undefined {
  const n = values.length;
  const seen = new Set<number>();
  for (const [index, value] of values.entries()) {
    const possible = Number.isInteger(value) && value >= 1 && value <= n;
    if (possible && !seen.has(value)) {
      seen.add(value);
      continue;
    }
    const message = possible
      ? `the value ${value} stands twice`
      : `the value ${value} is not one of 1, …, ${n}`;
    return { index, message, expected: `each of 1, …, ${n} once; ${missing(values)}` };
  }
  return undefined;
}

function missing(values: readonly number[]): string {
  const present = new Set(values);
  const absent = values.map((_, i) => i + 1).filter((value) => !present.has(value));
  const listed = absent.slice(0, LISTED).join(", ");
  const more = absent.length > LISTED ? ", …" : "";
  return `missing here: ${listed}${more}`;
}
