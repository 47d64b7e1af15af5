/** A job: what one computing command does inside the worker thread. */
import type { Budget } from "../outcomes/budget.js";
import type { InputFault, Reading } from "../outcomes/input-fault.js";
import type { JobRequest } from "./request.js";

/** What a job works with. */
export interface JobContext {
  /** Writes to standard output. */
  readonly write: (text: string) => void;
  /** Writes one line to standard error. */
  readonly warn: (message: string) => void;
  readonly budget: Budget;
}

/** Does the request, writes the result, returns the exit status. @throws BadInput */
export type Job = (request: JobRequest, context: JobContext) => number;

/** Input that the user must mend; ends the program with status 2 and one message. */
export class BadInput extends Error {
  readonly code = "bad-input";
  readonly fault: InputFault;
  constructor(fault: InputFault) {
    super(fault.message);
    this.name = "BadInput";
    this.fault = fault;
  }
}

/** The value that was read. @throws BadInput if there is a fault instead. */
export function accept<T>(reading: Reading<T>): T {
  if (!reading.ok) throw new BadInput(reading.fault);
  return reading.value;
}
