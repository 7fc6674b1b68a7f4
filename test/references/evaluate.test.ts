import { describe, expect, it } from 'vitest';
import { Problem } from '../../src/problems/index.ts';
import { unknownInputs } from '../../src/references/evaluate.ts';
import { evaluateReference, findReference, referenceNumber, references } from '../../src/references/index.ts';

describe('evaluation', () => {
  it('leaves out what lacks an input and names it', () => {
    const found = evaluateReference(findReference('poiseuille-pipe'), { reynolds: 100 });
    expect(found.values.map((v) => v.id)).toEqual(['frictionTimesReynolds', 'peakOverMean', 'frictionFactorDarcy', 'skinFrictionCoefficient']);
    expect(found.values[2]).toMatchObject({ value: 0.64, low: 0.64, high: 0.64, formula: 'f = 64/Re' });
    expect(found.missing).toContainEqual({ id: 'wallShear', needs: 'viscosity' });
    expect(found.problems).toEqual([]);
  });
  it('without any input where all are needed: one problem that names them', () => {
    const found = evaluateReference(findReference('ergun-bed'), {});
    expect(found.values).toEqual([]);
    expect(found.problems).toHaveLength(1);
    expect(found.problems[0]).toMatchObject({ code: 'missing-input' });
    expect(found.problems[0]?.expected).toContain('voidFraction');
    expect(found.problems[0]?.expected).toContain('viscosity in Pa s');
  });
  it('takes a default and says so', () => {
    const found = evaluateReference(findReference('kovasznay'), {});
    expect(found.flags).toEqual(['reynolds taken as 40']);
    expect(found.inputs).toEqual({ reynolds: 40 });
  });
  it('flags an input outside the range, from both sides, and not at the end itself', () => {
    const flags = (reynolds: number): readonly string[] => evaluateReference(findReference('poiseuille-pipe'), { reynolds }).flags;
    expect(flags(2300)).toEqual([]);
    expect(flags(2301)).toEqual(['reynolds = 2301 is outside 1e-12 .. 2300, where poiseuille-pipe holds']);
    expect(evaluateReference(findReference('graetz-pipe'), { graetz: 20, peclet: 50 }).flags[0]).toContain('peclet = 50 is outside 100');
  });
  it.each([[NaN, 'not-finite'], [Infinity, 'not-finite'], [0, 'not-positive'], [-5, 'not-positive']])('refuses a Reynolds number of %f', (reynolds, code) => {
    const found = evaluateReference(findReference('poiseuille-pipe'), { reynolds });
    expect(found.problems.map((p) => p.code)).toEqual([code]);
    expect(found.values.map((v) => v.id)).not.toContain('frictionFactorDarcy');
  });
  it('a benchmark holds at its own inputs only, within half a per cent', () => {
    const at = (rayleigh: number): ReturnType<typeof evaluateReference> => evaluateReference(findReference('side-heated-square'), { rayleigh });
    expect(at(1.004e5).values.find((v) => v.id === 'nusselt')?.value).toBe(4.519);
    expect(at(1.01e5).problems[0]).toMatchObject({ code: 'not-tabulated', nearest: '100000' });
    expect(at(1e7).values.map((v) => v.id)).not.toContain('nusseltMax');
    expect(at(1e7).problems).toEqual([]);
  });
  it('the spread is of the logarithm', () => {
    const { value, low, high } = evaluateReference(findReference('sphere-drag'), { reynolds: 100 }).values[0] as { value: number; low: number; high: number };
    expect(low).toBeCloseTo(value / 1.05, 12);
    expect(high).toBeCloseTo(value * 1.05, 12);
  });
  it('low stays below high for negative numbers', () => {
    for (const v of evaluateReference(findReference('lid-driven-square'), { reynolds: 1000 }).values) expect(v.low).toBeLessThanOrEqual(v.high);
  });
  it('ignores inherited names among the inputs', () => expect(evaluateReference(findReference('kovasznay'), Object.create({ reynolds: 20 }) as Record<string, number>).inputs).toEqual({ reynolds: 40 }));
  it('gives one number alone, or none', () => {
    const pipe = findReference('poiseuille-pipe');
    expect(referenceNumber(pipe, 'frictionFactorDarcy', { reynolds: 100 })).toEqual({ value: 0.64, uncertainty: 0 });
    expect(referenceNumber(pipe, 'frictionFactorDarcy', {})).toBeUndefined();
    expect(referenceNumber(pipe, 'frictionFactorDarcy', { reynolds: -1 })).toBeUndefined();
    expect(referenceNumber(pipe, 'nusselt', {})).toBeUndefined();
  });
  it('says so where it holds no number', () => expect(evaluateReference(findReference('cylinder-free-stream'), { reynolds: 45 }).problems[0]?.code).toBe('no-answer'));
  it('names the nearest reference and the nearest input', () => {
    expect(() => findReference('graetz-pip')).toThrowError(Problem);
    expect(unknownInputs(findReference('graetz-pipe'), ['graets', 'peclet'])).toMatchObject([{ code: 'unknown-input', nearest: 'graetz' }]);
  });
  describe.each(references.map((ref) => [ref.id, ref] as const))('%s', (id, ref) => {
    const own: Readonly<Record<string, Record<string, number>>> = { 'cylinder-free-stream': { reynolds: 100 }, 'shell-cylinder': { outerRadius: 3 }, 'shell-sphere': { outerRadius: 3 }, 'mixed-convection-pipe': { grashofFluxOverReynolds: 50 }, 'stefan-tube': { massFractionWall: 0.4 } };
    const middle = Object.fromEntries(ref.needs.map((need) => [need.id, need.anchors?.[1] ?? need.default ?? (need.range ? Math.sqrt(Math.max(need.range[0], 1e-3) * need.range[1]) : 1.5)]));
    const found = evaluateReference(ref, { ...middle, ...own[id] });
    it('answers within its range, with finite numbers and rising coordinates', () => {
      expect([...found.problems, ...found.missing]).toEqual([]);
      expect(found.values.length + found.tables.length).toBeGreaterThan(0);
      expect(found.tables.flatMap((t) => t.rows.flat()).every(Number.isFinite)).toBe(true);
      const broken = found.tables.filter((t) => t.rows.some((row, i) => row.length !== t.columns.length || (i > 0 && (row[0] as number) <= (t.rows[i - 1]?.[0] as number))));
      expect(broken.map((t) => t.id)).toEqual([]);
    });
  });
  it('is fast: a plan asks some six of them', () => {
    const given = { reynolds: 1000, prandtl: 7, graetz: 50, peclet: 7000, grashofFluxOverReynolds: 30 };
    const six = ['poiseuille-pipe', 'developed-heat-pipe', 'graetz-pipe', 'mixed-convection-pipe', 'turbulent-pipe', 'slab-steady'].map(findReference);
    // Best of twenty, since other work shares the machine.
    const times = Array.from({ length: 20 }, () => {
      const start = performance.now();
      for (const ref of six) evaluateReference(ref, given, 'values');
      return performance.now() - start;
    });
    expect(Math.min(...times)).toBeLessThan(5);
  });
});
