import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readProblem } from "../../src/problems/problem.js";
import { problemDocument } from "../../src/problems/problem-document.js";
import { hostileTexts } from "../problems/problem-texts.js";

describe("readProblem, at length", () => {
  it("answers 100,000 random and mutated texts with a problem that reads back, or a fault", () => {
    let problems = 0;
    let faults = 0;
    fc.assert(
      fc.property(hostileTexts, (text) => {
        const problem = readProblem(text, "fuzz.yaml");
        if (!problem.ok) {
          faults++;
          expect(problem.fault).toMatchObject({ code: "input-fault", file: "fuzz.yaml" });
          expect(problem.fault.place?.line).toBeLessThanOrEqual(text.split("\n").length);
          return;
        }
        problems++;
        const document = problemDocument(problem.value);
        const again = readProblem(JSON.stringify(document));
        expect(again.ok && problemDocument(again.value)).toEqual(document);
      }),
      { numRuns: 100_000 },
    );
    // Both answers must be frequent, or the texts test only one half of the reader.
    expect(problems).toBeGreaterThan(1000);
    expect(faults).toBeGreaterThan(50_000);
  });
});
