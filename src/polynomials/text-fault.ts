/**
 * Faults inside the readers of this folder: thrown with an offset where the descent notices them,
 * turned into a `Reading` with line, column and excerpt at its entry. They never leave a reader.
 */
import {
  faulty,
  type InputFault,
  type Place,
  placeAt,
  type Reading,
  read,
} from "../outcomes/input-fault.js";

/** A place, with the line it points into. */
interface Spot {
  readonly place: Place;
  readonly excerpt: string;
}

/** Where a text stands, when it is part of a larger one. */
export interface TextSource {
  readonly file?: string;
  /** The place of an offset of the text in the file; default: in the text itself. */
  readonly locate?: (offset: number) => Spot;
}

/** A fault on its way out of a recursive descent. */
export class TextFault extends Error {
  readonly offset: number;
  readonly expected: string | undefined;

  /** @param offset where in the text, in UTF-16 units. */
  constructor(offset: number, message: string, expected?: string) {
    super(message);
    this.name = "TextFault";
    this.offset = offset;
    this.expected = expected;
  }
}

/** Runs a reader of a text and turns the fault it throws into a `Reading`. */
export function readingOf<T>(text: string, source: TextSource, parse: () => T): Reading<T> {
  try {
    return read(parse());
  } catch (error) {
    if (!(error instanceof TextFault)) throw error;
    return faulty(located(text, error, source));
  }
}

/**
 * The source of a text that stands verbatim in a larger one, from an offset on, so that its faults
 * point into the larger text.
 */
export function textWithin(whole: string, start: number, file?: string): TextSource {
  const locate = (offset: number): Spot => spotIn(whole, start + offset);
  return { locate, ...(file === undefined ? {} : { file }) };
}

function located(
  text: string,
  { message, expected, offset }: TextFault,
  { file, locate }: TextSource,
): Omit<InputFault, "code"> {
  return {
    message,
    ...(locate === undefined ? spotIn(text, offset) : locate(offset)),
    ...(expected === undefined ? {} : { expected }),
    ...(file === undefined ? {} : { file }),
  };
}

function spotIn(text: string, offset: number): Spot {
  return { place: placeAt(text, offset), excerpt: lineAround(text, offset) };
}

function lineAround(text: string, offset: number): string {
  const start = offset === 0 ? 0 : text.lastIndexOf("\n", offset - 1) + 1;
  const end = text.indexOf("\n", offset);
  return text.slice(start, end === -1 ? undefined : end);
}
