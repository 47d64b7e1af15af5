/**
 * Random expressions in the reader's grammar, written with random spaces and superfluous parentheses,
 * each with its value at a point, computed from the expression and not from a polynomial.
 */
import fc from "fast-check";
import Fraction from "fraction.js";

/** An expression: its text, and its value at a point. */
export interface Expression {
  readonly text: string;
  readonly value: (point: readonly Fraction[]) => Fraction;
}

/** How tightly an expression binds: what may stand beside it without parentheses. */
type Binding = "sum" | "product" | "atom";
type Bound = Expression & { readonly binding: Binding };

const space = fc.constantFrom("", "", "", " ", "  ", "\n", "\t");

function inside(e: Bound, ...allowed: Binding[]): string {
  return allowed.includes(e.binding) ? e.text : `(${e.text})`;
}

/** Random expressions in the given variables. */
export function randomExpression(variables: readonly string[]): fc.Arbitrary<Expression> {
  return fc.letrec<{ e: Bound }>((tie) => ({
    e: fc.oneof(
      { depthSize: "small", withCrossShrink: true },
      fc.nat({ max: 12 }).map(
        (n): Bound => ({
          text: String(n),
          binding: "atom",
          value: () => new Fraction(n),
        }),
      ),
      fc.nat({ max: variables.length - 1 }).map(
        (v): Bound => ({
          text: variables[v] as string,
          binding: "atom",
          value: (point) => point[v] as Fraction,
        }),
      ),
      fc.tuple(tie("e"), tie("e"), space, space, fc.boolean()).map(
        ([a, b, s, t, minus]): Bound => ({
          text: `${a.text}${s}${minus ? "-" : "+"}${t}${inside(b, "product", "atom")}`,
          binding: "sum",
          value: (p) => (minus ? a.value(p).sub(b.value(p)) : a.value(p).add(b.value(p))),
        }),
      ),
      fc.tuple(tie("e"), tie("e"), space, space).map(
        ([a, b, s, t]): Bound => ({
          text: `${inside(a, "product", "atom")}${s}*${t}${inside(b, "atom")}`,
          binding: "product",
          value: (p) => a.value(p).mul(b.value(p)),
        }),
      ),
      fc.tuple(tie("e"), fc.integer({ min: 1, max: 9 }), space).map(
        ([a, n, s]): Bound => ({
          text: `${inside(a, "product", "atom")}/${s}${n}`,
          binding: "product",
          value: (p) => a.value(p).div(n),
        }),
      ),
      fc.tuple(tie("e"), fc.nat({ max: 3 }), space).map(
        ([a, n, s]): Bound => ({
          text: `(${a.text})${s}^${s}${n}`,
          binding: "product",
          value: (p) => a.value(p).pow(n) ?? new Fraction(0),
        }),
      ),
      fc.tuple(tie("e"), space).map(
        ([a, s]): Bound => ({
          text: `-${s}${inside(a, "atom")}`,
          binding: "sum",
          value: (p) => a.value(p).neg(),
        }),
      ),
      fc
        .tuple(tie("e"), space)
        .map(([a, s]): Bound => ({ ...a, text: `(${s}${a.text}${s})`, binding: "atom" })),
    ),
  })).e;
}
