/** The commands and their options. What a command does is imported when it is asked for. */
import { createRequire } from 'node:module';
import { Command, InvalidArgumentError } from 'commander';
import type { EvaluateOptions } from './evaluate.ts';
import type { FunctionsOptions } from './functions.ts';
import type { RenderOptions } from './render.ts';
import type { ServeOptions } from './serve.ts';
import type { Surroundings } from './surroundings.ts';

const MOST_SECONDS = 86_400;
const MOST_PORTS = 65_535;
/** KEEL on the keys of a telephone; no registered service uses it. */
const USUAL_PORT = 5335;

const EXIT_CODES = `
Exit codes: 0 all good; 1 evaluated, but an output holds an error or a check did not pass (an error in
any other cell is shown and does not count); 2 what was given cannot be used, or exceeds a limit of time
or size; 130 interrupted.`;

/** `settle` is given the exit code of the command that ran. */
export function createProgram(surroundings: Surroundings, settle: (exitCode: number) => void): Command {
  const program = new Command('evenkeel')
    .description('Evaluates workbooks whose cells hold chemical equilibria.')
    .version(version())
    .configureOutput({
      writeOut: (text) => surroundings.stdout.write(text),
      writeErr: (text) => surroundings.stderr.write(text),
    })
    .showHelpAfterError('Run it with --help for its options.')
    .addHelpText('after', EXIT_CODES)
    .exitOverride();

  evaluating(program.command('evaluate'))
    .summary('evaluate a workbook')
    .description(
      'Evaluates a workbook (- for standard input): its outputs, its checks, what needs attention.',
    )
    .option('--cells', 'show every cell as well')
    .option('--json', 'print one JSON object')
    .option('--save <file>', 'keep the evaluation (.json) or its page (.html)')
    .action(async (workbook: string, options: EvaluateOptions) => {
      const { evaluate } = await import('./evaluate.ts');
      settle(await evaluate(workbook, options, surroundings));
    });

  evaluating(program.command('render'))
    .summary('write the page of a workbook')
    .description('Evaluates a workbook (- for standard input) and writes it as one page that can be printed.')
    .requiredOption('--save <file>', 'where to write it (.html), - for standard output')
    .action(async (workbook: string, options: RenderOptions) => {
      const { render } = await import('./render.ts');
      settle(await render(workbook, options, surroundings));
    });

  withOwnFunctions(program.command('functions'))
    .summary('list the cell functions, or describe one')
    .description('Lists the cell functions; with a name describes that one, or lists its family.')
    .argument('[name]', 'such as EXTENT.SOLVE, or EXTENT')
    .option('--json', 'print one JSON array')
    .action(async (name: string | undefined, options: FunctionsOptions) => {
      const { functions } = await import('./functions.ts');
      settle(await functions(name, options, surroundings));
    });

  withTimeLimit(withOwnFunctions(program.command('serve')))
    .summary('show workbooks in a browser on this computer')
    .description('Shows workbooks as pages at 127.0.0.1, the samples unless files are given.')
    .argument('[workbooks...]', 'text workbooks')
    .option('--port <number>', '0 for any that is free', portNumber, USUAL_PORT)
    .action(async (workbooks: string[], options: ServeOptions) => {
      const { serve } = await import('./serve.ts');
      settle(await serve(workbooks, options, surroundings));
    });
  return program;
}

function evaluating(command: Command) {
  return withTimeLimit(withOwnFunctions(command.argument('<workbook>', 'a text workbook (YAML), or -')))
    .option('--set <name=value>', 'give an input another value; once for each', collected)
    .addHelpText('after', EXIT_CODES);
}

function withOwnFunctions(command: Command) {
  return command.option('--functions <file>', 'a JavaScript module with functions of your own');
}

function withTimeLimit(command: Command) {
  return command.option('--time-limit <seconds>', 'of one evaluation (default: 15)', seconds);
}

function collected(text: string, before: string[] = []): string[] {
  return [...before, text];
}

function seconds(text: string): number {
  const value = Number(text);
  if (value > 0 && value <= MOST_SECONDS) return value;
  throw new InvalidArgumentError(`Give seconds, above 0 and at most ${MOST_SECONDS}.`);
}

function portNumber(text: string): number {
  if (/^\d+$/.test(text) && Number(text) <= MOST_PORTS) return Number(text);
  throw new InvalidArgumentError(`Give a whole number from 0 to ${MOST_PORTS}.`);
}

function version(): string {
  return (createRequire(import.meta.url)('evenkeel/package.json') as { version: string }).version;
}
