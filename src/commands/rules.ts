import { choiceIds, effectIds, everyFact, noRules, withPack } from '../decide/index.ts';
import { shippedRules } from '../plan/index.ts';
import { nearestName, Problem } from '../problems/index.ts';
import { choiceRuleText, effectRuleText, rulesListText } from '../report/index.ts';
import { Args, Base, Flags } from './base.ts';

/** `runbrief rules`: the decisions, their limits and sources; the check of a company's own. */
export default class Rules extends Base {
  static override examples = [
    { command: 'runbrief rules', description: 'every decision by its id' },
    { command: 'runbrief rules buoyancy', description: 'when it applies, its branches with their limits, prices, sources and examples' },
    { command: 'runbrief rules --check our-rules', description: 'checks the rule files of a folder and runs their examples' },
    { command: 'runbrief rules radiation --rules our-rules', description: 'the rule that holds with your own over ours' },
  ];
  static override args = { id: Args.string({ description: 'id of an effect or choice' }) };
  static override flags = {
    rules: Flags.string({ helpValue: 'DIR', description: 'rule files of your own over ours' }),
    check: Flags.string({ helpValue: 'DIR', description: 'check the rule files of a folder', exclusive: ['rules'] }),
  };

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Rules);
    if (flags.check !== undefined) return this.#check(flags.check);
    const rules = flags.rules === undefined ? shippedRules() : withPack(flags.rules, shippedRules(), everyFact());
    if (args.id === undefined) {
      this.say(rulesListText(rules));
      return { effects: Object.values(rules.effects), choices: Object.values(rules.choices) };
    }
    const effect = Object.hasOwn(rules.effects, args.id) ? rules.effects[args.id] : undefined;
    const choice = Object.hasOwn(rules.choices, args.id) ? rules.choices[args.id] : undefined;
    if (effect !== undefined) this.say(effectRuleText(effect));
    else if (choice !== undefined) this.say(choiceRuleText(choice));
    else throw unknown(args.id, [...Object.keys(rules.effects), ...Object.keys(rules.choices)]);
    return (effect ?? choice) as object;
  }

  #check(folder: string): object {
    const pack = withPack(folder, noRules, everyFact());
    const decisions = [...Object.keys(pack.effects), ...Object.keys(pack.choices)];
    const examples = [...Object.values(pack.effects), ...Object.values(pack.choices)].reduce((sum, rule) => sum + rule.examples.length, 0);
    this.say(`${folder}: ${decisions.length} ${decisions.length === 1 ? 'rule' : 'rules'} in order, ${examples} examples give what they say`);
    return { folder, decisions, examples };
  }
}

function unknown(id: string, valid: readonly string[]): Problem {
  if (effectIds.includes(id) || choiceIds.includes(id)) return new Problem({ code: 'no-rule', message: `no rule decides ${id} yet; a plan leaves it undecided` });
  const nearest = nearestName(id, valid);
  return new Problem({ code: 'unknown-decision', message: `no effect or choice is called ${id}`, ...(nearest === undefined ? { expected: 'an id that `runbrief rules` lists' } : { nearest }) });
}
