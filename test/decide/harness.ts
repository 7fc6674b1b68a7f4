import { compileRules, type CompiledRules, type Target } from '../../src/decide/index.ts';
import { definitionsOfVerdicts } from '../../src/decide/index.ts';
import { joinDefinitions, quantity, Workings, type Definition, type Given, type Places } from '../../src/workings/index.ts';

export const number = (id: string, unit = '1'): Definition => quantity(id, { symbol: id, name: id, unit });
export const word = (id: string, words: readonly string[]): Definition => quantity(id, { symbol: '', name: id, unit: 'word', words });

/** A graph with the words of the decisions. */
export function graph(definitions: readonly Definition[], given: Readonly<Record<string, number | string | Given>>, rules?: CompiledRules, places?: Places): Workings {
  const inputs = Object.fromEntries(Object.entries(given).map(([id, v]) => [id, typeof v === 'object' ? v : { value: v }]));
  const own = definitionsOfVerdicts(rules);
  const known = new Set(own.map((d) => d.id));
  return new Workings(joinDefinitions([...definitions.filter((d) => !known.has(d.id)), ...own], places), inputs);
}

/** A rule pack from objects, without asking for examples: each gets those that its form demands. */
export function pack(...rules: readonly Record<string, unknown>[]): CompiledRules {
  return compileRules(rules.map((rule, k) => ({ file: `${k}.json`, text: JSON.stringify(withExamples(rule)) })), undefined, undefined, true);
}

function withExamples(rule: Record<string, unknown>): Record<string, unknown> {
  if (rule['examples'] !== undefined) return rule;
  const shown = ['include', 'leave-out', 'borderline', 'undecided'].map((verdict) => ({ facts: {}, verdict }));
  const takes = [...new Set([...((rule['first'] ?? []) as { take: unknown }[]), ...(rule['otherwise'] === undefined ? [] : [rule['otherwise'] as { take: unknown }])].map((e) => e.take))].filter((t) => typeof t === 'string');
  return { title: 'a rule', ...rule, examples: 'choice' in rule ? [...takes.map((take) => ({ facts: {}, take })), { facts: {}, take: 'none', applies: false }] : [...shown, { facts: {}, verdict: 'leave-out', applies: false }] };
}

export const band = (id: string, deciding: string, leaveOutAt: unknown, includeAt: unknown, more: Record<string, unknown> = {}): Record<string, unknown> => ({ id, deciding, leaveOutAt, includeAt, because: `${deciding} = {${deciding}}`, source: 'test', ...more });
export const is = (fact: string, value: unknown, operator = 'equal'): Record<string, unknown> => ({ fact, operator, value });
export const target = (quantityId: string, within?: Target['within']): Target => ({ id: quantityId, quantity: quantityId, computed: true, within });
