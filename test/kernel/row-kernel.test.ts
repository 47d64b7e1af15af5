import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { plainRowKernel } from "../../src/kernel/row-kernel.js";

describe.each([2, 3, 32003, 67108859, 67108879, 1073741789, 2147483629, 2147483647])(
  "the row kernel modulo %i",
  (p) => {
    it("adds a multiple of a sparse row, as big integers do", () => {
      const value = fc.oneof(fc.integer({ min: 0, max: p - 1 }), fc.constantFrom(0, p - 1));
      fc.assert(
        fc.property(
          fc.array(value, { minLength: 12, maxLength: 12 }),
          fc.shuffledSubarray([0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11]),
          fc.array(value, { minLength: 12, maxLength: 12 }),
          value,
          (dense, columns, coefficients, multiplier) => {
            const accumulator = Float64Array.from(dense);
            const row = coefficients.slice(0, columns.length);
            plainRowKernel(p).addMultiple(
              accumulator,
              Int32Array.from(columns),
              Int32Array.from(row),
              multiplier,
            );
            const wanted = dense.map(BigInt);
            columns.forEach((c, k) => {
              const sum = (wanted[c] as bigint) + BigInt(multiplier) * BigInt(row[k] as number);
              wanted[c] = sum % BigInt(p);
            });
            expect(Array.from(accumulator, BigInt)).toEqual(wanted);
          },
        ),
      );
    });

    it("knows its prime", () => {
      expect(plainRowKernel(p).prime).toBe(p);
    });
  },
);
