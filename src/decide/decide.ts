import type { Workings } from '../workings/index.ts';
import { testOf } from './conditions.ts';
import { choiceOutput, type ChoiceDecision } from './decide-choice.ts';
import { lackingOf, weighed, type EffectState, type MovedBy } from './effects.ts';
import { placedId } from './facts.ts';
import { engineVerdicts } from './engine.ts';
import { fillIn } from './fill-in.ts';
import { flips, type FlipAt, type FlipInput } from './flips.ts';
import type { CompiledRules, Verdict } from './form.ts';
import { choiceIds, effectIds, inOrder, titleOf } from './ids.ts';
import { bandNumbers } from './judge.ts';
import { notPriced, type Price, type Target, type Weighed } from './price.ts';
import { settle, type SettleOptions, type State } from './settle.ts';

/** One effect as the plan states it; absent keys are left out. */
export interface EffectDecision {
  readonly id: string;
  readonly title: string;
  readonly applies: boolean | 'unknown';
  readonly judged: boolean;
  readonly verdict: Verdict;
  readonly base?: Verdict;
  readonly movedBy?: MovedBy;
  readonly deciding?: { readonly quantity: string; readonly value: number; readonly leaveOutAt: number; readonly includeAt: number; readonly margin?: number; readonly marginKind?: 'factor' | 'difference'; readonly branch: string };
  readonly because: string;
  readonly flipsAt?: readonly FlipAt[];
  readonly price?: Price;
  readonly prices?: readonly Price[];
  readonly check?: string;
  readonly firstRun?: 'keep' | 'leave-out';
  readonly then?: readonly string[];
  readonly missing?: readonly string[];
  readonly sources?: readonly string[];
}
export interface Decisions {
  readonly effects: readonly EffectDecision[];
  readonly choices: readonly ChoiceDecision[];
}
export interface DecideOptions extends SettleOptions {
  /** Inputs whose flip values are sought, with the interval to look in. */
  readonly inputs?: readonly FlipInput[] | undefined;
  /** The decisions as `settle` left them at this point, with the same options; settled here unless given. */
  readonly settled?: State | undefined;
  /** The verdicts as the synchronous reading gives them, without a run of the rules engine beside it; the tests hold both to each other. */
  readonly quick?: boolean | undefined;
}

/**
 * All decisions of a case: settled in passes by the synchronous reading of the rules, the nominal verdicts confirmed by the rules engine at the settled point.
 *
 * @param workings  the graph; the words of the decisions are pinned in it
 * @param rules     compiled rules
 * @param targets   targets of the case
 * @param options   what can be asked for; spreads, ranges; inputs whose flip values are wanted
 * @returns         every effect and choice once, in the order of the plan
 * @throws          {Error} where the engine and the synchronous reading disagree: a defect of the program
 */
export async function decide(workings: Workings, rules: CompiledRules, targets: readonly Target[], options: DecideOptions = {}): Promise<Decisions> {
  const flipsAt = options.inputs === undefined ? undefined : flips(workings, rules, targets, options.inputs, options);
  const state = options.settled !== undefined && flipsAt === undefined ? options.settled : settle(workings, rules, targets, options);
  if (options.quick !== true) {
    const nominal = await engineVerdicts(state);
    for (const [id, effect] of state.effects) agree(id, effect, nominal.get(id));
  }
  return {
    effects: inOrder(Object.keys(rules.effects), effectIds).map((id) => effectOutput(id, state.effects.get(id) as EffectState, state, flipsAt?.get(id))),
    choices: inOrder(Object.keys(rules.choices), choiceIds).map((id) => choiceOutput(id, state)),
  };
}

function agree(id: string, effect: EffectState, engine: Verdict | 'not-applicable' | undefined): void {
  if (effect.rule === undefined || effect.movedBy === 'passes') return;
  const read = effect.applies === false ? 'not-applicable' : effect.bounded === undefined ? effect.base : 'undecided';
  if (engine !== read) throw new Error(`the rule ${id}: the engine gives ${String(engine)}, the reading ${read}`);
}

function effectOutput(id: string, e: EffectState, state: State, flipsAt: readonly FlipAt[] | undefined): EffectDecision {
  const head = { id, title: e.rule?.title ?? titleOf(id), applies: e.applies, judged: e.judged, verdict: e.verdict };
  const { reading, rule, facts } = e;
  if (rule === undefined) return { ...head, because: 'not judged: no rule decides it yet', missing: [] };
  if (e.applies === false || reading === undefined || facts === undefined) return { ...head, because: `cannot occur here: ${e.whyNot.join('; ')}` };
  const said = reading.branch ?? reading.fixed;
  const check = said?.check ?? rule.check;
  const fill = (text: string): string => fillIn(text, state.point.workings, e.place);
  const hold = (list: typeof rule.then): string[] => list.filter((t) => testOf(t.when)(facts, true) === 1).map((t) => fill(t.say));
  const carried = e.verdict === 'include' || e.verdict === 'borderline';
  const prices = e.verdict === 'undecided' ? [] : allPrices(e, state);
  return {
    ...head,
    ...(reading.judged ? { base: e.base } : {}),
    ...(e.movedBy === undefined ? {} : { movedBy: e.movedBy }),
    ...decidingOutput(e, state),
    // What the rule states beside a verdict that is carried belongs to its reason.
    because: [reasonOf(e, state, fill), ...(carried ? hold(rule.attributes) : [])].join('; '),
    ...(flipsAt === undefined || flipsAt.length === 0 ? {} : { flipsAt }),
    ...(prices.length === 0 ? {} : { price: (prices[0] as Weighed).price, prices: prices.map((p) => p.price) }),
    ...(check === undefined || e.verdict === 'include' || e.verdict === 'leave-out' ? {} : { check }),
    ...(e.verdict === 'borderline' ? { firstRun: e.firstRun ?? 'keep' } : {}),
    // oxlint-disable-next-line unicorn/no-thenable -- the key of rule files and plans; it holds words
    ...(carried && rule.then.length > 0 ? { then: hold(rule.then) } : {}),
    ...(e.verdict === 'undecided' ? { missing: missingPaths(e, state) } : {}),
    ...(said?.source === undefined ? {} : { sources: [said.source] }),
  };
}

function decidingOutput(e: EffectState, state: State): Pick<EffectDecision, 'deciding'> {
  const band = e.reading?.branch?.band;
  const numbers = band === undefined || e.facts === undefined ? undefined : bandNumbers(band, e.facts);
  if (band === undefined || numbers === undefined) return {};
  const quantity = placedId(state.point.workings, band.deciding, e.place);
  const { x, leaveOutAt, includeAt } = numbers;
  const slot = state.point.workings.slots[state.point.workings.index.get(quantity) ?? -1];
  const differ = slot?.node.about.unit === 'K' || x < 0 || leaveOutAt <= 0 || includeAt <= 0;
  const distances = [leaveOutAt, includeAt].map((limit) => (differ ? Math.abs(x - limit) : Math.abs(Math.log(x / limit))));
  const nearest = Math.min(...distances);
  const margin = differ ? nearest : Math.exp(nearest);
  return { deciding: { quantity, value: x, leaveOutAt, includeAt, ...(Number.isFinite(margin) ? { margin, marginKind: differ ? ('difference' as const) : ('factor' as const) } : {}), branch: e.reading?.branch?.id ?? '' } };
}

const moves: Readonly<Record<MovedBy, string>> = {
  range: 'over the operating range it crosses a limit',
  spread: 'within its spread it crosses a limit',
  price: 'moved by price',
  passes: 'it does not come to rest',
};

function reasonOf(e: EffectState, state: State, fill: (text: string) => string): string {
  const branch = e.reading?.branch;
  const without = branch?.band !== undefined && e.facts !== undefined && e.verdict !== 'undecided' && bandNumbers(branch.band, e.facts) === undefined && e.bounded === undefined ? branch.band.without?.because : undefined;
  if (e.verdict === 'undecided' && e.judged) {
    const names = lackingOf(e, state.point).map((id) => state.point.workings.slots[state.point.workings.index.get(placedId(state.point.workings, id, e.place)) ?? -1]?.node.about.name ?? id);
    return `not known: ${[...new Set(names)].join(', ')}${missingPaths(e, state)[0] === 'flow' ? '; no input of this flow gives it, a flow named more closely would' : ''}`;
  }
  const parts = [e.bounded !== undefined ? '' : (without ?? fill((branch ?? e.reading?.fixed)?.because ?? ''))];
  if (e.bounded !== undefined) parts.push(`the same at both ends of ${e.bounded.join('; ')}`);
  parts.push(...unpriced(e, state));
  if (e.movedBy !== undefined) parts.push(`${moves[e.movedBy]}${e.between === undefined ? '' : ` between ${e.between.join(' and ')}`}`);
  return parts.filter((p) => p !== '').join('; ');
}

/** Lines of the rule that would price the effect, had their law a value here. */
function unpriced(e: EffectState, state: State): string[] {
  const { facts, reading } = e;
  if (facts === undefined || reading === undefined || e.verdict === 'undecided') return [];
  const why = reading.prices.flatMap((line) => (line.factor === undefined || testOf(line.when)(facts, true) !== 1 ? [] : [notPriced(state.point.workings, line.factor, e.place)]));
  const said = [...new Set(why.filter((w): w is string => w !== undefined))];
  return said.length === 0 ? [] : [`not priced: ${said.join('; ')}`];
}

/** All prices, those that act first, the largest share of a tolerance first. */
function allPrices(e: EffectState, state: State): Weighed[] {
  const { rule, reading, facts } = e;
  if (rule === undefined || reading === undefined || facts === undefined) return [];
  const all = reading.prices.flatMap((line) => weighed(line, facts, e.place, state.point, !rule.exempt && line.exempt !== true));
  return all.map((w, k) => ({ w, k })).sort((a, b) => (a.w.share === b.w.share ? a.k - b.k : b.w.share - a.w.share)).map(({ w }) => w);
}

function missingPaths(e: EffectState, state: State): string[] {
  const paths = [...new Set(lackingOf(e, state.point).flatMap((id) => state.point.facts.at(e.place).missing(id) ?? []))];
  return paths.length > 0 || !e.judged ? paths : ['flow']; // no input of this flow leads there: one named more closely has the law
}
