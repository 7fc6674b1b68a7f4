import { describe, expect, it } from 'vitest';
import { convert } from '../../src/units/index.ts';
import { refusal } from './refusal.ts';

describe('convert', () => {
  // expected by hand from the definitions: 231 in3, 0.3048 m, 0.45359237 kg, 9.80665 m/s2, 4.1868 J/(g K), 101325 Pa
  it.each([
    ['12 gal/min', 'L/s', 0.7570823568, /US liquid gallon/],
    ['12 UK gal/min', 'L/s', 0.909218, undefined],
    ['2 barg', 'Pa', 301325, /gauge counts from 101325 Pa: 3.01325 bar absolute/],
    ['3 bar abs', 'bar gauge', 1.98675, undefined],
    ['3 bar', 'bar gauge', 1.98675, /read as absolute/],
    ['14.5 psig', 'psig', 14.5, /gauge/],
    ['212 degF', 'degC', 100, undefined],
    ['-40 degC', 'degF', -40, undefined],
    ['50 K difference', 'degF difference', 90, undefined],
    ['50 K difference', 'F difference', 90, undefined],
    ['50 dK', 'delta_degF', 90, undefined],
    ['10 degC difference', 'K', 10, undefined],
    ['1 hp', 'ft lbf/s', 550, /mechanical/],
    ['1 PS', 'kgf m/s', 75, undefined],
    ['60 rpm', 'Hz', 1, /one turn is 2 pi radians/],
    ['1 Hz', 'rpm', 60, /one turn is 2 pi radians/],
    ['180 deg', 'rad', Math.PI, undefined],
    ['1 ton', 'lb', 2000, /short ton/],
    ['1 t', 'kg', 1000, /tonne/],
    ['1 Btu/(lb degF)', 'cal_IT/(g degC)', 1, /International Table/],
    ['1 W/m2/K', 'W m^-2 K^-1', 1, /below it/],
    ['0.5', '%', 50, undefined],
    ['1 GB', 'MB', 1000, undefined],
    ['1 GiB', 'B', 1073741824, undefined],
    ['60 m^3/h normal', 'L/min normal', 1000, /normal counts at 0 degC and 101 325 Pa \(DIN 1343\)$/],
    ['273.15 Nm3/h', 'm^3/h standard', 288.15, /standard counts at 15 degC and 101 325 Pa \(ISO 13443\); the gas is ideal/],
    ['288.15 m^3/h standard', 'Nm3/h', 273.15, /ideal/],
  ])('%s to %s', (text, to, value, says) => {
    const got = convert(text, to);
    expect(got.value).toBeCloseTo(value, 9);
    expect(got.unit).toBe(to);
    expect(got.assumed.join('; ')).toMatch(says ?? /^$/);
  });

  it.each([
    ['2000 m^3/h normal', 'm^3/h', '"2000 m^3/h normal" counts at 0 degC and 101 325 Pa (DIN 1343); at another state it depends on temperature and pressure'],
    ['2000 m^3/h', 'm^3/h standard', '"2000 m^3/h" does not say at which state it is, and standard counts at 15 degC and 101 325 Pa (ISO 13443)'],
  ])('refuses %s to %s, since a state is missing', (text, to, message) => expect(refusal(() => convert(text, to))).toMatchObject({ code: 'no-reference-state', message }));

  it('carries the spread along', () => expect(convert('20 +/- 1 degC', 'degF')).toMatchObject({ value: 68, half: 1.8 }));

  it.each([
    ['5 m', 's', 'wrong-dimension', '"5 m" is not a quantity in s: "m" has the dimension m, wanted is s'],
    ['20 degC', 'dK', 'temperature-for-difference', '"20 degC" is a temperature, "dK" a difference'],
    ['20 C', 'K', 'ambiguous-unit', '"C" is read in more than one way'],
    ['20 degC', 'F', 'ambiguous-unit', '"F" is read in more than one way'],
    ['5 m', 'wat', 'unknown-unit', '"wat" is not a unit known here'],
    ['64 GB', '1', 'wrong-dimension', '"64 GB" is not a quantity in 1: "GB" has the dimension of bytes, wanted is of a plain number'],
  ])('%s to %s is refused', (text, to, code, message) => expect(refusal(() => convert(text, to))).toMatchObject({ code, message }));
});
