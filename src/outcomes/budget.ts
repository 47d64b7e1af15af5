/**
 * Budgets: how long and how large a computation may grow, and how it reports progress.
 * Long loops call `spend`; when a limit is reached it throws `LimitReached`, which every public
 * entry point turns into an `undecided` outcome. Cooperative, so nothing is ever half-written.
 */

/** Why a computation stopped before it had an answer. */
export interface Undecided {
  readonly kind: "undecided";
  /** `size`: a number or table grew too large; `method`: there is no method for this input yet. */
  readonly limit: "seconds" | "bytes" | "cancelled" | "size" | "method";
  /** What was reached, in one clause: "after 10.0 s, in degree 7 with 412 elements". */
  readonly reason: string;
}

/** Thrown inside a computation when its budget is spent; caught by `withinBudget`. */
export class LimitReached extends Error {
  readonly code = "limit-reached";
  readonly undecided: Undecided;
  constructor(undecided: Undecided) {
    super(undecided.reason);
    this.name = "LimitReached";
    this.undecided = undecided;
  }
}

/** What a budget needs from its surroundings; every member has a harmless default. */
export interface BudgetOptions {
  /** Wall-clock seconds from the budget's creation; default: no limit. */
  readonly seconds?: number | undefined;
  /** Bytes that `bytesInUse` may reach; default: no limit. */
  readonly bytes?: number | undefined;
  /** Milliseconds clock, injected so that the core needs no platform; default `performance.now`. */
  readonly now?: (() => number) | undefined;
  /** Bytes in use by the process; default: unknown, so that `bytes` is not checked. */
  readonly bytesInUse?: (() => number) | undefined;
  /** True once the user asked to stop. */
  readonly cancelled?: (() => boolean) | undefined;
  /** Receives the stage the computation is in, a few times a second at most. */
  readonly progress?: ((stage: string) => void) | undefined;
}

/** A running budget. */
export interface Budget {
  /**
   * To be called from long loops, cheaply and often: checks the limits every few milliseconds.
   * @param stage says where the computation is; only evaluated when it is needed.
   * @param work how many ordinary calls this one stands for, 1 by default; 8 make sure of a look at the clock.
   * @throws LimitReached when a limit is passed.
   */
  spend(stage: () => string, work?: number): void;
  /** Seconds since the budget was made. */
  elapsed(): number;
}

/**
 * Calls of `spend` between two looks at the clock. A look takes some 50 ns; a call may stand for 100 ms of
 * work with long integers or wide matrices, and a limit is to be honoured within about a second.
 */
const CALLS_BETWEEN_LOOKS = 8;
/** Milliseconds between two progress reports. */
const PROGRESS_INTERVAL = 100;

/** Starts a budget now. */
export function startBudget(options: BudgetOptions = {}): Budget {
  const now = options.now ?? (() => performance.now());
  const start = now();
  const deadline = options.seconds === undefined ? Infinity : start + options.seconds * 1000;
  let calls = 0;
  let lastReport = start;
  return {
    elapsed: () => (now() - start) / 1000,
    spend(stage, work = 1) {
      calls += work;
      if (calls < CALLS_BETWEEN_LOOKS) return;
      calls = 0;
      const time = now();
      const stop = (limit: Undecided["limit"], what: string): never => {
        throw new LimitReached({ kind: "undecided", limit, reason: `${what}, ${stage()}` });
      };
      if (time > deadline) stop("seconds", `after ${((time - start) / 1000).toFixed(1)} s`);
      if (options.cancelled?.() === true) stop("cancelled", "cancelled");
      if (time - lastReport >= PROGRESS_INTERVAL) {
        lastReport = time;
        options.progress?.(stage());
        const bytes = options.bytes !== undefined ? options.bytesInUse?.() : undefined;
        if (bytes !== undefined && options.bytes !== undefined && bytes > options.bytes) {
          stop("bytes", `with ${Math.round(bytes / 2 ** 20)} MiB in use`);
        }
      }
    },
  };
}

/** A budget without limits that reports nothing. */
export function unlimited(): Budget {
  return startBudget();
}

/** Runs a computation and turns a reached limit into an `Undecided` value. */
export function withinBudget<T>(compute: () => T): T | Undecided {
  try {
    return compute();
  } catch (error) {
    if (error instanceof LimitReached) return error.undecided;
    throw error;
  }
}

/** Is this a list that was reached, and not a limit? */
export function isList<T>(found: readonly T[] | Undecided): found is readonly T[] {
  return Array.isArray(found);
}
