import { describe, expect, it } from 'vitest';
import { linesOf, planOf } from './harness.ts';

const slot = (computing: string, more = ''): string => `format: 1
title: Air gap
targets: [{ quantity: heatRate, within: 8 % }]
flow: side-heated-cavity
sizes: { height: 0.8 m, width: 40 mm, depth: 0.5 m }
fluid: { material: air, pressure: 1 atm }
walls: [{ name: left, temperature: 21 degC${more} }, { name: right, temperature: 5 degC${more} }]
computing: { ${computing} }
`;

describe('cost against the budget of the case', () => {
  it('a run that outlasts the deadline contradicts it, with both numbers, at its line', async () => {
    const p = await planOf(slot('cores: 16, deadline: 12 h'));
    const wall = p.quantities['wallTime']?.value as number;
    expect(wall).toBeGreaterThan(12 * 3600);
    const found = p.contradictions.find((c) => c.code === 'over-budget');
    expect(found).toMatchObject({ path: 'computing.deadline', line: 8 });
    expect(found?.says).toMatch(/is done in .* by the estimate, .* core hours, and the case gives 12 h/);
  });
  it('memory likewise', async () => {
    const p = await planOf(slot('cores: 16, memory: 8 GB'));
    expect(p.contradictions.map((c) => [c.code, c.path])).toEqual([['over-budget', 'computing.memory']]);
  });
  it('a budget that only the fine mesh passes is a caution', async () => {
    const first = await planOf(slot('cores: 16'));
    const [medium, fine] = ['wallTime', 'wallTimeFine'].map((id) => first.quantities[id]?.value as number);
    expect(fine).toBeGreaterThan(2 * (medium as number));
    const p = await planOf(slot(`cores: 16, deadline: ${Math.round((medium as number) / 3600) + 20} h`));
    expect(p.contradictions).toEqual([]);
    expect(linesOf(p, 'cautions')).toContainEqual(expect.stringMatching(/^Over the budget: the fine mesh alone is done in \{wallTimeFine\} where \{computing\.deadline\} is given/));
  });
  it('within the budget nothing is said', async () => {
    const p = await planOf(slot('cores: 16, deadline: 100000 h, memory: 10000 GB'));
    expect(p.contradictions).toEqual([]);
    expect(linesOf(p, 'cautions').join(' ')).not.toContain('budget');
  });
  it('a treatment that resolves every eddy is stepped down where it passes the budget', async () => {
    const pipe = (computing: string): string => `format: 1
title: Peaks in a pipe
targets: [{ quantity: wallShear, mean: peak, within: 10 % }]
flow: pipe
sizes: { diameter: 50 mm, length: 2 m }
fluid: { material: water, pressure: 2 bar abs }
inlet: { speed: 0.2 m/s, temperature: 20 degC, profile: developed }
computing: { cores: 16${computing} }
`;
    const chosen = async (computing: string): Promise<string | undefined> => (await planOf(pipe(computing))).choices.find((c) => c.id === 'turbulence-treatment')?.chosen;
    expect([await chosen(''), await chosen(', deadline: 1 h')]).toEqual(['dns', 'les']);
  });
});

describe('a rung without a number', () => {
  it('states how near it must come: two-plates-radiation without an emissivity', async () => {
    const p = await planOf(slot('cores: 16'));
    const rung = p.ladder.find((r) => r.id === 'two-plates-radiation');
    expect(rung?.value).toBeUndefined();
    expect(rung?.limit).toMatchObject({ atMost: 0.02, unit: '1' });
    expect(p.quantities[rung?.limit.quantity ?? '']).toBeDefined();
  });
});
