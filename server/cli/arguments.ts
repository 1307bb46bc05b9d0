/** Subcommands and their options. Each action loads its own module. */
import { Command, CommanderError, Option } from 'commander';
import { severities, type Severity } from '../checks/severity.ts';
import { exitCode } from './exit.ts';

/** Runs the subcommand that the arguments name, and returns the exit code. */
export async function runArguments(args: readonly string[], version: string): Promise<number> {
  let code: number = exitCode.nothingFound;
  const program = new Command('isonym')
    .description(
      'Checks the laboratory notebooks of synthetic chemists: whether every name, formula, structure and mass in ' +
        'their compound blocks describes one and the same compound.',
    )
    .version(version, '-V, --version')
    .helpOption('-h, --help', 'show this help')
    .configureHelp({ showGlobalOptions: false })
    .showSuggestionAfterError(true)
    .exitOverride();

  program
    .command('check')
    .description('check notebook pages and say what is wrong with them')
    .argument('[path...]', 'Markdown files, or folders to search for them; - reads standard input', ['.'])
    .addOption(new Option('--format <format>', 'how to print').choices(['text', 'json']).default('text'))
    .addOption(
      new Option('--fail-on <severity>', 'the least severity that makes the exit code 1')
        .choices([...severities])
        .default('warning'),
    )
    .option('--config <file>', 'settings for all files, instead of the isonym.json above each')
    .addHelpText(
      'after',
      '\nExit code: 0 nothing at or above the level, 1 something, 2 something could not be checked.',
    )
    .action(async (paths: string[], options: { format: string; failOn: string; config?: string }) => {
      const { check } = await import('./check.ts');
      code = await check({
        paths,
        format: options.format === 'json' ? 'json' : 'text',
        failOn: options.failOn as Severity,
        config: options.config,
      });
    });

  program
    .command('read')
    .description('say which structures a name can mean')
    .argument('<name...>', 'names of compounds; - reads one name a line from standard input')
    .option('--json', 'one JSON object a line')
    .action(async (names: string[], options: { json?: boolean }) => {
      const { read } = await import('./read.ts');
      code = await read(names, options.json === true);
    });

  program
    .command('report')
    .description('write one page for the reviewer: every entry drawn, with its readings and findings')
    .argument('[path...]', 'Markdown files, or folders to search for them', ['.'])
    .requiredOption('-o, --output <file>', 'the HTML file to write')
    .option('--config <file>', 'settings for all files, instead of the isonym.json above each')
    .action(async (paths: string[], options: { output: string; config?: string }) => {
      const { report } = await import('./report.ts');
      code = await report({ paths, output: options.output, config: options.config });
    });

  program
    .command('checks')
    .description('list the checks, or explain one')
    .argument('[id]', 'the id of a check')
    .action(async (id?: string) => {
      const { checks } = await import('./checks.ts');
      code = checks(id);
    });

  try {
    await program.parseAsync(args, { from: 'user' });
  } catch (error) {
    if (!(error instanceof CommanderError)) throw error;
    // Commander has printed the help, the version or what is wrong with the arguments.
    return error.exitCode === 0 ? exitCode.nothingFound : exitCode.couldNotRun;
  }
  return code;
}
