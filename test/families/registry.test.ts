import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { permutationsOf, printPermutation } from "../../src/combinatorics/permutation.js";
import type { Ideal } from "../../src/families/ideal.js";
import { families, readFamilyIdeal } from "../../src/families/registry.js";
import type { InputFault } from "../../src/outcomes/input-fault.js";
import { readOrder } from "../../src/polynomials/order-phrase.js";
import { printPolynomial } from "../../src/polynomials/printing.js";
import { evaluate } from "./determinants.js";

function idealOf(name: string): Ideal {
  const ideal = readFamilyIdeal(name);
  if (!ideal.ok) throw new Error(`expected an ideal, got ${ideal.fault.message}`);
  return ideal.value;
}

function faultOf(name: string): InputFault {
  const ideal = readFamilyIdeal(name);
  if (ideal.ok) throw new Error(`expected a fault, got ${ideal.value.name}`);
  return ideal.fault;
}

function printed(name: string, kind?: string): string[] {
  const { generatingSets } = idealOf(name);
  const set = generatingSets.find((s) => kind === undefined || s.kind === kind);
  return (set?.polynomials() ?? []).map((f) => printPolynomial(f));
}

describe("readFamilyIdeal", () => {
  it("reads the example of every family, whose default order fits", () => {
    expect(families.map((f) => f.name)).toEqual([
      "schubert",
      "partial",
      "asm",
      "determinantal",
      "lower-upper",
      "lower-upper-scheme",
      "commuting",
    ]);
    for (const family of families) {
      const ideal = idealOf(family.example);
      expect(ideal.name).toBe(family.example);
      expect(readOrder(ideal.defaultOrder, ideal.ring).ok).toBe(true);
      expect(ideal.generatingSets.every((s) => s.polynomials().length > 0)).toBe(true);
    }
  });

  it("suggests the nearest family for a misspelt one", () => {
    expect(faultOf("schubret:2143")).toMatchObject({
      message: 'unknown family "schubret"',
      expected: "schubert, perhaps",
    });
  });

  it("lists the families for an unknown one", () => {
    for (const word of ["veronese", "", "constructor", "toString"]) {
      expect(faultOf(`${word}:1`)).toMatchObject({
        message: `unknown family "${word}"`,
        expected:
          "one of schubert, partial, asm, determinantal, lower-upper, lower-upper-scheme, commuting",
      });
    }
  });

  it("says what a family without an argument needs", () => {
    for (const name of ["schubert", "schubert:", "schubert:  "]) {
      expect(faultOf(name)).toMatchObject({
        message: "the family schubert needs a permutation in one-line notation",
        expected: "for example schubert:2143",
      });
    }
  });

  it("points into the name at the offending sign", () => {
    const fault = faultOf("schubert:12a3");
    expect(fault.place).toEqual({ line: 1, column: 12 });
    expect(fault.excerpt).toBe("schubert:12a3");
  });

  it.each([
    ["schubert:1223", "the value 2 stands twice"],
    ["schubert:0", "the value 0 is not one of 1, …, 1"],
    ["schubert:99999999999", "has 11 digits"],
    ["schubert:2,,1", "a value is missing"],
    ["schubert:2 1", "not separated by commas"],
    ["schubert:-1", '"-"'],
    ["partial:", "needs the columns of the dots"],
    ["partial:1,1", "two dots in one column"],
    ["partial:3/2", "a dot outside the columns"],
    ["partial:0/0", "it has no columns"],
    ["partial:x", "it cannot be read"],
    ["partial:1,2/", "it cannot be read"],
    ["partial:999", "more than 100 rows or columns"],
    ["asm:0", "the signs of a row do not alternate from + to +"],
    ["asm:+-+/+0-/00+", "the signs of a row do not alternate from + to +"],
    ["asm:+0/+0", "the signs of a column do not alternate from + to +"],
    ["asm:+0/0", "it is not a square of the signs +, - and 0"],
    ["asm:+x/0+", "it is not a square of the signs +, - and 0"],
    [`asm:${"+/".repeat(100)}+`, "more than 100 rows"],
    ["determinantal:3,4", "is no determinantal ideal"],
    ["determinantal:3,4,4", "is no determinantal ideal"],
    ["determinantal:0,4,0", "is no determinantal ideal"],
    ["determinantal:3,0,0", "is no determinantal ideal"],
    ["determinantal:101,1,0", "is no determinantal ideal"],
    ["determinantal:1,101,0", "is no determinantal ideal"],
    ["determinantal:3,4,-1", "is no determinantal ideal"],
    ["lower-upper:122", "the value 2 stands twice"],
    [`lower-upper:${Array.from({ length: 31 }, (_, i) => i + 1)}`, "of 31 values"],
    ["lower-upper-scheme:0", "is no size of two square matrices"],
    ["commuting:31", "is no size of two square matrices"],
  ])("refuses %s", (name, message) => {
    const fault = faultOf(name);
    expect(fault.message).toContain(message);
    expect(fault.expected).toMatch(/\S/);
  });

  it("never throws, and reads the names of what it reads back to the same", () => {
    const word = fc.constantFrom(...families.map((f) => f.name), "shubert", "");
    const signs = fc.constantFrom(..."0123456789,,/+-: \n\u0000x…".split(""));
    const argument = fc.oneof(fc.string({ unit: signs, maxLength: 12 }), fc.string());
    fc.assert(
      fc.property(word, argument, (family, text) => {
        const ideal = readFamilyIdeal(`${family}:${text}`);
        const name = ideal.ok ? idealOf(ideal.value.name).name : ideal.fault.code;
        expect(name).toBe(ideal.ok ? ideal.value.name : "input-fault");
      }),
      { numRuns: 2000 },
    );
  });
});

describe("partial permutations", () => {
  it("2,0,1 in four columns bounds the first column by 0 and two rows by 1", () => {
    // By hand: corner sums 0111, 0111, 1222; what is not implied is (2,1) of rank 0 and (2,4) of rank 1.
    const minors = printed("partial:2,0,1/4");
    expect(minors.slice(0, 2)).toEqual(["z11", "z21"]);
    expect(minors).toHaveLength(2 + 6);
    expect(minors).toContain("z13*z24 - z14*z23");
  });

  it("take the number of columns from the last dot when none is given", () => {
    expect(idealOf("partial: 0 , 2 ").name).toBe("partial:0,2/2");
    expect(idealOf("partial:0").name).toBe("partial:0/1");
    expect(printed("partial:0")).toEqual(["z11"]);
    expect(printed("partial:0,0/2")).toEqual(["z11", "z12", "z21", "z22"]);
  });

  it("with a dot in every row and column are the matrix Schubert varieties", () => {
    for (const w of permutationsOf(4)) {
      for (const kind of ["fulton", "defining"]) {
        expect(printed(`partial:${w.join(",")}`, kind)).toEqual(
          printed(`schubert:${printPermutation(w)}`, kind),
        );
      }
    }
  });

  it("have the Fulton generators of their completion to a permutation", () => {
    // Fulton 1992, §3 (from memory): the rank conditions of the completion lie inside the rectangle.
    // Row 2 of 2,0,1/4 gets its dot in a fifth column, columns 3 and 4 theirs in further rows: 25134.
    expect(printed("partial:2,0,1/4")).toEqual(printed("schubert:25134"));
    expect(printed("partial:0,2/2")).toEqual(printed("schubert:321"));
  });
});

describe("alternating sign matrices", () => {
  it("that are permutation matrices give the matrix Schubert varieties", () => {
    for (const w of permutationsOf(4)) {
      const rows = w.map((value) => w.map((_, j) => (value === j + 1 ? "+" : "0")).join(""));
      expect(printed(`asm:${rows.join("/")}`)).toEqual(printed(`schubert:${w.join("")}`));
    }
  });

  it("give for the one of size 3 with a -1 the union of the varieties of 231 and 312", () => {
    // By hand: (z11, z12·z21) = (z11, z12) ∩ (z11, z21). Unions: Weigandt, arXiv 2003.07342 (from memory).
    expect(printed("asm:0+0/+-+/0+0")).toEqual(["z11", "z11*z22 - z12*z21"]);
    const all = ["asm:0+0/+-+/0+0", "schubert:231", "schubert:312"].map(
      (name) => idealOf(name).generatingSets[0]?.polynomials() ?? [],
    );
    const points = fc.array(fc.bigInt({ min: -1n, max: 1n }), { minLength: 9, maxLength: 9 });
    fc.assert(
      fc.property(points, (drawn) => {
        const point = [0n, ...drawn.slice(1)];
        const [asm, a, b] = all.map((set) => set.every((f) => evaluate(f, point) === 0n));
        expect(asm).toBe(a === true || b === true);
      }),
    );
  });
});

describe("determinantal ideals", () => {
  it.each([
    [2, 2, 1, 1],
    [3, 3, 1, 9],
    [3, 4, 1, 18],
    [3, 4, 2, 4],
    [4, 5, 2, 40],
    [3, 4, 0, 12],
    [3, 4, 3, 0],
  ])("of %i×%i matrices of rank at most %i are given by %i minors", (m, n, r, count) => {
    expect(printed(`determinantal:${m},${n},${r}`)).toHaveLength(count);
  });

  it("are diagonal by default, as in Sturmfels 1990", () => {
    const ideal = idealOf("determinantal: 3 , 4 , 1 ");
    expect(ideal.name).toBe("determinantal:3,4,1");
    expect(ideal.defaultOrder).toBe("lex from nw by rows");
    expect(ideal.permutation).toBeUndefined();
  });
});
