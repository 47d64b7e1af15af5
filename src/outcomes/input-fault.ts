/**
 * What is wrong with a user's input, where, and what would be right.
 * Readers return a `Reading`; bad input never throws.
 */

/** A place in a text: `line` and `column` count from 1, columns in UTF-16 units. */
export interface Place {
  readonly line: number;
  readonly column: number;
}

/** One fault in user input, complete enough to print a message that helps. */
export interface InputFault {
  readonly code: "input-fault";
  /** What is wrong, in one clause without a full stop: "unknown variable w3". */
  readonly message: string;
  /** What would be right: "one of x11, x12, x21, x22". */
  readonly expected?: string;
  /** Path of the file, when the text came from one. */
  readonly file?: string;
  readonly place?: Place;
  /** The source line the place points into, for the caret. */
  readonly excerpt?: string;
}

/** Either a value read from user input, or the first fault in that input. */
export type Reading<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly fault: InputFault };

/** Wraps a value that was read. */
export function read<T>(value: T): Reading<T> {
  return { ok: true, value };
}

/** Wraps a fault. */
export function faulty(fault: Omit<InputFault, "code">): Reading<never> {
  return { ok: false, fault: { code: "input-fault", ...fault } };
}

/** The longest piece of an offending text that a message quotes. */
const LONGEST_QUOTE = 60;

/** Quotes an offending text for a message: control characters escaped, long texts shortened. */
export function quote(text: string): string {
  const shown = text.length > LONGEST_QUOTE ? `${text.slice(0, LONGEST_QUOTE)}…` : text;
  return JSON.stringify(shown);
}

/** The line and column of an offset in a text; offsets past the end point behind the last character. */
export function placeAt(text: string, offset: number): Place {
  const before = text.slice(0, offset);
  const lineStart = before.lastIndexOf("\n") + 1;
  let line = 1;
  for (let i = before.indexOf("\n"); i !== -1; i = before.indexOf("\n", i + 1)) line++;
  return { line, column: before.length - lineStart + 1 };
}
