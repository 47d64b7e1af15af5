/** Running the built program as a user does. `npm test` builds it first. */
import { spawn, spawnSync } from "node:child_process";
import { fileURLToPath } from "node:url";

/** The built program. */
export const PROGRAM = fileURLToPath(new URL("../../dist/cli/main.js", import.meta.url));

/** What a run left behind. */
export interface Run {
  readonly status: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs the program to its end. */
export function flatlimit(...args: string[]): Run {
  const { status, stdout, stderr } = spawnSync(process.execPath, [PROGRAM, ...args], {
    encoding: "utf8",
    maxBuffer: 2 ** 28,
  });
  return { status, stdout, stderr };
}

/** Runs the program with `--json` and reads what it printed. */
export function flatlimitJson(...args: string[]): Run & { readonly json: Record<string, unknown> } {
  const run = flatlimit(...args, "--json");
  return { ...run, json: JSON.parse(run.stdout) as Record<string, unknown> };
}

/** Starts the program and sends it a signal as soon as it has shown what it is doing. */
export function interrupted(signal: NodeJS.Signals, ...args: string[]): Promise<Run> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [PROGRAM, ...args, "--progress"]);
    let stdout = "";
    let stderr = "";
    child.stdout.on("data", (chunk: Buffer) => {
      stdout += chunk.toString();
    });
    child.stderr.on("data", (chunk: Buffer) => {
      if (stderr === "") child.kill(signal);
      stderr += chunk.toString();
    });
    child.on("close", (status) => resolve({ status, stdout, stderr }));
  });
}

/** Starts the program and closes its output after the first piece of it. */
export function closedAfterFirstPiece(...args: string[]): Promise<Run> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [PROGRAM, ...args]);
    let stdout = "";
    let stderr = "";
    child.stdout.once("data", (chunk: Buffer) => {
      stdout += chunk.toString();
      child.stdout.destroy();
    });
    child.stderr.on("data", (chunk: Buffer) => {
      stderr += chunk.toString();
    });
    child.on("exit", (status) => resolve({ status, stdout, stderr }));
  });
}
