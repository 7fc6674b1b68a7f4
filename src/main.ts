import about from '../package.json' with { type: 'json' };
import { COMMANDS, dispatch, fail } from './commands/index.ts';

/**
 * The program: runs one command line.
 *
 * @param argv  words after `runbrief`
 * @returns     exit code: 0 done, 1 a problem in what was given, 2 wrong use, 3 our defect, 4 a limit missed
 */
export async function main(argv: readonly string[]): Promise<number> {
  try {
    if (argv[0] !== '--version') return await dispatch(argv, COMMANDS);
    process.stdout.write(`runbrief ${about.version}\n`);
    return 0;
  } catch (error) {
    const end = argv.indexOf('--');
    return fail(error, argv.slice(0, end < 0 ? argv.length : end).includes('--json'));
  }
}

/** For bin/: a reader that goes away early, such as `head`, is no failure, a full disk is; a stray error is a defect, told without a stack. */
export async function start(): Promise<void> {
  for (const stream of [process.stdout, process.stderr]) {
    stream.on('error', (error: NodeJS.ErrnoException) => {
      if (error.code === 'EPIPE') return;
      process.stderr.write(`the result could not be written: ${error.message}\n`);
      process.exit(1);
    });
  }
  process.on('uncaughtException', (error) => process.exit(fail(error, false)));
  process.exitCode = await main(process.argv.slice(2));
  // What the runtime still compiles in the background is of no use any more; without this it is waited for.
  if (process.stdout.writableLength === 0 && process.stderr.writableLength === 0) process.exit();
}
