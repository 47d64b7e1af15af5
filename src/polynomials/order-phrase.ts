/**
 * Orders as phrases, read and refused with a place. The phrases are those of `TermOrder.phrase`:
 *
 * ```text
 * order  = { "weights" "(" integers ")" ("then" | "refined by") } base
 * base   = "graded revlex" | "graded lex" | "plain lex"
 *        | ["plain"] rules "from" corner "by" lines
 *        | ["plain"] "cells" rule "(" variables ")" rule "(" variables ")" …
 *        | "dual" "from" corner "by" lines ["refined by" base]
 * rules  = rule | rule "," rule …      one for every line of the reading
 * ```
 * `refined by` instead of `then` makes the order partial.
 */
import { faulty, placeAt, quote, type Reading, read } from "../outcomes/input-fault.js";
import { CORNERS, isCorner } from "./corner.js";
import { gradedRevlex } from "./graded-revlex.js";
import { nearestName } from "./nearest-name.js";
import {
  type CellRule,
  cellRulesOrder,
  cornerOrder,
  dualOrder,
  lineRulesOrder,
  listedLex,
  type ReadingPath,
  type Rule,
  weightOrder,
} from "./orders.js";
import { type PolynomialRing, type VariableIndex, variableNamed } from "./polynomial-ring.js";
import { type TermOrder, variableBelowOne } from "./term-order.js";

/** What orders look like, for messages. */
export const ORDER_EXAMPLES =
  '"lex from nw by rows", "revlex from se by columns", "graded revlex" or "plain lex"';

const LONGEST_PHRASE = 100_000;
const KEYWORDS = ["lex", "revlex", "dual", "graded", "plain", "weights", "cells"];

interface Word {
  readonly text: string;
  readonly offset: number;
}

class Fault extends Error {
  readonly offset: number;
  readonly expected: string;
  constructor(offset: number, message: string, expected: string) {
    super(message);
    this.offset = offset;
    this.expected = expected;
  }
}

/** Reads the phrase of an order on the ring. */
export function readOrder(phrase: string, ring: PolynomialRing): Reading<TermOrder> {
  try {
    const order = new PhraseReader(phrase, ring).whole();
    const below = variableBelowOne(order);
    if (below !== undefined) {
      throw new Fault(
        0,
        `${quote(phrase)} is not a term order: ${ring.variables[below]} is smaller than 1`,
        "positive weights first, or the degree first",
      );
    }
    return read(order);
  } catch (error) {
    if (!(error instanceof Fault)) throw error;
    const { message, expected, offset } = error;
    const excerpt = phrase.split("\n")[placeAt(phrase, offset).line - 1] ?? "";
    return faulty({ message, expected, place: placeAt(phrase, offset), excerpt });
  }
}

class PhraseReader {
  readonly #words: readonly Word[];
  readonly #ring: PolynomialRing;
  readonly #length: number;
  #next = 0;

  constructor(phrase: string, ring: PolynomialRing) {
    if (phrase.length > LONGEST_PHRASE) {
      throw new Fault(0, "the order is too long", `at most ${LONGEST_PHRASE} characters`);
    }
    this.#words = [...phrase.matchAll(/[(),]|[^\s(),]+/gu)].map((m) => ({
      text: m[0],
      offset: m.index,
    }));
    this.#ring = ring;
    this.#length = phrase.length;
  }

  whole(): TermOrder {
    if (this.#words.length === 0) throw new Fault(0, "the order is empty", ORDER_EXAMPLES);
    const order = this.#order();
    const rest = this.#words[this.#next];
    if (rest !== undefined) {
      throw new Fault(
        rest.offset,
        `${quote(rest.text)} cannot follow ${quote(order.phrase)}`,
        "nothing more",
      );
    }
    return order;
  }

  #order(): TermOrder {
    const vectors: number[][] = [];
    const start = this.#offset();
    while (this.#takes("weights")) {
      vectors.push(this.#vector());
      if (this.#takes("then")) continue;
      if (this.#takes("refined")) {
        this.#must("by", '"refined by"');
        return this.#built(start, () => weightOrder(this.#ring, vectors, this.#base(), "partial"));
      }
      throw this.#unexpected('"then" or "refined by" and another order');
    }
    const base = this.#base();
    if (vectors.length === 0) return base;
    return this.#built(start, () => weightOrder(this.#ring, vectors, base, "total"));
  }

  #vector(): number[] {
    this.#must("(", "weights in parentheses, such as (1,0,2)");
    const weights: number[] = [];
    do {
      const { text, offset } = this.#word("a weight");
      if (!/^[+-]?\d+$/.test(text)) {
        throw new Fault(offset, `${quote(text)} is not a weight`, "a whole number");
      }
      weights.push(Number(text));
    } while (this.#takes(","));
    this.#must(")", "a , or a )");
    return weights;
  }

  #base(): TermOrder {
    const start = this.#offset();
    if (this.#takes("graded")) {
      if (this.#takes("revlex")) return gradedRevlex(this.#ring);
      if (this.#takes("lex")) return listedLex(this.#ring, true);
      throw this.#unexpected('"graded lex" or "graded revlex"');
    }
    const plain = this.#takes("plain");
    if (plain && this.#peek() === "lex" && this.#peek(1) !== "from") {
      this.#next++;
      return listedLex(this.#ring, false);
    }
    if (this.#takes("cells")) return this.#cells(start, !plain);
    if (!plain && this.#takes("dual")) return this.#dual(start);
    const rules = this.#rules();
    const path = this.#path();
    const [rule] = rules;
    if (rules.length === 1 && rule !== undefined) {
      return this.#built(start, () => cornerOrder(this.#ring, rule, path, !plain));
    }
    if (plain)
      throw new Fault(start, '"plain" goes with one rule only', '"plain lex from nw by rows"');
    return this.#built(start, () => lineRulesOrder(this.#ring, rules, path));
  }

  #dual(start: number): TermOrder {
    const path = this.#path();
    if (!this.#takes("refined")) return this.#built(start, () => dualOrder(this.#ring, path));
    this.#must("by", '"refined by" and an order');
    const refinement = this.#base();
    return this.#built(start, () => dualOrder(this.#ring, path, refinement));
  }

  #cells(start: number, degreeFirst: boolean): TermOrder {
    const cells: CellRule[] = [];
    do {
      const rule = this.#rule('"cells lex (z11,z12) revlex (z21,z22)"');
      this.#must("(", "variables in parentheses, such as (z11,z12)");
      const variables: VariableIndex[] = [];
      do {
        const { text, offset } = this.#word("a variable");
        const index = variableNamed(this.#ring, text);
        if (index === undefined) {
          throw new Fault(offset, `unknown variable ${quote(text)}`, "a variable of the ring");
        }
        variables.push(index);
      } while (this.#takes(","));
      this.#must(")", "a , or a )");
      cells.push({ rule, variables });
    } while (this.#peek() === "lex" || this.#peek() === "revlex");
    return this.#built(start, () => cellRulesOrder(this.#ring, cells, degreeFirst));
  }

  #rules(): Rule[] {
    const rules: Rule[] = [];
    do rules.push(this.#rule(ORDER_EXAMPLES));
    while (this.#takes(","));
    return rules;
  }

  #rule(expected: string): Rule {
    const { text, offset } = this.#word(expected);
    if (text === "lex" || text === "revlex") return text;
    const near = nearestName(text, KEYWORDS);
    const hint = near === undefined ? "" : `${near}, perhaps; `;
    throw new Fault(
      offset,
      `unknown rule ${quote(text)}`,
      `${hint}an order such as ${ORDER_EXAMPLES}`,
    );
  }

  #path(): ReadingPath {
    this.#must("from", '"from" and a corner: nw, ne, sw or se');
    const corner = this.#word("a corner: nw, ne, sw or se");
    if (!isCorner(corner.text)) {
      throw new Fault(
        corner.offset,
        `unknown corner ${quote(corner.text)}`,
        `one of ${CORNERS.join(", ")}`,
      );
    }
    this.#must("by", '"by rows" or "by columns"');
    const lines = this.#word("rows or columns");
    if (lines.text !== "rows" && lines.text !== "columns") {
      throw new Fault(lines.offset, `unknown lines ${quote(lines.text)}`, "rows or columns");
    }
    return { corner: corner.text, lines: lines.text };
  }

  /* Builders refuse what does not fit the ring; their words are turned into a fault with a place. */
  #built(start: number, build: () => TermOrder): TermOrder {
    try {
      return build();
    } catch (error) {
      if (!(error instanceof RangeError)) throw error;
      const [, expected = error.message, got] =
        /^expected (.*?)(?:, got (.*))?$/.exec(error.message) ?? [];
      throw new Fault(
        start,
        got === undefined ? "the order does not fit the variables" : `got ${got}`,
        expected,
      );
    }
  }

  #peek(ahead = 0): string | undefined {
    return this.#words[this.#next + ahead]?.text;
  }

  #offset(): number {
    return this.#words[this.#next]?.offset ?? this.#length;
  }

  #takes(text: string): boolean {
    const found = this.#peek() === text;
    if (found) this.#next++;
    return found;
  }

  #word(expected: string): Word {
    const word = this.#words[this.#next++];
    if (word === undefined) throw new Fault(this.#length, "the order ends too early", expected);
    return word;
  }

  #must(text: string, expected: string): void {
    if (!this.#takes(text)) throw this.#unexpected(expected);
  }

  #unexpected(expected: string): Fault {
    const word = this.#words[this.#next];
    if (word === undefined) return new Fault(this.#length, "the order ends too early", expected);
    return new Fault(word.offset, `${quote(word.text)} cannot stand here`, expected);
  }
}
