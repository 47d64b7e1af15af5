/**
 * The polynomial reader: `x11*x22 - 3/2*x12^2*x21`, with parentheses, signs, powers, division by
 * constants and integers of any size. Recursive descent over one pass of tokens; every fault has its
 * line and column. Texts of any kind end in a value or a fault: nesting, numbers and expansion are bounded.
 *
 * ```text
 * sum     = [sign] product { sign product }
 * product = power { ("*" | "/") power }
 * power   = [sign] atom [ "^" integer ]
 * atom    = integer | variable | "(" sum ")"
 * ```
 */
import Fraction from "fraction.js";
import { LimitReached } from "../outcomes/budget.js";
import {
  faulty,
  type InputFault,
  type Place,
  placeAt,
  quote,
  type Reading,
  read,
} from "../outcomes/input-fault.js";
import { MAX_EXPONENT } from "./exponents.js";
import { nearestName } from "./nearest-name.js";
import {
  add,
  constant,
  divideByConstant,
  isZero,
  multiply,
  negate,
  type Polynomial,
  variable,
} from "./polynomial.js";
import { type PolynomialRing, type VariableIndex, variableNamed } from "./polynomial-ring.js";

/** Where a polynomial stands, when it is part of a larger text. */
export interface PolynomialSource {
  readonly file?: string;
  /** The place of an offset of the polynomial's text in the file; default: in the text itself. */
  readonly locate?: (offset: number) => { readonly place: Place; readonly excerpt: string };
}

/** Bounds that keep every text readable in a moment. */
const LIMITS = {
  depth: 200,
  digits: 100_000,
  terms: 100_000,
  products: 4_000_000,
  length: 4_000_000,
};

type TokenKind = "integer" | "name" | "sign" | "end" | "other";

interface Token {
  readonly kind: TokenKind;
  readonly text: string;
  readonly offset: number;
}

/** A fault on its way out of the descent; never leaves this file. */
class Fault extends Error {
  readonly offset: number;
  readonly expected: string | undefined;
  constructor(offset: number, message: string, expected?: string) {
    super(message);
    this.offset = offset;
    this.expected = expected;
  }
}

/** Reads a polynomial of the ring. */
export function readPolynomial(
  text: string,
  ring: PolynomialRing,
  source: PolynomialSource = {},
): Reading<Polynomial> {
  try {
    return read(new PolynomialParser(text, ring).whole());
  } catch (error) {
    if (error instanceof Fault) return faulty(located(text, error, source));
    if (error instanceof LimitReached) {
      const overflow = new Fault(0, error.message, `exponents up to ${MAX_EXPONENT}`);
      return faulty(located(text, overflow, source));
    }
    throw error;
  }
}

function located(
  text: string,
  { message, expected, offset }: Fault,
  { file, locate }: PolynomialSource,
): Omit<InputFault, "code"> {
  const { place, excerpt } = locate?.(offset) ?? {
    place: placeAt(text, offset),
    excerpt: lineAround(text, offset),
  };
  return {
    message,
    place,
    excerpt,
    ...(expected === undefined ? {} : { expected }),
    ...(file === undefined ? {} : { file }),
  };
}

function lineAround(text: string, offset: number): string {
  const start = text.lastIndexOf("\n", offset - 1) + 1;
  const end = text.indexOf("\n", offset);
  return text.slice(start, end === -1 ? undefined : end).slice(0, 10_000);
}

class PolynomialParser {
  readonly #text: string;
  readonly #ring: PolynomialRing;
  #token: Token;
  #depth = 0;
  /** Term products made so far: bounds the work of expanding. */
  #products = 0;

  constructor(text: string, ring: PolynomialRing) {
    if (text.length > LIMITS.length) {
      throw new Fault(0, "the text is too long", `at most ${LIMITS.length} characters`);
    }
    this.#text = text;
    this.#ring = ring;
    this.#token = this.#tokenAt(0);
  }

  whole(): Polynomial {
    if (this.#ended()) throw new Fault(0, "there is nothing to read", "a polynomial");
    const f = this.#sum();
    if (this.#ended()) return f;
    const { text, offset } = this.#token;
    if (text === ")") throw new Fault(offset, "a parenthesis is closed that was not opened");
    if (text === ".") throw new Fault(offset, "decimals are not exact", "a fraction such as 3/2");
    if (this.#token.kind === "other" && text !== "(") {
      throw new Fault(offset, `${quote(text)} cannot stand here`, "an operator: + - * / ^");
    }
    throw new Fault(
      offset,
      `an operator is missing before ${quote(text)}`,
      "products written with *",
    );
  }

  #sum(): Polynomial {
    const parts = [this.#product()];
    while (this.#token.kind === "sign") {
      const negative = this.#advance().text === "-";
      const term = this.#product();
      parts.push(negative ? negate(term) : term);
    }
    return sumOf(parts);
  }

  #product(): Polynomial {
    let f = this.#power();
    while (this.#token.text === "*" || this.#token.text === "/") {
      const operator = this.#advance();
      const start = this.#token.offset;
      const g = this.#power();
      f = operator.text === "*" ? this.#times(f, g, operator.offset) : this.#over(f, g, start);
    }
    return f;
  }

  #power(): Polynomial {
    if (this.#token.kind === "sign") {
      const negative = this.#advance().text === "-";
      const f = this.#nested(() => this.#power());
      return negative ? negate(f) : f;
    }
    const base = this.#atom();
    if (this.#token.text !== "^") return base;
    const { offset } = this.#advance();
    const { kind, text } = this.#advance();
    if (kind !== "integer")
      throw new Fault(offset + 1, "an exponent is missing", "a whole number after ^");
    const exponent = Number(text);
    if (!(exponent <= MAX_EXPONENT)) {
      throw new Fault(
        offset + 1,
        `the exponent ${quote(text)} is too large`,
        `at most ${MAX_EXPONENT}`,
      );
    }
    return this.#raised(base, exponent, offset);
  }

  #atom(): Polynomial {
    const token = this.#advance();
    if (token.kind === "integer") {
      if (token.text.length > LIMITS.digits) {
        throw new Fault(token.offset, "the number is too long", `at most ${LIMITS.digits} digits`);
      }
      return constant(this.#ring, new Fraction(BigInt(token.text)));
    }
    if (token.kind === "name") return variable(this.#ring, this.#variable(token));
    if (token.text === "(") {
      const f = this.#nested(() => this.#sum());
      if (this.#token.text !== ")") {
        throw new Fault(this.#token.offset, "a parenthesis is not closed", "a )");
      }
      this.#advance();
      return f;
    }
    const what =
      token.kind === "end"
        ? "the polynomial ends too early"
        : `${quote(token.text)} cannot stand here`;
    throw new Fault(token.offset, what, "a number, a variable or a (");
  }

  #variable(token: Token): VariableIndex {
    const index = variableNamed(this.#ring, token.text);
    if (index !== undefined) return index;
    const { variables } = this.#ring;
    const near = nearestName(token.text, variables);
    const list = variables.slice(0, 12).join(", ") + (variables.length > 12 ? ", …" : "");
    throw new Fault(
      token.offset,
      `unknown variable ${quote(token.text)}`,
      near === undefined ? `one of ${list}` : `${near}, perhaps; the variables are ${list}`,
    );
  }

  #nested<T>(descend: () => T): T {
    if (++this.#depth > LIMITS.depth) {
      throw new Fault(this.#token.offset, "nested too deeply", `at most ${LIMITS.depth} levels`);
    }
    const value = descend();
    this.#depth--;
    return value;
  }

  #times(f: Polynomial, g: Polynomial, offset: number): Polynomial {
    this.#products += f.monomials.length * g.monomials.length;
    if (this.#products > LIMITS.products) {
      throw new Fault(offset, "the expanded polynomial is too large", "fewer factors");
    }
    const product = multiply(f, g);
    if (product.monomials.length > LIMITS.terms) {
      throw new Fault(
        offset,
        "the expanded polynomial is too large",
        `at most ${LIMITS.terms} terms`,
      );
    }
    return product;
  }

  #over(f: Polynomial, g: Polynomial, offset: number): Polynomial {
    const [monomial] = g.monomials;
    if (g.monomials.length > 1 || monomial?.some((e) => e > 0)) {
      throw new Fault(offset, "division by something that is not a constant", "a non-zero number");
    }
    if (isZero(g)) throw new Fault(offset, "division by zero", "a non-zero number");
    return divideByConstant(f, g.numerators[0] as bigint, g.denominator);
  }

  #raised(base: Polynomial, exponent: number, offset: number): Polynomial {
    if (base.monomials.length === 1) return this.#monomialPower(base, exponent, offset);
    let power = constant(this.#ring, 1n);
    for (let k = 0; k < exponent && !isZero(power); k++) power = this.#times(power, base, offset);
    return power;
  }

  #monomialPower(base: Polynomial, exponent: number, offset: number): Polynomial {
    const monomial = new Uint16Array(this.#ring.variables.length);
    (base.monomials[0] as Uint16Array).forEach((e, v) => {
      if (e * exponent > MAX_EXPONENT) {
        throw new Fault(
          offset + 1,
          "the power has too large an exponent",
          `at most ${MAX_EXPONENT}`,
        );
      }
      monomial[v] = e * exponent;
    });
    const numerator = base.numerators[0] as bigint;
    const digits = (numerator * base.denominator).toString().length;
    if (digits * exponent > LIMITS.digits) {
      throw new Fault(
        offset + 1,
        "the power has too long a coefficient",
        `at most ${LIMITS.digits} digits`,
      );
    }
    const n = BigInt(exponent);
    return {
      ring: this.#ring,
      monomials: [monomial],
      numerators: [numerator ** n],
      denominator: base.denominator ** n,
    };
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
    const pattern = /\s*(?:(\d+)|([A-Za-z][A-Za-z0-9_]*)|([+-])|(\S))?/uy;
    pattern.lastIndex = start;
    const [whole = "", integer, name, sign, other] = pattern.exec(this.#text) ?? [];
    const text = integer ?? name ?? sign ?? other ?? "";
    const offset = start + whole.length - text.length;
    if (integer !== undefined) return { kind: "integer", text, offset };
    if (name !== undefined) return { kind: "name", text, offset };
    if (sign !== undefined) return { kind: "sign", text, offset };
    return { kind: other === undefined ? "end" : "other", text, offset };
  }
}

/* Adds in halves, so that long sums cost n log n and not n². */
function sumOf(parts: readonly Polynomial[]): Polynomial {
  if (parts.length === 1) return parts[0] as Polynomial;
  const half = parts.length >> 1;
  return add(sumOf(parts.slice(0, half)), sumOf(parts.slice(half)));
}
