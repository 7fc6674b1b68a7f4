import { Problem, type ProblemData } from '../problems/index.ts';
import { choiceIds, effectIds } from './ids.ts';
import type { ChoiceRule, CompiledRules, EffectRule } from './form.ts';
import { type Node, readJson } from './json-text.ts';
import type { KnownFacts } from './known.ts';
import { readChoice } from './read-choice.ts';
import { readEffect } from './read-effect.ts';
import { Reader, type Fields } from './reader.ts';

/** A rule file as text. */
export interface RuleFile {
  /** Its name for messages, as the user wrote it. */
  readonly file: string;
  readonly text: string;
}

export const noRules: CompiledRules = { format: 1, effects: {}, choices: {} };
const isNode = (read: Node | ProblemData): read is Node => 'value' in read;

/**
 * Reads and checks rule files, and puts them over rules that stand already: a rule of the same id takes the place of the earlier one.
 *
 * @param files  the files, in the order of their names
 * @param known  the facts that rules may name; without them names of quantities are not checked
 * @param over   rules that stand already
 * @param pack   whether ids beyond those of the program are allowed
 * @returns      all rules as plain data
 * @throws       {Problem} everything that is wrong in any file, with file, line, column and the nearest valid name
 */
export function compileRules(files: readonly RuleFile[], known?: KnownFacts, over: CompiledRules = noRules, pack = false): CompiledRules {
  const problems: ProblemData[] = [];
  const read = files.flatMap(({ file, text }) => {
    const root = readJson(text, file);
    if (isNode(root)) return { file, text, root, id: idOf(root) };
    problems.push(root);
    return [];
  });
  const own = pack ? [...Object.keys(over.effects), ...Object.keys(over.choices), ...read.map((r) => r.id)] : [];
  const effects: [string, EffectRule][] = [];
  const choices: [string, ChoiceRule][] = [];
  for (const { file, text, root, id } of read) {
    const isChoice = keysOf(root).has('choice');
    const reader = new Reader(text, file, known, own, isChoice);
    const valid = isChoice ? choiceIds : effectIds;
    if (id !== '' && !pack && !valid.includes(id)) reader.complain(root, 'unknown-decision', `no ${isChoice ? 'choice' : 'effect'} is called ${id}`, { name: id, valid });
    if ([...effects, ...choices].some(([other]) => other === id)) reader.complain(root, 'double-rule', `a second file decides ${id}`);
    const rule = isChoice ? readChoice(reader, root) : readEffect(reader, root);
    problems.push(...reader.problems);
    if (rule === undefined) continue;
    if ('choice' in rule) choices.push([id, rule]);
    else effects.push([id, rule]);
  }
  if (problems.length > 0) throw new Problem(problems);
  return { format: 1, effects: { ...over.effects, ...Object.fromEntries(effects) }, choices: { ...over.choices, ...Object.fromEntries(choices) } };
}

const keysOf = (root: Node): Fields => (root.value instanceof Map ? (root.value as Fields) : new Map());

function idOf(root: Node): string {
  const keys = keysOf(root);
  const value = (keys.get('effect') ?? keys.get('choice'))?.value.value;
  return typeof value === 'string' ? value : '';
}
