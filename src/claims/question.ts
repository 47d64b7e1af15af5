/** What a claim is asked about: an ideal, one of its generating sets, an order. */
import type { GeneratingSet, Ideal } from "../families/ideal.js";
import type { TermOrder } from "../polynomials/term-order.js";

/** One case of a claim. */
export interface Question {
  readonly ideal: Ideal;
  readonly generators: GeneratingSet;
  readonly order: TermOrder;
  /** What the problem file says of itself, handed on into the results. */
  readonly title?: string;
  readonly note?: string;
}
