/** Linear spans of polynomials over the rationals, by Gaussian elimination on leading monomials. */
import { leadingMonomialOf } from "../../src/polynomials/leading-terms.js";
import { isZero, type Polynomial, subtract } from "../../src/polynomials/polynomial.js";
import type { TermOrder } from "../../src/polynomials/term-order.js";
import { monic } from "./buchberger.js";

/** A linear span that can grow, in echelon form. */
export class LinearSpan {
  readonly #order: TermOrder;
  readonly #echelon = new Map<string, Polynomial>();

  /** The span of some polynomials. */
  constructor(order: TermOrder, spanning: readonly Polynomial[]) {
    this.#order = order;
    for (const f of spanning) this.add(f);
  }

  /** Is f a linear combination? */
  contains(f: Polynomial): boolean {
    return isZero(this.#reduced(f));
  }

  /** Takes f in. */
  add(f: Polynomial): void {
    const rest = this.#reduced(f);
    if (isZero(rest)) return;
    this.#echelon.set(leadingMonomialOf(rest, this.#order).join(), monic(rest, this.#order));
  }

  #reduced(f: Polynomial): Polynomial {
    let rest = f;
    while (!isZero(rest)) {
      const lead = leadingMonomialOf(rest, this.#order);
      const row = this.#echelon.get(lead.join());
      if (row === undefined) return rest;
      rest = subtract(monic(rest, this.#order), row);
    }
    return rest;
  }
}
