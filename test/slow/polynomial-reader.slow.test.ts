/** Long fuzzing of the readers of polynomials and orders. */
import fc from "fast-check";
import { describe, it } from "vitest";
import { hostileOrder, hostilePolynomial } from "../support/hostile-readings.js";

describe("a hundred thousand random and mutated texts", () => {
  it("never throw in the polynomial reader, and what is read prints back to itself", () => {
    fc.assert(hostilePolynomial(), { numRuns: 100_000 });
  });

  it("never throw in the order reader, and what is read reads back to itself", () => {
    fc.assert(hostileOrder(), { numRuns: 100_000 });
  });
});
