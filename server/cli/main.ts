/** The command `isonym`: takes the arguments apart and loads only what the subcommand needs. */
import { version } from '../../package.json';
import { exitCode, RunProblem } from './exit.ts';

/** A reader of our output that has had enough, such as `head`, is no failure. */
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exit(process.exitCode);
  throw error;
});

async function run(args: readonly string[]): Promise<number> {
  // Before anything is loaded: scripts ask for it often.
  if (args.length === 1 && (args[0] === '--version' || args[0] === '-V')) {
    console.log(version);
    return exitCode.nothingFound;
  }
  const { runArguments } = await import('./arguments.ts');
  return runArguments(args, version);
}

try {
  process.exitCode = await run(process.argv.slice(2));
} catch (error) {
  process.exitCode = exitCode.couldNotRun;
  if (error instanceof RunProblem) console.error(`isonym: ${error.message}`);
  else throw error;
}
