import { describe, expect, it } from 'vitest';
import { Problem } from '../../src/problems/index.ts';
import { evaluateReference, findReference } from '../../src/references/index.ts';
import { compareText } from '../../src/report/index.ts';
import { compareReference, readTable, type ReferenceComparison } from '../../src/results/index.ts';

const pipe = findReference('poiseuille-pipe');
const given = { reynolds: 500, speed: 0.02, length: 0.025, viscosity: 1e-3, flowLength: 2 };
const compare = (csv: string, numerical?: string, inputs: Record<string, number> = given): ReferenceComparison =>
  compareReference(pipe, evaluateReference(pipe, inputs), readTable(csv, 'a.csv'), numerical === undefined ? {} : { numerical });
/** The parabola u = 2 U (1 - (2 r/D)^2), written out here, times a factor. */
const parabola = (factor: number, scale = 1000): string => `radius [mm],velocity [m/s]\n${Array.from({ length: 26 }, (_, i) => i / 25).map((r) => `${r * 0.0125 * scale},${factor * 0.04 * (1 - r * r)}`).join('\n')}\n`;

describe('a profile in a pipe against the parabola', () => {
  it('the table in metres is taken, the one of shares is not; the limit is that of the step', () => {
    const found = compare(parabola(1), '0.1 %');
    expect(found.tables.map((table) => table.columns.map((column) => column.column))).toEqual([['velocity']]);
    expect(found).toMatchObject({ outcome: 'met', limit: 0.005 });
    expect(found.tables[0]?.columns[0].norms.largest).toBeCloseTo(0, 4);
  });
  it('1 % too fast is missed, with what to look at first; without a numerical uncertainty it cannot be told', () => {
    const found = compare(parabola(1.01), '0.1 %');
    expect(found.outcome).toBe('missed');
    expect(found.tables[0]?.columns[0].place.at ?? 1).toBeLessThan(0.001); // on the axis, or at the next point by the last digit of the cubic
    expect(found.tables[0]?.columns[0].norms.largest).toBeCloseTo(0.0004, 5);
    expect(compareText(found)).toContain('Look first at: developed inlet');
    expect(Math.max(...compareText(found).split('\n').map((line) => line.length))).toBeLessThanOrEqual(80);
    expect(compare(parabola(1.01)).outcome).toBe('cannot tell');
  });
  it('single numbers of one row: Hagen and Poiseuille give 32 mu U L/D^2 = 2.048 Pa', () => {
    const found = compare('pressureDrop [Pa],skinFrictionCoefficient\n2.048,0.032\n', '0.1 %');
    expect(found.values.map((one) => [one.known, one.outcome])).toEqual([[expect.closeTo(0.032, 12), 'met'], [expect.closeTo(2.048, 12), 'met']]);
  });
  it.each([
    ['nothing known', 'a,b\n1,2\n2,3\n', 'missing-column'],
    ['a known name in another unit', 'radius [m],velocity [Pa]\n0,1\n1,2\n', 'wrong-dimension'],
  ])('%s', (_, csv, code) => {
    const codes = (): string[] => {
      try {
        compare(csv);
      } catch (error) {
        if (error instanceof Problem) return error.list.map((p) => p.code);
      }
      return [];
    };
    expect(codes()).toEqual([code]);
  });
});
