/**
 * Where an offset of a YAML scalar's value stands in its source. Value and source agree up to white space
 * for plain, folded and literal scalars, and for quoted ones without escapes: they are walked side by side.
 */

/**
 * The offset in `source` (the scalar as typed, with quotes or block header) of an offset in `value`, or
 * undefined when escapes keep the two from agreeing. Linear in the offset.
 */
export function placeInScalar(source: string, value: string, offset: number): number | undefined {
  let place = contentStart(source);
  for (let i = 0; i < offset && i < value.length; i++) {
    const sign = value.charAt(i);
    if (isSpace(sign)) continue;
    place = skipSpace(source, place);
    if (source.charAt(place) !== sign) return undefined;
    place++;
  }
  const next = value.charAt(offset);
  if (next === "" || isSpace(next)) return place;
  place = skipSpace(source, place);
  return source.charAt(place) === next ? place : undefined;
}

/* Behind the opening quote or the header line of a block. */
function contentStart(source: string): number {
  const first = source.charAt(0);
  if (first === "|" || first === ">") return source.indexOf("\n") + 1;
  return first === '"' || first === "'" ? 1 : 0;
}

function skipSpace(source: string, from: number): number {
  let place = from;
  while (isSpace(source.charAt(place))) place++;
  return place;
}

function isSpace(sign: string): boolean {
  return sign === " " || sign === "\t" || sign === "\n" || sign === "\r";
}
