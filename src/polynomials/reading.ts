/**
 * The polynomial reader: `x11*x22 - 3/2*x12^2*x21`, with parentheses, signs, powers, division by
 * constants and integers of any size. Recursive descent over one pass of tokens; every fault has its
 * line and column. Any text ends in a moment: nesting, numbers and expansion are bounded.
 *
 * ```text
 * sum     = product { ("+" | "-") product }
 * product = factor { ("*" | "/") factor }
 * factor  = { "+" | "-" } atom [ "^" integer ]
 * atom    = integer | variable | "(" sum ")"
 * ```
 */
import { quote, type Reading } from "../outcomes/input-fault.js";
import { Expansion, LONGEST_NUMBER } from "./expansion.js";
import { MAX_EXPONENT } from "./exponents.js";
import { nearestName } from "./nearest-name.js";
import { constant, negate, type Polynomial, variable } from "./polynomial.js";
import type { PolynomialRing, VariableIndex } from "./polynomial-ring.js";
import { readingOf, TextFault, type TextSource } from "./text-fault.js";

/** The longest text that is read as one polynomial, in UTF-16 units. */
const LONGEST_TEXT = 1_000_000;
/** How deeply parentheses may be nested. */
const DEEPEST = 200;
/** Summands that wait before they are added up. */
const WAITING = 1000;
/** How many variables a message lists. */
const LISTED = 12;

/** Signs that are taken for those of the grammar, and what to write in their place. */
const LOOK_ALIKES: ReadonlyMap<string, string> = new Map([
  ["−", "-"],
  ["–", "-"],
  ["·", "*"],
  ["⋅", "*"],
  ["×", "*"],
  ["∗", "*"],
  ["÷", "/"],
  ["⁄", "/"],
  ["²", "^2"],
  ["³", "^3"],
  ["[", "("],
  ["]", ")"],
  ["{", "("],
  ["}", ")"],
]);

/** Where a polynomial stands, when it is part of a larger text. */
export type PolynomialSource = TextSource;

interface Token {
  readonly kind: "integer" | "name" | "sign" | "end" | "other";
  readonly text: string;
  readonly offset: number;
}

/**
 * Reads a polynomial of the ring. Never throws: a text that is none comes back as a fault.
 * @param source the file and the place of the text in it, when it is part of one.
 * @example readPolynomial("x11*x22 - 3/2*x12^2*x21", ring)
 */
export function readPolynomial(
  text: string,
  ring: PolynomialRing,
  source: PolynomialSource = {},
): Reading<Polynomial> {
  return readingOf(text, source, () => new PolynomialReader(text, ring).whole());
}

class PolynomialReader {
  readonly #text: string;
  readonly #ring: PolynomialRing;
  readonly #indices: ReadonlyMap<string, number>;
  readonly #expansion: Expansion;
  readonly #pattern = /\s*(?:(\d+)|([A-Za-z][A-Za-z0-9_]*)|([+-])|(\S))?/uy;
  #token: Token;
  #depth = 0;

  constructor(text: string, ring: PolynomialRing) {
    if (text.length > LONGEST_TEXT) {
      throw new TextFault(0, "the text is too long", `at most ${LONGEST_TEXT} characters`);
    }
    this.#text = text;
    this.#ring = ring;
    this.#indices = new Map(ring.variables.map((name, v) => [name, v]));
    this.#expansion = new Expansion(ring);
    this.#token = this.#tokenAt(0);
  }

  whole(): Polynomial {
    if (this.#ended()) throw new TextFault(0, "there is nothing to read", "a polynomial");
    const f = this.#sum();
    if (!this.#ended()) throw this.#trailing(this.#token);
    return f;
  }

  #sum(): Polynomial {
    let total = this.#product();
    let waiting: Polynomial[] = [];
    let terms = 0;
    while (this.#token.kind === "sign") {
      const sign = this.#advance();
      const f = this.#product();
      waiting.push(sign.text === "-" ? negate(f) : f);
      terms += f.monomials.length + 1;
      // Adding up once there are as many terms as the total has keeps memory and time in bounds.
      if (terms > total.monomials.length + WAITING) {
        total = this.#expansion.sum([total, ...waiting], sign.offset);
        waiting = [];
        terms = 0;
      }
    }
    return this.#expansion.sum([total, ...waiting], this.#token.offset);
  }

  #product(): Polynomial {
    let f = this.#factor();
    while (this.#token.text === "*" || this.#token.text === "/") {
      const operator = this.#advance();
      const { offset } = this.#token;
      const g = this.#factor();
      f =
        operator.text === "*"
          ? this.#expansion.product(f, g, operator.offset)
          : this.#expansion.quotient(f, g, offset);
    }
    return f;
  }

  #factor(): Polynomial {
    let negative = false;
    while (this.#token.kind === "sign") {
      if (this.#advance().text === "-") negative = !negative;
    }
    let f = this.#atom();
    if (this.#token.text === "^") {
      const { offset } = this.#advance();
      f = this.#expansion.power(f, this.#exponent(), offset);
    }
    return negative ? negate(f) : f;
  }

  #exponent(): number {
    const { kind, text, offset } = this.#advance();
    if (kind !== "integer") {
      const what = text === "-" ? "an exponent is negative" : "an exponent is missing";
      throw new TextFault(offset, what, "a whole number after ^");
    }
    const exponent = Number(text);
    if (exponent > MAX_EXPONENT) {
      const message = `the exponent ${quote(text)} is too large`;
      throw new TextFault(offset, message, `at most ${MAX_EXPONENT}`);
    }
    if (this.#token.text === "^") {
      throw new TextFault(
        this.#token.offset,
        "a power of a power is ambiguous",
        "parentheses, such as (x^2)^3",
      );
    }
    return exponent;
  }

  #atom(): Polynomial {
    const token = this.#advance();
    if (token.kind === "integer") return this.#integer(token);
    if (token.kind === "name") return variable(this.#ring, this.#variable(token));
    if (token.text === "(") return this.#parenthesis();
    if (token.kind === "end") {
      throw new TextFault(
        token.offset,
        "the polynomial ends too early",
        "a number, a variable or a (",
      );
    }
    if (token.text === "*" && this.#text[token.offset - 1] === "*") {
      throw new TextFault(token.offset - 1, 'unknown operator "**"', "^ for powers");
    }
    throw this.#misplaced(token, "a number, a variable or a (");
  }

  #integer({ text, offset }: Token): Polynomial {
    if (text.length > LONGEST_NUMBER) {
      throw new TextFault(offset, "the number is too long", `at most ${LONGEST_NUMBER} digits`);
    }
    return constant(this.#ring, BigInt(text));
  }

  #parenthesis(): Polynomial {
    if (++this.#depth > DEEPEST) {
      throw new TextFault(this.#token.offset, "nested too deeply", `at most ${DEEPEST} levels`);
    }
    const f = this.#sum();
    this.#depth--;
    const { kind, text, offset } = this.#token;
    if (kind === "end") throw new TextFault(offset, "a parenthesis is not closed", "a )");
    if (text !== ")") throw this.#trailing(this.#token);
    this.#advance();
    return f;
  }

  #variable({ text, offset }: Token): VariableIndex {
    const index = this.#indices.get(text);
    if (index !== undefined) return index as VariableIndex;
    const { variables } = this.#ring;
    const near = nearestName(text, variables);
    const list = variables.slice(0, LISTED).join(", ") + (variables.length > LISTED ? ", …" : "");
    throw new TextFault(
      offset,
      `unknown variable ${quote(text)}`,
      near === undefined ? `one of ${list}` : `${near}, perhaps; the variables are ${list}`,
    );
  }

  /* What is wrong with a token that follows a complete sum. */
  #trailing(token: Token): TextFault {
    const { kind, text, offset } = token;
    if (kind === "integer" || kind === "name" || text === "(") {
      return new TextFault(
        offset,
        `an operator is missing before ${quote(text)}`,
        "products written with *",
      );
    }
    if (text === ")") {
      return new TextFault(offset, "a parenthesis is closed that was not opened", "a ( before it");
    }
    return this.#misplaced(token, "an operator: + - * / ^");
  }

  #misplaced({ text, offset }: Token, expected: string): TextFault {
    if (text === "." && /\d/.test(this.#text.slice(Math.max(0, offset - 1), offset + 2))) {
      return new TextFault(offset, "decimals are not exact", "a fraction such as 3/2");
    }
    if (text === "=") {
      return new TextFault(
        offset,
        "an equation is not a polynomial",
        "the difference of its sides",
      );
    }
    const instead = LOOK_ALIKES.get(text);
    return new TextFault(
      offset,
      `${quote(text)} cannot stand here`,
      instead === undefined ? expected : `${instead} in its place`,
    );
  }

  #ended(): boolean {
    return this.#token.kind === "end";
  }

  #advance(): Token {
    const token = this.#token;
    this.#token = this.#tokenAt(token.offset + token.text.length);
    return token;
  }

  #tokenAt(start: number): Token {
    this.#pattern.lastIndex = start;
    const [whole = "", integer, name, sign, other] = this.#pattern.exec(this.#text) ?? [];
    const text = integer ?? name ?? sign ?? other ?? "";
    const offset = start + whole.length - text.length;
    if (integer !== undefined) return { kind: "integer", text, offset };
    if (name !== undefined) return { kind: "name", text, offset };
    if (sign !== undefined) return { kind: "sign", text, offset };
    return { kind: other === undefined ? "end" : "other", text, offset };
  }
}
