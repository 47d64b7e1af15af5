/** What the main thread asks of the worker, and what the worker tells it: plain data on both ways. */

/** The commands that compute; each has a file of its name in `jobs/`. */
export type JobName = "verify" | "limit" | "match" | "tilings";

/** Options that every computing command takes. */
export interface CommonOptions {
  readonly json: boolean;
  readonly quiet: boolean;
  /** Progress even where standard error is no terminal. */
  readonly progress: boolean;
  /** Wall-clock seconds. */
  readonly seconds?: number;
  /** Bytes. */
  readonly memory?: number;
}

/** One command line, read and checked as far as that needs no computation. */
export interface JobRequest extends CommonOptions {
  readonly job: JobName;
  /** The ideal or permutation, as typed. */
  readonly subject: string;
  /** The command's own options, as typed. */
  readonly settings: JobSettings;
}

/** The options of single commands; absent means not given. */
export interface JobSettings {
  readonly generators?: string;
  readonly order?: string;
  readonly tilings?: string;
  readonly kind?: string;
  readonly count?: boolean;
  readonly draw?: boolean;
  readonly all?: boolean;
}

/** Messages from the worker. */
export type WorkerMessage =
  | { readonly kind: "progress"; readonly stage: string }
  | { readonly kind: "done"; readonly status: number }
  /** The job could not go on and has written nothing; the main thread says so. */
  | { readonly kind: "undecided"; readonly reason: string };

/** Exit statuses of the program. */
export const EXIT = {
  holds: 0,
  fails: 1,
  badInput: 2,
  undecided: 3,
  fault: 4,
  interrupted: 130,
  terminated: 143,
} as const;
