/**
 * Runs every workload once per round, interleaved, and prints workload, checksum, median and spread in CPU
 * seconds, and the peak resident set so far. `--json` prints JSON instead; `--rounds N`; a word filters.
 */
import { workloads } from "./workloads.mjs";

const args = process.argv.slice(2);
const json = args.includes("--json");
const roundsAt = args.indexOf("--rounds");
const rounds = roundsAt === -1 ? 3 : Number(args[roundsAt + 1]);
const words = args.filter((a, k) => !a.startsWith("--") && (roundsAt === -1 || k !== roundsAt + 1));
const chosen = workloads.filter(({ name }) => words.every((word) => name.includes(word)));

/** @type {Map<string, { checksum: string, seconds: number[], peak: number }>} */
const results = new Map();
for (let round = 0; round < rounds; round++) {
  for (const { name, run } of chosen) {
    const before = process.cpuUsage();
    const checksum = run();
    const { user, system } = process.cpuUsage(before);
    const known = results.get(name) ?? { checksum, seconds: [], peak: 0 };
    if (known.checksum !== checksum)
      throw new Error(`${name}: ${checksum}, before ${known.checksum}`);
    known.seconds.push((user + system) / 1e6);
    known.peak = process.resourceUsage().maxRSS * 1024;
    results.set(name, known);
  }
}

const rows = [...results].map(([workload, { checksum, seconds, peak }]) => {
  const sorted = [...seconds].sort((a, b) => a - b);
  const [least = 0] = sorted;
  return {
    workload,
    checksum,
    median: sorted[sorted.length >> 1] ?? 0,
    least,
    most: sorted.at(-1) ?? 0,
    peakBytes: peak,
  };
});
if (json) {
  process.stdout.write(`${JSON.stringify({ node: process.version, rounds, rows })}\n`);
} else {
  for (const { workload, checksum, median, least, most, peakBytes } of rows) {
    const times = `${median.toFixed(3)} s  (${least.toFixed(3)} to ${most.toFixed(3)})`;
    process.stdout.write(
      `${workload}\n    ${times}  peak ${Math.round(peakBytes / 2 ** 20)} MiB  ${checksum}\n`,
    );
  }
}
