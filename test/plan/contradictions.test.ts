import { describe, expect, it } from 'vitest';
import { planOf } from './harness.ts';

const base = {
  title: 'title: A line', targets: 'targets: [{ quantity: outletTemperature, place: outlet, mean: mass-flow, within: 1 K }]', flow: 'flow: pipe', sizes: 'sizes: { diameter: 25 mm, length: 8 m }', inclination: 'inclination: horizontal',
  fluid: 'fluid: { material: water, pressure: 2 bar abs }', inlet: 'inlet: { speed: 0.4 m/s, temperature: 65 degC, profile: developed }', outlet: '', wall: 'wall: { temperature: 20 degC }', choices: '',
};
const text = (more: Partial<typeof base>): string => ['format: 1', ...Object.values({ ...base, ...more })].filter((l) => l !== '').join('\n');
const found = async (more: Partial<typeof base>): Promise<{ code: string; path: string; line: number | undefined }[]> => (await planOf(text(more))).contradictions.map(({ code, path, line }) => ({ code, path, line }));
const lineOf = (more: Partial<typeof base>, word: string): number => text(more).split('\n').findIndex((l) => l.includes(word)) + 1;

/** Each fault, and beside it the same case without it. */
const rows: readonly { code: string; bad: Partial<typeof base>; at: string; good: Partial<typeof base> }[] = [
  // rho U A = 980.6 kg/m^3 x 0.4 m/s x 4.9087e-4 m^2 = 0.1925 kg/s by hand.
  { code: 'two-drives', bad: { inlet: 'inlet: { speed: 0.4 m/s, massFlow: 0.3 kg/s, temperature: 65 degC }' }, at: 'massFlow', good: { inlet: 'inlet: { speed: 0.4 m/s, massFlow: 0.1925 kg/s, temperature: 65 degC }' } },
  { code: 'two-drives', bad: { inlet: 'inlet: { speed: 0.4 m/s, volumeFlow: 12.5 L/min, temperature: 65 degC }' }, at: 'volumeFlow', good: { inlet: 'inlet: { speed: 0.4 m/s, volumeFlow: 11.78 L/min, temperature: 65 degC }' } },
  // 100 m^3/h x 1.2929 kg/m^3 = 35.92 g/s by hand; in 25 mm at 9 bar and 20 degC 6.82 m/s.
  { code: 'two-drives', bad: { fluid: 'fluid: { material: air, pressure: 9 bar abs }', inlet: 'inlet: { volumeFlow: 100 m^3/h normal, massFlow: 40 g/s, temperature: 20 degC }' }, at: 'massFlow', good: { fluid: 'fluid: { material: air, pressure: 9 bar abs }', inlet: 'inlet: { volumeFlow: 100 m^3/h normal, massFlow: 35.92 g/s, temperature: 20 degC }' } },
  { code: 'two-drives', bad: { fluid: 'fluid: { material: air, pressure: 9 bar abs }', inlet: 'inlet: { speed: 56.59 m/s, volumeFlow: 100 m^3/h normal, temperature: 20 degC }' }, at: 'volumeFlow', good: { fluid: 'fluid: { material: air, pressure: 9 bar abs }', inlet: 'inlet: { speed: 6.82 m/s, volumeFlow: 100 m^3/h normal, temperature: 20 degC }' } },
  { code: 'outlet-above-inlet', bad: { outlet: 'outlet: { pressure: 3 bar abs }' }, at: 'outlet:', good: { outlet: 'outlet: { pressure: 1.9 bar abs }' } },
  { code: 'humidity-not-taken', bad: { fluid: 'fluid: { material: water, pressure: 2 bar abs, humidity: 40 % }' }, at: 'humidity', good: {} },
  { code: 'two-viscosities', bad: { fluid: 'fluid: { medium: liquid, density: 1050 kg/m^3, specificHeatCapacity: 3.9 kJ/(kg K), thermalConductivity: 0.55 W/(m K), viscosity: 20 mPa s, pressure: 3 bar abs }', outlet: 'rheology: { law: power-law, consistency: 6 Pa s^0.4, index: 0.4 }' }, at: 'viscosity', good: { fluid: 'fluid: { medium: liquid, density: 1050 kg/m^3, specificHeatCapacity: 3.9 kJ/(kg K), thermalConductivity: 0.55 W/(m K), pressure: 3 bar abs }', outlet: 'rheology: { law: power-law, consistency: 6 Pa s^0.4, index: 0.4 }' } },
  { code: 'shares-above-one', bad: { outlet: 'species: [{ name: a, inlet: 60 % mass }, { name: b, inlet: 50 % mass }]' }, at: 'species', good: { outlet: 'species: [{ name: a, inlet: 60 % mass }, { name: b, inlet: 40 % mass }]' } },
  { code: 'unknown-reactant', bad: { outlet: 'species: [{ name: feed, inlet: 1 % mass }]\nreactions: [{ of: food, rateConstant: 1 1/s }]' }, at: 'reactions', good: { outlet: 'species: [{ name: feed, inlet: 1 % mass }]\nreactions: [{ of: feed, rateConstant: 1 1/s }]' } },
  { code: 'rate-constant-unit', bad: { outlet: 'species: [{ name: feed, inlet: 1 % mass }]\nreactions: [{ of: feed, order: 2, rateConstant: 1 1/s }]' }, at: 'reactions', good: { outlet: 'species: [{ name: feed, inlet: 1 % mass }]\nreactions: [{ of: feed, where: wall, rateConstant: 1e-3 m/s }]' } },
  { code: 'layer-above-melting', bad: { fluid: 'fluid: { material: air, pressure: 1 bar abs }', wall: 'wall: { temperature: 700 degC, at: outer-face, layers: [{ material: aluminium, thickness: 2 mm }] }' }, at: 'wall:', good: { fluid: 'fluid: { material: air, pressure: 1 bar abs }', wall: 'wall: { temperature: 600 degC, at: outer-face, layers: [{ material: aluminium, thickness: 2 mm }] }' } },
  { code: 'layer-above-melting', bad: { wall: 'wall: { temperature: 5 degC, layers: [{ material: ice, thickness: 2 mm }] }' }, at: 'wall:', good: {} },
  { code: 'below-freezing', bad: { wall: 'wall: { temperature: -5 degC }' }, at: 'wall:', good: { wall: 'wall: { temperature: 3 degC }' } },
  { code: 'heat-of-an-adiabatic-wall', bad: { targets: 'targets: [{ quantity: heatRate, within: 5 % }]', wall: 'wall: { adiabatic: true }' }, at: 'heatRate', good: { targets: 'targets: [{ quantity: heatRate, within: 5 % }]' } },
  { code: 'no-closure', bad: { choices: 'choices: { turbulence: none }' }, at: 'choices', good: { choices: 'choices: { turbulence: rans }' } },
  { code: 'closure-on-laminar', bad: { inlet: 'inlet: { speed: 0.01 m/s, temperature: 65 degC }', choices: 'choices: { turbulence: rans }' }, at: 'choices', good: { inlet: 'inlet: { speed: 0.01 m/s, temperature: 65 degC }', choices: 'choices: { turbulence: none }' } },
  { code: 'wall-law-in-viscous-layer', bad: { choices: 'choices: { wallTreatment: law-of-the-wall, yPlus: 1 }' }, at: 'choices', good: { choices: 'choices: { wallTreatment: law-of-the-wall, yPlus: 40 }' } },
  { code: 'wall-law-in-buffer-layer', bad: { choices: 'choices: { wallTreatment: law-of-the-wall, yPlus: 15 }' }, at: 'choices', good: { choices: 'choices: { wallTreatment: blended, yPlus: 15 }' } },
  { code: 'unresolved-wall-layer', bad: { choices: 'choices: { wallTreatment: resolved, yPlus: 8 }' }, at: 'choices', good: { choices: 'choices: { wallTreatment: resolved, yPlus: 1 }' } },
  { code: 'cut-does-not-fit', bad: { choices: 'choices: { cuts: [two-dimensional] }' }, at: 'choices', good: { choices: 'choices: { cuts: [mirror-left-right] }' } },
  { code: 'flat-cut', bad: { choices: 'choices: { cuts: [axisymmetric] }' }, at: 'choices', good: { choices: 'choices: { cuts: [mirror-left-right] }' } },
  { code: 'cut-through-eddies', bad: { choices: 'choices: { turbulence: les, cuts: [mirror-left-right] }' }, at: 'choices', good: { choices: 'choices: { turbulence: les }' } },
  { code: 'step-of-a-steady-run', bad: { choices: 'choices: { run: steady, timeStep: 1 us }' }, at: 'choices', good: { choices: 'choices: { run: steady }' } },
  { code: 'domain-too-short', bad: { choices: 'choices: { domain: { downstream: 1 mm } }' }, at: 'choices', good: { choices: 'choices: { domain: { downstream: 1 m } }' } },
];

describe('contradictions', () => {
  it.each(rows)('$code is found, with its line, and only where it is', async ({ code, bad, at, good }) => {
    const hit = (await found(bad)).find((c) => c.code === code);
    expect(hit?.line).toBe(lineOf(bad, at));
    expect((await found(good)).map((c) => c.code)).not.toContain(code);
  });

  it('are none in a sound case', async () => {
    expect(await found({})).toEqual([]);
  });

  it('say what, with the numbers of both sides, what it does and what mends it', async () => {
    const p = await planOf(text({ inlet: 'inlet: { speed: 0.4 m/s, massFlow: 0.3 kg/s, temperature: 65 degC }', wall: 'wall: { temperature: -5 degC }' }));
    expect(p.contradictions.map((c) => c.code)).toEqual(['two-drives', 'below-freezing']);
    expect(p.contradictions[0]?.says).toBe('inlet.massFlow is 0.3 kg/s, while inlet.speed of 0.4 m/s makes the mass flow in all passages 0.1925 kg/s');
    expect(p.contradictions[0]?.effect).toContain('36 %');
    expect(p.contradictions[1]?.says).toMatch(/^-5 degC stands below the melting point -?0 degC/);
    for (const c of p.contradictions) expect([c.effect, c.cure].every((t) => t.length > 10)).toBe(true);
  });

  it('of two viscosities the law of rheology counts', async () => {
    const p = await planOf(['format: 1', 'title: Paste', 'targets: [{ quantity: pressureDrop, within: 10 % }]', 'flow: pipe', 'sizes: { diameter: 40 mm, length: 5 m }', 'fluid: { medium: liquid, density: 1050 kg/m^3, viscosity: 20 mPa s, pressure: 3 bar abs }', 'rheology: { law: power-law, consistency: 6 Pa s^0.4, index: 0.4 }', 'inlet: { speed: 0.3 m/s, temperature: 20 degC, profile: developed }'].join('\n'));
    // Power law in a pipe: dp = (4 L/D) K ((3n + 1)/(4n) 8U/D)^n = 500 x 6 x 82.5^0.4 = 17.5 kPa.
    expect(p.quantities['pressureDrop']?.value as number / (500 * 6 * 82.5 ** 0.4)).toBeCloseTo(1, 1);
    expect(p.contradictions.map(({ code }) => code)).toContain('two-viscosities');
  });

  it('leave the numbers of the plan as they were', async () => {
    const p = await planOf(text({ choices: 'choices: { timeStep: 10 s, domain: { downstream: 1 mm } }' }));
    expect(p.quantities['domainDownstream']?.value ?? 0.001).toBe(0.001);
    expect(p.quantities['choices.timeStep']?.value ?? 10).toBe(10);
  });
});
