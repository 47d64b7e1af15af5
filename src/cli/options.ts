/** The options that commands share, and how their values are read. */
import { type Command, InvalidArgumentError } from "commander";
import { launch } from "./launch.js";
import type { CommonOptions, JobName, JobSettings } from "./request.js";

const UNITS: ReadonlyMap<string, number> = new Map([
  ["KiB", 2 ** 10],
  ["MiB", 2 ** 20],
  ["GiB", 2 ** 30],
  ["KB", 1e3],
  ["MB", 1e6],
  ["GB", 1e9],
]);

/** Adds `--json`, `--seconds`, `--memory`, `--quiet`, `--progress` to a command. */
export function withCommonOptions(command: Command): Command {
  return command
    .option("--json", "print one JSON object and nothing else")
    .option("--seconds <number>", "stop as undecided after this many seconds", readSeconds)
    .option("--memory <size>", "stop as undecided past this much memory, such as 2GiB", readMemory)
    .option("--quiet", "no progress on standard error")
    .option("--progress", "progress on standard error even where it is no terminal");
}

/** Runs a job with the options that commander read, and sets the exit status. */
export async function runJob(
  job: JobName,
  subject: string,
  options: JobSettings & Partial<CommonOptions>,
): Promise<void> {
  const { json = false, quiet = false, progress = false, seconds, memory, ...settings } = options;
  process.exitCode = await launch({
    job,
    subject,
    settings,
    json,
    quiet,
    progress,
    ...(seconds === undefined ? {} : { seconds }),
    ...(memory === undefined ? {} : { memory }),
  });
}

function readSeconds(text: string): number {
  const seconds = /^\d+(\.\d+)?$/.test(text) ? Number(text) : Number.NaN;
  if (!(seconds > 0 && seconds < Infinity)) {
    throw new InvalidArgumentError("Expected a positive number of seconds, such as 60.");
  }
  return seconds;
}

function readMemory(text: string): number {
  const [, number = "", unit = ""] = /^(\d+(?:\.\d+)?) ?([A-Za-z]+)$/.exec(text) ?? [];
  const bytes = Number(number) * (UNITS.get(unit) ?? Number.NaN);
  if (!(bytes >= 1)) {
    throw new InvalidArgumentError("Expected a size with its unit, such as 512MiB or 2GiB.");
  }
  return bytes;
}
