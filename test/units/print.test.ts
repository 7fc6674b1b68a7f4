import { describe, expect, it } from 'vitest';
import { fromSI, numberParts, type Printing, printNumber, readQuantity } from '../../src/units/index.ts';
import { refusal } from './refusal.ts';

describe('printNumber', () => {
  it.each<[Printing, string]>([
    // prefixes
    [{ value: 2.3e-5, unit: 'm' }, '23 um'],
    [{ value: 2.3e-5, unit: 'm', unicode: true }, '23 µm'],
    [{ value: 0.025, unit: 'm' }, '25 mm'],
    [{ value: 0.4, unit: 'm/s' }, '0.4 m/s'],
    [{ value: 101325, unit: 'Pa' }, '101.3 kPa'],
    [{ value: 101325, unit: 'Pa', prefixes: false }, '101300 Pa'],
    [{ value: 9999.97, unit: 'Pa' }, '10 kPa'],
    [{ value: 8.9e-4, unit: 'Pa s' }, '0.89 mPa s'],
    [{ value: 1.81e-5, unit: 'Pa s' }, '18.1 uPa s'],
    [{ value: 4180, unit: 'J/(kg K)' }, '4180 J/(kg K)'],
    [{ value: 2.257e6, unit: 'J/kg' }, '2.257 MJ/kg'],
    [{ value: 1.5e-5, unit: 'm^2/s' }, '1.5e-5 m^2/s'],
    [{ value: 1.5e-5, unit: 'm^2/s', unicode: true }, '1.5×10⁻⁵ m²/s'],
    [{ value: 998.2, unit: 'kg/m^3' }, '998.2 kg/m^3'],
    [{ value: 0.018, unit: 'kg/mol' }, '18 g/mol'],
    [{ value: 6.4e10, unit: 'B' }, '64 GB'],
    [{ value: 2e-6, unit: 's' }, '2 us'],
    [{ value: 20000, unit: 's' }, '5.556 h'],
    [{ value: 0.001, unit: 'm' }, '1 mm'],
    [{ value: 1e-6, unit: 'm' }, '1 um'],
    [{ value: 0, unit: 'm' }, '0 m'],
    // plain numbers
    [{ value: 12500, unit: '1' }, '12500'],
    [{ value: 1.25e6, unit: '1' }, '1.25e6'],
    [{ value: 0.45, unit: '1', toUnit: '%' }, '45 %'],
    // spreads: no more digits than they bear
    [{ value: 26437, unit: 'W', low: 26437 / 1.02, high: 26437 * 1.02 }, '26.4 kW +/- 2 %'],
    [{ value: 26437, unit: 'W', low: 26437 / 1.3, high: 26437 * 1.3 }, '26 kW +/- 27 %'],
    [{ value: 2300, unit: 'W', low: 1150, high: 4600 }, '2300 W +/- factor 2'],
    [{ value: 2300, unit: 'W', low: 1150, high: 4600, unicode: true }, '2300 W ×/÷ 2'],
    [{ value: 0.4, unit: 'm/s', half: 0.02 }, '0.400 m/s +/- 5 %'],
    [{ value: 0.4, unit: 'm/s', half: 0.04 }, '0.40 m/s +/- 10 %'],
    [{ value: 123456, unit: '1', low: 60000, high: 250000 }, '120000 +/- factor 2'],
    [{ value: -3.2, unit: 'K', difference: true, half: 4 }, '-3 +/- 4 K'],
    [{ value: -3.2, unit: 'K', difference: true, half: 4, unicode: true }, '\u22123 ± 4 K'],
    [{ value: 5, unit: 'm', half: 0 }, '5 m'],
    // temperatures
    [{ value: 338.15, unit: 'K', toUnit: 'degC' }, '65 degC'],
    [{ value: 338.15, unit: 'K', toUnit: 'degC', half: 0.5 }, '65.0 degC +/- 0.5 K'],
    [{ value: 338.15, unit: 'K', toUnit: 'degC', half: 0.5, unicode: true }, '65.0 °C ± 0.5 K'],
    [{ value: 338.15, unit: 'K', half: 3 }, '338 +/- 3 K'],
    [{ value: 5, unit: 'K', toUnit: 'degF', difference: true }, '9 degF'],
    [{ value: 273.15, unit: 'K', toUnit: 'degC', half: 2 }, '0.0 degC +/- 2.0 K'],
    // the user's unit
    [{ value: 0.3, unit: 'm^3/s', toUnit: 'L/min' }, '18000 L/min'],
    [{ value: 50 * Math.PI, unit: 'rad/s', toUnit: 'rpm' }, '1500 rpm'],
    [{ value: 50 * Math.PI, unit: 'rad/s', toUnit: 'Hz' }, '25 Hz'],
    [{ value: Infinity, unit: 'm' }, 'infinite'],
    [{ value: NaN, unit: 'm' }, 'not a number'],
  ])('%o', (printing, text) => expect(printNumber(printing)).toBe(text));

  const relatives = [0.011, 0.02, 0.029, 0.03, 0.07, 0.1, 0.2, 0.29, 0.3, 0.45];
  const values = [1.23456789e-7, 0.0123456789, 1.23456789, 987.654321, 9.87654321e7];
  it.each(values.flatMap((value) => relatives.map((relative) => [value, relative] as const)))('%d with a spread of %d shows no digit below it', (value, relative) => {
    const { number } = numberParts({ value, unit: '1', low: value * (1 - relative), high: value * (1 + relative) });
    const [mantissa = '', exponent = '0'] = number.split('e');
    const zeros = /\.|e/.test(number) ? 0 : (/0*$/.exec(mantissa)?.[0].length ?? 0);
    const last = 10 ** (Number(exponent) + zeros - (mantissa.split('.')[1]?.length ?? 0));
    expect(last).toBeGreaterThan((value * relative) / 31); // two digits of a spread that begins with 1 or 2, one otherwise
    expect(Math.abs(Number(number) - value)).toBeLessThanOrEqual(value * relative); // and rounding stays within the spread
  });

  const units = ['m', 'm/s', 'Pa', 'Pa s', 'W', 'J/(kg K)', 'm^2/s', 'kg/m^3', 's', 'kg', 'Hz'];
  it.each([1.2346e-8, 3.3e-5, 0.00101, 0.1, 9.9999, 1234.5, 123456, 7.7e8].flatMap((value) => units.map((unit) => [value, unit] as const)))('%d %s is read back within half of the fourth digit', (value, unit) => {
    expect(Math.abs(readQuantity(printNumber({ value, unit }), { unit }).value / value - 1)).toBeLessThan(5.01e-4);
  });

  it('refuses a unit that it does not know', () => expect(refusal(() => printNumber({ value: 1, unit: 'wat' })).code).toBe('unknown-unit'));
});

describe('fromSI', () => {
  it.each([
    [338.15, 'degC', false, 65],
    [10, 'degC', true, 10],
    [373.15, 'degF', false, 212],
    [0.025, 'mm', false, 25],
  ])('%d as %s', (value, unit, difference, expected) => expect(fromSI(value, unit, difference)).toBeCloseTo(expected, 10));
});
