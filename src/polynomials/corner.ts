/** The four corners of a matrix: where a reading of its cells starts, or where rank bounds sit. */
export type Corner = "nw" | "ne" | "sw" | "se";

/** All corners, in the order in which messages list them. */
export const CORNERS: readonly Corner[] = ["nw", "ne", "sw", "se"];

/** Does a string name a corner? */
export function isCorner(text: string): text is Corner {
  return (CORNERS as readonly string[]).includes(text);
}
