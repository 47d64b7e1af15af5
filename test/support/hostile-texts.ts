/** Texts that no reader expects, and mutations of those it does. */
import fc from "fast-check";

const PIECES = [
  ..."+-*/^()[]{}.,;:=<>!?#&|~@$%'\"`\\_0123456789xyzXYZ \t\n\r\u0000\u00b2\u00b7\u00d7\u2212\ufeff",
  "\u{1d4b3}",
  "\ud800",
  "x11",
  "x1_12",
  "2x",
  "**",
  "^^",
  "1e9",
  "0x1f",
  "1.5",
  "3/2",
  "99999999999999999999999",
  "^65535",
  "^65536",
  "(x+y+z)^30",
  "((((((((",
  "NaN",
  "Infinity",
  "__proto__",
  "constructor",
  "toString",
];

/** Random strings of any kind, and random sequences of the pieces above. */
export const randomText: fc.Arbitrary<string> = fc.oneof(
  fc.string({ unit: "binary", maxLength: 60 }),
  fc.string({ unit: "grapheme", maxLength: 60 }),
  fc.array(fc.constantFrom(...PIECES), { maxLength: 30 }).map((pieces) => pieces.join("")),
);

/** A text with a few characters removed, repeated, exchanged or replaced by pieces. */
export function mutated(text: fc.Arbitrary<string>): fc.Arbitrary<string> {
  const change = fc.record({
    at: fc.double({ min: 0, max: 1, noNaN: true }),
    length: fc.nat({ max: 4 }),
    piece: fc.constantFrom("", ...PIECES),
    kind: fc.constantFrom("replace", "insert", "repeat", "reverse"),
  });
  return fc.tuple(text, fc.array(change, { minLength: 1, maxLength: 4 })).map(([start, changes]) =>
    changes.reduce((now, { at, length, piece, kind }) => {
      const from = Math.floor(at * (now.length + 1));
      const [before, cut, after] = [
        now.slice(0, from),
        now.slice(from, from + length),
        now.slice(from + length),
      ];
      if (kind === "replace") return before + piece + after;
      if (kind === "insert") return before + piece + cut + after;
      if (kind === "repeat") return before + cut + cut + after;
      return before + [...cut].reverse().join("") + after;
    }, start),
  );
}
