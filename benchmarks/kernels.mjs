/**
 * The kernel's loops against the same loops in C, interleaved, medians; C is compiled on the spot when there
 * is a compiler. `--json` prints JSON, `--rounds N` (default 7).
 */
import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { LOOPS, runLoop } from "./kernel-loops.mjs";
import { flag, median, number } from "./options.mjs";

/** Repetitions within one measurement: some tens of milliseconds each. */
const REPETITIONS = { sparse: 100, sparse26: 100, lanes: 40, products: 20, divisors: 60 };

const folder = mkdtempSync(join(tmpdir(), "flatlimit-"));
const binary = join(folder, "kernel-loops");
const source = fileURLToPath(new URL("kernel-loops.c", import.meta.url));
const compiled = spawnSync("cc", ["-O3", "-march=native", "-o", binary, source]);

/** @param {string} loop @param {number} repetitions */
function runC(loop, repetitions) {
  const { stdout, status } = spawnSync(binary, [loop, String(repetitions)], { encoding: "utf8" });
  if (status !== 0) throw new Error(`the C loop ${loop} ended with ${status}`);
  const [seconds = "", checksum = ""] = stdout.trim().split(" ");
  return { seconds: Number(seconds), checksum };
}

const contestants = {
  ...(compiled.status === 0 ? { c: runC } : {}),
  compiled: (/** @type {string} */ loop, /** @type {number} */ n) => runLoop(loop, "compiled", n),
  plain: (/** @type {string} */ loop, /** @type {number} */ n) => runLoop(loop, "plain", n),
};

const rows = LOOPS.map((loop) => {
  const repetitions = REPETITIONS[/** @type {keyof typeof REPETITIONS} */ (loop)];
  /** @type {Record<string, number[]>} */
  const seconds = {};
  const checksums = new Set();
  for (let round = 0; round < number("rounds", 7); round++) {
    for (const [name, run] of Object.entries(contestants)) {
      const result = run(loop, repetitions);
      seconds[name] = [...(seconds[name] ?? []), result.seconds];
      checksums.add(result.checksum);
    }
  }
  if (checksums.size !== 1) throw new Error(`${loop}: checksums ${[...checksums].join(", ")}`);
  const medians = Object.entries(seconds).map(([name, times]) => [name, median(times)]);
  return { loop, checksum: [...checksums][0], ...Object.fromEntries(medians) };
});
rmSync(folder, { recursive: true });

if (flag("json")) {
  process.stdout.write(`${JSON.stringify({ node: process.version, rows })}\n`);
} else {
  for (const { loop, checksum, c, compiled: wasm, plain } of rows) {
    const ratio = (/** @type {number} */ time) =>
      c === undefined ? "" : ` (${(c / time).toFixed(2)} of C)`;
    const parts = [
      c === undefined ? "no C compiler" : `C ${(1000 * c).toFixed(1)} ms`,
      `compiled ${(1000 * wasm).toFixed(1)} ms${ratio(wasm)}`,
      `plain ${(1000 * plain).toFixed(1)} ms${ratio(plain)}`,
    ];
    process.stdout.write(`${loop.padEnd(10)}${parts.join(", ")}, checksum ${checksum}\n`);
  }
}
