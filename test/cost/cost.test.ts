import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { workingsOf } from '../flows/harness.ts';

const near = (value: number | undefined, expected: number, relative: number): void => expect(Math.abs((value ?? Number.NaN) / expected - 1)).toBeLessThanOrEqual(relative);
const pipe = flows['pipe'] as Flow;
const had = (given: Readonly<Record<string, number | string>>, id: string): number | undefined => workingsOf(pipe, { energySolved: 'no', inletTemperature: 300, pressure: 1e5, ...given }).get(id);
const steady = { 'choice.run-character': 'steady' };

describe('cost of a run', () => {
  const run = { cellCount: 1e6, totalPasses: 2000, 'computing.cellUpdateRate': 2e5 };
  // 1e6 x 2000/2e5 = 1e4 s on one core.
  it('is cells times passes over the rate', () => {
    near(had({ ...run, 'computing.cores': 1 }, 'coreHours'), 1e4 / 3600, 1e-9);
    near(had({ ...run, 'computing.cores': 1 }, 'wallTime'), 1e4, 1e-9);
  });
  it('on more cores is done sooner and takes more core hours', () => {
    expect(had({ ...run, 'computing.cores': 50 }, 'wallTime')).toBeLessThan(1e4 / 25);
    expect(had({ ...run, 'computing.cores': 50 }, 'coreHours')).toBeGreaterThan(1e4 / 3600);
  });
  it('never shares out cores that have no work', () => expect(had({ ...run, cellCount: 3e4, 'computing.cores': 64 }, 'cores')).toBe(3));
});

describe('cost of a family', () => {
  // Three meshes over the finest at a ratio of 1.3, three directions, step following the cell: 1 + 1.3^-4 + 1.3^-8 = 1.47.
  it('of unsteady runs at a ratio of 1.3 is 1.47 fine runs', () => {
    const given = { refinementRatio: 1.3, meshDimension: 3, 'choice.run-character': 'transient' };
    near((had(given, 'runsFamily') as number) / (had(given, 'runsFine') as number), 1.473, 1e-3);
  });
  it('has no step study in a steady run', () => expect(had(steady, 'runsSteps')).toBe(0));
  it('larger steps add 3/4 of a run', () => expect(had({ 'choice.run-character': 'transient' }, 'runsSteps')).toBe(0.75));
});
