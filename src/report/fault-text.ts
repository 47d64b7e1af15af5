/** A fault in user input as the one message that is shown: where, what, the line with a caret, the remedy. */
import type { InputFault } from "../outcomes/input-fault.js";

/** The widest piece of a source line that is shown around the caret. */
const EXCERPT_WIDTH = 100;

/**
 * The message of a fault, without a final newline:
 * ```text
 * flatlimit: note.yaml:3:9: unknown variable w3
 *   3 | - x1*x2 - w3
 *     |           ^
 *   expected one of x1, x2, x3
 * ```
 */
export function printFault(fault: InputFault): string {
  const { file, place, message, expected, excerpt } = fault;
  // What was typed on the command line has no file: the caret alone shows the place.
  const parts = file === undefined ? [] : [file, place?.line, place?.column];
  const where = parts.filter((part) => part !== undefined).join(":");
  const lines = [`flatlimit: ${where === "" ? "" : `${where}: `}${message}`];
  if (place !== undefined && excerpt !== undefined) {
    const start = Math.max(0, place.column - 1 - EXCERPT_WIDTH / 2);
    const shown = printable(excerpt.slice(start, start + EXCERPT_WIDTH));
    const margin = " ".repeat(String(place.line).length);
    const before = printable(excerpt.slice(start, place.column - 1));
    lines.push(`  ${place.line} | ${shown}`, `  ${margin} | ${" ".repeat(before.length)}^`);
  }
  if (expected !== undefined) lines.push(`  expected ${expected}`);
  return lines.join("\n");
}

/** Control characters would break the layout or the terminal; each becomes one visible sign. */
function printable(text: string): string {
  return text.replace(/\p{Cc}/gu, (c) => (c === "\t" ? " " : "\u{fffd}"));
}
