/**
 * YAML text to a document tree, or its first fault. Every scalar is text. What a problem needs none of is
 * refused: anchors and aliases (a small file could unfold into a huge one), tags, keys that are no words,
 * directives, several documents. Any text of the length allowed ends in a moment: the parser is fed token by token, so
 * that it stops at the first stray one, and keys are compared here, since its own comparison is quadratic.
 */
import {
  Composer,
  type Document,
  isAlias,
  isMap,
  isScalar,
  Lexer,
  type Node,
  Parser,
  visit,
  type YAMLMap,
} from "yaml";
import { quote } from "../outcomes/input-fault.js";

/** The largest text that is read, in characters. */
export const MAX_TEXT = 4_000_000;
/** The deepest nesting of brackets or indentation that is read. */
const MAX_DEPTH = 50;
/** The largest number of scalars, signs and pieces of white space. */
const MAX_TOKENS = 400_000;

/** What any text has to be. */
const SYNTAX = "YAML or JSON";

/** Tags that say what is the case anyway. */
const PLAIN_TAGS = ["str", "map", "seq"].map((name) => `tag:yaml.org,2002:${name}`);

/** A fault at an offset of the text. */
export class YamlFault extends Error {
  readonly offset: number;
  readonly expected: string;
  constructor(offset: number, message: string, expected: string) {
    super(message);
    this.name = "YamlFault";
    this.offset = offset;
    this.expected = expected;
  }
}

/** Parses a text. @throws YamlFault */
export function parseYaml(text: string): Document.Parsed {
  checkText(text);
  const composer = new Composer({ schema: "failsafe", uniqueKeys: false });
  let document: Document.Parsed | undefined;
  for (const composed of composer.compose(tokensOf(text), true, text.length)) {
    const [error] = composed.errors;
    if (error !== undefined) throw syntaxFault(error.pos[0], error.code, error.message);
    if (document !== undefined) {
      throw new YamlFault(composed.range[0], "a second document", "one problem a file");
    }
    document = composed;
  }
  if (document?.contents == null || isBlank(document.contents)) {
    throw emptyFault();
  }
  checkNodes(document);
  return document;
}

function emptyFault(): YamlFault {
  return new YamlFault(0, "the file is empty", "a problem: at least the key ideal");
}

/* What can be refused before parsing, which recurses on nesting. */
function checkText(text: string): void {
  if (text.length > MAX_TEXT) {
    throw new YamlFault(0, "the file is too large", `at most ${MAX_TEXT} characters`);
  }
  if (text.trim() === "") throw emptyFault();
  const control = /[^\P{Cc}\t\n\r]/u.exec(text);
  if (control !== null) {
    const message = "the file is not text: it has control characters";
    throw new YamlFault(control.index, message, "a text file");
  }
  const deep = tooDeep(text);
  if (deep !== undefined) {
    throw new YamlFault(deep, "nested too deeply", `at most ${MAX_DEPTH} levels`);
  }
}

/* The parser's tokens, from its lexer's, up to the first stray one. */
function* tokensOf(text: string): ReturnType<Parser["parse"]> {
  const parser = new Parser();
  let count = 0;
  for (const lexeme of new Lexer().lex(text)) {
    if (++count > MAX_TOKENS) {
      throw new YamlFault(parser.offset, "the file has too many parts", `at most ${MAX_TOKENS}`);
    }
    for (const token of parser.next(lexeme)) {
      if (token.type === "error") {
        throw new YamlFault(token.offset, `${quote(token.source)} cannot stand here`, SYNTAX);
      }
      if (token.type === "directive") {
        throw new YamlFault(token.offset, `a directive ${quote(token.source)}`, "no directives");
      }
      yield token;
    }
  }
  yield* parser.end();
}

function syntaxFault(offset: number, code: string, message: string): YamlFault {
  if (code === "TAB_AS_INDENT") {
    return new YamlFault(offset, "a tab in the indentation", "spaces");
  }
  const [line = ""] = message.split("\n", 1);
  return new YamlFault(offset, line.slice(0, 200).replace(/\.$/, ""), SYNTAX);
}

function isBlank(node: Node): boolean {
  return isScalar(node) && (node.value === null || node.source === "");
}

function checkNodes(document: Document.Parsed): void {
  visit(document, {
    Node: (_, node) => {
      const offset = node.range?.[0] ?? 0;
      if (isAlias(node)) {
        throw new YamlFault(offset, "an alias", "the text itself, written out");
      }
      if (node.anchor !== undefined) {
        throw new YamlFault(offset, `an anchor ${quote(node.anchor)}`, "no anchors");
      }
      if (node.tag !== undefined && !PLAIN_TAGS.includes(node.tag)) {
        throw new YamlFault(offset, `a tag ${quote(node.tag)}`, "text, lists and mappings");
      }
      if (isMap(node)) checkKeys(node);
    },
  });
}

function checkKeys(map: YAMLMap): void {
  const seen = new Set<string>();
  for (const { key } of map.items) {
    const offset = (key as Node | null)?.range?.[0] ?? map.range?.[0] ?? 0;
    if (!isScalar(key) || typeof key.value !== "string" || key.value === "__proto__") {
      throw new YamlFault(offset, "a key that is no word", "one of the keys of a problem");
    }
    if (seen.has(key.value)) {
      throw new YamlFault(offset, `the key ${quote(key.value)} stands twice`, "each key once");
    }
    seen.add(key.value);
  }
}

/* Where brackets, long runs of list dashes or distinct indentations go deeper than is read. */
function tooDeep(text: string): number | undefined {
  let depth = 0;
  for (const { 0: bracket, index } of text.matchAll(/[[\]{}]/g)) {
    depth = Math.max(0, depth + (bracket === "[" || bracket === "{" ? 1 : -1));
    if (depth > MAX_DEPTH) return index;
  }
  const dashes = /(?:[-?:][ \t]+){51}/.exec(text);
  if (dashes !== null) return dashes.index;
  const indents = new Set<number>();
  for (const { 0: indent, index } of text.matchAll(/^ +(?=\S)/gm)) {
    indents.add(indent.length);
    if (indents.size > MAX_DEPTH) return index;
  }
  return undefined;
}
