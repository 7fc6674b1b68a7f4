import { describe, expect, it } from 'vitest';
import { dimensionOf, dimensionText, sameDimension, unit } from '../../src/units/index.ts';
import { refusal } from './refusal.ts';

describe('unit', () => {
  it.each([
    // the same unit written in other ways: factor and dimension agree
    ['W/(m^2 K)', 'W m^-2 K^-1'],
    ['W/(m^2 K)', 'W/(m²·K)'],
    ['W/(m^2 K)', 'W·m⁻²·K⁻¹'],
    ['W/(m^2 K)', 'W m-2 K-1'],
    ['W/(m^2 K)', 'W/m2/K'],
    ['W/(m^2 K)', 'W/m2 K'],
    ['W/(m^2 K)', 'W per m2 K'],
    ['kg/m^3', 'kg*m**-3'],
    ['Pa s', 'Pa.s'],
    ['Pa s', 'Pa-s'],
    ['N m', 'N-m'],
    ['um', 'µm'],
    ['um', 'μm'],
    ['um', 'micron'],
    ['m', '((m))'],
    ['L', 'litre'],
    ['kPa', 'kilopascal'],
    ['degC', '°C'],
    ['degC', 'deg C'],
    ['mol^0.5', 'mol^(1/2)'],
    ['1', ''],
  ])('%s is %s', (a, b) => {
    expect(unit(b).factor).toBeCloseTo(unit(a).factor, 14);
    expect(unit(b).offset).toBe(unit(a).offset);
    expect(sameDimension(dimensionOf(a), dimensionOf(b))).toBe(true);
  });

  it.each([
    ['kJ/(kg K)', 1000, 'm^2 s^-2 K^-1'],
    ['cP', 1e-3, 'kg m^-1 s^-1'],
    ['%', 0.01, '1'],
    ['10^6 m2', 1e6, 'm^2'],
    ['Pa s^n', 1, 'kg m^-1 s^-1.4'],
    ['kg m^-1 s^(n-2)', 1, 'kg m^-1 s^-1.4'],
    ['V', 1, 'kg m^2 s^-3 A^-1'],
    ['lx', 1, 'm^-2 cd'],
  ])('%s', (text, factor, dimension) => {
    expect(unit(text, 0.6).factor).toBeCloseTo(factor, 15);
    expect(dimensionText(unit(text, 0.6).dimension)).toBe(dimension);
  });

  it('takes names before prefixed names', () => {
    expect(dimensionText(dimensionOf('min'))).toBe('s'); // not milli-inch
    expect(dimensionText(dimensionOf('ft'))).toBe('m'); // not femtotonne
    expect(dimensionText(dimensionOf('pt'))).toBe('m^3'); // the pint, not picotonne
    expect(unit('dK')).toMatchObject({ factor: 1, difference: true }); // not decikelvin
    expect(dimensionText(dimensionOf('cd'))).toBe('cd');
    expect(dimensionText(dimensionOf('m/h'))).toBe('m s^-1');
    expect(unit('m/h').factor).toBeCloseTo(1 / 3600, 15);
  });

  it('knows a zero of the scale in a unit of one name alone', () => {
    expect(unit('degC').offset).toBe(273.15);
    expect(unit('J/degC').offset).toBe(0);
    expect(unit('1/degF').factor).toBeCloseTo(1.8, 14);
  });

  it.each([
    ['gal/min', /US liquid gallon/],
    ['ton', /short ton of 2000 lb/],
    ['t', /tonne of 1000 kg/],
    ['hp', /mechanical/],
    ['Btu', /International Table/],
    ['cal', /thermochemical/],
    ['oz', /avoirdupois/],
    ['W/m2/K', /below it/],
    ['W/(m2 C)', /C in .* temperature difference in degC/],
    ['year', /365\.25/],
    ['mH2O', /1000 kg\/m3/],
  ])('%s says what is assumed', (text, says) => expect(unit(text).assumed.join()).toMatch(says));

  it.each(['US gal', 'short ton', 'hp (metric)', 'Btu (IT)', 'cal_th', 'W/(m2 K)', 'atm', 'mmHg'])('%s leaves nothing open', (text) => expect(unit(text).assumed).toEqual([]));
});

describe('units that are refused', () => {
  it.each([
    ['C', 'ambiguous-unit', '"C" is read in more than one way', 'degC for the temperature, coulomb for the charge', 0, 1],
    ['F', 'ambiguous-unit', '"F" is read in more than one way', 'degF for the temperature, farad for the capacitance', 0, 1],
    ['Nm3/h', 'ambiguous-unit', '"Nm3" in "Nm3/h" is read in more than one way', 'for example "30 m^3/h normal", or N m^3 for newton times cubic metre', 0, 3],
    ['MBtu/h', 'ambiguous-unit', '"MBtu" in "MBtu/h" is read in more than one way', 'kBtu for a thousand, MMBtu for a million', 0, 4],
    ['m/', 'unreadable-unit', '"m/" is not a unit: something is missing at its end', 'for example kg/m^3, W/(m2 K), m2/s, Pa s', 2, 1],
    ['(m', 'unreadable-unit', '"(m" is not a unit: this bracket is not closed', 'for example kg/m^3, W/(m2 K), m2/s, Pa s', 0, 1],
    ['m)', 'unreadable-unit', '"m)" is not a unit: a bracket closes that was not opened', 'for example kg/m^3, W/(m2 K), m2/s, Pa s', 1, 1],
    ['m^999', 'unreadable-unit', '"m^999" is not a unit: an exponent beyond 30', 'for example kg/m^3, W/(m2 K), m2/s, Pa s', 1, 4],
    ['m--2', 'unreadable-unit', '"m--2" is not a unit: "-" does not belong in it', 'for example kg/m^3, W/(m2 K), m2/s, Pa s', 1, 1],
    ['Pa s^n', 'exponent-missing', '"Pa s^n" needs the exponent n, and none is given', 'the flow index beside it, for example index: 0.6', 4, 2],
  ])('%s', (text, code, message, expected, at, length) => expect(refusal(() => unit(text))).toEqual({ code, message, expected, at, length }));

  it.each([
    ['wat/m2', 'watt', 0],
    ['gpn', 'gpm', 0],
    ['kg/metr', 'meter', 3],
    ['PA', 'Pa', 0],
    ['kw', 'kW', 0],
    ['scfm', '"ft^3/min standard"', 0],
    ['kph', 'km/h', 0],
  ])('%s is unknown, %s is near', (text, nearest, at) => {
    const problem = refusal(() => unit(text));
    expect(problem).toMatchObject({ code: 'unknown-unit', at });
    expect(problem.nearest).toBe(nearest);
  });

  it.each(['constructor', '__proto__', 'toString', 'hasOwnProperty'])('%s is no unit', (text) => expect(refusal(() => unit(text)).code).toMatch(/unknown-unit|unreadable-unit/));
});
