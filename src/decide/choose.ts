import { leavesOf, testOf, unknownOf, whyFalse } from './conditions.ts';
import { Overlaid, type FactSource } from './facts.ts';
import type { ChoiceRule, Option } from './form.ts';

/** What is settled about one choice. */
export interface ChoiceState {
  readonly rule: ChoiceRule | undefined;
  readonly applies: boolean | 'unknown';
  readonly whyNot: readonly string[];
  readonly chosen: string;
  /** The case states it. */
  readonly given: boolean;
  /** What the rule takes, whatever the case states. */
  readonly advised?: string;
  readonly entry?: Option;
  /** Undecided effects that were taken as include. */
  readonly assumed: readonly string[];
  /** Facts for want of which an entry could not be told. */
  readonly lacking: readonly string[];
}

/**
 * Takes an option: the first entry that fits and whose numbers can be had.
 *
 * @param rule       its rule
 * @param facts      numbers, words, verdicts and earlier choices
 * @param undecided  ids of the undecided effects; they count as include here
 * @param stated     what the case states
 * @returns          the state of the choice
 */
export function choose(rule: ChoiceRule, facts: FactSource, undecided: readonly string[], stated: string | undefined): ChoiceState {
  const given = stated !== undefined;
  const counted = new Overlaid(facts, new Map(undecided.flatMap((id) => [[`verdict.${id}`, 'include'], [`kept.${id}`, 'yes']])));
  const truth = testOf(rule.applies)(counted, false);
  if (truth === 0 && rule.applies !== undefined) {
    return { rule, applies: false, whyNot: [...new Set(whyFalse(rule.applies, counted))], chosen: stated ?? 'none', advised: 'none', given, assumed: [], lacking: [] };
  }
  const lacking: string[] = [];
  for (const entry of rule.entries) {
    const fits = testOf(entry.when)(counted, true);
    if (fits === 2) lacking.push(...unknownOf(entry.when, counted, true));
    if (fits !== 1 || entry.needs.some((id) => facts.of(id) === undefined)) continue;
    const advised = typeof entry.take === 'string' ? entry.take : facts.of(entry.take.word);
    if (typeof advised !== 'string') continue;
    const assumed = leavesOf(entry.when).flatMap((leaf) => undecided.filter((id) => leaf.fact === `verdict.${id}` || leaf.fact === `kept.${id}`));
    return { rule, applies: truth === 1 || 'unknown', whyNot: [], chosen: stated ?? advised, advised, given, entry, assumed: [...new Set(assumed)], lacking: [...new Set(lacking)] };
  }
  return { rule, applies: truth === 1 || 'unknown', whyNot: [], chosen: stated ?? 'none', given, assumed: [], lacking: [...new Set(lacking)] };
}
