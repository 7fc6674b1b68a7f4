import { describe, expect, it } from 'vitest';
import { compileRules, decide, readRuleFolder, settle, type Condition, type CompiledRules } from '../../src/decide/index.ts';
import { quantity, type Definition, type Given } from '../../src/workings/index.ts';
import { band, graph, is, pack } from './harness.ts';

/** Seeded numbers in 0..1. Source: mulberry32, T. Ettinger, public domain, from memory. */
function random(seed: number): () => number {
  let s = seed;
  return () => {
    s = (s + 0x6d2b79f5) | 0;
    let t = Math.imul(s ^ (s >>> 15), 1 | s);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

interface Named { numbers: Map<string, Set<number>>; words: Map<string, Set<string>> }

/** The facts that rules read, with the numbers and words they are compared with. */
function namedBy(rules: CompiledRules): Named {
  const numbers = new Map<string, Set<number>>();
  const words = new Map<string, Set<string>>();
  const put = <T>(map: Map<string, Set<T>>, id: string, ...values: T[]): void => { map.set(id, new Set([...(map.get(id) ?? []), ...values])); };
  const condition = (c: Condition | undefined): void => {
    if (c === undefined) return;
    if ('all' in c) return c.all.forEach(condition);
    if ('any' in c) return c.any.forEach(condition);
    if (/^(verdict|branch|kept|choice)\./.test(c.fact)) return;
    if (typeof c.value === 'string') put(words, c.fact, c.value, 'another');
    else if (typeof c.value === 'number') put(numbers, c.fact, c.value);
    else if ('quantity' in c.value) { put(numbers, c.fact, 1); put(numbers, c.value.quantity, 1); }
    else put(words, c.fact, ...c.value, 'another');
  };
  for (const rule of Object.values(rules.effects)) {
    condition(rule.applies);
    for (const p of rule.price) condition(p.when);
    for (const b of rule.branches) {
      for (const c of [b.when, b.includeIf, b.leaveOutIf, b.atLeastBorderlineIf, b.atMostBorderlineIf, ...b.price.map((p) => p.when)]) condition(c);
      if (b.band === undefined) continue;
      for (const limit of [b.band.leaveOutAt, b.band.includeAt]) {
        if (typeof limit === 'number') put(numbers, b.band.deciding, limit);
        else { put(numbers, b.band.deciding, 1); put(numbers, limit.quantity, 1); }
      }
    }
  }
  for (const rule of Object.values(rules.choices)) {
    condition(rule.applies);
    for (const e of rule.entries) {
      condition(e.when);
      if (typeof e.take !== 'string') put(words, e.take.word, 'none');
    }
  }
  return { numbers, words };
}

const oneOf = <T>(list: readonly T[], r: () => number): T => list[Math.floor(r() * list.length)] as T;

/** A case at random: each fact at, below or above one of its limits, of either sign, or missing; what is missing can be asked for or not. */
function atRandom({ numbers, words }: Named, r: () => number): { definitions: Definition[]; given: Record<string, Given>; unaskable: Set<string> } {
  const definitions: Definition[] = [];
  const given: Record<string, Given> = {};
  const unaskable = new Set<string>();
  const add = (id: string, unit: string, value: number | string): void => {
    definitions.push(quantity(id, { symbol: id, name: id, unit }));
    if (r() < 0.15) { if (r() < 0.5) unaskable.add(id); } else given[id] = { value };
  };
  for (const [id, limits] of numbers) if (!words.has(id)) add(id, '1', oneOf([...limits], r) * oneOf([0, 0.1, 0.5, 0.999, 1, 1, 1.001, 2, 10, -1, 1e6], r));
  for (const [id, list] of words) add(id, 'word', oneOf([...list], r));
  return { definitions, given, unaskable };
}

async function compare(rules: CompiledRules, seeds: number): Promise<Record<string, number>> {
  const named = namedBy(rules);
  const seen: Record<string, number> = {};
  for (let seed = 1; seed <= seeds; seed++) {
    const { definitions, given, unaskable } = atRandom(named, random(seed));
    const workings = graph(definitions, given, rules);
    const askable = (id: string): boolean => !unaskable.has(id);
    const { effects } = await decide(workings, rules, [], { askable }); // throws where the two readings disagree
    const again = settle(workings, rules, [], { askable });
    for (const e of effects) {
      expect(`${e.id}, seed ${seed}: ${e.verdict}`).toBe(`${e.id}, seed ${seed}: ${again.effects.get(e.id)?.verdict ?? ''}`);
      if (e.judged) seen[e.applies === false ? 'not-applicable' : (e.base ?? e.verdict)] = (seen[e.applies === false ? 'not-applicable' : (e.base ?? e.verdict)] ?? 0) + 1;
    }
  }
  return seen;
}

const kinds = ['borderline', 'include', 'leave-out', 'not-applicable', 'undecided'];

describe('the rules engine and the synchronous reading', () => {
  const everything = pack(
    { effect: 'turbulence', branches: [band('a', 'x', { quantity: 'low', times: 0.8 }, { quantity: 'high', times: 1.2 })] },
    { effect: 'first', applies: { all: [is('kind', 'a'), { any: [is('y', 3, 'greaterThan'), is('verdict.turbulence', 'leave-out', 'notEqual')] }] }, branches: [band('a', 'x', 1, 10, { when: { any: [is('z', 2, 'lessThanInclusive'), is('kind', ['b', 'c'], 'in')] } }), band('b', 'y', 50, 10, { when: is('v', 2, 'lessThan'), includeIf: is('z', 0.1, 'greaterThanInclusive'), leaveOutIf: { all: [is('x', 4, 'lessThan'), is('kind', ['c'], 'notIn')] } }), { id: 'c', when: is('verdict.turbulence', 'include'), verdict: 'borderline', because: 'x', source: 's' }, { id: 'd', when: is('z', 5), judged: false, because: 'x', source: 's' }], otherwise: { verdict: 'leave-out', because: 'x' } },
    { effect: 'worst', combine: 'worst', branches: [band('a', 'x', 1, 10, { when: is('w', { quantity: 'z', times: 3 }, 'greaterThan') }), band('b', 'y', 2, 20, { magnitude: true, atLeastBorderlineIf: is('kind', 'b'), atMostBorderlineIf: is('z', 7, 'greaterThan') }), band('c', 'w', { quantity: 'low' }, { quantity: 'high' }, { smallMatters: true, when: is('branch.first', 'a'), without: { verdict: 'leave-out', because: 'x' } })] },
    { effect: 'circle-one', branches: [{ id: 'a', when: is('verdict.circle-two', 'leave-out'), verdict: 'include', because: 'x', source: 's' }, band('b', 'x', 1, 10, { when: is('z', 1, 'greaterThan') })], otherwise: { verdict: 'leave-out', because: 'x' } },
    { effect: 'circle-two', branches: [{ id: 'a', when: is('verdict.circle-one', 'include', 'notEqual'), verdict: 'leave-out', because: 'x', source: 's' }], otherwise: { verdict: 'include', because: 'x' } },
  );
  it('agree over rules made to use every part of the form', async () => {
    const seen = await compare(everything, 300);
    expect(Object.entries(seen).filter(([, times]) => times > 50).map(([verdict]) => verdict).sort()).toEqual(kinds);
  });
  it('agree over all rule files', async () => {
    const rules = compileRules(readRuleFolder('rules'));
    const seen = await compare(rules, 100);
    expect(Object.entries(seen).filter(([, times]) => times > 5).map(([verdict]) => verdict).sort()).toEqual(kinds);
  }, 60_000);
});
