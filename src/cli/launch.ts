/**
 * Runs one request in a worker thread, so that the main thread stays free to answer: Ctrl-C ends at
 * once and says what was reached, and a computation that overruns its budget without noticing is ended
 * as undecided.
 */
import { totalmem } from "node:os";
import { Worker } from "node:worker_threads";
import { OutputClosed, writeAll } from "./output.js";
import { EXIT, type JobRequest, type WorkerMessage } from "./request.js";

/** Seconds that a worker may take over its budget to notice it. */
const GRACE = 3;
/** The part of the machine's memory that a worker's heap may take when nothing else is asked. */
const HEAP_SHARE = 0.75;
const MEBIBYTE = 2 ** 20;

/** Runs the request; the result is the exit status of the program. */
export function launch(request: JobRequest): Promise<number> {
  const started = performance.now();
  const heap = Math.floor((request.memory ?? totalmem() * HEAP_SHARE) / MEBIBYTE);
  const worker = new Worker(new URL("./worker.js", import.meta.url), {
    workerData: request,
    resourceLimits: { maxOldGenerationSizeMb: Math.max(heap, 16) },
  });
  let stage = "starting";
  const progress = progressLine(request, started);
  return new Promise((resolve) => {
    const finish = (status: number): void => {
      clearTimeout(overrun);
      progress.clear();
      resolve(status);
      void worker.terminate();
    };
    const elapsed = (): string => `${((performance.now() - started) / 1000).toFixed(1)} s`;
    const undecided = (reason: string): void => {
      if (request.json) {
        const { subject, job } = request;
        say(
          1,
          JSON.stringify({
            command: job,
            ideal: subject,
            verdict: "undecided",
            evidence: "undecided",
            reason,
          }),
        );
      }
      say(2, `flatlimit: undecided: ${reason}`);
      finish(EXIT.undecided);
    };
    const interrupt = (status: number) => (): void => {
      progress.clear();
      say(2, `flatlimit: interrupted after ${elapsed()}: ${stage}`);
      finish(status);
    };
    const overrun = setTimeout(
      () => undecided(`after ${elapsed()}, ${stage}`),
      Math.min(((request.seconds ?? Infinity) + GRACE) * 1000, 2 ** 31 - 1),
    );
    process.on("SIGINT", interrupt(EXIT.interrupted));
    process.on("SIGTERM", interrupt(EXIT.terminated));
    worker.on("message", (message: WorkerMessage) => {
      if (message.kind === "done") {
        finish(message.status);
        return;
      }
      if (message.kind === "undecided") {
        undecided(`${message.reason}, ${stage}`);
        return;
      }
      stage = message.stage;
      progress.show(stage);
    });
    worker.on("error", (error: Error & { code?: string }) => {
      if (error.code === "ERR_WORKER_OUT_OF_MEMORY") undecided(`the memory was used up, ${stage}`);
      else {
        say(2, `flatlimit: internal fault: ${error.message}`);
        finish(EXIT.fault);
      }
    });
  });
}

/** Milliseconds between two lines of progress where they cannot overwrite each other. */
const LINE_INTERVAL = 1000;

/** Progress on standard error: one line that overwrites itself on a terminal, a line a second elsewhere. */
function progressLine(
  { quiet, progress }: JobRequest,
  started: number,
): { show(stage: string): void; clear(): void } {
  const { stderr } = process;
  let last = started;
  const timed = (stage: string): string =>
    `${((performance.now() - started) / 1000).toFixed(1)} s  ${stage}`;
  if (quiet || (stderr.isTTY !== true && !progress)) {
    return { show: () => undefined, clear: () => undefined };
  }
  if (stderr.isTTY === true) {
    return {
      show: (stage) => stderr.write(`\r\u001b[K${timed(stage).slice(0, stderr.columns - 1)}`),
      clear: () => stderr.write("\r\u001b[K"),
    };
  }
  return {
    show(stage) {
      if (performance.now() - last < LINE_INTERVAL) return;
      last = performance.now();
      say(2, timed(stage));
    },
    clear: () => undefined,
  };
}

function say(descriptor: 1 | 2, line: string): void {
  try {
    writeAll(descriptor, `${line}\n`);
  } catch (error) {
    if (!(error instanceof OutputClosed)) throw error;
  }
}
