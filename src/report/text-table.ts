/** Plain text tables for a terminal: columns as wide as their longest entry, two spaces between them. */

/** One column: its heading, and whether its entries are set to the right. */
export interface Column {
  readonly heading: string;
  readonly right?: boolean;
}

/** The lines of a table, heading first. Entries are single lines. */
export function textTable(
  columns: readonly Column[],
  rows: readonly (readonly string[])[],
): string[] {
  const widths = columns.map(({ heading }, k) =>
    rows.reduce((width, row) => Math.max(width, characters(row[k])), characters(heading)),
  );
  const line = (entries: readonly string[]): string =>
    entries
      .map((entry, k) => {
        const padding = " ".repeat((widths[k] ?? 0) - characters(entry));
        return columns[k]?.right === true ? padding + entry : entry + padding;
      })
      .join("  ")
      .trimEnd();
  return [line(columns.map((c) => c.heading)), ...rows.map(line)];
}

/* Characters, not UTF-16 units; all that is printed here is one column wide. */
function characters(text: string | undefined): number {
  return Array.from(text ?? "").length;
}
