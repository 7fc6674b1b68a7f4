import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { linesOf, planOf } from './harness.ts';

const duct = (humidity: string): string => readFileSync('examples/supply-duct.case.yaml', 'utf8').replace(/^fluid: .*/m, `fluid: { material: humid air, humidity: ${humidity}, pressure: 1 atm }`);

describe('a plan of air without a dew point', () => {
  it.each([['0 %', true], ['10 %', false]] as const)('stands at %s', async (humidity, dry) => {
    const lines = linesOf(await planOf(duct(humidity)), 'properties').join('\n');
    expect(lines).toContain('density');
    expect(lines.includes('has no dew point')).toBe(dry);
  });
});
