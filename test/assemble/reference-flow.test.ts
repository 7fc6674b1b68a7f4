import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { settleCase } from '../../src/plan/index.ts';

// A normal or standard volume flow is an amount of gas: the speed follows from the state of the inlet.
// Expected: m = rho_ref Q with rho_ref from published tables, U = (Q/A) (T/T_ref) (p_ref/p) by the law of ideal gases; the width is the compressibility factor.

interface Row { readonly why: string; readonly fluid: string; readonly flow: string; readonly temperature: string; readonly massFlow?: number; readonly speed: number; readonly within?: number }
const area = (Math.PI * 0.025 ** 2) / 4;
const ideal = (perHour: number, referenceT: number, T: number, p: number): number => ((perHour / 3600 / area) * (T / referenceT) * 101325) / p;

const rows: Row[] = [
  { why: 'normal, 0 degC and 1 atm (DIN 1343)', fluid: 'material: air, pressure: 9 bar abs', flow: '100 m^3/h normal', temperature: '20 degC', massFlow: (100 / 3600) * 1.2929, speed: ideal(100, 273.15, 293.15, 9e5) },
  { why: 'standard, 15 degC and 1 atm (ISO 13443; 1.225 kg/m^3 of ISO 2533)', fluid: 'material: air, pressure: 9 bar abs', flow: '100 m^3/h standard', temperature: '20 degC', massFlow: (100 / 3600) * 1.225, speed: ideal(100, 288.15, 293.15, 9e5) },
  { why: 'Nm3/h is the same as normal', fluid: 'material: air, pressure: 9 bar abs', flow: '100 Nm3/h', temperature: '20 degC', massFlow: (100 / 3600) * 1.2929, speed: ideal(100, 273.15, 293.15, 9e5) },
  { why: 'Sm3/h is the same as standard', fluid: 'material: air, pressure: 9 bar abs', flow: '100 Sm3/h', temperature: '20 degC', massFlow: (100 / 3600) * 1.225, speed: ideal(100, 288.15, 293.15, 9e5) },
  { why: 'the middle of a range', fluid: 'material: air, pressure: 9 bar abs', flow: '80 .. 120 m^3/h (normal)', temperature: '20 degC', massFlow: (100 / 3600) * 1.2929, speed: ideal(100, 273.15, 293.15, 9e5) },
  { why: 'a mixture of gases, 24 g/mol of 22.414 L/mol', fluid: 'material: gas mixture, pressure: 1.05 bar abs, composition: { oxygen: 40 % mol, nitrogen: 55 % mol, carbon dioxide: 5 % mol }', flow: '100 m^3/h normal', temperature: '250 degC', massFlow: ((100 / 3600) * (0.4 * 31.998 + 0.55 * 28.014 + 0.05 * 44.01)) / 22.414, speed: ideal(100, 273.15, 523.15, 1.05e5) },
  { why: 'steam, a liquid at 0 degC, counts by its moles', fluid: 'material: water, pressure: 1 bar abs', flow: '100 m^3/h normal', temperature: '300 degC', massFlow: ((100 / 3600) * 18.015) / 22.414, speed: ideal(100, 273.15, 573.15, 1e5) },
  { why: 'humid air keeps its moisture: 1.5 % of the moles at 60 %, 20 degC', fluid: 'material: humid air, pressure: 1 atm, humidity: 60 %', flow: '100 m^3/h normal', temperature: '20 degC', massFlow: ((100 / 3600) * (28.965 - 0.0139 * (28.965 - 18.015))) / 22.414, speed: ideal(100, 273.15, 293.15, 101325) },
  { why: 'a gas of constants is scaled as an ideal gas', fluid: 'medium: gas, density: 1.2 kg/m^3, viscosity: 18 uPa s, pressure: 1 bar abs', flow: '100 m^3/h normal', temperature: '20 degC', massFlow: (100 / 3600) * 1.2 * 1.01325 * (293.15 / 273.15), speed: ideal(100, 273.15, 293.15, 1e5) },
  { why: 'a bare volume flow is that of the inlet', fluid: 'material: air, pressure: 9 bar abs', flow: '100 m^3/h', temperature: '20 degC', speed: 100 / 3600 / area },
];

const pipe = (row: Pick<Row, 'fluid' | 'flow' | 'temperature'>) =>
  settleCase(readCase(`format: 1\ntitle: t\nflow: pipe\nsizes: { diameter: 25 mm, length: 8 m }\nfluid: { ${row.fluid} }\ninlet: { volumeFlow: ${row.flow}, temperature: ${row.temperature} }\n`, 'case.yaml', vocabulary)).assembled;

describe('a volume flow at normal or standard conditions', () => {
  it.each(rows)('$flow of $fluid: $why', (row) => {
    const { workings } = pipe(row);
    expect(Math.abs((workings.get('speed') as number) / row.speed - 1)).toBeLessThan(0.004);
    if (row.massFlow !== undefined) expect(Math.abs((workings.get('massFlow') as number) / row.massFlow - 1)).toBeLessThan(0.002);
    expect((workings.get('density') as number) * (workings.get('speed') as number) * area).toBeCloseTo(workings.get('massFlow') as number, 9);
    expect(workings.get('inlet.massFlow')).toBeUndefined();
  });

  it('moves mass flow and speed over its range and spread', () => {
    const { ranges, workings } = pipe({ ...(rows[4] as Row) });
    expect(ranges.map((r) => [r.path, r.to / r.from])).toEqual([['inlet.volumeFlow', 1.5]]);
    const middle = workings.get('massFlow') as number;
    workings.set('inlet.volumeFlow', 120 / 3600);
    expect((workings.get('massFlow') as number) / middle).toBeCloseTo(1.2, 9);
  });

  it('refuses it for what is no gas', () => {
    expect(() => pipe({ fluid: 'material: water, pressure: 3 bar abs', flow: '3 m^3/h normal', temperature: '20 degC' })).toThrow('a normal volume flow counts a gas');
    expect(() => pipe({ fluid: 'medium: liquid, density: 900 kg/m^3, pressure: 3 bar abs', flow: '3 m^3/h standard', temperature: '20 degC' })).toThrow('a standard volume flow counts a gas');
  });
});
