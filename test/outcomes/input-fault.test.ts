import { describe, expect, it } from "vitest";
import { faulty, placeAt, quote, read } from "../../src/outcomes/input-fault.js";

describe("faults in user input", () => {
  it("are either a value or a fault", () => {
    expect(read(3)).toEqual({ ok: true, value: 3 });
    expect(faulty({ message: "no" })).toEqual({
      ok: false,
      fault: { code: "input-fault", message: "no" },
    });
  });

  it("have places that count lines and columns from 1", () => {
    const text = "ab\ncd\n\nx";
    expect(placeAt(text, 0)).toEqual({ line: 1, column: 1 });
    expect(placeAt(text, 2)).toEqual({ line: 1, column: 3 });
    expect(placeAt(text, 3)).toEqual({ line: 2, column: 1 });
    expect(placeAt(text, 7)).toEqual({ line: 4, column: 1 });
    expect(placeAt(text, 99)).toEqual({ line: 4, column: 2 });
  });

  it("quote offending text on one line, and not too much of it", () => {
    expect(quote('a"\n')).toBe('"a\\"\\n"');
    expect(quote("x".repeat(60))).toBe(`"${"x".repeat(60)}"`);
    expect(quote("x".repeat(61))).toBe(`"${"x".repeat(60)}…"`);
  });
});
