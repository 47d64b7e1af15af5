/**
 * Orders as phrases, read and refused with a place. The phrases are those of `TermOrder.phrase`:
 *
 * ```text
 * order      = { "weights" "(" integers ")" ("then" | "refined by") } base
 * base       = "graded revlex" | "graded lex" | "plain lex"
 *            | ["plain"] rule path
 *            | rule "," rule … path                 one rule for every line of the reading
 *            | ["plain"] "cells" rule "(" variables ")" rule "(" variables ")" …
 *            | "dual" path ["refined by" base]
 * path       = "from" corner "by" ("rows" | "columns")
 * ```
 * `refined by` instead of `then` makes an order by weights partial. A dual order is partial in any case,
 * so that `dual … then …` is read as `dual … refined by …`.
 */
import { quote, type Reading } from "../outcomes/input-fault.js";
import { CORNERS, isCorner } from "./corner.js";
import { gradedRevlex } from "./graded-revlex.js";
import { nearestName } from "./nearest-name.js";
import {
  type CellRule,
  cellRulesPiece,
  cornerPiece,
  dualOrder,
  lineRulesOrder,
  listedLex,
  MAX_WEIGHT,
  type Rule,
  weightPiece,
} from "./orders.js";
import { PhraseWords } from "./phrase-words.js";
import { type PolynomialRing, type VariableIndex, variableNamed } from "./polynomial-ring.js";
import { type ReadingPath, readAllLines } from "./reading-path.js";
import { type TermOrder, variableBelowOne } from "./term-order.js";
import { readingOf, TextFault } from "./text-fault.js";

/* What orders look like, for messages. */
const ORDER_EXAMPLES =
  '"lex from nw by rows", "revlex from se by columns", "graded revlex" or "plain lex"';

const LISTED_ORDERS = '"graded revlex", "graded lex" or "plain lex"';
const KEYWORDS = ["lex", "revlex", "dual", "graded", "plain", "weights", "cells"];

/**
 * Reads the phrase of an order on the ring. Never throws: what is no term order comes back as a fault.
 * @example readOrder("revlex from nw by rows", ring)
 */
export function readOrder(phrase: string, ring: PolynomialRing): Reading<TermOrder> {
  return readingOf(phrase, {}, () => {
    const order = new OrderReader(phrase, ring).whole();
    const below = variableBelowOne(order);
    if (below === undefined) return order;
    throw new TextFault(
      0,
      `${quote(phrase)} is not a term order: ${ring.variables[below]} is below 1`,
      'positive weights first, or the degree first (without "plain")',
    );
  });
}

class OrderReader {
  readonly #words: PhraseWords;
  readonly #ring: PolynomialRing;

  constructor(phrase: string, ring: PolynomialRing) {
    this.#words = new PhraseWords(phrase);
    this.#ring = ring;
  }

  whole(): TermOrder {
    const words = this.#words;
    if (words.peek() === undefined) throw new TextFault(0, "the order is empty", ORDER_EXAMPLES);
    const order = this.#order();
    const rest = words.peek();
    if (rest === undefined) return order;
    const message = `${quote(rest)} cannot follow ${quote(order.phrase)}`;
    throw new TextFault(words.offset(), message, "nothing more");
  }

  #order(): TermOrder {
    const vectors: number[][] = [];
    while (this.#words.takes("weights")) {
      vectors.push(this.#vector());
      if (this.#words.takes("then")) continue;
      this.#words.must("refined", '"then" or "refined by" and another order');
      this.#words.must("by", '"refined by" and another order');
      return weightPiece(this.#ring, vectors, this.#base(), "partial");
    }
    const base = this.#base();
    return vectors.length === 0 ? base : weightPiece(this.#ring, vectors, base, "total");
  }

  #vector(): number[] {
    const { variables } = this.#ring;
    const wanted = `${variables.length} weights, one for each variable`;
    this.#words.must("(", "weights in parentheses, such as (1,0,2)");
    const weights: number[] = [];
    do {
      const { text, offset } = this.#words.word("a weight");
      const weight = Number(text);
      if (!/^[+-]?\d+$/.test(text)) {
        throw new TextFault(offset, `${quote(text)} is not a weight`, "a whole number");
      }
      if (Math.abs(weight) > MAX_WEIGHT) {
        const message = `the weight ${quote(text)} is too large`;
        throw new TextFault(offset, message, `a whole number up to ${MAX_WEIGHT}`);
      }
      if (weights.length === variables.length) {
        throw new TextFault(offset, "there are more weights than variables", wanted);
      }
      weights.push(weight);
    } while (this.#words.takes(","));
    const end = this.#words.offset();
    this.#words.must(")", "a , or a )");
    if (weights.length === variables.length) return weights;
    throw new TextFault(end, "there are fewer weights than variables", wanted);
  }

  #base(): TermOrder {
    const words = this.#words;
    if (words.takes("graded")) {
      if (words.takes("revlex")) return gradedRevlex(this.#ring);
      words.must("lex", '"graded lex" or "graded revlex"');
      return listedLex(this.#ring, true);
    }
    const start = words.offset();
    const plain = words.takes("plain");
    if (plain && words.peek() === "lex" && ![",", "from"].includes(words.peek(1) ?? "")) {
      words.takes("lex");
      return listedLex(this.#ring, false);
    }
    if (words.takes("cells")) return this.#cells(!plain);
    if (!plain && words.takes("dual")) return this.#dual(start);
    return this.#byRules(start, plain);
  }

  #byRules(start: number, plain: boolean): TermOrder {
    const rules: Rule[] = [];
    do rules.push(this.#rule());
    while (this.#words.takes(","));
    if (this.#ring.matrices.length === 0) {
      throw new TextFault(start, "there is no matrix to read from a corner", LISTED_ORDERS);
    }
    const path = this.#path();
    const [rule] = rules;
    if (rule !== undefined && rules.length === 1) {
      return cornerPiece(this.#ring, rule, path, !plain);
    }
    if (plain) {
      throw new TextFault(start, '"plain" goes with one rule only', '"plain lex from nw by rows"');
    }
    const lines = readAllLines(this.#ring, path).length;
    if (rules.length !== lines) {
      const message = `there are ${rules.length} rules for ${lines} ${path.lines}`;
      throw new TextFault(start, message, "one rule for each, or one for all");
    }
    return lineRulesOrder(this.#ring, rules, path);
  }

  #dual(start: number): TermOrder {
    if (this.#ring.pair === undefined) {
      throw new TextFault(start, "there are no paired matrices to compare", ORDER_EXAMPLES);
    }
    const path = this.#path();
    if (this.#words.takes("refined")) this.#words.must("by", '"refined by" and an order');
    else if (!this.#words.takes("then")) return dualOrder(this.#ring, path);
    return dualOrder(this.#ring, path, this.#base());
  }

  #cells(degreeFirst: boolean): TermOrder {
    const words = this.#words;
    const cells: CellRule[] = [];
    const seen = new Set<VariableIndex>();
    do {
      const rule = this.#rule();
      const variables: VariableIndex[] = [];
      words.must("(", "variables in parentheses, such as (z11,z12)");
      do variables.push(this.#newVariable(seen));
      while (words.takes(","));
      words.must(")", "a , or a )");
      cells.push({ rule, variables });
    } while (words.peek() === "lex" || words.peek() === "revlex");
    const missing = this.#ring.variables.find((_, v) => !seen.has(v as VariableIndex));
    if (missing === undefined) return cellRulesPiece(this.#ring, cells, degreeFirst);
    throw new TextFault(words.offset(), `there is no rule for ${missing}`, "every variable once");
  }

  #newVariable(seen: Set<VariableIndex>): VariableIndex {
    const { text, offset } = this.#words.word("a variable");
    const index = variableNamed(this.#ring, text);
    if (index === undefined) {
      const near = nearestName(text, this.#ring.variables);
      const expected = near === undefined ? "a variable of the ring" : `${near}, perhaps`;
      throw new TextFault(offset, `unknown variable ${quote(text)}`, expected);
    }
    if (seen.has(index)) {
      throw new TextFault(offset, `a second rule for ${text}`, "every variable once");
    }
    seen.add(index);
    return index;
  }

  #rule(): Rule {
    const expected = `an order such as ${ORDER_EXAMPLES}`;
    const text = this.#words.peek();
    if (text === undefined || KEYWORDS.includes(text)) {
      if (this.#words.takes("lex")) return "lex";
      if (this.#words.takes("revlex")) return "revlex";
      throw this.#words.unexpected(expected);
    }
    const near = nearestName(text, KEYWORDS);
    throw new TextFault(
      this.#words.offset(),
      `unknown rule ${quote(text)}`,
      near === undefined ? expected : `${near}, perhaps; ${expected}`,
    );
  }

  #path(): ReadingPath {
    const words = this.#words;
    words.must("from", '"from" and a corner: nw, ne, sw or se');
    const corner = words.word("a corner: nw, ne, sw or se");
    if (!isCorner(corner.text)) {
      const message = `unknown corner ${quote(corner.text)}`;
      throw new TextFault(corner.offset, message, `one of ${CORNERS.join(", ")}`);
    }
    words.must("by", '"by rows" or "by columns"');
    const lines = words.word("rows or columns");
    if (lines.text !== "rows" && lines.text !== "columns") {
      const message = `unknown lines ${quote(lines.text)}`;
      throw new TextFault(lines.offset, message, "rows or columns");
    }
    return { corner: corner.text, lines: lines.text };
  }
}
