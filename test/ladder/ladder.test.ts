import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readRuleFolder } from '../../src/decide/index.ts';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { fillReference, ladderDetails, ladderOf, ladderTables, skippedRungs } from '../../src/ladder/index.ts';
import { compileFiles, settleCase } from '../../src/plan/index.ts';

const rules = compileFiles(readRuleFolder('rules'));
const settled = (text: string): ReturnType<typeof settleCase>['assembled'] => settleCase(readCase(new TextEncoder().encode(text), 'x.case.yaml', vocabulary), { rules }).assembled;
const example = (name: string): ReturnType<typeof settled> => settled(readFileSync(`examples/${name}.case.yaml`, 'utf8'));
const pipe = (speed: string, more = ''): string => `format: 1
targets: [{ quantity: pressureDrop, within: 5 % }]
flow: pipe
sizes: { diameter: 10 mm, length: 1 m }
inclination: upward
fluid: { material: water, pressure: 2 bar abs }
inlet: { speed: ${speed}, temperature: 20 degC, profile: developed }
${more}`;

describe('the ladder of a case', () => {
  it('begins with the groups by hand and the order of the code, at least 0.4 under that on paper', () => {
    const [hand, fields] = ladderOf(settled(pipe('1 m/s')));
    expect(hand?.id).toBe('groups-by-hand');
    // Re = U D/nu, nu of water at 20 degC and 2 bar is 1.003e-6 m^2/s (IAPWS formulation of viscosity, 1.0016 mPa s over 998.25 kg/m^3).
    expect(hand?.value).toBeCloseTo(9966, -2);
    expect(hand?.limit.atMost).toBeCloseTo((hand?.value as number) * 1.005, 6);
    expect(fields).toMatchObject({ id: 'manufactured-solution', value: 2, limit: { atLeast: 1.6 } });
    expect(fields?.limit.atMost).toBeUndefined();
  });
  it('skips what the case leaves out, with the reason', () => {
    const laminar = settled(pipe('0.05 m/s'));
    expect(ladderDetails(laminar).map((d) => d.rung.id)).toEqual(['manufactured-solution', 'poiseuille-pipe']);
    const skipped = skippedRungs(laminar);
    expect(skipped.find((s) => s.id === 'turbulent-pipe')?.because).toEqual({ word: 'regime', is: 'laminar' });
    expect(skipped.find((s) => s.id === 'mixed-convection-pipe')?.because).toBeDefined();
  });
  it('gravity leaves the ladder with buoyancy', () => {
    const heated = settled(pipe('0.05 m/s', 'wall: { temperature: 20.05 degC }'));
    expect(heated.workings.word('verdict.buoyancy')).toBe('leave-out');
    expect(skippedRungs(heated).find((s) => s.id === 'mixed-convection-pipe')?.because).toEqual({ effect: 'buoyancy' });
  });
  it('a tolerance is W = 2 sqrt((scatter/2)^2 + plan^2), never below the limit of the flow', () => {
    const by = (name: string, id: string): number | undefined => example(name).workings.get(`rungTolerance.${id}`);
    // Measured, scatter 5 %: 2 sqrt(0.025^2 + 0.01^2) = 0.05385, above the 5 % that the flow asks.
    expect(by('bead-dryer', 'sphere-drag')).toBeCloseTo(0.0538516, 6);
    // Exact: 2 x 0.0025 = 0.005.
    expect(by('rinse-line', 'poiseuille-pipe')).toBeCloseTo(0.005, 12);
    // Measured, scatter 10 %: 2 sqrt(0.05^2 + 0.01^2) = 0.10198, below the 12 % that the flow allows.
    expect(by('rinse-line', 'turbulent-pipe:nusselt')).toBeCloseTo(0.12, 12);
  });
  it('limits are the predicted number and its tolerance', () => {
    const rung = ladderOf(example('rinse-line')).find((r) => r.id === 'developed-heat-pipe');
    // 3.6568 of a round pipe at uniform wall temperature (Shah and London 1978).
    expect(rung?.limit.atLeast).toBeCloseTo(3.6568 * 0.995, 3);
    expect(rung?.limit.atMost).toBeCloseTo(3.6568 * 1.005, 3);
  });
  it('distance from an answer is the logarithm of the groups over that of their yardstick', () => {
    const { workings } = example('sampling-rod');
    const reynolds = workings.get('reynolds') as number;
    // The rung at Re 40, one law holds over a factor of ten in Re.
    expect(workings.get('rungDistance.cylinder-free-stream')).toBeCloseTo(Math.log(reynolds / 40) / Math.log(10), 9);
    // An answer at the case's own number is no distance away; a laminar one of a turbulent case stands one further.
    expect(example('rinse-line').workings.get('rungDistance.turbulent-pipe')).toBe(0);
    expect(example('rinse-line').workings.get('rungDistance.graetz-pipe')).toBe(1);
  });
  it('numbers that a rung fixes count as numbers', () => {
    const assembled = example('rinse-line');
    const fixed = { ...assembled, flow: { ...assembled.flow, ladder: [{ reference: 'graetz-pipe', changes: 'at given numbers', compares: 'nusselt', with: { graetz: '100', peclet: '5000' }, limit: 0.01, ifMissed: 'x' }] } };
    expect(ladderDetails(fixed).find((d) => d.reference.id === 'graetz-pipe')?.inputs).toEqual({ graetz: 100, peclet: 5000 });
    expect(fillReference(fixed, 'graetz-pipe').inputs).toMatchObject({ graetz: 100, peclet: 5000 });
  });
  it('gives the profiles of its answers', () => {
    const tables = ladderTables(settled(pipe('0.05 m/s'))).find((t) => t.rung === 'poiseuille-pipe')?.tables;
    // u/U = 2 (1 - 1/4) = 1.5 at half the radius.
    expect(tables?.[0]?.rows.find((r) => r[0] === 0.5)?.[1]).toBeCloseTo(1.5, 12);
  });
  it('an answer is filled by the rung first, else by the ids of the case', () => {
    const assembled = example('rinse-line');
    const turbulent = fillReference(assembled, 'turbulent-pipe:nusselt');
    expect(turbulent.from).toMatchObject({ reynolds: 'reynoldsBulk', prandtl: 'prandtlBulk', speed: 'speed' });
    expect(fillReference(assembled, 'half-space-step').from).toMatchObject({ thermalDiffusivity: 'thermalDiffusivity' });
    expect(() => fillReference(assembled, 'turbulent-pip')).toThrow(/neither a rung/);
  });
});
