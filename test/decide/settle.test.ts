import { describe, expect, it } from 'vitest';
import { decide, settle, type SettleOptions, type Target } from '../../src/decide/index.ts';
import { quantity, way, type Definition, type Given } from '../../src/workings/index.ts';
import { band, graph, is, number, pack, target, word } from './harness.ts';

const verdictAt = (rule: Record<string, unknown>, given: Record<string, number | string>, definitions: Definition[], options?: SettleOptions): string => {
  const rules = pack(rule);
  return settle(graph(definitions, given, rules), rules, [], options).effects.get(rule['effect'] as string)?.verdict ?? '';
};
const x = [number('x')];

describe('limits', () => {
  const up = { effect: 'mach-like', branches: [band('only', 'x', 0.1, 1)] };
  const down = { effect: 'mach-like', branches: [band('only', 'x', 50, 10)] };
  const one = { effect: 'mach-like', branches: [band('only', 'x', 0.3, 0.3)] };
  const signed = { effect: 'mach-like', branches: [band('only', 'x', 0.02, 0.1, { magnitude: true })] };
  const kelvin = { effect: 'mach-like', branches: [band('only', 'x', -10, { quantity: 'onset', times: 1 })] };
  const scaled = { effect: 'mach-like', branches: [band('only', 'x', { quantity: 'low', times: 0.8 }, { quantity: 'high', times: 1.2 })] };
  const reversed = { effect: 'mach-like', branches: [band('only', 'x', { quantity: 'high' }, { quantity: 'low' }, { smallMatters: true })] };
  // Limits and verdicts by hand from "At the limit itself keep the physics".
  const rows: [string, Record<string, unknown>, number, string][] = [
    ['below', up, 0.0999, 'leave-out'], ['at the lower limit', up, 0.1, 'borderline'], ['between', up, 0.5, 'borderline'], ['just below the upper', up, 0.9999, 'borderline'], ['at the upper limit', up, 1, 'include'], ['above', up, 20, 'include'],
    ['reversed, far above', down, 50.001, 'leave-out'], ['reversed, at the limit of leaving out', down, 50, 'borderline'], ['reversed, between', down, 11, 'borderline'], ['reversed, at the limit of including', down, 10, 'include'], ['reversed, below', down, 0, 'include'],
    ['one limit, below', one, 0.2999, 'leave-out'], ['one limit, at it', one, 0.3, 'include'],
    ['signed, small', signed, -0.01, 'leave-out'], ['signed, at', signed, -0.02, 'borderline'], ['signed, large', signed, -0.3, 'include'],
    ['kelvin, below', kelvin, -10.1, 'leave-out'], ['kelvin, at', kelvin, -10, 'borderline'], ['kelvin, at the onset', kelvin, 4.4, 'include'],
    ['share of a quantity, below', scaled, 1839, 'leave-out'], ['share of a quantity, at', scaled, 1840, 'borderline'], ['share of a quantity, above', scaled, 4800, 'include'],
    ['reversed by quantities, above', reversed, 4001, 'leave-out'], ['reversed by quantities, at', reversed, 4000, 'borderline'], ['reversed by quantities, below', reversed, 2300, 'include'],
  ];
  it.each(rows)('%s', (_, rule, value, verdict) => {
    expect(verdictAt(rule, { x: value, onset: 4.4, low: 2300, high: 4000 }, [...x, number('onset', 'K'), number('low'), number('high')])).toBe(verdict);
  });
});

describe('branches', () => {
  const defs = [number('x'), number('y'), number('flag'), word('kind', ['a', 'b'])];
  const first = { effect: 'e', branches: [band('a', 'x', 1, 10, { when: is('kind', 'a') }), band('b', 'y', 1, 10)] };
  const worst = { effect: 'e', combine: 'worst', branches: [band('a', 'x', 1, 10), band('b', 'y', 1, 10)] };
  const extra = { effect: 'e', branches: [band('a', 'x', 1, 10, { includeIf: is('flag', 0.1, 'greaterThan'), leaveOutIf: is('y', 0) })] };
  const caps = { effect: 'e', branches: [band('a', 'x', 1, 10, { atLeastBorderlineIf: is('kind', 'a'), atMostBorderlineIf: is('kind', 'b') })] };
  const rows: [string, Record<string, unknown>, Record<string, number | string>, string][] = [
    ['the first that fits', first, { kind: 'a', x: 0, y: 20 }, 'leave-out'],
    ['the next where it does not', first, { kind: 'b', x: 0, y: 20 }, 'include'],
    ['not told which, but the same either way', first, { x: 30, y: 20 }, 'include'],
    ['not told which, and it matters', first, { x: 0, y: 20 }, 'undecided'],
    ['the worst of both', worst, { x: 0, y: 2 }, 'borderline'],
    ['include settles it, whatever is missing', worst, { y: 20 }, 'include'],
    ['else missing comes before borderline', worst, { y: 2 }, 'undecided'],
    ['includeIf comes first', extra, { x: 0, y: 0, flag: 1 }, 'include'],
    ['leaveOutIf second', extra, { x: 20, y: 0, flag: 0 }, 'leave-out'],
    ['includeIf not known, include anyway', extra, { x: 20, y: 1 }, 'include'],
    ['includeIf not known, else left out: not decided', extra, { x: 0, y: 1 }, 'undecided'],
    ['at least borderline', caps, { x: 0, kind: 'a' }, 'borderline'],
    ['at most borderline', caps, { x: 20, kind: 'b' }, 'borderline'],
    ['not capped', caps, { x: 20, kind: 'a' }, 'include'],
  ];
  it.each(rows)('%s', (_, rule, given, verdict) => {
    expect(verdictAt(rule, given, defs)).toBe(verdict);
  });
  it('does not apply: left out, with the reason', async () => {
    const rules = pack({ effect: 'e', applies: { all: [{ ...is('kind', 'a'), else: 'nothing of kind a' }] }, branches: [band('a', 'x', 1, 10)] });
    const { effects } = await decide(graph(defs, { kind: 'b', x: 20 }, rules), rules, []);
    expect(effects.at(-1)).toEqual({ id: 'e', title: 'a rule', applies: false, judged: true, verdict: 'leave-out', because: 'cannot occur here: nothing of kind a' });
  });
});

const area = quantity('area', { symbol: 'A', name: 'area', unit: 'm^2' }, [way({ needs: ['diameter'], value: ({ diameter }) => (Math.PI * diameter ** 2) / 4, formula: 'A = pi D^2/4', source: 'definition' })]);
const group = quantity('group', { symbol: 'X', name: 'group', unit: '1' }, [
  way({ needs: ['speed', 'diameter', 'viscosity'], value: ({ speed, diameter, viscosity }) => (speed * diameter) / viscosity, formula: 'X = U D/nu', source: 'definition' }),
  way({ needs: ['flow', 'area', 'diameter', 'viscosity'], value: ({ flow, area: a, diameter, viscosity }) => ((flow / a) * diameter) / viscosity, formula: 'X = Q D/(A nu)', source: 'definition' }),
]);
const flowing = [number('speed', 'm/s'), number('flow', 'm^3/s'), number('diameter', 'm'), number('viscosity', 'm^2/s'), area, group];
const groupRule = { effect: 'e', branches: [band('only', 'group', 100, 1000)] };

describe('what is missing', () => {
  it('names the inputs that would settle it, alternatives joined', async () => {
    const rules = pack(groupRule);
    const { effects } = await decide(graph(flowing, { diameter: 0.1, viscosity: 1e-6 }, rules), rules, []);
    expect(effects.at(-1)).toMatchObject({ verdict: 'undecided', judged: true, missing: ['speed|flow'], because: 'not known: group' });
  });
  it('takes what stands in "without" only where nothing could be asked', () => {
    const rule = { effect: 'e', branches: [band('only', 'group', 100, 1000, { without: { verdict: 'leave-out', because: 'constant by declaration' } })] };
    expect(verdictAt(rule, { diameter: 0.1, viscosity: 1e-6 }, flowing)).toBe('undecided');
    expect(verdictAt(rule, { diameter: 0.1, viscosity: 1e-6 }, flowing, { askable: () => false })).toBe('leave-out');
    expect(verdictAt(groupRule, { diameter: 0.1, viscosity: 1e-6 }, flowing, { askable: () => false })).toBe('undecided');
  });
  it('goes on where applicability cannot be told, and says so', async () => {
    const rules = pack({ ...groupRule, applies: is('heat', 0, 'greaterThan') });
    const w = graph([...flowing, number('heat')], { diameter: 0.1, viscosity: 1e-6, speed: 1 }, rules);
    expect((await decide(w, rules, [])).effects.at(-1)).toMatchObject({ applies: 'unknown', verdict: 'include' });
  });
  it('tries an input with physical bounds at both ends', async () => {
    const rule = (limit: number): Record<string, unknown> => ({ effect: 'e', branches: [band('only', 'group', limit, limit * 10, { bounds: [{ input: 'speed', from: 0.02, to: 1, why: 'no faster in this line' }] })] });
    const given = { diameter: 0.1, viscosity: 1e-6 };
    expect(verdictAt(rule(1e6), given, flowing)).toBe('leave-out'); // at most 1e5
    expect(verdictAt(rule(100), given, flowing)).toBe('include'); // at least 2000
    expect(verdictAt(rule(1e4), given, flowing)).toBe('undecided');
    const rules = pack(rule(100));
    const w = graph(flowing, given, rules);
    expect((await decide(w, rules, [])).effects.at(-1)).toMatchObject({ verdict: 'include', because: expect.stringContaining('no faster in this line') });
    expect(w.get('speed')).toBeUndefined();
  });
  it('has no rule: not judged, undecided, nothing to ask', async () => {
    const rules = pack();
    const { effects, choices } = await decide(graph([], {}, rules), rules, []);
    expect(effects).toHaveLength(63);
    expect(new Set(effects.map((e) => e.id)).size).toBe(63);
    expect(effects[0]).toEqual({ id: 'turbulence', title: 'Turbulence', applies: 'unknown', judged: false, verdict: 'undecided', because: 'not judged: no rule decides it yet', missing: [] });
    expect(choices).toHaveLength(14);
  });
});

const product = (id: string, needs: string[], unit = '1'): Definition => quantity(id, { symbol: id, name: id, unit }, [way({ needs, value: (of) => needs.reduce((p, n) => p * (of[n] as number), 1), formula: needs.join(' '), source: 'test' })]);
const priced = [number('x'), number('F'), number('plainNusselt'), product('nusselt', ['plainNusselt', 'F']), product('heatRate', ['nusselt'], 'W'), number('drag')];
const price = [{ factor: 'F', of: 'nusselt' }];

describe('price', () => {
  const rule = { effect: 'e', branches: [band('only', 'x', 1, 10, { price })] };
  const run = async (given: Record<string, number>, targets: Target[], change: Record<string, unknown> = {}, definitions = priced) => {
    const rules = pack({ ...rule, ...change });
    return (await decide(graph(definitions, { plainNusselt: 4, drag: 1, ...given }, rules), rules, targets)).effects.at(-1);
  };
  // With F = 1.10, leaving the effect out costs 1/1.10 - 1 = -9.0909 % (methods: "F = 1.10 prints -9 %").
  it('is (without - with)/with, for the target that follows', async () => {
    expect((await run({ x: 0.1, F: 1.1 }, [target('heatRate')]))?.price).toMatchObject({ target: 'heatRate', of: 'nusselt', relative: expect.closeTo(1 / 1.1 - 1, 12), acts: true });
  });
  it('moves leave-out to borderline beyond the tolerance, not within it', async () => {
    expect(await run({ x: 0.1, F: 1.1 }, [target('heatRate')])).toMatchObject({ verdict: 'borderline', base: 'leave-out', movedBy: 'price', firstRun: 'keep' });
    expect((await run({ x: 0.1, F: 1.019 }, [target('heatRate')]))?.verdict).toBe('leave-out');
    expect((await run({ x: 0.1, F: 1.1 }, [target('heatRate', { relative: 0.1 })]))?.verdict).toBe('leave-out');
  });
  it('moves include to borderline below a fifth of the tolerance, not above it', async () => {
    expect(await run({ x: 20, F: 1.003 }, [target('heatRate')])).toMatchObject({ verdict: 'borderline', base: 'include', movedBy: 'price', firstRun: 'leave-out' });
    expect((await run({ x: 20, F: 1.005 }, [target('heatRate')]))?.verdict).toBe('include');
  });
  it('keeps borderline, and tells whether the first run carries the effect', async () => {
    expect(await run({ x: 5, F: 1.1 }, [target('heatRate')])).toMatchObject({ verdict: 'borderline', firstRun: 'keep' });
    expect(await run({ x: 5, F: 1.01 }, [target('heatRate')])).toMatchObject({ verdict: 'borderline', firstRun: 'leave-out' });
    expect(await run({ x: 5 }, [target('heatRate')])).toMatchObject({ verdict: 'borderline', firstRun: 'keep' });
  });
  it('does not act through a target that does not follow, and stands under its own name', async () => {
    const e = await run({ x: 0.1, F: 1.5 }, [target('drag')]);
    expect(e).toMatchObject({ verdict: 'leave-out', price: { of: 'nusselt', relative: expect.closeTo(-1 / 3, 12), acts: false } });
    expect(e?.price?.target).toBeUndefined();
  });
  it('never moves an exempt effect, and still prints', async () => {
    expect(await run({ x: 0.1, F: 1.5 }, [target('heatRate')], { exempt: true })).toMatchObject({ verdict: 'leave-out', price: { relative: expect.closeTo(-1 / 3, 12), acts: false } });
    expect(await run({ x: 5, F: 1.0001 }, [target('heatRate')], { exempt: true })).toMatchObject({ verdict: 'borderline', firstRun: 'keep' });
  });
  it('counts the target with the largest share of its tolerance', async () => {
    const e = await run({ x: 5, F: 1.1 }, [target('heatRate', { relative: 0.5 }), target('nusselt', { relative: 0.01 })]);
    expect(e?.price?.target).toBe('nusselt');
    expect(e?.prices?.map((p) => p.target)).toEqual(['nusselt', 'heatRate']);
  });
  it('prints a change of sign, and no percentage', async () => {
    expect((await run({ x: 0.1, F: -0.2 }, [target('heatRate')]))).toMatchObject({ verdict: 'borderline', movedBy: 'price', price: { target: 'heatRate', signChange: true, acts: true } });
  });
  it('has none where the factor is 1 for want of a law: include stays, and what is borderline is kept', async () => {
    const idle = [number('x'), quantity('F', { symbol: 'F', name: 'F', unit: '1' }, [way({ needs: ['y'], value: ({ y }) => y, formula: 'F', source: 'test' }), way({ needs: [], value: () => 1, formula: 'F = 1', source: 'test' })]), number('y'), number('plainNusselt'), product('nusselt', ['plainNusselt', 'F']), product('heatRate', ['nusselt'], 'W')];
    const included = await run({ x: 20 }, [target('heatRate')], {}, idle);
    expect(included).toMatchObject({ verdict: 'include', base: 'include' });
    expect(included?.price).toBeUndefined();
    expect(await run({ x: 3 }, [target('heatRate')], {}, idle)).toMatchObject({ verdict: 'borderline', firstRun: 'keep' });
    expect(await run({ x: 20, y: 1.003 }, [target('heatRate')], {}, idle)).toMatchObject({ verdict: 'borderline', movedBy: 'price' });
  });
  it('divides the priced quantity by F where the factor itself is not in the target', async () => {
    const loose = [number('x'), number('F'), number('nusselt'), product('heatRate', ['nusselt'], 'W'), number('drag'), number('plainNusselt')];
    expect((await run({ x: 0.1, F: 1.1, nusselt: 5 }, [target('heatRate')], {}, loose))?.price).toMatchObject({ target: 'heatRate', relative: expect.closeTo(1 / 1.1 - 1, 12), acts: true });
  });
  it('is in kelvin for a temperature, against 2 % of its change', async () => {
    const warm = [...priced, number('inletTemperature', 'K'), quantity('outletTemperature', { symbol: 'T', name: 'T', unit: 'K' }, [way({ needs: ['inletTemperature', 'nusselt'], value: ({ inletTemperature, nusselt }) => inletTemperature - nusselt, formula: 'T', source: 'test' })])];
    // Nu = 4 x 1.1: the fluid cools by 4.4 K, without the effect by 4.0 K: +0.4 K. Tolerance 2 % of 4.4 K = 0.088 K.
    const e = await run({ x: 0.1, F: 1.1, inletTemperature: 300 }, [target('outletTemperature')], {}, warm);
    expect(e).toMatchObject({ verdict: 'borderline', price: { value: expect.closeTo(0.4, 9), unit: 'K', acts: true } });
    expect((await run({ x: 0.1, F: 1.1, inletTemperature: 300 }, [target('outletTemperature', { absolute: 1 })], {}, warm))?.verdict).toBe('leave-out');
  });
  it('may be a number in its own unit', async () => {
    const defs = [...priced, number('rise', 'K'), number('outletTemperature', 'K')];
    const own = { branches: [band('only', 'x', 1, 10, { price: [{ value: 'rise', of: 'outletTemperature' }] })] };
    expect(await run({ x: 0.1, rise: 3, outletTemperature: 310 }, [target('outletTemperature', { absolute: 1 })], own, defs)).toMatchObject({ verdict: 'borderline', price: { value: 3, unit: 'K', acts: true } });
    expect((await run({ x: 0.1, rise: 0.3, outletTemperature: 310 }, [target('outletTemperature', { absolute: 1 })], own, defs))?.verdict).toBe('leave-out');
  });
  it('leaves the graph as it was', async () => {
    const rules = pack(rule);
    const w = graph(priced, { x: 0.1, F: 1.1, plainNusselt: 4 }, rules);
    await decide(w, rules, [target('heatRate')]);
    expect([w.get('F'), w.get('heatRate')]).toEqual([1.1, 4.4]);
  });
});

describe('spread and operating range', () => {
  const rules = pack({ effect: 'e', branches: [band('only', 'x', 1, 10)] });
  const at = (value: number, options: SettleOptions) => settle(graph(x, { x: value }, rules), rules, [], options).effects.get('e');
  it('make a verdict borderline where they cross a limit', () => {
    expect(at(0.8, { spreadOf: () => ({ low: 0.6, high: 1.05 }) })).toMatchObject({ verdict: 'borderline', base: 'leave-out', movedBy: 'spread' });
    expect(at(0.8, { spreadOf: () => ({ low: 0.6, high: 0.99 }) })).toMatchObject({ verdict: 'leave-out' });
    expect(at(12, { rangeOf: () => ({ low: 9, high: 15 }), spreadOf: () => ({ low: 9, high: 15 }) })).toMatchObject({ verdict: 'borderline', base: 'include', movedBy: 'range' });
  });
  it('of a signed quantity enter by magnitude', () => {
    const signed = pack({ effect: 'e', branches: [band('only', 'x', 1, 10, { magnitude: true })] });
    const read = (low: number, high: number) => settle(graph(x, { x: -12 }, signed), signed, [], { rangeOf: () => ({ low, high }) }).effects.get('e')?.verdict;
    expect(read(-20, -11)).toBe('include');
    expect(read(-20, 20)).toBe('borderline');
  });
});

describe('passes', () => {
  it('let an effect read one that comes later', () => {
    const rules = pack(
      { effect: 'turbulence', branches: [{ id: 'a', when: is('verdict.radiation', 'include'), verdict: 'include', because: 'b', source: 's' }], otherwise: { verdict: 'leave-out', because: 'o' } },
      { effect: 'radiation', branches: [band('only', 'x', 1, 10)] },
    );
    const state = settle(graph(x, { x: 20 }, rules), rules, []);
    expect(state.effects.get('turbulence')?.verdict).toBe('include');
    expect(state.passes).toBe(3);
  });
  it('end what alternates as borderline with both states named', async () => {
    const contrary = (effect: string, other: string): Record<string, unknown> => ({ effect, branches: [{ id: 'a', when: is(`verdict.${other}`, 'include'), verdict: 'leave-out', because: 'b', source: 's' }], otherwise: { verdict: 'include', because: 'o' } });
    const rules = pack(
      contrary('turbulence', 'turbulence'),
      { effect: 'radiation', branches: [{ id: 'a', when: is('verdict.turbulence', 'borderline'), verdict: 'include', because: 'b', source: 's' }], otherwise: { verdict: 'leave-out', because: 'o' }, bothRegimes: false },
    );
    const w = graph([], {}, rules);
    const { effects } = await decide(w, rules, []);
    const find = (id: string) => effects.find((e) => e.id === id);
    expect(find('turbulence')).toMatchObject({ verdict: 'borderline', movedBy: 'passes', firstRun: 'keep', because: expect.stringMatching(/include and leave-out|leave-out and include/) });
    expect(find('radiation')?.verdict).toBe('include');
  });
  it('read both regimes where the regime is open, and the worse counts', async () => {
    const rules = pack(
      { effect: 'turbulence', branches: [band('only', 'x', 1, 10)] },
      { effect: 'radiation', branches: [band('laminar', 'y', 1, 10, { when: is('verdict.turbulence', 'leave-out') }), band('turbulent', 'z', 1, 10)] },
    );
    const read = (given: Record<string, number>) => settle(graph([...x, number('y'), number('z')], given, rules), rules, []).effects.get('radiation')?.verdict;
    expect(read({ x: 5, y: 0.1, z: 20 })).toBe('include');
    expect(read({ x: 5, y: 20, z: 0.1 })).toBe('include');
    expect(read({ x: 5, y: 5, z: 0.1 })).toBe('borderline');
    expect(read({ x: 0.5, y: 0.1, z: 20 })).toBe('leave-out');
    expect(read({ x: 5, y: 0.1 })).toBe('undecided');
    const both = await decide(graph([...x, number('y'), number('z')], { x: 5, y: 0.1, z: 20 }, rules), rules, []);
    expect(both.effects.find((e) => e.id === 'radiation')?.deciding).toMatchObject({ quantity: 'z', branch: 'turbulent', value: 20 });
  });
});

describe('places', () => {
  const biot = quantity('biot', { symbol: 'Bi', name: 'Bi', unit: '1', per: ['wall'], plain: 'target' });
  const places = { of: { wall: ['walls.left', 'walls.right'] }, target: { wall: 'walls.left' } };
  it('are all judged, and the worst counts', async () => {
    const rules = pack({ effect: 'e', per: 'wall', branches: [band('only', 'biot', 0.02, 0.1)] });
    const w = graph([biot], { 'biot@walls.left': 0.01, 'biot@walls.right': 0.5 }, rules, places);
    const { effects } = await decide(w, rules, []);
    expect(effects.at(-1)).toMatchObject({ verdict: 'include', deciding: { quantity: 'biot@walls.right', value: 0.5 }, because: 'biot = 0.5' });
  });
  it('lack what they lack by name', async () => {
    const rules = pack({ effect: 'e', per: 'wall', branches: [band('only', 'biot', 0.02, 0.1)] });
    const { effects } = await decide(graph([biot], { 'biot@walls.left': 0.01 }, rules, places), rules, []);
    expect(effects.at(-1)).toMatchObject({ verdict: 'undecided', missing: ['biot@walls.right'] });
  });
});

describe('margin', () => {
  const margin = async (value: number, leaveOutAt: number, includeAt: number, unit = '1') => {
    const rules = pack({ effect: 'e', branches: [band('only', 'x', leaveOutAt, includeAt)] });
    return (await decide(graph([number('x', unit)], { x: value }, rules), rules, [])).effects.at(-1)?.deciding;
  };
  it('is the distance to the nearer limit, a factor or a difference', async () => {
    expect(await margin(0.02, 0.1, 1)).toMatchObject({ margin: expect.closeTo(5, 12), marginKind: 'factor' });
    expect(await margin(0.9, 0.1, 1)).toMatchObject({ margin: expect.closeTo(1 / 0.9, 12) });
    expect(await margin(-25, -10, 4, 'K')).toMatchObject({ margin: 15, marginKind: 'difference' });
    expect(await margin(0, 0.1, 1)).not.toHaveProperty('margin');
  });
});

describe('choices', () => {
  const law = { choice: 'density-law', options: { constant: 'nothing changes', temperature: 'too much' }, first: [{ when: is('kept.variable-density', 'yes'), take: 'temperature', because: 'it changes by {x}' }], otherwise: { take: 'constant', because: 'it hardly changes', source: 'common practice' } };
  const effect = { effect: 'variable-density', branches: [band('only', 'x', 0.1, 0.2)] };
  const run = async (given: Record<string, number | Given>, chosen?: Record<string, string>) => {
    const rules = pack(law, effect);
    const w = graph(x, given, rules);
    const found = (await decide(w, rules, [], { chosen })).choices.find((c) => c.id === 'density-law');
    expect(w.word('choice.density-law')).toBe(found?.chosen);
    return found;
  };
  it('take the first entry that fits, and say why not the others', async () => {
    expect(await run({ x: 0.3 })).toMatchObject({ chosen: 'temperature', because: 'it changes by 0.3', rejected: [{ option: 'constant', because: 'nothing changes' }] });
    expect(await run({ x: 0.01 })).toMatchObject({ chosen: 'constant', sources: ['common practice'] });
  });
  it('keep what is stated and advise where it differs', async () => {
    expect(await run({ x: 0.3 }, { 'density-law': 'boussinesq' })).toMatchObject({ chosen: 'boussinesq', given: true, advised: 'temperature' });
    expect(await run({ x: 0.3 }, { 'density-law': 'temperature' })).not.toHaveProperty('advised');
  });
  it('take an undecided effect as include, and list it', async () => {
    expect(await run({})).toMatchObject({ chosen: 'temperature', because: expect.stringContaining('as if variable-density counted') });
  });
  it('pass over an option whose numbers cannot be had', async () => {
    const rules = pack({ ...law, first: [{ ...law.first[0], needs: ['x'] }] }, effect);
    expect((await decide(graph(x, {}, rules), rules, [])).choices.find((c) => c.id === 'density-law')?.chosen).toBe('constant');
  });
  it('are none where they do not apply, and read each other', async () => {
    const rules = pack(
      { ...law, choice: 'time-scheme', options: { 'implicit-1': 'x', 'backward-2': 'y' }, applies: { ...is('choice.run-character', 'steady', 'notEqual'), else: 'the run is steady' }, first: [], otherwise: { take: 'backward-2', because: 'b' } },
      { ...law, choice: 'run-character', options: { steady: 'x', transient: 'y' }, first: [{ when: is('x', 1, 'lessThan'), take: 'steady', because: 'b' }], otherwise: { take: 'transient', because: 'b' } },
    );
    const scheme = async (value: number) => (await decide(graph(x, { x: value }, rules), rules, [])).choices.find((c) => c.id === 'time-scheme');
    expect(await scheme(0)).toMatchObject({ applies: false, chosen: 'none', because: 'not called for: the run is steady', rejected: [] });
    expect(await scheme(5)).toMatchObject({ applies: true, chosen: 'backward-2' });
  });
});
