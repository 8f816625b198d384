import { CommanderError } from 'commander';
import { isInputError } from '../../functions/errors.ts';
import { ExitCode } from './exitCode.ts';
import { createProgram } from './program.ts';
import type { Surroundings } from './surroundings.ts';

/** Runs one command line, without the name of the program, and gives its exit code. */
export async function run(words: readonly string[], surroundings: Surroundings): Promise<number> {
  let exitCode: number = ExitCode.good;
  const program = createProgram(surroundings, (code) => (exitCode = code));
  try {
    await program.parseAsync(words, { from: 'user' });
    return exitCode;
  } catch (thrown) {
    return explain(thrown, surroundings);
  }
}

/** Whatever ends a command early was no evaluation: its code is that of an input that cannot be used. */
function explain(thrown: unknown, { stderr }: Surroundings): number {
  if (thrown instanceof CommanderError) {
    // It has said what it has to say.
    return thrown.exitCode === 0 ? ExitCode.good : ExitCode.unusable;
  }
  const { name, message, stack, code } = thrown as NodeJS.ErrnoException;
  if (code === 'ERR_SCRIPT_EXECUTION_INTERRUPTED') return ExitCode.interrupted;
  if (isInputError(thrown)) stderr.write(`error: ${message}\n`);
  else if (name === 'UnusableWorkbook') stderr.write(`${message}\n`);
  else
    stderr.write(`error: this is a fault of the program, not of what it was given.\n${stack ?? message}\n`);
  return ExitCode.unusable;
}
