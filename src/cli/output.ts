/**
 * Writing to standard output and standard error from any thread, at once and in order. A reader that
 * went away (`| head -1`) ends the program quietly; a slow reader is waited for.
 */
import { writeSync } from "node:fs";

/** Thrown when the reader of our output has closed it. */
export class OutputClosed extends Error {
  readonly code = "output-closed";
  constructor() {
    super("the output was closed");
    this.name = "OutputClosed";
  }
}

/** Milliseconds to wait for a slow reader before trying again. */
const PAUSE = 5;

/** Writes all of the text to a file descriptor. @throws OutputClosed */
export function writeAll(descriptor: 1 | 2, text: string): void {
  const bytes = Buffer.from(text, "utf8");
  const pause = new Int32Array(new SharedArrayBuffer(4));
  let written = 0;
  while (written < bytes.length) {
    try {
      written += writeSync(descriptor, bytes, written);
    } catch (error) {
      const code = error instanceof Error && "code" in error ? error.code : undefined;
      if (code === "EPIPE" || code === "EBADF") throw new OutputClosed();
      if (code !== "EAGAIN") throw error;
      Atomics.wait(pause, 0, 0, PAUSE);
    }
  }
}

/** Collects small pieces and writes them in larger ones; `flush` must end it. */
export function bufferedOutput(): { write(text: string): void; flush(): void } {
  const LARGE = 1 << 15;
  let held = "";
  let lines = 0;
  const flush = (): void => {
    if (held !== "") writeAll(1, held);
    held = "";
  };
  return {
    write(text) {
      held += text;
      // The first lines go out at once, so that a reader sees that something is coming.
      if (++lines <= 8 || held.length >= LARGE) flush();
    },
    flush,
  };
}
