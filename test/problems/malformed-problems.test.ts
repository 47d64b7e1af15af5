import { describe, expect, it } from "vitest";
import type { InputFault } from "../../src/outcomes/input-fault.js";
import { readProblem } from "../../src/problems/problem.js";

interface Malformed {
  readonly text: string;
  readonly line: number;
  readonly column: number;
  readonly message: string;
  readonly expected: string;
}

function faultOf(text: string, file?: string): InputFault {
  const problem = readProblem(text, file);
  if (problem.ok) throw new Error("expected a fault, got a problem");
  return problem.fault;
}

/* `▸` marks the place at which the fault must point; it is taken out before reading. */
function malformed(marked: string, message: string, expected: string): Malformed {
  const offset = marked.indexOf("▸");
  const before = marked.slice(0, offset).split("\n");
  return {
    text: marked.replace("▸", ""),
    line: before.length,
    column: (before.at(-1)?.length ?? 0) + 1,
    message,
    expected,
  };
}

const XY = "variables: {names: [x, y]}\n";
const Z3 = "variables: {matrices: [{name: z, rows: 3, columns: 3}]}\n";
const W = "ideal: {family: schubert:21}\n";
const P = `${XY}ideal: {polynomials: [x]}\n`;
const mapping = "a mapping with title, note, variables, ideal, generators, order, permutation";

const table: readonly Malformed[] = [
  // Texts that are no problem at all.
  malformed("▸", "the file is empty", "a problem: at least the key ideal"),
  malformed("▸   \n\n", "the file is empty", "a problem: at least the key ideal"),
  malformed("▸# only a comment\n", "the file is empty", "a problem: at least the key ideal"),
  malformed("▸---\n", "the file is empty", "a problem: at least the key ideal"),
  malformed("▸a sentence", "the problem is not right", mapping),
  malformed("▸[ideal]", "the problem is not right", mapping),
  malformed("title: a ▸\u0000\n", "the file is not text", "a text file"),
  malformed(
    "title: \u001b▸[31m\n".replace("\u001b▸", "▸\u001b"),
    "control characters",
    "a text file",
  ),
  // YAML.
  malformed("ideal:\n▸\tfamily: schubert:21\n", "a tab in the indentation", "spaces"),
  malformed('title: "abc▸', "Missing closing", "YAML or JSON"),
  malformed("ideal: {family: schubert:21▸", "Flow map", "YAML or JSON"),
  malformed("ideal: {}\n▸}\n", '"}" cannot stand here', "YAML or JSON"),
  malformed("title: ▸b: c\n", "Nested mappings", "YAML or JSON"),
  malformed("▸%YAML 1.1\n---\ntitle: a\n", 'a directive "%YAML 1.1"', "no directives"),
  malformed(`${W}▸---\n${W}`, "a second document", "one problem a file"),
  malformed(`${W}▸ideal: {}\n`, 'the key "ideal" stands twice', "each key once"),
  malformed("ideal: {family: a, ▸family: b}\n", 'the key "family" stands twice', "each key once"),
  malformed("ideal: &all ▸{family: a}\n", 'an anchor "all"', "no anchors"),
  malformed("title: &t ▸x\nnote: *t\n", 'an anchor "t"', "no anchors"),
  malformed("ideal: !code ▸{family: a}\n", 'a tag "!code"', "text, lists and mappings"),
  malformed("? ▸[a, b]\n: c\n", "a key that is no word", "one of the keys of a problem"),
  malformed("▸__proto__: {}\n", "a key that is no word", "one of the keys of a problem"),
  malformed(`ideal: ${"[".repeat(50)}▸[`, "nested too deeply", "at most 50 levels"),
  malformed(`▸${"- ".repeat(60)}x`, "nested too deeply", "at most 50 levels"),
  // Keys.
  malformed(`▸tite: a\n${W}`, 'unknown key "tite"', "title, perhaps"),
  malformed(`▸claims: []\n${W}`, 'unknown key "claims"', "one of title, note, variables"),
  malformed("▸idea: {family: schubert:21}\n", 'unknown key "idea"', "ideal, perhaps"),
  malformed("ideal: {▸famly: schubert:21}\n", 'unknown key "famly"', "family, perhaps"),
  malformed("ideal: {▸generator: []}\n", 'unknown key "generator"', "one of polynomials, family"),
  malformed(
    "▸title: a\n",
    "the key ideal is missing",
    "ideal: with polynomials, a family or ranks",
  ),
  malformed(`${W}title: ▸[a]\n`, "title is not right", "text"),
  malformed("ideal: ▸x\n", "ideal is not right", "polynomials, a family or ranks"),
  malformed("ideal: ▸{}\n", "the ideal is not given", "just one of polynomials, family, ranks"),
  malformed(`${XY}ideal: ▸{family: schubert:21, polynomials: [x]}\n`, "given twice", "just one of"),
  // Variables.
  malformed("▸ideal: {polynomials: [x]}\n", "the variables are not given", "variables: with names"),
  malformed(`${W}variables: ▸{names: [x]}\n`, "a family brings its own variables", "no variables"),
  malformed(`variables: ▸[x, y]\n${W}`, "variables is not right", "names or matrices"),
  malformed("variables: ▸{}\nideal: {polynomials: []}\n", "neither names nor matrices", "either"),
  malformed(
    "variables: ▸{names: [x], matrices: [{name: z, rows: 1, columns: 1}]}\nideal: {polynomials: []}\n",
    "names and matrices",
    "either names or matrices",
  ),
  malformed(
    "variables: {names: ▸[]}\nideal: {polynomials: []}\n",
    "not right",
    "at least one name",
  ),
  malformed("variables: {names: ▸x}\nideal: {polynomials: []}\n", "not right", "a list of names"),
  malformed(
    "variables: {names: [x, ▸x]}\nideal: {polynomials: []}\n",
    '"x" stands twice',
    "distinct",
  ),
  malformed("variables: {names: [▸1x]}\nideal: {polynomials: []}\n", '"1x" is no name', "a letter"),
  malformed(
    "variables: {matrices: [▸{name: z, rows: 3}]}\nideal: {polynomials: []}\n",
    "the key columns is missing",
    "name, rows, columns",
  ),
  malformed(
    "variables: {matrices: [{name: z, rows: ▸300, columns: 1}]}\nideal: {polynomials: []}\n",
    "variables.matrices.0.rows is not right",
    "a size from 1 to 100",
  ),
  malformed(
    "variables: {matrices: [{name: z, rows: ▸two, columns: 1}]}\nideal: {polynomials: []}\n",
    "variables.matrices.0.rows is not right",
    "a whole number",
  ),
  malformed(
    "variables: ▸{matrices: [{name: a, rows: 100, columns: 100}, {name: b, rows: 1, columns: 1}]}\nideal: {polynomials: []}\n",
    "10001 variables",
    "at most 10000",
  ),
  malformed(
    "variables: ▸{matrices: [{name: z, rows: 10, columns: 11}, {name: z1_, rows: 1, columns: 1}]}\nideal: {polynomials: []}\n",
    "the variables do not fit together",
    "distinct variables",
  ),
  malformed(
    "variables: {matrices: [{name: ▸z-, rows: 1, columns: 1}]}\nideal: {polynomials: []}\n",
    '"z-" is no name',
    "a letter",
  ),
  malformed(
    "variables:\n  matrices: [{name: x, rows: 2, columns: 3}, {name: y, rows: 2, columns: 3}]\n  pair: ▸[x, y]\nideal: {polynomials: []}\n",
    "the variables do not fit together",
    "x and y of transposed shapes",
  ),
  malformed(
    "variables: {names: [x], pair: ▸[x, x]}\nideal: {polynomials: []}\n",
    "a pair without matrices",
    "two matrices",
  ),
  malformed(
    "variables: {names: [x], degrees: {x: [1], y: ▸[2]}}\nideal: {polynomials: []}\n",
    'unknown variable "y"',
    "a variable of the ring",
  ),
  malformed(
    "variables: {names: [x, constructor], degrees: ▸{x: [1]}}\nideal: {polynomials: []}\n",
    "no degree for constructor",
    "a degree for every variable",
  ),
  malformed(
    "variables: {names: [x, y], degrees: ▸{x: [1], y: [1, 0]}}\nideal: {polynomials: []}\n",
    "degrees of different lengths",
    "vectors of one length",
  ),
  malformed(
    "variables: {names: [x], degrees: {x: [▸1.5]}}\nideal: {polynomials: []}\n",
    "variables.degrees.x.0 is not right",
    "an integer",
  ),
  // Polynomials: the place is that in the file, whatever the style of the text.
  malformed(`${XY}ideal:\n  polynomials:\n    - x + ▸w\n`, 'unknown variable "w"', "one of x, y"),
  malformed(`${XY}ideal:\n  polynomials:\n    - "x + ▸w"\n`, 'unknown variable "w"', "one of"),
  malformed(`${XY}ideal:\n  polynomials:\n    - 'x + ▸w'\n`, 'unknown variable "w"', "one of"),
  malformed(`${XY}ideal:\n  polynomials:\n    - x\n      + ▸w\n`, 'unknown variable "w"', "one of"),
  malformed(
    `${XY}ideal:\n  polynomials:\n    - |\n      x\n      + ▸w\n`,
    'unknown variable "w"',
    "one of x, y",
  ),
  malformed(
    `${XY}ideal:\n  polynomials:\n    - >-   # folded\n      x\n      + ▸w\n`,
    'unknown variable "w"',
    "one of x, y",
  ),
  malformed(`${XY}ideal: {polynomials: [▸"x \\u002b w"]}\n`, 'unknown variable "w"', "one of"),
  malformed(
    `{"variables": {"names": ["x"]},\n "ideal": {"polynomials": ["x", "x^▸"]}}`,
    "exponent",
    "",
  ),
  malformed(
    `${XY}ideal: {polynomials: [x ▸= y]}\n`,
    "an equation is not a polynomial",
    "difference",
  ),
  malformed(`${XY}ideal: {polynomials: ▸x}\n`, "ideal.polynomials is not right", "a list of"),
  malformed(`${XY}ideal: {polynomials: [x, ▸[y]]}\n`, "ideal.polynomials.1 is not right", "text"),
  malformed(
    "variables: {names: [x, y], degrees: {x: [1], y: [2]}}\nideal: {polynomials: [x^2 + y, ▸x + y]}\n",
    "not homogeneous: x has degree (1), y has degree (2)",
    "a generator that is homogeneous in the degrees given",
  ),
  // Families and ranks.
  malformed("ideal: {family: ▸shubert:21}\n", 'unknown family "shubert"', "schubert, perhaps"),
  malformed("ideal: {family: ▸schubert}\n", "the family schubert needs", "schubert:2143"),
  malformed('ideal: {family: "schubert:12▸a3"}\n', '"a" in', "a permutation"),
  malformed(
    `${Z3}ideal: {ranks: {matrix: ▸w, corner: nw, bounds: [{rows: 1, columns: 1, rank: 0}]}}\n`,
    'unknown matrix "w"',
    "one of z",
  ),
  malformed(
    `${XY}ideal: {ranks: {matrix: ▸z, corner: nw, bounds: [{rows: 1, columns: 1, rank: 0}]}}\n`,
    'unknown matrix "z"',
    "matrices among the variables",
  ),
  malformed(
    `${Z3}ideal: {ranks: {matrix: z, corner: ▸top, bounds: [{rows: 1, columns: 1, rank: 0}]}}\n`,
    "ideal.ranks.corner is not right",
    "nw, ne, sw or se",
  ),
  malformed(
    `${Z3}ideal: {ranks: {matrix: z, corner: nw, bounds: [▸{rows: 4, columns: 1, rank: 0}]}}\n`,
    "a corner of 4×1 in a 3×3 matrix",
    "a corner inside the matrix",
  ),
  malformed(
    `${Z3}ideal: {ranks: {matrix: z, corner: nw, bounds: [{rows: 2, columns: 1, rank: ▸-1}]}}\n`,
    "ideal.ranks.bounds.0.rank is not right",
    "a whole number from 0 to 9999",
  ),
  malformed(
    `${Z3}ideal: {ranks: {matrix: z, corner: nw, bounds: ▸[]}}\n`,
    "ideal.ranks.bounds is not right",
    "at least one bound",
  ),
  malformed(
    `${Z3}ideal: {ranks: ▸{matrix: z, corner: nw}}\n`,
    "the key bounds is missing",
    "matrix, corner, bounds",
  ),
  // Generators, permutation, order.
  malformed(`${W}generators: ▸cgd\n`, 'no generating set "cgd"', "one of fulton, cdg, defining"),
  malformed(`${P}generators: ▸fulton\n`, 'no generating set "fulton"', "one of given"),
  malformed(`${W}permutation: 2▸x\n`, '"x" in', "a permutation"),
  malformed(`${W}permutation: ▸231\n`, "does not fit the variables", "of the size of the first"),
  malformed(`${P}permutation: ▸21\n`, "does not fit the variables", "of the size of the first"),
  malformed(`${W}order: lex from ▸north by rows\n`, 'unknown corner "north"', "nw, ne, sw, se"),
  malformed(`${W}order: ▸lexx from nw by rows\n`, 'unknown rule "lexx"', "lex, perhaps"),
  malformed(`${P}order: ▸lex from nw by rows\n`, "matrix", "graded revlex"),
  malformed(`${P}order: ▸[graded, lex]\n`, "order is not right", "an order such as"),
  malformed(
    `${P}order: ▸{weights: [[1, 1]]}\n`,
    "weights alone do not order",
    "next or refinement",
  ),
  malformed(
    `${P}order: ▸{weights: [[1, 1]], next: graded lex, refinement: graded lex}\n`,
    "next and refinement",
    "either next or refinement",
  ),
  malformed(
    `${P}order: {weights: [[1, 1], ▸[1]], next: graded lex}\n`,
    "1 weights",
    "2, one for each variable",
  ),
  malformed(
    `${P}order: {weights: [{x: 1}, {▸w: 1}], next: graded lex}\n`,
    'unknown variable "w"',
    "a variable of the ring",
  ),
  malformed(`${P}order: {weights: [[1, ▸z]], next: graded lex}\n`, "not right", "an integer"),
  malformed(
    `${P}order: {weights: [[1, 1]], next: graded ▸up}\n`,
    '"up" cannot stand',
    "graded lex",
  ),
  malformed(`${P}order: {weights: [[1, 1]], refinement: ▸up}\n`, 'unknown rule "up"', "an order"),
  malformed(`${P}order: ▸{weights: [[-1, 1]], next: plain lex}\n`, "not a term order", "positive"),
  malformed(`${P}order: {weights: [], ▸nxt: plain lex}\n`, 'unknown key "nxt"', "next, perhaps"),
];

describe("readProblem", () => {
  it.each(table)("says of $text: $message", ({ text, line, column, message, expected }) => {
    const fault = faultOf(text, "note.yaml");
    expect(fault.place).toEqual({ line, column });
    expect(fault.message).toContain(message);
    expect(fault.expected).toContain(expected);
    expect(fault.file).toBe("note.yaml");
    expect(fault.excerpt).toBe(text.split("\n")[line - 1]);
  });

  it("names no file when the text came from none", () => {
    for (const { text } of table) expect(faultOf(text)).not.toHaveProperty("file");
  });

  it("shows lines that end in a carriage return without it", () => {
    const fault = faultOf("ideal: {family: schubert:21}\r\nordr: graded lex\r\n");
    expect(fault).toMatchObject({
      place: { line: 2, column: 1 },
      excerpt: "ordr: graded lex",
      expected: "order, perhaps",
    });
  });
});
