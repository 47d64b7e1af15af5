import { describe, expect, it } from "vitest";
import { readingOf, TextFault, textWithin } from "../../src/polynomials/text-fault.js";

function failing(error: Error): () => never {
  return () => {
    throw error;
  };
}

describe("faults in texts", () => {
  it("become readings with the line they point into", () => {
    const at = (offset: number): unknown =>
      readingOf("ab\n\ncd", {}, failing(new TextFault(offset, "wrong")));
    const fault = (line: number, column: number, excerpt: string): unknown => ({
      ok: false,
      fault: { code: "input-fault", message: "wrong", place: { line, column }, excerpt },
    });
    expect(at(0)).toEqual(fault(1, 1, "ab"));
    expect(at(2)).toEqual(fault(1, 3, "ab"));
    expect(at(3)).toEqual(fault(2, 1, ""));
    expect(at(4)).toEqual(fault(3, 1, "cd"));
    expect(at(6)).toEqual(fault(3, 3, "cd"));
  });

  it("point to the first line when it is empty", () => {
    const reading = readingOf("\nab", {}, failing(new TextFault(0, "wrong", "right")));
    expect(reading).toMatchObject({ fault: { place: { line: 1, column: 1 }, excerpt: "" } });
  });

  it("are placed in the larger text, with or without the name of its file", () => {
    const fault = failing(new TextFault(1, "wrong", "right"));
    expect(readingOf("ab", textWithin("x: ab", 3, "a.yaml"), fault)).toEqual({
      ok: false,
      fault: {
        code: "input-fault",
        message: "wrong",
        expected: "right",
        file: "a.yaml",
        place: { line: 1, column: 5 },
        excerpt: "x: ab",
      },
    });
    expect(textWithin("x: ab", 3)).not.toHaveProperty("file");
  });

  it("are the only errors that are caught", () => {
    expect(() => readingOf("ab", {}, failing(new RangeError("a mistake")))).toThrow(RangeError);
    expect(readingOf("ab", {}, () => 7)).toEqual({ ok: true, value: 7 });
  });
});
