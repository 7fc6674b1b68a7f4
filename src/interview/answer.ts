import { vocabulary } from '../assemble/index.ts';
import { fieldAt, readEntry } from '../case/index.ts';
import { Problem, type ProblemData } from '../problems/index.ts';
import type { Question } from './question.ts';
import type { State } from './state.ts';
import { caseOf } from './view.ts';

/** Words that answer any question. */
export const unknownWord = 'unknown';
export const skipWord = 'skip';

/**
 * The state after an answer: a value for the first path it fits, `path: value` for any path of the case, `unknown` or `skip`.
 *
 * @param state     the answers so far
 * @param question  what was asked
 * @param text      as the user wrote it
 * @param beside    values by path that are given together with it, unasked
 * @returns         the next state
 * @throws          {Problem} those of the case reader; empty-answer
 */
export function answered(state: State, question: Question, text: string, beside: Values = none): State {
  const said = text.trim();
  const group = question.paths.join('|');
  if (said === '') throw new Problem({ code: 'empty-answer', message: 'nothing is answered', expected: `${question.example}, ${unknownWord} or ${skipWord}` });
  if (said === skipWord || (said === unknownWord && question.now !== undefined)) return { ...state, later: new Set([...state.later, group]), before: state };
  if (said === unknownWord && question.paths[0] === 'purpose') return { ...state, later: new Set([...state.later, group]), before: state };
  if (said === unknownWord) return { ...state, unknown: new Map([...state.unknown, [group, question.why]]), before: state };
  const on = caseOf(state);
  const stated = /^([A-Za-z][\w.()+-]*(?: [\w.()+-]+)*)\s*:\s+(.+)$/su.exec(said);
  const flow = on.flow;
  const elsewhere = stated !== null && fieldAt(vocabulary, flow, stated[1] as string) !== undefined;
  const [path, value] = elsewhere ? checked(on, stated[1] as string, stated[2] as string) : fitting(on, question, said);
  const asked = question.paths.includes(path);
  const given = new Map([...kept(state, beside).given].filter(([old]) => old !== path));
  given.set(path, { text: value, why: asked ? question.why : (state.given.get(path)?.why ?? unasked) });
  const later = question.now === undefined || !asked ? state.later : new Set([...state.later, path]);
  const unknown = new Map([...state.unknown].filter(([paths]) => !paths.split('|').includes(path)));
  return { ...state, given, later, unknown, before: state };
}

/** Values by path, as the user wrote them. */
export type Values = ReadonlyMap<string, string>;
const none: Values = new Map();
const unasked = 'given without being asked';

/**
 * The state with values that no question asked for.
 *
 * @throws {Problem} those of the case reader, of a value that does not fit its path
 */
export function kept(state: State, values: Values): State {
  if (values.size === 0) return state;
  const on = caseOf(state);
  const given = new Map(state.given);
  for (const [path, text] of values) given.set(...noted(checked(on, path, text)));
  const unknown = new Map([...state.unknown].filter(([paths]) => !paths.split('|').some((one) => values.has(one))));
  return { ...state, given, unknown, before: state };
}

const noted = ([path, text]: readonly [string, string]): [string, { text: string; why: string }] => [path, { text, why: unasked }];

type On = Parameters<typeof readEntry>[1];

function checked(on: On, path: string, text: string): readonly [string, string] {
  readEntry(vocabulary, on, path, text);
  return [path, text];
}

/** The first path of the question that takes the text; the complaint of the first one where none does. */
function fitting(on: On, question: Question, text: string): readonly [string, string] {
  let first: Problem | undefined;
  for (const path of question.paths) {
    const flag = fieldAt(vocabulary, on.flow, path)?.field.kind === 'flag';
    try {
      if (flag) {
        if (text === path.slice(path.lastIndexOf('.') + 1) || text === 'no') return [path, 'true'];
      } else return checked(on, path, text);
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      first ??= error;
    }
  }
  const others = question.paths.slice(1);
  const list = (first as Problem).list;
  throw others.length === 0 ? first : new Problem(list.map((one): ProblemData => ({ ...one, expected: `${one.expected ?? ''}; or ${others.join(', ')}` })));
}
