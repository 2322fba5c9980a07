// The `linkwright` command: documents in, JSON or CSV out. stdout carries the result alone, stderr the messages.

import { Command, CommanderError } from "commander";
import { BadInput } from "./badInput.ts";
import { sweepCommand } from "./commands/sweep.ts";

const EXIT_BAD_INPUT = 2;

const program = new Command("linkwright")
  .description("Steering linkages and independent suspension from the command line.")
  .exitOverride()
  .configureHelp({ showGlobalOptions: true })
  .addCommand(sweepCommand());

for (const command of program.commands) command.exitOverride();

try {
  await program.parseAsync(process.argv);
} catch (error) {
  if (error instanceof BadInput) {
    for (const line of error.lines) process.stderr.write(`${line}\n`);
    process.exitCode = EXIT_BAD_INPUT;
  } else if (error instanceof CommanderError) {
    // Commander has told what was wrong; asking for help is not an error.
    process.exitCode = error.exitCode === 0 ? 0 : EXIT_BAD_INPUT;
  } else {
    throw error;
  }
}
