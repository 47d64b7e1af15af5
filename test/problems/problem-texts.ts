/** Problem files for property tests: well-formed ones of every kind, and texts broken out of them. */
import fc from "fast-check";

const polynomials = fc.constantFrom(
  "x - y",
  "3/2*(x*z - y^2)",
  "x^2*y - 1",
  "-x + 12345678901234567890*z",
  "0",
  "7",
);

const rank = fc.record({
  rows: fc.integer({ min: 1, max: 3 }),
  columns: fc.integer({ min: 1, max: 3 }),
  rank: fc.integer({ min: 0, max: 2 }),
});

const listedOrder = fc.constantFrom<unknown>(
  "graded revlex",
  "graded lex",
  "plain lex",
  "weights (1,0,2) then graded revlex",
  "weights (1,0,2) refined by graded lex",
  "cells lex (x) revlex (y,z)",
  { weights: [[1, 2, 3]], next: "plain lex" },
  { weights: [{ x: 1 }, { z: 2, y: 1 }], refinement: "graded revlex" },
);

const matrixOrder = fc.constantFrom<unknown>(
  "lex from se by columns",
  "revlex from ne by rows",
  "lex,revlex,lex from nw by rows",
  "plain lex from nw by rows",
  "graded revlex",
);

const heading = fc.record(
  { title: fc.string({ unit: "grapheme" }), note: fc.constant("two\nlines: [and] #signs") },
  { requiredKeys: [] },
);

const listed = fc.record({
  variables: fc.constant({ names: ["x", "y", "z"] }),
  ideal: fc.record({ polynomials: fc.array(polynomials, { maxLength: 4 }) }),
  order: listedOrder,
});

const graded = fc.record({
  variables: fc.constant({
    names: ["x", "y", "z"],
    degrees: { x: [1, 0], y: [1, 0], z: [-1, 2] },
  }),
  ideal: fc.constant({ polynomials: ["x - 2*y", "z^2", "x*z + y*z"] }),
  order: listedOrder,
});

const ranks = fc.record(
  {
    variables: fc.constant({ matrices: [{ name: "z", rows: 3, columns: 3 }] }),
    ideal: fc.record({
      ranks: fc.record({
        matrix: fc.constant("z"),
        corner: fc.constantFrom("nw", "ne", "sw", "se"),
        bounds: fc.array(rank, { minLength: 1, maxLength: 3 }),
      }),
    }),
    generators: fc.constantFrom("fulton", "defining"),
    order: matrixOrder,
    permutation: fc.constantFrom("132", "3,1,2"),
  },
  { requiredKeys: ["variables", "ideal"] },
);

const paired = fc.record({
  variables: fc.constant({
    matrices: [
      { name: "x", rows: 2, columns: 3 },
      { name: "y", rows: 3, columns: 2 },
    ],
    pair: ["x", "y"],
  }),
  ideal: fc.constant({ polynomials: ["x11*y11 + x12*y21 + x13*y31"] }),
  order: fc.constantFrom(
    "dual from nw by rows",
    "dual from se by columns refined by graded lex",
    "graded revlex",
  ),
});

const families = fc.record(
  {
    ideal: fc.constantFrom(
      { family: "schubert:2143" },
      { family: "schubert:1,3,2" },
      { family: "asm:0+0/+-+/0+0" },
      { family: "partial:2,0,1/4" },
      { family: "determinantal:3,3,1" },
    ),
    order: matrixOrder.filter((order) => order !== "lex,revlex,lex from nw by rows"),
  },
  { requiredKeys: ["ideal"] },
);

/** The content of a well-formed problem file of any kind. */
export const problemContents: fc.Arbitrary<Readonly<Record<string, unknown>>> = fc
  .tuple(heading, fc.oneof(listed, graded, ranks, paired, families))
  .map(([head, body]) => ({ ...head, ...body }));

const snippets = fc.oneof(
  fc.constantFrom(
    ..."{}[]:,-?&*!|>%@`'\"#\n\t ".split(""),
    "\u0000",
    "\ufeff",
    "\ud800",
    "\r\n",
    "---\n",
    "...\n",
    "- ",
    "*a",
    "&a ",
    "<<: ",
    "__proto__: ",
    "!!binary ",
    "x".repeat(1100),
    "[".repeat(60),
    "  ".repeat(60),
    "9".repeat(400),
    "(".repeat(300),
    "^65536",
    "schubert:",
    "weights (",
  ),
  fc.string({ unit: "binary", maxLength: 8 }),
);

/* Replaces, at some places of a text, some signs by others. */
function mutated(
  text: fc.Arbitrary<string>,
  put: fc.Arbitrary<string>,
  longest: number,
): fc.Arbitrary<string> {
  const where = fc.double({ min: 0, max: 1, noNaN: true });
  const edits = fc.array(fc.tuple(where, fc.nat(longest), put), { minLength: 1, maxLength: 4 });
  return fc.tuple(text, edits).map(([start, changes]) =>
    changes.reduce((changed, [share, gone, piece]) => {
      const at = Math.floor(share * changed.length);
      return changed.slice(0, at) + piece + changed.slice(at + gone);
    }, start),
  );
}

const written = problemContents.chain((content) =>
  fc.constantFrom(toYaml(content, 0), JSON.stringify(content)),
);
const harmless = fc.constantFrom(..."0123456789xyz +- ".split(""), "");

/** Texts that are problems, nearly problems, or nothing of the kind. */
export const hostileTexts: fc.Arbitrary<string> = fc.oneof(
  { weight: 8, arbitrary: mutated(written, snippets, 12) },
  { weight: 4, arbitrary: mutated(written, harmless, 1) },
  { weight: 1, arbitrary: fc.string({ unit: "binary", maxLength: 200 }) },
  { weight: 1, arbitrary: fc.array(snippets, { maxLength: 30 }).map((parts) => parts.join("")) },
  { weight: 1, arbitrary: fc.json() },
);

/** A content in block style, its texts quoted. */
export function toYaml(content: unknown, indent: number): string {
  const margin = " ".repeat(indent);
  if (Array.isArray(content) && content.length > 0) {
    return content.map((item) => `${margin}- ${JSON.stringify(item)}\n`).join("");
  }
  if (typeof content !== "object" || content === null || Array.isArray(content)) {
    return `${margin}${JSON.stringify(content)}\n`;
  }
  return Object.entries(content)
    .map(([key, value]) => `${margin}${key}:\n${toYaml(value, indent + 2)}`)
    .join("");
}
