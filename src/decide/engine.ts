import type { NestedCondition, RuleProperties } from 'json-rules-engine';
import { numberOf } from './conditions.ts';
import { viewsOf } from './effects.ts';
import type { FactSource } from './facts.ts';
import { verdicts, type Band, type Branch, type Condition, type EffectRule, type Leaf, type Limit, type Operator, type Verdict } from './form.ts';
import { combine, setOf, worse, type Outcome } from './judge.ts';
import type { State } from './settle.ts';

const opposite: Readonly<Record<Operator, Operator>> = {
  equal: 'notEqual', notEqual: 'equal', in: 'notIn', notIn: 'in', lessThan: 'greaterThanInclusive', greaterThanInclusive: 'lessThan', greaterThan: 'lessThanInclusive', lessThanInclusive: 'greaterThan',
};
const yes: NestedCondition = { fact: 'one', operator: 'equal', value: 1 };
const no: NestedCondition = { fact: 'one', operator: 'equal', value: 0 };
const constant = (truth: boolean): NestedCondition => (truth ? yes : no);

/** A group without what is settled already. */
function group(kind: 'all' | 'any', parts: readonly NestedCondition[]): NestedCondition {
  const [idle, settles] = kind === 'all' ? [yes, no] : [no, yes];
  if (parts.includes(settles)) return settles;
  const rest = parts.filter((part) => part !== idle);
  if (rest.length < 2) return rest[0] ?? idle;
  return kind === 'all' ? { all: rest } : { any: rest };
}
const all = (...parts: NestedCondition[]): NestedCondition => group('all', parts);
const any = (...parts: NestedCondition[]): NestedCondition => group('any', parts);

/** The facts of one run: flat, constant, finite. */
type Flat = Map<string, number | string>;
type Says = Verdict | 'fits' | 'fits-not' | 'applies-not';
interface Said { readonly effect: string; readonly view: number; readonly branch: number; readonly says: Says }

/** Puts the conditions of one view of a rule into the engine's form. What is not known is settled before the run: it may hold, and it may not. */
class Derived {
  readonly #flat: Flat;
  readonly #facts: FactSource;
  readonly #mark: string;

  constructor(flat: Flat, facts: FactSource, mark: string) {
    this.#flat = flat;
    this.#facts = facts;
    this.#mark = mark;
  }

  /** Where the condition may hold (or, negated, may be false); with `sure`, where it is so for certain. */
  may(condition: Condition | undefined, negated = false, gate = true, sure = false): NestedCondition {
    if (condition === undefined) return constant(!negated);
    if ('fact' in condition) return this.#leaf(condition, negated, gate, sure);
    const parts = ('all' in condition ? condition.all : condition.any).map((part) => this.may(part, negated, gate, sure));
    return group('all' in condition !== negated ? 'all' : 'any', parts);
  }

  #leaf(leaf: Leaf, negated: boolean, gate: boolean, sure: boolean): NestedCondition {
    const scaled = typeof leaf.value === 'object' && 'quantity' in leaf.value ? leaf.value : undefined;
    const lacks = this.#facts.of(leaf.fact) === undefined ? leaf.fact : scaled !== undefined && numberOf(scaled, this.#facts) === undefined ? scaled.quantity : undefined;
    if (lacks !== undefined) return constant(gate && !this.#facts.askable(lacks) ? negated : !sure);
    const value = scaled === undefined ? leaf.value : this.#limit(scaled);
    return { fact: this.#put(leaf.fact, this.#facts.of(leaf.fact) as number | string), operator: negated ? opposite[leaf.operator] : leaf.operator, value };
  }

  /** Where a branch may give a verdict. */
  verdict(branch: Branch, verdict: Verdict): NestedCondition {
    const least = branch.atLeastBorderlineIf;
    const most = branch.atMostBorderlineIf;
    const holds = (c: Condition | undefined): NestedCondition => (c === undefined ? constant(false) : this.may(c));
    const fails = (c: Condition | undefined): NestedCondition => (c === undefined ? constant(true) : this.may(c, true));
    if (verdict === 'leave-out') return all(this.#before(branch, verdict), fails(least));
    if (verdict === 'include') return all(this.#before(branch, verdict), fails(most));
    if (verdict === 'undecided') return this.#before(branch, verdict);
    return any(this.#before(branch, verdict), all(this.#before(branch, 'leave-out'), holds(least)), all(this.#before(branch, 'include'), holds(most)));
  }

  /** The verdict before the conditions that turn it into borderline. */
  #before(branch: Branch, verdict: Verdict): NestedCondition {
    const { includeIf, leaveOutIf } = branch;
    const rest = all(...(includeIf === undefined ? [] : [this.may(includeIf, true)]), ...(leaveOutIf === undefined ? [] : [this.may(leaveOutIf, true)]), this.#own(branch, verdict));
    if (verdict === 'include' && includeIf !== undefined) return any(this.may(includeIf), rest);
    if (verdict === 'leave-out' && leaveOutIf !== undefined) return any(all(...(includeIf === undefined ? [] : [this.may(includeIf, true)]), this.may(leaveOutIf)), rest);
    return rest;
  }

  #own(branch: Branch, verdict: Verdict): NestedCondition {
    return branch.band === undefined ? constant((branch.verdict ?? 'undecided') === verdict) : this.#band(branch.band, verdict);
  }

  #band(band: Band, verdict: Verdict): NestedCondition {
    const x = this.#facts.of(band.deciding);
    const lacks = [band.deciding, ...[band.leaveOutAt, band.includeAt].flatMap((l) => (typeof l === 'number' ? [] : [l.quantity]))].find((id) => typeof this.#facts.of(id) !== 'number');
    if (lacks !== undefined || typeof x !== 'number') {
      const stands = band.without !== undefined && !this.#facts.askable(lacks ?? band.deciding) ? band.without.verdict : 'undecided';
      return constant(stands === verdict);
    }
    const fact = band.magnitude ? this.#put(`|${band.deciding}|`, Math.abs(x)) : this.#put(band.deciding, x);
    const leaf = (operator: Operator, limit: Limit): NestedCondition => ({ fact, operator: band.smallMatters ? mirrored[operator] : operator, value: typeof limit === 'number' ? limit : this.#limit(limit) });
    if (verdict === 'include') return leaf('greaterThanInclusive', band.includeAt);
    if (verdict === 'leave-out') return all(leaf('lessThan', band.leaveOutAt), leaf('lessThan', band.includeAt));
    return verdict === 'borderline' ? all(leaf('greaterThanInclusive', band.leaveOutAt), leaf('lessThan', band.includeAt)) : constant(false);
  }

  #limit(limit: Exclude<Limit, number>): { fact: string } {
    return { fact: this.#put(`${limit.times} ${limit.quantity}`, numberOf(limit, this.#facts) as number) };
  }

  #put(name: string, value: number | string): string {
    if (typeof value === 'number' && !Number.isFinite(value)) throw new RangeError(`${name} is ${value} among the facts of the rules`);
    const key = `${name}${this.#mark}`;
    this.#flat.set(key, value);
    return key;
  }
}

/** A comparison read from the other side, for limits where small values matter. */
const mirrored: Readonly<Record<Operator, Operator>> = { ...opposite, equal: 'equal', notEqual: 'notEqual', in: 'in', notIn: 'notIn', lessThan: 'greaterThan', greaterThanInclusive: 'lessThanInclusive', greaterThan: 'lessThan', lessThanInclusive: 'greaterThanInclusive' };

/**
 * The nominal verdicts of all effects that have a rule, from one run of the rules engine over the facts of a settled point.
 *
 * @param state  the settled point
 * @returns      verdict by effect; `not-applicable` where it cannot occur
 */
export async function engineVerdicts(state: State): Promise<Map<string, Verdict | 'not-applicable'>> {
  const { Engine } = await import('json-rules-engine');
  const flat: Flat = new Map([['one', 1]]);
  const rules: RuleProperties[] = [];
  const views = new Map<string, number>();
  const idle = new Set<string>();
  const say = (said: Said, condition: NestedCondition): void => {
    if (condition !== no) rules.push({ name: `${said.effect} ${said.view} ${said.branch} ${said.says}`, conditions: 'fact' in condition ? { all: [condition] } : (condition), event: { type: 'said', params: { ...said } } });
  };
  for (const [effect, { rule }] of state.effects) {
    if (rule === undefined) continue;
    if (rule.applies !== undefined) {
      // Whether a rule applies is checked before the run: the engine is asked again only where it does.
      if (state.effects.get(effect)?.applies === false) {
        idle.add(effect);
        continue;
      }
      const plain = new Derived(flat, state.point.plain, '');
      say({ effect, view: -1, branch: -1, says: 'applies-not' }, plain.may(rule.applies, true, false, true));
    }
    const found = viewsOf(rule, state.point);
    views.set(effect, found.length);
    found.forEach((view, k) => {
      const derived = new Derived(flat, view.facts, view.place === undefined && view.regime === '' ? '' : ` at ${view.place ?? ''} ${view.regime}`);
      rule.branches.forEach((branch, b) => {
        const fits = derived.may(branch.when);
        if (fits === no) return;
        say({ effect, view: k, branch: b, says: 'fits' }, fits);
        say({ effect, view: k, branch: b, says: 'fits-not' }, derived.may(branch.when, true));
        for (const verdict of verdicts) say({ effect, view: k, branch: b, says: verdict }, derived.verdict(branch, verdict));
      });
    });
  }
  const { events } = await new Engine(rules).run(Object.fromEntries(flat));
  const out = tally(state, views, events.map((e) => e.params as Said));
  for (const effect of idle) out.set(effect, 'not-applicable');
  return out;
}

function tally(state: State, views: ReadonlyMap<string, number>, events: readonly Said[]): Map<string, Verdict | 'not-applicable'> {
  const said = new Map<string, Set<Says>>();
  for (const e of events) {
    const key = `${e.effect} ${e.view} ${e.branch}`;
    said.set(key, (said.get(key) ?? new Set()).add(e.says));
  }
  const out = new Map<string, Verdict | 'not-applicable'>();
  for (const [effect, count] of views) {
    if (said.get(`${effect} -1 -1`)?.has('applies-not') === true) {
      out.set(effect, 'not-applicable');
      continue;
    }
    const rule = state.effects.get(effect)?.rule as EffectRule;
    for (let k = 0; k < count; k++) {
      const { verdict } = combine(rule, rule.branches.map((_, b) => outcomeOf(said.get(`${effect} ${k} ${b}`) ?? new Set())));
      const before = out.get(effect);
      if (before === undefined || before === 'not-applicable' || worse(verdict, before)) out.set(effect, verdict);
    }
  }
  return out;
}

function outcomeOf(says: ReadonlySet<Says>): Outcome {
  const fits = says.has('fits') ? (says.has('fits-not') ? 2 : 1) : 0;
  return { fits, can: fits === 0 ? 0 : setOf(verdicts.filter((v) => says.has(v))) };
}
