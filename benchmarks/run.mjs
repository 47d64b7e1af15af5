/**
 * Runs every workload once per round, interleaved, each in a process of its own, and prints workload, checksum,
 * median and spread in CPU seconds of the workload alone, and the peak resident set of its process. `--json`
 * prints JSON instead; `--rounds N` (default 3); `--long` takes the workloads of minutes too; words filter by name.
 */
import { spawnSync } from "node:child_process";
import { fileURLToPath } from "node:url";
import { flag, median, number, words } from "./options.mjs";
import { workloads } from "./workloads.mjs";

/** @typedef {Map<string, { checksum: string, seconds: number[], peakBytes: number }>} Results */

const only = process.env["FLATLIMIT_WORKLOAD"];
if (only !== undefined) {
  const workload = workloads.find(({ name }) => name === only);
  if (workload === undefined) throw new Error(`no workload ${only}`);
  const before = process.cpuUsage();
  const checksum = workload.run();
  const { user, system } = process.cpuUsage(before);
  const peakBytes = process.resourceUsage().maxRSS * 1024;
  process.stdout.write(JSON.stringify({ checksum, seconds: (user + system) / 1e6, peakBytes }));
} else {
  const chosen = workloads.filter(
    ({ name, long }) =>
      words.every((word) => name.includes(word)) && (long !== true || flag("long")),
  );
  /** @type {Results} */
  const results = new Map();
  for (let round = 0; round < number("rounds", 3); round++) {
    for (const { name } of chosen) {
      const { checksum, seconds, peakBytes } = runInProcess(name);
      const known = results.get(name) ?? { checksum, seconds: [], peakBytes: 0 };
      if (known.checksum !== checksum)
        throw new Error(`${name}: ${checksum}, before ${known.checksum}`);
      known.seconds.push(seconds);
      known.peakBytes = Math.max(known.peakBytes, peakBytes);
      results.set(name, known);
    }
  }
  report(results);
}

/** @param {string} name @returns {{ checksum: string, seconds: number, peakBytes: number }} */
function runInProcess(name) {
  const { stdout, status } = spawnSync(process.execPath, [fileURLToPath(import.meta.url)], {
    encoding: "utf8",
    env: { ...process.env, FLATLIMIT_WORKLOAD: name },
    stdio: ["ignore", "pipe", "inherit"],
  });
  if (status !== 0) throw new Error(`${name} ended with ${status}`);
  return JSON.parse(stdout);
}

/** @param {Results} results */
function report(results) {
  const rows = [...results].map(([workload, { checksum, seconds, peakBytes }]) => ({
    workload,
    checksum,
    median: median(seconds),
    least: Math.min(...seconds),
    most: Math.max(...seconds),
    peakBytes,
  }));
  if (flag("json")) {
    process.stdout.write(`${JSON.stringify({ node: process.version, rows })}\n`);
    return;
  }
  for (const { workload, checksum, median: middle, least, most, peakBytes } of rows) {
    const times = `${middle.toFixed(3)} s  (${least.toFixed(3)} to ${most.toFixed(3)})`;
    process.stdout.write(
      `${workload}\n    ${times}  peak ${Math.round(peakBytes / 2 ** 20)} MiB  ${checksum}\n`,
    );
  }
}
