/** The words of a phrase, taken one after the other, with faults at their places. */
import { quote } from "../outcomes/input-fault.js";
import { TextFault } from "./text-fault.js";

/** A word, parenthesis or comma, and where it stands. */
export interface Word {
  readonly text: string;
  readonly offset: number;
}

/** The longest phrase that is read, in UTF-16 units. */
const LONGEST_PHRASE = 100_000;

/** A phrase being read, word by word. */
export class PhraseWords {
  readonly #words: readonly Word[];
  readonly #end: number;
  #next = 0;

  /** @throws TextFault when the phrase is too long. */
  constructor(phrase: string) {
    if (phrase.length > LONGEST_PHRASE) {
      throw new TextFault(0, "the order is too long", `at most ${LONGEST_PHRASE} characters`);
    }
    this.#words = [...phrase.matchAll(/[(),]|[^\s(),]+/gu)].map((match) => ({
      text: match[0],
      offset: match.index,
    }));
    this.#end = phrase.trimEnd().length;
  }

  /** The next word's text without taking it, or undefined at the end. */
  peek(ahead = 0): string | undefined {
    return this.#words[this.#next + ahead]?.text;
  }

  /** Where the next word stands. */
  offset(): number {
    return this.#words[this.#next]?.offset ?? this.#end;
  }

  /** Takes the next word if it is this one. */
  takes(text: string): boolean {
    const found = this.peek() === text;
    if (found) this.#next++;
    return found;
  }

  /** Takes the next word, whatever it is. @throws TextFault at the end. */
  word(expected: string): Word {
    const word = this.#words[this.#next];
    if (word === undefined) throw this.unexpected(expected);
    this.#next++;
    return word;
  }

  /** Takes the next word, which has to be this one. @throws TextFault */
  must(text: string, expected: string): void {
    if (!this.takes(text)) throw this.unexpected(expected);
  }

  /** The fault of a next word that cannot stand where it does, or of the end. */
  unexpected(expected: string): TextFault {
    const text = this.peek();
    const message =
      text === undefined ? "the order ends too early" : `${quote(text)} cannot stand here`;
    return new TextFault(this.offset(), message, expected);
  }
}
