import { nearestName, Problem } from '../problems/index.ts';
import { commandHelp, overview } from './help.ts';
import { stdout, write } from './output.ts';
import type { Entry } from './registry.ts';

/**
 * Finds the command, runs it or shows its help.
 *
 * @param argv      words after `runbrief`
 * @param commands  the registry
 * @returns         exit code
 * @throws          {Problem} unknown-command; whatever the command throws
 */
export async function dispatch(argv: readonly string[], commands: Readonly<Record<string, Entry>>): Promise<number> {
  const [first = '--help', ...rest] = argv;
  const asked = first === 'help' ? rest[0] : first;
  if (asked === undefined || asked === '--help' || asked === '-h') return print(overview(commands));
  const entry = Object.hasOwn(commands, asked) ? commands[asked] : undefined;
  if (entry === undefined) throw unknown(asked, Object.keys(commands));
  const { default: command } = await entry.load();
  const before = rest.slice(0, rest.includes('--') ? rest.indexOf('--') : rest.length);
  if (first === 'help' || before.includes('--help') || before.includes('-h')) return print(commandHelp(asked, entry.summary, command));
  return command.start(rest);
}

function print(text: string): 0 {
  write(stdout, `${text}\n`);
  return 0;
}

function unknown(asked: string, names: readonly string[]): Problem {
  const nearest = nearestName(asked, names);
  const message = asked.startsWith('-') ? `${asked} is not a flag of runbrief; flags of a command follow its name` : `"${asked}" is not a command of runbrief`;
  return new Problem({ code: 'unknown-command', message, expected: names.join(', '), ...(nearest === undefined ? {} : { nearest }) });
}
