/**
 * The shape of a problem file. All scalars are read as text (so that `2143`, `1/2` and `no` stay what was
 * typed); numbers are checked here.
 */
import { z } from "zod";

/** The largest number of variables that a problem file may declare. */
export const MAX_VARIABLES = 10_000;
/** As many bounds as the largest matrix has corners. */
const MAX_BOUNDS = 10_000;

const text = z.string({ error: "expected text" });
const filled = text.min(1, { error: "expected something here" });
const whole = text
  .regex(/^\d{1,4}$/, { error: "expected a whole number from 0 to 9999" })
  .transform(Number);
const size = whole.refine((n) => n >= 1 && n <= 100, { error: "expected a size from 1 to 100" });
const integer = text.regex(/^[+-]?\d{1,9}$/, { error: "expected an integer" }).transform(Number);

const matrix = z.strictObject(
  { name: filled, rows: size, columns: size },
  { error: "expected a matrix such as {name: z, rows: 3, columns: 3}" },
);

const variables = z.strictObject(
  {
    names: z
      .array(filled, { error: "expected a list of names" })
      .min(1, { error: "expected at least one name" })
      .optional(),
    matrices: z
      .array(matrix, { error: "expected a list of matrices" })
      .min(1, { error: "expected at least one matrix" })
      .optional(),
    pair: z
      .tuple([filled, filled], { error: "expected the names of two matrices such as [x, y]" })
      .optional(),
    degrees: z
      .record(
        filled,
        z
          .array(integer, { error: "expected a list of integers" })
          .min(1, { error: "expected at least one integer" }),
        {
          error: "expected a degree for each variable, such as {x: [1, 0], y: [0, 1]}",
        },
      )
      .optional(),
  },
  { error: "expected names or matrices" },
);

const bound = z.strictObject(
  { rows: size, columns: size, rank: whole },
  { error: "expected a bound such as {rows: 2, columns: 2, rank: 1}" },
);

const ranks = z.strictObject(
  {
    matrix: filled,
    corner: z.enum(["nw", "ne", "sw", "se"], { error: "expected nw, ne, sw or se" }),
    bounds: z
      .array(bound, { error: "expected a list of bounds" })
      .min(1, { error: "expected at least one bound" })
      .max(MAX_BOUNDS, { error: `expected at most ${MAX_BOUNDS} bounds` }),
  },
  { error: "expected matrix, corner and bounds" },
);

const ideal = z.strictObject(
  {
    polynomials: z.array(filled, { error: "expected a list of polynomials" }).optional(),
    family: filled.optional(),
    ranks: ranks.optional(),
  },
  { error: "expected polynomials, a family or ranks" },
);

const weightVector = z.union([z.array(integer), z.record(filled, integer)], {
  error: "expected weights such as [1, 0, 2] or {x: 1, z: 2}",
});

const weighted = z.strictObject({
  weights: z
    .array(weightVector, { error: "expected a list of weight vectors" })
    .min(1, { error: "expected at least one weight vector" }),
  next: filled.optional(),
  refinement: filled.optional(),
});

const order = z.union([filled, weighted], {
  error: "expected an order such as graded revlex, or weights with next or refinement",
});

/** A problem file after parsing, before its meaning is checked. */
export const problemSchema = z.strictObject(
  {
    title: text.optional(),
    note: text.optional(),
    variables: variables.optional(),
    ideal,
    generators: filled.optional(),
    order: order.optional(),
    permutation: filled.optional(),
  },
  {
    error: "expected a mapping with title, note, variables, ideal, generators, order, permutation",
  },
);

/** The checked shape. */
export type ProblemShape = z.output<typeof problemSchema>;

/** The keys that the mapping at a path of a problem file knows, in the order in which they are listed. */
export function knownKeys(path: readonly PropertyKey[]): readonly string[] {
  const where = path.map((key) => (typeof key === "number" ? "*" : String(key))).join(".");
  return Object.hasOwn(KEYS, where) ? (KEYS[where] ?? []) : [];
}

const KEYS: Readonly<Record<string, readonly string[]>> = {
  "": Object.keys(problemSchema.shape),
  variables: Object.keys(variables.shape),
  "variables.matrices.*": Object.keys(matrix.shape),
  ideal: Object.keys(ideal.shape),
  "ideal.ranks": Object.keys(ranks.shape),
  "ideal.ranks.bounds.*": Object.keys(bound.shape),
  order: Object.keys(weighted.shape),
};
