/**
 * Rank conditions of partial permutation matrices: `partial:2,0,1` has its dots at (1,2) and (3,1) and no
 * dot in row 2; `partial:2,0,1/4` has four columns.
 */
import { cornerSums } from "../combinatorics/corner-ranks.js";
import { faulty, quote, read } from "../outcomes/input-fault.js";
import { cornerTableIdeal } from "./corner-table-ideal.js";
import type { Family } from "./ideal.js";

const EXPECTED =
  "the column of the dot in each row, 0 for none, and the number of columns if it is larger: 2,0,1/4";

/** The family of partial permutation matrices. */
export const partialPermutationFamily: Family = {
  name: "partial",
  argument: "the columns of the dots, 0 where a row has none",
  description: "rank conditions of partial permutation matrices",
  example: "partial:2,0,1/4",
  read(argument) {
    const refuse = (why: string) =>
      faulty({
        message: `${quote(argument)} is no partial permutation: ${why}`,
        expected: EXPECTED,
      });
    const [, list = "", width] =
      /^\s*(\d{1,3}(?:\s*,\s*\d{1,3})*)\s*(?:\/\s*(\d{1,3}))?\s*$/.exec(argument) ?? [];
    if (list === "") return refuse("it cannot be read");
    const dots = list.split(",").map(Number);
    const columns = width === undefined ? Math.max(...dots, 1) : Number(width);
    const used = dots.filter((d) => d > 0);
    if (new Set(used).size < used.length) return refuse("two dots in one column");
    if (columns === 0) return refuse("it has no columns");
    if (used.some((d) => d > columns)) return refuse("a dot outside the columns");
    if (dots.length > 100 || columns > 100) return refuse("more than 100 rows or columns");
    const matrix = dots.map((dot) =>
      Array.from({ length: columns }, (_, j) => (dot === j + 1 ? 1 : 0)),
    );
    return read(cornerTableIdeal(`partial:${dots.join(",")}/${columns}`, cornerSums(matrix)));
  },
};
