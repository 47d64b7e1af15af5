/** Permutations in tests. */
import fc from "fast-check";
import {
  inverse,
  type Permutation,
  permutation,
  readPermutation,
} from "../../src/combinatorics/permutation.js";
import { accepted } from "./reading.js";

/** A permutation from its one-line notation. */
export function perm(text: string): Permutation {
  return accepted(readPermutation(text));
}

/** A random permutation of a size in the range. */
export function randomPermutation(least: number, most: number): fc.Arbitrary<Permutation> {
  return fc
    .integer({ min: least, max: most })
    .chain((n) => {
      const values = Array.from({ length: n }, (_, i) => i + 1);
      return fc.shuffledSubarray(values, { minLength: n, maxLength: n });
    })
    .map(permutation);
}

/** 1, …, m, then m+k, …, m+1. */
export function reversedBehind(m: number, k: number): Permutation {
  return permutation(Array.from({ length: m + k }, (_, i) => (i < m ? i + 1 : 2 * m + k - i)));
}

/** The reduced words of w: the a_1 … a_l of least length with w = s_{a_1} ⋯ s_{a_l}. */
export function reducedWords(w: Permutation): number[][] {
  const words = w.flatMap((value, i) => {
    const next = w[i + 1];
    if (next === undefined || value < next) return [];
    const shorter = [...w.slice(0, i), next, value, ...w.slice(i + 2)];
    return reducedWords(permutation(shorter)).map((word) => [...word, i + 1]);
  });
  return words.length === 0 ? [[]] : words;
}

/**
 * The double Schubert polynomial S_w(x,y) at integers, by divided differences from Π_{i+j≤n} (x_i − y_j) for
 * the longest permutation. The x must be distinct.
 * @source Lascoux, Schützenberger, *Polynômes de Schubert*, C. R. Acad. Sci. Paris 294 (1982) (from memory).
 */
export function doubleSchubert(w: Permutation, x: readonly bigint[], y: readonly bigint[]): bigint {
  const n = w.length;
  const ascent = w.findIndex((value, i) => value < (w[i + 1] ?? 0));
  if (ascent === -1) {
    let product = 1n;
    for (let i = 0; i < n; i++) {
      for (let j = 0; i + j + 2 <= n; j++) product *= (x[i] as bigint) - (y[j] as bigint);
    }
    return product;
  }
  const longer = permutation(exchanged(w, ascent));
  const [a, b] = [x[ascent] as bigint, x[ascent + 1] as bigint];
  return (doubleSchubert(longer, x, y) - doubleSchubert(longer, exchanged(x, ascent), y)) / (a - b);
}

function exchanged<T>(list: readonly T[], i: number): T[] {
  return [...list.slice(0, i), list[i + 1] as T, list[i] as T, ...list.slice(i + 2)];
}

/** The rank of the northwest i×j corner of the permutation matrix, by counting its dots. */
export function cornerRank(w: Permutation, i: number, j: number): number {
  return w.slice(0, i).filter((value) => value <= j).length;
}

/** Is (i,j) in the diagram: does it lie left of the dot of its row and above the dot of its column? */
export function isInDiagram(w: Permutation, i: number, j: number): boolean {
  return (w[i - 1] ?? 0) > j && (inverse(w)[j - 1] ?? 0) > i;
}
