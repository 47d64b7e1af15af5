import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { isScalar, parseDocument } from "yaml";
import { placeInScalar } from "../../src/problems/scalar-place.js";

function scalarValue(source: string): string {
  const { contents } = parseDocument(source, { schema: "failsafe" });
  if (!isScalar(contents)) throw new Error(`expected a scalar, got ${source}`);
  return String(contents.value);
}

describe("placeInScalar", () => {
  it.each([
    ["x + w", 4, "w"],
    ['"x + w"', 4, "w"],
    ["'x + w'", 4, "w"],
    ["x\n  + w", 4, "w"],
    ["|\n  x\n  + w\n", 4, "w"],
    [">- # folded\n  x\n\n  + w\n", 4, "w"],
    ['"x\n   + w"', 4, "w"],
  ])("finds in %j what stands at %i of the value", (source, offset, sign) => {
    const place = placeInScalar(source, scalarValue(source), offset);
    expect(place).toBe(source.indexOf(sign));
  });

  it("stands behind the last sign for the end of the value, and gives up at escapes", () => {
    expect(placeInScalar('"x +"', "x +", 3)).toBe(4);
    expect(placeInScalar("x +", "x +", 3)).toBe(3);
    expect(placeInScalar('"\\u0078 + w"', "x + w", 4)).toBeUndefined();
    expect(placeInScalar('"\\u0078 + w"', "x + w", 0)).toBeUndefined();
  });

  it("finds every sign of words in every style", () => {
    const words = fc.array(fc.string({ unit: fc.constantFrom(..."xyz123+*^()"), minLength: 1 }), {
      minLength: 1,
      maxLength: 6,
    });
    const style = fc.constantFrom("plain", "double", "single", "literal", "folded");
    fc.assert(
      fc.property(
        words,
        style,
        fc.constantFrom(" ", "  ", "\n  ", "\n\n   "),
        (list, kind, gap) => {
          const body = `x${list.join(gap)}`;
          const source = {
            plain: body,
            double: `"${body}"`,
            single: `'${body}'`,
            literal: `|\n  ${body}\n`,
            folded: `>+\n  ${body}\n`,
          }[kind];
          const value = scalarValue(source);
          for (let offset = 0; offset < value.length; offset++) {
            const sign = value.charAt(offset);
            const place = placeInScalar(source, value, offset);
            if (/\s/.test(sign)) expect(place).toBeDefined();
            else expect(source.charAt(place ?? -1)).toBe(sign);
          }
        },
      ),
    );
  });
});
