import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { writingOf } from '../../src/report/index.ts';
import { planFixture } from './plan-fixture.ts';

const on = readCase(new TextEncoder().encode('format: 1\nflow: pipe\nsizes: { diameter: 1 in, length: 8 m }\nfluid: { material: water, pressure: 29 psi abs }\ninlet: { speed: 40 cm/s, temperature: 65 degC }\ntargets: [{ quantity: pressureDrop }]\n'), 'a.case.yaml', vocabulary);
const { quantities } = planFixture();

describe('numbers of a plan', () => {
  const writing = writingOf(quantities, on);
  it.each([
    ['inlet.speed', '40.0 cm/s +/- 5 %'], // given: in the unit of the case
    ['sizes.diameter', '0.984252 in'], // 25 mm: the fixture's number, in the unit of this case
    ['pressure', '29.0075 psi'], // the given number itself, one way on
    ['outletTemperature', '53.4 degC +/- 0.8 K'], // computed, in the scale of the case: 326.54 - 273.15
    ['temperatureDifference', '45 K'], // a difference has no zero
    ['firstCellHeight', '42.0 um +/- 5 %'],
    ['reynolds', '22600 +/- 5 %'],
    ['regime', 'turbulent'],
    ['nothing', 'not known'],
  ])('%s', (id, text) => expect(writing.number(id)).toBe(text));

  it('stay in SI without a case', () => {
    expect(writingOf(quantities).number('outletTemperature')).toBe('326.5 +/- 0.8 K');
    expect(writingOf(quantities).number('inlet.speed')).toBe('0.400 m/s +/- 5 %');
  });
  it('of limits and flips have the unit of their quantity', () => {
    expect(writing.like('outletTemperature', 323.15)).toBe('50 degC');
    expect(writing.like('inlet.speed', 0.1)).toBe('10 cm/s');
    expect(writing.like('inlet.temperature', 310, 'K')).toBe('36.85 degC');
    expect(writing.like('temperatureDifference', 3)).toBe('3 K');
  });
  it('on a page have signs beyond ASCII', () => expect(writingOf(quantities, on, true).number('firstCellHeight')).toBe('42.0 µm ± 5 %'));
});
