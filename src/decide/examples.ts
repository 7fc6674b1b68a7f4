import { choose } from './choose.ts';
import { testOf } from './conditions.ts';
import { ExampleFacts } from './facts.ts';
import type { ChoiceRule, CompiledRules, EffectRule } from './form.ts';
import { lackingFacts, readRule } from './judge.ts';

/** An example of a rule, what it says and what the rule gives. */
export interface ExampleOutcome {
  readonly rule: string;
  /** Counted from 1. */
  readonly example: number;
  readonly expected: string;
  readonly got: string;
}

/**
 * Runs the examples of all rules.
 *
 * @param rules  compiled rules
 * @returns      one entry an example; those whose `got` differs from `expected` fail
 */
export function exampleOutcomes(rules: CompiledRules): ExampleOutcome[] {
  return [
    ...Object.entries(rules.effects).flatMap(([id, rule]) => effectOutcomes(id, rule)),
    ...Object.entries(rules.choices).flatMap(([id, rule]) => choiceOutcomes(id, rule)),
  ];
}

function effectOutcomes(id: string, rule: EffectRule): ExampleOutcome[] {
  return rule.examples.map((example, k) => {
    const facts = new ExampleFacts(example.facts, example.none);
    const applies = testOf(rule.applies)(facts, false) !== 0;
    const reading = readRule(rule, facts);
    const branch = reading.branch?.id ?? 'otherwise';
    const lacking = reading.verdict === 'undecided' ? lackingFacts(rule, facts).sort() : [];
    const show = (verdict: string, does: boolean, by: string, lacks: readonly string[]): string => [verdict, ...(does ? [] : ['does not apply']), ...(example.branch === undefined ? [] : [`by ${by}`]), ...(example.missing === undefined ? [] : [`for want of ${lacks.join(', ')}`])].join(', ');
    return {
      rule: id, example: k + 1,
      expected: show(example.verdict, example.applies !== false, example.branch ?? '', [...(example.missing ?? [])].sort()),
      got: show(applies ? reading.verdict : 'leave-out', applies, branch, lacking),
    };
  });
}

function choiceOutcomes(id: string, rule: ChoiceRule): ExampleOutcome[] {
  return rule.examples.map((example, k) => {
    const undecided = Object.entries(example.facts).flatMap(([fact, word]) => (fact.startsWith('verdict.') && word === 'undecided' ? [fact.slice(8)] : []));
    const state = choose(rule, new ExampleFacts(example.facts), undecided, undefined);
    const show = (take: string, applies: boolean): string => (applies ? take : `${take}, does not apply`);
    return { rule: id, example: k + 1, expected: show(example.take, example.applies !== false), got: show(state.chosen, state.applies !== false) };
  });
}
