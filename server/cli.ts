/** The command line. */
import { ExitCode } from './commands/exitCode.ts';
import { run } from './commands/run.ts';

// Whoever read the output may have had enough of it, as `head` has.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
  process.exit();
});
process.once('SIGINT', () => process.exit(ExitCode.interrupted));

process.exitCode = await run(process.argv.slice(2), process);
