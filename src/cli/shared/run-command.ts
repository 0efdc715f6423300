import { type ExitCode, exitCodes, Refusal } from './exit-codes';

/** What every command is made of. */
export interface Command<Asked> {
  help: string;
  /** @throws Refusal for arguments that do not fit */
  parse: (args: string[]) => Asked | 'help';
  /** Does the work and prints. @throws Refusal for bad input */
  run: (asked: Asked) => Promise<ExitCode>;
  /** Where code 1 says something else, as the outcome of a gate. */
  internalError?: ExitCode;
}

/** Runs a command with its arguments: help, refusals and our own errors are told alike by all of them. */
export async function runCommand<Asked>(
  { help, parse, run, internalError = exitCodes.internalError }: Command<Asked>,
  args: string[]
): Promise<ExitCode> {
  try {
    const asked = parse(args);
    if (asked !== 'help') return await run(asked);
    process.stdout.write(help);
    return exitCodes.done;
  } catch (error) {
    if (error instanceof Refusal) {
      process.stderr.write(`${error.lines.join('\n')}\n`);
      return exitCodes.badInput;
    }
    const said = error instanceof Error ? (error.stack ?? error.message) : String(error);
    process.stderr.write(`Internal error, not your file's fault: please report it.\n${said}\n`);
    return internalError;
  }
}
