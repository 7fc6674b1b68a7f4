import { describe, expect, it } from 'vitest';
import { readQuantity, type Wanted } from '../../src/units/index.ts';
import { attempt, refusal } from './refusal.ts';

const T: Wanted = { unit: 'K', kind: 'temperature' };
const D: Wanted = { unit: 'K', kind: 'temperatureDifference' };
const P: Wanted = { unit: 'Pa', kind: 'pressure' };
const F: Wanted = { unit: '1', kind: 'fraction' };
const length: Wanted = { unit: 'm', name: 'length' };
const speed: Wanted = { unit: 'm/s', name: 'speed' };

describe('readQuantity', () => {
  // expected by hand from the definitions of the units; equality, as these are short decimals
  it.each<[string, Wanted, object]>([
    ['25 mm', length, { value: 0.025, unit: 'mm' }],
    ['1.1 mm', length, { value: 0.0011 }],
    ['25mm', length, { value: 0.025 }],
    ['.5 m', length, { value: 0.5 }],
    ['5 x 10^-3 m', length, { value: 0.005 }],
    ['0.40 m/s +/- 5 %', speed, { value: 0.4, spread: { half: 0.02, relative: 0.05, bounds: false } }],
    ['0.40 m/s ± 0.02', speed, { value: 0.4, spread: { half: 0.02, bounds: false } }],
    ['0.40 m/s +/- 2 cm/s', speed, { value: 0.4, spread: { half: 0.02, bounds: false } }],
    ['20 +/- 0.5 degC', T, { value: 293.15, unit: 'degC', spread: { half: 0.5, bounds: false } }],
    ['20 degC +/- 1 K', T, { value: 293.15, spread: { half: 1, bounds: false } }],
    ['68 degF +/- 1.8 degF', T, { value: 293.15, spread: { half: 1, bounds: false } }],
    ['0.2 .. 0.6 m/s', speed, { value: 0.4, range: { from: 0.2, to: 0.6, bounds: false } }],
    ['0.2..0.6 m/s', speed, { value: 0.4, range: { from: 0.2, to: 0.6, bounds: false } }],
    ['20 cm/s .. 0.6 m/s', speed, { value: 0.4, range: { from: 0.2, to: 0.6, bounds: false } }],
    ['6 .. 12 W/(m^2 K) (bounds)', { unit: 'W/(m^2 K)' }, { value: 9, range: { from: 6, to: 12, bounds: true }, spread: { half: 3, bounds: true } }],
    ['-5 .. 5 degC', T, { value: 273.15, range: { from: 268.15, to: 278.15, bounds: false } }],
    ['50 K', T, { value: 50 }],
    ['\u22125 °C', T, { value: 268.15 }],
    ['50 K', D, { value: 50, difference: true }],
    ['50 dK', D, { value: 50, difference: true }],
    ['10 degC', D, { value: 10, difference: true, assumed: ['degC is read as a difference'] }],
    ['50 K difference', D, { value: 50, difference: true }],
    ['18 F difference', D, { value: 10, difference: true }],
    ['1 bar abs', P, { value: 1e5, assumed: [] }],
    ['1 bar', P, { value: 1e5, assumed: ['the pressure is read as absolute, as gauge is not said'] }],
    ['1 atm', P, { value: 101325, assumed: [] }],
    ['4 bar gauge', P, { value: 501325, gauge: true, assumed: ['gauge counts from 101325 Pa: 5.01325 bar absolute'] }],
    ['4 barg', P, { value: 501325, gauge: true }],
    ['4 bar(g)', P, { value: 501325, gauge: true }],
    ['4 bara', P, { value: 4e5, assumed: [] }],
    ['101\u2009325 Pa abs', P, { value: 101325 }],
    ['45 %', F, { value: 0.45, unit: '%' }],
    ['0.45', F, { value: 0.45, unit: '' }],
    ['4 bar gauge +/- 5 %', P, { value: 501325, spread: { half: 20000, relative: 0.05, bounds: false } }],
    ['0.2 .. 0.6 m/s +/- 0.1 (bounds)', speed, { range: { from: 0.2, to: 0.6, bounds: false }, spread: { half: 0.1, bounds: true } }],
    ['420 ppm', F, { value: 4.2e-4 }],
    ['0.9 % mol', F, { value: 0.009, basis: 'mol' }],
    ['3 vol%', F, { value: 0.03, basis: 'vol' }],
    ['3 % by mass', F, { value: 0.03, basis: 'mass' }],
    ['420 ppm vol', F, { value: 4.2e-4, basis: 'vol' }],
    ['45 +/- 2 %', F, { value: 0.45, spread: { half: 0.02, bounds: false } }],
    ['45 % +/- 10 % of value', F, { value: 0.45, spread: { half: 0.045, relative: 0.1, bounds: false } }],
    ['36 m^3/h normal', { unit: 'm^3/s', kind: 'volumeFlow' }, { value: 0.01, reference: 'normal' }],
    ['36 Nm3/h', { unit: 'm^3/s', kind: 'volumeFlow' }, { value: 0.01, reference: 'normal' }],
    ['36 Sm^3/h +/- 3 %', { unit: 'm^3/s', kind: 'volumeFlow' }, { value: 0.01, reference: 'standard' }],
    ['36 m3/h (normal)', { unit: 'm^3/s', kind: 'volumeFlow' }, { value: 0.01, reference: 'normal' }],
    ['36 m^3/h standard', { unit: 'm^3/s', kind: 'volumeFlow' }, { value: 0.01, reference: 'standard' }],
    ['2 Pa s^n', { unit: 'Pa s^n', exponentN: 0.6 }, { value: 2 }],
    ['64 GB', { unit: 'B' }, { value: 64e9 }],
    ['2e5 1/s', { unit: '1/s' }, { value: 2e5 }],
    ['5 %', { unit: 'W', orShare: true }, { value: 0.05, share: 'value' }],
    ['5 % of change', { ...D, orShare: true }, { value: 0.05, share: 'change' }],
    ['1 K', { ...D, orShare: true }, { value: 1, difference: true }],
    ['20 g', { unit: 'kg' }, { value: 0.02 }],
    ['3 mol', { unit: 'mol' }, { value: 3 }],
  ])('%s', (text, want, expected) => expect(readQuantity(text, want)).toMatchObject(expected));

  it('counts turns as wanted: 1500 rpm is 25 Hz and 50 pi rad/s', () => {
    expect(readQuantity('1500 rpm', { unit: 'Hz' }).value).toBeCloseTo(25, 12);
    expect(readQuantity('1500 rpm', { unit: 'rad/s' }).value).toBeCloseTo(50 * Math.PI, 12);
    expect(readQuantity('25 Hz', { unit: 'rad/s' }).value).toBeCloseTo(50 * Math.PI, 12);
    expect(readQuantity('1500 rpm', { unit: '1/s' }).assumed).toEqual(['rpm is counted in radians per second; turns per second are Hz']);
  });
});

describe('quantities that are refused', () => {
  const number = 'a number such as 25, 0.4, 1.5e-3';
  it.each<[string, Wanted, object]>([
    ['1.0 Pa.s/m', { unit: 'Pa s', name: 'dynamic viscosity' }, { code: 'wrong-dimension', message: '"1.0 Pa.s/m" is not a dynamic viscosity: "Pa.s/m" has the dimension kg m^-2 s^-1, wanted is kg m^-1 s^-1', expected: 'a dynamic viscosity, for example 1e-3 Pa s, 1 mPa s, 1 cP', at: 4, length: 6 }],
    ['25', length, { code: 'unit-missing', message: '"25" is not a length: the unit is missing', expected: 'a length, for example 25 mm, 0.5 m, 2 in', at: 0, length: 2 }],
    ['5 GB', F, { code: 'wrong-dimension', message: '"5 GB" is not a share: "GB" has the dimension of bytes, wanted is of a plain number', expected: 'a share, for example 45 %, 0.45', at: 2, length: 2 }],
    ['20 C', T, { code: 'ambiguous-unit', message: '"C" is read in more than one way', expected: 'degC for the temperature, coulomb for the charge', at: 3, length: 1 }],
    ['  20 wat', { unit: 'W' }, { code: 'unknown-unit', message: '"wat" is not a unit known here', nearest: 'watt', at: 5, length: 3 }],
    ['20 degC +/- 5 %', T, { code: 'percent-of-temperature', message: 'the spread in "20 degC +/- 5 %" has three readings: a share of the kelvin value, of the number in degC, or of a temperature difference', expected: 'a half-width such as +/- 1 K', at: 12, length: 3 }],
    ['5 %', { ...D, orShare: true }, { code: 'percent-of-temperature', message: '"5 %" has three readings: a share of the kelvin value, of the number in degC, or of a temperature difference', expected: 'a difference such as 1 K, or "5 % of change"', at: 0, length: 3 }],
    ['5 %', T, { code: 'percent-of-temperature', expected: 'a difference such as +/- 1 K' }],
    ['45 % +/- 2 %', F, { code: 'ambiguous-spread', message: 'the spread in "45 % +/- 2 %" has two readings: percentage points or a share of the value', expected: 'for example "45 +/- 2 %" for points, "45 % +/- 5 % of value" for a share', at: 9, length: 3 }],
    ['5 m/s +/- 2 kg', speed, { code: 'wrong-dimension', message: 'the spread in "5 m/s +/- 2 kg" has another dimension than the value', expected: 'a half-width in m/s, or in %', at: 10, length: 4 }],
    ['5 m/s +/- -2 %', speed, { code: 'negative-spread', expected: 'a half-width of zero or more' }],
    ['0.6 .. 0.2 m/s', speed, { code: 'range-reversed', message: '"0.6 .. 0.2 m/s" is not a speed: the range ends below its beginning', nearest: '0.2 .. 0.6 m/s' }],
    ['50 K difference', T, { code: 'difference-for-temperature', message: '"50 K difference" is not a temperature: it is a temperature difference', nearest: '50 K' }],
    ['-300 degC', T, { code: 'below-absolute-zero', message: '"-300 degC" is not a temperature: below absolute zero', at: 0, length: 4 }],
    ['-2 bar gauge', P, { code: 'below-vacuum', message: '"-2 bar gauge" is not a pressure: below vacuum' }],
    ['5 bar gauge', { unit: 'Pa', kind: 'pressureDifference' }, { code: 'pressure-for-difference', message: '"5 bar gauge" is not a pressure difference: a pressure difference is neither gauge nor absolute' }],
    ['5 bar gauge abs', P, { code: 'unreadable-quantity', message: '"5 bar gauge abs" says both gauge and absolute' }],
    ['3 mm gauge', length, { code: 'unreadable-quantity', message: '"3 mm gauge" is not a length: gauge and absolute belong to pressures' }],
    ['3 mm difference', length, { code: 'unreadable-quantity', message: '"3 mm difference" is not a length: the word difference belongs to temperatures' }],
    ['3 mm (bounds)', length, { code: 'unreadable-quantity', message: '"3 mm (bounds)" is not a length: bounds are said of a range or a spread' }],
    ['3 kg/s normal', { unit: 'kg/s' }, { code: 'unreadable-quantity', message: '"3 kg/s normal" is not a quantity in kg/s: normal and standard belong to volume flows' }],
    ['45', F, { code: 'not-a-share', message: '"45" is not a share: a share lies between 0 and 1', nearest: '45 %' }],
    ['1,5 mm', length, { code: 'not-a-number', message: '"1,5" is not a number here: the decimal sign is the point, and digits are not grouped by commas', expected: number, nearest: '1.5', at: 0, length: 3 }],
    ['1,000 mm', length, { code: 'not-a-number', nearest: '1.000 or 1000' }],
    ['1/2 in', length, { code: 'not-a-number', message: '"1/2" is a fraction: write it as a decimal number', nearest: '0.5' }],
    ['101 325 Pa', P, { code: 'not-a-number', message: '"101 325" is two numbers', nearest: '101325' }],
    ['1e999 m', length, { code: 'not-a-number', message: '"1e999" is beyond the range of numbers' }],
    ['1e-999 m', length, { code: 'not-a-number', message: '"1e-999" is too small to be told from zero' }],
    ['1e308 km', length, { code: 'not-a-number', message: '"1e308 km" is not a length: beyond the range of numbers' }],
    ['NaN', length, { code: 'not-a-number', message: '"NaN" is not a number' }],
    ['.inf m', length, { code: 'not-a-number', message: '".inf" is not a number' }],
    ['Infinity m', length, { code: 'not-a-number', message: '"Infinity" is not a number' }],
    ['0x10 mm', length, { code: 'not-a-number', message: '"0x10" is not a decimal number', at: 0, length: 4 }],
    ['1.2.3 m', length, { code: 'not-a-number', at: 0 }],
    ['', length, { code: 'not-a-number', message: 'a number is missing' }],
    ['5 .. mm', length, { code: 'not-a-number', message: '"mm" is not a number', at: 5, length: 2 }],
    ['5 mm +/-', length, { code: 'not-a-number', message: 'a number is missing', at: 8 }],
    ['2 Pa s^n', { unit: 'Pa s^n' }, { code: 'exponent-missing', at: 6, length: 2 }],
  ])('%s', (text, want, expected) => expect(refusal(() => readQuantity(text, want))).toMatchObject(expected));
});

describe('hostile text', () => {
  const many = (n: number, piece: string): string => piece.repeat(n);
  const texts = [many(1e5, '9'), `${many(199, '1')} m`, `1${many(90, ' ')}m`, `1 ${many(150, '(')}`, `1 ${many(60, 'm/')}m`, `1 ${many(60, 'm ')}`, `1 m${many(90, '^2')}`, `1 ${many(198, 'a')}`, `1 .. ${many(60, '.. ')}`, `1 +/- ${many(40, '+/- ')}1 m`, '1 m\u0000', '1 \u202em', '1 \ud800', `1${many(30, '\u2009000')} m`, '1 m (bounds) (bounds)', '1 ..', '+/- 1 m', '1 m^(((2)))', '1 m^1/0', '1 m^(1/0)', '1e5e5 m', '1 m^n', '--1 m', '1 °', `1 ${many(49, 'bar g ')}`];
  /** A finite value, or a problem with its place and words that a person can read. */
  const sound = (text: string): boolean => {
    const { value, problem } = attempt(() => readQuantity(text, { unit: 'm', orShare: true }));
    if (problem === undefined) return Number.isFinite(value?.value);
    return /^[a-z-]+$/.test(problem.code) && (problem.at ?? -1) >= 0 && (problem.length ?? 0) > 0 && problem.message.length < 600;
  };

  it('gives a quantity or a problem, and soon', () => {
    const begin = performance.now();
    expect(texts.filter((text) => !sound(text))).toEqual([]);
    expect(performance.now() - begin).toBeLessThan(2000); // a runaway pattern takes minutes
  });

  it('survives random signs', () => {
    const alphabet = '0123456789.eE+-/*^() %°µ²⁻msKkgPaNCF,xn\u2009±'.split('');
    let seed = 7;
    const next = (): number => (seed = (seed * 16807) % 2147483647) / 2147483647;
    const random = Array.from({ length: 5000 }, () => Array.from({ length: 1 + Math.floor(next() * 24) }, () => alphabet[Math.floor(next() * alphabet.length)]).join(''));
    expect(random.filter((text) => !sound(text))).toEqual([]);
  });
});
