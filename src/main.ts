import about from '../package.json' with { type: 'json' };
import { COMMANDS, dispatch, fail, stdout, write } from './commands/index.ts';

/**
 * The program: runs one command line.
 *
 * @param argv  words after `runbrief`
 * @returns     exit code: 0 done, 1 a problem in what was given, 2 wrong use, 3 our defect, 4 a limit missed
 */
export async function main(argv: readonly string[]): Promise<number> {
  try {
    if (argv[0] !== '--version') return await dispatch(argv, COMMANDS);
    write(stdout, `runbrief ${about.version}\n`);
    return 0;
  } catch (error) {
    const end = argv.indexOf('--');
    return fail(error, argv.slice(0, end < 0 ? argv.length : end).includes('--json'));
  }
}

/** For bin/: a stray error is a defect, told without a stack. */
export async function start(): Promise<void> {
  process.on('uncaughtException', (error) => process.exit(fail(error, false)));
  // All is written by now. What the runtime still compiles in the background is of no use any more; without this it is waited for.
  process.exit(await main(process.argv.slice(2)));
}
