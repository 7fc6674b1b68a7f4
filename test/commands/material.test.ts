import { describe, expect, it } from 'vitest';
import { runbrief } from './harness.ts';

describe('runbrief material', () => {
  it('prints every property with spread and source within 80 columns', async () => {
    const { code, stdout } = await runbrief(['material', 'water', '--at', '60 degC, 2 bar']);
    expect(code).toBe(0);
    expect(stdout).toContain('water, liquid, at 60 degC (333.15 K), 2 bar abs');
    expect(stdout).toMatch(/density +983\.24 kg\/m\^3 +\+\/- 0\.005 %/);
    expect(stdout).toContain('IAPWS R12-08');
    expect(stdout).toContain('the pressure is read as absolute');
    for (const line of stdout.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
  });

  it('gives the document of the design with --json', async () => {
    const { stdout } = await runbrief(['material', 'H2O', '--at', '2 bar, saturated vapour', '--json']);
    const document = JSON.parse(stdout) as { material: string; state: Record<string, unknown>; properties: Record<string, Record<string, unknown>> };
    expect(Object.keys(document)).toEqual(['material', 'state', 'properties']);
    expect(document.material).toBe('water');
    expect(document.state).toEqual({ temperature: expect.closeTo(393.36, 1) as number, pressure: 2e5, phase: 'vapour' });
    expect(Object.keys(document.properties['density'] ?? {})).toEqual(['value', 'unit', 'uncertainty', 'source', 'withinRange', 'range']);
    expect(document.properties['density']).toMatchObject({ unit: 'kg/m^3', withinRange: true });
    for (const id of ['density', 'viscosity', 'thermalConductivity', 'specificHeatCapacity', 'thermalExpansion', 'speedOfSound', 'kinematicViscosity', 'thermalDiffusivity', 'prandtl', 'vapourPressure', 'saturationTemperature', 'latentHeat', 'surfaceTension', 'meltingTemperature', 'molarMass']) expect(document.properties).toHaveProperty(id);
  });

  it('writes a range as CSV, remarks on stderr', async () => {
    const { code, stdout, stderr } = await runbrief(['material', 'water', '--over', '20 degC .. 90 degC, 2 bar', '--table', '--points', '3']);
    const lines = stdout.trimEnd().split('\n');
    expect([code, lines.length]).toEqual([0, 4]);
    expect(lines[0]).toContain('temperature [K],pressure [Pa],phase,density [kg/m^3]');
    expect(lines[1]).toMatch(/^293\.15,200000,liquid,998\.25/);
    expect(stderr).toContain('assumed');
  });

  it.each([
    [['material', 'steam', '--at', '60 degC, 2 bar'], 1, 'a temperature above 393.36 K (120.21 degC)'],
    [['material', 'aluminium', '--at', '700 degC, 1 bar'], 1, 'nearest   molten aluminium'],
    [['material', 'tin', '--at', '300 degC, 1 bar'], 1, 'nearest   molten tin'],
    [['material', 'ice', '--at', '5 degC, 1 bar'], 1, 'nearest   water'],
    [['material', 'copper', '--at', '1200 degC, 1 bar'], 1, 'nearest   molten copper'],
    [['material', 'stainless steel', '--at', '1500 degC, 1 bar'], 1, 'nearest   molten steel'],
    [['material', 'gold', '--at', '1200 degC, 1 bar'], 1, 'a temperature that is not above the melting temperature of'],
    [['material', 'lead', '--at', '20 degC, 1 bar'], 1, 'nearest   solid lead'],
    [['material', 'water', '--at', '-5 degC, 1 bar'], 1, 'nearest   ice'],
    [['material', 'watr', '--at', '60 degC, 2 bar'], 1, 'nearest   water'],
    [['material', 'oil', '--at', '60 degC, 2 bar'], 1, 'does not say which material is meant'],
    [['material', 'sea water', '--at', '20 degC, 1 bar'], 1, 'composition 3.5 % mass'],
    [['material', 'water', '--over', '20 degC .. 150 degC, 2 bar', '--fit', 'polynomial'], 1, 'turns from liquid to vapour'],
    [['material', 'water', '--over', '20 degC .. 50 degC, 2 bar', '--fit', 'spline'], 2, 'polynomial'],
    [['material', 'water', '--over', '20 degC .. 50 degC, 2 bar', '--fit', 'polynomial', '--of', 'viscosty'], 1, 'nearest   viscosity'],
    [['material', 'water'], 2, 'a state is needed'],
    [['material', 'water', '--at', '20 degC, 1 bar, humidity 40 %'], 1, 'nearest   humid air'],
    [['material', 'air', '--over', '20 degC .. 60 degC, 1 bar, humidity 40 %'], 1, 'nearest   humid air'],
    [['material', 'flue gas', '--at', '150 degC, 1 bar, humidity 40 %'], 1, 'water as one of its components'],
    [['material', 'propylene glycol', '--at', '20 degC, 1 bar, composition 40 %'], 1, 'nearest   propylene glycol-water'],
    [['material', 'water', '--at', '20 degC, 1 bar, propylene glycol 40 %'], 1, 'propylene glycol-water with "composition 40 % mass"'],
    [['material', 'propylene glycol', '--at', '20 degC, 1 bar, water 60 %'], 1, 'propylene glycol-water with "composition 40 % mass"'],
    [['material', 'water', '--at', '20 degC, 1 bar, glycol 40 %'], 1, 'ethylene glycol-water or propylene glycol-water'],
    [['material', 'ethylene glycol-water', '--at', '20 degC, 1 bar, propylene glycol 40 %'], 1, 'nearest   propylene glycol-water'],
    [['material', 'ethylene glycol-water', '--at', '20 degC, 1 bar, ethylene glycol 40 % mol'], 1, 'a share by mass'],
    [['material', 'water', '--at', '20 degC, 1 bar, oxygen 40 %'], 1, 'no mixture of gases'],
    [['material', 'water', '--over', '60 degC, 2 bar'], 1, 'the state has no range'],
  ])('%j', async (argv, code, says) => {
    const ended = await runbrief(argv);
    expect([ended.code, ended.stdout]).toEqual([code, '']);
    expect(ended.stderr).toContain(says);
  });

  it('takes the solute by its name as the composition', async () => {
    const byShare = await runbrief(['material', 'propylene glycol-water', '--at', '20 degC, 1 bar, composition 40 % mass']);
    for (const said of ['propylene glycol 40 %', 'water 60 %', 'water 60 % mass, propylene glycol 40 % mass']) expect((await runbrief(['material', 'propylene glycol-water', '--at', `20 degC, 1 bar, ${said}`])).stdout).toBe(byShare.stdout);
    expect(byShare.code).toBe(0);
  });

  it('gives functions ready to type in, within 80 columns', async () => {
    const { code, stdout } = await runbrief(['material', 'water', '--over', '20 degC .. 90 degC, 2 bar', '--fit', 'polynomial', '--within', '0.1 %']);
    expect(code).toBe(0);
    expect(stdout).toMatch(/density, y in kg\/m\^3, x = temperature in K\n +y = a0 \+ a1 x \+ a2 x\^2\n +a0 +=/);
    expect(stdout).toContain('safe from 293.15 K to 363.15 K');
    for (const line of stdout.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
  });

  it('prints shares without a unit, and says where a table is beyond its range', async () => {
    const fit = await runbrief(['material', 'ethylene glycol-water', '--over', '20 degC, 1 bar, composition 10 % .. 50 %', '--fit', 'polynomial', '--of', 'density,prandtl']);
    expect(fit.stdout).toContain('x = composition as a plain number');
    expect(fit.stdout).not.toMatch(/in 1\b|0\.5 1\b/);
    const table = await runbrief(['material', 'copper', '--over', '20 degC .. 900 degC', '--table', '--points', '2']);
    const [head, cold, hot] = table.stdout.trimEnd().split('\n').map((line) => line.split(',').at(-1));
    expect(head).toBe('beyond range');
    expect(cold).not.toContain('density');
    expect(hot).toContain('density');
    expect((await runbrief(['material', 'water', '--over', '20 degC .. 50 degC, 2 bar', '--fit', 'table', '--within', '5 K'])).stderr).toContain('is not an error');
  });

  it('a fit that is not within what was asked ends with 4', async () => {
    const { code, stdout } = await runbrief(['material', 'engine oil', '--over', '20 degC .. 90 degC, 2 bar', '--fit', 'power', '--of', 'viscosity']);
    expect(code).toBe(4);
    expect(stdout).toContain('NOT within what was asked');
  });

  it('draws curves in plain characters', async () => {
    const { stdout } = await runbrief(['material', 'air', '--over', '250 K .. 700 K, 1 atm', '--plot', '--of', 'viscosity']);
    expect(stdout).toContain('dynamic viscosity [Pa s]');
    expect(stdout.split('*').length).toBe(61);
  });

  it('takes gases by components', async () => {
    const { code, stdout } = await runbrief(['material', 'gas mixture', '--at', '20 degC, 1 atm, CO2 13.3 % mol, oxygen 3.9 % mol, nitrogen 82.8 % mol']);
    expect(code).toBe(0);
    expect(stdout).toMatch(/dynamic viscosity +17\.2 uPa s/);
  });

  it('lists the materials', async () => expect((await runbrief(['material'])).stdout).toContain('lead-bismuth eutectic'));
});
