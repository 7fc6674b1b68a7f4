import { describe, expect, it } from 'vitest';
import { Problem } from '../../src/problems/index.ts';
import { grids, type GridOptions, type GridVerdict } from '../../src/results/index.ts';

const one = (csv: string, options: GridOptions = {}): GridVerdict => grids(csv, 'a.csv', options).targets[0];
const sized = (values: readonly number[], sizes: readonly number[] = [1, 2, 4]): string => `size [m],f\n${values.map((v, i) => `${sizes[i]},${v.toFixed(8)}`).join('\n')}\n`;
const codes = (csv: string, options: GridOptions = {}): string[] => {
  try {
    grids(csv, 'a.csv', options);
  } catch (error) {
    if (error instanceof Problem) return error.list.map((p) => p.code);
    throw error;
  }
  return [];
};

describe('published columns (Celik et al., J. Fluids Eng. 130 (2008) 078001, table 1), rows in any order', () => {
  it('reattachment length: steady approach, 2.2 %', () => {
    const found = one('cells,length [m]\n4500,5.863\n18000,6.063\n8000,5.972\n', { dimension: 2 });
    expect(found).toMatchObject({ kind: 'monotone', safetyFactor: 1.25 });
    expect(found.order).toBeCloseTo(1.53, 2);
    expect(found.band).toBeCloseTo(0.022, 3);
    expect(found.approximateError).toBeCloseTo(0.015, 3);
    expect(found.extrapolatedError).toBeCloseTo(0.017, 3);
    expect(found.outcome).toBeUndefined();
  });
  it('an oscillating velocity: the index of 0.5 % is given, the band is half the swing', () => {
    const found = one('cells,u\n18000,6.0042\n4500,5.9624\n980,6.0909\n', { dimension: 2 });
    expect(found.kind).toBe('oscillatory');
    expect(found.index).toBeCloseTo(0.005, 3);
    expect(found.band).toBeCloseTo((6.0909 - 5.9624) / 2 / 6.0042, 10);
  });
});

describe('safety factor and order follow the evidence', () => {
  it.each([
    { name: 'order 2 believed', values: [1.01, 1.04, 1.16], kind: 'monotone', factor: 1.25, band: 1.25 * 0.01, order: 2 },
    { name: 'order 2.4 believed', values: [1 + 0.01, 1 + 0.01 * 2 ** 2.4, 1 + 0.01 * 4 ** 2.4], kind: 'monotone', factor: 1.25, band: 1.25 * 0.01, order: 2.4 },
    { name: 'order 3 is held at 2', values: [1.01, 1.08, 1.64], kind: 'monotone', factor: 1.25, band: (1.25 * 0.07) / 3, order: 3 },
    { name: 'order 0.3 is held at 0.5 with factor 3', values: [1.1, 1 + 0.1 * 2 ** 0.3, 1 + 0.1 * 4 ** 0.3], kind: 'monotone', factor: 3, band: (3 * 0.1 * (2 ** 0.3 - 1)) / (Math.SQRT2 - 1), order: 0.3 },
    { name: 'a swing of low order', values: [1, 1.1, 0.98], kind: 'oscillatory', factor: 3, band: (3 * 0.1) / (Math.SQRT2 - 1), order: Math.log2(1.2) },
    { name: 'two meshes', values: [1, 1.03], kind: 'two-grids', factor: 3, band: 0.03, order: undefined },
    { name: 'a change that grows', values: [1, 1.2, 1.3], kind: 'divergent', factor: 3, band: 0.6, order: undefined },
    { name: 'a change that appears on the finest alone', values: [1.2, 1, 1], kind: 'divergent', factor: 3, band: 0.6, order: undefined },
    { name: 'no change left', values: [1, 1, 1.03], kind: 'converged', factor: 3, band: (3 * 0.03) / 3 / 4, order: undefined },
  ])('$name', ({ values, kind, factor, band, order }) => {
    const found = one(sized(values));
    expect(found).toMatchObject({ kind, safetyFactor: factor });
    expect(found.bandAbsolute).toBeCloseTo(band, 6);
    expect(Math.abs((found.order ?? 0) - (order ?? 0))).toBeLessThan(1e-5);
    expect(found.extrapolated === undefined).toBe(kind === 'divergent');
  });
  it('the formal order may be 1', () => expect(one(sized([1, 1.03]), { formalOrder: 1 }).bandAbsolute).toBeCloseTo(0.09, 8));
  it('differences inside a stated iteration error are no evidence', () => {
    const csv = sized([1.01, 1.04, 1.16]);
    expect(one(csv, { iteration: '0.02' }).kind).toBe('monotone');
    expect(one(csv, { iteration: '0.04' }).kind).toBe('converged');
    expect(one(csv, { iteration: '0.02' }).cautions.join()).toContain('more than a tenth of the band');
  });
  it('four meshes and more: least squares; a change that grows is told there too', () => {
    const sizes = [1, 1.5, 2, 3, 4];
    const found = one(sized(sizes.map((h) => 3 - 0.1 * h ** 1.5), sizes));
    expect(found).toMatchObject({ kind: 'monotone', safetyFactor: 1.25 });
    expect(found.order).toBeCloseTo(1.5, 4);
    expect(found.extrapolated).toBeCloseTo(3, 5);
    expect(one(sized(sizes.map((h) => 3 - 0.1 / h), sizes)).kind).toBe('divergent');
    expect(one(sized([1, 1.01, 0.98, 1.04, 0.9], sizes)).kind).toBe('oscillatory');
    expect(one(sized([1, 1, 1, 1.1, 1.2], sizes)).kind).toBe('converged');
  });
  it('cells in two and three dimensions, sizes and steps', () => {
    const cells = 'cells,f\n64,1.01\n8,1.04\n1,1.16\n';
    expect(one(cells).order).toBeCloseTo(2, 6);
    expect(one(cells, { dimension: 2 }).order).toBeCloseTo(4 / 3, 6);
    expect(one('step [ms],f\n1,1.01\n2,1.04\n4,1.16\n').order).toBeCloseTo(2, 6);
    expect(one('size [in],f\n4,1.16\n2,1.04\n1,1.01\n').order).toBeCloseTo(2, 6);
  });
});

describe('outcome', () => {
  const steady = sized([1.01, 1.04, 1.16]); // band 0.0125, 1.2376 %
  it.each([
    ['met at the band itself and above', steady, '0.01250001', 'met'],
    ['missed below it', steady, '0.0124', 'missed'],
    ['as a share', steady, '1.24 %', 'met'],
    ['as a share, below', steady, '1.23 %', 'missed'],
    ['two meshes, inside by the factor 3', sized([1, 1.03]), '3.01 %', 'met'],
    ['two meshes, between the factors', sized([1, 1.03]), '2 %', 'cannot tell'],
    ['two meshes, beyond by 1.25 too', sized([1, 1.03]), '1 %', 'missed'],
    ['data that diverge', sized([1, 1.0002, 1.0003]), '10 %', 'cannot tell'],
    ['equal values', 'cells,f\n4000,10\n1000,10\n200,10\n', '2 %', 'met'],
    ['a share of nothing', sized([0, 0.01, 0.04]), '2 %', 'cannot tell'],
    ['nothing, in its unit', sized([0, 0.01, 0.04]), '0.01', 'met'],
  ])('%s', (_, csv, within, outcome) => {
    const found = grids(csv, 'a.csv', { within });
    expect(found.outcome).toBe(outcome);
    expect(found.targets[0].says).toContain(outcome === 'cannot tell' ? 'cannot be told' : `is ${outcome}`);
  });
  it('several targets: the worst counts', () => {
    expect(grids('size [m],a,b\n1,1.01,1.1\n2,1.04,1.4\n4,1.16,2.6\n', 'a.csv', { within: '2 %' }).outcome).toBe('missed');
  });
  it('a temperature takes kelvin, a bare % of it is refused; a rise takes both', () => {
    const csv = 'size [m],outlet temperature [degC]\n1,60.10\n2,60.40\n4,61.60\n';
    expect(grids(csv, 'a.csv', { within: '0.2 K' }).outcome).toBe('met');
    expect(one(csv).extrapolated).toBeCloseTo(333.15, 6);
    expect(codes(csv, { within: '2 %' })).toEqual(['percent-of-temperature']);
    expect(grids(csv.replace('temperature', 'temperature rise'), 'a.csv', { within: '2 %' }).outcome).toBe('met');
  });
  it.each([['2 kg', 'wrong-dimension'], ['2', 'unit-missing'], ['5 % of change', 'unreadable-quantity']])('a limit of %s for a pressure is %s', (within, code) => expect(codes('size [m],p [Pa]\n1,10.1\n2,10.4\n', { within })).toEqual([code]));
});

describe('cautions and refusals', () => {
  it('ratios below 1.3 (1.29 rounds to it)', () => {
    expect(grids(sized([1.01, 1.04, 1.16], [1, 1.29, 1.7]), 'a.csv').cautions).toEqual([]);
    expect(grids(sized([1.01, 1.04, 1.16], [1, 1.28, 1.7]), 'a.csv').cautions[0]).toContain('1.28 is below 1.3');
  });
  it('a second column of fineness is no target, and is held to the first', () => {
    const both = (dimension: 2 | 3): ReturnType<typeof grids> => grids('cells,size [m],drag [N]\n10000,0.01,10.5\n40000,0.005,10.2\n160000,0.0025,10.1\n', 'a.csv', { dimension });
    expect(both(2).targets.map((t) => t.name)).toEqual(['drag']);
    expect(JSON.stringify(both(2))).not.toContain('gives a ratio');
    expect(JSON.stringify(both(3))).toContain('gives a ratio of sizes of 2.00 where the first column gives 1.59');
  });
  it('zones that are not refined alike', () => {
    const csv = (layer: number): string => `cells,cells in layer,f\n64000,16000,1.01\n8000,${layer},1.04\n1000,250,1.16\n`;
    expect(grids(csv(2000), 'a.csv').cautions).toEqual([]);
    expect(grids(csv(3000), 'a.csv').cautions[0]).toContain('not similar: the ratio of sizes is 1.75 in layer and 2.00 over all');
  });
  it('differences of a few last digits, a value near zero, a coarsest mesh outside the range', () => {
    expect(one('size [m],f\n1,1.01\n2,1.02\n4,1.05\n').cautions.join()).toContain('1 times the last digit');
    expect(one(sized([0.001, 0.02, 0.09])).cautions.join()).toContain('cannot be told from zero');
    expect(one(sized([1, 1.3, 1.9])).cautions.join()).toContain('where 1 is due');
  });
  it.each([
    ['a first column that is none', 'cell,f\n1,2\n2,3\n', 'unknown-column'],
    ['a unit that does not fit', 'size [s],f\n1,2\n2,3\n', 'wrong-dimension'],
    ['no unit', 'size,f\n1,2\n2,3\n', 'wrong-dimension'],
    ['cells below one', 'cells,f\n0,2\n2,3\n', 'not-positive'],
    ['one mesh', 'cells,f\n10,2\n', 'one-mesh'],
    ['the same mesh twice', 'cells,f\n10,2\n10,3\n', 'same-mesh'],
    ['no target', 'cells\n10\n20\n', 'no-target'],
  ])('%s', (_, csv, code) => expect(codes(csv)).toContain(code));
  it('an order of nonsense', () => expect(codes(sized([1, 2]), { formalOrder: 0 })).toEqual(['wrong-order']));
});
