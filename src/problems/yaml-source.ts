/**
 * A YAML text with places: parsed with every scalar as text, and able to say where a path of keys stands,
 * so that faults found later still point into the file.
 */
import { type Document, isMap, isNode, isScalar } from "yaml";
import {
  faulty,
  type InputFault,
  type Place,
  placeAt,
  type Reading,
  read,
} from "../outcomes/input-fault.js";
import { placeInScalar } from "./scalar-place.js";
import { parseYaml, YamlFault } from "./yaml-parsing.js";

/** A path of keys and indices into a document. */
export type KeyPath = readonly PropertyKey[];

/** A parsed text. */
export class YamlSource {
  readonly file: string | undefined;
  readonly #text: string;
  readonly #document: Document.Parsed;

  private constructor(text: string, file: string | undefined, document: Document.Parsed) {
    this.#text = text;
    this.file = file;
    this.#document = document;
  }

  /** Parses a text. */
  static read(text: string, file?: string): Reading<YamlSource> {
    try {
      return read(new YamlSource(text, file, parseYaml(text)));
    } catch (error) {
      if (!(error instanceof YamlFault)) throw error;
      const { message, expected, offset } = error;
      return faulty({
        message,
        expected,
        ...locate(text, offset),
        ...(file === undefined ? {} : { file }),
      });
    }
  }

  /** The content as plain objects, lists and strings. */
  content(): unknown {
    return this.#document.toJS();
  }

  /** Is there something at a path? */
  has(path: KeyPath): boolean {
    return path.length === 0 || this.#document.hasIn([...path]);
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

  /** For a text value: where an offset of the value stands in the file, as near as can be found. */
  locatorOf(
    path: KeyPath,
  ): (offset: number) => { readonly place: Place; readonly excerpt: string } {
    return (offset) => {
      const node = this.#document.getIn([...path], true);
      const start = this.#offset(path);
      if (!isScalar(node) || !node.range) return this.locate(start);
      const source = this.#text.slice(start, node.range[1]);
      return this.locate(start + (placeInScalar(source, String(node.value), offset) ?? 0));
    };
  }

  /** The reading of a text value: a fault inside it is moved to where it stands in the file. */
  moved<T>(path: KeyPath, reading: Reading<T>): Reading<T> {
    if (reading.ok) return reading;
    const { message, expected, place } = reading.fault;
    const offset = (place?.line ?? 1) === 1 ? (place?.column ?? 1) - 1 : 0;
    const fault = this.fault(path, message, expected);
    return { ok: false, fault: { ...fault, ...this.locatorOf(path)(offset) } };
  }

  /** The place and line of an offset of the text. */
  locate(offset: number): { readonly place: Place; readonly excerpt: string } {
    return locate(this.#text, offset);
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

function locate(text: string, offset: number): { readonly place: Place; readonly excerpt: string } {
  const place = placeAt(text, offset);
  const start = offset - (place.column - 1);
  const end = text.indexOf("\n", start);
  const excerpt = text.slice(start, end === -1 ? undefined : end).replace(/\r$/, "");
  return { place, excerpt };
}
