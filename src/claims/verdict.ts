/** How claims end: what was decided, and how it is known. */

/** Does the claim hold? `undecided` when a limit was reached first. */
export type Verdict = "holds" | "fails" | "undecided";

/**
 * How a result is known: `proved` exactly over the rationals; `modular` modulo one or more primes, not
 * lifted; `undecided` when a limit was reached.
 */
export type Evidence = "proved" | "modular" | "undecided";
