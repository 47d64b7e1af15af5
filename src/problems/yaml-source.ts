/**
 * A YAML text with places: parsed with every scalar as text, and able to say where a path of keys stands,
 * so that faults found later still point into the file. Anchors and aliases are refused: a problem needs
 * none, and a small file could unfold into a huge one.
 */
import { type Document, isMap, isNode, isScalar, LineCounter, parseDocument, visit } from "yaml";
import {
  faulty,
  type InputFault,
  type Place,
  type Reading,
  read,
} from "../outcomes/input-fault.js";

/** A path of keys and indices into a document. */
export type KeyPath = readonly PropertyKey[];

/** The largest text that is read, in characters. */
export const MAX_TEXT = 4_000_000;
/** The deepest nesting of brackets or indentation that is read. */
const MAX_DEPTH = 50;

/** A parsed text. */
export class YamlSource {
  readonly file: string | undefined;
  readonly #text: string;
  readonly #document: Document.Parsed;
  readonly #lines: LineCounter;

  private constructor(
    text: string,
    file: string | undefined,
    document: Document.Parsed,
    lines: LineCounter,
  ) {
    this.#text = text;
    this.file = file;
    this.#document = document;
    this.#lines = lines;
  }

  /** Parses a text. */
  static read(text: string, file?: string): Reading<YamlSource> {
    const refuse = (message: string, expected: string, place: Place): Reading<never> =>
      faulty({
        message,
        expected,
        place,
        excerpt: text.slice(0, MAX_TEXT).split("\n", place.line)[place.line - 1] ?? "",
        ...(file === undefined ? {} : { file }),
      });
    const start = { line: 1, column: 1 };
    if (text.length > MAX_TEXT)
      return refuse("the file is too large", `at most ${MAX_TEXT} characters`, start);
    if (text.trim() === "")
      return refuse("the file is empty", "a problem: at least the key ideal", start);
    const control = /[^\P{Cc}\t\n\r]/u.exec(text);
    if (control !== null) {
      const before = text.slice(0, control.index).split("\n");
      const column = (before.at(-1)?.length ?? 0) + 1;
      return refuse("the file is not text: it has control characters", "a text file", {
        line: before.length,
        column,
      });
    }
    if (nestsTooDeeply(text))
      return refuse("nested too deeply", `at most ${MAX_DEPTH} levels`, start);
    const lines = new LineCounter();
    const document = parseDocument(text, {
      schema: "failsafe",
      lineCounter: lines,
      prettyErrors: false,
    });
    const placeOf = (offset: number): Place => {
      const { line, col } = lines.linePos(offset);
      return { line: Math.max(line, 1), column: Math.max(col, 1) };
    };
    const [error] = document.errors;
    if (error !== undefined) {
      return refuse(firstLine(error.message), "YAML or JSON", placeOf(error.pos[0]));
    }
    let alias: number | undefined;
    visit(document, {
      Alias: (_, node) => {
        alias = node.range?.[0] ?? 0;
        return visit.BREAK;
      },
    });
    if (alias !== undefined)
      return refuse("an alias", "the text itself, written out", placeOf(alias));
    return read(new YamlSource(text, file, document, lines));
  }

  /** The content as plain objects, lists and strings. */
  content(): unknown {
    return this.#document.toJS();
  }

  /** A fault at a path: at the key for an unknown one, at the value otherwise, or as near as can be found. */
  fault(path: KeyPath, message: string, expected?: string, key?: string): InputFault {
    const offset =
      (key === undefined ? undefined : this.#keyOffset(path, key)) ?? this.#offset(path);
    return {
      code: "input-fault",
      message,
      ...this.locate(offset),
      ...(expected === undefined ? {} : { expected }),
      ...(this.file === undefined ? {} : { file: this.file }),
    };
  }

  /** For a text value: where an offset of the value stands in the file. */
  locatorOf(
    path: KeyPath,
  ): (offset: number) => { readonly place: Place; readonly excerpt: string } {
    const start = this.#offset(path);
    const node = this.#document.getIn([...path], true);
    const value = isScalar(node) ? String(node.value) : "";
    const found = value === "" ? -1 : this.#text.indexOf(value, start);
    const end = isNode(node) ? (node.range?.[1] ?? start) : start;
    return (offset) => this.locate(found !== -1 && found <= end ? found + offset : start);
  }

  /** The place and line of an offset of the text. */
  locate(offset: number): { readonly place: Place; readonly excerpt: string } {
    const { line, col } = this.#lines.linePos(offset);
    const start = this.#lines.lineStarts[line - 1] ?? 0;
    const end = this.#text.indexOf("\n", start);
    return {
      place: { line: Math.max(line, 1), column: Math.max(col, 1) },
      excerpt: this.#text.slice(start, end === -1 ? undefined : end),
    };
  }

  #offset(path: KeyPath): number {
    for (let length = path.length; length >= 0; length--) {
      const node =
        length === 0 ? this.#document.contents : this.#document.getIn(path.slice(0, length), true);
      if (isNode(node) && node.range) return node.range[0];
    }
    return 0;
  }

  #keyOffset(path: KeyPath, key: string): number | undefined {
    const map = path.length === 0 ? this.#document.contents : this.#document.getIn([...path], true);
    if (!isMap(map)) return undefined;
    const pair = map.items.find((item) => isScalar(item.key) && item.key.value === key);
    return isNode(pair?.key) ? pair.key.range?.[0] : undefined;
  }
}

function firstLine(message: string): string {
  return (message.split("\n")[0] ?? "").replace(/\.$/, "");
}

/* The parser recurses on nesting; deep brackets or long runs of list dashes are refused beforehand. */
function nestsTooDeeply(text: string): boolean {
  let depth = 0;
  for (const bracket of text.matchAll(/[[\]{}]/g)) {
    depth += bracket[0] === "[" || bracket[0] === "{" ? 1 : -1;
    if (depth > MAX_DEPTH) return true;
    if (depth < 0) depth = 0;
  }
  if (/(?:[-?:][ \t]+){51}/.test(text)) return true;
  const indents = new Set(Array.from(text.matchAll(/^ +(?=\S)/gm), (m) => m[0].length));
  return indents.size > MAX_DEPTH;
}
