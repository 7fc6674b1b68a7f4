import { describe, expect, it } from 'vitest';
import { limitIn } from '../../src/assemble/target-definitions.ts';

describe('the limit that a purpose names', () => {
  it.each([
    ['Does the water leave the jacketed line below 50 degC?', 'K', 323.15],
    ['The drop must stay under 2 kPa, whatever happens', 'Pa', 2000],
    ['Is the heat at least 1.5 kW.', 'W', 1500],
    ['Keep it above 40 degC', 'K', 313.15],
  ])('%s', (purpose, unit, value) => {
    expect(limitIn(purpose, unit)?.value).toBeCloseTo(value, 9);
  });

  it.each([
    ['What pressure drop does the line take?', 'Pa'],
    ['Does the water leave below 50 degC?', 'Pa'],
    ['Is it below the limit of 50 degC?', 'K'],
    [`Is it below ${'1'.repeat(5000)}`, 'K'],
    ['', 'K'],
  ])('none in: %s', (purpose, unit) => {
    expect(limitIn(purpose, unit)).toBeUndefined();
  });
});
