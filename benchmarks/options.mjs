/** What the benchmarks share: their command line and the median. */
const args = process.argv.slice(2);

/** Was `--name` given? @param {string} name */
export const flag = (name) => args.includes(`--${name}`);

/** The number after `--name`. @param {string} name @param {number} otherwise */
export function number(name, otherwise) {
  const at = args.indexOf(`--${name}`);
  return at === -1 ? otherwise : Number(args[at + 1]);
}

/** The words that are neither options nor their values. */
export const words = args.filter((a, k) => !a.startsWith("--") && args[k - 1] !== "--rounds");

/** @param {readonly number[]} values */
export function median(values) {
  return [...values].sort((a, b) => a - b)[values.length >> 1] ?? 0;
}
