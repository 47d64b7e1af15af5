/**
 * What is known of an ideal: a Gröbner basis in some order, proved in an earlier answer about the same ideal or
 * promised by a theorem in the family's own order and checked exactly. From it the Hilbert function is known,
 * which drives every other order.
 */
import type { Ideal } from "../families/ideal.js";
import type { KnownBasis } from "../groebner/guided-basis.js";
import { verifyGenerators } from "../groebner/verification.js";
import { type Budget, LimitReached } from "../outcomes/budget.js";
import { readOrder } from "../polynomials/order-phrase.js";

const known = new WeakMap<Ideal, KnownBasis>();

/** Keeps a proved Gröbner basis of the ideal, unless one is known already. */
export function rememberBasis(ideal: Ideal, basis: KnownBasis): void {
  if (!known.has(ideal)) known.set(ideal, basis);
}

/** A proved Gröbner basis of the ideal that is at hand. */
export function rememberedBasis(ideal: Ideal): KnownBasis | undefined {
  return known.get(ideal);
}

/** The basis that a theorem promises, checked; undefined when there is none. @throws LimitReached */
export function promisedBasis(ideal: Ideal, budget: Budget): KnownBasis | undefined {
  if (ideal.defaultBasis === undefined) return undefined;
  const order = readOrder(ideal.defaultOrder, ideal.ring);
  if (!order.ok) return undefined;
  const [generators] = ideal.generatingSets;
  const verification = verifyGenerators(generators.polynomials(budget), order.value, budget);
  if (verification.kind === "undecided") throw new LimitReached(verification);
  if (verification.verdict === "fails") return undefined;
  rememberBasis(ideal, verification.generators);
  return verification.generators;
}
