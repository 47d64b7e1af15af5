/** `flatlimit verify`: are these generators a Gröbner basis for this order? */
import type { Command } from "commander";
import { runJob, withCommonOptions } from "../options.js";

/** Adds the command to the program. */
export function registerVerify(program: Command): void {
  const command = program
    .command("verify")
    .description("decide over the rationals whether a generating set is a Gröbner basis")
    .argument("<ideal>", "a family member such as schubert:2143, or a problem file")
    .option("--generators <set>", "the generating set, such as fulton or cdg")
    .option("--order <order>", 'the term order, such as "lex from nw by rows"');
  withCommonOptions(command)
    .addHelpText(
      "after",
      `
Example:
  flatlimit verify schubert:2143 --generators cdg --order "lex from nw by rows"`,
    )
    .action((ideal: string, options) => runJob("verify", ideal, options));
}
