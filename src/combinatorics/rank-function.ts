/** The rank function of a permutation and what is read off it: diagram, essential set, dominant part. */
import type { Cell } from "./cell.js";
import { inverse, type Permutation } from "./permutation.js";

/** `r_w(i,j) = #{a ≤ i : w(a) ≤ j}` as a table with rows and columns 0 … n. */
export function rankTable(w: Permutation): readonly (readonly number[])[] {
  const table = [new Array<number>(w.length + 1).fill(0)];
  for (const [i, value] of w.entries()) {
    table.push((table[i] as number[]).map((rank, j) => rank + (value <= j ? 1 : 0)));
  }
  return table;
}

/** The diagram D(w) = {(i,j) : w(i) > j, w⁻¹(j) > i}, row by row; it has ℓ(w) cells. */
export function diagram(w: Permutation): readonly Cell[] {
  const inverted = inverse(w);
  return w.flatMap((value, i) =>
    inverted.flatMap((place, j) =>
      value > j + 1 && place > i + 1 ? [{ row: i + 1, column: j + 1 }] : [],
    ),
  );
}

/**
 * The essential set: the cells (i,j) of D(w) with neither (i+1,j) nor (i,j+1) in D(w).
 * @source Fulton, *Flags, Schubert polynomials, degeneracy loci, and determinantal formulas*, Duke Math. J. 65 (1992).
 */
export function essentialSet(w: Permutation): readonly Cell[] {
  const cells = diagram(w);
  const keyOf = (row: number, column: number): number => row * (w.length + 1) + column;
  const inside = new Set(cells.map(({ row, column }) => keyOf(row, column)));
  return cells.filter(
    ({ row, column }) => !inside.has(keyOf(row + 1, column)) && !inside.has(keyOf(row, column + 1)),
  );
}

/** The dominant part: the cells of D(w) where r_w = 0. */
export function dominantPart(w: Permutation): readonly Cell[] {
  const ranks = rankTable(w);
  return diagram(w).filter(({ row, column }) => ranks[row]?.[column] === 0);
}
