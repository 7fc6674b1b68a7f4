import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { channelBeta, channelLambda, pipeB, pipeBeta, pipeLambda } from '../../src/references/graetz-constants.ts';
import { channelSection, entryAtFlux, entryAtTemperature, pipeSection } from '../../src/references/graetz-series.ts';
import { evaluateReference, findReference } from '../../src/references/index.ts';

interface Entry { id: string; inputs: { n?: { value: number } }; expected: number; tolerance: { rel: number } }
const { entries } = JSON.parse(readFileSync(new URL('../checks/values/E02_graetz.json', import.meta.url), 'utf8')) as { entries: Entry[] };
const lists: readonly (readonly [string, readonly number[]])[] = [['E02-pipe-T-', pipeLambda], ['E02-pipe-H-', pipeBeta], ['E02-plates-T-', channelLambda]];

describe('constants', () => {
  const rows = entries.flatMap((entry) => lists.filter(([start]) => entry.id.startsWith(start)).map(([, list]) => ({ ...entry, list })));
  it('six published eigenvalues are there', () => expect(rows.length).toBe(6));
  it.each(rows)('$id', ({ inputs, list, expected, tolerance }) => {
    expect(Math.abs((list[inputs.n?.value as number] as number) / expected - 1)).toBeLessThanOrEqual(tolerance.rel);
  });
  it('channel beta_1, Shah and London 1978 (from memory): 4.287224', () => expect(channelBeta[0]).toBeCloseTo(4.287224, 5));
  it('wall values of the flux modes sum to -11/24: wall and bulk are one at the inlet', () => {
    let sum = pipeB.reduce((total, b) => total + b, 0);
    for (let n = 61; n < 2e6; n++) sum -= 2.400806 * (4 * n + 4 / 3) ** (-5 / 3);
    // What is left beyond 2e6 modes: integral of the asymptote.
    expect(sum - (2.400806 / 4) * 1.5 * (8e6) ** (-2 / 3)).toBeCloseTo(-11 / 24, 3);
  });
});

describe.each([['pipe', pipeSection, 3.656793457763, 48 / 11], ['channel', channelSection, 7.540700874, 140 / 17]] as const)('%s', (_, section, atTemperature, atFlux) => {
  it('bulk starts at one and falls', () => {
    expect(entryAtTemperature(section, 1e-8).bulk).toBeCloseTo(1, 3);
    expect(entryAtTemperature(section, 1e-4).bulk).toBeLessThan(1);
  });
  it('heat balance: the fall of the bulk is the local transfer, d ln theta/dx* = -4 Nu', () => {
    for (const x of [1e-6, 1e-4, 1e-2, 0.1]) {
      const d = x * 1e-3;
      const slope = (Math.log(entryAtTemperature(section, x + d).bulk) - Math.log(entryAtTemperature(section, x - d).bulk)) / (2 * d);
      expect(-slope / 4 / entryAtTemperature(section, x).local).toBeCloseTo(1, 4);
    }
  });
  it('far downstream the developed values', () => {
    expect(entryAtTemperature(section, 10).local).toBeCloseTo(atTemperature, 8);
    expect(entryAtTemperature(section, 1e4).mean).toBeCloseTo(atTemperature, 3);
    expect(entryAtFlux(section, 10)).toBeCloseTo(atFlux, 10);
  });
});

describe('numbers of the literature', () => {
  // Mean Nusselt numbers of the pipe at x* (collocation with 90 terms), channel likewise.
  it.each([[1e-4, 33.81, 2], [1e-3, 15.384, 3], [1e-2, 7.155, 3], [0.03, 5.2145, 4]])('pipe, x* = %f: mean %f', (x, nusselt, digits) => expect(entryAtTemperature(pipeSection, x).mean).toBeCloseTo(nusselt, digits));
  it.each([[1e-3, 18.75, 2], [1e-2, 9.825, 3], [0.1, 7.776, 3]])('channel, x* = %f: mean %f', (x, nusselt, digits) => expect(entryAtTemperature(channelSection, x).mean).toBeCloseTo(nusselt, digits));
  it('short pipes tend to the thin-layer limit, whose factor is 1.615 (Leveque 1928)', () => {
    const limit = evaluateReference(findReference('leveque-pipe'), { graetz: 5000 }).values.find((v) => v.id === 'nusselt');
    expect(limit?.value).toBeCloseTo(1.615 * 5000 ** (1 / 3), 2);
    expect(entryAtTemperature(pipeSection, 1e-7).mean / (1.6151 * 1e7 ** (1 / 3))).toBeCloseTo(1, 2);
    for (const graetz of [5e3, 1e5, 1e6]) {
      const spread = evaluateReference(findReference('leveque-pipe'), { graetz }).values[2];
      const exact = entryAtTemperature(pipeSection, 1 / graetz).mean;
      expect(exact).toBeGreaterThanOrEqual((spread?.low as number) * 0.997);
      expect(exact).toBeLessThanOrEqual(spread?.high as number);
    }
  });
  it('entry lengths to 5 %: 0.0335 (uniform temperature), Shah and London 1978', () => {
    const length = evaluateReference(findReference('graetz-pipe'), { graetz: 1, peclet: 1000, length: 0.01 }).values.find((v) => v.id === 'entranceLengthThermal');
    expect(length?.value).toBeCloseTo(0.0335 * 1000 * 0.01, 3);
  });
});
