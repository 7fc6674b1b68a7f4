import type { CommandClass } from './base.ts';
import type { Entry } from './registry.ts';

const width = 100;
const exits = [
  [0, 'done'],
  [1, 'a problem in what was given, listed with file, line and column'],
  [2, 'wrong use of the command line, or a refusal to ask or to overwrite'],
  [3, 'a defect in runbrief'],
  [4, 'a limit was missed, or cannot be told'],
] as const;

/**
 * The overview: what to type first, then every command with its line.
 *
 * @param commands  the registry
 * @returns         text without a last newline
 */
export function overview(commands: Readonly<Record<string, Entry>>): string {
  const first = [
    ['runbrief template pipe > my.case.yaml', 'a case file with comments, to fill in'],
    ['runbrief plan my.case.yaml', 'every number, decision and step of the plan'],
    ['runbrief plan --help', 'examples and flags of one command'],
  ] as const;
  return [
    'runbrief: the brief before the run of a flow, heat or species problem.',
    section('Begin with', first),
    section('Commands', Object.entries(commands).map(([id, entry]) => [id, entry.summary] as const)),
    'Every command takes --json and --help. runbrief --version tells the version.',
  ]
    .filter((part) => part !== '')
    .join('\n\n');
}

/**
 * Help of one command: examples first, then arguments, flags and exit codes.
 *
 * @param id       its name
 * @param summary  its line in the overview
 * @param command  its class
 * @returns        text without a last newline
 */
export function commandHelp(id: string, summary: string, command: CommandClass): string {
  const args = Object.entries(command.args).map(([name, arg]) => [arg.required === true ? name.toUpperCase() : `[${name.toUpperCase()}]`, arg.description ?? ''] as const);
  const flags = Object.entries(command.flags).filter(([, flag]) => flag.hidden !== true).map(([name, flag]) => [flagText(name, flag), flagNote(flag)] as const);
  const call = ['runbrief', id, ...args.map(([name]) => name), flags.length === 0 ? '' : '[flags]'].filter((word) => word !== '').join(' ');
  return [
    `${call}\n  ${summary}`,
    section('Examples', command.examples.map((example) => [example.command, example.description] as const)),
    section('Arguments', args),
    section('Flags', [...flags, ['--json', 'the result as one JSON document on stdout'] as const]),
    section('Exit codes', exits.filter(([code]) => code < 4 || command.judges).map(([code, text]) => [String(code), text] as const)),
  ].filter((part) => part !== '').join('\n\n');
}

type FlagDefinition = CommandClass['flags'][string];

function flagText(name: string, flag: FlagDefinition): string {
  const value = flag.type === 'option' ? ` ${flag.helpValue === undefined ? name.toUpperCase() : String(flag.helpValue)}` : '';
  return `${flag.char === undefined ? '' : `-${flag.char}, `}--${name}${value}`;
}

function flagNote(flag: FlagDefinition): string {
  const options = flag.type === 'option' && flag.options !== undefined ? ` (${flag.options.join(', ')})` : '';
  const unless = flag.type === 'option' && ['string', 'number'].includes(typeof flag.default) ? `; ${String(flag.default)} unless said` : '';
  return `${flag.description ?? ''}${options}${unless}`;
}

/** A heading and two columns; a note that does not fit beside its term goes below it. */
function section(heading: string, rows: readonly (readonly [string, string])[]): string {
  if (rows.length === 0) return '';
  const short = rows.filter(([term]) => term.length <= 44).map(([term]) => term.length);
  const column = Math.max(8, ...short) + 4;
  const lines = rows.map(([term, note]) => {
    const [head = '', ...rest] = wrap(note, width - column);
    const below = rest.map((line) => `\n${' '.repeat(column)}${line}`).join('');
    return term.length + 4 > column ? `  ${term}\n${' '.repeat(column)}${head}${below}` : `  ${term.padEnd(column - 2)}${head}${below}`.trimEnd();
  });
  return `${heading}\n${lines.join('\n')}`;
}

function wrap(text: string, limit: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(/\s+/)) {
    if (line !== '' && line.length + word.length + 1 > limit) {
      lines.push(line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return [...lines, line];
}
