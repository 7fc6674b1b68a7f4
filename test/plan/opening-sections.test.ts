import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { plan as makePlan, type Plan } from '../../src/plan/index.ts';
import { linesOf, planOf, unknownIds } from './harness.ts';

const sections = ['question', 'physics', 'properties', 'documentation', 'cautions'] as const;
const rinse = readFileSync('examples/rinse-line.case.yaml', 'utf8');
const air = `
format: 1
title: Compressed air warmed in a line
targets: [{ quantity: pressureDrop, within: 5 % }, { quantity: noise level }]
flow: pipe
sizes: { diameter: 20 mm, length: 3 m }
fluid: { material: air, pressure: 8 bar abs }
inlet: { speed: 0.2 .. 12 m/s, temperature: 20 degC +/- 1 K }
wall: { temperature: 150 degC +/- 3 K }
choices: { cells: 1e6 }
`;
const box = `
format: 1
title: Warm and cold side
purpose: Is the heat that passes the gap less than 30 W?
targets: [{ quantity: nusselt, place: left, mean: area, within: 5 % }]
flow: side-heated-cavity
sizes: { height: 100 mm, width: 100 mm }
fluid: { material: air }
walls: [{ name: left, temperature: 40 degC }, { name: right, temperature: 20 degC }]
`;
const open = `
format: 1
title: Nothing drives it yet
targets: [{ quantity: pressureDrop }]
flow: pipe
sizes: { diameter: 20 mm, length: 3 m }
fluid: { material: water, pressure: 1.5 bar abs }
`;
/** Upward water in a tube heated by its wall, given by numbers, so that every term can be worked by hand. */
const tube = `
format: 1
title: Tube
targets: [{ quantity: heatRate, mean: area, place: wall, within: 5 % }]
flow: pipe
sizes: { diameter: 20 mm, length: 1 m }
inclination: upward
fluid: { density: 995.65 kg/m^3, viscosity: 7.972e-4 Pa s, thermalConductivity: 0.6144 W/(m K), specificHeatCapacity: 4180 J/(kg K), thermalExpansion: 3.029e-4 1/K, pressure: 1 bar abs, medium: liquid }
inlet: { speed: 0.05 m/s, temperature: 20 degC }
wall: { temperature: 40 degC }
`;
/** Just past the laminar limit of its section, so that decisions are borderline by their spread. */
const duct = `
format: 1
title: Duct
targets: [{ quantity: wallTemperature, mean: peak, within: 3 K }]
flow: duct
sizes: { width: 20 mm, height: 6 mm, length: 300 mm }
fluid: { material: propylene glycol-water, composition: { propylene glycol: 40 % mass }, pressure: 2 bar abs }
inlet: { volumeFlow: 4 L/min, temperature: 40 degC }
wall: { heatFlux: 40 kW/m^2 +/- 5 % }
`;
const plans = new Map<string, Promise<Plan>>();
const plan = (text: string): Promise<Plan> => { const had = plans.get(text) ?? planOf(text); plans.set(text, had); return had; };
const value = (p: Plan, id: string): number => p.quantities[id]?.value as number;

describe('question, physics, properties, documentation', () => {
  it.each([['rinse', rinse], ['air', air], ['box', box], ['open', open], ['tube', tube]])('name only numbers that the plan holds: %s', async (_, text) => {
    const p = await plan(text);
    expect(sections.flatMap((s) => unknownIds(p, s))).toEqual([]);
    for (const s of sections) expect(p.sections[s].lines.length).toBeGreaterThan(0);
  });

  it('list no decision that changes to what it is', async () => {
    const table = (await makePlan(readCase(duct, 'duct.case.yaml', vocabulary), { version: 'test', flips: true })).sections.question.tables.find((t) => t.title.startsWith('Where decisions change'));
    expect(table?.rows.length).toBeGreaterThan(0);
    expect(table?.rows.filter((row) => /^(\S+) becomes \1$/.test(row.at(-1) as string))).toEqual([]);
  });

  it('have no sentence without a number that reads the same in two cases', async () => {
    const texts = async (text: string): Promise<string[]> => { const p = await plan(text); return sections.flatMap((s) => linesOf(p, s)); };
    const other = new Set(await texts(box));
    const shared = (await texts(rinse)).filter((l) => other.has(l) && !l.includes('{'));
    expect(shared).toEqual([]);
  });

  it('tell that the rinse line is answered by hand: half-widths off its limit against those needed', async () => {
    const p = await plan(rinse);
    expect(value(p, 'targets.0.limit')).toBeCloseTo(323.15, 9);
    expect(value(p, 'targets.0.margin')).toBeCloseTo(Math.abs(value(p, 'outletTemperature') - 323.15), 9);
    const q = p.quantities['outletTemperature'];
    expect(value(p, 'targets.0.halfWidth')).toBeCloseTo(((q?.high as number) - (q?.low as number)) / 2, 9);
    // Phi(-1.645) = 5 %, of a half-width of 1.96 standard deviations.
    expect(value(p, 'targets.0.standOffNeeded')).toBeCloseTo(1.645 / 1.96, 3);
    expect(linesOf(p, 'question').join('\n')).toMatch(/no field simulation is needed: \{outletTemperature\} stands \{targets.0.margin\} below the limit/);
  });

  it('push the accuracy asked backwards: parts add by squares to it, each a stated share', async () => {
    const p = await plan(rinse);
    const row = (key: string): number => value(p, `targets.0.${key}`);
    expect([row('mesh'), row('iteration'), row('domain'), row('rest')].map((w) => w / row('accuracy'))).toEqual([1 / 3, 1 / 30, 0.1, 0.85].map((s) => expect.closeTo(s, 9)));
    // With a step share of 1/5 and an average share of 1/3: 0.111 + 0.040 + 0.001 + 0.111 + 0.010 + 0.7225.
    expect(Math.hypot(1 / 3, 1 / 5, 1 / 30, 1 / 3, 1 / 10, 0.85)).toBeCloseTo(1, 2);
  });

  it('list what is missing with the decisions that hang on it, and what is not computed', async () => {
    const p = await plan(open);
    const table = p.sections.question.tables.find((t) => t.title.startsWith('Inputs missing'));
    const first = table?.rows[0] as readonly string[];
    expect(first[0]).toBe('inlet.speed, inlet.volumeFlow, inlet.massFlow or drive.pressureDrop');
    expect(Number(first[1])).toBe((first[2] as string).split(/, | and /).length);
    expect(p.effects.find((e) => e.id === 'turbulence')?.missing).toContain('inlet.speed|inlet.volumeFlow|inlet.massFlow|drive.pressureDrop');
    expect(linesOf(p, 'documentation')[0]).toContain('No estimate, no price and no budget for pressureDrop');
    expect(linesOf(await plan(air), 'question').join('\n')).toContain('noise level is not computed');
  });

  it('show both ends of an operating range and the decisions that differ over it', async () => {
    const p = await plan(air);
    expect(linesOf(p, 'question').join('\n')).toMatch(/inlet.speed from 0.2 m\/s to 12 m\/s.*\n.*Decisions that differ over it: turbulence/);
    const rows = p.sections.question.tables.find((t) => t.title === 'Over the operating range')?.rows ?? [];
    // Re = rho U D/mu at 20 degC, 8 bar: 9.52 kg/m^3 and 18.3 uPa s by the gas law and an independent table.
    expect(rows.find((r) => r[0] === 'group that decides the regime')?.slice(1).map((c) => (typeof c === 'string' ? Number(c) : 0))[0]).toBeCloseTo((9.52 * 0.2 * 0.02) / 18.3e-6, -1);
    expect(rows.some((r) => r[0] === 'frictional pressure drop')).toBe(true);
  });

  it('size the terms of the equations as worked by hand', async () => {
    const p = await plan(tube);
    const rows: readonly [string, number][] = [
      ['termMomentumConvection', 995.65 * 0.05 ** 2 / 1],
      ['termMomentumViscous', (8 * 7.972e-4 * 0.05) / 0.01 ** 2],
      ['termMomentumBuoyancy', 995.65 * 9.80665 * 3.029e-4 * 20],
      ['termHydrostatic', 995.65 * 9.80665],
      ['termHeatConvection', (995.65 * 4180 * 0.05 * 20) / 1],
      ['termHeatAcross', (0.6144 * 20) / 0.01 ** 2],
      ['termHeatAlong', 0.6144 * 20],
      ['termHeatDissipation', 8 * 7.972e-4 * (0.05 / 0.01) ** 2],
      ['termHeatPressureWork', 3.029e-4 * 293.15 * 0.05 * ((8 * 7.972e-4 * 0.05) / 0.01 ** 2)],
    ];
    for (const [id, by] of rows) expect([id, value(p, id)]).toEqual([id, expect.closeTo(by, -Math.floor(Math.log10(by)) + 4)]);
    expect(linesOf(p, 'physics').join('\n')).toContain('In the momentum balance buoyancy leads with {termMomentumBuoyancy}');
  });

  it('put every effect that can occur into the table, with limits as decided', async () => {
    const p = await plan(rinse);
    const table = p.sections.physics.tables.find((t) => t.title === 'Effects that can occur');
    expect(table?.rows.map((r) => r[0])).toEqual(p.effects.filter((e) => e.judged && e.applies !== false).map((e) => e.title));
  });

  it('state each property with uncertainty, range and source, and hold constant what its limit allows', async () => {
    const p = await plan(rinse);
    const table = p.sections.properties.tables[0];
    for (const row of table?.rows.slice(0, 5) ?? []) {
      expect(row[5]).toMatch(/%$/);
      expect(row[6]).toMatch(/ K to /);
      // By number, set below the tables.
      const sources = p.sections.properties.tables.find((t) => t.title === 'Sources of these properties');
      for (const number of (row[7] as string).split(' ')) expect(sources?.rows.find((r) => r[0] === number)?.[1]).toMatch(/.{6}/);
    }
    const constant = (name: string): unknown => table?.rows.find((r) => r[0] === name)?.[4];
    expect(constant('density')).toBe('yes');
    expect(constant('dynamic viscosity')).toBe('no');
  });

  it('name the group of the regime with the length it is formed on: half of Re on twice the gap', async () => {
    const p = await planOf('format: 1\ntitle: t\ntargets: [{ quantity: wallTemperature, within: 3 K }]\nflow: channel\nsizes: { gap: 3 mm, length: 0.4 m, width: 60 mm }\nfluid: { material: water, pressure: 2 bar abs }\ninlet: { speed: 0.5 m/s, temperature: 80 degC }\nwall: { heatFlux: 60 kW/m^2 }\n');
    const [group, reynolds] = ['regimeGroup', 'reynolds'].map((id) => p.quantities[id]?.value as number);
    expect(p.quantities['regimeGroup']?.symbol).toBe('Re_H');
    expect((group as number) / (reynolds as number)).toBeCloseTo(0.5, 12);
    expect(linesOf(p, 'physics')[0]).toContain('its group (Re_H = U H/nu) is {regimeGroup}');
    expect(linesOf(p, 'physics')[0]).toContain('{length}, the length scale (twice the gap)');
  });

  it('list assumptions that decisions rest on, and inputs from which nothing follows', async () => {
    const register = (await plan(box)).sections.documentation.tables.find((t) => t.title === 'Register of assumptions')?.rows.map((r) => r[0]);
    expect(register).toEqual(expect.arrayContaining(['fluid.pressure', 'gravity', 'wallKind@walls.top']));
  });
});
