import { describe, expect, it } from 'vitest';
import { Problem } from '../../src/problems/index.ts';
import { compareTable, compareValues, judgeDeviation, norms, readTable, rungTolerance, type CompareOptions, type Comparison, type KnownTable, type TableComparison } from '../../src/results/index.ts';

/** Speed rising along a line: u = 2 x, so that straight lines and cubics agree and every deviation is known by hand. */
const ramp: KnownTable = { title: 'a ramp', band: 0, columns: [{ id: 'x', name: 'place', unit: 'm' }, { id: 'velocity', name: 'u', unit: 'm/s' }], rows: [0, 1, 2, 3, 4].map((x) => [x, 2 * x]) };
const result = (rows: readonly (readonly number[])[], header = 'x [m],u [m/s]'): string => `${header}\n${rows.map((row) => row.join(',')).join('\n')}\n`;
const compare = (csv: string, options: Partial<CompareOptions> = {}, known = ramp): TableComparison => compareTable(known, readTable(csv, 'a.csv'), { limit: 0.01, ...options });
const only = (csv: string, options: Partial<CompareOptions> = {}, known = ramp): Comparison => compare(csv, options, known).columns[0];
const codes = (work: () => unknown): string[] => {
  try {
    work();
  } catch (error) {
    if (error instanceof Problem) return error.list.map((p) => p.code);
    throw error;
  }
  return [];
};

describe('norms by hand', () => {
  it('of deviations 0.1, -0.3, 0.2 on a range of 2', () => {
    const found = norms([1.1, 1.7, 3.2], [1, 2, 3]);
    expect(found.mean).toBeCloseTo(0, 12);
    expect(found.l1).toBeCloseTo(0.6 / 3, 12);
    expect(found.l2).toBeCloseTo(Math.sqrt(0.14 / 3), 12);
    expect([found.largest, found.at, found.scale]).toEqual([expect.closeTo(-0.3, 12), 1, 2]);
    expect(found.overAll).toBeCloseTo(Math.sqrt(0.14 / 14), 12);
  });
});

describe('a result held against known points', () => {
  it('units, order of rows, names and other columns do not matter; the place of the largest deviation is given', () => {
    const found = only('time [s],Velocity [cm/s],X [mm]\n1,800,4000\n1,0,0\n1,420,2000\n1,200,1000\n1,600,3000\n', { numerical: '0.1 m/s' });
    expect(found.norms.largest).toBeCloseTo(0.2, 12);
    expect(found.place).toEqual({ at: 2, result: expect.closeTo(4.2, 12), known: 4 });
    expect(found.norms.l2).toBeCloseTo(0.2 / Math.sqrt(5), 12);
    expect(found.says).toContain('+0.2 m/s (2.5 % of the range) at place = 2 m');
  });
  it('the result is interpolated, never carried beyond its ends', () => {
    const found = only(result([[0.5, 1], [1.5, 3], [3.5, 7]]));
    expect(found.points).toBe(3);
    expect(found.outside).toEqual([0, 4]);
    expect(found.norms.largest).toBeCloseTo(0, 12);
    expect(found.cautions[0]).toContain('2 of 5 known points lie outside');
  });
  it('a result that covers less than half cannot pass', () => {
    const found = only(result([[0.5, 1], [2.5, 5]]), { numerical: '0.1 %' });
    expect([found.points, found.outcome]).toEqual([2, 'cannot tell']);
  });
  it('a column may be found by a unit that it alone has; a plain number never is', () => {
    const found = only(result([[0, 0], [4, 8]], 'position [m],axial [m/s]'));
    expect(found.by).toBe('unit');
    expect(found.cautions[0]).toContain('because of its unit alone');
    const bare: KnownTable = { ...ramp, columns: [{ id: 'radius', name: 'r/R', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }] };
    expect(codes(() => compare(result([[0, 0], [4, 8]], 'a,b'), {}, bare))).toEqual(['missing-column']);
    expect(only(result([[0, 0], [4, 8]], 'r/R,u/U'), {}, bare).by).toBe('name');
  });
  it.each([
    ['no coordinate', result([[0, 0], [1, 2]], 't [s],u [m/s]'), 'missing-column'],
    ['no value', result([[0, 0], [1, 2]], 'x [m],p [Pa]'), 'missing-column'],
    ['a unit that does not fit the name', result([[0, 0], [1, 2]], 'x [m],u [Pa]'), 'wrong-dimension'],
    ['places elsewhere', result([[10, 0], [11, 2]]), 'no-overlap'],
    ['one row', result([[0, 0]]), 'too-few-points'],
    ['a place twice', result([[0, 0], [1, 2], [0, 1]]), 'same-place'],
  ])('%s', (_, csv, code) => expect(codes(() => compare(csv))).toEqual([code]));
  it('rows too far apart are told', () => {
    const wave: KnownTable = { ...ramp, rows: [0.5, 1.5, 2.5].map((x) => [x, x * x]) };
    const found = only(result([[0, 0], [1, 1], [2, 4], [3, 9]]), {}, wave);
    expect(found.cautions.join()).toContain('straight lines and smooth curves differ');
    expect(Math.abs(only(result([[0, 0], [1, 1], [2, 4], [3, 9]]), { interpolation: 'linear' }, wave).norms.largest)).toBeCloseTo(0.25, 12);
  });
});

describe('outcome: |E| + U inside the limit, |E| - U outside it, each side', () => {
  it.each([
    [0.5, 1, { numerical: 0.49 }, 'met'],
    [0.5, 1, { numerical: 0.51 }, 'cannot tell'],
    [-1.5, 1, { numerical: 0.51 }, 'cannot tell'],
    [-1.5, 1, { numerical: 0.49 }, 'missed'],
    [0.5, 1, { numerical: 0.3, input: 0.4 }, 'met'],
    [0.5, 1, { numerical: 0.3, input: 0.3, statistical: 0.3 }, 'cannot tell'],
    [0, 1, {}, 'cannot tell'],
    [9, 1, {}, 'cannot tell'],
  ])('E = %f, limit %f, %o: %s', (deviation, limit, parts, outcome) => expect(judgeDeviation(deviation, limit, parts).outcome).toBe(outcome));
  it('the validation uncertainty holds the data, the root of squares (3, 4, 12: 13)', () => {
    const found = judgeDeviation(12.9, 100, { numerical: 3, input: 4, data: 12 });
    expect([found.uncertainty, found.validation, found.telling]).toEqual([5, 13, false]);
    expect(judgeDeviation(13.1, 100, { numerical: 3, input: 4, data: 12 }).telling).toBe(true);
  });
  it('a coarse mesh cannot pass by its own error', () => {
    const csv = result([[0, 0.04], [4, 8.04]]); // 0.5 % of the range off
    expect(only(csv).outcome).toBe('cannot tell');
    expect(only(csv, { numerical: '0.4 %' }).outcome).toBe('met');
    expect(only(csv, { numerical: '2 %' }).outcome).toBe('cannot tell');
    expect(only(csv, { numerical: '0.1 %', within: '0.02 m/s' }).outcome).toBe('missed');
    expect(only(csv, { numerical: '0.1 %', input: '0.1 %', within: '0.8 %' }).says).toContain('is met');
  });
  it('known numbers with a band: it counts in the validation uncertainty and is read back', () => {
    const found = only(result([[0, 0.1], [2, 4.3], [4, 8.1]]), { numerical: '0.1 m/s', measure: 'rms', interpolation: 'linear' }, { ...ramp, band: 0.15 });
    expect(found.parts.data).toBe(0.15);
    expect(found.withinBand).toBeCloseTo(0.4, 12); // 0.1, 0.2, 0.3, 0.2, 0.1 at the points
    expect(found.deviation).toBeCloseTo(Math.sqrt((0.01 + 0.04 + 0.09 + 0.04 + 0.01) / 5), 12);
  });
  it('a bare % of a temperature is refused, of its change it is not', () => {
    const warm: KnownTable = { ...ramp, columns: [{ id: 'x', name: 'x', unit: 'm' }, { id: 'temperature', name: 'T', unit: 'K' }], rows: [[0, 300], [1, 310]] };
    const csv = result([[0, 27], [1, 37]], 'x [m],T [degC]');
    expect(codes(() => compare(csv, { numerical: '1 %' }, warm))).toEqual(['percent-of-temperature']);
    expect(only(csv, { numerical: '1 % of change', within: '0.3 K' }, warm)).toMatchObject({ outcome: 'met', parts: { numerical: expect.closeTo(0.1, 12) } });
  });
});

describe('tolerance of a rung', () => {
  it.each([
    [0, 'exact', 0.005], // 2 x 0.25 %
    [0, 'measured', 0.02], // 2 x 1 %
    [0.02, 'measured', Math.sqrt(0.0008)],
    [0.001, 'benchmark', Math.sqrt(0.000026)],
  ] as const)('%f, %s', (uncertainty, kind, expected) => expect(rungTolerance({ uncertainty, kind })).toBeCloseTo(expected, 10));
});

describe('single numbers', () => {
  const known = [{ id: 'nusselt', name: 'Nusselt number', unit: '1', value: 3.65679, uncertainty: 0 }, { id: 'pressureDrop', name: 'pressure drop', unit: 'Pa', value: 1000, uncertainty: 0.05 }];
  const values = (csv: string, numerical?: string): ReturnType<typeof compareValues> => compareValues(known, readTable(csv, 'a.csv'), { limit: 0.005, ...(numerical === undefined ? {} : { numerical }) });
  it('each side of the limit of 0.5 %', () => {
    expect(values('Nusselt number,x\n3.67,1\n', '0.1 %')[0]).toMatchObject({ outcome: 'met', known: 3.65679, result: 3.67 });
    expect(values('nusselt\n3.67\n', '0.2 %')[0]?.outcome).toBe('cannot tell');
    expect(values('nusselt\n3.67\n')[0]?.outcome).toBe('cannot tell');
    expect(values('nusselt\n3.70\n', '0.1 %')[0]?.outcome).toBe('missed');
  });
  it('the band of the known number counts in the validation uncertainty', () => {
    const [found] = values('pressure drop [kPa]\n1.02\n', '1 %');
    expect(found?.validation).toBeCloseTo(Math.sqrt(50 ** 2 + 10 ** 2), 10);
    expect(found?.telling).toBe(false);
    expect(found?.says).toContain('E = S - D = +20 Pa (2 %)');
  });
  it('no such column, and more rows than one', () => {
    expect(values('drag\n1\n')).toEqual([]);
    expect(codes(() => values('nusselt\n1\n2\n'))).toEqual(['many-rows']);
  });
});
