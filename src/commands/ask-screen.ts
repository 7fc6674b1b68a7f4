import type { ChalkInstance } from 'chalk';
import type { Question } from '../interview/index.ts';
import { printProblem, type Problem } from '../problems/index.ts';
import { wrapped } from '../report/index.ts';

const indent = ' '.repeat(5);
/** A closed list longer than this is shown as words alone. */
const told = 12;

/** What can be typed besides an answer. */
export const opening = [
  'A number takes its unit, also 0.4 m/s +/- 5 % or 0.2 .. 0.6 m/s.',
  'unknown: not known    skip: not now       back: the question before',
  'list: decided so far  stop: save and go   enough: no more questions',
  'Anything else is stated as `path: value`, such as inlet.temperature: 65 degC.',
];

/**
 * A question as it stands on the screen.
 *
 * @param question  what is asked
 * @param number    its number, from 1
 * @param paint     colours
 * @returns         lines of at most 80 columns
 */
export function questionLines(question: Question, number: number, paint: ChalkInstance): string[] {
  const [path, ...others] = question.paths;
  const count = String(number).padStart(3);
  const head = wrapped(`${path}: ${question.asks}`, indent, `${count}  `);
  const hint = question.now === undefined ? suchAs(question) : `now ${question.now}; skip keeps it`;
  const more = others.length === 0 ? '' : `or, by its unit, ${others.map((one) => shared(path as string, one)).join(', ')}`;
  const hints = [hint, more].filter((text) => text !== '').join('; ');
  return [
    '',
    paint.bold(head),
    wrapped(question.why, indent),
    ...(hints === '' ? [] : [wrapped(hints, indent)]),
    ...offered(question),
  ];
}

/** An example, where the list of words does not tell enough. */
const suchAs = ({ example, offers }: Question): string => (example === '' || offers.some(({ word }) => word === example) ? '' : `such as ${example}`);

/** `inlet.volumeFlow` beside `inlet.speed` is `volumeFlow`. */
function shared(first: string, other: string): string {
  const at = first.lastIndexOf('.') + 1;
  return other.startsWith(first.slice(0, at)) ? other.slice(at) : other;
}

function offered({ offers }: Question): string[] {
  if (offers.length > told) return [wrapped(offers.map(({ word }) => word).join(', '), indent)];
  const longest = Math.max(0, ...offers.map(({ word }) => word.length));
  return offers.map(({ word, means }) => wrapped(means, ' '.repeat(7 + longest), `${indent}${word.padEnd(longest)}  `));
}

/** What is wrong with an answer. */
export function problemLines(problem: Problem, paint: ChalkInstance): string[] {
  return problem.list.flatMap((one) => {
    const [what = '', ...rest] = printProblem(one).split('\n');
    return [paint.yellow(wrapped(what, indent)), ...rest.map((line) => labelled(line.trim()))];
  });
}

/** `expected  ...` with the text in a column of its own. */
function labelled(line: string): string {
  const [label = '', ...words] = line.split(/\s+/);
  return wrapped(words.join(' '), `${indent}${' '.repeat(10)}`, `${indent}${label.padEnd(10)}`);
}
