/** The name a user may have meant: the nearest known one by edit distance (Damerau, Levenshtein: a swap counts once). */

/** The longest word that is taken for a misspelt name; bounds the work. */
const LONGEST_WORD = 40;

/**
 * The nearest of the names, upper and lower case alike; undefined when none is within a third of the
 * word's length, or within one change for words of two or three letters.
 */
export function nearestName(word: string, names: readonly string[]): string | undefined {
  if (word.length > LONGEST_WORD) return undefined;
  const allowed = word.length === 2 ? 1 : Math.floor(word.length / 3);
  let nearest: string | undefined;
  let least = allowed + 1;
  for (const name of names) {
    const distance = editDistance(word.toLowerCase(), name.toLowerCase());
    if (distance < least) [nearest, least] = [name, distance];
  }
  return nearest;
}

function editDistance(a: string, b: string): number {
  let before: number[] = [];
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++) {
      const replaced = (row[j - 1] as number) + (a[i - 1] === b[j - 1] ? 0 : 1);
      const swapped =
        i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]
          ? (before[j - 2] as number) + 1
          : Infinity;
      next.push(Math.min(replaced, swapped, (row[j] as number) + 1, (next[j - 1] as number) + 1));
    }
    before = row;
    row = next;
  }
  return row[b.length] as number;
}
