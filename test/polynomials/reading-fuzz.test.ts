/** Any string comes back from the readers as a value or as a fault that helps. */
import fc from "fast-check";
import { describe, it } from "vitest";
import { readOrder } from "../../src/polynomials/order-phrase.js";
import { expectHelpful } from "../support/faults.js";
import { hostileOrder, hostilePolynomial } from "../support/hostile-readings.js";

describe("random and mutated texts", () => {
  it("never throw in the polynomial reader, and what is read prints back to itself", () => {
    fc.assert(hostilePolynomial(), { numRuns: 3000 });
  });

  it("never throw in the order reader, and what is read reads back to itself", () => {
    fc.assert(hostileOrder(), { numRuns: 3000 });
  });

  it("of ten million characters are refused as orders", () => {
    for (const piece of ["lex ", "(", "\n", "weights (1,2,3) then "]) {
      const text = piece.repeat(Math.floor(10_000_000 / piece.length));
      const reading = readOrder(text, { variables: ["x"], matrices: [] });
      if (reading.ok) throw new Error("expected a fault");
      if (piece !== "\n") expectHelpful(reading.fault, text);
    }
  });
});
