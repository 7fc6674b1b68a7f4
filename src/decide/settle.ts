import type { Workings } from '../workings/index.ts';
import { choose, type ChoiceState } from './choose.ts';
import { leavesOf } from './conditions.ts';
import { judge, type EffectState, type Point } from './effects.ts';
import { Overlaid, WorkingsFacts, type FactSource } from './facts.ts';
import type { Branch, CompiledRules, Condition, EffectRule, Verdict } from './form.ts';
import { choicesInReadingOrder, effectsInReadingOrder } from './ids.ts';
import type { Interval } from './judge.ts';
import type { Target } from './price.ts';

/** What the reading of rules is handed besides the numbers. */
export interface SettleOptions {
  /** Whether an input can be given by the user at all; all unless said. */
  readonly askable?: ((id: string) => boolean) | undefined;
  /** Low and high end of a quantity over the operating range. */
  readonly rangeOf?: Interval | undefined;
  /** Low and high end of its spread. */
  readonly spreadOf?: Interval | undefined;
  /** Base verdicts alone, for scans: no price is weighed, no bound of a missing input tried. */
  readonly lean?: boolean | undefined;
  /** With `lean`: choices stay as they are. */
  readonly verdictsOnly?: boolean | undefined;
  /** Choices that the case states, by id. */
  readonly chosen?: Readonly<Record<string, string>> | undefined;
}
/** All decisions at one point of the workings. */
export interface State {
  readonly effects: ReadonlyMap<string, EffectState>;
  readonly choices: ReadonlyMap<string, ChoiceState>;
  readonly passes: number;
  readonly point: Point;
}

const mostPasses = 5;
const anything = (): boolean => true;
const absent: EffectState = { rule: undefined, applies: 'unknown', whyNot: [], judged: false, verdict: 'undecided', base: 'undecided' };

/** An effect in the order of reading, with the names of its words. */
interface Listed {
  readonly id: string;
  readonly rule: EffectRule | undefined;
  readonly verdict: string;
  readonly branch: string;
  readonly kept: string;
  /** It reads other decisions, so that each pass reads it anew. */
  readonly rests: boolean;
}

/** What holds for all points of one graph and one set of rules. */
interface Session {
  readonly effects: readonly Listed[];
  readonly choices: readonly string[];
  readonly places: (rule: EffectRule) => readonly (string | undefined)[];
}
const sessions = new WeakMap<Workings, WeakMap<CompiledRules, Session>>();

function sessionOf(workings: Workings, rules: CompiledRules): Session {
  const kept = sessions.get(workings) ?? new WeakMap<CompiledRules, Session>();
  sessions.set(workings, kept);
  let session = kept.get(rules);
  if (session === undefined) {
    const places = new Map<EffectRule, readonly (string | undefined)[]>();
    session = {
      effects: effectsInReadingOrder(Object.keys(rules.effects)).map((id): Listed => {
        const rule = rules.effects[id];
        return { id, rule, verdict: `verdict.${id}`, branch: `branch.${id}`, kept: `kept.${id}`, rests: rule !== undefined && restsOnOthers(rule) };
      }),
      choices: choicesInReadingOrder(Object.keys(rules.choices)),
      places: (rule) => {
        let found = places.get(rule);
        if (found === undefined) places.set(rule, (found = placesOf(workings, rule)));
        return found;
      },
    };
    kept.set(rules, session);
  }
  return session;
}

/** The places at which a rule is read: those at which a number of its branches exists. */
function placesOf(workings: Workings, rule: EffectRule): readonly (string | undefined)[] {
  if (rule.per === undefined) return [undefined];
  const named = new Set(rule.branches.flatMap((b) => [...(b.band === undefined ? [] : [b.band.deciding]), ...conditionsOf(b).flatMap((c) => leavesOf(c).map((l) => l.fact))]));
  const found = new Set<string>();
  for (const id of named) {
    const slot = workings.slots[workings.index.get(id) ?? -1];
    if (slot?.node.about.per?.[0] !== rule.per) continue;
    for (const other of workings.index.keys()) if (other.startsWith(`${id}@`)) found.add((other.slice(id.length + 1).split('/')[0]) as string);
  }
  return found.size === 0 ? [undefined] : [...found];
}

/** All conditions of a branch. */
const conditionsOf = (b: Branch): Condition[] => [b.when, b.includeIf, b.leaveOutIf, b.atLeastBorderlineIf, b.atMostBorderlineIf, ...b.price.map((p) => p.when)].filter((c): c is Condition => c !== undefined);

/** Whether a rule reads other decisions. */
function restsOnOthers(rule: EffectRule): boolean {
  const conditions = [rule.applies, ...rule.branches.flatMap(conditionsOf), ...rule.price.map((p) => p.when)];
  return conditions.some((c) => leavesOf(c).some((l) => /^(verdict|branch)\./.test(l.fact) || l.fact === 'regime'));
}

/**
 * Settles all decisions at one point of the workings, and pins the words `verdict.<id>` and `choice.<id>` in them.
 *
 * @param workings  the graph at the point
 * @param rules     compiled rules
 * @param targets   targets of the case, for the prices
 * @param options   what can be asked for; spreads and ranges of deciding quantities
 * @returns         the state of every effect and choice
 */
export function settle(workings: Workings, rules: CompiledRules, targets: readonly Target[], options: SettleOptions = {}): State {
  const session = sessionOf(workings, rules);
  const facts = new WorkingsFacts(workings, options.askable ?? anything);
  const words = new Map<string, string>();
  const point: Point = {
    workings, targets, facts, words, plain: new Overlaid(facts, words), views: new Map(), prices: new Map(), read: undefined,
    places: session.places, rangeOf: options.rangeOf, spreadOf: options.spreadOf, lean: options.lean === true,
  };
  const { effects, passes } = settleEffects(point, session);
  const moved = pinWords(workings, session.effects.map(({ id, verdict }) => [verdict, (effects.get(id) as EffectState).verdict]));
  const choices = options.lean === true && options.verdictsOnly === true ? new Map<string, ChoiceState>() : restingChoices(point, session, rules, effects, options, moved);
  return { effects, choices, passes, point };
}

/** Passes over the effects until one changes nothing. What still changes after the fifth is borderline, and the rest is read again with it. */
function settleEffects(point: Point, session: Session): { effects: Map<string, EffectState>; passes: number } {
  const effects = new Map<string, EffectState>();
  const alternating = new Set<string>();
  let passes = 0;
  for (const listed of session.effects) note(point, listed, absent);
  for (;;) {
    let changed = new Map<string, Verdict>([['', 'undecided']]);
    for (let k = 0; k < mostPasses && changed.size > 0; k++, passes++) changed = pass(point, session, effects, alternating);
    if (changed.size === 0) return { effects, passes };
    for (const listed of session.effects) {
      const before = changed.get(listed.id);
      if (before === undefined) continue;
      const now = effects.get(listed.id) as EffectState;
      const rests: EffectState = { ...now, verdict: 'borderline', movedBy: 'passes', between: [before, now.verdict], firstRun: 'keep' };
      alternating.add(listed.id);
      effects.set(listed.id, rests);
      note(point, listed, rests);
    }
  }
}

/** One pass; returns what changed, with the verdict before. */
function pass(point: Point, session: Session, effects: Map<string, EffectState>, alternating: ReadonlySet<string>): Map<string, Verdict> {
  const changed = new Map<string, Verdict>();
  for (const listed of session.effects) {
    const { id, rule } = listed;
    const old = effects.get(id);
    if (alternating.has(id) || (old !== undefined && !listed.rests)) continue;
    const next = rule === undefined ? absent : judge(rule, point);
    effects.set(id, next);
    if (note(point, listed, next)) changed.set(id, old?.verdict ?? 'undecided');
  }
  return changed;
}

/** Lays a state over the facts; whether it changes anything. */
function note(point: Point, { verdict, branch }: Listed, state: EffectState): boolean {
  const by = state.applies === false ? 'none' : (state.reading?.branch?.id ?? 'otherwise');
  if (point.words.get(verdict) === state.verdict && point.words.get(branch) === by) return false;
  point.words.set(verdict, state.verdict);
  point.words.set(branch, by);
  return true;
}

/** Facts of choices: the words of this point alone for choices and what the first run keeps, never those the graph still holds from another point. */
class ChoiceFacts implements FactSource {
  readonly #words: ReadonlyMap<string, string>;
  readonly #under: FactSource;
  constructor(words: ReadonlyMap<string, string>, under: FactSource) {
    this.#words = words;
    this.#under = under;
  }
  of(id: string): number | string | undefined {
    return this.#words.get(id) ?? (id.startsWith('choice.') ? undefined : this.#under.of(id));
  }
  askable(id: string): boolean {
    return this.#under.askable(id);
  }
}

/** The numbers of a choice may rest on verdicts and on other choices, and the graph holds those of the point it stood at before: it is pinned and read again until it rests. */
function restingChoices(point: Point, session: Session, rules: CompiledRules, effects: ReadonlyMap<string, EffectState>, options: SettleOptions, moved: boolean): Map<string, ChoiceState> {
  const { workings } = point;
  const stated = new Map(Object.entries(options.chosen ?? {}));
  for (let round = 0, stale = moved; ; round++) {
    const facts = stale ? new Overlaid(new WorkingsFacts(workings, options.askable ?? anything), point.words) : point.plain;
    const choices = settleChoices(point, facts, session, rules, effects, stated);
    stale = pinWords(workings, [...choices].flatMap(([id, state]) => (state.rule !== undefined || state.given ? [[`choice.${id}`, state.chosen] as const] : [])));
    if (!stale || round === mostPasses) return choices;
  }
}

function settleChoices(point: Point, plain: FactSource, session: Session, rules: CompiledRules, effects: ReadonlyMap<string, EffectState>, stated: ReadonlyMap<string, string>): Map<string, ChoiceState> {
  const undecided = [...effects].flatMap(([id, e]) => (e.verdict === 'undecided' && e.judged ? [id] : []));
  const words = new Map(point.words);
  for (const listed of session.effects) {
    const e = effects.get(listed.id) as EffectState;
    words.set(listed.kept, isKept(e) ? 'yes' : 'no');
    if (!e.judged) words.set(listed.verdict, 'leave-out'); // none of its numbers can be had
  }
  for (const [id, word] of stated) words.set(`choice.${id}`, word);
  const facts = new ChoiceFacts(words, plain);
  const out = new Map<string, ChoiceState>();
  for (let round = 0, more = true; more && round < mostPasses; round++) {
    more = false;
    for (const id of session.choices) {
      const rule = rules.choices[id];
      const said = stated.get(id);
      const next = rule === undefined ? unread(said) : choose(rule, facts, undecided, said);
      if (out.get(id)?.chosen !== next.chosen) more = true;
      out.set(id, next);
      if (rule !== undefined) words.set(`choice.${id}`, next.chosen);
    }
  }
  return out;
}

/** A choice that no rule decides. */
const unread = (said: string | undefined): ChoiceState => ({ rule: undefined, applies: 'unknown', whyNot: [], chosen: said ?? 'none', given: said !== undefined, assumed: [], lacking: [] });

/** Whether the model carries an effect in its first run: include, undecided, borderline unless it is first left out. */
export const isKept = (e: Pick<EffectState, 'verdict' | 'judged' | 'firstRun'>): boolean => e.verdict === 'include' || (e.verdict === 'undecided' && e.judged) || (e.verdict === 'borderline' && e.firstRun !== 'leave-out');

/** Pins words in one go, since each change of the pins costs a look at all edges; what is not in the graph, or is pinned so already, is passed over. Whether anything changed. */
function pinWords(workings: Workings, words: readonly (readonly [string, string])[]): boolean {
  const fresh = words.filter(([id, word]) => {
    const i = workings.index.get(id);
    return i !== undefined && !(workings.isPinned(i) && workings.wordAt(i) === word);
  });
  if (fresh.length > 0) workings.setAll(fresh);
  return fresh.length > 0;
}
