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
  const known = listFor(limit);
  for (let k = 0; ; k++) {
    while (known.primes.length <= k && known.next >= 2) {
      if (bigInt(known.next).isPrime()) known.primes.push(known.next);
      known.next--;
    }
    const prime = known.primes[k];
    if (prime === undefined) return;
    yield prime;
  }
}

interface KnownPrimes {
  readonly primes: number[];
  /** The largest number that has not been tested. */
  next: number;
}

/** Lists that have been begun: short ideals take longer to find their primes than to compute with them. */
const begun = new Map<number, KnownPrimes>();

function listFor(limit: number): KnownPrimes {
  const known = begun.get(limit) ?? { primes: [], next: limit - 1 };
  begun.set(limit, known);
  return known;
}
