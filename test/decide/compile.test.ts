import { describe, expect, it } from 'vitest';
import { compileRules, type KnownFacts } from '../../src/decide/index.ts';
import { Problem, type ProblemData } from '../../src/problems/index.ts';

const known: KnownFacts = {
  ids: new Set(['gravity', 'densityChange', 'richardson', 'mach', 'axis', 'imposedFlow', 'nusselt', 'buoyancyFactorNusselt', 'roughnessReynolds']),
  words: new Map([['axis', ['level', 'inclined', 'upright']], ['imposedFlow', ['yes', 'no']]]),
};
const good = {
  effect: 'buoyancy', title: 'Buoyancy in an imposed flow',
  applies: { all: [{ fact: 'gravity', operator: 'greaterThan', value: 0, else: 'no gravity' }] },
  branches: [{ id: 'body', deciding: 'richardson', leaveOutAt: 0.1, includeAt: 1, price: [{ factor: 'buoyancyFactorNusselt', of: 'nusselt' }], because: 'Ri = {richardson}', source: 'a book' }],
  examples: [
    { facts: { richardson: 2 }, verdict: 'include' }, { facts: { richardson: 0.1 }, verdict: 'borderline' }, { facts: { richardson: 0.01 }, verdict: 'leave-out' },
    { facts: {}, verdict: 'undecided' }, { facts: { gravity: 0 }, applies: false, verdict: 'leave-out' },
  ],
};
type Rule = Record<string, unknown>;
const text = (rule: Rule): string => JSON.stringify(rule, null, 2);
const problemsOf = (source: string, pack = false): readonly ProblemData[] => {
  try {
    compileRules([{ file: 'buoyancy.json', text: source }], known, undefined, pack);
    return [];
  } catch (error) {
    if (error instanceof Problem) return error.list;
    throw error;
  }
};
const branch = (more: Rule, without: string[] = []): Rule => {
  const b: Rule = { ...(good.branches[0] as Rule), ...more };
  for (const key of without) delete b[key];
  return { ...good, branches: [b] };
};

describe('rule files', () => {
  it('accepts the form and leaves plain JSON', () => {
    const rules = compileRules([{ file: 'buoyancy.json', text: text(good) }], known);
    expect(rules.effects['buoyancy']?.branches[0]?.band).toEqual({ deciding: 'richardson', leaveOutAt: 0.1, includeAt: 1, magnitude: false, smallMatters: false, bounds: [] });
    expect(JSON.parse(JSON.stringify(rules))).toEqual(rules);
  });

  const leaf = { fact: 'gravity', operator: 'greaterThan', value: 0 };
  const rows: { name: string; rule: Rule; code: string; nearest?: string; message?: RegExp }[] = [
    { name: 'priority', rule: { ...good, applies: { all: [{ ...leaf, priority: 1 }] } }, code: 'refused-key' },
    { name: 'path', rule: { ...good, applies: { all: [{ ...leaf, path: '$.x' }] } }, code: 'refused-key' },
    { name: 'not', rule: { ...good, applies: { not: leaf } }, code: 'refused-key', message: /opposite/ },
    { name: 'empty all', rule: { ...good, applies: { all: [] } }, code: 'empty-condition' },
    { name: 'empty any', rule: { ...good, applies: { any: [] } }, code: 'empty-condition' },
    { name: 'all and any', rule: { ...good, applies: { all: [leaf], any: [leaf] } }, code: 'mixed-condition' },
    { name: 'a misspelt group', rule: { ...good, applies: { al: [leaf] } }, code: 'unknown-key' },
    { name: 'an unknown operator', rule: { ...good, applies: { ...leaf, operator: 'greaterthen' } }, code: 'unknown-word', nearest: 'greaterThan' },
    { name: 'an unknown fact', rule: { ...good, applies: { ...leaf, fact: 'gravety' } }, code: 'unknown-fact', nearest: 'gravity' },
    { name: 'an unknown effect in a fact', rule: { ...good, applies: is('verdict.turbulense', 'include') }, code: 'unknown-fact', nearest: 'verdict.turbulence' },
    { name: 'an unknown verdict', rule: { ...good, applies: is('verdict.turbulence', 'included') }, code: 'unknown-word', nearest: 'include' },
    { name: 'a word outside its list', rule: { ...good, applies: is('axis', 'upright ') }, code: 'unknown-word', nearest: 'upright' },
    { name: 'a number compared as a word', rule: { ...good, applies: is('gravity', 'yes') }, code: 'wrong-kind' },
    { name: 'a word compared as a number', rule: { ...good, applies: { fact: 'axis', operator: 'greaterThan', value: 1 } }, code: 'wrong-kind' },
    { name: 'in with one word', rule: { ...good, applies: { fact: 'axis', operator: 'in', value: 'upright' } }, code: 'wrong-form' },
    { name: 'a choice read by an effect', rule: { ...good, applies: is('choice.density-law', 'constant') }, code: 'unknown-fact', message: /only choices/ },
    { name: 'a limit missing', rule: branch({}, ['includeAt']), code: 'missing-limit' },
    { name: 'a limit that is a word', rule: branch({ includeAt: 'high' }), code: 'wrong-form' },
    { name: 'a limit of an unknown quantity', rule: branch({ includeAt: { quantity: 'richardsen' } }), code: 'unknown-fact', nearest: 'richardson' },
    { name: 'a direction said twice', rule: branch({ smallMatters: false }), code: 'said-twice' },
    { name: 'two deciders', rule: branch({ verdict: 'include' }), code: 'two-deciders' },
    { name: 'no decider', rule: branch({}, ['deciding', 'leaveOutAt', 'includeAt']), code: 'missing-key' },
    { name: 'no source', rule: branch({}, ['source']), code: 'missing-key' },
    { name: 'a last branch with a condition', rule: branch({ when: leaf }), code: 'missing-otherwise' },
    { name: 'otherwise that never counts', rule: { ...good, otherwise: { verdict: 'include', because: 'x' } }, code: 'idle-otherwise' },
    { name: 'a hidden branch', rule: { ...good, branches: [good.branches[0], { ...good.branches[0], id: 'second' }] }, code: 'hidden-branch' },
    { name: 'a price of nothing', rule: branch({ price: [{ of: 'nusselt' }] }), code: 'missing-key' },
    { name: 'a misspelt factor', rule: branch({ price: [{ factor: 'buoyancyFactorNuselt', of: 'nusselt' }] }), code: 'unknown-fact', nearest: 'buoyancyFactorNusselt' },
    { name: 'a misspelt id in the reason', rule: branch({ because: 'Ri = {richardsn}' }), code: 'unknown-fact', nearest: 'richardson' },
    { name: 'a missing example', rule: { ...good, examples: good.examples.slice(1) }, code: 'missing-example', message: /include/ },
    { name: 'no example where it does not apply', rule: { ...good, examples: good.examples.slice(0, 4) }, code: 'missing-example', message: /not apply/ },
    { name: 'an unknown key', rule: { ...good, branchs: [] }, code: 'unknown-key', nearest: 'branches' },
    { name: 'an unknown decision', rule: { ...good, effect: 'buoyency' }, code: 'unknown-decision', nearest: 'buoyancy' },
    { name: 'nothing but a number', rule: 3 as unknown as Rule, code: 'wrong-form' },
  ];
  it.each(rows)('refuses $name', ({ rule, code, nearest, message }) => {
    const found = problemsOf(text(rule)).find((p) => p.code === code);
    expect(found).toMatchObject({ file: 'buoyancy.json', line: expect.any(Number), column: expect.any(Number), message: expect.stringMatching(message ?? /./), ...(nearest === undefined ? {} : { nearest }) });
  });

  it('says where, and everything at once', () => {
    const source = '{ "effect": "buoyancy", "title": "x",\n  "branches": [ { "id": "a", "deciding": "richardsen", "leaveOutAt": 0.1,\n      "because": "b", "source": "s" } ],\n  "examples": [] }';
    expect(problemsOf(source).map(({ code, line, column, length }) => [code, line, column, length])).toEqual([
      ['missing-limit', 2, 17, 60],
      ['unknown-fact', 2, 42, 12],
    ]);
  });

  const broken: [string, string, number, number][] = [
    ['{ "effect": "buoyancy", }', 'a key in double quotes', 1, 25],
    ['{ "a": 1,\n  "a": 2 }', 'stands twice', 2, 3],
    ['{ "a": NaN }', 'not a JSON value', 1, 8],
    ['{ "a": 1e999 }', 'not a JSON value', 1, 8],
    ['{ "a": "x\ny" }', 'a string that does not end', 1, 8],
    ['{ "a": 1 } x', 'follows the end', 1, 12],
    ['', 'ends too early', 1, 1],
    ['['.repeat(100000), 'nested deeper', 1, 62],
    [`{ "a": "${'x'.repeat(300000)}" }`, 'longer than 256 kB', 1, 1],
  ];
  it.each(broken)('reads %.40s as broken JSON', (source, message, line, column) => {
    expect(problemsOf(source)).toMatchObject([{ code: 'not-json', message: expect.stringContaining(message), line, column }]);
  });

  it('takes hostile names for what they are', () => {
    expect(problemsOf('{ "__proto__": { "polluted": 1 }, "effect": "__proto__", "title": "x", "branches": [], "examples": [] }').map((p) => p.code)).toContain('unknown-key');
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
    expect(problemsOf(text({ ...good, effect: 'constructor' }), true)).toEqual([]);
    let deep: Rule = leaf;
    for (let k = 0; k < 25; k++) deep = { all: [deep] };
    expect(problemsOf(text({ ...good, applies: deep })).map((p) => p.code)).toContain('too-deep');
  });

  it('lets a pack add its own ids and override ours', () => {
    const ours = compileRules([{ file: 'buoyancy.json', text: text(good) }], known);
    const both = compileRules([{ file: 'p/a.json', text: text({ ...good, effect: 'sediment-load' }) }, { file: 'p/b.json', text: text({ ...good, title: 'ours, stricter' }) }], known, ours, true);
    expect(Object.keys(both.effects)).toEqual(['buoyancy', 'sediment-load']);
    expect(both.effects['buoyancy']?.title).toBe('ours, stricter');
    expect(problemsOf(text({ ...good, effect: 'sediment-load' })).map((p) => p.code)).toEqual(['unknown-decision']);
    expect(() => compileRules([{ file: 'a.json', text: text(good) }, { file: 'b.json', text: text(good) }], known)).toThrow(/second file/);
  });

  it('checks the options of a choice', () => {
    const choice: Rule = {
      choice: 'density-law', title: 'Density model', options: { constant: 'too plain', temperature: 'not called for' },
      first: [{ when: is('kept.variable-density', 'yes'), take: 'temperature', because: 'density changes' }], otherwise: { take: 'constant', because: 'nothing changes it' },
      examples: [{ facts: { 'kept.variable-density': 'yes' }, take: 'temperature' }, { facts: { 'kept.variable-density': 'no' }, take: 'constant' }],
    };
    expect(problemsOf(text(choice))).toEqual([]);
    expect(problemsOf(text({ ...choice, options: { constant: 'x', temprature: 'y' } }))[0]).toMatchObject({ code: 'unknown-word', nearest: 'temperature' });
    expect(problemsOf(text({ ...choice, otherwise: { take: 'boussinesq', because: 'x' } }))[0]).toMatchObject({ code: 'unknown-word' });
    expect(problemsOf(text({ ...choice, examples: [] }))[0]).toMatchObject({ code: 'missing-example' });
  });
});

function is(fact: string, value: unknown): Rule {
  return { fact, operator: 'equal', value };
}
