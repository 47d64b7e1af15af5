/**
 * Rank conditions of alternating sign matrices: the corner sums bound the ranks. `asm:0+0/+-+/0+0` gives
 * the rows, `+` for 1, `-` for −1, `0` for 0.
 * @source Weigandt, *Bumpless pipe dreams and alternating sign matrices*, arXiv 2003.07342.
 */
import { cornerSums } from "../combinatorics/corner-ranks.js";
import { faulty, quote, read } from "../outcomes/input-fault.js";
import { cornerTableIdeal } from "./corner-table-ideal.js";
import type { Family } from "./ideal.js";

const EXPECTED = "rows of +, - and 0 separated by /, as many as columns: 0+0/+-+/0+0";

/** The family of alternating sign matrices. */
export const alternatingSignFamily: Family = {
  name: "asm",
  argument: "the rows of an alternating sign matrix",
  description: "rank conditions of alternating sign matrices",
  example: "asm:0+0/+-+/0+0",
  read(argument) {
    const rows = argument.trim().split("/");
    const refuse = (why: string) =>
      faulty({
        message: `${quote(argument)} is no alternating sign matrix: ${why}`,
        expected: EXPECTED,
      });
    if (rows.length > 100) return refuse("more than 100 rows");
    if (!rows.every((row) => /^[-+0]+$/.test(row) && row.length === rows.length)) {
      return refuse("it is not a square of the signs +, - and 0");
    }
    const matrix = rows.map((row) => Array.from(row, (c) => ({ "+": 1, "-": -1 })[c] ?? 0));
    const columns = matrix.map((_, j) => matrix.map((row) => row[j] as number));
    if (!matrix.every(alternates)) return refuse("the signs of a row do not alternate from + to +");
    if (!columns.every(alternates))
      return refuse("the signs of a column do not alternate from + to +");
    return read(cornerTableIdeal(`asm:${rows.join("/")}`, cornerSums(matrix)));
  },
};

/* Partial sums are 0 or 1 and the whole sum is 1. */
function alternates(line: readonly number[]): boolean {
  let sum = 0;
  for (const entry of line) {
    sum += entry;
    if (sum !== 0 && sum !== 1) return false;
  }
  return sum === 1;
}
