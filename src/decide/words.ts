import { quantity, wordWay, type Definition } from '../workings/index.ts';
import { noRules } from './compile.ts';
import { verdicts, type CompiledRules } from './form.ts';
import { choiceIds, effectIds, inOrder, optionsOf, titleOf } from './ids.ts';

/**
 * The words that decisions give to the graph: `verdict.<effect>`, `choice.<choice>`, and whether the cost is within the budget.
 *
 * @param rules  compiled rules, for the decisions that a rule pack adds
 * @returns      their definitions, with closed lists
 */
export function definitionsOfVerdicts(rules: CompiledRules = noRules): Definition[] {
  const word = (id: string, name: string, words: readonly string[]): Definition => quantity(id, { symbol: '', name, unit: 'word', words });
  return [
    ...inOrder(Object.keys(rules.effects), effectIds).map((id) => word(`verdict.${id}`, `verdict: ${titleOf(id).toLowerCase()}`, verdicts)),
    ...inOrder(Object.keys(rules.choices), choiceIds).map((id) => word(`choice.${id}`, `choice: ${titleOf(id).toLowerCase()}`, optionsOf(id) ?? ['none', ...Object.keys(rules.choices[id]?.options ?? {})])),
    quantity('budget', { symbol: '', name: 'cost against the budget', unit: 'word', words: ['within', 'over'] }, [wordWay({ needs: [], word: () => 'within', formula: 'within until the cost is known', source: 'definition' })]),
  ];
}
