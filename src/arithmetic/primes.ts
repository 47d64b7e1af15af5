/**
 * The primes that modular computations use: the largest below a bound, downwards, so that every run
 * on every machine takes the same ones. Primality is `big-integer`'s (deterministic at this size).
 */
import bigInt from "big-integer";
import { PRIME_LIMIT } from "./prime-field.js";

/** One more than the largest prime for which the plain row kernel is at its fastest. */
export const FAST_PRIME_LIMIT = 2 ** 26;

/**
 * The primes below `limit`, largest first.
 * @throws RangeError if `limit` is above 2³¹.
 */
export function* primesBelow(limit: number): Generator<number, void> {
  if (!Number.isInteger(limit) || limit > PRIME_LIMIT) {
    throw new RangeError(`expected a limit of at most 2^31, got ${limit}`);
  }
  for (let candidate = limit - 1; candidate >= 2; candidate--) {
    if (bigInt(candidate).isPrime()) yield candidate;
  }
}
