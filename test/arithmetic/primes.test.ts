import { describe, expect, it } from "vitest";
import { FAST_PRIME_LIMIT, primesBelow } from "../../src/arithmetic/primes.js";

function first(limit: number, count: number): number[] {
  const found: number[] = [];
  for (const p of primesBelow(limit)) {
    found.push(p);
    if (found.length === count) break;
  }
  return found;
}

describe("primes below a limit", () => {
  it("come largest first, all of them", () => {
    expect([...primesBelow(30)]).toEqual([29, 23, 19, 17, 13, 11, 7, 5, 3, 2]);
    expect([...primesBelow(2)]).toEqual([]);
    expect([...primesBelow(3)]).toEqual([2]);
  });

  // The largest primes below 2^26 and 2^31 are 2^26 − 5 and 2^31 − 1: well-known tables (from memory).
  it("start with the known largest ones", () => {
    expect(first(FAST_PRIME_LIMIT, 1)).toEqual([2 ** 26 - 5]);
    expect(first(2 ** 31, 2)).toEqual([2 ** 31 - 1, 2 ** 31 - 19]);
  });

  it("are the same as a sieve gives", () => {
    const limit = 5000;
    const composite = new Set<number>();
    const sieved: number[] = [];
    for (let n = 2; n < limit; n++) {
      if (!composite.has(n)) sieved.push(n);
      for (let m = n * n; m < limit; m += n) composite.add(m);
    }
    expect([...primesBelow(limit)].reverse()).toEqual(sieved);
  });

  it("refuse a limit above 2^31", () => {
    expect(() => primesBelow(2 ** 31 + 1).next()).toThrow("expected a limit of at most 2^31");
    expect(() => primesBelow(10.5).next()).toThrow(RangeError);
  });
});
