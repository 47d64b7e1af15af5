#!/usr/bin/env node
/**
 * The program `flatlimit`: reads the command line and hands the work to a worker thread. Only what
 * reading needs is loaded here, so that `--help` answers at once.
 */
import { Command, CommanderError } from "commander";
import { registerLimit } from "./commands/limit.js";
import { registerMatch } from "./commands/match.js";
import { registerTilings } from "./commands/tilings.js";
import { registerVerify } from "./commands/verify.js";
import { OutputClosed, writeAll } from "./output.js";
import { EXIT } from "./request.js";

const program = new Command("flatlimit")
  .description(
    "Flat limits of rank-condition ideals: Gröbner verification, components, multiplicities, tilings.",
  )
  .version("0.1.0")
  .addHelpText(
    "after",
    `
An IDEAL is a family member such as schubert:214365, or the path of a problem file (.yaml, .json).
Exit status: 0 the claim holds, 1 it fails, 2 bad input, 3 undecided, 4 internal fault.

Example:
  flatlimit match schubert:214365 --order "lex from se by rows"`,
  )
  .showHelpAfterError(false)
  .exitOverride()
  .configureOutput({
    writeOut: (text) => writeAll(1, text),
    writeErr: () => undefined,
  });

for (const register of [registerVerify, registerLimit, registerMatch, registerTilings]) {
  register(program);
}

process.exitCode = await main();

async function main(): Promise<number> {
  try {
    if (process.argv.length <= 2) {
      program.outputHelp();
      return EXIT.holds;
    }
    await program.parseAsync();
    return Number(process.exitCode ?? EXIT.holds);
  } catch (error) {
    if (error instanceof OutputClosed) return EXIT.holds;
    if (error instanceof CommanderError) {
      if (error.exitCode === 0) return EXIT.holds;
      const message = error.message.replace(/^error: /, "").replaceAll("\n", " ");
      writeAll(2, `flatlimit: ${message}\n  see flatlimit --help\n`);
      return EXIT.badInput;
    }
    throw error;
  }
}
