/** The worker thread: makes the budget, runs the job that was asked for, reports the exit status. */
import { parentPort, workerData } from "node:worker_threads";
import { type Budget, startBudget } from "../outcomes/budget.js";
import { printFault } from "../report/fault-text.js";
import { BadInput, type Job } from "./job.js";
import { bufferedOutput, OutputClosed, writeAll } from "./output.js";
import { EXIT, type JobRequest, type WorkerMessage } from "./request.js";

const port = parentPort;
if (port === null) throw new TypeError("expected to run in a worker thread");
const send = (message: WorkerMessage): void => port.postMessage(message);
send(await run(workerData as JobRequest));

async function run(request: JobRequest): Promise<WorkerMessage> {
  const output = bufferedOutput();
  try {
    const { job } = (await import(`./jobs/${request.job}.js`)) as { job: Job };
    const status = job(request, {
      write: output.write,
      warn: (message) => {
        output.flush();
        writeAll(2, `flatlimit: ${message}\n`);
      },
      budget: budgetOf(request),
    });
    output.flush();
    return { kind: "done", status };
  } catch (error) {
    if (isOutOfMemory(error)) {
      return { kind: "undecided", reason: "a table grew past what memory can hold" };
    }
    return { kind: "done", status: statusOf(error) };
  }
}

function budgetOf(request: JobRequest): Budget {
  return startBudget({
    seconds: request.seconds,
    bytes: request.memory,
    bytesInUse: () => process.memoryUsage.rss(),
    progress: (stage) => send({ kind: "progress", stage }),
  });
}

function statusOf(error: unknown): number {
  if (error instanceof OutputClosed) return EXIT.holds;
  try {
    if (error instanceof BadInput) {
      writeAll(2, `${printFault(error.fault)}\n`);
      return EXIT.badInput;
    }
    writeAll(2, `flatlimit: internal fault: ${error instanceof Error ? error.message : error}\n`);
  } catch (closed) {
    if (!(closed instanceof OutputClosed)) throw closed;
  }
  return EXIT.fault;
}

/* What the platform throws when an array or map cannot grow further. */
function isOutOfMemory(error: unknown): boolean {
  return (
    error instanceof RangeError &&
    /allocation failed|Invalid (typed )?array length|maximum size exceeded/.test(error.message)
  );
}
