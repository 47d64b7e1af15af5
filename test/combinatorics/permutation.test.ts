import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  descents,
  identity,
  inverse,
  length,
  MAX_SIZE,
  permutation,
  permutationsOf,
  printPermutation,
  readPermutation,
} from "../../src/combinatorics/permutation.js";
import { expectHelpful, refused } from "../support/faults.js";
import { mutated, randomText } from "../support/hostile-texts.js";
import { perm, randomPermutation } from "../support/permutations.js";
import { accepted } from "../support/reading.js";

describe("reading a permutation", () => {
  it("takes digits up to n = 9, and values with commas always", () => {
    expect(perm("2143")).toEqual([2, 1, 4, 3]);
    expect(perm("2,1,4,3")).toEqual([2, 1, 4, 3]);
    expect(perm("  2 , 1,4 ,\t3\n")).toEqual([2, 1, 4, 3]);
    expect(perm("1")).toEqual([1]);
    expect(perm("987654321")).toHaveLength(9);
    expect(perm("10,9,8,7,6,5,4,3,2,1")[0]).toBe(10);
  });

  it("takes up to a hundred values and no more", () => {
    const values = Array.from({ length: MAX_SIZE + 1 }, (_, i) => i + 1);
    expect(perm(values.slice(0, MAX_SIZE).join(","))).toHaveLength(MAX_SIZE);
    const fault = refused(readPermutation(values.join(",")));
    expect(fault).toMatchObject({
      message: "a permutation of 101 values",
      expected: "at most 100",
    });
  });

  it.each([
    ["1223", 3, '"1223" is no permutation: the value 2 stands twice', "missing here: 4"],
    ["0", 1, '"0" is no permutation: the value 0 is not one of 1, …, 1', "missing here: 1"],
    [
      "1, 5,3",
      4,
      '"1, 5,3" is no permutation: the value 5 is not one of 1, …, 3',
      "missing here: 2",
    ],
    [
      "1,1,1,1,1,1,1,1,1,1,1",
      3,
      "the value 1 stands twice",
      "missing here: 2, 3, 4, 5, 6, 7, 8, 9, …",
    ],
    ["99999999999", 1, '"99999999999" has 11 digits', "at most 9 without commas"],
    ["  1234567890", 3, '"1234567890" has 10 digits', "at most 9 without commas"],
    ["99999999999,1", 1, "the value 99999999999 is not one of 1, …, 2", "each of 1, …, 2 once"],
    ["", 1, "the permutation is empty", "such as 2143"],
    [" \n\t", 1, "the permutation is empty", "such as 2143"],
    ["21x3", 3, '"x" in a permutation', "such as 2143"],
    ["-1", 1, '"-" in a permutation', "such as 2143"],
    ["1.5", 2, '"." in a permutation', "such as 2143"],
    ["2,1,", 5, "a value is missing", "such as 2143"],
    ["2,,1", 3, "a value is missing", "such as 2143"],
    [",", 1, "a value is missing", "such as 2143"],
    ["2 1", 1, '"2 1" are not separated by commas', "such as 2143"],
    ["3,2 1", 3, 'no comma between the values of "2 1"', "such as 2143"],
  ])("refuses %j at column %i", (text, column, message, expected) => {
    const fault = refused(readPermutation(text));
    expect(fault.message).toContain(message);
    expect(fault.expected).toContain(expected);
    expect(fault.place).toEqual({ line: 1, column });
    expectHelpful(fault, text);
  });

  it("points into the right line", () => {
    const fault = refused(readPermutation("3,\n1,1"));
    expect(fault.place).toEqual({ line: 2, column: 3 });
    expect(fault.excerpt).toBe("1,1");
  });

  it("refuses ten million digits in a short message", () => {
    const fault = refused(readPermutation("7".repeat(10_000_000)));
    expect(fault.message.length).toBeLessThan(120);
    expect(fault.message).toContain("has 10000000 digits");
  });

  it("gives a permutation that prints back to itself, or a helpful fault, for 20,000 texts", () => {
    const written = fc.oneof(
      randomPermutation(1, 9).map(printPermutation),
      randomPermutation(1, 14).map((w) => w.join(" ,")),
    );
    const texts = fc.oneof(
      randomText,
      mutated(written),
      fc.string({ unit: fc.constantFrom(..."0123456789,, \n"), maxLength: 12 }),
    );
    fc.assert(
      fc.property(texts, (text) => {
        const reading = readPermutation(text);
        if (!reading.ok) return expectHelpful(reading.fault, text);
        expect(accepted(readPermutation(printPermutation(reading.value)))).toEqual(reading.value);
      }),
      { numRuns: 20_000 },
    );
  });
});

describe("permutations", () => {
  it("print back to what was read, with commas from n = 10 on", () => {
    fc.assert(
      fc.property(randomPermutation(1, 30), (w) => {
        expect(printPermutation(w).includes(",")).toBe(w.length > 9);
        expect(perm(printPermutation(w))).toEqual(w);
        expect(perm(w.join(","))).toEqual(w);
      }),
    );
  });

  it("are not made from other lists of numbers", () => {
    expect(permutation([2, 1])).toEqual([2, 1]);
    for (const values of [[], [1, 1], [0], [2], [1.5], [Number.NaN], [1, 2, 4]]) {
      expect(() => permutation(values)).toThrow(RangeError);
      expect(() => permutation(values)).toThrow("expected a permutation, got [");
    }
    expect(() => identity(0)).toThrow("expected a size n ≥ 1, got 0");
    expect(() => [...permutationsOf(-1)]).toThrow(RangeError);
  });

  it("do not change with the list they were made from", () => {
    const values = [2, 1, 3];
    const w = permutation(values);
    values[0] = 7;
    expect(w).toEqual([2, 1, 3]);
  });

  it("have the inverse that gives the identity on either side", () => {
    fc.assert(
      fc.property(randomPermutation(1, 20), (w) => {
        const v = inverse(w);
        expect(w.map((value) => v[value - 1])).toEqual(identity(w.length));
        expect(v.map((value) => w[value - 1])).toEqual(identity(w.length));
      }),
    );
  });

  it("are as long as they have inversions: 0 for the identity, n(n−1)/2 for the longest", () => {
    expect(length(identity(7))).toBe(0);
    expect(length(perm("7654321"))).toBe(21);
    expect(length(perm("2143"))).toBe(2);
    expect(length(perm("31524"))).toBe(4);
  });

  it("of S_n of length k are as many as the coefficient of q^k in [n]!", () => {
    // Rodrigues 1839; Stanley, *Enumerative Combinatorics* 1, corollary 1.3.13 (from memory).
    const byLength = new Array<number>(11).fill(0);
    for (const w of permutationsOf(5)) byLength[length(w)] = (byLength[length(w)] ?? 0) + 1;
    expect(byLength).toEqual([1, 4, 9, 15, 20, 22, 20, 15, 9, 4, 1]);
  });

  it("descend where the next value is smaller", () => {
    expect(descents(perm("31524"))).toEqual([1, 3]);
    expect(descents(identity(5))).toEqual([]);
    expect(descents(perm("4321"))).toEqual([1, 2, 3]);
  });

  it("with k descents are counted by the Eulerian numbers", () => {
    // Stanley, *Enumerative Combinatorics* 1, section 1.4 (from memory).
    const counts = new Array<number>(5).fill(0);
    for (const w of permutationsOf(5)) {
      counts[descents(w).length] = (counts[descents(w).length] ?? 0) + 1;
    }
    expect(counts).toEqual([1, 26, 66, 26, 1]);
  });

  it("come in lexicographic order, each once", () => {
    expect([...permutationsOf(1)]).toEqual([[1]]);
    expect(Array.from(permutationsOf(3), printPermutation)).toEqual(
      "123 132 213 231 312 321".split(" "),
    );
    const all = Array.from(permutationsOf(6), printPermutation);
    expect(new Set(all).size).toBe(720);
    expect(all).toEqual([...all].sort());
  });

  it("come one at a time: the first of S_100 at once", () => {
    const [first, second] = permutationsOf(100);
    expect(first).toEqual(identity(100));
    expect(second?.slice(98)).toEqual([100, 99]);
  });
});
