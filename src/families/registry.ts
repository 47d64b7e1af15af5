/** The families by name, and the reader of names such as `schubert:2143`. */
import { faulty, quote, type Reading } from "../outcomes/input-fault.js";
import { nearestName } from "../polynomials/nearest-name.js";
import { alternatingSignFamily } from "./alternating-sign.js";
import { commutingFamily } from "./commuting.js";
import { determinantalFamily } from "./determinantal.js";
import type { Family, Ideal } from "./ideal.js";
import { lowerUpperFamily } from "./lower-upper.js";
import { lowerUpperSchemeFamily } from "./lower-upper-scheme.js";
import { partialPermutationFamily } from "./partial-permutation.js";
import { schubertFamily } from "./schubert.js";

/** All families, in the order in which help lists them. */
export const families: readonly Family[] = [
  schubertFamily,
  partialPermutationFamily,
  alternatingSignFamily,
  determinantalFamily,
  lowerUpperFamily,
  lowerUpperSchemeFamily,
  commutingFamily,
];

/** Reads `family:argument`. */
export function readFamilyIdeal(name: string): Reading<Ideal> {
  const colon = name.indexOf(":");
  const word = colon === -1 ? name : name.slice(0, colon);
  const family = families.find((f) => f.name === word);
  if (family === undefined) {
    const near = nearestName(
      word,
      families.map((f) => f.name),
    );
    return faulty({
      message: `unknown family ${quote(word)}`,
      expected:
        near === undefined
          ? `one of ${families.map((f) => f.name).join(", ")}`
          : `${near}, perhaps`,
    });
  }
  if (colon === -1 || name.slice(colon + 1).trim() === "") {
    return faulty({
      message: `the family ${family.name} needs ${family.argument}`,
      expected: `for example ${family.example}`,
    });
  }
  const ideal = family.read(name.slice(colon + 1));
  if (ideal.ok || ideal.fault.place === undefined) return ideal;
  const { line, column } = ideal.fault.place;
  return faulty({ ...ideal.fault, place: { line, column: column + colon + 1 }, excerpt: name });
}
