import { vocabulary } from '../assemble/index.ts';
import { allPaths, readCase } from '../case/index.ts';
import { nearestName, Problem, type ProblemData } from '../problems/index.ts';
import { skipWord, unknownWord, type Values } from './answer.ts';
import type { Interview, Outcome } from './interview.ts';
import type { State } from './state.ts';

const flat = /^([A-Za-z][^:#]*?)\s*:\s+(\S.*?)\s*$/;

/**
 * Answers from a file: lines of `path: value`, or a case file however little it holds.
 *
 * @param text  the file
 * @param file  its name, as the user gave it
 * @returns     answers by path
 * @throws      {Problem} unknown-path, no-answer, or those of the case reader
 */
export function repliesIn(text: string, file: string): ReadonlyMap<string, string> {
  const lines = text.replace(/^\ufeff/, '').split(/\r?\n/).map((line, k) => ({ line, at: k + 1 })).filter(({ line }) => line.trim() !== '' && !line.trimStart().startsWith('#'));
  const isList = lines.some(({ line }) => /^[A-Za-z]\w*\.[^:]*:\s/.test(line)) || lines.every(({ line }) => flat.test(line) && !/^[A-Za-z]\w*:\s+[[{]/.test(line));
  if (!isList) return new Map([...readCase(text, file, vocabulary, { partial: true }).entries].filter(([path]) => path !== 'format').map(([path, entry]) => [path, entry.written]));
  const problems: ProblemData[] = [];
  const answers = new Map<string, string>();
  for (const { line, at } of lines) {
    const [, path, value] = flat.exec(line) ?? [];
    if (path === undefined || value === undefined) problems.push({ code: 'no-answer', message: 'this line holds no answer', file, line: at, column: 1, length: line.length, expected: 'path: value, such as inlet.speed: 0.4 m/s' });
    else if (answers.has(path)) problems.push({ code: 'duplicate-key', message: `${path} is answered twice`, file, line: at, column: 1, length: path.length, expected: 'each path once' });
    else answers.set(path, unquoted(value));
  }
  const flow = answers.get('flow') ?? '';
  const valid = allPaths(vocabulary, flow).map((path) => new RegExp(`^${path.split('.').map((part) => (part === '*' ? '[^.]+' : part)).join('\\.')}$`));
  for (const { line, at } of lines) {
    const path = flat.exec(line)?.[1];
    if (path === undefined || path.startsWith('sizes.') || valid.some((one) => one.test(path))) continue;
    const nearest = nearestName(path, allPaths(vocabulary, flow));
    problems.push({ code: 'unknown-path', message: `"${path.slice(0, 80)}" is not a path into the case`, file, line: at, column: 1, length: path.length, expected: 'keys joined by points, such as inlet.speed', ...(nearest === undefined ? {} : { nearest }) });
  }
  if (problems.length > 0) throw new Problem(problems);
  answers.delete('format');
  return answers;
}

/** A value without the quotes around it or the remark behind it. */
function unquoted(value: string): string {
  const quoted = /^"([^"\\]*)"(?:\s+#.*)?$|^'([^']*)'(?:\s+#.*)?$/.exec(value);
  return quoted === null ? value.replace(/\s+#.*$/, '') : ((quoted[1] ?? quoted[2]) as string);
}

/**
 * An interview held with answers from a file: what is asked is looked up, what is not there counts as unknown, and what no
 * question asks for is kept beside the rest.
 *
 * @param talk     the interview
 * @param state    where it begins
 * @param answers  by path
 * @param file     name of the file of answers, for problems
 * @returns        the last state, and paths that no question asked for
 * @throws         {Problem} an answer that does not fit
 */
export function replied(talk: Interview, state: State, answers: Values, file: string): { state: State; unasked: readonly string[] } {
  let at = state;
  const used = new Set<string>(state.given.keys());
  const unasked: string[] = [];
  const take = (outcome: Outcome, path: string): void => {
    if ('problem' in outcome) throw new Problem(outcome.problem.list.map((one) => ({ ...one, message: one.message.startsWith(path) ? one.message : `${path}: ${one.message}`, file })));
    at = outcome.state;
  };
  const left = (wanted: (path: string) => boolean): Values => new Map([...answers].filter(([path, text]) => !used.has(path) && text !== unknownWord && text !== skipWord && wanted(path)));
  for (;;) {
    const question = talk.next(at);
    if (at.wants !== undefined) throw new Problem({ code: 'no-answer', message: at.wants.says, file, expected: `${at.wants.path}: ${'example' in question ? question.example : ''}` });
    if (!('done' in question)) {
      const path = question.now === undefined ? question.paths.find((one) => answers.has(one)) : undefined;
      const text = path === undefined ? undefined : (answers.get(path) as string);
      const said = text === undefined ? (question.now === undefined ? unknownWord : skipWord) : text === unknownWord || text === skipWord ? text : `${path}: ${text}`;
      if (path !== undefined) used.add(path);
      // A material is settled at its state: what the file says of the fluid counts together with it.
      const beside = path === 'fluid.material' && said !== text ? left((one) => one.startsWith('fluid.')) : undefined;
      take(talk.answer(at, said, beside), path ?? '');
      for (const one of beside?.keys() ?? []) used.add(one);
      continue;
    }
    const rest = left(() => true);
    if (rest.size === 0) break;
    for (const [path, text] of rest) {
      take(talk.keep(at, new Map([[path, text]])), path);
      used.add(path);
      unasked.push(path);
    }
  }
  return { state: at, unasked };
}
