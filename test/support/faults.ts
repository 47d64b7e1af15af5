/** What every fault of a reader has to have. */
import { expect } from "vitest";
import type { InputFault, Reading } from "../../src/outcomes/input-fault.js";

/** The fault of a reading; a value fails the test. */
export function refused<T>(reading: Reading<T>): InputFault {
  if (reading.ok) throw new Error("expected a fault, got a value");
  return reading.fault;
}

/** Checks that a fault says what and where, and points into the text. */
export function expectHelpful(fault: InputFault, text: string): void {
  const { code, message, place, excerpt, expected } = fault;
  expect(code).toBe("input-fault");
  expect(message).not.toBe("");
  // What is quoted is the user's; the rest is ours.
  expect(message.replace(/"(?:[^"\\]|\\.)*"/g, "")).not.toMatch(/\.$|\n|undefined|NaN|\[object/);
  expect(expected).toMatch(/./);
  expect(place).toBeDefined();
  const line = text.split("\n")[(place?.line ?? 0) - 1];
  expect(excerpt).toBe(line);
  expect(place?.column).toBeGreaterThanOrEqual(1);
  expect(place?.column).toBeLessThanOrEqual((line ?? "").length + 1);
}
