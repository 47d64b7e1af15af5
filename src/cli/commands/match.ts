/** `flatlimit match`: components of the limit against tilings, in both directions. */
import type { Command } from "commander";
import { runJob, withCommonOptions } from "../options.js";

/** Adds the command to the program. */
export function registerMatch(program: Command): void {
  const command = program
    .command("match")
    .description("match the components of the flat limit with tilings, in both directions")
    .argument("<ideal>", "a family member such as schubert:214365, or a problem file")
    .option("--generators <set>", "the generating set to start from")
    .option("--order <order>", 'the term order, such as "lex from se by rows"')
    .option("--tilings <kind>", "ordinary or bumpless; by default as the order suggests");
  withCommonOptions(command)
    .addHelpText(
      "after",
      `
Example:
  flatlimit match schubert:214365 --order "lex from se by rows"`,
    )
    .action((ideal: string, options) => runJob("match", ideal, options));
}
