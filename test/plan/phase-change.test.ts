import { describe, expect, it } from 'vitest';
import { planOf } from './harness.ts';

const roomAir = `format: 1
title: Cold panel in a humid room
targets: [{ quantity: heatRate, within: 10 % }]
flow: plate
sizes: { length: 1.5 m, width: 1 m }
inclination: upward
fluid: { material: humid air, pressure: 1 atm, temperature: 26 degC, humidity: 60 % }
wall: { temperature: 14 degC, emissivity: 0.9 }
surroundings: { temperature: 26 degC }
`;

describe('humid air', () => {
  it('has its own departure from the ideal gas, so that nothing is asked for', async () => {
    const p = await planOf(roomAir);
    // CIPM-2007, Picard et al., Metrologia 45 (2008) 149, at the mean of 20 degC and x_v 0.0200: Z = 0.99962, by hand.
    expect(p.quantities['compressibilityFactor']?.value).toBeCloseTo(0.9996, 4);
    const effect = p.effects.find((e) => e.id === 'real-gas');
    expect(effect).toMatchObject({ verdict: 'leave-out' });
    expect(effect?.deciding?.margin).toBeGreaterThan(40); // 0.02 over 0.0004
  });
});

describe('a solution whose record does not say where it boils', () => {
  const across = (fluid: string, cold: string, hot: string, more = ''): string => `format: 1
title: A liquid across a tube
targets: [{ quantity: nusselt, within: 15 % }]
flow: cylinder
sizes: { diameter: 25 mm, span: 1 m }
fluid: { ${fluid}${more} }
inlet: { speed: 0.5 m/s, temperature: ${cold} }
wall: { temperature: ${hot} }
`;
  const brine = 'material: calcium chloride brine, pressure: 1 bar abs, composition: { calcium chloride: 25 % mass }';
  const acid = (name: string, solute: string, share: number): string => `material: ${name}, pressure: 1 bar abs, composition: { ${solute}: ${share} % mass }`;
  const verdicts = async (text: string): Promise<Record<string, { verdict: string; margin?: number | undefined; missing?: readonly string[] | undefined }>> => Object.fromEntries((await planOf(text)).effects.filter((e) => ['boiling', 'cavitation', 'freezing'].includes(e.id)).map((e) => [e.id, { verdict: e.verdict, missing: e.missing, deciding: e.deciding?.quantity }]));

  it('does not boil below the boiling point of water: a cold brine has no steam among its dangers', async () => {
    const p = await planOf(across(brine, '-15 degC', '5 degC'));
    const boiling = p.effects.find((e) => e.id === 'boiling');
    // Water boils at 99.61 degC at 1 bar (IAPWS R7-97); the stream takes pascals of it: 5 - 99.6 = -94.6 K.
    expect(boiling).toMatchObject({ verdict: 'leave-out', deciding: { quantity: 'boilingMarginMost@wall' } });
    expect(p.quantities['boilingMarginMost@wall']?.value).toBeCloseTo(-94.6, 0);
    expect(p.sections.cautions.lines.map((l) => l.text).join(' ')).not.toContain('Steam');
  });

  it('stays open where the wall is hotter than water boils', async () => {
    expect(await verdicts(across(acid('caustic soda', 'sodium hydroxide', 40), '80 degC', '105 degC'))).toMatchObject({ boiling: { verdict: 'undecided', missing: ['fluid.saturationTemperature'] } });
  });

  it('cannot cavitate where water would not, and may where it would', async () => {
    // Water at 5 degC: 872 Pa; (1e5 - 872)/(0.5 x 1240 x 0.25) = 640 over |C_p,min|.
    expect(await verdicts(across(brine, '-15 degC', '5 degC'))).toMatchObject({ cavitation: { verdict: 'leave-out', deciding: 'cavitationMarginLeast' } });
    expect(await verdicts(across(brine.replace('1 bar abs', '2 kPa abs'), '30 degC', '35 degC'))).toMatchObject({ cavitation: { verdict: 'undecided' } });
  });

  it('follows what evaporates first where the solute does', async () => {
    // Boiling points at 1 bar: methanol 64.2 degC, nitric acid 83 degC, ammonia -33.6 degC.
    expect(await verdicts(across(acid('methanol-water', 'methanol', 30), '10 degC', '30 degC'))).toMatchObject({ boiling: { verdict: 'leave-out' } });
    expect(await verdicts(across(acid('methanol-water', 'methanol', 30), '10 degC', '70 degC'))).toMatchObject({ boiling: { verdict: 'undecided' } });
    expect(await verdicts(across(acid('nitric acid', 'nitric acid', 30).replace('1 bar', '1.5 bar'), '10 degC', '30 degC'))).toMatchObject({ boiling: { verdict: 'leave-out' } });
    expect(await verdicts(across(acid('ammonia-water', 'ammonia', 20), '10 degC', '20 degC'))).toMatchObject({ boiling: { verdict: 'undecided' } });
  });

  it('does not freeze where no solution of its share does, and may below', async () => {
    expect(await verdicts(across(acid('sulphuric acid', 'sulphuric acid', 30), '10 degC', '20 degC'))).toMatchObject({ freezing: { verdict: 'leave-out', deciding: 'freezingMarginLeast' } });
    expect(await verdicts(across(acid('sulphuric acid', 'sulphuric acid', 30), '-5 degC', '20 degC'))).toMatchObject({ freezing: { verdict: 'undecided' } });
    // 40 % caustic soda sets at 15 degC, 50 % phosphoric acid far below zero.
    expect(await verdicts(across(acid('caustic soda', 'sodium hydroxide', 40), '10 degC', '30 degC'))).toMatchObject({ freezing: { verdict: 'undecided' } });
  });

  it('may flash where it is let out, if what evaporates first would', async () => {
    const p = await planOf(across(brine.replace('1 bar', '10 bar'), '30 degC', '150 degC'));
    expect(p.effects.find((e) => e.id === 'boiling')?.verdict).toBe('leave-out');
    expect(p.sections.cautions.lines.map((l) => l.text).join(' ')).toMatch(/Steam and boiling.*it may flash/);
  });
});

describe('condensation from humid air', () => {
  it('brings its latent heat to the wall, with its price', async () => {
    // By hand: p_v = 0.6 x 3355 = 2013 Pa, at the wall 1595 Pa; Y = 0.01245 and 0.00985; D(293 K) = 2.42e-5, Le = 0.88, Le^(-2/3) = 1.086;
    // s_L = (2.468e6/1018) x 1.086 x 0.002623/12 = 0.575. Of 152 W 92 W are radiation (5.14 W/(m^2 K)), so 0.575 x 60 W = 34 W more: F = 1.226, price -18 %.
    const p = await planOf(roomAir);
    expect(p.quantities['latentShare']?.value).toBeCloseTo(0.575, 1);
    expect(p.quantities['heatRate']?.value).toBeGreaterThan(-190);
    expect(p.quantities['heatRate']?.value).toBeLessThan(-183);
    const effect = p.effects.find((e) => e.id === 'condensation');
    expect(effect).toMatchObject({ verdict: 'include', price: { of: 'heatRate' } });
    expect(p.quantities['condensationFactorHeat']?.value).toBeCloseTo(1.226, 1);
    expect(p.sections.cautions.lines.map((l) => l.text).join(' ')).toContain('Condensation brings {latentShare}');
  });

  it('is none on a wall above the dew point, 17.6 degC', async () => {
    const p = await planOf(roomAir.replace('14 degC', '19 degC'));
    expect(p.quantities['condensationFactorHeat']?.value ?? 1).toBe(1);
  });
});

describe('a stream that leaves its phase on the way', () => {
  const pipe = (more: { inlet?: string; wall?: string; length?: string; pressure?: string }): string => `format: 1
title: A pipe
targets: [{ quantity: outletTemperature, within: 1 K }]
flow: pipe
sizes: { diameter: 25 mm, length: ${more.length ?? '8 m'} }
inclination: horizontal
fluid: { material: water, pressure: ${more.pressure ?? '1 bar abs'} }
inlet: { ${more.inlet ?? 'speed: 20 m/s, temperature: 165 degC'} }
wall: { ${more.wall ?? 'temperature: 20 degC'} }
`;
  const told = async (text: string): Promise<{ first: string | undefined; refused: string | undefined; caution: string | undefined }> => {
    const p = await planOf(text);
    return { first: p.contradictions[0]?.code, refused: p.targets[0]?.refused, caution: p.sections.cautions.lines[0]?.text };
  };
  it.each([
    // Steam at 1 bar condenses at 99.6 degC.
    ['condenses-on-the-way', pipe({})],
    // rho U A = 998 x 0.1 x 4.909e-4 = 0.049 kg/s; 100 kW/m^2 over 0.628 m^2 = 63 kW raise it by 306 K: far above 100 degC.
    ['boils-on-the-way', pipe({ inlet: 'speed: 0.1 m/s, temperature: 20 degC', wall: 'heatFlux: 100 kW/m^2' })],
    // -7.5 kW/m^2 over 0.628 m^2 = -4712 W at 0.049 kg/s x 4186 J/(kg K) cool it by 23.0 K: to -3 degC.
    ['freezes-on-the-way', pipe({ inlet: 'speed: 0.1 m/s, temperature: 20 degC', wall: 'heatFlux: -7.5 kW/m^2' })],
  ])('%s: no single-phase estimate is given, and it is told first', async (code, text) => {
    const out = await told(text);
    expect(out.first).toBe(code);
    expect(out.refused).toMatch(/condenses|boils|freezes/);
    expect(out.caution).toMatch(/^No estimate is given: the (?:vapour|liquid) .* on its way/);
  });
  it.each([
    // Hot walls keep the steam dry; 5 kW/m^2 raise the water by 15 K.
    pipe({ wall: 'temperature: 150 degC' }),
    pipe({ inlet: 'speed: 0.1 m/s, temperature: 20 degC', wall: 'heatFlux: 5 kW/m^2' }),
  ])('and nothing where the phase holds', async (text) => {
    expect(await told(text)).toMatchObject({ first: undefined, refused: undefined });
  });
});
